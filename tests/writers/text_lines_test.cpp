// SPDX-License-Identifier: MIT
#include "spanledger/writers/text_lines.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

namespace {

struct Metric {
    const char* text;
    double width; ///< sum of the advance widths of the face, in parts of its size
};

// Advance widths of Helvetica from its published font metrics file, from memory: digits and lower case 0.556, space and
// full stop 0.278, M and m 0.833, I 0.278, W 0.944, i and l 0.222, A 0.667, C 0.722, t 0.278.
constexpr Metric metrics[] = {{"4.21", 3 * 0.556 + 0.278}, {"4.21 M", 3 * 0.556 + 2 * 0.278 + 0.833},
                              {"mmmm", 4 * 0.833},         {"WWW", 3 * 0.944},
                              {"ill", 3 * 0.222},          {"C24", 0.722 + 2 * 0.556},
                              {"IIII", 4 * 0.278},         {"at A", 0.556 + 2 * 0.278 + 0.667}};

} // namespace

TEST_CASE("Text needs no more room than is said", "[writers][text_lines]") {
    for (const Metric& metric : metrics) {
        INFO(metric.text);
        CHECK(text_width(metric.text, {10.0, false}) >= 10.0 * metric.width);
        CHECK(text_width(metric.text, {10.0, false}) <= 13.5 * metric.width);
        CHECK(text_width(metric.text, {10.0, true}) > text_width(metric.text, {10.0, false}));
    }
}

TEST_CASE("Lines keep to their width and lose no word", "[writers][text_lines]") {
    const std::string text = "The tables hold on the basis in the sheet Basis, and on no other; für Prüfer too.";
    for (const double width : {60.0, 90.0, 150.0, 1000.0}) {
        std::string again;
        for (const std::string& line : text_lines(text, {9.0, false}, width)) {
            CHECK(text_width(line, {9.0, false}) <= width);
            again += (again.empty() ? "" : " ") + line;
        }
        CHECK(again == text);
    }
}

TEST_CASE("A word too long for a line is broken between characters", "[writers][text_lines]") {
    const std::string word = "ßßßßßßßßßßßßßßßßßßßß";
    std::string again;
    const auto lines = text_lines(word, {9.0, false}, 40.0);
    CHECK(lines.size() > 3);
    for (const std::string& line : lines) {
        CHECK(line.size() % 2 == 0); // each takes two bytes
        again += line;
    }
    CHECK(again == word);
}

TEST_CASE("Line ends of the text are kept, and no text is one empty line", "[writers][text_lines]") {
    CHECK(text_lines("one\n\ntwo", {9.0, false}, 500.0) == std::vector<std::string>{"one", "", "two"});
    CHECK(text_lines("", {9.0, false}, 500.0) == std::vector<std::string>{""});
}
