// SPDX-License-Identifier: MIT
#pragma once

#include "issue_sheets.hpp"
#include "table_kinds.hpp"

#include <cstdint>
#include <string>
#include <vector>

namespace spanledger {

/// Columns of a table that share a load class, on one sheet.
struct LoadGroup {
    std::string load;
    std::size_t first = 0; ///< column of the table
    std::size_t last = 0;  ///< one beyond
};

/// Columns of a table's sheet: two of row heads, then the cells of each load class behind a narrow empty one that parts
/// it from what stands before, then empty ones up to the page's width.
struct TableLayout {
    std::vector<double> widths; ///< points
    std::vector<LoadGroup> groups;
    std::vector<std::uint32_t> cell_columns; ///< column of the sheet, per column of the part
};

inline constexpr std::uint32_t head_columns = 2;

[[nodiscard]] TableLayout layout_of(const TablePart& part);

/// Words over the second column of row heads, with the unit.
[[nodiscard]] std::string second_head(const TableResult& table);

/// The sections are named by sizes in mm, not by designations.
[[nodiscard]] bool sections_are_sizes(const TableResult& table);

/// Columns at which the entries of a legend begin, when each needs a column for the mark and then this much room.
[[nodiscard]] std::vector<std::uint32_t> legend_slots(const std::vector<double>& widths, double room);

} // namespace spanledger
