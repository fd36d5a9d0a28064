// SPDX-License-Identifier: MIT
#include "spanledger/engine/rolled_rules.hpp"

#include "rolled_plans.hpp"
#include "spanledger/engine/rolled_joist.hpp"

#include <algorithm>

namespace spanledger {
namespace {

/// The same numbers as another number type.
template <class N> RolledInputs<N> lifted(const RolledInputs<double>& from) {
    std::vector<double> values;
    rolled_fields(from, [&](double value, const char*, const char*, const char*) { values.push_back(value); });
    RolledInputs<N> to;
    auto next = values.begin();
    rolled_fields(to, [&](N& field, const char*, const char*, const char*) { field = N(*next++); });
    return to;
}

class RolledJoistAt : public Joist {
public:
    RolledJoistAt(const RolledKinds& kinds, const RolledInputs<double>& inputs,
                  const RolledProperties<double>& section)
        : kinds_(&kinds), inputs_(inputs), joist_(kinds, inputs, section) {}

    void checks(Limit limit, double L, Check<double>* out) const override {
        joist_.checks(limit, L, [&out](double demand, double resistance) { *out++ = {demand, resistance}; });
    }

    [[nodiscard]] JoistFacts facts(double L) const override {
        JoistFacts facts;
        if (!kinds_->refusal.empty()) return facts;
        facts.deflections = deflections(L);
        if (!kinds_->cantilever && joist_.actions().permanent() > 0.0) facts.first_frequency = lowest_frequency(L);
        facts.reactions = reactions(L);
        if (!kinds_->cantilever && !kinds_->web_stiffened) facts.bearing_length_needed = bearing_length_needed(L);
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

    /// The shortest bearing at which the web resists the reaction; empty where none is long enough.
    std::optional<double> bearing_length_needed(double L) const {
        const double R = joist_.reaction(worst_combination(L), L);
        RolledInputs<double> inputs = inputs_;
        const auto resists = [&](double t) {
            inputs.t = t;
            return rolled::end_resistance(inputs) >= R;
        };
        double too_short = 0.0;
        double long_enough = rolled_section::web_depth(inputs.size);
        if (resists(too_short)) return 0.0;
        if (!resists(long_enough)) return std::nullopt;
        constexpr double fine_enough = 1e-6; // mm
        while (long_enough - too_short > fine_enough) {
            const double t = (too_short + long_enough) / 2.0;
            (resists(t) ? long_enough : too_short) = t;
        }
        return long_enough;
    }

    const RolledKinds* kinds_;
    RolledInputs<double> inputs_;
    RolledJoist<double> joist_;
};

class RolledRules : public JoistRules {
public:
    RolledRules(RolledKinds kinds, const RolledInputs<double>& inputs, LimitPlans plans)
        : kinds_(std::move(kinds)), inputs_(inputs), section_(rolled_properties(kinds_, inputs)),
          lifted_(lifted<Growth>(inputs)), lifted_section_(rolled_properties(kinds_, lifted_)) {
        plans_ = std::move(plans);
    }

    [[nodiscard]] std::unique_ptr<Joist> at(const Variation& variation) const override {
        RolledInputs<double> inputs = inputs_;
        inputs.actions.spacing = variation.spacing;
        inputs.actions.q_k = variation.variable;
        return std::make_unique<RolledJoistAt>(kinds_, inputs, section_);
    }

    void growth(Limit limit, const Growth& spacing, const Growth& L, Check<Growth>* out) const override {
        RolledInputs<Growth> inputs = lifted_;
        inputs.actions.spacing = spacing;
        const RolledJoist<Growth> joist(kinds_, inputs, lifted_section_);
        joist.checks(limit, L, [&out](const Growth& demand, const Growth& resistance) { *out++ = {demand, resistance}; });
    }

    [[nodiscard]] std::vector<double> breaks(Limit limit) const override {
        const bool jumps = limit == Limit::lateral_buckling && kinds_.restrained_at_intervals;
        return jumps ? std::vector{inputs_.restraint_spacing} : std::vector<double>{};
    }

    [[nodiscard]] double span_addition() const override { return kinds_.cantilever ? inputs_.t / 2.0 : inputs_.t; }
    [[nodiscard]] std::string span_rule() const override {
        return kinds_.cantilever ? "L = Lc + t/2 (clear projection and half the root's bearing)"
                                 : "L = Lc + t (clear span and half a bearing at each end)";
    }
    [[nodiscard]] double depth() const override { return inputs_.size.h; }

    [[nodiscard]] std::vector<std::string> notes() const override {
        std::vector<std::string> notes;
        if (kinds_.cantilever) {
            notes.emplace_back("Cantilever with a fixed root: rotation of the back span, hold-down and the bearing of "
                               "the root are not checked here; they are the reader's.");
        }
        if (kinds_.channel) {
            notes.emplace_back("Channels: the deck or its fixings must keep the load from twisting the joist; twist is "
                               "not checked here.");
        }
        return notes;
    }

private:
    RolledKinds kinds_;
    RolledInputs<double> inputs_;
    RolledProperties<double> section_;
    RolledInputs<Growth> lifted_;
    RolledProperties<Growth> lifted_section_;
};

} // namespace

std::unique_ptr<JoistRules> make_rolled_rules(RolledKinds kinds, const RolledInputs<double>& inputs,
                                              LimitPlans plans) {
    return std::make_unique<RolledRules>(std::move(kinds), inputs, std::move(plans));
}

std::unique_ptr<JoistRules> make_rolled_rules(const Inputs& inputs, const RolledMember& member, const LoadClass& load,
                                              UniformAction uniform) {
    RolledKinds kinds = rolled_kinds(inputs, member, load, uniform);
    LimitPlans plans = rolled_plans(inputs, member, load, kinds);
    return make_rolled_rules(std::move(kinds), rolled_inputs(inputs, member, load), std::move(plans));
}

} // namespace spanledger
