// SPDX-License-Identifier: MIT
#include "numeric/simpson.hpp"

#include "spanledger/clauses/beam_effects.hpp"

#include <catch2/catch.hpp>

#include <array>

using namespace spanledger;

// Closed forms of beam theory against equilibrium and the principle of virtual work, integrated numerically.

namespace {

constexpr double L = 4350.0;                // mm
constexpr double q = 1.73;                  // N/mm
constexpr double F = 2140.0;                // N
constexpr double EI = 3.9e11;               // N mm2
constexpr double flexibility = 1.2 / 6.9e6; // kappa/GA, 1/N

using Load = beam::Load<double>;
constexpr Load unit_force{0.0, 1.0};
constexpr std::array load_cases{Load{q, 0.0}, Load{0.0, F}, Load{q, F}};

/// Integral over the span in two smooth halves, for a load or a unit force at mid-span.
double over_span(const std::function<double(double)>& f) {
    return numeric::simpson(f, {0.0, L / 2.0}) + numeric::simpson(f, {L / 2.0, L});
}

/// Internal forces at x from the left support, by equilibrium of the piece to the left.
double simple_moment(double x, const Load& load) {
    const double reaction = load.q * L / 2.0 + load.F / 2.0;
    const double from_load = numeric::simpson([&](double s) { return load.q * (x - s); }, {0.0, x}, 2);
    return reaction * x - from_load - (x > L / 2.0 ? load.F * (x - L / 2.0) : 0.0);
}
double simple_shear(double x, const Load& load) {
    return load.q * L / 2.0 + load.F / 2.0 - load.q * x - (x > L / 2.0 ? load.F : 0.0);
}

/// At x from the root, by equilibrium of the piece to the tip; the moment counted as positive.
double cantilever_moment(double x, const Load& load) {
    return numeric::simpson([&](double s) { return load.q * (s - x); }, {x, L}, 2) + load.F * (L - x);
}
double cantilever_shear(double x, const Load& load) {
    return load.q * (L - x) + load.F;
}

} // namespace

TEST_CASE("largest moment and support shear follow from equilibrium") {
    CHECK(beam::simply_supported::moment<double>({q, F}, L) == Approx(simple_moment(L / 2.0, {q, F})));
    CHECK(beam::cantilever::moment<double>({q, F}, L) == Approx(cantilever_moment(0.0, {q, F})));
    CHECK(beam::cantilever::shear<double>({q, F}, L) == Approx(cantilever_shear(0.0, {q, F})));
    // The force beside the support: as its distance from the support goes to nothing, the support takes all of it.
    CHECK(beam::simply_supported::shear<double>({q, F}, L) == Approx(q * L / 2.0 + F * (L - 1e-9) / L));
}

TEST_CASE("no other section of the span has a larger moment") {
    for (double x = 0.0; x <= L; x += L / 57.0) {
        CHECK(simple_moment(x, {q, F}) <= beam::simply_supported::moment<double>({q, F}, L) * (1.0 + 1e-12));
        CHECK(cantilever_moment(x, {q, F}) <= beam::cantilever::moment<double>({q, F}, L) * (1.0 + 1e-12));
    }
}

TEST_CASE("mid-span deflection of a simply supported joist is that of virtual work") {
    for (const Load& load : load_cases) {
        const double bending =
            over_span([&](double x) { return simple_moment(x, load) * simple_moment(x, unit_force) / EI; });
        CHECK(beam::simply_supported::bending_deflection<double>(load, L, EI) == Approx(bending));
        // Simpson's rule straddles the step of the shear at mid-span, so each half is taken from inside.
        const double half = L / 2.0 * (1.0 - 1e-12);
        const double shear =
            2.0 * numeric::simpson(
                      [&](double x) { return simple_shear(x, load) * simple_shear(x, unit_force) * flexibility; },
                      {0.0, half});
        CHECK(beam::simply_supported::shear_deflection<double>(load, L, flexibility) == Approx(shear));
    }
}

TEST_CASE("tip deflection of a cantilever is that of virtual work") {
    for (const Load& load : load_cases) {
        const double bending = numeric::simpson(
            [&](double x) { return cantilever_moment(x, load) * cantilever_moment(x, unit_force) / EI; }, {0.0, L});
        CHECK(beam::cantilever::bending_deflection<double>(load, L, EI) == Approx(bending));
        const double shear = numeric::simpson(
            [&](double x) { return cantilever_shear(x, load) * cantilever_shear(x, unit_force) * flexibility; },
            {0.0, L});
        CHECK(beam::cantilever::shear_deflection<double>(load, L, flexibility) == Approx(shear));
    }
}
