// SPDX-License-Identifier: MIT
#pragma once

#include "engine/independent_timber.hpp"

#include <cstdint>
#include <random>
#include <sstream>
#include <string>

// Random members, load classes and briefs with every option of a timber joist. A seed gives the same cases anywhere:
// only the engine of the standard library is used, not its distributions.

namespace independent {

class Random {
public:
    explicit Random(std::uint64_t seed) : engine_(seed) {}

    double between(double low, double high) {
        return low + (high - low) * static_cast<double>(engine_() >> 11) * 0x1.0p-53;
    }
    int whole(int low, int high) { return low + static_cast<int>(engine_() % static_cast<unsigned>(high - low + 1)); }
    bool chance(double p) { return between(0.0, 1.0) < p; }
    template <class T> T one_of(std::initializer_list<T> values) {
        return values.begin()[whole(0, static_cast<int>(values.size()) - 1)];
    }
    std::optional<double> maybe(double p, double low, double high) {
        const double value = between(low, high);
        return chance(p) ? std::optional(value) : std::nullopt;
    }

private:
    std::mt19937_64 engine_;
};

inline Timber random_timber(Random& r) {
    Timber m;
    m.kind = r.one_of({Kind::softwood, Kind::hardwood, Kind::glulam, Kind::lvl});
    m.fm = r.between(14, 60);
    m.fv = r.between(2.5, 5);
    m.fc90 = r.between(2, 10);
    m.E = r.between(7000, 17000);
    m.E05 = m.E * r.between(0.6, 0.9);
    m.G = m.E / r.between(14, 22);
    if (m.kind == Kind::glulam || m.kind == Kind::lvl) m.G05 = m.G * r.between(0.6, 0.9);
    m.rho_k = m.kind == Kind::hardwood ? r.between(475, 900) : r.between(290, 520);
    m.rho_mean = m.rho_k * r.between(1.0, 1.25);
    m.s = r.between(0.0, 0.2);
    return m;
}

inline Loads random_loads(Random& r) {
    Loads l;
    l.g = r.between(0.0002, 0.002);
    if (r.chance(0.3)) l.g_partitions = r.between(0.0001, 0.001);
    if (r.chance(0.85)) l.q = r.between(0.0004, 0.006);
    if (r.chance(0.3)) l.partitions = r.between(0.0003, 0.0012);
    if (r.chance(0.2)) l.snow = r.between(0.0004, 0.004);
    if (r.chance(0.5)) l.Q = r.between(900, 4500);
    l.share = r.one_of({1.0, 1.0, r.between(0.3, 0.99)});
    l.q_duration = r.whole(1, 3);
    l.snow_duration = r.whole(1, 4);
    l.Q_duration = r.whole(1, 4);
    l.psi0 = r.one_of({0.7, 1.0, 0.0});
    l.psi2 = r.one_of({0.3, 0.6, 0.8, 0.0});
    l.snow_psi0 = r.one_of({0.5, 0.7});
    l.snow_psi2 = r.one_of({0.0, 0.2});
    l.Q_in_deflection = r.chance(0.3);
    return l;
}

inline void random_limits(Random& r, Case& c) {
    const std::array<double, 3> ratios{r.between(250, 500), r.between(200, 450), r.between(150, 350)};
    for (std::size_t i = 0; i < ratios.size(); ++i) {
        if (!r.chance(0.6)) continue;
        DeflectionLimit limit{ratios[i], std::nullopt};
        const int form = r.whole(0, 2);
        if (form > 0) limit.length = r.between(6, 40);
        if (form == 2) limit.ratio.reset();
        c.deflection[i] = limit;
    }
    if (c.deflection[2] && r.chance(0.3)) c.camber = r.between(1, 30);
    if (c.cantilever) return;
    c.vibration = r.one_of({Vibration::none, Vibration::uk, Vibration::recommended});
    c.floor_width = r.between(2500, 12000);
    c.deck_stiffness = std::pow(10.0, r.between(7.5, 12.5));
    c.a = r.between(0.5, 4.0);
    c.b_constant = r.between(50, 150);
    c.strutting = r.chance(0.5);
}

inline void random_support(Random& r, Case& c) {
    c.cantilever = r.chance(0.15);
    c.bearing = r.between(20, 150);
    if (c.timber.kind == Kind::glulam && r.chance(0.2)) c.bearing = r.between(300, 500);
    c.held = r.chance(0.3);
    if (!c.held && !c.cantilever) c.restraint = r.maybe(0.3, 300, 4000);
    c.position = r.one_of({Position::top, Position::centroid, Position::bottom});
    if (!c.cantilever) {
        c.concentrated_near = r.chance(0.3);
        c.uniform_near = r.chance(0.3);
        c.stock = r.maybe(0.2, 2400, 7200);
    }
    c.min_clear = r.maybe(0.25, 50, 900);
    c.max_clear = r.maybe(0.2, 2000, 12000);
}

inline Case random_case(Random& r) {
    Case c;
    c.timber = random_timber(r);
    c.b = r.between(35, 140);
    c.h = r.one_of({r.between(80, 300), r.between(90, 300), r.between(150, 700)});
    c.plies = r.one_of({1, 1, 1, 2, 3});
    c.fixed_together = c.plies > 1 && r.chance(0.4);
    c.spacing = r.one_of({400.0, 600.0, 610.0, r.between(200, 1200)});
    c.loads = random_loads(r);
    c.set = r.one_of({Set::one, Set::a_and_b});
    c.xi = r.one_of({0.85, 0.925});
    c.service_class = r.whole(1, 3);
    c.wet = r.chance(0.2);
    c.load_sharing = r.chance(0.4);
    c.self_weight = r.chance(0.8);
    c.shear_deflection = r.chance(0.4);
    c.partitions_creep_imposed = r.chance(0.4);
    random_support(r, c);
    random_limits(r, c);
    c.cap = r.one_of({1.0, 1.0, r.between(0.7, 1.0)});
    return c;
}

/// What a failing case was, in words enough to rebuild it.
inline std::string describe(const Case& c) {
    std::ostringstream out;
    out.precision(17);
    const Loads& l = c.loads;
    out << "kind " << static_cast<int>(c.timber.kind) << " b " << c.b << " h " << c.h << " plies " << c.plies
        << " spacing " << c.spacing << " bearing " << c.bearing << " g " << l.g << " gp " << l.g_partitions << " q "
        << l.q << " partitions " << l.partitions << " snow " << l.snow << " Q " << l.Q << " share " << l.share
        << " cantilever " << c.cantilever << " held " << c.held << " restraint " << c.restraint.value_or(0)
        << " position " << static_cast<int>(c.position) << " vibration " << static_cast<int>(c.vibration) << " near "
        << c.concentrated_near << c.uniform_near << " cap " << c.cap << " min " << c.min_clear.value_or(0) << " max "
        << c.max_clear.value_or(0) << " service class " << c.service_class;
    return out.str();
}

} // namespace independent
