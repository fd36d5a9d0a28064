// SPDX-License-Identifier: MIT
#pragma once

#include "engine/independent_channel_section.hpp"

#include <array>
#include <functional>
#include <optional>
#include <vector>

// The joist of the plain second implementation: loads, combinations, limits.

namespace independent_channel {

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
                double value =
                    5 * l.q * std::pow(L, 4) / 384 / c_.channel.E / I + l.F * std::pow(L, 3) / 48 / c_.channel.E / I;
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

    double unit_load(double L) const { return 1000 * std::pow(L, 3) / 48 / c_.channel.E / s_.I_gr / c_.unit_limit; }

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
    for (double L = lower; bad == 0;) {
        if (L >= upper) return std::nullopt;
        L = std::min(upper, L + 10);
        if (u(L) > 1)
            bad = L;
        else
            good = L;
    }
    while (bad - good > 1e-7) {
        const double middle = (good + bad) / 2;
        (u(middle) > 1 ? bad : good) = middle;
    }
    return good;
}

} // namespace independent_channel
