// SPDX-License-Identifier: MIT
#include "spanledger/engine/limit_curves.hpp"

#include "spanledger/engine/cell_solver.hpp"
#include "spanledger/engine/permissible_load.hpp"

#include <algorithm>
#include <cmath>
#include <set>

namespace spanledger {
namespace {

constexpr std::size_t points = 17;

/// The top of the chart: room above the load class's own action, whatever short spans could carry.
double chart_top(const LoadClass& load) {
    constexpr double least_top = 0.010; // 10 kN/m2
    return std::max(least_top, 4.0 * load.variable);
}

LoadClass with_variable(LoadClass load, double variable) {
    load.variable = variable;
    return load;
}

/// Clear spans of a chart: from where the load comes below the top to where no variable action is left.
class ChartRange {
public:
    ChartRange(const Inputs& inputs, const Member& member, const LoadClass& load, double spacing)
        : unloaded_(inputs, member, with_variable(load, 0.0), {spacing, spacing}),
          cell_(unloaded_.permissible_span(spacing)) {
        const CellSolver loaded(inputs, member, with_variable(load, chart_top(load)), {spacing, spacing});
        const double lower = search_range(inputs.brief.search, loaded.rules()).lower - loaded.rules().span_addition();
        from_ = loaded.permissible_span(spacing).value.value_or(lower);
    }

    /// In steps of whole centimetres.
    [[nodiscard]] std::vector<double> spans() const {
        if (!cell_.value || *cell_.value <= from_) return {};
        constexpr double centimetre = 10.0;
        const double length = *cell_.value - from_;
        const double step = std::max(centimetre, std::ceil(length / (points - 1) / centimetre) * centimetre);
        std::vector<double> spans;
        for (double span = std::ceil(from_ / centimetre) * centimetre; span < *cell_.value; span += step) {
            spans.push_back(span);
        }
        spans.push_back(*cell_.value);
        return spans;
    }

    /// How far a limit allows to span whatever the load.
    [[nodiscard]] std::optional<double> last_span(Limit limit) const {
        const LimitOutcome& outcome = cell_.limits[index_of(limit)];
        return outcome.kind == LimitOutcome::Kind::spans ? std::optional(outcome.clear_span) : std::nullopt;
    }

private:
    CellSolver unloaded_;
    Cell cell_;
    double from_ = 0.0;
};

std::optional<double> shown(const std::optional<double>& load, double top) {
    return load && *load <= top ? load : std::nullopt;
}

LimitCurves::Line line_of(Limit limit, const std::vector<PermissibleLoad>& at_spans, double top) {
    LimitCurves::Line line{limit, {}};
    for (const PermissibleLoad& at_span : at_spans) {
        const LoadOutcome& outcome = at_span.limits[index_of(limit)];
        const bool has_load = outcome.kind == LoadOutcome::Kind::load;
        line.loads.push_back(shown(has_load ? std::optional(outcome.variable) : std::nullopt, top));
    }
    return line;
}

/// An upright line is drawn where it is on the chart, or just beyond its right edge.
std::optional<double> upright(const std::optional<double>& span, double longest) {
    constexpr double margin = 1.15;
    return span && *span <= longest * margin ? span : std::nullopt;
}

} // namespace

std::optional<LimitCurves> limit_curves(const Inputs& inputs, const Member& member, const LoadClass& load,
                                        double spacing) {
    const ChartRange range(inputs, member, load, spacing);
    LimitCurves curves{member_name(member), load.name, spacing, range.spans(), {}, {}, 0.0};
    if (curves.spans.empty()) return std::nullopt;
    curves.greatest_load = chart_top(load);
    const LoadSolver solver(inputs, member, load);
    std::vector<PermissibleLoad> at_spans;
    for (const double span : curves.spans) at_spans.push_back(solver.at(spacing, span));
    for (const LimitDefinition& definition : limit_definitions) {
        LimitCurves::Line line = line_of(definition.limit, at_spans, curves.greatest_load);
        const bool loads = std::any_of(line.loads.begin(), line.loads.end(), [](const auto& l) { return l; });
        if (!loads) line.upright_at = upright(range.last_span(definition.limit), curves.spans.back());
        if (loads || line.upright_at) curves.lines.push_back(std::move(line));
    }
    for (const PermissibleLoad& at_span : at_spans) {
        curves.envelope.push_back(shown(at_span.variable, curves.greatest_load));
    }
    return curves;
}

std::vector<LimitCurves> limit_curves_of_brief(const Inputs& inputs) {
    Diagnostics ignored; // the brief was read without errors
    std::set<std::string> made;
    std::vector<LimitCurves> all;
    for (const TableRequest& request : inputs.brief.tables) {
        if (request.kind != TableKind::permissible_span) continue;
        for (const std::string& name : request.members) {
            const auto entry = std::find_if(inputs.brief.members.begin(), inputs.brief.members.end(),
                                            [&](const MembersEntry& e) { return e.name == name; });
            const std::vector<Member> members = members_of(*entry, inputs.catalogue, ignored);
            if (members.empty() || !made.insert(name + '\n' + request.loads.front()).second) continue;
            const auto load = std::find_if(inputs.brief.loads.begin(), inputs.brief.loads.end(),
                                           [&](const LoadClass& l) { return l.name == request.loads.front(); });
            auto curves = limit_curves(inputs, members[members.size() / 2], *load, request.spacings.front());
            if (curves) all.push_back(std::move(*curves));
        }
    }
    return all;
}

} // namespace spanledger
