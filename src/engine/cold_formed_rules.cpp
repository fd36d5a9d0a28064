// SPDX-License-Identifier: MIT
#include "spanledger/engine/cold_formed_rules.hpp"

#include "cold_formed_plans.hpp"
#include "spanledger/engine/cold_formed_joist.hpp"

#include <algorithm>

namespace spanledger {
namespace {

/// The same numbers as another number type.
template <class N> ColdFormedInputs<N> lifted(const ColdFormedInputs<double>& from) {
    std::vector<double> values;
    cold_formed_fields(from, [&](double value, const char*, const char*, const char*) { values.push_back(value); });
    ColdFormedInputs<N> to;
    auto next = values.begin();
    cold_formed_fields(to, [&](N& field, const char*, const char*, const char*) { field = N(*next++); });
    return to;
}

class ColdFormedJoistAt : public Joist {
public:
    ColdFormedJoistAt(const ColdFormedKinds& kinds, const ColdFormedInputs<double>& inputs,
                      const ColdFormedProperties<double>& section)
        : kinds_(&kinds), joist_(kinds, inputs, section) {}

    void checks(Limit limit, double L, Check<double>* out) const override {
        joist_.checks(limit, L, [&out](double demand, double resistance) { *out++ = {demand, resistance}; });
    }

    [[nodiscard]] JoistFacts facts(double L) const override {
        JoistFacts facts;
        if (!kinds_->refusal.empty()) return facts;
        facts.deflections = deflections(L);
        if (joist_.actions().permanent() > 0.0) facts.first_frequency = lowest_frequency(L);
        facts.reactions = reactions(L);
        if (!kinds_->web_stiffened) facts.bearing_length_needed = bearing_length_needed(L);
        return facts;
    }

private:
    std::vector<JoistFacts::Deflection> deflections(double L) const {
        std::vector<JoistFacts::Deflection> rows{{"variable", {}, -1.0}, {"instantaneous", {}, -1.0}};
        for (const ServiceCase& service : kinds_->service) {
            const auto w = joist_.deflections(service, L);
            const std::array values{w.w_Q, w.w_inst};
            for (std::size_t i = 0; i < rows.size(); ++i) {
                if (values[i] > rows[i].mm) rows[i] = {rows[i].name, service.label, values[i]};
            }
        }
        return rows;
    }

    double lowest_frequency(double L) const {
        double lowest = words::infinity;
        for (const ServiceCase& service : kinds_->frequency) {
            lowest = std::min(lowest, joist_.first_frequency(service, L));
        }
        return lowest;
    }

    std::vector<JoistFacts::Reaction> reactions(double L) const {
        std::vector<JoistFacts::Reaction> rows;
        const auto force = [&](const beam::Load<double>& load) { return beam::simply_supported::shear(load, L); };
        rows.push_back({"G", force({joist_.actions().permanent(), 0.0})});
        std::vector<Action> listed;
        for (const CombinationCase& combination : kinds_->combinations) {
            const Action action = combination.action;
            if (action == Action::none || std::find(listed.begin(), listed.end(), action) != listed.end()) continue;
            listed.push_back(action);
            rows.push_back({"Q: " + action_name(action), force(joist_.actions().characteristic(action))});
        }
        const std::size_t worst = worst_combination(L);
        rows.push_back({"design: " + kinds_->combinations[worst].label, joist_.reaction(worst, L)});
        return rows;
    }

    std::size_t worst_combination(double L) const {
        std::size_t worst = 0;
        for (std::size_t i = 1; i < kinds_->combinations.size(); ++i) {
            if (joist_.reaction(i, L) > joist_.reaction(worst, L)) worst = i;
        }
        return worst;
    }

    /// (6.15a) solved for the bearing length.
    double bearing_length_needed(double L) const {
        const double over = joist_.reaction(worst_combination(L), L) / joist_.section().R_w_0 - 1.0;
        return std::max(0.0, 100.0 * joist_.section().size.t * over);
    }

    const ColdFormedKinds* kinds_;
    ColdFormedJoist<double> joist_;
};

class ColdFormedRules : public JoistRules {
public:
    ColdFormedRules(ColdFormedKinds kinds, const ColdFormedInputs<double>& inputs, LimitPlans plans)
        : kinds_(std::move(kinds)), inputs_(inputs), section_(cold_formed_section(inputs, kinds_)),
          lifted_(lifted<Growth>(inputs)), lifted_section_(cold_formed_section(lifted_, kinds_)) {
        plans_ = std::move(plans);
    }

    [[nodiscard]] std::unique_ptr<Joist> at(const Variation& variation) const override {
        ColdFormedInputs<double> inputs = inputs_;
        inputs.actions.spacing = variation.spacing;
        inputs.actions.q_k = variation.variable;
        return std::make_unique<ColdFormedJoistAt>(kinds_, inputs, section_);
    }

    void growth(Limit limit, const Growth& spacing, const Growth& L, Check<Growth>* out) const override {
        ColdFormedInputs<Growth> inputs = lifted_;
        inputs.actions.spacing = spacing;
        const ColdFormedJoist<Growth> joist(kinds_, inputs, lifted_section_);
        joist.checks(limit, L, [&out](const Growth& demand, const Growth& resistance) { *out++ = {demand, resistance}; });
    }

    [[nodiscard]] std::vector<double> breaks(Limit) const override { return {}; }
    [[nodiscard]] double span_addition() const override { return inputs_.t; }
    [[nodiscard]] std::string span_rule() const override {
        return "L = Lc + t (clear span and half a bearing at each end)";
    }
    [[nodiscard]] double depth() const override { return inputs_.size.h; }
    [[nodiscard]] std::vector<std::string> notes() const override { return {}; }

private:
    ColdFormedKinds kinds_;
    ColdFormedInputs<double> inputs_;
    ColdFormedProperties<double> section_;
    ColdFormedInputs<Growth> lifted_;
    ColdFormedProperties<Growth> lifted_section_;
};

} // namespace

std::unique_ptr<JoistRules> make_cold_formed_rules(ColdFormedKinds kinds, const ColdFormedInputs<double>& inputs,
                                                   LimitPlans plans) {
    return std::make_unique<ColdFormedRules>(std::move(kinds), inputs, std::move(plans));
}

std::unique_ptr<JoistRules> make_cold_formed_rules(const Inputs& inputs, const ColdFormedMember& member,
                                                   const LoadClass& load, UniformAction uniform) {
    ColdFormedKinds kinds = cold_formed_kinds(inputs, member, load, uniform);
    LimitPlans plans = cold_formed_plans(inputs, member, load, kinds);
    return make_cold_formed_rules(std::move(kinds), cold_formed_inputs(inputs, member, load), std::move(plans));
}

} // namespace spanledger
