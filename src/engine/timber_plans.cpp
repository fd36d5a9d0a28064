// SPDX-License-Identifier: MIT
#include "timber_plans.hpp"

#include <fmt/format.h>

#include <array>

namespace spanledger {
namespace {

constexpr const char* ec5 = "EN 1995-1-1 ";

class Planner {
public:
    Planner(const Inputs& inputs, const TimberMember& member, const LoadClass& load, const TimberKinds& kinds)
        : inputs_(&inputs), member_(&member), load_(&load), kinds_(&kinds) {}

    LimitPlans plans() {
        strength();
        deflections();
        vibration();
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
        checked(Limit::bending, std::string(ec5) + "6.1.6", "MPa", combination_labels());
        checked(Limit::shear, std::string(ec5) + "6.1.7", "MPa", combination_labels());
        not_applicable(Limit::bending_with_shear, "EN 1995-1-1",
                       "EN 1995-1-1 has no interaction of bending with shear");
        if (kinds_->cantilever) {
            not_applicable(Limit::bearing, std::string(ec5) + "6.1.5",
                           "cantilever: the bearing of the root and its hold-down are the reader's");
        } else {
            checked(Limit::bearing, std::string(ec5) + "6.1.5", "MPa", combination_labels());
        }
        const bool general = kinds_->buckling_rule == BucklingRule::general;
        const std::string buckling = std::string(ec5) + (general ? "6.3.3, (6.31)" : "6.3.3, (6.32)");
        if (inputs_->brief.support.compression_edge == CompressionEdge::held) {
            not_applicable(Limit::lateral_buckling, buckling,
                           kinds_->cantilever ? "compression edge (the bottom edge of a cantilever) stated as held"
                                              : "compression edge stated as held");
        } else {
            checked(Limit::lateral_buckling, buckling, "MPa", combination_labels());
        }
    }

    void deflections() {
        const LimitsAsked& limits = inputs_->brief.limits;
        deflection(Limit::variable_deflection, limits.variable_deflection, "2.2.3, 7.2");
        deflection(Limit::instantaneous_deflection, limits.instantaneous_deflection, "2.2.3(2), 7.2");
        deflection(Limit::final_deflection, limits.final_deflection,
                   kinds_->camber ? "2.2.3(3), (7.2)" : "2.2.3(3), 7.2");
    }

    void deflection(Limit limit, const std::optional<DeflectionLimit>& asked, const char* clause) {
        if (!asked) return not_applicable(limit, std::string(ec5) + clause, "not asked for in the brief");
        std::vector<std::string> parts;
        for (const ServiceCase& service : kinds_->service) {
            if (asked->ratio) parts.push_back(fmt::format("{}, L/{}", service.label, *asked->ratio));
            if (asked->max_mm) parts.push_back(fmt::format("{}, {} mm", service.label, *asked->max_mm));
        }
        checked(limit, std::string(ec5) + clause, "mm", std::move(parts));
    }

    bool is_roof() const {
        const LoadCategory* category = find_load_category(inputs_->catalogue, load_->category);
        return category != nullptr && category->roof;
    }

    void vibration() {
        constexpr std::array limits{Limit::frequency, Limit::unit_load_deflection, Limit::velocity_response};
        std::string reason;
        if (!inputs_->brief.limits.vibration) {
            reason = "vibration not asked for in the brief";
        } else if (kinds_->cantilever) {
            reason = "cantilever: the rule is for floors on two supports";
        } else if (is_roof()) {
            reason = "roof: the rule is for floors of dwellings";
        }
        if (!reason.empty()) {
            for (const Limit limit : limits) not_applicable(limit, std::string(ec5) + "7.3.3", reason);
            return;
        }
        const bool no_mass = load_->permanent + load_->permanent_partitions <= 0.0 && !kinds_->self_weight;
        if (no_mass) {
            for (const Limit limit : limits) {
                not_applicable(limit, std::string(ec5) + "7.3.3", "no permanent load: the floor has no mass");
                plan(limit).status = LimitStatus::not_covered;
            }
            return;
        }
        const bool uk = kinds_->vibration == VibrationRuleSet::uk;
        LimitPlan& frequency =
            checked(Limit::frequency, std::string(ec5) + "7.3.3(1), (7.5)", "Hz", {"permanent mass"});
        frequency.strict = true;
        frequency.when_failing = "at or below 8 Hz a special investigation is needed (EN 1995-1-1 7.3.3(1))";
        checked(Limit::unit_load_deflection,
                std::string(ec5) + (uk ? "7.3.3(2), (7.3); UK NA.2.6, Table NA.5" : "7.3.3(2), (7.3)"), "mm", {"1 kN"});
        checked(Limit::velocity_response,
                std::string(ec5) + (uk ? "7.3.3(2), (7.4), (7.6); UK NA.2.6" : "7.3.3(2), (7.4), (7.6)"), "m/(N s2)",
                {"unit impulse"});
    }

    void stock_length() {
        if (!member_->stock_length) {
            return not_applicable(Limit::stock_length, "common practice", "no stock lengths stated");
        }
        checked(Limit::stock_length, "common practice", "mm", {"clear span with both bearings"}).capped = false;
    }

    const Inputs* inputs_;
    const TimberMember* member_;
    const LoadClass* load_;
    const TimberKinds* kinds_;
    LimitPlans plans_;
};

} // namespace

LimitPlans timber_plans(const Inputs& inputs, const TimberMember& member, const LoadClass& load,
                        const TimberKinds& kinds) {
    return Planner(inputs, member, load, kinds).plans();
}

} // namespace spanledger
