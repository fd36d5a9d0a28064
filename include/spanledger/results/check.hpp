// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/limits.hpp"
#include "spanledger/results/issue.hpp"

#include <optional>
#include <string>
#include <vector>

// The result shape of `check` for one joist.

namespace spanledger {

enum class Verdict { passes, fails, not_covered };

struct LimitCheck {
    Limit limit;
    LimitStatus status = LimitStatus::checked;
    std::string reason; ///< why not checked; or what a failing check means where the standard says so
    double utilisation = 0.0;
    double demand = 0.0;     ///< in `unit`
    double resistance = 0.0; ///< in `unit`
    std::string unit;
    std::string clause;
    std::string combination; ///< governing combination; for serviceability the action
    LimitOutcome outcome;
};

struct DeflectionLine {
    std::string name;   ///< "variable", "instantaneous", "final"
    std::string action; ///< governing variable action
    double mm = 0.0;
    double span_ratio = 0.0; ///< n of L/n
};

/// Support reactions of one joist in N; per metre of wall they are divided by the spacing.
struct Reaction {
    std::string action; ///< "G", "Q: uniform", "design: 6.10, uniform", ...
    double newton = 0.0;
};

struct Neighbour {
    std::string member;   ///< or the same member at another spacing
    double spacing = 0.0; ///< mm
    bool passes = false;
    double utilisation = 0.0;
    std::optional<double> permissible; ///< clear span in mm
};

struct CheckResult {
    std::string member;
    std::string load;
    double spacing = 0.0;        ///< mm
    double clear_span = 0.0;     ///< mm
    double effective_span = 0.0; ///< mm
    std::string span_rule;       ///< e.g. "L = Lc + t"
    Verdict verdict = Verdict::passes;
    std::optional<Limit> governing; ///< smallest permissible span
    double utilisation = 0.0;       ///< the largest
    std::optional<Limit> worst;     ///< the limit of the largest utilisation
    double cap = 1.0;
    std::optional<double> permissible;      ///< clear span in mm, unrounded
    std::optional<double> printed;          ///< rounded as a table would
    std::optional<double> permissible_load; ///< N/mm2
    std::string no_span_reason;
    std::vector<LimitCheck> limits; ///< every limit in order
    std::vector<DeflectionLine> deflections;
    double first_frequency = 0.0; ///< Hz, permanent mass
    std::vector<Reaction> reactions;
    std::optional<double> bearing_length_needed; ///< mm
    std::optional<Neighbour> deeper;
    std::optional<Neighbour> shallower;
    std::optional<Neighbour> wider_spacing;
    std::optional<Neighbour> closer_spacing;
    std::vector<std::string> notes; ///< rules a reader must know (caps, partitions, cantilever caution, ...)
    std::vector<std::string> cautions;
};

} // namespace spanledger
