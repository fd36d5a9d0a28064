// SPDX-License-Identifier: MIT
#include "spanledger/engine/basis_statement.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <set>
#include <type_traits>
#include <variant>

namespace spanledger {
namespace {

class SourceList {
public:
    explicit SourceList(const Inputs& inputs) : inputs_(&inputs) {}

    std::vector<SourceLine> lines() {
        members();
        load_categories();
        for (const Parameter& p : inputs_->catalogue.parameters) {
            add("parameter", p.key, fmt::format("{}{}", p.value, p.unit == "-" ? "" : " " + p.unit), p.provenance);
        }
        service_factors();
        combinations();
        return std::move(lines_);
    }

private:
    void add(std::string kind, std::string item, std::string value, const Provenance& from) {
        if (!listed_.insert(kind + '\n' + item).second) return;
        std::string source = from.source;
        for (const Source& s : inputs_->catalogue.sources) {
            if (s.key == from.source)
                source = s.edition.empty() || s.edition == "-" ? s.title : s.title + ", " + s.edition;
        }
        if (!from.note.empty()) source += " (" + from.note + ")";
        lines_.push_back(
            {std::move(kind), std::move(item), std::move(value), std::move(source), from.seen, from.practice_own});
    }

    void members() {
        Diagnostics ignored; // the brief was read without errors
        for (const MembersEntry& entry : inputs_->brief.members) {
            for (const Member& member : members_of(entry, inputs_->catalogue, ignored)) {
                std::visit([this](const auto& m) { add_member(m); }, member);
            }
        }
    }

    void add_member(const TimberMember& member) {
        const TimberClass& c = member.timber_class;
        add("strength class", c.name,
            fmt::format("fm,k {}, fv,k {}, fc,90,k {}, E0,mean {}, E0,05 {}, Gmean {} MPa; density k {}, mean {} kg/m3",
                        c.f_m_k, c.f_v_k, c.f_c_90_k, c.E_0_mean, c.E_0_05, c.G_mean, c.rho_k, c.rho_mean),
            c.provenance);
        if (member.size_provenance) {
            add("size", fmt::format("{}x{}", member.b, member.h), fmt::format("{} x {} mm", member.b, member.h),
                *member.size_provenance);
        }
    }

    void add_member(const RolledMember& member) {
        const SteelGrade& g = member.grade;
        const std::string thicker = g.f_y_40 ? fmt::format(", {} MPa above 16 up to 40 mm", *g.f_y_40) : "";
        add("steel grade", g.name, fmt::format("f_y {} MPa up to 16 mm thick{}", g.f_y_16, thicker), g.provenance);
        const RolledSection& s = member.section;
        add("section", s.name, fmt::format("h {}, b {}, t_w {}, t_f {}, r {} mm", s.h, s.b, s.t_w, s.t_f, s.r),
            s.provenance);
    }

    void add_member(const ColdFormedMember& member) {
        const ColdFormedGrade& g = member.grade;
        add("steel grade", g.name, fmt::format("f_yb {} MPa", g.f_yb), g.provenance);
        if (!member.size_provenance) return;
        const LippedChannelSize& s = member.size;
        add("section", lipped_channel_name(s),
            fmt::format("h {}, b_1 {}, b_2 {}, c {}, t_nom {}, r {} mm", s.h, s.b_1, s.b_2, s.c, s.t_nom, s.r),
            *member.size_provenance);
    }

    void load_categories() {
        for (const LoadClass& load : inputs_->brief.loads) {
            if (const LoadCategory* c = find_load_category(inputs_->catalogue, load.category)) {
                add("load category", c->name,
                    fmt::format("psi_0 {}, psi_1 {}, psi_2 {}", c->psi.psi0, c->psi.psi1, c->psi.psi2), c->provenance);
            }
        }
    }

    void service_factors() {
        for (const ServiceFactors& f : inputs_->catalogue.service_factors) {
            if (f.service_class != inputs_->brief.basis.service_class) continue;
            add("kmod, kdef", fmt::format("{}, service class {}", f.material, f.service_class),
                fmt::format("kmod {}, {}, {}, {}, {}; kdef {}", f.k_mod[0], f.k_mod[1], f.k_mod[2], f.k_mod[3],
                            f.k_mod[4], f.k_def),
                f.provenance);
        }
    }

    void combinations() {
        for (const Combination& c : inputs_->catalogue.combinations) {
            if (c.set == inputs_->brief.basis.combination) add("combination", c.name, c.clause, c.provenance);
        }
    }

    const Inputs* inputs_;
    std::set<std::string> listed_;
    std::vector<SourceLine> lines_;
};

} // namespace

std::vector<SourceLine> source_lines(const Inputs& inputs) {
    return SourceList(inputs).lines();
}

namespace {

/// The note of a limit over several members and loads: checked if it is checked for any of them.
LimitNote limit_note(Limit limit, const std::vector<const JoistRules*>& rules) {
    LimitNote note{.limit = limit, .status = LimitStatus::not_applicable, .reason = {}, .clause = {}};
    std::set<std::string> reasons;
    for (const JoistRules* r : rules) {
        const LimitPlan& plan = r->plan(limit);
        note.clause = plan.clause;
        if (plan.status == LimitStatus::checked) return {limit, LimitStatus::checked, {}, plan.clause};
        if (plan.status == LimitStatus::not_covered) note.status = plan.status;
        reasons.insert(plan.reason);
    }
    for (const std::string& reason : reasons) note.reason += (note.reason.empty() ? "" : "; ") + reason;
    return note;
}

void head_notes(const Inputs& inputs, const std::vector<const LoadClass*>& loads, TableResult& table) {
    for (const LimitNote& note : table.limits) {
        const bool stock = note.limit == Limit::stock_length;
        if (note.status == LimitStatus::checked || note.limit == Limit::bending_with_shear) continue;
        table.head_notes.push_back(fmt::format(
            "{}: {}.", stock ? "Stock length" : "Not checked, " + std::string(definition_of(note.limit).name),
            note.reason));
    }
    for (const LoadClass* load : loads) {
        if (load->concentrated <= 0.0) {
            table.head_notes.push_back(
                fmt::format("Not checked, concentrated load Qk: none stated for {}.", load->name));
        } else if (!load->concentrated_in_deflection) {
            table.head_notes.push_back(fmt::format("{}: Qk {} kN, {} of it on one joist, in strength only.", load->name,
                                                   load->concentrated / 1000.0, load->concentrated_share));
        }
    }
    if (inputs.brief.basis.utilisation_cap < 1.0) {
        table.head_notes.push_back(fmt::format("Utilisation cap {}.", inputs.brief.basis.utilisation_cap));
    }
}

} // namespace

void describe_table(const Inputs& inputs, const TableRequest& request, const std::vector<Member>& members,
                    TableResult& table) {
    std::vector<const LoadClass*> loads;
    for (const LoadClass& load : inputs.brief.loads) {
        if (std::find(request.loads.begin(), request.loads.end(), load.name) != request.loads.end()) {
            loads.push_back(&load);
        }
    }
    std::vector<std::unique_ptr<JoistRules>> owned;
    std::vector<const JoistRules*> rules;
    for (const LoadClass* load : loads) {
        owned.push_back(make_rules(inputs, members.front(), *load));
        rules.push_back(owned.back().get());
    }
    for (const LimitDefinition& definition : limit_definitions) {
        table.limits.push_back(limit_note(definition.limit, rules));
    }
    for (std::string& note : rules.front()->notes()) table.head_notes.push_back(std::move(note));
    head_notes(inputs, loads, table);
}

} // namespace spanledger
