// SPDX-License-Identifier: MIT
#include "spanledger/catalogue.hpp"
#include "spanledger/engine/basis_statement.hpp"
#include "spanledger/engine/cold_formed_rules.hpp"

#include <catch2/catch.hpp>

#include <algorithm>
#include <string>
#include <vector>

// Which channels are covered, which limits they have, and what is said of the others.

using namespace spanledger;

namespace {

Inputs plain_inputs() {
    Inputs inputs;
    Diagnostics diagnostics;
    inputs.catalogue = load_catalogue({}, "recommended", ".", diagnostics);
    REQUIRE_FALSE(diagnostics.has_errors());
    inputs.brief.support.compression_edge = CompressionEdge::held;
    return inputs;
}

LoadClass floor_load() {
    LoadClass load;
    load.name = "floor";
    load.category = "A";
    load.permanent = 0.0005;
    load.variable = 0.0015;
    return load;
}

ColdFormedMember channel(const LippedChannelSize& size, double f_yb = 350.0) {
    ColdFormedMember member;
    member.grade.f_yb = f_yb;
    member.size = size;
    return member;
}

std::unique_ptr<JoistRules> rules_of(const Inputs& inputs, const ColdFormedMember& member,
                                     const LoadClass& load = floor_load()) {
    return make_cold_formed_rules(inputs, member, load, UniformAction::as_given);
}

/// The one reason for which nothing of the member is covered; empty where it is covered.
std::string refusal(const Inputs& inputs, const ColdFormedMember& member) {
    const auto rules = rules_of(inputs, member);
    const std::string reason =
        rules->plan(Limit::bending).status == LimitStatus::not_covered ? rules->plan(Limit::bending).reason : "";
    for (const LimitPlan& plan : rules->plans()) {
        CHECK((plan.status == LimitStatus::not_covered) == !reason.empty());
    }
    return reason;
}

const LippedChannelSize usual{.h = 200, .b_1 = 65, .b_2 = 65, .c = 20, .t_nom = 2, .r = 2.5};

} // namespace

TEST_CASE("a channel on two supports with a held flange is covered", "[cold-formed]") {
    const Inputs inputs = plain_inputs();
    CHECK(refusal(inputs, channel(usual)).empty());
    const auto rules = rules_of(inputs, channel(usual));
    CHECK(rules->plan(Limit::lateral_buckling).status == LimitStatus::not_applicable);
    CHECK(rules->plan(Limit::final_deflection).status == LimitStatus::not_applicable);
    CHECK(rules->plan(Limit::velocity_response).status == LimitStatus::not_applicable);
    CHECK(rules->plan(Limit::bearing).status == LimitStatus::checked);
    CHECK(rules->plan(Limit::bending_with_shear).status == LimitStatus::checked);
    for (const LimitPlan& plan : rules->plans()) {
        if (plan.status != LimitStatus::checked) CHECK_FALSE(plan.reason.empty());
    }
}

TEST_CASE("channels outside the arrangement are refused", "[cold-formed]") {
    Inputs cantilever = plain_inputs();
    cantilever.brief.support.arrangement = Arrangement::cantilever;
    CHECK_THAT(refusal(cantilever, channel(usual)), Catch::Contains("cantilever"));
    Inputs free = plain_inputs();
    free.brief.support.compression_edge = CompressionEdge::free;
    CHECK_THAT(refusal(free, channel(usual)), Catch::Contains("compression flange"));
    free.brief.support.restraint_spacing = 600.0;
    CHECK_THAT(refusal(free, channel(usual)), Catch::Contains("compression flange"));
    const auto rules = rules_of(free, channel(usual));
    const JoistFacts facts = rules->at({.spacing = 600, .variable = 0.0015})->facts(4000, 1.0);
    CHECK(facts.deflections.empty());
    CHECK(facts.reactions.empty());
}

