// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/joist_rules.hpp"
#include "spanledger/engine/rolled_inputs.hpp"
#include "spanledger/input/inputs.hpp"
#include "spanledger/member.hpp"

namespace spanledger {

/// Which limits a rolled joist has under a load class, and why the others are not checked. A refused member has none.
[[nodiscard]] LimitPlans rolled_plans(const Inputs& inputs, const RolledMember& member, const LoadClass& load,
                                      const RolledKinds& kinds);

/// Yield strength of a grade at a thickness (mm), MPa; empty where the grade has none.
[[nodiscard]] std::optional<double> yield_strength(const SteelGrade& grade, double thickness);

/// Why the member is not covered at all; empty where it is.
[[nodiscard]] std::string rolled_refusal(const RolledMember& member, const RolledKinds& kinds,
                                         const RolledInputs<double>& inputs);

} // namespace spanledger
