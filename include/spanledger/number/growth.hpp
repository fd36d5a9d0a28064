// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

#include <algorithm>
#include <cmath>
#include <limits>

// A number type that answers, for a clause and a range of spans, how its result grows with the span L: it carries an
// enclosure of the value over the range and of the order d ln x / d ln L. Where the order is one number the quantity is
// a multiple of one power of L and inverts in closed form; where it is an interval above zero it crosses a level once,
// between two known spans. Nothing here is kept by hand: the clauses themselves are run with it.

namespace spanledger {

struct Growth {
    double low = 0.0; ///< enclosure of the value
    double high = 0.0;
    double order_low = 0.0; ///< enclosure of the order, where `known`
    double order_high = 0.0;
    bool known = true;   ///< continuous in L, of one sign, with these orders
    bool varies = false; ///< depends on L

    constexpr Growth() noexcept = default;
    constexpr Growth(double x) noexcept
        : low(x), high(x) {} // NOLINT(google-explicit-constructor): a literal in a clause

    /// A quantity that does not change with L but is known only to lie in an interval (a spacing of several).
    static constexpr Growth constant_between(double low, double high) noexcept {
        Growth x(low);
        x.high = high;
        return x;
    }
    /// The span itself, over [low, high].
    static constexpr Growth span_between(double low, double high) noexcept {
        Growth x = constant_between(low, high);
        x.order_low = x.order_high = 1.0;
        x.varies = true;
        return x;
    }

