// SPDX-License-Identifier: MIT
#include "program/outcome.hpp"
#include "program/subprocess.hpp"

#include "spanledger/program/options.hpp"

#include <catch2/catch.hpp>

#include <set>
#include <stdexcept>

namespace spanledger {
namespace {

using Catch::Matchers::Contains;
using Catch::Matchers::StartsWith;

TEST_CASE("the statuses documented are the ones there are", "[program]") {
    std::set<int> documented;
    for (const ExitStatusRow& row : exit_statuses()) documented.insert(row.status);
    CHECK(documented == std::set<int>{0, 1, 2, 3, 4, 130});
}

TEST_CASE("status 0: all well", "[program]") {
    const StartedFolder folder;
    CHECK(folder.started().status == 0);
    CHECK(run_inside(folder.tables()).status == 0);
    CHECK(run_inside({"catalogue", "sources"}).status == 0);
    const Outcome passing = run_inside(folder.check("4.2 m"));
    CHECK(passing.status == 0);
    CHECK_THAT(passing.out, StartsWith("PASSES"));
}

TEST_CASE("status 1: a check fails", "[program]") {
    const StartedFolder folder;
    const Outcome failing = run_inside(folder.check("6 m"));
    CHECK(failing.status == 1);
    CHECK_THAT(failing.out, StartsWith("FAILS"));
    CHECK(run_inside(with(folder.check("6 m"), "--json")).status == 1);
}

TEST_CASE("status 2: bad input", "[program]") {
    const StartedFolder folder;
    const Outcome missing = run_inside({"tables", folder.path() + "/none.toml", "--out", folder.out()});
    CHECK(missing.status == 2);
    CHECK(missing.out.empty());
    CHECK_THAT(missing.err, Contains("none.toml"));
    std::ofstream(folder.brief(), std::ios::app) << "\n[serach]\n";
    const Outcome wrong = run_inside(folder.tables());
    CHECK(wrong.status == 2);
    CHECK(wrong.out.empty());
    CHECK_THAT(wrong.err, Contains("serach") && Contains("search"));
    CHECK_FALSE(std::filesystem::exists(folder.out()));
}

TEST_CASE("status 3: could not write", "[program]") {
    const StartedFolder folder;
    const Outcome outcome = run_inside({"tables", folder.brief(), "--out", folder.brief() + "/below"});
    CHECK(outcome.status == 3);
    CHECK(outcome.out.empty());
    CHECK_THAT(outcome.err, Contains(folder.brief() + "/below"));
    const Outcome start = run_inside({"start", folder.brief() + "/below"});
    CHECK(start.status == 3);
    CHECK_THAT(start.err, Contains(folder.brief() + "/below"));
}

TEST_CASE("status 3: standard output is full", "[program]") {
    for (const Arguments& arguments : {Arguments{"catalogue"}, {"--help"}, {"--version"}, {"--print", "man"}}) {
        INFO(arguments.front());
        const Outcome outcome = run_apart({.arguments = arguments, .out = "/dev/full"});
        CHECK(outcome.status == 3);
        CHECK_THAT(outcome.err, Contains("could not write"));
    }
}

TEST_CASE("status 4: a fault inside is told and is no crash", "[program]") {
    const StartedFolder folder;
    const Outcome outcome =
        run_inside(folder.tables(), []() -> bool { throw std::runtime_error("planted by the test"); });
    CHECK(outcome.status == 4);
    CHECK_THAT(outcome.err, Contains("internal fault") && Contains("planted by the test"));
    CHECK(files_below(folder.out()).empty());
}

TEST_CASE("status 130: interrupted in the sweep", "[program]") {
    const StartedFolder folder;
    const Outcome outcome = run_inside(folder.tables(), [] { return true; });
    CHECK(outcome.status == 130);
    CHECK(outcome.out.empty());
    CHECK(files_below(folder.out()).empty());
}

} // namespace
} // namespace spanledger
