// SPDX-License-Identifier: MIT
#include "spanledger/engine/timber_rules.hpp"

#include "family_rules.hpp"
#include "spanledger/engine/timber_joist.hpp"
#include "timber_plans.hpp"

namespace spanledger {
namespace {

/// EN 1995-1-1: rectangles of solid timber, glulam and LVL.
struct TimberFamily {
    using Kinds = TimberKinds;
    template <class N> using Inputs = TimberInputs<N>;
    template <class N> using Joist = TimberJoist<N>;
    template <class N> struct Section {}; // a rectangle is quickly worked out anew

    template <class X, class Visit> static void fields(X& inputs, Visit&& visit) {
        timber_fields(inputs, std::forward<Visit>(visit));
    }
    template <class N> static Section<N> section(const Kinds& /*kinds*/, const Inputs<N>& /*inputs*/) { return {}; }
    template <class N>
    static Joist<N> joist(const Kinds& kinds, const Inputs<N>& inputs, const Section<N>& /*section*/) {
        return {kinds, inputs};
    }

    static JoistFacts facts(const Kinds& kinds, const Inputs<double>& inputs, const Joist<double>& joist, FactsAt at);
    static std::vector<double> breaks(const Kinds& kinds, const Inputs<double>& inputs, Limit limit);
    static bool is_cantilever(const Kinds& kinds) { return kinds.cantilever; }
    static double depth(const Inputs<double>& inputs) { return inputs.h; }
    static std::vector<std::string> notes(const Kinds& /*kinds*/) { return {}; }
};

/// (6.4) solved for the bearing length that leaves the design stress at the design strength.
double bearing_length_for(double contact_length, double extra) {
    return contact_length <= 2.0 * extra ? contact_length / 2.0 : contact_length - extra;
}

double bearing_length_needed(const TimberKinds& kinds, const TimberInputs<double>& inputs,
                             const TimberJoist<double>& joist, FactsAt at) {
    double contact = 0.0;
    for (std::size_t i = 0; i < kinds.combinations.size(); ++i) {
        contact = std::max(contact, joist.reaction(i, at.L) / joist.bearing_resistance_per_length(i, at.L) / at.cap);
    }
    return bearing_length_for(contact, inputs.contact_extra);
}

JoistFacts TimberFamily::facts(const Kinds& kinds, const Inputs<double>& inputs, const Joist<double>& joist,
                               FactsAt at) {
    const double L = at.L;
    JoistFacts facts;
    facts.deflections =
        largest_deflections(kinds.service, {"variable", "instantaneous", "final"}, [&](const ServiceCase& service) {
            const auto w = joist.deflections(service, L);
            const double w_Q = w.w_partitions + w.w_Q;
            return std::vector{w_Q, w.w_G + w_Q, joist.net_final(service, L)};
        });
    if (!kinds.cantilever && joist.actions().permanent() > 0.0) facts.first_frequency = joist.first_frequency(L);
    facts.reactions = support_reactions(kinds, joist, L, kinds.cantilever);
    if (!kinds.cantilever) facts.bearing_length_needed = bearing_length_needed(kinds, inputs, joist, at);
    return facts;
}

/// Where the restraints begin to count, and where kcrit steps: it rises at the slenderness of 1.4, so that a joist may
/// fail just below and pass again just above. The square of the slenderness is linear in l_ef and so in L, but for the
/// least value of l_ef, which only holds for spans near the depth.
std::vector<double> lateral_buckling_breaks(const TimberKinds& kinds, const TimberInputs<double>& inputs) {
    TimberKinds unrestrained = kinds;
    unrestrained.restrained_at_intervals = false;
    const TimberJoist<double> joist(unrestrained, inputs);
    const double L_1 = 10.0 * inputs.h;
    const double L_2 = 2.0 * L_1;
    std::vector<double> spans;
    if (kinds.restrained_at_intervals) spans.push_back(inputs.restraint_spacing);
    for (const bool end_force : {false, true}) {
        const double at_1 = squared(joist.relative_slenderness(L_1, end_force));
        const double slope = (squared(joist.relative_slenderness(L_2, end_force)) - at_1) / (L_2 - L_1);
        for (const double lambda : {en1995::stocky_up_to, en1995::intermediate_up_to}) {
            spans.push_back(L_1 + (squared(lambda) - at_1) / slope);
        }
    }
    return spans;
}

std::vector<double> TimberFamily::breaks(const Kinds& kinds, const Inputs<double>& inputs, Limit limit) {
    switch (limit) {
    case Limit::bearing: return {2.0 * inputs.h + inputs.t};
    case Limit::lateral_buckling: return lateral_buckling_breaks(kinds, inputs);
    case Limit::unit_load_deflection:
    case Limit::velocity_response: return {inputs.a_short_span};
    case Limit::shear: return {2.0 * inputs.h + inputs.t, inputs.h + inputs.t / 2.0};
    default: return {};
    }
}

} // namespace

std::unique_ptr<JoistRules> make_timber_rules(const Inputs& inputs, const TimberMember& member, const LoadClass& load,
                                              UniformAction uniform) {
    TimberKinds kinds = timber_kinds(inputs, member, load, uniform);
    LimitPlans plans = timber_plans(inputs, member, load, kinds);
    return std::make_unique<FamilyRules<TimberFamily>>(std::move(kinds), timber_inputs(inputs, member, load),
                                                       std::move(plans));
}

} // namespace spanledger
