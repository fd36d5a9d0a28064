// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1993-1-1:2005 6.2.5: bending resistance of a section of class 1, 2 or 3.

namespace spanledger::en1993 {

/// W of (6.13), (6.14): plastic in classes 1 and 2, elastic in class 3, mm3
template <class N> N section_modulus(const N& section_class, const N& W_pl, const N& W_el) {
    return named("W_y", "mm3", "EN 1993-1-1 6.2.5(2)", select(section_class <= N(2.0), W_pl, W_el));
}

/// (6.13), (6.14): M_c,Rd = W f_y/γM0, N mm
template <class N> N moment_resistance(const N& W_y, const N& f_y, const N& gamma_M0) {
    return named("M_c_Rd", "Nmm", "EN 1993-1-1 (6.13), (6.14)", W_y * f_y / gamma_M0);
}

} // namespace spanledger::en1993
