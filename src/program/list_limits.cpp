// SPDX-License-Identifier: MIT
#include "catalogue_listings.hpp"

#include "spanledger/engine/limit_statement.hpp"
#include "spanledger/limits.hpp"

#include <algorithm>
#include <utility>

namespace spanledger {
namespace {

/// Rows that differ in their material only become one.
void add_limit(Listing& listing, const LimitStatement& statement) {
    const LimitDefinition& limit = definition_of(statement.limit);
    for (Listing::Row& row : listing.rows) {
        if (name_of(row) == limit.name && std::get<std::string>(row[3]) == statement.clause) {
            std::get<std::string>(row[2]) += ", " + statement.material;
            return;
        }
    }
    listing.rows.push_back({std::string(limit.name), std::string(1, limit.letter), statement.material, statement.clause,
                            std::string(limit.about)});
}

Listing list_formulas(const std::vector<LimitStatement>& statements) {
    Listing listing{"formulas", {"limit", "material", "symbol", "formula", "unit", "clause"}, {}};
    for (const LimitStatement& statement : statements) {
        const std::string name(definition_of(statement.limit).name);
        for (const LimitStatement::Line& line : statement.lines) {
            listing.rows.push_back({name, statement.material, line.symbol, line.formula, line.unit, line.clause});
        }
    }
    return listing;
}

Listing list_symbols(const std::vector<LimitStatement>& statements) {
    Listing listing{"symbols", {"limit", "material", "symbol", "unit", "meaning"}, {}};
    for (const LimitStatement& statement : statements) {
        const std::string name(definition_of(statement.limit).name);
        for (const LimitStatement::Symbol& symbol : statement.symbols) {
            listing.rows.push_back({name, statement.material, symbol.symbol, symbol.unit, symbol.meaning});
        }
    }
    return listing;
}

Listing list_assumptions(const std::vector<LimitStatement>& statements) {
    Listing listing{"assumptions", {"limit", "material", "assumption"}, {}};
    for (const LimitStatement& statement : statements) {
        const std::string name(definition_of(statement.limit).name);
        listing.rows.push_back({name, statement.material, "shown for " + statement.example});
        for (const std::string& words : statement.assumptions) {
            listing.rows.push_back({name, statement.material, words});
        }
    }
    return listing;
}

} // namespace

std::vector<Listing> list_limits(const Catalogue& catalogue, Detail detail) {
    std::vector<LimitStatement> statements;
    for (LimitStatement& statement : limit_statements(catalogue)) {
        if (statement.not_checked.empty()) statements.push_back(std::move(statement));
    }
    std::stable_sort(statements.begin(), statements.end(),
                     [](const auto& a, const auto& b) { return index_of(a.limit) < index_of(b.limit); });
    Listing listing{"limits", {"limit", "letter", "materials", "clause", "about"}, {}};
    for (const LimitStatement& statement : statements) add_limit(listing, statement);
    // No clause works it out: it is a length that the brief states.
    const LimitDefinition& stock = definition_of(Limit::stock_length);
    listing.rows.push_back({std::string(stock.name), std::string(1, stock.letter),
                            std::string("all, where the brief states stock lengths"), std::string("common practice"),
                            std::string(stock.about)});
    if (detail == Detail::overview) return {listing};
    return {listing, list_formulas(statements), list_symbols(statements), list_assumptions(statements)};
}

} // namespace spanledger
