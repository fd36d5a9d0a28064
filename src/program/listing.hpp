// SPDX-License-Identifier: MIT
#pragma once

#include <string>
#include <variant>
#include <vector>

namespace spanledger {

/// A table of the catalogue: as aligned text or as JSON.
struct Listing {
    using Value = std::variant<std::string, double, bool>;
    std::string title;
    std::vector<std::string> columns; ///< with units where they have one, e.g. "f_m_k_MPa"
    std::vector<std::vector<Value>> rows;
};

[[nodiscard]] std::string listing_text(const Listing& listing);

/// {"title": [{column: value, ...}, ...], ...}
[[nodiscard]] std::string listings_json(const std::vector<Listing>& listings);

} // namespace spanledger
