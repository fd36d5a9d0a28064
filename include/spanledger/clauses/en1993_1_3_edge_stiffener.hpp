// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/en1993_1_3_plates.hpp"
#include "spanledger/clauses/lipped_channel.hpp"
#include "spanledger/number/plain.hpp"
#include "spanledger/number/step_names.hpp"

// EN 1993-1-3:2006 5.5.3.1 and 5.5.3.2: distortional buckling of a compression flange with a single edge fold. The part
// of the flange next to the lip and the lip itself are a stiffener, held by a spring that stands for the rest of the
// section.

namespace spanledger::en1993_1_3 {

/// The compression flange and its lip at full yield.
template <class N> struct EdgeStiffenedFlange {
    lipped_channel::MidLine<N> size;
    N lambda_b; ///< slenderness of the flange, simply supported at both edges, kσ = 4
    N lambda_c; ///< slenderness of the lip
    N E;        ///< MPa
    N nu;
    N f_yb; ///< MPa
};

/// Effective widths of the stiffener at some reduction χd, mm
template <class N> struct StiffenerWidths {
    N b_e2;
    N c_eff;
};

/// (5.16): λp,red = λp sqrt(χd); b_e2 = 0.5 ρ b_p, c_eff = ρ c_p
template <class N> StiffenerWidths<N> stiffener_widths(const EdgeStiffenedFlange<N>& flange, const N& chi_d) {
    const N lambda_b = named("lambda_p_b_red", "-", "EN 1993-1-3 (5.16)", flange.lambda_b * root(chi_d));
    const N lambda_c = named("lambda_p_c_red", "-", "EN 1993-1-3 (5.16)", flange.lambda_c * root(chi_d));
    return {
        named("b_e2", "mm", "EN 1993-1-3 5.5.3.2(3)", 0.5 * internal_reduction(lambda_b, N(1.0)) * flange.size.b_p1),
        named("c_eff", "mm", "EN 1993-1-3 (5.13a)", outstand_reduction(lambda_c) * flange.size.c_p)};
}

/// A_s = t(b_e2 + c_eff), mm2
template <class N> N stiffener_area(const StiffenerWidths<N>& x, const N& t) {
    return named("A_s", "mm2", "EN 1993-1-3 (5.14)", t * (x.b_e2 + x.c_eff));
}

/// Second moment of area of the stiffener about its own axis parallel to the flange, mm4
template <class N> N stiffener_second_moment(const StiffenerWidths<N>& x, const N& t) {
    const N a = named("a_s", "mm", "EN 1993-1-3 5.5.3.2", squared(x.c_eff) / (2.0 * (x.b_e2 + x.c_eff)));
    return named("I_s", "mm4", "EN 1993-1-3 5.5.3.2",
                 x.b_e2 * cubed(t) / 12.0 + cubed(x.c_eff) * t / 12.0 + x.b_e2 * t * squared(a) +
                     x.c_eff * t * squared(x.c_eff / 2.0 - a));
}

/// (5.10b) with kf = 0 (the other flange is in tension): K = E t3/(4(1 - ν2)) / (b1^2 hw + b1^3), N/mm2; b1 from the
/// web to the centroid of the stiffener
template <class N> N spring_stiffness(const EdgeStiffenedFlange<N>& flange, const StiffenerWidths<N>& x) {
    const N b_1 =
        named("b_1_s", "mm", "EN 1993-1-3 5.5.3.1(5)", flange.size.b_p1 - squared(x.b_e2) / (2.0 * (x.b_e2 + x.c_eff)));
    return named("K_1", "N/mm2", "EN 1993-1-3 (5.10b)",
                 flange.E * cubed(flange.size.t) / (4.0 * (1.0 - squared(flange.nu))) /
                     (squared(b_1) * flange.size.h_p + cubed(b_1)));
}

/// (5.15): σcr,s = 2 sqrt(K E I_s)/A_s, MPa
template <class N> N critical_stress(const EdgeStiffenedFlange<N>& flange, const StiffenerWidths<N>& x, const N& K) {
    return named("sigma_cr_s", "MPa", "EN 1993-1-3 (5.15)",
                 2.0 * root(K * flange.E * stiffener_second_moment(x, flange.size.t)) /
                     stiffener_area(x, flange.size.t));
}

/// (5.12): χd = 1 up to λd = 0.65, 1.47 - 0.723 λd to 1.38, 0.66/λd from there; never above 1 (at 0.65 the second
/// gives a little more)
template <class N> N distortional_reduction(const N& lambda_d) {
    return select(lambda_d <= N(0.65), N(1.0),
                  [&] { return least(N(1.0), select(lambda_d < N(1.38), 1.47 - 0.723 * lambda_d, 0.66 / lambda_d)); });
}

/// χd and the widths from which it came
template <class N> struct StiffenerStep {
    StiffenerWidths<N> widths;
    N chi_d;
};

template <class N>
StiffenerStep<N> stiffener_step(const EdgeStiffenedFlange<N>& flange, const N& K, const StiffenerStep<N>& before) {
    const StiffenerWidths<N> widths = stiffener_widths(flange, before.chi_d);
    const N sigma_cr = critical_stress(flange, widths, K);
    const N lambda_d = named("lambda_d", "-", "EN 1993-1-3 (5.12d)", root(flange.f_yb / sigma_cr));
    return {widths, distortional_reduction(lambda_d)};
}

/// The effective compression flange: b_e1 next to the web at full thickness, the stiffener at χd t.
template <class N> struct EffectiveFlange {
    N b_e1;
    N b_e2;
    N c_eff;
    N chi_d;
    N K; ///< N/mm2
};

inline constexpr int greatest_stiffener_steps = 50;
inline constexpr auto stiffener_step_symbols = step_names<greatest_stiffener_steps>("chi_d_");
inline constexpr auto stiffener_step_headings = step_names<greatest_stiffener_steps>("Edge stiffener, step ");

/// 5.5.3.2(3) to (10): the spring and b_e1 stay as the first step gives them, χd is refined with the slenderness it
/// leaves. Where it does not settle (χd jumps at λd = 1.38) the step with the smaller χd of the last two counts.
template <class N> EffectiveFlange<N> effective_flange(const EdgeStiffenedFlange<N>& flange) {
    const StiffenerWidths<N> unreduced = stiffener_widths(flange, N(1.0));
    const N K = spring_stiffness(flange, unreduced);
    StiffenerStep<N> before{unreduced, N(1.0)};
    StiffenerStep<N> now = before;
    for (std::size_t i = 0; i < stiffener_step_symbols.size(); ++i) {
        before = now;
        now = under(stiffener_step_headings[i].data(), [&] { return stiffener_step(flange, K, before); });
        now.chi_d = named(stiffener_step_symbols[i].data(), "-", "EN 1993-1-3 (5.12)", now.chi_d);
        if (settled(now.chi_d, before.chi_d)) break;
    }
    const auto last_is_smaller = now.chi_d <= before.chi_d;
    return {
        named("b_e1", "mm", "EN 1993-1-3 5.5.3.2(3)", unreduced.b_e2),
        named("b_e2", "mm", "EN 1993-1-3 5.5.3.2(10)", select(last_is_smaller, now.widths.b_e2, before.widths.b_e2)),
        named("c_eff", "mm", "EN 1993-1-3 5.5.3.2(10)", select(last_is_smaller, now.widths.c_eff, before.widths.c_eff)),
        named("chi_d", "-", "EN 1993-1-3 5.5.3.2(10)", least(now.chi_d, before.chi_d)), K};
}

} // namespace spanledger::en1993_1_3
