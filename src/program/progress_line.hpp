// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/program/run.hpp"

#include <chrono>
#include <cstddef>

namespace spanledger {

/// One line on a terminal that tells how far long work is, from half a second on; cleared at the end without escape
/// codes.
class ProgressLine {
public:
    ProgressLine(const Surroundings& around, bool shown) : around_(&around), shown_(shown) {}
    ~ProgressLine();
    ProgressLine(const ProgressLine&) = delete;
    ProgressLine& operator=(const ProgressLine&) = delete;

    /// Throws Interruption where the user asked to stop.
    void operator()(std::size_t done, std::size_t total);

private:
    using Clock = std::chrono::steady_clock;

    const Surroundings* around_;
    bool shown_;
    std::size_t width_ = 0; ///< of what stands on the terminal
    Clock::time_point next_ = Clock::now() + std::chrono::milliseconds(500);
};

} // namespace spanledger
