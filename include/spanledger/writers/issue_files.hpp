// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/results/issue.hpp"
#include "spanledger/writers/safe_file.hpp"

#include <string>
#include <vector>

namespace spanledger {

/// The files of an issue: NUMBER-REVISION with the endings .xlsx, .csv and .json.
struct NamedFiles {
    std::string workbook;
    std::string csv;
    std::string record;
};

/// Characters that a file name cannot hold everywhere become "_".
[[nodiscard]] NamedFiles issue_files(const Practice& practice, const std::string& folder);

/// Those of the files that exist already.
[[nodiscard]] std::vector<std::string> existing_files(const NamedFiles& files);

struct IssueOutcome {
    enum class Kind {
        written,
        refused,    ///< `existing` files were not to be replaced; nothing was changed
        failed,     ///< `error`; old files are intact
        interrupted ///< nothing was changed
    } kind = Kind::written;
    NamedFiles files;
    std::vector<std::string> existing;
    WriteError error;
    std::string fingerprint; ///< where written
};

/// Writes workbook, CSV and record beside their targets, then renames all three. `replace` allows existing files to be
/// replaced. The folder must exist (prepare_folder).
[[nodiscard]] IssueOutcome write_issue(const Issue& issue, const std::string& folder, bool replace,
                                       const Interrupted& interrupted = {});

} // namespace spanledger
