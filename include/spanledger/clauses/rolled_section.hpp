// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// Section properties of rolled joists from their dimensions, root fillets included: I and H sections and
// parallel-flange channels, bent about the axis parallel to the flanges. Lengths in mm.

namespace spanledger::rolled_section {

template <class N> struct Size {
    N h;
    N b;
    N t_w;
    N t_f;
    N r; ///< root radius
};

/// h_w = h - 2 t_f, mm: the web between the flanges
template <class N> N web_depth(const Size<N>& x) {
    return named("h_w", "mm", "geometry", x.h - 2.0 * x.t_f);
}

/// c = h_w - 2r, mm: the flat part of the web
template <class N> N web_flat(const Size<N>& x) {
    return named("c_w", "mm", "EN 1993-1-1 Table 5.2", x.h - 2.0 * x.t_f - 2.0 * x.r);
}

/// A square of side r less the quarter circle in it; the same for every root.
template <class N> struct Fillet {
    N area;     ///< mm2
    N distance; ///< of the centroid from web and from flange, mm
    N own;      ///< second moment of area about its centroid, mm4
};

template <class N> Fillet<N> fillet(const N& r) {
    constexpr double pi = 3.141592653589793;
    constexpr double area = 1.0 - pi / 4.0;
    constexpr double distance = (10.0 - 3.0 * pi) / (12.0 - 3.0 * pi);
    constexpr double own = 1.0 - 5.0 * pi / 16.0 - area * distance * distance;
    return {named("a_r", "mm2", "geometry", area * squared(r)), named("x_r", "mm", "geometry", distance * r),
            named("I_r", "mm4", "geometry", own * fourth(r))};
}

/// How many roots the web has: 4 for an I or H section, 2 for a channel.
inline constexpr double roots_of_i_section = 4.0;
inline constexpr double roots_of_channel = 2.0;

template <class N> N area(const Size<N>& x, double roots) {
    return named("A", "mm2", "geometry", 2.0 * x.b * x.t_f + web_depth(x) * x.t_w + roots * fillet(x.r).area);
}

template <class N> N second_moment(const Size<N>& x, double roots) {
    const Fillet<N> corner = fillet(x.r);
    const N arm = x.h / 2.0 - x.t_f - corner.distance;
    return named("I_y", "mm4", "geometry",
                 (x.b * cubed(x.h) - (x.b - x.t_w) * cubed(web_depth(x))) / 12.0 +
                     roots * (corner.own + corner.area * squared(arm)));
}

template <class N> N elastic_modulus(const N& I_y, const N& h) {
    return named("W_el", "mm3", "geometry", 2.0 * I_y / h);
}

template <class N> N plastic_modulus(const Size<N>& x, double roots) {
    const Fillet<N> corner = fillet(x.r);
    return named("W_pl", "mm3", "geometry",
                 x.b * x.t_f * (x.h - x.t_f) + x.t_w * squared(web_depth(x)) / 4.0 +
                     roots * corner.area * (x.h / 2.0 - x.t_f - corner.distance));
}

namespace i_section {

/// c = (b - t_w)/2 - r, mm: the outstand of a flange
template <class N> N outstand(const Size<N>& x) {
    return named("c_f", "mm", "EN 1993-1-1 Table 5.2", (x.b - x.t_w) / 2.0 - x.r);
}

template <class N> N weak_second_moment(const Size<N>& x) {
    const Fillet<N> corner = fillet(x.r);
    return named("I_z", "mm4", "geometry",
                 (2.0 * x.t_f * cubed(x.b) + web_depth(x) * cubed(x.t_w)) / 12.0 +
                     roots_of_i_section * (corner.own + corner.area * squared(x.t_w / 2.0 + corner.distance)));
}

/// I_t = 2/3 (b - 0.63 t_f) t_f3 + 1/3 (h - 2 t_f) t_w3 + 2 (t_w/t_f)(0.145 + 0.1 r/t_f) D4, mm4, with the diameter D
/// of the circle inscribed where web and flange meet, D = ((r + t_w/2)2 + (r + t_f)2 - r2)/(2r + t_f)
template <class N> N torsion_constant(const Size<N>& x) {
    const N D = named("D", "mm", "geometry",
                      (squared(x.r + x.t_w / 2.0) + squared(x.r + x.t_f) - squared(x.r)) / (2.0 * x.r + x.t_f));
    const N junctions = 2.0 * x.t_w / x.t_f * (0.145 + 0.1 * x.r / x.t_f) * fourth(D);
    return named("I_t", "mm4", "makers' tables of rolled sections",
                 2.0 / 3.0 * (x.b - 0.63 * x.t_f) * cubed(x.t_f) + web_depth(x) * cubed(x.t_w) / 3.0 + junctions);
}

/// I_w = t_f b3 (h - t_f)2/24, mm6
template <class N> N warping_constant(const Size<N>& x) {
    return named("I_w", "mm6", "thin-walled beam theory", x.t_f * cubed(x.b) * squared(x.h - x.t_f) / 24.0);
}

} // namespace i_section

namespace channel {

/// c = b - t_w - r, mm: the outstand of a flange
template <class N> N outstand(const Size<N>& x) {
    return named("c_f", "mm", "EN 1993-1-1 Table 5.2", x.b - x.t_w - x.r);
}

/// Distance of the centroid from the back of the web, mm
template <class N> N centroid(const Size<N>& x) {
    const Fillet<N> corner = fillet(x.r);
    const N first_moment = x.t_f * squared(x.b) + web_depth(x) * squared(x.t_w) / 2.0 +
                           roots_of_channel * corner.area * (x.t_w + corner.distance);
    return named("e_z", "mm", "geometry", first_moment / area(x, roots_of_channel));
}

template <class N> N weak_second_moment(const Size<N>& x) {
    const Fillet<N> corner = fillet(x.r);
    const N about_back = (2.0 * x.t_f * cubed(x.b) + web_depth(x) * cubed(x.t_w)) / 3.0 +
                         roots_of_channel * (corner.own + corner.area * squared(x.t_w + corner.distance));
    return named("I_z", "mm4", "geometry", about_back - area(x, roots_of_channel) * squared(centroid(x)));
}

/// I_t = 2/3 b t_f3 + 1/3 (h - 2 t_f) t_w3 + 2 α D4 - 0.42 t_f4, mm4, with the circle inscribed where web and flange
/// meet
template <class N> N torsion_constant(const Size<N>& x) {
    const N r_f = x.r / x.t_f;
    const N w_f = x.t_w / x.t_f;
    const N alpha = named("alpha_3", "-", "El Darwish and Johnston",
                          0.2621 * w_f + 0.1231 * r_f - 0.0908 - 0.0752 * w_f * r_f - 0.0945 * squared(w_f));
    const N D = named("D", "mm", "El Darwish and Johnston",
                      2.0 * (3.0 * x.r + x.t_w + x.t_f - root(2.0 * (2.0 * x.r + x.t_w) * (2.0 * x.r + x.t_f))));
    return named("I_t", "mm4", "El Darwish and Johnston",
                 2.0 / 3.0 * x.b * cubed(x.t_f) + web_depth(x) * cubed(x.t_w) / 3.0 + 2.0 * alpha * fourth(D) -
                     0.42 * fourth(x.t_f));
}

/// I_w of the mid-lines, roots left out: 4 to 8 % above what makers tabulate, mm6
template <class N> N warping_constant(const Size<N>& x) {
    const N b = x.b - x.t_w / 2.0;
    const N h = x.h - x.t_f;
    return named("I_w", "mm6", "thin-walled beam theory",
                 x.t_f * cubed(b) * squared(h) / 12.0 * (3.0 * b * x.t_f + 2.0 * h * x.t_w) /
                     (6.0 * b * x.t_f + h * x.t_w));
}

} // namespace channel

} // namespace spanledger::rolled_section
