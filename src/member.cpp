// SPDX-License-Identifier: MIT
#include "spanledger/member.hpp"

#include "member_families.hpp"
#include "spanledger/clauses/lipped_channel.hpp"
#include "spanledger/clauses/rolled_section.hpp"
#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <set>
#include <utility>

namespace spanledger {

namespace {

std::vector<std::string> class_names(const Catalogue& catalogue) {
    std::vector<std::string> names;
    for (const TimberClass& row : catalogue.timber_classes) names.push_back(row.name);
    for (const SteelGrade& row : catalogue.steel_grades) names.push_back(row.name);
    for (const ColdFormedGrade& row : catalogue.cold_formed_grades) names.push_back(row.name);
    return names;
}

void report_unknown_class(const std::string& name, const Catalogue& catalogue, const Place& place,
                          Diagnostics& diagnostics) {
    diagnostics.error("unknown-class", place, fmt::format("strength class '{}' is not known", name),
                      did_you_mean(name, class_names(catalogue)));
}

bool may_be_timber(std::string_view section, const Catalogue& catalogue) {
    return find_rolled_section(catalogue, section) == nullptr && !read_lipped_channel(section);
}

/// The sections of an entry, by the family of its class. Of an unknown class the sizes are looked at too, as timber.
std::vector<Member> sections_of(const MembersEntry& entry, const Catalogue& catalogue, Diagnostics& diagnostics) {
    const std::string& name = entry.material_class;
    if (const TimberClass* found = find_timber_class(catalogue, name)) {
        return timber_members(entry, *found, catalogue, diagnostics);
    }
    if (const SteelGrade* found = find_steel_grade(catalogue, name)) {
        return rolled_members(entry, *found, catalogue, diagnostics);
    }
    if (const ColdFormedGrade* found = find_cold_formed_grade(catalogue, name)) {
        return cold_formed_members(entry, *found, catalogue, diagnostics);
    }
    report_unknown_class(name, catalogue, entry.place, diagnostics);
    const auto is_timber = [&](const std::string& size) { return may_be_timber(size, catalogue); };
    if (entry.series.empty() && std::all_of(entry.sizes.begin(), entry.sizes.end(), is_timber)) {
        static_cast<void>(timber_members(entry, {}, catalogue, diagnostics));
    }
    return {};
}

void drop_repetitions(std::vector<Member>& members) {
    std::set<std::string> names;
    const auto repeated = [&](const Member& member) { return !names.insert(member_name(member)).second; };
    members.erase(std::remove_if(members.begin(), members.end(), repeated), members.end());
}

/// The same section in an entry of the brief, with the entry's stock lengths and fixing of plies.
std::optional<Member> member_of_brief(const Member& wanted, const Brief& brief, const Catalogue& catalogue) {
    Diagnostics reported_with_the_brief;
    const std::string name = member_name(wanted);
    for (const MembersEntry& entry : brief.members) {
        for (const Member& member : members_of(entry, catalogue, reported_with_the_brief)) {
            if (member_name(member) == name) return member;
        }
    }
    return std::nullopt;
}

std::optional<Member> proposed_member(const std::string& class_name, const ProposedSection& section,
                                      const Catalogue& catalogue, Diagnostics& diagnostics) {
    if (const TimberClass* found = find_timber_class(catalogue, class_name)) {
        return proposed_timber(section, *found, catalogue, diagnostics);
    }
    if (const SteelGrade* found = find_steel_grade(catalogue, class_name)) {
        return proposed_rolled(section, *found, catalogue, diagnostics);
    }
    if (const ColdFormedGrade* found = find_cold_formed_grade(catalogue, class_name)) {
        return proposed_cold_formed(section, *found, catalogue, diagnostics);
    }
    report_unknown_class(class_name, catalogue, section.place, diagnostics);
    if (may_be_timber(section.text, catalogue)) {
        static_cast<void>(proposed_timber(section, {}, catalogue, diagnostics));
    }
    return std::nullopt;
}

/// One answer per family of materials.
struct SectionName {
    std::string operator()(const TimberMember& m) const {
        const std::string size = fmt::format("{}x{}", m.b, m.h);
        return m.plies == 1 ? size : fmt::format("{}/{}", m.plies, size);
    }
    std::string operator()(const RolledMember& m) const { return m.section.name; }
    std::string operator()(const ColdFormedMember& m) const { return lipped_channel_name(m.size); }
};

struct ClassName {
    std::string operator()(const TimberMember& m) const { return m.timber_class.name; }
    std::string operator()(const RolledMember& m) const { return m.grade.name; }
    std::string operator()(const ColdFormedMember& m) const { return m.grade.name; }
};

struct MaterialName {
    std::string_view operator()(const TimberMember& m) const { return material_of(m.timber_class.timber); }
    std::string_view operator()(const RolledMember&) const { return "rolled steel"; }
    std::string_view operator()(const ColdFormedMember&) const { return "cold-formed steel"; }
};

struct DepthOf {
    double operator()(const TimberMember& m) const { return m.h; }
    double operator()(const RolledMember& m) const { return m.section.h; }
    double operator()(const ColdFormedMember& m) const { return m.size.h; }
};

constexpr double square_metres = 1e-6; // mm2 to m2

struct MassPerLength {
    double operator()(const TimberMember& m) const {
        return m.timber_class.rho_mean * m.plies * m.b * m.h * square_metres;
    }
    double operator()(const RolledMember& m) const {
        const RolledSection& s = m.section;
        const double roots =
            s.shape == RolledShape::channel ? rolled_section::roots_of_channel : rolled_section::roots_of_i_section;
        return m.density * rolled_section::area<double>({s.h, s.b, s.t_w, s.t_f, s.r}, roots) * square_metres;
    }
    double operator()(const ColdFormedMember& m) const {
        const LippedChannelSize& s = m.size;
        const lipped_channel::Size<double> size{s.h, s.b_1, s.b_2, s.c, s.t_nom, s.r};
        // The coating takes nothing from the mid-lines, nor from the mass.
        const double width = lipped_channel::developed_width(lipped_channel::mid_line(size, 0.0));
        return m.density * lipped_channel::nominal_area(size, width) * square_metres;
    }
};

struct Comparable {
    bool operator()(const TimberMember& a, const TimberMember& b) const {
        return a.timber_class.name == b.timber_class.name && a.b == b.b && a.plies == b.plies;
    }
    bool operator()(const RolledMember& a, const RolledMember& b) const {
        return a.grade.name == b.grade.name && a.section.series == b.section.series;
    }
    bool operator()(const ColdFormedMember& a, const ColdFormedMember& b) const {
        return a.grade.name == b.grade.name && a.size.t_nom == b.size.t_nom;
    }
    template <class A, class B> bool operator()(const A&, const B&) const { return false; }
};

} // namespace

std::string section_name(const Member& member) {
    return std::visit(SectionName{}, member);
}
std::string class_name(const Member& member) {
    return std::visit(ClassName{}, member);
}
std::string member_name(const Member& member) {
    return class_name(member) + " " + section_name(member);
}
std::string_view material_name(const Member& member) {
    return std::visit(MaterialName{}, member);
}
double depth_of(const Member& member) {
    return std::visit(DepthOf{}, member);
}
double mass_per_length(const Member& member) {
    return std::visit(MassPerLength{}, member);
}
bool comparable(const Member& a, const Member& b) {
    return std::visit(Comparable{}, a, b);
}

std::optional<double> stock_length_of(const Member& member) {
    return std::visit([](const auto& m) { return m.stock_length; }, member);
}

std::vector<Member> members_of(const MembersEntry& entry, const Catalogue& catalogue, Diagnostics& diagnostics) {
    std::vector<Member> members = sections_of(entry, catalogue, diagnostics);
    drop_repetitions(members);
    const auto longest = std::max_element(entry.stock_lengths.begin(), entry.stock_lengths.end());
    if (longest == entry.stock_lengths.end()) return members;
    for (Member& member : members) {
        std::visit([&](auto& m) { m.stock_length = *longest; }, member);
    }
    return members;
}

std::optional<Member> read_member(std::string_view text, const Brief& brief, const Catalogue& catalogue,
                                  Diagnostics& diagnostics) {
    const Place place{.file = "--member", .source_line = std::string(text)};
    const std::size_t start = std::min(text.find_first_not_of(' '), text.size());
    const std::size_t space = text.find(' ', start);
    if (space == std::string_view::npos) {
        diagnostics.error("bad-member", place, fmt::format("'{}' is not a class, a space and a size", text),
                          "write for example: --member \"C24 47x220\"");
        return std::nullopt;
    }
    const std::string name(text.substr(start, space - start));
    const auto wanted = proposed_member(name, {text.substr(space + 1), place}, catalogue, diagnostics);
    if (!wanted) return std::nullopt;
    const std::optional<Member> of_brief = member_of_brief(*wanted, brief, catalogue);
    return of_brief ? of_brief : wanted;
}

} // namespace spanledger
