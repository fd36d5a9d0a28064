// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/inputs.hpp"
#include "spanledger/member.hpp"
#include "spanledger/results/issue.hpp"

#include <optional>

namespace spanledger {

/// The curves of one member at one spacing, from where the load comes below the top of the chart to the span at which
/// no variable action is left. Empty where the member is not covered or carries nothing.
[[nodiscard]] std::optional<LimitCurves> limit_curves(const Inputs& inputs, const Member& member, const LoadClass& load,
                                                      double spacing);

/// For each members entry of each table of permissible spans: its middle section under the table's first load class at
/// its first spacing, each combination once.
[[nodiscard]] std::vector<LimitCurves> limit_curves_of_brief(const Inputs& inputs);

} // namespace spanledger
