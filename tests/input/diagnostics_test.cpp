// SPDX-License-Identifier: MIT
#include "spanledger/input/diagnostics.hpp"

#include <catch2/catch.hpp>

#include <sstream>

using namespace spanledger;

namespace {

std::string reported(const Diagnostics& diagnostics) {
    std::ostringstream out;
    report(diagnostics, out);
    return out.str();
}

std::size_t count_of(const std::string& text, const std::string& part) {
    std::size_t count = 0;
    for (std::size_t at = text.find(part); at != std::string::npos; at = text.find(part, at + part.size())) {
        ++count;
    }
    return count;
}

} // namespace

TEST_CASE("A diagnostic shows place, code, source line, caret and hint") {
    Diagnostics diagnostics;
    diagnostics.error("unknown-key", {"brief.toml", 3, 5, "    spacng = 400", 6}, "key 'spacng' is not known",
                      "did you mean 'spacing'?");
    CHECK(reported(diagnostics) == "brief.toml:3:5: key 'spacng' is not known [unknown-key]\n"
                                   "        spacng = 400\n"
                                   "        ^^^^^^\n"
                                   "    hint: did you mean 'spacing'?\n");
}

TEST_CASE("A place without a line names the file only, and one without a file nothing") {
    Diagnostics diagnostics;
    diagnostics.error("cannot-read", Place{.file = "a.csv"}, "no such file", "");
    diagnostics.error("usage", {}, "nothing to do", "");
    CHECK(reported(diagnostics) == "a.csv: no such file [cannot-read]\nnothing to do [usage]\n");
}

TEST_CASE("The caret stands under the character, whatever comes before it") {
    Diagnostics diagnostics;
    diagnostics.error("x", {"a", 1, 4, "\té\"z", 1}, "m", "");
    CHECK(reported(diagnostics) == "a:1:4: m [x]\n    \té\"z\n    \t  ^\n");
}

TEST_CASE("A long line is shown around its place") {
    Diagnostics diagnostics;
    const std::string line = std::string(1000, 'a') + "b" + std::string(1000, 'c');
    diagnostics.error("x", {"a", 1, 1001, line, 1}, "m", "");
    const std::string text = reported(diagnostics);
    CHECK(text.size() < 400);
    const std::size_t shown = text.find("    aaa");
    const std::size_t carets = text.find('\n', shown) + 1;
    REQUIRE(text.find('^') != std::string::npos);
    CHECK(text[shown + (text.find('^') - carets)] == 'b');
}

TEST_CASE("Warnings say so and are no errors") {
    Diagnostics diagnostics;
    diagnostics.warning("unusual", {"a", 1, 1, "x", 1}, "a wide spacing", "");
    CHECK_FALSE(diagnostics.has_errors());
    CHECK(reported(diagnostics).find("a:1:1: warning: a wide spacing [unusual]") == 0);
}

TEST_CASE("Of a file the first 20 errors and 20 warnings are shown, then counts, in the order of the text") {
    Diagnostics diagnostics;
    for (std::size_t line = 23; line >= 1; --line) {
        diagnostics.error("e", {"a", line, 1, "", 1}, "wrong", "");
        diagnostics.warning("w", {"a", line, 1, "", 1}, "odd", "");
    }
    diagnostics.error("e", {"b", 1, 1, "", 1}, "wrong too", "");
    const std::string text = reported(diagnostics);
    CHECK(count_of(text, "wrong [e]") == 20);
    CHECK(count_of(text, "odd [w]") == 20);
    CHECK(text.find("a: and 3 more errors\n") != std::string::npos);
    CHECK(text.find("a: and 3 more warnings\n") != std::string::npos);
    CHECK(text.find("a:1:1: wrong") < text.find("a:20:1: wrong"));
    CHECK(text.find("b:1:1: wrong too") != std::string::npos);
}

TEST_CASE("Control characters and invalid bytes of the input do not reach the terminal") {
    Diagnostics diagnostics;
    diagnostics.error("x", {"a\x1b[31m", 1, 1, "b\x1b]0;t\x07\xff\xc2\x9b", 1}, "m\x1b[2J", "h\r");
    const std::string text = reported(diagnostics);
    CHECK(text.find('\x1b') == std::string::npos);
    CHECK(text.find('\x07') == std::string::npos);
    CHECK(text.find('\r') == std::string::npos);
    CHECK(text.find('\xff') == std::string::npos);
    CHECK(text.find("\xc2\x9b") == std::string::npos);
}
