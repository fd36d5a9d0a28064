// SPDX-License-Identifier: MIT
#pragma once

#include <cstddef>
#include <map>
#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <vector>

// The one table of commands and options: parser, help, man page and completions are all made from it.

namespace spanledger {

struct OptionRow {
    std::string_view name;     ///< without dashes
    char letter = '\0';        ///< short form, or none
    std::string_view argument; ///< word for the argument; empty for a switch
    std::string_view meaning;
    std::string_view otherwise = {}; ///< what holds where it is not given
};

struct CommandRow {
    std::string_view name;
    std::string_view operands; ///< as shown in usage, e.g. "BRIEF"
    std::size_t least_operands;
    std::size_t most_operands;
    std::string_view meaning;
    std::string_view example; ///< runs as printed where `start` has written its files
    std::span<const OptionRow> options;
    std::string_view choice = {};                 ///< the first operand, where it is one of `words`
    std::span<const std::string_view> words = {}; ///< empty where the first operand names a file
};

[[nodiscard]] std::span<const CommandRow> command_table() noexcept;

/// Options of every command.
[[nodiscard]] std::span<const OptionRow> general_options() noexcept;

/// Its own options, then those of every command.
[[nodiscard]] std::vector<OptionRow> all_options(const CommandRow& command);

/// "TOPIC is a, b or c.", or empty where no operand is a choice.
[[nodiscard]] std::string operand_words(const CommandRow& command);

/// What --print can print, for packagers.
[[nodiscard]] std::span<const std::string_view> document_words() noexcept;

/// What the first operand of `catalogue` may be.
[[nodiscard]] std::span<const std::string_view> catalogue_words() noexcept;

struct ExitStatusRow {
    int status;
    std::string_view meaning;
};
[[nodiscard]] std::span<const ExitStatusRow> exit_statuses() noexcept;

/// Null where there is no such command.
[[nodiscard]] const CommandRow* find_command(std::string_view name) noexcept;

/// Whether a word is planned but not covered yet: a command (`option` empty), or an option of a command.
[[nodiscard]] bool not_covered_yet(std::string_view command, std::string_view option) noexcept;

/// A command line that fits the table.
struct CommandLine {
    const CommandRow* command = nullptr;                    ///< null: none given
    std::map<std::string, std::string, std::less<>> values; ///< switches have an empty value
    std::vector<std::string> operands;

    [[nodiscard]] bool has(std::string_view option) const { return values.find(option) != values.end(); }
    [[nodiscard]] std::optional<std::string> value(std::string_view option) const;
};

struct UsageError {
    std::string message;
    std::string hint;
};

struct ParsedCommandLine {
    CommandLine line;
    std::optional<UsageError> error;
};

/// Reads the arguments after the program's name. The command comes first; only options of every command may stand
/// before it. Abbreviations are not guessed; near misses are suggested. --help counts wherever it stands before "--".
[[nodiscard]] ParsedCommandLine parse_command_line(std::span<const std::string> arguments);

} // namespace spanledger
