// SPDX-License-Identifier: MIT
#pragma once

#include "steel_deflection_limits.hpp"

#include "spanledger/engine/cold_formed_inputs.hpp"
#include "spanledger/engine/joist_rules.hpp"
#include "spanledger/input/inputs.hpp"
#include "spanledger/member.hpp"

namespace spanledger {

/// Which limits a channel has under a load class, and why the others are not checked. A refused member has none.
[[nodiscard]] LimitPlans cold_formed_plans(const Inputs& inputs, const ColdFormedMember& member, const LoadClass& load,
                                           const ColdFormedKinds& kinds);

/// Why EN 1993-1-3, as used here, does not cover the member as the brief supports it; empty where it does.
[[nodiscard]] std::string cold_formed_refusal(const Support& support, const ColdFormedInputs<double>& inputs);

} // namespace spanledger
