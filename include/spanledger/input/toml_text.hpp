// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/diagnostics.hpp"

#include <cstddef>
#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <vector>

// A TOML text as a simple tree that knows where each part stands. Numbers keep their source text, so that one reader of
// quantities judges every number of the program.

namespace spanledger::toml {

enum class NodeKind {
    text,
    number, ///< finite or not, decimal or not: whatever TOML calls an integer or a float
    boolean,
    date, ///< dates and times
    array,
    table,
    unread, ///< stood in the file, but its syntax error has been reported already
};

/// Where a token stands; lines, columns and widths count characters from 1.
struct Mark {
    std::size_t line = 0;
    std::size_t column = 0;
    std::size_t width = 1;
};

/// A value, with the key it has in its table.
struct Node {
    NodeKind kind = NodeKind::table;
    std::string key;  ///< empty in an array and at the root
    Mark key_mark;    ///< of the key; in [[name]] and [name] of the header
    Mark mark;        ///< of the value
    std::string text; ///< a text's content; the source text of a number or date
    bool boolean = false;
    bool inline_table = false;
    std::vector<Node> children; ///< items of an array, or entries of a table in file order
};

/// The entry of a table, or nothing.
[[nodiscard]] const Node* find(const Node& table, std::string_view key);

/// Words for a kind, as in "a text".
[[nodiscard]] std::string_view kind_name(NodeKind kind) noexcept;

class Document {
public:
    Document(std::string file, std::string_view text);

    [[nodiscard]] const std::string& file() const noexcept { return file_; }
    [[nodiscard]] const Node& root() const noexcept { return root_; }
    /// A header could not be read, so that sections may only seem to be missing.
    [[nodiscard]] bool header_lost() const noexcept { return header_lost_; }
    [[nodiscard]] Place place(const Mark& mark) const;
    [[nodiscard]] std::size_t line_count() const noexcept { return line_starts_.size(); }
    [[nodiscard]] std::string_view line(std::size_t number) const; ///< without its line end; empty past the end

private:
    friend Document parse(const std::string& file, std::string_view text, Diagnostics& diagnostics,
                          std::span<const std::string> several);

    std::string file_;
    std::string text_;
    std::vector<std::size_t> line_starts_; ///< offset of each line in text_
    Node root_;
    bool header_lost_ = false;
};

/// Parses a text that read_text_file has accepted. Every syntax error goes to `diagnostics`, a key or table that stands
/// twice with both places; the parts that could be read are in the document, the others are NodeKind::unread. `several`
/// names sections that are written [[name]], for the hint where one is written [name] again.
[[nodiscard]] Document parse(const std::string& file, std::string_view text, Diagnostics& diagnostics,
                             std::span<const std::string> several = {});

} // namespace spanledger::toml
