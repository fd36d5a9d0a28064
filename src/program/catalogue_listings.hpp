// SPDX-License-Identifier: MIT
#pragma once

#include "listing.hpp"
#include "spanledger/catalogue.hpp"

#include <span>
#include <string_view>

namespace spanledger {

/// A topic of the catalogue command: its name, and how to list it. The first column holds the names to filter by.
struct CatalogueTopic {
    std::string_view name;
    Listing (*list)(const Catalogue& catalogue);
};

[[nodiscard]] std::span<const CatalogueTopic> catalogue_topics() noexcept;

} // namespace spanledger
