// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/diagnostics.hpp"

#include <cstddef>
#include <string>
#include <string_view>
#include <vector>

// The rows and fields of a table's text, before its columns mean anything: separated by comma, semicolon or tab
// (whichever the first row has most of), with quoted fields, any line end, and lines beginning with # as remarks.

namespace spanledger {

struct CsvField {
    std::string text{}; ///< without quotes and surrounding blanks
    std::size_t line = 0;
    std::size_t column = 0;
    std::size_t width = 1; ///< characters, as written
};

struct CsvRow {
    std::vector<CsvField> fields;
};

struct CsvText {
    std::string file; ///< its name in messages
    char separator = ',';
    std::vector<std::string> lines; ///< without their ends
    std::vector<CsvRow> rows;       ///< blank rows and remarks left out
    bool well_formed = true;        ///< false after a problem with quotes or control characters

    [[nodiscard]] Place place_of(const CsvField& field) const;
};

/// Splits an accepted text. Codes: "unclosed-quote", "stray-quote", "control-character", "too-many-rows",
/// "too-many-columns".
[[nodiscard]] CsvText split_csv(const std::string& file, std::string_view text, Diagnostics& diagnostics);

} // namespace spanledger
