// SPDX-License-Identifier: MIT
#include "engine/independent_to_engine.hpp"
#include "engine/independent_vibration.hpp"
#include "engine/random_cases.hpp"

#include "spanledger/engine/sweep.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

// The powers of the span that elementary beam theory gives each limit of a joist under uniform load (common practice,
// no source): M ~ L2, V ~ L, w ~ L4, f ~ 1/L2, so that w/(L/n) ~ L3.

namespace {

Growth growth_of(const independent::Case& c, Limit limit) {
    const auto rules = independent::to_engine(c).rules();
    std::vector<Check<Growth>> checks(rules->plan(limit).parts.size());
    rules->growth(Growth::constant_between(300.0, 600.0))
        ->checks(limit, Growth::span_between(1000.0, 20000.0), checks.data());
    Growth widest = checks.front().demand / checks.front().resistance;
    for (const auto& check : checks) {
        const Growth u = check.demand / check.resistance;
        widest.known = widest.known && u.known;
        widest.order_low = std::min(widest.order_low, u.order_low);
        widest.order_high = std::max(widest.order_high, u.order_high);
    }
    return widest;
}

independent::Case uniform_floor() {
    independent::Case c;
    c.loads.g = 0.0005;
    c.loads.q = 0.0015;
    for (auto& limit : c.deflection) limit = independent::DeflectionLimit{250.0, std::nullopt};
    c.vibration = independent::Vibration::recommended;
    c.stock = 6000;
    return c;
}

struct Order {
    double low;
    double high;
};
void check_order(const independent::Case& c, Limit limit, Order expected) {
    INFO(definition_of(limit).name);
    const Growth u = growth_of(c, limit);
    CHECK(u.known);
    CHECK(u.order_low == Approx(expected.low));
    CHECK(u.order_high == Approx(expected.high));
}

} // namespace

TEST_CASE("under uniform load the limits of a joist are powers of the span") {
    const independent::Case c = uniform_floor();
    check_order(c, Limit::bending, {2, 2});
    check_order(c, Limit::shear, {1, 1});
    check_order(c, Limit::bearing, {1, 1});
    check_order(c, Limit::variable_deflection, {3, 3});
    check_order(c, Limit::instantaneous_deflection, {3, 3});
    check_order(c, Limit::final_deflection, {3, 3});
    check_order(c, Limit::frequency, {2, 2});
    check_order(c, Limit::unit_load_deflection, {3, 3});
}

TEST_CASE("a deflection limit that is a length gives the fourth power, both criteria lie between") {
    independent::Case c = uniform_floor();
    c.deflection[1] = independent::DeflectionLimit{std::nullopt, 14.0};
    check_order(c, Limit::instantaneous_deflection, {4, 4});
    c.deflection[1] = independent::DeflectionLimit{333.0, 14.0};
    check_order(c, Limit::instantaneous_deflection, {3, 4});
}

TEST_CASE("shear deflection and a concentrated load lower the order") {
    independent::Case c = uniform_floor();
    c.shear_deflection = true;
    check_order(c, Limit::variable_deflection, {1, 3});
    c = uniform_floor();
    c.loads.Q = 2000;
    check_order(c, Limit::bending, {1, 2});
    check_order(c, Limit::shear, {0, 1});
}

namespace {

/// Two spans of a piece of the range, the second one longer.
struct TwoSpans {
    double a;
    double b;
};

/// Checks every known part of a limit between two spans of a piece; returns how many were known.
int check_piece(const Joist& joist, Limit limit, const Piece& piece, TwoSpans spans) {
    std::vector<Check<double>> at_a(piece.shapes.size());
    std::vector<Check<double>> at_b(piece.shapes.size());
    joist.checks(limit, spans.a, at_a.data());
    joist.checks(limit, spans.b, at_b.data());
    int known = 0;
    for (std::size_t part = 0; part < piece.shapes.size(); ++part) {
        const CheckShape& shape = piece.shapes[part];
        if (!shape.known || utilisation(at_a[part]) == 0.0) continue;
        ++known;
        const double growth = utilisation(at_b[part]) / utilisation(at_a[part]);
        CHECK(growth >= std::pow(spans.b / spans.a, shape.order_low) * (1.0 - 1e-11));
        CHECK(growth <= std::pow(spans.b / spans.a, shape.order_high) * (1.0 + 1e-11));
    }
    return known;
}

} // namespace

TEST_CASE("what the solver takes as known of a limit is true at random spans") {
    independent::Random random(20240608);
    int known = 0;
    for (int i = 0; i < 400; ++i) {
        const independent::Case c = independent::random_case(random);
        const auto rules = independent::to_engine(c).rules();
        const auto joist = rules->at({.spacing = c.spacing, .variable = c.loads.q});
        const SpanSolver solver(*rules, {independent::lower_bound(c), independent::lower_bound(c) + 8000.0},
                                {c.spacing * 0.9, c.spacing * 1.1}, 1.0);
        for (const LimitDefinition& definition : limit_definitions) {
            for (const Piece& piece : solver.pieces(definition.limit)) {
                const double a = random.between(piece.range.lower, piece.range.upper);
                const double b = a + (piece.range.upper - a) * random.between(0.01, 1.0);
                INFO(independent::describe(c) << ", " << definition.name << " from " << a << " to " << b);
                known += check_piece(*joist, definition.limit, piece, {a, b});
            }
        }
    }
    CHECK(known > 5000);
}
