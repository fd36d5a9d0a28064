// SPDX-License-Identifier: MIT
#include "program/outcome.hpp"

#include <catch2/catch.hpp>

namespace spanledger {
namespace {

using Catch::Matchers::Contains;

TEST_CASE("what is planned is refused as not covered yet, and no help lists it", "[program]") {
    const std::vector<std::pair<Arguments, std::string>> planned{
        {{"compare", "brief.toml", "--floors", "floors.csv"}, "command 'compare'"},
        {{"changes", "old.json", "new.json"}, "command 'changes'"},
        {{"check", "brief.toml", "--schedule", "schedule.csv"}, "option '--schedule' of check"},
        {{"check", "brief.toml", "--sheet=sheet.xlsx"}, "option '--sheet' of check"},
        {{"check", "--against", "issue.json", "brief.toml"}, "option '--against' of check"},
        {{"tables", "brief.toml", "--since", "old.json"}, "option '--since' of tables"},
    };
    const std::string help = run_inside({"--help"}).out + run_inside({"check", "--help"}).out +
                             run_inside({"tables", "--help"}).out + run_inside({"--print", "man"}).out;
    for (const auto& [arguments, named] : planned) {
        INFO(named);
        const Outcome outcome = run_inside(arguments);
        CHECK(outcome.status == 2);
        CHECK(outcome.out.empty());
        CHECK_THAT(outcome.err, Contains(named + " is not covered yet"));
    }
    for (const char* word : {"compare", "changes", "--schedule", "--sheet", "--against", "--since"}) {
        CHECK_THAT(help, !Contains(word));
    }
}

TEST_CASE("files that are several, or no text, are not written to standard output", "[program]") {
    const StartedFolder folder;
    for (const Arguments& arguments : {Arguments{"tables", folder.brief(), "--out", "-"}, {"start", "-"}}) {
        const Outcome outcome = run_inside(arguments);
        CHECK(outcome.status == 2);
        CHECK(outcome.out.empty());
        CHECK_THAT(outcome.err, Contains("standard output") && Contains("name a folder"));
    }
    CHECK_FALSE(std::filesystem::exists("-"));
}

} // namespace
} // namespace spanledger
