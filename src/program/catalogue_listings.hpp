// SPDX-License-Identifier: MIT
#pragma once

#include "listing.hpp"

#include <string_view>
#include <vector>

namespace spanledger {

/// Limits have formulas and symbols that are shown for one of them only.
enum class Detail { overview, full };

/// The listings of a topic, one of catalogue_words(). An unknown topic is a fault in the program (std::out_of_range).
[[nodiscard]] std::vector<Listing> catalogue_listings(std::string_view topic, const Catalogue& catalogue,
                                                      Detail detail);

/// Sections and their series, of timber and steel.
[[nodiscard]] std::vector<Listing> list_series(const Catalogue& catalogue);
[[nodiscard]] std::vector<Listing> list_sections(const Catalogue& catalogue);

/// Which limits there are, the materials that have them, and their clauses there.
[[nodiscard]] std::vector<Listing> list_limits(const Catalogue& catalogue, Detail detail);

} // namespace spanledger
