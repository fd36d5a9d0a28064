// SPDX-License-Identifier: MIT
#include "spanledger/catalogue.hpp"

#include <catch2/catch.hpp>

#include <cmath>

// EN 384:2016, relations between characteristic values (from memory). EN 338:2016 tabulates the classes from them,
// rounded: tensile strength of softwood to 0.5 MPa and of hardwood to 1 MPa, compressive strength to 1 MPa and across
// the grain to 0.1 MPa, E_0_05 to 100 MPa, E_90 and G to 10 MPa, mean density to 10 kg/m3. Half of the last digit is
// allowed, as any way of rounding would give.

using namespace spanledger;

namespace {

void check_close(const std::string& name, double tabulated, double relation, double step) {
    INFO(name << ": tabulated " << tabulated << ", by the relation " << relation << ", rounded to " << step);
    CHECK(std::abs(tabulated - relation) <= step / 2.0 + 1e-9);
}

void check_common(const TimberClass& row) {
    check_close(row.name + " f_c_0", row.f_c_0_k.value(), 4.3 * std::sqrt(row.f_m_k), 1.0);
    check_close(row.name + " G_mean", row.G_mean, row.E_0_mean / 16.0, 10.0);
    check_close(row.name + " rho_mean", row.rho_mean, 1.2 * row.rho_k, 10.0);
}

void check_softwood(const TimberClass& row) {
    check_close(row.name + " f_t_0", row.f_t_0_k.value(), -3.07 + 0.73 * row.f_m_k, 0.5);
    check_close(row.name + " f_c_90", row.f_c_90_k, 0.007 * row.rho_k, 0.1);
    check_close(row.name + " E_90", row.E_90_mean.value(), row.E_0_mean / 30.0, 10.0);
    check_close(row.name + " E_0_05", row.E_0_05, 0.67 * row.E_0_mean, 100.0);
}

void check_hardwood(const TimberClass& row) {
    check_close(row.name + " f_t_0", row.f_t_0_k.value(), 0.6 * row.f_m_k, 1.0);
    check_close(row.name + " f_c_90", row.f_c_90_k, (row.rho_k < 700.0 ? 0.010 : 0.015) * row.rho_k, 0.1);
    check_close(row.name + " E_90", row.E_90_mean.value(), row.E_0_mean / 15.0, 10.0);
    check_close(row.name + " E_0_05", row.E_0_05, 0.84 * row.E_0_mean, 100.0);
}

} // namespace

TEST_CASE("EN 384 relations hold for every class of solid timber", "[published]") {
    Diagnostics diagnostics;
    const Catalogue catalogue = load_catalogue({}, "recommended", "", diagnostics);
    int softwoods = 0;
    int hardwoods = 0;
    for (const TimberClass& row : catalogue.timber_classes) {
        if (row.timber == Timber::solid_softwood) {
            check_common(row);
            check_softwood(row);
            ++softwoods;
        } else if (row.timber == Timber::solid_hardwood) {
            check_common(row);
            check_hardwood(row);
            ++hardwoods;
        }
    }
    CHECK(softwoods == 12); // C14 to C50
    CHECK(hardwoods == 12); // D18 to D70
}
