// SPDX-License-Identifier: MIT
#include "numeric/beam_elements.hpp"

#include "spanledger/clauses/en1995_bending.hpp"
#include "spanledger/clauses/rectangle.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

// (6.31) and (6.32) against numerical solutions for a fork-supported rectangle under constant moment: GI_tor phi'' +
// M2/(EI_z) phi = 0, and St Venant's series for the torsion constant.

namespace {

constexpr double pi = 3.14159265358979323846;

/// Lowest eigenvalue of -phi'' = lambda phi, phi(0) = phi(L) = 0, by linear elements with consistent mass.
double lowest_twist_eigenvalue(double L) {
    constexpr std::size_t inner = 199;
    const double l = L / static_cast<double>(inner + 1);
    numeric::Matrix K(inner, numeric::Vector(inner, 0.0));
    numeric::Matrix M = K;
    for (std::size_t i = 0; i < inner; ++i) {
        K[i][i] = 2.0 / l;
        M[i][i] = 4.0 * l / 6.0;
        if (i + 1 == inner) continue;
        K[i][i + 1] = K[i + 1][i] = -1.0 / l;
        M[i][i + 1] = M[i + 1][i] = l / 6.0;
    }
    return numeric::lowest_eigenvalue(K, M);
}

/// Itor of a rectangle by St Venant's series.
double torsion_by_series(double b, double h) {
    double sum = 0.0;
    for (int n = 1; n < 200; n += 2) sum += std::tanh(n * pi * h / (2.0 * b)) / std::pow(n, 5);
    return h * b * b * b / 3.0 * (1.0 - 192.0 / std::pow(pi, 5) * b / h * sum);
}

} // namespace

TEST_CASE("the torsion constant is St Venant's within 0.6 % for b up to h") {
    for (double b = 20.0; b <= 200.0; b += 20.0) {
        INFO("b " << b);
        CHECK(rectangle::torsion_constant(b, 200.0) == Approx(torsion_by_series(b, 200.0)).epsilon(0.006));
    }
}

TEST_CASE("(6.31) is the lowest eigenvalue of the lateral torsional equation") {
    const double b = 45.0;
    const double h = 300.0;
    const double E = 11600.0;
    const double G = 400.0;
    const double L = 5000.0;
    const double I_z = h * b * b * b / 12.0;
    const double I_tor = torsion_by_series(b, h);
    const double M_crit = std::sqrt(lowest_twist_eigenvalue(L) * E * I_z * G * I_tor);
    const double W = b * h * h / 6.0;
    const double ours = en1995::critical_stress<double>(
        {b, h, E, G},
        {rectangle::weak_second_moment(b, h), rectangle::torsion_constant(b, h), rectangle::section_modulus(b, h)}, L);
    CHECK(ours == Approx(M_crit / W).epsilon(0.001));
}

TEST_CASE("(6.32) is (6.31) for a thin softwood rectangle with G = E/16, within two percent") {
    // Softwood of EN 338: G is a sixteenth of E. (6.32) leaves out the slight loss of a rectangle that is not thin.
    for (const double ratio : {0.02, 0.05}) {
        const double h = 400.0;
        const double b = ratio * h;
        const double simple = en1995::critical_stress_softwood<double>({b, h, 7400.0, 7400.0 / 16.0}, 4000.0);
        const double exact = en1995::critical_stress<double>(
            {b, h, 7400.0, 7400.0 / 16.0},
            {rectangle::weak_second_moment(b, h), torsion_by_series(b, h), rectangle::section_modulus(b, h)}, 4000.0);
        CHECK(simple == Approx(exact).epsilon(0.02));
    }
}
