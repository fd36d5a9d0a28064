// SPDX-License-Identifier: MIT
#include "issue_sheets.hpp"
#include "sheet_pen.hpp"

namespace spanledger {
namespace {

std::string mark(const SourceLine& line) {
    if (line.practice_own) return "practice's own";
    return line.seen ? "seen" : "from memory";
}

} // namespace

void write_sources(xlsx::Book& book, xlsx::Sheet& sheet, const Issue& issue) {
    SheetPen pen(book, sheet, {84.0, 116.0, 244.0, 236.0, 90.0});
    pen.paragraph(0, "Sources of the values", sheet_title, pen.width());
    pen.paragraph(
        0,
        "Every catalogue row and parameter that these tables use. Seen: the value was seen in the source. From "
        "memory: it is recalled, and must be confirmed against the source before the tables are relied on.",
        running_text, pen.width());
    pen.gap(4.0);
    const std::uint32_t head = pen.next_row();
    pen.row({"Kind", "Item", "Value, with unit", "Source", "Seen or recalled"}, list_head);
    const xlsx::At first_scrolling = pen.at(2);
    for (const SourceLine& line : issue.sources) {
        pen.row({line.kind, line.item, line.value, line.source, mark(line)}, list_row);
    }
    xlsx::PageSetUp page = page_set_up(issue.brief.practice);
    page.print_area = {{0, 0}, {pen.next_row() - 1, 4}};
    page.first_repeated_row = head;
    page.last_repeated_row = head;
    page.frozen = first_scrolling;
    sheet.set_up(page);
}

} // namespace spanledger
