// SPDX-License-Identifier: MIT
#pragma once

#include <cstddef>
#include <functional>
#include <string>
#include <vector>

// Ratios of times, taken so that a drift of the machine falls on both sides alike.

namespace spanledger::benchmark {

/// Time of one run, s.
struct Sample {
    double wall = 0.0;
    double processor = 0.0; ///< of all threads of the process
};

/// Times a piece of work in this process.
[[nodiscard]] Sample timed(const std::function<void()>& work);

struct Quartiles {
    double lower = 0.0;
    double median = 0.0;
    double upper = 0.0;
};

/// By linear interpolation; `values` is not empty.
[[nodiscard]] Quartiles quartiles(std::vector<double> values);

struct Ratios {
    Quartiles wall;
    Quartiles processor;
};

/// Time of b over time of a: a and b once each to warm up, then `quads` times in the order a b b a.
[[nodiscard]] Ratios measure(std::size_t quads, const std::function<Sample()>& a, const std::function<Sample()>& b);

/// One line: what, median and quartiles of the wall time, median of the processor time.
void print(const std::string& what, const Ratios& ratios);

/// Whether a control (the same work on both sides) is close enough to 1 for the other ratios to mean anything.
[[nodiscard]] bool control_holds(const Ratios& control);

} // namespace spanledger::benchmark
