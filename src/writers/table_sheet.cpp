// SPDX-License-Identifier: MIT
#include "issue_sheets.hpp"
#include "sheet_pen.hpp"
#include "table_layout.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <utility>

namespace spanledger {
namespace {

using xlsx::Line;

const xlsx::Style subtitle_style{.size = 9.0, .bold = true};
const xlsx::Style note_style{.size = 8.5};
const xlsx::Style head_style{.size = 9.0, .bold = true};
const xlsx::Style row_head_style{.size = 10.0, .borders = {.bottom = Line::fine}};

/// Points. A head taller than this repeats only its legend and column heads on later pages ...
constexpr double tallest_repeated_head = 240.0;
/// ... and one taller than this does not stay on the screen.
constexpr double tallest_frozen_head = 300.0;

/// The styles of a sheet's cells, found once: one per limit, and one for none.
class CellStyles {
public:
    CellStyles(SheetPen& pen, const std::string& number_format) {
        for (std::size_t i = 0; i <= limit_count; ++i) {
            const std::optional<Limit> limit = i < limit_count ? std::optional(static_cast<Limit>(i)) : std::nullopt;
            xlsx::Style style = cell_style(limit, number_format);
            style.borders.bottom = Line::fine;
            ids_[i] = pen.style(style);
        }
    }

    [[nodiscard]] xlsx::StyleId of(const std::optional<Limit>& governing) const noexcept {
        return ids_[governing ? index_of(*governing) : limit_count];
    }

private:
    std::array<xlsx::StyleId, limit_count + 1> ids_{};
};

class TableSheet {
public:
    TableSheet(xlsx::Book& book, xlsx::Sheet& sheet, const Issue& issue, const TablePart& part)
        : issue_(&issue), part_(&part), table_(part.table), kind_(&words_of(part.table->kind)),
          layout_(layout_of(part)), pen_(book, sheet, layout_.widths), reasons_(part.facts->reasons) {}

    void write() {
        titles();
        notes();
        const std::uint32_t repeated = pen_.next_row();
        legend();
        column_heads();
        const double head_height = pen_.height();
        const std::uint32_t first_row = pen_.next_row();
        rows();
        xlsx::PageSetUp page = page_set_up(issue_->brief.practice);
        page.print_area = {{0, 0}, {pen_.next_row() - 1, static_cast<std::uint32_t>(layout_.widths.size() - 1)}};
        page.first_repeated_row = head_height > tallest_repeated_head ? repeated : 0;
        page.last_repeated_row = first_row - 1;
        page.frozen = {head_height > tallest_frozen_head ? 0 : first_row, head_columns};
        pen_.sheet().set_up(page);
    }

private:
    void titles() {
        pen_.paragraph(0, fmt::format("Table {}  {}", part_->number, table_->name), sheet_title, pen_.width());
        std::string words = fmt::format("{}  |  {}", table_->members, table_->material);
        if (part_->parts > 1) words += fmt::format("  |  part {} of {}", part_->part, part_->parts);
        pen_.paragraph(0, words, subtitle_style, pen_.width());
    }

    void notes() {
        constexpr std::size_t most_in_lines = 6;
        const std::vector<std::string>& notes = table_->head_notes;
        if (notes.size() <= most_in_lines) {
            for (const std::string& note : notes) pen_.paragraph(0, note, note_style, pen_.width());
        } else {
            pen_.paragraph(0, fmt::format("{}", fmt::join(notes, "  ")), note_style, pen_.width());
        }
        pen_.gap(4.0);
    }

    void legend() {
        std::string words(kind_->heading);
        if (!kind_->unit.empty()) words += fmt::format(", in {}", kind_->unit);
        pen_.paragraph(0, words, group_heading, pen_.width());
        pen_.paragraph(0, fmt::format("A cell: {}. Its letter and fill name the limit that governs.", about()),
                       note_style, pen_.width());
        legend_entries();
        std::string without_value;
        for (std::size_t i = 0; i < reasons_.size(); ++i) {
            without_value += fmt::format("    {} {})  {}", no_limit_mark, i + 1, reasons_[i]);
        }
        if (!reasons_.empty()) {
            pen_.paragraph(0, fmt::format("Where there is {}:{}", kind_->no_value, without_value), note_style,
                           pen_.width());
        }
        pen_.gap(4.0);
    }

