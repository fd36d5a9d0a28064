// SPDX-License-Identifier: MIT
#include "cold_formed_plans.hpp"

#include "steel_frequency.hpp"

#include <fmt/format.h>

namespace spanledger {
namespace {

constexpr const char* cold_formed = "EN 1993-1-3 ";
constexpr const char* liveliness_clause = "EN 1993-1-1 7.2.3, EN 1990 A1.4.4";

class Planner {
public:
    Planner(const Inputs& inputs, const ColdFormedMember& member, const LoadClass& load, const ColdFormedKinds& kinds)
        : inputs_(&inputs), member_(&member), load_(&load), kinds_(&kinds) {}

    LimitPlans plans() {
        strength();
        deflections();
        liveliness();
        stock_length();
        return std::move(plans_);
    }

private:
    LimitPlan& plan(Limit limit) { return plans_[index_of(limit)]; }

    LimitPlan& checked(Limit limit, std::string clause, std::string unit, std::vector<std::string> parts) {
        LimitPlan& p = plan(limit);
        p.status = LimitStatus::checked;
        p.clause = std::move(clause);
        p.unit = std::move(unit);
        p.parts = std::move(parts);
        return p;
    }

    void not_applicable(Limit limit, std::string clause, std::string reason) {
        LimitPlan& p = plan(limit);
        p.status = LimitStatus::not_applicable;
        p.clause = std::move(clause);
        p.reason = std::move(reason);
    }

    std::vector<std::string> combination_labels() const {
        std::vector<std::string> labels;
        for (const CombinationCase& c : kinds_->combinations) labels.push_back(c.label);
        return labels;
    }

    void strength() {
        checked(Limit::bending, std::string(cold_formed) + "6.1.4.1, (6.4)", "Nmm", combination_labels());
        checked(Limit::shear, std::string(cold_formed) + "6.1.5, (6.8)", "N", combination_labels());
        checked(Limit::bending_with_shear, std::string(cold_formed) + "6.1.10, (6.27)", "-", combination_labels());
        if (kinds_->web_stiffened) {
            not_applicable(Limit::bearing, std::string(cold_formed) + "6.1.7",
                           "web stated as stiffened or cleated at its supports");
        } else {
            checked(Limit::bearing, std::string(cold_formed) + "6.1.7.2, (6.15a)", "N", combination_labels());
        }
        not_applicable(Limit::lateral_buckling, std::string(cold_formed) + "6.2.4",
                       "compression flange stated as held");
    }

    void deflections() {
        const SteelDeflectionLimits limits = steel_deflection_limits(*inputs_);
        deflection(Limit::variable_deflection, limits.variable);
        deflection(Limit::instantaneous_deflection, limits.instantaneous);
        not_applicable(Limit::final_deflection, std::string(cold_formed) + "7.3", "steel does not creep");
    }

    void deflection(Limit limit, const std::optional<DeflectionLimit>& asked) {
        const std::string clause = std::string(cold_formed) + "7.1(3), 7.3";
        if (!asked) return not_applicable(limit, clause, "not asked for in the brief");
        std::vector<std::string> parts;
        for (const ServiceCase& service : kinds_->service) {
            if (asked->ratio) parts.push_back(fmt::format("{}, L/{}", service.label, *asked->ratio));
            if (asked->max_mm) parts.push_back(fmt::format("{}, {} mm", service.label, *asked->max_mm));
        }
        checked(limit, clause, "mm", std::move(parts));
    }

    void liveliness() {
        frequency();
        if (inputs_->brief.limits.unit_load_deflection) {
            checked(Limit::unit_load_deflection, liveliness_clause, "mm", {"1 kN"});
        } else {
            not_applicable(Limit::unit_load_deflection, liveliness_clause, "not asked for in the brief");
        }
        not_applicable(Limit::velocity_response, "EN 1995-1-1 7.3.3", "a rule for timber floors");
    }

    void frequency() {
        const auto& asked = inputs_->brief.limits.frequency;
        if (!asked) {
            const bool timber_rule = inputs_->brief.limits.vibration.has_value();
            return not_applicable(Limit::frequency, liveliness_clause,
                                  timber_rule
                                      ? "the vibration rule of the brief is for timber; no frequency is asked for"
                                      : "not asked for in the brief");
        }
        if (!kinds_->self_weight && !have_mass(kinds_->frequency, *load_, asked->variable_share)) {
            not_applicable(Limit::frequency, liveliness_clause, "no permanent load: the joist has no mass");
            plan(Limit::frequency).status = LimitStatus::not_covered;
            return;
        }
        std::vector<std::string> parts;
        for (const ServiceCase& service : kinds_->frequency) {
            parts.push_back(service.action == Action::none
                                ? "permanent mass"
                                : fmt::format("permanent mass and {} of {}", asked->variable_share, service.label));
        }
        checked(Limit::frequency, liveliness_clause, "Hz", std::move(parts));
    }

    void stock_length() {
        if (!member_->stock_length) {
            return not_applicable(Limit::stock_length, "common practice", "no stock lengths stated");
        }
        checked(Limit::stock_length, "common practice", "mm", {"clear span with both bearings"}).capped = false;
    }

    const Inputs* inputs_;
    const ColdFormedMember* member_;
    const LoadClass* load_;
    const ColdFormedKinds* kinds_;
    LimitPlans plans_;
};

LimitPlans all_refused(const std::string& reason) {
    LimitPlans plans;
    for (LimitPlan& plan : plans) {
        plan.status = LimitStatus::not_covered;
        plan.reason = reason;
        plan.clause = "EN 1993-1-3";
    }
    return plans;
}

} // namespace

LimitPlans cold_formed_plans(const Inputs& inputs, const ColdFormedMember& member, const LoadClass& load,
                             const ColdFormedKinds& kinds) {
    if (!kinds.refusal.empty()) return all_refused(kinds.refusal);
    return Planner(inputs, member, load, kinds).plans();
}

} // namespace spanledger
