// SPDX-License-Identifier: MIT
#include "published/published.hpp"

#include "spanledger/clauses/beam_effects.hpp"
#include "spanledger/clauses/en1990_combinations.hpp"
#include "spanledger/clauses/en1995_bearing.hpp"
#include "spanledger/clauses/en1995_bending.hpp"
#include "spanledger/clauses/en1995_shear.hpp"
#include "spanledger/clauses/en1995_strength.hpp"
#include "spanledger/clauses/en1995_vibration.hpp"
#include "spanledger/clauses/rectangle.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

// LVL Handbook Europe (Federation of the Finnish Woodworking Industries), 2025, chapter 9.1, pages 181 to 185.

namespace published {
namespace {

constexpr double b = 45, h = 240, L = 4500, s = 400; // mm
constexpr double E = 13800, G = 600;                 // MPa
constexpr double k_mod = 0.8, gamma_M = 1.2;
constexpr double f_m_k = 44, f_v_k = 4.2, f_c_90_k = 6; // MPa, edgewise

Row row(const char* quantity, const char* printed, double ours, const char* unit) {
    return {Mark::seen, quantity, printed, ours, unit};
}

std::vector<Row> section() {
    return {
        row("A", "10800", rectangle::area(b, h), "mm2"),
        row("W", "4.32e5", rectangle::section_modulus(b, h), "mm3"),
        row("I", "5.18e7", rectangle::second_moment(b, h), "mm4"),
        row("EI", "7.15e11", E * rectangle::second_moment(b, h), "Nmm2"),
        row("GA", "6.48e6", G * rectangle::area(b, h), "N"),
        row("k_h = (300/240)^0.15", "1.034", en1995::size_factor_lvl<double>({300, 0.15, 1.2}, h), "-"),
    };
}

std::vector<Row> strength() {
    const double E_d = en1990::design_value<double>({1.15, 1.5}, 0.6 + 0.3, 2.0); // kN/m2
    const beam::Load<double> load{E_d * s / 1000.0, 0.0};                         // N/mm
    const double M = beam::simply_supported::moment(load, L);
    const double V = beam::simply_supported::shear(load, L);
    const double k_h = en1995::size_factor_lvl<double>({300, 0.15, 1.2}, h);
    Row truncated = row("E_d", "4.03", E_d, "kN/m2");
    truncated.remark = "4.035, printed truncated";
    truncated.units_off = 1.0;
    Row bending_strength = row("f_m_d", "30.3", k_h * en1995::design_strength(k_mod, f_m_k, gamma_M), "MPa");
    bending_strength.remark = "page 181 lists 48 MPa, page 182 uses the edgewise 44 MPa";
    return {
        truncated,
        row("M_d", "4.1", M / 1e6, "kNm"),
        row("sigma_m_d", "9.5", en1995::bending_stress(M, rectangle::section_modulus(b, h)), "MPa"),
        bending_strength,
        row("V_d", "3.6", V / 1e3, "kN"),
        row("tau_d", "0.5", en1995::shear_stress<double>(V, {b, h, 1.0}), "MPa"),
        row("f_v_d", "2.8", en1995::design_strength(k_mod, f_v_k, gamma_M), "MPa"),
        row("k_c_90 f_c_90_d", "4", 1.0 * en1995::design_strength(k_mod, f_c_90_k, gamma_M), "MPa"),
        row("contact length 45 + 15", "60", en1995::contact_length(45.0, 15.0), "mm"),
    };
}

std::vector<Row> vibration() {
    const double EI = E * rectangle::second_moment(b, h);
    const en1995::FloorStrip<double> floor{1000.0 * EI / s, 3.11e9, 120e-6};
    const double f_1 = en1995::first_frequency(floor, L);
    const double n_40 = en1995::modes_below_40_hz(floor, f_1, 5000.0 / L);
    Row frequency = row("f_1", "9.5", f_1, "Hz");
    frequency.remark = "with the 30 kg/m2 of the Finnish annex in the mass given, 120 kg/m2";
    return {
        row("service load g + q", "2.9", en1990::design_value<double>({1.0, 1.0}, 0.6 + 0.3, 2.0), "kN/m2"),
        row("(EI)_l", "1.79e6", floor.EI_l / 1e6, "Nm2/m"),
        frequency,
        row("n_40", "11", n_40, "-"),
        row("v", "0.010", en1995::velocity_response(n_40, 120.0 * 5.0 * 4.5), "m/(Ns2)"),
        row("150^(f_1 zeta - 1)", "0.011", en1995::velocity_limit(150.0, f_1, 0.01), "m/(Ns2)"),
        row("w(1 kN), F l3/(48 s (EI)_l)", "2.7", en1995::unit_load_deflection<double>({1.0, 1.0, EI}, L), "mm"),
    };
}

} // namespace

Example lvl_floor() {
    Example e;
    e.title = "LVL 48 P joist floor";
    e.source = "LVL Handbook Europe, Federation of the Finnish Woodworking Industries, 2025, chapter 9.1, pages 181 to "
               "185 (page 183 not seen)";
    e.inputs =
        "span 4500 mm, floor 5000 mm wide, joists 45 x 240 mm at 400 mm, edgewise f_m 44, f_v 4.2, f_c_90 6, E "
        "13800, G 600 MPa, size exponent 0.15, k_mod 0.8, gamma_M 1.2; Finnish gamma_G 1.15 and contact of 15 mm "
        "beyond the support given as inputs; (EI)_b 3110 Nm2/m as printed";
    for (const auto& part : {section(), strength(), vibration()}) {
        e.rows.insert(e.rows.end(), part.begin(), part.end());
    }
    e.not_covered = {
        {"deflections (page 183)", "page not seen"},
        {"k_delta 0.2, w(1 kN) 1.3 mm by F l2/(42 k_delta (EI)_l)", "rule of the Finnish annex"},
        {"(EI)_b 3.11e3 Nm2/m of the chipboard", "stiffness of the deck is an input"},
        {"30 kg/m2 added to the mass", "rule of the Finnish annex, put into the mass given"},
        {"bracing lines and battens: K_ser, gamma, (EI)_bracing, k_delta 0.45, w 0.6 mm",
         "strutting is covered by the UK rule only"},
        {"limits 0.6 mm (Finland), 0.5 mm (Austria)", "limits of other annexes; a is an input of the recommended rule"},
    };
    return e;
}

} // namespace published

TEST_CASE("LVL Handbook Europe 9.1: LVL 48 P joist floor") {
    published::check(published::lvl_floor());
}
