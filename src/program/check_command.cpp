// SPDX-License-Identifier: MIT
#include "commands.hpp"
#include "spanledger/engine/check_joist.hpp"
#include "spanledger/input/brief_schema.hpp"
#include "spanledger/input/quantity.hpp"
#include "spanledger/input/suggestion.hpp"
#include "spanledger/writers/check_writers.hpp"
#include "words.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <ostream>

namespace spanledger {
namespace {

constexpr double usual_timber_spacing = 1200.0; // mm

/// Reads the options that say what is proposed, and gathers what is wrong with them.
class ProposedJoist {
public:
    ProposedJoist(const CommandLine& line, const Inputs& inputs) : line_(&line), inputs_(&inputs) {}

    std::optional<CheckRequest> read() {
        const auto member = read_member(text("member"), inputs_->brief, inputs_->catalogue, diagnostics_);
        // The ranges are those of the tables' keys.
        const double spacing = read_length("spacing", "spacings_mm");
        const double clear_span = read_length("clear-span", "spans_m");
        check_load();
        if (member) check_spacing(*member, spacing);
        if (!member || diagnostics_.has_errors()) return std::nullopt;
        return CheckRequest{*member, spacing, text("load"), clear_span};
    }

    [[nodiscard]] const Diagnostics& diagnostics() const noexcept { return diagnostics_; }

private:
    [[nodiscard]] std::string text(std::string_view option) const { return line_->value(option).value_or(""); }

    static Place place(std::string_view option) { return Place{.file = "--" + std::string(option)}; }

    void error(const char* code, std::string_view option, std::string message, std::string hint) {
        diagnostics_.error(code, place(option), std::move(message), std::move(hint));
    }

    double read_length(std::string_view option, std::string_view key) {
        const QuantityResult read = read_quantity(text(option), Dimension::length, "mm");
        if (!read.value) {
            error("bad-quantity", option, read.error.message, read.error.hint);
            return 0.0;
        }
        const KeyDefinition& like = key_definition(section_definition("table"), key);
        const double of_unit = unit_factor(like.measure.unit, Dimension::length).value_or(1.0);
        const auto outside = [&](const KeyRange& range) {
            return *read.value < range.least * of_unit || *read.value > range.greatest * of_unit;
        };
        if (outside(like.hard)) {
            error("out-of-range", option,
                  fmt::format("'{}' is {:g} mm, which is outside the range", text(option), *read.value),
                  fmt::format("{}; a bare number is in mm", range_words(like.hard, like.measure)));
        } else if (outside(like.usual)) {
            warn_unusual(option, *read.value, range_words(like.usual, like.measure));
        }
        return *read.value;
    }

    void warn_unusual(std::string_view option, double value, const std::string& usual) {
        diagnostics_.warning("unusual", place(option),
                             fmt::format("{:g} mm is outside the usual range, {}", value, usual),
                             "it is used as it stands; check the number and its unit");
    }

    void check_load() {
        std::vector<std::string> names;
        for (const LoadClass& load : inputs_->brief.loads) names.push_back(load.name);
        if (std::find(names.begin(), names.end(), text("load")) != names.end()) return;
        error("unknown-load", "load", fmt::format("the brief has no load class '{}'", text("load")),
              did_you_mean(text("load"), names));
    }

    void check_spacing(const Member& member, double spacing) {
        const KeyRange usual = key_definition(section_definition("table"), "spacings_mm").usual;
        const bool timber = std::holds_alternative<TimberMember>(member);
        if (timber && spacing > usual_timber_spacing && spacing <= usual.greatest) {
            warn_unusual("spacing", spacing,
                         fmt::format("{:g} to {:g} mm for timber", usual.least, usual_timber_spacing));
        }
        const auto& widest = inputs_->brief.deck.max_spacing;
        if (widest && spacing > *widest) {
            error("deck-spacing", "spacing",
                  fmt::format("{:g} mm is wider than the deck of the brief spans, {:g} mm", spacing, *widest),
                  "take a closer spacing, or another deck in the brief");
        }
    }

    const CommandLine* line_;
    const Inputs* inputs_;
    Diagnostics diagnostics_;
};

std::string missing_options(const CommandLine& line) {
    std::string missing;
    for (const char* option : {"member", "spacing", "load", "clear-span"}) {
        if (!line.has(option)) missing += fmt::format("{}--{}", missing.empty() ? "" : ", ", option);
    }
    return missing;
}

/// The inputs with the proposed member and load class alone, for what is said of their sources.
Inputs narrowed(const Inputs& inputs, const CheckRequest& request) {
    Inputs narrow = inputs;
    MembersEntry entry;
    entry.name = member_name(request.member);
    entry.material_class = class_name(request.member);
    entry.sizes = {section_name(request.member)};
    narrow.brief.members = {entry};
    auto& loads = narrow.brief.loads;
    loads.erase(std::remove_if(loads.begin(), loads.end(), [&](const auto& load) { return load.name != request.load; }),
                loads.end());
    return narrow;
}

} // namespace

int check_command(const CommandLine& line, const Surroundings& around) {
    if (const std::string missing = missing_options(line); !missing.empty()) {
        return refuse(around, fmt::format("'check' needs {}", missing), "see spanledger check --help");
    }
    const std::optional<Inputs> inputs = read_and_report(line.operands.front(), line, around);
    if (!inputs) return exit_status::bad_input;
    ProposedJoist proposed(line, *inputs);
    const std::optional<CheckRequest> request = proposed.read();
    report_problems(proposed.diagnostics(), line, around);
    if (!request) return exit_status::bad_input;
    if (line.has("verbose")) say_sources(narrowed(*inputs, *request), line, around);
    const CheckResult result = check_joist(*inputs, *request);
    around.out << (line.has("json") ? check_json(result) : check_text(result));
    return result.verdict == Verdict::passes ? exit_status::well : exit_status::failed_check;
}

} // namespace spanledger
