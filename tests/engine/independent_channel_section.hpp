// SPDX-License-Identifier: MIT
#pragma once

#include <algorithm>
#include <cmath>
#include <vector>

// The rules for cold-formed channel joists written a second time, plainly and in one piece, straight from the standard:
// nothing of the program is used here. N, mm, MPa, kg, s.

namespace independent_channel {

struct Channel {
    double h = 0, b1 = 0, b2 = 0, c = 0, t_nom = 0, r = 0;
    double f = 0;
    double E = 210000, G = 81000, nu = 0.3, rho = 7850, gamma_M0 = 1, gamma_M1 = 1, zinc = 0.04;
};

/// A flat piece of the section: where its middle lies below the compression flange, how far it reaches down, its area.
struct Piece {
    double z, depth, area, own_thickness;
};

struct Whole {
    double A = 0, z = 0, I = 0;
};

inline Whole add_up(const std::vector<Piece>& pieces) {
    Whole w;
    double S = 0;
    for (const Piece& p : pieces) {
        w.A += p.area;
        S += p.area * p.z;
    }
    w.z = S / w.A;
    for (const Piece& p : pieces) {
        const double across = p.depth > 0 ? p.depth : p.own_thickness;
        w.I += p.area * across * across / 12 + p.area * (p.z - w.z) * (p.z - w.z);
    }
    return w;
}

inline double rho_inner(double lambda, double psi) {
    if (lambda <= 0.673) return 1;
    return std::min(1.0, 1 / lambda - 0.055 * (3 + psi) / (lambda * lambda));
}

inline double rho_outer(double lambda) {
    if (lambda <= 0.748) return 1;
    return std::min(1.0, 1 / lambda - 0.188 / (lambda * lambda));
}

inline double chi_of(double lambda) {
    if (lambda <= 0.65) return 1;
    return std::min(1.0, lambda < 1.38 ? 1.47 - 0.723 * lambda : 0.66 / lambda);
}

struct Section {
    double Mc = 0, Vb = 0, R0 = 0, t = 0, I_gr = 0, I_eff = 0, z_gr = 0, mass = 0, GA = 0;
};

struct Stiffened {
    double be1, be2, ceff, chi;
};

inline Stiffened stiffened_flange(const Channel& x, double t, double hp, double bp, double cp) {
    const double e = std::sqrt(235 / x.f);
    const double lb = bp / t / (28.4 * e * 2);
    const double ratio = cp / bp;
    const double kc = ratio <= 0.35 ? 0.5 : 0.5 + 0.83 * std::cbrt((ratio - 0.35) * (ratio - 0.35));
    const double lc = cp / t / (28.4 * e * std::sqrt(kc));
    const double be1 = rho_inner(lb, 1) * bp / 2;
    const double c1 = rho_outer(lc) * cp;
    const double arm = bp - be1 * be1 / 2 / (be1 + c1);
    const double K = x.E * t * t * t / (4 * (1 - x.nu * x.nu)) / (arm * arm * hp + arm * arm * arm);
    Stiffened last{be1, be1, c1, 1};
    for (int step = 0; step < 50; ++step) {
        const double be2 = rho_inner(lb * std::sqrt(last.chi), 1) * bp / 2;
        const double ce = rho_outer(lc * std::sqrt(last.chi)) * cp;
        const Whole s = add_up({{0, 0, be2 * t, t}, {ce / 2, ce, ce * t, t}});
        const double sigma = 2 * std::sqrt(K * x.E * s.I) / s.A;
        const Stiffened next{be1, be2, ce, chi_of(std::sqrt(x.f / sigma))};
        const bool same = std::abs(next.chi - last.chi) <= 1e-12 * next.chi;
        if (same || step == 49) return next.chi <= last.chi ? next : last;
        last = next;
    }
    return last;
}

inline Section section_of(const Channel& x, bool stiffened) {
    Section s;
    const double t = x.t_nom - x.zinc;
    s.t = t;
    const double hp = x.h - x.t_nom, p1 = x.b1 - x.t_nom, p2 = x.b2 - x.t_nom, cp = x.c - x.t_nom / 2;
    const Whole gross = add_up({{0, 0, p1 * t, t},
                                {hp / 2, hp, hp * t, t},
                                {hp, 0, p2 * t, t},
                                {cp / 2, cp, cp * t, t},
                                {hp - cp / 2, cp, cp * t, t}});
    const Stiffened f = stiffened_flange(x, t, hp, p1, cp);
    const std::vector<Piece> but_web{{0, 0, f.be1 * t, t},
                                     {0, 0, f.be2 * f.chi * t, f.chi * t},
                                     {f.ceff / 2, f.ceff, f.ceff * f.chi * t, t},
                                     {hp, 0, p2 * t, t},
                                     {hp - cp / 2, cp, cp * t, t}};
    std::vector<Piece> with_web = but_web;
    with_web.push_back({hp / 2, hp, hp * t, t});
    const double hc = add_up(with_web).z;
    const double psi = -(hp - hc) / hc;
    const double k = psi < -1 - 1e-9 ? 5.98 * (1 - psi) * (1 - psi) : 7.81 - 6.29 * psi + 9.78 * psi * psi;
    const double he = hc * rho_inner(hp / t / (28.4 * std::sqrt(235 / x.f) * std::sqrt(k)), psi);
    const double upper = 0.4 * he, lower = hp - (hc - 0.6 * he);
    std::vector<Piece> effective = but_web;
    effective.push_back({upper / 2, upper, upper * t, t});
    effective.push_back({hp - lower / 2, lower, lower * t, t});
    const Whole eff = add_up(effective);

    const double sum = hp + p1 + p2 + 2 * cp;
    const double soft = 1 - 2 * 0.43 * 4 * x.r / sum;
    const bool sharp = x.r <= 5 * t && x.r <= 0.1 * hp && x.r <= 0.1 * p1 && x.r <= 0.1 * p2;
    const double corner = sharp ? 1 : soft;
    const double W_el = corner * gross.I / std::max(gross.z, hp - gross.z);
    const double W_eff = corner * eff.I / std::max(eff.z, hp - eff.z);
    s.Mc = std::min(W_eff, W_el) * x.f / x.gamma_M0;

    const double lw = 0.346 * hp / t * std::sqrt(x.f / x.E);
    double fbv = 0.58 * x.f;
    if (lw > 0.83) fbv = 0.48 * x.f / lw;
    if (lw >= 1.4 && !stiffened) fbv = 0.67 * x.f / lw / lw;
    s.Vb = hp * t * fbv / x.gamma_M0;

    const double k2 = std::clamp(1.15 - 0.15 * x.r / t, 0.5, 1.0);
    s.R0 = (1.33 - 0.33 * x.f / 228) * k2 * (9.04 - hp / t / 60) * t * t * x.f / x.gamma_M1;
    s.I_gr = soft * gross.I;
    s.I_eff = soft * eff.I;
    s.z_gr = gross.z;
    const double rm = x.r + x.t_nom / 2;
    const double length = sum - 8 * rm + 2 * std::acos(-1.0) * rm;
    s.mass = x.rho * 1e-9 * x.t_nom * length;
    s.GA = x.G * hp * t;
    return s;
}

} // namespace independent_channel
