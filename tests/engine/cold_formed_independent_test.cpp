// SPDX-License-Identifier: MIT
#include "engine/independent_channel.hpp"
#include "spanledger/engine/cold_formed_joist.hpp"
#include "spanledger/engine/cold_formed_rules.hpp"
#include "spanledger/engine/sweep.hpp"

#include <catch2/catch.hpp>
#include <fmt/format.h>

#include <random>

// Random channels, loads and limits through the engine and through the plain second implementation.

using namespace spanledger;
namespace plain = independent_channel;

namespace {

class Random {
public:
    explicit Random(std::uint64_t seed) : engine_(seed) {}
    double between(double low, double high) {
        return low + (high - low) * static_cast<double>(engine_() >> 11) * 0x1.0p-53;
    }
    bool chance(double p) { return between(0.0, 1.0) < p; }

private:
    std::mt19937_64 engine_;
};

/// Within the limits of Table 5.1; corners beyond the limits for sharp ones now and then.
plain::Channel random_channel(Random& r) {
    plain::Channel x;
    x.t_nom = r.between(0.9, 3.5);
    const double t = x.t_nom - 0.04;
    x.b1 = r.between(35, std::min(58 * t, 130.0));
    x.b2 = r.chance(0.6) ? x.b1 : x.b1 * r.between(0.8, 1.2);
    const double wide = std::max(x.b1, x.b2), narrow = std::min(x.b1, x.b2);
    x.b2 = std::min(x.b2, 59 * t);
    x.c = r.between(0.2 * wide, std::min({0.6 * narrow, 49 * t}));
    x.h = r.between(2.2 * x.c, std::min(190 * t, 400.0));
    x.r = t * (r.chance(0.7) ? r.between(1, 2.5) : r.between(2.5, 5.9));
    x.f = r.between(220, 550);
    x.gamma_M0 = r.chance(0.5) ? 1.0 : r.between(1.0, 1.15);
    x.gamma_M1 = r.chance(0.5) ? 1.0 : r.between(1.0, 1.15);
    return x;
}

plain::Loads random_loads(Random& r) {
    plain::Loads l;
    l.g = r.between(0.0002, 0.002);
    if (r.chance(0.85)) l.q = r.between(0.0004, 0.006);
    if (r.chance(0.3)) l.partitions = r.between(0.0003, 0.0012);
    if (r.chance(0.2)) l.snow = r.between(0.0004, 0.004);
    if (r.chance(0.5)) l.Q = r.between(900, 9000);
    l.share = r.chance(0.5) ? 1.0 : r.between(0.3, 1.0);
    l.psi0 = r.between(0.5, 1.0);
    l.Q_in_deflection = r.chance(0.3);
    return l;
}

plain::Case random_case(Random& r) {
    plain::Case c;
    c.channel = random_channel(r);
    c.loads = random_loads(r);
    c.spacing = r.between(250, 1500);
    c.bearing = r.between(30, 150);
    c.self_weight = r.chance(0.8);
    c.shear_deflection = r.chance(0.3);
    c.stiffened = r.chance(0.3);
    c.a_and_b = r.chance(0.4);
    for (std::size_t i = 0; i < 2; ++i) {
        c.ratio[i] = r.between(200, 500);
        if (r.chance(0.4)) c.length[i] = r.between(5, 30);
    }
    if (r.chance(0.2)) c.camber = r.between(1, 15);
    c.f_min = r.between(3, 12);
    c.mass_share = r.between(0, 0.4);
    c.unit_limit = r.between(0.3, 4);
    c.stock = r.between(4000, 14000);
    return c;
}

ActionInputs<double> actions_of(const plain::Case& c) {
    ActionInputs<double> x{};
    x.g_k = c.loads.g;
    x.q_k = c.loads.q;
    x.q_partitions = c.loads.partitions;
    x.s_k = c.loads.snow;
    x.Q_k = c.loads.Q;
    x.Q_share = c.loads.share;
    x.psi_0_q = c.loads.psi0;
    x.psi_0_s = c.loads.snow_psi0;
    x.spacing = 1.0;
    x.gamma_G = c.gamma_G;
    x.gamma_Q = c.gamma_Q;
    x.xi = c.xi;
    return x;
}

ColdFormedInputs<double> inputs_of(const plain::Case& c) {
    const plain::Channel& s = c.channel;
    ColdFormedInputs<double> x{};
    x.size = {s.h, s.b1, s.b2, s.c, s.t_nom, s.r};
    x.coating = s.zinc;
    x.f_yb = s.f;
    x.E = s.E;
    x.G = s.G;
    x.nu = s.nu;
    x.rho = s.rho;
    x.gamma_M0 = s.gamma_M0;
    x.gamma_M1 = s.gamma_M1;
    x.t = c.bearing;
    x.stock_length = c.stock;
    x.actions = actions_of(c);
    x.ratio_variable = c.ratio[0].value_or(0);
    x.max_variable = c.length[0].value_or(0);
    x.ratio_instantaneous = c.ratio[1].value_or(0);
    x.max_instantaneous = c.length[1].value_or(0);
    x.camber = c.camber.value_or(0);
    x.min_frequency = c.f_min;
    x.variable_share = c.mass_share;
    x.max_unit_load = c.unit_limit;
    return x;
}

std::vector<Action> actions_present(const plain::Loads& l) {
    std::vector<Action> actions;
    if (l.q > 0 || l.partitions > 0) actions.push_back(Action::uniform);
    if (l.snow > 0) actions.push_back(Action::snow);
    if (l.Q > 0) actions.push_back(Action::concentrated);
    return actions;
}

ColdFormedKinds kinds_of(const plain::Case& c) {
    ColdFormedKinds kinds;
    kinds.web_stiffened = c.stiffened;
    kinds.self_weight = c.self_weight;
    kinds.shear_deflection = c.shear_deflection;
    kinds.camber = c.camber.has_value();
    CombinationCase combination;
    kinds.combinations.push_back(combination);
    for (const Action action : actions_present(c.loads)) {
        combination.action = action;
        combination.combination_value = c.a_and_b;
        combination.reduced_permanent = false;
        kinds.combinations.push_back(combination);
        if (!c.a_and_b) continue;
        combination.combination_value = false;
        combination.reduced_permanent = true;
        kinds.combinations.push_back(combination);
    }
    for (const Action action : actions_present(c.loads)) {
        if (action != Action::concentrated || c.loads.Q_in_deflection) kinds.service.push_back({action, {}});
        if (action != Action::concentrated) kinds.frequency.push_back({action, {}});
    }
    if (kinds.service.empty()) kinds.service.push_back({});
    if (kinds.frequency.empty()) kinds.frequency.push_back({});
    for (std::size_t i = 0; i < 2; ++i) {
        kinds.has_ratio[i] = c.ratio[i].has_value();
        kinds.has_length[i] = c.length[i].has_value();
    }
    return kinds;
}

LimitPlan checked(std::size_t parts) {
    LimitPlan plan;
    plan.status = LimitStatus::checked;
    plan.parts.resize(parts);
    return plan;
}

LimitPlans plans_of(const plain::Case& c, const ColdFormedKinds& kinds) {
    LimitPlans plans;
    const std::size_t combinations = kinds.combinations.size();
    for (const Limit limit : {Limit::bending, Limit::shear, Limit::bending_with_shear}) {
        plans[index_of(limit)] = checked(combinations);
    }
    if (!c.stiffened) plans[index_of(Limit::bearing)] = checked(combinations);
    const auto criteria = [&](std::size_t i) {
        return kinds.service.size() * (std::size_t{c.ratio[i].has_value()} + std::size_t{c.length[i].has_value()});
    };
    plans[index_of(Limit::variable_deflection)] = checked(criteria(0));
    plans[index_of(Limit::instantaneous_deflection)] = checked(criteria(1));
    plans[index_of(Limit::frequency)] = checked(kinds.frequency.size());
    plans[index_of(Limit::unit_load_deflection)] = checked(1);
    return plans;
}

struct Pair {
    Limit limit;
    std::function<double(double)> expected;
};

std::vector<Pair> pairs(const plain::Joist& joist) {
    return {
        {Limit::bending, [&](double L) { return joist.bending(L); }},
        {Limit::shear, [&](double L) { return joist.shear(L); }},
        {Limit::bending_with_shear, [&](double L) { return joist.bending_with_shear(L); }},
        {Limit::bearing, [&](double L) { return joist.bearing(L); }},
        {Limit::variable_deflection, [&](double L) { return joist.deflection(0, L); }},
        {Limit::instantaneous_deflection, [&](double L) { return joist.deflection(1, L); }},
        {Limit::frequency, [&](double L) { return joist.frequency(L); }},
        {Limit::unit_load_deflection, [&](double L) { return joist.unit_load(L); }},
    };
}

std::string describe(const plain::Case& c) {
    const plain::Channel& x = c.channel;
    const plain::Loads& l = c.loads;
    return fmt::format("C {}x{}/{}x{}x{} r{} f {} M0 {} s {} t {} g {} q {} part {} snow {} Q {} share {} stiffened {}",
                       x.h, x.b1, x.b2, x.c, x.t_nom, x.r, x.f, x.gamma_M0, c.spacing, c.bearing, l.g, l.q,
                       l.partitions, l.snow, l.Q, l.share, c.stiffened);
}

} // namespace

