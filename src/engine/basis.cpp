// SPDX-License-Identifier: MIT
#include "spanledger/engine/basis.hpp"

#include "spanledger/engine/cold_formed_rules.hpp"
#include "spanledger/engine/rolled_rules.hpp"
#include "spanledger/engine/timber_rules.hpp"

#include <algorithm>
#include <variant>

namespace spanledger {
namespace {

// The visible list: one line per family of materials.
struct RulesOf {
    const Inputs& inputs;
    const LoadClass& load;
    UniformAction uniform;

    std::unique_ptr<JoistRules> operator()(const TimberMember& member) const {
        return make_timber_rules(inputs, member, load, uniform);
    }
    std::unique_ptr<JoistRules> operator()(const RolledMember& member) const {
        return make_rolled_rules(inputs, member, load, uniform);
    }
    std::unique_ptr<JoistRules> operator()(const ColdFormedMember& member) const {
        return make_cold_formed_rules(inputs, member, load, uniform);
    }
};

} // namespace

std::unique_ptr<JoistRules> make_rules(const Inputs& inputs, const Member& member, const LoadClass& load,
                                       UniformAction uniform) {
    return std::visit(RulesOf{inputs, load, uniform}, member);
}

SpanRange search_range(const SearchRange& search, const JoistRules& rules) {
    constexpr double shortest_clear_span = 500.0;
    constexpr double longest_clear_span = 30000.0;
    const double lower = search.min_clear_span.value_or(std::max(shortest_clear_span, 2.0 * rules.depth()));
    const double upper = search.max_clear_span.value_or(longest_clear_span);
    return {lower + rules.span_addition(), upper + rules.span_addition()};
}

} // namespace spanledger
