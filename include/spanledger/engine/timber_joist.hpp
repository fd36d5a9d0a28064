// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/beam_effects.hpp"
#include "spanledger/clauses/en1995_bearing.hpp"
#include "spanledger/clauses/en1995_bending.hpp"
#include "spanledger/clauses/en1995_deflection.hpp"
#include "spanledger/clauses/en1995_shear.hpp"
#include "spanledger/clauses/en1995_strength.hpp"
#include "spanledger/clauses/en1995_vibration.hpp"
#include "spanledger/clauses/rectangle.hpp"
#include "spanledger/engine/joist_rules.hpp"
#include "spanledger/engine/line_actions.hpp"
#include "spanledger/engine/timber_inputs.hpp"

#include <vector>

namespace spanledger {

/// A timber joist at one spacing, written once over its number type. Everything that the span does not change is worked
/// out in the constructor; every limit is then a function of the effective span L.
template <class N> class TimberJoist {
public:
    TimberJoist(const TimberKinds& kinds, const TimberInputs<N>& inputs) : kinds_(&kinds), in_(inputs) {
        section();
        loads();
        strengths();
    }

    /// Calls out(demand, resistance) for each check of the limit, in the order of the plan's parts.
    template <class Out> void checks(Limit limit, const N& L, Out&& out) const {
        switch (limit) {
        case Limit::bending: return bending(L, out);
        case Limit::shear: return shear(L, out);
        case Limit::bearing: return bearing(L, out);
        case Limit::lateral_buckling: return lateral_buckling(L, out);
        case Limit::variable_deflection: return variable_deflection(L, out);
        case Limit::instantaneous_deflection: return instantaneous_deflection(L, out);
        case Limit::final_deflection: return final_deflection(L, out);
        case Limit::frequency: out(in_.min_frequency, first_frequency(L)); return;
        case Limit::unit_load_deflection: return unit_load_deflection(L, out);
        case Limit::velocity_response: return velocity_response(L, out);
        case Limit::stock_length: out(named("l", "mm", "common practice", L + in_.t), in_.stock_length); return;
        case Limit::bending_with_shear: return;
        }
    }

    struct ServiceDeflections {
        N w_G;          ///< permanent, without the partition allowance
        N w_partitions; ///< partition allowance
        N w_Q;          ///< the variable action itself
    };

    /// Deflections under G, the partition allowance and the variable action of one case.
    [[nodiscard]] ServiceDeflections deflections(const ServiceCase& service, const N& L) const {
        return {deflection({actions_.permanent(), N(0.0)}, L),
                deflection({actions_.partitions(service.action), N(0.0)}, L),
                deflection(actions_.variable(service.action), L)};
    }

    [[nodiscard]] N net_final(const ServiceCase& service, const N& L) const {
        const ServiceDeflections w = deflections(service, L);
        const N w_fin_G = en1995::final_deflection_permanent(w.w_G, in_.k_def);
        const N w_fin_partitions =
            kinds_->partitions_creep_permanent
                ? en1995::final_deflection_permanent(w.w_partitions, in_.k_def)
                : en1995::final_deflection_variable(w.w_partitions, actions_.psi_2(service.action), in_.k_def);
        const N w_fin_Q = en1995::final_deflection_variable(w.w_Q, actions_.psi_2(service.action), in_.k_def);
        const N w_fin = named("w_fin", "mm", "EN 1995-1-1 (2.2)", w_fin_G + w_fin_partitions + w_fin_Q);
        return kinds_->camber ? en1995::net_final_deflection(w_fin, in_.camber, w_fin_G) : w_fin;
    }

    [[nodiscard]] N first_frequency(const N& L) const { return en1995::first_frequency(floor_, L); }

    /// Design reaction of one combination; no reduction near the support applies to it.
    [[nodiscard]] N reaction(std::size_t combination, const N& L) const {
        return kinds_->cantilever ? beam::cantilever::shear(design_[combination].load, L)
                                  : beam::simply_supported::shear(design_[combination].load, L);
    }

    /// Strength in bearing over which the contact length is worked out, N per mm of contact length.
    [[nodiscard]] N bearing_resistance_per_length(std::size_t combination, const N& L) const {
        const Design& d = design_[combination];
        return bearing_factor(L) * d.k_sys * en1995::design_strength(d.k_mod, in_.f_c_90_k, in_.gamma_M) * width_;
    }

    /// λrel,m of the compression edge under the uniform load, or (cantilever) under a force at its end.
    [[nodiscard]] N relative_slenderness(const N& L, bool end_force) const {
        const N l_ef = effective_length(L, end_force);
        const N breadth = kinds_->fixed_together ? width_ : in_.b;
        const N G_0_05 = kinds_->G_0_05_tabulated
                             ? in_.G_0_05
                             : en1995::fifth_percentile_shear_modulus(in_.G_mean, in_.E_0_05, in_.E_mean);
        const en1995::SlenderRectangle<N> rectangle{breadth, in_.h, in_.E_0_05, G_0_05};
        const N sigma = kinds_->buckling_rule == BucklingRule::softwood_rectangle
                            ? en1995::critical_stress_softwood(rectangle, l_ef)
                            : en1995::critical_stress(rectangle, torsion(breadth), l_ef);
        return en1995::relative_slenderness(in_.f_m_k, sigma);
    }

    [[nodiscard]] const LineActions<N>& actions() const noexcept { return actions_; }

private:
    struct Design {
        beam::Load<N> load;
        N k_mod;
        N k_sys;
        N f_m_d; ///< kh ksys fm,d
        N f_v_d; ///< ksys fv,d
    };

    void section() {
        width_ = named("b_n", "mm", "geometry", in_.plies * in_.b);
        W_ = rectangle::section_modulus(width_, in_.h);
        EI_ = named("EI", "Nmm2", "geometry", in_.E_mean * rectangle::second_moment(width_, in_.h));
        if (kinds_->shear_deflection) {
            shear_flexibility_ =
                named("kappa/GA", "1/N", "beam theory", 1.2 / (in_.G_mean * rectangle::area(width_, in_.h)));
        }
    }

    /// Density in kg/m3 and sizes in mm: 1e-9 turns kg/m3 into kg/mm3.
    void loads() {
        const N self_weight = kinds_->self_weight
                                  ? named("g_self", "N/mm", "EN 1991-1-1 5.2",
                                          in_.rho_mean * 1e-9 * rectangle::area(width_, in_.h) * gravity)
                                  : N(0.0);
        actions_ = LineActions<N>(in_.actions, self_weight);
        floor_.EI_l = named("EI_l", "Nmm2/m", "EN 1995-1-1 7.3.3", 1000.0 * EI_ / actions_.spacing());
        floor_.EI_b = in_.EI_b;
        floor_.mass = named("m", "kg/mm2", "EN 1995-1-1 7.3.3", actions_.permanent() / actions_.spacing() / gravity);
    }

    void strengths() {
        const N k_h = size_factor();
        const N k_sys_shared = kinds_->system_strength
                                   ? named("k_sys", "-", "EN 1995-1-1 6.6",
                                           select(actions_.spacing() <= in_.k_sys_max_spacing, in_.k_sys, N(1.0)))
                                   : N(1.0);
        for (const CombinationCase& combination : kinds_->combinations) {
            Design d;
            d.k_mod = in_.k_mod[static_cast<std::size_t>(combination.duration)];
            d.k_sys = combination.action == Action::concentrated
                          ? select(actions_.concentrated_share() < N(1.0), N(1.0), k_sys_shared)
                          : k_sys_shared;
            d.load = actions_.design(combination);
            d.f_m_d = k_h * d.k_sys * en1995::design_strength(d.k_mod, in_.f_m_k, in_.gamma_M);
            d.f_v_d = d.k_sys * en1995::design_strength(d.k_mod, in_.f_v_k, in_.gamma_M);
            design_.push_back(d);
        }
    }

    [[nodiscard]] N size_factor() const {
        const en1995::SizeFactor<N> rule{in_.kh_depth, in_.kh_exponent, in_.kh_cap};
        switch (kinds_->size_rule) {
        case SizeRule::below_reference_depth: return en1995::size_factor_below_reference_depth(rule, in_.h);
        case SizeRule::lvl: return en1995::size_factor_lvl(rule, in_.h);
        case SizeRule::none: break;
        }
        return N(1.0);
    }

    [[nodiscard]] N moment(const beam::Load<N>& load, const N& L) const {
        return kinds_->cantilever ? beam::cantilever::moment(load, L) : beam::simply_supported::moment(load, L);
    }

    [[nodiscard]] N deflection(const beam::Load<N>& load, const N& L) const {
        if (kinds_->cantilever) {
            const N w = beam::cantilever::bending_deflection(load, L, EI_);
            return kinds_->shear_deflection ? w + beam::cantilever::shear_deflection(load, L, shear_flexibility_) : w;
        }
        const N w = beam::simply_supported::bending_deflection(load, L, EI_);
        return kinds_->shear_deflection ? w + beam::simply_supported::shear_deflection(load, L, shear_flexibility_) : w;
    }

    template <class Out> void bending(const N& L, Out& out) const {
        for (const Design& d : design_) {
            out(en1995::bending_stress(moment(d.load, L), W_), d.f_m_d);
        }
    }

    template <class Out> void shear(const N& L, Out& out) const {
        const en1995::ShearArea<N> area{width_, in_.h, in_.k_cr};
        for (const Design& d : design_) {
            out(en1995::shear_stress(shear_force(d.load, L), area), d.f_v_d);
        }
    }

    [[nodiscard]] N shear_force(const beam::Load<N>& load, const N& L) const {
        if (kinds_->cantilever) return beam::cantilever::shear(load, L);
        if (!kinds_->uniform_near_support && !kinds_->concentrated_near_support) {
            return beam::simply_supported::shear(load, L);
        }
        const en1995::SupportGeometry<N> support{in_.t, in_.h};
        const beam::Load<N> uniform{load.q, N(0.0)};
        const beam::Load<N> concentrated{N(0.0), load.F};
        const N V_q = kinds_->uniform_near_support ? en1995::uniform_shear_beyond_depth(load.q, L, support)
                                                   : beam::simply_supported::shear(uniform, L);
        const N V_F = kinds_->concentrated_near_support ? en1995::concentrated_shear_beyond_depth(load.F, L, support)
                                                        : beam::simply_supported::shear(concentrated, L);
        return named("V_d", "N", "EN 1995-1-1 6.1.7", V_q + V_F);
    }

    [[nodiscard]] N bearing_factor(const N& L) const {
        const en1995::DiscreteSupport<N> support{in_.k_c_90, in_.t, in_.h};
        switch (kinds_->bearing_rule) {
        case BearingRule::discrete: return en1995::bearing_factor(support, L);
        case BearingRule::glulam: return en1995::bearing_factor_glulam(support, in_.k_c_90_max_t, L);
        case BearingRule::none: break;
        }
        return N(1.0);
    }

    template <class Out> void bearing(const N& L, Out& out) const {
        const N l_ef = en1995::contact_length(in_.t, in_.contact_extra);
        const N k_c_90 = bearing_factor(L);
        for (std::size_t i = 0; i < design_.size(); ++i) {
            const Design& d = design_[i];
            out(en1995::bearing_stress(reaction(i, L), width_, l_ef),
                k_c_90 * d.k_sys * en1995::design_strength(d.k_mod, in_.f_c_90_k, in_.gamma_M));
        }
    }

    template <class Out> void lateral_buckling(const N& L, Out& out) const {
        const N k_crit_uniform = en1995::lateral_buckling_factor(relative_slenderness(L, false));
        // An end force on a cantilever has an effective length of its own; at mid-span of a simply supported joist the
        // larger one of the uniform load is kept.
        const bool differs = kinds_->cantilever;
        const N k_crit_force =
            differs ? en1995::lateral_buckling_factor(relative_slenderness(L, true)) : k_crit_uniform;
        for (std::size_t i = 0; i < design_.size(); ++i) {
            const Design& d = design_[i];
            const bool force = kinds_->combinations[i].action == Action::concentrated;
            out(en1995::bending_stress(moment(d.load, L), W_), (force ? k_crit_force : k_crit_uniform) * d.f_m_d);
        }
    }

    [[nodiscard]] en1995::TorsionProperties<N> torsion(const N& breadth) const {
        return {rectangle::weak_second_moment(breadth, in_.h), rectangle::torsion_constant(breadth, in_.h),
                rectangle::section_modulus(breadth, in_.h)};
    }

    [[nodiscard]] N effective_length(const N& L, bool end_force) const {
        const N allowance = height_allowance();
        if (kinds_->cantilever) {
            return en1995::effective_length<N>({L, end_force ? N(0.8) : N(0.5), allowance});
        }
        const N unrestrained = en1995::effective_length<N>({L, N(0.9), allowance});
        if (!kinds_->restrained_at_intervals) return unrestrained;
        const N between = en1995::effective_length<N>({in_.restraint_spacing, N(1.0), allowance});
        return named("l_ef", "mm", "EN 1995-1-1 Table 6.1", select(in_.restraint_spacing >= L, unrestrained, between));
    }

    [[nodiscard]] N height_allowance() const {
        switch (kinds_->load_position) {
        case LoadPosition::top: return 2.0 * in_.h;
        case LoadPosition::bottom: return -0.5 * in_.h;
        case LoadPosition::centroid: break;
        }
        return N(0.0);
    }

    struct DeflectionCriteria {
        std::size_t index; ///< into has_ratio and has_length
        const N& ratio;
        const N& length;
    };

    template <class Out> void deflection_checks(const N& w, const DeflectionCriteria& c, const N& L, Out& out) const {
        if (kinds_->has_ratio[c.index]) out(w, named("w_lim", "mm", "EN 1995-1-1 7.2", L / c.ratio));
        if (kinds_->has_length[c.index]) out(w, c.length);
    }

    template <class Out> void variable_deflection(const N& L, Out& out) const {
        for (const ServiceCase& service : kinds_->service) {
            const ServiceDeflections w = deflections(service, L);
            deflection_checks(named("w_Q", "mm", "EN 1995-1-1 2.2.3", w.w_partitions + w.w_Q),
                              {0, in_.ratio_variable, in_.max_variable}, L, out);
        }
    }

    template <class Out> void instantaneous_deflection(const N& L, Out& out) const {
        for (const ServiceCase& service : kinds_->service) {
            const ServiceDeflections w = deflections(service, L);
            deflection_checks(en1995::instantaneous_deflection(w.w_G, w.w_partitions + w.w_Q),
                              {1, in_.ratio_instantaneous, in_.max_instantaneous}, L, out);
        }
    }

    template <class Out> void final_deflection(const N& L, Out& out) const {
        for (const ServiceCase& service : kinds_->service) {
            deflection_checks(net_final(service, L), {2, in_.ratio_final, in_.max_final}, L, out);
        }
    }

    [[nodiscard]] N unit_load_limit(const N& L) const {
        if (kinds_->vibration == VibrationRuleSet::recommended) return in_.a;
        return uk::unit_load_limit<N>({in_.a_short, in_.a_short_span, in_.a_long, in_.a_long_exponent}, L);
    }

    template <class Out> void unit_load_deflection(const N& L, Out& out) const {
        const N k_dist = kinds_->vibration == VibrationRuleSet::uk
                             ? uk::distribution_factor<N>({in_.k_strut, in_.EI_b, actions_.spacing(), in_.k_dist_floor})
                             : N(1.0);
        out(en1995::unit_load_deflection<N>({k_dist, in_.k_amp, EI_}, L), unit_load_limit(L));
    }

    template <class Out> void velocity_response(const N& L, Out& out) const {
        const N f_1 = first_frequency(L);
        const N n_40 = en1995::modes_below_40_hz(floor_, f_1, in_.floor_width / L);
        const N modal_mass =
            named("m B L", "kg", "EN 1995-1-1 7.3.3",
                  actions_.permanent_without_partitions() / actions_.spacing() / gravity * in_.floor_width * L);
        const N b = kinds_->vibration == VibrationRuleSet::uk ? uk::velocity_base(unit_load_limit(L)) : in_.b_velocity;
        out(en1995::velocity_response(n_40, modal_mass), en1995::velocity_limit(b, f_1, in_.damping));
    }

    const TimberKinds* kinds_;
    TimberInputs<N> in_;
    N width_{}, W_{}, EI_{}, shear_flexibility_{};
    LineActions<N> actions_;
    en1995::FloorStrip<N> floor_{};
    std::vector<Design> design_;
};

} // namespace spanledger