TEST_CASE("channels agree with a plain second implementation", "[engine][cold-formed]") {
    Random r(20250611);
    int rounded = 0, reduced = 0, combined = 0;
    for (int n = 0; n < 3000; ++n) {
        const plain::Case c = random_case(r);
        const plain::Joist expected(c);
        const ColdFormedKinds kinds = kinds_of(c);
        const auto rules = make_cold_formed_rules(kinds, inputs_of(c), plans_of(c, kinds));
        const auto joist = rules->at({.spacing = c.spacing, .variable = c.loads.q});
        const double L = r.between(500, 12000);
        INFO(describe(c) << " L " << L);
        for (const Pair& pair : pairs(expected)) {
            if (rules->plan(pair.limit).status != LimitStatus::checked) continue;
            INFO(definition_of(pair.limit).name);
            const double u = worst_check(*rules, *joist, pair.limit, L).utilisation;
            if (pair.limit == Limit::bending_with_shear && expected.hopeless_in_shear() && expected.shear(L) > 1.0) {
                CHECK(u > 1.0);
                continue;
            }
            CHECK(u == Approx(pair.expected(L)).epsilon(1e-12).margin(1e-13));
        }
        const auto section = cold_formed_section(inputs_of(c), kinds);
        if (section.stiffness.I_eff < 0.9999 * section.stiffness.I_gr) ++reduced;
        if (c.channel.r > 5 * expected.section().t) ++rounded;
        if (expected.bending_with_shear(L) > 0.01) ++combined;
    }
    // The cases reach what they are meant to test.
    CHECK(rounded > 100);
    CHECK(reduced > 1500);
    CHECK(combined > 300);
}

