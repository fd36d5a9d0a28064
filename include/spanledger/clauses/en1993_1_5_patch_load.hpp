// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1993-1-5:2006 6: web under the reaction of a support at the end of a joist, type (c) of figure 6.1, web without
// stiffener, the load beginning at the end of the joist (c = 0).

namespace spanledger::en1993_1_5 {

template <class N> struct PatchedWeb {
    N h_w; ///< between the flanges, mm
    N t_w; ///< mm
    N t_f; ///< mm
    N b_f; ///< mm
    N f_y; ///< MPa, of web and flange
    N E;   ///< MPa
};

/// 6.3(1): s_s, at most h_w, mm
template <class N> N loaded_length(const N& t, const N& h_w) {
    return named("s_s", "mm", "EN 1993-1-5 6.3(1)", least(t, h_w));
}

/// Figure 6.1 (c): k_F = 2 + 6 (s_s + c)/h_w <= 6
template <class N> N buckling_coefficient(const PatchedWeb<N>& x, const N& s_s) {
    return named("k_F", "-", "EN 1993-1-5 figure 6.1", least(2.0 + 6.0 * s_s / x.h_w, N(6.0)));
}

/// (6.5): F_cr = 0.9 k_F E t_w3/h_w, N
template <class N> N critical_load(const PatchedWeb<N>& x, const N& k_F) {
    return named("F_cr", "N", "EN 1993-1-5 (6.5)", 0.9 * k_F * x.E * cubed(x.t_w) / x.h_w);
}

/// (6.8): m1 = f_yf b_f/(f_yw t_w)
template <class N> N flange_parameter(const PatchedWeb<N>& x) {
    return named("m_1", "-", "EN 1993-1-5 (6.8)", x.b_f / x.t_w);
}

/// (6.9) where λF > 0.5: m2 = 0.02 (h_w/t_f)2
template <class N> N web_parameter(const PatchedWeb<N>& x) {
    return named("m_2", "-", "EN 1993-1-5 (6.9)", 0.02 * squared(x.h_w / x.t_f));
}

/// What the effective loaded length depends on besides the web.
template <class N> struct PatchLoad {
    N s_s; ///< mm
    N k_F;
    N m_2; ///< (6.9), or 0
};

/// (6.13): l_e = k_F E t_w2/(2 f_yw h_w) <= s_s + c, mm
template <class N> N effective_edge_length(const PatchedWeb<N>& x, const PatchLoad<N>& load) {
    return named("l_e", "mm", "EN 1993-1-5 (6.13)",
                 least(load.k_F * x.E * squared(x.t_w) / (2.0 * x.f_y * x.h_w), load.s_s));
}

/// 6.5(3): l_y, the least of (6.10), (6.11) and (6.12), mm
template <class N> N effective_loaded_length(const PatchedWeb<N>& x, const PatchLoad<N>& load) {
    const N m_1 = flange_parameter(x);
    const N l_e = effective_edge_length(x, load);
    const N over_patch =
        named("l_y_1", "mm", "EN 1993-1-5 (6.10)", load.s_s + 2.0 * x.t_f * (1.0 + root(m_1 + load.m_2)));
    const N at_edge =
        named("l_y_2", "mm", "EN 1993-1-5 (6.11)", l_e + x.t_f * root(m_1 / 2.0 + squared(l_e / x.t_f) + load.m_2));
    const N beyond = named("l_y_3", "mm", "EN 1993-1-5 (6.12)", l_e + x.t_f * root(m_1 + load.m_2));
    return named("l_y", "mm", "EN 1993-1-5 6.5(3)", least(over_patch, least(at_edge, beyond)));
}

/// (6.4): λF = sqrt(l_y t_w f_yw/F_cr)
template <class N> N patch_slenderness(const PatchedWeb<N>& x, const N& l_y, const N& F_cr) {
    return named("lambda_F", "-", "EN 1993-1-5 (6.4)", root(l_y * x.t_w * x.f_y / F_cr));
}

/// (6.1), (6.2), (6.3): F_Rd = χF l_y t_w f_yw/γM1, χF = 0.5/λF <= 1, N. Where λF with m2 is at most 0.5, m2 is 0.
template <class N> N end_patch_resistance(const PatchedWeb<N>& x, const N& t, const N& gamma_M1) {
    const N s_s = loaded_length(t, x.h_w);
    const N k_F = buckling_coefficient(x, s_s);
    const N F_cr = critical_load(x, k_F);
    const N m_2 = web_parameter(x);
    const N lambda_with_m_2 = named("lambda_F_m", "-", "EN 1993-1-5 (6.4), (6.9)",
                                    patch_slenderness(x, effective_loaded_length<N>(x, {s_s, k_F, m_2}), F_cr));
    const N m_2_used = named("m_2_used", "-", "EN 1993-1-5 (6.9)", select(lambda_with_m_2 > N(0.5), m_2, N(0.0)));
    const N l_y = effective_loaded_length<N>(x, {s_s, k_F, m_2_used});
    const N chi_F = named("chi_F", "-", "EN 1993-1-5 (6.3)", least(0.5 / patch_slenderness(x, l_y, F_cr), N(1.0)));
    return named("F_Rd", "N", "EN 1993-1-5 (6.1)", chi_F * l_y * x.t_w * x.f_y / gamma_M1);
}

} // namespace spanledger::en1993_1_5
