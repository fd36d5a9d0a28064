// SPDX-License-Identifier: MIT
#pragma once

#include <cstddef>
#include <string_view>

namespace spanledger {

/// Whether a byte of UTF-8 belongs to the character that began before it.
[[nodiscard]] constexpr bool continues_character(char byte) noexcept {
    return (static_cast<unsigned char>(byte) & 0xC0U) == 0x80U;
}

/// Bytes of the first character of a text that is not empty.
[[nodiscard]] constexpr std::size_t first_character_bytes(std::string_view text) noexcept {
    std::size_t bytes = 1;
    while (bytes < text.size() && continues_character(text[bytes])) ++bytes;
    return bytes;
}

} // namespace spanledger
