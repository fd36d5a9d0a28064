// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1993-1-1:2005 6.3.2: lateral torsional buckling of rolled I and H sections whose compression flange is free.

namespace spanledger::en1993 {

template <class N> struct LateralStiffness {
    N E;   ///< MPa
    N G;   ///< MPa
    N I_z; ///< mm4
    N I_t; ///< mm4
    N I_w; ///< mm6
};

/// Form of the moment diagram and height of the load.
template <class N> struct LateralLoading {
    N C_1;
    N C_2;
    N z_g; ///< of the load above the shear centre, mm
};

/// N_cr,z = π2 E I_z/l2, N
template <class N> N weak_axis_critical_load(const LateralStiffness<N>& x, const N& l) {
    constexpr double pi_squared = 9.869604401089358;
    return named("N_cr_z", "N", "Euler", pi_squared * x.E * x.I_z / squared(l));
}

/// M_cr = C1 N_cr,z [sqrt(I_w/I_z + G I_t/N_cr,z + (C2 z_g)2) - C2 z_g] of a doubly symmetric section whose ends are
/// held against twist and free to warp, N mm
template <class N> N critical_moment(const LateralStiffness<N>& x, const LateralLoading<N>& loading, const N& l) {
    const N N_cr = weak_axis_critical_load(x, l);
    const N height = named("C_2 z_g", "mm", "NCCI, elastic critical moment", loading.C_2 * loading.z_g);
    return named("M_cr", "Nmm", "NCCI, elastic critical moment",
                 loading.C_1 * N_cr * (root(x.I_w / x.I_z + x.G * x.I_t / N_cr + squared(height)) - height));
}

/// λ_LT = sqrt(W_y f_y/M_cr)
template <class N> N lateral_slenderness(const N& W_y, const N& f_y, const N& M_cr) {
    return named("lambda_LT", "-", "EN 1993-1-1 6.3.2.2(1)", root(W_y * f_y / M_cr));
}

/// Tables 6.4 and 6.5 with 6.3: imperfection factor by h/b of a rolled section.
template <class N> struct LateralCurves {
    N h_b_1;   ///< greatest h/b of the first curve
    N h_b_2;   ///< greatest h/b of the second
    N alpha_1; ///< imperfection factors
    N alpha_2;
    N alpha_3;
};

template <class N> N imperfection_factor(const LateralCurves<N>& curves, const N& h_b) {
    return named("alpha_LT", "-", "EN 1993-1-1 Tables 6.3 to 6.5", select(h_b <= curves.h_b_1, curves.alpha_1, [&] {
                     return select(h_b <= curves.h_b_2, curves.alpha_2, curves.alpha_3);
                 }));
}

/// Where a buckling curve begins, and its shape.
template <class N> struct LateralCurve {
    N alpha;    ///< imperfection factor
    N lambda_0; ///< 0.2 in the general case, 0.4 recommended for rolled sections
    N beta;     ///< 1 in the general case, 0.75 recommended for rolled sections
};

/// 6.3.2.2: the curve of the general case
template <class N> LateralCurve<N> general_case(const N& alpha) {
    return {alpha, N(0.2), N(1.0)};
}

/// Φ_LT = 0.5 (1 + α(λ - λ_LT,0) + βλ2)
template <class N> N buckling_parameter(const N& lambda, const LateralCurve<N>& curve) {
    return named("Phi_LT", "-", "EN 1993-1-1 6.3.2.2(1), 6.3.2.3(1)",
                 0.5 * (1.0 + curve.alpha * (lambda - curve.lambda_0) + curve.beta * squared(lambda)));
}

/// (6.56), (6.57): χ_LT = 1/(Φ + sqrt(Φ2 - βλ2)) <= 1 and <= 1/λ2, which in the general case it is anyhow
template <class N> N reduction_factor(const N& lambda, const LateralCurve<N>& curve) {
    const N Phi = buckling_parameter(lambda, curve);
    const N chi = 1.0 / (Phi + root(greatest(squared(Phi) - curve.beta * squared(lambda), N(0.0))));
    return named("chi_LT", "-", "EN 1993-1-1 (6.56), (6.57)", least(least(N(1.0), 1.0 / squared(lambda)), chi));
}

/// (6.55): M_b,Rd = χ_LT W_y f_y/γM1, N mm
template <class N> N buckling_resistance(const N& chi_LT, const N& W_y, const N& f_y_over_gamma_M1) {
    return named("M_b_Rd", "Nmm", "EN 1993-1-1 (6.55)", chi_LT * W_y * f_y_over_gamma_M1);
}

} // namespace spanledger::en1993
