// SPDX-License-Identifier: MIT
#include "spanledger/input/brief_reader.hpp"

#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <charconv>
#include <chrono>
#include <cstdlib>
#include <optional>

namespace spanledger {

namespace {

std::vector<std::string> section_names() {
    std::vector<std::string> names;
    for (const SectionDefinition& section : brief_schema()) {
        if (!section.inlined) {
            names.emplace_back(section.name);
        }
    }
    return names;
}

const toml::Node* table_of(const toml::Document& document, std::string_view section) {
    const toml::Node* node = toml::find(document.root(), section);
    return node != nullptr && node->kind == toml::NodeKind::table ? node : nullptr;
}

std::vector<SectionReader> readers_of(const toml::Document& document, std::string_view section,
                                      Diagnostics& diagnostics) {
    std::vector<SectionReader> readers;
    if (const toml::Node* single = table_of(document, section)) { // reported, but its names count as known
        readers.emplace_back(document, single, section, diagnostics);
    }
    const toml::Node* node = toml::find(document.root(), section);
    if (node != nullptr && node->kind == toml::NodeKind::array) {
        for (const toml::Node& item : node->children) {
            if (item.kind == toml::NodeKind::table) {
                readers.emplace_back(document, &item, section, diagnostics);
            }
        }
    }
    return readers;
}

bool is_list_of_tables(const toml::Node& node) {
    return node.kind == toml::NodeKind::array &&
           std::all_of(node.children.begin(), node.children.end(),
                       [](const toml::Node& item) { return item.kind == toml::NodeKind::table; });
}

void check_root_entry(const toml::Document& document, const toml::Node& node, Diagnostics& diagnostics) {
    const std::vector<std::string> names = section_names();
    const Place place = document.place(node.key_mark);
    if (std::find(names.begin(), names.end(), node.key) == names.end()) {
        const bool section = node.kind == toml::NodeKind::table || is_list_of_tables(node);
        diagnostics.error(section ? "unknown-section" : "unknown-key", place,
                          section ? fmt::format("a brief has no section '{}'", node.key)
                                  : fmt::format("'{}' stands outside any section", node.key),
                          section ? did_you_mean(node.key, names) : unknown_key_hint(node.key, names));
        return;
    }
    const SectionDefinition& section = section_definition(node.key);
    const bool fits = section.several ? is_list_of_tables(node) : node.kind == toml::NodeKind::table;
    if (!fits && node.kind != toml::NodeKind::unread) {
        diagnostics.error("wrong-kind", place,
                          fmt::format("'{}' is {} of the brief, written {}", node.key,
                                      section.several ? "one of several sections" : "a section",
                                      section_header(section)),
                          fmt::format("write {} on a line of its own, and its keys below", section_header(section)));
    }
}

void check_sections(const toml::Document& document, Diagnostics& diagnostics) {
    for (const toml::Node& node : document.root().children) {
        check_root_entry(document, node, diagnostics);
    }
    for (const SectionDefinition& section : brief_schema()) {
        const std::string name(section.name);
        if (section.required && toml::find(document.root(), name) == nullptr && !document.header_lost()) {
            diagnostics.error("missing-section", Place{.file = document.file()},
                              fmt::format("the brief has no section {}", section_header(section)),
                              name == "practice" ? "add [practice] with number = \"...\" and revision = \"...\""
                                                 : "add [[load]] with name, category and at least one load, such as "
                                                   "variable_kN_m2 = 1.5");
        }
    }
}

std::optional<std::string> date_of_epoch(std::string_view seconds_text) {
    long long seconds = 0;
    constexpr long long end_of_9999 = 253402300799;
    const auto [end, error] = std::from_chars(seconds_text.data(), seconds_text.data() + seconds_text.size(), seconds);
    if (error != std::errc() || end != seconds_text.data() + seconds_text.size() || seconds < 0 ||
        seconds > end_of_9999) {
        return std::nullopt;
    }
    const std::chrono::sys_days days{std::chrono::days(seconds / 86400)};
    const std::chrono::year_month_day day{days};
    return fmt::format("{:04}-{:02}-{:02}", static_cast<int>(day.year()), static_cast<unsigned>(day.month()),
                       static_cast<unsigned>(day.day()));
}

std::string date_of_issue(SectionReader& section) {
    if (section.given("date")) {
        return section.date("date");
    }
    const char* const epoch = std::getenv("SOURCE_DATE_EPOCH");
    if (epoch == nullptr) {
        section.warning("date", "no-date", "the issue has no date",
                        "add date = 2026-01-31 (its own date) under [practice], or set SOURCE_DATE_EPOCH");
        return {};
    }
    const auto day = date_of_epoch(epoch);
    if (!day) {
        section.error("date", "bad-date", fmt::format("SOURCE_DATE_EPOCH is '{}', no number of seconds", epoch),
                      "set it to whole seconds since 1970-01-01 UTC, or add date = 2026-01-31 under [practice]");
    }
    return day.value_or("");
}

/// Number and revision name the files of an issue.
std::string file_safe(SectionReader& section, std::string_view key) {
    std::string text = section.text(key);
    const auto letter_or_digit = [](char c) {
        return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z') || (c >= '0' && c <= '9');
    };
    const bool safe = std::all_of(text.begin(), text.end(),
                                  [&](char c) { return letter_or_digit(c) || c == '.' || c == '_' || c == '-'; });
    constexpr std::size_t longest = 60;
    if (text.size() > longest) {
        section.value_error(key, "bad-text", fmt::format("{} has {} characters", key, text.size()),
                            fmt::format("shorten it to {}: it names the files of the issue", longest));
    } else if (!text.empty() && (!safe || !letter_or_digit(text.front()))) {
        section.value_error(key, "bad-text", fmt::format("{} '{}' cannot be part of a file name", key, text),
                            "use letters, digits, '.', '_' and '-' only, beginning with a letter or digit");
    }
    return text;
}

} // namespace

BriefSections::BriefSections(const toml::Document& document, Diagnostics& diagnostics)
    : practice(document, table_of(document, "practice"), "practice", diagnostics),
      basis(document, table_of(document, "basis"), "basis", diagnostics),
      catalogue(document, table_of(document, "catalogue"), "catalogue", diagnostics),
      support(document, table_of(document, "support"), "support", diagnostics),
      deck(document, table_of(document, "deck"), "deck", diagnostics),
      limits(document, table_of(document, "limits"), "limits", diagnostics),
      search(document, table_of(document, "search"), "search", diagnostics),
      loads(readers_of(document, "load", diagnostics)), members(readers_of(document, "members", diagnostics)),
      tables(readers_of(document, "table", diagnostics)) {
    check_sections(document, diagnostics);
}

Practice read_practice(SectionReader& section) {
    if (!section.stands()) {
        return {};
    }
    return {.name = section.text("name"),
            .number = file_safe(section, "number"),
            .revision = file_safe(section, "revision"),
            .title = section.text("title"),
            .prepared = section.text("prepared"),
            .checked = section.text("checked"),
            .date = date_of_issue(section),
            .notes = section.text("notes"),
            .replaces = section.text("replaces")};
}

BasisChoice read_basis(SectionReader& section) {
    (void)section.optional_choice("code"); // one code is covered; any other is reported
    BasisChoice basis{.parameters = section.text("parameters"),
                      .combination = section.text("combination"),
                      .service_class = section.whole_number("service_class"),
                      .wet_on_installation = section.yes("wet_on_installation"),
                      .load_sharing = section.yes("load_sharing"),
                      .utilisation_cap = section.number("utilisation_cap"),
                      .self_weight = section.yes("self_weight"),
                      .shear_deflection = section.yes("shear_deflection"),
                      .concentrated_near_support = section.yes("concentrated_near_support"),
                      .uniform_near_support = section.yes("uniform_near_support"),
                      .partitions_creep = section.choice<PartitionsCreep>("partitions_creep"),
                      .lateral_curves = section.choice<LateralCurves>("lateral_curves")};
    const KeyDefinition& parameters = key_definition(section_definition("basis"), "parameters");
    const std::vector<std::string> sets = listed_words(parameters.choices);
    if (std::find(sets.begin(), sets.end(), basis.parameters) == sets.end() && !basis.parameters.ends_with(".toml")) {
        const std::string nearest = nearest_name(basis.parameters, sets);
        section.value_error(
            "parameters", "unknown-choice", fmt::format("'{}' is no set of parameters", basis.parameters),
            fmt::format("{}known: {}, or a file whose name ends in .toml",
                        nearest.empty() ? "" : fmt::format("did you mean '{}'? ", nearest), fmt::join(sets, ", ")));
        basis.parameters = std::string(parameters.fallback);
    }
    return basis;
}

CatalogueFiles read_catalogue_files(SectionReader& section) {
    return {.classes = values_of(section.texts("classes")),
            .sections = values_of(section.texts("sections")),
            .series = values_of(section.texts("series")),
            .loads = values_of(section.texts("loads"))};
}

Support read_support(SectionReader& section) {
    return {.arrangement = section.choice<Arrangement>("arrangement"),
            .bearing = section.number("bearing_mm"),
            .root_fixed = section.optional_choice("root").has_value(),
            .compression_edge = section.choice<CompressionEdge>("compression_edge"),
            .restraint_spacing = section.optional_number("restraint_spacing_mm"),
            .load_position = section.choice<LoadPosition>("load_position"),
            .load_height = section.optional_number("load_height_mm"),
            .web_at_support = section.choice<WebAtSupport>("web_at_support")};
}

Deck read_deck(SectionReader& section) {
    return {.name = section.text("name"),
            .max_spacing = section.optional_number("max_spacing_mm"),
            .stiffness = section.optional_number("stiffness_Nmm2_per_m")};
}

SearchRange read_search(SectionReader& section) {
    return {.min_clear_span = section.optional_number("min_clear_span_mm"),
            .max_clear_span = section.optional_number("max_clear_span_mm"),
            .step = section.number("step_mm"),
            .rounding = section.choice<Rounding>("rounding")};
}

} // namespace spanledger
