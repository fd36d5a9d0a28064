// SPDX-License-Identifier: MIT
#include "cold_formed_plans.hpp"
#include "spanledger/engine/action_inputs.hpp"
#include "spanledger/engine/cold_formed_rules.hpp"
#include "steel_frequency.hpp"

namespace spanledger {
namespace {

void fill_steel(ColdFormedInputs<double>& x, const Catalogue& catalogue, const ColdFormedMember& member) {
    const LippedChannelSize& size = member.size;
    x.size = {.h = size.h, .b_1 = size.b_1, .b_2 = size.b_2, .c = size.c, .t_nom = size.t_nom, .r = size.r};
    x.f_yb = member.grade.f_yb;
    x.coating = parameter(catalogue, "zinc_thickness");
    x.E = parameter(catalogue, "steel_E");
    x.G = parameter(catalogue, "steel_G");
    x.nu = parameter(catalogue, "steel_nu");
    x.rho = parameter(catalogue, "steel_density");
    x.gamma_M0 = parameter(catalogue, "gamma_M0");
    x.gamma_M1 = parameter(catalogue, "gamma_M1");
}

void fill_deflection_limits(ColdFormedInputs<double>& x, const Inputs& inputs) {
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

ColdFormedInputs<double> cold_formed_inputs(const Inputs& inputs, const ColdFormedMember& member,
                                            const LoadClass& load) {
    ColdFormedInputs<double> x{};
    fill_steel(x, inputs.catalogue, member);
    x.t = inputs.brief.support.bearing;
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

ColdFormedKinds cold_formed_kinds(const Inputs& inputs, const ColdFormedMember& member, const LoadClass& load,
                                  UniformAction uniform) {
    const BasisChoice& basis = inputs.brief.basis;
    ColdFormedKinds kinds;
    kinds.refusal = cold_formed_refusal(inputs.brief.support, cold_formed_inputs(inputs, member, load));
    kinds.web_stiffened = inputs.brief.support.web_at_support == WebAtSupport::stiffened_or_cleated;
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
    return kinds;
}

} // namespace spanledger
