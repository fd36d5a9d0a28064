// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1993-1-3:2006 7.1(3): second moment of area for deflection, between gross and effective section.

namespace spanledger::en1993_1_3 {

template <class N> struct Stiffness {
    N I_gr;  ///< mm4, with rounded corners
    N I_eff; ///< mm4, at the yield strength, with rounded corners
    N z_c;   ///< mm, from the gross neutral axis to the compression flange
    N f_yb;  ///< MPa
};

/// σgr = M z_c/I_gr, at most f_yb, MPa
template <class N> N service_stress(const Stiffness<N>& x, const N& M) {
    return named("sigma_gr", "MPa", "EN 1993-1-3 7.1(3)", least(M * x.z_c / x.I_gr, x.f_yb));
}

/// (7.1): I_fic = I_gr - (σgr/f_yb)(I_gr - I_eff), mm4
template <class N> N fictitious_second_moment(const Stiffness<N>& x, const N& sigma_gr) {
    return named("I_fic", "mm4", "EN 1993-1-3 (7.1)", x.I_gr - sigma_gr / x.f_yb * (x.I_gr - x.I_eff));
}

} // namespace spanledger::en1993_1_3
