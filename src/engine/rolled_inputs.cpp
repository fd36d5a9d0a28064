// SPDX-License-Identifier: MIT
#include "rolled_plans.hpp"
#include "spanledger/engine/action_inputs.hpp"
#include "spanledger/engine/rolled_properties.hpp"
#include "spanledger/engine/rolled_rules.hpp"
#include "steel_deflection_limits.hpp"
#include "steel_frequency.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {

std::optional<double> yield_strength(const SteelGrade& grade, double thickness) {
    if (thickness <= 16.0) return grade.f_y_16;
    if (thickness <= 40.0) return grade.f_y_40;
    return std::nullopt;
}

namespace {

double thickest_part(const RolledSection& section) {
    return std::max(section.t_w, section.t_f);
}

void fill_steel(RolledInputs<double>& x, const Catalogue& catalogue, const RolledMember& member) {
    const RolledSection& section = member.section;
    x.size = {.h = section.h, .b = section.b, .t_w = section.t_w, .t_f = section.t_f, .r = section.r};
    x.f_y = yield_strength(member.grade, thickest_part(section)).value_or(member.grade.f_y_16);
    x.E = parameter(catalogue, "steel_E");
    x.G = parameter(catalogue, "steel_G");
    x.rho = parameter(catalogue, "steel_density");
    x.gamma_M0 = parameter(catalogue, "gamma_M0");
    x.gamma_M1 = parameter(catalogue, "gamma_M1");
    x.eta = parameter(catalogue, "steel_eta");
}

void fill_lateral(RolledInputs<double>& x, const Inputs& inputs) {
    const Catalogue& catalogue = inputs.catalogue;
    x.lambda_LT_0 = parameter(catalogue, "lateral_lambda_0");
    x.beta = parameter(catalogue, "lateral_beta");
    x.C_1_uniform = parameter(catalogue, "lateral_C1_uniform");
    x.C_2_uniform = parameter(catalogue, "lateral_C2_uniform");
    x.C_1_force = parameter(catalogue, "lateral_C1_force");
    x.C_2_force = parameter(catalogue, "lateral_C2_force");
    x.load_height = inputs.brief.support.load_height.value_or(0.0);
    if (inputs.brief.basis.lateral_curves == LateralCurves::rolled_sections) {
        x.curves = {.h_b_1 = parameter(catalogue, "lateral_h_b_1"),
                    .h_b_2 = parameter(catalogue, "lateral_h_b_2"),
                    .alpha_1 = parameter(catalogue, "lateral_alpha_1"),
                    .alpha_2 = parameter(catalogue, "lateral_alpha_2"),
                    .alpha_3 = parameter(catalogue, "lateral_alpha_3")};
    } else {
        const double second = parameter(catalogue, "lateral_general_alpha_2");
        const double h_b = parameter(catalogue, "lateral_general_h_b");
        x.curves = {.h_b_1 = h_b,
                    .h_b_2 = h_b,
                    .alpha_1 = parameter(catalogue, "lateral_general_alpha_1"),
                    .alpha_2 = second,
                    .alpha_3 = second};
    }
}

void fill_deflection_limits(RolledInputs<double>& x, const Inputs& inputs) {
    const SteelDeflectionLimits limits = steel_deflection_limits(inputs);
    if (limits.variable) {
        x.ratio_variable = limits.variable->ratio.value_or(0.0);
        x.max_variable = limits.variable->max_mm.value_or(0.0);
    }
    if (limits.instantaneous) {
        x.ratio_instantaneous = limits.instantaneous->ratio.value_or(0.0);
        x.max_instantaneous = limits.instantaneous->max_mm.value_or(0.0);
    }
    x.camber = inputs.brief.limits.camber.value_or(0.0);
}

} // namespace

RolledInputs<double> rolled_inputs(const Inputs& inputs, const RolledMember& member, const LoadClass& load) {
    RolledInputs<double> x{};
    fill_steel(x, inputs.catalogue, member);
    fill_lateral(x, inputs);
    x.t = inputs.brief.support.bearing;
    x.restraint_spacing = inputs.brief.support.restraint_spacing.value_or(0.0);
    x.stock_length = member.stock_length.value_or(0.0);
    x.actions = action_inputs(inputs.catalogue, load);
    fill_deflection_limits(x, inputs);
    const LimitsAsked& limits = inputs.brief.limits;
    if (limits.frequency) {
        x.min_frequency = limits.frequency->min_hz;
        x.variable_share = limits.frequency->variable_share;
    }
    x.max_unit_load = limits.unit_load_deflection.value_or(0.0);
    return x;
}

namespace {

LoadHeight load_height(const Support& support) {
    if (support.load_height) return LoadHeight::stated;
    switch (support.load_position) {
    case LoadPosition::top: return LoadHeight::top;
    case LoadPosition::centroid: return LoadHeight::centroid;
    case LoadPosition::bottom: return LoadHeight::bottom;
    }
    return LoadHeight::top;
}

std::string class_4_reason(const RolledKinds& kinds, const RolledInputs<double>& x) {
    const auto classes = rolled::classes(kinds, x);
    if (en1993::section_class(classes.flange, classes.web) <= 3.0) return {};
    return fmt::format("class 4: the {} is too slender in bending at f_y = {} MPa; effective sections of rolled joists "
                       "are not covered",
                       classes.flange > 3.0 ? "flange" : "web", x.f_y);
}

} // namespace

std::string rolled_refusal(const RolledMember& member, const RolledKinds& kinds, const RolledInputs<double>& inputs) {
    const double thickest = thickest_part(member.section);
    if (!yield_strength(member.grade, thickest)) {
        return fmt::format("{} has no yield strength for parts {} mm thick", member.grade.name, thickest);
    }
    return class_4_reason(kinds, inputs);
}

RolledKinds rolled_kinds(const Inputs& inputs, const RolledMember& member, const LoadClass& load,
                         UniformAction uniform) {
    const BasisChoice& basis = inputs.brief.basis;
    const Support& support = inputs.brief.support;
    RolledKinds kinds;
    kinds.channel = member.section.shape == RolledShape::channel;
    kinds.cantilever = support.arrangement == Arrangement::cantilever;
    kinds.lateral_curves = basis.lateral_curves;
    kinds.load_height = load_height(support);
    kinds.restrained_at_intervals = support.restraint_spacing.has_value();
    kinds.web_stiffened = support.web_at_support == WebAtSupport::stiffened_or_cleated;
    kinds.self_weight = basis.self_weight;
    kinds.shear_deflection = basis.shear_deflection;
    kinds.camber = inputs.brief.limits.camber.has_value();
    kinds.combinations = combination_cases(inputs.catalogue, basis.combination, load, uniform);
    kinds.service = service_cases(load, uniform);
    kinds.frequency = frequency_cases(load, uniform);
    const SteelDeflectionLimits limits = steel_deflection_limits(inputs);
    const std::array asked{limits.variable, limits.instantaneous};
    for (std::size_t i = 0; i < asked.size(); ++i) {
        kinds.has_ratio[i] = asked[i] && asked[i]->ratio;
        kinds.has_length[i] = asked[i] && asked[i]->max_mm;
    }
    kinds.refusal = rolled_refusal(member, kinds, rolled_inputs(inputs, member, load));
    return kinds;
}

} // namespace spanledger
