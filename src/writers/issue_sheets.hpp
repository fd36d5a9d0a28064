// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/results/issue.hpp"
#include "spanledger/writers/text_lines.hpp"
#include "spanledger/writers/xlsx_book.hpp"

#include <memory>
#include <string>
#include <vector>

// The sheets of an issued workbook, one function each.

namespace spanledger {

/// Looks that the sheets share.
inline const xlsx::Style sheet_title{.size = 14.0, .bold = true};
inline const xlsx::Style group_heading{.size = 10.0, .bold = true};
inline const xlsx::Style list_head{.size = 9.0, .bold = true, .borders = {.bottom = xlsx::Line::strong}};
inline const xlsx::Style list_row{.size = 9.0, .borders = {.bottom = xlsx::Line::fine}};
inline const xlsx::Style running_text{.size = 9.0};

/// Points between the margins of an A4 page in landscape, less a little.
inline constexpr double page_width = 770.0;

/// What a sheet must know of all the cells of its table before it writes the first.
struct TableFacts {
    double cell_width = 0.0;          ///< points
    std::vector<std::string> reasons; ///< why cells have no value, each once in the order met; cells give its number
    std::vector<Limit> limits;        ///< whose letters may stand in it: checked, or in a cell all the same
};

[[nodiscard]] TableFacts facts_of(const TableResult& table, const SearchRange& search);

/// Columns [first, last) of a table that stand on one sheet.
struct TablePart {
    const TableResult* table = nullptr;
    std::shared_ptr<const TableFacts> facts{};
    std::size_t number = 1; ///< of the table in the issue
    std::size_t part = 1;
    std::size_t parts = 1;
    std::size_t first = 0;
    std::size_t last = 0;
    std::string sheet{}; ///< its name
};

/// The parts of a table that are legible when fitted to a page's width: load classes stay together where they can.
[[nodiscard]] std::vector<TablePart> parts_of(const TableResult& table, std::size_t number, const SearchRange& search);

/// A line of the cover's list of sheets.
struct SheetEntry {
    std::string sheet;
    std::string holds;
};

/// What the cover says beside the issue itself.
struct CoverWords {
    std::string fingerprint;
    std::vector<SheetEntry> sheets;
};

void write_cover(xlsx::Book& book, xlsx::Sheet& sheet, const Issue& issue, const CoverWords& words);
void write_basis(xlsx::Book& book, xlsx::Sheet& sheet, const Issue& issue);
void write_table(xlsx::Book& book, xlsx::Sheet& sheet, const Issue& issue, const TablePart& part);
void write_curves(xlsx::Book& book, xlsx::Sheet& sheet, const Issue& issue, const LimitCurves& curves);
void write_sources(xlsx::Book& book, xlsx::Sheet& sheet, const Issue& issue);

/// Header and footer of every sheet: practice, title, number, revision, page n of N.
[[nodiscard]] xlsx::PageSetUp page_set_up(const Practice& practice);

/// "EX-101, revision A"
[[nodiscard]] std::string issue_mark(const Practice& practice);

/// Style of a cell that a limit governs; `number_format` without the letter. No limit: the mark –, without a fill.
[[nodiscard]] xlsx::Style cell_style(const std::optional<Limit>& governing, const std::string& number_format);

/// "0.00"
[[nodiscard]] std::string number_format_of(int decimals);

} // namespace spanledger
