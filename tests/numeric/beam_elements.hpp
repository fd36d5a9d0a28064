// SPDX-License-Identifier: MIT
#pragma once

#include <cmath>
#include <cstddef>
#include <numeric>
#include <vector>

// Finite elements of an Euler beam (cubic shape functions, consistent mass) and the lowest eigenvalue by inverse
// iteration: a second way to a natural frequency.

namespace numeric {

using Vector = std::vector<double>;
using Matrix = std::vector<Vector>;

inline double dot(const Vector& a, const Vector& b) {
    return std::inner_product(a.begin(), a.end(), b.begin(), 0.0);
}

inline Vector product(const Matrix& A, const Vector& x) {
    Vector y;
    y.reserve(A.size());
    for (const Vector& row : A) y.push_back(dot(row, x));
    return y;
}

/// Solves A x = b by elimination; A is symmetric and positive definite.
inline Vector solve(Matrix A, Vector b) {
    const std::size_t n = b.size();
    for (std::size_t k = 0; k < n; ++k) {
        for (std::size_t i = k + 1; i < n; ++i) {
            const double factor = A[i][k] / A[k][k];
            if (factor == 0.0) continue;
            for (std::size_t j = k; j < n; ++j) A[i][j] -= factor * A[k][j];
            b[i] -= factor * b[k];
        }
    }
    for (std::size_t i = n; i-- > 0;) {
        for (std::size_t j = i + 1; j < n; ++j) b[i] -= A[i][j] * b[j];
        b[i] /= A[i][i];
    }
    return b;
}

/// Lowest eigenvalue of K x = lambda M x.
inline double lowest_eigenvalue(const Matrix& K, const Matrix& M) {
    Vector x(K.size(), 1.0);
    double lambda = 0.0;
    for (int i = 0; i < 60; ++i) {
        x = solve(K, product(M, x));
        const double scale = std::sqrt(dot(x, product(M, x)));
        for (double& value : x) value /= scale;
        lambda = dot(x, product(K, x));
    }
    return lambda;
}

struct Beam {
    double EI;
    double m; ///< mass per length
    double L;
};

/// Stiffness and mass of a simply supported beam of n elements: rotation 0, (deflection, rotation) of each inner node,
/// rotation n.
struct Assembled {
    Matrix K, M;
};
inline Assembled assemble_simply_supported(const Beam& beam, std::size_t n) {
    const double l = beam.L / static_cast<double>(n);
    const double k = beam.EI / (l * l * l);
    const double m = beam.m * l / 420.0;
    const double K_e[4][4] = {{12 * k, 6 * l * k, -12 * k, 6 * l * k},
                              {6 * l * k, 4 * l * l * k, -6 * l * k, 2 * l * l * k},
                              {-12 * k, -6 * l * k, 12 * k, -6 * l * k},
                              {6 * l * k, 2 * l * l * k, -6 * l * k, 4 * l * l * k}};
    const double M_e[4][4] = {{156 * m, 22 * l * m, 54 * m, -13 * l * m},
                              {22 * l * m, 4 * l * l * m, 13 * l * m, -3 * l * l * m},
                              {54 * m, 13 * l * m, 156 * m, -22 * l * m},
                              {-13 * l * m, -3 * l * l * m, -22 * l * m, 4 * l * l * m}};
    const std::size_t all = 2 * (n + 1);
    const auto kept = [&](std::size_t dof) { return dof != 0 && dof != all - 2; };
    const auto place = [&](std::size_t dof) { return dof > all - 2 ? dof - 2 : dof - 1; };
    Assembled a{Matrix(all - 2, Vector(all - 2, 0.0)), Matrix(all - 2, Vector(all - 2, 0.0))};
    for (std::size_t e = 0; e < n; ++e) {
        for (std::size_t i = 0; i < 4; ++i) {
            for (std::size_t j = 0; j < 4; ++j) {
                if (!kept(2 * e + i) || !kept(2 * e + j)) continue;
                a.K[place(2 * e + i)][place(2 * e + j)] += K_e[i][j];
                a.M[place(2 * e + i)][place(2 * e + j)] += M_e[i][j];
            }
        }
    }
    return a;
}

} // namespace numeric
