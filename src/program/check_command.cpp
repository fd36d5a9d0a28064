// SPDX-License-Identifier: MIT
#include "commands.hpp"

#include "spanledger/engine/check_joist.hpp"
#include "spanledger/input/quantity.hpp"
#include "spanledger/input/suggestion.hpp"
#include "spanledger/writers/check_writers.hpp"

#include <fmt/format.h>

#include <array>
#include <ostream>

namespace spanledger {
namespace {

struct LengthRange {
    double least;
    double greatest;
};

/// Reads the options of a check and gathers what is wrong with them.
class CheckOptions {
public:
    CheckOptions(const CommandLine& line, const Inputs& inputs) : line_(&line), inputs_(&inputs) {}

    std::optional<CheckRequest> read() {
        const auto member = read_member_option();
        const double spacing = read_length("spacing", {50.0, 10000.0});
        const double clear_span = read_length("clear-span", {100.0, 60000.0});
        check_load();
        check_deck(spacing);
        if (!member || diagnostics_.has_errors()) return std::nullopt;
        return CheckRequest{*member, spacing, *line_->value("load"), clear_span};
    }

    [[nodiscard]] const Diagnostics& diagnostics() const noexcept { return diagnostics_; }

private:
    void error(const char* code, std::string_view option, std::string message, std::string hint) {
        Place place;
        place.file = "--" + std::string(option);
        diagnostics_.error(code, std::move(place), std::move(message), std::move(hint));
    }

    std::optional<Member> read_member_option() {
        const auto text = line_->value("member");
        return text ? read_member(*text, inputs_->brief, inputs_->catalogue, diagnostics_) : std::nullopt;
    }

    double read_length(std::string_view option, LengthRange range) {
        const auto text = line_->value(option);
        if (!text) return 0.0;
        const QuantityResult read = read_quantity(*text, Dimension::length, "mm");
        if (!read.value) {
            error("bad-quantity", option, read.error.message, read.error.hint);
            return 0.0;
        }
        if (*read.value < range.least || *read.value > range.greatest) {
            error("out-of-range", option, fmt::format("'{}' is not possible", *text),
                  fmt::format("from {} to {} mm; a bare number is in mm", range.least, range.greatest));
        }
        return *read.value;
    }

    void check_load() {
        const auto name = line_->value("load");
        if (!name) return;
        std::vector<std::string> names;
        for (const LoadClass& load : inputs_->brief.loads) names.push_back(load.name);
        if (std::find(names.begin(), names.end(), *name) != names.end()) return;
        error("unknown-load", "load", fmt::format("the brief has no load class '{}'", *name), did_you_mean(*name, names));
    }

    void check_deck(double spacing) {
        const auto& widest = inputs_->brief.deck.max_spacing;
        if (widest && spacing > *widest) {
            error("deck-spacing", "spacing", fmt::format("{} mm is wider than the deck spans ({} mm)", spacing, *widest),
                  "take a closer spacing, or a stiffer deck in the brief");
        }
    }

    const CommandLine* line_;
    const Inputs* inputs_;
    Diagnostics diagnostics_;
};

} // namespace

int check_command(const CommandLine& line, const Surroundings& around) {
    constexpr std::array needed{"member", "spacing", "load", "clear-span"};
    for (const char* option : needed) {
        if (!line.has(option)) {
            return refuse(around, fmt::format("check needs --{}", option), "see spanledger check --help");
        }
    }
    const std::optional<Inputs> inputs = read_and_report(line.operands.front(), line, around);
    if (!inputs) return exit_status::bad_input;
    CheckOptions options(line, *inputs);
    const std::optional<CheckRequest> request = options.read();
    report_problems(options.diagnostics(), line, around);
    if (!request) return exit_status::bad_input;
    const CheckResult result = check_joist(*inputs, *request);
    around.out << (line.has("json") ? check_json(result) : check_text(result));
    return result.verdict == Verdict::passes ? exit_status::well : exit_status::failed_check;
}

} // namespace spanledger
