// SPDX-License-Identifier: MIT
#include "spanledger/input/brief_schema.hpp"
#include "spanledger/input/builtin_files.hpp"
#include "spanledger/input/input_reference.hpp"
#include "spanledger/input/inputs.hpp"

#include <catch2/catch.hpp>

#include <cstdlib>
#include <set>
#include <sstream>

using namespace spanledger;

namespace {

const std::string practice = "[practice]\nnumber = \"T-1\"\nrevision = \"A\"\n";
const std::string dated = practice + "date = 2026-01-31\n";
const std::string load = "[[load]]\nname = \"Floor\"\ncategory = \"A\"\nvariable_kN_m2 = 1.5\n";
const std::string deflection = "[limits]\nfinal_deflection = {ratio = 250}\n";

Inputs read(const std::string& text) {
    Diagnostics diagnostics;
    const auto inputs = read_inputs_from_text("brief.toml", text, diagnostics);
    std::ostringstream out;
    report(diagnostics, out);
    INFO(out.str());
    REQUIRE(inputs.has_value());
    return *inputs;
}

Brief read_brief(const std::string& text) {
    return read(text).brief;
}

/// Sets SOURCE_DATE_EPOCH for as long as it lives.
class Epoch {
public:
    explicit Epoch(const char* seconds) {
        if (const char* before = std::getenv(name_)) {
            before_ = before;
        }
        seconds == nullptr ? unsetenv(name_) : setenv(name_, seconds, 1);
    }
    ~Epoch() { before_ ? setenv(name_, before_->c_str(), 1) : unsetenv(name_); }
    Epoch(const Epoch&) = delete;
    Epoch& operator=(const Epoch&) = delete;

private:
    static constexpr const char* name_ = "SOURCE_DATE_EPOCH";
    std::optional<std::string> before_;
};

} // namespace

TEST_CASE("The starter brief reads without any message") {
    Diagnostics diagnostics;
    const auto inputs = read_inputs_from_text("brief.toml", builtin_file("brief.toml"), diagnostics);
    std::ostringstream out;
    report(diagnostics, out);
    CHECK(out.str().empty());
    REQUIRE(inputs.has_value());
    const Brief& brief = inputs->brief;
    REQUIRE(brief.loads.size() >= 3);
    CHECK(brief.loads[0].permanent == 0.00025); // the dead-load bands of dwellings
    CHECK(brief.loads[1].permanent == 0.00050);
    CHECK(brief.loads[2].permanent == 0.00125);
    REQUIRE_FALSE(brief.tables.empty());
    CHECK(brief.tables[0].spacings == std::vector<double>{400.0, 450.0, 600.0});
    CHECK(brief.deck.stiffness == 1.95e9);
    CHECK(brief.support.compression_edge == CompressionEdge::held);
}

TEST_CASE("A short brief has the defaults that the headers state") {
    const Brief brief = read_brief(dated + load);
    const Brief defaults;
    CHECK(brief.basis.code == "european");
    CHECK(brief.basis.parameters == defaults.basis.parameters);
    CHECK(brief.basis.combination == defaults.basis.combination);
    CHECK(brief.basis.service_class == 1);
    CHECK(brief.basis.utilisation_cap == 1.0);
    CHECK(brief.basis.self_weight);
    CHECK_FALSE(brief.basis.load_sharing);
    CHECK_FALSE(brief.basis.wet_on_installation);
    CHECK_FALSE(brief.basis.shear_deflection);
    CHECK_FALSE(brief.basis.concentrated_near_support);
    CHECK_FALSE(brief.basis.uniform_near_support);
    CHECK(brief.basis.partitions_creep == PartitionsCreep::permanent);
    CHECK(brief.basis.lateral_curves == LateralCurves::rolled_sections);
    CHECK(brief.support.arrangement == Arrangement::single_span);
    CHECK(brief.support.bearing == 50.0);
    CHECK_FALSE(brief.support.root_fixed);
    CHECK(brief.support.compression_edge == CompressionEdge::free);
    CHECK(brief.support.load_position == LoadPosition::top);
    CHECK(brief.support.web_at_support == WebAtSupport::seated);
    CHECK_FALSE(brief.support.restraint_spacing.has_value());
    CHECK(brief.search.step == 10.0);
    CHECK(brief.search.rounding == Rounding::down);
    CHECK_FALSE(brief.search.min_clear_span.has_value());
    CHECK_FALSE(brief.limits.final_deflection.has_value());
    CHECK(brief.tables.empty());
}

