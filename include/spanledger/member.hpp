// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/catalogue.hpp"

#include <optional>
#include <string>
#include <variant>
#include <vector>

namespace spanledger {

/// A rectangular joist of one or more plies in a timber strength class.
struct TimberMember {
    TimberClass timber_class;
    double b = 0.0; ///< mm, one ply
    double h = 0.0; ///< mm
    int plies = 1;
    bool plies_fixed_together = false;
    std::optional<double> stock_length{};        ///< mm, the longest
    std::optional<Provenance> size_provenance{}; ///< where the size is a catalogue row
};

/// A cold-formed lipped channel in a grade of structural sheet.
struct ColdFormedMember {
    ColdFormedGrade grade;
    LippedChannelSize size;
    double density = 0.0;                        ///< kg/m3, the parameter in force
    std::optional<double> stock_length{};        ///< mm, the longest
    std::optional<Provenance> size_provenance{}; ///< where the size is a catalogue row
};

/// A hot-rolled section in a grade of structural steel.
struct RolledMember {
    SteelGrade grade;
    RolledSection section;
    double density = 0.0;                 ///< kg/m3, the parameter in force
    std::optional<double> stock_length{}; ///< mm, the longest
};

/// A section in a material: what a row of a table is. One alternative per family of materials.
using Member = std::variant<TimberMember, RolledMember, ColdFormedMember>;

[[nodiscard]] std::string
section_name(const Member& member);                         ///< "47x220", "2/47x220", "IPE 200", "C 150x50x15x1.5 r2.5"
[[nodiscard]] std::string class_name(const Member& member); ///< "C24", "S275"
[[nodiscard]] std::string member_name(const Member& member);               ///< "C24 47x220"
[[nodiscard]] std::string_view material_name(const Member& member);        ///< "solid timber", ...
[[nodiscard]] double depth_of(const Member& member);                       ///< mm
[[nodiscard]] double mass_per_length(const Member& member);                ///< kg/m
[[nodiscard]] std::optional<double> stock_length_of(const Member& member); ///< mm

/// Whether two members differ in depth only: the same class, and the same breadth and plies of timber or
/// the same series of rolled sections, or the same thickness of cold-formed ones.
[[nodiscard]] bool comparable(const Member& a, const Member& b);

/// Reads "47x220" or "2/47x220" (bare numbers are mm; case and spaces do not matter). Empty where it is no such size.
struct TimberSizeText {
    int plies = 1;
    double b = 0.0;
    double h = 0.0;
};
[[nodiscard]] std::optional<TimberSizeText> read_timber_size(std::string_view text);

/// Reads "C 150x50x15x1.5 r2.5": depth, flange ("74/66": compression flange first), lip, nominal thickness, inner
/// radius. Case and spaces do not matter. Empty where it is no such size.
[[nodiscard]] std::optional<LippedChannelSize> read_lipped_channel(std::string_view text);
[[nodiscard]] std::string lipped_channel_name(const LippedChannelSize& size);
/// Why there can be no such channel, as words that follow its name; empty where there can.
[[nodiscard]] std::string lipped_channel_problem(const LippedChannelSize& size);

/// Members of one entry of the brief, in catalogue order (series) or as listed (sizes), without repetition.
/// Names that are unknown go to `diagnostics` with suggestions.
[[nodiscard]] std::vector<Member> members_of(const MembersEntry& entry, const Catalogue& catalogue,
                                             Diagnostics& diagnostics);

/// Reads --member: class, one space, size. A member of the brief (same class and size) takes its stock lengths and
/// plies' fixing. Errors go to `diagnostics` with place "--member".
[[nodiscard]] std::optional<Member> read_member(std::string_view text, const Brief& brief, const Catalogue& catalogue,
                                                Diagnostics& diagnostics);

} // namespace spanledger
