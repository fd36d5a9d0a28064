// SPDX-License-Identifier: MIT
#include "program/subprocess.hpp"

#include "spanledger/program/help.hpp"
#include "spanledger/program/options.hpp"
#include "spanledger/version.hpp"

#include <catch2/catch.hpp>

#include <cstdlib>

namespace spanledger {
namespace {

using Catch::Matchers::Contains;
using Catch::Matchers::Matches;
using Catch::Matchers::StartsWith;

std::size_t widest_line(const std::string& text) {
    std::istringstream lines(text);
    std::size_t widest = 0;
    for (std::string line; std::getline(lines, line);) widest = std::max(widest, line.size());
    return widest;
}

/// The lines between "Example:" and the first empty line.
std::string example_of(const std::string& help) {
    std::istringstream lines(help);
    std::string line;
    std::getline(lines, line);
    std::string example;
    while (std::getline(lines, line) && !line.empty()) example += line + "\n";
    return example;
}

std::vector<Arguments> every_help() {
    std::vector<Arguments> every{{"--help"}, {"-h"}};
    for (const CommandRow& row : command_table()) every.push_back({std::string(row.name), "--help"});
    return every;
}

TEST_CASE("help goes to standard output, is at most 80 columns wide and begins with an example", "[program]") {
    for (const Arguments& arguments : every_help()) {
        INFO(arguments.front());
        const Outcome outcome = run_inside(arguments);
        CHECK(outcome.status == 0);
        CHECK(outcome.err.empty());
        CHECK_THAT(outcome.out, StartsWith("Example:\n  spanledger "));
        CHECK(widest_line(outcome.out) <= 80);
    }
}

TEST_CASE("the short help is at most 80 columns wide", "[program]") {
    CHECK(widest_line(run_inside({}).err) <= 80);
}

TEST_CASE("examples of the help run as printed in the folder that start filled", "[program]") {
    const std::string program_folder = std::filesystem::path(SPANLEDGER_PROGRAM).parent_path().string();
    for (const Arguments& arguments : every_help()) {
        const StartedFolder folder;
        const std::string example = example_of(run_inside(arguments).out);
        INFO(example);
        const Outcome outcome = run_apart({.arguments = {"-e", "-c", example},
                                           .program = "/bin/sh",
                                           .folder = folder.project(),
                                           .environment = {{"PATH", program_folder + ":/usr/bin:/bin"}}});
        INFO(outcome.err);
        CHECK(outcome.status == 0);
        CHECK_FALSE(outcome.out.empty());
    }
}

TEST_CASE("the option --help anywhere shows help", "[program]") {
    const std::string of_tables = run_inside({"tables", "--help"}).out;
    const std::vector<Arguments> places{{"--help", "tables"},           {"tables", "none.toml", "--help"},
                                        {"tables", "--out", "x", "-h"}, {"tables", "a", "b", "c", "--help"},
                                        {"tables", "--out", "--help"},  {"tables", "--unknown", "--help"}};
    for (const Arguments& arguments : places) {
        INFO(Catch::StringMaker<Arguments>::convert(arguments));
        const Outcome outcome = run_inside(arguments);
        CHECK(outcome.status == 0);
        CHECK(outcome.out == of_tables);
        CHECK(outcome.err.empty());
    }
    CHECK(run_inside({"tables", "--", "--help"}).status == 2);
}

TEST_CASE("help names every option of its command, and the general help every command", "[program]") {
    const std::string general = run_inside({"--help"}).out;
    for (const CommandRow& row : command_table()) {
        CHECK_THAT(general, Contains("\n  " + std::string(row.name) + " "));
        const std::string help = run_inside({std::string(row.name), "--help"}).out;
        for (const auto rows : {row.options, general_options()}) {
            for (const OptionRow& option : rows) {
                INFO(row.name << " --" << option.name);
                CHECK_THAT(help, Contains("--" + std::string(option.name)));
                if (option.letter != '\0') CHECK_THAT(help, Contains(std::string("  -") + option.letter + ", "));
            }
        }
    }
}

TEST_CASE("every option of the table is understood", "[program]") {
    for (const CommandRow& row : command_table()) {
        for (const auto rows : {row.options, general_options()}) {
            for (const OptionRow& option : rows) {
                INFO(row.name << " --" << option.name);
                Arguments arguments{std::string(row.name), "--" + std::string(option.name)};
                if (!option.argument.empty()) arguments.emplace_back("word");
                for (std::size_t i = 0; i < row.least_operands; ++i) arguments.emplace_back("operand");
                const ParsedCommandLine parsed = parse_command_line(arguments);
                CHECK_FALSE(parsed.error.has_value());
                CHECK(parsed.line.value(option.name) == (option.argument.empty() ? "" : "word"));
            }
        }
    }
}

TEST_CASE("the option --version prints the version and the fingerprint of the catalogue", "[program]") {
    for (const Arguments& arguments : {Arguments{"--version"}, {"tables", "--version"}}) {
        const Outcome outcome = run_inside(arguments);
        CHECK(outcome.status == 0);
        CHECK(outcome.err.empty());
        CHECK_THAT(outcome.out, Matches("spanledger [0-9]+\\.[0-9]+\\.[0-9]+, catalogue [0-9a-f]{16}\n"));
    }
}

} // namespace
} // namespace spanledger
