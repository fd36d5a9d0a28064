// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/joist_rules.hpp"
#include "spanledger/engine/timber_inputs.hpp"
#include "spanledger/input/inputs.hpp"
#include "spanledger/member.hpp"

namespace spanledger {

/// Which limits a timber member has under a load class, and why the others are not checked.
[[nodiscard]] LimitPlans timber_plans(const Inputs& inputs, const TimberMember& member, const LoadClass& load,
                                      const TimberKinds& kinds);

} // namespace spanledger
