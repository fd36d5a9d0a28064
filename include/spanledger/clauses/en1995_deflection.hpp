// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1995-1-1:2004+A1+A2, 2.2.3 and 7.2: instantaneous, final and net final deflection. Deflections in mm.

namespace spanledger::en1995 {

/// winst = wG + wQ
template <class N> N instantaneous_deflection(const N& w_G, const N& w_Q) {
    return named("w_inst", "mm", "EN 1995-1-1 2.2.3(2)", w_G + w_Q);
}

/// (2.3): wfin,G = wG(1 + kdef)
template <class N> N final_deflection_permanent(const N& w_G, const N& k_def) {
    return named("w_fin_G", "mm", "EN 1995-1-1 (2.3)", w_G * (1.0 + k_def));
}

/// (2.4): wfin,Q = wQ(1 + ψ2 kdef)
template <class N> N final_deflection_variable(const N& w_Q, const N& psi_2, const N& k_def) {
    return named("w_fin_Q", "mm", "EN 1995-1-1 (2.4)", w_Q * (1.0 + psi_2 * k_def));
}

/// (7.2): wnet,fin = wfin - wc; camber counts no further than the final permanent deflection
template <class N> N net_final_deflection(const N& w_fin, const N& camber, const N& w_fin_G) {
    return named("w_net_fin", "mm", "EN 1995-1-1 (7.2)", w_fin - least(camber, w_fin_G));
}

} // namespace spanledger::en1995
