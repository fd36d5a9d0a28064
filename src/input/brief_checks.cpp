// SPDX-License-Identifier: MIT
#include "spanledger/input/brief_reader.hpp"

#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {

namespace {

void check_combination(SectionReader& basis, const Brief& brief, const Catalogue& catalogue) {
    std::vector<std::string> sets;
    for (const Combination& combination : catalogue.combinations) {
        if (std::find(sets.begin(), sets.end(), combination.set) == sets.end()) {
            sets.push_back(combination.set);
        }
    }
    if (!sets.empty() && std::find(sets.begin(), sets.end(), brief.basis.combination) == sets.end()) {
        basis.value_error("combination", "unknown-choice",
                          fmt::format("'{}' is no set of combinations", brief.basis.combination),
                          did_you_mean(brief.basis.combination, sets));
    }
}

void check_cantilever(BriefSections& sections, const Brief& brief) {
    if (!brief.support.root_fixed && !sections.support.given("root")) {
        sections.support.error(
            "arrangement", "missing-key", "a cantilever needs the key 'root'",
            "add root = \"fixed\" where back span, hold-down and bearing keep the root from turning");
    }
    const auto refuse = [](SectionReader& section, std::string_view key, bool asked) {
        if (asked) {
            section.error(key, "contradiction", fmt::format("{} is not offered for a cantilever", key),
                          fmt::format("remove {}, or write arrangement = \"single span\"", key));
        }
    };
    refuse(sections.support, "restraint_spacing_mm", sections.support.given("restraint_spacing_mm"));
    refuse(sections.basis, "concentrated_near_support", brief.basis.concentrated_near_support);
    refuse(sections.basis, "uniform_near_support", brief.basis.uniform_near_support);
    for (SectionReader& entry : sections.members) {
        refuse(entry, "stock_lengths_m", entry.given("stock_lengths_m"));
    }
}

void check_support(BriefSections& sections, const Brief& brief) {
    SectionReader& support = sections.support;
    if (brief.support.arrangement == Arrangement::cantilever) {
        check_cantilever(sections, brief);
        return;
    }
    if (brief.support.root_fixed && !support.given("arrangement")) {
        support.warning("root", "no-effect", "root has no effect on a single span",
                        "remove root, or add arrangement = \"cantilever\"");
    }
    if (brief.support.compression_edge == CompressionEdge::held && support.given("restraint_spacing_mm")) {
        support.warning("restraint_spacing_mm", "no-effect",
                        "restraint_spacing_mm has no effect where compression_edge = \"held\"",
                        "remove it, or write compression_edge = \"free\"");
    }
    if (support.given("load_height_mm") && support.given("load_position")) {
        support.warning("load_height_mm", "no-effect",
                        "for steel load_height_mm takes the place of load_position; timber uses load_position only",
                        "remove one of the two");
    }
}

void check_search(SectionReader& search, const Brief& brief) {
    if (brief.search.rounding == Rounding::nearest) {
        search.error("rounding", "contradiction", "rounding = \"nearest\" is not offered with code = \"european\"",
                     "write rounding = \"down\"");
    }
    constexpr double least_lower_bound = 500.0; // where min_clear_span_mm is left out
    const double lower = brief.search.min_clear_span.value_or(least_lower_bound);
    if (brief.search.max_clear_span && *brief.search.max_clear_span <= lower) {
        search.error("max_clear_span_mm", "contradiction",
                     fmt::format("max_clear_span_mm is {:g} mm, which is not above min_clear_span_mm, {:g} mm{}",
                                 *brief.search.max_clear_span, lower,
                                 brief.search.min_clear_span ? "" : " where it is left out"),
                     "make max_clear_span_mm the greater of the two");
    }
}

void check_vibration(SectionReader& limits, const SectionReader& deck) {
    if (limits.given("vibration") && !deck.given("stiffness_Nmm2_per_m") && !deck.damaged()) {
        limits.error("vibration", "missing-key", "vibration needs the key 'stiffness_Nmm2_per_m' under [deck]",
                     "add [deck] with stiffness_Nmm2_per_m, the stiffness (EI)b of a metre of deck");
    }
}

} // namespace

void check_consistency(BriefSections& sections, const Brief& brief, const Catalogue& catalogue) {
    check_combination(sections.basis, brief, catalogue);
    check_support(sections, brief);
    check_search(sections.search, brief);
    check_vibration(sections.limits, sections.deck);
}

} // namespace spanledger
