// SPDX-License-Identifier: MIT
#include "published/published.hpp"

#include "spanledger/clauses/en1993_bending.hpp"
#include "spanledger/clauses/en1993_classification.hpp"
#include "spanledger/clauses/en1993_lateral_buckling.hpp"
#include "spanledger/clauses/en1993_shear.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

namespace published {
namespace {

constexpr rolled_section::Size<double> ipe_330{330.0, 160.0, 7.5, 11.5, 18.0};
constexpr double f_y = 235.0;
constexpr double L = 5700.0;
constexpr double W_pl = 804300.0;
constexpr en1993::LateralStiffness<double> stiffness{210000.0, 80770.0, 788.1e4, 281500.0, 199100e6};

Row class_row(const char* part, double ours) {
    return {Mark::seen, part, "1", ours, "-"};
}

std::vector<Row> classification() {
    const double c_f = rolled_section::i_section::outstand(ipe_330);
    const double c_w = rolled_section::web_flat(ipe_330);
    const double eps = en1993::epsilon(f_y);
    return {
        {Mark::seen, "flange c", "58.25", c_f, "mm"},
        {Mark::seen, "flange c/t_f", "5.07", c_f / ipe_330.t_f, "-"},
        class_row("class of the flange", en1993::flange_class(c_f / ipe_330.t_f, eps)),
        {Mark::seen, "web c", "271", c_w, "mm"},
        {Mark::seen, "web c/t_w", "36.1", c_w / ipe_330.t_w, "-"},
        class_row("class of the web", en1993::web_class(c_w / ipe_330.t_w, eps)),
    };
}

std::vector<Row> buckling() {
    const en1993::LateralLoading<double> loading{1.127, 0.454, 165.0};
    const double M_cr = en1993::critical_moment(stiffness, loading, L);
    const double lambda = en1993::lateral_slenderness(W_pl, f_y, M_cr);
    const en1993::LateralCurve<double> curve{0.49, 0.4, 0.75};
    return {
        {Mark::seen, "pi2 E I_z/L2", "502.75", en1993::weak_axis_critical_load(stiffness, L) / 1e3, "kN"},
        {Mark::seen, "C_2 z_g", "74.91", loading.C_2 * loading.z_g, "mm"},
        {Mark::seen, "M_cr", "113.9", M_cr / 1e6, "kNm"},
        {Mark::seen, "lambda_LT", "1.288", lambda, "-"},
        {Mark::seen, "Phi_LT", "1.340", en1993::buckling_parameter(lambda, curve), "-"},
        {Mark::seen, "chi_LT", "0.480", en1993::reduction_factor(lambda, curve), "-"},
    };
}

std::vector<Row> shear() {
    const double A_v = en1993::shear_area_of_i_section(ipe_330, 6260.0, 1.0);
    return {
        {Mark::from_memory, "A_v, from A = 62.6 cm2", "3080", A_v, "mm2"},
        {Mark::from_memory, "V_pl,Rd", "418", en1993::plastic_shear_resistance(A_v, f_y, 1.0) / 1e3, "kN"},
    };
}

} // namespace

Example lateral_buckling_of_a_beam() {
    Example e;
    e.title = "Section classes, shear and lateral torsional buckling of a floor beam";
    e.source = "Steel Buildings in Europe, Multi-Storey Steel Buildings, Part 4: Detailed Design, Appendix A.1, pages "
               "4-57 to 4-63 (the same example as Access Steel SX001)";
    e.inputs = "span 5.70 m, IPE 330 in S235, unrestrained, E = 210000 and G = 80770 MPa, W_pl,y = 804300 mm3, I_z = "
               "788.1 cm4, I_t = 28.15 cm4, I_w = 199100 cm6, C1 = 1.127; C2 = 0.454 and z_g = 165 mm from memory, "
               "which give the C2 zg that is printed; alpha_LT = 0.49, lambda_LT,0 = 0.4, beta = 0.75";
    for (auto rows : {classification(), buckling(), shear()}) {
        for (Row& row : rows) e.rows.push_back(std::move(row));
    }
    e.not_covered = {
        {"k_c 0.94, f 0.984, chi_LT,mod 0.488", "f of (6.58) is taken as 1 here"},
        {"M_b,Rd 92.24 kNm, M_Ed/M_b,Rd 0.981", "uses chi_LT,mod; with f = 1 M_b,Rd is 90.8 kNm"},
    };
    return e;
}

} // namespace published

TEST_CASE("Steel Buildings in Europe: lateral torsional buckling of a floor beam", "[published]") {
    published::check(published::lateral_buckling_of_a_beam());
}
