// SPDX-License-Identifier: MIT
#include "spanledger/input/brief_schema.hpp"
#include "spanledger/writers/issue_record.hpp"

namespace spanledger {
namespace {

constexpr double kN_m2 = 1000.0; // of 1 N/mm2
constexpr double kN = 0.001;     // of 1 N
constexpr double m = 0.001;      // of 1 mm

/// The word that the brief uses for a choice: the schema lists them in the order of the enumeration.
template <class Choice> std::string choice_word(std::string_view section, std::string_view key, Choice choice) {
    const auto words = listed_words(key_definition(section_definition(section), key).choices);
    return words.at(static_cast<std::size_t>(choice));
}

std::vector<double> in_metres(const std::vector<double>& lengths) {
    std::vector<double> metres;
    for (const double length : lengths) metres.push_back(in_unit(length, m));
    return metres;
}

class BriefWriter {
public:
    BriefWriter(JsonText& json, const Brief& brief) : json_(&json), brief_(&brief) {}

    void write() {
        json_->open_object();
        practice();
        basis();
        catalogue();
        support();
        deck();
        limits();
        search();
        lists();
        json_->close_object();
    }

private:
    template <class T> void field(std::string_view name, const T& value) { json_->field(name, value); }

    void section(std::string_view name) {
        json_->key(name);
        json_->open_object();
    }

    void practice() {
        const Practice& practice = brief_->practice;
        section("practice");
        field("name", practice.name);
        field("number", practice.number);
        field("revision", practice.revision);
        field("title", practice.title);
        field("prepared", practice.prepared);
        field("checked", practice.checked);
        field("date", practice.date);
        field("notes", practice.notes);
        field("replaces", practice.replaces);
        json_->close_object();
    }

    void basis() {
        const BasisChoice& basis = brief_->basis;
        section("basis");
        field("code", basis.code);
        field("parameters", basis.parameters);
        field("combination", basis.combination);
        field("service_class", basis.service_class);
        field("wet_on_installation", basis.wet_on_installation);
        field("load_sharing", basis.load_sharing);
        field("utilisation_cap", basis.utilisation_cap);
        field("self_weight", basis.self_weight);
        field("shear_deflection", basis.shear_deflection);
        field("concentrated_near_support", basis.concentrated_near_support);
        field("uniform_near_support", basis.uniform_near_support);
        field("partitions_creep", choice_word("basis", "partitions_creep", basis.partitions_creep));
        field("lateral_curves", choice_word("basis", "lateral_curves", basis.lateral_curves));
        json_->close_object();
    }

    void catalogue() {
        section("catalogue");
        field("classes", brief_->catalogue.classes);
        field("sections", brief_->catalogue.sections);
        field("series", brief_->catalogue.series);
        field("loads", brief_->catalogue.loads);
        json_->close_object();
    }

    void support() {
        const Support& support = brief_->support;
        section("support");
        field("arrangement", choice_word("support", "arrangement", support.arrangement));
        field("bearing_mm", support.bearing);
        field("root", support.root_fixed ? std::optional<std::string>("fixed") : std::nullopt);
        field("compression_edge", choice_word("support", "compression_edge", support.compression_edge));
        field("restraint_spacing_mm", support.restraint_spacing);
        field("load_position", choice_word("support", "load_position", support.load_position));
        field("load_height_mm", support.load_height);
        field("web_at_support", choice_word("support", "web_at_support", support.web_at_support));
        json_->close_object();
    }

    void deck() {
        section("deck");
        field("name", brief_->deck.name);
        field("max_spacing_mm", brief_->deck.max_spacing);
        field("stiffness_Nmm2_per_m", brief_->deck.stiffness);
        json_->close_object();
    }

    void deflection(std::string_view name, const std::optional<DeflectionLimit>& limit) {
        json_->key(name);
        if (!limit) return json_->null();
        json_->open_object();
        field("ratio", limit->ratio);
        field("max_mm", limit->max_mm);
        json_->close_object();
    }

