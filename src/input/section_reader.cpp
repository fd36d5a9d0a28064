// SPDX-License-Identifier: MIT
#include "spanledger/input/section_reader.hpp"

#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {

namespace {

std::string quoted_list(const std::vector<std::string>& words) {
    std::string list;
    for (const std::string& word : words) {
        list += fmt::format("{}\"{}\"", list.empty() ? "" : ", ", word);
    }
    return list;
}

std::vector<std::string> key_names(const SectionDefinition& section) {
    std::vector<std::string> names;
    for (const KeyDefinition& key : section.keys) {
        names.emplace_back(key.name);
    }
    return names;
}

std::string_view wanted_words(ValueKind kind) {
    switch (kind) {
    case ValueKind::number:
    case ValueKind::whole_number: return "a number";
    case ValueKind::yes_no: return "true or false";
    case ValueKind::date: return "a date";
    case ValueKind::table: return "{key = value, ...}";
    case ValueKind::texts: return "a text or a list of texts";
    case ValueKind::numbers: return "a number or a list of numbers";
    default: return "a text";
    }
}

} // namespace

std::string unknown_key_hint(std::string_view key, const std::vector<std::string>& known) {
    for (const SectionDefinition& section : brief_schema()) {
        const auto names = key_names(section);
        if (!section.inlined && std::find(names.begin(), names.end(), key) != names.end()) {
            return fmt::format("'{}' belongs under {}", key, section_header(section));
        }
    }
    return did_you_mean(key, known);
}

SectionReader::SectionReader(const toml::Document& document, const toml::Node* node, std::string_view section,
                             Diagnostics& diagnostics)
    : document_(&document), node_(node), section_(&section_definition(section)), diagnostics_(&diagnostics) {
    if (node_ != nullptr) {
        report_unknown_keys();
        report_missing_keys();
    }
}

const toml::Node* SectionReader::find(std::string_view key) const noexcept {
    return node_ == nullptr ? nullptr : toml::find(*node_, key);
}

const KeyDefinition& SectionReader::definition(std::string_view key) const {
    return key_definition(*section_, key);
}

toml::Mark SectionReader::mark(std::string_view key) const {
    if (const toml::Node* node = find(key)) {
        return node->key_mark;
    }
    if (node_ == nullptr) {
        return {0, 0, 1};
    }
    if (!node_->key.empty() && !node_->inline_table) {
        return node_->key_mark;
    }
    toml::Mark whole = node_->mark;
    if (const std::size_t end = document_->line(whole.line).find("]]"); node_->key.empty() && end < std::string::npos) {
        whole.width = end + 3 - std::min(whole.column, end);
    }
    return whole;
}

Place SectionReader::place(std::string_view key) const {
    return document_->place(mark(key));
}
Place SectionReader::place() const {
    return place(std::string_view());
}

Place SectionReader::value_place(std::string_view key) const {
    const toml::Node* node = find(key);
    return node == nullptr ? place(key) : document_->place(node->mark);
}

Place SectionReader::item_place(std::string_view key, std::size_t index, std::size_t count) const {
    const toml::Node* node = find(key);
    const bool listed = node != nullptr && node->kind == toml::NodeKind::array && node->children.size() == count;
    return listed ? document_->place(node->children[index].mark) : value_place(key);
}

bool SectionReader::damaged() const noexcept {
    const auto unread = [](const toml::Node& child) { return child.kind == toml::NodeKind::unread; };
    return document_->header_lost() ||
           (node_ != nullptr && std::any_of(node_->children.begin(), node_->children.end(), unread));
}

/// "[support]", "[[load]]", or the key of an inline table.
std::string SectionReader::words() const {
    return section_->inlined ? node_->key : section_header(*section_);
}

void SectionReader::value_error(std::string_view key, std::string code, std::string message, std::string hint) {
    diagnostics_->error(std::move(code), value_place(key), std::move(message), std::move(hint));
}

void SectionReader::item_warning(std::string_view key, Item item, std::string code, std::string message,
                                 std::string hint) {
    diagnostics_->warning(std::move(code), item_place(key, item.index, item.count), std::move(message),
                          std::move(hint));
}

void SectionReader::error(std::string_view key, std::string code, std::string message, std::string hint) {
    diagnostics_->error(std::move(code), place(key), std::move(message), std::move(hint));
}

void SectionReader::warning(std::string_view key, std::string code, std::string message, std::string hint) {
    diagnostics_->warning(std::move(code), place(key), std::move(message), std::move(hint));
}

void SectionReader::error_at(const toml::Mark& at, std::string code, std::string message, std::string hint) {
    diagnostics_->error(std::move(code), document_->place(at), std::move(message), std::move(hint));
}

void SectionReader::report_unknown_keys() {
    const std::vector<std::string> known = key_names(*section_);
    for (const toml::Node& child : node_->children) {
        if (std::find(known.begin(), known.end(), child.key) == known.end()) {
            diagnostics_->error("unknown-key", document_->place(child.key_mark),
                                fmt::format("{} has no key '{}'", words(), child.key),
                                unknown_key_hint(child.key, known));
        }
    }
}

void SectionReader::report_missing_keys() {
    for (const KeyDefinition& key : section_->keys) {
        if (key.required && !given(key.name)) {
            error(key.name, "missing-key", fmt::format("{} needs the key '{}'", words(), key.name),
                  fmt::format("add {0}, such as {0} = {1} ({2})", key.name, example_of(key), key.meaning));
        }
    }
}

