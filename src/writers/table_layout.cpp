// SPDX-License-Identifier: MIT
#include "table_layout.hpp"

#include "sheet_pen.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <numeric>

namespace spanledger {
namespace {

/// Wider sheets would shrink below legible print when fitted to a page.
constexpr double widest_sheet = 1080.0;
constexpr double least_cell_width = 46.0;
constexpr Font cell_font{10.0, false};
constexpr Font head_font{9.0, true};

double cell_width(const TableResult& table, const SearchRange& search) {
    const KindWords& kind = words_of(table.kind);
    double widest = text_width("0000 mm", head_font);
    double greatest = 0.0;
    for (const Cell& cell : table.cells) {
        if (kind.shows_text && cell.value) widest = std::max(widest, text_width(cell.text + " M", cell_font));
        if (cell.value) greatest = std::max(greatest, *cell.value * kind.scale);
    }
    if (!kind.shows_text) {
        const std::string longest = fmt::format("{:.{}f} M", greatest, decimals_of(kind, search));
        widest = std::max(widest, text_width(longest, cell_font));
    }
    return std::max(least_cell_width, widest + cell_padding);
}

double first_head_width(const TableResult& table) {
    double widest = text_width("Spacing", head_font);
    for (const RowHead& row : table.rows) widest = std::max(widest, text_width(row.material_class, cell_font));
    return widest + cell_padding;
}

double second_head_width(const TableResult& table) {
    double widest = text_width(second_head(table), head_font);
    for (const RowHead& row : table.rows) widest = std::max(widest, text_width(row.section, cell_font));
    return widest + cell_padding;
}

std::vector<LoadGroup> groups_of(const TableResult& table, std::size_t first, std::size_t last) {
    std::vector<LoadGroup> groups;
    for (std::size_t column = first; column < last; ++column) {
        const std::string& load = table.columns[column].load;
        if (groups.empty() || groups.back().load != load) groups.push_back({load, column, column});
        groups.back().last = column + 1;
    }
    return groups;
}

} // namespace

std::vector<TablePart> parts_of(const TableResult& table, std::size_t number, const SearchRange& search) {
    const double room = widest_sheet - first_head_width(table) - second_head_width(table);
    const auto most = std::max<std::size_t>(1, static_cast<std::size_t>(room / cell_width(table, search)));
    std::vector<TablePart> parts;
    TablePart part{.table = &table, .number = number};
    for (const LoadGroup& group : groups_of(table, 0, table.columns.size())) {
        const bool fits_with_others = group.last - part.first <= most;
        if (!fits_with_others && part.last > part.first) {
            parts.push_back(part);
            part.first = part.last;
        }
        while (group.last - part.first > most) {
            part.last = part.first + most;
            parts.push_back(part);
            part.first = part.last;
        }
        part.last = group.last;
    }
    parts.push_back(part);
    for (std::size_t i = 0; i < parts.size(); ++i) {
        parts[i].part = i + 1;
        parts[i].parts = parts.size();
    }
    return parts;
}

TableLayout layout_of(const TablePart& part, const SearchRange& search) {
    TableLayout layout;
    layout.groups = groups_of(*part.table, part.first, part.last);
    layout.cell_columns = part.last - part.first;
    layout.widths = {first_head_width(*part.table), second_head_width(*part.table)};
    const double width = cell_width(*part.table, search);
    for (const LoadGroup& group : layout.groups) {
        const auto columns = static_cast<double>(group.last - group.first);
        // A load class's name has two lines over its columns; longer ones take more.
        constexpr double widest_cell = 90.0;
        const double name = (text_width(group.load, head_font) / 2.0 + 3.0 * cell_padding) / columns;
        layout.widths.insert(layout.widths.end(), group.last - group.first, std::clamp(name, width, std::max(width, widest_cell)));
    }
    double total = std::accumulate(layout.widths.begin(), layout.widths.end(), 0.0);
    for (; total + least_cell_width <= page_width; total += least_cell_width) layout.widths.push_back(least_cell_width);
    return layout;
}

std::vector<std::string> reasons_without_value(const TableResult& table) {
    std::vector<std::string> reasons;
    for (const Cell& cell : table.cells) {
        if (cell.value || std::find(reasons.begin(), reasons.end(), cell.reason) != reasons.end()) continue;
        reasons.push_back(cell.reason);
    }
    return reasons;
}

bool sections_are_sizes(const TableResult& table) {
    return std::all_of(table.rows.begin(), table.rows.end(), [](const RowHead& row) {
        return !row.section.empty() && row.section.front() >= '0' && row.section.front() <= '9';
    });
}

std::string second_head(const TableResult& table) {
    const bool over_spans = !table.rows.empty() && table.rows.front().span.has_value();
    if (over_spans) return "Clear span, m";
    return sections_are_sizes(table) ? "Section, mm" : "Section";
}

std::vector<std::uint32_t> legend_slots(const std::vector<double>& widths, double room) {
    std::vector<std::uint32_t> slots;
    std::size_t column = 0;
    while (column < widths.size()) {
        double found = 0.0;
        std::size_t end = column + 1;
        while (end < widths.size() && found < room) found += widths[end++];
        if (found < room && !slots.empty()) break;
        slots.push_back(static_cast<std::uint32_t>(column));
        column = end;
    }
    return slots;
}

} // namespace spanledger
