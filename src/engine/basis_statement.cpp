// SPDX-License-Identifier: MIT
#include "spanledger/engine/basis_statement.hpp"

#include "cold_formed_statement.hpp"
#include "rolled_statement.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>

namespace spanledger {
namespace {

/// Collects the lines of the basis under their headings. Quantities are shown in the units of the brief.
class Statement {
public:
    explicit Statement(const Inputs& inputs) : inputs_(&inputs), brief_(&inputs.brief) {}

    std::vector<BasisLine> lines() {
        standards();
        span_and_bearing();
        material_and_moisture();
        restraint_and_deck();
        combinations();
        load_classes();
        limits();
        for (BasisLine& line : rolled_lines(*inputs_)) lines_.push_back(std::move(line));
        for (BasisLine& line : cold_formed_lines(*inputs_)) lines_.push_back(std::move(line));
        parameters();
        assumptions();
        exclusions();
        return std::move(lines_);
    }

private:
    struct Words {
        std::string value;
        std::string clause = {};
        std::string origin = "brief";
    };

    void heading(std::string words) { heading_ = std::move(words); }
    void line(std::string item, Words words) {
        lines_.push_back(
            {heading_, std::move(item), std::move(words.value), std::move(words.clause), std::move(words.origin)});
    }

    void standards() {
        heading("Standards");
        const std::array editions{
            std::array{"Basis of design", "EN 1990:2002+A1:2005"},
            std::array{"Imposed loads", "EN 1991-1-1:2002"},
            std::array{"Timber", "EN 1995-1-1:2004+A1:2008+A2:2014"},
            std::array{"Strength classes", "EN 338:2016 (solid timber), EN 14080:2013 (glulam), EN 14374 (LVL)"},
        };
        for (const auto& [item, edition] : editions) line(item, {edition, "", "standard"});
        line("Generation",
             {"first-generation Eurocodes; the second generation renumbers and changes some rules", "", "standard"});
        line("Parameter set", {inputs_->catalogue.parameter_set, "national annexes"});
    }

    void span_and_bearing() {
        heading("Span and bearing");
        const Support& support = brief_->support;
        const bool cantilever = support.arrangement == Arrangement::cantilever;
        line("Arrangement", {cantilever ? "cantilever, root stated as fixed" : "single span, simply supported"});
        line("Bearing length",
             {fmt::format("{} mm at each support; the tables hold for this bearing only", support.bearing)});
        line("Span in the tables", {cantilever ? "clear projection Lc from the face of the support to the tip"
                                               : "clear span Lc, face to face of supports",
                                    "", "definition"});
        line("Effective span", {cantilever ? "L = Lc + t/2" : "L = Lc + t; ratios L/n use L", "", "definition"});
        const SearchRange& search = brief_->search;
        line("Range searched",
             {fmt::format("clear spans from {} to {}",
                          search.min_clear_span ? fmt::format("{} mm", *search.min_clear_span) : "max(500 mm, 2h)",
                          search.max_clear_span ? fmt::format("{} mm", *search.max_clear_span) : "30000 mm")});
        line("Rounding", {fmt::format("down to {} mm, verified again at the printed span", search.step)});
    }

    void material_and_moisture() {
        heading("Material, sizes and moisture");
        const BasisChoice& basis = brief_->basis;
        line("Service class", {fmt::format("{}", basis.service_class), "EN 1995-1-1 2.3.1.3"});
        line("Wet on installation",
             {basis.wet_on_installation ? "yes: kdef is raised by 1.0" : "no", "EN 1995-1-1 3.2(4)"});
        line("Sizes", {"target sizes at the reference moisture content of 20 % (EN 336, tolerance class 2 or better); "
                       "sections unnotched and unbored",
                       "EN 336", "assumption"});
        line("Load sharing",
             {basis.load_sharing ? fmt::format("stated: ksys = {} up to {} mm spacing, single-ply members; 1.0 with "
                                               "the concentrated load where its share is below 1",
                                               parameter(inputs_->catalogue, "k_sys"),
                                               parameter(inputs_->catalogue, "k_sys_max_spacing"))
                                 : "not used: ksys = 1.0",
              "EN 1995-1-1 6.6"});
    }

