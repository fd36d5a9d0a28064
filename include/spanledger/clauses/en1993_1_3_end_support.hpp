// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1993-1-3:2006 6.1.7.2: transverse resistance of a single vertical web at an end support, flanges with lips, the
// bearing within 1.5 h_w of the free end.

namespace spanledger::en1993_1_3 {

template <class N> struct EndSupport {
    N h_w;  ///< between the mid-lines of the flanges, mm
    N t;    ///< mm
    N r;    ///< inner radius of the corners, mm
    N f_yb; ///< MPa
    N gamma_M1;
};

/// (6.15a) without its last bracket: k1 k2 k3 (9.04 - (h_w/t)/60) t2 f_yb/γM1, N; k3 = 1 for a vertical web
template <class N> N end_support_base(const EndSupport<N>& x) {
    const N k = named("k", "-", "EN 1993-1-3 6.1.7.2(3)", x.f_yb / 228.0);
    const N k_1 = named("k_1", "-", "EN 1993-1-3 6.1.7.2(3)", 1.33 - 0.33 * k);
    const N k_2 = named("k_2", "-", "EN 1993-1-3 6.1.7.2(3)", least(greatest(1.15 - 0.15 * x.r / x.t, N(0.5)), N(1.0)));
    return named("R_w_0", "N", "EN 1993-1-3 (6.15a)",
                 k_1 * k_2 * (9.04 - x.h_w / x.t / 60.0) * squared(x.t) * x.f_yb / x.gamma_M1);
}

/// (6.15a): R_w,Rd = R_w,0 (1 + 0.01 s_s/t), N
template <class N> N end_support_resistance(const N& base, const N& s_s, const N& t) {
    return named("R_w_Rd", "N", "EN 1993-1-3 (6.15a)", base * (1.0 + 0.01 * s_s / t));
}

} // namespace spanledger::en1993_1_3
