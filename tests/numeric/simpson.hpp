// SPDX-License-Identifier: MIT
#pragma once

#include <functional>

namespace numeric {

/// Integral of f from a to b by Simpson's rule; f is smooth between a and b.
struct Interval {
    double a;
    double b;
};
inline double simpson(const std::function<double(double)>& f, Interval over, int pairs = 400) {
    const double h = (over.b - over.a) / (2.0 * pairs);
    double sum = f(over.a) + f(over.b);
    for (int i = 1; i < 2 * pairs; ++i) sum += f(over.a + i * h) * (i % 2 == 1 ? 4.0 : 2.0);
    return sum * h / 3.0;
}

} // namespace numeric
