// SPDX-License-Identifier: MIT
#include "spanledger/writers/issue_workbook.hpp"

#include "issue_sheets.hpp"
#include "table_kinds.hpp"
#include "utf8_bytes.hpp"

#include "spanledger/input/utf8.hpp"
#include "spanledger/writers/sheet_names.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {
namespace {

xlsx::Properties properties_of(const Issue& issue) {
    const Practice& practice = issue.brief.practice;
    return {.title = practice.title,
            .subject = issue_mark(practice),
            .author = practice.prepared,
            .company = practice.name,
            .comments = "Joist span tables",
            .date = practice.date,
            .custom = {{"Number", practice.number},
                       {"Revision", practice.revision},
                       {"Program", "spanledger " + issue.program_version}}};
}

std::vector<TablePart> all_parts(const Issue& issue) {
    std::vector<TablePart> parts;
    for (std::size_t i = 0; i < issue.tables.size(); ++i) {
        for (TablePart& part : parts_of(issue.tables[i], i + 1, issue.brief.search)) parts.push_back(std::move(part));
    }
    return parts;
}

std::string holds(const TablePart& part) {
    const TableResult& table = *part.table;
    const KindWords& kind = words_of(table.kind);
    std::string text = fmt::format("{}{}{}; {}, {}; {} rows, {} columns", kind.heading, kind.unit.empty() ? "" : " in ",
                                   kind.unit, table.members, table.material, table.rows.size(), part.last - part.first);
    if (part.parts > 1) text += fmt::format("; part {} of {}", part.part, part.parts);
    return text;
}

/// The first characters of a text, with a sign where it goes on.
std::string beginning(const std::string& text, std::size_t characters) {
    if (count_characters(text) <= characters) return text;
    std::size_t bytes = 0;
    for (std::size_t n = 1; n < characters; ++n) bytes += first_character_bytes(std::string_view(text).substr(bytes));
    return text.substr(0, bytes) + "…";
}

/// Number, table and members entry; where they are too long for a sheet's name, each keeps about half the room.
std::string sheet_name(const TablePart& part) {
    constexpr std::size_t longest_name = 31;
    const std::string number =
        part.parts > 1 ? fmt::format("{}.{} ", part.number, part.part) : fmt::format("{} ", part.number);
    const std::size_t room = longest_name - std::min(longest_name - 4, number.size() + 2);
    const std::size_t of_members = std::min(count_characters(part.table->members), room / 2);
    const std::string table = beginning(part.table->name, room - of_members);
    return fmt::format("{}{}, {}", number, table, beginning(part.table->members, room - count_characters(table)));
}

} // namespace

WriteResult write_workbook(const Issue& issue, const std::string& file,
                           const std::function<std::string()>& fingerprint) {
    xlsx::Book book(file, properties_of(issue));
    SheetNames names;
    CoverWords words;
    xlsx::Sheet& cover = book.add_sheet(names.unique("Cover"));
    xlsx::Sheet& basis = book.add_sheet(names.unique("Basis"));
    words.sheets.push_back(
        {basis.name(), "Every choice, parameter, limit and assumption in force, with clause and origin"});
    write_basis(book, basis, issue);
    std::vector<TablePart> parts = all_parts(issue);
    for (TablePart& part : parts) {
        part.sheet = names.unique(sheet_name(part));
        words.sheets.push_back({part.sheet, holds(part)});
        write_table(book, book.add_sheet(part.sheet), issue, part);
    }
    for (const LimitCurves& curves : issue.curves) {
        xlsx::Sheet& sheet = book.add_sheet(names.unique(fmt::format("Curves {}", curves.member)));
        words.sheets.push_back(
            {sheet.name(), fmt::format("Limit curves: permissible load against span, {} at {} mm, {}", curves.member,
                                       curves.spacing, curves.load)});
        write_curves(book, sheet, issue, curves);
    }
    xlsx::Sheet& sources = book.add_sheet(names.unique("Sources"));
    words.sheets.push_back({sources.name(), "Every catalogue row and parameter in use, its source, seen or recalled"});
    write_sources(book, sources, issue);
    words.fingerprint = fingerprint();
    book.property("Fingerprint", words.fingerprint);
    write_cover(book, cover, issue, words);
    return book.close();
}

} // namespace spanledger
