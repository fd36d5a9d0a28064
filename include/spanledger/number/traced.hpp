// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/number/plain.hpp"

#include <memory>
#include <string>
#include <string_view>
#include <utility>
#include <vector>

// A number type that remembers how it came about: each value carries its own graph of operations and names. The clauses
// run with it give the formulas of calculation sheets and of the catalogue of limits. There is no tape and no global
// state: what nobody refers to any more is gone.

namespace spanledger {

enum class Operation {
    constant, ///< a number written in a clause
    input,    ///< a number that comes from outside; the clause field then holds its meaning
    same,     ///< a second name for its operand
    add,
    subtract,
    multiply,
    divide,
    power,
    root,
    logarithm,
    least,
    greatest,
    select, ///< condition, then, otherwise
    less,
    less_or_equal,
    both,
    either,
};

struct TraceNode {
    Operation operation = Operation::constant;
    double value = 0.0; ///< of a condition: 1 where it holds, else 0
    std::vector<std::shared_ptr<const TraceNode>> operands;
    std::string symbol; ///< empty where the value has no name
    std::string unit;
    std::string clause;

    [[nodiscard]] bool is_named() const noexcept { return !symbol.empty(); }
};

using Trace = std::shared_ptr<const TraceNode>;

class Traced {
public:
    Traced() : Traced(0.0) {}
    Traced(double constant) // NOLINT(google-explicit-constructor): a literal in a clause
        : trace_(make(Operation::constant, constant, {})) {}
    explicit Traced(Trace trace) : trace_(std::move(trace)) {}

    /// A number from outside, with the meaning a reader needs.
    static Traced input(double value, std::string_view symbol, std::string_view unit, std::string_view meaning) {
        TraceNode node{Operation::input, value, {}, std::string(symbol), std::string(unit), std::string(meaning)};
        return Traced(std::make_shared<const TraceNode>(std::move(node)));
    }

    [[nodiscard]] double value() const noexcept { return trace_->value; }
    [[nodiscard]] const Trace& trace() const noexcept { return trace_; }

    static Trace make(Operation operation, double value, std::vector<Trace> operands) {
        return std::make_shared<const TraceNode>(TraceNode{operation, value, std::move(operands), {}, {}, {}});
    }

private:
    Trace trace_;
};

class TracedCondition {
public:
    explicit TracedCondition(Trace trace) : trace_(std::move(trace)) {}
    [[nodiscard]] bool holds() const noexcept { return trace_->value != 0.0; }
    [[nodiscard]] const Trace& trace() const noexcept { return trace_; }

private:
    Trace trace_;
};

namespace words {
inline Traced traced(Operation operation, double value, const Traced& a, const Traced& b) {
    return Traced(Traced::make(operation, value, {a.trace(), b.trace()}));
}
inline TracedCondition compared(Operation operation, bool holds, const Trace& a, const Trace& b) {
    return TracedCondition(Traced::make(operation, holds ? 1.0 : 0.0, {a, b}));
}
} // namespace words

/// A constant needs no name: a quantity that a kind makes 0 or 1 drops out of the formulas it stands in.
inline Traced named(const char* symbol, const char* unit, const char* clause, const Traced& x) {
    const TraceNode& from = *x.trace();
    if (!from.is_named() && from.operation == Operation::constant) return x;
    TraceNode node = from.is_named() ? TraceNode{Operation::same, from.value, {x.trace()}, {}, {}, {}} : from;
    node.symbol = symbol;
    node.unit = unit;
    node.clause = clause;
    return Traced(std::make_shared<const TraceNode>(std::move(node)));
}

namespace words {
inline bool is_constant(const Traced& x, double value) {
    return x.trace()->operation == Operation::constant && x.value() == value;
}
} // namespace words

inline Traced operator+(const Traced& a, const Traced& b) {
    if (words::is_constant(a, 0.0)) return b;
    if (words::is_constant(b, 0.0)) return a;
    return words::traced(Operation::add, a.value() + b.value(), a, b);
}
inline Traced operator-(const Traced& a, const Traced& b) {
    if (words::is_constant(b, 0.0)) return a;
    return words::traced(Operation::subtract, a.value() - b.value(), a, b);
}
inline Traced operator*(const Traced& a, const Traced& b) {
    if (words::is_constant(a, 0.0) || words::is_constant(b, 0.0)) return Traced(0.0);
    if (words::is_constant(a, 1.0)) return b;
    if (words::is_constant(b, 1.0)) return a;
    return words::traced(Operation::multiply, a.value() * b.value(), a, b);
}
inline Traced operator-(const Traced& a) {
    return Traced(-1.0) * a;
}
inline Traced operator/(const Traced& a, const Traced& b) {
    if (words::is_constant(a, 0.0)) return a;
    if (words::is_constant(b, 1.0)) return a;
    return words::traced(Operation::divide, a.value() / b.value(), a, b);
}

inline TracedCondition operator<(const Traced& a, const Traced& b) {
    return words::compared(Operation::less, a.value() < b.value(), a.trace(), b.trace());
}
inline TracedCondition operator<=(const Traced& a, const Traced& b) {
    return words::compared(Operation::less_or_equal, a.value() <= b.value(), a.trace(), b.trace());
}
inline TracedCondition operator>(const Traced& a, const Traced& b) {
    return b < a;
}
inline TracedCondition operator>=(const Traced& a, const Traced& b) {
    return b <= a;
}
inline TracedCondition both(const TracedCondition& a, const TracedCondition& b) {
    return words::compared(Operation::both, a.holds() && b.holds(), a.trace(), b.trace());
}
inline TracedCondition either(const TracedCondition& a, const TracedCondition& b) {
    return words::compared(Operation::either, a.holds() || b.holds(), a.trace(), b.trace());
}

/// Both branches are worked out: a sheet shows both, and chooses live.
template <class A, class B> Traced select(const TracedCondition& condition, A&& a, B&& b) {
    const Traced x = words::value_of(std::forward<A>(a));
    const Traced y = words::value_of(std::forward<B>(b));
    return Traced(Traced::make(Operation::select, condition.holds() ? x.value() : y.value(),
                               {condition.trace(), x.trace(), y.trace()}));
}

inline Traced least(const Traced& a, const Traced& b) {
    return words::traced(Operation::least, least(a.value(), b.value()), a, b);
}
inline Traced greatest(const Traced& a, const Traced& b) {
    return words::traced(Operation::greatest, greatest(a.value(), b.value()), a, b);
}
inline Traced root(const Traced& x) {
    return Traced(Traced::make(Operation::root, root(x.value()), {x.trace()}));
}
inline Traced ln(const Traced& x) {
    return Traced(Traced::make(Operation::logarithm, ln(x.value()), {x.trace()}));
}
inline Traced power(const Traced& x, const Traced& exponent) {
    return words::traced(Operation::power, power(x.value(), exponent.value()), x, exponent);
}
inline Traced squared(const Traced& x) {
    return words::traced(Operation::power, squared(x.value()), x, Traced(2.0));
}
inline Traced cubed(const Traced& x) {
    return words::traced(Operation::power, cubed(x.value()), x, Traced(3.0));
}
inline Traced fourth(const Traced& x) {
    return words::traced(Operation::power, fourth(x.value()), x, Traced(4.0));
}

/// An iteration is shown to its last step.
inline bool settled(const Traced& /*now*/, const Traced& /*before*/) noexcept {
    return false;
}

} // namespace spanledger
