// SPDX-License-Identifier: MIT
#include "spanledger/input/suggestion.hpp"
#include "spanledger/program/options.hpp"

#include <boost/program_options.hpp>
#include <fmt/format.h>

#include <algorithm>

namespace spanledger {
namespace {

namespace po = boost::program_options;

std::vector<OptionRow> options_for(const CommandRow* command) {
    const auto general = general_options();
    return command == nullptr ? std::vector<OptionRow>(general.begin(), general.end()) : all_options(*command);
}

po::options_description describe(const std::vector<OptionRow>& rows) {
    po::options_description description;
    for (const OptionRow& row : rows) {
        std::string names(row.name);
        if (row.letter != '\0') names.append(",").append(1, row.letter);
        if (row.argument.empty()) {
            description.add_options()(names.c_str(), "");
        } else {
            description.add_options()(names.c_str(), po::value<std::string>(), "");
        }
    }
    description.add_options()("operand", po::value<std::vector<std::string>>(), "");
    return description;
}

std::vector<std::string> option_names(const CommandRow* command) {
    std::vector<std::string> names;
    for (const OptionRow& row : options_for(command)) names.push_back("--" + std::string(row.name));
    return names;
}

UsageError unknown_command(const std::string& name) {
    if (not_covered_yet(name, "")) {
        return {fmt::format("the command '{}' is not covered yet", name), "see spanledger --help"};
    }
    std::vector<std::string> names;
    for (const CommandRow& row : command_table()) names.emplace_back(row.name);
    return {fmt::format("unknown command '{}'", name), did_you_mean(name, names)};
}

UsageError unknown_option(std::string option, const CommandRow* command) {
    option.erase(std::min(option.find('='), option.size()));
    const std::string bare = option.substr(std::min(option.find_first_not_of('-'), option.size()));
    if (command == nullptr) {
        return {fmt::format("unknown option '{}' before the command", option),
                did_you_mean(option, option_names(command))};
    }
    if (not_covered_yet(command->name, bare)) {
        return {fmt::format("the option '{}' of {} is not covered yet", option, command->name),
                fmt::format("see spanledger {} --help", command->name)};
    }
    return {fmt::format("unknown option '{}' of {}", option, command->name),
            did_you_mean(option, option_names(command))};
}

// Thin over the exceptions of the library: each becomes a message of our own and what would be right.
UsageError usage_error(const po::error& error, const CommandRow* command) {
    if (const auto* unknown = dynamic_cast<const po::unknown_option*>(&error)) {
        return unknown_option(unknown->get_option_name(), command);
    }
    if (const auto* repeated = dynamic_cast<const po::multiple_occurrences*>(&error)) {
        return {fmt::format("the option '{}' is given more than once", repeated->get_option_name()), "give it once"};
    }
    if (const auto* syntax = dynamic_cast<const po::invalid_syntax*>(&error)) {
        const std::string option = syntax->get_option_name();
        if (syntax->kind() == po::invalid_syntax::extra_parameter) {
            return {fmt::format("the option '{}' takes no argument", option), fmt::format("write {} alone", option)};
        }
        return {fmt::format("the option '{}' needs an argument", option),
                fmt::format("write {} and its argument", option)};
    }
    return {error.what(), "see spanledger --help"};
}

CommandLine fitted(const CommandRow* command, const po::variables_map& map) {
    CommandLine line;
    line.command = command;
    for (const auto& [name, value] : map) {
        if (name == "operand") {
            line.operands = value.as<std::vector<std::string>>();
        } else {
            const auto* text = boost::any_cast<std::string>(&value.value());
            line.values[name] = text == nullptr ? std::string() : *text;
        }
    }
    return line;
}

/// Everything but the command's name. "--" ends the options; "-" alone is an operand.
ParsedCommandLine parse_options(const CommandRow* command, const std::vector<std::string>& arguments) {
    namespace style = po::command_line_style;
    const po::options_description description = describe(options_for(command));
    po::positional_options_description positions;
    positions.add("operand", -1);
    try {
        po::variables_map map;
        po::store(po::command_line_parser(arguments)
                      .options(description)
                      .positional(positions)
                      .style(style::unix_style & ~style::allow_guessing)
                      .run(),
                  map);
        return {fitted(command, map), std::nullopt};
    } catch (const po::error& error) {
        return {{}, usage_error(error, command)};
    }
}

std::optional<UsageError> operands_error(const CommandLine& line) {
    const CommandRow& command = *line.command;
    const std::string usage = fmt::format("spanledger {} {}", command.name, command.operands);
    if (line.operands.size() < command.least_operands) {
        return UsageError{fmt::format("'{}' needs {}", command.name, command.operands), usage};
    }
    if (line.operands.size() > command.most_operands) {
        return UsageError{fmt::format("'{}' takes {} and no more; '{}' is left over", command.name, command.operands,
                                      line.operands[command.most_operands]),
                          usage};
    }
    const bool empty = std::any_of(line.operands.begin(), line.operands.end(), [](const auto& o) { return o.empty(); });
    return empty ? std::optional(UsageError{fmt::format("an empty argument of '{}'", command.name), usage})
                 : std::nullopt;
}

bool asks_for_help(std::span<const std::string> arguments) {
    const auto end = std::find(arguments.begin(), arguments.end(), "--");
    return std::any_of(arguments.begin(), end, [](const auto& a) { return a == "--help" || a == "-h"; });
}

ParsedCommandLine help_for(const CommandRow* command) {
    ParsedCommandLine parsed;
    parsed.line.command = command;
    parsed.line.values["help"] = "";
    return parsed;
}

} // namespace

ParsedCommandLine parse_command_line(std::span<const std::string> arguments) {
    std::vector<std::string> rest(arguments.begin(), arguments.end());
    const auto named = std::find_if(rest.begin(), rest.end(), [](const std::string& argument) {
        return argument.empty() || argument[0] != '-' || argument == "-";
    });
    const CommandRow* const command = named == rest.end() ? nullptr : find_command(*named);
    if (asks_for_help(arguments)) return help_for(command);
    const std::vector<std::string> before(rest.begin(), named);
    ParsedCommandLine parsed = parse_options(nullptr, before);
    if (parsed.error || named == rest.end()) return parsed;
    if (command == nullptr) return {{}, unknown_command(*named)};
    rest.erase(named);
    parsed = parse_options(command, rest);
    if (parsed.error || parsed.line.has("help") || parsed.line.has("version")) return parsed;
    parsed.error = operands_error(parsed.line);
    return parsed;
}

} // namespace spanledger
