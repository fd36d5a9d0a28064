// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/action_cases.hpp"
#include "spanledger/engine/joist_rules.hpp"
#include "spanledger/engine/sweep.hpp"
#include "spanledger/input/inputs.hpp"
#include "spanledger/member.hpp"

#include <memory>

namespace spanledger {

/// The rules of a member under a load class in the brief's basis. The one place that names bases and materials.
[[nodiscard]] std::unique_ptr<JoistRules> make_rules(const Inputs& inputs, const Member& member, const LoadClass& load,
                                                     UniformAction uniform = UniformAction::as_given);

/// Effective spans searched for a member: the brief's clear spans, or max(500 mm, 2h) to 30 m.
[[nodiscard]] SpanRange search_range(const SearchRange& search, const JoistRules& rules);

} // namespace spanledger
