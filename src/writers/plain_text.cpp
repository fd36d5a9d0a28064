// SPDX-License-Identifier: MIT
#include "plain_text.hpp"

#include "utf8_bytes.hpp"

#include "spanledger/input/utf8.hpp"

#include <algorithm>

namespace spanledger {
namespace {

constexpr std::size_t indent = 2;
constexpr std::size_t name_columns = 26;

std::string padded(const std::string& text, std::size_t columns, bool right_aligned) {
    const std::size_t present = count_characters(text);
    const std::string blanks(columns > present ? columns - present : 0, ' ');
    return right_aligned ? blanks + text : text + blanks;
}

/// Bytes of the first `columns` characters.
std::size_t bytes_of(std::string_view text, std::size_t columns) {
    std::size_t bytes = 0;
    for (std::size_t i = 0; i < columns && bytes < text.size(); ++i) bytes += first_character_bytes(text.substr(bytes));
    return bytes;
}

void trim_right(std::string& text) {
    text.erase(text.find_last_not_of(' ') + 1);
}

} // namespace

std::vector<std::string> broken_lines(std::string_view words, std::size_t columns) {
    std::vector<std::string> lines(1);
    while (!words.empty()) {
        const std::size_t space = words.find_first_of(" \n");
        std::string_view word = words.substr(0, space);
        words.remove_prefix(space == std::string_view::npos ? words.size() : space + 1);
        const std::size_t present = count_characters(lines.back());
        if (present > 0 && present + 1 + count_characters(word) > columns) lines.emplace_back();
        while (count_characters(word) > columns) {
            const std::size_t bytes = bytes_of(word, columns);
            lines.back() = word.substr(0, bytes);
            lines.emplace_back();
            word.remove_prefix(bytes);
        }
        if (!lines.back().empty()) lines.back() += ' ';
        lines.back() += word;
    }
    for (std::string& line : lines) line = printable(line);
    return lines;
}

std::vector<std::size_t> TextTable::widths() const {
    std::vector<std::size_t> widths;
    for (std::size_t column = 0; column < columns_.size(); ++column) {
        std::size_t widest = count_characters(columns_[column].name);
        for (const auto& row : rows_) widest = std::max(widest, count_characters(row[column]));
        widths.push_back(widest);
    }
    return widths;
}

std::string TextTable::text(std::size_t left) const {
    constexpr std::size_t gap = 2;
    const std::vector<std::size_t> wide = widths();
    std::size_t before_last = left;
    for (std::size_t column = 0; column + 1 < columns_.size(); ++column) before_last += wide[column] + gap;
    constexpr std::size_t least_room = 12;
    const std::size_t room = std::max(least_room, text_columns - std::min(before_last, text_columns));
    std::string text;
    const auto add_row = [&](const auto& cell_of) {
        std::string line(left, ' ');
        for (std::size_t column = 0; column + 1 < columns_.size(); ++column) {
            line += padded(cell_of(column), wide[column], columns_[column].right_aligned) + std::string(gap, ' ');
        }
        const std::size_t last = columns_.size() - 1;
        for (const std::string& part : broken_lines(cell_of(last), room)) {
            line += padded(part, std::min(wide[last], room), columns_[last].right_aligned);
            trim_right(line);
            text += line + '\n';
            line.assign(before_last, ' ');
        }
    };
    add_row([&](std::size_t column) { return columns_[column].name; });
    for (const auto& row : rows_) add_row([&](std::size_t column) { return row[column]; });
    return text;
}

void PlainText::paragraph(std::string_view words) {
    const auto lines = broken_lines(words, text_columns - indent);
    for (std::size_t i = 0; i < lines.size(); ++i) text_ += (i > 0 ? std::string(indent, ' ') : "") + lines[i] + '\n';
}

void PlainText::heading(std::string_view words) {
    text_ += '\n';
    text_ += words;
    text_ += '\n';
}

void PlainText::fact(std::string_view name, std::string_view words) {
    const auto lines = broken_lines(words, text_columns - indent - name_columns);
    for (std::size_t i = 0; i < lines.size(); ++i) {
        std::string line(indent, ' ');
        line += padded(i == 0 ? std::string(name) : std::string(), name_columns, false) + lines[i];
        trim_right(line);
        text_ += line + '\n';
    }
}

void PlainText::table(const TextTable& table) {
    text_ += table.text(indent);
}

void PlainText::list(std::string_view name, const std::vector<std::string>& items) {
    if (items.empty()) return;
    heading(name);
    for (const std::string& item : items) {
        const auto lines = broken_lines(item, text_columns - 2 * indent);
        for (std::size_t i = 0; i < lines.size(); ++i) {
            text_ += std::string(indent, ' ') + (i == 0 ? "- " : "  ") + lines[i] + '\n';
        }
    }
}

} // namespace spanledger
