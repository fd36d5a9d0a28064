// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/rolled_section.hpp"
#include "spanledger/number/plain.hpp"

// EN 1993-1-1:2005 6.2.6: shear of rolled sections, load parallel to the web; EN 1993-1-5:2006 5 where the web may
// buckle.

namespace spanledger::en1993 {

/// 6.2.6(3)a: A_v = A - 2 b t_f + (t_w + 2r) t_f, at least η h_w t_w, of an I or H section, mm2
template <class N> N shear_area_of_i_section(const rolled_section::Size<N>& x, const N& A, const N& eta) {
    return named(
        "A_v", "mm2", "EN 1993-1-1 6.2.6(3)a",
        greatest(A - 2.0 * x.b * x.t_f + (x.t_w + 2.0 * x.r) * x.t_f, eta * rolled_section::web_depth(x) * x.t_w));
}

/// 6.2.6(3)b: A_v = A - 2 b t_f + (t_w + r) t_f of a channel, mm2
template <class N> N shear_area_of_channel(const rolled_section::Size<N>& x, const N& A) {
    return named("A_v", "mm2", "EN 1993-1-1 6.2.6(3)b", A - 2.0 * x.b * x.t_f + (x.t_w + x.r) * x.t_f);
}

/// (6.18): V_pl,Rd = A_v (f_y/sqrt(3))/γM0, N
template <class N> N plastic_shear_resistance(const N& A_v, const N& f_y, const N& gamma_M0) {
    return named("V_pl_Rd", "N", "EN 1993-1-1 (6.18)", A_v * f_y / (1.7320508075688772 * gamma_M0));
}

/// What shear buckling of a web without intermediate stiffeners needs.
template <class N> struct Web {
    N h_w; ///< between the flanges, mm
    N t_w; ///< mm
    N f_y; ///< MPa
    N eps;
    N eta;
};

/// EN 1993-1-5 (5.5): λw = h_w/(86.4 t ε), stiffeners at the supports only
template <class N> N web_slenderness(const Web<N>& x) {
    return named("lambda_w", "-", "EN 1993-1-5 (5.5)", x.h_w / (86.4 * x.t_w * x.eps));
}

/// EN 1993-1-5 (5.2), Table 5.1 without rigid end post, for λw >= 0.83/η: V_bw,Rd = (0.83/λw) f_yw h_w t/(sqrt(3) γM1),
/// N
template <class N> N web_buckling_resistance(const Web<N>& x, const N& gamma_M1) {
    const N chi_w = named("chi_w", "-", "EN 1993-1-5 Table 5.1", 0.83 / web_slenderness(x));
    return named("V_bw_Rd", "N", "EN 1993-1-5 (5.2)", chi_w * x.f_y * x.h_w * x.t_w / (1.7320508075688772 * gamma_M1));
}

/// 6.2.6(6): where h_w/t_w > 72 ε/η the web may buckle in shear, and the smaller resistance counts, N
template <class N> N shear_resistance(const N& V_pl_Rd, const Web<N>& web, const N& gamma_M1) {
    return named("V_c_Rd", "N", "EN 1993-1-1 6.2.6(1), (6)",
                 select(
                     web.h_w / web.t_w > 72.0 * web.eps / web.eta,
                     [&] { return least(V_pl_Rd, web_buckling_resistance(web, gamma_M1)); }, V_pl_Rd));
}

} // namespace spanledger::en1993
