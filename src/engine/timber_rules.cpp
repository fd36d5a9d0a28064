// SPDX-License-Identifier: MIT
#include "spanledger/engine/timber_rules.hpp"

#include "spanledger/engine/action_cases.hpp"
#include "spanledger/engine/timber_joist.hpp"
#include "timber_plans.hpp"

#include <algorithm>

namespace spanledger {
namespace {

/// The same numbers as another number type.
template <class N> TimberInputs<N> lifted(const TimberInputs<double>& from) {
    std::vector<double> values;
    timber_fields(from, [&](double value, const char*, const char*, const char*) { values.push_back(value); });
    TimberInputs<N> to;
    auto next = values.begin();
    timber_fields(to, [&](N& field, const char*, const char*, const char*) { field = N(*next++); });
    return to;
}

/// (6.4) solved for the bearing length that leaves the design stress at the design strength.
double bearing_length_for(double contact_length, double extra) {
    return contact_length <= 2.0 * extra ? contact_length / 2.0 : contact_length - extra;
}

class TimberJoistAt : public Joist {
public:
    TimberJoistAt(const TimberKinds& kinds, const TimberInputs<double>& inputs)
        : kinds_(&kinds), inputs_(inputs), joist_(kinds, inputs) {}

    void checks(Limit limit, double L, Check<double>* out) const override {
        joist_.checks(limit, L, [&out](double demand, double resistance) { *out++ = {demand, resistance}; });
    }

    [[nodiscard]] JoistFacts facts(double L) const override {
        JoistFacts facts;
        facts.deflections = deflections(L);
        if (!kinds_->cantilever && joist_.actions().permanent() > 0.0) facts.first_frequency = joist_.first_frequency(L);
        facts.reactions = reactions(L);
        if (!kinds_->cantilever) facts.bearing_length_needed = bearing_length_needed(L);
        return facts;
    }

private:
    std::vector<JoistFacts::Deflection> deflections(double L) const {
        std::vector<JoistFacts::Deflection> rows{{"variable", {}, -1.0}, {"instantaneous", {}, -1.0}, {"final", {}, -1.0}};
        for (const ServiceCase& service : kinds_->service) {
            const auto w = joist_.deflections(service, L);
            const double w_Q = w.w_partitions + w.w_Q;
            const std::array values{w_Q, w.w_G + w_Q, joist_.net_final(service, L)};
            for (std::size_t i = 0; i < rows.size(); ++i) {
                if (values[i] > rows[i].mm) rows[i] = {rows[i].name, service.label, values[i]};
            }
        }
        return rows;
    }

    double support_force(const beam::Load<double>& load, double L) const {
        return kinds_->cantilever ? beam::cantilever::shear(load, L) : beam::simply_supported::shear(load, L);
    }

    std::vector<JoistFacts::Reaction> reactions(double L) const {
        std::vector<JoistFacts::Reaction> rows;
        rows.push_back({"G", support_force({joist_.actions().permanent(), 0.0}, L)});
        std::vector<Action> listed;
        for (const CombinationCase& combination : kinds_->combinations) {
            const Action action = combination.action;
            if (action == Action::none || std::find(listed.begin(), listed.end(), action) != listed.end()) continue;
            listed.push_back(action);
            rows.push_back({"Q: " + action_name(action), support_force(joist_.actions().characteristic(action), L)});
        }
        std::size_t worst = 0;
        for (std::size_t i = 1; i < kinds_->combinations.size(); ++i) {
            if (joist_.reaction(i, L) > joist_.reaction(worst, L)) worst = i;
        }
        rows.push_back({"design: " + kinds_->combinations[worst].label, joist_.reaction(worst, L)});
        return rows;
    }

    double bearing_length_needed(double L) const {
        double contact = 0.0;
        for (std::size_t i = 0; i < kinds_->combinations.size(); ++i) {
            contact = std::max(contact, joist_.reaction(i, L) / joist_.bearing_resistance_per_length(i, L));
        }
        return bearing_length_for(contact, inputs_.contact_extra);
    }

