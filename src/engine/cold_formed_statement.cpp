// SPDX-License-Identifier: MIT
#include "cold_formed_statement.hpp"

#include "steel_limit_lines.hpp"

#include <fmt/format.h>

#include <array>

namespace spanledger {
namespace {

constexpr const char* heading = "Cold-formed channels";

constexpr std::array rules{
    FixedLine{"Standards", "EN 1993-1-3:2006, EN 1993-1-5:2006; grades of EN 10346", "", "standard"},
    FixedLine{
        "Corners",
        "sharp in resistance where r <= 5 t and r <= 0.10 b_p of web and flanges, else I (1 - 2 delta); stiffness "
        "always with I (1 - 2 delta)",
        "EN 1993-1-3 5.1(3), (4)", "standard"},
    FixedLine{
        "Edge stiffener",
        "spring stiffness K and b_e1 of the first step are kept, chi_d is refined until it settles, in at most 50 "
        "steps; where it does not, the smaller of the last two counts",
        "EN 1993-1-3 5.5.3.2", "reading of the standard"},
    FixedLine{"Effective section",
              "web in one step; moduli to the mid-lines of the flanges, never above the elastic one",
              "EN 1993-1-3 5.5, 6.1.4.1; EN 1993-1-5 4.4", "standard"},
    FixedLine{"Bending with shear",
              "M/M_c + (2V/V_b - 1)^2 <= 1 at every section with V > V_b/2, on the safe side without the share of the "
              "flanges; the concentrated load stands where it is worst for the section",
              "EN 1993-1-3 6.1.10, (6.27)", "standard"},
    FixedLine{"Deflection of channels",
              "second moment of area between gross and effective section, by the stress under the characteristic "
              "combination; no creep",
              "EN 1993-1-3 7.1(3)", "standard"},
    FixedLine{"Frequency and 1 kN deflection", "with the gross section, I (1 - 2 delta)", "EN 1993-1-3 5.1(4)",
              "assumption"},
    FixedLine{"Self-weight of channels", "from the area at nominal thickness with rounded corners", "", "assumption"},
    FixedLine{"Twist", "the deck and its fixings keep the channel from twisting", "", "assumption"},
    FixedLine{"Not covered", "compression flange not held, cantilevers, sizes outside Table 5.1 and 5.2(2)",
              "EN 1993-1-3 Table 5.1", "exclusion"},
    FixedLine{"Web under a concentrated load", "not checked between the supports: the deck must spread the load", "",
              "exclusion"},
};

BasisLine line(std::string item, std::string value, std::string clause, std::string origin) {
    return {heading, std::move(item), std::move(value), std::move(clause), std::move(origin)};
}

BasisLine core_line(const Inputs& inputs) {
    return line(
        "Core thickness",
        fmt::format("t = t_nom - {} mm; mid-line sizes follow t_nom", parameter(inputs.catalogue, "zinc_thickness")),
        "EN 1993-1-3 3.2.4(3)", "standard");
}

BasisLine web_line(const Support& support) {
    if (support.web_at_support == WebAtSupport::stiffened_or_cleated) {
        return line("Web at the supports",
                    "stated as stiffened or cleated: end reaction not checked, shear strength of a web with stiffening",
                    "EN 1993-1-3 6.1.5 Table 6.1, 6.1.7", "brief");
    }
    return line("Web at the supports",
                fmt::format("seated on {} mm, single unstiffened web; shear strength of a web without stiffening",
                            support.bearing),
                "EN 1993-1-3 6.1.5 Table 6.1, 6.1.7.2 (6.15a)", "brief");
}

} // namespace

std::vector<BasisLine> cold_formed_lines(const Inputs& inputs) {
    std::vector<BasisLine> lines;
    if (!has_members<ColdFormedMember>(inputs)) return lines;
    for (const FixedLine& words : rules) lines.push_back(line(words.item, words.value, words.clause, words.origin));
    lines.insert(lines.begin() + 1, core_line(inputs));
    lines.push_back(web_line(inputs.brief.support));
    for (BasisLine& limit : steel_limit_lines(inputs, heading)) lines.push_back(std::move(limit));
    return lines;
}

} // namespace spanledger
