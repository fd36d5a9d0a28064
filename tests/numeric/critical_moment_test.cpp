// SPDX-License-Identifier: MIT
#include "numeric/beam_elements.hpp"
#include "numeric/simpson.hpp"

#include "spanledger/clauses/en1993_lateral_buckling.hpp"

#include <catch2/catch.hpp>

#include <functional>

using namespace spanledger;

// M_cr against the energy of lateral torsional buckling. With v'' = -M phi/(E I_z) eliminated, a joist on forks buckles
// at the smallest load factor at which, for some twist phi = sum b_n sin(n pi x/L),
//     integral of E I_w phi''^2 + G I_t phi'^2 - M^2 phi^2/(E I_z) - q z_g phi^2   (and - F z_g phi(L/2)^2)
// is no longer positive: found by bisection on the pivots of the quadratic form.

namespace {

constexpr double pi = 3.14159265358979323846;
constexpr std::size_t terms = 12;

struct Diagram {
    std::function<double(double)> moment; ///< over x/L, greatest value 1
    double q = 0.0;                       ///< uniform load in units of M/L2
    double F = 0.0;                       ///< force at mid-span in units of M/L
};

const Diagram constant_moment{[](double) { return 1.0; }};
const Diagram uniform_load{[](double s) { return 4.0 * s * (1.0 - s); }, 8.0, 0.0};
const Diagram force_at_midspan{[](double s) { return s < 0.5 ? 2.0 * s : 2.0 * (1.0 - s); }, 0.0, 4.0};

double wave(std::size_t n, double s) {
    return std::sin(static_cast<double>(n + 1) * pi * s);
}

/// Integral over x/L of M2 sin sin; the diagram may have a corner at mid-span.
numeric::Matrix coupling(const Diagram& diagram) {
    numeric::Matrix C(terms, numeric::Vector(terms, 0.0));
    for (std::size_t i = 0; i < terms; ++i) {
        for (std::size_t j = 0; j < terms; ++j) {
            const auto f = [&](double s) {
                const double m = diagram.moment(s);
                return m * m * wave(i, s) * wave(j, s);
            };
            C[i][j] = numeric::simpson(f, {0.0, 0.5}) + numeric::simpson(f, {0.5, 1.0});
        }
    }
    return C;
}

bool positive_definite(numeric::Matrix A) {
    for (std::size_t k = 0; k < A.size(); ++k) {
        if (A[k][k] <= 0.0) return false;
        for (std::size_t i = k + 1; i < A.size(); ++i) {
            const double factor = A[i][k] / A[k][k];
            for (std::size_t j = k; j < A.size(); ++j) A[i][j] -= factor * A[k][j];
        }
    }
    return true;
}

struct Joist {
    en1993::LateralStiffness<double> stiffness;
    double z_g;
    double L;
};

/// The quadratic form at greatest moment M.
numeric::Matrix energy(const Joist& joist, const Diagram& diagram, const numeric::Matrix& C, double M) {
    const auto& x = joist.stiffness;
    const double L = joist.L;
    numeric::Matrix A(terms, numeric::Vector(terms, 0.0));
    for (std::size_t i = 0; i < terms; ++i) {
        const double k = static_cast<double>(i + 1) * pi / L;
        A[i][i] = (x.E * x.I_w * std::pow(k, 4) + x.G * x.I_t * k * k - diagram.q * M / (L * L) * joist.z_g) * L / 2.0;
        for (std::size_t j = 0; j < terms; ++j) {
            A[i][j] -= M * M / (x.E * x.I_z) * C[i][j] * L;
            A[i][j] -= diagram.F * M / L * joist.z_g * wave(i, 0.5) * wave(j, 0.5);
        }
    }
    return A;
}

double numerical_critical_moment(const Joist& joist, const Diagram& diagram) {
    const numeric::Matrix C = coupling(diagram);
    double low = 0.0;
    double high = 1e11;
    for (int i = 0; i < 100; ++i) {
        const double M = (low + high) / 2.0;
        (positive_definite(energy(joist, diagram, C, M)) ? low : high) = M;
    }
    return low;
}

// IPE 330 and HEA 200, from memory.
const en1993::LateralStiffness<double> ipe_330{210000, 81000, 788.1e4, 28.15e4, 199100e6};
const en1993::LateralStiffness<double> hea_200{210000, 81000, 1336e4, 20.98e4, 108000e6};

struct Case {
    Joist joist;
    double h;
};

std::vector<Case> cases() {
    std::vector<Case> all;
    for (const double L : {1500.0, 3000.0, 5700.0, 9000.0}) {
        for (const double height : {-0.5, 0.0, 0.5}) {
            all.push_back({{ipe_330, height * 330.0, L}, 330.0});
            all.push_back({{hea_200, height * 190.0, L}, 190.0});
        }
    }
    return all;
}

double uniform(const Joist& joist) {
    return en1993::critical_moment<double>(joist.stiffness, {1.127, 0.454, joist.z_g}, joist.L);
}

double force(const Joist& joist) {
    return en1993::critical_moment<double>(joist.stiffness, {1.348, 0.630, joist.z_g}, joist.L);
}

} // namespace

TEST_CASE("M_cr under constant moment is the lowest eigenvalue") {
    for (const Case& c : cases()) {
        const double ours = en1993::critical_moment<double>(c.joist.stiffness, {1.0, 0.0, c.joist.z_g}, c.joist.L);
        CHECK(ours == Approx(numerical_critical_moment(c.joist, constant_moment)).epsilon(1e-9));
    }
}

TEST_CASE("M_cr under uniform load is the lowest eigenvalue within 0.8 %, on the safe side") {
    for (const Case& c : cases()) {
        const double numerical = numerical_critical_moment(c.joist, uniform_load);
        INFO("h " << c.h << ", L " << c.joist.L << ", z_g " << c.joist.z_g);
        CHECK(uniform(c.joist) == Approx(numerical).epsilon(0.008));
        CHECK(uniform(c.joist) <= numerical * 1.001);
    }
}

TEST_CASE("M_cr under a force at mid-span is the lowest eigenvalue within 1.2 %, and lower where the force is on top") {
    for (const Case& c : cases()) {
        const double numerical = numerical_critical_moment(c.joist, force_at_midspan);
        INFO("h " << c.h << ", L " << c.joist.L << ", z_g " << c.joist.z_g);
        if (c.joist.z_g == 0.0) CHECK(force(c.joist) == Approx(numerical).epsilon(0.012));
        if (c.joist.z_g > 0.0) CHECK(force(c.joist) < numerical);
        if (c.joist.z_g > 0.0) CHECK(force(c.joist) > 0.93 * numerical);
    }
}

TEST_CASE("the smaller M_cr of both forms is safe for any mix of uniform load and force, wherever they act") {
    for (const Case& c : cases()) {
        for (const double share : {0.0, 0.25, 0.5, 0.75, 1.0}) {
            const Diagram mixed{
                [=](double s) { return (1.0 - share) * uniform_load.moment(s) + share * force_at_midspan.moment(s); },
                (1.0 - share) * uniform_load.q, share * force_at_midspan.F};
            INFO("h " << c.h << ", L " << c.joist.L << ", z_g " << c.joist.z_g << ", share of the force " << share);
            CHECK(std::min(uniform(c.joist), force(c.joist)) <= numerical_critical_moment(c.joist, mixed) * 1.001);
        }
    }
}
