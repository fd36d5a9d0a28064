// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/line_actions.hpp"
#include "spanledger/input/brief.hpp"

#include <array>
#include <cstddef>
#include <string>
#include <vector>

// Everything a timber joist is worked out from: numbers (which may be traced) and kinds (which may not).

namespace spanledger {

/// Numbers, in N, mm, MPa, kg. timber_fields() gives each its symbol, unit and meaning.
template <class N> struct TimberInputs {
    // section
    N b, h, plies;
    // strength class
    N f_m_k, f_v_k, f_c_90_k, E_mean, E_0_05, G_mean, G_0_05, rho_mean;
    // factors of the standard and its national annex
    N gamma_M, k_sys, k_sys_max_spacing, k_cr, k_c_90, k_c_90_max_t, contact_extra, kh_depth, kh_exponent, kh_cap,
        k_def;
    std::array<N, 5> k_mod; // by Duration
    // support and restraint
    N t, restraint_spacing, stock_length;
    ActionInputs<N> actions;
    // deflection limits: ratio n of L/n and length
    N ratio_variable, max_variable, ratio_instantaneous, max_instantaneous, ratio_final, max_final, camber;
    // vibration
    N min_frequency, floor_width, EI_b, a, b_velocity, damping, k_amp, k_strut, k_dist_floor, a_short, a_short_span,
        a_long, a_long_exponent;
};

/// Symbol, unit and meaning of every field, in order: visit(field, symbol, unit, meaning).
// NOLINTNEXTLINE(readability-function-size): one line per field, nothing else
template <class Inputs, class Visit> void timber_fields(Inputs& x, Visit&& visit) {
    visit(x.b, "b", "mm", "breadth of one ply");
    visit(x.h, "h", "mm", "depth");
    visit(x.plies, "n", "-", "number of plies");
    visit(x.f_m_k, "f_m_k", "MPa", "characteristic bending strength");
    visit(x.f_v_k, "f_v_k", "MPa", "characteristic shear strength");
    visit(x.f_c_90_k, "f_c_90_k", "MPa", "characteristic compressive strength perpendicular to grain");
    visit(x.E_mean, "E_mean", "MPa", "mean modulus of elasticity");
    visit(x.E_0_05, "E_0_05", "MPa", "fifth percentile modulus of elasticity");
    visit(x.G_mean, "G_mean", "MPa", "mean shear modulus");
    visit(x.G_0_05, "G_0_05", "MPa", "fifth percentile shear modulus");
    visit(x.rho_mean, "rho_mean", "kg/m3", "mean density");
    visit(x.gamma_M, "gamma_M", "-", "partial factor, material");
    visit(x.k_sys, "k_sys_0", "-", "system strength factor");
    visit(x.k_sys_max_spacing, "s_sys", "mm", "greatest spacing for load sharing");
    visit(x.k_cr, "k_cr", "-", "crack factor in shear");
    visit(x.k_c_90, "k_c_90_0", "-", "bearing factor on discrete supports");
    visit(x.k_c_90_max_t, "t_max", "mm", "greatest bearing length for the bearing factor");
    visit(x.contact_extra, "t_extra", "mm", "greatest extra contact length");
    visit(x.kh_depth, "h_0", "mm", "reference depth of the size factor");
    visit(x.kh_exponent, "s_h", "-", "exponent of the size factor");
    visit(x.kh_cap, "k_h_max", "-", "greatest size factor");
    visit(x.k_def, "k_def", "-", "deformation factor");
    visit(x.k_mod[0], "k_mod_permanent", "-", "modification factor, permanent");
    visit(x.k_mod[1], "k_mod_long", "-", "modification factor, long term");
    visit(x.k_mod[2], "k_mod_medium", "-", "modification factor, medium term");
    visit(x.k_mod[3], "k_mod_short", "-", "modification factor, short term");
    visit(x.k_mod[4], "k_mod_instantaneous", "-", "modification factor, instantaneous");
    visit(x.t, "t", "mm", "bearing length");
    visit(x.restraint_spacing, "a_r", "mm", "spacing of restraints of the compression edge");
    visit(x.stock_length, "l_stock", "mm", "longest stock length");
    action_fields(x.actions, visit);
    visit(x.ratio_variable, "n_Q", "-", "variable deflection limit L/n");
    visit(x.max_variable, "w_Q_max", "mm", "variable deflection limit");
    visit(x.ratio_instantaneous, "n_inst", "-", "instantaneous deflection limit L/n");
    visit(x.max_instantaneous, "w_inst_max", "mm", "instantaneous deflection limit");
    visit(x.ratio_final, "n_fin", "-", "final deflection limit L/n");
    visit(x.max_final, "w_fin_max", "mm", "final deflection limit");
    visit(x.camber, "w_c", "mm", "camber");
    visit(x.min_frequency, "f_min", "Hz", "least first frequency");
    visit(x.floor_width, "B", "mm", "floor width");
    visit(x.EI_b, "EI_b", "Nmm2/m", "stiffness of the floor across the joists");
    visit(x.a, "a_0", "mm", "limit of the deflection under 1 kN (recommended rule)");
    visit(x.b_velocity, "b_v_0", "-", "velocity response constant (recommended rule)");
    visit(x.damping, "zeta", "-", "modal damping ratio");
    visit(x.k_amp, "k_amp", "-", "amplification factor");
    visit(x.k_strut, "k_strut", "-", "strutting factor");
    visit(x.k_dist_floor, "k_dist_min", "-", "least share of 1 kN");
    visit(x.a_short, "a_short", "mm", "limit of the deflection under 1 kN, short spans");
    visit(x.a_short_span, "L_short", "mm", "greatest short span");
    visit(x.a_long, "a_long", "-", "factor of the limit for long spans");
    visit(x.a_long_exponent, "e_long", "-", "exponent of the limit for long spans");
}

enum class BucklingRule { softwood_rectangle, general };
enum class SizeRule { none, below_reference_depth, lvl };
enum class BearingRule { none, discrete, glulam };

/// Choices that are not numbers.
struct TimberKinds {
    bool cantilever = false;
    SizeRule size_rule = SizeRule::none;
    BearingRule bearing_rule = BearingRule::none;
    BucklingRule buckling_rule = BucklingRule::softwood_rectangle;
    LoadPosition load_position = LoadPosition::top;
    bool restrained_at_intervals = false;
    bool G_0_05_tabulated = false;
    bool fixed_together = false;
    bool system_strength = false; ///< load sharing stated, one ply
    bool self_weight = true;
    bool shear_deflection = false;
    bool concentrated_near_support = false;
    bool uniform_near_support = false;
    bool partitions_creep_permanent = true;
    bool camber = false;
    VibrationRuleSet vibration = VibrationRuleSet::uk;
    std::vector<CombinationCase> combinations;
    std::vector<ServiceCase> service;
    std::array<bool, 3> has_ratio{}; ///< variable, instantaneous, final
    std::array<bool, 3> has_length{};
};

} // namespace spanledger
