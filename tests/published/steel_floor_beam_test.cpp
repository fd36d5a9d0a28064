// SPDX-License-Identifier: MIT
#include "published/published.hpp"

#include "spanledger/clauses/beam_effects.hpp"
#include "spanledger/engine/line_actions.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

namespace published {

// What of the steel example does not depend on the material: loads, effects, deflection.
Example steel_floor_beam() {
    ActionInputs<double> floor{};
    floor.g_k = 2.88e-3; // N/mm2
    floor.g_partitions = 0.75e-3;
    floor.q_k = 2.5e-3;
    floor.spacing = 2500.0;
    floor.gamma_G = 1.35;
    floor.gamma_Q = 1.5;
    const LineActions<double> actions(floor, 0.482); // N/mm
    CombinationCase combination;
    combination.action = Action::uniform;
    constexpr double L = 5700.0;
    constexpr double EI = 210000.0 * 117.7e6; // IPE 330: I_y = 11770 cm4, from memory
    const double w = beam::simply_supported::bending_deflection<double>({15.81, 0.0}, L, EI);
    Example e;
    e.title = "Loads and effects of a floor beam";
    e.source = "Steel Buildings in Europe, Multi-Storey Steel Buildings, Part 4: Detailed Design, Appendix A.1, pages "
               "4-57 to 4-63";
    e.inputs = "span 5.70 m, 2.50 m apart, slab 2.88 and partitions 0.75 kN/m2, self-weight 0.482 kN/m, imposed 2.5 "
               "kN/m2, factors 1.35 and 1.50; I_y of IPE 330 from memory";
    e.rows = {
        {Mark::seen, "G_k", "9.56", actions.permanent(), "kN/m"},
        {Mark::seen, "Q_k", "6.25", actions.variable(Action::uniform).q, "kN/m"},
        {Mark::seen, "design load", "22.28", actions.design(combination).q, "kN/m"},
        {Mark::seen, "M_Ed, from the rounded 22.28 kN/m", "90.48",
         beam::simply_supported::moment<double>({22.28, 0.0}, L) / 1e6, "kNm"},
        {Mark::seen, "V_Ed, from the rounded 22.28 kN/m", "63.50",
         beam::simply_supported::shear<double>({22.28, 0.0}, L) / 1e3, "kN"},
        {Mark::from_memory, "L/w under G + Q = 15.81 kN/m", "648", L / w, "-"},
    };
    e.not_covered = {
        {"cross-section class, M_cr, chi_LT, M_b_Rd, V_pl_Rd", "rolled steel is not part of this comparison"},
    };
    return e;
}

} // namespace published

TEST_CASE("Steel Buildings in Europe: loads and effects of a floor beam") {
    published::check(published::steel_floor_beam());
}
