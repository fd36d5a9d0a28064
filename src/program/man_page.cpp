// SPDX-License-Identifier: MIT
#include "spanledger/program/help.hpp"
#include "spanledger/version.hpp"

#include <fmt/format.h>

namespace spanledger {
namespace {

/// Text that roff takes as it is: backslashes and hyphens keep their meaning, no line looks like a request.
std::string roff(std::string_view text) {
    std::string result;
    bool line_begins = true;
    for (const char c : text) {
        if (line_begins && (c == '.' || c == '\'')) result += "\\&";
        line_begins = c == '\n';
        if (c == '\\') {
            result += "\\e";
        } else if (c == '-') {
            result += "\\-";
        } else {
            result += c;
        }
    }
    return result;
}

/// A paragraph behind a tag in bold.
std::string tagged(std::string_view tag, std::string_view words) {
    return fmt::format(".TP\n.B {}\n{}\n", roff(tag), roff(words));
}

std::string options_text(std::span<const OptionRow> rows) {
    std::string text;
    for (const OptionRow& row : rows) {
        const std::string letter = row.letter == '\0' ? "" : fmt::format("\\-{}, ", row.letter);
        const std::string argument = row.argument.empty() ? "" : fmt::format(" \\fI{}\\fR", row.argument);
        const std::string otherwise = row.otherwise.empty() ? "" : fmt::format(" (otherwise {})", row.otherwise);
        text += fmt::format(".TP\n\\fB{}\\-\\-{}\\fR{}\n{}{}.\n", letter, roff(row.name), argument, roff(row.meaning),
                            roff(otherwise));
    }
    return text;
}

std::string commands_text() {
    std::string text;
    for (const CommandRow& row : command_table()) {
        const std::string operands = row.words.empty() ? "" : roff(operand_words(row)) + "\n";
        text += fmt::format(".SS spanledger {} {}\nTo {}.\n{}{}", row.name, row.operands, roff(row.meaning), operands,
                            options_text(row.options));
    }
    return text;
}

std::string statuses_text() {
    std::string text = ".SH EXIT STATUS\n";
    for (const ExitStatusRow& row : exit_statuses()) {
        text += tagged(fmt::format("{}", row.status), fmt::format("{}.", row.meaning));
    }
    return text;
}

std::string files_text() {
    return ".SH FILES\n" +
           tagged("BRIEF", "What to produce, as TOML. \"-\" reads standard input. Its keys are in the input reference, "
                           "which \"spanledger --print input-reference\" prints.") +
           tagged("NUMBER-REVISION.xlsx", "An issued set of tables as a workbook.") +
           tagged("NUMBER-REVISION.csv", "The same with one line for each cell.") +
           tagged("NUMBER-REVISION.json", "The record of the issue: all that is needed to make it again.");
}

std::string environment_text() {
    return ".SH ENVIRONMENT\n" +
           tagged("SOURCE_DATE_EPOCH",
                  "Seconds since 1970-01-01, UTC: the date of an issue whose brief states none. The clock is never "
                  "read.") +
           tagged("NO_COLOR, TERM", "Make no difference: nothing that is printed holds colours or escape codes.");
}

std::string examples_text() {
    std::string text;
    for (const CommandRow& row : command_table()) {
        const char* const between = text.empty() ? ".SH EXAMPLES" : ".PP";
        text += fmt::format("{}\nTo {}:\n.PP\n.EX\n{}\n.EE\n", between, roff(row.meaning), roff(row.example));
    }
    return text;
}

std::string packagers_text() {
    std::string words;
    for (const std::string_view word : document_words()) words += fmt::format("{}{}", words.empty() ? "" : ", ", word);
    return fmt::format(
        ".SH FOR PACKAGERS\n\"spanledger {} \\fIDOCUMENT\\fR\" prints what comes with the program: {}.\n",
        roff("--print"), roff(words));
}

} // namespace

std::string man_page() {
    return fmt::format(".TH SPANLEDGER 1 \"\" \"spanledger {}\" \"User commands\"\n", program_version()) +
           ".SH NAME\nspanledger \\- joist span tables from a material catalogue and a short brief\n"
           ".SH SYNOPSIS\n.B spanledger\n\\fICOMMAND\\fR [\\fIOPTIONS\\fR] ...\n"
           ".SH DESCRIPTION\nMakes joist span tables of a practice, checks proposed joists against every limit, and "
           "shows what is known, with its sources.\nResults go to standard output, words to standard error.\n.PP\n"
           "Results are for competent persons: local codes come first, and a licensed practitioner decides whether a "
           "result applies to a building.\n"
           ".SH COMMANDS\n" +
           commands_text() + ".SS Options of every command\n" + options_text(general_options()) + statuses_text() +
           files_text() + environment_text() + examples_text() + packagers_text();
}

} // namespace spanledger
