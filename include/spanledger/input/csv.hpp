// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/csv_text.hpp"
#include "spanledger/input/diagnostics.hpp"

#include <cstddef>
#include <limits>
#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <vector>

// Tables written by hand or by a spreadsheet. The first row names the columns. Decimal commas are read in files whose
// columns are separated by semicolons only.

namespace spanledger {

/// A column that a table may have.
struct CsvColumn {
    std::string name;
    bool required = true;
};

/// What a number in a table may be, and what is usual. Both ends count as inside.
struct NumberRange {
    double least = -std::numeric_limits<double>::max();
    double greatest = std::numeric_limits<double>::max();
    std::optional<double> usual_least{};
    std::optional<double> usual_greatest{};
    std::string_view unit{}; ///< in messages; empty for a pure number
};

/// A read table: its columns bound to the ones asked for, its rows complete.
class CsvTable {
public:
    CsvTable(CsvText text, const CsvRow& header);

    [[nodiscard]] const std::string& file() const noexcept { return text_.file; }
    [[nodiscard]] char separator() const noexcept { return text_.separator; }
    [[nodiscard]] const std::vector<CsvRow>& rows() const noexcept { return text_.rows; }

    /// Index of a column in every row; empty where the file does not have it.
    [[nodiscard]] std::optional<std::size_t> index_of(std::string_view column) const noexcept;

    /// Place of a field for a message.
    [[nodiscard]] Place place_of(const CsvField& field) const { return text_.place_of(field); }

private:
    CsvText text_;
    std::vector<std::string> columns_;
};

/// Reads a table. `file` is its name in messages. Rows with too few or too many fields are reported and left out.
/// Empty where the text is not UTF-8, or a column is missing, unknown or named twice. Codes: "invalid-utf8",
/// those of split_csv(), "no-columns", "unknown-column", "missing-column", "duplicate-column", "short-row",
/// "long-row".
[[nodiscard]] std::optional<CsvTable> read_csv(const std::string& file, std::string_view text,
                                               std::span<const CsvColumn> columns, Diagnostics& diagnostics);

/// One row of a table by column names; problems are reported at the field's place and remembered.
class CsvRecord {
public:
    CsvRecord(const CsvTable& table, const CsvRow& row, Diagnostics& diagnostics)
        : table_(&table), row_(&row), diagnostics_(&diagnostics) {}

    /// The field's text; empty where the file does not have the column.
    [[nodiscard]] const std::string& text(std::string_view column) const;

    /// The same, refused where empty ("empty-field").
    const std::string& required_text(std::string_view column);

    /// A number within its range; 0 after a problem ("bad-number", "empty-field", "out-of-range"; warning "unusual").
    double number(std::string_view column, const NumberRange& range);

    /// The same where an empty field or a missing column means that there is none.
    std::optional<double> optional_number(std::string_view column, const NumberRange& range);

    /// "yes" or "no", or the first of two words; refused otherwise ("bad-word").
    bool yes_or_no(std::string_view column);

    /// Position of the field's text in `words`, ignoring case; 0 after a problem ("bad-word").
    std::size_t one_of(std::string_view column, std::span<const std::string> words);

    void error(std::string_view column, std::string code, std::string message, std::string hint);
    void warning(std::string_view column, std::string code, std::string message, std::string hint);

    [[nodiscard]] Place place(std::string_view column) const;
    [[nodiscard]] std::size_t line() const noexcept { return row_->fields.front().line; }
    [[nodiscard]] bool good() const noexcept { return good_; }

private:
    [[nodiscard]] const CsvField* field(std::string_view column) const noexcept;
    void check_range(std::string_view column, double value, const NumberRange& range);

    const CsvTable* table_;
    const CsvRow* row_;
    Diagnostics* diagnostics_;
    bool good_ = true;
};

/// True where the text looks like something that a spreadsheet made of a name: a date ("03-Dec", "Dec-03") or a number
/// in powers of ten ("2.00E+04").
[[nodiscard]] bool spoiled_by_spreadsheet(std::string_view name);

} // namespace spanledger
