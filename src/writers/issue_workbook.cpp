// SPDX-License-Identifier: MIT
#include "spanledger/writers/issue_workbook.hpp"

#include "issue_sheets.hpp"
#include "table_kinds.hpp"

#include "spanledger/writers/sheet_names.hpp"

#include <fmt/format.h>

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

std::string sheet_name(const TablePart& part) {
    const std::string plain = fmt::format("{} {}, {}", part.number, part.table->name, part.table->members);
    return part.parts > 1 ? fmt::format("{}.{} {}", part.number, part.part, plain.substr(plain.find(' ') + 1)) : plain;
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
