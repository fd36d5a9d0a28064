// SPDX-License-Identifier: MIT
#include "commands.hpp"
#include "progress_line.hpp"
#include "spanledger/engine/issue_tables.hpp"
#include "spanledger/input/suggestion.hpp"
#include "spanledger/writers/issue_files.hpp"
#include "words.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <functional>
#include <ostream>

namespace spanledger {
namespace {

int refuse_existing(const Surroundings& around, const std::vector<std::string>& existing) {
    around.err << fmt::format("spanledger: this revision is issued already: {}\n"
                              "    hint: give the brief a new revision, or say --replace\n",
                              joined(existing));
    return exit_status::could_not_write;
}

std::string counted(std::size_t number, std::string_view one) {
    return fmt::format("{} {}{}", number, one, number == 1 ? "" : "s");
}

std::string summary(const Issue& issue) {
    std::size_t cells = 0;
    std::size_t without = 0;
    for (const TableResult& table : issue.tables) {
        cells += table.cells.size();
        without += static_cast<std::size_t>(
            std::count_if(table.cells.begin(), table.cells.end(), [](const Cell& cell) { return !cell.value; }));
    }
    return fmt::format("{}, {}, {} of them without a span or value{}", counted(issue.tables.size(), "table"),
                       counted(cells, "cell"), without, without == 0 ? "" : ": they say why");
}

Issue sweep(const Inputs& inputs, const CommandLine& line, const Surroundings& around) {
    ProgressLine progress(around, around.err_is_terminal && !line.has("quiet"));
    return issue_tables(inputs, std::ref(progress));
}

int write(const CommandLine& line, const Surroundings& around, const Issue& issue, const std::string& folder) {
    const IssueOutcome outcome = write_issue(issue, folder, line.has("replace"), around.interrupted);
    switch (outcome.kind) {
    case IssueOutcome::Kind::refused: return refuse_existing(around, outcome.existing);
    case IssueOutcome::Kind::failed: return could_not_write(around, outcome.error);
    case IssueOutcome::Kind::interrupted: throw Interruption{};
    case IssueOutcome::Kind::written: break;
    }
    around.out << outcome.files.workbook << "\n" << outcome.files.csv << "\n" << outcome.files.record << "\n";
    say(line, around, summary(issue));
    return exit_status::well;
}

} // namespace

int tables_command(const CommandLine& line, const Surroundings& around) {
    const std::string folder = line.value("out").value_or("output");
    if (folder == "-" || folder.empty()) {
        return refuse(around, "an issue cannot go to standard output", "name a folder: --out DIR");
    }
    const std::optional<Inputs> inputs = read_and_report(line.operands.front(), line, around);
    if (!inputs) return exit_status::bad_input;
    say_sources(*inputs, line, around);
    if (auto error = prepare_folder(folder)) return could_not_write(around, *error);
    const auto existing = existing_files(issue_files(inputs->brief.practice, folder));
    if (!existing.empty() && !line.has("replace")) return refuse_existing(around, existing);
    return write(line, around, sweep(*inputs, line, around), folder);
}

} // namespace spanledger
