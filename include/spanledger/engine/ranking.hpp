// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/limits.hpp"

#include <array>
#include <optional>

namespace spanledger {

/// The limits that leave least and second least.
struct Ranking {
    std::optional<Limit> governing;
    std::optional<Limit> next;
};

/// What each limit leaves (empty where it sets no bound). Values within 1e-9 relative are equal: the earlier limit
/// governs.
[[nodiscard]] inline Ranking rank_limits(const std::array<std::optional<double>, limit_count>& left) noexcept {
    constexpr double tie = 1.0 - 1e-9;
    Ranking ranking;
    const auto value = [&](const std::optional<Limit>& limit) { return *left[index_of(*limit)]; };
    for (const LimitDefinition& definition : limit_definitions) {
        const auto& mine = left[index_of(definition.limit)];
        if (!mine) continue;
        if (!ranking.governing || *mine < value(ranking.governing) * tie) {
            ranking = {definition.limit, ranking.governing};
        } else if (!ranking.next || *mine < value(ranking.next) * tie) {
            ranking.next = definition.limit;
        }
    }
    return ranking;
}

} // namespace spanledger
