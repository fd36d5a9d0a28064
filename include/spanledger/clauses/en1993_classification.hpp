// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1993-1-1:2005 5.5 and Table 5.2: class of a section in bending about its strong axis.

namespace spanledger::en1993 {

/// ε = sqrt(235/f_y), f_y in MPa
template <class N> N epsilon(const N& f_y) {
    return named("eps", "-", "EN 1993-1-1 Table 5.2", root(235.0 / f_y));
}

/// Greatest c/t of classes 1 to 3, in multiples of ε.
struct ClassLimits {
    double class_1;
    double class_2;
    double class_3;
};

inline constexpr ClassLimits outstand_in_compression{9.0, 10.0, 14.0};
inline constexpr ClassLimits web_in_bending{72.0, 83.0, 124.0};

template <class N> N part_class(const N& c_over_t, const N& eps, const ClassLimits& limits) {
    return select(c_over_t <= limits.class_1 * eps, N(1.0), [&] {
        return select(c_over_t <= limits.class_2 * eps, N(2.0),
                      [&] { return select(c_over_t <= limits.class_3 * eps, N(3.0), N(4.0)); });
    });
}

/// 1, 2, 3 or 4: outstand flange in compression
template <class N> N flange_class(const N& c_over_t, const N& eps) {
    return named("class_f", "-", "EN 1993-1-1 Table 5.2", part_class(c_over_t, eps, outstand_in_compression));
}

/// 1, 2, 3 or 4: web in bending
template <class N> N web_class(const N& c_over_t, const N& eps) {
    return named("class_w", "-", "EN 1993-1-1 Table 5.2", part_class(c_over_t, eps, web_in_bending));
}

/// 5.5.2(6): the least favourable of the parts in compression
template <class N> N section_class(const N& flange, const N& web) {
    return named("class", "-", "EN 1993-1-1 5.5.2(6)", greatest(flange, web));
}

} // namespace spanledger::en1993
