// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/basis.hpp"
#include "spanledger/engine/timber_inputs.hpp"

namespace spanledger {

/// EN 1995-1-1 for solid timber, glulam and LVL rectangles.
[[nodiscard]] std::unique_ptr<JoistRules> make_timber_rules(const Inputs& inputs, const TimberMember& member,
                                                            const LoadClass& load, UniformAction uniform);

/// The numbers and kinds a timber joist is worked out from, at the load class's own variable action and spacing 1 mm.
[[nodiscard]] TimberInputs<double> timber_inputs(const Inputs& inputs, const TimberMember& member,
                                                 const LoadClass& load);
[[nodiscard]] TimberKinds timber_kinds(const Inputs& inputs, const TimberMember& member, const LoadClass& load,
                                       UniformAction uniform);

} // namespace spanledger
