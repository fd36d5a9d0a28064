// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/en1993_lateral_buckling.hpp"
#include "spanledger/clauses/rolled_section.hpp"
#include "spanledger/engine/line_actions.hpp"
#include "spanledger/input/brief.hpp"

#include <array>
#include <string>
#include <vector>

// Everything a rolled steel joist is worked out from: numbers (which may be traced) and kinds (which may not).

namespace spanledger {

/// Numbers, in N, mm, MPa, kg. rolled_fields() gives each its symbol, unit and meaning.
template <class N> struct RolledInputs {
    rolled_section::Size<N> size;
    // steel
    N f_y, E, G, rho;
    // factors of the standard and its national annex
    N gamma_M0, gamma_M1, eta;
    // lateral torsional buckling
    N lambda_LT_0, beta;
    en1993::LateralCurves<N> curves;
    N C_1_uniform, C_2_uniform, C_1_force, C_2_force, load_height;
    // support and restraint
    N t, restraint_spacing, stock_length;
    ActionInputs<N> actions;
    // deflection limits: ratio n of L/n and length
    N ratio_variable, max_variable, ratio_instantaneous, max_instantaneous, camber;
    // liveliness
    N min_frequency, variable_share, max_unit_load;
};

/// Symbol, unit and meaning of every field, in order: visit(field, symbol, unit, meaning).
template <class Inputs, class Visit> void rolled_fields(Inputs& x, Visit&& visit) {
    visit(x.size.h, "h", "mm", "depth");
    visit(x.size.b, "b", "mm", "width of the flanges");
    visit(x.size.t_w, "t_w", "mm", "thickness of the web");
    visit(x.size.t_f, "t_f", "mm", "thickness of the flanges");
    visit(x.size.r, "r", "mm", "root radius");
    visit(x.f_y, "f_y", "MPa", "yield strength at the thickest part");
    visit(x.E, "E", "MPa", "modulus of elasticity");
    visit(x.G, "G", "MPa", "shear modulus");
    visit(x.rho, "rho", "kg/m3", "density");
    visit(x.gamma_M0, "gamma_M0", "-", "partial factor, cross-sections");
    visit(x.gamma_M1, "gamma_M1", "-", "partial factor, instability");
    visit(x.eta, "eta", "-", "strength of a web in shear beyond yield");
    visit(x.lambda_LT_0, "lambda_LT_0", "-", "slenderness at which lateral buckling begins, rolled sections");
    visit(x.beta, "beta", "-", "shape of the lateral buckling curve, rolled sections");
    visit(x.curves.h_b_1, "h_b_1", "-", "greatest h/b of the first lateral buckling curve");
    visit(x.curves.h_b_2, "h_b_2", "-", "greatest h/b of the second lateral buckling curve");
    visit(x.curves.alpha_1, "alpha_LT_1", "-", "imperfection factor of the first curve");
    visit(x.curves.alpha_2, "alpha_LT_2", "-", "imperfection factor of the second curve");
    visit(x.curves.alpha_3, "alpha_LT_3", "-", "imperfection factor of the third curve");
    visit(x.C_1_uniform, "C_1_q", "-", "factor C1 of M_cr, uniform load");
    visit(x.C_2_uniform, "C_2_q", "-", "factor C2 of M_cr, uniform load");
    visit(x.C_1_force, "C_1_F", "-", "factor C1 of M_cr, force at mid-span");
    visit(x.C_2_force, "C_2_F", "-", "factor C2 of M_cr, force at mid-span");
    visit(x.load_height, "z_g_0", "mm", "stated height of the load above the shear centre");
    visit(x.t, "t", "mm", "bearing length");
    visit(x.restraint_spacing, "a_r", "mm", "spacing of restraints of the compression flange");
    visit(x.stock_length, "l_stock", "mm", "longest stock length");
    action_fields(x.actions, visit);
    visit(x.ratio_variable, "n_Q", "-", "variable deflection limit L/n");
    visit(x.max_variable, "w_Q_max", "mm", "variable deflection limit");
    visit(x.ratio_instantaneous, "n_inst", "-", "instantaneous deflection limit L/n");
    visit(x.max_instantaneous, "w_inst_max", "mm", "instantaneous deflection limit");
    visit(x.camber, "w_c", "mm", "camber");
    visit(x.min_frequency, "f_min", "Hz", "least first frequency");
    visit(x.variable_share, "eta_m", "-", "share of the variable action in the mass");
    visit(x.max_unit_load, "w_1kN_max", "mm", "limit of the deflection under 1 kN");
}

/// Where the load acts: an edge, the centroid, or a height the brief states.
enum class LoadHeight { top, centroid, bottom, stated };

/// Choices that are not numbers.
struct RolledKinds {
    std::string refusal;  ///< why the member is not covered at all; empty where it is
    bool channel = false; ///< else an I or H section
    bool cantilever = false;
    LateralCurves lateral_curves = LateralCurves::rolled_sections;
    LoadHeight load_height = LoadHeight::top;
    bool restrained_at_intervals = false;
    bool web_stiffened = false; ///< stiffened or cleated at the supports
    bool self_weight = true;
    bool shear_deflection = false;
    bool camber = false;
    std::vector<CombinationCase> combinations;
    std::vector<ServiceCase> service;
    std::vector<ServiceCase> frequency; ///< uniform alternatives only; the permanent action alone where there are none
    std::array<bool, 2> has_ratio{};    ///< variable, instantaneous
    std::array<bool, 2> has_length{};
};

} // namespace spanledger
