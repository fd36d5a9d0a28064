// SPDX-License-Identifier: MIT
#pragma once

#include <cstddef>
#include <optional>
#include <string>
#include <string_view>

namespace spanledger {

/// Offset in bytes of the first byte that is not valid UTF-8; empty where all of it is.
[[nodiscard]] std::optional<std::size_t> first_invalid_utf8(std::string_view text) noexcept;

/// Number of characters (code points) in a valid UTF-8 text.
[[nodiscard]] std::size_t count_characters(std::string_view text) noexcept;

/// The text with control characters and invalid bytes replaced, so that showing it cannot steer a terminal.
[[nodiscard]] std::string printable(std::string_view text);

} // namespace spanledger
