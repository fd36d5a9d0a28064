// SPDX-License-Identifier: MIT
#include "spanledger/input/toml_repair.hpp"

#include "spanledger/input/toml_advice.hpp"
#include "spanledger/input/utf8.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger::toml {

namespace {

constexpr std::string_view substitute = "spanledger: set aside ";

std::size_t width_of(std::string_view text) {
    return std::max<std::size_t>(count_characters(text), 1);
}

/// The first `count` characters of a line.
std::string_view characters_before(std::string_view line, std::size_t count) {
    std::size_t end = 0;
    for (; count > 0 && end < line.size(); --count) {
        do {
            ++end;
        } while (end < line.size() && (static_cast<unsigned char>(line[end]) & 0xC0) == 0x80);
    }
    return line.substr(0, end);
}

bool is_word_character(char c) {
    return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z') || (c >= '0' && c <= '9') || c == '_' || c == '-';
}

/// First place of a whole word; npos where there is none.
std::size_t find_word(std::string_view text, std::string_view word) {
    for (std::size_t at = text.find(word); at != std::string_view::npos; at = text.find(word, at + 1)) {
        const std::size_t end = at + word.size();
        const bool begins = at == 0 || !is_word_character(text[at - 1]);
        if (begins && (end == text.size() || !is_word_character(text[end]))) {
            return at;
        }
    }
    return std::string_view::npos;
}

/// The name in "cannot redefine existing integer 'a'".
std::string name_in(const std::string& reason) {
    const std::size_t open = reason.find('\'');
    const std::size_t close = reason.rfind('\'');
    return open < close ? reason.substr(open + 1, close - open - 1) : std::string();
}

} // namespace

Repair::Repair(const Document& document, TryParse try_parse, Diagnostics& diagnostics)
    : document_(&document), try_parse_(std::move(try_parse)), diagnostics_(&diagnostics) {
    for (std::size_t number = 1; number <= document.line_count(); ++number) {
        lines_.emplace_back(document.line(number));
    }
}

bool Repair::is_substitute(std::string_view text) noexcept {
    return text.starts_with(substitute);
}

std::string Repair::joined(std::size_t line_count) const {
    std::string text;
    for (std::size_t i = 0; i < line_count; ++i) {
        text += lines_[i];
        text += '\n';
    }
    return text;
}

bool Repair::parses_before(std::size_t number) const {
    return !try_parse_(joined(number - 1));
}

std::size_t Repair::next_statement(std::size_t after) const {
    std::size_t number = after + 1;
    while (number <= lines_.size() && !begins_statement(lines_[number - 1])) {
        ++number;
    }
    return number;
}

/// First line of the statement at fault: the line of the failure, or an earlier one that left something open.
std::size_t Repair::statement_at_fault(const ParseFailure& failure) const {
    std::size_t first = std::clamp<std::size_t>(failure.mark.line, 1, lines_.size());
    while (first > 1 && !parses_before(first)) {
        do {
            --first;
        } while (first > 1 && !begins_statement(lines_[first - 1]));
    }
    return first;
}

std::string Repair::substitute_for(const std::string& line) {
    if (begins_header(line)) {
        header_lost_ = true;
        return fmt::format("[\"{}{}\"]", substitute, ++headers_set_aside_);
    }
    return begins_statement(line) ? fmt::format("{} = \"{}\"", split_assignment(line).key, substitute) : std::string();
}

void Repair::set_aside(const ParseFailure& failure) {
    const std::size_t first = statement_at_fault(failure);
    const std::size_t next = next_statement(first);
    const std::string line = lines_[first - 1];
    const bool twice = failure.reason.find("cannot redefine") != std::string::npos;
    if (twice) {
        remember_duplicate(failure, first);
    } else {
        const bool at_end = failure.reason.find("end-of-file") != std::string::npos;
        report_syntax(failure, first, at_end || failure.mark.line >= next);
    }
    for (std::size_t number = first; number < next; ++number) {
        lines_[number - 1].clear();
    }
    const bool own_key_twice = twice && !begins_header(line) && !duplicates_.back().inlined;
    if (!own_key_twice) {
        lines_[first - 1] = substitute_for(line);
    }
}

void Repair::report_syntax(const ParseFailure& failure, std::size_t first, bool left_open) {
    const std::string& line = lines_[first - 1];
    const Advice advice = left_open ? unclosed_advice(line) : syntax_advice(line, failure.reason);
    const Assignment parts = split_assignment(line);
    Mark mark = left_open ? Mark{first, 1} : failure.mark;
    if (advice.at_value && !parts.key.empty()) {
        const std::string_view before = std::string_view(line).substr(0, parts.value_offset);
        mark = {first, count_characters(before) + 1, width_of(parts.value)};
    }
    diagnostics_->error("syntax", document_->place(mark), advice.message, advice.hint);
}

void Repair::remember_duplicate(const ParseFailure& failure, std::size_t first) {
    const std::string_view line = lines_[first - 1];
    Duplicate duplicate{name_in(failure.reason), {first, 1, width_of(line)}, begins_header(line)};
    if (!duplicate.header) {
        const std::string_view before = characters_before(line, failure.mark.column - 1);
        const std::size_t offset = std::min(before.rfind(duplicate.name), before.size());
        duplicate.inlined = offset > line.find('=');
        duplicate.mark = {first, count_characters(before.substr(0, offset)) + 1, width_of(duplicate.name)};
    }
    duplicates_.push_back(std::move(duplicate));
}

void Repair::report_duplicates(const Node& root, std::span<const std::string> several) {
    for (const Duplicate& duplicate : duplicates_) {
        const auto earlier = first_place(root, duplicate);
        const std::string first =
            earlier ? fmt::format("; it is already in line {}, column {}", earlier->line, earlier->column) : "";
        const std::string& name = duplicate.name;
        if (duplicate.header) {
            const bool repeatable = std::find(several.begin(), several.end(), name) != several.end();
            diagnostics_->error("duplicate-section", document_->place(duplicate.mark),
                                fmt::format("the section [{}] stands twice{}", name, first),
                                repeatable ? fmt::format("write [[{}]] each time: there may be several", name)
                                           : fmt::format("keep one [{}] with all its keys", name));
        } else {
            diagnostics_->error("duplicate-key", document_->place(duplicate.mark),
                                fmt::format("the key '{}' stands twice{}", name, first), "remove one of the two");
        }
    }
}

/// The last place before the second one where the name stands as a key: in the tree, or earlier in the same line.
std::optional<Mark> Repair::first_place(const Node& root, const Duplicate& duplicate) const {
    const auto& [name, mark, header, inlined] = duplicate;
    const std::string_view before = characters_before(document_->line(mark.line), mark.column - 1);
    const std::string_view leaf = std::string_view(name).substr(name.rfind('.') + 1);
    if (const std::size_t offset = find_word(before, leaf); !header && offset != std::string_view::npos) {
        return Mark{mark.line, count_characters(before.substr(0, offset)) + 1};
    }
    std::optional<Mark> last;
    std::vector<const Node*> open{&root};
    while (!open.empty()) {
        const Node& node = *open.back();
        open.pop_back();
        if (node.key == leaf && node.key_mark.line < mark.line && (!last || last->line < node.key_mark.line)) {
            last = node.key_mark;
        }
        for (const Node& child : node.children) {
            open.push_back(&child);
        }
    }
    return last;
}

} // namespace spanledger::toml
