// SPDX-License-Identifier: MIT
#include "spanledger/input/quantity.hpp"

#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <charconv>
#include <cmath>
#include <vector>

namespace spanledger {

namespace {

/// A unit is a power of ten times the internal unit of its dimension.
struct Unit {
    std::string_view name;
    Dimension dimension;
    int power;
};

constexpr std::array units{
    Unit{"mm", Dimension::length, 0},
    Unit{"cm", Dimension::length, 1},
    Unit{"m", Dimension::length, 3},
    Unit{"kN/m2", Dimension::area_load, -3},
    Unit{"N/m2", Dimension::area_load, -6},
    Unit{"kPa", Dimension::area_load, -3},
    Unit{"Pa", Dimension::area_load, -6},
    Unit{"kN/m", Dimension::line_load, 0},
    Unit{"N/mm", Dimension::line_load, 0},
    Unit{"N/m", Dimension::line_load, -3},
    Unit{"kN", Dimension::force, 3},
    Unit{"N", Dimension::force, 0},
    Unit{"MPa", Dimension::stress, 0},
    Unit{"N/mm2", Dimension::stress, 0},
    Unit{"kN/mm2", Dimension::stress, 3},
    Unit{"GPa", Dimension::stress, 3},
    Unit{"kg/m3", Dimension::density, 0},
    Unit{"Hz", Dimension::frequency, 0},
    Unit{"Nmm2/m", Dimension::plate_stiffness, 0},
    Unit{"Nm2/m", Dimension::plate_stiffness, 6},
    Unit{"kNm2/m", Dimension::plate_stiffness, 9},
};

/// The same unit however its spaces, powers and products are written: "kN m²/m" is "kNm2/m".
std::string plain_unit(std::string_view text) {
    static constexpr std::array<std::pair<std::string_view, std::string_view>, 6> spellings{
        {{" ", ""}, {"^", ""}, {"*", ""}, {"²", "2"}, {"³", "3"}, {"·", ""}}};
    std::string plain(text);
    for (const auto& [from, to] : spellings) {
        for (std::size_t at = plain.find(from); at != std::string::npos; at = plain.find(from, at)) {
            plain.replace(at, from.size(), to);
        }
    }
    return plain;
}

const Unit* find_unit(std::string_view name, Dimension dimension) {
    const std::string plain = plain_unit(name);
    const auto of_dimension = std::find_if(units.begin(), units.end(), [&](const Unit& unit) {
        return unit.name == plain && unit.dimension == dimension;
    });
    return of_dimension == units.end() ? nullptr : &*of_dimension;
}

const Unit* find_unit(std::string_view name) {
    const std::string plain = plain_unit(name);
    const auto found = std::find_if(units.begin(), units.end(), [&](const Unit& unit) { return unit.name == plain; });
    return found == units.end() ? nullptr : &*found;
}

std::vector<std::string> unit_names(Dimension dimension) {
    std::vector<std::string> names;
    for (const Unit& unit : units) {
        if (unit.dimension == dimension) {
            names.emplace_back(unit.name);
        }
    }
    return names;
}

std::string_view trimmed(std::string_view text) {
    const std::size_t first = text.find_first_not_of(" \t");
    if (first == std::string_view::npos) {
        return {};
    }
    return text.substr(first, text.find_last_not_of(" \t") - first + 1);
}

bool starts_number(std::string_view text) {
    const std::size_t sign = !text.empty() && text[0] == '-' ? 1 : 0;
    const std::size_t point = text.size() > sign && text[sign] == '.' ? 1 : 0;
    return text.size() > sign + point && text[sign + point] >= '0' && text[sign + point] <= '9';
}

/// Where a finite decimal number at the start of `text` ends; 0 where there is none.
std::size_t number_length(std::string_view text) {
    double value = 0.0;
    if (!starts_number(text)) {
        return 0;
    }
    const auto [end, error] = std::from_chars(text.data(), text.data() + text.size(), value);
    return error == std::errc() && std::isfinite(value) ? static_cast<std::size_t>(end - text.data()) : 0;
}

/// The number times a power of ten, rounded once: the exponent of the decimal text is changed, not the value.
std::optional<double> scaled(std::string_view number, int power) {
    const std::size_t mark = number.find_first_of("eE");
    int exponent = 0;
    if (mark != std::string_view::npos) {
        std::string_view digits = number.substr(mark + 1);
        digits.remove_prefix(digits[0] == '+' ? 1 : 0);
        if (std::from_chars(digits.data(), digits.data() + digits.size(), exponent).ec != std::errc() ||
            std::abs(exponent) > 10000) {
            return std::nullopt;
        }
    }
    return read_number(fmt::format("{}e{}", number.substr(0, mark), exponent + power));
}

QuantityError wrong_unit(std::string_view text, std::string_view unit, Dimension dimension) {
    const std::vector<std::string> names = unit_names(dimension);
    if (names.empty()) {
        return {fmt::format("'{}': a {} is wanted, without a unit", text, dimension_name(dimension)),
                "leave out what follows the number"};
    }
    const std::string accepted = fmt::format("units of a {}: {}", dimension_name(dimension), joined(names));
    if (const Unit* other = find_unit(unit)) {
        return {fmt::format("'{}' is a {}, but a {} is wanted", text, dimension_name(other->dimension),
                            dimension_name(dimension)),
                accepted};
    }
    if (unit.starts_with(',')) {
        return {fmt::format("'{}' is not a number with a unit", text), "write decimals with a point, as in 4.2"};
    }
    const std::string nearest = nearest_name(plain_unit(unit), names);
    return {fmt::format("'{}': unit '{}' is not known", text, unit),
            nearest.empty() ? accepted : fmt::format("did you mean '{}'? {}", nearest, accepted)};
}

} // namespace

std::string_view dimension_name(Dimension dimension) noexcept {
    switch (dimension) {
    case Dimension::number: return "number";
    case Dimension::length: return "length";
    case Dimension::area_load: return "load on an area";
    case Dimension::line_load: return "load on a line";
    case Dimension::force: return "force";
    case Dimension::stress: return "stress";
    case Dimension::density: return "density";
    case Dimension::frequency: return "frequency";
    case Dimension::plate_stiffness: return "stiffness of a width";
    }
    return "";
}

std::optional<double> read_number(std::string_view text) {
    double value = 0.0;
    const std::size_t length = number_length(text);
    if (length == 0 || length != text.size()) {
        return std::nullopt;
    }
    std::from_chars(text.data(), text.data() + text.size(), value);
    return value + 0.0; // -0 becomes 0
}

QuantityResult read_quantity(std::string_view text, Dimension dimension, std::string_view bare_unit) {
    const std::string_view token = trimmed(text);
    const std::size_t length = number_length(token);
    if (length == 0) {
        return {std::nullopt, {fmt::format("'{}' is not a finite number", text), "write a number such as 4.2"}};
    }
    const std::string_view number = token.substr(0, length);
    const std::string_view written = trimmed(token.substr(length));
    const std::string_view unit_name = written.empty() ? bare_unit : written;
    int power = 0;
    if (dimension != Dimension::number || !written.empty()) {
        const Unit* unit = find_unit(unit_name, dimension);
        if (unit == nullptr) {
            return {std::nullopt, wrong_unit(token, unit_name, dimension)};
        }
        power = unit->power;
    }
    const std::optional<double> value = scaled(number, power);
    if (!value) {
        return {std::nullopt, {fmt::format("'{}' is too large or too small", text), "check the number and its unit"}};
    }
    return {value, {}};
}

std::optional<double> unit_factor(std::string_view unit, Dimension dimension) {
    const Unit* found = find_unit(unit, dimension);
    return found == nullptr ? std::nullopt : scaled("1", found->power);
}

} // namespace spanledger
