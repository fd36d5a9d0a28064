// SPDX-License-Identifier: MIT
#include "spanledger/input/toml_advice.hpp"

#include "spanledger/input/quantity.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>

namespace spanledger::toml {

namespace {

constexpr std::size_t longest_dotted_key = 100;
constexpr std::string_view blanks = " \t\r";

std::string_view trimmed(std::string_view text) {
    const std::size_t first = text.find_first_not_of(blanks);
    return first == std::string_view::npos ? std::string_view()
                                           : text.substr(first, text.find_last_not_of(blanks) - first + 1);
}

bool is_digit(char c) {
    return c >= '0' && c <= '9';
}
bool is_letter(char c) {
    return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z');
}
bool is_key_character(char c) {
    return is_digit(c) || is_letter(c) || c == '_' || c == '-' || c == '.';
}

/// First of `wanted` that stands outside quotes; npos where there is none.
std::size_t find_outside_quotes(std::string_view text, char wanted) {
    char quote = '\0';
    for (std::size_t i = 0; i < text.size(); ++i) {
        const char c = text[i];
        if (quote != '\0') {
            if (c == '\\' && quote == '"') {
                ++i;
            } else if (c == quote) {
                quote = '\0';
            }
        } else if (c == wanted) {
            return i;
        } else if (c == '"' || c == '\'') {
            quote = c;
        }
    }
    return std::string_view::npos;
}

std::string_view without_comment(std::string_view text) {
    return trimmed(text.substr(0, find_outside_quotes(text, '#')));
}

bool is_truth_word(std::string_view value) {
    static constexpr std::array<std::string_view, 6> words{"true", "false", "yes", "no", "on", "off"};
    std::string lower(value);
    std::transform(lower.begin(), lower.end(), lower.begin(),
                   [](char c) { return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c; });
    return std::find(words.begin(), words.end(), lower) != words.end();
}

bool has_decimal_comma(std::string_view value) {
    const std::size_t comma = value.find(',');
    return comma != std::string_view::npos && comma + 1 < value.size() && is_digit(value[comma + 1]);
}

bool looks_like_date(std::string_view value) {
    return value.size() > 5 && std::all_of(value.begin(), value.begin() + 4, is_digit) && value[4] == '-';
}

bool ends_in_unit(std::string_view value) {
    const std::string_view unit =
        trimmed(value.substr(std::min(value.find_first_not_of("+-0123456789."), value.size())));
    static constexpr std::array dimensions{Dimension::length, Dimension::area_load, Dimension::line_load,
                                           Dimension::force,  Dimension::stress,    Dimension::frequency};
    return std::any_of(dimensions.begin(), dimensions.end(),
                       [&](Dimension dimension) { return unit_factor(unit, dimension).has_value(); });
}

Advice number_advice(std::string_view key, std::string_view value) {
    const std::string message = fmt::format("'{}' is not a number", value);
    if (has_decimal_comma(value)) {
        std::string pointed(value);
        std::replace(pointed.begin(), pointed.end(), ',', '.');
        return {
            message,
            fmt::format("write decimals with a point: {} = {}; a list stands in brackets: [{}]", key, pointed, value),
            true};
    }
    if (looks_like_date(value)) {
        return {fmt::format("'{}' is not a date of the calendar", value), "write year-month-day, as in 2026-01-31",
                true};
    }
    if (ends_in_unit(value)) {
        return {message, fmt::format("with a unit it stands in quotes: {} = \"{}\"", key, value), true};
    }
    const bool leading_zero = value.size() > 1 && value[0] == '0' && is_digit(value[1]);
    return {message,
            leading_zero ? "write it without leading zeros" : "write a finite decimal number, such as 400 or 4.2",
            true};
}

Advice word_advice(std::string_view key, std::string_view value) {
    if (is_truth_word(value)) {
        return {fmt::format("'{}' is not a value", value), fmt::format("write {0} = true or {0} = false", key), true};
    }
    return {fmt::format("'{}' is a text without quotes", value), fmt::format("write {} = \"{}\"", key, value), true};
}

/// "Error while parsing string: encountered ..." as "encountered ... (string)".
std::string plain_reason(std::string_view reason) {
    constexpr std::string_view lead = "Error while parsing ";
    const std::size_t colon = reason.find(": ");
    if (!reason.starts_with(lead) || colon == std::string_view::npos) {
        return std::string(reason);
    }
    std::string plain =
        fmt::format("{} ({})", reason.substr(colon + 2), reason.substr(lead.size(), colon - lead.size()));
    constexpr std::string_view line_end = "'\\n'";
    if (const std::size_t at = plain.find(line_end); at != std::string::npos) {
        plain.replace(at, line_end.size(), "the end of the line");
    }
    return plain;
}

std::string closing_hint(std::string_view value) {
    switch (value.empty() ? ' ' : value.front()) {
    case '"':
    case '\'': return "close the text with the quote it began with; a backslash in double quotes is written \\\\";
    case '[': return "part the values of a list by commas and close it with ]";
    case '{': return "write {key = value, key = value} in one line, closed with }";
    default: return "write key = value, [section], or [[section]] for one of several; a remark begins with #";
    }
}

} // namespace

Assignment split_assignment(std::string_view line) {
    const std::size_t equals = find_outside_quotes(line, '=');
    if (equals == std::string_view::npos || find_outside_quotes(line, '#') < equals) {
        return {};
    }
    const std::string_view after = line.substr(equals + 1);
    const std::size_t blank = std::min(after.find_first_not_of(blanks), after.size());
    return {trimmed(line.substr(0, equals)), without_comment(after), equals + 1 + blank};
}

bool begins_header(std::string_view line) {
    return trimmed(line).starts_with('[');
}

bool begins_statement(std::string_view line) {
    const std::string_view key = split_assignment(line).key;
    return begins_header(line) || (!key.empty() && std::all_of(key.begin(), key.end(), is_key_character));
}

bool has_endless_key(std::string_view line) {
    std::size_t parts = 1;
    char quote = '\0';
    for (const char c : line) {
        if (quote != '\0') {
            quote = c == quote ? '\0' : quote;
        } else if (c == '"' || c == '\'') {
            quote = c;
        } else if (c == '#') {
            return false;
        } else if (c == '.') {
            ++parts;
        } else if (c == ',' || c == '=' || c == '[' || c == '{') {
            parts = 1;
        }
        if (parts > longest_dotted_key) {
            return true;
        }
    }
    return false;
}

Advice syntax_advice(std::string_view line, std::string_view reason) {
    const auto [key, value, offset] = split_assignment(line);
    if (!key.empty() && begins_statement(line)) {
        if (value.empty()) {
            return {fmt::format("'{}' has no value", key), "type a value after the =, or remove the line"};
        }
        const char first = value.front();
        if (is_digit(first) || first == '+' || first == '-' || first == '.') {
            return number_advice(key, value);
        }
        if (is_letter(first)) {
            return word_advice(key, value);
        }
    }
    const bool open_quote = !value.empty() && (value.front() == '"' || value.front() == '\'');
    if (open_quote && reason.find("unescaped control") != std::string_view::npos) {
        return unclosed_advice(line);
    }
    return {"cannot be read: " + plain_reason(reason),
            begins_header(line) ? "write [section], or [[section]] for one of several" : closing_hint(value)};
}

Advice unclosed_advice(std::string_view line) {
    const auto [key, value, offset] = split_assignment(line);
    return {"what begins here is not closed before the next key or the end of the file", closing_hint(value), true};
}

} // namespace spanledger::toml
