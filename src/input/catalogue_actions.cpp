// SPDX-License-Identifier: MIT
#include "catalogue_rows.hpp"

#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>

namespace spanledger {

namespace {

const std::array<std::string, 5> duration_words{"permanent", "long", "medium", "short", "instantaneous"};

const NumberRange psi_range{.least = 0.0, .greatest = 1.0};
const NumberRange area_load_range{.least = 0.0, .greatest = 400.0, .usual_greatest = 50.0, .unit = "kN/m2"};
const NumberRange force_range{.least = 0.0, .greatest = 1000.0, .usual_greatest = 100.0, .unit = "kN"};

Psi read_psi(CsvRecord& record) {
    const Psi psi{record.number("psi0", psi_range), record.number("psi1", psi_range), record.number("psi2", psi_range)};
    if (record.good() && psi.psi2 > psi.psi1) {
        record.error("psi2", "contradiction", fmt::format("'psi2' ({}) is above 'psi1' ({})", psi.psi2, psi.psi1),
                     "check whether values stand in the wrong column");
    }
    return psi;
}

/// Whether a row holds in the set in force. A built-in file has all rows of "recommended", and over them those of a
/// set.
bool row_applies(CsvRecord& record, const RowFile& file, std::string_view in_force) {
    const std::vector<std::string>& sets = builtin_parameter_sets();
    const std::string& set = record.text("parameters");
    if (set.empty()) {
        return true;
    }
    if (std::find(sets.begin(), sets.end(), set) == sets.end()) {
        record.error("parameters", "unknown-parameters", fmt::format("parameter set '{}' is not known", set),
                     did_you_mean(set, sets));
        return true;
    }
    return set == in_force || (!file.practice_own && set == "recommended");
}

LoadCategory read_category(CsvRecord& record) {
    LoadCategory row;
    row.name = read_name(record, "category");
    row.use = record.required_text("use");
    row.roof = record.yes_or_no("roof");
    row.duration = static_cast<Duration>(record.one_of("duration", duration_words));
    row.psi = read_psi(record);
    if (const std::optional<double> load = record.optional_number("q_k_kN_m2", area_load_range)) {
        row.q_k = *load / 1000.0;
    }
    if (const std::optional<double> force = record.optional_number("Q_k_kN", force_range)) {
        row.Q_k = *force * 1000.0;
    }
    return row;
}

} // namespace

void read_load_categories(const RowFile& file, const Catalogue& catalogue, std::string_view base_set,
                          RowCollector<LoadCategory>& collector, Diagnostics& diagnostics) {
    static const std::array<CsvColumn, 13> columns{{{"parameters", false},
                                                    {"category"},
                                                    {"use"},
                                                    {"roof"},
                                                    {"duration"},
                                                    {"psi0"},
                                                    {"psi1"},
                                                    {"psi2"},
                                                    {"q_k_kN_m2", false},
                                                    {"Q_k_kN", false},
                                                    {"source"},
                                                    {"seen", false},
                                                    {"note", false}}};
    for_each_record(file, columns, diagnostics, [&](CsvRecord& record) {
        LoadCategory row = read_category(record);
        row.provenance = read_provenance(record, file, catalogue.sources);
        if (row_applies(record, file, base_set)) {
            const std::string name = row.name;
            collector.add(std::move(row), name, record, record.text("parameters"));
        }
    });
}

Psi read_snow_psi(const RowFile& file, std::string_view base_set, Diagnostics& diagnostics) {
    static const std::array<CsvColumn, 7> columns{
        {{"parameters"}, {"psi0"}, {"psi1"}, {"psi2"}, {"source"}, {"seen"}, {"note"}}};
    Psi in_force;
    for_each_record(file, columns, diagnostics, [&](CsvRecord& record) {
        const Psi psi = read_psi(record);
        if (row_applies(record, file, base_set)) {
            in_force = psi;
        }
    });
    return in_force;
}

void read_service_factors(const RowFile& file, Catalogue& catalogue, Diagnostics& diagnostics) {
    static const std::array<std::string, 5> k_mod_columns{"k_mod_permanent", "k_mod_long", "k_mod_medium",
                                                          "k_mod_short", "k_mod_instantaneous"};
    std::vector<CsvColumn> columns{{"material"}, {"service_class"}, {"k_def"}, {"source"}, {"seen"}, {"note"}};
    for (const std::string& column : k_mod_columns) {
        columns.push_back({column});
    }
    RowCollector<ServiceFactors> collector(catalogue.service_factors);
    for_each_record(file, columns, diagnostics, [&](CsvRecord& record) {
        ServiceFactors row;
        row.material = record.required_text("material");
        row.service_class = static_cast<int>(record.number("service_class", {.least = 1.0, .greatest = 3.0}));
        for (std::size_t i = 0; i < k_mod_columns.size(); ++i) {
            row.k_mod[i] = record.number(k_mod_columns[i], {.least = 0.1, .greatest = 1.5});
        }
        row.k_def = record.number("k_def", {.least = 0.0, .greatest = 5.0});
        row.provenance = read_provenance(record, file, catalogue.sources);
        const std::string name = fmt::format("{} service class {}", row.material, row.service_class);
        collector.add(std::move(row), name, record);
    });
}

void read_combinations(const RowFile& file, Catalogue& catalogue, Diagnostics& diagnostics) {
    static const std::array<CsvColumn, 8> columns{
        {{"set"}, {"name"}, {"reduced_permanent"}, {"variable"}, {"clause"}, {"source"}, {"seen"}, {"note"}}};
    static const std::array<std::string, 3> variable_words{"none", "full", "combination value"};
    RowCollector<Combination> collector(catalogue.combinations);
    for_each_record(file, columns, diagnostics, [&](CsvRecord& record) {
        Combination row;
        row.set = record.required_text("set");
        row.name = record.required_text("name");
        row.reduced_permanent = record.yes_or_no("reduced_permanent");
        row.variable = static_cast<Combination::Variable>(record.one_of("variable", variable_words));
        row.clause = record.required_text("clause");
        row.provenance = read_provenance(record, file, catalogue.sources);
        const std::string name = row.set + ": " + row.name;
        collector.add(std::move(row), name, record);
    });
}

} // namespace spanledger
