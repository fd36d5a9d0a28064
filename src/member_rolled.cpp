// SPDX-License-Identifier: MIT
#include "member_families.hpp"

#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {

namespace {

std::vector<std::string> section_names(const Catalogue& catalogue) {
    std::vector<std::string> names;
    for (const RolledSection& row : catalogue.rolled_sections) names.push_back(row.name);
    return names;
}

std::vector<std::string> series_names(const Catalogue& catalogue) {
    std::vector<std::string> names;
    for (const RolledSection& row : catalogue.rolled_sections) {
        if (std::find(names.begin(), names.end(), row.series) == names.end()) names.push_back(row.series);
    }
    return names;
}

RolledMember make_member(const SteelGrade& grade, const RolledSection& section, const Catalogue& catalogue) {
    return {.grade = grade, .section = section, .density = parameter(catalogue, "steel_density")};
}

std::vector<Member> members_of_series(const MembersEntry& entry, const SteelGrade& grade, const Catalogue& catalogue,
                                      Diagnostics& diagnostics) {
    std::vector<Member> members;
    for (const RolledSection& row : catalogue.rolled_sections) {
        if (row.series == entry.series) members.emplace_back(make_member(grade, row, catalogue));
    }
    if (members.empty()) {
        diagnostics.error("unknown-series", entry.place,
                          fmt::format("series '{}' of rolled sections is not known", entry.series),
                          did_you_mean(entry.series, series_names(catalogue)));
    }
    return members;
}

} // namespace

std::optional<Member> proposed_rolled(const ProposedSection& section, const SteelGrade& grade,
                                      const Catalogue& catalogue, Diagnostics& diagnostics) {
    const RolledSection* const found = find_rolled_section(catalogue, section.text);
    if (found == nullptr) {
        diagnostics.error("unknown-section", section.place,
                          fmt::format("'{}' is not a rolled section that is known", section.text),
                          did_you_mean(std::string(section.text), section_names(catalogue)));
        return std::nullopt;
    }
    return make_member(grade, *found, catalogue);
}

std::vector<Member> rolled_members(const MembersEntry& entry, const SteelGrade& grade, const Catalogue& catalogue,
                                   Diagnostics& diagnostics) {
    if (entry.plies != 1 || entry.plies_fixed_together) {
        diagnostics.error("contradiction", entry.place, "plies are for timber: a steel joist is one section",
                          "remove plies and plies_fixed_together");
    }
    if (!entry.series.empty()) return members_of_series(entry, grade, catalogue, diagnostics);
    std::vector<Member> members;
    for (const std::string& text : entry.sizes) {
        if (auto member = proposed_rolled({text, entry.place}, grade, catalogue, diagnostics)) {
            members.push_back(*std::move(member));
        }
    }
    return members;
}

} // namespace spanledger
