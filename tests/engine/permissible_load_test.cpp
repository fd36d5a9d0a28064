// SPDX-License-Identifier: MIT
#include "engine/independent_to_engine.hpp"
#include "engine/independent_vibration.hpp"
#include "engine/random_cases.hpp"

#include "spanledger/engine/permissible_load.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

// The permissible load judged by the independent calculation: q_k is put into its load class and every limit checked.

namespace {

constexpr double load_step = 1e-5; // N/mm2: 0.01 kN/m2

bool carries(independent::Case c, double q, double L) {
    c.loads.q = q;
    for (const LimitDefinition& definition : limit_definitions) {
        if (!independent::active(c, definition.limit)) continue;
        const double cap = definition.limit == Limit::stock_length ? 1.0 : c.cap;
        if (!(independent::utilisation(c, definition.limit, L) <= cap * (1.0 + 1e-12))) return false;
    }
    return true;
}

} // namespace

TEST_CASE("the permissible load is carried and a little more is not") {
    independent::Random random(20240606);
    int found = 0;
    int none = 0;
    for (int i = 0; i < 3000; ++i) {
        const independent::Case c = independent::random_case(random);
        const double clear_span = random.between(1000, 6000);
        const double L = clear_span + independent::span_addition(c);
        INFO("case " << i << ": " << independent::describe(c) << " clear span " << clear_span);
        const auto engine = independent::to_engine(c);
        const LoadSolver solver(engine.inputs, engine.member, engine.load());
        const PermissibleLoad load = solver.at(c.spacing, clear_span);
        const Cell cell = solver.cell(c.spacing, clear_span);
        if (!load.variable) {
            ++none;
            CHECK(!carries(c, 0.0, L));
            CHECK(!cell.value);
            CHECK(cell.reason == "a limit fails without variable action");
            continue;
        }
        ++found;
        CHECK(carries(c, *load.variable * (1.0 - 1e-9), L));
        REQUIRE(cell.value);
        CHECK(carries(c, *cell.value, L));
        if (!load.governing) continue;
        CHECK(!carries(c, *load.variable * (1.0 + 1e-9) + 1e-12, L));
        CHECK(*cell.value <= *load.variable + 1e-12);
        CHECK(*cell.value > *load.variable - load_step - 1e-12);
    }
    CHECK(found > 500);
    CHECK(none > 100);
}

TEST_CASE("the limit that governs a permissible load is the one that fails just above it") {
    independent::Random random(20240607);
    for (int i = 0; i < 1500; ++i) {
        independent::Case c = independent::random_case(random);
        const double clear_span = random.between(1000, 6000);
        const auto engine = independent::to_engine(c);
        const PermissibleLoad load = LoadSolver(engine.inputs, engine.member, engine.load()).at(c.spacing, clear_span);
        if (!load.variable || !load.governing) continue;
        INFO("case " << i << ": " << independent::describe(c) << " clear span " << clear_span);
        const double L = clear_span + independent::span_addition(c);
        c.loads.q = *load.variable * (1.0 + 1e-9) + 1e-12;
        CHECK(independent::utilisation(c, *load.governing, L) > c.cap);
    }
}
