// SPDX-License-Identifier: MIT
#pragma once

#include <cstddef>
#include <string>

// An invented practice of any size, made the same every time, for the benchmark to issue tables for.

namespace spanledger::benchmark {

/// How many rows and columns the practice's tables have: four members entries, each with every size of the series.
struct PracticeSize {
    std::size_t sizes = 0;    ///< at most 1400
    std::size_t loads = 0;    ///< at most 30
    std::size_t spacings = 0; ///< at most 6
};

inline constexpr PracticeSize ten_thousand_cells{.sizes = 70, .loads = 12, .spacings = 3};
inline constexpr PracticeSize million_cells{.sizes = 1400, .loads = 30, .spacings = 6};

/// Which limits the brief asks for, and how the compression edge stands.
enum class BriefKind { without_vibration, with_vibration, free_edge };

/// Writes brief.toml and the series file that it names into an existing folder; the path of the brief.
std::string write_practice(const std::string& folder, const PracticeSize& size, BriefKind kind);

} // namespace spanledger::benchmark
