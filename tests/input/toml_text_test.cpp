// SPDX-License-Identifier: MIT
#include "spanledger/input/text_file.hpp"
#include "spanledger/input/toml_text.hpp"

#include <catch2/catch.hpp>

#include <filesystem>
#include <fstream>
#include <iostream>
#include <sstream>

using namespace spanledger;

namespace {

/// A tree in one line, to compare.
std::string shown(const toml::Node& node) {
    std::string text = node.key.empty() ? "" : node.key + "=";
    switch (node.kind) {
    case toml::NodeKind::text: return text + "'" + node.text + "'";
    case toml::NodeKind::boolean: return text + (node.boolean ? "true" : "false");
    case toml::NodeKind::unread: return text + "?";
    case toml::NodeKind::array:
    case toml::NodeKind::table: break;
    default: return text + node.text;
    }
    const bool list = node.kind == toml::NodeKind::array;
    text += list ? "[" : "{";
    for (const toml::Node& child : node.children) {
        text += shown(child) + " ";
    }
    return text + (list ? "]" : "}");
}

std::string tree_of(std::string_view text) {
    Diagnostics diagnostics;
    return shown(toml::parse("t.toml", text, diagnostics).root());
}

Diagnostics problems_of(std::string_view text) {
    Diagnostics diagnostics;
    (void)toml::parse("t.toml", text, diagnostics);
    return diagnostics;
}

std::string where(const Diagnostic& diagnostic) {
    return std::to_string(diagnostic.place.line) + ":" + std::to_string(diagnostic.place.column);
}

} // namespace

TEST_CASE("A TOML text becomes a tree in the order of the text") {
    CHECK(tree_of("b = 1\na = \"x\"\n[t]\nz = {k = true, a = 2.50}\n[[l]]\nv = [1, 2]\n[[l]]\nd = 2026-01-31\n") ==
          "{b=1 a='x' t={z={k=true a=2.50 } } l=[{v=[1 2 ] } {d=2026-01-31 } ] }");
}

TEST_CASE("Numbers keep their source text, without what only TOML knows") {
    CHECK(tree_of("a = +1_000\nb = 1.50\nc = 0x1F\nd = nan\ne = -2e3\n") == "{a=1000 b=1.50 c=0x1F d=nan e=-2e3 }");
}

TEST_CASE("Source texts are found behind characters of several bytes") {
    CHECK(tree_of("\"é€\" = {\"ü\" = 12.5, \"ß\" = [1, 23, 456]}\n") == "{é€={ü=12.5 ß=[1 23 456 ] } }");
}

TEST_CASE("Every node knows its place") {
    Diagnostics diagnostics;
    const toml::Document document = toml::parse("t.toml", "[a]\n  key = \"é\"\nn = [10,\n  200]\n", diagnostics);
    const toml::Node& a = *toml::find(document.root(), "a");
    const toml::Node& key = *toml::find(a, "key");
    CHECK(document.place(key.key_mark).column == 3);
    CHECK(document.place(key.key_mark).width == 3);
    CHECK(document.place(key.mark).column == 9);
    CHECK(document.place(key.mark).width == 3);
    CHECK(document.place(key.mark).source_line == "  key = \"é\"");
    const toml::Node& second = toml::find(a, "n")->children[1];
    CHECK(second.mark.line == 4);
    CHECK(second.mark.column == 3);
    CHECK(second.mark.width == 3);
}

TEST_CASE("Byte-order mark, CRLF and a missing last line end read alike") {
    const std::string plain = "[a]\nb = 1.5\nc = \"x\"\n";
    Diagnostics diagnostics;
    const auto marked = accept_text("t.toml", "\xEF\xBB\xBF[a]\r\nb = 1.5\r\nc = \"x\"", diagnostics);
    REQUIRE(marked.has_value());
    CHECK(tree_of(*marked) == tree_of(plain));
    const toml::Document document = toml::parse("t.toml", *marked, diagnostics);
    CHECK(document.line(2) == "b = 1.5");
    CHECK(diagnostics.all().empty());
}

TEST_CASE("All syntax errors of a text are reported, and the rest is read") {
    const std::string text = "a = 4,5\nb = 2\nc = uk\nlist = [1,\n  2x,\n  3]\nd = 4\n";
    const Diagnostics problems = problems_of(text);
    REQUIRE(problems.all().size() == 3);
    CHECK(where(problems.all()[0]) == "1:5");
    CHECK(where(problems.all()[1]) == "3:5");
    CHECK(where(problems.all()[2]) == "5:4");
    CHECK(tree_of(text) == "{a=? b=2 c=? list=? d=4 }");
}

