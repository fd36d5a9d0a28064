// SPDX-License-Identifier: MIT
#include "program/outcome.hpp"

#include <catch2/catch.hpp>

namespace spanledger {
namespace {

using Catch::Matchers::Contains;

const std::vector<std::string> issued_names{"EX-101-A.csv", "EX-101-A.json", "EX-101-A.xlsx"};

std::vector<std::string> names_of(const std::map<std::string, std::string>& files) {
    std::vector<std::string> names;
    for (const auto& [name, text] : files) names.push_back(name);
    return names;
}

TEST_CASE("start writes its four files and names them", "[program]") {
    const StartedFolder folder;
    const auto files = files_below(folder.project());
    CHECK(names_of(files) == std::vector<std::string>{"brief.toml", "floors.csv", "rates.csv", "schedule.csv"});
    for (const auto& [name, text] : files) {
        CHECK(text.size() > 100);
        CHECK_THAT(folder.started().out, Contains(folder.project() + "/" + name + "\n"));
    }
}

TEST_CASE("start refuses a folder that holds one of its files", "[program]") {
    for (const char* name : {"brief.toml", "schedule.csv", "floors.csv", "rates.csv"}) {
        const TemporaryFolder folder;
        folder.write(name, "mine\n");
        const Outcome outcome = run_inside({"start", folder.path()});
        CHECK(outcome.status == 2);
        CHECK(outcome.out.empty());
        CHECK_THAT(outcome.err, Contains(name));
        CHECK(files_below(folder.path()) == std::map<std::string, std::string>{{name, "mine\n"}});
    }
}

TEST_CASE("start fills a folder that holds other files", "[program]") {
    const TemporaryFolder folder;
    folder.write("notes.txt", "mine\n");
    CHECK(run_inside({"start", folder.path()}).status == 0);
    CHECK(files_below(folder.path()).size() == 5);
    CHECK(file_text(folder.path() + "/notes.txt") == "mine\n");
}

TEST_CASE("start --catalogue writes the data files too", "[program]") {
    const TemporaryFolder folder;
    const Outcome outcome = run_inside({"start", folder.path() + "/new", "--catalogue"});
    CHECK(outcome.status == 0);
    CHECK_THAT(outcome.out, Contains("timber-classes.csv\n") && Contains("sources.csv\n") && Contains("brief.toml\n"));
    std::istringstream lines(outcome.out);
    for (std::string line; std::getline(lines, line);) CHECK(std::filesystem::file_size(line) > 0);
}

TEST_CASE("tables makes a missing folder and issues workbook, CSV and record", "[program]") {
    const StartedFolder folder;
    const std::string deep = folder.out() + "/a/b";
    const Outcome outcome = run_inside({"tables", folder.brief(), "--out", deep});
    CHECK(outcome.status == 0);
    CHECK(names_of(files_below(deep)) == issued_names);
    for (const std::string& name : issued_names) CHECK_THAT(outcome.out, Contains(deep + "/" + name + "\n"));
}

TEST_CASE("an issued revision is not overwritten", "[program]") {
    const StartedFolder folder;
    REQUIRE(run_inside(folder.tables()).status == 0);
    const auto issued = files_below(folder.out());
    REQUIRE(names_of(issued) == issued_names);
    // Marked, so that a rewrite with the same bytes would show.
    for (const std::string& name : issued_names) std::ofstream(folder.out() + "/" + name) << "issued " << name;
    const auto marked = files_below(folder.out());
    SECTION("where all three files are there") {}
    SECTION("where only the record is left") {
        std::filesystem::remove(folder.out() + "/EX-101-A.xlsx");
        std::filesystem::remove(folder.out() + "/EX-101-A.csv");
    }
    const auto before = files_below(folder.out());
    const Outcome again = run_inside(folder.tables());
    CHECK(again.status == 3);
    CHECK(again.out.empty());
    CHECK_THAT(again.err, Contains("EX-101-A.json") && Contains("--replace"));
    CHECK(files_below(folder.out()) == before);
    CHECK(run_inside(folder.replacing_tables()).status == 0);
    CHECK(files_below(folder.out()) == issued);
}

TEST_CASE("a folder that cannot be is found before the work starts", "[program]") {
    const StartedFolder folder;
    const std::string impossible = folder.brief() + "/below";
    int asked = 0;
    const auto counting = [&asked] {
        ++asked;
        return false;
    };
    const Outcome outcome = run_inside({"tables", folder.brief(), "--out", impossible}, counting);
    CHECK(outcome.status == 3);
    CHECK_THAT(outcome.err, Contains(impossible));
    CHECK(asked == 0);
    // The same count rises where the work is done, so that a zero means something.
    CHECK(run_inside(folder.tables(), counting).status == 0);
    CHECK(asked > 0);
}

TEST_CASE("the name of a folder may be any name", "[program]") {
    const StartedFolder folder;
    const std::string odd = folder.out() + "/a b 'c' \xC3\xBC";
    CHECK(run_inside({"tables", folder.brief(), "--out=" + odd}).status == 0);
    CHECK(names_of(files_below(odd)) == issued_names);
}

} // namespace
} // namespace spanledger
