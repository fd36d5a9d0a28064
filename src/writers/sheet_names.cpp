// SPDX-License-Identifier: MIT
#include "spanledger/writers/sheet_names.hpp"

#include "utf8_bytes.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {
namespace {

constexpr std::size_t longest_name = 31; // UTF-16 units

/// UTF-16 units of the character that begins with this byte: characters of four bytes take two.
std::size_t units_of(char first_byte) {
    return static_cast<unsigned char>(first_byte) >= 0xF0U ? 2 : 1;
}

/// The longest beginning with at most `units` UTF-16 units.
std::string_view beginning(std::string_view text, std::size_t units) {
    std::size_t taken = 0;
    std::size_t i = 0;
    while (i < text.size()) {
        if (taken + units_of(text[i]) > units) break;
        taken += units_of(text[i]);
        i += first_character_bytes(text.substr(i));
    }
    return text.substr(0, i);
}

std::string without_illegal(std::string_view wanted) {
    std::string name;
    for (const char c : wanted) {
        const bool control = static_cast<unsigned char>(c) < 0x20U || c == 0x7F;
        const bool illegal = control || std::string_view("[]:*?/\\").find(c) != std::string_view::npos;
        const char legal = illegal ? ' ' : c;
        if (legal != ' ' || !name.ends_with(' ')) name += legal;
    }
    return name;
}

std::string_view trimmed(std::string_view name) {
    constexpr std::string_view edge = " '";
    const std::size_t first = name.find_first_not_of(edge);
    if (first == std::string_view::npos) return {};
    return name.substr(first, name.find_last_not_of(edge) - first + 1);
}

/// Two bytes of UTF-8 as a code point.
unsigned code_point(char first, char second) {
    return ((static_cast<unsigned char>(first) & 0x1FU) << 6U) | (static_cast<unsigned char>(second) & 0x3FU);
}

/// Capitals of Latin, Greek and Cyrillic as small letters, the same in every locale.
std::string folded(std::string_view name) {
    std::string small;
    for (std::size_t i = 0; i < name.size(); ++i) {
        const char c = name[i];
        if (c >= 'A' && c <= 'Z') {
            small += static_cast<char>(c - 'A' + 'a');
            continue;
        }
        small += c;
        const bool two_bytes = (static_cast<unsigned char>(c) & 0xE0U) == 0xC0U && i + 1 < name.size();
        if (!two_bytes) continue;
        unsigned code = code_point(c, name[++i]);
        const bool latin = code >= 0xC0 && code <= 0xDE && code != 0xD7;
        const bool greek = code >= 0x391 && code <= 0x3A9;
        const bool cyrillic = code >= 0x410 && code <= 0x42F;
        if (latin || greek || cyrillic) code += 0x20;
        if (code >= 0x400 && code <= 0x40F) code += 0x50;
        small.back() = static_cast<char>(0xC0U | (code >> 6U));
        small += static_cast<char>(0x80U | (code & 0x3FU));
    }
    return small;
}

} // namespace

std::string SheetNames::unique(std::string_view wanted) {
    const std::string legal = without_illegal(wanted);
    std::string_view base = trimmed(legal);
    if (base.empty() || folded(base) == "history") base = "Sheet";
    std::string name(trimmed(beginning(base, longest_name)));
    for (int n = 2; std::find(taken_.begin(), taken_.end(), folded(name)) != taken_.end(); ++n) {
        const std::string ending = fmt::format(" ({})", n);
        name = std::string(trimmed(beginning(base, longest_name - ending.size()))) + ending;
    }
    taken_.push_back(folded(name));
    return name;
}

} // namespace spanledger
