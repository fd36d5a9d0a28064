// SPDX-License-Identifier: MIT
#include "spanledger/engine/action_inputs.hpp"
#include "spanledger/engine/timber_rules.hpp"

namespace spanledger {
namespace {

// What each kind of timber takes from the parameters; empty names are rules the kind does not have.
struct KindParameters {
    const char* gamma_M;
    const char* k_cr;
    const char* k_c_90;
    const char* kh_depth;
    const char* kh_exponent;
    const char* kh_cap;
};

KindParameters kind_parameters(Timber timber) {
    switch (timber) {
    case Timber::solid_softwood:
        return {"gamma_M_solid", "k_cr_solid", "kc90_solid", "kh_solid_depth", "kh_solid_exponent", "kh_solid_cap"};
    case Timber::solid_hardwood:
        return {"gamma_M_solid", "k_cr_solid", "", "kh_solid_depth", "kh_solid_exponent", "kh_solid_cap"};
    case Timber::glulam:
        return {"gamma_M_glulam",  "k_cr_glulam",        "kc90_glulam",
                "kh_glulam_depth", "kh_glulam_exponent", "kh_glulam_cap"};
    case Timber::lvl: return {"gamma_M_lvl", "k_cr_lvl", "", "kh_lvl_depth", "", "kh_lvl_cap"};
    }
    return {};
}

double parameter_or(const Catalogue& catalogue, const char* key, double otherwise) {
    return *key == '\0' ? otherwise : parameter(catalogue, key);
}

void fill_class(TimberInputs<double>& x, const TimberMember& member) {
    const TimberClass& c = member.timber_class;
    x.b = member.b;
    x.h = member.h;
    x.plies = member.plies;
    x.f_m_k = c.f_m_k;
    x.f_v_k = c.f_v_k;
    x.f_c_90_k = c.f_c_90_k;
    x.E_mean = c.E_0_mean;
    x.E_0_05 = c.E_0_05;
    x.G_mean = c.G_mean;
    x.G_0_05 = c.G_05.value_or(0.0);
    x.rho_mean = c.rho_mean;
    x.stock_length = member.stock_length.value_or(0.0);
}

void fill_factors(TimberInputs<double>& x, const Inputs& inputs, const TimberClass& timber_class) {
    const Catalogue& catalogue = inputs.catalogue;
    const KindParameters keys = kind_parameters(timber_class.timber);
    x.gamma_M = parameter(catalogue, keys.gamma_M);
    x.k_sys = parameter(catalogue, "k_sys");
    x.k_sys_max_spacing = parameter(catalogue, "k_sys_max_spacing");
    x.k_cr = parameter(catalogue, keys.k_cr);
    x.k_c_90 = parameter_or(catalogue, keys.k_c_90, 1.0);
    x.k_c_90_max_t = parameter(catalogue, "kc90_glulam_max_length");
    x.contact_extra = parameter(catalogue, "kc90_extra_length");
    x.kh_depth = parameter(catalogue, keys.kh_depth);
    x.kh_exponent =
        *keys.kh_exponent == '\0' ? timber_class.size_exponent.value_or(0.0) : parameter(catalogue, keys.kh_exponent);
    x.kh_cap = parameter(catalogue, keys.kh_cap);
    const ServiceFactors* factors =
        find_service_factors(catalogue, timber_class.timber, inputs.brief.basis.service_class);
    x.k_mod = factors->k_mod;
    x.k_def = factors->k_def;
    if (inputs.brief.basis.wet_on_installation) x.k_def += parameter(catalogue, "k_def_wet");
}

void fill_deflection_limits(TimberInputs<double>& x, const LimitsAsked& limits) {
    const auto fill = [](const std::optional<DeflectionLimit>& limit, double& ratio, double& length) {
        ratio = limit ? limit->ratio.value_or(0.0) : 0.0;
        length = limit ? limit->max_mm.value_or(0.0) : 0.0;
    };
    fill(limits.variable_deflection, x.ratio_variable, x.max_variable);
    fill(limits.instantaneous_deflection, x.ratio_instantaneous, x.max_instantaneous);
    fill(limits.final_deflection, x.ratio_final, x.max_final);
    x.camber = limits.camber.value_or(0.0);
}

void fill_vibration(TimberInputs<double>& x, const Inputs& inputs) {
    const Catalogue& catalogue = inputs.catalogue;
    x.min_frequency = parameter(catalogue, "vibration_min_frequency");
    x.EI_b = inputs.brief.deck.stiffness.value_or(0.0);
    x.k_dist_floor = parameter(catalogue, "vibration_kdist_floor");
    x.a_short = parameter(catalogue, "vibration_a_short_mm");
    x.a_short_span = parameter(catalogue, "vibration_a_short_max_span");
    x.a_long = parameter(catalogue, "vibration_a_long");
    x.a_long_exponent = parameter(catalogue, "vibration_a_long_exponent");
    x.k_amp = 1.0;
    x.k_strut = 1.0;
    const auto& vibration = inputs.brief.limits.vibration;
    if (!vibration) return;
    const bool uk = vibration->rule == VibrationRuleSet::uk;
    x.floor_width = vibration->floor_width;
    x.a = vibration->a_mm.value_or(0.0);
    x.b_velocity = vibration->b.value_or(0.0);
    x.damping = vibration->damping.value_or(
        parameter(catalogue, uk ? "vibration_damping_uk_rule" : "vibration_damping_recommended_rule"));
    if (!uk) return;
    x.k_amp = vibration->kamp.value_or(parameter(catalogue, "vibration_kamp_uk"));
    if (vibration->strutting) x.k_strut = parameter(catalogue, "vibration_kstrut_uk");
}

} // namespace

TimberInputs<double> timber_inputs(const Inputs& inputs, const TimberMember& member, const LoadClass& load) {
    TimberInputs<double> x{};
    fill_class(x, member);
    fill_factors(x, inputs, member.timber_class);
    x.t = inputs.brief.support.bearing;
    x.restraint_spacing = inputs.brief.support.restraint_spacing.value_or(0.0);
    x.actions = action_inputs(inputs.catalogue, load);
    fill_deflection_limits(x, inputs.brief.limits);
    fill_vibration(x, inputs);
    return x;
}

namespace {

void fill_material_rules(TimberKinds& kinds, const Inputs& inputs, const TimberClass& c) {
    switch (c.timber) {
    case Timber::solid_softwood:
    case Timber::solid_hardwood:
        kinds.size_rule = c.rho_k <= parameter(inputs.catalogue, "kh_solid_max_density")
                              ? SizeRule::below_reference_depth
                              : SizeRule::none;
        break;
    case Timber::glulam: kinds.size_rule = SizeRule::below_reference_depth; break;
    case Timber::lvl: kinds.size_rule = SizeRule::lvl; break;
    }
    if (c.timber == Timber::solid_softwood) kinds.bearing_rule = BearingRule::discrete;
    if (c.timber == Timber::glulam) kinds.bearing_rule = BearingRule::glulam;
    const bool softwood_rectangle = c.timber == Timber::solid_softwood || c.timber == Timber::glulam;
    kinds.buckling_rule = softwood_rectangle ? BucklingRule::softwood_rectangle : BucklingRule::general;
    kinds.G_0_05_tabulated = c.G_05.has_value();
}

} // namespace

TimberKinds timber_kinds(const Inputs& inputs, const TimberMember& member, const LoadClass& load,
                         UniformAction uniform) {
    const BasisChoice& basis = inputs.brief.basis;
    const Support& support = inputs.brief.support;
    const LimitsAsked& limits = inputs.brief.limits;
    TimberKinds kinds;
    fill_material_rules(kinds, inputs, member.timber_class);
    kinds.cantilever = support.arrangement == Arrangement::cantilever;
    kinds.load_position = support.load_position;
    kinds.restrained_at_intervals = support.restraint_spacing.has_value();
    kinds.fixed_together = member.plies_fixed_together;
    kinds.system_strength = basis.load_sharing && member.plies == 1;
    kinds.self_weight = basis.self_weight;
    kinds.shear_deflection = basis.shear_deflection;
    kinds.concentrated_near_support = basis.concentrated_near_support;
    kinds.uniform_near_support = basis.uniform_near_support;
    kinds.partitions_creep_permanent = basis.partitions_creep == PartitionsCreep::permanent;
    kinds.camber = limits.camber.has_value();
    kinds.vibration = limits.vibration ? limits.vibration->rule : VibrationRuleSet::uk;
    kinds.combinations = combination_cases(inputs.catalogue, basis.combination, load, uniform);
    kinds.service = service_cases(load, uniform);
    const std::array asked{limits.variable_deflection, limits.instantaneous_deflection, limits.final_deflection};
    for (std::size_t i = 0; i < asked.size(); ++i) {
        kinds.has_ratio[i] = asked[i] && asked[i]->ratio;
        kinds.has_length[i] = asked[i] && asked[i]->max_mm;
    }
    return kinds;
}

} // namespace spanledger
