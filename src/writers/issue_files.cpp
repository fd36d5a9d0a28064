// SPDX-License-Identifier: MIT
#include "spanledger/writers/issue_files.hpp"

#include "spanledger/writers/issue_csv.hpp"
#include "spanledger/writers/issue_record.hpp"
#include "spanledger/writers/issue_workbook.hpp"

#include <array>
#include <filesystem>
#include <future>
#include <utility>

namespace spanledger {
namespace {

/// A part of a file name that every system accepts.
std::string for_file_name(const std::string& text) {
    std::string name;
    for (const char c : text) {
        const bool control = static_cast<unsigned char>(c) < 0x20U || c == 0x7F;
        name += control || std::string_view(R"(/\:*?"<>|)").find(c) != std::string_view::npos ? '_' : c;
    }
    if (!name.empty() && name.front() == '.') name.front() = '_';
    return name;
}

/// What the second thread makes while the first fills the workbook.
struct Texts {
    IssueRecord record;
    std::string csv;
};

WriteResult write_and_settle(TemporaryFile& file, const std::string& text) {
    if (auto error = file.write(text)) return error;
    return file.settle();
}

/// The three files in the making; whatever is not placed is removed.
class IssueWriting {
public:
    IssueWriting(const Issue& issue, const NamedFiles& files)
        : issue_(&issue), workbook_(files.workbook), csv_(files.csv), record_(files.record) {}

    WriteResult make() {
        for (const TemporaryFile* file : all()) {
            if (file->problem()) return file->problem();
        }
        std::future<Texts> making = std::async(std::launch::async, [this] {
            IssueRecord record = issue_record(*issue_);
            return record.finite ? Texts{std::move(record), issue_csv(*issue_)} : Texts{std::move(record), {}};
        });
        Texts texts;
        const auto fingerprint = [&] {
            texts = making.get();
            return texts.record.fingerprint;
        };
        if (auto error = write_workbook(*issue_, workbook_.path(), fingerprint)) {
            return WriteError{workbook_.target(), error->reason};
        }
        fingerprint_ = texts.record.fingerprint;
        if (!texts.record.finite) return WriteError{record_.target(), "a number of the issue is not finite"};
        if (auto error = workbook_.settle()) return error;
        if (auto error = write_and_settle(csv_, texts.csv)) return error;
        return write_and_settle(record_, texts.record.text);
    }

    WriteResult place() {
        for (TemporaryFile* file : all()) {
            if (auto error = file->place()) return error;
        }
        return {};
    }

    [[nodiscard]] const std::string& fingerprint() const noexcept { return fingerprint_; }

private:
    std::array<TemporaryFile*, 3> all() { return {&workbook_, &csv_, &record_}; }

    const Issue* issue_;
    TemporaryFile workbook_;
    TemporaryFile csv_;
    TemporaryFile record_;
    std::string fingerprint_;
};

} // namespace

NamedFiles issue_files(const Practice& practice, const std::string& folder) {
    const std::string stem = for_file_name(practice.number + "-" + practice.revision);
    const auto named = [&](const char* ending) { return (std::filesystem::path(folder) / (stem + ending)).string(); };
    return {named(".xlsx"), named(".csv"), named(".json")};
}

std::vector<std::string> existing_files(const NamedFiles& files) {
    std::vector<std::string> existing;
    for (const std::string& file : {files.workbook, files.csv, files.record}) {
        std::error_code unknown; // a file that cannot be looked at is met again when it is written
        if (std::filesystem::exists(std::filesystem::symlink_status(file, unknown))) existing.push_back(file);
    }
    return existing;
}

IssueOutcome write_issue(const Issue& issue, const std::string& folder, bool replace, const Interrupted& interrupted) {
    using Kind = IssueOutcome::Kind;
    const auto stop = [&] { return interrupted && interrupted(); };
    IssueOutcome outcome;
    outcome.files = issue_files(issue.brief.practice, folder);
    const auto ended = [&](Kind kind) {
        outcome.kind = kind;
        return outcome;
    };
    outcome.existing = existing_files(outcome.files);
    if (!replace && !outcome.existing.empty()) return ended(Kind::refused);
    if (stop()) return ended(Kind::interrupted);
    IssueWriting writing(issue, outcome.files);
    WriteResult error = writing.make();
    if (stop()) return ended(Kind::interrupted);
    if (!error) error = writing.place();
    if (error) {
        outcome.error = *error;
        return ended(Kind::failed);
    }
    outcome.fingerprint = writing.fingerprint();
    return ended(Kind::written);
}

} // namespace spanledger
