// SPDX-License-Identifier: MIT
#include "engine/rolled_cases.hpp"

#include "spanledger/engine/cell_solver.hpp"
#include "spanledger/engine/rolled_rules.hpp"

#include <catch2/catch.hpp>

#include <set>

using namespace spanledger;
namespace plain = independent_rolled;

// What is not checked, and why.

namespace {

/// IPE 200 in S275 under an office load, as the engine reads it.
plain::EngineCase ipe_200() {
    plain::Case c;
    c.section = {false, 200.0, 100.0, 5.6, 8.5, 12.0};
    c.loads.g = 0.001;
    c.loads.q = 0.0025;
    return plain::to_engine(c);
}

RolledMember& section_of(plain::EngineCase& engine) {
    return std::get<RolledMember>(engine.member);
}

LimitPlan plan_of(const plain::EngineCase& engine, Limit limit) {
    return engine.rules()->plan(limit);
}

Cell cell_of(const plain::EngineCase& engine) {
    return CellSolver(engine.inputs, engine.member, engine.load(), {600.0, 600.0}).permissible_span(600.0);
}

bool contains(const std::string& text, const std::string& part) {
    return text.find(part) != std::string::npos;
}

} // namespace

TEST_CASE("the list of a rolled joist's numbers names every one of them once") {
    RolledInputs<double> x{};
    std::set<const double*> fields;
    std::set<std::string> symbols;
    std::size_t count = 0;
    rolled_fields(x, [&](const double& field, const char* symbol, const char* unit, const char* meaning) {
        ++count;
        fields.insert(&field);
        symbols.insert(symbol);
        CHECK((*unit != '\0' && *meaning != '\0'));
    });
    CHECK(count * sizeof(double) == sizeof x);
    CHECK(fields.size() == count);
    CHECK(symbols.size() == count);
}

TEST_CASE("a class 4 section is refused in every limit, and its cell says so") {
    auto engine = ipe_200();
    section_of(engine).section.t_f = 3.0; // c/t_f = 11.7 above 14 eps = 11.4 in S355
    section_of(engine).grade.f_y_16 = 355.0;
    for (const LimitDefinition& definition : limit_definitions) {
        CHECK(plan_of(engine, definition.limit).status == LimitStatus::not_covered);
    }
    const Cell cell = cell_of(engine);
    CHECK_FALSE(cell.value.has_value());
    CHECK(cell.reason.find("class 4: the flange") == 0);
    section_of(engine).section.t_f = 8.5;
    section_of(engine).section.t_w = 1.5; // c/t_w = 106 above 124 eps = 100.9
    CHECK(cell_of(engine).reason.find("class 4: the web") == 0);
}

TEST_CASE("the yield strength is that of the thickest part") {
    auto engine = ipe_200();
    RolledMember member = section_of(engine);
    member.section.t_f = 16.0;
    CHECK(rolled_inputs(engine.inputs, member, engine.load()).f_y == 275.0);
    member.section.t_f = 16.1;
    CHECK(rolled_inputs(engine.inputs, member, engine.load()).f_y == 265.0);
    member.section.t_f = 8.5;
    member.section.t_w = 16.1;
    CHECK(rolled_inputs(engine.inputs, member, engine.load()).f_y == 265.0);
}

TEST_CASE("parts thicker than the grade's strengths reach are refused") {
    auto engine = ipe_200();
    section_of(engine).section.t_f = 40.5;
    CHECK(contains(cell_of(engine).reason, "no yield strength for parts 40.5 mm thick"));
    section_of(engine).section.t_f = 20.0;
    section_of(engine).grade.f_y_40.reset();
    CHECK(contains(cell_of(engine).reason, "no yield strength for parts 20 mm thick"));
}

TEST_CASE("free channels and free cantilevers are refused, held ones are not") {
    auto engine = ipe_200();
    CHECK(plan_of(engine, Limit::lateral_buckling).status == LimitStatus::checked);
    section_of(engine).section.shape = RolledShape::channel;
    CHECK(plan_of(engine, Limit::lateral_buckling).status == LimitStatus::not_covered);
    CHECK(contains(cell_of(engine).reason, "channel whose compression flange is free"));
    engine.inputs.brief.support.restraint_spacing = 500.0; // still free between restraints
    CHECK(plan_of(engine, Limit::lateral_buckling).status == LimitStatus::not_covered);
    engine.inputs.brief.support.compression_edge = CompressionEdge::held;
    CHECK(plan_of(engine, Limit::lateral_buckling).status == LimitStatus::not_applicable);
    CHECK(cell_of(engine).value.has_value());
    CHECK(contains(engine.rules()->notes().front(), "twist"));

    engine = ipe_200();
    engine.inputs.brief.support.arrangement = Arrangement::cantilever;
    CHECK(contains(cell_of(engine).reason, "cantilever"));
    engine.inputs.brief.support.compression_edge = CompressionEdge::held;
    CHECK(cell_of(engine).value.has_value());
    CHECK(contains(plan_of(engine, Limit::lateral_buckling).reason, "bottom flange"));
    CHECK(plan_of(engine, Limit::bearing).status == LimitStatus::not_applicable);
    CHECK(plan_of(engine, Limit::frequency).status == LimitStatus::not_applicable);
}

