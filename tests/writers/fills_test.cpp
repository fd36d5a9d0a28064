// SPDX-License-Identifier: MIT
#include "spanledger/limits.hpp"

#include <catch2/catch.hpp>

#include <cmath>
#include <set>

using namespace spanledger;

namespace {

double part(std::uint32_t colour, unsigned shift) {
    return static_cast<double>((colour >> shift) & 0xFFU) / 255.0;
}

/// Luma of ITU-R BT.601: how light a fill is when printed in grey.
double grey(std::uint32_t colour) {
    return 0.299 * part(colour, 16) + 0.587 * part(colour, 8) + 0.114 * part(colour, 0);
}

double linear(double s) {
    return s <= 0.04045 ? s / 12.92 : std::pow((s + 0.055) / 1.055, 2.4);
}

/// Contrast of black text on the colour by the web content accessibility guidelines, 1.4.3.
double black_contrast(std::uint32_t colour) {
    const double luminance =
        0.2126 * linear(part(colour, 16)) + 0.7152 * linear(part(colour, 8)) + 0.0722 * linear(part(colour, 0));
    return (luminance + 0.05) / 0.05;
}

} // namespace

TEST_CASE("Every fill is light, and black text stands out on it", "[writers][fills]") {
    for (const LimitDefinition& limit : limit_definitions) {
        INFO(limit.name);
        CHECK(grey(limit.fill) >= 0.7);
        CHECK(black_contrast(limit.fill) >= 7.0);
    }
}

TEST_CASE("No two limits share a letter or a fill", "[writers][fills]") {
    std::set<char> letters;
    std::set<std::uint32_t> fills;
    for (const LimitDefinition& limit : limit_definitions) {
        letters.insert(limit.letter);
        fills.insert(limit.fill);
    }
    CHECK(letters.size() == limit_count);
    CHECK(fills.size() == limit_count);
}
