// SPDX-License-Identifier: MIT
#include "spanledger/input/csv.hpp"

#include <catch2/catch.hpp>

#include <algorithm>
#include <array>

using namespace spanledger;

namespace {

const std::array<CsvColumn, 3> columns{{{"name"}, {"depth_mm"}, {"note", false}}};

std::vector<std::string> codes_of(const Diagnostics& diagnostics) {
    std::vector<std::string> codes;
    for (const Diagnostic& diagnostic : diagnostics.all()) {
        codes.push_back(diagnostic.code);
    }
    return codes;
}

std::vector<std::string> codes_of_text(std::string_view text) {
    Diagnostics diagnostics;
    (void)read_csv("t.csv", text, columns, diagnostics);
    return codes_of(diagnostics);
}

Diagnostics number_diagnostics(const std::string& written, char separator = ',') {
    Diagnostics diagnostics;
    const std::string text = std::string("name") + separator + "depth_mm\na" + separator + written + "\n";
    const auto table = read_csv("t.csv", text, columns, diagnostics);
    if (table && !table->rows().empty()) {
        CsvRecord record(*table, table->rows().front(), diagnostics);
        (void)record.number("depth_mm", {1.0, 1000.0, 50.0, 500.0, "mm"});
    }
    return diagnostics;
}

} // namespace

TEST_CASE("Every way to write a table reads alike") {
    const std::string text = GENERATE(
        as<std::string>(), "name,depth_mm,note\nC24,220,two words\n", "name,depth_mm,note\r\nC24,220,two words\r\n",
        "name,depth_mm,note\rC24,220,two words\r", "\xEF\xBB\xBFname,depth_mm,note\nC24,220,two words\n",
        "name;depth_mm;note\nC24;220;two words\n", "name\tdepth_mm\tnote\nC24\t220\ttwo words\n",
        "name,depth_mm,note\nC24,220,two words", "\"name\",\"depth_mm\",\"note\"\n\"C24\",\"220\",\"two words\"\n",
        " name , depth_mm , note \n C24 , 220 , two words \n",
        "# remark, with commas; and others\n\nname,depth_mm,note\n\n# more\nC24,220,two words\n,,\n");
    INFO(text);
    Diagnostics diagnostics;
    const auto table = read_csv("t.csv", text, columns, diagnostics);
    REQUIRE(table.has_value());
    CHECK(diagnostics.all().empty());
    REQUIRE(table->rows().size() == 1);
    CsvRecord record(*table, table->rows()[0], diagnostics);
    CHECK(record.text("name") == "C24");
    CHECK(record.number("depth_mm", {}) == 220.0);
    CHECK(record.text("note") == "two words");
    CHECK(record.good());
}

TEST_CASE("A quoted field may hold separators, quotes and line breaks") {
    const std::string end = GENERATE(as<std::string>(), "\n", "\r\n", "\r");
    Diagnostics diagnostics;
    const auto table = read_csv("t.csv", "name,depth_mm,note" + end + "a,1,\"x, \"\"y\"\"" + end + "z\"" + end + "b,q,",
                                columns, diagnostics);
    REQUIRE(table.has_value());
    REQUIRE(table->rows().size() == 2);
    CHECK(table->rows()[0].fields[2].text == "x, \"y\"\nz");
    // The line count goes on through the quoted break, so that later places are right.
    CsvRecord record(*table, table->rows()[1], diagnostics);
    (void)record.number("depth_mm", {});
    REQUIRE(diagnostics.all().size() == 1);
    CHECK(diagnostics.all()[0].place.line == 4);
    CHECK(diagnostics.all()[0].place.column == 3);
    CHECK(diagnostics.all()[0].place.source_line == "b,q,");
}

TEST_CASE("Wrong tables are refused with a code") {
    struct Row {
        const char* text;
        const char* code;
    };
    const auto row =
        GENERATE(Row{"", "no-columns"}, Row{"# only a remark\n", "no-columns"},
                 Row{"name,dpeth_mm,note\n", "unknown-column"}, Row{"name,note\n", "missing-column"},
                 Row{"name,name,depth_mm\n", "duplicate-column"}, Row{"name,depth_mm,\n", "unknown-column"},
                 Row{"name,depth_mm\na\n", "short-row"}, Row{"name,depth_mm\na,1,2\n", "long-row"},
                 Row{"name,depth_mm\n\"a,1\n", "unclosed-quote"}, Row{"name,depth_mm\n\"a\"b,1\n", "stray-quote"},
                 Row{"name,depth_mm\na\"b,1\n", "stray-quote"}, Row{"name,depth_mm\na\x01,1\n", "control-character"},
                 Row{"name,depth_mm\n\xff,1\n", "invalid-utf8"}, Row{"\xff\xfen\0a\0", "invalid-utf8"});
    INFO(row.text);
    const auto codes = codes_of_text(row.text);
    CHECK(std::find(codes.begin(), codes.end(), row.code) != codes.end());
}

TEST_CASE("A mistyped column gets a suggestion, and a short row names its column and row") {
    Diagnostics diagnostics;
    (void)read_csv("t.csv", "name,dpeth_mm\n", columns, diagnostics);
    CHECK(diagnostics.all().at(0).hint == "did you mean 'depth_mm'?");
    CHECK(diagnostics.all().at(0).place.column == 6);

    Diagnostics short_row;
    (void)read_csv("t.csv", "name,depth_mm,note\nfirst,1,\nsecond\n", columns, short_row);
    REQUIRE(short_row.all().size() == 1);
    CHECK(short_row.all()[0].message.find("'second'") != std::string::npos);
    CHECK(short_row.all()[0].hint.find("'depth_mm'") != std::string::npos);
    CHECK(short_row.all()[0].place.line == 3);
}

