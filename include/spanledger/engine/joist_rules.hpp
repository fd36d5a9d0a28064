// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/limits.hpp"
#include "spanledger/number/growth.hpp"
#include "spanledger/number/traced.hpp"
#include "spanledger/results/issue.hpp"

#include <array>
#include <memory>
#include <optional>
#include <string>
#include <vector>

// What the sweep knows of a basis: which limits a member has under a load class, each as demand and resistance at a
// span. A material's rules stand behind this interface; the sweep knows nothing of materials.

namespace spanledger {

/// One comparison of a limit: for one combination, one action, or one of two criteria. Both in the limit's unit.
template <class N> struct Check {
    N demand;
    N resistance;
};

[[nodiscard]] inline double utilisation(const Check<double>& check) noexcept {
    return check.demand / check.resistance;
}

/// How a limit is checked for a member under a load class, whatever the spacing and span.
struct LimitPlan {
    LimitStatus status = LimitStatus::not_applicable;
    std::string reason; ///< why it is not checked
    std::string clause;
    std::string unit;
    std::vector<std::string> parts; ///< one per check, e.g. "6.10, uniform"
    bool strict = false;            ///< fails at a utilisation of exactly 1 too
    bool capped = true;             ///< the practice's utilisation cap applies; otherwise 1
    std::string when_failing;       ///< what the standard says of a member that fails, if anything
};

using LimitPlans = std::array<LimitPlan, limit_count>;

/// What the sweep and a check may vary.
struct Variation {
    double spacing = 0.0;  ///< mm
    double variable = 0.0; ///< q_k, N/mm2
};

/// Quantities a check reports besides its limits.
struct JoistFacts {
    struct Deflection {
        std::string name;
        std::string action;
        double mm = 0.0;
    };
    struct Reaction {
        std::string action;
        double newton = 0.0;
    };
    std::vector<Deflection> deflections; ///< largest of each name over the actions
    double first_frequency = 0.0;        ///< Hz; 0 where it has none (no mass, cantilever)
    std::vector<Reaction> reactions;
    std::optional<double> bearing_length_needed; ///< mm
};

/// A member at one spacing under one load.
class Joist {
public:
    Joist() = default;
    Joist(const Joist&) = delete;
    Joist& operator=(const Joist&) = delete;
    virtual ~Joist() = default;

    /// All checks of one limit at effective span L (mm), in the order of the plan's parts; `out` has room for them.
    virtual void checks(Limit limit, double L, Check<double>* out) const = 0;

    /// `cap`: the utilisation that the bearing length needed may leave.
    [[nodiscard]] virtual JoistFacts facts(double L, double cap) const = 0;
};

/// How the checks of a member grow with the span, for every spacing of a range.
class JoistGrowth {
public:
    JoistGrowth() = default;
    JoistGrowth(const JoistGrowth&) = delete;
    JoistGrowth& operator=(const JoistGrowth&) = delete;
    virtual ~JoistGrowth() = default;

    /// All checks of one limit over the spans `L`, in the order of the plan's parts; `out` has room for them.
    virtual void checks(Limit limit, const Growth& L, Check<Growth>* out) const = 0;
};

/// A member under a load class in a basis.
class JoistRules {
public:
    JoistRules() = default;
    JoistRules(const JoistRules&) = delete;
    JoistRules& operator=(const JoistRules&) = delete;
    virtual ~JoistRules() = default;

    [[nodiscard]] const LimitPlans& plans() const noexcept { return plans_; }
    [[nodiscard]] const LimitPlan& plan(Limit limit) const noexcept { return plans_[index_of(limit)]; }

    [[nodiscard]] virtual std::unique_ptr<Joist> at(const Variation& variation) const = 0;

    /// For every spacing within `spacing`. These rules must outlive what is returned.
    [[nodiscard]] virtual std::unique_ptr<JoistGrowth> growth(const Growth& spacing) const = 0;

    /// All checks of one limit at a clear span (mm), each value with the way it came about.
    [[nodiscard]] virtual std::vector<Check<Traced>> trace(Limit limit, const Variation& variation,
                                                           const Traced& clear_span) const = 0;

    /// Effective spans (mm) at which a rule of this limit changes, with or without a jump.
    [[nodiscard]] virtual std::vector<double> breaks(Limit limit) const = 0;

    /// L = clear span + this, mm.
    [[nodiscard]] virtual double span_addition() const = 0;
    [[nodiscard]] virtual std::string span_rule() const = 0;
    [[nodiscard]] virtual double depth() const = 0; ///< mm

    /// Statements that hold for every cell of this member: cautions a reader must see.
    [[nodiscard]] virtual std::vector<std::string> notes() const = 0;

protected:
    LimitPlans plans_; // NOLINT(cppcoreguidelines-non-private-member-variables-in-classes): filled by the rules
};

} // namespace spanledger
