// SPDX-License-Identifier: MIT
#include "spanledger/writers/json_text.hpp"

#include <fmt/format.h>
#include <nlohmann/json.hpp>

#include <array>
#include <charconv>
#include <cmath>

namespace spanledger {

void JsonText::open(char bracket) {
    before_element();
    text_ += bracket;
    has_elements_.push_back(false);
}

void JsonText::close(char bracket) {
    const bool had_elements = has_elements_.back();
    const bool in_lines = has_elements_.size() <= levels_in_lines_;
    has_elements_.pop_back();
    if (had_elements && in_lines) new_line();
    text_ += bracket;
    if (has_elements_.empty()) text_ += '\n';
}

void JsonText::new_line() {
    text_ += '\n';
    text_.append(has_elements_.size(), ' ');
}

void JsonText::before_element() {
    if (after_key_) {
        after_key_ = false;
        return;
    }
    if (has_elements_.empty()) return;
    if (has_elements_.back()) text_ += ',';
    has_elements_.back() = true;
    if (has_elements_.size() <= levels_in_lines_) new_line();
}

void JsonText::key(std::string_view name) {
    value(name);
    text_ += ':';
    after_key_ = true;
}

void JsonText::value(std::string_view text) {
    before_element();
    // Invalid UTF-8 becomes the replacement character: the output is always valid.
    text_ += nlohmann::json(text).dump(-1, ' ', false, nlohmann::json::error_handler_t::replace);
}

void JsonText::value(char letter) {
    if (letter < ' ' || letter > '~' || letter == '"' || letter == '\\') return value(std::string_view(&letter, 1));
    before_element();
    text_ += {'"', letter, '"'};
}

void JsonText::value(double number) {
    if (!std::isfinite(number)) {
        finite_ = false;
        return null();
    }
    before_element();
    constexpr std::size_t longest = 32;
    std::array<char, longest> digits; // NOLINT(cppcoreguidelines-pro-type-member-init): to_chars writes it
    const double plain = number == 0.0 ? 0.0 : number; // no minus before a zero
    const auto end = std::to_chars(digits.data(), digits.data() + digits.size(), plain);
    text_.append(digits.data(), end.ptr);
}

void JsonText::value(bool yes) {
    before_element();
    text_ += yes ? "true" : "false";
}

void JsonText::whole(std::int64_t number) {
    before_element();
    fmt::format_to(std::back_inserter(text_), "{}", number);
}

void JsonText::null() {
    before_element();
    text_ += "null";
}

double in_unit(double value, double factor) {
    if (!std::isfinite(value)) return value;
    const std::string digits = fmt::format("{:.14g}", value * factor);
    double converted = 0.0;
    std::from_chars(digits.data(), digits.data() + digits.size(), converted);
    return converted;
}

std::optional<double> in_unit(const std::optional<double>& value, double factor) {
    return value ? std::optional(in_unit(*value, factor)) : std::nullopt;
}

} // namespace spanledger
