// SPDX-License-Identifier: MIT
#include "spanledger/input/utf8.hpp"

#include <algorithm>

namespace spanledger {

namespace {

constexpr std::string_view replacement = "\xEF\xBF\xBD";

/// What the first byte of a character says: its length, and the range that the second byte must lie in (which rules
/// out overlong forms, surrogates and values above U+10FFFF).
struct LeadByte {
    std::size_t length = 0; ///< 0: no character starts so
    unsigned char least = 0x80;
    unsigned char greatest = 0xBF;
};

LeadByte lead_byte(unsigned char byte) noexcept {
    if (byte < 0x80) {
        return {1};
    }
    if (byte >= 0xC2 && byte <= 0xDF) {
        return {2};
    }
    if (byte >= 0xE0 && byte <= 0xEF) {
        return {3, static_cast<unsigned char>(byte == 0xE0 ? 0xA0 : 0x80),
                static_cast<unsigned char>(byte == 0xED ? 0x9F : 0xBF)};
    }
    if (byte >= 0xF0 && byte <= 0xF4) {
        return {4, static_cast<unsigned char>(byte == 0xF0 ? 0x90 : 0x80),
                static_cast<unsigned char>(byte == 0xF4 ? 0x8F : 0xBF)};
    }
    return {};
}

/// Length in bytes of the valid character at the start of `text`, 0 where there is none.
std::size_t character_length(std::string_view text) noexcept {
    const auto byte_at = [&](std::size_t i) { return static_cast<unsigned char>(text[i]); };
    const LeadByte lead = lead_byte(byte_at(0));
    if (lead.length == 0 || text.size() < lead.length) {
        return 0;
    }
    for (std::size_t i = 1; i < lead.length; ++i) {
        const unsigned char least = i == 1 ? lead.least : 0x80;
        const unsigned char greatest = i == 1 ? lead.greatest : 0xBF;
        if (byte_at(i) < least || byte_at(i) > greatest) {
            return 0;
        }
    }
    return lead.length;
}

bool is_control(std::string_view character) noexcept {
    const auto first = static_cast<unsigned char>(character[0]);
    const bool c1 = first == 0xC2 && static_cast<unsigned char>(character[1]) < 0xA0;
    return (character.size() == 1 && (first < 0x20 || first == 0x7F)) || (character.size() == 2 && c1);
}

} // namespace

std::optional<std::size_t> first_invalid_utf8(std::string_view text) noexcept {
    for (std::size_t i = 0; i < text.size();) {
        const std::size_t length = character_length(text.substr(i));
        if (length == 0) {
            return i;
        }
        i += length;
    }
    return std::nullopt;
}

std::size_t count_characters(std::string_view text) noexcept {
    return static_cast<std::size_t>(
        std::count_if(text.begin(), text.end(), [](char c) { return (static_cast<unsigned char>(c) & 0xC0) != 0x80; }));
}

std::string printable(std::string_view text) {
    std::string shown;
    shown.reserve(text.size());
    for (std::size_t i = 0; i < text.size();) {
        const std::size_t length = character_length(text.substr(i));
        const std::string_view character = text.substr(i, std::max<std::size_t>(length, 1));
        if (character == "\t") {
            shown += character;
        } else {
            shown += length == 0 || is_control(character) ? replacement : character;
        }
        i += character.size();
    }
    return shown;
}

} // namespace spanledger
