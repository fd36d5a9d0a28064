// SPDX-License-Identifier: MIT
#pragma once

#include <algorithm>
#include <cmath>
#include <type_traits>
#include <utility>

// The words in which a clause is written. A clause is a template over its number type N; this header gives the words
// their meaning for N = double. Other number types (growth.hpp, and a tracing one) give the same words another meaning,
// so that no equation stands twice. Rules for clauses: every printed quantity is named, results are const N, no std::
// maths on N, a branch on a number is select, a plain `if` only on kinds, and both branches stay finite.

namespace spanledger {

/// Gives a result its symbol, unit and clause as a checker reads them.
constexpr double named(const char* /*symbol*/, const char* /*unit*/, const char* /*clause*/, double x) noexcept {
    return x;
}

/// Opens a heading for the quantities named in `body`.
template <class Body> constexpr auto under(const char* /*heading*/, Body&& body) {
    return std::forward<Body>(body)();
}

constexpr bool both(bool a, bool b) noexcept {
    return a && b;
}
constexpr bool either(bool a, bool b) noexcept {
    return a || b;
}

namespace words {
/// A branch is a number, or a callable where working it out is costly.
template <class Branch> constexpr decltype(auto) value_of(Branch&& branch) {
    if constexpr (std::is_invocable_v<Branch>) {
        return std::forward<Branch>(branch)();
    } else {
        return std::forward<Branch>(branch);
    }
}
} // namespace words

/// a where the condition holds, else b. Either may be a callable.
template <class A, class B> constexpr double select(bool condition, A&& a, B&& b) {
    return condition ? static_cast<double>(words::value_of(std::forward<A>(a)))
                     : static_cast<double>(words::value_of(std::forward<B>(b)));
}

constexpr double least(double a, double b) noexcept {
    return std::min(a, b);
}
constexpr double greatest(double a, double b) noexcept {
    return std::max(a, b);
}
inline double root(double x) noexcept {
    return std::sqrt(x);
}
inline double power(double x, double exponent) noexcept {
    return std::pow(x, exponent);
}
constexpr double squared(double x) noexcept {
    return x * x;
}
constexpr double cubed(double x) noexcept {
    return x * x * x;
}
constexpr double fourth(double x) noexcept {
    return squared(squared(x));
}
inline double ln(double x) noexcept {
    return std::log(x);
}

/// Whether a step of an iteration no longer changes its result. It may end only the run in double: other number types
/// take every step.
inline bool settled(double now, double before) noexcept {
    return std::abs(now - before) <= 1e-12 * std::abs(now);
}

} // namespace spanledger
