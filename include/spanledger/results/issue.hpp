// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/catalogue.hpp"
#include "spanledger/input/brief.hpp"
#include "spanledger/limits.hpp"

#include <array>
#include <cstdint>
#include <optional>
#include <string>
#include <vector>

// The result shape of `tables`: every writer of an issue (workbook, CSV, JSON) accepts it and decides nothing.

namespace spanledger {

enum class LimitStatus : std::uint8_t { checked, not_applicable, not_covered };

/// What one limit leaves in one cell.
struct LimitOutcome {
    enum class Kind : std::uint8_t {
        spans,         ///< `clear_span` is the limit's own permissible clear span
        never_reached, ///< no span up to the upper bound reaches it
        fails_at_once, ///< exceeded at the lower bound already
        not_checked    ///< not applicable, or not covered: see the table's limit notes
    } kind = Kind::not_checked;
    double clear_span = 0.0; ///< mm, unrounded
};

/// One cell: a member at a spacing under a load class.
struct Cell {
    /// Printed, rounded to the safe side; empty where there is none. By the table's kind: clear span in mm, variable
    /// action in N/mm2, utilisation, or (smallest section) the utilisation of the section named in `text`.
    std::optional<double> value;
    std::string text;                  ///< smallest section only: its name
    double utilisation = 0.0;          ///< the largest at the printed value
    std::optional<Limit> governing;    ///< smallest permissible span; empty: none reached, or no span
    std::optional<Limit> next;         ///< the next smallest
    std::string reason;                ///< why there is no span, or "no limit reached"
    std::optional<double> permissible; ///< unrounded, in the unit of `value`
    std::array<LimitOutcome, limit_count> limits{};
};

/// A row is a section; in a table of smallest sections it is a clear span, and `section` is empty.
struct RowHead {
    std::string material_class;
    std::string section;
    double depth = 0.0;              ///< mm
    std::optional<double> span = {}; ///< mm, clear
};

struct ColumnHead {
    std::string load;
    double spacing = 0.0;            ///< mm
    std::optional<double> span = {}; ///< mm, clear: tables of permissible loads and of utilisations
};

/// Whether a limit is checked in a table, and if not, why.
struct LimitNote {
    Limit limit;
    LimitStatus status = LimitStatus::checked;
    std::string reason; ///< empty where checked
    std::string clause;
};

/// One sheet: one table request of the brief, one members entry, one material.
struct TableResult {
    std::string name; ///< of the table request
    TableKind kind = TableKind::permissible_span;
    std::string members;  ///< name of the members entry
    std::string material; ///< "solid timber", ...
    std::vector<RowHead> rows;
    std::vector<ColumnHead> columns;     ///< load class by load class, each with its spacings
    std::vector<Cell> cells;             ///< row by row
    std::vector<LimitNote> limits;       ///< every limit, in order
    std::vector<std::string> head_notes; ///< what is not checked, and rules of the whole table

    [[nodiscard]] const Cell& at(std::size_t row, std::size_t column) const {
        return cells[row * columns.size() + column];
    }
};

/// Permissible variable action against span for one section: what each limit leaves, and the least of all.
struct LimitCurves {
    std::string member;
    std::string load;
    double spacing = 0.0;      ///< mm
    std::vector<double> spans; ///< mm, clear
    struct Line {
        Limit limit;
        std::vector<std::optional<double>> loads; ///< N/mm2 at each span; empty above `greatest_load` or where none
        std::optional<double> upright_at = {};    ///< mm: a limit that no load changes ends all spans here instead
    };
    std::vector<Line> lines; ///< limits that are reached somewhere
    std::vector<std::optional<double>> envelope;
    double greatest_load = 0.0; ///< N/mm2: the top of the chart
};

/// A statement of the basis: what is in force, why, from where.
struct BasisLine {
    std::string heading; ///< group, e.g. "Combinations", "Span and bearing"
    std::string item;
    std::string value; ///< with unit
    std::string clause;
    std::string origin; ///< "recommended", "uk", "brief", "practice's own"
};

/// A catalogue row or parameter in use, for the sources sheet.
struct SourceLine {
    std::string kind; ///< "strength class", "size", "parameter", "load category", ...
    std::string item;
    std::string value;
    std::string source; ///< full words
    bool seen = false;
    bool practice_own = false;
};

struct Issue {
    Brief brief;
    std::vector<TableResult> tables;
    std::vector<LimitCurves> curves;
    std::vector<BasisLine> basis;
    std::vector<SourceLine> sources;
    std::vector<std::string> cautions;
    std::string program_version;
    std::string catalogue_fingerprint;
    std::string fingerprint; ///< of the canonical record
};

} // namespace spanledger
