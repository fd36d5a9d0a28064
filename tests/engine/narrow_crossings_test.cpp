// SPDX-License-Identifier: MIT
#include "engine/independent_to_engine.hpp"
#include "engine/independent_vibration.hpp"
#include "engine/random_cases.hpp"

#include "spanledger/engine/cell_solver.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

// kcrit of (6.34) steps at lambda = 0.75 (1 to 0.9975) and, the other way, at 1.4 (0.5100 to 0.5102): just below 1.4 a
// joist may fail although it passes again a millimetre further. The first failure counts.

namespace {

/// The span at which the relative slenderness of the uniform load reaches lambda; empty where it is not in the range.
std::optional<double> span_at_slenderness(const independent::Case& c, double lambda) {
    double low = independent::lower_bound(c);
    double high = independent::upper_bound(c);
    if (independent::relative_slenderness(c, low, false) >= lambda) return std::nullopt;
    if (independent::relative_slenderness(c, high, false) <= lambda) return std::nullopt;
    while (high - low > 1e-9) {
        const double middle = 0.5 * (low + high);
        (independent::relative_slenderness(c, middle, false) < lambda ? low : high) = middle;
    }
    return low;
}

/// A free joist whose lateral buckling is just exceeded within the last millimetre before lambda.
std::optional<independent::Case> just_exceeded(independent::Random& random, double lambda) {
    independent::Case c = independent::random_case(random);
    c.held = false;
    c.restraint.reset();
    const auto L = span_at_slenderness(c, lambda);
    if (!L) return std::nullopt;
    const double before = independent::utilisation(c, Limit::lateral_buckling, *L - 1e-6);
    c.cap = before * (1.0 - random.between(2e-5, 3e-4));
    return c;
}

} // namespace

TEST_CASE("a failure in the last millimetre before a step of kcrit is found") {
    independent::Random random(20240603);
    int cases = 0;
    while (cases < 300) {
        const double lambda = random.one_of({0.75, 1.4});
        const auto c = just_exceeded(random, lambda);
        if (!c) continue;
        ++cases;
        INFO(independent::describe(*c) << " lambda " << lambda);
        const double L = *span_at_slenderness(*c, lambda);
        double expected = L - 5.0;
        REQUIRE(independent::utilisation(*c, Limit::lateral_buckling, expected) <= c->cap);
        while (independent::utilisation(*c, Limit::lateral_buckling, expected + 0.002) <= c->cap) expected += 0.002;
        const auto engine = independent::to_engine(*c);
        const CellSolver solver(engine.inputs, engine.member, engine.load(), {c->spacing, c->spacing});
        const LimitOutcome found = solver.permissible_span(c->spacing).limits[index_of(Limit::lateral_buckling)];
        REQUIRE(found.kind == LimitOutcome::Kind::spans);
        CHECK(found.clear_span + independent::span_addition(*c) == Approx(expected).margin(0.1).epsilon(0));
    }
}
