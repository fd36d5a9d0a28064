// SPDX-License-Identifier: MIT
#pragma once

#include <algorithm>
#include <cmath>
#include <optional>

// The section of a second, plain reading of the design basis for rolled steel joists, in N and mm. It shares no formula
// with the program: nothing here includes a clause.

namespace independent_rolled {

struct Section {
    bool channel = false;
    double h = 0, b = 0, tw = 0, tf = 0, r = 0;
};

struct Loads {
    double g = 0, g_partitions = 0, q = 0, partitions = 0, snow = 0, Q = 0, share = 1; // N/mm2, N
    double psi0 = 0.7, snow_psi0 = 0.5;
    bool Q_in_deflection = false;
};

enum class Height { top, centroid, bottom };

struct Case {
    Section section;
    double fy16 = 275, fy40 = 265;
    double gM0 = 1, gM1 = 1, eta = 1;
    double lambda0 = 0.4, beta = 0.75;
    bool uk = false;      ///< third curve d above h/b = 3.1
    bool general = false; ///< 6.3.2.2
    Loads loads;
    bool a_and_b = false;
    double xi = 0.85;
    double spacing = 600, bearing = 50;
    bool cantilever = false, held = false, stiffened = false, self_weight = true, shear_deflection = false;
    std::optional<double> restraint, load_height, stock;
    Height height = Height::top;
    std::optional<double> ratio_Q, length_Q, ratio_inst, length_inst, camber, f_min, unit_limit;
    double mass_share = 0.1;
    double cap = 1.0;
};

inline const double pi = std::acos(-1.0);

// Section properties: the section cut into rectangles and four (two) corner pieces.

struct Properties {
    double A, Iy, Wel, Wpl, Iz, It, Iw;
};

inline Properties properties(const Section& s) {
    const double n = s.channel ? 2 : 4;
    const double hw = s.h - 2 * s.tf;
    const double piece = s.r * s.r - pi * s.r * s.r / 4;
    // Centroid of the piece from its corner: first moments of square and quarter circle.
    const double to_corner =
        s.r == 0 ? 0 : (s.r * s.r * s.r / 2 - pi * s.r * s.r / 4 * (s.r - 4 * s.r / (3 * pi))) / piece;
    const double about_edge = std::pow(s.r, 4) / 3 - (std::pow(s.r, 4) * (pi / 16 - 4 / (9 * pi)) +
                                                      pi * s.r * s.r / 4 * std::pow(s.r - 4 * s.r / (3 * pi), 2));
    const double own = about_edge - piece * to_corner * to_corner;
    const double arm = hw / 2 - to_corner;
    const double flange_arm = (s.h - s.tf) / 2;
    Properties p{};
    p.A = 2 * s.b * s.tf + hw * s.tw + n * piece;
    p.Iy = 2 * (s.b * std::pow(s.tf, 3) / 12 + s.b * s.tf * flange_arm * flange_arm) + s.tw * hw * hw * hw / 12 +
           n * (own + piece * arm * arm);
    p.Wel = p.Iy / (s.h / 2);
    p.Wpl = 2 * (s.b * s.tf * flange_arm + s.tw * hw / 2 * hw / 4) + n * piece * arm;
    p.Iz = 2 * s.tf * std::pow(s.b, 3) / 12 + hw * std::pow(s.tw, 3) / 12 +
           4 * (own + piece * std::pow(s.tw / 2 + to_corner, 2));
    const double D = (std::pow(s.r + s.tw / 2, 2) + std::pow(s.r + s.tf, 2) - s.r * s.r) / (2 * s.r + s.tf);
    p.It = 2.0 / 3 * (s.b - 0.63 * s.tf) * std::pow(s.tf, 3) + 1.0 / 3 * hw * std::pow(s.tw, 3) +
           2 * (s.tw / s.tf) * (0.145 + 0.1 * s.r / s.tf) * std::pow(D, 4);
    p.Iw = s.tf * std::pow(s.b, 3) * std::pow(s.h - s.tf, 2) / 24;
    return p;
}

inline double fy(const Case& c) {
    return std::max(c.section.tw, c.section.tf) <= 16 ? c.fy16 : c.fy40;
}
inline double eps(const Case& c) {
    return std::sqrt(235 / fy(c));
}

inline int part_class(double ct, double e, double one, double two, double three) {
    if (ct <= one * e) return 1;
    if (ct <= two * e) return 2;
    return ct <= three * e ? 3 : 4;
}

inline int section_class(const Case& c) {
    const Section& s = c.section;
    const double flange = s.channel ? s.b - s.tw - s.r : (s.b - s.tw - 2 * s.r) / 2;
    return std::max(part_class(flange / s.tf, eps(c), 9, 10, 14),
                    part_class((s.h - 2 * s.tf - 2 * s.r) / s.tw, eps(c), 72, 83, 124));
}

inline double W(const Case& c) {
    const Properties p = properties(c.section);
    return section_class(c) <= 2 ? p.Wpl : p.Wel;
}

inline double V_Rd(const Case& c) {
    const Section& s = c.section;
    const double hw = s.h - 2 * s.tf;
    const double A = properties(s).A;
    double Av = A - 2 * s.b * s.tf + (s.tw + (s.channel ? 1 : 2) * s.r) * s.tf;
    if (!s.channel) Av = std::max(Av, c.eta * hw * s.tw);
    double V = Av * (fy(c) / std::sqrt(3.0)) / c.gM0;
    if (hw / s.tw > 72 * eps(c) / c.eta) {
        const double lambda = hw / (86.4 * s.tw * eps(c));
        V = std::min(V, 0.83 / lambda * fy(c) * hw * s.tw / (std::sqrt(3.0) * c.gM1));
    }
    return V;
}

} // namespace independent_rolled
