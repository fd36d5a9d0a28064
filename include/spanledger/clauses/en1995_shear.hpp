// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/beam_effects.hpp"
#include "spanledger/number/plain.hpp"

// EN 1995-1-1:2004+A1+A2, 6.1.7: shear of a rectangle, and which loads near a support may be left out.

namespace spanledger::en1995 {

/// τd = 1.5 Vd/(kcr b h), MPa; `width` is the whole breadth of all plies, mm
template <class N> struct ShearArea {
    N width;
    N h;
    N k_cr; ///< 6.1.7(2)
};

template <class N> N shear_stress(const N& V_d, const ShearArea<N>& area) {
    return named("tau_d", "MPa", "EN 1995-1-1 6.1.7", 1.5 * V_d / (area.k_cr * area.width * area.h));
}

/// Where a joist stands on its support.
template <class N> struct SupportGeometry {
    N t; ///< bearing length, mm
    N h; ///< depth, mm
};

/// 6.1.7(3): a concentrated load within h of the support edge is left out, so it counts from there: F(L - t/2 - h)/L
template <class N> N concentrated_shear_beyond_depth(const N& F, const N& L, const SupportGeometry<N>& support) {
    return named("V_F", "N", "EN 1995-1-1 6.1.7(3)", F * greatest(L - support.t / 2.0 - support.h, N(0.0)) / L);
}

/// National choice: uniform load within h of the face of the support is left out: q(L/2 - t/2 - h)
template <class N> N uniform_shear_beyond_depth(const N& q, const N& L, const SupportGeometry<N>& support) {
    return named("V_q", "N", "national choice to EN 1995-1-1 6.1.7",
                 q * greatest(L / 2.0 - support.t / 2.0 - support.h, N(0.0)));
}

} // namespace spanledger::en1995
