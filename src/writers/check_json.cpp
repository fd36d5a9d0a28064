// SPDX-License-Identifier: MIT
#include "spanledger/writers/check_writers.hpp"

#include "status_words.hpp"

namespace spanledger {
namespace {

constexpr double kN_m2 = 1000.0; // of 1 N/mm2
constexpr double kN = 0.001;     // of 1 N

constexpr std::string_view verdict_word(Verdict verdict) {
    switch (verdict) {
    case Verdict::passes: return "passes";
    case Verdict::fails: return "fails";
    case Verdict::not_covered: break;
    }
    return "not covered";
}

std::optional<std::string> limit_name(const std::optional<Limit>& limit) {
    return limit ? std::optional<std::string>(definition_of(*limit).name) : std::nullopt;
}

/// In mm. A limit that is exceeded at the lower bound leaves 0; one that is never reached, or not checked, nothing.
std::optional<double> span_of(const LimitOutcome& outcome) {
    switch (outcome.kind) {
    case LimitOutcome::Kind::spans: return outcome.clear_span;
    case LimitOutcome::Kind::fails_at_once: return 0.0;
    case LimitOutcome::Kind::never_reached:
    case LimitOutcome::Kind::not_checked: break;
    }
    return std::nullopt;
}

class CheckWriter {
public:
    CheckWriter(JsonText& json, const CheckResult& check) : json_(&json), check_(&check) {}

    void write() {
        json_->open_object();
        joist();
        limits();
        json_->field("span_rule", check_->span_rule);
        json_->field("utilisation_cap", check_->cap);
        json_->field("worst", limit_name(check_->worst));
        json_->field("no_span_reason", check_->no_span_reason);
        deflections();
        json_->field("first_frequency_Hz", check_->first_frequency);
        reactions();
        json_->field("bearing_length_needed_mm", check_->bearing_length_needed);
        neighbour("next_deeper", check_->deeper);
        neighbour("next_shallower", check_->shallower);
        neighbour("next_wider_spacing", check_->wider_spacing);
        neighbour("next_closer_spacing", check_->closer_spacing);
        json_->field("notes", check_->notes);
        json_->field("cautions", check_->cautions);
        json_->close_object();
    }

private:
    void joist() {
        json_->field("member", check_->member);
        json_->field("load", check_->load);
        json_->field("spacing_mm", check_->spacing);
        json_->field("clear_span_mm", check_->clear_span);
        json_->field("effective_span_mm", check_->effective_span);
        json_->field("verdict", verdict_word(check_->verdict));
        json_->field("governing", limit_name(check_->governing));
        json_->field("utilisation", check_->utilisation);
        json_->field("permissible_clear_span_mm", check_->permissible);
        json_->field("printed_clear_span_mm", check_->printed);
        json_->field("permissible_load_kN_m2", in_unit(check_->permissible_load, kN_m2));
    }

    void limits() {
        json_->key("limits");
        json_->open_list();
        for (const LimitCheck& limit : check_->limits) write_limit(limit);
        json_->close_list();
    }

    void write_limit(const LimitCheck& limit) {
        const auto if_checked = [&](double number) {
            return limit.status == LimitStatus::checked ? std::optional(number) : std::nullopt;
        };
        json_->open_object();
        json_->field("limit", definition_of(limit.limit).name);
        json_->field("status", status_word(limit.status));
        json_->field("reason", limit.reason);
        json_->field("utilisation", if_checked(limit.utilisation));
        json_->field("demand", if_checked(limit.demand));
        json_->field("resistance", if_checked(limit.resistance));
        json_->field("unit", limit.unit);
        json_->field("clause", limit.clause);
        json_->field("combination", limit.combination);
        json_->field("permissible_clear_span_mm", span_of(limit.outcome));
        json_->close_object();
    }

    void deflections() {
        json_->key("deflections");
        json_->open_list();
        for (const DeflectionLine& line : check_->deflections) {
            json_->open_object();
            json_->field("deflection", line.name);
            json_->field("action", line.action);
            json_->field("mm", line.mm);
            json_->field("span_ratio", line.span_ratio);
            json_->close_object();
        }
        json_->close_list();
    }

    void reactions() {
        json_->key("reactions");
        json_->open_list();
        for (const Reaction& reaction : check_->reactions) {
            json_->open_object();
            json_->field("action", reaction.action);
            json_->field("per_joist_kN", in_unit(reaction.newton, kN));
            json_->field("per_metre_kN_m", in_unit(reaction.newton / check_->spacing, 1.0)); // N/mm is kN/m
            json_->close_object();
        }
        json_->close_list();
    }

    void neighbour(std::string_view name, const std::optional<Neighbour>& neighbour) {
        json_->key(name);
        if (!neighbour) return json_->null();
        json_->open_object();
        json_->field("member", neighbour->member);
        json_->field("spacing_mm", neighbour->spacing);
        json_->field("passes", neighbour->passes);
        json_->field("utilisation", neighbour->utilisation);
        json_->field("permissible_clear_span_mm", neighbour->permissible);
        json_->close_object();
    }

    JsonText* json_;
    const CheckResult* check_;
};

} // namespace

void write_check(JsonText& json, const CheckResult& check) {
    CheckWriter(json, check).write();
}

std::string check_json(const CheckResult& check) {
    constexpr std::size_t levels_in_lines = 2;
    JsonText json(levels_in_lines);
    write_check(json, check);
    return json.take();
}

} // namespace spanledger
