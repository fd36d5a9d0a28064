// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/results/issue.hpp"

#include <string>
#include <string_view>

namespace spanledger {

/// A field of a CSV line: quoted where needed, and with an apostrophe before a text that a spreadsheet would take for a
/// formula (= + - @, or a control character in front).
[[nodiscard]] std::string csv_field(std::string_view text);

/// The issue as long-form CSV (RFC 4180), a line per cell, then a column per limit with its own permissible clear span,
/// rounded down to 1 mm: empty where the limit is never reached or not checked, 0.000 where it fails at once. All
/// numbers of the issue must be finite (issue_record tells).
[[nodiscard]] std::string issue_csv(const Issue& issue);

} // namespace spanledger
