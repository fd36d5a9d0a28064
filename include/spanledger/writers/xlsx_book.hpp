// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/writers/safe_file.hpp"

#include <cstdint>
#include <memory>
#include <string>
#include <utility>
#include <vector>

// A workbook to be filled: the one door to the library that makes the file. Every return code is checked behind it; the
// first problem is kept and reported by close().

namespace spanledger::xlsx {

enum class Align : std::uint8_t { left, centre, right };
enum class Line : std::uint8_t { none, fine, thin, strong };

inline constexpr std::uint32_t no_fill = 0xFFFFFFFF;

struct Borders {
    Line left = Line::none;
    Line right = Line::none;
    Line top = Line::none;
    Line bottom = Line::none;
    bool operator==(const Borders&) const = default;
};

/// How a cell looks. Text is black throughout.
struct Style {
    double size = 9.0; ///< points
    bool bold = false;
    bool italic = false;
    bool underlined = false;
    Align align = Align::left;
    bool at_top = false; ///< vertically; otherwise centred
    bool wrapped = false;
    std::uint8_t indent = 0;
    std::uint32_t fill = no_fill; ///< 0xRRGGBB
    std::string number_format{};
    Borders borders{};
    bool operator==(const Style&) const = default;
};

using StyleId = std::uint16_t;

/// Counted from 0.
struct At {
    std::uint32_t row = 0;
    std::uint32_t column = 0;
};

struct Area {
    At first;
    At last;
};

/// Header and footer: left, centre and right part. "&[page]" and "&[pages]" stand for the page's number and their
/// count.
struct PageWords {
    std::string left;
    std::string centre;
    std::string right;
};

/// A4 landscape, fitted to the page's width.
struct PageSetUp {
    PageWords header;
    PageWords footer;
    Area print_area;
    std::uint32_t first_repeated_row = 0;
    std::uint32_t last_repeated_row = 0;
    At frozen;             ///< first cell that scrolls
    bool one_page = false; ///< fitted to one page's height too
};

struct Properties {
    std::string title;
    std::string subject;
    std::string author;
    std::string company;
    std::string comments;
    std::string date;                                        ///< yyyy-mm-dd; a fixed day in 1980 where it is none
    std::vector<std::pair<std::string, std::string>> custom; ///< name and value
};

/// One line of a chart: a row of points in the cells of its sheet, its look told apart by marker and dash.
struct ChartLine {
    std::string name;
    Area spans;               ///< cells along the horizontal axis
    Area values;              ///< cells along the vertical axis
    std::size_t look = 0;     ///< lines of different look differ in marker, dash and grey
    bool is_envelope = false; ///< drawn thick, without markers
};

/// A chart of lines over numbers on both axes.
struct Chart {
    std::string title;
    std::string horizontal; ///< axis titles, with units
    std::string vertical;
    std::string description; ///< what it shows, for who cannot see it
    double width = 0.0;      ///< points
    double height = 0.0;
    double least_span = 0.0;
    double greatest_span = 0.0;
    double greatest_value = 0.0;
    std::vector<ChartLine> lines;
};

struct BookState;

class Sheet {
public:
    /// What the text begins with does not matter: it is never taken for a formula.
    void text(At at, const std::string& words, StyleId style);
    /// A value that is not finite is a reported error.
    void number(At at, double value, StyleId style);
    void blank(At at, StyleId style);
    void link(At at, const std::string& sheet, StyleId style);

    void column_width(std::uint32_t column, double points);
    void row_height(std::uint32_t row, double points);
    void set_up(const PageSetUp& page);
    void chart(At at, const Chart& chart);

    [[nodiscard]] const std::string& name() const noexcept { return name_; }

private:
    friend class Book;
    Sheet(BookState& book, void* handle, std::string name) : book_(&book), handle_(handle), name_(std::move(name)) {}

    BookState* book_;
    void* handle_;
    std::string name_;
};

class Book {
public:
    /// `file` is written by close(). What the library keeps on disk meanwhile lies in the same folder, without a name.
    Book(const std::string& file, const Properties& properties);
    ~Book();
    Book(const Book&) = delete;
    Book& operator=(const Book&) = delete;

    /// The same style asked for twice is one style.
    [[nodiscard]] StyleId style(const Style& style);

    /// Names must be unique and allowed (sheet_names.hpp).
    [[nodiscard]] Sheet& add_sheet(const std::string& name);

    /// Custom document property, such as the fingerprint once it is known.
    void property(const std::string& name, const std::string& value);

    /// Writes the file and reads it back; the first problem of the whole book, if any.
    [[nodiscard]] WriteResult close();

private:
    std::unique_ptr<BookState> state_;
};

/// Reads every part of a workbook file and checks that it is whole: a disk that fills up while the parts are made
/// leaves shortened parts in a file that is otherwise well-formed.
[[nodiscard]] WriteResult check_parts(const std::string& file);

} // namespace spanledger::xlsx
