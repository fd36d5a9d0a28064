// SPDX-License-Identifier: MIT
#include "spanledger/writers/issue_record.hpp"

#include "spanledger/input/brief_schema.hpp"

#include "writers/sample_issue.hpp"

#include <catch2/catch.hpp>
#include <fmt/format.h>

using namespace spanledger;

TEST_CASE("The record's brief has every key of the schema", "[writers][record]") {
    Brief brief = sample::brief();
    brief.limits.frequency = FrequencyLimit{};
    JsonText json(1);
    write_brief(json, brief);
    for (const SectionDefinition& section : brief_schema()) {
        for (const KeyDefinition& key : section.keys) {
            INFO(section.name << "." << key.name);
            CHECK(json.text().find(fmt::format("\"{}\":", key.name)) != std::string::npos);
        }
        if (!section.inlined) CHECK(json.text().find(fmt::format("\n \"{}\":", section.name)) != std::string::npos);
    }
}

TEST_CASE("Choices stand in the brief's own words", "[writers][record]") {
    Brief brief = sample::brief();
    brief.support.arrangement = Arrangement::cantilever;
    brief.support.root_fixed = true;
    brief.support.compression_edge = CompressionEdge::held;
    brief.support.web_at_support = WebAtSupport::stiffened_or_cleated;
    brief.basis.lateral_curves = LateralCurves::general_case;
    brief.search.rounding = Rounding::nearest;
    brief.loads.front().duration = Duration::long_term;
    brief.tables.front().kind = TableKind::smallest_section;
    JsonText json(1);
    write_brief(json, brief);
    for (const char* words :
         {R"("arrangement":"cantilever")", R"("root":"fixed")", R"("compression_edge":"held")",
          R"("web_at_support":"stiffened or cleated")", R"("lateral_curves":"general case")", R"("rounding":"nearest")",
          R"("duration":"long")", R"("kind":"smallest section")", R"("rule":"uk")"}) {
        CHECK(json.text().find(words) != std::string::npos);
    }
}

TEST_CASE("The fingerprint changes with any number or word, and with nothing else", "[writers][record]") {
    const std::string first = issue_record(sample::issue()).fingerprint;
    CHECK(issue_record(sample::issue()).fingerprint == first);
    Issue filled = sample::issue();
    fill_fingerprint(filled);
    CHECK(filled.fingerprint == first);
    CHECK(issue_record(filled).fingerprint == first);
    Issue number = sample::issue();
    number.tables.back().cells.front().utilisation += 1e-15;
    CHECK(issue_record(number).fingerprint != first);
    Issue word = sample::issue();
    word.cautions.back() += ".";
    CHECK(issue_record(word).fingerprint != first);
}