    [[nodiscard]] std::string about() const {
        return fmt::format(fmt::runtime(kind_->about), rounding_words(issue_->brief.search));
    }

    void legend_entries() {
        std::vector<std::pair<std::optional<Limit>, std::string>> entries;
        double room = 0.0;
        for (const Limit limit : part_->facts->limits) entries.emplace_back(limit, definition_of(limit).about);
        if (!kind_->shows_text) entries.emplace_back(std::nullopt, "beside a number: no limit reached");
        for (const auto& entry : entries) room = std::max(room, text_width(entry.second, font_of(note_style)));
        const auto slots = legend_slots(layout_.widths, room + 2.0 * cell_padding);
        for (std::size_t i = 0; i < entries.size(); ++i) {
            const std::uint32_t column = slots[i % slots.size()];
            legend_entry(column, entries[i].first, entries[i].second);
            if (i % slots.size() + 1 == slots.size() || i + 1 == entries.size()) pen_.end_row(13.5);
        }
    }

    void legend_entry(std::uint32_t column, const std::optional<Limit>& limit, const std::string& words) {
        xlsx::Style mark{.size = 9.0, .bold = true, .align = xlsx::Align::centre};
        if (limit) mark.fill = definition_of(*limit).fill;
        const std::string letter = limit ? std::string(1, definition_of(*limit).letter) : std::string(no_limit_mark);
        pen_.sheet().text(pen_.at(column), letter, pen_.style(mark));
        xlsx::Style beside = note_style;
        beside.indent = 1;
        pen_.sheet().text(pen_.at(column + 1), words, pen_.style(beside));
    }

    [[nodiscard]] std::uint32_t column_of(std::size_t table_column) const {
        return layout_.cell_columns[table_column - part_->first];
    }

    /// Blanks of a style under all row heads and cells: the empty columns that part groups stay as they are.
    void rule(const xlsx::Style& style) {
        const xlsx::StyleId id = pen_.style(style);
        for (std::uint32_t column = 0; column < head_columns; ++column) pen_.sheet().blank(pen_.at(column), id);
        for (const std::uint32_t column : layout_.cell_columns) pen_.sheet().blank(pen_.at(column), id);
    }

    void column_heads() {
        load_names();
        head_numbers(
            "Spacing, c/c", [](const ColumnHead& column) { return column.spacing; }, "0.##\" mm\"");
        if (!table_->columns.empty() && table_->columns.front().span) {
            head_numbers(
                "Clear span", [](const ColumnHead& column) { return *column.span / 1000.0; }, "0.00#\" m\"");
        }
        units();
    }

    void load_names() {
        std::vector<std::vector<std::string>> names;
        std::size_t most = 1;
        for (const LoadGroup& group : layout_.groups) {
            double width = 0.0;
            for (std::size_t c = group.first; c < group.last; ++c) width += layout_.widths[column_of(c)];
            names.push_back(text_lines(group.load, font_of(head_style), width - cell_padding));
            most = std::max(most, names.back().size());
        }
        for (std::size_t line = 0; line < most; ++line) load_name_line(names, line);
    }

    /// One line of all the names: it runs on over the empty cells of its own group.
    void load_name_line(const std::vector<std::vector<std::string>>& names, std::size_t line) {
        xlsx::Style style = head_style;
        style.borders.top = line == 0 ? Line::strong : Line::none;
        rule(style);
        const xlsx::StyleId id = pen_.style(style);
        if (line == 0) pen_.sheet().text(pen_.at(0), "Load class", id);
        for (std::size_t group = 0; group < names.size(); ++group) {
            if (line >= names[group].size()) continue;
            pen_.sheet().text(pen_.at(column_of(layout_.groups[group].first)), names[group][line], id);
        }
        pen_.end_row(13.0);
    }

