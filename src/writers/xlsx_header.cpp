// SPDX-License-Identifier: MIT
#include "xlsx_header.hpp"

#include "utf8_bytes.hpp"

#include <fmt/format.h>

namespace spanledger::xlsx {
namespace {

/// A part of a header or footer: & begins a code there. What is too long ends with a sign that says so.
std::string header_part(const std::string& words) {
    constexpr std::size_t longest_part = 69; // bytes: with the sign and the codes, three parts fit in 255
    std::string_view rest = words;
    std::string coded;
    const auto take = [&rest](std::string_view words_taken) {
        const bool there = rest.starts_with(words_taken);
        if (there) rest.remove_prefix(words_taken.size());
        return there;
    };
    while (!rest.empty()) {
        std::string next;
        if (take("&[page]")) {
            next = "&P";
        } else if (take("&[pages]")) {
            next = "&N";
        } else if (take("&")) {
            next = "&&";
        } else {
            next = rest.substr(0, first_character_bytes(rest));
            rest.remove_prefix(next.size());
        }
        if (coded.size() + next.size() > longest_part) return coded + "…";
        coded += next;
    }
    return coded;
}

} // namespace

std::string header_text(const PageWords& words, std::string_view font) {
    // The blank after the size keeps a number that the words begin with apart from it.
    const auto part = [font](const char* place, const std::string& text) {
        return text.empty() ? std::string() : fmt::format("&{}&\"{}\"&8 {}", place, font, header_part(text));
    };
    return part("L", words.left) + part("C", words.centre) + part("R", words.right);
}

} // namespace spanledger::xlsx
