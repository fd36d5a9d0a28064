// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/catalogue.hpp"
#include "spanledger/limits.hpp"

#include <string>
#include <vector>

namespace spanledger {

/// How one limit is worked out for one material: made by running its clauses with a number that remembers.
struct LimitStatement {
    Limit limit;
    std::string material; ///< "solid timber", ...
    std::string example;  ///< the member and situation the clauses were run for
    std::string clause;
    std::string not_checked; ///< why the material does not have this limit; empty where it has

    struct Line {
        std::string symbol;
        std::string formula;
        std::string unit;
        std::string clause;
    };
    std::vector<Line> lines; ///< the last two are demand and resistance

    struct Symbol {
        std::string symbol;
        std::string unit;
        std::string meaning;
    };
    std::vector<Symbol> symbols;
    std::vector<std::string> assumptions;
};

/// Every limit for every material of the European basis.
[[nodiscard]] std::vector<LimitStatement> limit_statements(const Catalogue& catalogue);

} // namespace spanledger
