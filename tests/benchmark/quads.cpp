// SPDX-License-Identifier: MIT
#include "quads.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <chrono>
#include <cmath>
#include <ctime>

namespace spanledger::benchmark {
namespace {

double processor_seconds() {
    timespec now{};
    clock_gettime(CLOCK_PROCESS_CPUTIME_ID, &now);
    return static_cast<double>(now.tv_sec) + 1e-9 * static_cast<double>(now.tv_nsec);
}

double quantile(const std::vector<double>& sorted, double share) {
    const double at = share * static_cast<double>(sorted.size() - 1);
    const auto below = static_cast<std::size_t>(at);
    const std::size_t above = std::min(below + 1, sorted.size() - 1);
    return std::lerp(sorted[below], sorted[above], at - static_cast<double>(below));
}

} // namespace

Sample timed(const std::function<void()>& work) {
    const double processor = processor_seconds();
    const auto wall = std::chrono::steady_clock::now();
    work();
    const std::chrono::duration<double> taken = std::chrono::steady_clock::now() - wall;
    return {.wall = taken.count(), .processor = processor_seconds() - processor};
}

Quartiles quartiles(std::vector<double> values) {
    std::sort(values.begin(), values.end());
    return {.lower = quantile(values, 0.25), .median = quantile(values, 0.5), .upper = quantile(values, 0.75)};
}

Ratios measure(std::size_t quads, const std::function<Sample()>& a, const std::function<Sample()>& b) {
    a();
    b();
    std::vector<double> wall;
    std::vector<double> processor;
    for (std::size_t quad = 0; quad < quads; ++quad) {
        const Sample a_first = a();
        const Sample b_first = b();
        const Sample b_second = b();
        const Sample a_second = a();
        wall.push_back((b_first.wall + b_second.wall) / (a_first.wall + a_second.wall));
        processor.push_back((b_first.processor + b_second.processor) / (a_first.processor + a_second.processor));
    }
    return {.wall = quartiles(std::move(wall)), .processor = quartiles(std::move(processor))};
}

void print(const std::string& what, const Ratios& ratios) {
    fmt::print("{:<58} {:7.3f}  [{:.3f}, {:.3f}]  processor time {:.3f}\n", what, ratios.wall.median, ratios.wall.lower,
               ratios.wall.upper, ratios.processor.median);
}

bool control_holds(const Ratios& control) {
    return control.wall.median >= 0.97 && control.wall.median <= 1.03;
}

} // namespace spanledger::benchmark
