// SPDX-License-Identifier: MIT
#include "spanledger/writers/xlsx_book.hpp"

#include "utf8_bytes.hpp"
#include "xlsx_header.hpp"
#include "xlsx_state.hpp"

#include <fmt/format.h>
#include <xlsxwriter.h>

#include <algorithm>
#include <cerrno>
#include <charconv>
#include <chrono>
#include <cmath>
#include <cstdio>
#include <ctime>
#include <new>
#include <system_error>
#include <utility>

#include <fcntl.h>
#include <unistd.h>

namespace spanledger::xlsx {

namespace {

constexpr const char* font_name = "Arial";
constexpr double text_size = 9.0;
constexpr std::uint8_t a4 = 9;

/// Seconds since 1970 of a day at midnight UTC; of 1 January 1980, where zip archives begin, if the text is no later
/// day.
std::time_t created_at(const std::string& date) {
    using namespace std::chrono;
    constexpr sys_days earliest = year{1980} / January / 1;
    int y = 0;
    unsigned m = 0;
    unsigned d = 0;
    const char* end = date.data() + date.size();
    const auto year_end = std::from_chars(date.data(), end, y).ptr;
    const auto month_end = year_end < end ? std::from_chars(year_end + 1, end, m).ptr : end;
    if (month_end < end) std::from_chars(month_end + 1, end, d);
    const year_month_day day{year{y}, month{m}, std::chrono::day{d}};
    const sys_days chosen = day.ok() ? std::max(sys_days{day}, earliest) : earliest;
    return static_cast<std::time_t>(duration_cast<seconds>(chosen.time_since_epoch()).count());
}

/// The beginning of a text, whole characters only.
std::string shortened(const std::string& text, std::size_t bytes) {
    if (text.size() <= bytes) return text;
    std::size_t end = bytes;
    while (end > 0 && continues_character(text[end])) --end;
    return text.substr(0, end);
}

struct LineLook {
    std::uint8_t border;
    lxw_color_t colour;
};

LineLook look_of(Line line) {
    switch (line) {
    case Line::fine: return {LXW_BORDER_THIN, 0xC8C8C8};
    case Line::thin: return {LXW_BORDER_THIN, 0x707070};
    case Line::strong: return {LXW_BORDER_MEDIUM, 0x303030};
    case Line::none: break;
    }
    return {LXW_BORDER_NONE, LXW_COLOR_BLACK};
}

void apply(const Borders& borders, lxw_format* format) {
    const LineLook left = look_of(borders.left);
    const LineLook right = look_of(borders.right);
    const LineLook top = look_of(borders.top);
    const LineLook bottom = look_of(borders.bottom);
    format_set_left(format, left.border);
    format_set_left_color(format, left.colour);
    format_set_right(format, right.border);
    format_set_right_color(format, right.colour);
    format_set_top(format, top.border);
    format_set_top_color(format, top.colour);
    format_set_bottom(format, bottom.border);
    format_set_bottom_color(format, bottom.colour);
}

void apply(const Style& style, lxw_format* format) {
    constexpr std::uint8_t alignments[] = {LXW_ALIGN_LEFT, LXW_ALIGN_CENTER, LXW_ALIGN_RIGHT};
    format_set_font_name(format, font_name);
    format_set_font_size(format, style.size);
    if (style.bold) format_set_bold(format);
    if (style.italic) format_set_italic(format);
    if (style.underlined) format_set_underline(format, LXW_UNDERLINE_SINGLE);
    format_set_align(format, alignments[static_cast<std::size_t>(style.align)]);
    format_set_align(format, style.at_top ? LXW_ALIGN_VERTICAL_TOP : LXW_ALIGN_VERTICAL_CENTER);
    if (style.wrapped) format_set_text_wrap(format);
    if (style.indent > 0) format_set_indent(format, style.indent);
    if (style.fill != no_fill) {
        format_set_pattern(format, LXW_PATTERN_SOLID);
        format_set_bg_color(format, LXW_COLOR_UNSET);
        format_set_fg_color(format, style.fill);
    }
    if (!style.number_format.empty()) format_set_num_format(format, style.number_format.c_str());
    apply(style.borders, format);
}

/// Quotes a sheet's name for a reference.
std::string reference_to(const std::string& sheet) {
    std::string quoted;
    for (const char c : sheet) quoted += c == '\'' ? std::string("''") : std::string(1, c);
    return fmt::format("internal:'{}'!A1", quoted);
}

struct CloseResult {
    lxw_error code = LXW_NO_ERROR;
    int system_error = 0;
};

/// The library has words of its own for standard error when closing fails; the user gets the program's instead.
CloseResult quietly_closed(lxw_workbook* workbook) {
    std::fflush(stderr);
    const int standard_error = ::dup(STDERR_FILENO);
    const int nowhere = ::open("/dev/null", O_WRONLY | O_CLOEXEC);
    if (standard_error >= 0 && nowhere >= 0) ::dup2(nowhere, STDERR_FILENO);
    errno = 0;
    CloseResult result;
    result.code = workbook_close(workbook);
    result.system_error = errno;
    std::fflush(stderr);
    if (standard_error >= 0) ::dup2(standard_error, STDERR_FILENO);
    if (standard_error >= 0) ::close(standard_error);
    if (nowhere >= 0) ::close(nowhere);
    return result;
}

lxw_worksheet* worksheet(void* handle) {
    return static_cast<lxw_worksheet*>(handle);
}
lxw_row_t row_of(At at) {
    return at.row;
}
lxw_col_t column_of(At at) {
    return static_cast<lxw_col_t>(at.column);
}

} // namespace

void Sheet::text(At at, const std::string& words, StyleId style) {
    book_->check(
        worksheet_write_string(worksheet(handle_), row_of(at), column_of(at), words.c_str(), book_->formats[style]),
        "a text");
}

void Sheet::number(At at, double value, StyleId style) {
    if (!std::isfinite(value)) return book_->report("a number of the sheet " + name_ + " is not finite");
    const double plain = value == 0.0 ? 0.0 : value; // no minus before a zero
    book_->check(worksheet_write_number(worksheet(handle_), row_of(at), column_of(at), plain, book_->formats[style]),
                 "a number");
}

void Sheet::blank(At at, StyleId style) {
    book_->check(worksheet_write_blank(worksheet(handle_), row_of(at), column_of(at), book_->formats[style]),
                 "an empty cell");
}

void Sheet::link(At at, const std::string& sheet, StyleId style) {
    book_->check(worksheet_write_url(worksheet(handle_), row_of(at), column_of(at), reference_to(sheet).c_str(),
                                     book_->formats[style]),
                 "a link");
    text(at, sheet, style);
}

void Sheet::column_width(std::uint32_t column, double points) {
    constexpr double pixels_per_point = 96.0 / 72.0;
    const auto at = static_cast<lxw_col_t>(column);
    book_->check(worksheet_set_column_pixels(worksheet(handle_), at, at,
                                             static_cast<std::uint32_t>(std::ceil(points * pixels_per_point)), nullptr),
                 "a column's width");
}

void Sheet::row_height(std::uint32_t row, double points) {
    book_->check(worksheet_set_row(worksheet(handle_), row, points, nullptr), "a row's height");
}

void Sheet::set_up(const PageSetUp& page) {
    lxw_worksheet* sheet = worksheet(handle_);
    worksheet_set_landscape(sheet);
    worksheet_set_paper(sheet, a4);
    worksheet_fit_to_pages(sheet, 1, page.one_page ? 1 : 0);
    worksheet_set_margins(sheet, 0.45, 0.45, 0.65, 0.6); // inches: left, right, top, bottom
    worksheet_gridlines(sheet, LXW_HIDE_ALL_GRIDLINES);
    worksheet_freeze_panes(sheet, page.frozen.row, column_of(page.frozen));
    lxw_header_footer_options margin = {};
    margin.margin = 0.3;
    book_->check(worksheet_set_header_opt(sheet, header_text(page.header, font_name).c_str(), &margin), "the header");
    book_->check(worksheet_set_footer_opt(sheet, header_text(page.footer, font_name).c_str(), &margin), "the footer");
    book_->check(worksheet_repeat_rows(sheet, page.first_repeated_row, page.last_repeated_row), "the repeated rows");
    book_->check(worksheet_print_area(sheet, page.print_area.first.row, column_of(page.print_area.first),
                                      page.print_area.last.row, column_of(page.print_area.last)),
                 "the print area");
    // Values such as "1.0" are words here: no warning triangles beside them.
    book_->check(worksheet_ignore_errors(sheet, LXW_IGNORE_NUMBER_STORED_AS_TEXT, "A1:XFD1048576"), "the marks");
}

Book::Book(const std::string& file, const Properties& properties) : state_(std::make_unique<BookState>()) {
    state_->file = file;
    state_->folder = folder_of(file);
    lxw_workbook_options options = {};
    options.tmpdir = state_->folder.data();
    options.use_zip64 = LXW_FALSE;
    state_->workbook = workbook_new_opt(file.c_str(), &options);
    if (state_->workbook == nullptr) throw std::bad_alloc(); // its only cause
    // The first format is the workbook's own: column widths count in its digits.
    lxw_format* own = STAILQ_FIRST(state_->workbook->formats);
    format_set_font_name(own, font_name);
    format_set_font_size(own, text_size);
    Properties words = properties;
    lxw_doc_properties document = {};
    document.title = words.title.data();
    document.subject = words.subject.data();
    document.author = words.author.data();
    document.company = words.company.data();
    document.comments = words.comments.data();
    document.created = created_at(words.date);
    state_->check(workbook_set_properties(state_->workbook, &document), "the properties");
    for (const auto& [name, value] : words.custom) property(name, value);
}

Book::~Book() = default;

StyleId Book::style(const Style& style) {
    const auto known = std::find(state_->styles.begin(), state_->styles.end(), style);
    if (known != state_->styles.end()) return static_cast<StyleId>(known - state_->styles.begin());
    lxw_format* format = workbook_add_format(state_->workbook);
    apply(style, format);
    state_->styles.push_back(style);
    state_->formats.push_back(format);
    return static_cast<StyleId>(state_->styles.size() - 1);
}

Sheet& Book::add_sheet(const std::string& name) {
    state_->check(workbook_validate_sheet_name(state_->workbook, name.c_str()), "the sheet name " + name);
    lxw_worksheet* sheet = workbook_add_worksheet(state_->workbook, name.c_str());
    if (sheet == nullptr) {
        state_->report("the sheet " + name + " could not be added");
        sheet = workbook_add_worksheet(state_->workbook, nullptr); // something to go on with; the book is not kept
    }
    state_->sheets.push_back(Sheet(*state_, sheet, name));
    return state_->sheets.back();
}

void Book::property(const std::string& name, const std::string& value) {
    constexpr std::size_t longest = 255;
    state_->check(
        workbook_set_custom_property_string(state_->workbook, name.c_str(), shortened(value, longest).c_str()),
        "the property " + name);
}

WriteResult Book::close() {
    if (state_->problem) return state_->problem;
    const CloseResult closed = quietly_closed(std::exchange(state_->workbook, nullptr));
    if (closed.code != LXW_NO_ERROR && closed.system_error != 0) {
        state_->report(std::generic_category().message(closed.system_error));
    }
    state_->check(closed.code, "the workbook");
    if (state_->problem) return state_->problem;
    return check_parts(state_->file);
}

} // namespace spanledger::xlsx
