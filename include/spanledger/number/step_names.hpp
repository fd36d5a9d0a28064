// SPDX-License-Identifier: MIT
#pragma once

#include <array>
#include <cstddef>
#include <string_view>

namespace spanledger {

inline constexpr std::size_t longest_step_name = 48;
using StepName = std::array<char, longest_step_name>;

/// Names of the steps of an iteration, `prefix` followed by 1, 2, ...: fixed texts that outlive every number so named.
template <std::size_t Count> constexpr std::array<StepName, Count> step_names(std::string_view prefix) {
    static_assert(Count < 100, "a step has at most two digits");
    std::array<StepName, Count> names{};
    for (std::size_t i = 0; i < Count; ++i) {
        std::size_t at = 0;
        for (const char c : prefix) names[i][at++] = c;
        const std::size_t number = i + 1;
        if (number >= 10) names[i][at++] = static_cast<char>('0' + number / 10);
        names[i][at] = static_cast<char>('0' + number % 10);
    }
    return names;
}

} // namespace spanledger
