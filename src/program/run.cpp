// SPDX-License-Identifier: MIT
#include "spanledger/program/run.hpp"

#include "commands.hpp"
#include "spanledger/catalogue.hpp"
#include "spanledger/input/suggestion.hpp"
#include "spanledger/program/help.hpp"
#include "spanledger/version.hpp"
#include "words.hpp"

#include <algorithm>
#include <array>
#include <exception>
#include <ostream>
#include <stdexcept>

namespace spanledger {
namespace {

struct CommandEntry {
    std::string_view name;
    int (*function)(const CommandLine& line, const Surroundings& around);
};

constexpr std::array functions{
    CommandEntry{"start", start_command},
    CommandEntry{"tables", tables_command},
    CommandEntry{"check", check_command},
    CommandEntry{"catalogue", catalogue_command},
};

int run_command(const CommandLine& line, const Surroundings& around) {
    for (const CommandEntry& entry : functions) {
        if (entry.name == line.command->name) return entry.function(line, around);
    }
    throw std::logic_error("a command of the option table has no function");
}

int print_document(const std::string& name, const Surroundings& around) {
    const std::string text = document(name);
    if (text.empty()) {
        const auto words = document_words();
        return refuse(around, "no document '" + name + "'",
                      did_you_mean(name, std::vector<std::string>(words.begin(), words.end())));
    }
    around.out << text;
    return exit_status::well;
}

int run_line(std::span<const std::string> arguments, const Surroundings& around) {
    // For packagers; not an option, so that it stands in no help.
    if (arguments.size() == 2 && arguments[0] == "--print") return print_document(arguments[1], around);
    const ParsedCommandLine parsed = parse_command_line(arguments);
    if (parsed.error) return refuse(around, parsed.error->message, parsed.error->hint);
    const CommandLine& line = parsed.line;
    if (line.has("help")) {
        around.out << (line.command == nullptr ? general_help() : command_help(*line.command));
        return exit_status::well;
    }
    if (line.has("version")) {
        around.out << "spanledger " << program_version() << ", catalogue " << builtin_fingerprint() << "\n";
        return exit_status::well;
    }
    if (line.command != nullptr) return run_command(line, around);
    around.err << short_help();
    return exit_status::bad_input;
}

/// Results that did not arrive are no results, whatever they said.
int delivered(int status, const Surroundings& around) {
    around.out.flush();
    const bool has_results = status == exit_status::well || status == exit_status::failed_check;
    return has_results && !around.out ? could_not_write(around, {"standard output", "not all of it was taken"})
                                      : status;
}

int internal_fault(const Surroundings& around, std::string what) {
    std::replace(what.begin(), what.end(), '\n', ' ');
    around.err << "spanledger: internal fault: " << what << "\n";
    return exit_status::fault;
}

} // namespace

int run(std::span<const std::string> arguments, const Surroundings& around) {
    try {
        return delivered(run_line(arguments, around), around);
    } catch (const Interruption&) {
        around.err << "spanledger: interrupted; nothing was written\n";
        return exit_status::interrupted;
    } catch (const std::exception& error) {
        return internal_fault(around, error.what());
    } catch (...) {
        return internal_fault(around, "unknown");
    }
}

} // namespace spanledger
