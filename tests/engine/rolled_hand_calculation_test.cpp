// SPDX-License-Identifier: MIT
#include "spanledger/clauses/en1993_1_5_patch_load.hpp"
#include "spanledger/clauses/en1993_bending_with_shear.hpp"
#include "spanledger/clauses/en1993_classification.hpp"
#include "spanledger/clauses/en1993_lateral_buckling.hpp"
#include "spanledger/clauses/en1993_shear.hpp"

#include <catch2/catch.hpp>

#include <array>

using namespace spanledger;

// Clauses against calculations by hand; the steps stand beside the results.

namespace {

Approx by_hand(double value) {
    return Approx(value).epsilon(1e-6);
}

} // namespace

TEST_CASE("the web at an end support: IPE 200, S275, on 50 mm") {
    // h_w 183, k_F = 2 + 6 x 50/183 = 3.639344, F_cr = 660082, m1 = 17.857143, m2 = 9.270311, l_e = 50 (159.8 without
    // cap), l_y = min(155.543, 111.765, 94.2714): lambda_F = 0.46898, so m2 = 0: l_y = min(138.838, 106.081, 85.9191),
    // lambda_F = 0.44772, chi_F = 1, F_Rd = 85.9191 x 5.6 x 275
    const en1993_1_5::PatchedWeb<double> web{183.0, 5.6, 8.5, 100.0, 275.0, 210000.0};
    CHECK(en1993_1_5::critical_load(web, 3.639344262) == by_hand(660082.0682));
    CHECK(en1993_1_5::effective_loaded_length<double>(web, {50.0, 3.639344262, 9.270311419}) == by_hand(94.27141935));
    CHECK(en1993_1_5::end_patch_resistance(web, 50.0, 1.0) == by_hand(132315.346));
    // (6.11) is the least on a short bearing: l_e = 20, l_y = min(108.838, 52.3278, 55.9191)
    CHECK(en1993_1_5::end_patch_resistance(web, 20.0, 1.0) == by_hand(52.327840721 * 5.6 * 275.0));
    CHECK(en1993_1_5::end_patch_resistance(web, 50.0, 1.1) == by_hand(132315.346 / 1.1));
    // s_s is never above h_w, and k_F never above 6
    CHECK(en1993_1_5::end_patch_resistance(web, 183.0, 1.0) == en1993_1_5::end_patch_resistance(web, 900.0, 1.0));
    CHECK(en1993_1_5::buckling_coefficient(web, 122.1) == 6.0);
}

TEST_CASE("the web at an end support buckles: IPE 600, S275, on 50 mm") {
    // k_F = 2.533808, F_cr = 1472457.9, m1 = 18.333333, m2 = 17.498282, l_e = 50, l_y = min(315.466, 160.118, 163.733),
    // lambda_F = 0.599040, chi_F = 0.834668
    const en1993_1_5::PatchedWeb<double> web{562.0, 12.0, 19.0, 220.0, 275.0, 210000.0};
    CHECK(en1993_1_5::end_patch_resistance(web, 50.0, 1.0) == by_hand(441030.8312));
}

TEST_CASE("shear buckling of a slender web: UB 406x140x39, S355") {
    // h_w/t_w = 380.8/6.4 = 59.5 > 72 x 0.813617 = 58.58; lambda_w = 0.846415, chi_w = 0.980606;
    // V_bw = 0.980606 x 355 x 380.8 x 6.4/sqrt(3) = 489823 N; A_v = 2756.93, V_pl = 565054 N
    const rolled_section::Size<double> size{398.0, 141.8, 6.4, 8.6, 10.2};
    const double eps = en1993::epsilon(355.0);
    const double A = rolled_section::area(size, rolled_section::roots_of_i_section);
    const double V_pl = en1993::plastic_shear_resistance(en1993::shear_area_of_i_section(size, A, 1.0), 355.0, 1.0);
    CHECK(A == by_hand(4965.3887));
    CHECK(V_pl == by_hand(565054.203));
    CHECK(en1993::shear_resistance<double>(V_pl, {380.8, 6.4, 355.0, eps, 1.0}, 1.0) == by_hand(489823.1007));
    // In S275 the limit is 66.6: the web does not buckle.
    CHECK(en1993::shear_resistance<double>(V_pl, {380.8, 6.4, 275.0, en1993::epsilon(275.0), 1.0}, 1.0) == V_pl);
}

TEST_CASE("the shear area is never below the web's, and a channel counts one root") {
    const rolled_section::Size<double> sharp{200.0, 100.0, 10.0, 8.0, 0.0};
    CHECK(en1993::shear_area_of_i_section(sharp, 3440.0, 1.0) == by_hand(1920.0)); // 3440 - 1600 + 80, above 1840
    CHECK(en1993::shear_area_of_i_section(sharp, 3440.0, 1.2) == by_hand(2208.0)); // 1.2 x 184 x 10
    CHECK(en1993::shear_area_of_channel<double>({200.0, 80.0, 6.0, 11.0, 13.0}, 2900.0) == by_hand(1349.0));
}

TEST_CASE("bending with shear: the web gives less from half of the shear resistance on") {
    const en1993::WebInBending<double> web{220600.0, 1024.8, 5.6, 200000.0};
    CHECK(en1993::shear_reduction(100000.0, 200000.0) == 0.0);
    CHECK(en1993::shear_reduction(150000.0, 200000.0) == by_hand(0.25));
    CHECK(en1993::shear_reduction(190000.0, 200000.0) == by_hand(0.81));
    CHECK(en1993::shear_reduction(300000.0, 200000.0) == 1.0);
    // (220600 - 0.25 x 1024.8^2/22.4) x 275 = (220600 - 11721.15) x 275
    CHECK(en1993::moment_resistance_with_shear(web, 0.25, 275.0) == by_hand(57441683.75));
}

TEST_CASE("section classes change at the ratios of Table 5.2") {
    for (const double f_y : {235.0, 355.0}) {
        const double eps = en1993::epsilon(f_y);
        const auto limits = {std::array{9.0, 72.0, 1.0}, std::array{10.0, 83.0, 2.0}, std::array{14.0, 124.0, 3.0}};
        for (const auto& [flange, web, section_class] : limits) {
            CHECK(en1993::flange_class(flange * eps * 0.9999, eps) == section_class);
            CHECK(en1993::flange_class(flange * eps * 1.0001, eps) == section_class + 1.0);
            CHECK(en1993::web_class(web * eps * 0.9999, eps) == section_class);
            CHECK(en1993::web_class(web * eps * 1.0001, eps) == section_class + 1.0);
        }
    }
    CHECK(en1993::section_class(1.0, 3.0) == 3.0);
}

TEST_CASE("the general case of lateral buckling, by hand") {
    // curve a, lambda 1: Phi = 0.5 (1 + 0.21 x 0.8 + 1) = 1.084; chi = 1/(1.084 + sqrt(0.175056)) = 0.665603
    CHECK(en1993::reduction_factor(1.0, en1993::general_case(0.21)) == by_hand(0.66560306));
    CHECK(en1993::reduction_factor(0.2, en1993::general_case(0.21)) == 1.0);
    CHECK(en1993::reduction_factor(0.1, en1993::general_case(0.76)) == 1.0);
    // rolled sections: no reduction up to 0.4; Euler's hyperbola bounds a long joist
    CHECK(en1993::reduction_factor<double>(0.4, {0.49, 0.4, 0.75}) == 1.0);
    CHECK(en1993::reduction_factor<double>(5.0, {0.0, 0.4, 0.75}) == by_hand(0.04));
}
