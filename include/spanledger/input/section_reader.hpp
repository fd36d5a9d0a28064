// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/brief_schema.hpp"
#include "spanledger/input/diagnostics.hpp"
#include "spanledger/input/toml_text.hpp"

#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace spanledger {

/// A value with its place in the text.
template <class T> struct Located {
    T value;
    toml::Mark mark;
};

template <class T> [[nodiscard]] std::vector<T> values_of(const std::vector<Located<T>>& located) {
    std::vector<T> values;
    for (const auto& item : located) {
        values.push_back(item.value);
    }
    return values;
}

/// Hint for a key that stands where it is not known: the section it belongs under, or the nearest of `known`.
[[nodiscard]] std::string unknown_key_hint(std::string_view key, const std::vector<std::string>& known);

/// One section of a brief, read by the names and rules of the schema. Unknown and missing keys are reported when it is
/// made, wrong values when they are read; a key left out, or wrong, gives the schema's fallback.
class SectionReader {
public:
    /// `node` is null where the section does not stand in the text. `section` must be in the schema.
    SectionReader(const toml::Document& document, const toml::Node* node, std::string_view section,
                  Diagnostics& diagnostics);

    /// The key stands in the text, readable or not.
    [[nodiscard]] bool given(std::string_view key) const noexcept { return find(key) != nullptr; }
    [[nodiscard]] bool stands() const noexcept { return node_ != nullptr; }
    [[nodiscard]] bool empty() const noexcept { return node_ == nullptr || node_->children.empty(); }
    /// A key of the section, or a header of the text, could not be read: what seems to be missing may be there.
    [[nodiscard]] bool damaged() const noexcept;

    /// Place of a key where given, else of the section.
    [[nodiscard]] Place place(std::string_view key) const;
    [[nodiscard]] Place place() const;
    /// Place of a key's value; the key must be given.
    [[nodiscard]] Place value_place(std::string_view key) const;
    /// Place of an item of a list of `count` items; of the whole value where the list has another length.
    [[nodiscard]] Place item_place(std::string_view key, std::size_t index, std::size_t count) const;
    /// Line and column of a key where given, else of the section.
    [[nodiscard]] toml::Mark mark(std::string_view key) const;

    [[nodiscard]] std::string text(std::string_view key);
    [[nodiscard]] std::string date(std::string_view key);
    /// In the internal unit of the key's dimension.
    [[nodiscard]] double number(std::string_view key) { return optional_number(key).value_or(0.0); }
    [[nodiscard]] std::optional<double> optional_number(std::string_view key);
    [[nodiscard]] int whole_number(std::string_view key) { return static_cast<int>(number(key)); }
    [[nodiscard]] bool yes(std::string_view key);
    /// Position in the schema's choices; empty where there is no value.
    [[nodiscard]] std::optional<std::size_t> optional_choice(std::string_view key);
    /// The same as an enumeration whose values are in the order of the choices.
    template <class Enum> [[nodiscard]] Enum choice(std::string_view key, Enum otherwise = Enum{}) {
        const auto position = optional_choice(key);
        return position ? static_cast<Enum>(*position) : otherwise;
    }
    [[nodiscard]] std::vector<Located<std::string>> texts(std::string_view key);
    [[nodiscard]] std::vector<Located<double>> numbers(std::string_view key);
    /// The inline table of a key; empty where it is left out or no table.
    [[nodiscard]] std::optional<SectionReader> table(std::string_view key);

    void error_at(const toml::Mark& mark, std::string code, std::string message, std::string hint);
    void error(std::string_view key, std::string code, std::string message, std::string hint);
    /// The same, at the key's value.
    void value_error(std::string_view key, std::string code, std::string message, std::string hint);
    /// At an item of a list, see item_place.
    struct Item {
        std::size_t index = 0;
        std::size_t count = 0;
    };
    void item_warning(std::string_view key, Item item, std::string code, std::string message, std::string hint);
    void warning(std::string_view key, std::string code, std::string message, std::string hint);

private:
    [[nodiscard]] const toml::Node* find(std::string_view key) const noexcept;
    [[nodiscard]] const KeyDefinition& definition(std::string_view key) const;
    [[nodiscard]] std::string words() const;
    void report_unknown_keys();
    void report_missing_keys();
    std::optional<double> read_number(const KeyDefinition& key, const toml::Node& node);
    std::optional<std::string> read_text(const KeyDefinition& key, const toml::Node& node);
    [[nodiscard]] bool within_range(const KeyDefinition& key, double value, const toml::Node& node);
    void wrong_kind(const KeyDefinition& key, const toml::Node& node, std::string hint);

    const toml::Document* document_;
    const toml::Node* node_;
    const SectionDefinition* section_;
    Diagnostics* diagnostics_;
};

} // namespace spanledger
