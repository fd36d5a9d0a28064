// SPDX-License-Identifier: MIT
#include "practice.hpp"
#include "quads.hpp"

#include "spanledger/engine/basis.hpp"
#include "spanledger/engine/sweep.hpp"
#include "spanledger/input/inputs.hpp"
#include "spanledger/member.hpp"

#include <fmt/format.h>

#include <array>
#include <cmath>
#include <cstdlib>
#include <filesystem>
#include <iostream>
#include <memory>
#include <string>
#include <vector>

// The span solver against a bisection of every limit between the bounds of the search, over the same joists.

namespace {

using namespace spanledger;
using Outcomes = std::array<LimitOutcome, limit_count>;

constexpr int bisection_steps = 24;

/// A member under a load class, with its joists at every spacing.
struct Row {
    std::unique_ptr<JoistRules> rules;
    SpanRange range;
    std::vector<std::unique_ptr<Joist>> joists;
};

struct Work {
    std::vector<Row> rows;
    SpanRange spacings;
    double cap = 1.0;
};

Work work_of(const Inputs& inputs) {
    const TableRequest& table = inputs.brief.tables.front();
    Work work{.rows = {},
              .spacings = {table.spacings.front(), table.spacings.back()},
              .cap = inputs.brief.basis.utilisation_cap};
    Diagnostics diagnostics;
    for (const MembersEntry& entry : inputs.brief.members) {
        for (const Member& member : members_of(entry, inputs.catalogue, diagnostics)) {
            for (const LoadClass& load : inputs.brief.loads) {
                Row row;
                row.rules = make_rules(inputs, member, load);
                row.range = search_range(inputs.brief.search, *row.rules);
                for (const double spacing : table.spacings) {
                    row.joists.push_back(row.rules->at({.spacing = spacing, .variable = load.variable}));
                }
                work.rows.push_back(std::move(row));
            }
        }
    }
    return work;
}

LimitOutcome bisected(const Row& row, const Joist& joist, Limit limit, double cap) {
    const auto exceeded = [&](double L) { return worst_check(*row.rules, joist, limit, L).utilisation > cap; };
    if (exceeded(row.range.lower)) return {.kind = LimitOutcome::Kind::fails_at_once, .clear_span = 0.0};
    if (!exceeded(row.range.upper)) return {.kind = LimitOutcome::Kind::never_reached, .clear_span = 0.0};
    SpanRange bracket = row.range;
    for (int step = 0; step < bisection_steps; ++step) {
        const double middle = 0.5 * (bracket.lower + bracket.upper);
        (exceeded(middle) ? bracket.upper : bracket.lower) = middle;
    }
    return {.kind = LimitOutcome::Kind::spans, .clear_span = bracket.lower};
}

std::vector<Outcomes> by_bisection(const Work& work) {
    std::vector<Outcomes> all;
    for (const Row& row : work.rows) {
        for (const auto& joist : row.joists) {
            Outcomes& outcomes = all.emplace_back();
            for (const LimitDefinition& definition : limit_definitions) {
                const LimitPlan& plan = row.rules->plan(definition.limit);
                if (plan.status != LimitStatus::checked) continue;
                outcomes[index_of(definition.limit)] = bisected(row, *joist, definition.limit, cap_of(plan, work.cap));
            }
        }
    }
    return all;
}

std::vector<Outcomes> by_solver(const Work& work) {
    std::vector<Outcomes> all;
    for (const Row& row : work.rows) {
        const SpanSolver solver(*row.rules, row.range, work.spacings, work.cap);
        for (const auto& joist : row.joists) solver.solve(*joist, all.emplace_back());
    }
    return all;
}

/// Within the last step of the bisection. Where a utilisation falls again beyond its first crossing, the bisection may
/// end at a later one: then the solver's must be a crossing.
bool agree(const Row& row, const Joist& joist, Limit limit, const LimitOutcome& solved, const LimitOutcome& bisected,
           double cap) {
    const double resolution = std::ldexp(row.range.upper - row.range.lower, -bisection_steps) * 1.01;
    if (solved.kind == bisected.kind) {
        if (std::abs(solved.clear_span - bisected.clear_span) <= resolution) return true;
    }
    if (solved.kind != LimitOutcome::Kind::spans) return false;
    const auto u = [&](double L) { return worst_check(*row.rules, joist, limit, L).utilisation; };
    return u(solved.clear_span) <= cap * (1.0 + 1e-12) && u(solved.clear_span + resolution) > cap;
}

std::size_t differences(const Work& work, const std::vector<Outcomes>& solved, const std::vector<Outcomes>& bisected) {
    std::size_t count = 0;
    std::size_t at = 0;
    for (const Row& row : work.rows) {
        for (const auto& joist : row.joists) {
            for (std::size_t i = 0; i < limit_count; ++i) {
                const Limit limit = limit_definitions[i].limit;
                const double cap = cap_of(row.rules->plan(limit), work.cap);
                if (!agree(row, *joist, limit, solved[at][i], bisected[at][i], cap)) ++count;
            }
            ++at;
        }
    }
    return count;
}

struct Case {
    benchmark::BriefKind kind;
    const char* name;
};

bool compare(const std::string& folder, const Case& brief, std::size_t quads) {
    Diagnostics diagnostics;
    const std::string file = benchmark::write_practice(folder, {.sizes = 70, .loads = 3, .spacings = 3}, brief.kind);
    const auto inputs = read_inputs(file, diagnostics);
    report(diagnostics, std::cerr);
    if (!inputs) return false;
    const Work work = work_of(*inputs);
    const std::size_t different = differences(work, by_solver(work), by_bisection(work));
    if (different > 0) {
        fmt::print("{}: {} outcomes differ between the solver and the bisection\n", brief.name, different);
        return false;
    }
    const auto solver = [&] { return benchmark::timed([&] { by_solver(work); }); };
    const auto bisection = [&] { return benchmark::timed([&] { by_bisection(work); }); };
    const benchmark::Ratios control = benchmark::measure(quads, solver, solver);
    benchmark::print(fmt::format("solver / solver (control), {}", brief.name), control);
    benchmark::print(fmt::format("bisection / solver, {}", brief.name), benchmark::measure(quads, solver, bisection));
    return benchmark::control_holds(control);
}

} // namespace

/// solver_bench [QUADS]: exit status 1 where outputs differ or a control is off.
int main(int argc, char** argv) {
    using benchmark::BriefKind;
    const std::size_t quads = argc > 1 ? std::strtoul(argv[1], nullptr, 10) : 25;
    std::string folder = (std::filesystem::temp_directory_path() / "spanledger-solver-XXXXXX").string();
    if (quads == 0 || mkdtemp(folder.data()) == nullptr) return 2;
    bool well = true;
    for (const Case& brief :
         {Case{BriefKind::without_vibration, "without vibration"}, Case{BriefKind::with_vibration, "with vibration"},
          Case{BriefKind::free_edge, "free edge"}}) {
        well = compare(folder, brief, quads) && well;
    }
    std::filesystem::remove_all(folder);
    return well ? 0 : 1;
}
