// SPDX-License-Identifier: MIT
#include "spanledger/engine/issue_tables.hpp"

#include "spanledger/engine/basis_statement.hpp"
#include "spanledger/engine/cell_solver.hpp"
#include "spanledger/engine/limit_curves.hpp"
#include "spanledger/engine/permissible_load.hpp"
#include "spanledger/fingerprint.hpp"
#include "spanledger/member.hpp"
#include "spanledger/version.hpp"

#include <algorithm>
#include <functional>
#include <memory>
#include <utility>

namespace spanledger {
namespace {

const LoadClass& load_named(const Brief& brief, const std::string& name) {
    return *std::find_if(brief.loads.begin(), brief.loads.end(), [&](const auto& load) { return load.name == name; });
}

const MembersEntry& entry_named(const Brief& brief, const std::string& name) {
    return *std::find_if(brief.members.begin(), brief.members.end(),
                         [&](const auto& entry) { return entry.name == name; });
}

SpanRange enclosing(const std::vector<double>& spacings) {
    const auto [low, high] = std::minmax_element(spacings.begin(), spacings.end());
    return {*low, *high};
}

/// Counts cells for the progress callback.
class Counter {
public:
    Counter(const Progress& progress, std::size_t total) : progress_(&progress), total_(total) {}
    void add(std::size_t cells) {
        done_ += cells;
        if (*progress_) (*progress_)(done_, total_);
    }

private:
    const Progress* progress_;
    std::size_t total_;
    std::size_t done_ = 0;
};

/// One cell of a kind that stands a section against a column.
using ColumnCell = std::function<Cell(const ColumnHead&)>;

ColumnCell column_cell(const Inputs& inputs, const TableRequest& request, const Member& member, const LoadClass& load) {
    if (request.kind == TableKind::permissible_load) {
        return [solver = std::make_shared<LoadSolver>(inputs, member, load)](const ColumnHead& column) {
            return solver->cell(column.spacing, *column.span);
        };
    }
    const auto solver = std::make_shared<CellSolver>(inputs, member, load, enclosing(request.spacings));
    if (request.kind == TableKind::utilisation) {
        return [solver](const ColumnHead& column) { return solver->utilisation(column.spacing, *column.span); };
    }
    return [solver](const ColumnHead& column) { return solver->permissible_span(column.spacing); };
}

void sweep_row(const Inputs& inputs, const TableRequest& request, const Member& member, TableResult& table) {
    const std::size_t columns_of_load = table.columns.size() / request.loads.size();
    auto column = table.columns.begin();
    for (const std::string& load : request.loads) {
        const ColumnCell cell = column_cell(inputs, request, member, load_named(inputs.brief, load));
        for (std::size_t i = 0; i < columns_of_load; ++i) table.cells.push_back(cell(*column++));
    }
}

void sweep_sections(const Inputs& inputs, const TableRequest& request, const std::vector<Member>& members,
                    TableResult& table, Counter& counter) {
    table.cells.reserve(members.size() * table.columns.size());
    for (const Member& member : members) {
        table.rows.push_back({class_name(member), section_name(member), depth_of(member)});
        sweep_row(inputs, request, member, table);
        counter.add(table.columns.size());
    }
}

/// The first member, by depth and then by mass, that passes at a span.
Cell smallest_section(const std::vector<Member>& by_size, const std::vector<std::unique_ptr<CellSolver>>& solvers,
                      double spacing, double span) {
    Cell cell;
    for (std::size_t i = 0; i < by_size.size(); ++i) {
        Cell at_span = solvers[i]->utilisation(spacing, span);
        if (!at_span.value || !solvers[i]->passes(spacing, span)) continue;
        at_span.text = section_name(by_size[i]);
        return at_span;
    }
    cell.reason = "no section of the entry passes";
    return cell;
}

void sweep_spans(const Inputs& inputs, const TableRequest& request, std::vector<Member> members, TableResult& table,
                 Counter& counter) {
    std::stable_sort(members.begin(), members.end(), [](const Member& a, const Member& b) {
        return std::pair(depth_of(a), mass_per_length(a)) < std::pair(depth_of(b), mass_per_length(b));
    });
    for (const double span : request.spans) {
        table.rows.push_back({.material_class = class_name(members.front()), .section = {}, .span = span});
    }
    table.cells.resize(table.rows.size() * table.columns.size());
    std::size_t first_column = 0;
    for (const std::string& load : request.loads) {
        std::vector<std::unique_ptr<CellSolver>> solvers;
        for (const Member& member : members) {
            solvers.push_back(std::make_unique<CellSolver>(inputs, member, load_named(inputs.brief, load),
                                                           enclosing(request.spacings)));
        }
        for (std::size_t s = 0; s < request.spacings.size(); ++s) {
            for (std::size_t row = 0; row < request.spans.size(); ++row) {
                table.cells[row * table.columns.size() + first_column + s] =
                    smallest_section(members, solvers, request.spacings[s], request.spans[row]);
            }
            counter.add(request.spans.size());
        }
        first_column += request.spacings.size();
    }
}

TableResult table_head(const TableRequest& request, const std::string& entry, const Member& first) {
    TableResult table;
    table.name = request.name;
    table.kind = request.kind;
    table.members = entry;
    table.material = material_name(first);
    const bool over_spans = request.kind == TableKind::permissible_load || request.kind == TableKind::utilisation;
    for (const std::string& load : request.loads) {
        for (const double spacing : request.spacings) {
            if (!over_spans) {
                table.columns.push_back({load, spacing});
                continue;
            }
            for (const double span : request.spans) table.columns.push_back({load, spacing, span});
        }
    }
    return table;
}

TableResult sweep_table(const Inputs& inputs, const TableRequest& request, const std::string& entry,
                        const std::vector<Member>& members, Counter& counter) {
    TableResult table = table_head(request, entry, members.front());
    if (request.kind == TableKind::smallest_section) {
        sweep_spans(inputs, request, members, table, counter);
    } else {
        sweep_sections(inputs, request, members, table, counter);
    }
    describe_table(inputs, request, members, table);
    return table;
}

std::size_t rows_of(const TableRequest& request, std::size_t members) {
    return request.kind == TableKind::smallest_section ? request.spans.size() : members;
}

std::size_t columns_of(const TableRequest& request) {
    const bool over_spans = request.kind == TableKind::permissible_load || request.kind == TableKind::utilisation;
    return request.loads.size() * request.spacings.size() * (over_spans ? request.spans.size() : 1);
}

} // namespace

std::size_t count_cells(const Inputs& inputs) {
    std::size_t cells = 0;
    Diagnostics ignored; // the brief was read without errors
    for (const TableRequest& request : inputs.brief.tables) {
        for (const std::string& entry : request.members) {
            const auto members = members_of(entry_named(inputs.brief, entry), inputs.catalogue, ignored);
            cells += rows_of(request, members.size()) * columns_of(request);
        }
    }
    return cells;
}

Issue issue_tables(const Inputs& inputs, const Progress& progress) {
    Diagnostics ignored; // the brief was read without errors
    Issue issue;
    issue.brief = inputs.brief;
    issue.program_version = program_version();
    issue.catalogue_fingerprint = builtin_fingerprint();
    Counter counter(progress, count_cells(inputs));
    for (const TableRequest& request : inputs.brief.tables) {
        for (const std::string& entry : request.members) {
            const auto members = members_of(entry_named(inputs.brief, entry), inputs.catalogue, ignored);
            if (members.empty()) continue;
            issue.tables.push_back(sweep_table(inputs, request, entry, members, counter));
        }
    }
    issue.curves = limit_curves_of_brief(inputs);
    issue.basis = basis_lines(inputs);
    issue.sources = source_lines(inputs);
    issue.cautions = cautions(inputs);
    return issue;
}

} // namespace spanledger
