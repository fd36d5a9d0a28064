// SPDX-License-Identifier: MIT
#include "spanledger/number/growth.hpp"

#include <catch2/catch.hpp>

#include <functional>
#include <vector>

using namespace spanledger;

// Growth says of a quantity between which values it lies and with which power of the span it grows.

namespace {

const Growth span = Growth::span_between(1000.0, 8000.0);

struct Order {
    double low;
    double high;
};
void check_order(const Growth& x, Order expected) {
    CHECK(x.known);
    CHECK(x.order_low == Approx(expected.low));
    CHECK(x.order_high == Approx(expected.high));
}

} // namespace

TEST_CASE("the span grows with its first power and a constant with none") {
    check_order(span, {1, 1});
    CHECK(span.is_power_law());
    check_order(Growth(7.0), {0, 0});
    CHECK_FALSE(Growth(7.0).varies);
}

TEST_CASE("orders add in products, subtract in quotients, and multiply in powers") {
    check_order(span * span, {2, 2});
    check_order(cubed(span), {3, 3});
    check_order(fourth(span), {4, 4});
    check_order(1.0 / squared(span), {-2, -2});
    check_order(5.0 * fourth(span) / span, {3, 3});
    check_order(root(span), {0.5, 0.5});
    check_order(power(span, -1.1), {-1.1, -1.1});
    check_order(power(span, Growth(0.25)), {0.25, 0.25});
    check_order(named("x", "-", "", squared(span)), {2, 2});
}

TEST_CASE("a sum of two powers grows between both") {
    check_order(squared(span) + 3.0 * span, {1, 2});
    CHECK_FALSE((squared(span) + 3.0 * span).is_power_law());
    check_order(squared(span) + 2.0 * squared(span), {2, 2});
    check_order(span + 100.0, {0, 1});
}

TEST_CASE("what is zero leaves the order of the rest alone") {
    check_order(squared(span) + Growth(0.0) * span, {2, 2});
    check_order(Growth(0.0) + cubed(span), {3, 3});
    check_order(span - Growth(0.0), {1, 1});
    CHECK((Growth(0.0) * span).is_zero());
    CHECK((Growth(0.0) / span).is_zero());
}

TEST_CASE("a quotient by what may be zero is not known") {
    const Growth through_zero = span - 2000.0;
    CHECK_FALSE(through_zero.known);
    CHECK_FALSE((1.0 / through_zero).known);
    CHECK_FALSE((span * through_zero).known);
    CHECK_FALSE(root(through_zero).known);
    CHECK_FALSE(ln(span).known);
    CHECK_FALSE(power(2.0, span).known);
    CHECK(ln(Growth(3.0)).known);
    CHECK_FALSE((-span).known);
}

TEST_CASE("a choice that holds over the whole range is that branch") {
    check_order(select(span <= Growth(9000.0), squared(span), cubed(span)), {2, 2});
    check_order(select(span <= Growth(500.0), squared(span), cubed(span)), {3, 3});
    check_order(select(span > Growth(9000.0), squared(span), [] { return cubed(span); }), {3, 3});
}

TEST_CASE("a choice that changes along the span is not known, for it may jump") {
    CHECK_FALSE(select(span <= Growth(4000.0), squared(span), squared(span)).known);
    CHECK_FALSE(select(both(span <= Growth(4000.0), span >= Growth(2000.0)), span, span).known);
    CHECK(select(both(span <= Growth(9000.0), span >= Growth(500.0)), span, squared(span)).is_power_law());
    CHECK(select(either(span <= Growth(4000.0), span >= Growth(500.0)), span, squared(span)).is_power_law());
}

TEST_CASE("a choice that the span does not change keeps an order between both branches") {
    const Growth spacing = Growth::constant_between(400.0, 650.0);
    check_order(select(spacing <= Growth(610.0), Growth(1.1), Growth(1.0)), {0, 0});
    check_order(select(spacing <= Growth(610.0), span, squared(span)), {1, 2});
}

TEST_CASE("least and greatest take the only possible one, or lie between both") {
    check_order(least(span, Growth(9000.0)), {1, 1});
    check_order(greatest(span, Growth(9000.0)), {0, 0});
    check_order(least(span, Growth(4000.0)), {0, 1});
    check_order(greatest(squared(span), 4000.0 * span), {1, 2});
}

namespace {

/// A formula in both number types.
struct Formula {
    const char* words;
    std::function<Growth(const Growth&)> growth;
    std::function<double(double)> value;
};

#define BOTH(expression)                                                                                               \
    Formula {                                                                                                          \
#expression, [](const Growth& L) { return Growth(expression); }, [](double L) { return double(expression); }   \
    }

const std::vector<Formula>& formulas() {
    static const std::vector<Formula> all{
        BOTH(2.0 * squared(L) / 8.0 + 1500.0 * L / 4.0),
        BOTH(fourth(L) / 384.0 + 900.0 * cubed(L) / 48.0),
        BOTH(1.0 / squared(L) * root(1e12 / (L + 20.0))),
        BOTH(least(cubed(L), 5e10)),
        BOTH(greatest(0.9 * L + 440.0, 0.1 * L)),
        BOTH(1.0 / (1.0 / L + 0.001)),
        BOTH(power(L / 300.0, -1.1) * (L + 50.0)),
        BOTH(squared(L) - 100.0 * L),
        BOTH(1.56 - 1e-5 * L),
        BOTH(L / (L - 90.0)),
        BOTH(least(greatest(180.0 - 0.01 * L, 50.0), 150.0)),
    };
    return all;
}
#undef BOTH

/// d ln x / d ln L, by a central difference.
double order_at(const Formula& f, double L) {
    constexpr double d = 1e-5;
    return (std::log(f.value(L * (1.0 + d))) - std::log(f.value(L * (1.0 - d)))) / (2.0 * d);
}

} // namespace

TEST_CASE("what growth encloses holds the value, and the order where it is known, at every span of the range") {
    int known = 0;
    for (const Formula& f : formulas()) {
        for (double low = 500.0; low < 15000.0; low *= 1.7) {
            const double high = low * 2.3;
            const Growth x = f.growth(Growth::span_between(low, high));
            known += x.known ? 1 : 0;
            for (int i = 0; i <= 40; ++i) {
                const double L = low + (high - low) * i / 40.0;
                INFO(f.words << " at " << L << " in " << low << " to " << high);
                CHECK(f.value(L) >= x.low - 1e-12 * std::abs(x.low));
                CHECK(f.value(L) <= x.high + 1e-12 * std::abs(x.high));
                if (!x.known) continue;
                CHECK(order_at(f, L) >= x.order_low - 1e-6);
                CHECK(order_at(f, L) <= x.order_high + 1e-6);
            }
        }
    }
    CHECK(known > 50);
}
