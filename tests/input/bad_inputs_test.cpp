// SPDX-License-Identifier: MIT
#include "spanledger/input/brief_reader.hpp"
#include "spanledger/input/brief_schema.hpp"
#include "spanledger/input/inputs.hpp"
#include "spanledger/input/toml_text.hpp"

#include <catch2/catch.hpp>
#include <fmt/format.h>

#include <algorithm>
#include <filesystem>
#include <fstream>
#include <sstream>

// Broken briefs and catalogue files are in tests/bad_inputs, each beside the exact text that the user must see.

using namespace spanledger;
namespace fs = std::filesystem;

namespace {

std::string content_of(const fs::path& file) {
    std::ifstream in(file, std::ios::binary);
    REQUIRE(in);
    return {std::istreambuf_iterator<char>(in), {}};
}

std::string diagnostics_of(const fs::path& brief) {
    Diagnostics diagnostics;
    const auto inputs = read_inputs(brief.string(), diagnostics);
    CHECK(inputs.has_value() == !diagnostics.has_errors());
    std::ostringstream out;
    report(diagnostics, out);
    std::string text = out.str();
    const std::string folder = brief.parent_path().string() + "/";
    for (std::size_t at = text.find(folder); at != std::string::npos; at = text.find(folder, at)) {
        text.erase(at, folder.size());
    }
    return text;
}

std::vector<fs::path> cases() {
    std::vector<fs::path> found;
    for (const auto& entry : fs::directory_iterator(fs::path(SPANLEDGER_TEST_DATA) / "bad_inputs")) {
        if (entry.path().extension() == ".expected") {
            found.push_back(entry.path());
        }
    }
    std::sort(found.begin(), found.end());
    return found;
}

bool is_numeric(const KeyDefinition& key) {
    return key.kind == ValueKind::number || key.kind == ValueKind::whole_number || key.kind == ValueKind::numbers;
}

/// A key and its value as typed, in a section.
struct Line {
    std::string section;
    std::string key;
    std::string value;
};

/// A brief that is right; `changed` replaces or adds a line. Each key stands on a line of its own, which is returned.
struct BriefText {
    std::string text;
    std::size_t changed_line = 0;
};

std::vector<Line> right_lines(const Line& changed) {
    const std::string rule = changed.key == "kamp" || changed.key == "damping" ? "\"uk\"" : "\"recommended\"";
    std::vector<Line> lines{
        {"practice", "number", "\"T-1\""},
        {"practice", "revision", "\"A\""},
        {"practice", "date", "2026-01-31"},
        {"basis", "service_class", "1"},
        {"support", "bearing_mm", "50"},
        {"deck", "stiffness_Nmm2_per_m", "2e9"},
        {"limits", "instantaneous_deflection", "{ratio = 300}"},
        {"limits", "final_deflection", "{ratio = 250}"},
        {"limits", "camber_mm", "0"},
        {"limits.deflection", "ratio", "360"},
        {"limits.frequency", "min_hz", "8"},
        {"limits.vibration", "rule", rule},
        {"limits.vibration", "floor_width_m", "4"},
        {"limits.vibration", "strutting", "true"},
        {"search", "step_mm", "10"},
        {"load", "name", "\"Floor\""},
        {"load", "category", "\"A\""},
        {"load", "variable_kN_m2", "1.5"},
        {"load", "concentrated_kN", "2"},
        {"load", "concentrated_share", "1"},
        {"load", "snow_kN_m2", "0.6"},
        {"members", "name", "\"Joists\""},
        {"members", "class", "\"C24\""},
        {"members", "sizes", "[\"47x220\"]"},
        {"table", "kind", "\"permissible span\""},
        {"table", "members", "\"Joists\""},
        {"table", "spacings_mm", "[400]"},
        {"table", "loads", "\"Floor\""},
    };
    if (rule == "\"recommended\"") {
        lines.push_back({"limits.vibration", "a_mm", "1.5"});
        lines.push_back({"limits.vibration", "b", "120"});
    }
    const auto same = [&](const Line& line) { return line.section == changed.section && line.key == changed.key; };
    if (const auto found = std::find_if(lines.begin(), lines.end(), same); found != lines.end()) {
        found->value = changed.value;
    } else {
        lines.push_back(changed);
    }
    return lines;
}

BriefText brief_with(const Line& changed) {
    const std::vector<Line> lines = right_lines(changed);
    BriefText brief;
    for (const SectionDefinition& section : brief_schema()) {
        const std::string inlined_key =
            section.name == "limits.deflection" ? "limits.variable_deflection" : std::string(section.name);
        brief.text += section.inlined ? fmt::format("[{}]\n", inlined_key) : section_header(section) + "\n";
        for (const Line& line : lines) {
            if (line.section == section.name) {
                brief.text += fmt::format("{} = {}\n", line.key, line.value);
                if (line.section == changed.section && line.key == changed.key) {
                    brief.changed_line =
                        static_cast<std::size_t>(std::count(brief.text.begin(), brief.text.end(), '\n'));
                }
            }
        }
    }
    return brief;
}

/// Reads a brief against the built-in catalogue, which is loaded once for all of them.
Diagnostics problems_of(const std::string& text) {
    Diagnostics diagnostics;
    static const Catalogue catalogue = load_catalogue({}, "recommended", "", diagnostics);
    const toml::Document document = toml::parse("brief.toml", text, diagnostics);
    BriefSections sections(document, diagnostics);
    Brief brief;
    brief.practice = read_practice(sections.practice);
    brief.basis = read_basis(sections.basis);
    brief.support = read_support(sections.support);
    brief.deck = read_deck(sections.deck);
    brief.limits = read_limits(sections.limits);
    brief.search = read_search(sections.search);
    brief.loads = read_loads(sections.loads, catalogue, diagnostics);
    brief.members = read_members(sections.members);
    brief.tables = read_tables(sections.tables, brief);
    check_consistency(sections, brief, catalogue);
    return diagnostics;
}

/// Errors at the changed line.
std::size_t errors_at_line(const BriefText& brief) {
    const Diagnostics diagnostics = problems_of(brief.text);
    const auto& all = diagnostics.all();
    return static_cast<std::size_t>(std::count_if(all.begin(), all.end(), [&](const Diagnostic& diagnostic) {
        return diagnostic.severity == Severity::error && diagnostic.place.line == brief.changed_line;
    }));
}

/// Runs `check` for every numeric key of the schema.
template <class Check> std::size_t for_each_numeric_key(Check&& check) {
    std::size_t count = 0;
    for (const SectionDefinition& section : brief_schema()) {
        for (const KeyDefinition& key : section.keys) {
            if (is_numeric(key)) {
                ++count;
                check(std::string(section.name), key);
            }
        }
    }
    return count;
}

} // namespace

