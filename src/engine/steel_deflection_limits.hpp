// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/inputs.hpp"

#include <optional>

namespace spanledger {

/// Deflection limits of a steel joist: as the brief states them; where it states neither, w_Q and w_inst by the
/// parameters in force.
struct SteelDeflectionLimits {
    std::optional<DeflectionLimit> variable;
    std::optional<DeflectionLimit> instantaneous;
};

[[nodiscard]] inline SteelDeflectionLimits steel_deflection_limits(const Inputs& inputs) {
    const LimitsAsked& asked = inputs.brief.limits;
    if (asked.variable_deflection || asked.instantaneous_deflection) {
        return {asked.variable_deflection, asked.instantaneous_deflection};
    }
    const auto ratio = [&](const char* key) {
        return DeflectionLimit{.ratio = parameter(inputs.catalogue, key), .max_mm = std::nullopt};
    };
    return {ratio("steel_variable_deflection"), ratio("steel_instantaneous_deflection")};
}

} // namespace spanledger
