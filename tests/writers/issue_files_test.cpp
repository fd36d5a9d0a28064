// SPDX-License-Identifier: MIT
#include "spanledger/writers/issue_files.hpp"

#include "writers/sample_issue.hpp"
#include "writers/size_limit.hpp"
#include "writers/working_folder.hpp"

#include <catch2/catch.hpp>

#include <ctime>
#include <limits>

using namespace spanledger;
using sample::bytes_of;
using sample::WorkingFolder;
using Kind = IssueOutcome::Kind;

namespace {

void set_old_files(const NamedFiles& files) {
    for (const std::string& file : {files.workbook, files.csv, files.record}) REQUIRE_FALSE(write_file(file, "old"));
}

void check_old_files(const WorkingFolder& folder, const NamedFiles& files) {
    for (const std::string& file : {files.workbook, files.csv, files.record}) CHECK(bytes_of(file) == "old");
    CHECK(folder.names().size() == 3);
}

/// Gives an environment variable another value for a while.
class Variable {
public:
    Variable(const char* name, const char* value) : name_(name) {
        if (const char* before = std::getenv(name)) before_ = before;
        ::setenv(name, value, 1);
        ::tzset();
    }
    ~Variable() {
        if (before_) {
            ::setenv(name_, before_->c_str(), 1);
        } else {
            ::unsetenv(name_);
        }
        ::tzset();
    }
    Variable(const Variable&) = delete;
    Variable& operator=(const Variable&) = delete;

private:
    const char* name_;
    std::optional<std::string> before_;
};

} // namespace

TEST_CASE("An issue is three files named by number and revision", "[writers][issue]") {
    const WorkingFolder folder;
    const IssueOutcome outcome = write_issue(sample::issue(), folder.path(), false);
    REQUIRE(outcome.kind == Kind::written);
    CHECK(outcome.files.workbook == folder.file("SL-7_1-B.xlsx"));
    CHECK(outcome.files.csv == folder.file("SL-7_1-B.csv"));
    CHECK(outcome.files.record == folder.file("SL-7_1-B.json"));
    CHECK(folder.names().size() == 3);
    CHECK(outcome.fingerprint.size() == 16);
}

TEST_CASE("File names never leave the folder or hide", "[writers][issue]") {
    Practice practice;
    practice.number = "../a:b";
    practice.revision = "*";
    CHECK(issue_files(practice, "out").csv == "out/_._a_b-_.csv");
}

TEST_CASE("An issued revision is not overwritten unless asked", "[writers][issue]") {
    const WorkingFolder folder;
    const NamedFiles files = issue_files(sample::brief().practice, folder.path());
    REQUIRE_FALSE(write_file(files.record, "old"));
    const IssueOutcome refused = write_issue(sample::issue(), folder.path(), false);
    CHECK(refused.kind == Kind::refused);
    CHECK(refused.existing == std::vector<std::string>{files.record});
    CHECK(bytes_of(files.record) == "old");
    CHECK(folder.names().size() == 1);
    CHECK(write_issue(sample::issue(), folder.path(), true).kind == Kind::written);
    CHECK(bytes_of(files.record) != "old");
}

TEST_CASE("An interrupted issue changes nothing, whenever it is stopped", "[writers][issue]") {
    for (const int stop_after : {0, 1}) {
        const WorkingFolder folder;
        const NamedFiles files = issue_files(sample::brief().practice, folder.path());
        set_old_files(files);
        int asked = 0;
        const auto outcome = write_issue(sample::issue(), folder.path(), true, [&] { return asked++ >= stop_after; });
        CHECK(outcome.kind == Kind::interrupted);
        check_old_files(folder, files);
    }
}

