// SPDX-License-Identifier: MIT
#include "spanledger/writers/issue_csv.hpp"

#include "table_kinds.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <iterator>

namespace spanledger {
namespace {

constexpr std::string_view line_end = "\r\n";

/// A length in mm, in metres with three decimals, rounded down to 1 mm.
void append_metres_down(std::string& line, double mm) {
    constexpr double rounding = 1e-7; // a whole number of mm but for the last digits is that number
    const auto whole = static_cast<long long>(std::floor(mm + rounding));
    const fmt::format_int metres(whole / 1000);
    const fmt::format_int millimetres(1000 + whole % 1000); // three digits behind the first
    line.append(metres.data(), metres.size()).append(1, '.').append(millimetres.data() + 1, millimetres.size() - 1);
}

/// A utilisation with four decimals, rounded up.
void append_utilisation(std::string& line, double utilisation) {
    constexpr double places = 1e4;
    constexpr double rounding = 1e-8;
    fmt::format_to(std::back_inserter(line), "{:.4f}", std::ceil(utilisation * places - rounding) / places + 0.0);
}

std::string header() {
    std::string line =
        "table,kind,material,class,section,spacing_mm,load,clear_span_m,load_kN_m2,utilisation,governing,"
        "next_limit,reason";
    for (const LimitDefinition& definition : limit_definitions) {
        std::string name(definition.name);
        std::replace(name.begin(), name.end(), ' ', '_');
        std::replace(name.begin(), name.end(), '-', '_');
        line += ',' + name + "_clear_span_m";
    }
    line += line_end;
    return line;
}

class TableLines {
public:
    TableLines(const Issue& issue, const TableResult& table, std::string& text)
        : table_(&table), words_(&words_of(table.kind)), text_(&text),
          span_decimals_(decimals_of_step(issue.brief.search.step)) {}

    void write() {
        const std::string start =
            fmt::format("{},{},{},", csv_field(table_->name), words_->name, csv_field(table_->material));
        std::vector<std::string> columns;
        for (const ColumnHead& column : table_->columns) {
            columns.push_back(fmt::format(",{},{},", column.spacing, csv_field(column.load)));
        }
        for (std::size_t row = 0; row < table_->rows.size(); ++row) {
            const std::string row_start = start + csv_field(table_->rows[row].material_class) + ',';
            for (std::size_t column = 0; column < columns.size(); ++column) {
                *text_ += row_start;
                section(table_->rows[row], table_->at(row, column));
                *text_ += columns[column];
                cell(row, column);
            }
        }
    }

private:
    void section(const RowHead& row, const Cell& cell) {
        *text_ += csv_field(words_->shows_text ? cell.text : row.section);
    }

    void cell(std::size_t row, std::size_t column) {
        const Cell& cell = table_->at(row, column);
        const auto& given = table_->rows[row].span ? table_->rows[row].span : table_->columns[column].span;
        clear_span(given, cell);
        *text_ += ',';
        if (table_->kind == TableKind::permissible_load && cell.value)
            number(*cell.value * words_->scale, words_->decimals);
        *text_ += ',';
        if (cell.value) append_utilisation(*text_, cell.utilisation);
        *text_ += ',';
        if (cell.governing) *text_ += definition_of(*cell.governing).name;
        *text_ += ',';
        if (cell.next) *text_ += definition_of(*cell.next).name;
        *text_ += ',';
        if (!cell.reason.empty()) *text_ += csv_field(cell.reason);
        for (const LimitOutcome& outcome : cell.limits) limit(outcome);
        *text_ += line_end;
    }

    /// The span printed in the cell, or the one that its row or column gives.
    void clear_span(const std::optional<double>& given, const Cell& cell) {
        constexpr double m = 0.001;
        if (table_->kind == TableKind::permissible_span) {
            if (cell.value) number(*cell.value * m, span_decimals_);
        } else if (given) {
            fmt::format_to(std::back_inserter(*text_), "{:.12g}", *given * m);
        }
    }

    void number(double value, int decimals) { fmt::format_to(std::back_inserter(*text_), "{:.{}f}", value, decimals); }

    void limit(const LimitOutcome& outcome) {
        *text_ += ',';
        if (outcome.kind == LimitOutcome::Kind::spans) append_metres_down(*text_, outcome.clear_span);
        if (outcome.kind == LimitOutcome::Kind::fails_at_once) *text_ += "0.000";
    }

    const TableResult* table_;
    const KindWords* words_;
    std::string* text_;
    int span_decimals_;
};

} // namespace

std::string csv_field(std::string_view text) {
    std::string field(text);
    const bool like_formula =
        !field.empty() && std::string_view("=+-@\t\r").find(field.front()) != std::string_view::npos;
    if (like_formula) field.insert(0, 1, '\'');
    if (field.find_first_of(",\"\r\n") == std::string::npos) return field;
    std::string quoted = "\"";
    for (const char c : field) {
        if (c == '"') quoted += '"';
        quoted += c;
    }
    return quoted + '"';
}

std::string issue_csv(const Issue& issue) {
    std::string text = header();
    for (const TableResult& table : issue.tables) TableLines(issue, table, text).write();
    return text;
}

} // namespace spanledger
