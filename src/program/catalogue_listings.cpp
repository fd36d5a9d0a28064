// SPDX-License-Identifier: MIT
#include "catalogue_listings.hpp"

#include "spanledger/limits.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>

namespace spanledger {
namespace {

std::string seen_mark(const Provenance& from) {
    const char* mark = from.seen ? "seen" : "from memory";
    return from.practice_own ? fmt::format("{}, practice's own", mark) : mark;
}

std::string duration_word(Duration duration) {
    constexpr std::array words{"permanent", "long", "medium", "short", "instantaneous"};
    return words[static_cast<std::size_t>(duration)];
}

std::string kind_word(Timber timber) {
    constexpr std::array words{"solid softwood", "solid hardwood", "glulam", "LVL"};
    return words[static_cast<std::size_t>(timber)];
}

Listing list_classes(const Catalogue& catalogue) {
    Listing listing{"classes",
                    {"class", "timber", "f_m_k_MPa", "f_v_k_MPa", "f_c_90_k_MPa", "E_0_mean_MPa", "E_0_05_MPa",
                     "G_mean_MPa", "rho_k_kg_m3", "rho_mean_kg_m3", "standard", "source", "seen"},
                    {}};
    for (const TimberClass& c : catalogue.timber_classes) {
        listing.rows.push_back({c.name, kind_word(c.timber), c.f_m_k, c.f_v_k, c.f_c_90_k, c.E_0_mean, c.E_0_05,
                                c.G_mean, c.rho_k, c.rho_mean, c.standard, c.provenance.source,
                                seen_mark(c.provenance)});
    }
    return listing;
}

Listing list_series(const Catalogue& catalogue) {
    Listing listing{"series", {"series", "region", "sizes_mm", "source", "seen"}, {}};
    for (const TimberSize& size : catalogue.timber_sizes) {
        const std::string text = fmt::format("{}x{}", size.b, size.h);
        const auto known = std::find_if(listing.rows.begin(), listing.rows.end(), [&](const auto& row) {
            return std::get<std::string>(row[0]) == size.series;
        });
        if (known != listing.rows.end()) {
            std::get<std::string>((*known)[2]) += " " + text;
        } else {
            listing.rows.push_back(
                {size.series, size.region, text, size.provenance.source, seen_mark(size.provenance)});
        }
    }
    return listing;
}

Listing list_sections(const Catalogue& catalogue) {
    Listing listing{"sections", {"section", "series", "b_mm", "h_mm", "W_mm3", "I_mm4", "source", "seen"}, {}};
    for (const TimberSize& size : catalogue.timber_sizes) {
        listing.rows.push_back({fmt::format("{}x{}", size.b, size.h), size.series, size.b, size.h,
                                size.b * size.h * size.h / 6.0, size.b * size.h * size.h * size.h / 12.0,
                                size.provenance.source, seen_mark(size.provenance)});
    }
    return listing;
}

Listing list_loads(const Catalogue& catalogue) {
    Listing listing{"loads",
                    {"category", "use", "roof", "duration", "psi0", "psi1", "psi2", "q_k_guide_kN_m2", "Q_k_guide_kN",
                     "source", "seen"},
                    {}};
    const auto guide = [](const std::optional<double>& value, double factor) {
        return value ? fmt::format("{}", *value * factor) : std::string();
    };
    for (const LoadCategory& c : catalogue.load_categories) {
        listing.rows.push_back({c.name, c.use, c.roof, duration_word(c.duration), c.psi.psi0, c.psi.psi1, c.psi.psi2,
                                guide(c.q_k, 1000.0), guide(c.Q_k, 0.001), c.provenance.source,
                                seen_mark(c.provenance)});
    }
    return listing;
}

Listing list_parameters(const Catalogue& catalogue) {
    Listing listing{"parameters",
                    {"parameter", "value", "unit", "recommended", "set", "clause", "meaning", "source", "seen"},
                    {}};
    for (const Parameter& p : catalogue.parameters) {
        listing.rows.push_back({p.key, p.value, p.unit, p.recommended, p.set, p.clause, p.meaning,
                                p.provenance.source, seen_mark(p.provenance)});
    }
    return listing;
}

Listing list_limits(const Catalogue& /*catalogue*/) {
    Listing listing{"limits", {"limit", "letter", "about"}, {}};
    for (const LimitDefinition& d : limit_definitions) {
        listing.rows.push_back({std::string(d.name), std::string(1, d.letter), std::string(d.about)});
    }
    return listing;
}

Listing list_sources(const Catalogue& catalogue) {
    Listing listing{"sources", {"source", "title", "edition", "note"}, {}};
    for (const Source& s : catalogue.sources) listing.rows.push_back({s.key, s.title, s.edition, s.note});
    return listing;
}

constexpr std::array topics{
    CatalogueTopic{"classes", list_classes},       CatalogueTopic{"series", list_series},
    CatalogueTopic{"sections", list_sections},     CatalogueTopic{"loads", list_loads},
    CatalogueTopic{"parameters", list_parameters}, CatalogueTopic{"limits", list_limits},
    CatalogueTopic{"sources", list_sources},
};

} // namespace

std::span<const CatalogueTopic> catalogue_topics() noexcept { return topics; }

} // namespace spanledger
