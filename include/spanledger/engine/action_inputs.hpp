// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/line_actions.hpp"

namespace spanledger {

/// The numbers of a load class under the parameters in force, at the spacing of 1 mm that the rules then replace.
[[nodiscard]] ActionInputs<double> action_inputs(const Catalogue& catalogue, const LoadClass& load);

} // namespace spanledger
