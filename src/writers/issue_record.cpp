// SPDX-License-Identifier: MIT
#include "spanledger/writers/issue_record.hpp"

#include "status_words.hpp"
#include "table_kinds.hpp"

#include "spanledger/fingerprint.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {
namespace {

/// The limits that any cell of the table says something about.
std::vector<Limit> limits_in_cells(const TableResult& table) {
    std::vector<Limit> limits;
    for (const LimitDefinition& definition : limit_definitions) {
        const std::size_t i = index_of(definition.limit);
        const bool used = std::any_of(table.cells.begin(), table.cells.end(), [i](const Cell& cell) {
            return cell.limits[i].kind != LimitOutcome::Kind::not_checked;
        });
        if (used) limits.push_back(definition.limit);
    }
    return limits;
}

class RecordWriter {
public:
    explicit RecordWriter(const Issue& issue) : issue_(&issue) {}

    /// With the place where the line of the fingerprint belongs.
    struct Canonical {
        std::string text;
        std::size_t fingerprint_line = 0;
        bool finite = true;
    };

    Canonical write() {
        json_.reserve(expected_size());
        json_.open_object();
        json_.field("record", "spanledger issue, version 1");
        const std::size_t fingerprint_line = json_.text().size() + 1; // after the comma that comes next
        json_.field("program_version", issue_->program_version);
        json_.field("catalogue_fingerprint", issue_->catalogue_fingerprint);
        json_.key("brief");
        write_brief(json_, issue_->brief);
        sources("parameters", true);
        sources("catalogue_rows", false);
        basis();
        json_.field("cautions", issue_->cautions);
        how_to_read();
        json_.key("tables");
        json_.open_list();
        for (const TableResult& one : issue_->tables) table(one);
        json_.close_list();
        json_.close_object();
        return {json_.take(), fingerprint_line, json_.finite()};
    }

private:
    [[nodiscard]] std::size_t expected_size() const {
        constexpr std::size_t of_a_cell = 160;
        constexpr std::size_t of_the_rest = 65536;
        std::size_t cells = 0;
        for (const TableResult& one : issue_->tables) cells += one.cells.size();
        return cells * of_a_cell + of_the_rest;
    }

    void sources(std::string_view name, bool parameters) {
        json_.key(name);
        json_.open_list();
        for (const SourceLine& line : issue_->sources) {
            if ((line.kind == "parameter") != parameters) continue;
            json_.open_object();
            json_.field("kind", line.kind);
            json_.field("item", line.item);
            json_.field("value", line.value);
            json_.field("source", line.source);
            json_.field("seen", line.seen);
            json_.field("practice_own", line.practice_own);
            json_.close_object();
        }
        json_.close_list();
    }

    void basis() {
        json_.key("basis");
        json_.open_list();
        for (const BasisLine& line : issue_->basis) {
            json_.open_object();
            json_.field("heading", line.heading);
            json_.field("item", line.item);
            json_.field("value", line.value);
            json_.field("clause", line.clause);
            json_.field("origin", line.origin);
            json_.close_object();
        }
        json_.close_list();
    }

    void how_to_read() {
        json_.key("cell_fields");
        json_.value(std::vector<std::string>{"value", "text", "utilisation", "governing", "next", "permissible",
                                             "reason", "clear_spans_mm"});
        json_.field("clear_spans_mm",
                    "one per limit of limits_in_cells: its own permissible clear span, unrounded; null: "
                    "never reached; 0: exceeded at the lower bound; false: not checked");
    }

    void table(const TableResult& table) {
        const std::vector<Limit> limits = limits_in_cells(table);
        json_.open_object();
        json_.field("name", table.name);
        json_.field("kind", words_of(table.kind).name);
        json_.field("value_unit", words_of(table.kind).record_unit);
        json_.field("members", table.members);
        json_.field("material", table.material);
        json_.field("head_notes", table.head_notes);
        limit_notes(table);
        json_.key("limits_in_cells");
        json_.open_list();
        for (const Limit limit : limits) json_.value(definition_of(limit).name);
        json_.close_list();
        heads(table);
        json_.key("cells");
        json_.open_list();
        for (std::size_t row = 0; row < table.rows.size(); ++row) cells_of_row(table, row, limits);
        json_.close_list();
        json_.close_object();
    }

    void limit_notes(const TableResult& table) {
        json_.key("limits");
        json_.open_list();
        for (const LimitNote& note : table.limits) {
            json_.open_object();
            json_.field("limit", definition_of(note.limit).name);
            json_.field("letter", definition_of(note.limit).letter);
            json_.field("status", status_word(note.status));
            json_.field("reason", note.reason);
            json_.field("clause", note.clause);
            json_.close_object();
        }
        json_.close_list();
    }

    void heads(const TableResult& table) {
        json_.key("rows");
        json_.open_list();
        for (const RowHead& row : table.rows) {
            json_.open_object();
            json_.field("class", row.material_class);
            json_.field("section", row.section);
            json_.field("depth_mm", row.depth);
            json_.field("clear_span_mm", row.span);
            json_.close_object();
        }
        json_.close_list();
        json_.key("columns");
        json_.open_list();
        for (const ColumnHead& column : table.columns) {
            json_.open_object();
            json_.field("load", column.load);
            json_.field("spacing_mm", column.spacing);
            json_.field("clear_span_mm", column.span);
            json_.close_object();
        }
        json_.close_list();
    }

    void cells_of_row(const TableResult& table, std::size_t row, const std::vector<Limit>& limits) {
        json_.open_list();
        for (std::size_t column = 0; column < table.columns.size(); ++column) cell(table.at(row, column), limits);
        json_.close_list();
    }

    void cell(const Cell& cell, const std::vector<Limit>& limits) {
        json_.open_list();
        json_.value(cell.value);
        text_or_null(cell.text);
        json_.value(cell.utilisation);
        letter_or_null(cell.governing);
        letter_or_null(cell.next);
        json_.value(cell.permissible);
        text_or_null(cell.reason);
        json_.open_list();
        for (const Limit limit : limits) outcome(cell.limits[index_of(limit)]);
        json_.close_list();
        json_.close_list();
    }

    void text_or_null(const std::string& text) {
        if (text.empty()) return json_.null();
        json_.value(text);
    }

    void letter_or_null(const std::optional<Limit>& limit) {
        if (!limit) return json_.null();
        json_.value(definition_of(*limit).letter);
    }

    void outcome(const LimitOutcome& outcome) {
        switch (outcome.kind) {
        case LimitOutcome::Kind::spans: return json_.value(outcome.clear_span);
        case LimitOutcome::Kind::never_reached: return json_.null();
        case LimitOutcome::Kind::fails_at_once: return json_.value(0);
        case LimitOutcome::Kind::not_checked: return json_.value(false);
        }
    }

    const Issue* issue_;
    JsonText json_{4}; // the record, its lists, a table, the lists of a table
};

} // namespace

IssueRecord issue_record(const Issue& issue) {
    RecordWriter::Canonical canonical = RecordWriter(issue).write();
    IssueRecord record{.text = {}, .fingerprint = fingerprint_of(canonical.text), .finite = canonical.finite};
    canonical.text.insert(canonical.fingerprint_line, fmt::format("\n \"fingerprint\":\"{}\",", record.fingerprint));
    record.text = std::move(canonical.text);
    return record;
}

void fill_fingerprint(Issue& issue) {
    issue.fingerprint = issue_record(issue).fingerprint;
}

} // namespace spanledger
