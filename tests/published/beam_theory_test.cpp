// SPDX-License-Identifier: MIT
#include "published/published.hpp"

#include "spanledger/clauses/beam_effects.hpp"
#include "spanledger/clauses/rectangle.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

// Facts of the trade. Printed values are worked out by hand for q = 2 N/mm, F = 3000 N, L = 4000 mm, b = 60 mm,
// h = 200 mm, E = 10000 MPa: EI = 4e11 N mm2.

namespace published {
namespace {

constexpr double L = 4000.0;
constexpr double EI = 4e11;
constexpr beam::Load<double> uniform{2.0, 0.0};
constexpr beam::Load<double> point{0.0, 3000.0};

Row fact(const char* quantity, const char* printed, double ours, const char* unit) {
    return {Mark::common_practice, quantity, printed, ours, unit};
}

} // namespace

Example beam_theory() {
    namespace simple = beam::simply_supported;
    namespace tip = beam::cantilever;
    Example e;
    e.title = "Beam theory";
    e.source = "common practice, no source";
    e.inputs =
        "q = 2 N/mm, F = 3000 N, L = 4000 mm, b x h = 60 x 200 mm, E = 10000 MPa; printed values worked out by hand";
    e.rows = {
        fact("A = bh", "12000", rectangle::area(60.0, 200.0), "mm2"),
        fact("W = bh2/6", "400000", rectangle::section_modulus(60.0, 200.0), "mm3"),
        fact("I = bh3/12", "40000000", rectangle::second_moment(60.0, 200.0), "mm4"),
        fact("I_z = hb3/12", "3600000", rectangle::weak_second_moment(60.0, 200.0), "mm4"),
        fact("M = qL2/8", "4000000", simple::moment(uniform, L), "Nmm"),
        fact("M = FL/4", "3000000", simple::moment(point, L), "Nmm"),
        fact("V = qL/2", "4000", simple::shear(uniform, L), "N"),
        fact("V = F beside the support", "3000", simple::shear(point, L), "N"),
        fact("w = qL4/(76.8EI)", "16.6667", simple::bending_deflection(uniform, L, EI), "mm"),
        fact("w = FL3/(48EI)", "10.0000", simple::bending_deflection(point, L, EI), "mm"),
        fact("cantilever M = qL2/2", "16000000", tip::moment(uniform, L), "Nmm"),
        fact("cantilever M = FL", "12000000", tip::moment(point, L), "Nmm"),
        fact("cantilever V = qL", "8000", tip::shear(uniform, L), "N"),
        fact("cantilever V = F", "3000", tip::shear(point, L), "N"),
        fact("cantilever w = qL4/(8EI)", "160.0000", tip::bending_deflection(uniform, L, EI), "mm"),
        fact("cantilever w = FL3/(3EI)", "160.0000", tip::bending_deflection(point, L, EI), "mm"),
    };
    return e;
}

} // namespace published

TEST_CASE("beam theory: facts of the trade") {
    published::check(published::beam_theory());
}
