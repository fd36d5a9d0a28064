// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1995-1-1:2004+A1+A2, 6.1.6, 6.3.3: bending about the strong axis, and lateral torsional stability.

namespace spanledger::en1995 {

/// σm,d = M/W, MPa
template <class N> N bending_stress(const N& M_d, const N& W) {
    return named("sigma_m_d", "MPa", "EN 1995-1-1 6.1.6", M_d / W);
}

/// Table 6.1: effective length from a fraction of the span (or of the restraint spacing).
template <class N> struct EffectiveLength {
    N length;           ///< span, or spacing of restraints, mm
    N fraction;         ///< 0.9 uniform load, 1.0 constant moment, cantilever 0.5 uniform, 0.8 end force
    N height_allowance; ///< +2h load on the top, 0 at the centroid, -0.5h hanging from the bottom, mm
};

/// lef, never below a tenth of the length, mm
template <class N> N effective_length(const EffectiveLength<N>& x) {
    return named("l_ef", "mm", "EN 1995-1-1 Table 6.1",
                 greatest(x.fraction * x.length + x.height_allowance, 0.1 * x.length));
}

template <class N> struct SlenderRectangle {
    N b;      ///< mm
    N h;      ///< mm
    N E_0_05; ///< MPa
    N G_0_05; ///< MPa
};

/// (6.32): σm,crit = 0.78 b2 E0,05/(h lef), softwood rectangles, MPa
template <class N> N critical_stress_softwood(const SlenderRectangle<N>& x, const N& l_ef) {
    return named("sigma_m_crit", "MPa", "EN 1995-1-1 (6.32)", 0.78 * squared(x.b) * x.E_0_05 / (x.h * l_ef));
}

/// What (6.31) needs besides the rectangle's elastic values.
template <class N> struct TorsionProperties {
    N I_z;   ///< mm4
    N I_tor; ///< mm4
    N W;     ///< mm3
};

/// (6.31): σm,crit = π sqrt(E0,05 Iz G0,05 Itor)/(lef Wy), MPa
template <class N> N critical_stress(const SlenderRectangle<N>& x, const TorsionProperties<N>& section, const N& l_ef) {
    return named("sigma_m_crit", "MPa", "EN 1995-1-1 (6.31)",
                 3.141592653589793 * root(x.E_0_05 * section.I_z * x.G_0_05 * section.I_tor) / (l_ef * section.W));
}

/// (6.30): λrel,m = sqrt(fm,k/σm,crit)
template <class N> N relative_slenderness(const N& f_m_k, const N& sigma_m_crit) {
    return named("lambda_rel_m", "-", "EN 1995-1-1 (6.30)", root(f_m_k / sigma_m_crit));
}

/// The slendernesses at which (6.34) changes its formula. Its value steps there: 1 to 0.9975, and 0.5100 to 0.5102.
inline constexpr double stocky_up_to = 0.75;
inline constexpr double intermediate_up_to = 1.4;

/// (6.34): kcrit
template <class N> N lateral_buckling_factor(const N& lambda) {
    return named("k_crit", "-", "EN 1995-1-1 (6.34)", select(lambda <= N(stocky_up_to), N(1.0), [&] {
                     return select(lambda <= N(intermediate_up_to), 1.56 - 0.75 * lambda, 1.0 / squared(lambda));
                 }));
}

} // namespace spanledger::en1995