TEST_CASE("What is left open is reported where it begins") {
    const Diagnostics problems = problems_of("a = 1\nb = [1, 2\nc = 3\n");
    REQUIRE(problems.all().size() == 1);
    CHECK(where(problems.all()[0]) == "2:5");
    CHECK(tree_of("a = 1\nb = [1, 2\nc = 3\n") == "{a=1 b=? c=3 }");
    const Diagnostics of_text = problems_of("a = 1\nb = \"\"\"\nmore\n");
    REQUIRE(of_text.all().size() == 1);
    CHECK(where(of_text.all()[0]) == "2:5");
}

TEST_CASE("A key or section that stands twice is reported with both places") {
    const Diagnostics problems = problems_of("[a]\nk = 1\n[b]\nk = 1\n  k = 2\n[a]\nm = 3\n[c]\nx = {r = 1, r = 2}\n");
    REQUIRE(problems.all().size() == 3);
    CHECK(where(problems.all()[0]) == "5:3");
    CHECK(problems.all()[0].message == "the key 'k' stands twice; it is already in line 4, column 1");
    CHECK(where(problems.all()[1]) == "6:1");
    CHECK(problems.all()[1].message == "the section [a] stands twice; it is already in line 1, column 2");
    CHECK(where(problems.all()[2]) == "9:13");
    CHECK(problems.all()[2].message == "the key 'r' stands twice; it is already in line 9, column 6");
}

TEST_CASE("A header that cannot be read is remembered") {
    Diagnostics diagnostics;
    CHECK(toml::parse("t.toml", "[[load]\na = 1\n", diagnostics).header_lost());
    CHECK_FALSE(toml::parse("t.toml", "[load]\na = 4,5\n", diagnostics).header_lost());
}

TEST_CASE("Deep nesting and endless keys are refused, not followed") {
    std::string dots = "a";
    for (int i = 0; i < 50000; ++i) {
        dots += ".a";
    }
    CHECK(problems_of(dots + " = 1\n").has_errors());
    CHECK(problems_of("[" + dots + "]\n").has_errors());
    CHECK(problems_of("x = {" + dots + " = 1}\n").has_errors());
    CHECK(problems_of("x = " + std::string(50000, '[') + "\n").has_errors());
    CHECK_FALSE(problems_of("x = [0.5, 1.5]\ny = \"........\"\n").has_errors());
}

TEST_CASE("A brief that is not UTF-8 is refused at its place") {
    Diagnostics diagnostics;
    CHECK_FALSE(accept_text("t.toml", "a = 1\nö = \"\xFC\"\n", diagnostics).has_value());
    REQUIRE(diagnostics.all().size() == 1);
    CHECK(diagnostics.all()[0].code == "invalid-utf8");
    CHECK(where(diagnostics.all()[0]) == "2:6");
}

TEST_CASE("A file over 64 MiB is refused with its size") {
    const std::filesystem::path file = std::filesystem::temp_directory_path() / "spanledger-large-file-test.toml";
    std::ofstream(file).put('a');
    std::filesystem::resize_file(file, largest_text_file + (largest_text_file / 2));
    Diagnostics diagnostics;
    CHECK_FALSE(read_text_file(file.string(), diagnostics).has_value());
    std::filesystem::remove(file);
    REQUIRE(diagnostics.all().size() == 1);
    CHECK(diagnostics.all()[0].code == "file-too-large");
    CHECK(diagnostics.all()[0].message == "the file has 96.0 MiB; at most 64 MiB are read");
}

TEST_CASE("A missing file and a folder are refused") {
    Diagnostics diagnostics;
    CHECK_FALSE(read_text_file("no-such-file.toml", diagnostics).has_value());
    CHECK_FALSE(read_text_file(std::filesystem::temp_directory_path().string(), diagnostics).has_value());
    REQUIRE(diagnostics.all().size() == 2);
    CHECK(diagnostics.all()[0].code == "unreadable-file");
    CHECK(diagnostics.all()[1].message == "this is a folder, not a file");
}

TEST_CASE("A single - reads standard input") {
    std::istringstream input("\xEF\xBB\xBF"
                             "a = 1\n");
    std::streambuf* const before = std::cin.rdbuf(input.rdbuf());
    Diagnostics diagnostics;
    const auto text = read_text_file("-", diagnostics);
    std::cin.rdbuf(before);
    std::cin.clear();
    CHECK(text == "a = 1\n");
    CHECK(diagnostics.all().empty());
}
