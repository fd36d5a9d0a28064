// SPDX-License-Identifier: MIT
#include "spanledger/input/csv.hpp"
#include "spanledger/input/quantity.hpp"
#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <utility>

namespace spanledger {

namespace {

std::string with_unit(double value, std::string_view unit) {
    return unit.empty() ? fmt::format("{}", value) : fmt::format("{} {}", value, unit);
}

std::string lower_case(std::string_view text) {
    std::string lower(text);
    std::transform(lower.begin(), lower.end(), lower.begin(),
                   [](char c) { return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c; });
    return lower;
}

std::string bad_number_hint(std::string_view text, char separator) {
    if (text.find(',') != std::string_view::npos && separator != ';') {
        return "write decimals with a point; a decimal comma is read only where columns are separated by semicolons";
    }
    return "write a finite decimal number without a unit, such as 4.2";
}

/// With semicolons between columns a single comma in a number is its decimal mark.
std::string with_decimal_point(std::string_view text, char separator) {
    std::string number(text);
    const bool one_comma = std::count(number.begin(), number.end(), ',') == 1;
    if (separator == ';' && one_comma && number.find('.') == std::string::npos) {
        std::replace(number.begin(), number.end(), ',', '.');
    }
    return number;
}

} // namespace

const CsvField* CsvRecord::field(std::string_view column) const noexcept {
    const auto index = table_->index_of(column);
    return index ? &row_->fields[*index] : nullptr;
}

const std::string& CsvRecord::text(std::string_view column) const {
    static const std::string none;
    const CsvField* found = field(column);
    return found == nullptr ? none : found->text;
}

const std::string& CsvRecord::required_text(std::string_view column) {
    const std::string& found = text(column);
    if (found.empty()) {
        error(column, "empty-field", fmt::format("'{}' is empty", column), "fill it in");
    }
    return found;
}

double CsvRecord::number(std::string_view column, const NumberRange& range) {
    if (required_text(column).empty()) {
        return 0.0;
    }
    return optional_number(column, range).value_or(0.0);
}

std::optional<double> CsvRecord::optional_number(std::string_view column, const NumberRange& range) {
    const std::string& written = text(column);
    if (written.empty()) {
        return std::nullopt;
    }
    const std::optional<double> value = read_number(with_decimal_point(written, table_->separator()));
    if (!value) {
        error(column, "bad-number", fmt::format("'{}': '{}' is not a number", column, written),
              bad_number_hint(written, table_->separator()));
        return std::nullopt;
    }
    check_range(column, *value, range);
    return value;
}

void CsvRecord::check_range(std::string_view column, double value, const NumberRange& range) {
    const auto message = [&](std::string_view word, double least, double greatest) {
        return fmt::format("'{}': {} is outside the {} range {} to {}", column, with_unit(value, range.unit), word,
                           least, with_unit(greatest, range.unit));
    };
    if (value < range.least || value > range.greatest) {
        error(column, "out-of-range", message("possible", range.least, range.greatest),
              "check the number and its unit");
        return;
    }
    const double least = range.usual_least.value_or(range.least);
    const double greatest = range.usual_greatest.value_or(range.greatest);
    if (value < least || value > greatest) {
        warning(column, "unusual", message("usual", least, greatest), "check the number and its unit");
    }
}

bool CsvRecord::yes_or_no(std::string_view column) {
    static const std::array<std::string, 2> words{"no", "yes"};
    return one_of(column, words) == 1;
}

std::size_t CsvRecord::one_of(std::string_view column, std::span<const std::string> words) {
    const std::string written = lower_case(required_text(column));
    const auto found =
        std::find_if(words.begin(), words.end(), [&](const std::string& word) { return lower_case(word) == written; });
    if (found != words.end()) {
        return static_cast<std::size_t>(found - words.begin());
    }
    if (!written.empty()) {
        error(column, "bad-word", fmt::format("'{}': '{}' is not one of: {}", column, text(column), joined(words)),
              did_you_mean(written, words));
    }
    return 0;
}

void CsvRecord::error(std::string_view column, std::string code, std::string message, std::string hint) {
    good_ = false;
    diagnostics_->error(std::move(code), place(column), std::move(message), std::move(hint));
}

void CsvRecord::warning(std::string_view column, std::string code, std::string message, std::string hint) {
    diagnostics_->warning(std::move(code), place(column), std::move(message), std::move(hint));
}

Place CsvRecord::place(std::string_view column) const {
    const CsvField* found = field(column);
    return table_->place_of(found == nullptr ? row_->fields.front() : *found);
}

bool spoiled_by_spreadsheet(std::string_view name) {
    static constexpr std::array<std::string_view, 12> months{"jan", "feb", "mar", "apr", "may", "jun",
                                                             "jul", "aug", "sep", "oct", "nov", "dec"};
    const auto is_number = [](std::string_view text) {
        return !text.empty() && text.find_first_not_of("0123456789") == std::string_view::npos;
    };
    const auto is_month = [&](std::string_view text) {
        const std::string lower = lower_case(text);
        return std::find(months.begin(), months.end(), lower) != months.end();
    };
    const std::size_t dash = name.find('-');
    if (dash != std::string_view::npos) {
        const std::string_view before = name.substr(0, dash);
        const std::string_view after = name.substr(dash + 1, name.find('-', dash + 1) - dash - 1);
        if ((is_number(before) && is_month(after)) || (is_month(before) && is_number(after))) {
            return true;
        }
    }
    const std::size_t exponent = name.find_first_of("eE");
    return exponent != std::string_view::npos && exponent > 0 && read_number(name).has_value() &&
           name.find_first_of("+-", exponent) == exponent + 1;
}

} // namespace spanledger
