// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/basis.hpp"
#include "spanledger/engine/cold_formed_inputs.hpp"

namespace spanledger {

/// EN 1993-1-3 for cold-formed lipped channels bent about their strong axis.
[[nodiscard]] std::unique_ptr<JoistRules> make_cold_formed_rules(const Inputs& inputs, const ColdFormedMember& member,
                                                                 const LoadClass& load, UniformAction uniform);

/// The numbers and kinds a channel joist is worked out from, at the load class's own variable action and spacing 1 mm.
[[nodiscard]] ColdFormedInputs<double> cold_formed_inputs(const Inputs& inputs, const ColdFormedMember& member,
                                                          const LoadClass& load);
[[nodiscard]] ColdFormedKinds cold_formed_kinds(const Inputs& inputs, const ColdFormedMember& member,
                                                const LoadClass& load, UniformAction uniform);

/// The rules of a joist whose numbers and kinds are at hand.
[[nodiscard]] std::unique_ptr<JoistRules>
make_cold_formed_rules(ColdFormedKinds kinds, const ColdFormedInputs<double>& inputs, LimitPlans plans);

} // namespace spanledger
