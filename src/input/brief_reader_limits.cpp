// SPDX-License-Identifier: MIT
#include "spanledger/input/brief_reader.hpp"

#include <fmt/format.h>

#include <array>

namespace spanledger {

namespace {

std::optional<DeflectionLimit> read_deflection(SectionReader& limits, std::string_view key) {
    auto table = limits.table(key);
    if (!table) {
        return std::nullopt;
    }
    if (table->empty()) {
        limits.error(key, "empty-limit", fmt::format("{} states no limit", key),
                     fmt::format("write {0} = {{ratio = 250}} for L/250, {0} = {{max_mm = 14}}, or both", key));
        return std::nullopt;
    }
    return DeflectionLimit{table->optional_number("ratio"), table->optional_number("max_mm")};
}

std::optional<FrequencyLimit> read_frequency(SectionReader& limits) {
    auto table = limits.table("frequency");
    if (!table) {
        return std::nullopt;
    }
    return FrequencyLimit{table->number("min_hz"), table->number("variable_share")};
}

/// A key of one vibration rule that is missing with it, or stands with the other one.
void check_rule_keys(SectionReader& table, VibrationRuleSet rule) {
    for (const std::string_view key : std::array<std::string_view, 2>{"a_mm", "b"}) {
        if (rule == VibrationRuleSet::recommended && !table.given(key)) {
            table.error("rule", "missing-key", fmt::format("rule = \"recommended\" needs the key '{}'", key),
                        key == "b"
                            ? "add b = 120, or another value of EN 1995-1-1 figure 7.2, to vibration = {...}"
                            : "add a_mm = 1.5, or another value of EN 1995-1-1 figure 7.2, to vibration = {...}");
        }
        if (rule == VibrationRuleSet::uk && table.given(key)) {
            table.error(key, "contradiction",
                        fmt::format("{} does not go with rule = \"uk\", which computes it from the span", key),
                        fmt::format("remove {}, or write rule = \"recommended\"", key));
        }
    }
    if (rule == VibrationRuleSet::recommended && table.given("kamp")) {
        table.error("kamp", "contradiction", "kamp does not go with rule = \"recommended\", which has no such factor",
                    "remove kamp, or write rule = \"uk\"");
    }
}

std::optional<VibrationLimit> read_vibration(SectionReader& limits) {
    auto table = limits.table("vibration");
    if (!table) {
        return std::nullopt;
    }
    const auto rule = table->optional_choice("rule");
    if (rule) {
        check_rule_keys(*table, static_cast<VibrationRuleSet>(*rule));
    }
    return VibrationLimit{.rule = rule ? static_cast<VibrationRuleSet>(*rule) : VibrationRuleSet::uk,
                          .floor_width = table->number("floor_width_m"),
                          .strutting = table->yes("strutting"),
                          .a_mm = table->optional_number("a_mm"),
                          .b = table->optional_number("b"),
                          .damping = table->optional_number("damping"),
                          .kamp = table->optional_number("kamp")};
}

} // namespace

LimitsAsked read_limits(SectionReader& section) {
    LimitsAsked limits{.variable_deflection = read_deflection(section, "variable_deflection"),
                       .instantaneous_deflection = read_deflection(section, "instantaneous_deflection"),
                       .final_deflection = read_deflection(section, "final_deflection"),
                       .camber = section.optional_number("camber_mm"),
                       .frequency = read_frequency(section),
                       .unit_load_deflection = section.optional_number("unit_load_deflection_mm"),
                       .vibration = read_vibration(section)};
    const bool immediate = section.given("variable_deflection") || section.given("instantaneous_deflection");
    if (limits.camber.value_or(0.0) > 0.0 && !immediate) {
        section.error("camber_mm", "contradiction",
                      "camber_mm needs variable_deflection or instantaneous_deflection to be stated too",
                      "add instantaneous_deflection = {ratio = 300}, or remove camber_mm");
    }
    return limits;
}

} // namespace spanledger
