// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/results/issue.hpp"

#include <string_view>

namespace spanledger {

/// As in machine-readable results.
[[nodiscard]] constexpr std::string_view status_word(LimitStatus status) noexcept {
    switch (status) {
    case LimitStatus::checked: return "checked";
    case LimitStatus::not_applicable: return "not applicable";
    case LimitStatus::not_covered: break;
    }
    return "not covered";
}

} // namespace spanledger
