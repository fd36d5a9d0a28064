// SPDX-License-Identifier: MIT
#include "engine/independent_to_engine.hpp"
#include "engine/independent_vibration.hpp"
#include "engine/random_cases.hpp"

#include "spanledger/engine/cell_solver.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

// Every limit of the engine against the independent reading of the design basis.

namespace {

constexpr std::uint64_t seed = 20240601;

/// Relative, with room for a value that is zero but for rounding.
bool same(double a, double b, double relative) {
    return std::abs(a - b) <= relative * std::max(std::abs(a), std::abs(b)) + 1e-15;
}

/// 1e-12, but where (40/f1)^2 - 1 nearly cancels in the velocity response the last digits of f1 count for more.
double tolerance(const independent::Case& c, Limit limit, double L) {
    if (limit != Limit::velocity_response) return 1e-12;
    const double left = std::abs(40.0 / independent::frequency(c, L) - 1.0);
    return 1e-12 * std::max(1.0, 0.01 / left);
}

double engine_utilisation(const JoistRules& rules, const Joist& joist, Limit limit, double L) {
    return worst_check(rules, joist, limit, L).utilisation;
}

} // namespace

TEST_CASE("the same limits are active, with the same utilisation, as in an independent calculation") {
    independent::Random random(seed);
    for (int i = 0; i < 8000; ++i) {
        const independent::Case c = independent::random_case(random);
        const auto engine = independent::to_engine(c);
        const auto rules = engine.rules();
        const auto joist = rules->at({.spacing = c.spacing, .variable = c.loads.q});
        REQUIRE(rules->span_addition() == independent::span_addition(c));
        const double L = independent::span_addition(c) + random.between(300, 9000);
        for (const LimitDefinition& definition : limit_definitions) {
            INFO("case " << i << ": " << independent::describe(c) << " L " << L << ", " << definition.name);
            const bool checked = rules->plan(definition.limit).status == LimitStatus::checked;
            REQUIRE(checked == independent::active(c, definition.limit));
            if (!checked) continue;
            const double ours = engine_utilisation(*rules, *joist, definition.limit, L);
            const double theirs = independent::utilisation(c, definition.limit, L);
            if (!same(ours, theirs, tolerance(c, definition.limit, L))) {
                INFO("engine " << ours << ", independent " << theirs);
                FAIL_CHECK("different utilisation");
            }
        }
    }
}

namespace {

double engine_first_failure(const LimitOutcome& outcome, const JoistRules& rules) {
    switch (outcome.kind) {
    case LimitOutcome::Kind::spans: return outcome.clear_span + rules.span_addition();
    case LimitOutcome::Kind::never_reached: return HUGE_VAL;
    case LimitOutcome::Kind::fails_at_once:
    case LimitOutcome::Kind::not_checked: break;
    }
    return 0.0;
}

/// Whether two answers are one: within 0.1 mm, where "never" counts as the upper bound.
bool same_span(double ours, double theirs, const independent::Case& c) {
    const double upper = independent::upper_bound(c);
    const double lower = independent::lower_bound(c);
    const auto placed = [&](double L) { return std::clamp(L, lower, upper); };
    return std::abs(placed(ours) - placed(theirs)) <= 0.1;
}

} // namespace

TEST_CASE("every limit's permissible span is the first crossing that a slow scan finds") {
    independent::Random random(seed + 1);
    for (int i = 0; i < 4000; ++i) {
        const independent::Case c = independent::random_case(random);
        const auto engine = independent::to_engine(c);
        const CellSolver solver(engine.inputs, engine.member, engine.load(), {c.spacing, c.spacing});
        const Cell cell = solver.permissible_span(c.spacing);
        for (const LimitDefinition& definition : limit_definitions) {
            if (!independent::active(c, definition.limit)) continue;
            INFO("case " << i << ": " << independent::describe(c) << ", " << definition.name);
            const double ours = engine_first_failure(cell.limits[index_of(definition.limit)], solver.rules());
            const double theirs = independent::first_failure(c, definition.limit, 10.0);
            if (!same_span(ours, theirs, c)) {
                INFO("engine " << ours << ", independent " << theirs);
                FAIL_CHECK("different permissible span");
            }
        }
    }
}
