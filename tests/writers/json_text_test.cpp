// SPDX-License-Identifier: MIT
#include "spanledger/writers/json_text.hpp"

#include <catch2/catch.hpp>

#include <limits>

using namespace spanledger;

TEST_CASE("Keys stay in order; outer levels take lines", "[writers][json]") {
    JsonText json(1);
    json.open_object();
    json.field("z", 1.5);
    json.field("a", std::vector<std::string>{"x", "y"});
    json.key("empty");
    json.open_list();
    json.close_list();
    json.field("yes", true);
    json.field("none", std::optional<double>());
    json.close_object();
    CHECK(json.text() == "{\n \"z\":1.5,\n \"a\":[\"x\",\"y\"],\n \"empty\":[],\n \"yes\":true,\n \"none\":null\n}\n");
}

TEST_CASE("Numbers are as short as they can be, the same in every locale", "[writers][json]") {
    const auto written = [](double number) {
        JsonText json(0);
        json.value(number);
        return json.text();
    };
    CHECK(written(0.1) == "0.1");
    CHECK(written(4213.0) == "4213");
    CHECK(written(1.0 / 3.0) == "0.3333333333333333");
    CHECK(written(-0.0) == "0");
}

TEST_CASE("A number that is not finite is null, and told", "[writers][json]") {
    for (const double bad : {std::numeric_limits<double>::quiet_NaN(), std::numeric_limits<double>::infinity()}) {
        JsonText json(0);
        json.value(1.0);
        CHECK(json.finite());
        json.value(bad);
        CHECK_FALSE(json.finite());
        CHECK(json.text() == "1null");
    }
}

TEST_CASE("Text is escaped, and bytes that are no UTF-8 are replaced", "[writers][json]") {
    JsonText json(0);
    json.value("a\"b\\c\n\x01 ü");
    CHECK(json.text() == "\"a\\\"b\\\\c\\n\\u0001 ü\"");
    JsonText bad(0);
    bad.value("\xff");
    CHECK(bad.text() == "\"\xEF\xBF\xBD\"");
    JsonText quote(0);
    quote.value('"');
    CHECK(quote.text() == "\"\\\"\"");
}

TEST_CASE("Quantities lose the digits that a conversion leaves", "[writers][json]") {
    CHECK(in_unit(0.00025, 1000.0) == 0.25);
    CHECK(in_unit(0.0006, 1000.0) == 0.6);
    CHECK(in_unit(4810.0, 0.001) == 4.81);
    CHECK(in_unit(std::optional<double>(), 1000.0) == std::nullopt);
}
