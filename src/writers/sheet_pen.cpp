// SPDX-License-Identifier: MIT
#include "sheet_pen.hpp"

#include <algorithm>
#include <numeric>

namespace spanledger {
namespace {

/// A spreadsheet's row is at most 409 points high.
constexpr std::size_t most_lines_in_a_row = 30;

std::string joined(const std::vector<std::string>& lines, std::size_t first) {
    std::string text;
    const std::size_t last = std::min(lines.size(), first + most_lines_in_a_row);
    for (std::size_t i = first; i < last; ++i) {
        text += lines[i];
        if (i + 1 < last) text += ' ';
    }
    return text;
}

} // namespace

Font font_of(const xlsx::Style& style) {
    return {style.size, style.bold};
}

SheetPen::SheetPen(xlsx::Book& book, xlsx::Sheet& sheet, std::vector<double> widths)
    : book_(&book), sheet_(&sheet), widths_(std::move(widths)) {
    for (std::uint32_t column = 0; column < widths_.size(); ++column) sheet_->column_width(column, widths_[column]);
}

double SheetPen::width() const noexcept {
    return std::accumulate(widths_.begin(), widths_.end(), 0.0);
}

void SheetPen::end_row(double points) {
    sheet_->row_height(row_, points);
    height_ += points;
    ++row_;
}

void SheetPen::gap(double points) {
    end_row(points);
}

void SheetPen::row(const std::vector<std::string>& texts, const xlsx::Style& style) {
    std::vector<std::vector<std::string>> lines;
    std::size_t most = 1;
    for (std::size_t column = 0; column < texts.size(); ++column) {
        lines.push_back(text_lines(texts[column], font_of(style), widths_[column] - cell_padding));
        most = std::max(most, lines.back().size());
    }
    xlsx::Style wrapped = style;
    wrapped.wrapped = true;
    wrapped.at_top = true;
    const xlsx::StyleId id = book_->style(wrapped);
    for (std::size_t first = 0; first < most; first += most_lines_in_a_row) {
        for (std::uint32_t column = 0; column < texts.size(); ++column) {
            const bool all = lines[column].size() <= most_lines_in_a_row;
            const std::string text = all ? (first == 0 ? texts[column] : std::string()) : joined(lines[column], first);
            if (text.empty()) {
                sheet_->blank(at(column), id);
            } else {
                sheet_->text(at(column), text, id);
            }
        }
        end_row(row_height_of(std::min(most - first, most_lines_in_a_row), font_of(style)));
    }
}

void SheetPen::paragraph(std::uint32_t column, const std::string& text, const xlsx::Style& style, double width) {
    const xlsx::StyleId id = book_->style(style);
    for (const std::string& line : text_lines(text, font_of(style), width - cell_padding)) {
        if (!line.empty()) sheet_->text(at(column), line, id);
        end_row(row_height_of(1, font_of(style)) - 1.0);
    }
}

void SheetPen::heading(const std::string& text, const xlsx::Style& style) {
    xlsx::Style ruled = style;
    ruled.borders.bottom = xlsx::Line::thin;
    const xlsx::StyleId id = book_->style(ruled);
    const auto lines = text_lines(text, font_of(style), width() - cell_padding);
    for (std::size_t i = 0; i < lines.size(); ++i) {
        const bool last = i + 1 == lines.size();
        sheet_->text(at(0), lines[i], last ? id : book_->style(style));
        for (std::uint32_t column = 1; last && column < widths_.size(); ++column) sheet_->blank(at(column), id);
        end_row(row_height_of(1, font_of(style)));
    }
}

} // namespace spanledger