    void restraint_and_deck() {
        heading("Restraint and deck");
        const Support& support = brief_->support;
        const bool cantilever = support.arrangement == Arrangement::cantilever;
        std::string edge = cantilever ? "the bottom edge of the cantilever" : "the top edge";
        edge += support.compression_edge == CompressionEdge::held
                    ? " is held against sideways movement over its whole length by the deck or bracing"
                    : " is not held between supports: lateral buckling is checked";
        line("Compression edge", {edge, "EN 1995-1-1 6.3.3"});
        if (support.restraint_spacing) {
            line("Intermediate restraints",
                 {fmt::format("every {} mm; each holds the compression edge", *support.restraint_spacing),
                  "EN 1995-1-1 6.3.3"});
        }
        if (support.compression_edge == CompressionEdge::free) {
            constexpr std::array positions{"top edge", "centroid", "bottom edge (hanging)"};
            line("Load position",
                 {positions[static_cast<std::size_t>(support.load_position)], "EN 1995-1-1 Table 6.1"});
        }
        line("Ends", {"held against twist at the supports", "EN 1995-1-1 6.3.3(3)", "assumption"});
        const Deck& deck = brief_->deck;
        if (!deck.name.empty()) line("Deck", {deck.name});
        if (deck.max_spacing) line("Widest spacing of the deck", {fmt::format("{} mm", *deck.max_spacing)});
        if (deck.stiffness) {
            line("Stiffness across the joists", {fmt::format("(EI)b = {} Nmm2 per m", *deck.stiffness)});
        }
    }

    void combinations() {
        heading("Combinations of actions");
        for (const Combination& c : inputs_->catalogue.combinations) {
            if (c.set != brief_->basis.combination) continue;
            std::string words = c.reduced_permanent ? "xi gamma_G G" : "gamma_G G";
            if (c.variable == Combination::Variable::full) words += " + gamma_Q Q";
            if (c.variable == Combination::Variable::combination_value) words += " + gamma_Q psi_0 Q";
            line(c.name, {words, c.clause, "standard"});
        }
        line("Variable actions", {"one at a time: uniform load, snow, concentrated load; a movable partition allowance "
                                  "acts with the uniform and with the concentrated load",
                                  "EN 1991-1-1 6.2.1, 6.3.1.2", "standard"});
        line("Load duration", {"each combination uses the kmod of its shortest action; the permanent action alone is a "
                               "combination of its own",
                               "EN 1995-1-1 3.1.3(2)", "standard"});
        line("Serviceability", {"characteristic combination G + Q", "EN 1990 6.5.3", "standard"});
        line("Partition allowance in creep",
             {brief_->basis.partitions_creep == PartitionsCreep::permanent ? "as a permanent action"
                                                                           : "as the imposed load",
              "EN 1995-1-1 2.2.3"});
    }

    static std::string duration_word(Duration duration) {
        constexpr std::array words{"permanent", "long term", "medium term", "short term", "instantaneous"};
        return words[static_cast<std::size_t>(duration)];
    }

    void load_classes() {
        heading("Load classes");
        line("Self-weight of the joist", {brief_->basis.self_weight ? "added to the permanent action of every class"
                                                                    : "not added: included in the stated actions",
                                          "EN 1991-1-1 5.2"});
        for (const LoadClass& load : brief_->loads) load_class(load);
    }

