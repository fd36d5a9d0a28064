// SPDX-License-Identifier: MIT
#include "spanledger/writers/issue_files.hpp"

#include "writers/sample_issue.hpp"
#include "writers/working_folder.hpp"

#include <catch2/catch.hpp>
#include <fmt/format.h>

#include <cstdlib>

using namespace spanledger;
using sample::WorkingFolder;

namespace {

/// Runs a script on an issue's files; what it finds wrong stands in the report.
void check_with(const char* script, const NamedFiles& files, const WorkingFolder& folder, const char* more = "") {
    const std::string report = folder.file("report.txt");
    const std::string command =
        fmt::format("'{}' '{}/writers/{}' '{}' '{}' '{}' {} > '{}' 2>&1", SPANLEDGER_PYTHON, SPANLEDGER_TEST_DATA,
                    script, files.workbook, files.csv, files.record, more, report);
    const int status = std::system(command.c_str()); // NOLINT(cert-env33-c): the paths are the test's own
    INFO(sample::bytes_of(report));
    CHECK(status == 0);
}

/// As wide as no page is: one load class per part of a sheet, and one load class wider than a sheet.
Issue wide_issue() {
    Issue issue = sample::issue();
    TableResult& table = issue.tables.front();
    table.columns.clear();
    table.rows.resize(2);
    for (int load = 0; load < 120; ++load) {
        const double spacings = load == 60 ? 40.0 : 7.0;
        for (double n = 0.0; n < spacings; n += 1.0)
            table.columns.push_back({fmt::format("Load {}", load), 300.0 + 10.0 * n, {}});
    }
    table.cells.clear();
    for (std::size_t i = 0; i < 2 * table.columns.size(); ++i) {
        table.cells.push_back(
            sample::spanning(static_cast<Limit>(i % limit_count), 1000.0 + 3.7 * static_cast<double>(i)));
    }
    issue.tables.resize(1);
    return issue;
}

} // namespace

TEST_CASE("Workbook, CSV and record say the same, cell by cell", "[writers][read_back]") {
    const WorkingFolder folder;
    const IssueOutcome outcome = write_issue(sample::issue(), folder.path(), false);
    REQUIRE(outcome.kind == IssueOutcome::Kind::written);
    check_with("read_back.py", outcome.files, folder, "--sample");
}

TEST_CASE("A table wider than a page goes on in further sheets", "[writers][read_back]") {
    const WorkingFolder folder;
    const IssueOutcome outcome = write_issue(wide_issue(), folder.path(), false);
    REQUIRE(outcome.kind == IssueOutcome::Kind::written);
    check_with("read_back.py", outcome.files, folder, "--more-sheets");
}

TEST_CASE("Printed pages cut no text, and each table page has its legend", "[writers][pages]") {
    const WorkingFolder folder;
    const IssueOutcome outcome = write_issue(sample::issue(), folder.path(), false);
    REQUIRE(outcome.kind == IssueOutcome::Kind::written);
    check_with("printed_pages.py", outcome.files, folder);
}