TEST_CASE("Every broken input gives the text that stands beside it") {
    const auto found = cases();
    REQUIRE(found.size() >= 45);
    for (const fs::path& expected : found) {
        fs::path brief = expected;
        brief.replace_extension(".toml");
        INFO(brief.filename().string());
        CHECK(diagnostics_of(brief) == content_of(expected));
    }
}

TEST_CASE("Every error of the broken inputs says what to type instead") {
    for (const fs::path& expected : cases()) {
        fs::path brief = expected;
        brief.replace_extension(".toml");
        Diagnostics diagnostics;
        (void)read_inputs(brief.string(), diagnostics);
        INFO(brief.filename().string());
        REQUIRE_FALSE(diagnostics.all().empty());
        for (const Diagnostic& diagnostic : diagnostics.all()) {
            CHECK_FALSE(diagnostic.hint.empty());
            CHECK(diagnostic.code.find_first_not_of("abcdefghijklmnopqrstuvwxyz0123456789-") == std::string::npos);
        }
    }
}

TEST_CASE("Every numeric key takes a right value") {
    const std::size_t count = for_each_numeric_key([](const std::string& section, const KeyDefinition& key) {
        for (const std::string& value : {example_number(key), fmt::format("\"{}\"", example_number(key))}) {
            const BriefText brief = brief_with({section, std::string(key.name), value});
            INFO(brief.text);
            CHECK(errors_at_line(brief) == 0);
        }
    });
    CHECK(count >= 30);
}

TEST_CASE("Every numeric key refuses what is no finite decimal number") {
    const std::vector<std::string> refused{"nan",        "-nan",     "+nan",     "inf",        "-inf",       "+inf",
                                           "1e400",      "-1e400",   "0x10",     "0o17",       "0b11",       "4mm",
                                           "1,5",        "",         "\"\"",     "\" \"",      "\"nan\"",    "\"inf\"",
                                           "\"1e400\"",  "\"0x10\"", "\"1,5\"",  "\"4 kg x\"", "\"4 \\t5\"", "true",
                                           "2026-01-31", "{}",       "\"four\"", "--5",        ".5",         "012"};
    for_each_numeric_key([&](const std::string& section, const KeyDefinition& key) {
        for (const std::string& value : refused) {
            const BriefText brief = brief_with({section, std::string(key.name), value});
            INFO(section << "." << key.name << " = " << value);
            CHECK(errors_at_line(brief) == 1);
        }
    });
}

TEST_CASE("Every numeric key refuses a negative value where it is impossible") {
    std::size_t signed_keys = 0;
    for_each_numeric_key([&](const std::string& section, const KeyDefinition& key) {
        const BriefText brief = brief_with({section, std::string(key.name), "-0.5"});
        INFO(section << "." << key.name);
        CHECK(errors_at_line(brief) == (key.hard.least < 0.0 ? 0 : 1));
        signed_keys += key.hard.least < 0.0 ? 1 : 0;
    });
    CHECK(signed_keys == 1); // the height of a load above the shear centre
}

TEST_CASE("Every item of a list of numbers is judged") {
    for_each_numeric_key([&](const std::string& section, const KeyDefinition& key) {
        if (key.kind == ValueKind::numbers) {
            for (const char* value : {"[1.0, nan]", "[1.0, -1]", "[1.0, \"\"]", "[1.0, [400]]", "[1.0, 1e99]"}) {
                INFO(section << "." << key.name << " = " << value);
                CHECK(errors_at_line(brief_with({section, std::string(key.name), value})) >= 1);
            }
        }
    });
}

TEST_CASE("Values beyond the ends of the possible range are refused") {
    for_each_numeric_key([&](const std::string& section, const KeyDefinition& key) {
        const std::string above = fmt::format("{}", key.hard.greatest * 1.001 + 1e-6);
        INFO(section << "." << key.name << " = " << above);
        CHECK(errors_at_line(brief_with({section, std::string(key.name), above})) == 1);
    });
}