    template <class Value> void head_numbers(const char* name, Value value, const char* format) {
        xlsx::Style style = head_style;
        pen_.sheet().text(pen_.at(0), name, pen_.style(style));
        style.align = xlsx::Align::centre;
        style.number_format = format;
        const xlsx::StyleId id = pen_.style(style);
        for (std::size_t c = part_->first; c < part_->last; ++c) {
            pen_.sheet().number(pen_.at(column_of(c)), value(table_->columns[c]), id);
        }
        pen_.end_row(13.0);
    }

    void units() {
        xlsx::Style style = head_style;
        style.borders.bottom = Line::strong;
        pen_.sheet().text(pen_.at(0), "Class", pen_.style(style));
        pen_.sheet().text(pen_.at(1), second_head(*table_), pen_.style(style));
        style.align = xlsx::Align::centre;
        style.bold = false;
        const xlsx::StyleId id = pen_.style(style);
        const std::string unit = kind_->shows_text     ? "section"
                                 : kind_->unit.empty() ? "ratio"
                                                       : std::string(kind_->unit);
        for (const std::uint32_t column : layout_.cell_columns) pen_.sheet().text(pen_.at(column), unit, id);
        pen_.end_row(13.0);
    }

    void rows() {
        const std::string format =
            kind_->shows_text ? "@" : number_format_of(decimals_of(*kind_, issue_->brief.search));
        const CellStyles styles(pen_, format);
        xlsx::Style without = cell_style(std::nullopt, format);
        without.number_format.clear();
        without.borders.bottom = Line::fine;
        const xlsx::StyleId without_value = pen_.style(without);
        const xlsx::StyleId head = pen_.style(row_head_style);
        for (std::size_t row = 0; row < table_->rows.size(); ++row) {
            row_heads(table_->rows[row], head);
            for (std::size_t c = part_->first; c < part_->last; ++c) {
                const Cell& cell = table_->at(row, c);
                if (cell.value) {
                    value(pen_.at(column_of(c)), cell, styles.of(cell.governing));
                } else {
                    pen_.sheet().text(pen_.at(column_of(c)), reason_mark(cell), without_value);
                }
            }
            pen_.end_row(15.0);
        }
        closing_line();
    }

    void closing_line() {
        xlsx::Style line;
        line.borders.top = Line::strong;
        rule(line);
        pen_.end_row(4.0);
    }

    void row_heads(const RowHead& row, xlsx::StyleId style) {
        pen_.sheet().text(pen_.at(0), row.material_class, style);
        if (row.span) {
            xlsx::Style span = row_head_style;
            span.number_format = "0.00#";
            pen_.sheet().number(pen_.at(1), *row.span / 1000.0, pen_.style(span));
        } else {
            pen_.sheet().text(pen_.at(1), row.section, style);
        }
    }

    void value(xlsx::At at, const Cell& cell, xlsx::StyleId style) {
        if (kind_->shows_text) {
            pen_.sheet().text(at, cell.text, style);
        } else {
            pen_.sheet().number(at, *cell.value * kind_->scale, style);
        }
    }

    [[nodiscard]] std::string reason_mark(const Cell& cell) const {
        const auto found = std::find(reasons_.begin(), reasons_.end(), cell.reason);
        return fmt::format("{} {})", no_limit_mark, found - reasons_.begin() + 1);
    }

    const Issue* issue_;
    const TablePart* part_;
    const TableResult* table_;
    const KindWords* kind_;
    TableLayout layout_;
    SheetPen pen_;
    const std::vector<std::string>& reasons_;
};

} // namespace

void write_table(xlsx::Book& book, xlsx::Sheet& sheet, const Issue& issue, const TablePart& part) {
    TableSheet(book, sheet, issue, part).write();
}

} // namespace spanledger
