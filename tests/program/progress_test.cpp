// SPDX-License-Identifier: MIT
#include "program/outcome.hpp"

#include <catch2/catch.hpp>

#include <chrono>
#include <thread>

namespace spanledger {
namespace {

using Catch::Matchers::Contains;
using Catch::Matchers::Matches;

/// Issues tables with a terminal for its words; every question whether to stop takes `pause`.
Outcome run_on_terminal(const Arguments& arguments, std::chrono::milliseconds pause) {
    std::ostringstream out;
    std::ostringstream err;
    const auto wait = [pause] {
        std::this_thread::sleep_for(pause);
        return false;
    };
    const int status = run(arguments, Surroundings{out, err, true, wait});
    return {status, out.str(), err.str()};
}

TEST_CASE("progress is shown past half a second, and cleared at the end without escape codes", "[program]") {
    const StartedFolder folder;
    const Outcome outcome = run_on_terminal(folder.tables(), std::chrono::milliseconds(30));
    CHECK(outcome.status == 0);
    CHECK_THAT(outcome.err, Contains(" cells") && !Contains("\x1b"));
    // What stands after the last return is the summary; what stands before it are blanks over the progress.
    const std::size_t last = outcome.err.rfind('\r');
    REQUIRE(last != std::string::npos);
    const std::size_t before = outcome.err.rfind('\r', last - 1);
    REQUIRE(before != std::string::npos);
    const std::size_t shown = outcome.err.rfind('\r', before - 1);
    REQUIRE(shown != std::string::npos);
    CHECK_THAT(outcome.err.substr(shown + 1, before - shown - 1), Matches("[0-9]+ of [0-9]+ cells"));
    const std::string cleared = outcome.err.substr(before + 1, last - before - 1);
    CHECK(cleared.size() >= before - shown - 1);
    CHECK(cleared.find_first_not_of(' ') == std::string::npos);
    CHECK_THAT(outcome.err.substr(last + 1), Matches("[0-9]+ tables, [0-9]+ cells[^]*"));
}

TEST_CASE("quick work shows no progress, and silent work none at all", "[program]") {
    const StartedFolder folder;
    const Outcome quick = run_on_terminal(folder.tables(), std::chrono::milliseconds(0));
    CHECK(quick.status == 0);
    CHECK(quick.err.find('\r') == std::string::npos);
    const Outcome silent = run_on_terminal(with(folder.replacing_tables(), "-q"), std::chrono::milliseconds(30));
    CHECK(silent.status == 0);
    CHECK(silent.err.empty());
}

} // namespace
} // namespace spanledger
