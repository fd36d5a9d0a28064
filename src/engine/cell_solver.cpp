// SPDX-License-Identifier: MIT
#include "spanledger/engine/cell_solver.hpp"

#include "spanledger/engine/ranking.hpp"

#include <algorithm>
#include <cmath>

namespace spanledger {
namespace {

/// Among the limits exceeded at the lower bound, the one exceeded most.
Limit worst_at(const JoistRules& rules, const Joist& joist, const Cell& cell, double L) {
    double worst = -1.0;
    Limit limit = Limit::bending;
    for (const LimitDefinition& definition : limit_definitions) {
        if (cell.limits[index_of(definition.limit)].kind != LimitOutcome::Kind::fails_at_once) continue;
        const double u = worst_check(rules, joist, definition.limit, L).utilisation;
        if (u > worst) {
            worst = u;
            limit = definition.limit;
        }
    }
    return limit;
}

bool fails_at_once(const Cell& cell) {
    return std::any_of(cell.limits.begin(), cell.limits.end(),
                       [](const LimitOutcome& outcome) { return outcome.kind == LimitOutcome::Kind::fails_at_once; });
}

} // namespace

CellSolver::CellSolver(const Inputs& inputs, const Member& member, const LoadClass& load, SpanRange spacings)
    : rules_(make_rules(inputs, member, load)), search_(inputs.brief.search), variable_(load.variable),
      cap_(inputs.brief.basis.utilisation_cap),
      solver_(*rules_, search_range(inputs.brief.search, *rules_), spacings, cap_) {}

std::unique_ptr<Joist> CellSolver::joist(double spacing) const {
    return rules_->at({.spacing = spacing, .variable = variable_});
}

Cell CellSolver::solved(const Joist& joist) const {
    Cell cell;
    cell.reason = not_covered_reason(*rules_);
    if (!cell.reason.empty()) return cell;
    solver_.solve(joist, cell.limits);
    for (LimitOutcome& outcome : cell.limits) {
        if (outcome.kind == LimitOutcome::Kind::spans) outcome.clear_span -= rules_->span_addition();
    }
    if (fails_at_once(cell)) {
        cell.governing = worst_at(*rules_, joist, cell, solver_.range().lower);
        cell.reason = "no span above the lower bound";
        return cell;
    }
    std::array<std::optional<double>, limit_count> left;
    for (std::size_t i = 0; i < limit_count; ++i) {
        // Effective spans: a tie is judged on L.
        if (cell.limits[i].kind == LimitOutcome::Kind::spans) {
            left[i] = cell.limits[i].clear_span + rules_->span_addition();
        }
    }
    const Ranking ranking = rank_limits(left);
    cell.governing = ranking.governing;
    cell.next = ranking.next;
    if (cell.governing) {
        cell.permissible = cell.limits[index_of(*cell.governing)].clear_span;
    } else {
        cell.permissible = solver_.range().upper - rules_->span_addition();
        cell.reason = "no limit reached";
    }
    return cell;
}

void CellSolver::print_span(Cell& cell, const Joist& joist) const {
    if (!cell.permissible) return;
    // A span that is a whole number of steps but for the last digits is that number of steps.
    constexpr double rounding = 1e-7;
    const double shortest = solver_.range().lower - rules_->span_addition() - search_.step;
    for (double steps = std::floor(*cell.permissible / search_.step + rounding); steps > 0.0; steps -= 1.0) {
        const double clear_span = steps * search_.step;
        if (clear_span < shortest) break;
        const Appraisal appraisal = appraise(*rules_, joist, clear_span + rules_->span_addition(), cap_);
        if (!appraisal.passes) continue;
        cell.value = clear_span;
        cell.utilisation = appraisal.utilisation;
        return;
    }
    cell.reason = "no span above the lower bound";
}

Cell CellSolver::permissible_span(double spacing) const {
    const auto at_spacing = joist(spacing);
    Cell cell = solved(*at_spacing);
    print_span(cell, *at_spacing);
    return cell;
}

Cell CellSolver::utilisation(double spacing, double clear_span) const {
    Cell cell;
    cell.reason = not_covered_reason(*rules_);
    if (!cell.reason.empty()) return cell;
    const Appraisal appraisal = appraise(*rules_, *joist(spacing), clear_span + rules_->span_addition(), cap_);
    // Rounded up: a printed 1.00 passes. The last digits of a computed 1 do not make it 1.01.
    cell.value = std::ceil(appraisal.utilisation * 100.0 - 1e-9) / 100.0 + 0.0; // no -0
    cell.permissible = appraisal.utilisation;
    cell.utilisation = appraisal.utilisation;
    cell.governing = appraisal.worst;
    cell.next = appraisal.next;
    return cell;
}

bool CellSolver::passes(double spacing, double clear_span) const {
    const Appraisal appraisal = appraise(*rules_, *joist(spacing), clear_span + rules_->span_addition(), cap_);
    return appraisal.passes && appraisal.covered;
}

Appraisal appraise(const JoistRules& rules, const Joist& joist, double L, double cap) {
    Appraisal appraisal;
    double next = 0.0;
    for (const LimitDefinition& definition : limit_definitions) {
        const LimitPlan& plan = rules.plan(definition.limit);
        if (plan.status == LimitStatus::not_covered) appraisal.covered = false;
        if (plan.status != LimitStatus::checked) continue;
        const double u = worst_check(rules, joist, definition.limit, L).utilisation;
        const bool pass = spanledger::passes(plan, u, cap);
        appraisal.passes = appraisal.passes && pass;
        if (pass && !plan.capped) continue; // a length that is in stock uses nothing up
        if (!appraisal.worst || u > appraisal.utilisation) {
            next = appraisal.utilisation;
            appraisal.next = appraisal.worst;
            appraisal.utilisation = u;
            appraisal.worst = definition.limit;
        } else if (!appraisal.next || u > next) {
            next = u;
            appraisal.next = definition.limit;
        }
    }
    return appraisal;
}

std::string not_covered_reason(const JoistRules& rules) {
    for (const LimitPlan& plan : rules.plans()) {
        if (plan.status == LimitStatus::not_covered) return plan.reason;
    }
    return {};
}

} // namespace spanledger
