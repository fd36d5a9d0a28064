// SPDX-License-Identifier: MIT
#include "published/published.hpp"

#include "spanledger/clauses/en1990_combinations.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

namespace published {

Example combination_factors() {
    Example e;
    e.title = "Combinations of EN 1990";
    e.source = "EN 1990:2002+A1, Table A1.2(B), and annexes: 1.35 and 1.5 seen in Steel Buildings in Europe, Part 4, "
               "page 68; Dutch 1.2 in Structural Design Essentials (TU Delft open textbook); Finnish 1.15 in LVL "
               "Handbook Europe 2025, page 181";
    e.inputs = "gamma_G 1.35, gamma_Q 1.5; xi 0.85 recommended (from memory), 0.925 United Kingdom (from memory), "
               "0.89 Netherlands (from memory)";
    const auto xi_G = [](double xi) { return en1990::reduced_permanent_factor(xi, 1.35); };
    e.rows = {
        {Mark::seen, "(6.10) gamma_G G, G = 1", "1.35", en1990::design_value<double>({1.35, 1.5}, 1.0, 0.0), "-"},
        {Mark::seen, "(6.10) gamma_Q Q, Q = 1", "1.5", en1990::design_value<double>({1.35, 1.5}, 0.0, 1.0), "-"},
        {Mark::common_practice, "(6.10) 1.35 G + 1.5 Q, G = 2, Q = 4", "8.70",
         en1990::design_value<double>({1.35, 1.5}, 2.0, 4.0), "kN/m2"},
        {Mark::from_memory, "(6.10b) xi gamma_G, recommended 0.85 x 1.35", "1.1475", xi_G(0.85), "-"},
        {Mark::seen, "(6.10b) xi gamma_G, Finland", "1.15", xi_G(0.85), "-"},
        {Mark::from_memory, "(6.10b) xi gamma_G, United Kingdom 0.925 x 1.35", "1.24875", xi_G(0.925), "-"},
        {Mark::seen, "(6.10b) xi gamma_G, Netherlands", "1.2", xi_G(0.89), "-"},
        {Mark::from_memory, "(6.10a) gamma_Q psi_0, category A 1.5 x 0.7", "1.05",
         en1990::combination_variable_factor(1.5, 0.7), "-"},
    };
    return e;
}

} // namespace published

TEST_CASE("EN 1990: factors of the fundamental combinations") {
    published::check(published::combination_factors());
}
