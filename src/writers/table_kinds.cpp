// SPDX-License-Identifier: MIT
#include "table_kinds.hpp"

#include <fmt/format.h>

#include <array>
#include <cmath>

namespace spanledger {
namespace {

constexpr std::array kinds{
    KindWords{.kind = TableKind::permissible_span,
              .name = "permissible span",
              .heading = "Permissible clear span",
              .unit = "m",
              .record_unit = "mm",
              .scale = 0.001,
              .step_decides = true,
              .about = "the longest clear span at which every limit checked is met, {}",
              .no_value = "no span"},
    KindWords{.kind = TableKind::permissible_load,
              .name = "permissible load",
              .heading = "Permissible variable load",
              .unit = "kN/m2",
              .record_unit = "N/mm2",
              .scale = 1000.0,
              .about = "the greatest uniform variable load at the clear span of the column, rounded down; the other "
                       "actions of the load class stay as they are",
              .no_value = "no load"},
    KindWords{.kind = TableKind::utilisation,
              .name = "utilisation",
              .heading = "Utilisation",
              .unit = "",
              .record_unit = "-",
              .about =
                  "the largest utilisation of any limit at the clear span of the column, rounded up; a pure number",
              .no_value = "no value"},
    KindWords{.kind = TableKind::smallest_section,
              .name = "smallest section",
              .heading = "Smallest section",
              .unit = "",
              .record_unit = "-",
              .shows_text = true,
              .about = "the first section of the entry, by depth, that passes at the clear span of the row",
              .no_value = "no section"},
};

} // namespace

const KindWords& words_of(TableKind kind) noexcept {
    return kinds[static_cast<std::size_t>(kind)];
}

int decimals_of(const KindWords& words, const SearchRange& search) noexcept {
    return words.step_decides ? decimals_of_step(search.step) : words.decimals;
}

int decimals_of_step(double step) noexcept {
    constexpr int most = 6;
    constexpr double rounding = 1e-9;
    double steps_per_unit = step / 10.0; // in the second decimal of a metre
    for (int decimals = 2; decimals < most; ++decimals) {
        if (std::abs(steps_per_unit - std::round(steps_per_unit)) < rounding) return decimals;
        steps_per_unit *= 10.0;
    }
    return most;
}

std::string rounding_words(const SearchRange& search) {
    const char* how = search.rounding == Rounding::down ? "down" : "to the nearest";
    return fmt::format("rounded {}{} {} mm", how, search.rounding == Rounding::down ? " to" : "", search.step);
}

} // namespace spanledger
