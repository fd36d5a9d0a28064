// SPDX-License-Identifier: MIT
#include "issue_sheets.hpp"

#include <fmt/format.h>

namespace spanledger {

std::string issue_mark(const Practice& practice) {
    return practice.revision.empty() ? practice.number
                                     : fmt::format("{}, revision {}", practice.number, practice.revision);
}

xlsx::PageSetUp page_set_up(const Practice& practice) {
    xlsx::PageSetUp page;
    page.header = {.left = practice.name, .centre = practice.title, .right = issue_mark(practice)};
    page.footer = {.left = issue_mark(practice), .centre = practice.date, .right = "page &[page] of &[pages]"};
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
