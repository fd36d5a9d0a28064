// SPDX-License-Identifier: MIT
#include "spanledger/writers/check_writers.hpp"

#include "spanledger/input/utf8.hpp"

#include <catch2/catch.hpp>

#include <sstream>

using namespace spanledger;

namespace {

LimitCheck limit(Limit which, double utilisation, LimitOutcome outcome) {
    LimitCheck check{.limit = which,
                     .reason = {},
                     .unit = "MPa",
                     .clause = "EN 1995-1-1 6.1.6",
                     .combination = "6.10, uniform",
                     .outcome = outcome};
    check.utilisation = utilisation;
    check.demand = 10.0 * utilisation;
    check.resistance = 10.0;

    return check;
}

CheckResult sample_check() {
    CheckResult check;
    check.member = "C24 47x220";
    check.load = "Dwelling \"quoted\"";
    check.spacing = 400.0;
    check.clear_span = 4200.0;
    check.effective_span = 4250.0;
    check.span_rule = "L = Lc + t";
    check.governing = Limit::unit_load_deflection;
    check.worst = Limit::bending;
    check.utilisation = 0.8121;
    check.permissible = 4450.7713;
    check.printed = 4450.0;
    check.permissible_load = 0.0028391;
    check.limits = {limit(Limit::bending, 0.8121, {LimitOutcome::Kind::spans, 5645.39}),
                    limit(Limit::shear, 0.3, {LimitOutcome::Kind::never_reached, 0.0}),
                    limit(Limit::bearing, 0.4, {LimitOutcome::Kind::fails_at_once, 0.0}),
                    limit(Limit::unit_load_deflection, 0.7905, {LimitOutcome::Kind::spans, 4450.7713})};
    check.limits[3].clause = "EN 1995-1-1 7.3.3(2), (7.3); UK NA.2.6, Table NA.5, and some more words of a long clause";
    LimitCheck held{
        .limit = Limit::lateral_buckling, .reason = {}, .unit = {}, .clause = {}, .combination = {}, .outcome = {}};
    held.status = LimitStatus::not_applicable;
    held.reason = "compression edge stated as held";
    check.limits.push_back(held);
    check.deflections = {{"final", "uniform", 10.151, 418.69}};
    check.first_frequency = 11.84;
    check.reactions = {{"G", 515.5}, {"design: 6.10, concentrated", 3696.0}};
    check.bearing_length_needed = 17.04;
    check.deeper = Neighbour{"C24 47x245", 400.0, true, 0.598, 4810.0};
    check.wider_spacing = Neighbour{"C24 47x220", 450.0, false, 1.0004, std::nullopt};
    check.notes = {"A note."};
    check.cautions = {std::string(250, 'x') + " a caution with a word that no line can hold"};
    return check;
}

std::vector<std::string> lines_of(const std::string& text) {
    std::vector<std::string> lines;
    std::istringstream in(text);
    for (std::string line; std::getline(in, line);) lines.push_back(line);
    return lines;
}

bool contains(const std::string& text, const std::string& words) {
    return text.find(words) != std::string::npos;
}

/// Whether the words stand in the text in this order.
bool in_order(const std::string& text, const std::vector<std::string>& words) {
    std::size_t from = 0;
    for (const std::string& one : words) {
        from = text.find(one, from);
        if (from == std::string::npos) return false;
        from += one.size();
    }
    return true;
}

} // namespace

TEST_CASE("A check as JSON has the promised fields first, in their order", "[writers][check]") {
    const std::string json = check_json(sample_check());
    CHECK(in_order(json, {"{\n \"member\":\"C24 47x220\"", "\"load\":\"Dwelling \\\"quoted\\\"\"", "\"spacing_mm\":400",
                          "\"clear_span_mm\":4200", "\"effective_span_mm\":4250", "\"verdict\":\"passes\"",
                          "\"governing\":\"unit-load deflection\"", "\"utilisation\":0.8121",
                          "\"permissible_clear_span_mm\":4450.7713", "\"printed_clear_span_mm\":4450",
                          "\"permissible_load_kN_m2\":2.8391", "\"limits\":["}));
    CHECK(in_order(json, {R"({"limit":"bending","status":"checked","reason":"","utilisation":0.8121,"demand":8.121,)"
                          R"("resistance":10,"unit":"MPa","clause":"EN 1995-1-1 6.1.6","combination":"6.10, uniform",)"
                          R"("permissible_clear_span_mm":5645.39})"}));
}

TEST_CASE("A limit never reached has no span in JSON, one exceeded at once has 0", "[writers][check]") {
    const std::string json = check_json(sample_check());
    CHECK(in_order(json, {"\"limit\":\"shear\"", "\"permissible_clear_span_mm\":null", "\"limit\":\"bearing\"",
                          "\"permissible_clear_span_mm\":0}"}));
}

TEST_CASE("A limit that is not checked has a reason and no numbers in JSON", "[writers][check]") {
    CHECK(
        contains(check_json(sample_check()),
                 R"({"limit":"lateral buckling","status":"not applicable","reason":"compression edge stated as held",)"
                 R"("utilisation":null,"demand":null,"resistance":null,)"));
}

TEST_CASE("A check as text begins with a verdict, and keeps to 100 columns", "[writers][check]") {
    const std::string text = check_text(sample_check());
    CHECK(lines_of(text).front() == "PASSES: C24 47x220, utilisation 0.813 (bending)");
    for (const std::string& line : lines_of(text)) {
        INFO(line);
        CHECK(count_characters(line) <= 100);
        CHECK((line.empty() || line.back() != ' '));
    }
}

TEST_CASE("A check as text lists utilisations worst first and gives what a reader needs", "[writers][check]") {
    const std::string text = check_text(sample_check());
    CHECK(in_order(text, {"Limits, worst first", "bending", "8.121", "10", "MPa", "0.813", "5.645", "EN 1995-1-1 6.1.6",
                          "unit-load deflection", "0.791", "bearing", "none", "shear", "never"}));
    for (const char* words :
         {"compression edge stated as held", "10.2 mm, L/418 (uniform)", "11.8 Hz", "0.52 kN", "1.29 kN/m", "9.24 kN/m",
          "18 mm", "4.450 m, governed by unit-load deflection", "up to 2.83 kN/m2",
          "C24 47x245 at 400 mm: passes, utilisation 0.598, clear span up to 4.81 m",
          "C24 47x220 at 450 mm: fails, utilisation 1.001", "A note.", "a caution with a word"}) {
        INFO(words);
        CHECK(contains(text, words));
    }
}

TEST_CASE("A utilisation just above one never looks like one", "[writers][check]") {
    CheckResult check = sample_check();
    check.verdict = Verdict::fails;
    check.utilisation = 1.0000001;
    CHECK(lines_of(check_text(check)).front() == "FAILS: C24 47x220, utilisation 1.001 (bending)");
}

TEST_CASE("What is not covered says so first, with the reason", "[writers][check]") {
    CheckResult check = sample_check();
    check.verdict = Verdict::not_covered;
    check.no_span_reason = "class 4 in bending";
    check.permissible.reset();
    CHECK(lines_of(check_text(check)).front() == "NOT COVERED: C24 47x220, class 4 in bending");
    CHECK(contains(check_json(check), "\"verdict\":\"not covered\""));
}
