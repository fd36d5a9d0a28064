// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/beam_effects.hpp"
#include "spanledger/number/plain.hpp"

// EN 1993-1-3:2006 6.1.5 and 6.1.10: shear of a web without longitudinal stiffeners, and bending with shear.

namespace spanledger::en1993_1_3 {

template <class N> struct Web {
    N h_w;  ///< between the mid-lines of the flanges, mm
    N t;    ///< mm
    N f_yb; ///< MPa
    N E;    ///< MPa
};

/// (6.10a): λw = 0.346 (h_w/t) sqrt(f_yb/E)
template <class N> N web_slenderness(const Web<N>& web) {
    return named("lambda_w", "-", "EN 1993-1-3 (6.10a)", 0.346 * web.h_w / web.t * root(web.f_yb / web.E));
}

/// Table 6.1, web without stiffening at the support, MPa
template <class N> N shear_strength_unstiffened(const Web<N>& web) {
    const N lambda = web_slenderness(web);
    return named("f_bv", "MPa", "EN 1993-1-3 Table 6.1", select(lambda <= N(0.83), 0.58 * web.f_yb, [&] {
                     return select(lambda < N(1.40), 0.48 * web.f_yb / lambda, 0.67 * web.f_yb / squared(lambda));
                 }));
}

/// Table 6.1, web with stiffening at the support, such as cleats, MPa
template <class N> N shear_strength_stiffened(const Web<N>& web) {
    const N lambda = web_slenderness(web);
    return named("f_bv", "MPa", "EN 1993-1-3 Table 6.1",
                 select(lambda <= N(0.83), 0.58 * web.f_yb, 0.48 * web.f_yb / lambda));
}

/// (6.8): V_b,Rd = h_w t f_bv/γM0 for a vertical web, N
template <class N> N shear_resistance(const Web<N>& web, const N& f_bv, const N& gamma_M0) {
    return named("V_b_Rd", "N", "EN 1993-1-3 (6.8)", web.h_w * web.t * f_bv / gamma_M0);
}

/// Resistances that interact.
template <class N> struct BendingAndShear {
    N M_c; ///< N mm
    N V_b; ///< N
};

/// (6.27) with the whole bracket, on the safe side: M/M_c + (2V/V_b - 1)2, the second term where V > V_b/2; the largest
/// over all sections with V > V_b/2, 0 where there are none.
///
/// F stands where it is worst for the section: just beyond it, which gives the largest moment and the largest shear
/// there at once. At x from the nearer support M = (q/2 + F/L) x (L - x) and V = q(L/2 - x) + F(1 - x/L). With x_e,
/// where V = V_b/2, the left side f(x) is a parabola on [0, x_e]. Its slope at x_e is that of M alone, not negative up
/// to mid-span. If it is concave it therefore rises all the way to x_e; if it is convex its largest value is at an end.
/// Either way f(0) or f(x_e) is the largest. (Where V > V_b/2 even at mid-span, F > V_b and shear fails at any span;
/// x_e is then kept at mid-span.)
template <class N> N bending_with_shear(const beam::Load<N>& load, const N& L, const BendingAndShear<N>& resistance) {
    const N half = named("V_b/2", "N", "EN 1993-1-3 6.1.10", resistance.V_b / 2.0);
    const N V_0 = beam::simply_supported::shear(load, L);
    const N x_e = named("x_e", "mm", "beam theory",
                        L * least(greatest((V_0 - half) / greatest(load.q * L + load.F, half), N(0.0)), N(0.5)));
    const N M_e = named("M_e", "Nmm", "beam theory", (load.q / 2.0 + load.F / L) * x_e * (L - x_e));
    const N V_e = named("V_e", "N", "beam theory", V_0 - (load.q + load.F / L) * x_e);
    const N at_support = squared(greatest(V_0 / half - 1.0, N(0.0)));
    const N at_x_e = M_e / resistance.M_c + squared(greatest(V_e / half - 1.0, N(0.0)));
    return named("eta_MV", "-", "EN 1993-1-3 6.1.10", greatest(at_support, at_x_e));
}

} // namespace spanledger::en1993_1_3
