// SPDX-License-Identifier: MIT
#include "program/subprocess.hpp"

#include "spanledger/program/help.hpp"
#include "spanledger/program/options.hpp"

#include <catch2/catch.hpp>

namespace spanledger {
namespace {

using Catch::Matchers::Contains;

std::string printed(const std::string& name) {
    const Outcome outcome = run_inside({"--print", name});
    CHECK(outcome.status == 0);
    CHECK(outcome.err.empty());
    return outcome.out;
}

std::string without_backslashes(std::string text) {
    text.erase(std::remove(text.begin(), text.end(), '\\'), text.end());
    return text;
}

/// Calls `look(command, option)` for every option that a command understands.
template <class Look> void for_every_option(const Look& look) {
    for (const CommandRow& row : command_table()) {
        for (const auto rows : {row.options, general_options()}) {
            for (const OptionRow& option : rows) look(row, option);
        }
    }
}

TEST_CASE("the man page has no error in it", "[program]") {
    const Outcome outcome = run_other("mandoc", {"-Tlint", "-Werror"}, printed("man"));
    INFO(outcome.out << outcome.err);
    CHECK(outcome.status == 0);
}

TEST_CASE("the linter of man pages finds an error where there is one", "[program]") {
    CHECK(run_other("mandoc", {"-Tlint", "-Werror"}, printed("man") + ".so /etc/passwd\n.RE 7\n").status != 0);
}

TEST_CASE("the man page names commands, options, statuses, files, environment and examples", "[program]") {
    const std::string page = without_backslashes(printed("man"));
    for (const char* heading : {"NAME", "SYNOPSIS", "EXIT STATUS", "FILES", "ENVIRONMENT", "EXAMPLES"}) {
        CHECK_THAT(page, Contains(std::string(".SH ") + heading + "\n"));
    }
    for_every_option([&](const CommandRow& row, const OptionRow& option) {
        INFO(row.name << " --" << option.name);
        CHECK_THAT(page, Contains("--" + std::string(option.name)));
    });
    for (const CommandRow& row : command_table()) {
        CHECK_THAT(page, Contains("spanledger " + std::string(row.name) + " " + std::string(row.operands)));
    }
    for (const ExitStatusRow& row : exit_statuses()) {
        CHECK_THAT(page, Contains(".B " + std::to_string(row.status) + "\n" + std::string(row.meaning)));
    }
}

TEST_CASE("the man page reads as the help does", "[program]") {
    const Outcome read = run_other("mandoc", {"-Tutf8", "-Owidth=200"}, printed("man"));
    CHECK(read.status == 0);
    for (const CommandRow& row : command_table()) {
        std::istringstream lines{std::string(row.example)};
        for (std::string line; std::getline(lines, line);) CHECK_THAT(read.out, Contains(line));
    }
}

TEST_CASE("bash offers every command and every option", "[program]") {
    const TemporaryFolder folder;
    folder.write("completion", printed("bash"));
    const auto offered = [&](const std::string& words, int at) {
        const std::string script = "set -eu; . " + folder.path() + "/completion; COMP_WORDS=(" + words +
                                   "); COMP_CWORD=" + std::to_string(at) +
                                   "; _spanledger; printf ' %s ' \"${COMPREPLY[@]}\"";
        const Outcome outcome = run_other("bash", {"-c", script});
        CHECK(outcome.err.empty());
        return outcome.out;
    };
    const std::string commands = offered("spanledger ''", 1);
    for (const CommandRow& row : command_table()) CHECK_THAT(commands, Contains(" " + std::string(row.name) + " "));
    CHECK_THAT(offered("spanledger ch", 1), Contains(" check ") && !Contains("tables"));
    for_every_option([&](const CommandRow& row, const OptionRow& option) {
        INFO(row.name << " --" << option.name);
        const std::string options =
            offered("spanledger " + std::string(row.name) + " --" + std::string(option.name), 2);
        CHECK_THAT(options, Contains(" --" + std::string(option.name) + " "));
    });
}

/// The lines that hold all of the words.
std::size_t lines_with(const std::string& text, const std::vector<std::string>& words) {
    std::istringstream lines(text);
    std::size_t count = 0;
    for (std::string line; std::getline(lines, line);) {
        const auto held = [&](const std::string& word) { return line.find(word) != std::string::npos; };
        count += std::all_of(words.begin(), words.end(), held) ? 1U : 0U;
    }
    return count;
}

TEST_CASE("zsh is told of every command and every option", "[program]") {
    const std::string zsh = printed("zsh");
    for (const CommandRow& row : command_table()) {
        CHECK(lines_with(zsh, {"'" + std::string(row.name) + ":"}) == 1);
        const std::size_t begins = zsh.find("        " + std::string(row.name) + ")\n");
        REQUIRE(begins != std::string::npos);
        const std::string block = zsh.substr(begins, zsh.find(";;", begins) - begins);
        for (const auto rows : {row.options, general_options()}) {
            for (const OptionRow& option : rows) {
                INFO(row.name << " --" << option.name);
                const std::string letter = option.letter == '\0' ? "--" : std::string("-") + option.letter + ",--";
                CHECK(lines_with(block, {letter + std::string(option.name)}) == 1);
            }
        }
    }
}

TEST_CASE("fish is told of every command and every option", "[program]") {
    const std::string fish = printed("fish");
    for (const CommandRow& row : command_table())
        CHECK(lines_with(fish, {"-a " + std::string(row.name) + " -d "}) == 1);
    for_every_option([&](const CommandRow& row, const OptionRow& option) {
        INFO(row.name << " --" << option.name);
        CHECK(lines_with(fish, {" -n '__fish_seen_subcommand_from " + std::string(row.name) + "' ",
                                " -l " + std::string(option.name) + " "}) == 1);
    });
}

TEST_CASE("an unknown document is refused with the known ones", "[program]") {
    const Outcome outcome = run_inside({"--print", "html"});
    CHECK(outcome.status == 2);
    CHECK(outcome.out.empty());
    for (const std::string_view name : document_words()) CHECK_THAT(outcome.err, Contains(std::string(name)));
}

} // namespace
} // namespace spanledger
