// SPDX-License-Identifier: MIT
#include "spanledger/input/csv.hpp"

#include "spanledger/input/suggestion.hpp"
#include "spanledger/input/text_file.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <utility>

namespace spanledger {

namespace {

std::vector<std::string> names_of(std::span<const CsvColumn> columns) {
    std::vector<std::string> names;
    for (const CsvColumn& column : columns) {
        names.push_back(column.name);
    }
    return names;
}

/// Reports every column name that is unknown, stands twice or is missing.
bool columns_fit(const CsvText& text, const CsvRow& header, std::span<const CsvColumn> columns,
                 Diagnostics& diagnostics) {
    const std::vector<std::string> known = names_of(columns);
    const auto first_with = [&](const std::string& name) {
        return std::find_if(header.fields.begin(), header.fields.end(),
                            [&](const CsvField& field) { return field.text == name; });
    };
    bool fit = true;
    const auto problem = [&](std::string code, const CsvField& at, std::string message, std::string hint) {
        fit = false;
        diagnostics.error(std::move(code), text.place_of(at), std::move(message), std::move(hint));
    };
    for (const CsvField& field : header.fields) {
        if (std::find(known.begin(), known.end(), field.text) == known.end()) {
            problem("unknown-column", field, fmt::format("column '{}' is not known", field.text),
                    did_you_mean(field.text, known));
        } else if (const CsvField& first = *first_with(field.text); &first != &field) {
            problem("duplicate-column", field, fmt::format("column '{}' stands twice", field.text),
                    fmt::format("it is also at column {} of the line; leave one out", first.column));
        }
    }
    for (const CsvColumn& column : columns) {
        if (column.required && first_with(column.name) == header.fields.end()) {
            problem("missing-column", header.fields.front(), fmt::format("column '{}' is missing", column.name),
                    fmt::format("the columns are: {}", joined(known)));
        }
    }
    return fit;
}

void report_uneven_row(const CsvText& text, const CsvRow& header, const CsvRow& row, Diagnostics& diagnostics) {
    const std::size_t wanted = header.fields.size();
    const bool is_short = row.fields.size() < wanted;
    const CsvField& at = is_short ? row.fields.back() : row.fields[wanted];
    const std::string hint = is_short ? fmt::format("the field of column '{}' is missing, or a separator is",
                                                    header.fields[row.fields.size()].text)
                                      : "leave out what is too much, or put a text that holds the separator in quotes";
    diagnostics.error(is_short ? "short-row" : "long-row", text.place_of(at),
                      fmt::format("row '{}' has {} fields, but there are {} columns", row.fields.front().text,
                                  row.fields.size(), wanted),
                      hint);
}

} // namespace

std::optional<CsvTable> read_csv(const std::string& file, std::string_view text, std::span<const CsvColumn> columns,
                                 Diagnostics& diagnostics) {
    const std::optional<std::string_view> accepted = accept_text(file, text, diagnostics);
    if (!accepted) {
        return std::nullopt;
    }
    CsvText split = split_csv(file, *accepted, diagnostics);
    if (split.rows.empty()) {
        diagnostics.error("no-columns", {.file = file}, "the file has no row of column names",
                          fmt::format("begin with a row of column names: {}", joined(names_of(columns))));
        return std::nullopt;
    }
    const CsvRow header = split.rows.front();
    if (!columns_fit(split, header, columns, diagnostics) || !split.well_formed) {
        return std::nullopt;
    }
    std::vector<CsvRow> rows = std::exchange(split.rows, {});
    for (auto row = rows.begin() + 1; row != rows.end(); ++row) {
        if (row->fields.size() == header.fields.size()) {
            split.rows.push_back(std::move(*row));
        } else {
            report_uneven_row(split, header, *row, diagnostics);
        }
    }
    return CsvTable(std::move(split), header);
}

CsvTable::CsvTable(CsvText text, const CsvRow& header) : text_(std::move(text)) {
    for (const CsvField& field : header.fields) {
        columns_.push_back(field.text);
    }
}

std::optional<std::size_t> CsvTable::index_of(std::string_view column) const noexcept {
    const auto found = std::find(columns_.begin(), columns_.end(), column);
    return found == columns_.end() ? std::nullopt : std::optional(static_cast<std::size_t>(found - columns_.begin()));
}

} // namespace spanledger
