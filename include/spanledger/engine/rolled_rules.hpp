// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/basis.hpp"
#include "spanledger/engine/rolled_inputs.hpp"

namespace spanledger {

/// EN 1993-1-1 for rolled I and H sections and parallel-flange channels bent about their strong axis.
[[nodiscard]] std::unique_ptr<JoistRules> make_rolled_rules(const Inputs& inputs, const RolledMember& member,
                                                            const LoadClass& load, UniformAction uniform);

/// The numbers and kinds a rolled joist is worked out from, at the load class's own variable action and spacing 1 mm.
[[nodiscard]] RolledInputs<double> rolled_inputs(const Inputs& inputs, const RolledMember& member,
                                                 const LoadClass& load);
[[nodiscard]] RolledKinds rolled_kinds(const Inputs& inputs, const RolledMember& member, const LoadClass& load,
                                       UniformAction uniform);

/// The rules of a joist whose numbers and kinds are at hand.
[[nodiscard]] std::unique_ptr<JoistRules> make_rolled_rules(RolledKinds kinds, const RolledInputs<double>& inputs,
                                                            LimitPlans plans);

} // namespace spanledger
