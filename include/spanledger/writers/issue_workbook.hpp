// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/results/issue.hpp"
#include "spanledger/writers/safe_file.hpp"

#include <functional>
#include <string>

namespace spanledger {

/// Writes the issued workbook to `file`. `fingerprint` is asked for once, after the tables are filled in, so that it
/// may be computed meanwhile.
[[nodiscard]] WriteResult write_workbook(const Issue& issue, const std::string& file,
                                         const std::function<std::string()>& fingerprint);

} // namespace spanledger
