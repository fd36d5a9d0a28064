// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/inputs.hpp"
#include "spanledger/member.hpp"
#include "spanledger/results/issue.hpp"

#include <algorithm>
#include <string>
#include <variant>
#include <vector>

namespace spanledger {

/// A line of the basis that no choice of the brief changes.
struct FixedLine {
    const char* item;
    const char* value;
    const char* clause;
    const char* origin;
};

/// Whether an entry of the brief holds members of a family.
template <class FamilyMember> [[nodiscard]] bool has_members(const Inputs& inputs) {
    Diagnostics ignored; // the brief was read without errors
    const auto& entries = inputs.brief.members;
    return std::any_of(entries.begin(), entries.end(), [&](const MembersEntry& entry) {
        const std::vector<Member> members = members_of(entry, inputs.catalogue, ignored);
        return !members.empty() && std::holds_alternative<FamilyMember>(members.front());
    });
}

/// The serviceability limits of steel joists, under the heading of their family.
[[nodiscard]] std::vector<BasisLine> steel_limit_lines(const Inputs& inputs, const std::string& heading);

} // namespace spanledger
