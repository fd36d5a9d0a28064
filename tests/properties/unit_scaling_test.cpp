// SPDX-License-Identifier: MIT
#include "engine/independent_vibration.hpp"
#include "engine/random_cases.hpp"
#include "properties/utilisation_at.hpp"

#include <catch2/catch.hpp>

#include <set>

using namespace spanledger;

// All forces and lengths scaled, stresses to match: every utilisation stays the same, unless a constant hides a unit.

namespace {

struct Scale {
    double length;
    double force;
    [[nodiscard]] double stress() const { return force / (length * length); }
};

void scale_if(std::optional<double>& value, double factor) {
    if (value) *value *= factor;
}

independent::Timber scaled(independent::Timber m, const Scale& by) {
    for (double* stress : {&m.fm, &m.fv, &m.fc90, &m.E, &m.E05, &m.G}) *stress *= by.stress();
    scale_if(m.G05, by.stress());
    m.rho_mean *= by.stress() / by.length; // weight per volume
    return m;
}

independent::Loads scaled(independent::Loads l, const Scale& by) {
    for (double* area : {&l.g, &l.g_partitions, &l.q, &l.partitions, &l.snow}) *area *= by.stress();
    l.Q *= by.force;
    return l;
}

independent::Case scaled(independent::Case c, const Scale& by) {
    c.timber = scaled(c.timber, by);
    c.loads = scaled(c.loads, by);
    for (double* length : {&c.b, &c.h, &c.spacing, &c.bearing, &c.floor_width, &c.a}) *length *= by.length;
    for (auto* length : {&c.stock, &c.restraint, &c.camber}) scale_if(*length, by.length);
    for (auto& limit : c.deflection) {
        if (limit) scale_if(limit->length, by.length);
    }
    c.deck_stiffness *= by.stress() * by.length * by.length * by.length;
    return c;
}

/// Where a constant hides a unit: the reference depth of kh (mm), 30 mm of contact, 8 Hz, 40 Hz, 1 kN, 200 kg, the
/// a of the UK annex in mm.
const std::set<Limit> exceptions{Limit::bending,   Limit::lateral_buckling,     Limit::bearing,
                                 Limit::frequency, Limit::unit_load_deflection, Limit::velocity_response};

independent::Case without_load_sharing(independent::Random& random) {
    independent::Case c = independent::random_case(random);
    c.load_sharing = false; // the greatest spacing of 6.6 is 610 mm
    return c;
}

} // namespace

TEST_CASE("scaling forces, lengths and stresses together changes no utilisation") {
    independent::Random random(11);
    std::size_t compared = 0;
    for (int i = 0; i < 2500; ++i) {
        const independent::Case c = without_load_sharing(random);
        const double L = independent::lower_bound(c) + random.between(0, 6000);
        const Scale by{random.between(0.3, 3.0), random.between(0.2, 20.0)};
        const auto before = independent::engine_utilisations(c, L);
        const auto after = independent::engine_utilisations(scaled(c, by), L * by.length);
        for (const LimitDefinition& definition : limit_definitions) {
            const auto& x = before[index_of(definition.limit)];
            if (!x || exceptions.count(definition.limit) == 1) continue;
            ++compared;
            INFO(definition.name << " of " << independent::describe(c) << " by " << by.length << ", " << by.force);
            CHECK(*after[index_of(definition.limit)] == Approx(*x).epsilon(1e-11));
        }
    }
    CHECK(compared > 5000);
}

TEST_CASE("bending and lateral buckling scale too where the size factor does not change") {
    independent::Random random(12);
    for (int i = 0; i < 2500; ++i) {
        independent::Case c = without_load_sharing(random);
        c.h = random.between(600, 900);
        if (c.timber.kind == independent::Kind::lvl) c.timber.s = 0.0;
        const double L = independent::lower_bound(c) + random.between(0, 6000);
        const Scale by{random.between(1.0, 3.0), random.between(0.2, 20.0)};
        const auto before = independent::engine_utilisations(c, L);
        const auto after = independent::engine_utilisations(scaled(c, by), L * by.length);
        INFO(independent::describe(c) << " by " << by.length << ", " << by.force);
        for (const Limit limit : {Limit::bending, Limit::lateral_buckling}) {
            const auto& x = before[index_of(limit)];
            if (x) CHECK(*after[index_of(limit)] == Approx(*x).epsilon(1e-11));
        }
    }
}

TEST_CASE("the limits with a unit hidden in a constant do change with scale") {
    independent::Case c;
    c.h = 120; // below the reference depth of kh
    c.loads.g = 0.0005;
    c.loads.q = 0.0015;
    c.vibration = independent::Vibration::uk;
    const Scale by{0.7, 3.0};
    const auto before = independent::engine_utilisations(c, 3000.0);
    const auto after = independent::engine_utilisations(scaled(c, by), 3000.0 * by.length);
    for (const Limit limit : exceptions) {
        INFO(definition_of(limit).name);
        CHECK(*after[index_of(limit)] != Approx(*before[index_of(limit)]).epsilon(1e-6));
    }
}
