// SPDX-License-Identifier: MIT
#pragma once

#include <string>
#include <string_view>
#include <vector>

// Plain text for a terminal or a file, at most 100 columns wide.

namespace spanledger {

inline constexpr std::size_t text_columns = 100;

struct TextColumn {
    std::string name;
    bool right_aligned = false;
};

/// An aligned table. What does not fit beside the other columns is wrapped in the last one.
class TextTable {
public:
    explicit TextTable(std::vector<TextColumn> columns) : columns_(std::move(columns)) {}
    void add(std::vector<std::string> cells) { rows_.push_back(std::move(cells)); }
    [[nodiscard]] std::string text(std::size_t indent) const;

private:
    [[nodiscard]] std::vector<std::size_t> widths() const;

    std::vector<TextColumn> columns_;
    std::vector<std::vector<std::string>> rows_;
};

class PlainText {
public:
    /// A paragraph from the left margin, later lines indented.
    void paragraph(std::string_view words);
    void heading(std::string_view words);
    /// A name in a column of its own, then words, wrapped within theirs.
    void fact(std::string_view name, std::string_view words);
    void table(const TextTable& table);
    /// A heading and its items; nothing where there are none.
    void list(std::string_view name, const std::vector<std::string>& items);

    [[nodiscard]] std::string take() { return std::move(text_); }

private:
    std::string text_;
};

/// Words broken into lines of at most `columns` characters.
[[nodiscard]] std::vector<std::string> broken_lines(std::string_view words, std::size_t columns);

} // namespace spanledger
