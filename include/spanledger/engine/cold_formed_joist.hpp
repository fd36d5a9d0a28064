// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/beam_effects.hpp"
#include "spanledger/engine/cold_formed_inputs.hpp"
#include "spanledger/engine/cold_formed_section.hpp"
#include "spanledger/engine/deflection_criteria.hpp"
#include "spanledger/engine/joist_rules.hpp"
#include "spanledger/engine/line_actions.hpp"

#include <vector>

namespace spanledger {

/// A cold-formed channel joist at one spacing, written once over its number type: simply supported, its compression
/// flange held. The section is worked out beforehand; every limit is a function of the effective span L.
template <class N> class ColdFormedJoist {
public:
    ColdFormedJoist(const ColdFormedKinds& kinds, const ColdFormedInputs<N>& inputs,
                    const ColdFormedProperties<N>& section)
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
        case Limit::variable_deflection: return variable_deflection(L, out);
        case Limit::instantaneous_deflection: return instantaneous_deflection(L, out);
        case Limit::frequency: return frequency(L, out);
        case Limit::unit_load_deflection: return unit_load_deflection(L, out);
        case Limit::stock_length: out(named("l", "mm", "common practice", L + in_.t), in_.stock_length); return;
        case Limit::lateral_buckling:
        case Limit::final_deflection:
        case Limit::velocity_response: return;
        }
    }

    struct ServiceDeflections {
        N w_Q;    ///< variable action and partition allowance
        N w_inst; ///< with the permanent action, less camber
    };

    /// Deflections of one case, with the second moment of area that its characteristic combination leaves.
    [[nodiscard]] ServiceDeflections deflections(const ServiceCase& service, const N& L) const {
        const N M = beam::simply_supported::moment(actions_.service(service.action), L);
        const N EI = named("EI_fic", "Nmm2", "EN 1993-1-3 7.1(3)",
                           in_.E * en1993_1_3::fictitious_second_moment(
                                       section_.stiffness, en1993_1_3::service_stress(section_.stiffness, M)));
        const N w_G = deflection({actions_.permanent(), N(0.0)}, L, EI);
        const N w_Q = named("w_Q", "mm", "beam theory", deflection(actions_.characteristic(service.action), L, EI));
        const N w_inst = named("w_inst", "mm", "EN 1990 A1.4.3", w_G + w_Q);
        return {w_Q, kinds_->camber ? named("w_inst_c", "mm", "EN 1990 A1.4.3", greatest(w_inst - in_.camber, N(0.0)))
                                    : w_inst};
    }

    /// With the share of the variable action in the mass, Hz
    [[nodiscard]] N first_frequency(const ServiceCase& service, const N& L) const {
        const N m =
            named("m", "kg/mm", "beam theory",
                  (actions_.permanent() + in_.variable_share * actions_.characteristic(service.action).q) / gravity);
        return beam::simply_supported::first_frequency(section_.EI_gr, m, L);
    }

    /// Design reaction of one combination
    [[nodiscard]] N reaction(std::size_t combination, const N& L) const {
        return beam::simply_supported::shear(design_[combination], L);
    }

    [[nodiscard]] const LineActions<N>& actions() const noexcept { return actions_; }
    [[nodiscard]] const ColdFormedProperties<N>& section() const noexcept { return section_; }

private:
    /// Density in kg/m3 and sizes in mm: 1e-9 turns kg/m3 into kg/mm3.
    void loads() {
        const N self_weight =
            kinds_->self_weight ? named("g_self", "N/mm", "EN 1991-1-1 5.2", in_.rho * 1e-9 * section_.A_nom * gravity)
                                : N(0.0);
        actions_ = LineActions<N>(in_.actions, self_weight);
        design_.reserve(kinds_->combinations.size());
        for (const CombinationCase& combination : kinds_->combinations) design_.push_back(actions_.design(combination));
    }

    [[nodiscard]] N deflection(const beam::Load<N>& load, const N& L, const N& EI) const {
        const N w = beam::simply_supported::bending_deflection(load, L, EI);
        return kinds_->shear_deflection
                   ? w + beam::simply_supported::shear_deflection(load, L, section_.shear_flexibility)
                   : w;
    }

    template <class Out> void bending(const N& L, Out& out) const {
        for (const beam::Load<N>& load : design_) {
            out(beam::simply_supported::moment(load, L), section_.resistance.M_c);
        }
    }

    template <class Out> void shear(const N& L, Out& out) const {
        for (const beam::Load<N>& load : design_) {
            out(beam::simply_supported::shear(load, L), section_.resistance.V_b);
        }
    }

    template <class Out> void bending_with_shear(const N& L, Out& out) const {
        for (const beam::Load<N>& load : design_) {
            out(en1993_1_3::bending_with_shear(load, L, section_.resistance), N(1.0));
        }
    }

    template <class Out> void end_support(const N& L, Out& out) const {
        const N R_w = en1993_1_3::end_support_resistance(section_.R_w_0, in_.t, section_.size.t);
        for (std::size_t i = 0; i < design_.size(); ++i) out(reaction(i, L), R_w);
    }

    [[nodiscard]] DeflectionCriteria<N> criteria(std::size_t index, const N& ratio, const N& length) const {
        return {kinds_->has_ratio[index], kinds_->has_length[index], ratio, length};
    }

    template <class Out> void variable_deflection(const N& L, Out& out) const {
        for (const ServiceCase& service : kinds_->service) {
            deflection_checks(deflections(service, L).w_Q, criteria(0, in_.ratio_variable, in_.max_variable), L, out);
        }
    }

    template <class Out> void instantaneous_deflection(const N& L, Out& out) const {
        for (const ServiceCase& service : kinds_->service) {
            deflection_checks(deflections(service, L).w_inst,
                              criteria(1, in_.ratio_instantaneous, in_.max_instantaneous), L, out);
        }
    }

    template <class Out> void frequency(const N& L, Out& out) const {
        for (const ServiceCase& service : kinds_->frequency) out(in_.min_frequency, first_frequency(service, L));
    }

    template <class Out> void unit_load_deflection(const N& L, Out& out) const {
        const beam::Load<N> unit{N(0.0), N(1000.0)};
        out(named("w_1kN", "mm", "beam theory", beam::simply_supported::bending_deflection(unit, L, section_.EI_gr)),
            in_.max_unit_load);
    }

    const ColdFormedKinds* kinds_;
    ColdFormedInputs<N> in_;
    ColdFormedProperties<N> section_;
    LineActions<N> actions_;
    std::vector<beam::Load<N>> design_;
};

} // namespace spanledger
