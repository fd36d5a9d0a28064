// SPDX-License-Identifier: MIT
#include "spanledger/engine/action_inputs.hpp"

#include <algorithm>

namespace spanledger {
namespace {

/// EN 1995-1-1 3.1.3(2): the shortest duration among the actions present.
Duration shortest_duration(const LoadClass& load, Action action) {
    switch (action) {
    case Action::none: return Duration::permanent;
    case Action::snow: return load.snow_duration;
    case Action::uniform: return load.duration;
    case Action::concentrated:
        return load.partitions > 0.0 ? std::max(load.duration, load.concentrated_duration) : load.concentrated_duration;
    }
    return Duration::permanent;
}

} // namespace

std::string action_name(Action action) {
    switch (action) {
    case Action::none: return "permanent";
    case Action::uniform: return "uniform";
    case Action::snow: return "snow";
    case Action::concentrated: return "concentrated";
    }
    return {};
}

std::vector<Action> variable_actions(const LoadClass& load, UniformAction uniform) {
    std::vector<Action> actions;
    if (uniform == UniformAction::always || load.variable > 0.0 || load.partitions > 0.0) {
        actions.push_back(Action::uniform);
    }
    if (load.snow > 0.0) actions.push_back(Action::snow);
    if (load.concentrated > 0.0) actions.push_back(Action::concentrated);
    return actions;
}

std::vector<CombinationCase> combination_cases(const Catalogue& catalogue, const std::string& set,
                                               const LoadClass& load, UniformAction uniform) {
    std::vector<CombinationCase> cases;
    const std::vector<Action> actions = variable_actions(load, uniform);
    for (const Combination& combination : catalogue.combinations) {
        if (combination.set != set) continue;
        CombinationCase base;
        base.reduced_permanent = combination.reduced_permanent;
        base.combination_value = combination.variable == Combination::Variable::combination_value;
        base.label = combination.name;
        if (combination.variable == Combination::Variable::none) {
            cases.push_back(base);
            continue;
        }
        for (const Action action : actions) {
            CombinationCase with = base;
            with.action = action;
            with.duration = shortest_duration(load, action);
            with.label = combination.name + ", " + action_name(action);
            cases.push_back(with);
        }
    }
    return cases;
}

std::vector<ServiceCase> service_cases(const LoadClass& load, UniformAction uniform) {
    std::vector<ServiceCase> cases;
    for (const Action action : variable_actions(load, uniform)) {
        if (action == Action::concentrated && !load.concentrated_in_deflection) continue;
        cases.push_back({action, action_name(action)});
    }
    if (cases.empty()) cases.push_back({Action::none, action_name(Action::none)});
    return cases;
}

ActionInputs<double> action_inputs(const Catalogue& catalogue, const LoadClass& load) {
    return {
        .g_k = load.permanent,
        .g_partitions = load.permanent_partitions,
        .q_k = load.variable,
        .q_partitions = load.partitions,
        .s_k = load.snow,
        .Q_k = load.concentrated,
        .Q_share = load.concentrated_share,
        .psi_0_q = load.psi.psi0,
        .psi_2_q = load.psi.psi2,
        .psi_0_s = load.snow_psi.psi0,
        .psi_2_s = load.snow_psi.psi2,
        .spacing = 1.0,
        .gamma_G = parameter(catalogue, "gamma_G"),
        .gamma_Q = parameter(catalogue, "gamma_Q"),
        .xi = parameter(catalogue, "xi"),
    };
}

} // namespace spanledger
