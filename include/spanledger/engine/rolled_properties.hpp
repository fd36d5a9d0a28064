// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/en1993_1_5_patch_load.hpp"
#include "spanledger/clauses/en1993_bending.hpp"
#include "spanledger/clauses/en1993_bending_with_shear.hpp"
#include "spanledger/clauses/en1993_classification.hpp"
#include "spanledger/clauses/en1993_lateral_buckling.hpp"
#include "spanledger/clauses/en1993_shear.hpp"
#include "spanledger/clauses/rolled_section.hpp"
#include "spanledger/engine/rolled_inputs.hpp"

namespace spanledger {

/// What a rolled section gives a joist, whatever its span, spacing and load: worked out once for a member.
template <class N> struct RolledProperties {
    N A;                 ///< mm2
    N EI;                ///< N mm2
    N shear_flexibility; ///< 1/N, 1/(G A_w)
    N W_y;               ///< mm3, plastic or elastic by class
    N M_c;               ///< N mm
    N V_c;               ///< N
    N F_Rd;              ///< N, at the bearing length of the joist
    en1993::WebInBending<N> web;
    en1993::LateralStiffness<N> lateral; ///< I and H sections
    N alpha_LT;
    N z_g; ///< mm
};

namespace rolled {

/// Classes of flange and web in bending.
template <class N> struct Classes {
    N flange;
    N web;
};

template <class N> Classes<N> classes(const RolledKinds& kinds, const RolledInputs<N>& in) {
    const N eps = en1993::epsilon(in.f_y);
    const N c_f =
        kinds.channel ? rolled_section::channel::outstand(in.size) : rolled_section::i_section::outstand(in.size);
    const N c_w = rolled_section::web_flat(in.size);
    const N flange = named("c_f/t_f", "-", "EN 1993-1-1 Table 5.2", c_f / in.size.t_f);
    const N web = named("c_w/t_w", "-", "EN 1993-1-1 Table 5.2", c_w / in.size.t_w);
    return {en1993::flange_class(flange, eps), en1993::web_class(web, eps)};
}

template <class N> N shear_resistance(const RolledKinds& kinds, const RolledInputs<N>& in, const N& A) {
    const N A_v =
        kinds.channel ? en1993::shear_area_of_channel(in.size, A) : en1993::shear_area_of_i_section(in.size, A, in.eta);
    const en1993::Web<N> web{rolled_section::web_depth(in.size), in.size.t_w, in.f_y, en1993::epsilon(in.f_y), in.eta};
    return en1993::shear_resistance(en1993::plastic_shear_resistance(A_v, in.f_y, in.gamma_M0), web, in.gamma_M1);
}

/// z_g, mm: above the shear centre
template <class N> N load_height(const RolledKinds& kinds, const RolledInputs<N>& in) {
    switch (kinds.load_height) {
    case LoadHeight::top: return named("z_g", "mm", "NCCI, elastic critical moment", in.size.h / 2.0);
    case LoadHeight::bottom: return named("z_g", "mm", "NCCI, elastic critical moment", -0.5 * in.size.h);
    case LoadHeight::stated: return in.load_height;
    case LoadHeight::centroid: break;
    }
    return N(0.0);
}

template <class N> N end_resistance(const RolledInputs<N>& in) {
    return en1993_1_5::end_patch_resistance<N>(
        {rolled_section::web_depth(in.size), in.size.t_w, in.size.t_f, in.size.b, in.f_y, in.E}, in.t, in.gamma_M1);
}

template <class N> en1993::LateralStiffness<N> lateral_stiffness(const RolledInputs<N>& in) {
    return {in.E, in.G, rolled_section::i_section::weak_second_moment(in.size),
            rolled_section::i_section::torsion_constant(in.size), rolled_section::i_section::warping_constant(in.size)};
}

} // namespace rolled

template <class N> RolledProperties<N> rolled_properties(const RolledKinds& kinds, const RolledInputs<N>& in) {
    const double roots = kinds.channel ? rolled_section::roots_of_channel : rolled_section::roots_of_i_section;
    RolledProperties<N> x{};
    x.A = rolled_section::area(in.size, roots);
    const N I_y = rolled_section::second_moment(in.size, roots);
    x.EI = named("EI", "Nmm2", "geometry", in.E * I_y);
    const rolled::Classes<N> classes = rolled::classes(kinds, in);
    x.W_y = en1993::section_modulus(en1993::section_class(classes.flange, classes.web),
                                    rolled_section::plastic_modulus(in.size, roots),
                                    rolled_section::elastic_modulus(I_y, in.size.h));
    x.M_c = en1993::moment_resistance(x.W_y, in.f_y, in.gamma_M0);
    x.V_c = rolled::shear_resistance(kinds, in, x.A);
    const N A_w = named("A_w", "mm2", "EN 1993-1-1 6.2.8(5)", rolled_section::web_depth(in.size) * in.size.t_w);
    x.web = {x.W_y, A_w, in.size.t_w, x.V_c};
    if (kinds.shear_deflection) x.shear_flexibility = named("1/GA_w", "1/N", "beam theory", 1.0 / (in.G * A_w));
    if (!kinds.web_stiffened && !kinds.cantilever) x.F_Rd = rolled::end_resistance(in);
    if (!kinds.channel && !kinds.cantilever) {
        x.lateral = rolled::lateral_stiffness(in);
        x.alpha_LT = en1993::imperfection_factor(in.curves, named("h/b", "-", "geometry", in.size.h / in.size.b));
        x.z_g = rolled::load_height(kinds, in);
    }
    return x;
}

} // namespace spanledger