// Sizes at which different parts no longer fit: the sheets' temporary parts, the workbook, the CSV, the record.
TEST_CASE("A disk that fills up at any point is reported and harms no old file", "[writers][issue]") {
    for (const rlim_t bytes : {0U, 300U, 3000U, 9000U, 20000U, 30000U, 60000U, 90000U}) {
        INFO(bytes);
        const WorkingFolder folder;
        const NamedFiles files = issue_files(sample::brief().practice, folder.path());
        set_old_files(files);
        const int failed = sample::within_file_size(bytes, [&] {
            const IssueOutcome outcome = write_issue(sample::issue(), folder.path(), true);
            return outcome.kind == Kind::failed && !outcome.error.path.empty() && !outcome.error.reason.empty() ? 1 : 0;
        });
        CHECK(failed == 1);
        check_old_files(folder, files);
    }
}

TEST_CASE("A missing folder is reported with the file that could not be", "[writers][issue]") {
    const WorkingFolder folder;
    const IssueOutcome outcome = write_issue(sample::issue(), folder.file("missing"), false);
    CHECK(outcome.kind == Kind::failed);
    CHECK(outcome.error.path == folder.file("missing/SL-7_1-B.xlsx"));
}

TEST_CASE("A number that is not finite is never written", "[writers][issue]") {
    constexpr double nan = std::numeric_limits<double>::quiet_NaN();
    const WorkingFolder folder;
    Issue in_a_cell = sample::issue();
    in_a_cell.tables.front().cells.front().value = nan;
    Issue in_a_limit = sample::issue();
    in_a_limit.tables.front().cells.front().limits.front() = {LimitOutcome::Kind::spans, 1.0 / 0.0};
    for (const Issue& issue : {in_a_cell, in_a_limit}) {
        const IssueOutcome outcome = write_issue(issue, folder.path(), false);
        CHECK(outcome.kind == Kind::failed);
        CHECK(outcome.error.reason.find("finite") != std::string::npos);
        CHECK(folder.names().empty());
    }
}

TEST_CASE("Time zone, locale and temporary folder leave no trace in the bytes", "[writers][issue]") {
    const WorkingFolder here;
    const WorkingFolder there;
    const IssueOutcome first = write_issue(sample::issue(), here.path(), false);
    REQUIRE(first.kind == Kind::written);
    const Variable zone("TZ", "Pacific/Kiritimati");
    const Variable locale("LC_ALL", "de_DE.UTF-8");
    const Variable temporary("TMPDIR", "/nowhere");
    const IssueOutcome second = write_issue(sample::issue(), there.path(), false);
    REQUIRE(second.kind == Kind::written);
    CHECK(bytes_of(first.files.workbook) == bytes_of(second.files.workbook));
    CHECK(bytes_of(first.files.csv) == bytes_of(second.files.csv));
    CHECK(bytes_of(first.files.record) == bytes_of(second.files.record));
}

TEST_CASE("An issue without tables, and tables without rows or columns, are written", "[writers][issue]") {
    const WorkingFolder folder;
    Issue issue = sample::issue();
    issue.tables.resize(2);
    issue.tables[0].rows.clear();
    issue.tables[0].cells.clear();
    issue.tables[1].columns.clear();
    issue.tables[1].cells.clear();
    CHECK(write_issue(issue, folder.path(), false).kind == Kind::written);
    issue.tables.clear();
    issue.basis.clear();
    issue.sources.clear();
    issue.cautions.clear();
    issue.brief.practice = {};
    CHECK(write_issue(issue, folder.path(), false).kind == Kind::written);
}

TEST_CASE("Words far too long for a page are written all the same", "[writers][issue]") {
    const WorkingFolder folder;
    Issue issue = sample::issue();
    Practice& practice = issue.brief.practice;
    practice.name = std::string(300, '&');
    practice.title.clear();
    for (int i = 0; i < 200; ++i) practice.title += "üÜ ";
    practice.notes = std::string(10000, 'n');
    practice.revision = std::string(60, '&');
    issue.basis.front().value = std::string(20000, 'v');
    issue.tables.front().head_notes = {std::string(5000, 'h')};
    issue.tables.front().columns.front().load = std::string(500, 'l');
    CHECK(write_issue(issue, folder.path(), false).kind == Kind::written);
}
