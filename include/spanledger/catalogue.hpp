// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/brief.hpp"
#include "spanledger/input/diagnostics.hpp"

#include <array>
#include <map>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

// The material catalogue: rows of the CSV files of materials/, built into the program, and a practice's own rows over
// them. Numbers as in the files' headers: MPa, mm, kg/m3; factors without unit.

namespace spanledger {

/// Where a row comes from. Every row has one.
struct Provenance {
    std::string source{}; ///< key in sources.csv, or the practice's own words for its own rows
    bool seen = false;    ///< the value was seen in that source; otherwise it is recalled from memory
    bool practice_own = false;
    std::string file{}; ///< the practice file, empty for built-in rows
    std::size_t line = 0;
    std::string note{};
};

struct Source {
    std::string key;
    std::string title;
    std::string edition;
    std::string note;
};

enum class Timber { solid_softwood, solid_hardwood, glulam, lvl };

/// A strength class of timber. Strengths and stiffnesses in MPa, densities in kg/m3.
struct TimberClass {
    std::string name;
    std::string standard;
    Timber timber = Timber::solid_softwood;
    double f_m_k = 0.0;    ///< bending, edgewise
    double f_v_k = 0.0;    ///< shear
    double f_c_90_k = 0.0; ///< compression perpendicular to grain (edgewise for LVL)
    std::optional<double> f_t_0_k;
    std::optional<double> f_t_90_k;
    std::optional<double> f_c_0_k;
    double E_0_mean = 0.0;
    double E_0_05 = 0.0;
    std::optional<double> E_90_mean;
    double G_mean = 0.0;
    std::optional<double> G_05; ///< where tabulated
    double rho_k = 0.0;
    double rho_mean = 0.0;
    std::optional<double> size_exponent; ///< LVL: s of EN 14374
    Provenance provenance;
};

/// A rectangular timber size of a series.
struct TimberSize {
    std::string series;
    std::string region;
    double b = 0.0; ///< mm
    double h = 0.0; ///< mm
    Provenance provenance;
};

/// A grade of structural sheet for cold-formed sections.
struct ColdFormedGrade {
    std::string name;
    std::string standard;
    double f_yb = 0.0; ///< basic yield strength, MPa
    Provenance provenance;
};

/// Outer sizes of a lipped channel, mm.
struct LippedChannelSize {
    double h = 0.0;
    double b_1 = 0.0;   ///< compression flange
    double b_2 = 0.0;   ///< tension flange
    double c = 0.0;     ///< both lips
    double t_nom = 0.0; ///< zinc included
    double r = 0.0;     ///< inner radius of the corners
};

/// A lipped channel of a series.
struct ColdFormedSize {
    std::string series;
    LippedChannelSize size;
    Provenance provenance;
};

/// A grade of structural steel.
struct SteelGrade {
    std::string name;
    std::string standard;
    double f_y_16 = 0.0;          ///< yield strength up to 16 mm thick, MPa
    std::optional<double> f_y_40; ///< above 16 up to 40 mm thick, MPa
    Provenance provenance;
};

enum class RolledShape { i_section, channel };

/// A hot-rolled section of a series, sizes in mm.
struct RolledSection {
    std::string series;
    std::string name; ///< "IPE 200", "UB 203x133x25"
    RolledShape shape = RolledShape::i_section;
    double h = 0.0;
    double b = 0.0;
    double t_w = 0.0;
    double t_f = 0.0;
    double r = 0.0; ///< root radius
    Provenance provenance;
};

/// A category of use: EN 1991-1-1 Tables 6.1 to 6.10, EN 1990 Table A1.1 as the parameter set in force gives it.
struct LoadCategory {
    std::string name; ///< "A", "C3", "H", ...
    std::string use;
    bool roof = false;
    Duration duration = Duration::medium_term;
    Psi psi;
    std::optional<double> q_k; ///< N/mm2, guide value
    std::optional<double> Q_k; ///< N, guide value
    Provenance provenance;
};

/// One value that a national annex may change, as in force.
struct Parameter {
    std::string key; ///< "gamma_G", "kcr_solid", ...
    double value = 0.0;
    std::string unit; ///< "-" for a pure number
    std::string clause;
    std::string meaning;
    double least = 0.0; ///< hard range
    double greatest = 0.0;
    double recommended = 0.0; ///< what the standard recommends
    std::string set;          ///< the set that gave the value in force
    Provenance provenance;
};

/// kmod of EN 1995-1-1 Table 3.1 by duration, and kdef of Table 3.2, for one material and service class.
struct ServiceFactors {
    std::string material; ///< "solid timber", "glulam", "LVL"
    int service_class = 1;
    std::array<double, 5> k_mod{}; ///< indexed by Duration
    double k_def = 0.0;
    Provenance provenance;
};

/// One combination of actions (EN 1990) as data.
struct Combination {
    std::string set;                ///< "6.10" or "6.10a/b"
    std::string name;               ///< "6.10", "6.10a", "6.10b", "6.10 permanent only", ...
    bool reduced_permanent = false; ///< γG is multiplied by ξ
    enum class Variable { none, full, combination_value } variable = Variable::none;
    std::string clause;
    Provenance provenance;
};

/// All rows known in a run, practice rows in place of the built-in ones they override. Vectors keep file order.
struct Catalogue {
    std::vector<Source> sources;
    std::vector<TimberClass> timber_classes;
    std::vector<TimberSize> timber_sizes;
    std::vector<SteelGrade> steel_grades;
    std::vector<ColdFormedGrade> cold_formed_grades;
    std::vector<ColdFormedSize> cold_formed_sizes;
    std::vector<RolledSection> rolled_sections;
    std::vector<LoadCategory> load_categories;
    std::vector<Parameter> parameters;
    std::string parameter_set; ///< "recommended", "uk", or the practice file's name
    std::vector<ServiceFactors> service_factors;
    std::vector<Combination> combinations;
    Psi snow_psi; ///< of the parameter set in force, altitude up to 1000 m
};

[[nodiscard]] const TimberClass* find_timber_class(const Catalogue& catalogue, std::string_view name);
[[nodiscard]] const SteelGrade* find_steel_grade(const Catalogue& catalogue, std::string_view name);
[[nodiscard]] const ColdFormedGrade* find_cold_formed_grade(const Catalogue& catalogue, std::string_view name);
/// Case and spaces do not matter: "ipe200" is "IPE 200".
[[nodiscard]] const RolledSection* find_rolled_section(const Catalogue& catalogue, std::string_view name);
[[nodiscard]] const LoadCategory* find_load_category(const Catalogue& catalogue, std::string_view name);
[[nodiscard]] const ServiceFactors* find_service_factors(const Catalogue& catalogue, Timber timber, int service_class);

/// Value of a parameter that the built-in catalogue defines. An unknown key is a fault in the program
/// (std::logic_error).
[[nodiscard]] double parameter(const Catalogue& catalogue, std::string_view key);

/// Words of the trade for a kind of timber: "solid timber", "glulam", "LVL" (the material column of results).
[[nodiscard]] std::string_view material_of(Timber timber) noexcept;

/// The built-in rows with parameter set `set` in force ("recommended" or "uk"), then the practice's files over them.
/// `parameters` may be the path of a practice's own .toml file. All problems go to `diagnostics`; rows with problems
/// are left out. `base_directory` is what relative file names are relative to (the brief's folder).
[[nodiscard]] Catalogue load_catalogue(const CatalogueFiles& files, const std::string& parameters,
                                       const std::string& base_directory, Diagnostics& diagnostics);

/// First 16 hexadecimal digits of SHA-256 over the built-in data files.
[[nodiscard]] std::string builtin_fingerprint();

} // namespace spanledger
