// SPDX-License-Identifier: MIT
#include "spanledger/program/help.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {
namespace {

constexpr std::size_t meaning_column = 27;
constexpr std::size_t command_column = 14;
constexpr std::size_t widest_line = 80;

constexpr std::string_view two_examples = "  spanledger start first-tables\n"
                                          "  spanledger tables first-tables/brief.toml\n";

/// `text` broken at spaces; every line but the first is indented, the first stands there already.
std::string wrapped(std::string_view text, std::size_t indent) {
    std::string result;
    std::size_t width = indent;
    while (!text.empty()) {
        const std::string_view word = text.substr(0, text.find(' '));
        text.remove_prefix(std::min(word.size() + 1, text.size()));
        if (width > indent && width + 1 + word.size() > widest_line) {
            result.append("\n").append(indent, ' ');
            width = indent;
        }
        if (width > indent) {
            result += ' ';
            ++width;
        }
        result += word;
        width += word.size();
    }
    return result;
}

std::string option_line(const OptionRow& row) {
    std::string head = row.letter == '\0' ? "      " : fmt::format("  -{}, ", row.letter);
    head.append("--").append(row.name);
    if (!row.argument.empty()) head.append(" ").append(row.argument);
    const bool room = head.size() + 2 <= meaning_column;
    head.append(room ? "" : "\n").append(meaning_column - (room ? head.size() : 0), ' ');
    std::string meaning(row.meaning);
    if (!row.otherwise.empty()) meaning += fmt::format(" (otherwise {})", row.otherwise);
    return head + wrapped(meaning, meaning_column) + "\n";
}

std::string options_text(std::span<const OptionRow> rows) {
    std::string text;
    for (const OptionRow& row : rows) text += option_line(row);
    return text;
}

std::string commands_text() {
    std::string text;
    for (const CommandRow& row : command_table()) {
        text += fmt::format("  {:<{}}{}\n", row.name, command_column - 2, wrapped(row.meaning, command_column));
    }
    return text;
}

std::string indented(std::string_view lines) {
    std::string text = "  ";
    for (const char c : lines) {
        text += c;
        if (c == '\n') text += "  ";
    }
    return text + "\n";
}

std::string statuses_text() {
    std::string words;
    for (const ExitStatusRow& row : exit_statuses()) {
        words += fmt::format("{}{} {}", words.empty() ? "" : ", ", row.status, row.meaning);
    }
    return wrapped("Exit status: " + words + ".", 0) + "\n";
}

} // namespace

std::string short_help() {
    return fmt::format("spanledger makes joist span tables from a material catalogue and a short brief.\n\n"
                       "{}\nspanledger --help tells more.\n",
                       two_examples);
}

std::string general_help() {
    return fmt::format("Example:\n{}\nUsage: spanledger COMMAND [OPTIONS] ...\n\n"
                       "Commands:\n{}\nOptions of every command:\n{}\n"
                       "spanledger COMMAND --help tells more of a command.\n\n{}\n{}\n",
                       two_examples, commands_text(), options_text(general_options()), statuses_text(),
                       wrapped("Results are for competent persons: local codes come first, and a licensed practitioner "
                               "decides whether a result applies to a building.",
                               0));
}

std::string command_help(const CommandRow& row) {
    const std::string operands = row.words.empty() ? "" : wrapped(operand_words(row), 0) + "\n";
    return fmt::format("Example:\n{}\nUsage: spanledger {} {} [OPTIONS]\n\n{}\n{}\nOptions:\n{}\n"
                       "Options of every command:\n{}",
                       indented(row.example), row.name, row.operands, wrapped(fmt::format("To {}.", row.meaning), 0),
                       operands, options_text(row.options), options_text(general_options()));
}

} // namespace spanledger
