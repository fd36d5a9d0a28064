// SPDX-License-Identifier: MIT
#include "cold_formed_plans.hpp"

#include <fmt/format.h>

namespace spanledger {
namespace {

/// One ratio of the section and the range the standard gives for it.
struct ScopeRule {
    const char* symbol;
    double value;
    double least;
    double greatest;
    const char* clause;
};

std::string outside(const ScopeRule& rule) {
    if (rule.value > rule.greatest) {
        return fmt::format("{} = {:.4g} is above {} (EN 1993-1-3 {})", rule.symbol, rule.value, rule.greatest,
                           rule.clause);
    }
    if (!(rule.value >= rule.least)) {
        return fmt::format("{} = {:.4g} is below {} (EN 1993-1-3 {})", rule.symbol, rule.value, rule.least,
                           rule.clause);
    }
    return {};
}

template <std::size_t Count> std::string first_outside(const std::array<ScopeRule, Count>& rules) {
    for (const ScopeRule& rule : rules) {
        if (std::string words = outside(rule); !words.empty()) return words;
    }
    return {};
}

std::string size_refusal(const ColdFormedInputs<double>& x) {
    const double t = x.size.t_nom - x.coating;
    const double sharpest = 0.04 * t * x.E / x.f_yb;
    return first_outside(std::array{
        ScopeRule{"core thickness", t, 0.45, 15.0, "3.2.4(1), mm"},
        ScopeRule{"h/t", x.size.h / t, 0.0, 500.0, "Table 5.1"},
        ScopeRule{"b_1/t", x.size.b_1 / t, 0.0, 60.0, "Table 5.1"},
        ScopeRule{"b_2/t", x.size.b_2 / t, 0.0, 60.0, "Table 5.1"},
        ScopeRule{"c/t", x.size.c / t, 0.0, 50.0, "Table 5.1"},
        ScopeRule{"c/b_1", x.size.c / x.size.b_1, 0.2, 0.6, "5.2(2)"},
        ScopeRule{"c/b_2", x.size.c / x.size.b_2, 0.2, 0.6, "5.2(2)"},
        ScopeRule{"r", x.size.r, 0.0, sharpest, "5.1(6): 0.04 t E/f_yb, mm"},
    });
}

std::string web_refusal(const ColdFormedInputs<double>& x) {
    const double t = x.size.t_nom - x.coating;
    std::string words = first_outside(std::array{
        ScopeRule{"h_w/t", (x.size.h - x.size.t_nom) / t, 0.0, 200.0, "6.1.7.2(1)"},
        ScopeRule{"r/t", x.size.r / t, 0.0, 6.0, "6.1.7.2(1)"},
    });
    if (!words.empty()) words += ": the web must be stiffened or cleated at its supports";
    return words;
}

} // namespace

std::string cold_formed_refusal(const Support& support, const ColdFormedInputs<double>& inputs) {
    if (support.arrangement == Arrangement::cantilever) return "cantilevers of cold-formed channels are not covered";
    if (support.compression_edge != CompressionEdge::held) {
        return "cold-formed channels are covered only where the compression flange is stated as held";
    }
    std::string words = size_refusal(inputs);
    if (words.empty() && support.web_at_support == WebAtSupport::seated) words = web_refusal(inputs);
    return words;
}

} // namespace spanledger
