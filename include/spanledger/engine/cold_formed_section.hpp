// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/en1993_1_3_bending.hpp"
#include "spanledger/clauses/en1993_1_3_deflection.hpp"
#include "spanledger/clauses/en1993_1_3_effective_channel.hpp"
#include "spanledger/clauses/en1993_1_3_end_support.hpp"
#include "spanledger/clauses/en1993_1_3_shear.hpp"
#include "spanledger/clauses/lipped_channel.hpp"
#include "spanledger/engine/cold_formed_inputs.hpp"

namespace spanledger {

/// What a channel gives a joist, whatever its span, spacing and load: worked out once for a member.
template <class N> struct ColdFormedProperties {
    lipped_channel::MidLine<N> size;
    N A_nom;                                   ///< mm2, nominal thickness, rounded corners
    en1993_1_3::BendingAndShear<N> resistance; ///< at γM0
    N R_w_0;                                   ///< N, (6.15a) before the bearing length
    en1993_1_3::Stiffness<N> stiffness;
    N EI_gr;             ///< N mm2
    N shear_flexibility; ///< 1/N, 1/(G A_w) of the web
};

namespace cold_formed {

/// Shear resistance of the web, N
template <class N>
N shear_resistance(const ColdFormedInputs<N>& in, const lipped_channel::MidLine<N>& size, bool web_stiffened) {
    const en1993_1_3::Web<N> web{size.h_p, size.t, in.f_yb, in.E};
    const N f_bv =
        web_stiffened ? en1993_1_3::shear_strength_stiffened(web) : en1993_1_3::shear_strength_unstiffened(web);
    return en1993_1_3::shear_resistance(web, f_bv, in.gamma_M0);
}

/// Moment resistance, N mm
template <class N> N moment_resistance(const ColdFormedInputs<N>& in, const lipped_channel::Properties<N>& gross,
                                       const lipped_channel::Properties<N>& effective, const N& corner_factor) {
    const N W_el = named("W_el", "mm3", "geometry", en1993_1_3::section_modulus(gross, corner_factor * gross.I));
    const N W_eff = en1993_1_3::section_modulus(effective, corner_factor * effective.I);
    return en1993_1_3::moment_resistance(en1993_1_3::effective_modulus(W_eff, W_el), in.f_yb, in.gamma_M0);
}

} // namespace cold_formed

template <class N>
ColdFormedProperties<N> cold_formed_section(const ColdFormedInputs<N>& in, const ColdFormedKinds& kinds) {
    const lipped_channel::MidLine<N> size = lipped_channel::mid_line(in.size, in.coating);
    const N width = lipped_channel::developed_width(size);
    const lipped_channel::Properties<N> gross = lipped_channel::gross(size);
    const lipped_channel::Properties<N> effective = en1993_1_3::effective<N>(size, {in.f_yb, in.E, in.nu});
    const N rounding = lipped_channel::inertia_reduction(lipped_channel::corner_reduction(in.size.r, width));
    const N corner_factor = en1993_1_3::resistance_corner_factor(size, in.size.r, rounding);
    const N I_gr = named("I_gr", "mm4", "EN 1993-1-3 (5.1b)", rounding * gross.I);
    const N I_eff = named("I_eff", "mm4", "EN 1993-1-3 (5.1b)", rounding * effective.I);
    return {
        .size = size,
        .A_nom = lipped_channel::nominal_area(in.size, width),
        .resistance = {cold_formed::moment_resistance(in, gross, effective, corner_factor),
                       cold_formed::shear_resistance(in, size, kinds.web_stiffened)},
        .R_w_0 = en1993_1_3::end_support_base<N>({size.h_p, size.t, in.size.r, in.f_yb, in.gamma_M1}),
        .stiffness = {I_gr, I_eff, gross.z_c, in.f_yb},
        .EI_gr = named("EI_gr", "Nmm2", "geometry", in.E * I_gr),
        .shear_flexibility = named("1/GA_w", "1/N", "beam theory", 1.0 / (in.G * size.h_p * size.t)),
    };
}

} // namespace spanledger