TEST_CASE("sizes outside the range of the standard are refused, those at its edge are not", "[cold-formed]") {
    struct Edge {
        std::string symbol;
        LippedChannelSize inside, outside;
    };
    // Core thickness 1.96 mm of 2 mm: b/t 60 is 117.6 mm, c/t 50 is 98 mm.
    const std::vector<Edge> edges{
        {"b_1/t", {200, 117.5, 100, 30, 2, 2.5}, {200, 117.7, 100, 30, 2, 2.5}},
        {"b_2/t", {200, 100, 117.5, 30, 2, 2.5}, {200, 100, 117.7, 30, 2, 2.5}},
        {"c/b_1", {200, 65, 65, 13, 2, 2.5}, {200, 65, 64, 12.9, 2, 2.5}},
        {"c/b_1", {200, 65, 65, 39, 2, 2.5}, {200, 65, 66, 39.1, 2, 2.5}},
        {"c/b_2", {200, 65, 100, 20, 2, 2.5}, {200, 65, 100.1, 20, 2, 2.5}},
        {"core thickness", {100, 25, 25, 8, 0.49, 1}, {100, 25, 25, 8, 0.48, 1}},
    };
    const Inputs inputs = plain_inputs();
    Inputs cleated = plain_inputs();
    cleated.brief.support.web_at_support = WebAtSupport::stiffened_or_cleated;
    for (const Edge& edge : edges) {
        INFO(edge.symbol);
        CHECK(refusal(cleated, channel(edge.inside)).empty());
        CHECK_THAT(refusal(cleated, channel(edge.outside)), Catch::StartsWith(edge.symbol));
    }
    CHECK_THAT(refusal(cleated, channel({1000, 115, 115, 40, 2.03, 2.5})), Catch::StartsWith("h/t"));
    CHECK_THAT(refusal(cleated, channel({400, 115, 115, 40, 2, 30}, 550)), Catch::StartsWith("r = 30"));
}

TEST_CASE("a web that is not stiffened has closer limits", "[cold-formed]") {
    const Inputs seated = plain_inputs();
    Inputs cleated = plain_inputs();
    cleated.brief.support.web_at_support = WebAtSupport::stiffened_or_cleated;
    // Core thickness 1.96 mm: h_w/t 200 is h = 394 mm; r/t 6 is 11.76 mm.
    const LippedChannelSize deep{.h = 394.1, .b_1 = 100, .b_2 = 100, .c = 30, .t_nom = 2, .r = 2.5};
    const LippedChannelSize round{.h = 200, .b_1 = 100, .b_2 = 100, .c = 30, .t_nom = 2, .r = 11.8};
    CHECK_THAT(refusal(seated, channel(deep)), Catch::StartsWith("h_w/t") && Catch::Contains("stiffened or cleated"));
    CHECK_THAT(refusal(seated, channel(round)), Catch::StartsWith("r/t"));
    for (const auto& size : {deep, round}) {
        CHECK(refusal(cleated, channel(size)).empty());
        const auto rules = rules_of(cleated, channel(size));
        CHECK(rules->plan(Limit::bearing).status == LimitStatus::not_applicable);
        CHECK_FALSE(rules->at({.spacing = 600, .variable = 0.0015})->facts(4000, 1.0).bearing_length_needed);
    }
    LippedChannelSize edge = deep;
    edge.h = 393.9;
    CHECK(refusal(seated, channel(edge)).empty());
}

TEST_CASE("deflection limits of steel hold where the brief states neither", "[cold-formed]") {
    Inputs inputs = plain_inputs();
    const auto parts = [&](Limit limit) { return rules_of(inputs, channel(usual))->plan(limit).parts; };
    CHECK(parts(Limit::variable_deflection) == std::vector<std::string>{"uniform, L/360"});
    CHECK(parts(Limit::instantaneous_deflection) == std::vector<std::string>{"uniform, L/250"});
    inputs.brief.limits.final_deflection = DeflectionLimit{.ratio = 200.0, .max_mm = std::nullopt};
    CHECK(parts(Limit::variable_deflection) == std::vector<std::string>{"uniform, L/360"});
    inputs.brief.limits.instantaneous_deflection = DeflectionLimit{.ratio = 300.0, .max_mm = 14.0};
    CHECK(parts(Limit::variable_deflection).empty());
    CHECK(parts(Limit::instantaneous_deflection) == std::vector<std::string>{"uniform, L/300", "uniform, 14 mm"});
}

