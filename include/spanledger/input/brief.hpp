// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/diagnostics.hpp"

#include <optional>
#include <string>
#include <vector>

// What a practice asks for, after reading: every quantity in N, mm, MPa, kg, s. Areas loads are N/mm2 (1 kN/m2 is
// 0.001 N/mm2). Which keys exist, their ranges and their words are in the schema (brief_schema.hpp).

namespace spanledger {

enum class Duration { permanent, long_term, medium_term, short_term, instantaneous };

enum class Arrangement { single_span, cantilever };
enum class CompressionEdge { held, free };
enum class LoadPosition { top, centroid, bottom };
enum class WebAtSupport { seated, stiffened_or_cleated };
enum class LateralCurves { rolled_sections, general_case };
enum class PartitionsCreep { permanent, imposed };
enum class VibrationRuleSet { uk, recommended };
enum class Rounding { down, nearest };
enum class TableKind { permissible_span, permissible_load, utilisation, smallest_section };

struct Practice {
    std::string name;
    std::string number;
    std::string revision;
    std::string title;
    std::string prepared;
    std::string checked;
    std::string date; ///< ISO 8601, from the brief or SOURCE_DATE_EPOCH; empty if neither is given
    std::string notes;
    std::string replaces;
};

struct BasisChoice {
    std::string code = "european";
    std::string parameters = "recommended"; ///< a set's name, or the path of a practice's own .toml file
    std::string combination = "6.10";       ///< a set of combinations in the catalogue
    int service_class = 1;
    bool wet_on_installation = false;
    bool load_sharing = false;
    double utilisation_cap = 1.0;
    bool self_weight = true;
    bool shear_deflection = false;
    bool concentrated_near_support = false; ///< EN 1995-1-1 6.1.7(3) is used
    bool uniform_near_support = false;      ///< national: uniform load within h of the face is left out of shear
    PartitionsCreep partitions_creep = PartitionsCreep::permanent;
    LateralCurves lateral_curves = LateralCurves::rolled_sections;
};

struct CatalogueFiles {
    std::vector<std::string> classes;
    std::vector<std::string> sections;
    std::vector<std::string> series;
    std::vector<std::string> loads;
};

struct Support {
    Arrangement arrangement = Arrangement::single_span;
    double bearing = 50.0; ///< mm
    bool root_fixed = false;
    CompressionEdge compression_edge = CompressionEdge::free;
    std::optional<double> restraint_spacing; ///< mm
    LoadPosition load_position = LoadPosition::top;
    std::optional<double> load_height; ///< mm above the shear centre (steel)
    WebAtSupport web_at_support = WebAtSupport::seated;
};

struct Deck {
    std::string name;
    std::optional<double> max_spacing; ///< mm
    std::optional<double> stiffness;   ///< N mm2 per metre, across the joists
};

/// A deflection limit: L/ratio, a length, or the smaller of both. At least one is set.
struct DeflectionLimit {
    std::optional<double> ratio;
    std::optional<double> max_mm;
};

struct FrequencyLimit {
    double min_hz = 8.0;
    double variable_share = 0.1;
};

struct VibrationLimit {
    VibrationRuleSet rule = VibrationRuleSet::uk;
    double floor_width = 0.0; ///< mm
    bool strutting = false;
    std::optional<double> a_mm; ///< recommended rule only
    std::optional<double> b;    ///< recommended rule only
    std::optional<double> damping;
    std::optional<double> kamp; ///< uk rule only
};

struct LimitsAsked {
    std::optional<DeflectionLimit> variable_deflection;
    std::optional<DeflectionLimit> instantaneous_deflection;
    std::optional<DeflectionLimit> final_deflection;
    std::optional<double> camber; ///< mm
    std::optional<FrequencyLimit> frequency;
    std::optional<double> unit_load_deflection; ///< mm under 1 kN (steel)
    std::optional<VibrationLimit> vibration;
};

struct SearchRange {
    std::optional<double> min_clear_span; ///< mm; absent: the greater of 500 mm and 2h
    std::optional<double> max_clear_span; ///< mm; absent: 30 m
    double step = 10.0;                   ///< mm
    Rounding rounding = Rounding::down;
};

/// ψ factors of EN 1990 Table A1.1.
struct Psi {
    double psi0 = 0.0;
    double psi1 = 0.0;
    double psi2 = 0.0;
};

/// The actions of one kind of floor or roof. Defaults of duration and ψ are filled in from the load category.
struct LoadClass {
    std::string name;
    std::string category;
    double permanent = 0.0;            ///< N/mm2, self-weight of the joist not included
    double permanent_partitions = 0.0; ///< N/mm2
    double variable = 0.0;             ///< N/mm2
    double partitions = 0.0;           ///< N/mm2, movable partition allowance (variable)
    Duration duration = Duration::medium_term;
    Psi psi;
    double snow = 0.0; ///< N/mm2
    Duration snow_duration = Duration::short_term;
    Psi snow_psi;
    double concentrated = 0.0;       ///< N, the whole Qk
    double concentrated_share = 1.0; ///< part of Qk that one joist takes
    Duration concentrated_duration = Duration::medium_term;
    bool concentrated_in_deflection = false;
};

struct MembersEntry {
    std::string name;
    std::string material_class;     ///< "C24", "S275", ...
    std::string series;             ///< either a series ...
    std::vector<std::string> sizes; ///< ... or sizes as written
    int plies = 1;
    bool plies_fixed_together = false;
    std::vector<double> stock_lengths; ///< mm
    Place place;                       ///< of the entry, for messages that need the catalogue
};

struct TableRequest {
    std::string name;
    TableKind kind = TableKind::permissible_span;
    std::vector<std::string> members;
    std::vector<double> spacings; ///< mm
    std::vector<std::string> loads;
    std::vector<double> spans; ///< mm, clear
};

struct Brief {
    std::string file; ///< as named by the user; "-" for standard input
    Practice practice;
    BasisChoice basis;
    CatalogueFiles catalogue;
    Support support;
    Deck deck;
    LimitsAsked limits;
    SearchRange search;
    std::vector<LoadClass> loads;
    std::vector<MembersEntry> members;
    std::vector<TableRequest> tables;
};

} // namespace spanledger
