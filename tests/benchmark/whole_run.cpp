// SPDX-License-Identifier: MIT
#include "bare_cells.hpp"
#include "practice.hpp"
#include "quads.hpp"

#include "issue_sheets.hpp" // how the writer parts a table among sheets

#include "spanledger/engine/issue_tables.hpp"
#include "spanledger/input/inputs.hpp"
#include "spanledger/writers/issue_files.hpp"
#include "spanledger/writers/issue_workbook.hpp"

#include <fmt/format.h>

#include <iostream>
#include <optional>
#include <string>
#include <vector>

// The whole way from a brief to an issue, as far as asked; and the files that a run and the bare writer start from.

namespace {

using namespace spanledger;

std::optional<Issue> swept(const std::string& brief) {
    Diagnostics diagnostics;
    const std::optional<Inputs> inputs = read_inputs(brief, diagnostics);
    report(diagnostics, std::cerr);
    if (!inputs) return std::nullopt;
    return issue_tables(*inputs);
}

benchmark::BareSheet bare_sheet(const TablePart& part, std::size_t number) {
    const TableResult& table = *part.table;
    benchmark::BareSheet sheet;
    sheet.name = fmt::format("Sheet {}", number);
    for (std::size_t column = part.first; column < part.last; ++column) {
        sheet.loads.push_back(table.columns[column].load);
        sheet.spacings.push_back(table.columns[column].spacing);
    }
    for (std::size_t row = 0; row < table.rows.size(); ++row) {
        sheet.classes.push_back(table.rows[row].material_class);
        sheet.sections.push_back(table.rows[row].section);
        for (std::size_t column = part.first; column < part.last; ++column) {
            const Cell& cell = table.at(row, column);
            sheet.spans.push_back(cell.value.value_or(0.0) * 0.001);
            sheet.limits.push_back(static_cast<std::uint8_t>(cell.governing ? index_of(*cell.governing) : limit_count));
        }
    }
    return sheet;
}

/// Writes brief, series and the cells of its issue into the folder.
bool prepare(const std::string& folder, const std::string& cells) {
    const auto size = cells == "million" ? benchmark::million_cells : benchmark::ten_thousand_cells;
    const auto issue = swept(benchmark::write_practice(folder, size, benchmark::BriefKind::with_vibration));
    if (!issue) return false;
    std::vector<benchmark::BareSheet> sheets;
    for (std::size_t i = 0; i < issue->tables.size(); ++i) {
        for (const TablePart& part : parts_of(issue->tables[i], i + 1, issue->brief.search)) {
            sheets.push_back(bare_sheet(part, sheets.size() + 1));
        }
    }
    return benchmark::write_bare_sheets(folder + "/cells.bin", sheets);
}

bool swept_only(const std::string& brief) {
    return swept(brief).has_value();
}

/// The fingerprint is that of the JSON record, which is not made here.
bool workbook_written(const std::string& brief, const std::string& file) {
    const auto issue = swept(brief);
    return issue && !write_workbook(*issue, file, [] { return std::string(16, '0'); });
}

bool all_files_written(const std::string& brief, const std::string& folder) {
    const auto issue = swept(brief);
    return issue && write_issue(*issue, folder, true).kind == IssueOutcome::Kind::written;
}

} // namespace

/// whole_run prepare FOLDER ten-thousand|million | sweep BRIEF | workbook BRIEF FILE | all BRIEF FOLDER
/// Each prints its wall and processor seconds.
int main(int argc, char** argv) {
    const std::vector<std::string> words(argv + 1, argv + argc);
    if (words.size() < 2) return 2;
    const std::string last = words.back();
    bool well = false;
    const auto sample = benchmark::timed([&] {
        if (words[0] == "prepare") well = prepare(words[1], last);
        if (words[0] == "sweep") well = swept_only(words[1]);
        if (words[0] == "workbook") well = workbook_written(words[1], last);
        if (words[0] == "all") well = all_files_written(words[1], last);
    });
    fmt::print("{} {}\n", sample.wall, sample.processor);
    return well ? 0 : 1;
}
