// SPDX-License-Identifier: MIT
#include "program/subprocess.hpp"

#include <catch2/catch.hpp>

namespace spanledger {
namespace {

using Catch::Matchers::Contains;

/// Comment lines, more than a pipe holds: once they are written the program is reading, past the set-up of signals.
std::string more_than_a_pipe_holds() {
    const std::string line = "# " + std::string(98, '.') + "\n";
    std::string text;
    while (text.size() < 300000) text += line;
    return text;
}

TEST_CASE("a full disk: status 3, the old issue intact, nothing left lying about", "[program]") {
    const StartedFolder folder;
    REQUIRE(run_inside(folder.tables()).status == 0);
    const auto issued = files_below(folder.out());
    std::size_t greatest = 0;
    for (const auto& [name, text] : issued) greatest = std::max(greatest, text.size());
    const std::string temporary = folder.path() + "/temporary";
    std::filesystem::create_directory(temporary);
    for (const std::size_t limit : {std::size_t{0}, std::size_t{4096}, std::size_t{20000}, greatest - 1}) {
        INFO("limit " << limit);
        const Outcome outcome = run_apart({.arguments = with(folder.replacing_tables(), "--quiet"),
                                           .environment = {{"TMPDIR", temporary}},
                                           .file_size = limit});
        CHECK(outcome.status == 3);
        CHECK(outcome.out.empty());
        CHECK(files_below(folder.out()) == issued);
        CHECK(files_below(temporary).empty());
    }
}

TEST_CASE("a full disk is told with the file that could not be written", "[program]") {
    const StartedFolder folder;
    const Outcome outcome = run_apart({.arguments = folder.tables(), .file_size = 4096});
    CHECK(outcome.status == 3);
    CHECK_THAT(outcome.err, Contains("could not write " + folder.out() + "/EX-101-A."));
    CHECK(files_below(folder.out()).empty());
}

TEST_CASE("start on a full disk leaves nothing half written", "[program]") {
    const TemporaryFolder folder;
    const Outcome outcome = run_apart({.arguments = {"start", folder.path() + "/new"}, .file_size = 100});
    CHECK(outcome.status == 3);
    CHECK(files_below(folder.path()).empty());
}

TEST_CASE("signals that ask to stop: status 130 and nothing left lying about", "[program]") {
    const StartedFolder folder;
    const std::string temporary = folder.path() + "/temporary";
    std::filesystem::create_directory(temporary);
    for (const int number : {SIGINT, SIGTERM}) {
        Subprocess process(
            {.arguments = {"tables", "-", "--out", folder.out()}, .environment = {{"TMPDIR", temporary}}});
        process.feed(more_than_a_pipe_holds());
        process.signal(number);
        process.feed(file_text(folder.brief()));
        const Outcome outcome = process.wait();
        CHECK(outcome.status == 130);
        CHECK(outcome.out.empty());
        CHECK((!std::filesystem::exists(folder.out()) || files_below(folder.out()).empty()));
        CHECK(files_below(temporary).empty());
    }
}

TEST_CASE("interrupted while files are being written: no half file and no temporary file", "[program]") {
    const StartedFolder folder;
    int parts_seen = 0;
    const Outcome outcome = run_inside(folder.tables(), [&] {
        parts_seen += files_below(folder.out()).empty() ? 0 : 1;
        return parts_seen > 0;
    });
    CHECK(parts_seen > 0);
    CHECK(outcome.status == 130);
    CHECK(files_below(folder.out()).empty());
}

TEST_CASE("a temporary folder that cannot be written is no hindrance", "[program]") {
    const StartedFolder folder;
    REQUIRE(run_inside(folder.tables()).status == 0);
    const auto issued = files_below(folder.out());
    for (const std::string& temporary : {folder.path() + "/none", folder.brief(), std::string("/proc")}) {
        INFO(temporary);
        const Outcome outcome =
            run_apart({.arguments = folder.replacing_tables(), .environment = {{"TMPDIR", temporary}}});
        INFO(outcome.err);
        CHECK(outcome.status == 0);
        CHECK(files_below(folder.out()) == issued);
    }
}

TEST_CASE("the operand - reads the brief from standard input", "[program]") {
    const StartedFolder folder;
    REQUIRE(run_inside(folder.tables()).status == 0);
    const auto issued = files_below(folder.out());
    const Outcome outcome =
        run_apart({.arguments = {"tables", "-", "--out", folder.out() + "/other"}}, file_text(folder.brief()));
    CHECK(outcome.status == 0);
    const auto others = files_below(folder.out() + "/other");
    CHECK(others.at("EX-101-A.csv") == issued.at("EX-101-A.csv"));
    Arguments check = folder.check("4.2 m");
    check[1] = "-";
    const Outcome checked = run_apart({.arguments = check}, file_text(folder.brief()));
    CHECK(checked.status == 0);
    CHECK(checked.out == run_inside(folder.check("4.2 m")).out);
}

TEST_CASE("an empty standard input is bad input", "[program]") {
    const TemporaryFolder folder;
    const Outcome outcome = run_apart({.arguments = {"tables", "-", "--out", folder.path()}});
    CHECK(outcome.status == 2);
    CHECK(outcome.out.empty());
    CHECK_FALSE(outcome.err.empty());
}

TEST_CASE("a folder in place of a brief is bad input", "[program]") {
    const TemporaryFolder folder;
    const Outcome outcome = run_inside({"tables", folder.path()});
    CHECK(outcome.status == 2);
    CHECK_THAT(outcome.err, Contains(folder.path()));
}

} // namespace
} // namespace spanledger
