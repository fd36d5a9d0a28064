// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1995-1-1:2004+A1+A2, 7.3.3: residential floors, and the UK national annex NA.2.6. Internal units: mm, N, kg; areal
// mass in kg/mm2, so that 1000 turns N into kg mm/s2 where a formula mixes both.

namespace spanledger::en1995 {

template <class N> struct FloorStrip {
    N EI_l; ///< stiffness of the floor along the joists, N mm2 per metre width
    N EI_b; ///< across the joists, N mm2 per metre
    N mass; ///< kg/mm2
};

/// (7.5): f1 = π/(2L2) sqrt((EI)l/m), Hz. (EI)l is per metre width, hence per mm it is a thousandth.
template <class N> N first_frequency(const FloorStrip<N>& floor, const N& L) {
    return named("f_1", "Hz", "EN 1995-1-1 (7.5)", 1.5707963267948966 / squared(L) * root(floor.EI_l / floor.mass));
}

/// What the deflection under a concentrated force of 1 kN needs.
template <class N> struct UnitLoad {
    N k_dist; ///< share of 1 kN on one joist; 1 with the recommended rule
    N k_amp;  ///< shear and joint flexibility; 1 with the recommended rule
    N EI;     ///< of one joist, N mm2
};

/// w(1 kN) = kdist kamp 1000 L3/(48 EI), mm
template <class N> N unit_load_deflection(const UnitLoad<N>& x, const N& L) {
    return named("w_1kN", "mm", "EN 1995-1-1 (7.3); UK NA.2.6", x.k_dist * x.k_amp * 1000.0 * cubed(L) / (48.0 * x.EI));
}

/// (7.7): n40, the number of modes below 40 Hz; 0 where f1 is 40 Hz or more
template <class N> N modes_below_40_hz(const FloorStrip<N>& floor, const N& f_1, const N& width_over_span) {
    const N above = named("(40/f_1)^2 - 1", "-", "EN 1995-1-1 (7.7)", greatest(squared(40.0 / f_1) - 1.0, N(0.0)));
    const N stiffness_ratio =
        named("(EI)_l/(EI)_b", "-", "EN 1995-1-1 (7.7)", floor.EI_l / least(floor.EI_b, floor.EI_l));
    return named("n_40", "-", "EN 1995-1-1 (7.7)", power(above * fourth(width_over_span) * stiffness_ratio, 0.25));
}

/// (7.6): v = 4(0.4 + 0.6 n40)/(m B L + 200), m/(N s2); `modal_mass` is m B L in kg
template <class N> N velocity_response(const N& n_40, const N& modal_mass) {
    return named("v", "m/(N s2)", "EN 1995-1-1 (7.6)", 4.0 * (0.4 + 0.6 * n_40) / (modal_mass + 200.0));
}

/// (7.4): the limit b^(f1 ζ - 1), m/(N s2)
template <class N> N velocity_limit(const N& b, const N& f_1, const N& zeta) {
    return named("v_lim", "m/(N s2)", "EN 1995-1-1 (7.4)", power(b, f_1 * zeta - 1.0));
}

} // namespace spanledger::en1995

namespace spanledger::uk {

template <class N> struct LoadSharing {
    N k_strut; ///< 0.97 with strutting, else 1
    N EI_b;    ///< N mm2 per metre
    N spacing; ///< mm
    N floor;   ///< least value, 0.30
};

/// NA.2.6.2: kdist = max(kstrut (0.38 - 0.08 ln(14 (EI)b/s4)), 0.30), at most 1
template <class N> N distribution_factor(const LoadSharing<N>& x) {
    const N share = named("k_dist_0", "-", "UK NA to EN 1995-1-1 NA.2.6.2",
                          x.k_strut * (0.38 - 0.08 * ln(14.0 * x.EI_b / fourth(x.spacing))));
    return named("k_dist", "-", "UK NA to EN 1995-1-1 NA.2.6.2", least(N(1.0), greatest(x.floor, share)));
}

template <class N> struct UnitLoadLimit {
    N short_limit;   ///< 1.8 mm
    N short_span;    ///< 4000 mm
    N long_factor;   ///< 16500
    N long_exponent; ///< 1.1
};

/// Table NA.5: a = 1.8 mm up to 4 m, 16500/L^1.1 above (L in mm)
template <class N> N unit_load_limit(const UnitLoadLimit<N>& x, const N& L) {
    return named("a", "mm", "UK NA to EN 1995-1-1 Table NA.5",
                 select(L <= x.short_span, x.short_limit, [&] { return x.long_factor / power(L, x.long_exponent); }));
}

/// Table NA.5 and figure 7.2: b = 180 - 60a up to a = 1, 160 - 40a above, kept within 50 and 150
template <class N> N velocity_base(const N& a) {
    const N b =
        named("b_0", "-", "UK NA to EN 1995-1-1 Table NA.5", select(a <= N(1.0), 180.0 - 60.0 * a, 160.0 - 40.0 * a));
    return named("b", "-", "UK NA to EN 1995-1-1 Table NA.5", least(greatest(b, N(50.0)), N(150.0)));
}

} // namespace spanledger::uk