TEST_CASE("permissible spans of channels agree with a plain search", "[engine][cold-formed]") {
    Random r(77);
    for (int n = 0; n < 40; ++n) {
        const plain::Case c = random_case(r);
        const plain::Joist expected(c);
        const ColdFormedKinds kinds = kinds_of(c);
        const auto rules = make_cold_formed_rules(kinds, inputs_of(c), plans_of(c, kinds));
        const SpanRange range{std::max(500.0, 2 * c.channel.h) + c.bearing, 30000.0 + c.bearing};
        const SpanSolver solver(*rules, range, {200.0, 2000.0}, 1.0);
        std::array<LimitOutcome, limit_count> outcomes;
        solver.solve(*rules->at({.spacing = c.spacing, .variable = c.loads.q}), outcomes);
        INFO(describe(c));
        for (const Pair& pair : pairs(expected)) {
            const LimitOutcome& outcome = outcomes[index_of(pair.limit)];
            if (rules->plan(pair.limit).status != LimitStatus::checked) continue;
            INFO(definition_of(pair.limit).name);
            const auto span = plain::permissible(pair.expected, range.lower, range.upper);
            if (!span) {
                CHECK(outcome.kind == LimitOutcome::Kind::never_reached);
            } else if (*span == 0.0) {
                CHECK(outcome.kind == LimitOutcome::Kind::fails_at_once);
            } else {
                CHECK(outcome.kind == LimitOutcome::Kind::spans);
                CHECK(outcome.clear_span == Approx(*span).epsilon(0).margin(0.1));
            }
        }
    }
}

TEST_CASE("every field of a channel's inputs is described", "[engine][cold-formed]") {
    std::size_t count = 0;
    ColdFormedInputs<double> x{};
    cold_formed_fields(x, [&](double& field, const char*, const char*, const char*) {
        field = 1.0;
        ++count;
    });
    CHECK(count * sizeof(double) == sizeof(x));
}
