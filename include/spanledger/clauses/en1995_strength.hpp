// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1995-1-1:2004+A1+A2, sections 2.4.1 and 3: design strengths and size factors. Strengths in MPa.

namespace spanledger::en1995 {

/// (2.14): Xd = kmod Xk/γM
template <class N> N design_strength(const N& k_mod, const N& X_k, const N& gamma_M) {
    return named("X_d", "MPa", "EN 1995-1-1 (2.14)", k_mod * X_k / gamma_M);
}

/// What a size factor needs: the reference depth and exponent of the material, and the cap.
template <class N> struct SizeFactor {
    N reference_depth; ///< mm: 150 solid, 600 glulam, 300 LVL
    N exponent;        ///< 0.2 solid, 0.1 glulam, s of EN 14374 for LVL
    N cap;             ///< 1.3 solid, 1.1 glulam, 1.2 LVL
};

/// (3.1) and (3.2): kh = min((h0/h)^e, cap) for h < h0, else 1
template <class N> N size_factor_below_reference_depth(const SizeFactor<N>& rule, const N& h) {
    return named(
        "k_h", "-", "EN 1995-1-1 (3.1), (3.2)",
        select(h < rule.reference_depth, least(power(rule.reference_depth / h, rule.exponent), rule.cap), N(1.0)));
}

/// (3.3): kh = min((300/h)^s, 1.2) for LVL edgewise; below 1 for deeper members
template <class N> N size_factor_lvl(const SizeFactor<N>& rule, const N& h) {
    return named("k_h", "-", "EN 1995-1-1 (3.3)", least(power(rule.reference_depth / h, rule.exponent), rule.cap));
}

/// G0,05 in proportion to E0,05/E0,mean where the product standard does not tabulate it, MPa
template <class N> N fifth_percentile_shear_modulus(const N& G_mean, const N& E_0_05, const N& E_0_mean) {
    return named("G_0_05", "MPa", "EN 384", G_mean * E_0_05 / E_0_mean);
}

} // namespace spanledger::en1995
