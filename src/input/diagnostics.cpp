// SPDX-License-Identifier: MIT
#include "spanledger/input/diagnostics.hpp"

#include "spanledger/input/utf8.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <ostream>
#include <utility>

namespace spanledger {

namespace {

constexpr std::size_t shown_per_file = 20;
constexpr std::size_t widest_excerpt = 160; ///< characters of a source line that are shown
constexpr std::size_t context_before = 60;  ///< characters kept before the place in a longer line

/// Splits a valid UTF-8 text into its characters.
std::vector<std::string_view> characters_of(std::string_view text) {
    std::vector<std::string_view> characters;
    for (std::size_t start = 0; start < text.size();) {
        std::size_t end = start + 1;
        while (end < text.size() && (static_cast<unsigned char>(text[end]) & 0xC0) == 0x80) {
            ++end;
        }
        characters.push_back(text.substr(start, end - start));
        start = end;
    }
    return characters;
}

/// The source line, and under it a caret; a tab stays a tab so that the caret stands right at any tab width.
void write_excerpt(const Place& place, std::ostream& out) {
    const std::string line = printable(place.source_line);
    const auto characters = characters_of(line);
    const std::size_t target = place.column > 0 ? place.column - 1 : 0;
    const bool cut = characters.size() > widest_excerpt && target > context_before;
    const std::size_t first = cut ? target - context_before : 0;
    const std::size_t last = std::min(characters.size(), first + widest_excerpt);
    std::string shown;
    std::string carets;
    for (std::size_t i = first; i < last; ++i) {
        shown += characters[i];
        if (i < target) {
            carets += characters[i] == "\t" ? "\t" : " ";
        }
    }
    out << "    " << shown << '\n';
    if (place.column > 0) {
        const std::size_t room = last > target ? last - target : 1;
        const std::size_t width = std::clamp<std::size_t>(place.width, 1, room);
        out << "    " << carets << std::string(width, '^') << '\n';
    }
}

std::string location_of(const Place& place) {
    std::string location = printable(place.file);
    if (place.line > 0) {
        location += fmt::format(":{}", place.line);
        if (place.column > 0) {
            location += fmt::format(":{}", place.column);
        }
    }
    return location.empty() ? location : location + ": ";
}

void write_one(const Diagnostic& diagnostic, std::ostream& out) {
    const char* const severity = diagnostic.severity == Severity::warning ? "warning: " : "";
    out << location_of(diagnostic.place) << severity << printable(diagnostic.message) << " [" << diagnostic.code
        << "]\n";
    if (!diagnostic.place.source_line.empty()) {
        write_excerpt(diagnostic.place, out);
    }
    if (!diagnostic.hint.empty()) {
        out << "    hint: " << printable(diagnostic.hint) << '\n';
    }
}

/// Diagnostics of one file and severity in the order of the text.
using Group = std::vector<const Diagnostic*>;

void write_group(const std::string& file, Severity severity, const Group& all, std::ostream& out) {
    Group group;
    std::copy_if(all.begin(), all.end(), std::back_inserter(group),
                 [&](const Diagnostic* d) { return d->place.file == file && d->severity == severity; });
    std::stable_sort(group.begin(), group.end(), [](const Diagnostic* a, const Diagnostic* b) {
        return std::pair(a->place.line, a->place.column) < std::pair(b->place.line, b->place.column);
    });
    const std::size_t shown = std::min(group.size(), shown_per_file);
    for (std::size_t i = 0; i < shown; ++i) {
        write_one(*group[i], out);
    }
    if (const std::size_t rest = group.size() - shown; rest > 0) {
        const std::string_view noun = severity == Severity::error ? "error" : "warning";
        out << location_of(Place{.file = file}) << fmt::format("and {} more {}{}\n", rest, noun, rest > 1 ? "s" : "");
    }
}

} // namespace

void Diagnostics::add(Diagnostic diagnostic) {
    if (diagnostic.severity == Severity::error) {
        ++errors_;
    }
    all_.push_back(std::move(diagnostic));
}

void Diagnostics::error(std::string code, Place place, std::string message, std::string hint) {
    add({Severity::error, std::move(code), std::move(place), std::move(message), std::move(hint)});
}

void Diagnostics::warning(std::string code, Place place, std::string message, std::string hint) {
    add({Severity::warning, std::move(code), std::move(place), std::move(message), std::move(hint)});
}

void report(const Diagnostics& diagnostics, std::ostream& out) {
    Group all;
    std::vector<std::string> files;
    for (const Diagnostic& diagnostic : diagnostics.all()) {
        all.push_back(&diagnostic);
        if (std::find(files.begin(), files.end(), diagnostic.place.file) == files.end()) {
            files.push_back(diagnostic.place.file);
        }
    }
    for (const std::string& file : files) {
        write_group(file, Severity::error, all, out);
        write_group(file, Severity::warning, all, out);
    }
}

} // namespace spanledger
