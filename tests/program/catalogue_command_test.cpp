// SPDX-License-Identifier: MIT
#include "program/outcome.hpp"

#include "spanledger/limits.hpp"
#include "spanledger/program/options.hpp"

#include <catch2/catch.hpp>

namespace spanledger {
namespace {

using Catch::Matchers::Contains;
using Catch::Matchers::Matches;

std::string catalogue_text(Arguments arguments) {
    arguments.insert(arguments.begin(), "catalogue");
    const Outcome outcome = run_inside(arguments);
    CHECK(outcome.status == 0);
    CHECK(outcome.err.empty());
    return outcome.out;
}

std::size_t lines_with(const std::string& text, const std::string& words) {
    std::istringstream lines(text);
    std::size_t count = 0;
    for (std::string line; std::getline(lines, line);) count += line.find(words) != std::string::npos ? 1 : 0;
    return count;
}

TEST_CASE("every topic of the option table is listed", "[program]") {
    std::string all;
    for (const std::string_view topic : catalogue_words()) {
        const std::string text = catalogue_text({std::string(topic)});
        CHECK(std::count(text.begin(), text.end(), '\n') > 3);
        all += (all.empty() ? "" : "\n") + text;
    }
    CHECK(catalogue_text({}) == all);
}

TEST_CASE("a class is shown with units, source and mark", "[program]") {
    const std::string text = catalogue_text({"classes", "C24"});
    CHECK_THAT(text, Contains("f_m_k_MPa") && Contains("rho_k_kg_m3") && Contains("source") && Contains("seen"));
    CHECK(lines_with(text, "C24 ") == 1);
    CHECK_THAT(text, Matches("[^]*\nC24 +solid timber +24 +4 +2.5 +11000 +7400 +690 +350 +420 [^]*"));
    CHECK_THAT(catalogue_text({"classes", "S275"}), Contains("275") && Contains("steel grades"));
}

TEST_CASE("spaces and case in the name of a section do not matter", "[program]") {
    const std::string text = catalogue_text({"sections", "IPE 200"});
    CHECK(lines_with(text, "IPE 200 ") == 1);
    CHECK(catalogue_text({"sections", "ipe200"}) == text);
    CHECK_THAT(catalogue_text({"sections", "47X220"}), Contains("UK 47"));
}

TEST_CASE("columns are aligned", "[program]") {
    std::istringstream lines(catalogue_text({"sources"}));
    std::string line;
    std::getline(lines, line);
    std::getline(lines, line);
    std::getline(lines, line);
    const std::size_t edition = line.find("edition");
    std::size_t rows = 0;
    for (; std::getline(lines, line); ++rows) {
        REQUIRE(line.size() > edition);
        CHECK(line[edition - 1] == ' ');
        CHECK(line[edition] != ' ');
    }
    CHECK(rows > 10);
}

TEST_CASE("every limit is listed with its letter, and one limit with its formulas", "[program]") {
    const std::string text = catalogue_text({"limits"});
    for (const LimitDefinition& limit : limit_definitions) {
        CHECK_THAT(text, Contains("\n" + std::string(limit.name) + " ") && Contains(std::string(limit.about)));
    }
    CHECK_THAT(text, !Contains("formulas"));
    CHECK_THAT(catalogue_text({"limits", "bending"}), Contains("formulas") && Contains("q_d*L^2/8"));
}

TEST_CASE("with a brief its parameters hold, and the practice's own rows are marked", "[program]") {
    const StartedFolder folder;
    std::string brief = file_text(folder.brief());
    brief.insert(brief.find("[support]"), "[catalogue]\nclasses = [\"own.csv\"]\n\n");
    std::ofstream(folder.brief()) << brief;
    std::ofstream(folder.project() + "/own.csv")
        << "class,standard,timber,f_m_k_MPa,f_v_k_MPa,f_c_90_k_MPa,E_0_mean_MPa,E_0_05_MPa,G_mean_MPa,rho_k_kg_m3,"
           "rho_mean_kg_m3,source\nOwnC,own tests,solid softwood,20,3.5,2.4,9500,6400,590,330,400,report 12\n";
    const std::string own = catalogue_text({"classes", "OwnC", "--brief", folder.brief()});
    CHECK_THAT(own, Contains("report 12") && Contains("practice's own") && Contains("own.csv:2"));
    CHECK_THAT(catalogue_text({"classes", "C24", "--brief", folder.brief()}), !Contains("practice's own"));
    // xi is 0.85 as recommended, 0.925 in the United Kingdom.
    CHECK_THAT(catalogue_text({"parameters", "xi"}), Contains(" 0.85 ") && !Contains("0.925"));
    CHECK_THAT(catalogue_text({"parameters", "xi", "--brief", folder.brief()}),
               Contains(" 0.925 ") && Contains(" uk "));
}

} // namespace
} // namespace spanledger
