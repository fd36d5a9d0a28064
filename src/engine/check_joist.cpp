// SPDX-License-Identifier: MIT
#include "spanledger/engine/check_joist.hpp"

#include "spanledger/engine/basis_statement.hpp"
#include "spanledger/engine/cell_solver.hpp"
#include "spanledger/engine/permissible_load.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {
namespace {

class Checker {
public:
    Checker(const Inputs& inputs, const CheckRequest& request)
        : inputs_(&inputs), request_(&request), load_(find_load()),
          solver_(inputs, request.member, *load_, {request.spacing, request.spacing}),
          joist_(solver_.joist(request.spacing)), cap_(inputs.brief.basis.utilisation_cap) {}

    CheckResult run() {
        identify();
        check_limits();
        spans();
        facts();
        neighbours();
        words();
        return std::move(result_);
    }

private:
    const LoadClass* find_load() const {
        const auto& loads = inputs_->brief.loads;
        return &*std::find_if(loads.begin(), loads.end(), [&](const auto& l) { return l.name == request_->load; });
    }

    void identify() {
        result_.member = member_name(request_->member);
        result_.load = request_->load;
        result_.spacing = request_->spacing;
        result_.clear_span = request_->clear_span;
        result_.effective_span = request_->clear_span + solver_.rules().span_addition();
        result_.span_rule = solver_.rules().span_rule();
        result_.cap = cap_;
    }

    void check_limits() {
        for (const LimitDefinition& definition : limit_definitions) {
            result_.limits.push_back(check_limit(definition.limit));
        }
        const Appraisal appraisal = appraise(solver_.rules(), *joist_, result_.effective_span, cap_);
        result_.utilisation = appraisal.utilisation;
        result_.worst = appraisal.worst;
        result_.verdict = !appraisal.covered ? Verdict::not_covered
                          : appraisal.passes ? Verdict::passes
                                             : Verdict::fails;
    }

    LimitCheck check_limit(Limit limit) const {
        const LimitPlan& plan = solver_.rules().plan(limit);
        LimitCheck check{.limit = limit,
                         .status = plan.status,
                         .reason = plan.reason,
                         .unit = plan.unit,
                         .clause = plan.clause,
                         .combination = {},
                         .outcome = {}};
        if (plan.status != LimitStatus::checked) return check;
        const WorstCheck worst = worst_check(solver_.rules(), *joist_, limit, result_.effective_span);
        check.utilisation = worst.utilisation;
        check.demand = worst.check.demand;
        check.resistance = worst.check.resistance;
        check.combination = plan.parts[worst.part];
        if (!passes(plan, worst.utilisation, cap_)) check.reason = plan.when_failing;
        return check;
    }

    void spans() {
        const Cell cell = solver_.permissible_span(request_->spacing);
        for (LimitCheck& check : result_.limits) check.outcome = cell.limits[index_of(check.limit)];
        result_.governing = cell.governing;
        result_.permissible = cell.permissible;
        result_.printed = cell.value;
        result_.no_span_reason = cell.reason;
        result_.permissible_load =
            LoadSolver(*inputs_, request_->member, *load_).at(request_->spacing, request_->clear_span).variable;
    }

    void facts() {
        const JoistFacts facts = joist_->facts(result_.effective_span, cap_);
        for (const auto& w : facts.deflections) {
            result_.deflections.push_back({w.name, w.action, w.mm, w.mm > 0.0 ? result_.effective_span / w.mm : 0.0});
        }
        result_.first_frequency = facts.first_frequency;
        for (const auto& r : facts.reactions) result_.reactions.push_back({r.action, r.newton});
        result_.bearing_length_needed = facts.bearing_length_needed;
    }

    /// Members of the entry of the brief that holds this member; of the first with the same class if none does.
    std::vector<Member> matching_entry(const MembersEntry** found) const {
        Diagnostics ignored; // the brief was read without errors
        std::vector<Member> fallback;
        for (const MembersEntry& entry : inputs_->brief.members) {
            if (entry.material_class != class_name(request_->member)) continue;
            std::vector<Member> members = members_of(entry, inputs_->catalogue, ignored);
            const bool holds = std::any_of(members.begin(), members.end(),
                                           [&](const Member& member) { return member_name(member) == result_.member; });
            if (holds) {
                *found = &entry;
                return members;
            }
            if (fallback.empty() && !members.empty()) {
                *found = &entry;
                fallback = std::move(members);
            }
        }
        return fallback;
    }

    Neighbour neighbour(const Member& member, double spacing) const {
        const CellSolver solver(*inputs_, member, *load_, {spacing, spacing});
        const auto joist = solver.joist(spacing);
        const double L = request_->clear_span + solver.rules().span_addition();
        const Appraisal appraisal = appraise(solver.rules(), *joist, L, cap_);
        return {member_name(member), spacing, appraisal.passes && appraisal.covered, appraisal.utilisation,
                solver.permissible_span(spacing).value};
    }

    void neighbours() {
        const MembersEntry* entry = nullptr;
        const std::vector<Member> members = matching_entry(&entry);
        const double depth = depth_of(request_->member);
        const Member* deeper = nullptr;
        const Member* shallower = nullptr;
        for (const Member& member : members) {
            if (!comparable(member, request_->member)) continue;
            const double d = depth_of(member);
            if (d > depth && (deeper == nullptr || d < depth_of(*deeper))) deeper = &member;
            if (d < depth && (shallower == nullptr || d > depth_of(*shallower))) shallower = &member;
        }
        if (deeper != nullptr) result_.deeper = neighbour(*deeper, request_->spacing);
        if (shallower != nullptr) result_.shallower = neighbour(*shallower, request_->spacing);
        neighbouring_spacings(entry);
    }

    void neighbouring_spacings(const MembersEntry* entry) {
        std::optional<double> wider;
        std::optional<double> closer;
        for (const TableRequest& table : inputs_->brief.tables) {
            const bool about = entry == nullptr || std::find(table.members.begin(), table.members.end(), entry->name) !=
                                                       table.members.end();
            if (!about) continue;
            for (const double s : table.spacings) {
                if (s > request_->spacing && (!wider || s < *wider)) wider = s;
                if (s < request_->spacing && (!closer || s > *closer)) closer = s;
            }
        }
        if (wider) result_.wider_spacing = neighbour(request_->member, *wider);
        if (closer) result_.closer_spacing = neighbour(request_->member, *closer);
    }

    void words() {
        result_.notes = solver_.rules().notes();
        if (cap_ < 1.0) {
            result_.notes.push_back(fmt::format("The practice's utilisation cap of {} applies to every limit.", cap_));
        }
        result_.cautions = cautions(*inputs_);
    }

    const Inputs* inputs_;
    const CheckRequest* request_;
    const LoadClass* load_;
    CellSolver solver_;
    std::unique_ptr<Joist> joist_;
    double cap_;
    CheckResult result_;
};

} // namespace

CheckResult check_joist(const Inputs& inputs, const CheckRequest& request) {
    return Checker(inputs, request).run();
}

} // namespace spanledger
