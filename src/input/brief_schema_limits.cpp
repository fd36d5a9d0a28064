// SPDX-License-Identifier: MIT
#include "spanledger/input/brief_schema.hpp"

#include <array>

namespace spanledger {

namespace {

using enum ValueKind;

constexpr Measure millimetres{Dimension::length, "mm"};

constexpr std::array limits{
    KeyDefinition{.name = "variable_deflection",
                  .kind = table,
                  .table = "limits.deflection",
                  .meaning = "deflection under the variable action alone, w_Q",
                  .clause = "EN 1995-1-1 7.2"},
    KeyDefinition{.name = "instantaneous_deflection",
                  .kind = table,
                  .table = "limits.deflection",
                  .meaning = "deflection under permanent and variable action without creep, w_inst",
                  .clause = "EN 1995-1-1 7.2"},
    KeyDefinition{.name = "final_deflection",
                  .kind = table,
                  .table = "limits.deflection",
                  .meaning = "deflection with creep, less camber, w_net,fin",
                  .clause = "EN 1995-1-1 (7.2)"},
    KeyDefinition{.name = "camber_mm",
                  .kind = number,
                  .measure = millimetres,
                  .hard = {0, 500},
                  .usual = {0, 50},
                  .meaning = "precamber; needs variable_deflection or instantaneous_deflection too",
                  .clause = "EN 1995-1-1 7.2"},
    KeyDefinition{.name = "frequency",
                  .kind = table,
                  .table = "limits.frequency",
                  .meaning = "least first natural frequency of steel joists; timber uses vibration"},
    KeyDefinition{.name = "unit_load_deflection_mm",
                  .kind = number,
                  .measure = millimetres,
                  .hard = {0.01, 50},
                  .usual = {0.5, 3},
                  .meaning = "steel: greatest deflection under 1 kN at mid-span; timber uses vibration"},
    KeyDefinition{.name = "vibration",
                  .kind = table,
                  .table = "limits.vibration",
                  .meaning = "vibration of residential timber floors; needs deck.stiffness_Nmm2_per_m",
                  .clause = "EN 1995-1-1 7.3.3"},
};

constexpr std::array deflection{
    KeyDefinition{.name = "ratio",
                  .kind = number,
                  .hard = {50, 2000},
                  .usual = {100, 1000},
                  .meaning = "n of L/n, L the effective span"},
    KeyDefinition{.name = "max_mm",
                  .kind = number,
                  .measure = millimetres,
                  .hard = {0.5, 200},
                  .usual = {3, 50},
                  .meaning = "greatest deflection as a length"},
};

constexpr std::array frequency{
    KeyDefinition{.name = "min_hz",
                  .kind = number,
                  .measure = {Dimension::frequency, "Hz"},
                  .fallback = "8",
                  .hard = {0.5, 100},
                  .usual = {3, 20},
                  .meaning = "least first natural frequency"},
    KeyDefinition{.name = "variable_share",
                  .kind = number,
                  .fallback = "0.1",
                  .hard = {0, 1},
                  .meaning = "share of the variable action that counts as mass"},
};

constexpr std::array vibration{
    KeyDefinition{.name = "rule",
                  .kind = choice,
                  .choices = "uk|recommended",
                  .required = true,
                  .meaning = "UK national annex, or the recommended values"},
    KeyDefinition{.name = "floor_width_m",
                  .kind = number,
                  .measure = {Dimension::length, "m"},
                  .hard = {0.3, 200},
                  .usual = {2, 15},
                  .required = true,
                  .meaning = "width B of the floor across the joists"},
    KeyDefinition{
        .name = "strutting", .kind = yes_no, .required = true, .meaning = "transverse strutting between the joists"},
    KeyDefinition{.name = "a_mm",
                  .kind = number,
                  .measure = millimetres,
                  .hard = {0.1, 10},
                  .usual = {0.5, 4},
                  .needed_with = "rule = \"recommended\"",
                  .meaning = "greatest deflection under 1 kN",
                  .clause = "EN 1995-1-1 (7.3)"},
    KeyDefinition{.name = "b",
                  .kind = number,
                  .hard = {10, 300},
                  .usual = {50, 150},
                  .needed_with = "rule = \"recommended\"",
                  .meaning = "base of the limit of the velocity response",
                  .clause = "EN 1995-1-1 (7.4)"},
    KeyDefinition{.name = "damping",
                  .kind = number,
                  .fallback_words = "the parameter of the set in force",
                  .hard = {0.001, 0.3},
                  .usual = {0.01, 0.02},
                  .meaning = "modal damping ratio"},
    KeyDefinition{.name = "kamp",
                  .kind = number,
                  .fallback_words = "the parameter of the set in force",
                  .hard = {1, 2},
                  .usual = {1.05, 1.45},
                  .meaning = "amplification by shear and joints; with rule = \"uk\" only",
                  .clause = "UK NA to EN 1995-1-1 NA.2.6.2"},
};

} // namespace

std::span<const KeyDefinition> limits_keys() noexcept {
    return limits;
}
std::span<const KeyDefinition> deflection_keys() noexcept {
    return deflection;
}
std::span<const KeyDefinition> frequency_keys() noexcept {
    return frequency;
}
std::span<const KeyDefinition> vibration_keys() noexcept {
    return vibration;
}

} // namespace spanledger
