// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/writers/text_lines.hpp"
#include "spanledger/writers/xlsx_book.hpp"

#include <cstdint>
#include <string>
#include <vector>

namespace spanledger {

/// Writes a sheet from top to bottom, with rows high enough and lines short enough for their text: nothing is cut.
class SheetPen {
public:
    /// `widths` of the columns in points.
    SheetPen(xlsx::Book& book, xlsx::Sheet& sheet, std::vector<double> widths);

    /// One text per column, wrapped within its column. A text too long for one row goes on in the next.
    void row(const std::vector<std::string>& texts, const xlsx::Style& style);

    /// Running text from a column on, over the columns right of it (which stay empty), up to `width` points.
    void paragraph(std::uint32_t column, const std::string& text, const xlsx::Style& style, double width);

    /// A title over the whole width with a line below.
    void heading(const std::string& text, const xlsx::Style& style);

    /// An empty row of that height.
    void gap(double points);

    /// Sets the height of the present row and goes to the next.
    void end_row(double points);

    [[nodiscard]] xlsx::At at(std::uint32_t column) const noexcept { return {row_, column}; }
    [[nodiscard]] std::uint32_t next_row() const noexcept { return row_; }
    [[nodiscard]] double height() const noexcept { return height_; } ///< of all rows so far
    [[nodiscard]] double width() const noexcept;                     ///< of all columns
    [[nodiscard]] const std::vector<double>& widths() const noexcept { return widths_; }
    [[nodiscard]] xlsx::Sheet& sheet() noexcept { return *sheet_; }
    [[nodiscard]] xlsx::StyleId style(const xlsx::Style& style) { return book_->style(style); }

private:
    xlsx::Book* book_;
    xlsx::Sheet* sheet_;
    std::vector<double> widths_;
    std::uint32_t row_ = 0;
    double height_ = 0.0;
};

/// What a cell's text must keep from its borders, both sides together, in points.
inline constexpr double cell_padding = 7.0;

[[nodiscard]] Font font_of(const xlsx::Style& style);

} // namespace spanledger
