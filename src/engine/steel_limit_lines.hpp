// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/inputs.hpp"
#include "spanledger/results/issue.hpp"

#include <string>
#include <vector>

namespace spanledger {

/// The serviceability limits of steel joists, under the heading of their family.
[[nodiscard]] std::vector<BasisLine> steel_limit_lines(const Inputs& inputs, const std::string& heading);

} // namespace spanledger