    const TimberKinds* kinds_;
    TimberInputs<double> inputs_;
    TimberJoist<double> joist_;
};

class TimberRules : public JoistRules {
public:
    TimberRules(TimberKinds kinds, const TimberInputs<double>& inputs, LimitPlans plans)
        : kinds_(std::move(kinds)), inputs_(inputs), lifted_(lifted<Growth>(inputs)) {
        plans_ = std::move(plans);
    }

    [[nodiscard]] std::unique_ptr<Joist> at(const Variation& variation) const override {
        TimberInputs<double> inputs = inputs_;
        inputs.actions.spacing = variation.spacing;
        inputs.actions.q_k = variation.variable;
        return std::make_unique<TimberJoistAt>(kinds_, inputs);
    }

    void growth(Limit limit, const Growth& spacing, const Growth& L, Check<Growth>* out) const override {
        TimberInputs<Growth> inputs = lifted_;
        inputs.actions.spacing = spacing;
        const TimberJoist<Growth> joist(kinds_, inputs);
        joist.checks(limit, L, [&out](const Growth& demand, const Growth& resistance) { *out++ = {demand, resistance}; });
    }

    [[nodiscard]] std::vector<double> breaks(Limit limit) const override {
        switch (limit) {
        case Limit::bearing: return {2.0 * inputs_.h + inputs_.t};
        case Limit::lateral_buckling: return lateral_buckling_breaks();
        case Limit::unit_load_deflection:
        case Limit::velocity_response: return {inputs_.a_short_span};
        case Limit::shear: return {2.0 * inputs_.h + inputs_.t, inputs_.h + inputs_.t / 2.0};
        default: return {};
        }
    }

    [[nodiscard]] double span_addition() const override { return kinds_.cantilever ? inputs_.t / 2.0 : inputs_.t; }
    [[nodiscard]] std::string span_rule() const override {
        return kinds_.cantilever ? "L = Lc + t/2 (clear projection and half the root's bearing)"
                                 : "L = Lc + t (clear span and half a bearing at each end)";
    }
    [[nodiscard]] double depth() const override { return inputs_.h; }

    [[nodiscard]] std::vector<std::string> notes() const override {
        std::vector<std::string> notes;
        if (kinds_.cantilever) {
            notes.emplace_back("Cantilever with a fixed root: rotation of the back span, hold-down and the bearing of "
                               "the root are not checked here; they are the reader's.");
        }
        return notes;
    }

private:
    /// Where the restraints begin to count, and where kcrit steps. The square of the slenderness is linear in l_ef and
    /// so in L, but for the least value of l_ef, which only holds for spans near the depth.
    [[nodiscard]] std::vector<double> lateral_buckling_breaks() const {
        TimberKinds unrestrained = kinds_;
        unrestrained.restrained_at_intervals = false;
        const TimberJoist<double> joist(unrestrained, inputs_);
        const double L_1 = 10.0 * inputs_.h;
        const double L_2 = 2.0 * L_1;
        std::vector<double> spans;
        if (kinds_.restrained_at_intervals) spans.push_back(inputs_.restraint_spacing);
        for (const bool end_force : {false, true}) {
            const double at_1 = squared(joist.relative_slenderness(L_1, end_force));
            const double slope = (squared(joist.relative_slenderness(L_2, end_force)) - at_1) / (L_2 - L_1);
            for (const double lambda : {en1995::stocky_up_to, en1995::intermediate_up_to}) {
                spans.push_back(L_1 + (squared(lambda) - at_1) / slope);
            }
        }
        return spans;
    }

    TimberKinds kinds_;
    TimberInputs<double> inputs_;
    TimberInputs<Growth> lifted_;
};

} // namespace

std::unique_ptr<JoistRules> make_timber_rules(const Inputs& inputs, const TimberMember& member, const LoadClass& load,
                                              UniformAction uniform) {
    TimberKinds kinds = timber_kinds(inputs, member, load, uniform);
    LimitPlans plans = timber_plans(inputs, member, load, kinds);
    return std::make_unique<TimberRules>(std::move(kinds), timber_inputs(inputs, member, load), std::move(plans));
}

} // namespace spanledger
