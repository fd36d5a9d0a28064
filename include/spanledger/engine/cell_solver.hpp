// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/basis.hpp"
#include "spanledger/engine/sweep.hpp"
#include "spanledger/results/issue.hpp"

#include <memory>

namespace spanledger {

/// Works out the cells of one member under one load class.
class CellSolver {
public:
    /// `spacings` (mm) enclose every spacing that will be asked for.
    CellSolver(const Inputs& inputs, const Member& member, const LoadClass& load, SpanRange spacings);

    /// Permissible clear span at a spacing: rounded to the step and verified at the rounded value.
    [[nodiscard]] Cell permissible_span(double spacing) const;

    /// Largest utilisation, and its limit, at a clear span (mm).
    [[nodiscard]] Cell utilisation(double spacing, double clear_span) const;

    /// Whether every limit passes at a clear span (mm).
    [[nodiscard]] bool passes(double spacing, double clear_span) const;

    [[nodiscard]] const JoistRules& rules() const noexcept { return *rules_; }
    [[nodiscard]] std::unique_ptr<Joist> joist(double spacing) const;

private:
    void print_span(Cell& cell, const Joist& joist) const;
    [[nodiscard]] Cell solved(const Joist& joist) const;

    std::unique_ptr<JoistRules> rules_;
    SearchRange search_;
    double variable_;
    double cap_;
    SpanSolver solver_;
};

/// Largest utilisation over every checked limit at effective span L, and whether all pass.
struct Appraisal {
    double utilisation = 0.0;
    std::optional<Limit> worst;
    std::optional<Limit> next; ///< second largest utilisation
    bool passes = true;
    bool covered = true; ///< no limit is "not covered"
};
[[nodiscard]] Appraisal appraise(const JoistRules& rules, const Joist& joist, double L, double cap);

/// Why a member is not covered under a load class; empty where it is.
[[nodiscard]] std::string not_covered_reason(const JoistRules& rules);

} // namespace spanledger
