// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

namespace spanledger {

/// A deflection limit as a ratio L/n, a length, or both.
template <class N> struct DeflectionCriteria {
    bool has_ratio;
    bool has_length;
    const N& ratio;
    const N& length; ///< mm
};

/// Calls out(demand, resistance) for the ratio, then for the length, whichever there are.
template <class N, class Out>
void deflection_checks(const N& w, const DeflectionCriteria<N>& criteria, const N& L, Out& out) {
    if (criteria.has_ratio) out(w, named("w_lim", "mm", "EN 1990 A1.4.3", L / criteria.ratio));
    if (criteria.has_length) out(w, criteria.length);
}

} // namespace spanledger
