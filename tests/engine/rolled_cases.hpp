// SPDX-License-Identifier: MIT
#pragma once

#include "engine/independent_rolled.hpp"
#include "engine/random_cases.hpp"

#include "spanledger/engine/basis.hpp"
#include "spanledger/input/inputs.hpp"

#include <sstream>
#include <stdexcept>
#include <string>

// Random rolled joists with every option, and the same joists as the engine reads them.

namespace independent_rolled {

using independent::Random;

/// From stocky to class 4, from joists to shapes as wide as deep.
inline Section random_shape(Random& r) {
    Section s;
    s.channel = r.chance(0.2);
    s.h = r.between(80, 900);
    s.b = s.channel ? r.between(0.25, 0.6) * s.h : r.between(0.28, 1.05) * s.h;
    s.b = std::clamp(s.b, 40.0, 420.0);
    s.tw = s.h / r.one_of({r.between(25, 60), r.between(25, 60), r.between(50, 110)});
    s.tf = std::max(s.tw * r.between(1.2, 2.2), s.b / r.between(8, 26));
    s.tf = std::min(s.tf, 39.0);
    s.tw = std::min(s.tw, 39.0);
    s.r = r.chance(0.05) ? 0.0 : std::min(s.tf * r.between(0.7, 1.8), s.b / 5);
    return s;
}

inline Loads random_actions(Random& r) {
    Loads l;
    l.g = r.between(0.0002, 0.004);
    if (r.chance(0.3)) l.g_partitions = r.between(0.0001, 0.001);
    if (r.chance(0.85)) l.q = r.one_of({r.between(0.0004, 0.006), r.between(0.01, 0.3)});
    if (r.chance(0.3)) l.partitions = r.between(0.0003, 0.0012);
    if (r.chance(0.2)) l.snow = r.between(0.0004, 0.004);
    if (r.chance(0.5)) l.Q = r.one_of({r.between(900, 9000), r.between(900, 9000), r.between(20000, 400000)});
    l.share = r.one_of({1.0, r.between(0.3, 0.99)});
    l.psi0 = r.between(0.5, 1.0);
    l.snow_psi0 = r.between(0.5, 0.7);
    l.Q_in_deflection = r.chance(0.3);
    return l;
}

inline void random_asked(Random& r, Case& c) {
    if (r.chance(0.7)) {
        c.ratio_Q = r.maybe(0.6, 200, 500);
        c.length_Q = r.maybe(0.3, 5, 30);
        c.ratio_inst = r.maybe(0.6, 150, 400);
        c.length_inst = r.maybe(0.3, 8, 40);
    }
    c.camber = r.maybe(0.2, 1, 25);
    c.f_min = r.maybe(0.4, 3, 12);
    c.mass_share = r.between(0, 0.4);
    c.unit_limit = r.maybe(0.3, 0.1, 3);
    if (!c.cantilever) c.stock = r.maybe(0.2, 4000, 15000);
}

inline Case random_joist(Random& r) {
    Case c;
    c.section = random_shape(r);
    c.fy16 = r.one_of({235.0, 275.0, 355.0, r.between(220, 460)});
    c.fy40 = c.fy16 * r.between(0.93, 1.0);
    c.gM0 = r.one_of({1.0, r.between(1.0, 1.15)});
    c.gM1 = r.one_of({1.0, r.between(1.0, 1.15)});
    c.eta = r.one_of({1.0, 1.0, 1.2});
    c.lambda0 = r.one_of({0.4, 0.2});
    c.beta = r.one_of({0.75, 1.0});
    c.uk = r.chance(0.4);
    c.xi = c.uk ? 0.925 : 0.85;
    c.general = r.chance(0.3);
    c.loads = random_actions(r);
    c.a_and_b = r.chance(0.4);
    c.spacing = r.between(300, 4000);
    c.bearing = r.between(20, 250);
    c.cantilever = r.chance(0.15);
    c.held = r.chance(0.3);
    c.stiffened = r.chance(0.3);
    c.self_weight = r.chance(0.8);
    c.shear_deflection = r.chance(0.3);
    if (!c.held && !c.cantilever) c.restraint = r.maybe(0.4, 400, 6000);
    c.load_height = r.maybe(0.2, -0.7 * c.section.h, 0.9 * c.section.h);
    c.height = r.one_of({Height::top, Height::centroid, Height::bottom});
    random_asked(r, c);
    c.cap = r.one_of({1.0, 1.0, r.between(0.7, 1.0)});
    return c;
}

inline double span_addition(const Case& c) {
    return c.cantilever ? c.bearing / 2 : c.bearing;
}

inline std::string describe(const Case& c) {
    std::ostringstream out;
    out.precision(17);
    const Section& s = c.section;
    const Loads& l = c.loads;
    out << (s.channel ? "channel " : "I ") << s.h << " " << s.b << " " << s.tw << " " << s.tf << " " << s.r << " fy "
        << c.fy16 << " " << c.fy40 << " gM " << c.gM0 << " " << c.gM1 << " eta " << c.eta << " general " << c.general
        << " uk " << c.uk << " a/b " << c.a_and_b << " spacing " << c.spacing << " bearing " << c.bearing << " g "
        << l.g << " " << l.g_partitions << " q " << l.q << " " << l.partitions << " snow " << l.snow << " Q " << l.Q
        << " share " << l.share << " cantilever " << c.cantilever << " held " << c.held << " restraint "
        << c.restraint.value_or(0) << " height " << z_g(c) << " cap " << c.cap;
    return out.str();
}

// As the engine reads it.

inline const spanledger::Catalogue& built_in(bool uk) {
    const auto load = [](const char* set) {
        spanledger::Diagnostics diagnostics;
        auto catalogue = spanledger::load_catalogue({}, set, ".", diagnostics);
        if (diagnostics.has_errors()) throw std::runtime_error("the built-in catalogue has errors");
        return catalogue;
    };
    static const spanledger::Catalogue recommended = load("recommended");
    static const spanledger::Catalogue british = load("uk");
    return uk ? british : recommended;
}

inline void set_parameter(spanledger::Catalogue& catalogue, const char* key, double value) {
    for (auto& parameter : catalogue.parameters) {
        if (parameter.key == key) parameter.value = value;
    }
}

struct EngineCase {
    spanledger::Inputs inputs;
    spanledger::Member member;

