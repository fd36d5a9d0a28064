// SPDX-License-Identifier: MIT
#include "catalogue_listings.hpp"
#include "commands.hpp"

#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <ostream>

namespace spanledger {
namespace {

std::string folded(std::string_view text) {
    std::string plain;
    for (const char c : text) {
        if (c != ' ') plain += static_cast<char>(std::tolower(static_cast<unsigned char>(c)));
    }
    return plain;
}

std::string name_of(const std::vector<Listing::Value>& row) { return std::get<std::string>(row.front()); }

std::vector<std::string> names_in(const Listing& listing) {
    std::vector<std::string> names;
    for (const auto& row : listing.rows) names.push_back(name_of(row));
    return names;
}

/// Keeps the rows of one name; spaces and case do not matter.
void keep_only(Listing& listing, const std::string& name) {
    const auto other = [&](const auto& row) { return folded(name_of(row)) != folded(name); };
    listing.rows.erase(std::remove_if(listing.rows.begin(), listing.rows.end(), other), listing.rows.end());
}

std::vector<std::string> topic_names() {
    std::vector<std::string> names;
    for (const CatalogueTopic& topic : catalogue_topics()) names.emplace_back(topic.name);
    return names;
}

std::optional<Catalogue> catalogue_of(const CommandLine& line, const Surroundings& around) {
    if (const auto brief = line.value("brief")) {
        std::optional<Inputs> inputs = read_and_report(*brief, line, around);
        return inputs ? std::optional(std::move(inputs->catalogue)) : std::nullopt;
    }
    Diagnostics diagnostics;
    Catalogue catalogue = load_catalogue({}, "recommended", "", diagnostics);
    report_problems(diagnostics, line, around);
    return catalogue;
}

} // namespace

int catalogue_command(const CommandLine& line, const Surroundings& around) {
    const std::string wanted = line.operands.empty() ? std::string() : line.operands.front();
    const auto topics = catalogue_topics();
    const bool known = wanted.empty() || std::any_of(topics.begin(), topics.end(), [&](const CatalogueTopic& topic) {
                           return topic.name == wanted;
                       });
    if (!known) return refuse(around, fmt::format("unknown topic '{}'", wanted), did_you_mean(wanted, topic_names()));
    const std::optional<Catalogue> catalogue = catalogue_of(line, around);
    if (!catalogue) return exit_status::bad_input;
    std::vector<Listing> listings;
    for (const CatalogueTopic& topic : topics) {
        if (!wanted.empty() && topic.name != wanted) continue;
        listings.push_back(topic.list(*catalogue));
        if (line.operands.size() < 2) continue;
        const std::vector<std::string> names = names_in(listings.back());
        keep_only(listings.back(), line.operands[1]);
        if (listings.back().rows.empty()) {
            return refuse(around, fmt::format("nothing named '{}' among the {}", line.operands[1], topic.name),
                          did_you_mean(line.operands[1], names));
        }
    }
    if (line.has("json")) {
        around.out << listings_json(listings);
        return exit_status::well;
    }
    for (std::size_t i = 0; i < listings.size(); ++i) {
        around.out << (i == 0 ? "" : "\n") << listing_text(listings[i]);
    }
    return exit_status::well;
}

} // namespace spanledger
