// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/inputs.hpp"
#include "spanledger/results/issue.hpp"

#include <vector>

namespace spanledger {

/// What the basis says of rolled steel joists: rules, readings and assumptions. Empty where the brief has none.
[[nodiscard]] std::vector<BasisLine> rolled_lines(const Inputs& inputs);

} // namespace spanledger
