// SPDX-License-Identifier: MIT
#include "spanledger/catalogue.hpp"

#include "catalogue_rows.hpp"
#include "spanledger/fingerprint.hpp"
#include "spanledger/input/builtin_files.hpp"
#include "spanledger/input/text_file.hpp"

#include <algorithm>
#include <array>
#include <stdexcept>

namespace spanledger {

namespace {

constexpr std::array data_files{"cold-formed-grades.csv",
                                "cold-formed-sections.csv",
                                "combinations.csv",
                                "load-categories.csv",
                                "parameter-values.csv",
                                "parameters.csv",
                                "rolled-sections.csv",
                                "service-factors.csv",
                                "snow.csv",
                                "sources.csv",
                                "steel-grades.csv",
                                "timber-classes.csv",
                                "timber-series.csv"};

RowFile builtin(const char* name) {
    return {name, builtin_file(name), false};
}

/// Reads each of a practice's files over what is there.
template <class Read> void read_practice_files(const std::vector<std::string>& names, const std::string& base_directory,
                                               Diagnostics& diagnostics, Read&& read) {
    for (const std::string& name : names) {
        const std::string path = resolve_file(base_directory, name);
        if (const std::optional<std::string> text = read_text_file(path, diagnostics)) {
            read(RowFile{path, *text, true});
        }
    }
}

/// Columns that only the files of one family of materials have.
constexpr std::string_view steel_grade_column = "f_y_16_MPa";
constexpr std::string_view rolled_section_column = "tf_mm";
constexpr std::string_view cold_formed_grade_column = "f_yb_MPa";
constexpr std::string_view cold_formed_size_column = "t_nom_mm";

void load_classes(const CatalogueFiles& files, const std::string& base_directory, Catalogue& catalogue,
                  Diagnostics& diagnostics) {
    RowCollector<TimberClass> timber(catalogue.timber_classes);
    RowCollector<SteelGrade> steel(catalogue.steel_grades);
    RowCollector<ColdFormedGrade> cold_formed(catalogue.cold_formed_grades);
    const auto read = [&](const RowFile& file) {
        if (has_column(file.text, steel_grade_column)) {
            read_steel_grades(file, catalogue.sources, steel, diagnostics);
        } else if (has_column(file.text, cold_formed_grade_column)) {
            read_cold_formed_grades(file, catalogue.sources, cold_formed, diagnostics);
        } else {
            read_timber_classes(file, catalogue.sources, timber, diagnostics);
        }
    };
    read(builtin("timber-classes.csv"));
    read(builtin("steel-grades.csv"));
    read(builtin("cold-formed-grades.csv"));
    timber.begin_practice_rows();
    steel.begin_practice_rows();
    cold_formed.begin_practice_rows();
    read_practice_files(files.classes, base_directory, diagnostics, read);
}

void load_sizes(const CatalogueFiles& files, const std::string& base_directory, Catalogue& catalogue,
                Diagnostics& diagnostics) {
    RowCollector<TimberSize> timber(catalogue.timber_sizes);
    RowCollector<RolledSection> rolled(catalogue.rolled_sections);
    RowCollector<ColdFormedSize> cold_formed(catalogue.cold_formed_sizes);
    const auto read = [&](const RowFile& file) {
        if (has_column(file.text, rolled_section_column)) {
            read_rolled_sections(file, catalogue.sources, rolled, diagnostics);
        } else if (has_column(file.text, cold_formed_size_column)) {
            read_cold_formed_sizes(file, catalogue.sources, cold_formed, diagnostics);
        } else {
            read_timber_sizes(file, catalogue.sources, timber, diagnostics);
        }
    };
    read(builtin("timber-series.csv"));
    read(builtin("rolled-sections.csv"));
    read(builtin("cold-formed-sections.csv"));
    timber.begin_practice_rows();
    rolled.begin_practice_rows();
    cold_formed.begin_practice_rows();
    read_practice_files(files.sections, base_directory, diagnostics, read);
    read_practice_files(files.series, base_directory, diagnostics, read);
}

void load_categories(const CatalogueFiles& files, const std::string& base_directory, const std::string& base_set,
                     Catalogue& catalogue, Diagnostics& diagnostics) {
    RowCollector<LoadCategory> collector(catalogue.load_categories);
    const auto read = [&](const RowFile& file) {
        read_load_categories(file, catalogue, base_set, collector, diagnostics);
    };
    read(builtin("load-categories.csv"));
    collector.begin_practice_rows();
    read_practice_files(files.loads, base_directory, diagnostics, read);
}

template <class Row> const Row* find_named(const std::vector<Row>& rows, std::string_view name) {
    const auto found = std::find_if(rows.begin(), rows.end(), [&](const Row& row) { return row.name == name; });
    return found == rows.end() ? nullptr : &*found;
}

} // namespace

const TimberClass* find_timber_class(const Catalogue& catalogue, std::string_view name) {
    return find_named(catalogue.timber_classes, name);
}

const SteelGrade* find_steel_grade(const Catalogue& catalogue, std::string_view name) {
    return find_named(catalogue.steel_grades, name);
}

const ColdFormedGrade* find_cold_formed_grade(const Catalogue& catalogue, std::string_view name) {
    return find_named(catalogue.cold_formed_grades, name);
}

namespace {

/// A section's name without spaces, in small letters.
std::string bare_name(std::string_view name) {
    std::string bare;
    for (const char c : name) {
        if (c != ' ' && c != '\t') bare.push_back(c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c);
    }
    return bare;
}

} // namespace

const RolledSection* find_rolled_section(const Catalogue& catalogue, std::string_view name) {
    const auto& rows = catalogue.rolled_sections;
    const auto found = std::find_if(rows.begin(), rows.end(), [wanted = bare_name(name)](const RolledSection& row) {
        return bare_name(row.name) == wanted;
    });
    return found == rows.end() ? nullptr : &*found;
}

const LoadCategory* find_load_category(const Catalogue& catalogue, std::string_view name) {
    return find_named(catalogue.load_categories, name);
}

const ServiceFactors* find_service_factors(const Catalogue& catalogue, Timber timber, int service_class) {
    const auto& rows = catalogue.service_factors;
    const auto found = std::find_if(rows.begin(), rows.end(), [&](const ServiceFactors& row) {
        return row.material == material_of(timber) && row.service_class == service_class;
    });
    return found == rows.end() ? nullptr : &*found;
}

double parameter(const Catalogue& catalogue, std::string_view key) {
    const auto& rows = catalogue.parameters;
    const auto found = std::find_if(rows.begin(), rows.end(), [&](const Parameter& row) { return row.key == key; });
    if (found == rows.end()) {
        throw std::logic_error("no parameter " + std::string(key));
    }
    return found->value;
}

std::string_view material_of(Timber timber) noexcept {
    switch (timber) {
    case Timber::solid_softwood:
    case Timber::solid_hardwood: return "solid timber";
    case Timber::glulam: return "glulam";
    case Timber::lvl: return "LVL";
    }
    return "";
}

Catalogue load_catalogue(const CatalogueFiles& files, const std::string& parameters, const std::string& base_directory,
                         Diagnostics& diagnostics) {
    Catalogue catalogue;
    read_sources(builtin("sources.csv"), catalogue.sources, diagnostics);
    const std::string base_set = read_parameters(parameters, base_directory, catalogue, diagnostics);
    load_classes(files, base_directory, catalogue, diagnostics);
    load_sizes(files, base_directory, catalogue, diagnostics);
    load_categories(files, base_directory, base_set, catalogue, diagnostics);
    catalogue.snow_psi = read_snow_psi(builtin("snow.csv"), base_set, diagnostics);
    read_service_factors(builtin("service-factors.csv"), catalogue, diagnostics);
    read_combinations(builtin("combinations.csv"), catalogue, diagnostics);
    return catalogue;
}

std::string builtin_fingerprint() {
    std::string text;
    for (const char* const name : data_files) {
        text.append(name).append("\n").append(builtin_file(name)).append("\n");
    }
    return fingerprint_of(text);
}

} // namespace spanledger
