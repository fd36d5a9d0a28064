// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/lipped_channel.hpp"
#include "spanledger/number/plain.hpp"

// EN 1993-1-3:2006 6.1.4.1: bending resistance of a joist whose compression flange is held. Moduli go to the mid-lines
// of the flanges; mm3.

namespace spanledger::en1993_1_3 {

/// W = I/z of the further flange; I in mm4 as the corners leave it
template <class N> N section_modulus(const lipped_channel::Properties<N>& section, const N& I) {
    return I / greatest(section.z_c, section.z_t);
}

/// W_eff is never taken above W_el, so that no plastic reserve is counted.
template <class N> N effective_modulus(const N& W_eff, const N& W_el) {
    return named("W_eff", "mm3", "EN 1993-1-3 6.1.4.1", least(W_eff, W_el));
}

/// (6.4): M_c,Rd = W_eff f_yb/γM0, N mm
template <class N> N moment_resistance(const N& W_eff, const N& f_yb, const N& gamma_M0) {
    return named("M_c_Rd", "Nmm", "EN 1993-1-3 (6.4)", W_eff * f_yb / gamma_M0);
}

/// 5.1(3): whether corners may be taken as sharp in resistance: r <= 5t and r <= 0.10 b_p of the web and both flanges;
/// otherwise I is multiplied by 1 - 2δ (5.1(4)).
template <class N>
N resistance_corner_factor(const lipped_channel::MidLine<N>& x, const N& r, const N& stiffness_factor) {
    const N narrowest = named("b_p_min", "mm", "EN 1993-1-3 5.1(3)", least(x.h_p, least(x.b_p1, x.b_p2)));
    return named("corner factor", "-", "EN 1993-1-3 5.1(3), (4)",
                 select(both(r <= 5.0 * x.t, r <= 0.10 * narrowest), N(1.0), stiffness_factor));
}

} // namespace spanledger::en1993_1_3