    void load_class(const LoadClass& load) {
        const auto areal = [](double value) { return fmt::format("{:.2f} kN/m2", value * 1000.0); };
        std::string words = "permanent " + areal(load.permanent);
        if (load.permanent_partitions > 0.0) words += ", permanent partitions " + areal(load.permanent_partitions);
        if (load.variable > 0.0) {
            words += fmt::format(", variable {} ({})", areal(load.variable), duration_word(load.duration));
        }
        if (load.partitions > 0.0) words += ", movable partitions " + areal(load.partitions);
        if (load.snow > 0.0) {
            words += fmt::format(", snow {} ({})", areal(load.snow), duration_word(load.snow_duration));
        }
        line(load.name, {words, "category " + load.category});
        line(load.name + ", psi",
             {fmt::format("psi_0 {}, psi_1 {}, psi_2 {}", load.psi.psi0, load.psi.psi1, load.psi.psi2),
              "EN 1990 Table A1.1"});
        if (load.snow > 0.0) {
            line(load.name + ", psi of snow", {fmt::format("psi_0 {}, psi_1 {}, psi_2 {}", load.snow_psi.psi0,
                                                           load.snow_psi.psi1, load.snow_psi.psi2),
                                               "EN 1990 Table A1.1"});
        }
        concentrated(load);
    }

    void concentrated(const LoadClass& load) {
        if (load.concentrated <= 0.0) {
            line(load.name + ", concentrated load", {"none stated: not checked", "EN 1991-1-1 6.3.1.2"});
            return;
        }
        line(load.name + ", concentrated load",
             {fmt::format("Qk {} kN ({}), {} of it on one joist, at mid-span for moment and beside the support for "
                          "shear; {} in deflection",
                          load.concentrated / 1000.0, duration_word(load.concentrated_duration),
                          load.concentrated_share, load.concentrated_in_deflection ? "counted" : "not counted"),
              "EN 1991-1-1 6.3.1.2"});
    }

    void deflection_limit(const char* item, const std::optional<DeflectionLimit>& limit) {
        std::string words = "not checked";
        if (limit && limit->ratio && limit->max_mm) {
            words = fmt::format("the smaller of L/{} and {} mm", *limit->ratio, *limit->max_mm);
        } else if (limit && limit->ratio) {
            words = fmt::format("L/{}", *limit->ratio);
        } else if (limit) {
            words = fmt::format("{} mm", *limit->max_mm);
        }
        line(item, {words, "EN 1995-1-1 7.2"});
    }

    void limits() {
        heading("Limits");
        line("Utilisation cap", {fmt::format("{}", brief_->basis.utilisation_cap)});
        line("Strength", {"bending, shear, bearing, and lateral buckling where the compression edge is not held",
                          "EN 1995-1-1 6", "standard"});
        const LimitsAsked& asked = brief_->limits;
        deflection_limit("Variable deflection", asked.variable_deflection);
        deflection_limit("Instantaneous deflection", asked.instantaneous_deflection);
        deflection_limit("Final deflection", asked.final_deflection);
        if (asked.camber) {
            line("Camber", {fmt::format("{} mm, counted up to the final permanent deflection", *asked.camber),
                            "EN 1995-1-1 (7.2)"});
        }
        line("Shear deformation", {brief_->basis.shear_deflection ? "included in every deflection" : "left out"});
        line("Shear near the support", {shear_words(), "EN 1995-1-1 6.1.7(3)"});
        vibration();
    }

    std::string shear_words() const {
        const BasisChoice& basis = brief_->basis;
        if (basis.concentrated_near_support && basis.uniform_near_support) {
            return "concentrated and uniform load within h of the face left out";
        }
        if (basis.concentrated_near_support) return "concentrated load within h of the face left out";
        if (basis.uniform_near_support) return "uniform load within h of the face left out (national choice)";
        return "all load counted";
    }

