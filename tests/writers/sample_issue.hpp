// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/results/issue.hpp"

#include <cmath>
#include <string>

// An issue made up by hand for the writers: no engine has seen its numbers. Two tables of spans with every letter,
// cells without a span, cells that no limit ends, nasty names; and a table of each other kind.

namespace sample {

using namespace spanledger;

inline LoadClass load(std::string name, double permanent) {
    LoadClass load;
    load.name = std::move(name);
    load.category = "A";
    load.permanent = permanent;
    load.variable = 0.0015;
    load.concentrated = 2000.0;
    return load;
}

inline Brief brief() {
    Brief brief;
    brief.file = "sample.toml";
    brief.practice = {.name = "Practice & Sons <sample>",
                      .number = "SL-7/1",
                      .revision = "B",
                      .title = "=Joists & rafters, \"sample\" für Prüfer",
                      .prepared = "A. Person",
                      .checked = "",
                      .date = "2026-01-31",
                      .notes = "Invented for a test. Not for construction.",
                      .replaces = "SL-7/1-A"};
    brief.loads = {load("Dwelling, G 0.25", 0.00025), load("Dwelling, G 0.50", 0.0005),
                   load("=SUM(A1) & a load class with a name so long that it cannot stand in one line", 0.00125)};
    brief.limits.final_deflection = DeflectionLimit{250.0, std::nullopt};
    brief.limits.instantaneous_deflection = DeflectionLimit{333.0, 14.0};
    VibrationLimit& vibration = brief.limits.vibration.emplace();
    vibration.floor_width = 4000.0;
    vibration.strutting = true;
    brief.deck = {"22 mm board (invented)", 600.0, 1.95e9};
    brief.members = {{"C24, 47 mm", "C24", "UK 47", {}, 1, false, {4800.0, 7200.0}, {}},
                     {"+plies [2] of */?: a name beyond 31 characters", "GL24h", "", {"2/47x220"}, 2, true, {}, {}}};
    brief.tables = {
        {"Floor joists", TableKind::permissible_span, {"C24, 47 mm"}, {400, 450, 600}, {"Dwelling, G 0.25"}, {}}};
    return brief;
}

/// A cell with a span: `limit` governs at it, every later limit leaves 7 mm more than the one before.
inline Cell spanning(Limit limit, double permissible) {
    Cell cell;
    cell.value = std::floor(permissible / 10.0) * 10.0;
    cell.utilisation = 0.99871;
    cell.governing = limit;
    cell.next = limit == Limit::final_deflection ? Limit::bending : Limit::final_deflection;
    cell.permissible = permissible;
    for (std::size_t i = 0; i < limit_count; ++i) {
        cell.limits[i] = {LimitOutcome::Kind::spans, permissible + 7.0 * static_cast<double>(i + 1)};
    }
    cell.limits[index_of(limit)] = {LimitOutcome::Kind::spans, permissible};
    cell.limits[index_of(Limit::bending_with_shear)] = {};
    cell.limits[index_of(Limit::velocity_response)] = {LimitOutcome::Kind::never_reached, 0.0};
    return cell;
}

inline Cell without_span(std::string reason) {
    Cell cell;
    cell.reason = std::move(reason);
    cell.governing = Limit::bending;
    cell.limits[index_of(Limit::bending)] = {LimitOutcome::Kind::fails_at_once, 0.0};
    return cell;
}

inline Cell unlimited() {
    Cell cell;
    cell.value = 30000.0;
    cell.utilisation = 0.25;
    cell.permissible = 30000.0;
    cell.reason = "no limit reached";
    for (LimitOutcome& outcome : cell.limits) outcome.kind = LimitOutcome::Kind::never_reached;
    return cell;
}

inline std::vector<LimitNote> limit_notes() {
    std::vector<LimitNote> notes;
    for (const LimitDefinition& definition : limit_definitions) {
        notes.push_back({definition.limit, LimitStatus::checked, "", "EN 1995-1-1 6.1"});
    }
    notes[index_of(Limit::bending_with_shear)] = {Limit::bending_with_shear, LimitStatus::not_applicable,
                                                  "no interaction of bending with shear", "EN 1995-1-1 6.1"};
    return notes;
}

inline TableResult span_table(std::string name, std::string members, std::string material, std::size_t rows) {
    TableResult table;
    table.name = std::move(name);
    table.members = std::move(members);
    table.material = std::move(material);
    table.limits = limit_notes();
    table.head_notes = {"Not checked, bending with shear: EN 1995-1-1 has no interaction of bending with shear.",
                        "Dwelling, G 0.25: Qk 2 kN, 1 of it on one joist, in strength only.",
                        "Dwelling, G 0.50: Qk 2 kN, 1 of it on one joist, in strength only."};
    for (const LoadClass& one : brief().loads) {
        for (const double spacing : {400.0, 450.0, 600.0}) table.columns.push_back({one.name, spacing, {}});
    }
    for (std::size_t row = 0; row < rows; ++row) {
        const double depth = 97.0 + 25.0 * static_cast<double>(row);
        table.rows.push_back(
            {row % 3 == 2 ? "-C16" : "C24", "47x" + std::to_string(static_cast<int>(depth)), depth, {}});
        for (std::size_t column = 0; column < table.columns.size(); ++column) {
            const std::size_t n = row * table.columns.size() + column;
            if (n % 23 == 5) {
                table.cells.push_back(without_span(n % 2 == 0 ? "no span above the lower bound" : "class 4"));
            } else if (n % 29 == 7) {
                table.cells.push_back(unlimited());
            } else {
                const double permissible =
                    1503.0 + 211.37 * static_cast<double>(row) - 37.11 * static_cast<double>(column);
                table.cells.push_back(spanning(static_cast<Limit>(n % limit_count), permissible));
            }
        }
    }
    return table;
}

/// A table over spans of another kind; `unit` is the step of its values.
inline TableResult other_table(TableKind kind, double unit) {
    TableResult table = span_table("@Loads and ratios", "C24, 47 mm", "solid timber", 0);
    table.kind = kind;
    table.columns.clear();
    for (const double span : {3000.0, 3600.0, 4200.0}) table.columns.push_back({"Dwelling, G 0.25", 400.0, span});
    for (std::size_t row = 0; row < 4; ++row) {
        table.rows.push_back(
            {"C24", "47x" + std::to_string(147 + 25 * row), 147.0 + 25.0 * static_cast<double>(row), {}});
        for (std::size_t column = 0; column < 3; ++column) {
            Cell cell;
            cell.value = unit * static_cast<double>(37 + 11 * row + 3 * column);
            cell.utilisation = kind == TableKind::utilisation ? *cell.value : 0.9;
            cell.governing = Limit::shear;
            if (row == 0 && column == 2) {
                cell = {};
                cell.reason = "a limit fails without variable action";
            }
            table.cells.push_back(cell);
        }
    }
    return table;
}

inline TableResult smallest_sections() {
    TableResult table = span_table("Smallest", "C24, 47 mm", "solid timber", 0);
    table.kind = TableKind::smallest_section;
    for (const double span : {2400.0, 3050.0}) {
        table.rows.push_back({"C24", "", 0.0, span});
        for (std::size_t column = 0; column < table.columns.size(); ++column) {
            Cell cell;
            cell.value = 0.93;
            cell.utilisation = 0.93;
            cell.text = "2/47x220";
            cell.governing = Limit::final_deflection;
            if (column == 8) {
                cell = {};
                cell.reason = "no section of the entry passes";
            }
            table.cells.push_back(cell);
        }
    }
    return table;
}

inline Issue issue() {
    Issue issue;
    issue.brief = brief();
    issue.tables = {span_table("Floor joists", "C24, 47 mm", "solid timber", 40),
                    span_table("floor JOISTS", "+plies [2] of */?: a name beyond 31 characters", "glulam", 3),
                    span_table("floor joists", "+plies [2] of */?: a name beyond 31 characters, again", "glulam", 3),
                    other_table(TableKind::permissible_load, 1e-4),
                    other_table(TableKind::utilisation, 0.01),
                    smallest_sections()};
    issue.basis = {{"Standards", "Basis of design", "EN 1990:2002+A1:2005", "", "standard"},
                   {"Standards", "Timber", "EN 1995-1-1:2004+A1:2008+A2:2014", "", "standard"},
                   {"Span and bearing", "Bearing length", "50 mm at each support", "", "brief"},
                   {"Span and bearing", "-leading sign", std::string(400, 'w') + " and words after a very long one",
                    "6.1", "brief"},
                   {"Parameters", "gamma_G", "1.35  (permanent actions)", "EN 1990 Table A1.2(B)", "recommended"}};
    issue.sources = {{"parameter", "gamma_G", "1.35", "EN 1990:2002", false, false},
                     {"strength class", "C24", "fm,k 24 MPa", "EN 338:2016", true, false},
                     {"size", "47x220", "47 x 220 mm", "=the practice's own list", false, true}};
    issue.cautions = {"For competent persons only: a licensed practitioner decides whether a table applies.",
                      "No extrapolation to other spans, spacings, loads or sections."};
    issue.program_version = "0.0.0";
    issue.catalogue_fingerprint = "0123456789abcdef";
    return issue;
}

} // namespace sample
