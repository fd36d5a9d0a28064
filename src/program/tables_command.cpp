// SPDX-License-Identifier: MIT
#include "commands.hpp"

#include "spanledger/engine/issue_tables.hpp"
#include "spanledger/writers/issue_files.hpp"
#include "spanledger/writers/safe_file.hpp"

#include <fmt/format.h>

#include <chrono>
#include <ostream>

namespace spanledger {
namespace {

/// Thrown through the sweep when the user asks to stop.
struct Interruption {};

/// Progress on a terminal once half a second has passed, cleared at the end.
class ProgressLine {
public:
    explicit ProgressLine(const Surroundings& around, bool shown) : around_(&around), shown_(shown) {}
    ~ProgressLine() {
        if (visible_) around_->err << "\r\x1b[K" << std::flush;
    }
    ProgressLine(const ProgressLine&) = delete;
    ProgressLine& operator=(const ProgressLine&) = delete;

    void operator()(std::size_t done, std::size_t total) {
        if (around_->interrupted && around_->interrupted()) throw Interruption{};
        if (!shown_) return;
        const auto now = std::chrono::steady_clock::now();
        if (now - last_ < std::chrono::milliseconds(500)) return;
        last_ = now;
        visible_ = true;
        around_->err << fmt::format("\r{} of {} cells", done, total) << std::flush;
    }

private:
    const Surroundings* around_;
    bool shown_;
    bool visible_ = false;
    std::chrono::steady_clock::time_point last_ = std::chrono::steady_clock::now();
};

int could_not_write(const Surroundings& around, const WriteError& error) {
    around.err << fmt::format("spanledger: could not write {}: {}\n", error.path, error.reason);
    return exit_status::could_not_write;
}

int refuse_existing(const Surroundings& around, const std::vector<std::string>& existing) {
    for (const std::string& file : existing) around.err << fmt::format("spanledger: {} is issued already\n", file);
    around.err << "  hint: give the brief a new revision, or say --replace\n";
    return exit_status::could_not_write;
}

void summarise(const CommandLine& line, const Surroundings& around, const Issue& issue) {
    std::size_t cells = 0;
    std::size_t without = 0;
    for (const TableResult& table : issue.tables) {
        cells += table.cells.size();
        for (const Cell& cell : table.cells) without += cell.value ? 0 : 1;
    }
    say(line, around, fmt::format("{} tables, {} cells, {} of them without a value (the cell says why)",
                                  issue.tables.size(), cells, without));
}

int write(const CommandLine& line, const Surroundings& around, const Issue& issue, const std::string& folder) {
    const IssueOutcome outcome = write_issue(issue, folder, line.has("replace"), around.interrupted);
    switch (outcome.kind) {
    case IssueOutcome::Kind::refused: return refuse_existing(around, outcome.existing);
    case IssueOutcome::Kind::failed: return could_not_write(around, outcome.error);
    case IssueOutcome::Kind::interrupted: return exit_status::interrupted;
    case IssueOutcome::Kind::written: break;
    }
    around.out << outcome.files.workbook << "\n" << outcome.files.csv << "\n" << outcome.files.record << "\n";
    summarise(line, around, issue);
    return exit_status::well;
}

} // namespace

int tables_command(const CommandLine& line, const Surroundings& around) {
    const std::optional<Inputs> inputs = read_and_report(line.operands.front(), line, around);
    if (!inputs) return exit_status::bad_input;
    if (inputs->brief.tables.empty()) {
        return refuse(around, fmt::format("{} asks for no table", inputs->brief.file), "add a [[table]] to the brief");
    }
    const std::string folder = line.value("out").value_or("output");
    if (const WriteResult problem = prepare_folder(folder)) return could_not_write(around, *problem);
    if (!line.has("replace")) {
        const auto existing = existing_files(issue_files(inputs->brief.practice, folder));
        if (!existing.empty()) return refuse_existing(around, existing);
    }
    try {
        ProgressLine progress(around, around.err_is_terminal && !line.has("quiet"));
        const Issue issue = issue_tables(*inputs, std::ref(progress));
        return write(line, around, issue, folder);
    } catch (const Interruption&) {
        return exit_status::interrupted;
    }
}

} // namespace spanledger
