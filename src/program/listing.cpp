// SPDX-License-Identifier: MIT
#include "listing.hpp"

#include "spanledger/writers/json_text.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <utility>

namespace spanledger {
namespace {

/// For people: six figures, and every figure of a whole number. JSON has full precision.
struct ValueText {
    std::string operator()(std::monostate /*none*/) const { return "-"; }
    std::string operator()(const std::string& text) const { return text; }
    std::string operator()(double number) const {
        constexpr double six_figures = 1e5;
        return std::abs(number) >= six_figures ? fmt::format("{:.0f}", number) : fmt::format("{:.6g}", number);
    }
    std::string operator()(bool yes) const { return yes ? "yes" : "no"; }
};

std::string value_text(const Listing::Value& value) {
    return std::visit(ValueText{}, value);
}

struct ValueJson {
    JsonText* json;
    void operator()(std::monostate /*none*/) const { json->null(); }
    template <class T> void operator()(const T& value) const { json->value(value); }
};

/// Characters that a terminal shows, not bytes.
std::size_t shown_width(std::string_view text) {
    return static_cast<std::size_t>(std::count_if(
        text.begin(), text.end(), [](char c) { return (static_cast<unsigned char>(c) & 0xC0U) != 0x80U; }));
}

bool holds_numbers(const Listing& listing, std::size_t column) {
    return std::any_of(listing.rows.begin(), listing.rows.end(),
                       [&](const Listing::Row& row) { return std::holds_alternative<double>(row[column]); });
}

std::string line_of(const std::vector<std::string>& cells, const std::vector<std::size_t>& widths,
                    const std::vector<bool>& right) {
    std::string text;
    for (std::size_t c = 0; c < cells.size(); ++c) {
        const std::string gap(widths[c] - shown_width(cells[c]), ' ');
        text += (c == 0 ? "" : "  ") + (right[c] ? gap + cells[c] : cells[c] + gap);
    }
    text.erase(text.find_last_not_of(' ') + 1);
    return text + "\n";
}

std::string folded(std::string_view name) {
    std::string plain;
    for (const char c : name) {
        if (c != ' ') plain += c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c;
    }
    return plain;
}

} // namespace

void Listing::add(Row row, const Provenance& from) {
    row.emplace_back(from.source);
    row.emplace_back(std::string(from.seen ? "seen" : "from memory"));
    row.emplace_back(from.practice_own ? fmt::format("practice's own, {}:{}", from.file, from.line)
                                       : std::string("built in"));
    rows.push_back(std::move(row));
}

Listing::Value maybe(const std::optional<double>& number) {
    return number ? Listing::Value(*number) : Listing::Value();
}

std::vector<std::string> columns_with_origin(std::vector<std::string> columns) {
    for (const char* column : {"source", "seen", "origin"}) columns.emplace_back(column);
    return columns;
}

std::string name_of(const Listing::Row& row) {
    return value_text(row.front());
}

void keep_only(Listing& listing, std::string_view name) {
    const auto other = [&](const Listing::Row& row) { return folded(name_of(row)) != folded(name); };
    listing.rows.erase(std::remove_if(listing.rows.begin(), listing.rows.end(), other), listing.rows.end());
}

std::string listing_text(const Listing& listing) {
    std::vector<std::vector<std::string>> lines{listing.columns};
    for (const Listing::Row& row : listing.rows) {
        auto& line = lines.emplace_back();
        for (const Listing::Value& value : row) line.push_back(value_text(value));
    }
    std::vector<std::size_t> widths(listing.columns.size(), 0);
    std::vector<bool> right;
    for (std::size_t c = 0; c < widths.size(); ++c) {
        for (const auto& line : lines) widths[c] = std::max(widths[c], shown_width(line[c]));
        right.push_back(holds_numbers(listing, c));
    }
    std::string text = listing.title + "\n\n";
    for (const auto& line : lines) text += line_of(line, widths, right);
    return text;
}

std::string listings_json(const std::vector<Listing>& listings) {
    JsonText json(2);
    json.open_object();
    for (const Listing& listing : listings) {
        std::string key = listing.title;
        for (char& c : key) c = c == ' ' || c == '-' ? '_' : c;
        json.key(key);
        json.open_list();
        for (const Listing::Row& row : listing.rows) {
            json.open_object();
            for (std::size_t c = 0; c < row.size(); ++c) {
                json.key(listing.columns[c]);
                std::visit(ValueJson{&json}, row[c]);
            }
            json.close_object();
        }
        json.close_list();
    }
    json.close_object();
    return json.take() + "\n";
}

} // namespace spanledger
