// SPDX-License-Identifier: MIT
#include "engine/independent_vibration.hpp"
#include "engine/random_cases.hpp"
#include "properties/utilisation_at.hpp"

#include <catch2/catch.hpp>

#include <set>

using namespace spanledger;

// More span, spacing or load never helps; more timber never harms. The exceptions are named, each with its reason.

namespace {

using Change = std::function<void(independent::Case&, double& L, independent::Random&)>;
using Exceptions = std::set<Limit>;

/// Checks that no limit of a changed joist is worse (factor 1) or better (factor -1) than before.
void check_never_worse(std::uint64_t seed, const Change& change, const Exceptions& exceptions, bool increases) {
    independent::Random random(seed);
    std::size_t compared = 0;
    for (int i = 0; i < 2500; ++i) {
        independent::Case c = independent::random_case(random);
        double L = independent::lower_bound(c) + random.between(0, 6000);
        const auto before = independent::engine_utilisations(c, L);
        change(c, L, random);
        const auto after = independent::engine_utilisations(c, L);
        for (const LimitDefinition& definition : limit_definitions) {
            const auto& x = before[index_of(definition.limit)];
            const auto& y = after[index_of(definition.limit)];
            if (!x || !y || exceptions.count(definition.limit) == 1) continue;
            ++compared;
            INFO(definition.name << " of " << independent::describe(c) << " at " << L);
            const double smaller = increases ? *x : *y;
            const double larger = increases ? *y : *x;
            CHECK(smaller <= larger * (1.0 + 1e-11));
        }
    }
    CHECK(compared > 8000);
}

} // namespace

TEST_CASE("utilisation never falls as the span grows") {
    // Bearing: kc,90 begins to count where the clear span reaches 2h (own search bounds may start below). Lateral
    // buckling: kcrit of (6.34) steps up by 0.04 % at lambda = 1.4. Velocity response: a heavier floor responds less.
    check_never_worse(
        1, [](auto&, double& L, auto& random) { L *= random.between(1.0, 1.5); },
        {Limit::bearing, Limit::lateral_buckling, Limit::velocity_response}, true);
}

TEST_CASE("bearing and lateral buckling never fall as the span grows but at their steps") {
    independent::Random random(2);
    for (int i = 0; i < 2500; ++i) {
        const independent::Case c = independent::random_case(random);
        const double shortest = std::max(independent::lower_bound(c), 2.0 * c.h + c.bearing);
        const double L = shortest + random.between(0, 6000);
        const auto before = independent::engine_utilisations(c, L);
        const auto after = independent::engine_utilisations(c, L * random.between(1.0, 1.5));
        INFO(independent::describe(c) << " at " << L);
        for (const Limit limit : {Limit::bearing, Limit::lateral_buckling}) {
            const auto& x = before[index_of(limit)];
            if (x) CHECK(*x <= *after[index_of(limit)] * (1.0 + (limit == Limit::bearing ? 1e-11 : 4e-4)));
        }
    }
}

TEST_CASE("utilisation never falls as the spacing grows") {
    // Velocity response: fewer joists make the floor less stiff along than across.
    check_never_worse(
        3, [](auto& c, double&, auto& random) { c.spacing *= random.between(1.0, 2.0); }, {Limit::velocity_response},
        true);
}

TEST_CASE("utilisation never falls as a variable action grows") {
    check_never_worse(
        4,
        [](auto& c, double&, auto& random) {
            const double factor = random.between(1.0, 3.0);
            switch (random.whole(0, 3)) {
            case 0: c.loads.q *= factor; break;
            case 1: c.loads.partitions *= factor; break;
            case 2: c.loads.snow *= factor; break;
            default: c.loads.Q *= factor;
            }
        },
        {}, true);
}

TEST_CASE("utilisation never falls as the permanent action grows") {
    // Velocity response: mass makes the floor quieter and slower at once.
    check_never_worse(
        5, [](auto& c, double&, auto& random) { c.loads.g *= random.between(1.0, 3.0); }, {Limit::velocity_response},
        true);
}

TEST_CASE("a wider joist never does worse") {
    // Velocity response as above. Nothing else: self-weight grows no faster than the section.
    check_never_worse(
        6, [](auto& c, double&, auto& random) { c.b *= random.between(1.0, 1.6); }, {Limit::velocity_response}, false);
}

TEST_CASE("a deeper joist never does worse") {
    // Bearing: the reaction grows with the self-weight while the contact does not, and kc,90 needs a clear span of 2h.
    // Lateral buckling: depth makes a free joist more slender and lifts a load on its top. Velocity response as above.
    // kh falls with depth, but less than the section modulus grows, so bending is no exception.
    check_never_worse(
        7, [](auto& c, double&, auto& random) { c.h *= random.between(1.0, 1.6); },
        {Limit::bearing, Limit::lateral_buckling, Limit::velocity_response}, false);
}

TEST_CASE("another ply never does worse where load sharing is not counted on") {
    // Load sharing belongs to joists of one ply (6.6). Velocity response as above.
    check_never_worse(
        8, [](auto& c, double&, auto&) { c.plies += c.load_sharing ? 0 : 1; }, {Limit::velocity_response}, false);
}
