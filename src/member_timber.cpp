// SPDX-License-Identifier: MIT
#include "member_families.hpp"

#include "spanledger/input/quantity.hpp"
#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>

namespace spanledger {

namespace {

constexpr double least_breadth = 10.0;
constexpr double greatest_breadth = 1000.0;
constexpr double least_depth = 20.0;
constexpr double greatest_depth = 3000.0;
constexpr int most_plies = 10;
constexpr const char* size_hint = "write a size as 47x220, or 2/47x220 for two plies (breadth x depth in mm)";

/// The text without blanks, and with x between breadth and depth however it is written.
std::string plain_size(std::string_view text) {
    constexpr std::string_view times = "×";
    std::string plain;
    while (!text.empty()) {
        const bool is_times = text.starts_with(times);
        const char c = is_times || text[0] == 'X' ? 'x' : text[0];
        if (c != ' ' && c != '\t') {
            plain.push_back(c);
        }
        text.remove_prefix(is_times ? times.size() : 1);
    }
    return plain;
}

std::vector<std::string> series_names(const Catalogue& catalogue) {
    std::vector<std::string> names;
    for (const TimberSize& row : catalogue.timber_sizes) {
        if (std::find(names.begin(), names.end(), row.series) == names.end()) {
            names.push_back(row.series);
        }
    }
    return names;
}

/// Reads a size and refuses what cannot be a joist.
std::optional<TimberSizeText> require_size(std::string_view text, const Place& place, Diagnostics& diagnostics) {
    const std::optional<TimberSizeText> size = read_timber_size(text);
    if (!size) {
        diagnostics.error("bad-size", place, fmt::format("'{}' is not a timber size", text), size_hint);
        return std::nullopt;
    }
    const bool possible = size->b >= least_breadth && size->b <= greatest_breadth && size->h >= least_depth &&
                          size->h <= greatest_depth && size->plies <= most_plies;
    if (!possible) {
        diagnostics.error("out-of-range", place, fmt::format("size '{}' is not possible", text),
                          fmt::format("breadth {} to {} mm, depth {} to {} mm, at most {} plies", least_breadth,
                                      greatest_breadth, least_depth, greatest_depth, most_plies));
        return std::nullopt;
    }
    return size;
}

TimberMember make_member(const TimberClass& timber_class, const TimberSizeText& size, const Catalogue& catalogue) {
    TimberMember member{.timber_class = timber_class, .b = size.b, .h = size.h, .plies = size.plies};
    const auto& rows = catalogue.timber_sizes;
    const auto row = std::find_if(rows.begin(), rows.end(),
                                  [&](const TimberSize& known) { return known.b == size.b && known.h == size.h; });
    if (row != rows.end()) {
        member.size_provenance = row->provenance;
    }
    return member;
}

/// The sizes of a series, with the entry's plies.
std::vector<TimberMember> members_of_series(const MembersEntry& entry, const TimberClass& timber_class,
                                            const Catalogue& catalogue, Diagnostics& diagnostics) {
    std::vector<TimberMember> members;
    for (const TimberSize& row : catalogue.timber_sizes) {
        if (row.series == entry.series) {
            members.push_back({.timber_class = timber_class,
                               .b = row.b,
                               .h = row.h,
                               .plies = entry.plies,
                               .size_provenance = row.provenance});
        }
    }
    if (members.empty()) {
        diagnostics.error("unknown-series", entry.place, fmt::format("series '{}' is not known", entry.series),
                          did_you_mean(entry.series, series_names(catalogue)));
    }
    return members;
}

/// The sizes that an entry lists; plies of a size count where the entry says nothing of plies.
std::vector<TimberMember> members_of_sizes(const MembersEntry& entry, const TimberClass& timber_class,
                                           const Catalogue& catalogue, Diagnostics& diagnostics) {
    std::vector<TimberMember> members;
    for (const std::string& text : entry.sizes) {
        std::optional<TimberSizeText> size = require_size(text, entry.place, diagnostics);
        if (!size) {
            continue;
        }
        if (size->plies != 1 && entry.plies != 1 && size->plies != entry.plies) {
            diagnostics.error(
                "contradiction", entry.place,
                fmt::format("size '{}' has {} plies, but the entry says {}", text, size->plies, entry.plies),
                "state the plies once");
            continue;
        }
        size->plies = std::max(size->plies, entry.plies);
        members.push_back(make_member(timber_class, *size, catalogue));
    }
    return members;
}

} // namespace

std::optional<TimberSizeText> read_timber_size(std::string_view text) {
    const std::string plain = plain_size(text);
    const std::size_t slash = plain.find('/');
    const std::string_view size =
        slash == std::string::npos ? std::string_view(plain) : std::string_view(plain).substr(slash + 1);
    const std::size_t times = size.find('x');
    if (times == std::string_view::npos) {
        return std::nullopt;
    }
    const std::optional<double> b = read_number(size.substr(0, times));
    const std::optional<double> h = read_number(size.substr(times + 1));
    const std::optional<double> plies =
        slash == std::string::npos ? std::optional(1.0) : read_number(std::string_view(plain).substr(0, slash));
    if (!b || !h || !plies || *b <= 0.0 || *h <= 0.0 || *plies < 1.0 || *plies > 1000.0 ||
        *plies != std::floor(*plies)) {
        return std::nullopt;
    }
    return TimberSizeText{static_cast<int>(*plies), *b, *h};
}

std::vector<Member> timber_members(const MembersEntry& entry, const TimberClass& timber_class,
                                   const Catalogue& catalogue, Diagnostics& diagnostics) {
    std::vector<TimberMember> members = entry.series.empty()
                                            ? members_of_sizes(entry, timber_class, catalogue, diagnostics)
                                            : members_of_series(entry, timber_class, catalogue, diagnostics);
    std::vector<Member> result;
    for (TimberMember& member : members) {
        member.plies_fixed_together = entry.plies_fixed_together;
        result.emplace_back(std::move(member));
    }
    return result;
}

std::optional<Member> proposed_timber(const ProposedSection& section, const TimberClass& timber_class,
                                      const Catalogue& catalogue, Diagnostics& diagnostics) {
    const std::optional<TimberSizeText> size = require_size(section.text, section.place, diagnostics);
    if (!size) return std::nullopt;
    return make_member(timber_class, *size, catalogue);
}

} // namespace spanledger
