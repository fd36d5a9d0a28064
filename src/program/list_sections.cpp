// SPDX-License-Identifier: MIT
#include "catalogue_listings.hpp"

#include "spanledger/clauses/rectangle.hpp"
#include "spanledger/clauses/rolled_section.hpp"
#include "spanledger/member.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {
namespace {

/// A section of any family, as its series lists it.
struct SeriesItem {
    const std::string& series;
    std::string section;
    const char* material;
    const Provenance& provenance;
};

/// Sizes of a series side by side, under the provenance of its first.
class SeriesListing {
public:
    void add(const SeriesItem& item) {
        auto& rows = listing_.rows;
        const auto known =
            std::find_if(rows.begin(), rows.end(), [&](const auto& row) { return name_of(row) == item.series; });
        if (known == rows.end()) {
            listing_.add({item.series, std::string(item.material), 1.0, item.section}, item.provenance);
            return;
        }
        std::get<double>((*known)[2]) += 1.0;
        std::get<std::string>((*known)[3]) += ", " + item.section;
    }
    [[nodiscard]] const Listing& listing() const noexcept { return listing_; }

private:
    Listing listing_{"series", columns_with_origin({"series", "material", "count", "sections"}), {}};
};

std::string timber_name(const TimberSize& size) {
    return fmt::format("{}x{}", size.b, size.h);
}

Listing list_timber_sections(const Catalogue& catalogue) {
    Listing listing{
        "timber sections", columns_with_origin({"section", "series", "region", "b_mm", "h_mm", "W_mm3", "I_mm4"}), {}};
    for (const TimberSize& size : catalogue.timber_sizes) {
        listing.add({timber_name(size), size.series, size.region, size.b, size.h,
                     rectangle::section_modulus(size.b, size.h), rectangle::second_moment(size.b, size.h)},
                    size.provenance);
    }
    return listing;
}

Listing list_rolled_sections(const Catalogue& catalogue) {
    Listing listing{"rolled sections",
                    columns_with_origin({"section", "series", "h_mm", "b_mm", "t_w_mm", "t_f_mm", "r_mm", "A_mm2",
                                         "I_y_mm4", "W_el_mm3", "W_pl_mm3"}),
                    {}};
    for (const RolledSection& s : catalogue.rolled_sections) {
        const rolled_section::Size<double> size{s.h, s.b, s.t_w, s.t_f, s.r};
        const double roots =
            s.shape == RolledShape::channel ? rolled_section::roots_of_channel : rolled_section::roots_of_i_section;
        const double I_y = rolled_section::second_moment(size, roots);
        listing.add({s.name, s.series, s.h, s.b, s.t_w, s.t_f, s.r, rolled_section::area(size, roots), I_y,
                     rolled_section::elastic_modulus(I_y, s.h), rolled_section::plastic_modulus(size, roots)},
                    s.provenance);
    }
    return listing;
}

Listing list_cold_formed_sections(const Catalogue& catalogue) {
    Listing listing{"cold-formed sections",
                    columns_with_origin({"section", "series", "h_mm", "b_1_mm", "b_2_mm", "c_mm", "t_nom_mm", "r_mm"}),
                    {}};
    for (const ColdFormedSize& s : catalogue.cold_formed_sizes) {
        listing.add(
            {lipped_channel_name(s.size), s.series, s.size.h, s.size.b_1, s.size.b_2, s.size.c, s.size.t_nom, s.size.r},
            s.provenance);
    }
    return listing;
}

} // namespace

std::vector<Listing> list_series(const Catalogue& catalogue) {
    SeriesListing series;
    for (const TimberSize& s : catalogue.timber_sizes) {
        series.add({s.series, timber_name(s), "timber", s.provenance});
    }
    for (const RolledSection& s : catalogue.rolled_sections) {
        series.add({s.series, s.name, "rolled steel", s.provenance});
    }
    for (const ColdFormedSize& s : catalogue.cold_formed_sizes) {
        series.add({s.series, lipped_channel_name(s.size), "cold-formed steel", s.provenance});
    }
    return {series.listing()};
}

std::vector<Listing> list_sections(const Catalogue& catalogue) {
    return {list_timber_sections(catalogue), list_rolled_sections(catalogue), list_cold_formed_sections(catalogue)};
}

} // namespace spanledger
