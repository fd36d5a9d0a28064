// SPDX-License-Identifier: MIT
#pragma once

#include <cstdint>
#include <string>
#include <vector>

// The cells of an issue's tables as nothing but heads, numbers and letters: what the bare writer is given beforehand.

namespace spanledger::benchmark {

/// One sheet of an issue.
struct BareSheet {
    std::string name;
    std::vector<std::string> classes;  ///< one per row
    std::vector<std::string> sections; ///< one per row
    std::vector<std::string> loads;    ///< one per column
    std::vector<double> spacings;      ///< mm, one per column
    std::vector<double> spans;         ///< m, row by row; 0 where there is no span
    std::vector<std::uint8_t> limits;  ///< index of the governing limit, or limit_count
};

/// Writes the sheets to a file of this machine's byte order; false where it could not.
[[nodiscard]] bool write_bare_sheets(const std::string& file, const std::vector<BareSheet>& sheets);

/// Reads such a file; empty where it could not.
[[nodiscard]] std::vector<BareSheet> read_bare_sheets(const std::string& file);

} // namespace spanledger::benchmark
