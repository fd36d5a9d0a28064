// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1995-1-1:2004+A1+A2, 6.1.5: compression perpendicular to the grain at an end support without overhang.

namespace spanledger::en1995 {

/// lef = t + min(30 mm, t): the contact length may be taken longer on the side of the span, mm
template <class N> N contact_length(const N& t, const N& extra) {
    return named("l_ef_90", "mm", "EN 1995-1-1 6.1.5(1)", t + least(extra, t));
}

/// σc,90,d = Rd/(b lef), MPa
template <class N> N bearing_stress(const N& R_d, const N& width, const N& l_ef) {
    return named("sigma_c_90_d", "MPa", "EN 1995-1-1 (6.4)", R_d / (width * l_ef));
}

/// A joist on discrete supports.
template <class N> struct DiscreteSupport {
    N k_c_90;
    N t; ///< bearing length, mm
    N h; ///< depth, mm
};

/// 6.1.5(4): kc,90 on discrete supports counts only where the clear distance L - t is at least 2h. Written in L, so
/// that a span of just 2h is not lost in the last digit.
template <class N> N bearing_factor(const DiscreteSupport<N>& x, const N& L) {
    return named("k_c_90", "-", "EN 1995-1-1 6.1.5(4)", select(L >= 2.0 * x.h + x.t, x.k_c_90, N(1.0)));
}

/// The same for glulam, which also needs a contact length of at most 400 mm.
template <class N> N bearing_factor_glulam(const DiscreteSupport<N>& x, const N& greatest_t, const N& L) {
    return named("k_c_90", "-", "EN 1995-1-1 6.1.5(4)",
                 select(both(L >= 2.0 * x.h + x.t, x.t <= greatest_t), x.k_c_90, N(1.0)));
}

} // namespace spanledger::en1995
