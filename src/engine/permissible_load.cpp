// SPDX-License-Identifier: MIT
#include "spanledger/engine/permissible_load.hpp"

#include "spanledger/engine/cell_solver.hpp"
#include "spanledger/engine/ranking.hpp"

#include <boost/math/tools/toms748_solve.hpp>

#include <cmath>

namespace spanledger {
namespace {

constexpr double greatest_load = 0.4; // N/mm2: the hard range of a load in the brief
constexpr double load_step = 1e-5;    // N/mm2: 0.01 kN/m2

} // namespace

LoadSolver::LoadSolver(const Inputs& inputs, const Member& member, const LoadClass& load)
    : rules_(make_rules(inputs, member, load, UniformAction::always)), cap_(inputs.brief.basis.utilisation_cap) {}

LoadOutcome LoadSolver::outcome(Limit limit, double spacing, double L) const {
    const LimitPlan& plan = rules_->plan(limit);
    if (plan.status != LimitStatus::checked) return {};
    const double cap = cap_of(plan, cap_);
    const auto excess = [&](double variable) {
        const auto joist = rules_->at({.spacing = spacing, .variable = variable});
        return worst_check(*rules_, *joist, limit, L).utilisation - cap;
    };
    const double unloaded = excess(0.0);
    if (!passes(plan, unloaded + cap, cap_)) return {LoadOutcome::Kind::fails_unloaded, 0.0};
    const double loaded = excess(greatest_load);
    if (passes(plan, loaded + cap, cap_)) return {LoadOutcome::Kind::never_reached, 0.0};
    if (unloaded >= 0.0) return {LoadOutcome::Kind::load, 0.0};
    std::uintmax_t iterations = 200;
    const auto found = boost::math::tools::toms748_solve(excess, 0.0, greatest_load, unloaded, loaded,
                                                         boost::math::tools::eps_tolerance<double>(50), iterations);
    return {LoadOutcome::Kind::load, excess(found.second) <= 0.0 ? found.second : found.first};
}

PermissibleLoad LoadSolver::at(double spacing, double clear_span) const {
    PermissibleLoad result;
    result.reason = not_covered_reason(*rules_);
    if (!result.reason.empty()) return result;
    const double L = clear_span + rules_->span_addition();
    for (const LimitDefinition& definition : limit_definitions) {
        const LoadOutcome found = outcome(definition.limit, spacing, L);
        result.limits[index_of(definition.limit)] = found;
        if (found.kind == LoadOutcome::Kind::fails_unloaded && result.reason.empty()) {
            result.governing = definition.limit;
            result.reason = "a limit fails without variable action";
        }
    }
    if (!result.reason.empty()) return result;
    std::array<std::optional<double>, limit_count> left;
    for (std::size_t i = 0; i < limit_count; ++i) {
        if (result.limits[i].kind == LoadOutcome::Kind::load) left[i] = result.limits[i].variable;
    }
    const Ranking ranking = rank_limits(left);
    result.governing = ranking.governing;
    result.next = ranking.next;
    if (result.governing) {
        result.variable = result.limits[index_of(*result.governing)].variable;
    } else {
        result.variable = greatest_load;
        result.reason = "no limit reached";
    }
    return result;
}

Cell LoadSolver::cell(double spacing, double clear_span) const {
    const PermissibleLoad load = at(spacing, clear_span);
    Cell cell;
    cell.governing = load.governing;
    cell.next = load.next;
    cell.reason = load.reason;
    cell.permissible = load.variable;
    if (!load.variable) return cell;
    constexpr double rounding = 1e-7; // a load that is a whole number of steps but for the last digits
    const double L = clear_span + rules_->span_addition();
    for (double steps = std::floor(*load.variable / load_step + rounding); steps >= 0.0; steps -= 1.0) {
        const auto joist = rules_->at({.spacing = spacing, .variable = steps * load_step});
        const Appraisal appraisal = appraise(*rules_, *joist, L, cap_);
        if (!appraisal.passes) continue;
        cell.value = steps * load_step;
        cell.utilisation = appraisal.utilisation;
        return cell;
    }
    cell.reason = "a limit fails without variable action";
    return cell;
}

} // namespace spanledger
