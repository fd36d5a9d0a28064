// SPDX-License-Identifier: MIT
#include "spanledger/input/suggestion.hpp"

#include <catch2/catch.hpp>

#include <vector>

using namespace spanledger;

TEST_CASE("The nearest name is found through slips of the finger") {
    const std::vector<std::string> known{
        "C16", "C22", "C24", "GL24h", "spacings_mm", "UK 47", "instantaneous_deflection"};
    CHECK(nearest_name("C42", known) == "C24");
    CHECK(nearest_name("c24", known) == "C24");
    CHECK(nearest_name("GL24", known) == "GL24h");
    CHECK(nearest_name("spacing_mm", known) == "spacings_mm");
    CHECK(nearest_name("spcaings_mm", known) == "spacings_mm");
    CHECK(nearest_name("UK47", known) == "UK 47");
    CHECK(nearest_name("instantaneous", known) == "instantaneous_deflection");
}

TEST_CASE("Nothing is suggested where nothing is near") {
    const std::vector<std::string> known{"C16", "C24", "bending"};
    CHECK(nearest_name("", known).empty());
    CHECK(nearest_name("S355J2", known).empty());
    CHECK(nearest_name("xyz", known).empty());
    CHECK(nearest_name(std::string(10000, 'C'), known).empty());
    CHECK(nearest_name("C24", {}).empty());
    CHECK(did_you_mean("xyz", known) == "known: C16, C24, bending");
}
