// SPDX-License-Identifier: MIT
#include "spanledger/engine/formula.hpp"

#include <fmt/format.h>

#include <set>
#include <unordered_set>

namespace spanledger {
namespace {

/// How tightly an operation binds: an operand that binds less is bracketed.
int binding(Operation operation) {
    switch (operation) {
    case Operation::add:
    case Operation::subtract: return 1;
    case Operation::multiply:
    case Operation::divide: return 2;
    case Operation::power: return 3;
    case Operation::select:
    case Operation::less:
    case Operation::less_or_equal:
    case Operation::both:
    case Operation::either: return 0;
    default: return 4;
    }
}

class Writer {
public:
    explicit Writer(bool numbers) : numbers_(numbers) {}

    /// The expression itself, even where it has a name.
    std::string expression(const TraceNode& node) const {
        const auto infix = [&](const char* sign) { return infixed(node, sign); };
        switch (node.operation) {
        case Operation::constant: return number(node.value);
        case Operation::input: return numbers_ ? number(node.value) : node.symbol;
        case Operation::same: return operand(*node.operands[0]);
        case Operation::add: return infix(" + ");
        case Operation::subtract: return infix(" - ");
        case Operation::multiply: return infix("*");
        case Operation::divide: return infix("/");
        case Operation::power: return infix("^");
        case Operation::root: return call("sqrt", node);
        case Operation::logarithm: return call("ln", node);
        case Operation::least: return call("min", node);
        case Operation::greatest: return call("max", node);
        case Operation::select:
            return fmt::format("{} where {}, else {}", operand(*node.operands[1]), operand(*node.operands[0]),
                               operand(*node.operands[2]));
        case Operation::less: return infix(" < ");
        case Operation::less_or_equal: return infix(" <= ");
        case Operation::both: return infix(" and ");
        case Operation::either: return infix(" or ");
        }
        return {};
    }

private:
    static std::string number(double value) { return fmt::format("{:.7g}", value); }

    /// A named quantity by its symbol or value, anything else by its expression.
    std::string operand(const TraceNode& node) const {
        if (!node.is_named()) return expression(node);
        return numbers_ ? number(node.value) : node.symbol;
    }

    int binding_of(const TraceNode& node) const {
        if (node.is_named() || node.operation == Operation::constant) {
            const bool negative = (numbers_ || node.operation == Operation::constant) && node.value < 0.0;
            return negative ? 0 : 4;
        }
        return binding(node.operation);
    }

    std::string bracketed(const TraceNode& node, int least_binding) const {
        return binding_of(node) < least_binding ? "(" + operand(node) + ")" : operand(node);
    }

    std::string infixed(const TraceNode& node, const char* sign) const {
        const int own = binding(node.operation);
        // The right side of - / and ^ needs brackets at the same level too, and so does the left side of ^.
        const bool commutes = node.operation == Operation::add || node.operation == Operation::multiply;
        const bool is_power = node.operation == Operation::power;
        return bracketed(*node.operands[0], is_power ? own + 1 : own) + sign +
               bracketed(*node.operands[1], commutes ? own : own + 1);
    }

    std::string call(const char* name, const TraceNode& node) const {
        std::string text = std::string(name) + "(";
        for (std::size_t i = 0; i < node.operands.size(); ++i)
            text += (i == 0 ? "" : ", ") + operand(*node.operands[i]);
        return text + ")";
    }

    bool numbers_;
};

class Steps {
public:
    std::vector<Trace> of(const std::vector<Trace>& results) {
        for (const Trace& result : results) visit(result);
        return std::move(steps_);
    }

private:
    void visit(const Trace& trace) {
        if (!visited_.insert(trace.get()).second) return;
        for (const Trace& operand : trace->operands) visit(operand);
        if (!trace->is_named()) return;
        const std::string identity = trace->symbol + "=" + formula_text(*trace) + "=" + numbers_text(*trace);
        if (known_.insert(identity).second) steps_.push_back(trace);
    }

    std::unordered_set<const TraceNode*> visited_;
    std::set<std::string> known_;
    std::vector<Trace> steps_;
};

} // namespace

std::vector<Trace> named_steps(const std::vector<Trace>& results) {
    return Steps().of(results);
}

std::string formula_text(const TraceNode& node) {
    return Writer(false).expression(node);
}

std::string numbers_text(const TraceNode& node) {
    return Writer(true).expression(node);
}

} // namespace spanledger
