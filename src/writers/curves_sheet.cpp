// SPDX-License-Identifier: MIT
#include "issue_sheets.hpp"
#include "sheet_pen.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>

namespace spanledger {
namespace {

constexpr double chart_height = 290.0;
constexpr double chart_row_height = 14.5;
constexpr double column_width = 62.0;
constexpr double line_height = 12.5;

constexpr double metres = 0.001;       // mm to m
constexpr double kilonewtons = 1000.0; // N/mm2 to kN/m2

/// Lines that no load changes stand upright: two points of their own, below the others.
std::size_t upright_lines(const LimitCurves& curves) {
    return static_cast<std::size_t>(
        std::count_if(curves.lines.begin(), curves.lines.end(), [](const auto& line) { return line.upright_at; }));
}

class CurvesSheet {
public:
    CurvesSheet(xlsx::Book& book, xlsx::Sheet& sheet, const LimitCurves& curves)
        : curves_(&curves), sheet_(&sheet),
          pen_(book, sheet, std::vector<double>(std::max<std::size_t>(curves.lines.size() + 2, 12), column_width)) {}

    void write(const xlsx::PageSetUp& page) {
        pen_.heading(fmt::format("{}, {} mm spacing, load class {}", curves_->member, curves_->spacing, curves_->load),
                     sheet_title);
        pen_.paragraph(0,
                       "Permissible uniform variable load against clear span: what each limit leaves, and the least of "
                       "all. Where two lines cross, one limit takes over from the other. Upright lines end all spans "
                       "whatever the load. Loads above the top of the chart are left out.",
                       running_text, page_width);
        const std::uint32_t chart_row = pen_.next_row();
        for (double height = 0.0; height < chart_height; height += chart_row_height) pen_.gap(chart_row_height);
        values();
        sheet_->chart({chart_row, 0}, chart());
        xlsx::PageSetUp set_up = page;
        set_up.print_area = {{0, 0}, {pen_.next_row() - 1, last_column()}};
        set_up.one_page = true;
        sheet_->set_up(set_up);
    }

private:
    [[nodiscard]] std::uint32_t last_column() const { return static_cast<std::uint32_t>(pen_.widths().size() - 1); }

    void heads() {
        const xlsx::Style head{.size = 8.0,
                               .bold = true,
                               .align = xlsx::Align::right,
                               .wrapped = true,
                               .borders = {.bottom = xlsx::Line::strong}};
        std::vector<std::string> words{"clear span, m"};
        for (const auto& line : curves_->lines)
            words.push_back(std::string(definition_of(line.limit).name) + unit(line));
        words.emplace_back("least of all, kN/m2");
        words.resize(pen_.widths().size());
        pen_.row(words, head);
    }

    static std::string unit(const LimitCurves::Line& line) { return line.upright_at ? ", ends at" : ", kN/m2"; }

    void values() {
        heads();
        first_value_ = pen_.next_row();
        const xlsx::StyleId number = pen_.style({.size = 8.0,
                                                 .align = xlsx::Align::right,
                                                 .number_format = "0.00",
                                                 .borders = {.bottom = xlsx::Line::fine}});
        for (std::size_t i = 0; i < curves_->spans.size(); ++i) {
            sheet_->number(pen_.at(0), curves_->spans[i] * metres, number);
            for (std::size_t k = 0; k < curves_->lines.size(); ++k) load(k + 1, curves_->lines[k].loads[i], number);
            load(curves_->lines.size() + 1, curves_->envelope[i], number);
            pen_.end_row(line_height);
        }
        if (upright_lines(*curves_) > 0) uprights(number);
    }

    void load(std::size_t column, const std::optional<double>& value, xlsx::StyleId style) {
        // Rounded down to 0.01 kN/m2, as in a table.
        if (value)
            sheet_->number(pen_.at(static_cast<std::uint32_t>(column)),
                           std::floor(*value * kilonewtons * 100.0 + 1e-6) / 100.0, style);
    }

    /// Two rows: the span at which the line stands, at the foot and at the top of the chart.
    void uprights(xlsx::StyleId number) {
        first_upright_ = pen_.next_row();
        for (const double height : {0.0, curves_->greatest_load * kilonewtons}) {
            for (std::size_t k = 0; k < curves_->lines.size(); ++k) {
                const auto& at = curves_->lines[k].upright_at;
                if (at) sheet_->number(pen_.at(static_cast<std::uint32_t>(k + 1)), *at * metres, number);
            }
            sheet_->number(pen_.at(static_cast<std::uint32_t>(curves_->lines.size() + 1)), height, number);
            sheet_->text(pen_.at(0), "upright lines, m", pen_.style({.size = 8.0}));
            pen_.end_row(line_height);
        }
    }

    [[nodiscard]] xlsx::Area column_of_values(std::size_t column) const {
        const auto c = static_cast<std::uint32_t>(column);
        const auto last = first_value_ + static_cast<std::uint32_t>(curves_->spans.size()) - 1;
        return {{first_value_, c}, {last, c}};
    }

    [[nodiscard]] xlsx::Area upright_cells(std::size_t column) const {
        const auto c = static_cast<std::uint32_t>(column);
        return {{first_upright_, c}, {first_upright_ + 1, c}};
    }

    [[nodiscard]] xlsx::Chart chart() const {
        xlsx::Chart chart;
        chart.title = fmt::format("{} at {} mm: where each limit takes over", curves_->member, curves_->spacing);
        chart.horizontal = "clear span, m";
        chart.vertical = "permissible variable load, kN/m2";
        chart.width = page_width - 30.0;
        chart.height = chart_height - 10.0;
        chart.least_span = std::floor(curves_->spans.front() * metres * 2.0) / 2.0;
        chart.greatest_span = std::ceil(curves_->spans.back() * metres * 2.0) / 2.0;
        chart.greatest_value = std::ceil(curves_->greatest_load * kilonewtons);
        const std::size_t least = curves_->lines.size() + 1;
        for (std::size_t k = 0; k < curves_->lines.size(); ++k) {
            const LimitCurves::Line& line = curves_->lines[k];
            const LimitDefinition& definition = definition_of(line.limit);
            const std::string name = fmt::format("{}  {}", definition.letter, definition.name);
            if (line.upright_at) {
                chart.lines.push_back({name, upright_cells(k + 1), upright_cells(least), k});
            } else {
                chart.lines.push_back({name, column_of_values(0), column_of_values(k + 1), k});
            }
        }
        chart.lines.push_back({"least of all", column_of_values(0), column_of_values(least), 0, true});
        chart.description = description();
        return chart;
    }

    [[nodiscard]] std::string description() const {
        std::string limits;
        for (const auto& line : curves_->lines) {
            limits += (limits.empty() ? "" : ", ") + std::string(definition_of(line.limit).name);
        }
        return fmt::format(
            "Chart of the permissible uniform variable load in kN/m2 against the clear span in m for {} at "
            "{} mm spacing, load class {}; lines for {} and the least of all.",
            curves_->member, curves_->spacing, curves_->load, limits);
    }

    const LimitCurves* curves_;
    xlsx::Sheet* sheet_;
    SheetPen pen_;
    std::uint32_t first_value_ = 0;
    std::uint32_t first_upright_ = 0;
};

} // namespace

void write_curves(xlsx::Book& book, xlsx::Sheet& sheet, const Issue& issue, const LimitCurves& curves) {
    CurvesSheet(book, sheet, curves).write(page_set_up(issue.brief.practice));
}

} // namespace spanledger
