// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/results/issue.hpp"
#include "spanledger/writers/json_text.hpp"

#include <string>

namespace spanledger {

/// The JSON record of an issue: what went in, what is in force, every cell with every limit.
struct IssueRecord {
    std::string text;        ///< the whole file
    std::string fingerprint; ///< of the text without the line that holds the fingerprint
    bool finite = true;      ///< false: a number was not finite and stands as null; such an issue must not be written
};

[[nodiscard]] IssueRecord issue_record(const Issue& issue);

/// Computes the fingerprint of the issue's record.
void fill_fingerprint(Issue& issue);

/// The brief with every key resolved, under the names and in the units that the brief itself uses.
void write_brief(JsonText& json, const Brief& brief);

} // namespace spanledger
