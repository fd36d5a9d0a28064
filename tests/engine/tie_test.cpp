// SPDX-License-Identifier: MIT
#include "spanledger/engine/ranking.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

// Within 1e-9 relative the earlier limit governs, in the order bending, shear, bending with shear, bearing, lateral
// buckling, w_Q, w_inst, w_net,fin, frequency, unit-load deflection, velocity response, stock length.

namespace {

std::array<std::optional<double>, limit_count> spans(std::initializer_list<std::pair<Limit, double>> given) {
    std::array<std::optional<double>, limit_count> left;
    for (const auto& [limit, span] : given) left[index_of(limit)] = span;
    return left;
}

} // namespace

TEST_CASE("of equal spans the earlier limit governs and the other is next") {
    const Ranking r = rank_limits(spans({{Limit::final_deflection, 4000.0}, {Limit::bending, 4000.0}}));
    CHECK(r.governing == Limit::bending);
    CHECK(r.next == Limit::final_deflection);
}

TEST_CASE("spans within 1e-9 relative are equal, further apart the smaller one governs") {
    const Ranking near = rank_limits(spans({{Limit::shear, 4000.0}, {Limit::stock_length, 4000.0 - 3.9e-6}}));
    CHECK(near.governing == Limit::shear);
    const Ranking apart = rank_limits(spans({{Limit::shear, 4000.0}, {Limit::stock_length, 4000.0 - 4.1e-6}}));
    CHECK(apart.governing == Limit::stock_length);
    CHECK(apart.next == Limit::shear);
}

TEST_CASE("every limit in the order of the tie") {
    const std::array order{Limit::bending,
                           Limit::shear,
                           Limit::bending_with_shear,
                           Limit::bearing,
                           Limit::lateral_buckling,
                           Limit::variable_deflection,
                           Limit::instantaneous_deflection,
                           Limit::final_deflection,
                           Limit::frequency,
                           Limit::unit_load_deflection,
                           Limit::velocity_response,
                           Limit::stock_length};
    REQUIRE(order.size() == limit_count);
    for (std::size_t i = 0; i + 1 < order.size(); ++i) {
        const Ranking r = rank_limits(spans({{order[i], 3000.0}, {order[i + 1], 3000.0}}));
        CHECK(r.governing == order[i]);
        CHECK(r.next == order[i + 1]);
    }
}

TEST_CASE("the second smallest span is next wherever it stands") {
    const Ranking r = rank_limits(spans({{Limit::bending, 5000.0},
                                         {Limit::shear, 9000.0},
                                         {Limit::final_deflection, 4000.0},
                                         {Limit::frequency, 4500.0}}));
    CHECK(r.governing == Limit::final_deflection);
    CHECK(r.next == Limit::frequency);
    CHECK(!rank_limits(spans({})).governing);
}
