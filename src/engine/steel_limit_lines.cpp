// SPDX-License-Identifier: MIT
#include "steel_limit_lines.hpp"

#include "steel_deflection_limits.hpp"

#include <fmt/format.h>

namespace spanledger {
namespace {

std::string limit_words(const std::optional<DeflectionLimit>& limit) {
    if (!limit) return "not checked";
    if (limit->ratio && limit->max_mm) return fmt::format("L/{}, at most {} mm", *limit->ratio, *limit->max_mm);
    return limit->ratio ? fmt::format("L/{}", *limit->ratio) : fmt::format("{} mm", *limit->max_mm);
}

std::string frequency_words(const std::optional<FrequencyLimit>& limit) {
    if (!limit) return "not checked";
    return fmt::format("at least {} Hz, with {} of the uniform variable actions in the mass", limit->min_hz,
                       limit->variable_share);
}

} // namespace

std::vector<BasisLine> steel_limit_lines(const Inputs& inputs, const std::string& heading) {
    constexpr const char* deflection_clause = "EN 1993-1-1 7.2.1, EN 1990 A1.4.3";
    constexpr const char* liveliness_clause = "EN 1993-1-1 7.2.3, EN 1990 A1.4.4";
    const LimitsAsked& asked = inputs.brief.limits;
    const SteelDeflectionLimits limits = steel_deflection_limits(inputs);
    const bool stated = asked.variable_deflection || asked.instantaneous_deflection;
    const std::string origin = stated ? "brief" : "parameters in force";
    return {
        {heading, "Variable deflection", limit_words(limits.variable), deflection_clause, origin},
        {heading, "Instantaneous deflection", limit_words(limits.instantaneous), deflection_clause, origin},
        {heading, "First frequency", frequency_words(asked.frequency), liveliness_clause, "brief"},
        {heading, "Deflection under 1 kN",
         asked.unit_load_deflection ? fmt::format("{} mm", *asked.unit_load_deflection) : "not checked",
         liveliness_clause, "brief"},
    };
}

} // namespace spanledger
