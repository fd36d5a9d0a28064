// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/diagnostics.hpp"

#include <cstddef>
#include <optional>
#include <string>
#include <string_view>

namespace spanledger {

inline constexpr std::size_t largest_text_file = std::size_t{64} << 20; ///< bytes

/// The text without a byte order mark, where it is UTF-8 of at most 64 MiB; otherwise "invalid-utf8" with its place, or
/// "file-too-large" with its size. `file` is its name in messages.
[[nodiscard]] std::optional<std::string_view> accept_text(const std::string& file, std::string_view text,
                                                          Diagnostics& diagnostics);

/// Reads a whole text file ("-" is standard input) and accepts it as above; "unreadable-file" where it cannot be read.
[[nodiscard]] std::optional<std::string> read_text_file(const std::string& file, Diagnostics& diagnostics);

/// `file` as it is if absolute, else within `base_directory` (empty: the current one).
[[nodiscard]] std::string resolve_file(const std::string& base_directory, const std::string& file);

} // namespace spanledger