TEST_CASE("a stiffened or cleated web is not checked at its supports") {
    auto engine = ipe_200();
    CHECK(plan_of(engine, Limit::bearing).status == LimitStatus::checked);
    engine.inputs.brief.support.web_at_support = WebAtSupport::stiffened_or_cleated;
    CHECK(plan_of(engine, Limit::bearing).status == LimitStatus::not_applicable);
    CHECK(contains(plan_of(engine, Limit::bearing).reason, "stiffened or cleated"));
}

TEST_CASE("the deflection limits of a brief without any are L/360 and L/250, and either one alone where it is stated") {
    auto engine = ipe_200();
    CHECK(plan_of(engine, Limit::variable_deflection).parts == std::vector<std::string>{"uniform, L/360"});
    CHECK(plan_of(engine, Limit::instantaneous_deflection).parts == std::vector<std::string>{"uniform, L/250"});
    engine.inputs.brief.limits.instantaneous_deflection = DeflectionLimit{.ratio = 200.0, .max_mm = 20.0};
    CHECK(plan_of(engine, Limit::variable_deflection).status == LimitStatus::not_applicable);
    CHECK(plan_of(engine, Limit::instantaneous_deflection).parts ==
          std::vector<std::string>{"uniform, L/200", "uniform, 20 mm"});
    CHECK(contains(plan_of(engine, Limit::final_deflection).reason, "creep"));
}

TEST_CASE("rules for timber floors do not apply to steel, and say so") {
    auto engine = ipe_200();
    CHECK(plan_of(engine, Limit::frequency).reason == "not asked for in the brief");
    engine.inputs.brief.limits.vibration = VibrationLimit{
        .rule = VibrationRuleSet::uk, .floor_width = 4000.0, .a_mm = {}, .b = {}, .damping = {}, .kamp = {}};
    for (const Limit limit : {Limit::frequency, Limit::unit_load_deflection, Limit::velocity_response}) {
        CHECK(plan_of(engine, limit).status == LimitStatus::not_applicable);
        CHECK(contains(plan_of(engine, limit).reason, "timber"));
    }
}

TEST_CASE("a frequency needs mass in every case that is checked") {
    auto engine = ipe_200();
    engine.inputs.brief.limits.frequency = FrequencyLimit{8.0, 0.0};
    CHECK(plan_of(engine, Limit::frequency).status == LimitStatus::checked);
    engine.inputs.brief.basis.self_weight = false;
    engine.inputs.brief.loads.front().permanent = 0.0;
    CHECK(plan_of(engine, Limit::frequency).status == LimitStatus::not_covered);
    engine.inputs.brief.limits.frequency->variable_share = 0.1;
    CHECK(plan_of(engine, Limit::frequency).status == LimitStatus::checked);
}

TEST_CASE("camber takes from the instantaneous deflection only, and leaves no less than nothing") {
    auto engine = ipe_200();
    const auto deflections = [&] {
        const auto rules = engine.rules();
        return rules->at({.spacing = 600.0, .variable = 0.0025})->facts(5000.0, 1.0).deflections;
    };
    const auto before = deflections();
    engine.inputs.brief.limits.camber = 3.0;
    const auto after = deflections();
    CHECK(after[0].mm == before[0].mm);
    CHECK(after[1].mm == Approx(before[1].mm - 3.0));
    engine.inputs.brief.limits.camber = 400.0;
    CHECK(deflections()[1].mm == 0.0);
}

TEST_CASE("the bearing length needed is the one at which the web just resists the reaction") {
    auto engine = ipe_200();
    engine.inputs.brief.loads.front().variable = 0.03;
    const auto joist_on = [&](double bearing) {
        engine.inputs.brief.support.bearing = bearing;
        return engine.rules();
    };
    const auto rules = joist_on(50.0);
    const auto needed = rules->at({.spacing = 1500.0, .variable = 0.03})->facts(3500.0, 1.0).bearing_length_needed;
    REQUIRE(needed.has_value());
    CHECK(*needed > 10.0);
    const auto utilisation_on = [&](double bearing) {
        const auto r = joist_on(bearing);
        return worst_check(*r, *r->at({.spacing = 1500.0, .variable = 0.03}), Limit::bearing, 3500.0).utilisation;
    };
    CHECK(utilisation_on(*needed) <= 1.0);
    CHECK(utilisation_on(*needed - 0.001) > 1.0);
}
