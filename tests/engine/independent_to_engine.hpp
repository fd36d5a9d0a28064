// SPDX-License-Identifier: MIT
#pragma once

#include "engine/independent_timber.hpp"

#include "spanledger/engine/basis.hpp"
#include "spanledger/input/inputs.hpp"

#include <stdexcept>

// An independent case as the engine reads it.

namespace independent {

inline const spanledger::Catalogue& built_in_catalogue(double xi) {
    const auto load = [](const char* set) {
        spanledger::Diagnostics diagnostics;
        auto catalogue = spanledger::load_catalogue({}, set, ".", diagnostics);
        if (diagnostics.has_errors()) throw std::runtime_error("the built-in catalogue has errors");
        return catalogue;
    };
    static const spanledger::Catalogue recommended = load("recommended");
    static const spanledger::Catalogue uk = load("uk");
    return xi == 0.85 ? recommended : uk;
}

struct EngineCase {
    spanledger::Inputs inputs;
    spanledger::Member member;

    [[nodiscard]] const spanledger::LoadClass& load() const { return inputs.brief.loads.front(); }
    [[nodiscard]] std::unique_ptr<spanledger::JoistRules> rules() const {
        return spanledger::make_rules(inputs, member, load());
    }
};

inline spanledger::TimberMember engine_member(const Case& c) {
    const Timber& m = c.timber;
    spanledger::TimberMember member;
    member.timber_class.name = "T";
    member.timber_class.timber = static_cast<spanledger::Timber>(m.kind);
    member.timber_class.f_m_k = m.fm;
    member.timber_class.f_v_k = m.fv;
    member.timber_class.f_c_90_k = m.fc90;
    member.timber_class.E_0_mean = m.E;
    member.timber_class.E_0_05 = m.E05;
    member.timber_class.G_mean = m.G;
    member.timber_class.G_05 = m.G05;
    member.timber_class.rho_k = m.rho_k;
    member.timber_class.rho_mean = m.rho_mean;
    if (m.kind == Kind::lvl) member.timber_class.size_exponent = m.s;
    member.b = c.b;
    member.h = c.h;
    member.plies = c.plies;
    member.plies_fixed_together = c.fixed_together;
    member.stock_length = c.stock;
    return member;
}

inline spanledger::LoadClass engine_load(const Loads& l) {
    spanledger::LoadClass load;
    load.name = "load";
    load.category = "A";
    load.permanent = l.g;
    load.permanent_partitions = l.g_partitions;
    load.variable = l.q;
    load.partitions = l.partitions;
    load.duration = static_cast<spanledger::Duration>(l.q_duration);
    load.psi = {l.psi0, 0.5, l.psi2};
    load.snow = l.snow;
    load.snow_duration = static_cast<spanledger::Duration>(l.snow_duration);
    load.snow_psi = {l.snow_psi0, 0.2, l.snow_psi2};
    load.concentrated = l.Q;
    load.concentrated_share = l.share;
    load.concentrated_duration = static_cast<spanledger::Duration>(l.Q_duration);
    load.concentrated_in_deflection = l.Q_in_deflection;
    return load;
}

inline void fill_basis(const Case& c, spanledger::Brief& brief) {
    auto& basis = brief.basis;
    basis.combination = c.set == Set::one ? "6.10" : "6.10a/b";
    basis.service_class = c.service_class;
    basis.wet_on_installation = c.wet;
    basis.load_sharing = c.load_sharing;
    basis.utilisation_cap = c.cap;
    basis.self_weight = c.self_weight;
    basis.shear_deflection = c.shear_deflection;
    basis.concentrated_near_support = c.concentrated_near;
    basis.uniform_near_support = c.uniform_near;
    basis.partitions_creep =
        c.partitions_creep_imposed ? spanledger::PartitionsCreep::imposed : spanledger::PartitionsCreep::permanent;
    auto& support = brief.support;
    support.arrangement = c.cantilever ? spanledger::Arrangement::cantilever : spanledger::Arrangement::single_span;
    support.bearing = c.bearing;
    support.root_fixed = c.cantilever;
    support.compression_edge = c.held ? spanledger::CompressionEdge::held : spanledger::CompressionEdge::free;
    support.restraint_spacing = c.restraint;
    support.load_position = static_cast<spanledger::LoadPosition>(c.position);
    brief.search.min_clear_span = c.min_clear;
    brief.search.max_clear_span = c.max_clear;
}

inline void fill_limits(const Case& c, spanledger::Brief& brief) {
    auto& limits = brief.limits;
    const std::array targets{&limits.variable_deflection, &limits.instantaneous_deflection, &limits.final_deflection};
    for (std::size_t i = 0; i < targets.size(); ++i) {
        if (c.deflection[i]) *targets[i] = spanledger::DeflectionLimit{c.deflection[i]->ratio, c.deflection[i]->length};
    }
    limits.camber = c.camber;
    if (c.vibration == Vibration::none) return;
    spanledger::VibrationLimit vibration;
    vibration.floor_width = c.floor_width;
    vibration.strutting = c.strutting;
    vibration.rule =
        c.vibration == Vibration::uk ? spanledger::VibrationRuleSet::uk : spanledger::VibrationRuleSet::recommended;
    if (c.vibration == Vibration::recommended) {
        vibration.a_mm = c.a;
        vibration.b = c.b_constant;
    }
    limits.vibration = vibration;
    brief.deck.stiffness = c.deck_stiffness;
}

inline EngineCase to_engine(const Case& c) {
    EngineCase engine;
    engine.inputs.catalogue = built_in_catalogue(c.xi);
    engine.member = engine_member(c);
    engine.inputs.brief.loads.push_back(engine_load(c.loads));
    fill_basis(c, engine.inputs.brief);
    fill_limits(c, engine.inputs.brief);
    return engine;
}

} // namespace independent