TEST_CASE("Quantities are read in the unit of their key, or in their own") {
    const Brief brief = read_brief(
        dated + "[support]\nbearing_mm = \"7.5 cm\"\nrestraint_spacing_mm = \"1.2 m\"\nload_position = \"centroid\"\n"
                "[deck]\nname = \"board\"\nmax_spacing_mm = 600\nstiffness_Nmm2_per_m = \"2 kN m2/m\"\n"
                "[limits]\ninstantaneous_deflection = {ratio = 333, max_mm = 14}\ncamber_mm = 0\n"
                "vibration = {rule = \"uk\", floor_width_m = 4.5, strutting = true, kamp = 1.2}\n"
                "[search]\nmin_clear_span_mm = 1000\nmax_clear_span_mm = \"8 m\"\nstep_mm = 50\n"
                "[[load]]\nname = \"Floor\"\ncategory = \"A\"\npermanent_kN_m2 = \"500 N/m2\"\nvariable_kN_m2 = 1.5\n"
                "partitions_kN_m2 = 0.5\nconcentrated_kN = 2\nconcentrated_share = 0.6\n");
    CHECK(brief.support.bearing == 75.0);
    CHECK(brief.support.restraint_spacing == 1200.0);
    CHECK(brief.support.load_position == LoadPosition::centroid);
    CHECK(brief.deck.max_spacing == 600.0);
    CHECK(brief.deck.stiffness == 2e9);
    CHECK(brief.limits.instantaneous_deflection->ratio == 333.0);
    CHECK(brief.limits.instantaneous_deflection->max_mm == 14.0);
    CHECK(brief.limits.vibration->floor_width == 4500.0);
    CHECK(brief.limits.vibration->strutting);
    CHECK(brief.limits.vibration->kamp == 1.2);
    CHECK_FALSE(brief.limits.vibration->damping.has_value());
    CHECK(brief.search.min_clear_span == 1000.0);
    CHECK(brief.search.max_clear_span == 8000.0);
    CHECK(brief.search.step == 50.0);
    CHECK(brief.loads[0].permanent == 0.0005);
    CHECK(brief.loads[0].variable == 0.0015);
    CHECK(brief.loads[0].partitions == 0.0005);
    CHECK(brief.loads[0].concentrated == 2000.0);
    CHECK(brief.loads[0].concentrated_share == 0.6);
}

TEST_CASE("Duration and psi come from the load category of the parameter set in force") {
    const std::string roof = "[[load]]\nname = \"Roof\"\ncategory = \"H\"\nvariable_kN_m2 = 0.6\nsnow_kN_m2 = 0.8\n";
    const auto recommended = read_brief(dated + load + roof).loads;
    CHECK(recommended[0].duration == Duration::medium_term);
    CHECK(recommended[0].concentrated_duration == Duration::medium_term);
    CHECK(recommended[0].psi.psi0 == 0.7);
    CHECK(recommended[0].psi.psi1 == 0.5);
    CHECK(recommended[0].psi.psi2 == 0.3);
    CHECK(recommended[1].duration == Duration::short_term);
    CHECK(recommended[1].psi.psi0 == 0.0); // EN 1990 Table A1.1, category H
    CHECK(recommended[1].snow_duration == Duration::short_term);
    CHECK(recommended[1].snow_psi.psi0 == 0.5);
    const auto uk = read_brief(dated + "[basis]\nparameters = \"uk\"\n" + load + roof).loads;
    CHECK(uk[1].psi.psi0 == 0.7); // UK national annex to EN 1990, Table NA.A1.1, category H
}