    [[nodiscard]] const spanledger::LoadClass& load() const { return inputs.brief.loads.front(); }
    [[nodiscard]] std::unique_ptr<spanledger::JoistRules> rules() const {
        return spanledger::make_rules(inputs, member, load());
    }
};

inline spanledger::RolledMember engine_member(const Case& c) {
    const Section& s = c.section;
    spanledger::RolledMember member;
    member.grade.name = "S";
    member.grade.f_y_16 = c.fy16;
    member.grade.f_y_40 = c.fy40;
    member.section.shape = s.channel ? spanledger::RolledShape::channel : spanledger::RolledShape::i_section;
    member.section.h = s.h;
    member.section.b = s.b;
    member.section.t_w = s.tw;
    member.section.t_f = s.tf;
    member.section.r = s.r;
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
    load.psi = {l.psi0, 0.5, 0.3};
    load.snow = l.snow;
    load.snow_psi = {l.snow_psi0, 0.2, 0.0};
    load.concentrated = l.Q;
    load.concentrated_share = l.share;
    load.concentrated_in_deflection = l.Q_in_deflection;
    return load;
}

inline std::optional<spanledger::DeflectionLimit> engine_limit(std::optional<double> ratio,
                                                               std::optional<double> length) {
    if (!ratio && !length) return std::nullopt;
    return spanledger::DeflectionLimit{ratio, length};
}

inline void fill_brief(const Case& c, spanledger::Brief& brief) {
    brief.loads.push_back(engine_load(c.loads));
    brief.basis.combination = c.a_and_b ? "6.10a/b" : "6.10";
    brief.basis.utilisation_cap = c.cap;
    brief.basis.self_weight = c.self_weight;
    brief.basis.shear_deflection = c.shear_deflection;
    brief.basis.lateral_curves =
        c.general ? spanledger::LateralCurves::general_case : spanledger::LateralCurves::rolled_sections;
    auto& support = brief.support;
    support.arrangement = c.cantilever ? spanledger::Arrangement::cantilever : spanledger::Arrangement::single_span;
    support.bearing = c.bearing;
    support.compression_edge = c.held ? spanledger::CompressionEdge::held : spanledger::CompressionEdge::free;
    support.restraint_spacing = c.restraint;
    support.load_position = static_cast<spanledger::LoadPosition>(c.height);
    support.load_height = c.load_height;
    support.web_at_support =
        c.stiffened ? spanledger::WebAtSupport::stiffened_or_cleated : spanledger::WebAtSupport::seated;
    auto& limits = brief.limits;
    limits.variable_deflection = engine_limit(c.ratio_Q, c.length_Q);
    limits.instantaneous_deflection = engine_limit(c.ratio_inst, c.length_inst);
    limits.camber = c.camber;
    if (c.f_min) limits.frequency = spanledger::FrequencyLimit{*c.f_min, c.mass_share};
    limits.unit_load_deflection = c.unit_limit;
}

inline EngineCase to_engine(const Case& c) {
    EngineCase engine;
    engine.inputs.catalogue = built_in(c.uk);
    set_parameter(engine.inputs.catalogue, "gamma_M0", c.gM0);
    set_parameter(engine.inputs.catalogue, "gamma_M1", c.gM1);
    set_parameter(engine.inputs.catalogue, "steel_eta", c.eta);
    set_parameter(engine.inputs.catalogue, "lateral_lambda_0", c.lambda0);
    set_parameter(engine.inputs.catalogue, "lateral_beta", c.beta);
    engine.member = engine_member(c);
    fill_brief(c, engine.inputs.brief);
    return engine;
}

} // namespace independent_rolled
