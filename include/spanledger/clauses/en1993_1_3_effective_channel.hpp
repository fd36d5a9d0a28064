// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/en1993_1_3_edge_stiffener.hpp"
#include "spanledger/clauses/en1993_1_3_plates.hpp"
#include "spanledger/clauses/lipped_channel.hpp"
#include "spanledger/number/plain.hpp"

// EN 1993-1-3:2006 5.5 and EN 1993-1-5:2006 4.4: effective section of a lipped channel bent about its strong axis to
// the yield strength in its compression flange, with sharp corners.

namespace spanledger::en1993_1_3 {

/// The steel as the effective section needs it.
template <class N> struct Steel {
    N f_yb; ///< MPa
    N E;    ///< MPa
    N nu;
};

/// The effective parts of the web: h_1 below the compression flange, h_2 above the tension flange, mm
template <class N> struct EffectiveWeb {
    N h_1;
    N h_2;
};

/// Depth of the web in compression with the effective compression flange and the whole web, mm
template <class N> N compressed_depth(const lipped_channel::MidLine<N>& x, const EffectiveFlange<N>& flange) {
    const N first_moment = x.c_p * (x.h_p - x.c_p / 2.0) + x.b_p2 * x.h_p + squared(x.h_p) / 2.0 +
                           flange.chi_d * squared(flange.c_eff) / 2.0;
    const N width = x.c_p + x.b_p2 + x.h_p + flange.b_e1 + (flange.b_e2 + flange.c_eff) * flange.chi_d;
    return named("h_c", "mm", "EN 1993-1-3 5.5.2", first_moment / width);
}

/// Effective web in one step: b_e1 = 0.4 ρ h_c below the flange, 0.6 ρ h_c above the neutral axis
template <class N> EffectiveWeb<N> effective_web(const lipped_channel::MidLine<N>& x, const N& h_c, const N& epsilon) {
    const N psi = named("psi", "-", "EN 1993-1-5 Table 4.1", (h_c - x.h_p) / h_c);
    const N lambda = plate_slenderness<N>({x.h_p, x.t, epsilon}, web_buckling_factor(psi));
    const N h_eff = named("h_eff", "mm", "EN 1993-1-5 Table 4.1", internal_reduction(lambda, psi) * h_c);
    return {named("h_1", "mm", "EN 1993-1-5 Table 4.1", 0.4 * h_eff),
            named("h_2", "mm", "EN 1993-1-5 Table 4.1", x.h_p - h_c + 0.6 * h_eff)};
}

/// Properties of the effective parts together
template <class N> lipped_channel::Properties<N> effective_properties(const lipped_channel::MidLine<N>& x,
                                                                      const EffectiveFlange<N>& flange,
                                                                      const EffectiveWeb<N>& web) {
    const N width = x.c_p + x.b_p2 + web.h_1 + web.h_2 + flange.b_e1 + (flange.b_e2 + flange.c_eff) * flange.chi_d;
    const N A = named("A_eff", "mm2", "EN 1993-1-3 5.5", x.t * width);
    const N first_moment = x.c_p * (x.h_p - x.c_p / 2.0) + x.b_p2 * x.h_p + web.h_2 * (x.h_p - web.h_2 / 2.0) +
                           squared(web.h_1) / 2.0 + flange.chi_d * squared(flange.c_eff) / 2.0;
    const N z_c = named("z_c", "mm", "EN 1993-1-3 5.5", first_moment / width);
    const N z_t = named("z_t", "mm", "EN 1993-1-3 5.5", x.h_p - z_c);
    const N own = (cubed(web.h_1) + cubed(web.h_2) + cubed(x.c_p) + flange.chi_d * cubed(flange.c_eff) +
                   (x.b_p2 + flange.b_e1 + flange.b_e2 * cubed(flange.chi_d)) * squared(x.t)) /
                  12.0;
    const N shifted = x.c_p * squared(z_t - x.c_p / 2.0) + x.b_p2 * squared(z_t) +
                      web.h_2 * squared(z_t - web.h_2 / 2.0) + web.h_1 * squared(z_c - web.h_1 / 2.0) +
                      (flange.b_e1 + flange.b_e2 * flange.chi_d) * squared(z_c) +
                      flange.c_eff * flange.chi_d * squared(z_c - flange.c_eff / 2.0);
    return {A, z_c, z_t, named("I_eff_sharp", "mm4", "EN 1993-1-3 5.5", x.t * (own + shifted))};
}

/// The compression flange with its lip, as the effective section takes it
template <class N>
EdgeStiffenedFlange<N> compression_flange(const lipped_channel::MidLine<N>& x, const Steel<N>& steel) {
    const N epsilon = yield_ratio(steel.f_yb);
    const N lambda_b =
        named("lambda_p_b", "-", "EN 1993-1-5 4.4(2)", plate_slenderness<N>({x.b_p1, x.t, epsilon}, N(4.0)));
    const N lambda_c = named("lambda_p_c", "-", "EN 1993-1-5 4.4(2)",
                             plate_slenderness<N>({x.c_p, x.t, epsilon}, lip_buckling_factor(x.c_p, x.b_p1)));
    return {x, lambda_b, lambda_c, steel.E, steel.nu, steel.f_yb};
}

template <class N> lipped_channel::Properties<N> effective(const lipped_channel::MidLine<N>& x, const Steel<N>& steel) {
    const EffectiveFlange<N> flange = effective_flange(compression_flange(x, steel));
    const EffectiveWeb<N> web = effective_web(x, compressed_depth(x, flange), yield_ratio(steel.f_yb));
    return effective_properties(x, flange, web);
}

} // namespace spanledger::en1993_1_3
