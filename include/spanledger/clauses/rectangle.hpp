// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// Section properties of a rectangle b x h bent about the axis parallel to b (geometry). b and h in mm.

namespace spanledger::rectangle {

/// A = bh, mm2
template <class N> N area(const N& b, const N& h) {
    return named("A", "mm2", "geometry", b * h);
}

/// W = bh2/6, mm3
template <class N> N section_modulus(const N& b, const N& h) {
    return named("W", "mm3", "geometry", b * squared(h) / 6.0);
}

/// I = bh3/12, mm4
template <class N> N second_moment(const N& b, const N& h) {
    return named("I", "mm4", "geometry", b * cubed(h) / 12.0);
}

/// Iz = hb3/12, mm4: about the weak axis
template <class N> N weak_second_moment(const N& b, const N& h) {
    return named("I_z", "mm4", "geometry", h * cubed(b) / 12.0);
}

/// Itor = hb3/3 (1 - 0.63 b/h + 0.052 (b/h)5), mm4, for b <= h (series solution of St Venant's torsion, rounded)
template <class N> N torsion_constant(const N& b, const N& h) {
    const N ratio = named("b/h", "-", "geometry", b / h);
    return named("I_tor", "mm4", "St Venant torsion",
                 h * cubed(b) / 3.0 * (1.0 + 0.052 * fourth(ratio) * ratio - 0.63 * ratio));
}

} // namespace spanledger::rectangle
