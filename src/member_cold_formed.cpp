// SPDX-License-Identifier: MIT
#include "member_families.hpp"

#include "spanledger/input/quantity.hpp"
#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>

namespace spanledger {

namespace {

constexpr const char* channel_hint =
    "write a lipped channel as C 150x50x15x1.5 r2.5: depth x flange x lip x nominal "
    "thickness, inner radius in mm; unequal flanges 74/66, the compression flange first";

/// The text in small letters without blanks, and with x between sizes however it is written.
std::string plain_channel(std::string_view text) {
    constexpr std::string_view times = "×";
    std::string plain;
    while (!text.empty()) {
        const bool is_times = text.starts_with(times);
        const char c = is_times ? 'x' : text[0];
        if (c != ' ' && c != '\t') plain.push_back(c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c);
        text.remove_prefix(is_times ? times.size() : 1);
    }
    return plain;
}

/// What stands before `mark`, which is taken off `rest` with it; all of `rest` where there is no mark.
std::string_view before(std::string_view& rest, char mark) {
    const std::size_t at = rest.find(mark);
    const std::string_view part = rest.substr(0, at);
    rest = at == std::string_view::npos ? std::string_view{} : rest.substr(at + 1);
    return part;
}

/// One size of a channel and what is possible for it, mm.
struct ChannelRange {
    const char* words;
    double LippedChannelSize::*size;
    double least;
    double greatest;
};

constexpr std::array channel_ranges{
    ChannelRange{"depth", &LippedChannelSize::h, 40.0, 1000.0},
    ChannelRange{"compression flange", &LippedChannelSize::b_1, 15.0, 400.0},
    ChannelRange{"tension flange", &LippedChannelSize::b_2, 15.0, 400.0},
    ChannelRange{"lip", &LippedChannelSize::c, 4.0, 150.0},
    ChannelRange{"nominal thickness", &LippedChannelSize::t_nom, 0.3, 10.0},
    ChannelRange{"inner radius", &LippedChannelSize::r, 0.0, 50.0},
};

bool same_size(const LippedChannelSize& a, const LippedChannelSize& b) {
    return lipped_channel_name(a) == lipped_channel_name(b);
}

ColdFormedMember make_member(const ColdFormedGrade& grade, const LippedChannelSize& size, const Catalogue& catalogue) {
    ColdFormedMember member{.grade = grade, .size = size, .density = parameter(catalogue, "steel_density")};
    const auto& rows = catalogue.cold_formed_sizes;
    const auto row = std::find_if(rows.begin(), rows.end(),
                                  [&](const ColdFormedSize& known) { return same_size(known.size, size); });
    if (row != rows.end()) member.size_provenance = row->provenance;
    return member;
}

std::vector<std::string> series_names(const Catalogue& catalogue) {
    std::vector<std::string> names;
    for (const ColdFormedSize& row : catalogue.cold_formed_sizes) {
        if (std::find(names.begin(), names.end(), row.series) == names.end()) names.push_back(row.series);
    }
    return names;
}

std::vector<Member> members_of_series(const MembersEntry& entry, const ColdFormedGrade& grade,
                                      const Catalogue& catalogue, Diagnostics& diagnostics) {
    std::vector<Member> members;
    for (const ColdFormedSize& row : catalogue.cold_formed_sizes) {
        if (row.series != entry.series) continue;
        ColdFormedMember member = make_member(grade, row.size, catalogue);
        member.size_provenance = row.provenance;
        members.emplace_back(std::move(member));
    }
    if (members.empty()) {
        diagnostics.error("unknown-series", entry.place,
                          fmt::format("series '{}' of cold-formed sections is not known", entry.series),
                          did_you_mean(entry.series, series_names(catalogue)));
    }
    return members;
}

} // namespace

std::optional<LippedChannelSize> read_lipped_channel(std::string_view text) {
    const std::string plain = plain_channel(text);
    std::string_view rest = plain;
    if (!rest.starts_with('c')) return std::nullopt;
    rest.remove_prefix(1);
    const std::string_view depth = before(rest, 'x');
    std::string_view flanges = before(rest, 'x');
    const bool unequal = flanges.find('/') != std::string_view::npos;
    const std::string_view compression = before(flanges, '/');
    const std::string_view lip = before(rest, 'x');
    const std::string_view thickness = before(rest, 'r');
    const auto h = read_number(depth);
    const auto b_1 = read_number(compression);
    const auto b_2 = unequal ? read_number(flanges) : b_1;
    const auto c = read_number(lip);
    const auto t_nom = read_number(thickness);
    const auto r = read_number(rest);
    if (!h || !b_1 || !b_2 || !c || !t_nom || !r) return std::nullopt;
    return LippedChannelSize{.h = *h, .b_1 = *b_1, .b_2 = *b_2, .c = *c, .t_nom = *t_nom, .r = *r};
}

std::string lipped_channel_name(const LippedChannelSize& size) {
    const std::string flanges =
        size.b_1 == size.b_2 ? fmt::format("{}", size.b_1) : fmt::format("{}/{}", size.b_1, size.b_2);
    return fmt::format("C {}x{}x{}x{} r{}", size.h, flanges, size.c, size.t_nom, size.r);
}

std::string lipped_channel_problem(const LippedChannelSize& size) {
    for (const ChannelRange& range : channel_ranges) {
        const double value = size.*range.size;
        if (value < range.least || value > range.greatest) {
            return fmt::format("its {} of {} mm is not within {} to {} mm", range.words, value, range.least,
                               range.greatest);
        }
    }
    const double corner = size.t_nom + size.r;
    if (size.c < corner) return "its lips are shorter than their corners";
    if (std::min(size.b_1, size.b_2) < 2.0 * corner) return "its flanges are narrower than their corners";
    if (size.h < 2.0 * size.c) return "its lips overlap";
    return {};
}

std::optional<Member> proposed_cold_formed(const ProposedSection& section, const ColdFormedGrade& grade,
                                           const Catalogue& catalogue, Diagnostics& diagnostics) {
    const std::optional<LippedChannelSize> size = read_lipped_channel(section.text);
    if (!size) {
        diagnostics.error("bad-size", section.place, fmt::format("'{}' is not a lipped channel", section.text),
                          channel_hint);
        return std::nullopt;
    }
    if (const std::string problem = lipped_channel_problem(*size); !problem.empty()) {
        diagnostics.error("out-of-range", section.place,
                          fmt::format("channel '{}' is not possible: {}", section.text, problem), channel_hint);
        return std::nullopt;
    }
    return make_member(grade, *size, catalogue);
}

std::vector<Member> cold_formed_members(const MembersEntry& entry, const ColdFormedGrade& grade,
                                        const Catalogue& catalogue, Diagnostics& diagnostics) {
    if (entry.plies != 1 || entry.plies_fixed_together) {
        diagnostics.error("contradiction", entry.place, "plies are for timber: a steel joist is one section",
                          "remove plies and plies_fixed_together");
    }
    if (!entry.series.empty()) return members_of_series(entry, grade, catalogue, diagnostics);
    std::vector<Member> members;
    for (const std::string& text : entry.sizes) {
        if (auto member = proposed_cold_formed({text, entry.place}, grade, catalogue, diagnostics)) {
            members.push_back(*std::move(member));
        }
    }
    return members;
}

} // namespace spanledger
