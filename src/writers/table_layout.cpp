// SPDX-License-Identifier: MIT
#include "table_layout.hpp"

#include "sheet_pen.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <numeric>

namespace spanledger {
namespace {

/// Wider sheets would shrink below legible print when fitted to a page.
constexpr double widest_sheet = 1110.0;
constexpr double least_cell_width = 46.0;
constexpr double parting_width = 6.0;
constexpr Font cell_font{10.0, false};
constexpr Font head_font{9.0, true};

/// Gathers the facts in one pass: tables may be larger than any cache.
class FactGatherer {
public:
    explicit FactGatherer(const TableResult& table) : kind_(&words_of(table.kind)) {
        for (const LimitNote& note : table.limits) {
            if (note.status == LimitStatus::checked) shown_[index_of(note.limit)] = true;
        }
        for (const Cell& cell : table.cells) {
            if (cell.value) {
                add_value(cell);
            } else if (std::find(facts_.reasons.begin(), facts_.reasons.end(), cell.reason) == facts_.reasons.end()) {
                facts_.reasons.push_back(cell.reason);
            }
        }
    }

    TableFacts facts(const SearchRange& search) {
        double widest = std::max(text_width("0000 mm", head_font), widest_text_);
        if (!kind_->shows_text) {
            const std::string longest = fmt::format("{:.{}f} M", greatest_ * kind_->scale, decimals_of(*kind_, search));
            widest = std::max(widest, text_width(longest, cell_font));
        }
        facts_.cell_width = std::max(least_cell_width, widest + cell_padding);
        for (const LimitDefinition& definition : limit_definitions) {
            if (shown_[index_of(definition.limit)]) facts_.limits.push_back(definition.limit);
        }
        return std::move(facts_);
    }

private:
    void add_value(const Cell& cell) {
        if (kind_->shows_text) widest_text_ = std::max(widest_text_, text_width(cell.text + " M", cell_font));
        greatest_ = std::max(greatest_, *cell.value);
        if (cell.governing) shown_[index_of(*cell.governing)] = true;
    }

    const KindWords* kind_;
    TableFacts facts_;
    std::array<bool, limit_count> shown_{};
    double widest_text_ = 0.0;
    double greatest_ = 0.0;
};

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

/// Width of each cell under a load class: its name has two lines over its columns; longer ones take more.
double width_of_cells(const LoadGroup& group, const TableFacts& facts) {
    constexpr double widest_cell = 90.0;
    const auto columns = static_cast<double>(group.last - group.first);
    const double name = (text_width(group.load, head_font) / 2.0 + 3.0 * cell_padding) / columns;
    return std::clamp(name, facts.cell_width, std::max(facts.cell_width, widest_cell));
}

} // namespace

TableFacts facts_of(const TableResult& table, const SearchRange& search) {
    return FactGatherer(table).facts(search);
}

std::vector<TablePart> parts_of(const TableResult& table, std::size_t number, const SearchRange& search) {
    const auto facts = std::make_shared<const TableFacts>(facts_of(table, search));
    const double room = widest_sheet - first_head_width(table) - second_head_width(table);
    std::vector<TablePart> parts;
    TablePart part{.table = &table, .facts = facts, .number = number};
    double taken = 0.0;
    const auto end_part = [&] {
        if (part.last == part.first) return;
        parts.push_back(part);
        part.first = part.last;
        taken = 0.0;
    };
    for (const LoadGroup& group : groups_of(table, 0, table.columns.size())) {
        const double width = width_of_cells(group, *facts);
        const auto columns = static_cast<double>(group.last - group.first);
        if (taken + parting_width + columns * width > room) end_part();
        for (std::size_t column = group.first; column < group.last; ++column) {
            if (taken + parting_width + width > room) end_part();
            part.last = column + 1;
            taken += width;
        }
        taken += parting_width;
    }
    if (parts.empty() || part.last > part.first) parts.push_back(part);
    for (std::size_t i = 0; i < parts.size(); ++i) {
        parts[i].part = i + 1;
        parts[i].parts = parts.size();
    }
    return parts;
}

TableLayout layout_of(const TablePart& part) {
    TableLayout layout;
    layout.groups = groups_of(*part.table, part.first, part.last);
    layout.widths = {first_head_width(*part.table), second_head_width(*part.table)};
    for (const LoadGroup& group : layout.groups) {
        layout.widths.push_back(parting_width);
        for (std::size_t column = group.first; column < group.last; ++column) {
            layout.cell_columns.push_back(static_cast<std::uint32_t>(layout.widths.size()));
            layout.widths.push_back(width_of_cells(group, *part.facts));
        }
    }
    double total = std::accumulate(layout.widths.begin(), layout.widths.end(), 0.0);
    for (; total + least_cell_width <= page_width; total += least_cell_width) layout.widths.push_back(least_cell_width);
    return layout;
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
        if (widths[column] <= parting_width) {
            ++column;
            continue;
        }
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
