// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/beam_effects.hpp"
#include "spanledger/number/plain.hpp"

// EN 1993-1-1:2005 6.2.8: where V > V_Rd/2 the web has less to give in bending. V_Rd is V_pl,Rd, or the resistance of a
// web that buckles in shear (6.2.8(2)).
//
// Which section of a simply supported joist is worst. A concentrated load stands where it is worst for the section
// looked at, which is at that section for M and V alike, so at x from the support
//     M(x) = x (L - x)(q/2 + F/L),    V(x) = V_0 - (q + F/L) x,    V_0 = qL/2 + F.
// V falls along the half span, to V_Rd at x_1 (0 where V_0 <= V_Rd) and to V_Rd/2 at x_2; beyond x_2 nothing is
// reduced. Before x_1 the reduction is whole and M grows, so x_1 is worst there. Between both, M <= k M_V, for any k,
// reads Q(x) = M - k M_V <= 0 with a quadratic Q. If Q is convex its greatest value is at an end. If it is concave, its
// slope at x_2, which is M' there since M_V is level, is not negative as long as x_2 <= L/2, so Q grows and is greatest
// at x_2. Hence no section exceeds both x_1 and x_2. x_2 > L/2 needs F > V_Rd: the shear limit then fails at every
// span.

namespace spanledger::en1993 {

/// A section's own resistances, and what the web contributes.
template <class N> struct WebInBending {
    N W_y;  ///< mm3
    N A_w;  ///< h_w t_w, mm2
    N t_w;  ///< mm
    N V_Rd; ///< N
};

/// ρ = (2V/V_Rd - 1)2 where V > V_Rd/2; whole from V_Rd on, where the shear limit fails
template <class N> N shear_reduction(const N& V, const N& V_Rd) {
    return named("rho", "-", "EN 1993-1-1 6.2.8(3)", squared(least(greatest(2.0 * V / V_Rd - 1.0, N(0.0)), N(1.0))));
}

/// (6.30): M_V,Rd = (W - ρ A_w2/(4 t_w)) f_y/γM0, N mm
template <class N>
N moment_resistance_with_shear(const WebInBending<N>& x, const N& rho, const N& design_yield_strength) {
    return named("M_V_Rd", "Nmm", "EN 1993-1-1 (6.30)",
                 (x.W_y - rho * squared(x.A_w) / (4.0 * x.t_w)) * design_yield_strength);
}

/// x from the support at which V of a simply supported joist has fallen to `V`, at most L/2; 0 where it is never above,
/// mm
template <class N> N section_with_shear(const beam::Load<N>& load, const N& L, const N& V) {
    const N V_0 = beam::simply_supported::shear(load, L);
    return named("x_V", "mm", "beam theory",
                 L / 2.0 * least(greatest(V_0 - V, N(0.0)) / (greatest(V_0, V) - load.F / 2.0), N(1.0)));
}

/// M(x) = x (L - x)(q/2 + F/L), F at the section, N mm
template <class N> N moment_at(const beam::Load<N>& load, const N& L, const N& x) {
    return named("M_x", "Nmm", "beam theory", x * (L - x) * (load.q / 2.0 + load.F / L));
}

} // namespace spanledger::en1993
