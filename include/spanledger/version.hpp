// SPDX-License-Identifier: MIT
#pragma once

#include <string_view>

namespace spanledger {

/// The program's version, "0.1.0".
[[nodiscard]] std::string_view program_version() noexcept;

} // namespace spanledger
