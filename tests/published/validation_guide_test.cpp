// SPDX-License-Identifier: MIT
#include "published/published.hpp"

#include <catch2/catch.hpp>
#include <fmt/format.h>

#include <array>
#include <charconv>
#include <cmath>
#include <fstream>

namespace published {
namespace {

std::string_view words(Mark mark) {
    switch (mark) {
    case Mark::seen: return "seen";
    case Mark::from_memory: return "from memory";
    case Mark::common_practice: return "common practice, no source";
    }
    return {};
}

/// Digits after the point and power of ten of a number as printed.
struct Digits {
    int decimals = 0;
    int exponent = 0;
};
Digits digits_of(std::string_view printed) {
    Digits digits;
    const auto e = printed.find('e');
    if (e != std::string_view::npos) {
        std::from_chars(printed.data() + e + 1, printed.data() + printed.size(), digits.exponent);
    }
    const auto mantissa = printed.substr(0, e);
    const auto point = mantissa.find('.');
    if (point != std::string_view::npos) digits.decimals = static_cast<int>(mantissa.size() - point - 1);
    return digits;
}

/// Ours with two digits more than the source prints.
std::string shown(const Row& row, double value) {
    const Digits digits = digits_of(row.printed);
    if (row.printed.find('e') != std::string::npos) return fmt::format("{:.{}e}", value, digits.decimals + 2);
    return fmt::format("{:.{}f}", value, digits.decimals + 2);
}

/// (ours - printed)/printed in percent, without a sign where it is zero to the digits shown.
std::string difference(const Row& row) {
    const double printed = printed_value(row);
    const double percent = printed == 0.0 ? 100.0 * row.ours : 100.0 * (row.ours - printed) / printed;
    return std::abs(percent) < 0.005 ? "0.00 %" : fmt::format("{:+.2f} %", percent);
}

std::string line_of(const Row& row) {
    return fmt::format("| {} | {} | {} | {} | {} | {} | {} |\n", row.quantity, row.printed, shown(row, row.ours),
                       row.unit, difference(row), words(row.mark), row.remark);
}

std::string section_of(const Example& example) {
    std::string text =
        fmt::format("\n## {}\n\nSource: {}.\n\nInputs: {}.\n\n", example.title, example.source, example.inputs);
    text += "| quantity | printed | ours | unit | difference | printed value | remark |\n"
            "|---|---:|---:|---|---:|---|---|\n";
    for (const Row& row : example.rows) text += line_of(row);
    return text;
}

std::string not_covered_section(const std::vector<Example>& examples) {
    std::string text = "\n## Not covered\n\nLines of these sources that are not compared, and why.\n\n"
                       "| source | line | reason |\n|---|---|---|\n";
    for (const Example& example : examples) {
        for (const NotCovered& line : example.not_covered) {
            text += fmt::format("| {} | {} | {} |\n", example.title, line.line, line.reason);
        }
    }
    return text;
}

std::string summary(const std::vector<Example>& examples) {
    std::array<std::size_t, 3> count{};
    for (const Example& example : examples) {
        for (const Row& row : example.rows) ++count[static_cast<std::size_t>(row.mark)];
    }
    return fmt::format("{} values: {} seen in their source, {} from memory, {} common practice without a source. Each "
                       "agrees with ours within half a unit of the last printed digit, unless its remark says why "
                       "not.\n",
                       count[0] + count[1] + count[2], count[0], count[1], count[2]);
}

} // namespace

double printed_value(const Row& row) {
    return std::stod(row.printed);
}

double tolerance(const Row& row) {
    const Digits digits = digits_of(row.printed);
    return row.units_off * std::pow(10.0, digits.exponent - digits.decimals);
}

bool agrees(const Row& row) {
    // A value that lies on the half unit itself rounds either way.
    constexpr double on_the_half = 1.0 + 1e-9;
    return std::abs(row.ours - printed_value(row)) <= tolerance(row) * on_the_half;
}

void check(const Example& example) {
    for (const Row& row : example.rows) {
        INFO(example.source << "\n"
                            << row.quantity << ": printed " << row.printed << " " << row.unit << " (" << words(row.mark)
                            << "), ours " << shown(row, row.ours) << ", tolerance " << tolerance(row) << ". "
                            << row.remark);
        CHECK(agrees(row));
        CHECK((row.units_off == 0.5 || !row.remark.empty()));
    }
}

std::string guide(const std::vector<Example>& examples) {
    std::string text = "# Validation guide\n\nPublished results, ours, and the difference. Made by the test suite: "
                       "every row below is checked there.\n\n";
    text += summary(examples);
    for (const Example& example : examples) text += section_of(example);
    return text + not_covered_section(examples);
}

namespace {

std::vector<Example> all_examples() {
    std::vector<Example> all{beam_theory(),
                             combination_factors(),
                             lvl_floor(),
                             din_floor(),
                             glulam_hall(),
                             steel_floor_beam(),
                             lateral_buckling_of_a_beam(),
                             lipped_channel_section()};
    for (auto& table : timber_parameters()) all.push_back(std::move(table));
    for (auto& table : psi_factors()) all.push_back(std::move(table));
    return all;
}

} // namespace
} // namespace published

using namespace published;

TEST_CASE("the tolerance of a printed value is half a unit of its last digit") {
    CHECK(tolerance({Mark::seen, "", "4.03", 0, ""}) == Approx(0.005));
    CHECK(tolerance({Mark::seen, "", "701", 0, ""}) == Approx(0.5));
    CHECK(tolerance({Mark::seen, "", "7.15e11", 0, ""}) == Approx(0.005e11));
    CHECK(agrees({Mark::seen, "", "9.5", 9.457, "MPa"}));
    CHECK_FALSE(agrees({Mark::seen, "", "9.5", 9.449, "MPa"}));
    CHECK_FALSE(agrees({Mark::seen, "", "9.5", 9.551, "MPa"}));
}

TEST_CASE("the validation guide holds every published row and is written") {
    const std::vector<Example> examples = all_examples();
    std::size_t rows = 0;
    for (const Example& example : examples) {
        rows += example.rows.size();
        check(example);
    }
    CHECK(rows > 150);
    const std::string text = guide(examples);
    CHECK(text.find("nan") == std::string::npos);
    CHECK(text.find("inf") == std::string::npos);
    std::ofstream out(SPANLEDGER_VALIDATION_GUIDE, std::ios::binary);
    out << text;
    out.close();
    CHECK(out.good());
}
