// SPDX-License-Identifier: MIT
#include "words.hpp"

#include "spanledger/engine/basis_statement.hpp"

#include <fmt/format.h>

#include <ostream>

namespace spanledger {
namespace {

/// All of them, or only the errors.
Diagnostics shown_of(const Diagnostics& diagnostics, bool quiet) {
    Diagnostics shown;
    for (const Diagnostic& diagnostic : diagnostics.all()) {
        if (!quiet || diagnostic.severity == Severity::error) shown.add(diagnostic);
    }
    return shown;
}

} // namespace

void stop_if_asked(const Surroundings& around) {
    if (around.interrupted && around.interrupted()) throw Interruption{};
}

void say(const CommandLine& line, const Surroundings& around, const std::string& words) {
    if (!line.has("quiet")) around.err << words << "\n";
}

int refuse(const Surroundings& around, const std::string& message, const std::string& hint) {
    around.err << fmt::format("spanledger: {}\n    hint: {}\n", message, hint);
    return exit_status::bad_input;
}

int could_not_write(const Surroundings& around, const WriteError& error) {
    around.err << fmt::format("spanledger: could not write {}: {}\n", error.path, error.reason);
    return exit_status::could_not_write;
}

void report_problems(const Diagnostics& diagnostics, const CommandLine& line, const Surroundings& around) {
    report(shown_of(diagnostics, line.has("quiet")), around.err);
}

std::optional<Inputs> read_and_report(const std::string& brief, const CommandLine& line, const Surroundings& around) {
    Diagnostics diagnostics;
    std::optional<Inputs> inputs = read_inputs(brief, diagnostics);
    if (brief == "-") stop_if_asked(around); // a stopped wait for standard input looks like its end
    report_problems(diagnostics, line, around);
    return inputs;
}

void say_sources(const Inputs& inputs, const CommandLine& line, const Surroundings& around) {
    if (!line.has("verbose") || line.has("quiet")) return;
    around.err << fmt::format("parameter set: {}\n", inputs.catalogue.parameter_set);
    for (const SourceLine& row : source_lines(inputs)) {
        around.err << fmt::format("{} {}: {}; {}, {}{}\n", row.kind, row.item, row.value, row.source,
                                  row.seen ? "seen" : "from memory", row.practice_own ? ", practice's own" : "");
    }
}

std::string shell_word(const std::string& text) {
    constexpr std::string_view plain = "ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789_./+-";
    if (text.find_first_not_of(plain) == std::string::npos && !text.starts_with('-')) return text;
    std::string quoted = text.starts_with('-') ? "'./" : "'";
    for (const char c : text) quoted += c == '\'' ? "'\\''" : std::string(1, c);
    return quoted + "'";
}

} // namespace spanledger
