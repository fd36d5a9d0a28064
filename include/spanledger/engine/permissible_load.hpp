// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/basis.hpp"
#include "spanledger/results/issue.hpp"

#include <array>
#include <memory>

namespace spanledger {

/// The variable action q_k (N/mm2) that one limit leaves at a span.
struct LoadOutcome {
    enum class Kind { load, never_reached, fails_unloaded, not_checked } kind = Kind::not_checked;
    double variable = 0.0;
};

/// The variable action that every limit leaves; the smallest governs.
struct PermissibleLoad {
    std::optional<double> variable; ///< N/mm2, unrounded; empty: a limit fails without any variable action
    std::optional<Limit> governing; ///< empty: no limit reached up to the upper bound, which `variable` then is
    std::optional<Limit> next;
    std::string reason; ///< why there is no load, or "no limit reached"
    std::array<LoadOutcome, limit_count> limits{};
};

/// Largest q_k of one member under one load class: partition allowance, snow and concentrated load stay as they are.
class LoadSolver {
public:
    LoadSolver(const Inputs& inputs, const Member& member, const LoadClass& load);

    [[nodiscard]] PermissibleLoad at(double spacing, double clear_span) const;

    /// The same as a table's cell: rounded down to 0.01 kN/m2 and verified at the rounded value.
    [[nodiscard]] Cell cell(double spacing, double clear_span) const;

    [[nodiscard]] const JoistRules& rules() const noexcept { return *rules_; }

private:
    [[nodiscard]] LoadOutcome outcome(Limit limit, double spacing, double L) const;

    std::unique_ptr<JoistRules> rules_;
    double cap_;
};

} // namespace spanledger