    [[nodiscard]] constexpr bool is_zero() const noexcept { return low == 0.0 && high == 0.0; }
    [[nodiscard]] constexpr bool is_power_law() const noexcept { return known && order_low == order_high; }
};

namespace words {

inline Growth unknown_between(double low, double high) noexcept {
    Growth x = Growth::constant_between(low, high);
    x.known = false;
    x.varies = true;
    return x;
}

constexpr double infinity = std::numeric_limits<double>::infinity();

/// Sum, least, greatest and select of two positive quantities: the order lies between both.
inline Growth joined(const Growth& a, const Growth& b, double low, double high) noexcept {
    Growth x = Growth::constant_between(low, high);
    x.varies = a.varies || b.varies;
    x.known = a.known && b.known && (!x.varies || (a.low >= 0.0 && b.low >= 0.0));
    x.order_low = std::min(a.order_low, b.order_low);
    x.order_high = std::max(a.order_high, b.order_high);
    return x;
}

inline Growth product(const Growth& a, const Growth& b, double b_order_sign) noexcept {
    const auto ends = std::minmax({a.low * b.low, a.low * b.high, a.high * b.low, a.high * b.high});
    Growth x = Growth::constant_between(ends.first, ends.second);
    if (std::isnan(x.low) || std::isnan(x.high)) {
        x.low = -infinity;
        x.high = infinity;
    }
    x.varies = a.varies || b.varies;
    x.known = a.known && b.known;
    const double from = b_order_sign * b.order_low;
    const double to = b_order_sign * b.order_high;
    x.order_low = a.order_low + std::min(from, to);
    x.order_high = a.order_high + std::max(from, to);
    return x;
}

/// Where a > b >= 0 over the whole range, the order of a - b is that of a and b/(a - b) times what it exceeds b's by.
inline void take_order_of_difference(Growth& x, const Growth& a, const Growth& b) noexcept {
    const double weight_low = b.low / (a.high - b.low);
    const double weight_high = b.high / (a.low - b.high);
    const double excess_low = a.order_low - b.order_high;
    const double excess_high = a.order_high - b.order_low;
    x.order_low = a.order_low + std::min(weight_low * excess_low, weight_high * excess_low);
    x.order_high = a.order_high + std::max(weight_low * excess_high, weight_high * excess_high);
    x.known = true;
}

} // namespace words

inline Growth named(const char*, const char*, const char*, const Growth& x) noexcept {
    return x;
}

inline Growth operator+(const Growth& a, const Growth& b) noexcept {
    if (a.is_zero()) return b;
    if (b.is_zero()) return a;
    return words::joined(a, b, a.low + b.low, a.high + b.high);
}

inline Growth operator-(const Growth& a, const Growth& b) noexcept {
    if (b.is_zero()) return a;
    Growth x = words::unknown_between(a.low - b.high, a.high - b.low);
    if (!a.varies && !b.varies) {
        x.varies = false;
        x.known = true;
    } else if (a.known && b.known && b.low >= 0.0 && a.low > b.high) {
        words::take_order_of_difference(x, a, b);
    }
    return x;
}

inline Growth operator-(const Growth& a) noexcept {
    return Growth(0.0) - a;
}

inline Growth operator*(const Growth& a, const Growth& b) noexcept {
    if (a.is_zero() || b.is_zero()) return Growth(0.0);
    return words::product(a, b, 1.0);
}

inline Growth operator/(const Growth& a, const Growth& b) noexcept {
    if (a.is_zero()) return Growth(0.0);
    Growth inverse = b;
    const bool crosses_zero = b.low <= 0.0 && b.high >= 0.0;
    inverse.low = crosses_zero ? -words::infinity : 1.0 / b.high;
    inverse.high = crosses_zero ? words::infinity : 1.0 / b.low;
    inverse.known = b.known && !(crosses_zero && b.varies);
    return words::product(a, inverse, -1.0);
}

/// Whether a comparison holds over the whole range, nowhere, or in parts of it.
struct GrowthCondition {
    bool always = false;
    bool never = false;
    bool varies = false; ///< the answer may change with L
};

inline GrowthCondition operator<=(const Growth& a, const Growth& b) noexcept {
    return {.always = a.high <= b.low, .never = a.low > b.high, .varies = a.varies || b.varies};
}
inline GrowthCondition operator<(const Growth& a, const Growth& b) noexcept {
    return {.always = a.high < b.low, .never = a.low >= b.high, .varies = a.varies || b.varies};
}
inline GrowthCondition operator>=(const Growth& a, const Growth& b) noexcept {
    return b <= a;
}
inline GrowthCondition operator>(const Growth& a, const Growth& b) noexcept {
    return b < a;
}

inline GrowthCondition both(const GrowthCondition& a, const GrowthCondition& b) noexcept {
    return {.always = a.always && b.always, .never = a.never || b.never, .varies = a.varies || b.varies};
}
inline GrowthCondition either(const GrowthCondition& a, const GrowthCondition& b) noexcept {
    return {.always = a.always || b.always, .never = a.never && b.never, .varies = a.varies || b.varies};
}

template <class A, class B> Growth select(const GrowthCondition& condition, A&& a, B&& b) {
    if (condition.always) return Growth(words::value_of(std::forward<A>(a)));
    if (condition.never) return Growth(words::value_of(std::forward<B>(b)));
    const Growth x = words::value_of(std::forward<A>(a));
    const Growth y = words::value_of(std::forward<B>(b));
    Growth result = words::joined(x, y, std::min(x.low, y.low), std::max(x.high, y.high));
    if (condition.varies) {
        // The branch may change along the span with a jump, which no order can describe.
        result.known = false;
        result.varies = true;
    }
    return result;
}

inline Growth least(const Growth& a, const Growth& b) noexcept {
    if (a.high <= b.low) return a;
    if (b.high <= a.low) return b;
    return words::joined(a, b, std::min(a.low, b.low), std::min(a.high, b.high));
}

inline Growth greatest(const Growth& a, const Growth& b) noexcept {
    if (a.low >= b.high) return a;
    if (b.low >= a.high) return b;
    return words::joined(a, b, std::max(a.low, b.low), std::max(a.high, b.high));
}

/// A power with a fixed exponent; the base is not negative.
inline Growth power(const Growth& x, double exponent) noexcept {
    Growth result = x;
    const double at_low = std::pow(std::max(x.low, 0.0), exponent);
    const double at_high = std::pow(std::max(x.high, 0.0), exponent);
    result.low = std::min(at_low, at_high);
    result.high = std::max(at_low, at_high);
    result.order_low = std::min(exponent * x.order_low, exponent * x.order_high);
    result.order_high = std::max(exponent * x.order_low, exponent * x.order_high);
    result.known = x.known && x.low >= 0.0;
    return result;
}

/// A power whose exponent is a quantity of its own: a power law only where that quantity is one fixed number.
inline Growth power(const Growth& x, const Growth& exponent) noexcept {
    if (!exponent.varies && exponent.low == exponent.high) return power(x, exponent.low);
    Growth result = words::unknown_between(0.0, words::infinity);
    if (!x.varies && !exponent.varies) {
        result.varies = false;
        result.known = true;
    }
    return result;
}

inline Growth root(const Growth& x) noexcept {
    return power(x, 0.5);
}
inline Growth squared(const Growth& x) noexcept {
    return x * x;
}
inline Growth cubed(const Growth& x) noexcept {
    return x * x * x;
}
inline Growth fourth(const Growth& x) noexcept {
    return squared(squared(x));
}

inline bool settled(const Growth& /*now*/, const Growth& /*before*/) noexcept {
    return false;
}

inline Growth ln(const Growth& x) noexcept {
    Growth result = words::unknown_between(x.low > 0.0 ? std::log(x.low) : -words::infinity,
                                           x.high > 0.0 ? std::log(x.high) : -words::infinity);
    if (!x.varies) {
        result.varies = false;
        result.known = true;
    }
    return result;
}

} // namespace spanledger
