// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/traced.hpp"

#include <string>
#include <vector>

// How a traced result came about, in words: the named quantities it needs, each with its formula.

namespace spanledger {

/// The named quantities that the results need, each after those it needs itself; inputs included. Quantities that came
/// about twice in the same way are listed once.
[[nodiscard]] std::vector<Trace> named_steps(const std::vector<Trace>& results);

/// The right-hand side of a quantity, in the symbols of its operands: "q*L^2/8 + F*L/4", "min(a, b)",
/// "a where c <= d, else b". Numbers of the clause stand as they are.
[[nodiscard]] std::string formula_text(const TraceNode& node);

/// The same with the operands' values put in.
[[nodiscard]] std::string numbers_text(const TraceNode& node);

} // namespace spanledger
