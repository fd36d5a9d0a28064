// SPDX-License-Identifier: MIT
#include "catalogue_listings.hpp"

#include "spanledger/writers/json_text.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <stdexcept>

namespace spanledger {
namespace {

std::string duration_word(Duration duration) {
    constexpr std::array words{"permanent", "long", "medium", "short", "instantaneous"};
    return words.at(static_cast<std::size_t>(duration));
}

Listing list_timber_classes(const Catalogue& catalogue) {
    Listing listing{"timber classes",
                    columns_with_origin({"class", "material", "f_m_k_MPa", "f_v_k_MPa", "f_c_90_k_MPa", "E_0_mean_MPa",
                                         "E_0_05_MPa", "G_mean_MPa", "rho_k_kg_m3", "rho_mean_kg_m3", "standard"}),
                    {}};
    for (const TimberClass& c : catalogue.timber_classes) {
        listing.add({c.name, std::string(material_of(c.timber)), c.f_m_k, c.f_v_k, c.f_c_90_k, c.E_0_mean, c.E_0_05,
                     c.G_mean, c.rho_k, c.rho_mean, c.standard},
                    c.provenance);
    }
    return listing;
}

Listing list_steel_grades(const Catalogue& catalogue) {
    Listing listing{
        "steel grades", columns_with_origin({"grade", "f_y_to_16_mm_MPa", "f_y_to_40_mm_MPa", "standard"}), {}};
    for (const SteelGrade& g : catalogue.steel_grades) {
        listing.add({g.name, g.f_y_16, maybe(g.f_y_40), g.standard}, g.provenance);
    }
    return listing;
}

Listing list_cold_formed_grades(const Catalogue& catalogue) {
    Listing listing{"cold-formed grades", columns_with_origin({"grade", "f_yb_MPa", "standard"}), {}};
    for (const ColdFormedGrade& g : catalogue.cold_formed_grades) {
        listing.add({g.name, g.f_yb, g.standard}, g.provenance);
    }
    return listing;
}

std::vector<Listing> list_classes(const Catalogue& catalogue) {
    return {list_timber_classes(catalogue), list_steel_grades(catalogue), list_cold_formed_grades(catalogue)};
}

std::vector<Listing> list_loads(const Catalogue& catalogue) {
    constexpr double kN_m2 = 1000.0; // of 1 N/mm2
    constexpr double kN = 0.001;     // of 1 N
    Listing listing{"load categories",
                    columns_with_origin({"category", "use", "roof", "duration", "psi0", "psi1", "psi2",
                                         "q_k_guide_kN_m2", "Q_k_guide_kN"}),
                    {}};
    for (const LoadCategory& c : catalogue.load_categories) {
        listing.add({c.name, c.use, c.roof, duration_word(c.duration), c.psi.psi0, c.psi.psi1, c.psi.psi2,
                     maybe(in_unit(c.q_k, kN_m2)), maybe(in_unit(c.Q_k, kN))},
                    c.provenance);
    }
    return {listing};
}

Listing list_combinations(const Catalogue& catalogue) {
    constexpr std::array words{"none", "full", "combination value"};
    Listing listing{"combinations",
                    columns_with_origin({"combination", "set", "permanent_reduced_by_xi", "variable", "clause"}),
                    {}};
    for (const Combination& c : catalogue.combinations) {
        listing.add(
            {c.name, c.set, c.reduced_permanent, std::string(words.at(static_cast<std::size_t>(c.variable))), c.clause},
            c.provenance);
    }
    return listing;
}

Listing list_service_factors(const Catalogue& catalogue) {
    Listing listing{"service factors",
                    columns_with_origin({"material", "service_class", "k_mod_permanent", "k_mod_long", "k_mod_medium",
                                         "k_mod_short", "k_mod_instantaneous", "k_def"}),
                    {}};
    for (const ServiceFactors& f : catalogue.service_factors) {
        listing.add({f.material, static_cast<double>(f.service_class), f.k_mod[0], f.k_mod[1], f.k_mod[2], f.k_mod[3],
                     f.k_mod[4], f.k_def},
                    f.provenance);
    }
    return listing;
}

std::vector<Listing> list_parameters(const Catalogue& catalogue) {
    Listing listing{"parameters",
                    columns_with_origin({"parameter", "value", "unit", "recommended", "set", "clause", "meaning"}),
                    {}};
    for (const Parameter& p : catalogue.parameters) {
        listing.add({p.key, p.value, p.unit, p.recommended, p.set, p.clause, p.meaning}, p.provenance);
    }
    return {listing, list_combinations(catalogue), list_service_factors(catalogue)};
}

std::vector<Listing> list_sources(const Catalogue& catalogue) {
    Listing listing{"sources", {"source", "edition", "title", "note"}, {}};
    for (const Source& s : catalogue.sources) listing.rows.push_back({s.key, s.edition, s.title, s.note});
    return {listing};
}

struct Topic {
    std::string_view name;
    std::vector<Listing> (*list)(const Catalogue& catalogue);
};

constexpr std::array topics{
    Topic{"classes", list_classes}, Topic{"series", list_series},         Topic{"sections", list_sections},
    Topic{"loads", list_loads},     Topic{"parameters", list_parameters}, Topic{"sources", list_sources},
};

} // namespace

std::vector<Listing> catalogue_listings(std::string_view topic, const Catalogue& catalogue, Detail detail) {
    if (topic == "limits") return list_limits(catalogue, detail);
    const auto* const found =
        std::find_if(topics.begin(), topics.end(), [&](const Topic& row) { return row.name == topic; });
    if (found == topics.end()) throw std::out_of_range("a topic of the option table has no listing");
    return found->list(catalogue);
}

} // namespace spanledger
