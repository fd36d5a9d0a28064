// SPDX-License-Identifier: MIT
#include "spanledger/catalogue.hpp"

#include <catch2/catch.hpp>

#include <algorithm>
#include <set>

using namespace spanledger;

namespace {

Catalogue built_in(const std::string& set) {
    Diagnostics diagnostics;
    Catalogue catalogue = load_catalogue({}, set, "", diagnostics);
    CHECK(diagnostics.all().empty());
    return catalogue;
}

const Parameter& find(const Catalogue& catalogue, const std::string& key) {
    const auto& rows = catalogue.parameters;
    return *std::find_if(rows.begin(), rows.end(), [&](const Parameter& row) { return row.key == key; });
}

} // namespace

TEST_CASE("The built-in catalogue reads without a problem") {
    const Catalogue catalogue = built_in(GENERATE(as<std::string>(), "recommended", "uk"));
    CHECK(catalogue.timber_classes.size() == 39);
    CHECK(catalogue.load_categories.size() == 18);
    CHECK(catalogue.service_factors.size() == 9);
    CHECK(catalogue.combinations.size() == 5);
}

TEST_CASE("Every built-in row has a source that resolves") {
    const Catalogue catalogue = built_in("uk");
    std::set<std::string> keys;
    for (const Source& source : catalogue.sources) {
        keys.insert(source.key);
    }
    const auto check_all = [&](const auto& rows) {
        for (const auto& row : rows) {
            INFO(row.provenance.source);
            CHECK(keys.count(row.provenance.source) == 1);
            CHECK_FALSE(row.provenance.practice_own);
        }
    };
    check_all(catalogue.timber_classes);
    check_all(catalogue.timber_sizes);
    check_all(catalogue.load_categories);
    check_all(catalogue.parameters);
    check_all(catalogue.service_factors);
    check_all(catalogue.combinations);
}

TEST_CASE("A class has the values of its standard") {
    const Catalogue catalogue = built_in("recommended");
    const TimberClass* c24 = find_timber_class(catalogue, "C24");
    REQUIRE(c24 != nullptr);
    CHECK(c24->timber == Timber::solid_softwood);
    CHECK(c24->f_m_k == 24.0);
    CHECK(c24->f_v_k == 4.0);
    CHECK(c24->f_c_90_k == 2.5);
    CHECK(c24->E_0_mean == 11000.0);
    CHECK(c24->E_0_05 == 7400.0);
    CHECK(c24->G_mean == 690.0);
    CHECK_FALSE(c24->G_05.has_value());
    CHECK(c24->rho_k == 350.0);
    CHECK(c24->rho_mean == 420.0);
    CHECK(c24->provenance.seen);
    CHECK_FALSE(find_timber_class(catalogue, "C45")->provenance.seen);
    CHECK(find_timber_class(catalogue, "GL24h")->G_05 == 540.0);
    CHECK(find_timber_class(catalogue, "LVL48P")->size_exponent == 0.15);
    CHECK(find_timber_class(catalogue, "LVL48P")->f_m_k == 44.0); // edgewise, not 48
    CHECK(find_timber_class(catalogue, "C25") == nullptr);
}

TEST_CASE("No glulam or LVL class is stiffer across the grain or at the fifth percentile than on average") {
    for (const TimberClass& row : built_in("uk").timber_classes) {
        INFO(row.name);
        CHECK(row.E_0_05 < row.E_0_mean);
        CHECK(row.rho_k < row.rho_mean);
        CHECK((row.timber == Timber::lvl) == row.size_exponent.has_value());
    }
}

TEST_CASE("The UK set differs from the recommended one where its annex does") {
    const Catalogue recommended = built_in("recommended");
    const Catalogue uk = built_in("uk");
    CHECK(parameter(recommended, "xi") == 0.85);
    CHECK(parameter(uk, "xi") == 0.925);
    CHECK(find(uk, "xi").recommended == 0.85);
    CHECK(find(uk, "xi").set == "uk");
    CHECK(find(uk, "kh_solid_cap").set == "recommended");
    CHECK(find_load_category(recommended, "H")->psi.psi0 == 0.0);
    CHECK(find_load_category(uk, "H")->psi.psi0 == 0.7);
    CHECK(find_load_category(uk, "A")->q_k == 0.0015);
    CHECK(find_load_category(recommended, "A")->q_k == 0.002);
    CHECK(find_load_category(recommended, "A")->Q_k == 2000.0);
    CHECK_FALSE(find_load_category(uk, "C3")->q_k.has_value());
    CHECK(uk.snow_psi.psi0 == 0.5);
    CHECK(recommended.parameter_set == "recommended");
}

