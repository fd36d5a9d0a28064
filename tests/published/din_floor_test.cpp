// SPDX-License-Identifier: MIT
#include "published/published.hpp"

#include "spanledger/clauses/beam_effects.hpp"
#include "spanledger/clauses/en1990_combinations.hpp"
#include "spanledger/clauses/en1995_bending.hpp"
#include "spanledger/clauses/en1995_shear.hpp"
#include "spanledger/clauses/en1995_strength.hpp"
#include "spanledger/clauses/rectangle.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

namespace published {

Example din_floor() {
    const double permanent = en1990::design_value<double>({1.35, 1.5}, 1.75, 0.0); // kN/m2
    const double total = en1990::design_value<double>({1.35, 1.5}, 1.75, 2.80);
    const beam::Load<double> load{total * 625.0 / 1000.0, 0.0}; // N/mm
    const double M = beam::simply_supported::moment(load, 4500.0);
    const double V = beam::simply_supported::shear(load, 4500.0);
    const double f_m_d = en1995::design_strength(0.8, 24.0, 1.3);
    Example e;
    e.title = "Timber joist floor to DIN 1052";
    e.source = "Berechnungsbeispiel Holzbalkendecke, Ueberwachungsgemeinschaft KVH, to DIN 1052:2008 (some blocks not "
               "seen); the partial-factor format is that of EN 1995-1-1";
    e.inputs = "C24, 80 x 240 mm at 625 mm, g_k 1.75 and q_k 2.80 kN/m2, medium term, k_mod 0.8, gamma_M 1.3; the span "
               "of 4.50 m was not seen: it follows from both M_d and V_d";
    e.rows = {
        {Mark::seen, "q_d, permanent part", "2.36", permanent, "kN/m2"},
        {Mark::seen, "q_d", "6.56", total, "kN/m2"},
        {Mark::seen, "M_d", "10.38", M / 1e6, "kNm"},
        {Mark::seen, "V_d", "9.23", V / 1e3, "kN"},
        {Mark::seen, "f_m_d", "14.8", f_m_d, "MPa"},
        {Mark::seen, "W needed, from the rounded 10.38 kNm and 14.8 MPa", "701",
         en1995::bending_stress(10.38e6, 1000.0) / 14.8, "cm3"},
        {Mark::seen, "sigma_m_d", "13.5", en1995::bending_stress(M, rectangle::section_modulus(80.0, 240.0)), "MPa"},
        {Mark::seen, "tau_d, without k_cr", "0.72", en1995::shear_stress<double>(V, {80.0, 240.0, 1.0}), "MPa"},
    };
    e.not_covered = {
        {"shear stress with the crack factor", "DIN 1052:2008 has no k_cr; EN 1995-1-1/A1 divides by 0.67"},
        {"deflection and vibration blocks", "not seen"},
    };
    return e;
}

} // namespace published

TEST_CASE("DIN 1052: timber joist floor") {
    published::check(published::din_floor());
}
