// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// EN 1990:2002+A1, 6.4.3.2 and Table A1.2(B): factors of the fundamental combinations, one variable action at a time:
// (6.10) γG G + γQ Q; (6.10a) γG G + γQ ψ0 Q; (6.10b) ξ γG G + γQ Q. Factors without unit.

namespace spanledger::en1990 {

/// (6.10b): ξ γG
template <class N> N reduced_permanent_factor(const N& xi, const N& gamma_G) {
    return named("xi gamma_G", "-", "EN 1990 (6.10b)", xi * gamma_G);
}

/// (6.10a): γQ ψ0
template <class N> N combination_variable_factor(const N& gamma_Q, const N& psi_0) {
    return named("gamma_Q psi_0", "-", "EN 1990 (6.10a)", gamma_Q * psi_0);
}

/// What an action is multiplied by on either side of (6.10).
template <class N> struct Factors {
    N permanent;
    N variable;
};

/// (6.10): E_d from the permanent and the variable action (or their effects), both in one unit
template <class N> N design_value(const Factors<N>& factors, const N& G, const N& Q) {
    return factors.permanent * G + factors.variable * Q;
}

} // namespace spanledger::en1990
