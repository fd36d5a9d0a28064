// SPDX-License-Identifier: MIT
#include "spanledger/writers/check_writers.hpp"

#include "plain_text.hpp"
#include "status_words.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <utility>

namespace spanledger {
namespace {

constexpr double m = 0.001;  // of 1 mm
constexpr double kN = 0.001; // of 1 N

std::string_view verdict_word(Verdict verdict) {
    switch (verdict) {
    case Verdict::passes: return "PASSES";
    case Verdict::fails: return "FAILS";
    case Verdict::not_covered: break;
    }
    return "NOT COVERED";
}

/// To the safe side: three decimals, rounded up.
std::string utilisation_text(double utilisation) {
    constexpr double places = 1000.0;
    constexpr double rounding = 1e-9;
    return fmt::format("{:.3f}", std::ceil(utilisation * places - rounding) / places + 0.0);
}

/// In m, rounded down to 1 mm.
std::string metres_down(double mm) {
    constexpr double rounding = 1e-7;
    return fmt::format("{:.3f}", std::floor(mm + rounding) * m);
}

/// A printed span in m, as many decimals as it has.
std::string metres(double mm) {
    return fmt::format("{:.10g} m", mm * m);
}

/// Four figures, but whole numbers in full.
std::string figures(double value) {
    return value >= 1000.0 ? fmt::format("{:.0f}", value) : fmt::format("{:.4g}", value);
}

std::string span_text(const LimitOutcome& outcome) {
    switch (outcome.kind) {
    case LimitOutcome::Kind::spans: return metres_down(outcome.clear_span);
    case LimitOutcome::Kind::never_reached: return "never";
    case LimitOutcome::Kind::fails_at_once: return "none";
    case LimitOutcome::Kind::not_checked: break;
    }
    return "";
}

class CheckText {
public:
    explicit CheckText(const CheckResult& check) : check_(&check) {}

    std::string write() {
        verdict();
        joist();
        limits();
        not_checked();
        spans();
        deflections();
        reactions();
        neighbours();
        out_.list("Notes", check_->notes);
        out_.list("Cautions", check_->cautions);
        return out_.take();
    }

private:
    void verdict() {
        std::string line(verdict_word(check_->verdict));
        line += ": " + check_->member;
        if (check_->verdict == Verdict::not_covered) {
            if (!check_->no_span_reason.empty()) line += ", " + check_->no_span_reason;
        } else if (check_->worst) {
            line += fmt::format(", utilisation {} ({})", utilisation_text(check_->utilisation),
                                definition_of(*check_->worst).name);
        }
        out_.paragraph(line);
    }

    void joist() {
        out_.fact("Load class", check_->load);
        out_.fact("Spacing", fmt::format("{} mm", check_->spacing));
        out_.fact("Clear span", fmt::format("{:.3f} m, effective span {:.3f} m ({})", check_->clear_span * m,
                                            check_->effective_span * m, check_->span_rule));
        if (check_->cap < 1.0) out_.fact("Utilisation cap", fmt::format("{}", check_->cap));
    }

    void limits() {
        std::vector<const LimitCheck*> checked;
        for (const LimitCheck& limit : check_->limits) {
            if (limit.status == LimitStatus::checked) checked.push_back(&limit);
        }
        std::stable_sort(checked.begin(), checked.end(),
                         [](const auto* a, const auto* b) { return a->utilisation > b->utilisation; });
        if (checked.empty()) return;
        out_.heading("Limits, worst first; span: the limit's own permissible clear span");
        TextTable table({{"limit", false},
                         {"demand", true},
                         {"resistance", true},
                         {"unit", false},
                         {"utilisation", true},
                         {"span, m", true},
                         {"clause", false}});
        for (const LimitCheck* limit : checked) {
            table.add({std::string(definition_of(limit->limit).name), figures(limit->demand),
                       figures(limit->resistance), limit->unit, utilisation_text(limit->utilisation),
                       span_text(limit->outcome), limit->clause});
        }
        out_.table(table);
        combinations(checked);
    }

