// SPDX-License-Identifier: MIT
#include "catalogue_rows.hpp"

#include "spanledger/input/builtin_files.hpp"
#include "spanledger/input/quantity.hpp"
#include "spanledger/input/suggestion.hpp"
#include "spanledger/input/text_file.hpp"
#include "spanledger/input/toml_text.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>

namespace spanledger {

namespace {

constexpr const char* definitions_file = "parameters.csv";
constexpr const char* values_file = "parameter-values.csv";
const std::string recommended = "recommended";

std::vector<std::string> keys_of(const std::vector<Parameter>& parameters) {
    std::vector<std::string> keys;
    for (const Parameter& parameter : parameters) {
        keys.push_back(parameter.key);
    }
    return keys;
}

Parameter* find_parameter(std::vector<Parameter>& parameters, std::string_view key) {
    const auto found = std::find_if(parameters.begin(), parameters.end(),
                                    [&](const Parameter& parameter) { return parameter.key == key; });
    return found == parameters.end() ? nullptr : &*found;
}

void read_definitions(Catalogue& catalogue, Diagnostics& diagnostics) {
    static const std::array<CsvColumn, 6> columns{
        {{"key"}, {"unit"}, {"clause"}, {"meaning"}, {"least"}, {"greatest"}}};
    const RowFile file{definitions_file, builtin_file(definitions_file)};
    RowCollector<Parameter> collector(catalogue.parameters);
    for_each_record(file, columns, diagnostics, [&](CsvRecord& record) {
        Parameter row;
        row.key = record.required_text("key");
        row.unit = record.required_text("unit");
        row.clause = record.required_text("clause");
        row.meaning = record.required_text("meaning");
        row.least = record.number("least", {});
        row.greatest = record.number("greatest", {});
        const std::string key = row.key;
        collector.add(std::move(row), key, record);
    });
}

/// Puts the values of "recommended", then those of `set`, in force.
void read_values(const std::string& set, Catalogue& catalogue, Diagnostics& diagnostics) {
    static const std::array<CsvColumn, 6> columns{{{"set"}, {"key"}, {"value"}, {"source"}, {"seen"}, {"note"}}};
    const RowFile file{values_file, builtin_file(values_file)};
    for_each_record(file, columns, diagnostics, [&](CsvRecord& record) {
        Parameter* const parameter = find_parameter(catalogue.parameters, record.required_text("key"));
        if (parameter == nullptr) {
            record.error("key", "unknown-key", fmt::format("parameter '{}' is not known", record.text("key")),
                         did_you_mean(record.text("key"), keys_of(catalogue.parameters)));
            return;
        }
        const double value = record.number("value", {.least = parameter->least, .greatest = parameter->greatest});
        Provenance provenance = read_provenance(record, file, catalogue.sources);
        const std::string& row_set = record.text("set");
        if (row_set == recommended) {
            parameter->recommended = value;
        }
        if (row_set == recommended || row_set == set) {
            parameter->value = value;
            parameter->set = row_set;
            parameter->provenance = std::move(provenance);
        }
    });
}

/// A practice's own parameter file.
class PracticeParameters {
public:
    PracticeParameters(const std::string& file, std::string_view text, Diagnostics& diagnostics)
        : document_(toml::parse(file, text, diagnostics)), diagnostics_(diagnostics) {}

    /// The built-in set that the file starts from; "recommended" after a problem.
    std::string starts_from() {
        const toml::Node* const node = toml::find(document_.root(), "starts_from");
        if (node == nullptr) {
            if (!document_.header_lost()) {
                diagnostics_.error("missing-key", {.file = document_.file()},
                                   "'starts_from' is missing: the file must name the set it starts from",
                                   "write for example: starts_from = \"uk\"");
            }
            return recommended;
        }
        const auto& sets = builtin_parameter_sets();
        if (node->kind == toml::NodeKind::text && std::find(sets.begin(), sets.end(), node->text) != sets.end()) {
            return node->text;
        }
        if (node->kind != toml::NodeKind::unread) {
            error("unknown-parameters", node->mark, fmt::format("parameter set '{}' is not known", node->text),
                  did_you_mean(node->text, sets));
        }
        return recommended;
    }

