// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/action_cases.hpp"

#include <vector>

namespace spanledger {

/// The cases of which the first frequency is checked: the uniform alternatives; the permanent action alone where there
/// are none.
[[nodiscard]] inline std::vector<ServiceCase> frequency_cases(const LoadClass& load, UniformAction uniform) {
    std::vector<ServiceCase> cases;
    for (const Action action : variable_actions(load, uniform)) {
        if (action != Action::concentrated) cases.push_back({action, action_name(action)});
    }
    if (cases.empty()) cases.push_back({Action::none, action_name(Action::none)});
    return cases;
}

/// Whether a joist without self-weight has mass in every one of these cases, with a share of the variable action.
[[nodiscard]] inline bool have_mass(const std::vector<ServiceCase>& cases, const LoadClass& load,
                                    double variable_share) {
    if (load.permanent + load.permanent_partitions > 0.0) return true;
    for (const ServiceCase& service : cases) {
        const double variable = service.action == Action::uniform ? load.variable + load.partitions
                                : service.action == Action::snow  ? load.snow
                                                                  : 0.0;
        if (variable_share * variable <= 0.0) return false;
    }
    return true;
}

} // namespace spanledger
