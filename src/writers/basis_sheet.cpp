// SPDX-License-Identifier: MIT
#include "issue_sheets.hpp"
#include "sheet_pen.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <set>

namespace spanledger {
namespace {

std::string joined(const std::set<std::string>& words) {
    std::string text;
    for (const std::string& one : words) text += (text.empty() ? "" : "; ") + one;
    return text;
}

/// What the tables say of one limit: its clauses where any checks it, else why none does.
BasisLine limit_line(const Issue& issue, const LimitDefinition& definition) {
    std::set<std::string> clauses;
    std::set<std::string> reasons;
    bool checked = false;
    for (const TableResult& table : issue.tables) {
        for (const LimitNote& note : table.limits) {
            if (note.limit != definition.limit) continue;
            const bool here = note.status == LimitStatus::checked;
            checked = checked || here;
            if (here && !note.clause.empty()) clauses.insert(note.clause);
            if (!here && !note.reason.empty()) reasons.insert(note.reason);
        }
    }
    std::string value(definition.about);
    if (!checked) value += ": not checked";
    if (!reasons.empty()) value += fmt::format(" ({}{})", checked ? "not in every table: " : "", joined(reasons));
    return {{}, fmt::format("{}  {}", definition.letter, definition.name), std::move(value), joined(clauses), {}};
}

void write_line(SheetPen& pen, const BasisLine& line) {
    pen.row({line.item, line.value, line.clause, line.origin}, list_row);
}

} // namespace

void write_basis(xlsx::Book& book, xlsx::Sheet& sheet, const Issue& issue) {
    SheetPen pen(book, sheet, {152.0, 390.0, 138.0, 90.0});
    pen.paragraph(0, "Basis of the tables", sheet_title, pen.width());
    pen.paragraph(0, "Everything that is in force in this issue. The tables hold on this basis and on no other.",
                  running_text, pen.width());
    pen.gap(4.0);
    const std::uint32_t head = pen.next_row();
    pen.row({"Item", "Value, with unit", "Clause", "Origin"}, list_head);
    const xlsx::At first_scrolling = pen.at(1);
    std::string heading;
    for (const BasisLine& line : issue.basis) {
        if (line.heading != heading) {
            pen.gap(7.0);
            pen.heading(line.heading, group_heading);
            heading = line.heading;
        }
        write_line(pen, line);
    }
    pen.gap(7.0);
    pen.heading("Letters of the limits", group_heading);
    for (const LimitDefinition& definition : limit_definitions) write_line(pen, limit_line(issue, definition));
    xlsx::PageSetUp page = page_set_up(issue.brief.practice);
    page.print_area = {{0, 0}, {pen.next_row() - 1, 3}};
    page.first_repeated_row = head;
    page.last_repeated_row = head;
    page.frozen = first_scrolling;
    sheet.set_up(page);
}

} // namespace spanledger
