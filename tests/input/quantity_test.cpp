// SPDX-License-Identifier: MIT
#include "spanledger/input/quantity.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

TEST_CASE("Only a whole finite decimal token is a number") {
    const auto text = GENERATE("", " ", "nan", "-nan", "inf", "-inf", "infinity", "1e400", "-1e400", "1e-400", "0x10",
                               "0x1p3", "4.2 ", " 4.2", "4.2m", "4,2", "1,000", "1 000", "1_000", "+4.2", "--1", "-",
                               ".", "e3", "1e", "1e+", "4.2.1", "½", "٣", "1d3");
    INFO('\'' << text << '\'');
    CHECK_FALSE(read_number(text).has_value());
}

TEST_CASE("Numbers are read exactly") {
    CHECK(read_number("4.2") == 4.2);
    CHECK(read_number("-0.5") == -0.5);
    CHECK(read_number("1e3") == 1000.0);
    CHECK(read_number("1E-3") == 0.001);
    CHECK(read_number(".5") == 0.5);
    CHECK(read_number("5.") == 5.0);
    CHECK(std::signbit(read_number("-0").value()) == false);
}

TEST_CASE("A quantity is converted to the internal unit and rounded once") {
    struct Row {
        const char* text;
        Dimension dimension;
        const char* bare_unit;
        double value;
    };
    // 1.005 * 1000 is 1004.9999999999999 in double arithmetic; the decimal text is 1005.
    const auto row = GENERATE(
        Row{"1.005 m", Dimension::length, "mm", 1005.0}, Row{"4200", Dimension::length, "mm", 4200.0},
        Row{"4.2", Dimension::length, "m", 4200.0}, Row{"42cm", Dimension::length, "mm", 420.0},
        Row{" 400 mm ", Dimension::length, "mm", 400.0}, Row{"1.5 kN/m2", Dimension::area_load, "kN/m2", 0.0015},
        Row{"1.5 kN/m²", Dimension::area_load, "kN/m2", 0.0015},
        Row{"1.5 kN / m^2", Dimension::area_load, "kN/m2", 0.0015},
        Row{"1500 N/m2", Dimension::area_load, "kN/m2", 0.0015}, Row{"0.57", Dimension::area_load, "kN/m2", 0.00057},
        Row{"3 kPa", Dimension::area_load, "kN/m2", 0.003}, Row{"2 kN", Dimension::force, "kN", 2000.0},
        Row{"2.5", Dimension::line_load, "kN/m", 2.5}, Row{"2.5e0 N/mm", Dimension::line_load, "kN/m", 2.5},
        Row{"11 GPa", Dimension::stress, "MPa", 11000.0}, Row{"420 kg/m³", Dimension::density, "kg/m3", 420.0},
        Row{"8 Hz", Dimension::frequency, "Hz", 8.0},
        Row{"0.25 kNm2/m", Dimension::plate_stiffness, "Nmm2/m", 250000000.0}, Row{"0.1", Dimension::number, "", 0.1},
        Row{"-3 mm", Dimension::length, "mm", -3.0});
    INFO(row.text);
    const QuantityResult result = read_quantity(row.text, row.dimension, row.bare_unit);
    REQUIRE(result.value.has_value());
    CHECK(*result.value == row.value);
}

TEST_CASE("A wrong dimension is refused naming both") {
    const QuantityResult result = read_quantity("4.2 kN", Dimension::length, "mm");
    REQUIRE_FALSE(result.value.has_value());
    CHECK(result.error.message == "'4.2 kN' is a force, but a length is wanted");
    CHECK(result.error.hint.find("mm, cm, m") != std::string::npos);
}

TEST_CASE("Other wrong quantities are refused with a hint") {
    const auto text =
        GENERATE("4,2 m", "nan m", "m", "", "4.2 mmm", "4.2 M", "4.2 ft", "1e400 m", "1e308 m", "0x10 mm", "4.2 m m3");
    INFO(text);
    const QuantityResult result = read_quantity(text, Dimension::length, "mm");
    CHECK_FALSE(result.value.has_value());
    CHECK_FALSE(result.error.message.empty());
    CHECK_FALSE(result.error.hint.empty());
}

TEST_CASE("A unit where none belongs is refused") {
    CHECK_FALSE(read_quantity("1.0 mm", Dimension::number, "").value.has_value());
    CHECK_FALSE(read_quantity("5 %", Dimension::number, "").value.has_value());
}

TEST_CASE("A mistyped unit gets a suggestion") {
    CHECK(read_quantity("4.2 KN/m2", Dimension::area_load, "kN/m2").error.hint.find("did you mean 'kN/m2'?") == 0);
}

TEST_CASE("Unit factors are powers of ten, only of their own dimension") {
    CHECK(unit_factor("m", Dimension::length) == 1000.0);
    CHECK(unit_factor("kN/m2", Dimension::area_load) == 0.001);
    CHECK_FALSE(unit_factor("m", Dimension::force).has_value());
    CHECK_FALSE(unit_factor("furlong", Dimension::length).has_value());
}