    /// Puts the file's values in force over those of the set it starts from.
    void apply(const std::string& set_name, Catalogue& catalogue) {
        const std::string source = source_of_values();
        for (const toml::Node& node : document_.root().children) {
            if (node.key == "values" && node.kind == toml::NodeKind::table) {
                for (const toml::Node& value : node.children) {
                    apply_value(value, set_name, source, catalogue);
                }
            } else if (node.key == "values" && node.kind != toml::NodeKind::unread) {
                error("wrong-kind", node.mark, fmt::format("'values' is {}, not a table", toml::kind_name(node.kind)),
                      "write the heading [values] and the values below it");
            } else if (std::find(keys_.begin(), keys_.end(), node.key) == keys_.end()) {
                report_unknown_key(node, catalogue);
            }
        }
    }

private:
    void error(std::string code, const toml::Mark& mark, std::string message, std::string hint) {
        diagnostics_.error(std::move(code), document_.place(mark), std::move(message), std::move(hint));
    }

    void report_unknown_key(const toml::Node& node, const Catalogue& catalogue) {
        const auto known = keys_of(catalogue.parameters);
        const bool misplaced = std::find(known.begin(), known.end(), node.key) != known.end();
        error("unknown-key", node.key_mark, fmt::format("key '{}' is not known here", node.key),
              misplaced ? "put it below the heading [values]" : did_you_mean(node.key, keys_));
    }

    /// The practice's own words for where the values come from; the file itself where it says nothing.
    std::string source_of_values() {
        const toml::Node* const node = toml::find(document_.root(), "source");
        if (node == nullptr || node->kind == toml::NodeKind::unread) {
            return document_.file();
        }
        if (node->kind != toml::NodeKind::text || node->text.empty()) {
            error("wrong-kind", node->mark, "'source' must be a text that is not empty",
                  "say where the values come from, in quotes");
        }
        return node->text;
    }

    void apply_value(const toml::Node& node, const std::string& set_name, const std::string& source,
                     Catalogue& catalogue) {
        Parameter* const parameter = find_parameter(catalogue.parameters, node.key);
        if (parameter == nullptr) {
            error("unknown-key", node.key_mark, fmt::format("parameter '{}' is not known", node.key),
                  did_you_mean(node.key, keys_of(catalogue.parameters)));
            return;
        }
        if (node.kind == toml::NodeKind::unread) {
            return;
        }
        const auto value = node.kind == toml::NodeKind::number ? read_number(node.text) : std::nullopt;
        if (!value) {
            error("bad-number", node.mark, fmt::format("'{}' is not a finite number", node.key),
                  fmt::format("write a number without quotes{}", unit_words(*parameter)));
        } else if (*value < parameter->least || *value > parameter->greatest) {
            error("out-of-range", node.mark,
                  fmt::format("'{}': {} is outside the possible range {} to {}", node.key, *value, parameter->least,
                              parameter->greatest),
                  fmt::format("{} recommends {}", parameter->clause, parameter->recommended));
        } else {
            parameter->value = *value;
            parameter->set = set_name;
            parameter->provenance = {
                .source = source, .practice_own = true, .file = document_.file(), .line = node.mark.line, .note = {}};
        }
    }

    static std::string unit_words(const Parameter& parameter) {
        return parameter.unit == "-" ? std::string() : fmt::format(", in {}", parameter.unit);
    }

    const std::vector<std::string> keys_{"starts_from", "values", "source"};
    toml::Document document_;
    Diagnostics& diagnostics_;
};

} // namespace

const std::vector<std::string>& builtin_parameter_sets() {
    static const std::vector<std::string> sets{recommended, "uk"};
    return sets;
}

std::string read_parameters(const std::string& parameters, const std::string& base_directory, Catalogue& catalogue,
                            Diagnostics& diagnostics) {
    catalogue.parameter_set = parameters;
    read_definitions(catalogue, diagnostics);
    const auto& sets = builtin_parameter_sets();
    if (std::find(sets.begin(), sets.end(), parameters) != sets.end()) {
        read_values(parameters, catalogue, diagnostics);
        return parameters;
    }
    std::optional<std::string> text;
    if (std::string_view(parameters).ends_with(".toml")) {
        text = read_text_file(resolve_file(base_directory, parameters), diagnostics);
    } else {
        diagnostics.error("unknown-parameters", {}, fmt::format("parameter set '{}' is not known", parameters),
                          did_you_mean(parameters, sets) + " (a practice's own file ends in .toml)");
    }
    if (!text) {
        read_values(recommended, catalogue, diagnostics);
        return recommended;
    }
    PracticeParameters practice(resolve_file(base_directory, parameters), *text, diagnostics);
    const std::string base_set = practice.starts_from();
    read_values(base_set, catalogue, diagnostics);
    practice.apply(parameters, catalogue);
    return base_set;
}

} // namespace spanledger
