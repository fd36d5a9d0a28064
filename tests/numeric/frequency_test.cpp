// SPDX-License-Identifier: MIT
#include "numeric/beam_elements.hpp"

#include "spanledger/clauses/beam_effects.hpp"
#include "spanledger/clauses/en1995_vibration.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

namespace {

/// First frequency in Hz of a beam in SI units.
double numerical_frequency(const numeric::Beam& beam) {
    const auto assembled = numeric::assemble_simply_supported(beam, 24);
    return std::sqrt(numeric::lowest_eigenvalue(assembled.K, assembled.M)) / (2.0 * 3.14159265358979323846);
}

} // namespace

TEST_CASE("the first frequency of a beam is its lowest eigenvalue") {
    // 3.1e5 N m2, 24 kg/m, 4.2 m; the clause takes N mm2, kg/mm, mm.
    const double expected = numerical_frequency({3.1e5, 24.0, 4.2});
    CHECK(beam::simply_supported::first_frequency(3.1e11, 0.024, 4200.0) == Approx(expected).epsilon(1e-6));
}

TEST_CASE("the first frequency of a floor strip is that of a metre of it") {
    // 1.79e6 N m2/m, 120 kg/m2, 4.5 m; the clause takes N mm2/m, kg/mm2, mm.
    const double expected = numerical_frequency({1.79e6, 120.0, 4.5});
    CHECK(en1995::first_frequency<double>({1.79e12, 3e9, 120e-6}, 4500.0) == Approx(expected).epsilon(1e-6));
}