    void limits() {
        const LimitsAsked& limits = brief_->limits;
        section("limits");
        deflection("variable_deflection", limits.variable_deflection);
        deflection("instantaneous_deflection", limits.instantaneous_deflection);
        deflection("final_deflection", limits.final_deflection);
        field("camber_mm", limits.camber);
        frequency();
        field("unit_load_deflection_mm", limits.unit_load_deflection);
        vibration();
        json_->close_object();
    }

    void frequency() {
        json_->key("frequency");
        const std::optional<FrequencyLimit>& frequency = brief_->limits.frequency;
        if (!frequency) return json_->null();
        json_->open_object();
        field("min_hz", frequency->min_hz);
        field("variable_share", frequency->variable_share);
        json_->close_object();
    }

    void vibration() {
        json_->key("vibration");
        const std::optional<VibrationLimit>& vibration = brief_->limits.vibration;
        if (!vibration) return json_->null();
        json_->open_object();
        field("rule", choice_word("limits.vibration", "rule", vibration->rule));
        field("floor_width_m", in_unit(vibration->floor_width, m));
        field("strutting", vibration->strutting);
        field("a_mm", vibration->a_mm);
        field("b", vibration->b);
        field("damping", vibration->damping);
        field("kamp", vibration->kamp);
        json_->close_object();
    }

    void search() {
        section("search");
        field("min_clear_span_mm", brief_->search.min_clear_span);
        field("max_clear_span_mm", brief_->search.max_clear_span);
        field("step_mm", brief_->search.step);
        field("rounding", choice_word("search", "rounding", brief_->search.rounding));
        json_->close_object();
    }

    void psi(const std::string& prefix, const Psi& psi) {
        field(prefix + "psi0", psi.psi0);
        field(prefix + "psi1", psi.psi1);
        field(prefix + "psi2", psi.psi2);
    }

    void load(const LoadClass& load) {
        json_->open_object();
        field("name", load.name);
        field("category", load.category);
        field("permanent_kN_m2", in_unit(load.permanent, kN_m2));
        field("permanent_partitions_kN_m2", in_unit(load.permanent_partitions, kN_m2));
        field("variable_kN_m2", in_unit(load.variable, kN_m2));
        field("partitions_kN_m2", in_unit(load.partitions, kN_m2));
        field("duration", choice_word("load", "duration", load.duration));
        psi("", load.psi);
        field("snow_kN_m2", in_unit(load.snow, kN_m2));
        field("snow_duration", choice_word("load", "snow_duration", load.snow_duration));
        psi("snow_", load.snow_psi);
        field("concentrated_kN", in_unit(load.concentrated, kN));
        field("concentrated_share", load.concentrated_share);
        field("concentrated_duration", choice_word("load", "concentrated_duration", load.concentrated_duration));
        field("concentrated_in_deflection", load.concentrated_in_deflection);
        json_->close_object();
    }

    void members(const MembersEntry& entry) {
        json_->open_object();
        field("name", entry.name);
        field("class", entry.material_class);
        field("series", entry.series.empty() ? std::nullopt : std::optional(entry.series));
        field("sizes", entry.sizes);
        field("plies", entry.plies);
        field("plies_fixed_together", entry.plies_fixed_together);
        field("stock_lengths_m", in_metres(entry.stock_lengths));
        json_->close_object();
    }

    void table(const TableRequest& table) {
        json_->open_object();
        field("name", table.name);
        field("kind", choice_word("table", "kind", table.kind));
        field("members", table.members);
        field("spacings_mm", table.spacings);
        field("loads", table.loads);
        field("spans_m", in_metres(table.spans));
        json_->close_object();
    }

    void lists() {
        json_->key("load");
        json_->open_list();
        for (const LoadClass& one : brief_->loads) load(one);
        json_->close_list();
        json_->key("members");
        json_->open_list();
        for (const MembersEntry& one : brief_->members) members(one);
        json_->close_list();
        json_->key("table");
        json_->open_list();
        for (const TableRequest& one : brief_->tables) table(one);
        json_->close_list();
    }

    JsonText* json_;
    const Brief* brief_;
};

} // namespace

void write_brief(JsonText& json, const Brief& brief) {
    BriefWriter(json, brief).write();
}

} // namespace spanledger