void SectionReader::wrong_kind(const KeyDefinition& key, const toml::Node& node, std::string hint) {
    if (node.kind != toml::NodeKind::unread) {
        error_at(node.mark, "wrong-kind",
                 fmt::format("{}: {} stands where {} is wanted", key.name, toml::kind_name(node.kind),
                             wanted_words(key.kind)),
                 std::move(hint));
    }
}

std::optional<std::string> SectionReader::read_text(const KeyDefinition& key, const toml::Node& node) {
    constexpr std::size_t longest_line = 200;
    constexpr std::size_t longest_text = 4000;
    if (node.kind != toml::NodeKind::text) {
        const bool has_source = node.kind == toml::NodeKind::number || node.kind == toml::NodeKind::date;
        wrong_kind(key, node,
                   fmt::format("write a text in quotes: {} = \"{}\"", key.name, has_source ? node.text : "..."));
        return std::nullopt;
    }
    constexpr std::string_view blanks = " \t\r\n";
    const std::size_t first = node.text.find_first_not_of(blanks);
    if (first == std::string::npos) {
        error_at(node.mark, "empty-text", fmt::format("{} is empty", key.name),
                 key.required ? fmt::format("type the {}", key.meaning) : "type a text, or remove the line");
        return std::nullopt;
    }
    const std::string text = node.text.substr(first, node.text.find_last_not_of(blanks) - first + 1);
    const bool lines = key.kind == ValueKind::long_text;
    const bool control = std::any_of(text.begin(), text.end(), [&](char c) {
        return (static_cast<unsigned char>(c) < 0x20 || c == '\x7F') &&
               !(lines && (c == '\n' || c == '\r' || c == '\t'));
    });
    if (control || text.size() > (lines ? longest_text : longest_line)) {
        error_at(node.mark, "bad-text",
                 control ? fmt::format("{} holds a control character, such as a tab or a line end", key.name)
                         : fmt::format("{} has {} bytes; at most {} are read", key.name, text.size(),
                                       lines ? longest_text : longest_line),
                 control ? "write it in one line with spaces" : "shorten it");
        return std::nullopt;
    }
    return text;
}

std::string SectionReader::text(std::string_view key) {
    const KeyDefinition& known = definition(key);
    const toml::Node* node = find(key);
    return node == nullptr ? std::string(known.fallback)
                           : read_text(known, *node).value_or(std::string(known.fallback));
}

bool SectionReader::yes(std::string_view key) {
    const KeyDefinition& known = definition(key);
    const toml::Node* node = find(key);
    if (node != nullptr && node->kind == toml::NodeKind::boolean) {
        return node->boolean;
    }
    if (node != nullptr) {
        wrong_kind(known, *node, fmt::format("write {0} = true or {0} = false, without quotes", key));
    }
    return known.fallback == "true";
}

std::optional<std::size_t> SectionReader::optional_choice(std::string_view key) {
    const KeyDefinition& known = definition(key);
    const toml::Node* node = find(key);
    const std::vector<std::string> words = listed_words(known.choices);
    const auto position_of = [&](std::string_view word) -> std::optional<std::size_t> {
        const auto found = std::find(words.begin(), words.end(), word);
        return found == words.end() ? std::nullopt : std::optional(static_cast<std::size_t>(found - words.begin()));
    };
    const std::optional<std::size_t> fallback = position_of(known.fallback);
    if (node == nullptr) {
        return fallback;
    }
    const auto text = read_text(known, *node);
    if (!text) {
        return fallback;
    }
    const auto position = position_of(*text);
    if (!position) {
        const std::vector<std::string> later = listed_words(known.not_covered);
        if (std::find(later.begin(), later.end(), *text) != later.end()) {
            error_at(node->mark, "not-covered", fmt::format("{} = \"{}\" is not covered yet", key, *text),
                     "covered: " + quoted_list(words));
        } else {
            const std::string nearest = nearest_name(*text, words);
            error_at(node->mark, "unknown-choice", fmt::format("'{}' is no value of {}", *text, key),
                     fmt::format("{}known: {}", nearest.empty() ? "" : fmt::format("did you mean '{}'? ", nearest),
                                 quoted_list(words)));
        }
    }
    return position ? position : fallback;
}

std::vector<Located<std::string>> SectionReader::texts(std::string_view key) {
    const KeyDefinition& known = definition(key);
    const toml::Node* node = find(key);
    std::vector<Located<std::string>> found;
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
        if (auto text = read_text(known, item)) {
            found.push_back({std::move(*text), item.mark});
        }
    }
    return found;
}

std::optional<SectionReader> SectionReader::table(std::string_view key) {
    const KeyDefinition& known = definition(key);
    const toml::Node* node = find(key);
    if (node == nullptr) {
        return std::nullopt;
    }
    if (node->kind != toml::NodeKind::table) {
        std::string keys;
        for (const KeyDefinition& inner : section_definition(known.table).keys) {
            keys += fmt::format("{}{}", keys.empty() ? "" : ", ", inner.name);
        }
        wrong_kind(known, *node, fmt::format("write {} = {{key = value, ...}} with the keys {}", key, keys));
        return std::nullopt;
    }
    return SectionReader(*document_, node, known.table, *diagnostics_);
}

} // namespace spanledger
