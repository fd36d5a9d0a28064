// SPDX-License-Identifier: MIT
#include "listing.hpp"

#include "spanledger/writers/json_text.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {
namespace {

struct ValueText {
    std::string operator()(const std::string& text) const { return text; }
    std::string operator()(double number) const { return fmt::format("{}", number); }
    std::string operator()(bool yes) const { return yes ? "yes" : "no"; }
};

bool is_number(const Listing::Value& value) { return std::holds_alternative<double>(value); }

/// Characters a terminal shows, not bytes.
std::size_t shown_width(const std::string& text) {
    return static_cast<std::size_t>(
        std::count_if(text.begin(), text.end(), [](char c) { return (static_cast<unsigned char>(c) & 0xC0U) != 0x80U; }));
}

std::string padded(const std::string& text, std::size_t width, bool right) {
    const std::string gap(width - std::min(width, shown_width(text)), ' ');
    return right ? gap + text : text + gap;
}

} // namespace

std::string listing_text(const Listing& listing) {
    std::vector<std::size_t> widths;
    for (std::size_t c = 0; c < listing.columns.size(); ++c) {
        std::size_t width = shown_width(listing.columns[c]);
        for (const auto& row : listing.rows) width = std::max(width, shown_width(std::visit(ValueText{}, row[c])));
        widths.push_back(width);
    }
    const auto line = [&](const auto& cell_text, const auto& cell_right) {
        std::string text;
        for (std::size_t c = 0; c < widths.size(); ++c) {
            text += (c == 0 ? "" : "  ") + padded(cell_text(c), widths[c], cell_right(c));
        }
        text.erase(text.find_last_not_of(' ') + 1);
        return text + "\n";
    };
    std::string text = listing.title + "\n\n";
    const auto right = [&](std::size_t c) { return !listing.rows.empty() && is_number(listing.rows.front()[c]); };
    text += line([&](std::size_t c) { return listing.columns[c]; }, right);
    for (const auto& row : listing.rows) {
        text += line([&](std::size_t c) { return std::visit(ValueText{}, row[c]); },
                     [&](std::size_t c) { return is_number(row[c]); });
    }
    return text;
}

std::string listings_json(const std::vector<Listing>& listings) {
    JsonText json(2);
    json.open_object();
    for (const Listing& listing : listings) {
        json.key(listing.title);
        json.open_list();
        for (const auto& row : listing.rows) {
            json.open_object();
            for (std::size_t c = 0; c < row.size(); ++c) {
                json.key(listing.columns[c]);
                std::visit([&](const auto& value) { json.value(value); }, row[c]);
            }
            json.close_object();
        }
        json.close_list();
    }
    json.close_object();
    return json.take() + "\n";
}

} // namespace spanledger
