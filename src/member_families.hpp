// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/diagnostics.hpp"
#include "spanledger/member.hpp"

#include <optional>
#include <string_view>
#include <vector>

// How each family of materials reads the sections of an entry, and a proposed section. Stock lengths are left to
// members_of(). Problems go to `diagnostics`, and what has one is left out.

namespace spanledger {

[[nodiscard]] std::vector<Member> timber_members(const MembersEntry& entry, const TimberClass& timber_class,
                                                 const Catalogue& catalogue, Diagnostics& diagnostics);

[[nodiscard]] std::vector<Member> rolled_members(const MembersEntry& entry, const SteelGrade& grade,
                                                 const Catalogue& catalogue, Diagnostics& diagnostics);

[[nodiscard]] std::vector<Member> cold_formed_members(const MembersEntry& entry, const ColdFormedGrade& grade,
                                                      const Catalogue& catalogue, Diagnostics& diagnostics);

/// A section as written, and where.
struct ProposedSection {
    std::string_view text;
    Place place;
};

[[nodiscard]] std::optional<Member> proposed_timber(const ProposedSection& section, const TimberClass& timber_class,
                                                    const Catalogue& catalogue, Diagnostics& diagnostics);

[[nodiscard]] std::optional<Member> proposed_rolled(const ProposedSection& section, const SteelGrade& grade,
                                                    const Catalogue& catalogue, Diagnostics& diagnostics);

[[nodiscard]] std::optional<Member> proposed_cold_formed(const ProposedSection& section, const ColdFormedGrade& grade,
                                                         const Catalogue& catalogue, Diagnostics& diagnostics);

} // namespace spanledger
