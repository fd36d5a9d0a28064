// SPDX-License-Identifier: MIT
#pragma once

#include "engine/independent_to_engine.hpp"

#include "spanledger/engine/sweep.hpp"

namespace independent {

/// The engine's utilisation of every checked limit at an effective span; empty where a limit is not checked.
inline std::array<std::optional<double>, spanledger::limit_count> engine_utilisations(const Case& c, double L) {
    const auto rules = to_engine(c).rules();
    const auto joist = rules->at({.spacing = c.spacing, .variable = c.loads.q});
    std::array<std::optional<double>, spanledger::limit_count> all;
    for (const auto& definition : spanledger::limit_definitions) {
        if (rules->plan(definition.limit).status != spanledger::LimitStatus::checked) continue;
        all[spanledger::index_of(definition.limit)] =
            spanledger::worst_check(*rules, *joist, definition.limit, L).utilisation;
    }
    return all;
}

} // namespace independent
