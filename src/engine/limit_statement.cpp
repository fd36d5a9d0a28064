// SPDX-License-Identifier: MIT
#include "spanledger/engine/limit_statement.hpp"

#include "spanledger/engine/basis.hpp"
#include "spanledger/engine/formula.hpp"
#include "spanledger/member.hpp"

#include <fmt/format.h>

#include <array>
#include <cctype>
#include <map>

namespace spanledger {
namespace {

/// A situation in which a material has as many limits as it can have.
struct Example {
    const char* member;
    CompressionEdge edge;
};

constexpr std::array examples{
    Example{"C24 47x220", CompressionEdge::free},
    Example{"GL24h 90x315", CompressionEdge::free},
    Example{"LVL48P 45x240", CompressionEdge::free},
    Example{"S275 UB 203x133x25", CompressionEdge::free},
    Example{"S350GD C 200x60x20x2 r2", CompressionEdge::held},
};

Inputs example_inputs(const Catalogue& catalogue, CompressionEdge edge) {
    Inputs inputs;
    inputs.catalogue = catalogue;
    Brief& brief = inputs.brief;
    brief.support.compression_edge = edge;
    brief.deck.stiffness = 2.0e9;
    brief.limits.variable_deflection = DeflectionLimit{.ratio = 360.0, .max_mm = {}};
    brief.limits.instantaneous_deflection = DeflectionLimit{.ratio = 300.0, .max_mm = {}};
    brief.limits.final_deflection = DeflectionLimit{.ratio = 250.0, .max_mm = {}};
    brief.limits.frequency = FrequencyLimit{};
    brief.limits.unit_load_deflection = 1.0;
    brief.limits.vibration = VibrationLimit{
        .rule = VibrationRuleSet::uk, .floor_width = 4000.0, .a_mm = {}, .b = {}, .damping = {}, .kamp = {}};
    LoadClass load;
    load.name = "floor";
    load.category = "A";
    load.permanent = 0.0005;
    load.variable = 0.0015;
    load.psi = {0.7, 0.5, 0.3};
    brief.loads.push_back(load);
    return inputs;
}

class Stating {
public:
    Stating(const JoistRules& rules, const Member& member, Limit limit) : rules_(&rules) {
        statement_.limit = limit;
        statement_.material = material_name(member);
        statement_.example = member_name(member) + ", single span, uniform load";
        statement_.clause = rules.plan(limit).clause;
    }

    LimitStatement state() {
        const LimitPlan& plan = rules_->plan(statement_.limit);
        if (plan.status != LimitStatus::checked) {
            statement_.not_checked = plan.reason;
            return std::move(statement_);
        }
        const Traced clear_span = Traced::input(4000.0, "L_c", "mm", "clear span");
        const auto checks = rules_->trace(statement_.limit, {.spacing = 400.0, .variable = 0.0015}, clear_span);
        // The last check: the combination with the variable action.
        const Check<Traced> check{named("demand", plan.unit.c_str(), "", checks.back().demand),
                                  named("resistance", plan.unit.c_str(), "", checks.back().resistance)};
        for (const Trace& step : named_steps({check.demand.trace(), check.resistance.trace()})) add(*step);
        statement_.assumptions = {"g = 9.81 m/s2; first-generation Eurocodes", rules_->span_rule()};
        if (!plan.when_failing.empty()) statement_.assumptions.push_back(plan.when_failing);
        if (iterated_) {
            statement_.assumptions.emplace_back(
                "the first two steps of an iteration are shown; it runs until it settles, "
                "at most 50 steps");
        }
        return std::move(statement_);
    }

private:
    /// A line without its step numbers: the steps of an iteration differ in nothing else.
    static std::string shape(const std::string& line) {
        std::string text;
        for (const char c : line) {
            if (std::isdigit(static_cast<unsigned char>(c)) == 0) text += c;
        }
        return text;
    }

    void add(const TraceNode& step) {
        if (step.operation == Operation::input) {
            statement_.symbols.push_back({step.symbol, step.unit, step.clause});
            return;
        }
        constexpr int shown_steps = 2;
        const std::string formula = formula_text(step);
        if (++seen_[shape(step.symbol + " = " + formula)] > shown_steps) {
            iterated_ = true;
            return;
        }
        statement_.lines.push_back({step.symbol, formula, step.unit, step.clause});
    }

    const JoistRules* rules_;
    std::map<std::string, int> seen_;
    bool iterated_ = false;
    LimitStatement statement_;
};

} // namespace

std::vector<LimitStatement> limit_statements(const Catalogue& catalogue) {
    std::vector<LimitStatement> statements;
    for (const Example& example : examples) {
        const Inputs inputs = example_inputs(catalogue, example.edge);
        Diagnostics diagnostics;
        const auto member = read_member(example.member, inputs.brief, catalogue, diagnostics);
        if (!member) continue;
        const auto rules = make_rules(inputs, *member, inputs.brief.loads.front());
        for (const LimitDefinition& definition : limit_definitions) {
            statements.push_back(Stating(*rules, *member, definition.limit).state());
        }
    }
    return statements;
}

} // namespace spanledger
