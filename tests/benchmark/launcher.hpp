// SPDX-License-Identifier: MIT
#pragma once

#include "quads.hpp"

#include <string>
#include <vector>

namespace spanledger::benchmark {

/// What one run of a program took.
struct Run {
    Sample sample;          ///< as the program itself prints it
    double peak_mib = 0.0;  ///< largest resident size, its reading of inputs included
    bool succeeded = false; ///< exit status 0 and two numbers printed
};

/// Runs a program (path, then arguments) that prints its wall and processor seconds. This process must stay small: a
/// child's peak memory is counted from that of its parent.
[[nodiscard]] Run launch(const std::vector<std::string>& command);

} // namespace spanledger::benchmark
