// SPDX-License-Identifier: MIT
#include "engine/independent_to_engine.hpp"
#include "engine/independent_vibration.hpp"
#include "engine/random_cases.hpp"

#include "spanledger/engine/cell_solver.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

// A printed cell judged by the independent calculation.

namespace {

constexpr double step = 10.0; // mm, the default of a table

bool passes_everywhere(const independent::Case& c, double clear_span) {
    const double L = clear_span + independent::span_addition(c);
    for (const LimitDefinition& definition : limit_definitions) {
        if (!independent::active(c, definition.limit)) continue;
        const double cap = definition.limit == Limit::stock_length ? 1.0 : c.cap;
        if (!(independent::utilisation(c, definition.limit, L) <= cap * (1.0 + 1e-12))) return false;
    }
    return true;
}

/// First failures of all active limits as effective spans.
std::array<double, limit_count> first_failures(const independent::Case& c) {
    std::array<double, limit_count> spans{};
    spans.fill(HUGE_VAL);
    for (const LimitDefinition& definition : limit_definitions) {
        if (!independent::active(c, definition.limit)) continue;
        spans[index_of(definition.limit)] = independent::first_failure(c, definition.limit, 10.0);
    }
    return spans;
}

Cell cell_of(const independent::Case& c) {
    const auto engine = independent::to_engine(c);
    return CellSolver(engine.inputs, engine.member, engine.load(), {c.spacing, c.spacing}).permissible_span(c.spacing);
}

void check_printed(const independent::Case& c, const Cell& cell, double L) {
    const double clear = L - independent::span_addition(c);
    REQUIRE(cell.value);
    CHECK(*cell.value == Approx(std::floor(*cell.value / step + 0.5) * step).epsilon(0).margin(1e-9));
    CHECK(*cell.value <= clear + 1e-3);
    CHECK(*cell.value > clear - step - 1e-3);
    CHECK(passes_everywhere(c, *cell.value));
}

} // namespace

TEST_CASE("a printed span passes, the next step fails, and the shortest limit governs") {
    independent::Random random(20240604);
    int printed = 0;
    int bounded = 0;
    int without = 0;
    for (int i = 0; i < 2500; ++i) {
        const independent::Case c = independent::random_case(random);
        INFO("case " << i << ": " << independent::describe(c));
        const Cell cell = cell_of(c);
        const auto spans = first_failures(c);
        const auto shortest = std::min_element(spans.begin(), spans.end());
        if (*shortest < independent::lower_bound(c)) {
            ++without;
            CHECK(!cell.value);
            CHECK(cell.reason == "no span above the lower bound");
        } else if (*shortest >= independent::upper_bound(c)) {
            ++bounded;
            CHECK(!cell.governing);
            CHECK(cell.reason == "no limit reached");
            check_printed(c, cell, independent::upper_bound(c));
        } else if (!cell.value) {
            // Rounded down, the span lies below the lower bound and fails there.
            CHECK(*shortest < independent::lower_bound(c) + step);
        } else {
            ++printed;
            check_printed(c, cell, *shortest);
            REQUIRE(cell.governing);
            CHECK(spans[index_of(*cell.governing)] == Approx(*shortest).epsilon(0).margin(1e-3));
            CHECK(cell.reason.empty());
            CHECK(*cell.permissible + independent::span_addition(c) == Approx(*shortest).epsilon(0).margin(1e-3));
        }
    }
    // The cases must really have been of all three sorts.
    CHECK(printed > 1000);
    CHECK(bounded > 10);
    CHECK(without > 10);
}

TEST_CASE("a printed cell's utilisation is the largest at the printed span and within the cap") {
    independent::Random random(20240605);
    for (int i = 0; i < 2500; ++i) {
        independent::Case c = independent::random_case(random);
        c.stock.reset();
        const Cell cell = cell_of(c);
        if (!cell.value) continue;
        INFO("case " << i << ": " << independent::describe(c));
        double largest = 0.0;
        for (const LimitDefinition& definition : limit_definitions) {
            if (!independent::active(c, definition.limit)) continue;
            const double L = *cell.value + independent::span_addition(c);
            largest = std::max(largest, independent::utilisation(c, definition.limit, L));
        }
        CHECK(cell.utilisation == Approx(largest).epsilon(1e-10));
        CHECK(cell.utilisation <= c.cap * (1.0 + 1e-12));
    }
}

TEST_CASE("a member whose depth leaves no span below the upper bound has no span") {
    independent::Case c;
    c.h = 600;
    c.b = 140;
    c.loads.g = 0.0005;
    c.loads.q = 0.0015;
    c.max_clear = 1000; // below 2h
    const Cell cell = cell_of(c);
    CHECK(!cell.value);
    CHECK(cell.reason == "no span above the lower bound");
}
