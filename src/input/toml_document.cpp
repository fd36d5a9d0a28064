// SPDX-License-Identifier: MIT
#include "spanledger/input/toml_text.hpp"

#include <algorithm>

namespace spanledger::toml {

namespace {

/// Longer lines are no help in a message, and copying them for each would not end.
constexpr std::size_t longest_excerpt = 4000; ///< bytes

} // namespace

const Node* find(const Node& table, std::string_view key) {
    const auto found =
        std::find_if(table.children.begin(), table.children.end(), [&](const Node& child) { return child.key == key; });
    return found == table.children.end() ? nullptr : &*found;
}

std::string_view kind_name(NodeKind kind) noexcept {
    switch (kind) {
    case NodeKind::text: return "a text";
    case NodeKind::number: return "a number";
    case NodeKind::boolean: return "true or false";
    case NodeKind::date: return "a date";
    case NodeKind::array: return "a list";
    case NodeKind::table: return "a table";
    case NodeKind::unread: return "unreadable";
    }
    return "";
}

Document::Document(std::string file, std::string_view text) : file_(std::move(file)), text_(text) {
    line_starts_.push_back(0);
    for (std::size_t i = 0; i < text_.size(); ++i) {
        if (text_[i] == '\n') {
            line_starts_.push_back(i + 1);
        }
    }
}

std::string_view Document::line(std::size_t number) const {
    if (number == 0 || number > line_starts_.size()) {
        return {};
    }
    const std::size_t start = line_starts_[number - 1];
    std::string_view line = std::string_view(text_).substr(start);
    line = line.substr(0, line.find('\n'));
    if (line.ends_with('\r')) {
        line.remove_suffix(1);
    }
    return line;
}

Place Document::place(const Mark& mark) const {
    const std::string_view whole = line(mark.line);
    return {.file = file_,
            .line = mark.line,
            .column = mark.column,
            .source_line = std::string(whole.size() > longest_excerpt ? std::string_view() : whole),
            .width = mark.width};
}

} // namespace spanledger::toml
