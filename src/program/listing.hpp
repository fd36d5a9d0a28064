// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/catalogue.hpp"

#include <optional>
#include <string>
#include <string_view>
#include <variant>
#include <vector>

namespace spanledger {

/// A part of the catalogue, as aligned text or as JSON.
struct Listing {
    /// Empty: the row has no such value.
    using Value = std::variant<std::monostate, std::string, double, bool>;
    using Row = std::vector<Value>;

    std::string title;
    std::vector<std::string> columns; ///< with their units, e.g. "f_m_k_MPa"; the first holds the names to filter by
    std::vector<Row> rows;

    /// Appends a row, and behind it what `columns_with_origin` stands for.
    void add(Row row, const Provenance& from);
};

[[nodiscard]] Listing::Value maybe(const std::optional<double>& number);

/// The columns, then source, seen and origin (built in, or a line of a practice's file).
[[nodiscard]] std::vector<std::string> columns_with_origin(std::vector<std::string> columns);

[[nodiscard]] std::string name_of(const Listing::Row& row);

/// Keeps the rows of one name; spaces and case do not matter.
void keep_only(Listing& listing, std::string_view name);

[[nodiscard]] std::string listing_text(const Listing& listing);

/// {"title": [{column: value, ...}, ...], ...}; blanks and hyphens of a title become "_".
[[nodiscard]] std::string listings_json(const std::vector<Listing>& listings);

} // namespace spanledger
