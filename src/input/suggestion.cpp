// SPDX-License-Identifier: MIT
#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cctype>
#include <vector>

namespace spanledger {

namespace {

constexpr std::size_t longest_compared = 100; ///< longer names are no slips of the finger
constexpr std::size_t names_listed = 12;

std::string lower_case(std::string_view text) {
    std::string lower(text);
    std::transform(lower.begin(), lower.end(), lower.begin(),
                   [](char c) { return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c; });
    return lower;
}

// Two letters swapped are a likelier slip than a letter changed, left out or added.
constexpr std::size_t swap_cost = 1;
constexpr std::size_t change_cost = 2;

/// Cost of the cheapest changes of single letters, and swaps of neighbours, that lead from a to b.
std::size_t edit_distance(std::string_view a, std::string_view b) {
    std::array<std::vector<std::size_t>, 3> rows; // of the two letters before, the letter before, this letter
    for (auto& row : rows) {
        row.resize(b.size() + 1);
    }
    auto& [two_before, before, now] = rows;
    for (std::size_t j = 0; j <= b.size(); ++j) {
        now[j] = j * change_cost;
    }
    for (std::size_t i = 1; i <= a.size(); ++i) {
        std::swap(two_before, before);
        std::swap(before, now);
        now[0] = i * change_cost;
        for (std::size_t j = 1; j <= b.size(); ++j) {
            const std::size_t change = a[i - 1] == b[j - 1] ? 0 : change_cost;
            now[j] = std::min({before[j] + change_cost, now[j - 1] + change_cost, before[j - 1] + change});
            if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1]) {
                now[j] = std::min(now[j], two_before[j - 2] + swap_cost);
            }
        }
    }
    return now[b.size()];
}

} // namespace

std::string nearest_name(std::string_view wanted, std::span<const std::string> known) {
    if (wanted.empty() || wanted.size() > longest_compared) {
        return {};
    }
    const std::string sought = lower_case(wanted);
    std::size_t best = change_cost * std::max<std::size_t>(1, wanted.size() / 3) + 1;
    std::string nearest;
    for (const std::string& name : known) {
        if (name.size() > longest_compared) {
            continue;
        }
        const std::size_t distance = edit_distance(sought, lower_case(name));
        if (distance < best && distance < change_cost * name.size()) {
            best = distance;
            nearest = name;
        }
    }
    if (nearest.empty() && wanted.size() >= 2) {
        const auto begins = std::find_if(known.begin(), known.end(), [&](const std::string& name) {
            return lower_case(name).compare(0, sought.size(), sought) == 0;
        });
        return begins == known.end() ? std::string() : *begins;
    }
    return nearest;
}

std::string joined(std::span<const std::string> names) {
    std::string text;
    for (const std::string& name : names) {
        text.append(text.empty() ? "" : ", ").append(name);
    }
    return text;
}

std::string did_you_mean(std::string_view wanted, std::span<const std::string> known) {
    if (const std::string nearest = nearest_name(wanted, known); !nearest.empty()) {
        return fmt::format("did you mean '{}'?", nearest);
    }
    if (known.empty()) {
        return "none is known";
    }
    const auto listed = known.first(std::min(known.size(), names_listed));
    return fmt::format("known: {}{}", joined(listed), known.size() > names_listed ? ", ..." : "");
}

} // namespace spanledger
