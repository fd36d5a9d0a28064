// SPDX-License-Identifier: MIT
#include "spanledger/input/brief_schema.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <stdexcept>

// Looking things up in the schema, and its words for messages.

namespace spanledger {

const SectionDefinition& section_definition(std::string_view name) {
    const auto sections = brief_schema();
    const auto found =
        std::find_if(sections.begin(), sections.end(), [&](const SectionDefinition& s) { return s.name == name; });
    if (found == sections.end()) {
        throw std::logic_error(fmt::format("no section {} in the schema of the brief", name));
    }
    return *found;
}

const KeyDefinition& key_definition(const SectionDefinition& section, std::string_view key) {
    const auto found = std::find_if(section.keys.begin(), section.keys.end(),
                                    [&](const KeyDefinition& definition) { return definition.name == key; });
    if (found == section.keys.end()) {
        throw std::logic_error(fmt::format("no key {} in section {} of the brief", key, section.name));
    }
    return *found;
}

std::vector<std::string> listed_words(std::string_view choices) {
    std::vector<std::string> words;
    while (!choices.empty()) {
        const std::size_t bar = std::min(choices.find('|'), choices.size());
        words.emplace_back(choices.substr(0, bar));
        choices.remove_prefix(std::min(bar + 1, choices.size()));
    }
    return words;
}

std::string section_header(const SectionDefinition& section) {
    return section.several ? fmt::format("[[{}]]", section.name) : fmt::format("[{}]", section.name);
}

std::string range_words(const KeyRange& range, const Measure& measure) {
    return fmt::format("{:g} to {:g}{}{}", range.least, range.greatest, measure.unit.empty() ? "" : " ", measure.unit);
}

std::string example_number(const KeyDefinition& key) {
    if (!key.fallback.empty() && key.fallback != "0") {
        return std::string(key.fallback);
    }
    const KeyRange& range = key.usual.stated() ? key.usual : key.hard;
    return fmt::format("{:g}", range.least > 0.0 ? range.least : std::min(1.0, range.greatest));
}

std::string example_of(const KeyDefinition& key) {
    switch (key.kind) {
    case ValueKind::yes_no: return "true";
    case ValueKind::number:
    case ValueKind::whole_number: return example_number(key);
    case ValueKind::texts: return "[\"...\"]";
    case ValueKind::numbers: return fmt::format("[{}]", example_number(key));
    case ValueKind::choice:
    case ValueKind::choice_or_file: return fmt::format("\"{}\"", listed_words(key.choices).front());
    case ValueKind::date: return "2026-01-31";
    case ValueKind::table: return "{...}";
    default: return "\"...\"";
    }
}

} // namespace spanledger
