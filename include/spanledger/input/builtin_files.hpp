// SPDX-License-Identifier: MIT
#pragma once

#include <span>
#include <string_view>

namespace spanledger {

/// A data file of materials/ or a starter file, built into the program.
struct BuiltinFile {
    std::string_view name; ///< without folder
    std::string_view text;
};

/// All built-in files, ordered by name within their folder.
[[nodiscard]] std::span<const BuiltinFile> builtin_files() noexcept;

/// Text of one built-in file. An unknown name is a fault in the program (std::logic_error).
[[nodiscard]] std::string_view builtin_file(std::string_view name);

} // namespace spanledger
