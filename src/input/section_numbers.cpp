// SPDX-License-Identifier: MIT
#include "spanledger/input/section_reader.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <chrono>
#include <cmath>

// Numbers and dates of a section.

namespace spanledger {

namespace {

/// "0x1F", "0o17", "0b11", with or without a sign.
bool has_base_prefix(std::string_view number) {
    const std::size_t sign = number.starts_with('-') ? 1 : 0;
    return number.size() > sign + 1 && number[sign] == '0' &&
           std::string_view("xXoObB").find(number[sign + 1]) != std::string_view::npos;
}

/// A bound of a range in the internal unit.
double internal(double bound, const Measure& measure) {
    return measure.unit.empty() ? bound : bound * unit_factor(measure.unit, measure.dimension).value_or(1.0);
}

bool inside(double value, const KeyRange& range, const Measure& measure) {
    constexpr double rounding = 1e-12; // a bound times its factor may be rounded
    const double least = internal(range.least, measure);
    const double greatest = internal(range.greatest, measure);
    return value >= least - rounding * std::abs(least) && value <= greatest + rounding * std::abs(greatest);
}

/// A number as typed, with the key's unit where it had none.
std::string typed(const toml::Node& node, const Measure& measure) {
    const bool bare = node.kind == toml::NodeKind::number && !measure.unit.empty();
    return bare ? fmt::format("{} {}", node.text, measure.unit) : node.text;
}

std::optional<std::string> calendar_date(std::string_view text) {
    const bool shaped = text.size() == 10 && text[4] == '-' && text[7] == '-';
    const auto digits = [&](std::size_t first, std::size_t count) {
        int value = 0;
        for (const char c : text.substr(first, count)) {
            value = c >= '0' && c <= '9' && value >= 0 ? value * 10 + (c - '0') : -1;
        }
        return value;
    };
    if (!shaped || digits(0, 4) < 0 || digits(5, 2) < 0 || digits(8, 2) < 0) {
        return std::nullopt;
    }
    const std::chrono::year_month_day day{std::chrono::year(digits(0, 4)),
                                          std::chrono::month(static_cast<unsigned>(digits(5, 2))),
                                          std::chrono::day(static_cast<unsigned>(digits(8, 2)))};
    return day.ok() ? std::optional(std::string(text)) : std::nullopt;
}

} // namespace

bool SectionReader::within_range(const KeyDefinition& key, double value, const toml::Node& node) {
    const std::string check = key.measure.unit.empty() ? "check the number" : "check the number and its unit";
    if (!inside(value, key.hard, key.measure)) {
        error_at(node.mark, "out-of-range",
                 fmt::format("{}: {} is outside the range {}", key.name, typed(node, key.measure),
                             range_words(key.hard, key.measure)),
                 key.usual.stated() ? fmt::format("usual are {}; {}", range_words(key.usual, key.measure), check)
                                    : std::string("write a number within that range"));
        return false;
    }
    if (key.usual.stated() && !inside(value, key.usual, key.measure)) {
        diagnostics_->warning("unusual", document_->place(node.mark),
                              fmt::format("{}: {} is outside the usual range {}", key.name, typed(node, key.measure),
                                          range_words(key.usual, key.measure)),
                              "it is used as it stands; " + check);
    }
    return true;
}

std::optional<double> SectionReader::read_number(const KeyDefinition& key, const toml::Node& node) {
    const std::string accepted =
        fmt::format("write a decimal number{}, such as {}",
                    key.measure.unit.empty() ? "" : fmt::format(" in {}", key.measure.unit), example_number(key));
    if (node.kind != toml::NodeKind::number && node.kind != toml::NodeKind::text) {
        wrong_kind(key, node, accepted);
        return std::nullopt;
    }
    if (node.text.find_first_not_of(" \t") == std::string::npos) {
        error_at(node.mark, "bad-number", fmt::format("{} is empty", key.name), accepted);
        return std::nullopt;
    }
    if (has_base_prefix(node.text)) {
        error_at(node.mark, "bad-number", fmt::format("{}: '{}' is not a decimal number", key.name, node.text),
                 accepted);
        return std::nullopt;
    }
    const QuantityResult read = read_quantity(node.text, key.measure.dimension, key.measure.unit);
    if (!read.value) {
        error_at(node.mark, "bad-number", fmt::format("{}: {}", key.name, read.error.message), read.error.hint);
        return std::nullopt;
    }
    if (key.kind == ValueKind::whole_number && *read.value != std::floor(*read.value)) {
        error_at(node.mark, "bad-number", fmt::format("{}: {} is not a whole number", key.name, node.text),
                 fmt::format("write a whole number from {}", range_words(key.hard, key.measure)));
        return std::nullopt;
    }
    return within_range(key, *read.value, node) ? read.value : std::nullopt;
}

std::optional<double> SectionReader::optional_number(std::string_view key) {
    const KeyDefinition& known = definition(key);
    const toml::Node* node = find(key);
    if (node != nullptr) {
        if (const auto value = read_number(known, *node)) {
            return value;
        }
    }
    return known.fallback.empty() ? std::nullopt
                                  : read_quantity(known.fallback, known.measure.dimension, known.measure.unit).value;
}

std::vector<Located<double>> SectionReader::numbers(std::string_view key) {
    const KeyDefinition& known = definition(key);
    const toml::Node* node = find(key);
    std::vector<Located<double>> found;
    if (node == nullptr) {
        return found;
    }
    const bool list = node->kind == toml::NodeKind::array;
    if (list && node->children.empty() && (known.required || !known.needed_with.empty())) {
        error_at(node->mark, "empty-list", fmt::format("{} is an empty list", key),
                 fmt::format("list at least one: {}", known.meaning));
    }
    for (std::size_t i = 0; i < (list ? node->children.size() : 1); ++i) {
        const toml::Node& item = list ? node->children[i] : *node;
        const auto value = read_number(known, item);
        const auto same = [&](const Located<double>& other) { return value && other.value == *value; };
        if (std::any_of(found.begin(), found.end(), same)) {
            error_at(item.mark, "duplicate-value", fmt::format("{}: {} stands twice", key, typed(item, known.measure)),
                     "remove one of the two");
        } else if (value) {
            found.push_back({*value, item.mark});
        }
    }
    return found;
}

std::string SectionReader::date(std::string_view key) {
    const KeyDefinition& known = definition(key);
    const toml::Node* node = find(key);
    if (node == nullptr) {
        return {};
    }
    if (node->kind != toml::NodeKind::date && node->kind != toml::NodeKind::text) {
        wrong_kind(known, *node, fmt::format("write {} = 2026-01-31", key));
        return {};
    }
    const auto day = calendar_date(node->text);
    if (!day) {
        error_at(node->mark, "bad-date", fmt::format("{}: '{}' is not a date of the calendar", key, node->text),
                 "write year-month-day, as in 2026-01-31");
    }
    return day.value_or("");
}

} // namespace spanledger
