// SPDX-License-Identifier: MIT
#include "spanledger/input/input_reference.hpp"

#include "spanledger/input/brief_schema.hpp"

#include <fmt/format.h>

namespace spanledger {

namespace {

constexpr std::string_view introduction =
    R"(# Input reference: the brief

A brief is a TOML file. A key that is not in this reference is refused, with a suggestion. A number is in the unit that
the key ends in; it may also be a text with a unit of its own, such as "4.2 m" or "1.5 kN/m2". A list may be a single
value. Outside the possible range a value is refused, outside the usual range it is used, with a warning. nan, inf, and
hexadecimal, octal and binary numbers are refused.
)";

std::string with_unit(std::string_view words, const Measure& measure) {
    return measure.unit.empty() ? std::string(words) : fmt::format("{}, {}", words, measure.unit);
}

std::string quoted_choices(const KeyDefinition& key) {
    std::string list;
    for (const std::string& word : listed_words(key.choices)) {
        list += fmt::format("{}\"{}\"", list.empty() ? "" : ", ", word);
    }
    for (const std::string& word : listed_words(key.not_covered)) {
        list += fmt::format(", \"{}\" (not covered yet)", word);
    }
    return list;
}

std::string kind_words(const KeyDefinition& key) {
    switch (key.kind) {
    case ValueKind::text: return "text";
    case ValueKind::long_text: return "text, also of several lines";
    case ValueKind::date: return "date, yyyy-mm-dd";
    case ValueKind::number: return with_unit("number", key.measure);
    case ValueKind::whole_number: return "whole number";
    case ValueKind::yes_no: return "true or false";
    case ValueKind::choice: return quoted_choices(key);
    case ValueKind::choice_or_file: return quoted_choices(key) + ", or a file name ending in .toml";
    case ValueKind::texts: return "list of texts";
    case ValueKind::numbers: return with_unit("list of numbers", key.measure);
    case ValueKind::table: return fmt::format("{{...}}, see {}", key.table);
    }
    return {};
}

std::string fallback_words(const KeyDefinition& key) {
    if (key.required) {
        return "required";
    }
    if (!key.needed_with.empty()) {
        return fmt::format("required with {}", key.needed_with);
    }
    if (!key.fallback_words.empty()) {
        return std::string(key.fallback_words);
    }
    if (key.fallback.empty()) {
        return "none";
    }
    const bool quoted =
        key.kind == ValueKind::text || key.kind == ValueKind::choice || key.kind == ValueKind::choice_or_file;
    return quoted ? fmt::format("\"{}\"", key.fallback) : std::string(key.fallback);
}

std::string range_or_dash(const KeyRange& range, const Measure& measure) {
    return range.stated() ? range_words(range, measure) : "-";
}

std::string key_row(const KeyDefinition& key) {
    return fmt::format("| `{}` | {} | {} | {} | {} | {} | {} |\n", key.name, kind_words(key), fallback_words(key),
                       range_or_dash(key.hard, key.measure), range_or_dash(key.usual, key.measure), key.meaning,
                       key.clause.empty() ? "-" : key.clause);
}

std::string section_text(const SectionDefinition& section) {
    const std::string heading = section.inlined ? std::string(section.name) : section_header(section);
    std::string_view standing = section.inlined ? " Written in braces, as {key = value, key = value}." : "";
    if (!section.inlined) {
        standing = section.required ? " Required." : " May be left out.";
    }
    std::string text = fmt::format("\n## {}\n\n{}{}{}\n\n", heading, section.meaning, standing,
                                   section.several ? " May stand several times." : "");
    text += "| key | value | if left out | possible range | usual range | meaning | clause |\n";
    text += "|---|---|---|---|---|---|---|\n";
    for (const KeyDefinition& key : section.keys) {
        text += key_row(key);
    }
    return text;
}

} // namespace

std::string input_reference() {
    std::string text(introduction);
    for (const SectionDefinition& section : brief_schema()) {
        text += section_text(section);
    }
    return text;
}

} // namespace spanledger