TEST_CASE("Durations and psi of the load categories") {
    const Catalogue catalogue = built_in("recommended");
    CHECK(find_load_category(catalogue, "A")->duration == Duration::medium_term);
    CHECK(find_load_category(catalogue, "E1")->duration == Duration::long_term);
    CHECK(find_load_category(catalogue, "H")->duration == Duration::short_term);
    CHECK(find_load_category(catalogue, "H")->roof);
    CHECK_FALSE(find_load_category(catalogue, "A")->roof);
    CHECK(find_load_category(catalogue, "C5")->psi.psi2 == 0.6);
    CHECK(find_load_category(catalogue, "E1")->psi.psi0 == 1.0);
    CHECK(find_load_category(catalogue, "B")->psi.psi2 == 0.3);
}

TEST_CASE("kmod and kdef by material and service class") {
    const Catalogue catalogue = built_in("recommended");
    const auto timber = GENERATE(Timber::solid_softwood, Timber::solid_hardwood, Timber::glulam, Timber::lvl);
    const ServiceFactors* dry = find_service_factors(catalogue, timber, 1);
    REQUIRE(dry != nullptr);
    CHECK(dry->k_mod == std::array<double, 5>{0.6, 0.7, 0.8, 0.9, 1.1});
    CHECK(dry->k_def == 0.6);
    CHECK(find_service_factors(catalogue, timber, 2)->k_mod == dry->k_mod);
    CHECK(find_service_factors(catalogue, timber, 2)->k_def == 0.8);
    CHECK(find_service_factors(catalogue, timber, 3)->k_mod == std::array<double, 5>{0.5, 0.55, 0.65, 0.7, 0.9});
    CHECK(find_service_factors(catalogue, timber, 3)->k_def == 2.0);
    CHECK(find_service_factors(catalogue, timber, 4) == nullptr);
}

TEST_CASE("Combinations are data") {
    using Variable = Combination::Variable;
    const Catalogue catalogue = built_in("recommended");
    const auto& rows = catalogue.combinations;
    REQUIRE(rows.size() == 5);
    CHECK(rows[0].name == "6.10 permanent only");
    CHECK(rows[1].name == "6.10");
    CHECK(rows[2].name == "6.10a permanent only");
    CHECK(rows[3].name == "6.10a");
    CHECK(rows[3].variable == Variable::combination_value);
    CHECK_FALSE(rows[3].reduced_permanent);
    CHECK(rows[4].name == "6.10b");
    CHECK(rows[4].variable == Variable::full);
    CHECK(rows[4].reduced_permanent);
    CHECK(rows[0].variable == Variable::none);
}

TEST_CASE("Every parameter has a value within its hard range, and an unknown key is a fault") {
    const Catalogue catalogue = built_in(GENERATE(as<std::string>(), "recommended", "uk"));
    for (const Parameter& row : catalogue.parameters) {
        INFO(row.key);
        CHECK_FALSE(row.set.empty());
        CHECK(row.least < row.greatest);
        CHECK(row.value >= row.least);
        CHECK(row.value <= row.greatest);
        CHECK(row.recommended >= row.least);
    }
    CHECK_THROWS_AS(parameter(catalogue, "gamma_X"), std::logic_error);
}

TEST_CASE("Series hold no size twice, and depths grow within a series") {
    const Catalogue catalogue = built_in("uk");
    const TimberSize* before = nullptr;
    for (const TimberSize& row : catalogue.timber_sizes) {
        INFO(row.series << ' ' << row.b << 'x' << row.h);
        if (before != nullptr && before->series == row.series && before->b == row.b) {
            CHECK(before->h < row.h);
        }
        before = &row;
    }
}

TEST_CASE("The fingerprint of the data is stable within a build and looks like one") {
    const std::string fingerprint = builtin_fingerprint();
    CHECK(fingerprint.size() == 16);
    CHECK(fingerprint.find_first_not_of("0123456789abcdef") == std::string::npos);
    CHECK(fingerprint == builtin_fingerprint());
}
