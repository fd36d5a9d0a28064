// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/brief.hpp"

#include <string>
#include <string_view>

namespace spanledger {

/// How one kind of table is shown. A kind is one entry in table_kinds.cpp; nothing else in the writers asks for it.
struct KindWords {
    TableKind kind = TableKind::permissible_span;
    std::string_view name;        ///< as in the brief
    std::string_view heading;     ///< what a cell is, without its unit
    std::string_view unit;        ///< of the shown number; empty for a pure number
    std::string_view record_unit; ///< of Cell::value
    double scale = 1.0;           ///< shown number per Cell::value
    int decimals = 2;             ///< at least
    bool step_decides = false;    ///< as many decimals as the step of the spans needs
    bool shows_text = false;      ///< Cell::text is shown, not the number
    std::string_view about;       ///< a line for the legend; {} is how spans are rounded
    std::string_view no_value;    ///< short, as in "no span"
};

[[nodiscard]] const KindWords& words_of(TableKind kind) noexcept;

/// Decimals of the shown numbers of a table.
[[nodiscard]] int decimals_of(const KindWords& words, const SearchRange& search) noexcept;

/// Decimals that show every multiple of a step (mm) in metres exactly; at least 2.
[[nodiscard]] int decimals_of_step(double step) noexcept;

/// "rounded down to 10 mm"
[[nodiscard]] std::string rounding_words(const SearchRange& search);

} // namespace spanledger
