// SPDX-License-Identifier: MIT
#include "engine/rolled_cases.hpp"

#include "spanledger/engine/cell_solver.hpp"
#include "spanledger/engine/sweep.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;
namespace plain = independent_rolled;

// Random rolled joists through the engine and through the plain second reading of the basis.

namespace {

constexpr std::uint64_t seed = 1993;

bool same(double a, double b) {
    return std::abs(a - b) <= 1e-12 * std::max(std::abs(a), std::abs(b)) + 1e-15;
}

} // namespace

TEST_CASE("a rolled joist has the same limits, with the same utilisation, as in an independent calculation") {
    independent::Random random(seed);
    std::size_t refused = 0;
    std::array<std::size_t, limit_count> compared{};
    for (int i = 0; i < 20000; ++i) {
        const plain::Case c = plain::random_joist(random);
        const auto engine = plain::to_engine(c);
        const auto rules = engine.rules();
        const auto joist = rules->at({.spacing = c.spacing, .variable = c.loads.q});
        REQUIRE(rules->span_addition() == plain::span_addition(c));
        const double L = plain::span_addition(c) + random.between(300, 12000);
        refused += plain::refused(c) ? 1U : 0U;
        for (const LimitDefinition& definition : limit_definitions) {
            INFO("case " << i << ": " << plain::describe(c) << " L " << L << ", " << definition.name);
            const bool checked = rules->plan(definition.limit).status == LimitStatus::checked;
            REQUIRE(checked == plain::active(c, definition.limit));
            if (!checked) continue;
            if (definition.limit == Limit::bending_with_shear && plain::force_above_shear_resistance(c)) continue;
            ++compared[index_of(definition.limit)];
            const double ours = worst_check(*rules, *joist, definition.limit, L).utilisation;
            const double theirs = plain::utilisation(c, definition.limit, L);
            INFO("engine " << ours << ", independent " << theirs);
            if (!same(ours, theirs)) FAIL_CHECK("different utilisation");
        }
    }
    CHECK(refused > 1000);
    for (const LimitDefinition& definition : limit_definitions) {
        const bool of_steel =
            definition.limit != Limit::final_deflection && definition.limit != Limit::velocity_response;
        CHECK((compared[index_of(definition.limit)] > 1000) == of_steel);
    }
}

namespace {

struct Range {
    double lower;
    double upper;
};

/// First span at which the utilisation exceeds the cap: steps of 10 mm, then bisection.
double first_failure(const plain::Case& c, Limit limit, Range range) {
    const double cap = limit == Limit::stock_length ? 1.0 : c.cap;
    const auto fails = [&](double L) { return plain::utilisation(c, limit, L) > cap * (1 + 1e-12); };
    if (fails(range.lower)) return range.lower;
    for (double L = range.lower; L < range.upper;) {
        const double next = std::min(L + 10.0, range.upper);
        if (fails(next)) {
            double good = L;
            double bad = next;
            while (bad - good > 1e-4) ((fails((good + bad) / 2)) ? bad : good) = (good + bad) / 2;
            return good;
        }
        L = next;
    }
    return range.upper;
}

double placed(const LimitOutcome& outcome, double addition, Range range) {
    switch (outcome.kind) {
    case LimitOutcome::Kind::spans: return outcome.clear_span + addition;
    case LimitOutcome::Kind::never_reached: return range.upper;
    case LimitOutcome::Kind::fails_at_once:
    case LimitOutcome::Kind::not_checked: break;
    }
    return range.lower;
}

} // namespace

TEST_CASE("every limit's permissible span of a rolled joist is the first crossing that a slow scan finds") {
    independent::Random random(seed + 1);
    std::size_t inside = 0;
    for (int i = 0; i < 200; ++i) {
        const plain::Case c = plain::random_joist(random);
        auto engine = plain::to_engine(c);
        engine.inputs.brief.search.max_clear_span = 15000.0;
        const CellSolver solver(engine.inputs, engine.member, engine.load(), {c.spacing, c.spacing});
        if (!not_covered_reason(solver.rules()).empty()) continue;
        const Cell cell = solver.permissible_span(c.spacing);
        const double addition = plain::span_addition(c);
        const Range range{std::max(500.0, 2 * c.section.h) + addition, 15000.0 + addition};
        for (const LimitDefinition& definition : limit_definitions) {
            if (!plain::active(c, definition.limit)) continue;
            if (definition.limit == Limit::bending_with_shear && plain::force_above_shear_resistance(c)) continue;
            INFO("case " << i << ": " << plain::describe(c) << ", " << definition.name);
            const double ours = placed(cell.limits[index_of(definition.limit)], addition, range);
            const double theirs = first_failure(c, definition.limit, range);
            inside += ours > range.lower && ours < range.upper ? 1U : 0U;
            INFO("engine " << ours << ", scan " << theirs);
            CHECK(std::abs(ours - theirs) <= 0.1);
        }
    }
    CHECK(inside > 400);
}
