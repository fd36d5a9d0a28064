// SPDX-License-Identifier: MIT
#include "published/published.hpp"

#include "spanledger/catalogue.hpp"

#include <catch2/catch.hpp>
#include <fmt/format.h>

using namespace spanledger;

// Values that the catalogue holds, against the texts that quote the standards.

namespace published {
namespace {

const Catalogue& catalogue(const std::string& set) {
    const auto load = [](const char* name) {
        Diagnostics diagnostics;
        auto loaded = load_catalogue({}, name, ".", diagnostics);
        REQUIRE_FALSE(diagnostics.has_errors());
        return loaded;
    };
    static const Catalogue recommended = load("recommended");
    static const Catalogue uk = load("uk");
    return set == "uk" ? uk : recommended;
}

struct Factors {
    Timber timber;
    const char* name;
    Mark k_mod_mark;
    Mark k_def_mark;
};

constexpr std::array factors{
    Factors{Timber::solid_softwood, "solid timber", Mark::seen, Mark::seen},
    Factors{Timber::glulam, "glulam", Mark::seen, Mark::seen},
    Factors{Timber::lvl, "LVL", Mark::seen, Mark::seen},
};

Example k_mod_table() {
    constexpr std::array durations{"permanent", "long", "medium", "short", "instantaneous"};
    constexpr std::array dry{"0.60", "0.70", "0.80", "0.90", "1.10"};
    constexpr std::array wet{"0.50", "0.55", "0.65", "0.70", "0.90"};
    Example e;
    e.title = "k_mod";
    e.source = "EN 1995-1-1 Table 3.1, as quoted in the ICE Manual of Structural Design: Buildings, Table 19.9 (web "
               "copy); LVL also in LVL Handbook Europe 2025, page 118";
    e.inputs = "material, service class (SC), load duration";
    for (const Factors& f : factors) {
        for (int service_class = 1; service_class <= 3; ++service_class) {
            const ServiceFactors* row = find_service_factors(catalogue("recommended"), f.timber, service_class);
            for (std::size_t i = 0; i < durations.size(); ++i) {
                e.rows.push_back({f.k_mod_mark, fmt::format("{}, SC {}, {}", f.name, service_class, durations[i]),
                                  service_class == 3 ? wet[i] : dry[i], row->k_mod[i], "-"});
            }
        }
    }
    return e;
}

Example k_def_table() {
    constexpr std::array printed{"0.60", "0.80", "2.00"};
    Example e;
    e.title = "k_def";
    e.source = "EN 1995-1-1 Table 3.2, as quoted in Structural Design Essentials (TU Delft open textbook) and LVL "
               "Handbook Europe 2025, page 118";
    e.inputs = "material, service class (SC)";
    for (const Factors& f : factors) {
        for (int service_class = 1; service_class <= 3; ++service_class) {
            const ServiceFactors* row = find_service_factors(catalogue("recommended"), f.timber, service_class);
            e.rows.push_back({f.k_def_mark, fmt::format("{}, SC {}", f.name, service_class),
                              printed[static_cast<std::size_t>(service_class - 1)], row->k_def, "-"});
        }
    }
    return e;
}

struct Value {
    Mark mark;
    const char* key;
    const char* printed;
    const char* unit;
    const char* set = "recommended";
};

constexpr Mark seen = Mark::seen;
constexpr Mark memory = Mark::from_memory;
constexpr std::array values{
    Value{seen, "gamma_G", "1.35", "-"},
    Value{seen, "gamma_Q", "1.50", "-"},
    Value{memory, "xi", "0.85", "-"},
    Value{seen, "gamma_G", "1.35", "-", "uk"},
    Value{seen, "gamma_Q", "1.5", "-", "uk"},
    Value{memory, "xi", "0.925", "-", "uk"},
    Value{seen, "gamma_M_solid", "1.30", "-"},
    Value{seen, "gamma_M_glulam", "1.25", "-"},
    Value{seen, "gamma_M_lvl", "1.20", "-"},
    Value{seen, "gamma_M_solid", "1.3", "-", "uk"},
    Value{seen, "k_sys", "1.1", "-"},
    Value{seen, "k_sys_max_spacing", "610", "mm"},
    Value{memory, "k_cr_solid", "0.67", "-"},
    Value{memory, "k_cr_glulam", "0.67", "-"},
    Value{memory, "k_cr_lvl", "1.0", "-"},
    Value{seen, "kh_solid_depth", "150", "mm"},
    Value{memory, "kh_solid_exponent", "0.2", "-"},
    Value{memory, "kh_solid_cap", "1.3", "-"},
    Value{memory, "kh_solid_max_density", "700", "kg/m3"},
    Value{memory, "kh_glulam_depth", "600", "mm"},
    Value{memory, "kh_glulam_exponent", "0.1", "-"},
    Value{memory, "kh_glulam_cap", "1.1", "-"},
    Value{seen, "kh_lvl_depth", "300", "mm"},
    Value{memory, "kh_lvl_cap", "1.2", "-"},
    Value{memory, "kc90_solid", "1.5", "-"},
    Value{memory, "kc90_glulam", "1.75", "-"},
    Value{memory, "kc90_glulam_max_length", "400", "mm"},
    Value{memory, "kc90_extra_length", "30", "mm"},
    Value{memory, "k_def_wet", "1.0", "-"},
    Value{seen, "vibration_min_frequency", "8", "Hz"},
    Value{seen, "vibration_damping_recommended_rule", "0.01", "-"},
    Value{memory, "vibration_damping_uk_rule", "0.02", "-", "uk"},
    Value{memory, "vibration_kamp_uk", "1.05", "-", "uk"},
    Value{memory, "vibration_kstrut_uk", "0.97", "-", "uk"},
    Value{memory, "vibration_kdist_floor", "0.30", "-", "uk"},
    Value{memory, "vibration_a_short_mm", "1.8", "mm", "uk"},
    Value{memory, "vibration_a_short_max_span", "4000", "mm", "uk"},
    Value{memory, "vibration_a_long", "16500", "-", "uk"},
    Value{memory, "vibration_a_long_exponent", "1.1", "-", "uk"},
};

Example parameter_table() {
    Example e;
    e.title = "Parameters of EN 1990 and EN 1995-1-1";
    e.source = "the standards and the UK national annexes, quoted in Steel Buildings in Europe, Part 4 (gamma_G, "
               "gamma_Q), Structural Design Essentials, TU Delft (gamma_M), ICE Manual of Structural Design: Buildings "
               "(k_sys), Porteous and Kermani, Structural Timber Design to Eurocode 5, 2007 (UK factors, 150 mm), LVL "
               "Handbook Europe 2025 (LVL, vibration)";
    e.inputs = "parameter set and key of the catalogue";
    for (const Value& v : values) {
        e.rows.push_back(
            {v.mark, fmt::format("{}: {}", v.set, v.key), v.printed, parameter(catalogue(v.set), v.key), v.unit});
    }
    e.not_covered = {
        {"LVL size factor capped at 1.1 (LVL Handbook, page 122)", "EN 1995-1-1 3.4(3) has 1.2 (from memory)"},
        {"k_cr of Germany and Austria, 2.0/f_v_k", "other annexes: a practice's own parameters"},
    };
    return e;
}

} // namespace

std::vector<Example> timber_parameters() {
    return {k_mod_table(), k_def_table(), parameter_table()};
}

namespace {

struct PsiRow {
    const char* category;
    std::array<const char*, 3> printed;
};

Example psi_table(const std::string& set, Mark mark, const std::string& source, const std::vector<PsiRow>& rows) {
    Example e;
    e.title = fmt::format("psi factors, {}", set);
    e.source = source;
    e.inputs = "category of use";
    for (const PsiRow& row : rows) {
        const LoadCategory* category = find_load_category(catalogue(set), row.category);
        REQUIRE(category != nullptr);
        const std::array ours{category->psi.psi0, category->psi.psi1, category->psi.psi2};
        for (std::size_t i = 0; i < ours.size(); ++i) {
            e.rows.push_back({mark, fmt::format("category {}, psi_{}", row.category, i), row.printed[i], ours[i], "-"});
        }
    }
    return e;
}

Example snow_table() {
    Example e;
    e.title = "psi factors of snow, altitude to 1000 m";
    e.source = "EN 1990 Table A1.1 and UK annex Table NA.A1.1";
    e.inputs = "parameter set";
    for (const char* set : {"recommended", "uk"}) {
        const Psi& psi = catalogue(set).snow_psi;
        e.rows.push_back({Mark::from_memory, fmt::format("{}, psi_0", set), "0.5", psi.psi0, "-"});
        e.rows.push_back({Mark::from_memory, fmt::format("{}, psi_1", set), "0.2", psi.psi1, "-"});
        e.rows.push_back({Mark::from_memory, fmt::format("{}, psi_2", set), "0", psi.psi2, "-"});
    }
    e.not_covered = {{"above 1000 m, and Finland, Iceland, Norway, Sweden: 0.7, 0.5, 0.2", "a load class gives them"}};
    return e;
}

} // namespace

std::vector<Example> psi_factors() {
    const std::vector<PsiRow> floors{{"A", {"0.7", "0.5", "0.3"}}, {"B", {"0.7", "0.5", "0.3"}},
                                     {"C", {"0.7", "0.7", "0.6"}}, {"D", {"0.7", "0.7", "0.6"}},
                                     {"E", {"1.0", "0.9", "0.8"}}, {"F", {"0.7", "0.7", "0.6"}},
                                     {"G", {"0.7", "0.5", "0.3"}}};
    return {
        psi_table("recommended", Mark::seen,
                  "EN 1990 Table A1.1, as quoted in Structural Design Essentials (TU Delft open textbook)", floors),
        psi_table("recommended", Mark::from_memory, "EN 1990 Table A1.1, roofs", {{"H", {"0", "0", "0"}}}),
        psi_table("uk", Mark::from_memory, "UK annex to EN 1990, Table NA.A1.1", {{"H", {"0.7", "0", "0"}}}),
        snow_table(),
    };
}

} // namespace published

TEST_CASE("catalogue: k_mod, k_def and parameters as quoted") {
    for (const auto& table : published::timber_parameters()) published::check(table);
}

TEST_CASE("catalogue: psi factors as quoted") {
    for (const auto& table : published::psi_factors()) published::check(table);
}
