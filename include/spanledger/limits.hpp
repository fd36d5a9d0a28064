// SPDX-License-Identifier: MIT
#pragma once

#include <array>
#include <cstddef>
#include <cstdint>
#include <string_view>

namespace spanledger {

/// Everything that can govern a joist, in the order that breaks a tie.
enum class Limit : std::uint8_t {
    bending,
    shear,
    bending_with_shear,
    bearing,
    lateral_buckling,
    variable_deflection,
    instantaneous_deflection,
    final_deflection,
    frequency,
    unit_load_deflection,
    velocity_response,
    stock_length,
};

/// What writers show of a limit.
struct LimitDefinition {
    Limit limit;
    std::string_view name;  ///< as in machine-readable results
    char letter;            ///< shown in a table cell
    std::uint32_t fill;     ///< light cell fill, 0xRRGGBB, grey luminance at least 0.7
    std::string_view about; ///< one line for a legend
};

inline constexpr std::array limit_definitions{
    LimitDefinition{Limit::bending, "bending", 'M', 0xF9DCC4, "bending strength"},
    LimitDefinition{Limit::shear, "shear", 'V', 0xFBE8A6, "shear strength"},
    LimitDefinition{Limit::bending_with_shear, "bending with shear", 'C', 0xF3E9D2,
                    "bending strength reduced by shear"},
    LimitDefinition{Limit::bearing, "bearing", 'R', 0xE3D5F1, "bearing on the support"},
    LimitDefinition{Limit::lateral_buckling, "lateral buckling", 'B', 0xF7D1DE, "lateral torsional buckling"},
    LimitDefinition{Limit::variable_deflection, "variable deflection", 'Q', 0xD6EEF5,
                    "deflection under the variable action"},
    LimitDefinition{Limit::instantaneous_deflection, "instantaneous deflection", 'I', 0xD3E4F8,
                    "instantaneous deflection"},
    LimitDefinition{Limit::final_deflection, "final deflection", 'F', 0xD5EFDD, "final deflection, creep included"},
    LimitDefinition{Limit::frequency, "frequency", 'H', 0xE6F2C8, "first natural frequency"},
    LimitDefinition{Limit::unit_load_deflection, "unit-load deflection", 'U', 0xCFEFEA, "deflection under 1 kN"},
    LimitDefinition{Limit::velocity_response, "velocity response", 'P', 0xEDE3DA, "unit impulse velocity response"},
    LimitDefinition{Limit::stock_length, "stock length", 'S', 0xE4E4E4, "longest stock length"},
};

inline constexpr std::size_t limit_count = limit_definitions.size();

[[nodiscard]] constexpr std::size_t index_of(Limit limit) noexcept {
    return static_cast<std::size_t>(limit);
}

[[nodiscard]] constexpr const LimitDefinition& definition_of(Limit limit) noexcept {
    return limit_definitions[index_of(limit)];
}

/// Shown where no limit governs: no span, or none reached.
inline constexpr std::string_view no_limit_mark = "–";

} // namespace spanledger
