// SPDX-License-Identifier: MIT
#include "spanledger/engine/cold_formed_rules.hpp"

#include "cold_formed_plans.hpp"
#include "family_rules.hpp"
#include "spanledger/engine/cold_formed_joist.hpp"

namespace spanledger {
namespace {

/// EN 1993-1-3: cold-formed lipped channels.
struct ColdFormedFamily {
    using Kinds = ColdFormedKinds;
    template <class N> using Inputs = ColdFormedInputs<N>;
    template <class N> using Joist = ColdFormedJoist<N>;
    template <class N> using Section = ColdFormedProperties<N>;

    template <class X, class Visit> static void fields(X& inputs, Visit&& visit) {
        cold_formed_fields(inputs, std::forward<Visit>(visit));
    }
    template <class N> static Section<N> section(const Kinds& kinds, const Inputs<N>& inputs) {
        return cold_formed_section(inputs, kinds);
    }
    template <class N> static Joist<N> joist(const Kinds& kinds, const Inputs<N>& inputs, const Section<N>& section) {
        return {kinds, inputs, section};
    }

    static JoistFacts facts(const Kinds& kinds, const Inputs<double>& inputs, const Joist<double>& joist, FactsAt at);
    static std::vector<double> breaks(const Kinds& /*kinds*/, const Inputs<double>& /*inputs*/, Limit /*limit*/) {
        return {};
    }
    static bool is_cantilever(const Kinds& /*kinds*/) { return false; } // refused
    static double depth(const Inputs<double>& inputs) { return inputs.size.h; }
    static std::vector<std::string> notes(const Kinds& /*kinds*/) { return {}; }
};

/// (6.15a) solved for the bearing length.
double bearing_length_needed(const ColdFormedJoist<double>& joist, double reaction) {
    return std::max(0.0, 100.0 * joist.section().size.t * (reaction / joist.section().R_w_0 - 1.0));
}

JoistFacts ColdFormedFamily::facts(const Kinds& kinds, const Inputs<double>& /*inputs*/, const Joist<double>& joist,
                                   FactsAt at) {
    const double L = at.L;
    JoistFacts facts;
    if (!kinds.refusal.empty()) return facts;
    facts.deflections =
        largest_deflections(kinds.service, {"variable", "instantaneous"}, [&](const ServiceCase& service) {
            const auto w = joist.deflections(service, L);
            return std::vector{w.w_Q, w.w_inst};
        });
    if (joist.actions().permanent() > 0.0)
        facts.first_frequency = joist.first_frequency(ServiceCase{}, L); // permanent mass
    facts.reactions = support_reactions(kinds, joist, L, false);
    if (!kinds.web_stiffened) {
        facts.bearing_length_needed =
            bearing_length_needed(joist, joist.reaction(worst_combination(kinds, joist, L), L) / at.cap);
    }
    return facts;
}

} // namespace

std::unique_ptr<JoistRules> make_cold_formed_rules(ColdFormedKinds kinds, const ColdFormedInputs<double>& inputs,
                                                   LimitPlans plans) {
    return std::make_unique<FamilyRules<ColdFormedFamily>>(std::move(kinds), inputs, std::move(plans));
}

std::unique_ptr<JoistRules> make_cold_formed_rules(const Inputs& inputs, const ColdFormedMember& member,
                                                   const LoadClass& load, UniformAction uniform) {
    ColdFormedKinds kinds = cold_formed_kinds(inputs, member, load, uniform);
    LimitPlans plans = cold_formed_plans(inputs, member, load, kinds);
    return make_cold_formed_rules(std::move(kinds), cold_formed_inputs(inputs, member, load), std::move(plans));
}

} // namespace spanledger
