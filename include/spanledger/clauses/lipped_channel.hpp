// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// Geometry of a lipped channel bent about its strong axis, the lip of the compression flange downwards: plates along
// their mid-lines with sharp corners, and what rounded corners take away. Lengths in mm.

namespace spanledger::lipped_channel {

/// As a section is named: outer sizes, nominal thickness (metal and zinc), inner radius of the corners.
template <class N> struct Size {
    N h;
    N b_1; ///< compression flange
    N b_2; ///< tension flange
    N c;   ///< both lips
    N t_nom;
    N r;
};

/// Mid-line sizes follow the nominal thickness; the plates are as thick as their core.
template <class N> struct MidLine {
    N h_p;
    N b_p1;
    N b_p2;
    N c_p;
    N t;
};

/// EN 1993-1-3 3.2.4(3): the core is what remains without the zinc
template <class N> MidLine<N> mid_line(const Size<N>& x, const N& coating) {
    return {named("h_p", "mm", "geometry", x.h - x.t_nom), named("b_p1", "mm", "geometry", x.b_1 - x.t_nom),
            named("b_p2", "mm", "geometry", x.b_2 - x.t_nom), named("c_p", "mm", "geometry", x.c - x.t_nom / 2.0),
            named("t", "mm", "EN 1993-1-3 3.2.4", x.t_nom - coating)};
}

/// Sum of the plate widths
template <class N> N developed_width(const MidLine<N>& x) {
    return named("sum b_p", "mm", "geometry", x.h_p + x.b_p1 + x.b_p2 + 2.0 * x.c_p);
}

/// A section with sharp corners; z from the neutral axis to the mid-line of either flange.
template <class N> struct Properties {
    N A;   ///< mm2
    N z_c; ///< mm, to the compression flange
    N z_t; ///< mm, to the tension flange
    N I;   ///< mm4
};

template <class N> Properties<N> gross(const MidLine<N>& x) {
    const N width = developed_width(x);
    const N A = named("A_gr", "mm2", "geometry", x.t * width);
    const N first_moment = x.c_p * (x.h_p - x.c_p / 2.0) + x.b_p2 * x.h_p + squared(x.h_p) / 2.0 + squared(x.c_p) / 2.0;
    const N z_c = named("z_c_gr", "mm", "geometry", first_moment / width);
    const N z_t = named("z_t_gr", "mm", "geometry", x.h_p - z_c);
    const N own = (cubed(x.h_p) + 2.0 * cubed(x.c_p) + (x.b_p1 + x.b_p2) * squared(x.t)) / 12.0;
    const N shifted = x.h_p * squared(x.h_p / 2.0 - z_c) + x.b_p1 * squared(z_c) + x.b_p2 * squared(z_t) +
                      x.c_p * squared(z_c - x.c_p / 2.0) + x.c_p * squared(z_t - x.c_p / 2.0);
    return {A, z_c, z_t, named("I_gr_sharp", "mm4", "geometry", x.t * (own + shifted))};
}

/// EN 1993-1-3 (5.1d): δ = 0.43 Σ r/Σ b_p for four corners of 90 degrees
template <class N> N corner_reduction(const N& r, const N& sum_of_widths) {
    return named("delta", "-", "EN 1993-1-3 (5.1d)", 0.43 * 4.0 * r / sum_of_widths);
}

/// (5.1b): I = I_sharp (1 - 2δ)
template <class N> N inertia_reduction(const N& delta) {
    return named("1 - 2 delta", "-", "EN 1993-1-3 (5.1b)", 1.0 - 2.0 * delta);
}

/// Area at the nominal thickness with rounded corners, mm2: a corner's arc of radius rm is 2 rm - π/2 rm shorter.
template <class N> N nominal_area(const Size<N>& x, const N& sum_of_widths) {
    constexpr double shorter = 4.0 * (2.0 - 1.5707963267948966);
    return named("A_nom", "mm2", "geometry", x.t_nom * (sum_of_widths - shorter * (x.r + x.t_nom / 2.0)));
}

} // namespace spanledger::lipped_channel
