// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/limits.hpp"

#include <algorithm>
#include <array>
#include <cmath>
#include <optional>
#include <vector>

// A second, plain way to the same numbers, for the tests alone: EN 1990 and EN 1995-1-1 for timber rectangles, written
// straight from the rules of the design basis in double, without a look at the clauses it checks. Slow on purpose.
// N, mm, MPa, kg/m3. Durations: 0 permanent, 1 long, 2 medium, 3 short term, 4 instantaneous.

namespace independent {

enum class Kind { softwood, hardwood, glulam, lvl };
enum class Set { one, a_and_b }; // 6.10, or 6.10a and 6.10b
enum class Position { top, centroid, bottom };
enum class Vibration { none, uk, recommended };

struct Timber {
    Kind kind = Kind::softwood;
    double fm = 24, fv = 4, fc90 = 2.5, E = 11000, E05 = 7400, G = 690;
    std::optional<double> G05;
    double rho_k = 350, rho_mean = 420;
    double s = 0.15; // LVL size exponent
};

struct Loads {
    double g = 0, g_partitions = 0, q = 0, partitions = 0, snow = 0; // N/mm2
    double Q = 0, share = 1;                                         // N
    int q_duration = 2, snow_duration = 3, Q_duration = 2;
    double psi0 = 0.7, psi2 = 0.3, snow_psi0 = 0.5, snow_psi2 = 0;
    bool Q_in_deflection = false;
};

struct DeflectionLimit {
    std::optional<double> ratio, length;
};

struct Case {
    Timber timber;
    double b = 47, h = 220;
    int plies = 1;
    bool fixed_together = false;
    std::optional<double> stock;
    double spacing = 400, bearing = 50;
    Loads loads;
    Set set = Set::one;
    double xi = 0.85;
    int service_class = 1;
    bool wet = false, load_sharing = false, self_weight = true, shear_deflection = false;
    bool concentrated_near = false, uniform_near = false, partitions_creep_imposed = false;
    bool cantilever = false, held = false;
    std::optional<double> restraint;
    Position position = Position::top;
    std::array<std::optional<DeflectionLimit>, 3> deflection; // w_Q, w_inst, w_net,fin
    std::optional<double> camber;
    Vibration vibration = Vibration::none;
    double floor_width = 5000, deck_stiffness = 1e9, a = 1.0, b_constant = 120; // EI_b in N mm2 per m
    bool strutting = false;
    double cap = 1.0;
    std::optional<double> min_clear, max_clear;
};

/// One combination of actions: line load, point load, kmod and ksys.
struct Combined {
    double q = 0, F = 0, kmod = 0, ksys = 1;
    bool concentrated = false;
};

inline double kmod(int service_class, int duration) {
    constexpr std::array<double, 5> dry{0.60, 0.70, 0.80, 0.90, 1.10};
    constexpr std::array<double, 5> wet{0.50, 0.55, 0.65, 0.70, 0.90};
    return (service_class == 3 ? wet : dry)[static_cast<std::size_t>(duration)];
}

inline double kdef(const Case& c) {
    const double table = c.service_class == 1 ? 0.6 : c.service_class == 2 ? 0.8 : 2.0;
    return table + (c.wet ? 1.0 : 0.0);
}

inline double gamma_M(Kind kind) {
    return kind == Kind::glulam ? 1.25 : kind == Kind::lvl ? 1.2 : 1.3;
}
inline double breadth(const Case& c) {
    return c.plies * c.b;
}
inline double inertia(const Case& c) {
    return breadth(c) * c.h * c.h * c.h / 12.0;
}
inline double modulus(const Case& c) {
    return breadth(c) * c.h * c.h / 6.0;
}

inline double self_weight(const Case& c) {
    if (!c.self_weight) return 0.0;
    const double kg_per_m = c.timber.rho_mean * (breadth(c) / 1000.0) * (c.h / 1000.0);
    return kg_per_m * 9.81 / 1000.0; // N/m to N/mm
}

inline double permanent(const Case& c) {
    return (c.loads.g + c.loads.g_partitions) * c.spacing + self_weight(c);
}

inline std::vector<Combined> combinations(const Case& c) {
    const Loads& l = c.loads;
    const double G = permanent(c);
    const double partitions = l.partitions * c.spacing;
    const double ksys = c.load_sharing && c.spacing <= 610.0 && c.plies == 1 ? 1.1 : 1.0;
    std::vector<Combined> all{{1.35 * G, 0.0, kmod(c.service_class, 0), ksys, false}};
    const auto add = [&](double q, double F, int duration, double psi0, double k) {
        const double m = kmod(c.service_class, duration);
        const bool concentrated = F > 0.0;
        if (c.set == Set::one) {
            all.push_back({1.35 * G + 1.5 * q, 1.5 * F, m, k, concentrated});
        } else {
            all.push_back({1.35 * G + 1.5 * psi0 * q, 1.5 * psi0 * F, m, k, concentrated});
            all.push_back({c.xi * 1.35 * G + 1.5 * q, 1.5 * F, m, k, concentrated});
        }
    };
    if (l.q > 0.0 || l.partitions > 0.0) add(l.q * c.spacing + partitions, 0.0, l.q_duration, l.psi0, ksys);
    if (l.snow > 0.0) add(l.snow * c.spacing, 0.0, l.snow_duration, l.snow_psi0, ksys);
    if (l.Q > 0.0) {
        const int duration = l.partitions > 0.0 ? std::max(l.q_duration, l.Q_duration) : l.Q_duration;
        add(partitions, l.share * l.Q, duration, l.psi0, l.share < 1.0 ? 1.0 : ksys);
    }
    return all;
}

inline double moment(const Case& c, double q, double F, double L) {
    return c.cantilever ? q * L * L / 2.0 + F * L : q * L * L / 8.0 + F * L / 4.0;
}

inline double kh(const Case& c) {
    const double h = c.h;
    switch (c.timber.kind) {
    case Kind::softwood:
    case Kind::hardwood: return c.timber.rho_k <= 700.0 && h < 150.0 ? std::min(std::pow(150.0 / h, 0.2), 1.3) : 1.0;
    case Kind::glulam: return h < 600.0 ? std::min(std::pow(600.0 / h, 0.1), 1.1) : 1.0;
    case Kind::lvl: return std::min(std::pow(300.0 / h, c.timber.s), 1.2);
    }
    return 1.0;
}

inline double strength(const Case& c, double characteristic, const Combined& x) {
    return x.kmod * characteristic / gamma_M(c.timber.kind) * x.ksys;
}

inline double bending(const Case& c, double L) {
    double worst = 0.0;
    for (const Combined& x : combinations(c)) {
        worst = std::max(worst, moment(c, x.q, x.F, L) / modulus(c) / (kh(c) * strength(c, c.timber.fm, x)));
    }
    return worst;
}

inline double shear(const Case& c, double L) {
    const double kcr = c.timber.kind == Kind::lvl ? 1.0 : 0.67;
    double worst = 0.0;
    for (const Combined& x : combinations(c)) {
        double from_q = c.cantilever ? x.q * L : x.q * L / 2.0;
        double from_F = x.F;
        if (!c.cantilever && c.uniform_near) from_q = x.q * std::max(0.0, L / 2.0 - c.bearing / 2.0 - c.h);
        if (!c.cantilever && c.concentrated_near) from_F = x.F * std::max(0.0, L - c.bearing / 2.0 - c.h) / L;
        const double tau = 1.5 * (from_q + from_F) / (kcr * breadth(c) * c.h);
        worst = std::max(worst, tau / strength(c, c.timber.fv, x));
    }
    return worst;
}

inline double bearing(const Case& c, double L) {
    const double clear = L - c.bearing;
    double kc90 = 1.0;
    if (clear >= 2.0 * c.h - 1e-9) { // the last digits of L - t do not count
        if (c.timber.kind == Kind::softwood) kc90 = 1.5;
        if (c.timber.kind == Kind::glulam && c.bearing <= 400.0) kc90 = 1.75;
    }
    const double contact = c.bearing + std::min(30.0, c.bearing);
    double worst = 0.0;
    for (const Combined& x : combinations(c)) {
        const double reaction = x.q * L / 2.0 + x.F;
        worst = std::max(worst, reaction / (breadth(c) * contact) / (kc90 * strength(c, c.timber.fc90, x)));
    }
    return worst;
}

inline double effective_length(const Case& c, double L, bool concentrated) {
    double length = L;
    double fraction = 0.9;
    if (c.cantilever) {
        fraction = concentrated ? 0.8 : 0.5;
    } else if (c.restraint && *c.restraint < L) {
        length = *c.restraint;
        fraction = 1.0;
    }
    const double allowance = c.position == Position::top      ? 2.0 * c.h
                             : c.position == Position::bottom ? -0.5 * c.h
                                                              : 0.0;
    return std::max(fraction * length + allowance, length / 10.0);
}

inline double critical_stress(const Case& c, double l_ef) {
    const double b = c.fixed_together ? breadth(c) : c.b;
    const double h = c.h;
    const Timber& m = c.timber;
    if (m.kind == Kind::softwood || m.kind == Kind::glulam) return 0.78 * b * b * m.E05 / (h * l_ef);
    const double I_tor = h * b * b * b / 3.0 * (1.0 - 0.63 * b / h + 0.052 * std::pow(b / h, 5));
    const double G05 = m.G05 ? *m.G05 : m.G * m.E05 / m.E;
    const double I_z = h * b * b * b / 12.0;
    const double W_y = b * h * h / 6.0;
    return 3.14159265358979323846 * std::sqrt(m.E05 * I_z * G05 * I_tor) / (l_ef * W_y);
}

inline double relative_slenderness(const Case& c, double L, bool concentrated) {
    return std::sqrt(c.timber.fm / critical_stress(c, effective_length(c, L, concentrated)));
}

inline double kcrit(double lambda) {
    if (lambda <= 0.75) return 1.0;
    if (lambda <= 1.4) return 1.56 - 0.75 * lambda;
    return 1.0 / (lambda * lambda);
}

inline double lateral_buckling(const Case& c, double L) {
    double worst = 0.0;
    for (const Combined& x : combinations(c)) {
        const double k = kcrit(relative_slenderness(c, L, c.cantilever && x.concentrated));
        worst = std::max(worst, moment(c, x.q, x.F, L) / modulus(c) / (k * kh(c) * strength(c, c.timber.fm, x)));
    }
    return worst;
}

inline double deflection(const Case& c, double q, double F, double L) {
    const double EI = c.timber.E * inertia(c);
    const double GA = c.timber.G * breadth(c) * c.h;
    const double bend = c.cantilever ? q * L * L * L * L / (8.0 * EI) + F * L * L * L / (3.0 * EI)
                                     : q * L * L * L * L / (76.8 * EI) + F * L * L * L / (48.0 * EI);
    const double slide = c.cantilever ? 1.2 * q * L * L / (2.0 * GA) + 1.2 * F * L / GA
                                      : 1.2 * q * L * L / (8.0 * GA) + 1.2 * F * L / (4.0 * GA);
    return c.shear_deflection ? bend + slide : bend;
}

/// Deflection of variable action, all actions, and net final, under one alternative.
struct Deflections {
    double w_Q = 0, w_inst = 0, w_net_fin = 0;
};

inline Deflections deflections(const Case& c, double L, double q, double F, double partitions, double psi2) {
    const double w_G = deflection(c, permanent(c), 0.0, L);
    const double w_P = deflection(c, partitions, 0.0, L);
    const double w_V = deflection(c, q, F, L);
    const double k = kdef(c);
    const double final_P = w_P * (1.0 + (c.partitions_creep_imposed ? psi2 : 1.0) * k);
    const double final_all = w_G * (1.0 + k) + final_P + w_V * (1.0 + psi2 * k);
    return {w_P + w_V, w_G + w_P + w_V, final_all - std::min(c.camber.value_or(0.0), w_G * (1.0 + k))};
}

inline std::vector<Deflections> all_deflections(const Case& c, double L) {
    const Loads& l = c.loads;
    const double P = l.partitions * c.spacing;
    std::vector<Deflections> all{deflections(c, L, 0.0, 0.0, 0.0, 0.0)};
    if (l.q > 0.0 || P > 0.0) all.push_back(deflections(c, L, l.q * c.spacing, 0.0, P, l.psi2));
    if (l.snow > 0.0) all.push_back(deflections(c, L, l.snow * c.spacing, 0.0, 0.0, l.snow_psi2));
    if (l.Q > 0.0 && l.Q_in_deflection) all.push_back(deflections(c, L, 0.0, l.share * l.Q, P, l.psi2));
    return all;
}

inline double deflection_limit(const Case& c, double L, std::size_t which) {
    double worst = 0.0;
    for (const Deflections& w : all_deflections(c, L)) {
        const double value = which == 0 ? w.w_Q : which == 1 ? w.w_inst : w.w_net_fin;
        const DeflectionLimit& limit = *c.deflection[which];
        double allowed = limit.ratio ? L / *limit.ratio : *limit.length;
        if (limit.length) allowed = std::min(allowed, *limit.length);
        worst = std::max(worst, value / allowed);
    }
    return worst;
}

} // namespace independent
