// SPDX-License-Identifier: MIT
#pragma once

#include <algorithm>
#include <array>
#include <cmath>
#include <functional>
#include <optional>
#include <string>
#include <vector>

// The rules for cold-formed channel joists written a second time, plainly and in one piece, straight from the standard:
// nothing of the program is used here. N, mm, MPa, kg, s.

namespace independent_channel {

struct Channel {
    double h = 0, b1 = 0, b2 = 0, c = 0, t_nom = 0, r = 0;
    double f = 0;
    double E = 210000, G = 81000, nu = 0.3, rho = 7850, gamma_M0 = 1, gamma_M1 = 1, zinc = 0.04;
};

struct Loads {
    double g = 0, q = 0, partitions = 0, snow = 0, Q = 0, share = 1, psi0 = 0.7, snow_psi0 = 0.5;
    bool Q_in_deflection = false;
};

struct Case {
    Channel channel;
    Loads loads;
    double spacing = 600, bearing = 50;
    bool self_weight = true, shear_deflection = false, stiffened = false, a_and_b = false;
    double gamma_G = 1.35, gamma_Q = 1.5, xi = 0.85;
    std::array<std::optional<double>, 2> ratio, length; // w_Q, w_inst
    std::optional<double> camber;
    double f_min = 8, mass_share = 0.1, unit_limit = 1, stock = 0;
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

/// Uniform load and concentrated load on one joist.
struct Line {
    double q, F;
};

struct Alternative {
    Line line;
    double psi0;
    bool concentrated;
};

class Joist {
public:
    explicit Joist(const Case& c) : c_(c), s_(section_of(c.channel, c.stiffened)) {
        G_ = c.loads.g * c.spacing + (c.self_weight ? s_.mass * 9.81 : 0.0);
        const Loads& l = c.loads;
        if (l.q > 0 || l.partitions > 0) Q_.push_back({{(l.q + l.partitions) * c.spacing, 0}, l.psi0, false});
        if (l.snow > 0) Q_.push_back({{l.snow * c.spacing, 0}, l.snow_psi0, false});
        if (l.Q > 0) Q_.push_back({{l.partitions * c.spacing, l.share * l.Q}, l.psi0, true});
    }

    const Section& section() const { return s_; }

    double bending(double L) const {
        return worst([&](Line d) { return (d.q * L * L / 8 + d.F * L / 4) / s_.Mc; });
    }
    double shear(double L) const {
        return worst([&](Line d) { return (d.q * L / 2 + d.F) / s_.Vb; });
    }
    /// The concentrated load alone exceeds the shear resistance: no span is possible.
    bool hopeless_in_shear() const { return c_.gamma_Q * c_.loads.share * c_.loads.Q > s_.Vb; }

    double bearing(double L) const {
        const double R = s_.R0 * (1 + 0.01 * c_.bearing / s_.t);
        return worst([&](Line d) { return (d.q * L / 2 + d.F) / R; });
    }

    /// Section by section, the concentrated load just beyond each.
    double bending_with_shear(double L) const {
        return worst([&](Line d) {
            double largest = 0;
            const auto at = [&](double x) {
                const double V = d.q * (L / 2 - x) + d.F * (L - x) / L;
                const double M = d.q * x * (L - x) / 2 + d.F * x * (L - x) / L;
                const double over = 2 * V / s_.Vb - 1;
                if (over > -1e-9) largest = std::max(largest, M / s_.Mc + over * over);
            };
            const double last = (d.q * L / 2 + d.F - s_.Vb / 2) / (d.q + d.F / L);
            if (last <= 0) return 0.0;
            constexpr int parts = 400;
            for (int i = 0; i <= parts; ++i) at(std::min(last, L / 2) * i / parts);
            return largest;
        });
    }

    double deflection(int which, double L) const {
        double u = 0;
        for (const Line& Q : in_deflection()) {
            const double M = (G_ + Q.q) * L * L / 8 + Q.F * L / 4;
            const double stress = std::min(M * s_.z_gr / s_.I_gr, c_.channel.f);
            const double I = s_.I_gr - stress / c_.channel.f * (s_.I_gr - s_.I_eff);
            const auto w = [&](Line l) {
                double value = 5 * l.q * std::pow(L, 4) / 384 / c_.channel.E / I + l.F * std::pow(L, 3) / 48 / c_.channel.E / I;
                if (c_.shear_deflection) value += (l.q * L * L / 8 + l.F * L / 4) / s_.GA;
                return value;
            };
            double value = w(Q);
            if (which == 1) value = std::max(0.0, value + w({G_, 0}) - c_.camber.value_or(0));
            const auto i = static_cast<std::size_t>(which);
            if (c_.ratio[i]) u = std::max(u, value / (L / *c_.ratio[i]));
            if (c_.length[i]) u = std::max(u, value / *c_.length[i]);
        }
        return u;
    }

    double frequency(double L) const {
        double u = 0;
        bool any = false;
        const auto one = [&](double q) {
            const double m = (G_ + c_.mass_share * q) / 9.81 * 1000; // kg/m
            const double EI = c_.channel.E * s_.I_gr * 1e-6;         // N m2
            const double f = std::acos(-1.0) / 2 * std::sqrt(EI / (m * std::pow(L / 1000, 4)));
            u = std::max(u, c_.f_min / f);
        };
        for (const Alternative& a : Q_) {
            if (a.concentrated) continue;
            one(a.line.q);
            any = true;
        }
        if (!any) one(0);
        return u;
    }

    double unit_load(double L) const {
        return 1000 * std::pow(L, 3) / 48 / c_.channel.E / s_.I_gr / c_.unit_limit;
    }

private:
    double worst(const std::function<double(Line)>& u) const {
        double largest = u({c_.gamma_G * G_, 0});
        for (const Alternative& a : Q_) {
            const auto with = [&](double G_factor, double Q_factor) {
                largest = std::max(largest, u({G_factor * G_ + Q_factor * a.line.q, Q_factor * a.line.F}));
            };
            if (c_.a_and_b) {
                with(c_.gamma_G, c_.gamma_Q * a.psi0);
                with(c_.xi * c_.gamma_G, c_.gamma_Q);
            } else {
                with(c_.gamma_G, c_.gamma_Q);
            }
        }
        return largest;
    }

    std::vector<Line> in_deflection() const {
        std::vector<Line> lines;
        for (const Alternative& a : Q_) {
            if (!a.concentrated || c_.loads.Q_in_deflection) lines.push_back(a.line);
        }
        if (lines.empty()) lines.push_back({0, 0});
        return lines;
    }

    Case c_;
    Section s_;
    double G_ = 0;
    std::vector<Alternative> Q_;
};

/// The largest span up to `upper` for which u stays at most 1, by walking and halving; empty where it never exceeds 1.
inline std::optional<double> permissible(const std::function<double(double)>& u, double lower, double upper) {
    if (u(lower) > 1) return 0;
    double good = lower, bad = 0;
    for (double L = lower; bad == 0; ) {
        if (L >= upper) return std::nullopt;
        L = std::min(upper, L + 10);
        if (u(L) > 1) bad = L; else good = L;
    }
    while (bad - good > 1e-7) {
        const double middle = (good + bad) / 2;
        (u(middle) > 1 ? bad : good) = middle;
    }
    return good;
}

} // namespace independent_channel
