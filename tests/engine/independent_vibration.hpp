// SPDX-License-Identifier: MIT
#pragma once

#include "engine/independent_timber.hpp"

// EN 1995-1-1 7.3.3 and the UK national annex, in SI units (m, kg, N) as the standard prints them; then every limit by
// name, and the permissible span by a slow scan.

namespace independent {

inline double floor_mass(const Case& c, bool with_partitions) {                  // kg/m2
    const double g = c.loads.g + (with_partitions ? c.loads.g_partitions : 0.0); // N/mm2
    return (g * 1e6 + self_weight(c) * 1000.0 / (c.spacing / 1000.0)) / 9.81;
}

inline double stiffness_along(const Case& c) { // N m2 per m
    return c.timber.E * inertia(c) * 1e-6 / (c.spacing / 1000.0);
}

inline double frequency(const Case& c, double L) {
    const double l = L / 1000.0;
    return 3.14159265358979323846 / (2.0 * l * l) * std::sqrt(stiffness_along(c) / floor_mass(c, true));
}

inline double unit_deflection(const Case& c, double L) { // mm under 1 kN
    double share = 1.0;
    double amplification = 1.0;
    if (c.vibration == Vibration::uk) {
        const double k_strut = c.strutting ? 0.97 : 1.0;
        const double logarithm = std::log(14.0 * c.deck_stiffness / std::pow(c.spacing, 4));
        share = std::min(1.0, std::max(0.30, k_strut * (0.38 - 0.08 * logarithm)));
        amplification = 1.05;
    }
    return share * amplification * 1000.0 * L * L * L / (48.0 * c.timber.E * inertia(c));
}

inline double unit_deflection_limit(const Case& c, double L) {
    if (c.vibration == Vibration::recommended) return c.a;
    return L <= 4000.0 ? 1.8 : 16500.0 / std::pow(L, 1.1);
}

inline double velocity(const Case& c, double L) {
    const double l = L / 1000.0;
    const double B = c.floor_width / 1000.0;
    const double f1 = frequency(c, L);
    double n40 = 0.0;
    if (f1 < 40.0) {
        const double along = stiffness_along(c);
        const double across = c.deck_stiffness * 1e-6;
        n40 = std::pow(((40.0 / f1) * (40.0 / f1) - 1.0) * std::pow(B / l, 4) * along / std::min(across, along), 0.25);
    }
    return 4.0 * (0.4 + 0.6 * n40) / (floor_mass(c, false) * B * l + 200.0);
}

inline double velocity_limit(const Case& c, double L) {
    double b = c.b_constant;
    double zeta = 0.01;
    if (c.vibration == Vibration::uk) {
        const double a = unit_deflection_limit(c, L);
        b = std::clamp(a <= 1.0 ? 180.0 - 60.0 * a : 160.0 - 40.0 * a, 50.0, 150.0);
        zeta = 0.02;
    }
    return std::pow(b, frequency(c, L) * zeta - 1.0);
}

using spanledger::Limit;

inline bool active(const Case& c, Limit limit) {
    switch (limit) {
    case Limit::bending:
    case Limit::shear: return true;
    case Limit::bearing: return !c.cantilever;
    case Limit::lateral_buckling: return !c.held;
    case Limit::variable_deflection: return c.deflection[0].has_value();
    case Limit::instantaneous_deflection: return c.deflection[1].has_value();
    case Limit::final_deflection: return c.deflection[2].has_value();
    case Limit::frequency:
    case Limit::unit_load_deflection:
    case Limit::velocity_response: return c.vibration != Vibration::none && !c.cantilever;
    case Limit::stock_length: return c.stock.has_value();
    case Limit::bending_with_shear: return false;
    }
    return false;
}

inline double utilisation(const Case& c, Limit limit, double L) {
    switch (limit) {
    case Limit::bending: return bending(c, L);
    case Limit::shear: return shear(c, L);
    case Limit::bearing: return bearing(c, L);
    case Limit::lateral_buckling: return lateral_buckling(c, L);
    case Limit::variable_deflection: return deflection_limit(c, L, 0);
    case Limit::instantaneous_deflection: return deflection_limit(c, L, 1);
    case Limit::final_deflection: return deflection_limit(c, L, 2);
    case Limit::frequency: return 8.0 / frequency(c, L);
    case Limit::unit_load_deflection: return unit_deflection(c, L) / unit_deflection_limit(c, L);
    case Limit::velocity_response: return velocity(c, L) / velocity_limit(c, L);
    case Limit::stock_length: return (L + c.bearing) / *c.stock; // Lc + 2t
    case Limit::bending_with_shear: break;
    }
    return 0.0;
}

inline double span_addition(const Case& c) {
    return c.cantilever ? c.bearing / 2.0 : c.bearing;
}
inline double lower_bound(const Case& c) {
    return c.min_clear.value_or(std::max(500.0, 2.0 * c.h)) + span_addition(c);
}
inline double upper_bound(const Case& c) {
    return c.max_clear.value_or(30000.0) + span_addition(c);
}

/// Where a limit leaves off, as an effective span: 0 where it fails at the lower bound, infinity where never reached.
inline double first_failure(const Case& c, Limit limit, double step) {
    const double cap = limit == Limit::stock_length ? 1.0 : c.cap;
    const double upper = upper_bound(c);
    double passing = lower_bound(c);
    if (!(utilisation(c, limit, passing) <= cap)) return 0.0;
    while (passing < upper) {
        double failing = std::min(passing + step, upper);
        if (utilisation(c, limit, failing) <= cap) {
            passing = failing;
            continue;
        }
        while (failing - passing > 1e-6) {
            const double middle = 0.5 * (passing + failing);
            (utilisation(c, limit, middle) <= cap ? passing : failing) = middle;
        }
        return passing;
    }
    return HUGE_VAL;
}

} // namespace independent
