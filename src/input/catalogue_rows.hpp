// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/catalogue.hpp"
#include "spanledger/input/csv.hpp"

#include <map>
#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <utility>
#include <vector>

// How the files of the catalogue become rows. Built-in files and a practice's files go through the same readers.

namespace spanledger {

/// A file of rows.
struct RowFile {
    std::string name;
    std::string_view text;
    bool practice_own = false;
};

/// Names of the built-in parameter sets, "recommended" first.
[[nodiscard]] const std::vector<std::string>& builtin_parameter_sets();

/// Where a row comes from; an empty source is reported ("missing-source"), and in a built-in file an unknown one.
[[nodiscard]] Provenance read_provenance(CsvRecord& record, const RowFile& file, const std::vector<Source>& sources);

/// A name in the first column of a row: not empty, and warned of where a spreadsheet may have changed it.
[[nodiscard]] std::string read_name(CsvRecord& record, std::string_view column);

/// Puts rows of one kind together: a practice's row takes the place of the built-in row of the same name, others are
/// added; two of one owner with the same name are reported with both places ("duplicate-row").
template <class Row> class RowCollector {
public:
    explicit RowCollector(std::vector<Row>& rows) : rows_(&rows) {}

    /// The built-in rows are complete; what follows is the practice's.
    void begin_practice_rows() { first_places_.clear(); }

    /// `name` identifies the row, and within one owner's rows its `scope` too. A good record becomes a row.
    void add(Row row, const std::string& name, CsvRecord& record, const std::string& scope = {}) {
        const Place place = record.place({});
        const auto [first, is_first] = first_places_.try_emplace({scope, name}, place);
        if (!is_first) {
            record.error({}, "duplicate-row", "'" + name + "' stands twice",
                         "it is also at " + first->second.file + ":" + std::to_string(first->second.line) +
                             "; leave one out");
        }
        if (record.good()) {
            put(std::move(row), name);
        }
    }

private:
    void put(Row row, const std::string& name) {
        const auto [known, is_new] = positions_.try_emplace(name, rows_->size());
        if (is_new) {
            rows_->push_back(std::move(row));
        } else {
            (*rows_)[known->second] = std::move(row);
        }
    }

    std::vector<Row>* rows_;
    std::map<std::string, std::size_t> positions_;
    std::map<std::pair<std::string, std::string>, Place> first_places_;
};

void read_sources(const RowFile& file, std::vector<Source>& sources, Diagnostics& diagnostics);

void read_timber_classes(const RowFile& file, const std::vector<Source>& sources, RowCollector<TimberClass>& collector,
                         Diagnostics& diagnostics);

void read_timber_sizes(const RowFile& file, const std::vector<Source>& sources, RowCollector<TimberSize>& collector,
                       Diagnostics& diagnostics);

void read_steel_grades(const RowFile& file, const std::vector<Source>& sources, RowCollector<SteelGrade>& collector,
                       Diagnostics& diagnostics);

void read_rolled_sections(const RowFile& file, const std::vector<Source>& sources,
                          RowCollector<RolledSection>& collector, Diagnostics& diagnostics);

void read_cold_formed_grades(const RowFile& file, const std::vector<Source>& sources,
                             RowCollector<ColdFormedGrade>& collector, Diagnostics& diagnostics);

void read_cold_formed_sizes(const RowFile& file, const std::vector<Source>& sources,
                            RowCollector<ColdFormedSize>& collector, Diagnostics& diagnostics);

/// Whether the row of column names holds a column: what tells the practice's files of one family from another's.
[[nodiscard]] bool has_column(std::string_view text, std::string_view column);

/// Rows of the parameter set in force. `base_set`: a built-in set ("recommended", "uk").
void read_load_categories(const RowFile& file, const Catalogue& catalogue, std::string_view base_set,
                          RowCollector<LoadCategory>& collector, Diagnostics& diagnostics);

[[nodiscard]] Psi read_snow_psi(const RowFile& file, std::string_view base_set, Diagnostics& diagnostics);

void read_service_factors(const RowFile& file, Catalogue& catalogue, Diagnostics& diagnostics);

void read_combinations(const RowFile& file, Catalogue& catalogue, Diagnostics& diagnostics);

/// The parameters with the set `parameters` in force (a built-in set, or a practice's own .toml file). Returns the
/// built-in set that it is or starts from; "recommended" after a problem.
[[nodiscard]] std::string read_parameters(const std::string& parameters, const std::string& base_directory,
                                          Catalogue& catalogue, Diagnostics& diagnostics);

/// Reads the columns of a file row by row: `read` gets each record of a file whose columns fit.
template <class Read>
void for_each_record(const RowFile& file, std::span<const CsvColumn> columns, Diagnostics& diagnostics, Read&& read) {
    const std::optional<CsvTable> table = read_csv(file.name, file.text, columns, diagnostics);
    if (!table) {
        return;
    }
    for (const CsvRow& row : table->rows()) {
        CsvRecord record(*table, row, diagnostics);
        read(record);
    }
}

} // namespace spanledger
