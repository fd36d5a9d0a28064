// SPDX-License-Identifier: MIT
#include "catalogue_listings.hpp"
#include "commands.hpp"
#include "spanledger/input/suggestion.hpp"
#include "words.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <ostream>

namespace spanledger {
namespace {

std::optional<Inputs> inputs_of(const CommandLine& line, const Surroundings& around) {
    if (const auto brief = line.value("brief")) {
        std::optional<Inputs> inputs = read_and_report(*brief, line, around);
        if (inputs) say_sources(*inputs, line, around);
        return inputs;
    }
    Diagnostics none; // the built-in rows are in order: a test reads them all
    Inputs inputs;
    inputs.catalogue = load_catalogue({}, "recommended", "", none);
    return inputs;
}

std::vector<std::string> names_in(const std::vector<Listing>& listings) {
    std::vector<std::string> names;
    for (const Listing& listing : listings) {
        for (const Listing::Row& row : listing.rows) names.push_back(name_of(row));
    }
    return names;
}

/// Keeps what has the name; false where nothing has.
bool keep_named(std::vector<Listing>& listings, std::string_view name) {
    for (Listing& listing : listings) keep_only(listing, name);
    const auto empty = [](const Listing& listing) { return listing.rows.empty(); };
    listings.erase(std::remove_if(listings.begin(), listings.end(), empty), listings.end());
    return !listings.empty();
}

void print(const std::vector<Listing>& listings, bool json, std::ostream& out) {
    if (json) {
        out << listings_json(listings);
        return;
    }
    bool first = true;
    for (const Listing& listing : listings) {
        out << (first ? "" : "\n") << listing_text(listing);
        first = false;
    }
}

} // namespace

int catalogue_command(const CommandLine& line, const Surroundings& around) {
    const auto words = catalogue_words();
    std::vector<std::string> topics(words.begin(), words.end());
    if (!line.operands.empty()) {
        const std::string& topic = line.operands.front();
        if (std::find(topics.begin(), topics.end(), topic) == topics.end()) {
            return refuse(around, fmt::format("unknown topic '{}' of catalogue", topic), did_you_mean(topic, topics));
        }
        topics = {topic};
    }
    const std::optional<Inputs> inputs = inputs_of(line, around);
    if (!inputs) return exit_status::bad_input;
    const bool named = line.operands.size() == 2;
    std::vector<Listing> listings;
    for (const std::string& topic : topics) {
        for (Listing& listing : catalogue_listings(topic, inputs->catalogue, named ? Detail::full : Detail::overview)) {
            listings.push_back(std::move(listing));
        }
    }
    if (named) {
        const std::string& name = line.operands[1];
        const std::vector<std::string> known = names_in(listings);
        if (!keep_named(listings, name)) {
            return refuse(around, fmt::format("nothing named '{}' among the {}", name, topics.front()),
                          did_you_mean(name, known));
        }
    }
    print(listings, line.has("json"), around.out);
    return exit_status::well;
}

} // namespace spanledger