TEST_CASE("frequency takes the uniform alternatives only, and needs mass", "[cold-formed]") {
    Inputs inputs = plain_inputs();
    CHECK(rules_of(inputs, channel(usual))->plan(Limit::frequency).status == LimitStatus::not_applicable);
    inputs.brief.limits.frequency = FrequencyLimit{.min_hz = 8.0, .variable_share = 0.1};
    LoadClass load = floor_load();
    load.concentrated = 2000.0;
    load.concentrated_in_deflection = true;
    const auto rules = rules_of(inputs, channel(usual), load);
    CHECK(rules->plan(Limit::frequency).parts == std::vector<std::string>{"permanent mass and 0.1 of uniform"});
    CHECK(rules->plan(Limit::variable_deflection).parts.size() == 2);
    inputs.brief.basis.self_weight = false;
    load.permanent = 0.0;
    CHECK(rules_of(inputs, channel(usual), load)->plan(Limit::frequency).status == LimitStatus::checked);
    inputs.brief.limits.frequency->variable_share = 0.0;
    CHECK(rules_of(inputs, channel(usual), load)->plan(Limit::frequency).status == LimitStatus::not_covered);
}

TEST_CASE("the bearing length needed is where the reaction meets its resistance", "[cold-formed]") {
    Inputs inputs = plain_inputs();
    LoadClass load = floor_load();
    load.concentrated = 4500.0;
    const double L = 5000.0;
    const Variation variation{.spacing = 600, .variable = load.variable};
    const auto needed = rules_of(inputs, channel(usual), load)->at(variation)->facts(L, 1.0).bearing_length_needed;
    REQUIRE(needed);
    REQUIRE(*needed > 1.0);
    inputs.brief.support.bearing = *needed;
    const auto rules = rules_of(inputs, channel(usual), load);
    std::vector<Check<double>> checks(rules->plan(Limit::bearing).parts.size());
    rules->at(variation)->checks(Limit::bearing, L, checks.data());
    double worst = 0.0;
    for (const Check<double>& check : checks) worst = std::max(worst, utilisation(check));
    CHECK(worst == Approx(1.0).epsilon(1e-12));
}

TEST_CASE("the basis tells of channels where the brief has some, and of their sources", "[cold-formed]") {
    const auto brief = [](const std::string& members) {
        return "[practice]\nname = \"p\"\nnumber = \"n\"\nrevision = \"A\"\ntitle = \"t\"\n[support]\ncompression_edge "
               "= "
               "\"held\"\n[[load]]\nname = \"floor\"\ncategory = \"A\"\npermanent_kN_m2 = 0.5\nvariable_kN_m2 = 1.5\n"
               "[[members]]\nname = \"joists\"\n" +
               members +
               "\n[[table]]\nname = \"spans\"\nkind = \"permissible span\"\nmembers = [\"joists\"]\nspacings_mm = "
               "[400]\nloads = [\"floor\"]\n";
    };
    const auto count = [&](const std::string& members) {
        Diagnostics diagnostics;
        const auto inputs = read_inputs_from_text("brief.toml", brief(members), diagnostics);
        REQUIRE(inputs.has_value());
        const auto lines = basis_lines(*inputs);
        return std::count_if(lines.begin(), lines.end(),
                             [](const BasisLine& line) { return line.heading == "Cold-formed channels"; });
    };
    CHECK(count("class = \"C24\"\nsizes = [\"47x220\"]") == 0);
    CHECK(count("class = \"S350GD\"\nseries = \"C 200\"") > 10);

    Diagnostics diagnostics;
    const auto inputs =
        read_inputs_from_text("brief.toml", brief("class = \"S350GD\"\nseries = \"C 200\""), diagnostics);
    const auto sources = source_lines(*inputs);
    const auto has = [&](const std::string& kind, const std::string& item) {
        return std::any_of(sources.begin(), sources.end(), [&](const SourceLine& line) {
            return line.kind == kind && line.item == item && !line.source.empty() && !line.seen;
        });
    };
    CHECK(has("steel grade", "S350GD"));
    CHECK(has("section", "C 200x65x20x2 r2.5"));
}
