// SPDX-License-Identifier: MIT
#include "spanledger/input/toml_text.hpp"

#include "spanledger/input/toml_advice.hpp"
#include "spanledger/input/toml_repair.hpp"

#include <toml++/toml.h>

#include <algorithm>

namespace spanledger::toml {

namespace {

constexpr std::size_t most_repairs = 20;
constexpr std::size_t largest_repaired = std::size_t{1} << 20; ///< bytes; each repair parses the text anew

Mark mark_of(const ::toml::source_region& region) {
    const bool one_line = region.end.line == region.begin.line && region.end.column > region.begin.column;
    return {region.begin.line, region.begin.column, one_line ? region.end.column - region.begin.column : 1};
}

std::optional<ParseFailure> try_parse(const std::string& text, ::toml::table& result) {
    try {
        result = ::toml::parse(text);
        return std::nullopt;
    } catch (const ::toml::parse_error& error) {
        return ParseFailure{std::string(error.description()), mark_of(error.source())};
    }
}

NodeKind kind_of(const ::toml::node& node) {
    switch (node.type()) {
    case ::toml::node_type::string: return NodeKind::text;
    case ::toml::node_type::integer:
    case ::toml::node_type::floating_point: return NodeKind::number;
    case ::toml::node_type::boolean: return NodeKind::boolean;
    case ::toml::node_type::array: return NodeKind::array;
    case ::toml::node_type::table: return NodeKind::table;
    default: return NodeKind::date;
    }
}

/// A number without underscores between digits and a leading plus, which only TOML knows.
std::string plain_number(std::string_view source) {
    std::string text(source);
    text.erase(std::remove(text.begin(), text.end(), '_'), text.end());
    return text.starts_with('+') ? text.substr(1) : text;
}

/// Copies the parser's tree, with source texts of numbers, into ours.
class TreeCopy {
public:
    explicit TreeCopy(const Document& document) : document_(&document) {}

    void copy(const ::toml::node& source, Node& node) {
        node.kind = kind_of(source);
        node.mark = mark_of(source.source());
        if (const auto* table = source.as_table()) {
            node.inline_table = table->is_inline();
            copy_entries(*table, node);
        } else if (const auto* array = source.as_array()) {
            for (const ::toml::node& item : *array) {
                copy(item, node.children.emplace_back());
            }
        } else if (const auto* text = source.as_string()) {
            node.text = text->get();
            node.kind = Repair::is_substitute(node.text) ? NodeKind::unread : NodeKind::text;
        } else if (const auto* truth = source.as_boolean()) {
            node.boolean = truth->get();
        } else {
            node.text = plain_number(source_text(node.mark));
        }
    }

private:
    void copy_entries(const ::toml::table& table, Node& node) {
        std::vector<std::pair<const ::toml::key*, const ::toml::node*>> entries;
        for (const auto& [key, value] : table) {
            if (!Repair::is_substitute(key.str())) {
                entries.emplace_back(&key, &value);
            }
        }
        std::sort(entries.begin(), entries.end(), [](const auto& a, const auto& b) {
            const ::toml::source_position& left = a.first->source().begin;
            const ::toml::source_position& right = b.first->source().begin;
            return std::pair(left.line, left.column) < std::pair(right.line, right.column);
        });
        for (const auto& [key, value] : entries) {
            Node& child = node.children.emplace_back();
            child.key = std::string(key->str());
            child.key_mark = mark_of(key->source());
            copy(*value, child);
        }
    }

    /// Numbers and dates are ASCII, so that their width in characters is their length.
    std::string_view source_text(const Mark& mark) {
        return document_->line(mark.line).substr(byte_offset(mark), mark.width);
    }

    /// Offset of a mark in its line; quick as long as marks come in the order of the text.
    std::size_t byte_offset(const Mark& mark) {
        if (mark.line != cursor_.line || mark.column < cursor_.column) {
            cursor_ = {mark.line, 1};
            offset_ = 0;
        }
        const std::string_view line = document_->line(mark.line);
        for (; cursor_.column < mark.column && offset_ < line.size(); ++cursor_.column) {
            do {
                ++offset_;
            } while (offset_ < line.size() && (static_cast<unsigned char>(line[offset_]) & 0xC0) == 0x80);
        }
        return offset_;
    }

    const Document* document_;
    Mark cursor_;
    std::size_t offset_ = 0;
};

/// The parser has no bound for the depth of dotted keys, the stack has.
bool refuse_endless_keys(const Document& document, Diagnostics& diagnostics) {
    for (std::size_t number = 1; number <= document.line_count(); ++number) {
        if (has_endless_key(document.line(number))) {
            diagnostics.error("syntax", document.place({number, 1}), "a key with more than 100 parts",
                              "write section.key at most");
            return true;
        }
    }
    return false;
}

} // namespace

Document parse(const std::string& file, std::string_view text, Diagnostics& diagnostics,
               std::span<const std::string> several) {
    Document document(file, text);
    document.header_lost_ = true;
    if (refuse_endless_keys(document, diagnostics)) {
        return document;
    }
    ::toml::table table;
    Repair repair(
        document,
        [](const std::string& part) {
            ::toml::table ignored;
            return try_parse(part, ignored);
        },
        diagnostics);
    for (std::size_t attempt = 0; attempt <= most_repairs; ++attempt) {
        const auto failure = try_parse(repair.text(), table);
        if (!failure) {
            TreeCopy(document).copy(table, document.root_);
            document.header_lost_ = repair.header_lost();
            break;
        }
        if (attempt == most_repairs || (attempt > 0 && text.size() > largest_repaired)) {
            break;
        }
        repair.set_aside(*failure);
    }
    repair.report_duplicates(document.root_, several);
    return document;
}

} // namespace spanledger::toml
