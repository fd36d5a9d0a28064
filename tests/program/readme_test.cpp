// SPDX-License-Identifier: MIT
#include "program/outcome.hpp"

#include <catch2/catch.hpp>

// What the README shows is what the program prints.

namespace spanledger {
namespace {

std::string readme() {
    return file_text(SPANLEDGER_TEST_DATA "/../README.md");
}

/// The fenced text behind "<!-- output of: NAME -->".
std::string shown_output(const std::string& name) {
    const std::string text = readme();
    const std::string fence = "```\n";
    const std::size_t mark = text.find("<!-- output of: " + name + " -->");
    const std::size_t open = text.find(fence, mark);
    const std::size_t close = text.find(fence, open + fence.size());
    REQUIRE(mark != std::string::npos);
    REQUIRE(close != std::string::npos);
    return text.substr(open + fence.size(), close - open - fence.size());
}

TEST_CASE("the README shows the check as the program prints it", "[program]") {
    const StartedFolder folder;
    CHECK(run_inside(folder.check("4.2 m")).out == shown_output("check"));
}

TEST_CASE("the README names the files that the starter brief issues", "[program]") {
    const StartedFolder folder;
    const Outcome outcome = run_inside(folder.tables());
    REQUIRE(outcome.status == 0);
    std::istringstream lines(outcome.out);
    std::string shown;
    for (std::string line; std::getline(lines, line);) {
        shown += "output/" + std::filesystem::path(line).filename().string() + "\n";
    }
    CHECK(shown == shown_output("spanledger tables brief.toml"));
}

TEST_CASE("the README gives the job in its first paragraph and both commands", "[program]") {
    const std::string text = readme();
    CHECK(text.find("joist span tables") < text.find("\n\n", text.find("\n\n") + 2));
    CHECK(text.find(".ci/prepare && cmake --workflow --preset demo") != std::string::npos);
    CHECK(text.find(".ci/prepare tests && cmake --workflow --preset tests") != std::string::npos);
}

} // namespace
} // namespace spanledger
