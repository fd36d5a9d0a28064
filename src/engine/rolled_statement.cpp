// SPDX-License-Identifier: MIT
#include "rolled_statement.hpp"

#include "steel_limit_lines.hpp"

#include <fmt/format.h>

#include <array>

namespace spanledger {
namespace {

constexpr const char* heading = "Rolled steel joists";

constexpr std::array rules{
    FixedLine{"Standards", "EN 1993-1-1:2005, EN 1993-1-5:2006; grades of EN 10025-2, sections of EN 10365:2017", "",
              "standard"},
    FixedLine{"Yield strength", "that of the thickest part of the section", "EN 10025-2 Table 7", "standard"},
    FixedLine{"Section properties", "from the dimensions, root fillets included", "", "geometry"},
    FixedLine{"Section classes", "plastic resistance in classes 1 and 2, elastic in class 3; class 4 is not covered",
              "EN 1993-1-1 5.5, Table 5.2", "standard"},
    FixedLine{
        "Bending with shear",
        "at every section with V > V_Rd/2; the concentrated load stands where it is worst for the section; V_Rd is the "
        "smaller resistance where the web may buckle in shear",
        "EN 1993-1-1 6.2.8, (6.30)", "standard"},
    FixedLine{"Deflection of steel", "no creep; camber reduces the instantaneous deflection only", "EN 1990 A1.4.3",
              "standard"},
    FixedLine{"Shear deformation", "where it is counted, of the web alone: 1/(G h_w t_w)", "", "assumption"},
    FixedLine{"Self-weight", "from the area with root fillets", "", "assumption"},
    FixedLine{"Channels", "the deck and its fixings keep the load from twisting the joist", "", "assumption"},
    FixedLine{"Web under a concentrated load", "not checked between the supports: the deck must spread the load", "",
              "exclusion"},
    FixedLine{"Not covered", "class 4 sections; channels and cantilevers whose compression flange is free", "",
              "exclusion"},
};

BasisLine web_line(const Support& support) {
    if (support.web_at_support == WebAtSupport::stiffened_or_cleated) {
        return {heading, "Web at the supports", "stated as stiffened or cleated: not checked", "EN 1993-1-5 6",
                "brief"};
    }
    return {heading, "Web at the supports",
            fmt::format("seated on {} mm, unstiffened, the bearing beginning at the end of the joist", support.bearing),
            "EN 1993-1-5 6, type (c)", "brief"};
}

BasisLine height_line(const Support& support) {
    constexpr std::array words{"on the top flange: h/2 above the shear centre", "at the centroid",
                               "on the bottom flange: h/2 below the shear centre"};
    const std::string height = support.load_height ? fmt::format("{} mm above the shear centre", *support.load_height)
                                                   : words[static_cast<std::size_t>(support.load_position)];
    return {heading, "Height of the load", height, "NCCI, elastic critical moment", "brief"};
}

void add_lateral_lines(const Inputs& inputs, std::vector<BasisLine>& lines) {
    const Support& support = inputs.brief.support;
    if (support.compression_edge == CompressionEdge::held) return;
    const bool rolled = inputs.brief.basis.lateral_curves == LateralCurves::rolled_sections;
    lines.push_back({heading, "Lateral torsional buckling",
                     rolled ? "curves for rolled sections, f of (6.58) taken as 1" : "general case, Table 6.4",
                     rolled ? "EN 1993-1-1 6.3.2.3" : "EN 1993-1-1 6.3.2.2", "brief"});
    lines.push_back(
        {heading, "Critical moment",
         "ends held against twist and free to warp; with a concentrated load the smaller of uniform load and "
         "force at mid-span; 6.3.2.2(4) is not used",
         "NCCI, elastic critical moment", "standard"});
    lines.push_back(height_line(support));
    if (!support.restraint_spacing) return;
    lines.push_back({heading, "Intermediate restraints",
                     fmt::format("every {} mm; each holds the compression flange or prevents twist; constant moment "
                                 "between them; none where that spacing is L or more",
                                 *support.restraint_spacing),
                     "EN 1993-1-1 6.3.2", "brief"});
}

} // namespace

std::vector<BasisLine> rolled_lines(const Inputs& inputs) {
    std::vector<BasisLine> lines;
    if (!has_members<RolledMember>(inputs)) return lines;
    for (const FixedLine& words : rules)
        lines.push_back({heading, words.item, words.value, words.clause, words.origin});
    add_lateral_lines(inputs, lines);
    lines.push_back(web_line(inputs.brief.support));
    for (BasisLine& line : steel_limit_lines(inputs, heading)) lines.push_back(std::move(line));
    return lines;
}

} // namespace spanledger
