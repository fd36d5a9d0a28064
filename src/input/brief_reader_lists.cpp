// SPDX-License-Identifier: MIT
#include "spanledger/input/brief_reader.hpp"

#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>

// [[load]], [[members]] and [[table]].

namespace spanledger {

namespace {

/// Names given so far within a kind, with the line each stands in.
class Names {
public:
    void add(SectionReader& section, const std::string& name) {
        const auto same = [&](const auto& known) { return known.value == name; };
        const auto found = std::find_if(names_.begin(), names_.end(), same);
        if (name.empty()) {
            return;
        }
        if (found == names_.end()) {
            names_.push_back({name, section.mark("name")});
            return;
        }
        section.error("name", "duplicate-name",
                      fmt::format("the name '{}' stands twice; it is already in line {}, column {}", name,
                                  found->mark.line, found->mark.column),
                      "give one of the two another name");
    }

private:
    std::vector<Located<std::string>> names_;
};

std::vector<std::string> category_names(const Catalogue& catalogue) {
    std::vector<std::string> names;
    for (const LoadCategory& category : catalogue.load_categories) {
        names.push_back(category.name);
    }
    return names;
}

LoadCategory category_of(SectionReader& section, const std::string& name, const Catalogue& catalogue) {
    const LoadCategory* category = find_load_category(catalogue, name);
    if (category != nullptr) {
        return *category;
    }
    if (!name.empty() && !catalogue.load_categories.empty()) {
        section.value_error("category", "unknown-name", fmt::format("load category '{}' is not known", name),
                            did_you_mean(name, category_names(catalogue)));
    }
    return {};
}

Psi read_psi(SectionReader& section, const std::string& prefix, const Psi& otherwise) {
    const Psi psi{section.optional_number(prefix + "psi0").value_or(otherwise.psi0),
                  section.optional_number(prefix + "psi1").value_or(otherwise.psi1),
                  section.optional_number(prefix + "psi2").value_or(otherwise.psi2)};
    const bool given = section.given(prefix + "psi1") || section.given(prefix + "psi2");
    if (given && psi.psi2 > psi.psi1) {
        section.warning(prefix + "psi2", "unusual",
                        fmt::format("{0}psi2 = {1} is greater than {0}psi1 = {2}", prefix, psi.psi2, psi.psi1),
                        "the quasi-permanent value is usually no greater than the frequent one");
    }
    return psi;
}

/// Keys that say something about a load which is not there.
void check_idle_keys(SectionReader& section, const LoadClass& load) {
    const auto idle = [&](std::string_view key, std::string_view of) {
        if (section.given(key) && !section.given(of)) {
            section.warning(key, "no-effect", fmt::format("{} has no effect without {}", key, of),
                            fmt::format("add {}, or remove {}", of, key));
        }
    };
    for (const char* key : {"concentrated_share", "concentrated_duration", "concentrated_in_deflection"}) {
        idle(key, "concentrated_kN");
    }
    for (const char* key : {"snow_duration", "snow_psi0", "snow_psi1", "snow_psi2"}) {
        idle(key, "snow_kN_m2");
    }
    if (load.concentrated > 0.0 && !section.given("concentrated_share")) {
        section.error("concentrated_kN", "missing-key", "concentrated_kN needs the key 'concentrated_share'",
                      "add concentrated_share = 1.0, the safe value, or the smaller part of it that one joist takes");
    }
}

void check_actions(SectionReader& section, const LoadClass& load, const LoadCategory& category) {
    const double all =
        load.permanent + load.permanent_partitions + load.variable + load.partitions + load.snow + load.concentrated;
    if (all <= 0.0 && !section.damaged()) {
        section.error("", "no-action", fmt::format("the load class '{}' has no load", load.name),
                      "add at least one load greater than 0, such as variable_kN_m2 = 1.5");
    }
    if (load.snow > 0.0 && !category.roof && !category.name.empty()) {
        section.warning("snow_kN_m2", "unusual", fmt::format("snow on category {}, which is no roof", category.name),
                        "snow belongs to a roof category such as H");
    }
    if (load.partitions + load.permanent_partitions > 0.0 && category.roof) {
        section.warning(load.partitions > 0.0 ? "partitions_kN_m2" : "permanent_partitions_kN_m2", "unusual",
                        fmt::format("partitions on category {}, a roof", category.name),
                        "partitions belong to a floor category such as A");
    }
}

LoadClass read_load(SectionReader& section, const Catalogue& catalogue, const Diagnostics& diagnostics) {
    const auto errors = [&] {
        return std::count_if(diagnostics.all().begin(), diagnostics.all().end(),
                             [](const Diagnostic& d) { return d.severity == Severity::error; });
    };
    const auto errors_before = errors();
    const std::string name = section.text("name");
    const std::string category_name = section.text("category");
    const LoadCategory category = category_of(section, category_name, catalogue);
    LoadClass load{.name = name,
                   .category = category_name,
                   .permanent = section.number("permanent_kN_m2"),
                   .permanent_partitions = section.number("permanent_partitions_kN_m2"),
                   .variable = section.number("variable_kN_m2"),
                   .partitions = section.number("partitions_kN_m2"),
                   .duration = section.choice("duration", category.duration),
                   .psi = read_psi(section, "", category.psi),
                   .snow = section.number("snow_kN_m2"),
                   .snow_duration = section.choice<Duration>("snow_duration"),
                   .snow_psi = read_psi(section, "snow_", catalogue.snow_psi),
                   .concentrated = section.number("concentrated_kN"),
                   .concentrated_share = section.optional_number("concentrated_share").value_or(1.0),
                   .concentrated_duration = section.choice("concentrated_duration", category.duration),
                   .concentrated_in_deflection = section.yes("concentrated_in_deflection")};
    if (errors() == errors_before) { // a load that could not be read is no missing load
        check_actions(section, load, category);
    }
    check_idle_keys(section, load);
    return load;
}

MembersEntry read_entry(SectionReader& section) {
    MembersEntry entry{.name = section.text("name"),
                       .material_class = section.text("class"),
                       .series = section.text("series"),
                       .sizes = values_of(section.texts("sizes")),
                       .plies = section.whole_number("plies"),
                       .plies_fixed_together = section.yes("plies_fixed_together"),
                       .stock_lengths = values_of(section.numbers("stock_lengths_m")),
                       .place = section.place()};
    if (section.given("series") && section.given("sizes")) {
        section.error("sizes", "contradiction", "series and sizes stand in one entry",
                      "keep one of them, and write another [[members]] for the other");
    }
    if (!section.given("series") && !section.given("sizes")) {
        section.error("", "missing-key", "[[members]] needs the key 'series' or 'sizes'",
                      "add series = \"...\" (`spanledger catalogue series`), or sizes = [\"47x220\"]");
    }
    return entry;
}

/// Names that a table lists: each must be known, and once.
std::vector<std::string> read_references(SectionReader& section, std::string_view key, std::string_view header,
                                         const std::vector<std::string>& known) {
    std::vector<std::string> names;
    for (const auto& [name, mark] : section.texts(key)) {
        if (std::find(names.begin(), names.end(), name) != names.end()) {
            section.error_at(mark, "duplicate-value", fmt::format("{}: '{}' stands twice", key, name),
                             "remove one of the two");
        } else if (std::find(known.begin(), known.end(), name) != known.end()) {
            names.push_back(name);
        } else if (!section.damaged()) { // else the name may stand under a header that could not be read
            section.error_at(mark, "unknown-name", fmt::format("no {} has the name '{}'", header, name),
                             did_you_mean(name, known));
        }
    }
    return names;
}

template <class Entry> std::vector<std::string> names_of(const std::vector<Entry>& entries) {
    std::vector<std::string> names;
    for (const Entry& entry : entries) {
        names.push_back(entry.name);
    }
    return names;
}

std::vector<double> read_spacings(SectionReader& section, const Deck& deck) {
    const auto spacings = section.numbers("spacings_mm");
    for (const auto& [spacing, mark] : spacings) {
        if (deck.max_spacing && spacing > *deck.max_spacing) {
            section.error_at(
                mark, "contradiction",
                fmt::format("a spacing of {:g} mm is wider than the deck may span: max_spacing_mm of [deck] "
                            "is {:g} mm",
                            spacing, *deck.max_spacing),
                "leave out the spacing, or name a deck that spans it");
        }
    }
    return values_of(spacings);
}

TableRequest read_table(SectionReader& section, const Brief& brief, std::size_t number) {
    const auto kind = section.optional_choice("kind");
    TableRequest table{.name = section.text("name"),
                       .kind = kind ? static_cast<TableKind>(*kind) : TableKind::permissible_span,
                       .members = read_references(section, "members", "[[members]]", names_of(brief.members)),
                       .spacings = read_spacings(section, brief.deck),
                       .loads = read_references(section, "loads", "[[load]]", names_of(brief.loads)),
                       .spans = values_of(section.numbers("spans_m"))};
    if (table.name.empty()) {
        table.name = fmt::format("Table {}", number);
    }
    if (kind && table.kind != TableKind::permissible_span && table.spans.empty() && !section.given("spans_m")) {
        section.error("kind", "missing-key", "a table of this kind needs the key 'spans_m'",
                      "add spans_m = [3.0, 3.5, 4.0] (clear spans), or write kind = \"permissible span\"");
    }
    if (kind && table.kind == TableKind::permissible_span && section.given("spans_m")) {
        section.warning("spans_m", "no-effect", "spans_m has no effect in a table of permissible spans",
                        "remove spans_m, or write kind = \"permissible load\" or \"utilisation\"");
    }
    return table;
}

} // namespace

std::vector<LoadClass> read_loads(std::vector<SectionReader>& sections, const Catalogue& catalogue,
                                  const Diagnostics& diagnostics) {
    std::vector<LoadClass> loads;
    Names names;
    for (SectionReader& section : sections) {
        loads.push_back(read_load(section, catalogue, diagnostics));
        names.add(section, loads.back().name);
    }
    return loads;
}

std::vector<MembersEntry> read_members(std::vector<SectionReader>& sections) {
    std::vector<MembersEntry> entries;
    Names names;
    for (SectionReader& section : sections) {
        entries.push_back(read_entry(section));
        names.add(section, entries.back().name);
    }
    return entries;
}

std::vector<TableRequest> read_tables(std::vector<SectionReader>& sections, const Brief& brief) {
    std::vector<TableRequest> tables;
    Names names;
    for (SectionReader& section : sections) {
        tables.push_back(read_table(section, brief, tables.size() + 1));
        names.add(section, tables.back().name);
    }
    return tables;
}

} // namespace spanledger
