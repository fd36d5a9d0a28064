// SPDX-License-Identifier: MIT
#include "spanledger/input/brief_reader.hpp"

#include "spanledger/member.hpp"

#include <fmt/format.h>

#include <algorithm>

// What can be judged only when it is known which members are of timber and which of steel.

namespace spanledger {

namespace {

constexpr double usual_timber_spacing = 1200.0; // mm

/// The members of each entry of the brief, and what they are made of.
struct EntryMembers {
    std::vector<Member> members;
    bool timber = false;
    bool steel = false;
};

/// Points a message about an entry at the value it speaks of.
Place place_in_entry(const SectionReader& section, const MembersEntry& entry, const Diagnostic& diagnostic) {
    if (diagnostic.code == "unknown-class") {
        return section.value_place("class");
    }
    for (std::size_t i = 0; i < entry.sizes.size(); ++i) {
        if (diagnostic.message.find("'" + entry.sizes[i] + "'") != std::string::npos) {
            return section.item_place("sizes", i, entry.sizes.size());
        }
    }
    return section.value_place(section.given("sizes") ? "sizes" : "series");
}

bool is_squat(const TimberMember& member) {
    return member.b > 3.0 * member.h;
}

bool is_slender(const TimberMember& member) {
    const double breadth = member.plies_fixed_together ? member.b * member.plies : member.b;
    return member.h > 5.0 * breadth;
}

/// One warning for an entry, however many of its sections are so.
void warn_of_shape(SectionReader& entry, const std::vector<Member>& members, bool (*shaped)(const TimberMember&),
                   const std::string& shape, const std::string& hint) {
    std::size_t count = 0;
    std::string first;
    for (const Member& member : members) {
        const auto* timber = std::get_if<TimberMember>(&member);
        if (timber != nullptr && shaped(*timber)) {
            first = count == 0 ? section_name(member) : first;
            ++count;
        }
    }
    if (count > 0) {
        const std::string more = count > 1 ? fmt::format(" and {} more", count - 1) : "";
        entry.warning("", "unusual", fmt::format("{}{}: {}", first, more, shape), hint);
    }
}

EntryMembers read_entry_members(SectionReader& section, const MembersEntry& entry, const Catalogue& catalogue,
                                Diagnostics& diagnostics) {
    if (entry.material_class.empty() || entry.series.empty() == entry.sizes.empty()) {
        return {}; // reported already
    }
    Diagnostics of_entry;
    EntryMembers result{.members = members_of(entry, catalogue, of_entry)};
    for (Diagnostic diagnostic : of_entry.all()) {
        diagnostic.place = place_in_entry(section, entry, diagnostic);
        diagnostics.add(std::move(diagnostic));
    }
    for (const Member& member : result.members) {
        (std::holds_alternative<TimberMember>(member) ? result.timber : result.steel) = true;
    }
    return result;
}

void check_shapes(SectionReader& section, const std::vector<Member>& members, bool held_and_strutted) {
    warn_of_shape(section, members, is_squat, "the breadth is more than 3 times the depth",
                  "usual are breadths to 3 times the depth; check that the size is breadth x depth");
    if (!held_and_strutted) {
        warn_of_shape(section, members, is_slender, "the depth is more than 5 times the breadth",
                      "usual are depths to 5 times the breadth, more only with compression_edge = \"held\" and "
                      "strutting (vibration = {strutting = true, ...})");
    }
}

void check_limits_of_timber(SectionReader& limits) {
    const bool deflection = limits.given("variable_deflection") || limits.given("instantaneous_deflection") ||
                            limits.given("final_deflection");
    if (!deflection && !limits.damaged()) {
        limits.warning("", "no-deflection-limit",
                       "no deflection limit is stated, so the deflection of timber is not checked",
                       "add under [limits], for example, final_deflection = {ratio = 250}");
    }
}

void check_limits_without_steel(SectionReader& limits, const Brief& brief) {
    for (const char* key : {"frequency", "unit_load_deflection_mm"}) {
        if (limits.given(key)) {
            limits.warning(key, "no-effect",
                           fmt::format("{} is a limit of steel joists; timber joists are not checked with it", key),
                           "for timber floors write vibration = {rule = \"uk\", ...} in its place");
        }
    }
    if (brief.limits.camber.value_or(0.0) > 0.0 && !limits.given("final_deflection")) {
        limits.warning("camber_mm", "no-effect",
                       "camber_mm reduces the final deflection of timber, which is not limited",
                       "add final_deflection = {ratio = 250}, or remove camber_mm");
    }
}

void check_limits_without_timber(SectionReader& limits) {
    for (const char* key : {"vibration", "final_deflection"}) {
        if (limits.given(key)) {
            limits.warning(
                key, "no-effect",
                fmt::format("{} is a limit of timber joists; steel joists are not checked with it", key),
                key == std::string_view("vibration")
                    ? "for steel floors write frequency = {min_hz = 8} and unit_load_deflection_mm in its place"
                    : "for steel joists write instantaneous_deflection = {ratio = 250} in its place");
        }
    }
}

void check_spacings(BriefSections& sections, const Brief& brief, const std::vector<EntryMembers>& entries) {
    const KeyRange& range = key_definition(section_definition("table"), "spacings_mm").usual; // in mm, as spacings are
    for (std::size_t t = 0; t < brief.tables.size(); ++t) {
        const TableRequest& table = brief.tables[t];
        bool timber = false;
        for (std::size_t i = 0; i < entries.size(); ++i) {
            const auto& named = table.members;
            timber = timber ||
                     (entries[i].timber && std::find(named.begin(), named.end(), brief.members[i].name) != named.end());
        }
        for (std::size_t i = 0; timber && i < table.spacings.size(); ++i) {
            const double spacing = table.spacings[i];
            if (spacing > usual_timber_spacing && spacing <= range.greatest) { // beyond it is reported already
                sections.tables[t].item_warning(
                    "spacings_mm", {i, table.spacings.size()}, "unusual",
                    fmt::format("spacings_mm: {:g} mm is outside the usual range for timber, {:g} to {:g} mm", spacing,
                                range.least, usual_timber_spacing),
                    "it is used as it stands; check the number and its unit");
            }
        }
    }
}

} // namespace

void check_materials(BriefSections& sections, const Brief& brief, const Catalogue& catalogue,
                     Diagnostics& diagnostics) {
    const bool strutted = brief.limits.vibration && brief.limits.vibration->strutting;
    const bool held = brief.support.compression_edge == CompressionEdge::held;
    std::vector<EntryMembers> entries;
    for (std::size_t i = 0; i < brief.members.size(); ++i) {
        entries.push_back(read_entry_members(sections.members[i], brief.members[i], catalogue, diagnostics));
        check_shapes(sections.members[i], entries.back().members, held && strutted);
    }
    const bool timber = std::any_of(entries.begin(), entries.end(), [](const auto& entry) { return entry.timber; });
    const bool steel = std::any_of(entries.begin(), entries.end(), [](const auto& entry) { return entry.steel; });
    if (timber || brief.members.empty()) {
        check_limits_of_timber(sections.limits);
    }
    if (timber && !steel) {
        check_limits_without_steel(sections.limits, brief);
    }
    if (steel && !timber) {
        check_limits_without_timber(sections.limits);
    }
    check_spacings(sections, brief, entries);
}

} // namespace spanledger
