// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/lipped_channel.hpp"
#include "spanledger/engine/line_actions.hpp"

#include <array>
#include <string>
#include <vector>

// Everything a cold-formed channel joist is worked out from: numbers (which may be traced) and kinds (which may not).

namespace spanledger {

/// Numbers, in N, mm, MPa, kg. cold_formed_fields() gives each its symbol, unit and meaning.
template <class N> struct ColdFormedInputs {
    lipped_channel::Size<N> size;
    // steel
    N coating, f_yb, E, G, nu, rho;
    N gamma_M0, gamma_M1;
    // support
    N t, stock_length;
    ActionInputs<N> actions;
    // deflection limits: ratio n of L/n and length
    N ratio_variable, max_variable, ratio_instantaneous, max_instantaneous, camber;
    // liveliness
    N min_frequency, variable_share, max_unit_load;
};

/// Symbol, unit and meaning of every field, in order: visit(field, symbol, unit, meaning).
template <class Inputs, class Visit> void cold_formed_fields(Inputs& x, Visit&& visit) {
    visit(x.size.h, "h", "mm", "depth");
    visit(x.size.b_1, "b_1", "mm", "width of the compression flange");
    visit(x.size.b_2, "b_2", "mm", "width of the tension flange");
    visit(x.size.c, "c", "mm", "depth of the lips");
    visit(x.size.t_nom, "t_nom", "mm", "nominal thickness, zinc included");
    visit(x.size.r, "r", "mm", "inner radius of the corners");
    visit(x.coating, "t_coat", "mm", "thickness of the zinc on both sides together");
    visit(x.f_yb, "f_yb", "MPa", "basic yield strength");
    visit(x.E, "E", "MPa", "modulus of elasticity");
    visit(x.G, "G", "MPa", "shear modulus");
    visit(x.nu, "nu", "-", "Poisson's ratio");
    visit(x.rho, "rho", "kg/m3", "density");
    visit(x.gamma_M0, "gamma_M0", "-", "partial factor, cross-sections");
    visit(x.gamma_M1, "gamma_M1", "-", "partial factor, instability");
    visit(x.t, "t_b", "mm", "bearing length");
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

/// Choices that are not numbers.
struct ColdFormedKinds {
    std::string refusal;        ///< why the member is not covered at all; empty where it is
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
