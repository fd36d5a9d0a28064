// SPDX-License-Identifier: MIT
#include "program/outcome.hpp"

#include <catch2/catch.hpp>

namespace spanledger {
namespace {

using Catch::Matchers::Contains;

struct Refusal {
    Arguments arguments;
    std::string message;
    std::string hint;
};

void check_refusal(const Refusal& refusal) {
    const Outcome outcome = run_inside(refusal.arguments);
    INFO(Catch::StringMaker<Arguments>::convert(refusal.arguments));
    CHECK(outcome.status == 2);
    CHECK(outcome.out.empty());
    CHECK_THAT(outcome.err, Contains(refusal.message));
    CHECK_THAT(outcome.err, Contains(refusal.hint));
}

TEST_CASE("no arguments: short help with two examples on standard error, status 2", "[program]") {
    const Outcome outcome = run_inside({});
    CHECK(outcome.status == 2);
    CHECK(outcome.out.empty());
    CHECK_THAT(outcome.err, Contains("spanledger start ") && Contains("spanledger tables "));
    CHECK(std::count(outcome.err.begin(), outcome.err.end(), '\n') < 15);
}

TEST_CASE("a general option without a command shows the short help", "[program]") {
    const Outcome outcome = run_inside({"--quiet"});
    CHECK(outcome.status == 2);
    CHECK(outcome.out.empty());
    CHECK_THAT(outcome.err, Contains("spanledger start "));
}

TEST_CASE("mistyped commands and options are refused with what was meant", "[program]") {
    check_refusal({{"tabels", "brief.toml"}, "unknown command 'tabels'", "did you mean 'tables'?"});
    check_refusal({{"chekc", "brief.toml"}, "unknown command 'chekc'", "did you mean 'check'?"});
    check_refusal({{"catalog"}, "unknown command 'catalog'", "did you mean 'catalogue'?"});
    check_refusal({{""}, "unknown command ''", "known: start, tables, check, catalogue"});
    check_refusal({{"tables", "brief.toml", "--repalce"}, "unknown option '--repalce'", "did you mean '--replace'?"});
    check_refusal(
        {{"check", "brief.toml", "--mebmer", "C24 47x220"}, "unknown option '--mebmer'", "did you mean '--member'?"});
    check_refusal({{"catalogue", "clases"}, "unknown topic 'clases'", "did you mean 'classes'?"});
    check_refusal({{"catalogue", "classes", "C25"}, "nothing named 'C25' among the classes", "did you mean 'C2"});
    check_refusal({{"tables", "-x", "brief.toml"}, "unknown option '-x'", "--out"});
}

TEST_CASE("abbreviated options are refused", "[program]") {
    check_refusal(
        {{"check", "brief.toml", "--mem", "C24 47x220"}, "unknown option '--mem'", "did you mean '--member'?"});
    check_refusal({{"tables", "brief.toml", "--repl"}, "unknown option '--repl'", "hint"});
    check_refusal({{"tables", "brief.toml", "--verb"}, "unknown option '--verb'", "hint"});
    check_refusal({{"--vers"}, "unknown option '--vers'", "did you mean '--version'?"});
    check_refusal({{"cat", "classes"}, "unknown command 'cat'", "did you mean 'catalogue'?"});
}

TEST_CASE("an option of another command is refused", "[program]") {
    check_refusal({{"tables", "brief.toml", "--member", "C24 47x220"}, "unknown option '--member'", "hint"});
    check_refusal({{"start", "folder", "--out", "x"}, "unknown option '--out'", "hint"});
}

TEST_CASE("arguments that are missing, too many or given twice are refused", "[program]") {
    check_refusal({{"tables"}, "'tables' needs BRIEF", "spanledger tables BRIEF"});
    check_refusal({{"tables", "a.toml", "b.toml"}, "'tables' takes BRIEF", "spanledger tables BRIEF"});
    check_refusal({{"start"}, "'start' needs DIR", "spanledger start DIR"});
    check_refusal({{"tables", "a.toml", "--out"}, "option '--out' needs", "--out "});
    check_refusal({{"tables", "a.toml", "--replace=yes"}, "option '--replace' takes no argument", "--replace"});
    check_refusal({{"tables", "a.toml", "--out", "a", "-o", "b"}, "option '--out' is given more than once", "once"});
    check_refusal({{"catalogue", "classes", "C24", "C16"}, "'catalogue' takes", "catalogue"});
}

TEST_CASE("check names every option that it still needs", "[program]") {
    const StartedFolder folder;
    for (const std::size_t left_out : {2U, 4U, 6U, 8U}) {
        Arguments arguments = folder.check("4.2 m");
        const std::string option = arguments[left_out];
        const auto at = arguments.begin() + static_cast<std::ptrdiff_t>(left_out);
        arguments.erase(at, at + 2);
        check_refusal({arguments, "needs " + option, "check --help"});
    }
}

TEST_CASE("mistyped names in check are refused with what was meant", "[program]") {
    const StartedFolder folder;
    const auto changed = [&](std::size_t place, const std::string& text) {
        Arguments arguments = folder.check("4.2 m");
        arguments[place] = text;
        return arguments;
    };
    check_refusal({changed(3, "C25 47x220"), "C25", "C2"});
    check_refusal({changed(3, "C24"), "C24", "hint"});
    check_refusal({changed(3, "C24 47y220"), "47y220", "hint"});
    check_refusal({changed(7, "Dweling, G 0.50"), "Dweling, G 0.50", "did you mean 'Dwelling, G 0.50'?"});
    check_refusal({changed(5, "400 kN"), "kN", "hint"});
    check_refusal({changed(5, "40 m"), "40 m", "mm"});
    check_refusal({changed(9, "3"), "'3'", "m"});
    check_refusal({changed(9, "nan"), "nan", "hint"});
}

TEST_CASE("option and argument may be written together", "[program]") {
    const StartedFolder folder;
    const Outcome apart = run_inside(folder.check("4.2 m"));
    const Outcome together = run_inside(
        {"check", folder.brief(), "--member=C24 47x220", "-s400", "--load=Dwelling, G 0.50", "--clear-span=4.2 m"});
    CHECK(apart.status == 0);
    CHECK(together.status == 0);
    CHECK(together.out == apart.out);
}

TEST_CASE("after -- everything is an operand", "[program]") {
    check_refusal({{"tables", "--", "--replace", "brief.toml"}, "'tables' takes BRIEF", "BRIEF"});
    const Outcome outcome = run_inside({"tables", "--", "--replace"});
    CHECK(outcome.status == 2);
    CHECK(outcome.out.empty());
    CHECK_THAT(outcome.err, Contains("--replace") && !Contains("unknown option"));
}

} // namespace
} // namespace spanledger
