// SPDX-License-Identifier: MIT
#include "program/subprocess.hpp"

#include <catch2/catch.hpp>

namespace spanledger {
namespace {

using Catch::Matchers::Contains;

/// Whether it is one JSON text in the strict sense: NaN and Infinity are none.
bool parses_as_json(const std::string& text) {
    const char* script = "import json, sys\n"
                         "def refuse(word): raise ValueError(word)\n"
                         "json.loads(sys.stdin.buffer.read().decode('utf-8'), parse_constant=refuse)\n";
    return run_other(SPANLEDGER_PYTHON, {"-c", script}, text).status == 0;
}

TEST_CASE("the judge of JSON refuses what is none", "[program]") {
    CHECK(parses_as_json("{\"a\": [1, null]}\n"));
    CHECK_FALSE(parses_as_json("{\"a\": NaN}"));
    CHECK_FALSE(parses_as_json("{} {}"));
    CHECK_FALSE(parses_as_json(""));
}

TEST_CASE("what --json prints always parses", "[program]") {
    const StartedFolder folder;
    for (const char* span : {"1 m", "4.2 m", "6 m", "15 m"}) {
        INFO(span);
        const Outcome outcome = run_inside(with(folder.check(span), "--json"));
        CHECK(outcome.status <= 1);
        CHECK(parses_as_json(outcome.out));
    }
    for (const char* topic : {"classes", "series", "sections", "loads", "parameters", "limits", "sources"}) {
        INFO(topic);
        CHECK(parses_as_json(run_inside({"catalogue", topic, "--json"}).out));
    }
    CHECK(parses_as_json(run_inside({"catalogue", "--json"}).out));
}

TEST_CASE("the record of an issue parses", "[program]") {
    const StartedFolder folder;
    REQUIRE(run_inside(folder.tables()).status == 0);
    CHECK(parses_as_json(file_text(folder.out() + "/EX-101-A.json")));
}

TEST_CASE("standard output is empty where there is an error", "[program]") {
    const StartedFolder folder;
    const std::vector<Arguments> wrong{
        {"check", folder.brief(), "--json"},        with(with(folder.check("nan"), "--json"), "--verbose"),
        {"tables", folder.path() + "/none.toml"},   {"catalogue", "nothing", "--json"},
        {"catalogue", "classes", "none", "--json"}, {"catalogue", "--brief", folder.path() + "/none.toml", "--json"}};
    for (const Arguments& arguments : wrong) {
        INFO(Catch::StringMaker<Arguments>::convert(arguments));
        const Outcome outcome = run_inside(arguments);
        CHECK(outcome.status == 2);
        CHECK(outcome.out.empty());
        CHECK_FALSE(outcome.err.empty());
    }
}

TEST_CASE("no escape codes and no progress where nothing is a terminal", "[program]") {
    const StartedFolder folder;
    const std::vector<Arguments> runs{{},
                                      {"--help"},
                                      {"catalogue"},
                                      with(folder.replacing_tables(), "--verbose"),
                                      folder.check("4.2 m"),
                                      folder.check("6 m"),
                                      {"tables", folder.path() + "/none.toml"}};
    for (const auto& [name, value] : std::vector<std::pair<std::string, std::string>>{
             {"TERM", "xterm-256color"}, {"NO_COLOR", "1"}, {"TERM", "dumb"}}) {
        for (const Arguments& arguments : runs) {
            INFO(Catch::StringMaker<Arguments>::convert(arguments));
            const Outcome outcome = run_apart({.arguments = arguments, .environment = {{name, value}}});
            CHECK((outcome.out + outcome.err).find_first_of("\x1b\r") == std::string::npos);
        }
    }
}

TEST_CASE("with -q nothing is said, and results stay the same", "[program]") {
    const StartedFolder folder;
    const Outcome spoken = run_inside(folder.tables());
    const Outcome silent = run_inside(with(folder.replacing_tables(), "-q"));
    CHECK_FALSE(spoken.err.empty());
    CHECK(silent.err.empty());
    CHECK(silent.out == spoken.out);
    CHECK(run_inside(with(folder.check("4.2 m"), "-q")).out == run_inside(folder.check("4.2 m")).out);
    CHECK(run_inside({"start", folder.path() + "/another", "--quiet"}).err.empty());
}

TEST_CASE("with -q errors are said", "[program]") {
    const Outcome outcome = run_inside({"tables", "none.toml", "-q"});
    CHECK(outcome.status == 2);
    CHECK_THAT(outcome.err, Contains("none.toml"));
}

TEST_CASE("with -v it is said where values come from, on standard error alone", "[program]") {
    const StartedFolder folder;
    const Outcome plain = run_inside(folder.check("4.2 m"));
    const Outcome wordy = run_inside(with(folder.check("4.2 m"), "-v"));
    CHECK(wordy.out == plain.out);
    CHECK(wordy.err.size() > plain.err.size());
    CHECK_THAT(wordy.err, Contains("parameter") && Contains("uk"));
}

TEST_CASE("words on standard error are whole lines", "[program]") {
    const StartedFolder folder;
    for (const Arguments& arguments : {folder.tables(), Arguments{"tables", "none.toml"}, {"tabels"}, {}}) {
        const Outcome outcome = run_inside(arguments);
        REQUIRE_FALSE(outcome.err.empty());
        CHECK(outcome.err.back() == '\n');
    }
}

} // namespace
} // namespace spanledger
