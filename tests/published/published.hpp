// SPDX-License-Identifier: MIT
#pragma once

#include <string>
#include <vector>

// Values printed elsewhere, each beside ours. The same rows are checked and make the validation guide.

namespace published {

/// How well a printed value is known.
enum class Mark { seen, from_memory, common_practice };

struct Row {
    Mark mark;
    std::string quantity;
    std::string printed; ///< digits as the source prints them; half a unit of the last one is the tolerance
    double ours;         ///< in `unit`
    std::string unit;
    std::string remark{};
    double units_off = 0.5; ///< more than half a unit only where the remark says why
};

/// A line of a source that is not compared, and why.
struct NotCovered {
    std::string line;
    std::string reason;
};

/// One worked example or table: everything under one source.
struct Example {
    std::string title;
    std::string source;
    std::string inputs; ///< what is put in, and what of it is not from the source
    std::vector<Row> rows;
    std::vector<NotCovered> not_covered{};
};

[[nodiscard]] double printed_value(const Row& row);
/// Half a unit of the last printed digit, or as many units as the row says.
[[nodiscard]] double tolerance(const Row& row);
[[nodiscard]] bool agrees(const Row& row);

/// Checks every row of an example, with all that is needed to find a difference.
void check(const Example& example);

/// The guide in Markdown.
[[nodiscard]] std::string guide(const std::vector<Example>& examples);

// The examples, each in the file of its name.
[[nodiscard]] Example beam_theory();
[[nodiscard]] Example combination_factors();
[[nodiscard]] Example lvl_floor();
[[nodiscard]] Example din_floor();
[[nodiscard]] Example glulam_hall();
[[nodiscard]] Example steel_floor_beam();
[[nodiscard]] Example lateral_buckling_of_a_beam();
[[nodiscard]] Example lipped_channel_section();
[[nodiscard]] std::vector<Example> timber_parameters();
[[nodiscard]] std::vector<Example> psi_factors();

} // namespace published
