// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/quantity.hpp"

#include <span>
#include <string>
#include <string_view>
#include <vector>

// Every key of a brief, once: reading, defaults, suggestions and the input reference all come from these tables.

namespace spanledger {

enum class ValueKind {
    text,      ///< one line
    long_text, ///< may have several lines
    date,      ///< TOML date, or text, yyyy-mm-dd
    number,    ///< number in the key's unit, or text with a unit
    whole_number,
    yes_no,         ///< true or false
    choice,         ///< one of the listed words
    choice_or_file, ///< one of the listed words, or the path of a .toml file
    texts,          ///< list of texts, or a single one
    numbers,        ///< list of numbers, or a single one
    table,          ///< {key = value, ...}
};

/// The unit of a bare number.
struct Measure {
    Dimension dimension = Dimension::number;
    std::string_view unit; ///< empty for a pure number
};

/// Both ends count as inside, in the key's unit. No range where least > greatest.
struct KeyRange {
    double least = 0.0;
    double greatest = -1.0;

    [[nodiscard]] constexpr bool stated() const noexcept { return least <= greatest; }
};

struct KeyDefinition {
    std::string_view name;
    ValueKind kind = ValueKind::text;
    Measure measure{};
    std::string_view fallback{};       ///< value where the key is left out, as it would be typed; may be empty
    std::string_view fallback_words{}; ///< where that value is not a fixed one, what it is
    KeyRange hard{};                   ///< refused outside; every number has one
    KeyRange usual{};                  ///< warned of outside
    std::string_view choices{};        ///< parted by '|', in the order of the enumeration they stand for
    std::string_view not_covered{};    ///< choices that are known but refused as yet
    std::string_view table{};          ///< section of the schema that describes an inline table
    bool required = false;
    std::string_view needed_with{}; ///< when else it must be given
    std::string_view meaning;
    std::string_view clause{};
};

struct SectionDefinition {
    std::string_view name;
    bool several = false;  ///< [[name]]
    bool required = false; ///< at least one must stand
    bool inlined = false;  ///< describes an inline table, is no section of its own
    std::string_view meaning;
    std::span<const KeyDefinition> keys;
};

/// All sections in the order of a brief.
[[nodiscard]] std::span<const SectionDefinition> brief_schema() noexcept;

/// A section or key that must exist: an unknown name is a fault in the program (std::logic_error).
[[nodiscard]] const SectionDefinition& section_definition(std::string_view name);
[[nodiscard]] const KeyDefinition& key_definition(const SectionDefinition& section, std::string_view key);

/// Words parted by '|'.
[[nodiscard]] std::vector<std::string> listed_words(std::string_view choices);

/// "[support]", "[[load]]"
[[nodiscard]] std::string section_header(const SectionDefinition& section);

/// A number that a key may have, and how a value of a key is typed, for hints.
[[nodiscard]] std::string example_number(const KeyDefinition& key);
[[nodiscard]] std::string example_of(const KeyDefinition& key);

/// "50 to 10000 mm"
[[nodiscard]] std::string range_words(const KeyRange& range, const Measure& measure);

/// Keys of the sections that may stand several times (brief_schema_lists.cpp).
[[nodiscard]] std::span<const KeyDefinition> load_keys() noexcept;
[[nodiscard]] std::span<const KeyDefinition> members_keys() noexcept;
[[nodiscard]] std::span<const KeyDefinition> table_keys() noexcept;

/// Keys of [limits] and its inline tables (brief_schema_limits.cpp).
[[nodiscard]] std::span<const KeyDefinition> limits_keys() noexcept;
[[nodiscard]] std::span<const KeyDefinition> deflection_keys() noexcept;
[[nodiscard]] std::span<const KeyDefinition> frequency_keys() noexcept;
[[nodiscard]] std::span<const KeyDefinition> vibration_keys() noexcept;

} // namespace spanledger
