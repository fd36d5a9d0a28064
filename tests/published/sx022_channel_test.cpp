// SPDX-License-Identifier: MIT
#include "published/published.hpp"

#include "spanledger/clauses/en1993_1_3_bending.hpp"
#include "spanledger/clauses/en1993_1_3_effective_channel.hpp"

#include <catch2/catch.hpp>

#include <cmath>

using namespace spanledger;

// Access Steel SX022a-EN-EU. The inputs to the gross section were seen there; later figures are from memory. The
// figures come out only with the spring stiffness and b_e1 of the first step kept through the iteration.

namespace published {
namespace {

using namespace en1993_1_3;

const lipped_channel::Size<double> sx022{.h = 200, .b_1 = 74, .b_2 = 66, .c = 20.8, .t_nom = 2, .r = 3};
const Steel<double> s350{.f_yb = 350, .E = 210000, .nu = 0.3};

lipped_channel::MidLine<double> mid_line() {
    return lipped_channel::mid_line(sx022, 0.04);
}

Row seen(const char* quantity, const char* printed, double ours, const char* unit) {
    return {Mark::seen, quantity, printed, ours, unit};
}

Row recalled(const char* quantity, const char* printed, double ours, const char* unit) {
    return {Mark::from_memory, quantity, printed, ours, unit};
}

/// Printed from intermediate results that were rounded.
Row rounded(Row row, const char* remark, double units_off) {
    row.remark = remark;
    row.units_off = units_off;
    return row;
}

std::vector<Row> gross_section() {
    const auto x = mid_line();
    const auto gross = lipped_channel::gross(x);
    return {
        seen("h_p", "198", x.h_p, "mm"),
        seen("b_p1", "72", x.b_p1, "mm"),
        seen("b_p2", "64", x.b_p2, "mm"),
        seen("c_p", "19.8", x.c_p, "mm"),
        seen("t", "1.96", x.t, "mm"),
        rounded(seen("b/t", "37.75", sx022.b_1 / x.t, "-"), "37.755, printed truncated", 0.6),
        seen("c/t", "10.61", sx022.c / x.t, "-"),
        seen("h/t", "102.04", sx022.h / x.t, "-"),
        seen("r/t", "1.53", sx022.r / x.t, "-"),
        seen("A_br", "732", gross.A, "mm2"),
        seen("z_b1", "96.88", gross.z_c, "mm"),
    };
}

std::vector<Row> first_step() {
    const auto flange = compression_flange(mid_line(), s350);
    const double rho = internal_reduction(flange.lambda_b, 1.0);
    const auto widths = stiffener_widths(flange, 1.0);
    const double K = spring_stiffness(flange, widths);
    const double sigma_cr = critical_stress(flange, widths, K);
    return {
        recalled("lambda_p of the flange", "0.789", flange.lambda_b, "-"),
        recalled("rho of the flange", "0.914", rho, "-"),
        recalled("b_eff", "65.8", rho * flange.size.b_p1, "mm"),
        recalled("b_e1 = b_e2", "32.9", widths.b_e2, "mm"),
        recalled("lambda_p of the lip", "0.614", flange.lambda_c, "-"),
        seen("rho of the lip", "1", outstand_reduction(flange.lambda_c), "-"),
        recalled("A_s", "103.3", stiffener_area(widths, flange.size.t), "mm2"),
        recalled("I_s", "3663", stiffener_second_moment(widths, flange.size.t), "mm4"),
        recalled("K_1", "0.439", K, "N/mm2"),
        recalled("sigma_cr,s", "355.78", sigma_cr, "MPa"),
        recalled("lambda_d", "0.992", std::sqrt(s350.f_yb / sigma_cr), "-"),
        recalled("chi_d", "0.753", stiffener_step(flange, K, {widths, 1.0}).chi_d, "-"),
    };
}

std::vector<Row> settled_flange_and_web() {
    const auto x = mid_line();
    const auto flange = effective_flange(compression_flange(x, s350));
    const double h_c = compressed_depth(x, flange);
    const double psi = (h_c - x.h_p) / h_c;
    const auto web = effective_web(x, h_c, yield_ratio(s350.f_yb));
    return {
        recalled("b_e2, settled", "35.9", flange.b_e2, "mm"),
        recalled("chi_d, settled", "0.737", flange.chi_d, "-"),
        rounded(recalled("t_red", "1.445", flange.chi_d * x.t, "mm"), "printed from 0.737, rounded", 1.0),
        recalled("h_c", "101.6", h_c, "mm"),
        recalled("psi", "-0.949", psi, "-"),
        recalled("k_sigma of the web", "22.58", web_buckling_factor(psi), "-"),
        recalled("h_eff", "97.5", web.h_1 / 0.4, "mm"),
        recalled("h_1", "39", web.h_1, "mm"),
        recalled("h_2", "154.9", web.h_2, "mm"),
    };
}

std::vector<Row> effective_section() {
    const auto effective = en1993_1_3::effective(mid_line(), s350);
    return {
        rounded(recalled("A_eff", "689.2", effective.A, "mm2"), "printed from t_red = 1.445", 0.6),
        recalled("z_c", "102.3", effective.z_c, "mm"),
        recalled("z_t", "95.7", effective.z_t, "mm"),
        recalled("I_eff,y", "4.140e6", effective.I, "mm4"),
        rounded(recalled("W_eff,y,c", "40463", effective.I / effective.z_c, "mm3"),
                "one in the fifth digit: printed from t_red = 1.445", 1.0),
        recalled("W_eff,y,t", "43264", effective.I / effective.z_t, "mm3"),
    };
}

} // namespace

Example lipped_channel_section() {
    Example e;
    e.title = "Effective section of a cold-formed lipped channel in bending";
    e.source =
        "Access Steel SX022a-EN-EU, Calculation of effective section properties for a cold-formed lipped channel "
        "section in bending, V. Ungureanu, A. Ruff, checked D. Dubina, December 2005";
    e.inputs = "C 200x74/66x20.8x2 r3, core 1.96 mm, f_yb = 350 MPa, E = 210000 MPa, nu = 0.3, gamma_M0 = 1.0; spring "
               "stiffness and b_e1 of the first step kept";
    for (auto rows : {gross_section(), first_step(), settled_flange_and_web(), effective_section()}) {
        for (Row& row : rows) e.rows.push_back(std::move(row));
    }
    return e;
}

} // namespace published

TEST_CASE("SX022: effective section of a lipped channel", "[published]") {
    published::check(published::lipped_channel_section());
}

// Not printed in the source: worked out once by hand from the printed rules.
TEST_CASE("SX022: gross second moment of area and moment resistance", "[published]") {
    CHECK(lipped_channel::gross(published::mid_line()).I == Approx(4495921).epsilon(0).margin(0.5));
    CHECK(en1993_1_3::resistance_corner_factor(published::mid_line(), 3.0, 0.9) == 1.0);
    const auto effective = en1993_1_3::effective(published::mid_line(), published::s350);
    const double W = en1993_1_3::section_modulus(effective, effective.I);
    CHECK(en1993_1_3::moment_resistance(W, 350.0, 1.0) == Approx(14.16e6).epsilon(0).margin(0.005e6));
}
