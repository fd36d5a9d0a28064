// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1993-1-3:2006 5.5.2 and EN 1993-1-5:2006 4.4: effective widths of plane elements without stiffeners. Stress ratio
// ψ is the stress at the less compressed edge over that at the more compressed edge.

namespace spanledger::en1993_1_3 {

/// ε = sqrt(235/fyb)
template <class N> N yield_ratio(const N& f_yb) {
    return named("epsilon", "-", "EN 1993-1-5 4.4(2)", root(235.0 / f_yb));
}

template <class N> struct Plate {
    N width; ///< mm
    N t;     ///< mm
    N epsilon;
};

/// λp = (b/t)/(28.4 ε sqrt(kσ))
template <class N> N plate_slenderness(const Plate<N>& plate, const N& k_sigma) {
    return named("lambda_p", "-", "EN 1993-1-5 4.4(2)", plate.width / plate.t / (28.4 * plate.epsilon * root(k_sigma)));
}

/// (4.2): ρ = (λp - 0.055(3 + ψ))/λp2 <= 1, internal elements
template <class N> N internal_reduction(const N& lambda_p, const N& psi) {
    return named("rho", "-", "EN 1993-1-5 (4.2)", select(lambda_p <= N(0.673), N(1.0), [&] {
                     return least(N(1.0), (lambda_p - 0.055 * (3.0 + psi)) / squared(lambda_p));
                 }));
}

/// (4.3): ρ = (λp - 0.188)/λp2 <= 1, outstand elements
template <class N> N outstand_reduction(const N& lambda_p) {
    return named("rho", "-", "EN 1993-1-5 (4.3)", select(lambda_p <= N(0.748), N(1.0), [&] {
                     return least(N(1.0), (lambda_p - 0.188) / squared(lambda_p));
                 }));
}

/// Table 4.1, internal elements in bending, ψ < 0: 7.81 - 6.29 ψ + 9.78 ψ2, and 5.98(1 - ψ)2 below -1. A symmetric and
/// fully effective channel has -1 but for the last digits: there, where the table gives 23.9, the first of both counts,
/// which is the lower.
template <class N> N web_buckling_factor(const N& psi) {
    return named("k_sigma_w", "-", "EN 1993-1-5 Table 4.1",
                 select(psi >= N(-1.0 - 1e-9), 7.81 - 6.29 * psi + 9.78 * squared(psi), 5.98 * squared(1.0 - psi)));
}

/// (5.13b), (5.13c): kσ of a single edge fold, up to c_p/b_p = 0.6
template <class N> N lip_buckling_factor(const N& c_p, const N& b_p) {
    const N ratio = named("c_p/b_p", "-", "EN 1993-1-3 5.5.3.2(5)", c_p / b_p);
    return named("k_sigma_c", "-", "EN 1993-1-3 (5.13b), (5.13c)", select(ratio <= N(0.35), N(0.5), [&] {
                     return 0.5 + 0.83 * power(greatest(ratio - 0.35, N(0.0)), 2.0 / 3.0);
                 }));
}

} // namespace spanledger::en1993_1_3
