// SPDX-License-Identifier: MIT
#include "spanledger/program/options.hpp"

#include <algorithm>
#include <array>
#include <utility>

namespace spanledger {
namespace {

constexpr OptionRow json_option{"json", '\0', "", "print the result as JSON"};

constexpr std::array start_options{
    OptionRow{"catalogue", '\0', "", "also write the built-in catalogue files, into the folder catalogue in DIR"},
};

constexpr std::array tables_options{
    OptionRow{"out", 'o', "DIR", "folder for the issued files", "output"},
    OptionRow{"replace", '\0', "", "replace a revision that is issued already"},
};

constexpr std::array check_options{
    OptionRow{"member", 'm', "MEMBER", "the joist: class, one space, size, such as \"C24 47x220\""},
    OptionRow{"spacing", 's', "LENGTH", "spacing of the joists; a bare number is in mm"},
    OptionRow{"load", 'l', "NAME", "a load class of the brief"},
    OptionRow{"clear-span", 'c', "LENGTH", "from face to face of the supports; a bare number is in mm"},
    json_option,
};

constexpr std::array catalogue_options{
    OptionRow{"brief", 'b', "BRIEF", "with the parameters and the practice's files of a brief",
              "the built-in rows and the recommended parameters"},
    json_option,
};

constexpr std::array<std::string_view, 7> topics{"classes",    "series", "sections", "loads",
                                                 "parameters", "limits", "sources"};

constexpr std::array commands{
    CommandRow{"start", "DIR", 1, 1,
               "write a commented brief, schedule, floor list and rates of an invented project, which run unchanged",
               "spanledger start first-tables", start_options},
    CommandRow{"tables", "BRIEF", 1, 1, "work out the tables of a brief and issue them as workbook, CSV and JSON",
               "spanledger tables brief.toml", tables_options},
    CommandRow{"check", "BRIEF", 1, 1, "check one proposed joist against every limit of a brief",
               "spanledger check brief.toml --member \"C24 47x220\" --spacing 400 \\\n"
               "    --load \"Dwelling, G 0.50\" --clear-span 3.9m",
               check_options},
    CommandRow{"catalogue", "[TOPIC [NAME]]", 0, 2, "print what is known, with its sources",
               "spanledger catalogue classes C24", catalogue_options, "TOPIC", topics},
};

constexpr std::array general{
    OptionRow{"help", 'h', "", "show help"},
    OptionRow{"version", '\0', "", "show version and catalogue fingerprint"},
    OptionRow{"quiet", 'q', "", "print no words but errors on standard error"},
    OptionRow{"verbose", 'v', "", "say on standard error where values come from"},
};

constexpr std::array<std::string_view, 5> documents{"man", "bash", "zsh", "fish", "input-reference"};

constexpr std::array statuses{
    ExitStatusRow{0, "all well"},           ExitStatusRow{1, "a check failed or is not covered"},
    ExitStatusRow{2, "bad input or usage"}, ExitStatusRow{3, "could not write"},
    ExitStatusRow{4, "internal fault"},     ExitStatusRow{130, "interrupted"},
};

using Words = std::pair<std::string_view, std::string_view>;

constexpr std::array later{
    Words{"compare", ""},  Words{"changes", ""},    Words{"check", "schedule"}, Words{"check", "against"},
    Words{"check", "out"}, Words{"check", "sheet"}, Words{"tables", "since"},
};

} // namespace

std::span<const CommandRow> command_table() noexcept {
    return commands;
}
std::span<const OptionRow> general_options() noexcept {
    return general;
}
std::span<const std::string_view> document_words() noexcept {
    return documents;
}
std::span<const std::string_view> catalogue_words() noexcept {
    return topics;
}
std::span<const ExitStatusRow> exit_statuses() noexcept {
    return statuses;
}

std::vector<OptionRow> all_options(const CommandRow& command) {
    std::vector<OptionRow> rows(command.options.begin(), command.options.end());
    rows.insert(rows.end(), general.begin(), general.end());
    return rows;
}

std::string operand_words(const CommandRow& command) {
    std::string text;
    for (std::size_t i = 0; i < command.words.size(); ++i) {
        const bool last = i + 1 == command.words.size();
        text.append(i == 0 ? "" : last ? " or " : ", ").append(command.words[i]);
    }
    return text.empty() ? text : std::string(command.choice) + " is " + text + ".";
}

const CommandRow* find_command(std::string_view name) noexcept {
    const auto* const found =
        std::find_if(commands.begin(), commands.end(), [&](const CommandRow& row) { return row.name == name; });
    return found == commands.end() ? nullptr : found;
}

bool not_covered_yet(std::string_view command, std::string_view option) noexcept {
    return std::find(later.begin(), later.end(), Words(command, option)) != later.end();
}

std::optional<std::string> CommandLine::value(std::string_view option) const {
    const auto found = values.find(option);
    return found == values.end() ? std::nullopt : std::optional(found->second);
}

} // namespace spanledger