TEST_CASE("Durations and psi of the brief go before those of the category") {
    const auto loads = read_brief(dated + load + "duration = \"long\"\npsi2 = 0.4\nsnow_kN_m2 = 1\nsnow_psi2 = 0.2\n" +
                                  "snow_duration = \"medium\"\nconcentrated_kN = 1\nconcentrated_share = 1\n" +
                                  "concentrated_duration = \"instantaneous\"\nconcentrated_in_deflection = true\n")
                           .loads;
    CHECK(loads[0].duration == Duration::long_term);
    CHECK(loads[0].psi.psi0 == 0.7);
    CHECK(loads[0].psi.psi2 == 0.4);
    CHECK(loads[0].snow_duration == Duration::medium_term);
    CHECK(loads[0].snow_psi.psi2 == 0.2);
    CHECK(loads[0].concentrated_duration == Duration::instantaneous);
    CHECK(loads[0].concentrated_in_deflection);
}

TEST_CASE("Lists take a single value too, and tables have names") {
    const Brief brief = read_brief(
        dated + deflection + load +
        "[[members]]\nname = \"J\"\nclass = \"C24\"\nsizes = \"2/47x220\"\nstock_lengths_m = 6.0\n"
        "[[members]]\nname = \"K\"\nclass = \"C16\"\nseries = \"UK 47\"\nstock_lengths_m = [4.8, \"6 m\"]\nplies = 2\n"
        "plies_fixed_together = true\n"
        "[[table]]\nkind = \"permissible span\"\nmembers = \"J\"\nspacings_mm = 400\nloads = \"Floor\"\n"
        "[[table]]\nkind = \"smallest section\"\nmembers = [\"J\", \"K\"]\nspacings_mm = [400, \"0.6 m\"]\n"
        "loads = [\"Floor\"]\nspans_m = [3, 4.5]\n");
    CHECK(brief.members[0].sizes == std::vector<std::string>{"2/47x220"});
    CHECK(brief.members[0].stock_lengths == std::vector<double>{6000.0});
    CHECK(brief.members[1].stock_lengths == std::vector<double>{4800.0, 6000.0});
    CHECK(brief.members[1].plies == 2);
    CHECK(brief.members[1].plies_fixed_together);
    CHECK(brief.tables[0].name == "Table 1");
    CHECK(brief.tables[0].spacings == std::vector<double>{400.0});
    CHECK(brief.tables[1].name == "Table 2");
    CHECK(brief.tables[1].kind == TableKind::smallest_section);
    CHECK(brief.tables[1].members == std::vector<std::string>{"J", "K"});
    CHECK(brief.tables[1].spacings == std::vector<double>{400.0, 600.0});
    CHECK(brief.tables[1].spans == std::vector<double>{3000.0, 4500.0});
}

TEST_CASE("A cantilever whose root is fixed is read") {
    const Brief brief =
        read_brief(dated + deflection + "[support]\narrangement = \"cantilever\"\nroot = \"fixed\"\n" + load);
    CHECK(brief.support.arrangement == Arrangement::cantilever);
    CHECK(brief.support.root_fixed);
}

TEST_CASE("A practice's own catalogue file is found beside the brief") {
    Diagnostics diagnostics;
    (void)read_inputs_from_text("/no/such/folder/brief.toml",
                                dated + "[catalogue]\nclasses = \"own.csv\"\n" + deflection + load, diagnostics);
    REQUIRE(diagnostics.all().size() == 1);
    CHECK(diagnostics.all()[0].place.file == "/no/such/folder/own.csv");
}

TEST_CASE("The date of an issue is its own, or that of SOURCE_DATE_EPOCH, never that of the clock") {
    {
        const Epoch epoch("0");
        CHECK(read_brief(dated + load).practice.date == "2026-01-31");
        CHECK(read_brief(practice + "date = \"2024-02-29\"\n" + load).practice.date == "2024-02-29");
        CHECK(read_brief(practice + load).practice.date == "1970-01-01");
    }
    {
        const Epoch epoch("1709164800"); // 29 February 2024, 00:00 UTC
        CHECK(read_brief(practice + load).practice.date == "2024-02-29");
    }
    const Epoch epoch(nullptr);
    Diagnostics diagnostics;
    const auto inputs = read_inputs_from_text("brief.toml", practice + deflection + load, diagnostics);
    REQUIRE(inputs.has_value());
    CHECK(inputs->brief.practice.date.empty());
    REQUIRE(diagnostics.all().size() == 1);
    CHECK(diagnostics.all()[0].code == "no-date");
}

