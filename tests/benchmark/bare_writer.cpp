// SPDX-License-Identifier: MIT
#include "bare_cells.hpp"
#include "quads.hpp"

#include "spanledger/limits.hpp"

#include <fmt/format.h>
#include <xlsxwriter.h>

#include <array>
#include <string>
#include <vector>

// The least work that puts an issue's table cells into a workbook: heads, numbers, and a format per governing limit.

namespace {

using spanledger::benchmark::BareSheet;
/// A format per governing limit, and one for none.
using Formats = std::array<lxw_format*, spanledger::limit_count + 1>;

constexpr lxw_row_t head_rows = 3;
constexpr lxw_col_t head_columns = 2;

lxw_format* cell_format(lxw_workbook* workbook, const std::string& number_format) {
    lxw_format* format = workbook_add_format(workbook);
    format_set_num_format(format, number_format.c_str());
    format_set_align(format, LXW_ALIGN_CENTER);
    format_set_bottom(format, LXW_BORDER_THIN);
    return format;
}

Formats cell_formats(lxw_workbook* workbook) {
    Formats formats{};
    for (const spanledger::LimitDefinition& definition : spanledger::limit_definitions) {
        lxw_format* format = cell_format(workbook, fmt::format("0.00\" {}\"", definition.letter));
        format_set_pattern(format, LXW_PATTERN_SOLID);
        format_set_fg_color(format, definition.fill);
        formats[spanledger::index_of(definition.limit)] = format;
    }
    formats.back() = cell_format(workbook, fmt::format("0.00\" {}\"", spanledger::no_limit_mark));
    return formats;
}

void write_column_heads(lxw_worksheet* worksheet, const BareSheet& sheet) {
    for (std::size_t i = 0; i < sheet.loads.size(); ++i) {
        const auto column = static_cast<lxw_col_t>(i + head_columns);
        if (i == 0 || sheet.loads[i] != sheet.loads[i - 1]) {
            worksheet_write_string(worksheet, 0, column, sheet.loads[i].c_str(), nullptr);
        }
        worksheet_write_number(worksheet, 1, column, sheet.spacings[i], nullptr);
        worksheet_write_string(worksheet, 2, column, "m", nullptr);
    }
}

void write_sheet(lxw_workbook* workbook, const Formats& formats, const BareSheet& sheet) {
    lxw_worksheet* worksheet = workbook_add_worksheet(workbook, sheet.name.c_str());
    write_column_heads(worksheet, sheet);
    std::size_t cell = 0;
    for (std::size_t i = 0; i < sheet.sections.size(); ++i) {
        const auto row = static_cast<lxw_row_t>(i + head_rows);
        worksheet_write_string(worksheet, row, 0, sheet.classes[i].c_str(), nullptr);
        worksheet_write_string(worksheet, row, 1, sheet.sections[i].c_str(), nullptr);
        for (std::size_t j = 0; j < sheet.loads.size(); ++j, ++cell) {
            const auto column = static_cast<lxw_col_t>(j + head_columns);
            lxw_format* format = formats[sheet.limits[cell]];
            if (sheet.spans[cell] > 0.0) {
                worksheet_write_number(worksheet, row, column, sheet.spans[cell], format);
            } else {
                worksheet_write_string(worksheet, row, column, spanledger::no_limit_mark.data(), formats.back());
            }
        }
    }
}

bool write_workbook(const std::vector<BareSheet>& sheets, const char* file) {
    lxw_workbook* workbook = workbook_new(file);
    const Formats formats = cell_formats(workbook);
    for (const BareSheet& sheet : sheets) write_sheet(workbook, formats, sheet);
    return workbook_close(workbook) == LXW_NO_ERROR;
}

} // namespace

/// bare_writer CELLS WORKBOOK: prints the wall and processor seconds of the writing, reading the cells not included.
int main(int argc, char** argv) {
    if (argc != 3) return 2;
    const auto sheets = spanledger::benchmark::read_bare_sheets(argv[1]);
    if (sheets.empty()) return 2;
    bool written = false;
    const auto sample = spanledger::benchmark::timed([&] { written = write_workbook(sheets, argv[2]); });
    fmt::print("{} {}\n", sample.wall, sample.processor);
    return written ? 0 : 3;
}