TEST_CASE("Invalid UTF-8 is refused at its place") {
    Diagnostics diagnostics;
    CHECK_FALSE(read_csv("t.csv", "name,depth_mm\né,1\nb\xc3(,2\n", columns, diagnostics).has_value());
    REQUIRE(diagnostics.all().size() == 1);
    CHECK(diagnostics.all()[0].place.line == 3);
    CHECK(diagnostics.all()[0].place.column == 2);
}

TEST_CASE("Only finite decimal numbers within the range are read") {
    const auto written =
        GENERATE("nan", "inf", "-inf", "1e400", "0x10", "220mm", "220 mm", "\"2,2\"", "1 000", "abc", "--1");
    INFO(written);
    CHECK(codes_of(number_diagnostics(written)) == std::vector<std::string>{"bad-number"});
}

TEST_CASE("Range, emptiness and what is unusual are told apart") {
    CHECK(codes_of(number_diagnostics("220")).empty());
    CHECK(codes_of(number_diagnostics("")) == std::vector<std::string>{"empty-field"});
    CHECK(codes_of(number_diagnostics("-220")) == std::vector<std::string>{"out-of-range"});
    CHECK(codes_of(number_diagnostics("1001")) == std::vector<std::string>{"out-of-range"});
    CHECK(codes_of(number_diagnostics("501")) == std::vector<std::string>{"unusual"});
    CHECK_FALSE(number_diagnostics("501").has_errors());
    CHECK(number_diagnostics("501").all()[0].message == "'depth_mm': 501 mm is outside the usual range 50 to 500 mm");
}

TEST_CASE("A decimal comma is read between semicolons only") {
    CHECK(codes_of(number_diagnostics("220,5", ';')).empty());
    CHECK(codes_of(number_diagnostics("220.5", ';')).empty());
    CHECK(codes_of(number_diagnostics("1.220,5", ';')) == std::vector<std::string>{"bad-number"});
    CHECK(codes_of(number_diagnostics("1,220,5", ';')) == std::vector<std::string>{"bad-number"});
    CHECK(codes_of_text("name\tdepth_mm\na\t2,5\n").empty()); // read as text so far
    CHECK(number_diagnostics("\"220,5\"").all().at(0).hint.find("decimal comma") != std::string::npos);

    Diagnostics diagnostics;
    const auto table = read_csv("t.csv", "name;depth_mm\na;220,5\n", columns, diagnostics);
    REQUIRE(table.has_value());
    CsvRecord record(*table, table->rows().at(0), diagnostics);
    CHECK(record.number("depth_mm", {}) == 220.5);
}

TEST_CASE("Optional columns and fields may be left out") {
    Diagnostics diagnostics;
    const auto table = read_csv("t.csv", "name,depth_mm\na,\n", columns, diagnostics);
    REQUIRE(table.has_value());
    CsvRecord record(*table, table->rows().at(0), diagnostics);
    CHECK(record.text("note").empty());
    CHECK_FALSE(record.optional_number("depth_mm", {}).has_value());
    CHECK_FALSE(record.optional_number("note", {}).has_value());
    CHECK(record.good());
    CHECK(record.required_text("note").empty());
    CHECK_FALSE(record.good());
}

TEST_CASE("Words are checked, ignoring case") {
    const std::array<std::string, 2> words{"solid softwood", "LVL"};
    Diagnostics diagnostics;
    const auto table = read_csv("t.csv", "name,depth_mm\nlvl,yes\nlvvl,maybe\n", columns, diagnostics);
    REQUIRE(table.has_value());
    CsvRecord first(*table, table->rows().at(0), diagnostics);
    CHECK(first.one_of("name", words) == 1);
    CHECK(first.yes_or_no("depth_mm"));
    CHECK(first.good());
    CsvRecord second(*table, table->rows().at(1), diagnostics);
    (void)second.one_of("name", words);
    (void)second.yes_or_no("depth_mm");
    CHECK(codes_of(diagnostics) == std::vector<std::string>{"bad-word", "bad-word"});
    CHECK(diagnostics.all()[0].hint == "did you mean 'LVL'?");
}

TEST_CASE("Names that a spreadsheet has changed are recognised") {
    const auto spoiled = GENERATE("03-Dec", "3-dec", "Dec-03", "2.00E+04", "2E+4", "1e-5", "05-Mar-24");
    CHECK(spoiled_by_spreadsheet(spoiled));
    const auto fine =
        GENERATE("C24", "GL24h", "UK 47", "E1", "2E4", "D30", "47x220", "Dec", "LVL48P", "45-ply", "E-class");
    INFO(fine);
    CHECK_FALSE(spoiled_by_spreadsheet(fine));
}

TEST_CASE("A file of another kind is given up, not read to its end") {
    const std::string many_fields = "name" + std::string(5000, ',') + "\n";
    CHECK(codes_of_text(many_fields).front() == "too-many-columns");
    std::string many_rows = "name,depth_mm\n";
    for (int i = 0; i < 200100; ++i) {
        many_rows += "a,1\n";
    }
    CHECK(codes_of_text(many_rows) == std::vector<std::string>{"too-many-rows"});
}
