// SPDX-License-Identifier: MIT
#include "spanledger/number/growth.hpp"
#include "spanledger/number/step_names.hpp"

#include <catch2/catch.hpp>

#include <cmath>
#include <string>

using namespace spanledger;

namespace {

/// d ln f / d ln L of f(L) = 3 - 1e-9 L2, worked out by hand: -2e-9 L2/(3 - 1e-9 L2).
double order_of_difference(double L) {
    return -2e-9 * L * L / (3.0 - 1e-9 * L * L);
}

} // namespace

TEST_CASE("the order of a positive difference is enclosed", "[growth]") {
    const Growth L = Growth::span_between(1000.0, 40000.0);
    const Growth difference = Growth(3.0) - 1e-9 * squared(L);
    REQUIRE(difference.known);
    for (const double at : {1000.0, 5000.0, 20000.0, 40000.0}) {
        CAPTURE(at);
        CHECK(difference.order_low <= order_of_difference(at));
        CHECK(difference.order_high >= order_of_difference(at));
    }
    CHECK(difference.order_high <= 0.0);
    CHECK(difference.order_low >= -4.0);
}

TEST_CASE("a span less a length grows faster than the span", "[growth]") {
    const Growth clear = Growth::span_between(1000.0, 2000.0) - Growth(100.0);
    REQUIRE(clear.known);
    CHECK(clear.order_low <= 2000.0 / 1900.0);
    CHECK(clear.order_high >= 1000.0 / 900.0);
    CHECK(clear.order_low >= 1.0);
}

TEST_CASE("a difference that may lose its sign stays unknown", "[growth]") {
    const Growth L = Growth::span_between(1000.0, 2000.0);
    CHECK_FALSE((L - Growth(1000.0)).known);
    CHECK_FALSE((Growth(1500.0) - L).known);
    CHECK_FALSE((L - Growth(-5.0)).known);
}

TEST_CASE("only the run in double ends an iteration early", "[growth]") {
    CHECK(settled(1.0, 1.0 + 0.9e-12));
    CHECK_FALSE(settled(1.0, 1.0 + 1.1e-12));
    CHECK(settled(-4.0e6, -4.0e6 - 3.0e-6));
    CHECK_FALSE(settled(Growth(1.0), Growth(1.0)));
}

TEST_CASE("steps of an iteration are numbered from 1", "[growth]") {
    constexpr auto names = step_names<12>("chi_");
    CHECK(std::string(names[0].data()) == "chi_1");
    CHECK(std::string(names[8].data()) == "chi_9");
    CHECK(std::string(names[11].data()) == "chi_12");
}
