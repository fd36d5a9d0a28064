// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/beam_effects.hpp"
#include "spanledger/engine/deflection_criteria.hpp"
#include "spanledger/engine/joist_rules.hpp"
#include "spanledger/engine/line_actions.hpp"
#include "spanledger/engine/rolled_inputs.hpp"
#include "spanledger/engine/rolled_properties.hpp"

#include <algorithm>
#include <vector>

namespace spanledger {

/// A rolled steel joist at one spacing, written once over its number type. The section is worked out beforehand; every
/// limit is a function of the effective span L.
template <class N> class RolledJoist {
public:
    RolledJoist(const RolledKinds& kinds, const RolledInputs<N>& inputs, const RolledProperties<N>& section)
        : kinds_(&kinds), in_(inputs), section_(section) {
        loads();
    }

    /// Calls out(demand, resistance) for each check of the limit, in the order of the plan's parts.
    template <class Out> void checks(Limit limit, const N& L, Out&& out) const {
        switch (limit) {
        case Limit::bending: return bending(L, out);
        case Limit::shear: return shear(L, out);
        case Limit::bending_with_shear: return bending_with_shear(L, out);
        case Limit::bearing: return end_support(L, out);
        case Limit::lateral_buckling: return lateral_buckling(L, out);
        case Limit::variable_deflection: return variable_deflection(L, out);
        case Limit::instantaneous_deflection: return instantaneous_deflection(L, out);
        case Limit::frequency: return frequency(L, out);
        case Limit::unit_load_deflection: return unit_load_deflection(L, out);
        case Limit::stock_length: out(named("l", "mm", "common practice", L + in_.t), in_.stock_length); return;
        case Limit::final_deflection:
        case Limit::velocity_response: return;
        }
    }

    struct ServiceDeflections {
        N w_Q;    ///< variable action and partition allowance
        N w_inst; ///< with the permanent action, less camber
    };

    [[nodiscard]] ServiceDeflections deflections(const ServiceCase& service, const N& L) const {
        const N w_G = named("w_G", "mm", "EN 1990 A1.4.3", deflection({actions_.permanent(), N(0.0)}, L));
        const N w_Q = named("w_Q", "mm", "EN 1990 A1.4.3", deflection(actions_.characteristic(service.action), L));
        const N w_inst = named("w_inst", "mm", "EN 1990 A1.4.3", w_G + w_Q);
        return {w_Q, kinds_->camber ? named("w_inst_c", "mm", "EN 1990 A1.4.3", greatest(w_inst - in_.camber, N(0.0)))
                                    : w_inst};
    }

    /// With the share of the variable action in the mass, Hz
    [[nodiscard]] N first_frequency(const ServiceCase& service, const N& L) const {
        const N variable = in_.variable_share * actions_.characteristic(service.action).q;
        const N m = named("m", "kg/mm", "beam theory", (actions_.permanent() + variable) / gravity);
        return beam::simply_supported::first_frequency(section_.EI, m, L);
    }

    /// Design reaction of one combination
    [[nodiscard]] N reaction(std::size_t combination, const N& L) const { return shear_force(design_[combination], L); }

    [[nodiscard]] const LineActions<N>& actions() const noexcept { return actions_; }

private:
    /// Density in kg/m3 and sizes in mm: 1e-9 turns kg/m3 into kg/mm3.
    void loads() {
        const N self_weight = kinds_->self_weight
                                  ? named("g_self", "N/mm", "EN 1991-1-1 5.2", in_.rho * 1e-9 * section_.A * gravity)
                                  : N(0.0);
        actions_ = LineActions<N>(in_.actions, self_weight);
        design_.reserve(kinds_->combinations.size());
        for (const CombinationCase& combination : kinds_->combinations) design_.push_back(actions_.design(combination));
    }

    [[nodiscard]] N moment(const beam::Load<N>& load, const N& L) const {
        return kinds_->cantilever ? beam::cantilever::moment(load, L) : beam::simply_supported::moment(load, L);
    }

    [[nodiscard]] N shear_force(const beam::Load<N>& load, const N& L) const {
        return kinds_->cantilever ? beam::cantilever::shear(load, L) : beam::simply_supported::shear(load, L);
    }

    [[nodiscard]] N deflection(const beam::Load<N>& load, const N& L) const {
        if (kinds_->cantilever) {
            const N w = beam::cantilever::bending_deflection(load, L, section_.EI);
            return kinds_->shear_deflection
                       ? w + beam::cantilever::shear_deflection(load, L, section_.shear_flexibility)
                       : w;
        }
        const N w = beam::simply_supported::bending_deflection(load, L, section_.EI);
        return kinds_->shear_deflection
                   ? w + beam::simply_supported::shear_deflection(load, L, section_.shear_flexibility)
                   : w;
    }

    template <class Out> void bending(const N& L, Out& out) const {
        for (const beam::Load<N>& load : design_) out(moment(load, L), section_.M_c);
    }

    template <class Out> void shear(const N& L, Out& out) const {
        for (const beam::Load<N>& load : design_) out(shear_force(load, L), section_.V_c);
    }

    [[nodiscard]] N moment_resistance_at(const N& V) const {
        const N f_yd = named("f_yd", "MPa", "EN 1993-1-1 6.2.5", in_.f_y / in_.gamma_M0);
        return en1993::moment_resistance_with_shear(section_.web, en1993::shear_reduction(V, section_.V_c), f_yd);
    }

    template <class Out> void bending_with_shear(const N& L, Out& out) const {
        const N half = named("V_Rd/2", "N", "EN 1993-1-1 6.2.8(2)", section_.V_c / 2.0);
        for (const beam::Load<N>& load : design_) {
            if (kinds_->cantilever) {
                const N V = shear_force(load, L);
                out(select(V > half, moment(load, L), N(0.0)), moment_resistance_at(V));
                continue;
            }
            const auto moment_where = [&](const N& V) {
                return en1993::moment_at(load, L, en1993::section_with_shear(load, L, V));
            };
            // V is F/2 at mid-span and no less before it.
            out(moment_where(half), moment_resistance_at(greatest(half, load.F / 2.0)));
            out(moment_where(section_.V_c), moment_resistance_at(section_.V_c));
        }
    }

    template <class Out> void end_support(const N& L, Out& out) const {
        for (const beam::Load<N>& load : design_) out(shear_force(load, L), section_.F_Rd);
    }

    /// Between intermediate restraints the moment is taken as constant; a spacing of L or more restrains nothing.
    [[nodiscard]] N critical_moment(const en1993::LateralLoading<N>& loading, const N& L) const {
        if (!kinds_->restrained_at_intervals) return en1993::critical_moment(section_.lateral, loading, L);
        const en1993::LateralLoading<N> constant_moment{N(1.0), N(0.0), section_.z_g};
        return named(
            "M_cr_r", "Nmm", "NCCI, elastic critical moment",
            select(
                in_.restraint_spacing >= L, [&] { return en1993::critical_moment(section_.lateral, loading, L); },
                [&] { return en1993::critical_moment(section_.lateral, constant_moment, in_.restraint_spacing); }));
    }

    [[nodiscard]] N buckling_resistance(const N& M_cr) const {
        const en1993::LateralCurve<N> curve =
            kinds_->lateral_curves == LateralCurves::rolled_sections
                ? en1993::LateralCurve<N>{section_.alpha_LT, in_.lambda_LT_0, in_.beta}
                : en1993::general_case(section_.alpha_LT);
        const N chi = en1993::reduction_factor(en1993::lateral_slenderness(section_.W_y, in_.f_y, M_cr), curve);
        const N f_yd = named("f_yd_1", "MPa", "EN 1993-1-1 (6.55)", in_.f_y / in_.gamma_M1);
        return en1993::buckling_resistance(chi, section_.W_y, f_yd);
    }

    /// A force with the uniform load: the smaller of what either form of the moment diagram gives.
    [[nodiscard]] N buckling_resistance_with_force(const N& M_cr_uniform, const N& L) const {
        const N M_cr_force = critical_moment({in_.C_1_force, in_.C_2_force, section_.z_g}, L);
        return buckling_resistance(
            named("M_cr_min", "Nmm", "NCCI, elastic critical moment", least(M_cr_uniform, M_cr_force)));
    }

    template <class Out> void lateral_buckling(const N& L, Out& out) const {
        const auto& cases = kinds_->combinations;
        const auto has_force = [](const CombinationCase& c) { return c.action == Action::concentrated; };
        const N M_cr = critical_moment({in_.C_1_uniform, in_.C_2_uniform, section_.z_g}, L);
        const N M_b_uniform = buckling_resistance(M_cr);
        const N M_b_force =
            std::any_of(cases.begin(), cases.end(), has_force) ? buckling_resistance_with_force(M_cr, L) : M_b_uniform;
        for (std::size_t i = 0; i < cases.size(); ++i) {
            out(moment(design_[i], L), has_force(cases[i]) ? M_b_force : M_b_uniform);
        }
    }

    template <class Out> void variable_deflection(const N& L, Out& out) const {
        const DeflectionCriteria<N> criteria{kinds_->has_ratio[0], kinds_->has_length[0], in_.ratio_variable,
                                             in_.max_variable};
        for (const ServiceCase& service : kinds_->service) {
            deflection_checks(deflections(service, L).w_Q, criteria, L, out);
        }
    }

    template <class Out> void instantaneous_deflection(const N& L, Out& out) const {
        const DeflectionCriteria<N> criteria{kinds_->has_ratio[1], kinds_->has_length[1], in_.ratio_instantaneous,
                                             in_.max_instantaneous};
        for (const ServiceCase& service : kinds_->service) {
            deflection_checks(deflections(service, L).w_inst, criteria, L, out);
        }
    }

    template <class Out> void frequency(const N& L, Out& out) const {
        for (const ServiceCase& service : kinds_->frequency) out(in_.min_frequency, first_frequency(service, L));
    }

    template <class Out> void unit_load_deflection(const N& L, Out& out) const {
        const beam::Load<N> unit{N(0.0), N(1000.0)};
        out(named("w_1kN", "mm", "beam theory", beam::simply_supported::bending_deflection(unit, L, section_.EI)),
            in_.max_unit_load);
    }

    const RolledKinds* kinds_;
    RolledInputs<N> in_;
    RolledProperties<N> section_;
    LineActions<N> actions_;
    std::vector<beam::Load<N>> design_;
};

} // namespace spanledger
