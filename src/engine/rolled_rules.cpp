// SPDX-License-Identifier: MIT
#include "spanledger/engine/rolled_rules.hpp"

#include "family_rules.hpp"
#include "rolled_plans.hpp"
#include "spanledger/engine/rolled_joist.hpp"

namespace spanledger {
namespace {

/// EN 1993-1-1: rolled I and H sections and parallel-flange channels.
struct RolledFamily {
    using Kinds = RolledKinds;
    template <class N> using Inputs = RolledInputs<N>;
    template <class N> using Joist = RolledJoist<N>;
    template <class N> using Section = RolledProperties<N>;

    template <class X, class Visit> static void fields(X& inputs, Visit&& visit) {
        rolled_fields(inputs, std::forward<Visit>(visit));
    }
    template <class N> static Section<N> section(const Kinds& kinds, const Inputs<N>& inputs) {
        return rolled_properties(kinds, inputs);
    }
    template <class N> static Joist<N> joist(const Kinds& kinds, const Inputs<N>& inputs, const Section<N>& section) {
        return {kinds, inputs, section};
    }

    static JoistFacts facts(const Kinds& kinds, const Inputs<double>& inputs, const Joist<double>& joist, FactsAt at);
    static std::vector<double> breaks(const Kinds& kinds, const Inputs<double>& inputs, Limit limit);
    static bool is_cantilever(const Kinds& kinds) { return kinds.cantilever; }
    static double depth(const Inputs<double>& inputs) { return inputs.size.h; }
    static std::vector<std::string> notes(const Kinds& kinds);
};

/// The shortest bearing at which the web resists the reaction; empty where none is long enough.
std::optional<double> bearing_length_needed(RolledInputs<double> inputs, double reaction) {
    const auto resists = [&](double t) {
        inputs.t = t;
        return rolled::end_resistance(inputs) >= reaction;
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

JoistFacts RolledFamily::facts(const Kinds& kinds, const Inputs<double>& inputs, const Joist<double>& joist,
                               FactsAt at) {
    const double L = at.L;
    JoistFacts facts;
    if (!kinds.refusal.empty()) return facts;
    facts.deflections =
        largest_deflections(kinds.service, {"variable", "instantaneous"}, [&](const ServiceCase& service) {
            const auto w = joist.deflections(service, L);
            return std::vector{w.w_Q, w.w_inst};
        });
    if (!kinds.cantilever && joist.actions().permanent() > 0.0) {
        facts.first_frequency = joist.first_frequency(ServiceCase{}, L); // permanent mass
    }
    facts.reactions = support_reactions(kinds, joist, L, kinds.cantilever);
    if (!kinds.cantilever && !kinds.web_stiffened) {
        facts.bearing_length_needed =
            bearing_length_needed(inputs, joist.reaction(worst_combination(kinds, joist, L), L) / at.cap);
    }
    return facts;
}

std::vector<double> RolledFamily::breaks(const Kinds& kinds, const Inputs<double>& inputs, Limit limit) {
    const bool jumps = limit == Limit::lateral_buckling && kinds.restrained_at_intervals;
    return jumps ? std::vector{inputs.restraint_spacing} : std::vector<double>{};
}

std::vector<std::string> RolledFamily::notes(const Kinds& kinds) {
    if (!kinds.channel) return {};
    return {"Channels: the deck or its fixings must keep the load from twisting the joist; twist is not checked here."};
}

} // namespace

std::unique_ptr<JoistRules> make_rolled_rules(RolledKinds kinds, const RolledInputs<double>& inputs, LimitPlans plans) {
    return std::make_unique<FamilyRules<RolledFamily>>(std::move(kinds), inputs, std::move(plans));
}

std::unique_ptr<JoistRules> make_rolled_rules(const Inputs& inputs, const RolledMember& member, const LoadClass& load,
                                              UniformAction uniform) {
    RolledKinds kinds = rolled_kinds(inputs, member, load, uniform);
    LimitPlans plans = rolled_plans(inputs, member, load, kinds);
    return make_rolled_rules(std::move(kinds), rolled_inputs(inputs, member, load), std::move(plans));
}

} // namespace spanledger
