// SPDX-License-Identifier: MIT
#include "engine/independent_to_engine.hpp"
#include "engine/independent_vibration.hpp"
#include "engine/random_cases.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

// What a check reports besides its limits, against the independent calculation.

namespace {

double support_force(const independent::Case& c, double q, double F, double L) {
    return c.cantilever ? q * L + F : q * L / 2.0 + F;
}

void check_deflections(const independent::Case& c, const JoistFacts& facts, double L) {
    independent::Deflections largest{-1.0, -1.0, -1.0};
    for (const auto& w : independent::all_deflections(c, L)) {
        largest.w_Q = std::max(largest.w_Q, w.w_Q);
        largest.w_inst = std::max(largest.w_inst, w.w_inst);
        largest.w_net_fin = std::max(largest.w_net_fin, w.w_net_fin);
    }
    REQUIRE(facts.deflections.size() == 3);
    CHECK(facts.deflections[0].mm == Approx(largest.w_Q).epsilon(1e-11));
    CHECK(facts.deflections[1].mm == Approx(largest.w_inst).epsilon(1e-11));
    CHECK(facts.deflections[2].mm == Approx(largest.w_net_fin).epsilon(1e-11));
}

void check_reactions(const independent::Case& c, const JoistFacts& facts, double L) {
    CHECK(facts.reactions.front().newton == Approx(support_force(c, independent::permanent(c), 0.0, L)).epsilon(1e-11));
    double design = 0.0;
    for (const auto& x : independent::combinations(c)) design = std::max(design, support_force(c, x.q, x.F, L));
    CHECK(facts.reactions.back().newton == Approx(design).epsilon(1e-11));
    for (const auto& reaction : facts.reactions) {
        if (reaction.action == "Q: concentrated") {
            const double partitions = c.loads.partitions * c.spacing;
            CHECK(reaction.newton == Approx(support_force(c, partitions, c.loads.share * c.loads.Q, L)).epsilon(1e-11));
        }
    }
}

/// The contact length at which the bearing stress reaches the strength, by proportion: the stress is R/(b l_ef).
void check_bearing_length(const independent::Case& c, const JoistFacts& facts, double L) {
    REQUIRE(facts.bearing_length_needed.has_value() == !c.cantilever);
    if (c.cantilever) return;
    const double contact = c.bearing + std::min(30.0, c.bearing);
    const double needed = *facts.bearing_length_needed;
    CHECK(needed + std::min(30.0, needed) == Approx(contact * independent::bearing(c, L)).epsilon(1e-11));
}

} // namespace

TEST_CASE("deflections, reactions, frequency and bearing length of a check are those of an independent calculation") {
    independent::Random random(20240609);
    for (int i = 0; i < 2500; ++i) {
        const independent::Case c = independent::random_case(random);
        const double L = independent::lower_bound(c) + random.between(0, 5000);
        INFO("case " << i << ": " << independent::describe(c) << " L " << L);
        const auto rules = independent::to_engine(c).rules();
        const JoistFacts facts = rules->at({.spacing = c.spacing, .variable = c.loads.q})->facts(L, 1.0);
        check_deflections(c, facts, L);
        check_reactions(c, facts, L);
        check_bearing_length(c, facts, L);
        CHECK(facts.first_frequency == Approx(c.cantilever ? 0.0 : independent::frequency(c, L)).epsilon(1e-11));
    }
}
