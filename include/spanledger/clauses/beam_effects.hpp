// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

// Statics of a prismatic beam (elementary beam theory). q in N/mm, F in N, L in mm, EI in N mm2, GA in N; moments in
// N mm, forces in N, deflections in mm. F stands where it is worst: at mid-span (at the tip of a cantilever) for moment
// and deflection, beside the support for shear.

namespace spanledger::beam {

/// A uniform load and one concentrated load on the same joist.
template <class N> struct Load {
    N q;
    N F;
};

namespace simply_supported {

/// M = qL2/8 + FL/4
template <class N> N moment(const Load<N>& load, const N& L) {
    return named("M", "Nmm", "beam theory", load.q * squared(L) / 8.0 + load.F * L / 4.0);
}

/// V = qL/2 + F
template <class N> N shear(const Load<N>& load, const N& L) {
    return named("V", "N", "beam theory", load.q * L / 2.0 + load.F);
}

/// w = 5qL4/(384EI) + FL3/(48EI)
template <class N> N bending_deflection(const Load<N>& load, const N& L, const N& EI) {
    return named("w", "mm", "beam theory", 5.0 * load.q * fourth(L) / (384.0 * EI) + load.F * cubed(L) / (48.0 * EI));
}

/// w_s = kappa (qL2/8 + FL/4)/GA; `shear_flexibility` is kappa/GA, 1/N
template <class N> N shear_deflection(const Load<N>& load, const N& L, const N& shear_flexibility) {
    return named("w_s", "mm", "beam theory", shear_flexibility * (load.q * squared(L) / 8.0 + load.F * L / 4.0));
}

/// f1 = (pi/2) sqrt(EI/(m L4)); m in kg/mm, so 1000 turns N into kg mm/s2. Result in Hz.
template <class N> N first_frequency(const N& EI, const N& m, const N& L) {
    return named("f_1", "Hz", "beam theory", 1.5707963267948966 / squared(L) * root(1000.0 * EI / m));
}

} // namespace simply_supported

namespace cantilever {

/// M = qL2/2 + FL at the root
template <class N> N moment(const Load<N>& load, const N& L) {
    return named("M", "Nmm", "beam theory", load.q * squared(L) / 2.0 + load.F * L);
}

/// V = qL + F at the root
template <class N> N shear(const Load<N>& load, const N& L) {
    return named("V", "N", "beam theory", load.q * L + load.F);
}

/// w = qL4/(8EI) + FL3/(3EI) at the tip
template <class N> N bending_deflection(const Load<N>& load, const N& L, const N& EI) {
    return named("w", "mm", "beam theory", load.q * fourth(L) / (8.0 * EI) + load.F * cubed(L) / (3.0 * EI));
}

/// w_s = kappa (qL2/2 + FL)/GA at the tip; `shear_flexibility` is kappa/GA, 1/N
template <class N> N shear_deflection(const Load<N>& load, const N& L, const N& shear_flexibility) {
    return named("w_s", "mm", "beam theory", shear_flexibility * (load.q * squared(L) / 2.0 + load.F * L));
}

} // namespace cantilever

} // namespace spanledger::beam