    void combinations(const std::vector<const LimitCheck*>& checked) {
        out_.heading("Governing combination or criterion");
        for (const LimitCheck* limit : checked) {
            std::string words = limit->combination;
            if (!limit->reason.empty()) words += (words.empty() ? "" : "; ") + limit->reason;
            if (!words.empty()) out_.fact(definition_of(limit->limit).name, words);
        }
    }

    void not_checked() {
        bool first = true;
        for (const LimitCheck& limit : check_->limits) {
            if (limit.status == LimitStatus::checked) continue;
            if (std::exchange(first, false)) out_.heading("Not checked");
            out_.fact(definition_of(limit.limit).name, fmt::format("{}: {}", status_word(limit.status), limit.reason));
        }
    }

    void spans() {
        out_.heading("Largest passing span");
        if (!check_->permissible) {
            out_.fact("clear span", "none: " + check_->no_span_reason);
        } else {
            std::string words = metres_down(*check_->permissible) + " m";
            words += check_->governing ? fmt::format(", governed by {}", definition_of(*check_->governing).name)
                                       : fmt::format(", {}", check_->no_span_reason);
            out_.fact("clear span", words);
        }
        if (check_->printed) out_.fact("in a table", metres(*check_->printed));
        if (check_->permissible_load) {
            // Rounded down to two decimals.
            const double hundredths = std::floor(*check_->permissible_load * 1e5 + 1e-7);
            out_.fact("variable load", fmt::format("up to {:.2f} kN/m2 at this clear span", hundredths / 100.0));
        }
    }

    void deflections() {
        if (check_->deflections.empty() && check_->first_frequency <= 0.0) return;
        out_.heading("Deflection and frequency");
        for (const DeflectionLine& line : check_->deflections) {
            std::string words = fmt::format("{:.1f} mm", line.mm);
            if (line.span_ratio > 0.0) words += fmt::format(", L/{:.0f}", std::floor(line.span_ratio));
            if (!line.action.empty()) words += fmt::format(" ({})", line.action);
            out_.fact(line.name, words);
        }
        if (check_->first_frequency > 0.0) {
            out_.fact("first frequency", fmt::format("{:.1f} Hz, permanent mass", check_->first_frequency));
        }
    }

    void reactions() {
        if (check_->reactions.empty()) return;
        out_.heading("Reactions at a support");
        TextTable table({{"action", false}, {"per joist", true}, {"per metre of wall", true}});
        for (const Reaction& reaction : check_->reactions) {
            table.add({reaction.action, fmt::format("{:.2f} kN", reaction.newton * kN),
                       fmt::format("{:.2f} kN/m", reaction.newton / check_->spacing)}); // N/mm is kN/m
        }
        out_.table(table);
        if (check_->bearing_length_needed) {
            out_.fact("bearing length needed",
                      fmt::format("{:.0f} mm", std::ceil(*check_->bearing_length_needed - 1e-9) + 0.0));
        }
    }

    void neighbours() {
        if (!check_->deeper && !check_->shallower && !check_->wider_spacing && !check_->closer_spacing) return;
        out_.heading("Next to it");
        neighbour("next deeper", check_->deeper);
        neighbour("next shallower", check_->shallower);
        neighbour("next wider spacing", check_->wider_spacing);
        neighbour("next closer spacing", check_->closer_spacing);
    }

    void neighbour(std::string_view name, const std::optional<Neighbour>& other) {
        if (!other) return;
        std::string words = fmt::format("{} at {} mm: {}, utilisation {}", other->member, other->spacing,
                                        other->passes ? "passes" : "fails", utilisation_text(other->utilisation));
        if (other->permissible) words += ", clear span up to " + metres(*other->permissible);
        out_.fact(name, words);
    }

    const CheckResult* check_;
    PlainText out_;
};

} // namespace

std::string check_text(const CheckResult& check) {
    return CheckText(check).write();
}

} // namespace spanledger
