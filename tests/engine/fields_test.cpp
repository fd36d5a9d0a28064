// SPDX-License-Identifier: MIT
#include "spanledger/engine/timber_inputs.hpp"

#include <catch2/catch.hpp>

#include <set>
#include <string>

using namespace spanledger;

namespace {

/// Addresses, symbols and words of what a field list visits.
struct Visited {
    std::set<const double*> fields;
    std::set<std::string> symbols;
    std::size_t count = 0;
    bool worded = true;

    void operator()(const double& field, const char* symbol, const char* unit, const char* meaning) {
        ++count;
        fields.insert(&field);
        symbols.insert(symbol);
        worded = worded && *symbol != '\0' && *unit != '\0' && *meaning != '\0';
    }
};

} // namespace

TEST_CASE("the list of a timber joist's numbers names every one of them once") {
    TimberInputs<double> x{};
    Visited visited;
    timber_fields(x, visited);
    CHECK(visited.count * sizeof(double) == sizeof(TimberInputs<double>));
    CHECK(visited.fields.size() == visited.count);
    CHECK(visited.symbols.size() == visited.count);
    CHECK(visited.worded);
}

TEST_CASE("the list of the actions' numbers names every one of them once") {
    ActionInputs<double> x{};
    Visited visited;
    action_fields(x, visited);
    CHECK(visited.count * sizeof(double) == sizeof(ActionInputs<double>));
    CHECK(visited.fields.size() == visited.count);
    CHECK(visited.symbols.size() == visited.count);
    CHECK(visited.worded);
}
