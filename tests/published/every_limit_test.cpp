// SPDX-License-Identifier: MIT
#define CATCH_CONFIG_EXTERNAL_INTERFACES
#include <catch2/catch.hpp>

#include "spanledger/catalogue.hpp"
#include "spanledger/engine/limit_statement.hpp"

#include <algorithm>
#include <array>
#include <string>

// Every limit of every material stands on a case from outside the project, or on a numerical solution that shares no
// code with it. A new limit, or a test that is renamed or dropped, fails here until its case is named.

namespace spanledger {
namespace {

struct Case {
    const char* material;
    Limit limit;
    const char* test; ///< name of the test case
};

constexpr const char* lvl_floor = "LVL Handbook Europe 9.1: LVL 48 P joist floor";
constexpr const char* glulam_hall = "Structural Design Essentials: glulam main beam of a hall";
constexpr const char* din_floor = "DIN 1052: timber joist floor";
constexpr const char* timber_again =
    "the same limits are active, with the same utilisation, as in an independent calculation";
constexpr const char* eigenvalue_631 = "(6.31) is the lowest eigenvalue of the lateral torsional equation";
constexpr const char* near_631 = "(6.32) is (6.31) for a thin softwood rectangle with G = E/16, within two percent";
constexpr const char* virtual_work = "mid-span deflection of a simply supported joist is that of virtual work";
constexpr const char* strip_frequency = "the first frequency of a floor strip is that of a metre of it";
constexpr const char* beam_frequency = "the first frequency of a beam is its lowest eigenvalue";
constexpr const char* steel_beam = "Steel Buildings in Europe: loads and effects of a floor beam";
constexpr const char* steel_buckling = "Steel Buildings in Europe: lateral torsional buckling of a floor beam";
constexpr const char* channel_again = "channels agree with a plain second implementation";
constexpr std::array cases{
    Case{"solid timber", Limit::bending, din_floor},
    Case{"solid timber", Limit::shear, din_floor},
    Case{"solid timber", Limit::bearing, timber_again},
    Case{"solid timber", Limit::lateral_buckling, near_631},
    Case{"solid timber", Limit::variable_deflection, virtual_work},
    Case{"solid timber", Limit::instantaneous_deflection, virtual_work},
    Case{"solid timber", Limit::final_deflection, timber_again},
    Case{"solid timber", Limit::frequency, strip_frequency},
    Case{"solid timber", Limit::unit_load_deflection, virtual_work},
    Case{"solid timber", Limit::velocity_response, lvl_floor},
    Case{"glulam", Limit::bending, glulam_hall},
    Case{"glulam", Limit::shear, timber_again},
    Case{"glulam", Limit::bearing, timber_again},
    Case{"glulam", Limit::lateral_buckling, near_631},
    Case{"glulam", Limit::variable_deflection, virtual_work},
    Case{"glulam", Limit::instantaneous_deflection, virtual_work},
    Case{"glulam", Limit::final_deflection, glulam_hall},
    Case{"glulam", Limit::frequency, strip_frequency},
    Case{"glulam", Limit::unit_load_deflection, virtual_work},
    Case{"glulam", Limit::velocity_response, lvl_floor},
    Case{"LVL", Limit::bending, lvl_floor},
    Case{"LVL", Limit::shear, lvl_floor},
    Case{"LVL", Limit::bearing, lvl_floor},
    Case{"LVL", Limit::lateral_buckling, eigenvalue_631},
    Case{"LVL", Limit::variable_deflection, virtual_work},
    Case{"LVL", Limit::instantaneous_deflection, virtual_work},
    Case{"LVL", Limit::final_deflection, timber_again},
    Case{"LVL", Limit::frequency, strip_frequency},
    Case{"LVL", Limit::unit_load_deflection, virtual_work},
    Case{"LVL", Limit::velocity_response, lvl_floor},
    Case{"rolled steel", Limit::bending, steel_beam},
    Case{"rolled steel", Limit::shear, steel_beam},
    Case{"rolled steel", Limit::bending_with_shear,
         "bending with shear: the web gives less from half of the shear resistance on"},
    Case{"rolled steel", Limit::bearing, "the web at an end support: IPE 200, S275, on 50 mm"},
    Case{"rolled steel", Limit::lateral_buckling, steel_buckling},
    Case{"rolled steel", Limit::variable_deflection, virtual_work},
    Case{"rolled steel", Limit::instantaneous_deflection, steel_beam},
    Case{"rolled steel", Limit::frequency, beam_frequency},
    Case{"rolled steel", Limit::unit_load_deflection, virtual_work},
    Case{"cold-formed steel", Limit::bending, "SX022: effective section of a lipped channel"},
    Case{"cold-formed steel", Limit::shear, channel_again},
    Case{"cold-formed steel", Limit::bending_with_shear, channel_again},
    Case{"cold-formed steel", Limit::bearing, channel_again},
    Case{"cold-formed steel", Limit::variable_deflection, channel_again},
    Case{"cold-formed steel", Limit::instantaneous_deflection, channel_again},
    Case{"cold-formed steel", Limit::frequency, beam_frequency},
    Case{"cold-formed steel", Limit::unit_load_deflection, virtual_work},
};

bool has_test(const std::string& name) {
    const auto& tests = Catch::getRegistryHub().getTestCaseRegistry().getAllTests();
    return std::any_of(tests.begin(), tests.end(), [&](const Catch::TestCase& test) { return test.name == name; });
}

TEST_CASE("every limit of every material has a case from outside") {
    Diagnostics none;
    for (const LimitStatement& statement : limit_statements(load_catalogue({}, "recommended", "", none))) {
        if (!statement.not_checked.empty()) continue;
        const auto found = std::find_if(cases.begin(), cases.end(), [&](const Case& c) {
            return statement.material == c.material && statement.limit == c.limit;
        });
        INFO(statement.material << ", " << definition_of(statement.limit).name);
        REQUIRE(found != cases.end());
        CHECK(has_test(found->test));
    }
}

} // namespace
} // namespace spanledger
