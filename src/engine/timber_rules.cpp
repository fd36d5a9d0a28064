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

    static JoistFacts facts(const Kinds& kinds, const Inputs<double>& inputs, const Joist<double>& joist, double L);
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
                             const TimberJoist<double>& joist, double L) {
    double contact = 0.0;
    for (std::size_t i = 0; i < kinds.combinations.size(); ++i) {
        contact = std::max(contact, joist.reaction(i, L) / joist.bearing_resistance_per_length(i, L));
    }
    return bearing_length_for(contact, inputs.contact_extra);
}

JoistFacts TimberFamily::facts(const Kinds& kinds, const Inputs<double>& inputs, const Joist<double>& joist, double L) {
    JoistFacts facts;
    facts.deflections = largest_deflections(
        kinds.service, {"variable", "instantaneous", "final"}, [&](const ServiceCase& service) {
            const auto w = joist.deflections(service, L);
            const double w_Q = w.w_partitions + w.w_Q;
            return std::vector{w_Q, w.w_G + w_Q, joist.net_final(service, L)};
        });
    if (!kinds.cantilever && joist.actions().permanent() > 0.0) facts.first_frequency = joist.first_frequency(L);
    facts.reactions = support_reactions(kinds, joist, L, kinds.cantilever);
    if (!kinds.cantilever) facts.bearing_length_needed = bearing_length_needed(kinds, inputs, joist, L);
    return facts;
}

std::vector<double> TimberFamily::breaks(const Kinds& kinds, const Inputs<double>& inputs, Limit limit) {
    switch (limit) {
    case Limit::bearing: return {2.0 * inputs.h + inputs.t};
    case Limit::lateral_buckling:
        return kinds.restrained_at_intervals ? std::vector{inputs.restraint_spacing} : std::vector<double>{};
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
