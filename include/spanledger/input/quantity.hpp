// SPDX-License-Identifier: MIT
#pragma once

#include <optional>
#include <string>
#include <string_view>

namespace spanledger {

/// What a quantity measures. Numbers inside are in N, mm, MPa, kg, s.
enum class Dimension {
    number,          ///< no unit
    length,          ///< mm
    area_load,       ///< N/mm2
    line_load,       ///< N/mm
    force,           ///< N
    stress,          ///< MPa
    density,         ///< kg/m3
    frequency,       ///< Hz
    plate_stiffness, ///< N mm2 per metre
};

[[nodiscard]] std::string_view dimension_name(Dimension dimension) noexcept;

/// A whole token that is a finite decimal number ("4.2", "1e3"); nan, inf, hex, trailing text and empty are refused.
[[nodiscard]] std::optional<double> read_number(std::string_view text);

struct QuantityError {
    std::string message; ///< what is wrong, naming both dimensions where the dimension is wrong
    std::string hint;    ///< what to type instead
};

struct QuantityResult {
    std::optional<double> value; ///< in the internal unit
    QuantityError error;         ///< meaningful where there is no value
};

/// Reads "4.2 m", "4200", "1.5 kN/m2". A bare number is in `bare_unit` (a unit of that dimension, e.g. "mm", "m",
/// "kN/m2"). Conversion is exact decimal scaling, done once, here.
[[nodiscard]] QuantityResult read_quantity(std::string_view text, Dimension dimension, std::string_view bare_unit);

/// Factor from `unit` to the internal unit of its dimension; empty where the unit is unknown.
[[nodiscard]] std::optional<double> unit_factor(std::string_view unit, Dimension dimension);

} // namespace spanledger
