// SPDX-License-Identifier: MIT
#include "spanledger/program/help.hpp"

#include <fmt/format.h>

namespace spanledger {
namespace {

std::string separated(std::span<const std::string_view> words) {
    return fmt::format("{}", fmt::join(words, " "));
}

std::string command_names() {
    std::string names;
    for (const CommandRow& row : command_table()) names += fmt::format("{}{}", names.empty() ? "" : " ", row.name);
    return names;
}

std::string option_words(const CommandRow& command) {
    std::string words;
    for (const OptionRow& row : all_options(command))
        words += fmt::format("{}--{}", words.empty() ? "" : " ", row.name);
    return words;
}

/// Without the characters that mean something to a shell inside its description of an option.
std::string plain(std::string_view text) {
    std::string result;
    for (const char c : text) {
        if (std::string_view("'\"[]:\\").find(c) == std::string_view::npos) result += c;
    }
    return result;
}

/// The two ways in which zsh is told of an option: with its letter, and without.
std::string zsh_option(const OptionRow& row) {
    const std::string rest =
        fmt::format("[{}]{}", plain(row.meaning), row.argument.empty() ? "" : fmt::format(":{}:_files", row.argument));
    if (row.letter == '\0') return fmt::format("'--{}{}'", row.name, rest);
    return fmt::format("'(-{0} --{1})'{{-{0},--{1}}}'{2}'", row.letter, row.name, rest);
}

std::string fish_option(const std::string& condition, const OptionRow& row) {
    return fmt::format("complete -c spanledger -n '{}'{} -l {}{} -d '{}'\n", condition,
                       row.letter == '\0' ? "" : fmt::format(" -s {}", row.letter), row.name,
                       row.argument.empty() ? "" : " -r", plain(row.meaning));
}

} // namespace

std::string bash_completion() {
    std::string cases;
    for (const CommandRow& row : command_table()) {
        cases += fmt::format("        {}) options=\"{}\" operands=\"{}\" ;;\n", row.name, option_words(row),
                             separated(row.words));
    }
    return fmt::format(R"(# bash completion for spanledger
_spanledger() {{
    local word=${{COMP_WORDS[COMP_CWORD]}} options="--help --version" operands=""
    case ${{COMP_WORDS[1]}} in
{}    esac
    if [[ $word == -* ]]; then
        mapfile -t COMPREPLY < <(compgen -W "$options" -- "$word")
    elif [[ $COMP_CWORD -eq 1 ]]; then
        mapfile -t COMPREPLY < <(compgen -W "{}" -- "$word")
    elif [[ $COMP_CWORD -eq 2 && -n $operands ]]; then
        mapfile -t COMPREPLY < <(compgen -W "$operands" -- "$word")
    else
        mapfile -t COMPREPLY < <(compgen -f -- "$word")
    fi
}}
complete -o filenames -F _spanledger spanledger
)",
                       cases, command_names());
}

std::string zsh_completion() {
    std::string commands;
    std::string cases;
    for (const CommandRow& row : command_table()) {
        commands += fmt::format("        '{}:{}'\n", row.name, plain(row.meaning));
        cases += fmt::format("        {})\n            _arguments -s", row.name);
        for (const OptionRow& option : all_options(row)) cases += " \\\n                " + zsh_option(option);
        const std::string first = row.words.empty() ? "" : fmt::format(" '2:topic:({})'", separated(row.words));
        cases += fmt::format("{} '*:file:_files' ;;\n", first);
    }
    return fmt::format(R"(#compdef spanledger
_spanledger() {{
    local -a commands
    commands=(
{}    )
    if (( CURRENT == 2 )); then
        _describe command commands
        return
    fi
    case $words[2] in
{}    esac
}}
_spanledger "$@"
)",
                       commands, cases);
}

std::string fish_completion() {
    const std::string no_command = fmt::format("not __fish_seen_subcommand_from {}", command_names());
    std::string text = "# fish completion for spanledger\n";
    for (const CommandRow& row : command_table()) {
        text +=
            fmt::format("complete -c spanledger -n '{}' -f -a {} -d '{}'\n", no_command, row.name, plain(row.meaning));
        const std::string this_command = fmt::format("__fish_seen_subcommand_from {}", row.name);
        if (!row.words.empty()) {
            text += fmt::format("complete -c spanledger -n '{}' -f -a '{}'\n", this_command, separated(row.words));
        }
        for (const OptionRow& option : all_options(row)) text += fish_option(this_command, option);
    }
    for (const OptionRow& option : general_options()) text += fish_option(no_command, option);
    return text;
}

} // namespace spanledger
