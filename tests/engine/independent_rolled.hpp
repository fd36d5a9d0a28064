// SPDX-License-Identifier: MIT
#pragma once

#include "engine/independent_rolled_section.hpp"

#include "spanledger/limits.hpp"

#include <vector>

// A second, plain reading of the design basis for rolled steel joists, in N and mm. It shares no formula with the
// program: nothing here includes a clause.

namespace independent_rolled {

using spanledger::Limit;

// Combinations.

struct Combination {
    double q, F; // N/mm, N
    bool force;
};

inline double self_weight(const Case& c) {
    return c.self_weight ? 7850 * 9.81 * properties(c.section).A * 1e-9 : 0.0;
}
inline double permanent(const Case& c) {
    return (c.loads.g + c.loads.g_partitions) * c.spacing + self_weight(c);
}
inline bool has_uniform(const Case& c) {
    return c.loads.q > 0 || c.loads.partitions > 0;
}

inline std::vector<Combination> combinations(const Case& c) {
    const double g = permanent(c);
    const Loads& l = c.loads;
    const double imposed = (l.q + l.partitions) * c.spacing;
    const double beside_force = l.partitions * c.spacing;
    std::vector<Combination> all{{1.35 * g, 0, false}};
    const auto add = [&](double G, double psi, double snow_psi) {
        if (has_uniform(c)) all.push_back({G * g + 1.5 * psi * imposed, 0, false});
        if (l.snow > 0) all.push_back({G * g + 1.5 * snow_psi * l.snow * c.spacing, 0, false});
        if (l.Q > 0) all.push_back({G * g + 1.5 * psi * beside_force, 1.5 * psi * l.share * l.Q, true});
    };
    if (c.a_and_b) {
        add(1.35, l.psi0, l.snow_psi0);
        add(1.35 * c.xi, 1, 1);
    } else {
        add(1.35, 1, 1);
    }
    return all;
}

inline double M(const Case& c, const Combination& k, double L) {
    return c.cantilever ? k.q * L * L / 2 + k.F * L : k.q * L * L / 8 + k.F * L / 4;
}
inline double V(const Case& c, const Combination& k, double L) {
    return c.cantilever ? k.q * L + k.F : k.q * L / 2 + k.F;
}

// Limits.

inline double M_V_Rd(const Case& c, double shear) {
    const Section& s = c.section;
    const double Aw = (s.h - 2 * s.tf) * s.tw;
    double rho = 0;
    if (shear > V_Rd(c) / 2) rho = std::pow(2 * std::min(shear / V_Rd(c), 1.0) - 1, 2);
    return (W(c) - rho * Aw * Aw / (4 * s.tw)) * fy(c) / c.gM0;
}

/// The worst section along the joist, the force at the section looked at: all stations, and the ends of the stretches.
inline double bending_with_shear(const Case& c, const Combination& k, double L) {
    const double V_half = V_Rd(c) / 2;
    if (c.cantilever) return V(c, k, L) > V_half ? M(c, k, L) / M_V_Rd(c, V(c, k, L)) : 0.0;
    const auto shear = [&](double x) { return k.q * (L / 2 - x) + k.F * (L - x) / L; };
    const auto moment = [&](double x) { return k.q * x * (L - x) / 2 + k.F * x * (L - x) / L; };
    if (shear(0) <= V_half) return 0.0;
    const double slope = k.q + k.F / L;
    const double end = std::min((shear(0) - V_half) / slope, L / 2);
    const double whole = std::clamp((shear(0) - 2 * V_half) / slope, 0.0, L / 2);
    double worst = std::max(moment(end) / M_V_Rd(c, V_half), moment(whole) / M_V_Rd(c, shear(whole)));
    for (int i = 1; i < 200; ++i) {
        const double x = end * i / 200;
        worst = std::max(worst, moment(x) / M_V_Rd(c, shear(x)));
    }
    return worst;
}

/// The shear limit then fails at every span, and the program no longer looks at every section for this one.
inline bool force_above_shear_resistance(const Case& c) {
    for (const Combination& k : combinations(c)) {
        if (k.F > V_Rd(c)) return true;
    }
    return false;
}

inline double web_resistance(const Case& c) {
    const Section& s = c.section;
    const double hw = s.h - 2 * s.tf;
    const double ss = std::min(c.bearing, hw);
    const double kF = std::min(6.0, 2 + 6 * ss / hw);
    const double Fcr = 0.9 * kF * 210000 * std::pow(s.tw, 3) / hw;
    const double m1 = s.b / s.tw;
    const double le = std::min(ss, kF * 210000 * s.tw * s.tw / (2 * fy(c) * hw));
    const auto ly = [&](double m2) {
        return std::min({ss + 2 * s.tf * (1 + std::sqrt(m1 + m2)),
                         le + s.tf * std::sqrt(m1 / 2 + std::pow(le / s.tf, 2) + m2), le + s.tf * std::sqrt(m1 + m2)});
    };
    const auto lambda = [&](double l) { return std::sqrt(l * s.tw * fy(c) / Fcr); };
    double l = ly(0.02 * std::pow(hw / s.tf, 2));
    if (lambda(l) <= 0.5) l = ly(0);
    return std::min(1.0, 0.5 / lambda(l)) * l * s.tw * fy(c) / c.gM1;
}

inline double z_g(const Case& c) {
    if (c.load_height) return *c.load_height;
    if (c.height == Height::centroid) return 0;
    return c.height == Height::top ? c.section.h / 2 : -c.section.h / 2;
}

inline double M_cr(const Case& c, double l, double C1, double C2) {
    const Properties p = properties(c.section);
    const double N = pi * pi * 210000 * p.Iz / (l * l);
    const double z = C2 * z_g(c);
    return C1 * N * (std::sqrt(p.Iw / p.Iz + l * l * 81000 * p.It / (pi * pi * 210000 * p.Iz) + z * z) - z);
}

inline double chi(const Case& c, double lambda) {
    const double hb = c.section.h / c.section.b;
    if (c.general) {
        const double alpha = hb <= 2 ? 0.21 : 0.34;
        const double phi = 0.5 * (1 + alpha * (lambda - 0.2) + lambda * lambda);
        return std::min(1.0, 1 / (phi + std::sqrt(phi * phi - lambda * lambda)));
    }
    const double alpha = hb <= 2 ? 0.34 : (c.uk && hb > 3.1 ? 0.76 : 0.49);
    const double phi = 0.5 * (1 + alpha * (lambda - c.lambda0) + c.beta * lambda * lambda);
    return std::min({1.0, 1 / (lambda * lambda), 1 / (phi + std::sqrt(phi * phi - c.beta * lambda * lambda))});
}

inline double lateral_buckling(const Case& c, const Combination& k, double L) {
    double Mcr = 0;
    if (c.restraint && *c.restraint < L) {
        Mcr = M_cr(c, *c.restraint, 1, 0);
    } else {
        Mcr = M_cr(c, L, 1.127, 0.454);
        if (k.force) Mcr = std::min(Mcr, M_cr(c, L, 1.348, 0.630));
    }
    return M(c, k, L) / (chi(c, std::sqrt(W(c) * fy(c) / Mcr)) * W(c) * fy(c) / c.gM1);
}

inline double deflection(const Case& c, double q, double F, double L) {
    const double EI = 210000 * properties(c.section).Iy;
    const double GA = 81000 * (c.section.h - 2 * c.section.tf) * c.section.tw;
    if (c.cantilever) {
        const double w = q * std::pow(L, 4) / (8 * EI) + F * std::pow(L, 3) / (3 * EI);
        return c.shear_deflection ? w + (q * L * L / 2 + F * L) / GA : w;
    }
    const double w = 5 * q * std::pow(L, 4) / (384 * EI) + F * std::pow(L, 3) / (48 * EI);
    return c.shear_deflection ? w + (q * L * L / 8 + F * L / 4) / GA : w;
}

/// Greatest w_Q, or w_inst less camber.
inline double worst_deflection(const Case& c, double L, bool with_permanent) {
    const Loads& l = c.loads;
    std::vector<double> w;
    if (has_uniform(c)) w.push_back(deflection(c, (l.q + l.partitions) * c.spacing, 0, L));
    if (l.snow > 0) w.push_back(deflection(c, l.snow * c.spacing, 0, L));
    if (l.Q > 0 && l.Q_in_deflection) w.push_back(deflection(c, l.partitions * c.spacing, l.share * l.Q, L));
    if (w.empty()) w.push_back(0);
    const double worst = *std::max_element(w.begin(), w.end());
    if (!with_permanent) return worst;
    return std::max(0.0, worst + deflection(c, permanent(c), 0, L) - c.camber.value_or(0));
}

inline double frequency(const Case& c, double L) {
    double Q = 0;
    if (has_uniform(c)) Q = (c.loads.q + c.loads.partitions) * c.spacing;
    Q = std::max(Q, c.loads.snow * c.spacing);
    const double kg_per_m = (permanent(c) + c.mass_share * Q) * 1000 / 9.81;
    const double EI_Nm2 = 210000 * properties(c.section).Iy * 1e-6;
    return pi / 2 * std::sqrt(EI_Nm2 / (kg_per_m * std::pow(L / 1000, 4)));
}

/// Brief words: a ratio, a length, both, or for neither limit stated L/360 and L/250.
inline std::optional<double> deflection_limit(const Case& c, double L, bool with_permanent) {
    const auto& ratio = with_permanent ? c.ratio_inst : c.ratio_Q;
    const auto& length = with_permanent ? c.length_inst : c.length_Q;
    if (ratio && length) return std::min(L / *ratio, *length);
    if (ratio) return L / *ratio;
    if (length) return *length;
    if (c.ratio_Q || c.length_Q || c.ratio_inst || c.length_inst) return std::nullopt;
    return with_permanent ? L / 250 : L / 360;
}

inline bool refused(const Case& c) {
    return section_class(c) == 4;
}

inline bool active(const Case& c, Limit limit) {
    if (refused(c)) return false;
    switch (limit) {
    case Limit::bending:
    case Limit::shear:
    case Limit::bending_with_shear: return true;
    case Limit::bearing: return !c.cantilever && !c.stiffened;
    case Limit::lateral_buckling: return !c.held && !c.cantilever && !c.section.channel;
    case Limit::variable_deflection: return deflection_limit(c, 1000, false).has_value();
    case Limit::instantaneous_deflection: return deflection_limit(c, 1000, true).has_value();
    case Limit::frequency: return !c.cantilever && c.f_min.has_value();
    case Limit::unit_load_deflection: return !c.cantilever && c.unit_limit.has_value();
    case Limit::stock_length: return c.stock.has_value();
    case Limit::final_deflection:
    case Limit::velocity_response: break;
    }
    return false;
}

inline double utilisation(const Case& c, Limit limit, double L) {
    const auto worst = [&](auto&& of) {
        double u = 0;
        for (const Combination& k : combinations(c)) u = std::max(u, of(k));
        return u;
    };
    switch (limit) {
    case Limit::bending: return worst([&](const auto& k) { return M(c, k, L) / (W(c) * fy(c) / c.gM0); });
    case Limit::shear: return worst([&](const auto& k) { return V(c, k, L) / V_Rd(c); });
    case Limit::bending_with_shear: return worst([&](const auto& k) { return bending_with_shear(c, k, L); });
    case Limit::bearing: return worst([&](const auto& k) { return V(c, k, L) / web_resistance(c); });
    case Limit::lateral_buckling: return worst([&](const auto& k) { return lateral_buckling(c, k, L); });
    case Limit::variable_deflection: return worst_deflection(c, L, false) / *deflection_limit(c, L, false);
    case Limit::instantaneous_deflection: return worst_deflection(c, L, true) / *deflection_limit(c, L, true);
    case Limit::frequency: return *c.f_min / frequency(c, L);
    case Limit::unit_load_deflection:
        return 1000 * std::pow(L, 3) / (48 * 210000 * properties(c.section).Iy) / *c.unit_limit;
    case Limit::stock_length: return (L + c.bearing) / *c.stock;
    case Limit::final_deflection:
    case Limit::velocity_response: break;
    }
    return 0;
}

} // namespace independent_rolled
