// SPDX-License-Identifier: MIT
#include "rolled_plans.hpp"

#include "steel_deflection_limits.hpp"
#include "steel_frequency.hpp"

#include <fmt/format.h>

namespace spanledger {
namespace {

constexpr const char* ec3 = "EN 1993-1-1 ";

class Planner {
public:
    Planner(const Inputs& inputs, const RolledMember& member, const LoadClass& load, const RolledKinds& kinds)
        : inputs_(&inputs), member_(&member), load_(&load), kinds_(&kinds) {}

    LimitPlans plans() {
        strength();
        web_at_support();
        lateral_buckling();
        deflections();
        liveliness();
        stock_length();
        return std::move(plans_);
    }

private:
    LimitPlan& plan(Limit limit) { return plans_[index_of(limit)]; }

    LimitPlan& checked(Limit limit, std::string clause, const char* unit, std::vector<std::string> parts) {
        LimitPlan& p = plan(limit);
        p.status = LimitStatus::checked;
        p.clause = std::move(clause);
        p.unit = unit;
        p.parts = std::move(parts);
        return p;
    }

    LimitPlan& not_applicable(Limit limit, std::string clause, std::string reason) {
        LimitPlan& p = plan(limit);
        p.status = LimitStatus::not_applicable;
        p.clause = std::move(clause);
        p.reason = std::move(reason);
        return p;
    }

    void not_covered(Limit limit, std::string clause, std::string reason) {
        not_applicable(limit, std::move(clause), std::move(reason)).status = LimitStatus::not_covered;
    }

    std::vector<std::string> combination_labels() const {
        std::vector<std::string> labels;
        for (const CombinationCase& c : kinds_->combinations) labels.push_back(c.label);
        return labels;
    }

    void strength() {
        checked(Limit::bending, std::string(ec3) + "6.2.5", "Nmm", combination_labels());
        checked(Limit::shear, std::string(ec3) + "6.2.6, EN 1993-1-5 5.3", "N", combination_labels());
        std::vector<std::string> sections;
        for (const CombinationCase& c : kinds_->combinations) {
            if (kinds_->cantilever) {
                sections.push_back(c.label + ", at the root");
            } else {
                sections.push_back(c.label + ", where V = V_Rd/2");
                sections.push_back(c.label + ", where V = V_Rd");
            }
        }
        checked(Limit::bending_with_shear, std::string(ec3) + "6.2.8", "Nmm", std::move(sections));
    }

    void web_at_support() {
        const std::string clause = "EN 1993-1-5 6, type (c)";
        if (kinds_->cantilever) {
            not_applicable(Limit::bearing, clause,
                           "cantilever: the bearing of the root and its hold-down are the reader's");
        } else if (kinds_->web_stiffened) {
            not_applicable(Limit::bearing, clause, "web stated as stiffened or cleated at its supports");
        } else {
            checked(Limit::bearing, clause, "N", combination_labels());
        }
    }

    void lateral_buckling() {
        const bool rolled = kinds_->lateral_curves == LateralCurves::rolled_sections;
        const std::string clause = std::string(ec3) + (rolled ? "6.3.2.3" : "6.3.2.2");
        if (inputs_->brief.support.compression_edge == CompressionEdge::held) {
            not_applicable(Limit::lateral_buckling, clause,
                           kinds_->cantilever ? "compression flange (the bottom flange of a cantilever) stated as held"
                                              : "compression flange stated as held");
        } else if (kinds_->cantilever) {
            not_covered(Limit::lateral_buckling, clause,
                        "a cantilever whose compression flange (the bottom flange) is free is not covered");
        } else if (kinds_->channel) {
            not_covered(Limit::lateral_buckling, clause, "a channel whose compression flange is free is not covered");
        } else {
            checked(Limit::lateral_buckling, clause, "Nmm", combination_labels());
        }
    }

    void deflections() {
        const SteelDeflectionLimits limits = steel_deflection_limits(*inputs_);
        deflection(Limit::variable_deflection, limits.variable);
        deflection(Limit::instantaneous_deflection, limits.instantaneous);
        not_applicable(Limit::final_deflection, std::string(ec3) + "7.2.1", "steel does not creep");
    }

    void deflection(Limit limit, const std::optional<DeflectionLimit>& asked) {
        const std::string clause = std::string(ec3) + "7.2.1, EN 1990 A1.4.3";
        if (!asked) {
            not_applicable(limit, clause, "not asked for in the brief");
            return;
        }
        std::vector<std::string> parts;
        for (const ServiceCase& service : kinds_->service) {
            if (asked->ratio) parts.push_back(fmt::format("{}, L/{}", service.label, *asked->ratio));
            if (asked->max_mm) parts.push_back(fmt::format("{}, {} mm", service.label, *asked->max_mm));
        }
        checked(limit, clause, "mm", std::move(parts));
    }

    void liveliness() {
        const std::string clause = std::string(ec3) + "7.2.3, EN 1990 A1.4.4";
        not_applicable(Limit::velocity_response, "EN 1995-1-1 7.3.3", "a rule for timber floors");
        if (kinds_->cantilever) {
            const char* reason = "cantilever: the rule is for joists on two supports";
            not_applicable(Limit::frequency, clause, reason);
            not_applicable(Limit::unit_load_deflection, clause, reason);
            return;
        }
        frequency(clause);
        if (inputs_->brief.limits.unit_load_deflection) {
            checked(Limit::unit_load_deflection, clause, "mm", {"1 kN"});
        } else {
            not_applicable(Limit::unit_load_deflection, clause, not_asked_for());
        }
    }

    std::string not_asked_for() const {
        return inputs_->brief.limits.vibration
                   ? "the vibration rule of the brief is for timber; nothing of the kind is asked for steel"
                   : "not asked for in the brief";
    }

    void frequency(const std::string& clause) {
        const auto& asked = inputs_->brief.limits.frequency;
        if (!asked) {
            not_applicable(Limit::frequency, clause, not_asked_for());
            return;
        }
        if (!kinds_->self_weight && !have_mass(kinds_->frequency, *load_, asked->variable_share)) {
            return not_covered(Limit::frequency, clause, "no permanent load: the joist has no mass");
        }
        std::vector<std::string> parts;
        for (const ServiceCase& service : kinds_->frequency) {
            parts.push_back(service.action == Action::none
                                ? "permanent mass"
                                : fmt::format("permanent mass and {} of {}", asked->variable_share, service.label));
        }
        checked(Limit::frequency, clause, "Hz", std::move(parts));
    }

    void stock_length() {
        if (!member_->stock_length) {
            not_applicable(Limit::stock_length, "common practice", "no stock lengths stated");
            return;
        }
        checked(Limit::stock_length, "common practice", "mm", {"clear span with both bearings"}).capped = false;
    }

    const Inputs* inputs_;
    const RolledMember* member_;
    const LoadClass* load_;
    const RolledKinds* kinds_;
    LimitPlans plans_;
};

LimitPlans all_refused(const std::string& reason) {
    LimitPlans plans;
    for (LimitPlan& plan : plans) {
        plan.status = LimitStatus::not_covered;
        plan.reason = reason;
        plan.clause = "EN 1993-1-1 5.5";
    }
    return plans;
}

} // namespace

LimitPlans rolled_plans(const Inputs& inputs, const RolledMember& member, const LoadClass& load,
                        const RolledKinds& kinds) {
    if (!kinds.refusal.empty()) return all_refused(kinds.refusal);
    return Planner(inputs, member, load, kinds).plans();
}

} // namespace spanledger
