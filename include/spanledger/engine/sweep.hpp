// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/joist_rules.hpp"

#include <vector>

// The largest span that every limit allows. Knows nothing of materials or standards: only of checks as functions of L.

namespace spanledger {

/// Effective spans searched, mm.
struct SpanRange {
    double lower = 0.0;
    double upper = 0.0;
};

/// How one check grows within one piece of the range.
struct CheckShape {
    bool known = false;     ///< the orders hold
    double order_low = 0.0; ///< of the utilisation
    double order_high = 0.0;
};

/// A piece of the range in which no rule of the limit changes.
struct Piece {
    SpanRange range;
    std::vector<CheckShape> shapes; ///< one per check of the limit
};

/// For each limit, the pieces of the range. Found once for a member under a load class, for all its spacings.
class SpanSolver {
public:
    /// `spacings` enclose every spacing that will be asked for.
    SpanSolver(const JoistRules& rules, SpanRange range, SpanRange spacings, double cap);

    /// What each limit leaves for a joist of these rules, as effective spans.
    void solve(const Joist& joist, std::array<LimitOutcome, limit_count>& outcomes) const;

    [[nodiscard]] const std::vector<Piece>& pieces(Limit limit) const noexcept { return pieces_[index_of(limit)]; }
    [[nodiscard]] const SpanRange& range() const noexcept { return range_; }

private:
    [[nodiscard]] std::vector<Piece> pieces_of(const JoistGrowth& growth, Limit limit) const;
    [[nodiscard]] LimitOutcome solve_limit(const Joist& joist, Limit limit) const;

    const JoistRules* rules_;
    SpanRange range_;
    double cap_;
    std::array<std::vector<Piece>, limit_count> pieces_;
};

/// Largest utilisation of one limit at effective span L, and which of its checks it is.
struct WorstCheck {
    double utilisation = 0.0;
    std::size_t part = 0;
    Check<double> check{};
};
[[nodiscard]] WorstCheck worst_check(const JoistRules& rules, const Joist& joist, Limit limit, double L);

/// The utilisation a limit may reach.
[[nodiscard]] inline double cap_of(const LimitPlan& plan, double cap) noexcept {
    return plan.capped ? cap : 1.0;
}

/// Whether a utilisation passes: at most the cap within rounding of the last digits, below 1 where the limit is strict.
[[nodiscard]] bool passes(const LimitPlan& plan, double utilisation, double cap) noexcept;

} // namespace spanledger
