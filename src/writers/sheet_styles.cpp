// SPDX-License-Identifier: MIT
#include "issue_sheets.hpp"

#include "utf8_bytes.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {
namespace {

constexpr Font header_font{8.0, false};

/// The text in one line of so many points; what is too long ends with a sign that says so.
std::string in_one_line(const std::string& text, double width) {
    std::string line;
    for (std::string_view rest = text; !rest.empty();) {
        const std::size_t bytes = first_character_bytes(rest);
        line += rest.substr(0, bytes);
        rest.remove_prefix(bytes);
        if (rest.empty() || text_width(line + "…", header_font) <= width) continue;
        line.resize(line.size() - bytes);
        return line + "…";
    }
    return line;
}

} // namespace

std::string issue_mark(const Practice& practice) {
    return practice.revision.empty() ? practice.number
                                     : fmt::format("{}, revision {}", practice.number, practice.revision);
}

xlsx::PageSetUp page_set_up(const Practice& practice) {
    xlsx::PageSetUp page;
    constexpr double widest_side = page_width / 3.0;
    const std::string left = in_one_line(practice.name, widest_side);
    const std::string right = in_one_line(issue_mark(practice), widest_side);
    const double side = std::max(text_width(left, header_font), text_width(right, header_font));
    page.header = {.left = left, .centre = in_one_line(practice.title, page_width - 2.0 * side - 20.0), .right = right};
    page.footer = {.left = right, .centre = practice.date, .right = "page &[page] of &[pages]"};
    return page;
}

std::string number_format_of(int decimals) {
    return decimals > 0 ? "0." + std::string(static_cast<std::size_t>(decimals), '0') : "0";
}

xlsx::Style cell_style(const std::optional<Limit>& governing, const std::string& number_format) {
    xlsx::Style style{.size = 10.0, .align = xlsx::Align::centre};
    if (governing) {
        const LimitDefinition& limit = definition_of(*governing);
        style.fill = limit.fill;
        style.number_format = fmt::format("{}\" {}\"", number_format, limit.letter);
    } else {
        style.number_format = fmt::format("{}\" {}\"", number_format, no_limit_mark);
    }
    return style;
}

} // namespace spanledger
