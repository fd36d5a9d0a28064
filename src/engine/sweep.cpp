// SPDX-License-Identifier: MIT
#include "spanledger/engine/sweep.hpp"

#include <boost/math/tools/minima.hpp>
#include <boost/math/tools/toms748_solve.hpp>

#include <algorithm>
#include <cmath>

namespace spanledger {
namespace {

// Enough for every combination of three variable actions, each with two criteria.
constexpr std::size_t greatest_checks = 64;

// Pieces keep this distance (relative) from a span at which a rule changes, so that each lies on one side of it.
constexpr double break_gap = 1e-12;

// Where nothing is known of a check, the range is walked in steps of this ratio.
constexpr double march_ratio = 1.1;

/// One check of a joist as a function of the span.
class CheckCurve {
public:
    CheckCurve(const Joist& joist, Limit limit, std::size_t part) : joist_(&joist), limit_(limit), part_(part) {}

    double operator()(double L) const {
        std::array<Check<double>, greatest_checks>
            checks; // NOLINT(cppcoreguidelines-pro-type-member-init): written below
        joist_->checks(limit_, L, checks.data());
        return utilisation(checks[part_]);
    }

private:
    const Joist* joist_;
    Limit limit_;
    std::size_t part_;
};

/// Last span of a bracket at which u <= cap, where u(low) <= cap < u(high).
double crossing(const CheckCurve& u, double cap, SpanRange bracket) {
    const auto excess = [&](double L) { return u(L) - cap; };
    const double at_low = excess(bracket.lower);
    if (at_low >= 0.0) return bracket.lower;
    std::uintmax_t iterations = 200;
    const auto found =
        boost::math::tools::toms748_solve(excess, bracket.lower, bracket.upper, at_low, excess(bracket.upper),
                                          boost::math::tools::eps_tolerance<double>(50), iterations);
    return excess(found.second) <= 0.0 ? found.second : found.first;
}

/// The peak of u between three spans of a march, where it may exceed the cap unseen.
std::optional<double> hidden_peak(const CheckCurve& u, double cap, SpanRange between) {
    const auto found =
        boost::math::tools::brent_find_minima([&](double L) { return -u(L); }, between.lower, between.upper, 40);
    return -found.second > cap ? std::optional(found.first) : std::nullopt;
}

/// First crossing of a check of which nothing is known but that it is smooth within the range.
std::optional<double> first_crossing_by_marching(const CheckCurve& u, double cap, SpanRange range, double at_lower) {
    // Only a local maximum this close to the cap can hide a peak above it between two steps of the march. The ends of
    // the range count as maxima too: a peak may lie just inside.
    constexpr double peak_watch = 0.8;
    const auto crossing_before_peak = [&](SpanRange between) -> std::optional<double> {
        const auto top = hidden_peak(u, cap, between);
        return top ? std::optional(crossing(u, cap, {between.lower, *top})) : std::nullopt;
    };
    double previous = range.lower;
    double before_previous = range.lower;
    double at_previous = at_lower;
    double at_before = at_lower;
    while (previous < range.upper) {
        const double next = std::min(previous * march_ratio, range.upper);
        const double at_next = u(next);
        if (at_previous >= at_before && at_previous >= at_next && at_previous > peak_watch * cap) {
            if (const auto L = crossing_before_peak({before_previous, next})) return L;
        }
        if (at_next > cap) return crossing(u, cap, {previous, next});
        before_previous = previous;
        at_before = at_previous;
        previous = next;
        at_previous = at_next;
    }
    const bool peak_at_end = at_previous >= at_before && at_previous > peak_watch * cap;
    return peak_at_end ? crossing_before_peak({before_previous, range.upper}) : std::nullopt;
}

/// Largest span within the piece before the check exceeds the cap; empty where it does not. u(lower) <= cap.
std::optional<double> last_passing_span(const CheckCurve& u, const CheckShape& shape, double cap, SpanRange range,
                                        double at_lower) {
    if (at_lower <= 0.0 && shape.known) return std::nullopt;
    if (shape.known && shape.order_high <= 0.0) return std::nullopt;
    if (shape.known && shape.order_low == shape.order_high) {
        const double L = range.lower * std::pow(cap / at_lower, 1.0 / shape.order_low);
        return L < range.upper ? std::optional(L) : std::nullopt;
    }
    if (shape.known && shape.order_low >= 0.0) {
        const double ratio = cap / at_lower;
        const double from = std::min(range.upper, range.lower * std::pow(ratio, 1.0 / shape.order_high));
        double to = range.upper;
        if (shape.order_low > 0.0) to = std::min(to, range.lower * std::pow(ratio, 1.0 / shape.order_low));
        // The bracket is exact but for rounding: widen it so that the ends really enclose the crossing.
        const SpanRange bracket{std::max(range.lower, from * (1.0 - 1e-12)), std::min(range.upper, to * (1.0 + 1e-12))};
        if (u(bracket.upper) <= cap) return std::nullopt;
        return crossing(u, cap, bracket);
    }
    return first_crossing_by_marching(u, cap, range, at_lower);
}

std::vector<CheckShape> shapes_of(const JoistGrowth& growth, Limit limit, SpanRange range, std::size_t parts) {
    std::vector<Check<Growth>> checks(parts);
    growth.checks(limit, Growth::span_between(range.lower, range.upper), checks.data());
    std::vector<CheckShape> shapes;
    shapes.reserve(checks.size());
    for (const Check<Growth>& check : checks) {
        const Growth u = check.demand / check.resistance;
        shapes.push_back({.known = u.known, .order_low = u.order_low, .order_high = u.order_high});
    }
    return shapes;
}

bool all_known(const std::vector<CheckShape>& shapes) {
    return std::all_of(shapes.begin(), shapes.end(), [](const CheckShape& shape) { return shape.known; });
}

using Utilisations = std::array<double, greatest_checks>;

/// Utilisation of every check of a limit at one span.
Utilisations utilisations(const Joist& joist, Limit limit, double L, std::size_t parts) {
    std::array<Check<double>, greatest_checks> checks; // NOLINT(cppcoreguidelines-pro-type-member-init): written below
    joist.checks(limit, L, checks.data());
    Utilisations all; // NOLINT(cppcoreguidelines-pro-type-member-init): the first `parts` are written below
    for (std::size_t part = 0; part < parts; ++part) all[part] = utilisation(checks[part]);
    return all;
}

/// Whether another check of the piece is never below this one: it starts no lower and grows no slower.
bool overtaken(const Piece& piece, const Utilisations& at_lower, std::size_t part) {
    const CheckShape& shape = piece.shapes[part];
    for (std::size_t other = 0; other < piece.shapes.size(); ++other) {
        const CheckShape& rival = piece.shapes[other];
        const bool higher = at_lower[other] > at_lower[part];
        if (higher && shape.known && rival.known && rival.order_low >= shape.order_high) return true;
    }
    return false;
}

/// The shortest of the spans that the checks of a piece leave; infinite where none is exceeded.
double shortest_span(const Joist& joist, Limit limit, const Piece& piece, const Utilisations& at_lower, double cap) {
    double shortest = words::infinity;
    for (std::size_t part = 0; part < piece.shapes.size(); ++part) {
        const CheckShape& shape = piece.shapes[part];
        if (overtaken(piece, at_lower, part)) continue;
        const CheckCurve u(joist, limit, part);
        // A check that still passes where another is exceeded, and only grows, leaves a longer span.
        const bool increases = shape.known && shape.order_low >= 0.0;
        if (increases && std::isfinite(shortest) && u(shortest) <= cap) continue;
        const auto L = last_passing_span(u, shape, cap, piece.range, at_lower[part]);
        shortest = std::min(shortest, L.value_or(words::infinity));
    }
    return shortest;
}

} // namespace

SpanSolver::SpanSolver(const JoistRules& rules, SpanRange range, SpanRange spacings, double cap)
    : rules_(&rules), range_(range), cap_(cap) {
    const auto growth = rules.growth(Growth::constant_between(spacings.lower, spacings.upper));
    for (const LimitDefinition& definition : limit_definitions) {
        if (rules.plan(definition.limit).status == LimitStatus::checked) {
            pieces_[index_of(definition.limit)] = pieces_of(*growth, definition.limit);
        }
    }
}

std::vector<Piece> SpanSolver::pieces_of(const JoistGrowth& growth, Limit limit) const {
    const std::size_t parts = rules_->plan(limit).parts.size();
    std::vector<CheckShape> whole = shapes_of(growth, limit, range_, parts);
    if (all_known(whole)) return {{range_, std::move(whole)}};
    std::vector<double> breaks = rules_->breaks(limit);
    std::sort(breaks.begin(), breaks.end());
    std::vector<Piece> pieces;
    double from = range_.lower;
    for (const double at : breaks) {
        if (at * (1.0 - break_gap) <= from || at >= range_.upper) continue;
        pieces.push_back({{from, at * (1.0 - break_gap)}, {}});
        from = at * (1.0 + break_gap);
    }
    pieces.push_back({{from, range_.upper}, {}});
    for (Piece& piece : pieces) {
        piece.shapes = shapes_of(growth, limit, piece.range, parts);
    }
    return pieces;
}

LimitOutcome SpanSolver::solve_limit(const Joist& joist, Limit limit) const {
    const double cap = cap_of(rules_->plan(limit), cap_);
    double last_good = 0.0;
    for (const Piece& piece : pieces_[index_of(limit)]) {
        const std::size_t parts = piece.shapes.size();
        const Utilisations at_lower = utilisations(joist, limit, piece.range.lower, parts);
        const bool starts_well =
            std::all_of(at_lower.data(), at_lower.data() + parts, [cap](double u) { return u <= cap; });
        if (!starts_well) {
            if (last_good == 0.0) return {.kind = LimitOutcome::Kind::fails_at_once, .clear_span = 0.0};
            return {.kind = LimitOutcome::Kind::spans, .clear_span = last_good};
        }
        const double shortest = shortest_span(joist, limit, piece, at_lower, cap);
        if (std::isfinite(shortest)) return {.kind = LimitOutcome::Kind::spans, .clear_span = shortest};
        last_good = piece.range.upper;
    }
    return {.kind = LimitOutcome::Kind::never_reached, .clear_span = 0.0};
}

void SpanSolver::solve(const Joist& joist, std::array<LimitOutcome, limit_count>& outcomes) const {
    for (const LimitDefinition& definition : limit_definitions) {
        LimitOutcome& outcome = outcomes[index_of(definition.limit)];
        outcome = {};
        if (rules_->plan(definition.limit).status == LimitStatus::checked) {
            outcome = solve_limit(joist, definition.limit);
        }
    }
}

WorstCheck worst_check(const JoistRules& rules, const Joist& joist, Limit limit, double L) {
    std::array<Check<double>, greatest_checks> checks; // NOLINT(cppcoreguidelines-pro-type-member-init): written below
    joist.checks(limit, L, checks.data());
    WorstCheck worst;
    for (std::size_t part = 0; part < rules.plan(limit).parts.size(); ++part) {
        const double u = utilisation(checks[part]);
        if (part == 0 || !(u <= worst.utilisation)) worst = {u, part, checks[part]};
    }
    return worst;
}

bool passes(const LimitPlan& plan, double utilisation, double cap) noexcept {
    constexpr double rounding = 1e-12;
    if (plan.strict && utilisation >= 1.0) return false;
    return utilisation <= cap_of(plan, cap) * (1.0 + rounding);
}

} // namespace spanledger