    void vibration() {
        const auto& asked = brief_->limits.vibration;
        if (!asked) {
            line("Vibration", {"not checked", "EN 1995-1-1 7.3.3"});
            return;
        }
        const bool uk = asked->rule == VibrationRuleSet::uk;
        line("Vibration", {fmt::format("{} rule, floor width {} m, {} strutting; floors only",
                                       uk ? "UK national annex" : "recommended", asked->floor_width / 1000.0,
                                       asked->strutting ? "with" : "without"),
                           "EN 1995-1-1 7.3.3"});
        if (!uk) line("Vibration, a and b", {fmt::format("a = {} mm, b = {}", *asked->a_mm, *asked->b)});
        if (asked->damping) line("Vibration, damping", {fmt::format("{}", *asked->damping)});
        if (asked->kamp) line("Vibration, kamp", {fmt::format("{}", *asked->kamp)});
    }

    void parameters() {
        heading("Parameters in force");
        for (const Parameter& p : inputs_->catalogue.parameters) {
            std::string origin = p.set;
            if (p.value != p.recommended) origin += fmt::format("; differs from the recommended {}", p.recommended);
            const std::string unit = p.unit == "-" ? "" : " " + p.unit;
            line(p.key, {fmt::format("{}{}  ({})", p.value, unit, p.meaning), p.clause, origin});
        }
        for (const ServiceFactors& f : inputs_->catalogue.service_factors) {
            if (f.service_class != brief_->basis.service_class) continue;
            line("kmod, " + f.material, {fmt::format("permanent {}, long {}, medium {}, short {}, instantaneous {}",
                                                     f.k_mod[0], f.k_mod[1], f.k_mod[2], f.k_mod[3], f.k_mod[4]),
                                         "EN 1995-1-1 Table 3.1", "standard"});
            line("kdef, " + f.material, {fmt::format("{}", f.k_def), "EN 1995-1-1 Table 3.2", "standard"});
        }
    }

    void assumptions() {
        heading("Assumptions");
        line("Joists", {"straight, parallel, at equal spacing, of one section over the whole span", "", "assumption"});
        line("Loads", {"uniform over the area, from above; no load from other members", "", "assumption"});
        line("Gravity", {"9.81 m/s2", "", "assumption"});
        line("Supports", {"level and rigid, with the same bearing length at both ends", "", "assumption"});
    }

    void exclusions() {
        heading("Not covered by these tables");
        for (const char* words :
             {"notches and holes", "trimmers, trimmed openings and headers", "partitions standing on joists",
              "concentrated loads other than the load class's own", "fire", "connections and hangers",
              "the supports, walls and beams below", "stability of the building, diaphragm action"}) {
            line(words, {"excluded: design it separately", "", "exclusion"});
        }
    }

    const Inputs* inputs_;
    const Brief* brief_;
    std::string heading_;
    std::vector<BasisLine> lines_;
};

} // namespace

std::vector<BasisLine> basis_lines(const Inputs& inputs) {
    return Statement(inputs).lines();
}

std::vector<std::string> cautions(const Inputs& inputs) {
    // NOLINTBEGIN(bugprone-suspicious-missing-comma): sentences longer than a line
    std::vector<std::string> words{
        "For competent persons only: a licensed practitioner decides whether a table applies to a building and answers "
        "for its use.",
        "Local codes, national annexes and the building's own conditions come before anything stated here.",
        "Spans hold only for the load classes, bearing, restraint, service class and limits of the basis. No "
        "extrapolation to other spans, spacings, loads or sections.",
        "Notches, holes, trimmers, partitions standing on joists, other concentrated loads, fire, connections and "
        "supports are not covered.",
        "Strength, stiffness and parameter values marked as recalled must be confirmed against the standard before "
        "the tables are relied on.",
    };
    // NOLINTEND(bugprone-suspicious-missing-comma)
    if (inputs.brief.support.arrangement == Arrangement::cantilever) {
        words.emplace_back("Cantilevers: rotation of the back span, hold-down and the bearing of the root are the "
                           "reader's to check.");
    }
    return words;
}

} // namespace spanledger
