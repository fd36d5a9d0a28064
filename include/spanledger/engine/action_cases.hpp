// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/catalogue.hpp"

#include <string>
#include <vector>

// Which combinations and which variable actions a load class has, as kinds. Their numbers are in line_actions.hpp.

namespace spanledger {

/// The variable action of a combination. A floor load's partition allowance acts with `uniform` and `concentrated`.
enum class Action { none, uniform, snow, concentrated };

/// One combination with one variable action; the label is what a reader sees.
struct CombinationCase {
    bool reduced_permanent = false;
    bool combination_value = false; ///< the variable action is multiplied by ψ0
    Action action = Action::none;
    Duration duration = Duration::permanent; ///< shortest of the actions present
    std::string label;
};

/// One variable action in the serviceability limit state.
struct ServiceCase {
    Action action = Action::none;
    std::string label;
};

/// Whether the load class's own variable action is present even where its value is zero: a solver for the permissible
/// load varies it from zero.
enum class UniformAction { as_given, always };

/// What a reader calls an action: "uniform", "snow", "concentrated", "permanent".
[[nodiscard]] std::string action_name(Action action);

/// The alternatives of a load class: one variable action at a time.
[[nodiscard]] std::vector<Action> variable_actions(const LoadClass& load, UniformAction uniform);

/// Every combination of the set with every alternative.
[[nodiscard]] std::vector<CombinationCase> combination_cases(const Catalogue& catalogue, const std::string& set,
                                                             const LoadClass& load, UniformAction uniform);

/// The alternatives that count in deflection; the permanent action alone where there are none.
[[nodiscard]] std::vector<ServiceCase> service_cases(const LoadClass& load, UniformAction uniform);

} // namespace spanledger
