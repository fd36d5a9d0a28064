// SPDX-License-Identifier: MIT
#include "xlsx_state.hpp"

#include <array>

namespace spanledger::xlsx {
namespace {

constexpr double pixels_per_point = 96.0 / 72.0;

// Lines must be told apart in black and white: by marker first, by dash second, by darkness last.
constexpr std::array markers{LXW_CHART_MARKER_SQUARE, LXW_CHART_MARKER_DIAMOND,  LXW_CHART_MARKER_TRIANGLE,
                             LXW_CHART_MARKER_CIRCLE, LXW_CHART_MARKER_X,        LXW_CHART_MARKER_PLUS,
                             LXW_CHART_MARKER_STAR,   LXW_CHART_MARKER_LONG_DASH};
constexpr std::array dashes{LXW_CHART_LINE_DASH_SOLID, LXW_CHART_LINE_DASH_DASH, LXW_CHART_LINE_DASH_ROUND_DOT,
                            LXW_CHART_LINE_DASH_DASH_DOT, LXW_CHART_LINE_DASH_LONG_DASH};
constexpr std::array<std::uint32_t, 4> inks{0x1F4E79, 0x7B3F00, 0x2E5E2E, 0x5B2C6F};

constexpr lxw_row_t row_of(At at) {
    return at.row;
}
constexpr lxw_col_t column_of(At at) {
    return static_cast<lxw_col_t>(at.column);
}

void set_cells(lxw_chart_series* series, const std::string& sheet, const ChartLine& line) {
    chart_series_set_categories(series, sheet.c_str(), row_of(line.spans.first), column_of(line.spans.first),
                                row_of(line.spans.last), column_of(line.spans.last));
    chart_series_set_values(series, sheet.c_str(), row_of(line.values.first), column_of(line.values.first),
                            row_of(line.values.last), column_of(line.values.last));
    chart_series_set_name(series, line.name.c_str());
}

void set_look(lxw_chart_series* series, const ChartLine& line) {
    constexpr float thick = 3.0F;
    constexpr float usual = 1.25F;
    lxw_chart_line drawn{};
    drawn.color = line.is_envelope ? lxw_color_t{LXW_COLOR_BLACK} : inks[line.look % inks.size()];
    drawn.width = line.is_envelope ? thick : usual;
    drawn.dash_type =
        static_cast<std::uint8_t>(line.is_envelope ? LXW_CHART_LINE_DASH_SOLID : dashes[line.look % dashes.size()]);
    chart_series_set_line(series, &drawn);
    chart_series_set_marker_type(
        series,
        static_cast<std::uint8_t>(line.is_envelope ? LXW_CHART_MARKER_NONE : markers[line.look % markers.size()]));
    if (line.is_envelope) return;
    constexpr std::uint8_t marker_size = 6;
    chart_series_set_marker_size(series, marker_size);
    lxw_chart_line edge{};
    edge.color = drawn.color;
    chart_series_set_marker_line(series, &edge);
    lxw_chart_fill inside{};
    inside.color = line.look % 2 == 0 ? drawn.color : lxw_color_t{LXW_COLOR_WHITE};
    chart_series_set_marker_fill(series, &inside);
}

void set_axes(lxw_chart* chart, const Chart& words) {
    chart_axis_set_name(chart->x_axis, words.horizontal.c_str());
    chart_axis_set_name(chart->y_axis, words.vertical.c_str());
    chart_axis_set_min(chart->x_axis, words.least_span);
    chart_axis_set_max(chart->x_axis, words.greatest_span);
    chart_axis_set_min(chart->y_axis, 0.0);
    chart_axis_set_max(chart->y_axis, words.greatest_value);
    chart_axis_set_num_format(chart->x_axis, "0.0");
    chart_axis_set_num_format(chart->y_axis, "0.0");
    lxw_chart_line grid{};
    grid.color = 0xD0D0D0;
    constexpr float hairline = 0.5F;
    grid.width = hairline;
    for (lxw_chart_axis* axis : {chart->x_axis, chart->y_axis}) {
        chart_axis_major_gridlines_set_visible(axis, LXW_TRUE);
        chart_axis_major_gridlines_set_line(axis, &grid);
    }
}

} // namespace

void Sheet::chart(At at, const Chart& words) {
    lxw_chart* chart = workbook_add_chart(book_->workbook, LXW_CHART_SCATTER_STRAIGHT_WITH_MARKERS);
    if (chart == nullptr) return book_->report("a chart of the sheet " + name_ + " could not be added");
    for (const ChartLine& line : words.lines) {
        lxw_chart_series* series = chart_add_series(chart, nullptr, nullptr);
        if (series == nullptr) return book_->report("a line of the chart of " + name_ + " could not be added");
        set_cells(series, name_, line);
        set_look(series, line);
    }
    chart_title_set_name(chart, words.title.c_str());
    lxw_chart_font title_font{};
    title_font.size = 11;
    title_font.bold = LXW_TRUE;
    chart_title_set_name_font(chart, &title_font);
    chart_legend_set_position(chart, LXW_CHART_LEGEND_RIGHT);
    chart_show_blanks_as(chart, LXW_CHART_BLANKS_AS_GAP);
    set_axes(chart, words);
    // The library takes 480 by 288 pixels for a chart and scales it.
    lxw_chart_options options{};
    options.x_scale = words.width * pixels_per_point / 480.0;
    options.y_scale = words.height * pixels_per_point / 288.0;
    options.object_position = LXW_OBJECT_MOVE_DONT_SIZE;
    std::string description = words.description; // the library wants it writable, and copies it
    options.description = description.data();
    book_->check(
        worksheet_insert_chart_opt(static_cast<lxw_worksheet*>(handle_), row_of(at), column_of(at), chart, &options),
        "a chart");
}

} // namespace spanledger::xlsx