TEST_CASE("A wrong SOURCE_DATE_EPOCH is refused") {
    for (const char* value : {"", "-1", "1e9", "tomorrow", "99999999999999999999"}) {
        const Epoch epoch(value);
        Diagnostics diagnostics;
        CHECK_FALSE(read_inputs_from_text("brief.toml", practice + deflection + load, diagnostics).has_value());
        REQUIRE(diagnostics.all().size() == 1);
        CHECK(diagnostics.all()[0].code == "bad-date");
    }
}

TEST_CASE("Slender joists are unusual unless held and strutted") {
    const std::string slender = load + "[[members]]\nname = \"J\"\nclass = \"C24\"\nsizes = \"38x235\"\n";
    const auto warnings = [&](bool held, bool strutted) {
        Diagnostics diagnostics;
        (void)read_inputs_from_text("brief.toml",
                                    dated + deflection + "vibration = {rule = \"uk\", floor_width_m = 4, strutting = " +
                                        (strutted ? "true" : "false") + "}\n[deck]\nstiffness_Nmm2_per_m = 2e9\n" +
                                        "[support]\ncompression_edge = \"" + (held ? "held" : "free") + "\"\n" +
                                        slender,
                                    diagnostics);
        return diagnostics.all().size();
    };
    CHECK(warnings(true, true) == 0);
    CHECK(warnings(true, false) == 1);
    CHECK(warnings(false, true) == 1);
    CHECK(warnings(false, false) == 1);
}

TEST_CASE("The schema is consistent") {
    for (const SectionDefinition& section : brief_schema()) {
        std::set<std::string_view> names;
        for (const KeyDefinition& key : section.keys) {
            INFO(section.name << "." << key.name);
            CHECK(names.insert(key.name).second);
            CHECK_FALSE(key.meaning.empty());
            const bool numeric =
                key.kind == ValueKind::number || key.kind == ValueKind::whole_number || key.kind == ValueKind::numbers;
            CHECK(key.hard.stated() == numeric);
            if (key.usual.stated()) {
                CHECK(key.usual.least >= key.hard.least);
                CHECK(key.usual.greatest <= key.hard.greatest);
            }
            if (numeric && !key.measure.unit.empty()) {
                CHECK(unit_factor(key.measure.unit, key.measure.dimension).has_value());
            }
            if (numeric && !key.fallback.empty()) {
                const auto fallback = read_number(key.fallback);
                REQUIRE(fallback.has_value());
                CHECK(*fallback >= (key.usual.stated() ? key.usual.least : key.hard.least));
                CHECK(*fallback <= (key.usual.stated() ? key.usual.greatest : key.hard.greatest));
            }
            CHECK((key.kind == ValueKind::choice || key.kind == ValueKind::choice_or_file) == !key.choices.empty());
            CHECK((key.kind == ValueKind::table) == !key.table.empty());
        }
    }
}

TEST_CASE("The input reference names every key, choice and both ranges") {
    const std::string reference = input_reference();
    for (const SectionDefinition& section : brief_schema()) {
        const std::string heading = section.inlined ? std::string(section.name) : section_header(section);
        CHECK(reference.find("\n## " + heading + "\n") != std::string::npos);
        for (const KeyDefinition& key : section.keys) {
            CHECK(reference.find("| `" + std::string(key.name) + "` |") != std::string::npos);
        }
    }
    CHECK(reference.find("| `bearing_mm` | number, mm | 50 | 10 to 1000 mm | 35 to 300 mm |") != std::string::npos);
    CHECK(reference.find("\"two equal spans\" (not covered yet)") != std::string::npos);
    CHECK(reference.find("\"permissible span\", \"permissible load\", \"utilisation\", \"smallest section\"") !=
          std::string::npos);
}
