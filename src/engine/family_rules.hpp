// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/joist_rules.hpp"
#include "spanledger/engine/line_actions.hpp"

#include <algorithm>
#include <utility>

// What the rules of every family of materials share. A Family names its types and functions:
//   Kinds, Inputs<N>, Section<N>, Joist<N>           kinds and numbers a joist is worked out from
//   fields(inputs, visit)                            symbol, unit and meaning of every number
//   section(kinds, inputs)                           all that neither spacing, load nor span changes
//   joist(kinds, inputs, section)
//   facts(kinds, inputs, joist, at)
//   breaks(kinds, inputs, limit), is_cantilever(kinds), depth(inputs), notes(kinds)

namespace spanledger {

/// The combination with the largest reaction.
template <class Kinds, class J> std::size_t worst_combination(const Kinds& kinds, const J& joist, double L) {
    std::size_t worst = 0;
    for (std::size_t i = 1; i < kinds.combinations.size(); ++i) {
        if (joist.reaction(i, L) > joist.reaction(worst, L)) worst = i;
    }
    return worst;
}

/// Reactions under G, under each variable action, and the largest design reaction.
template <class Kinds, class J>
std::vector<JoistFacts::Reaction> support_reactions(const Kinds& kinds, const J& joist, double L, bool cantilever) {
    const auto force = [&](const beam::Load<double>& load) {
        return cantilever ? beam::cantilever::shear(load, L) : beam::simply_supported::shear(load, L);
    };
    std::vector<JoistFacts::Reaction> rows{{"G", force({joist.actions().permanent(), 0.0})}};
    std::vector<Action> listed;
    for (const CombinationCase& combination : kinds.combinations) {
        const Action action = combination.action;
        if (action == Action::none || std::find(listed.begin(), listed.end(), action) != listed.end()) continue;
        listed.push_back(action);
        rows.push_back({"Q: " + action_name(action), force(joist.actions().characteristic(action))});
    }
    const std::size_t worst = worst_combination(kinds, joist, L);
    rows.push_back({"design: " + kinds.combinations[worst].label, joist.reaction(worst, L)});
    return rows;
}

/// The largest deflection of each name over the actions; `values(service)` gives one per name.
template <class Values> std::vector<JoistFacts::Deflection> largest_deflections(const std::vector<ServiceCase>& cases,
                                                                                const std::vector<std::string>& names,
                                                                                const Values& values) {
    std::vector<JoistFacts::Deflection> rows;
    for (const std::string& name : names) rows.push_back({name, {}, -1.0});
    for (const ServiceCase& service : cases) {
        const std::vector<double> w = values(service);
        for (std::size_t i = 0; i < rows.size(); ++i) {
            if (w[i] > rows[i].mm) rows[i] = {rows[i].name, service.label, w[i]};
        }
    }
    return rows;
}

/// Where facts are asked for.
struct FactsAt {
    double L;   ///< effective span, mm
    double cap; ///< utilisation that the bearing may reach
};

template <class Family> class FamilyJoist : public Joist {
public:
    using Kinds = typename Family::Kinds;
    using Inputs = typename Family::template Inputs<double>;

    FamilyJoist(const Kinds& kinds, const Inputs& inputs, const typename Family::template Section<double>& section)
        : kinds_(&kinds), inputs_(inputs), joist_(Family::joist(kinds, inputs, section)) {}

    void checks(Limit limit, double L, Check<double>* out) const override {
        joist_.checks(limit, L, [&out](double demand, double resistance) { *out++ = {demand, resistance}; });
    }

    [[nodiscard]] JoistFacts facts(double L, double cap) const override {
        return Family::facts(*kinds_, inputs_, joist_, {L, cap});
    }

private:
    const Kinds* kinds_;
    Inputs inputs_;
    typename Family::template Joist<double> joist_;
};

template <class Family> class FamilyGrowth : public JoistGrowth {
public:
    FamilyGrowth(const typename Family::Kinds& kinds, const typename Family::template Inputs<Growth>& inputs,
                 const typename Family::template Section<Growth>& section)
        : joist_(Family::joist(kinds, inputs, section)) {}

    void checks(Limit limit, const Growth& L, Check<Growth>* out) const override {
        joist_.checks(limit, L, [&out](const Growth& demand, const Growth& resistance) {
            *out++ = {demand, resistance};
        });
    }

private:
    typename Family::template Joist<Growth> joist_;
};

template <class Family> class FamilyRules : public JoistRules {
public:
    using Kinds = typename Family::Kinds;
    template <class N> using Inputs = typename Family::template Inputs<N>;
    template <class N> using Section = typename Family::template Section<N>;

    FamilyRules(Kinds kinds, const Inputs<double>& inputs, LimitPlans&& plans)
        : kinds_(std::move(kinds)), inputs_(inputs), section_(Family::section(kinds_, inputs_)) {
        plans_ = std::move(plans);
    }

    [[nodiscard]] std::unique_ptr<Joist> at(const Variation& variation) const override {
        return std::make_unique<FamilyJoist<Family>>(kinds_, varied(variation), section_);
    }

    [[nodiscard]] std::unique_ptr<JoistGrowth> growth(const Growth& spacing) const override {
        Inputs<Growth> inputs = lifted<Growth>(inputs_);
        inputs.actions.spacing = spacing;
        return std::make_unique<FamilyGrowth<Family>>(kinds_, inputs, Family::section(kinds_, inputs));
    }

    [[nodiscard]] std::vector<Check<Traced>> trace(Limit limit, const Variation& variation,
                                                   const Traced& clear_span) const override {
        const Inputs<Traced> inputs = lifted<Traced>(varied(variation));
        const Section<Traced> section = Family::section(kinds_, inputs);
        const Traced L = named("L", "mm", "definition of the effective span",
                               Family::is_cantilever(kinds_) ? clear_span + inputs.t / 2.0 : clear_span + inputs.t);
        std::vector<Check<Traced>> checks;
        Family::joist(kinds_, inputs, section)
            .checks(limit, L, [&checks](const Traced& demand, const Traced& resistance) {
                checks.push_back({demand, resistance});
            });
        return checks;
    }

    [[nodiscard]] std::vector<double> breaks(Limit limit) const override {
        return Family::breaks(kinds_, inputs_, limit);
    }
    [[nodiscard]] double span_addition() const override {
        return Family::is_cantilever(kinds_) ? inputs_.t / 2.0 : inputs_.t;
    }
    [[nodiscard]] std::string span_rule() const override {
        return Family::is_cantilever(kinds_) ? "L = Lc + t/2 (clear projection and half the root's bearing)"
                                             : "L = Lc + t (clear span and half a bearing at each end)";
    }
    [[nodiscard]] double depth() const override { return Family::depth(inputs_); }

    [[nodiscard]] std::vector<std::string> notes() const override {
        std::vector<std::string> notes = Family::notes(kinds_);
        if (Family::is_cantilever(kinds_)) {
            notes.emplace_back("Cantilever with a fixed root: rotation of the back span, hold-down and the bearing of "
                               "the root are not checked here; they are the reader's.");
        }
        return notes;
    }

private:
    template <class N> static N lifted_value(double value, const char* symbol, const char* unit, const char* meaning) {
        if constexpr (std::is_same_v<N, Traced>) {
            return Traced::input(value, symbol, unit, meaning);
        } else {
            return N(value);
        }
    }

    /// The same numbers as another number type.
    template <class N> static Inputs<N> lifted(const Inputs<double>& from) {
        std::vector<double> values;
        Family::fields(from, [&](double value, const char*, const char*, const char*) { values.push_back(value); });
        Inputs<N> to;
        auto next = values.begin();
        Family::fields(to, [&](N& field, const char* symbol, const char* unit, const char* meaning) {
            field = lifted_value<N>(*next++, symbol, unit, meaning);
        });
        return to;
    }

    [[nodiscard]] Inputs<double> varied(const Variation& variation) const {
        Inputs<double> inputs = inputs_;
        inputs.actions.spacing = variation.spacing;
        inputs.actions.q_k = variation.variable;
        return inputs;
    }

    Kinds kinds_;
    Inputs<double> inputs_;
    Section<double> section_;
};

} // namespace spanledger
