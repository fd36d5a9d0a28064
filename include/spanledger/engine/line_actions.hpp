// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/clauses/beam_effects.hpp"
#include "spanledger/clauses/en1990_combinations.hpp"
#include "spanledger/engine/action_cases.hpp"
#include "spanledger/number/plain.hpp"

namespace spanledger {

/// Numbers of the actions on a floor or roof and of their combination. Areas in N/mm2, Q_k in N, spacing in mm.
template <class N> struct ActionInputs {
    N g_k, g_partitions, q_k, q_partitions, s_k, Q_k, Q_share, psi_0_q, psi_2_q, psi_0_s, psi_2_s, spacing, gamma_G,
        gamma_Q, xi;
};

/// Symbol, unit and meaning of every field, in order: visit(field, symbol, unit, meaning).
template <class Inputs, class Visit> void action_fields(Inputs& x, Visit&& visit) {
    visit(x.g_k, "g_k", "N/mm2", "permanent action");
    visit(x.g_partitions, "g_p", "N/mm2", "permanent partitions");
    visit(x.q_k, "q_k", "N/mm2", "variable action");
    visit(x.q_partitions, "q_p", "N/mm2", "movable partition allowance");
    visit(x.s_k, "s_k", "N/mm2", "snow");
    visit(x.Q_k, "Q_k", "N", "concentrated action");
    visit(x.Q_share, "eta_Q", "-", "share of Q_k on one joist");
    visit(x.psi_0_q, "psi_0_q", "-", "combination factor, variable action");
    visit(x.psi_2_q, "psi_2_q", "-", "quasi-permanent factor, variable action");
    visit(x.psi_0_s, "psi_0_s", "-", "combination factor, snow");
    visit(x.psi_2_s, "psi_2_s", "-", "quasi-permanent factor, snow");
    visit(x.spacing, "s", "mm", "spacing of joists, centre to centre");
    visit(x.gamma_G, "gamma_G", "-", "partial factor, permanent actions");
    visit(x.gamma_Q, "gamma_Q", "-", "partial factor, variable actions");
    visit(x.xi, "xi", "-", "reduction factor of (6.10b)");
}

/// Acceleration of gravity, m/s2: what turns kg into N.
inline constexpr double gravity = 9.81;

/// The loads on one joist: N per mm of its length, and N.
template <class N> class LineActions {
public:
    LineActions() = default;
    LineActions(const ActionInputs<N>& inputs, const N& self_weight) : in_(inputs), self_weight_(self_weight) {
        permanent_ = named("g", "N/mm", "EN 1990 6.4.3", (in_.g_k + in_.g_partitions) * in_.spacing + self_weight);
    }

    /// Permanent line load, self-weight and permanent partitions included.
    [[nodiscard]] const N& permanent() const noexcept { return permanent_; }

    [[nodiscard]] N permanent_without_partitions() const {
        return named("g_1", "N/mm", "EN 1990 6.4.3", in_.g_k * in_.spacing + self_weight_);
    }

    /// The variable action itself, without the partition allowance.
    [[nodiscard]] beam::Load<N> variable(Action action) const {
        switch (action) {
        case Action::uniform: return {named("q", "N/mm", "EN 1991-1-1 6.3", in_.q_k * in_.spacing), N(0.0)};
        case Action::snow: return {named("q_s", "N/mm", "EN 1991-1-3", in_.s_k * in_.spacing), N(0.0)};
        case Action::concentrated: return {N(0.0), named("F", "N", "EN 1991-1-1 6.3.1.2", in_.Q_share * in_.Q_k)};
        case Action::none: break;
        }
        return {N(0.0), N(0.0)};
    }

    /// The partition allowance that acts with a floor load.
    [[nodiscard]] N partitions(Action action) const {
        const bool floor_load = action == Action::uniform || action == Action::concentrated;
        return floor_load ? named("q_pl", "N/mm", "EN 1991-1-1 6.3.1.2(8)", in_.q_partitions * in_.spacing) : N(0.0);
    }

    /// The variable action with the partition allowance.
    [[nodiscard]] beam::Load<N> characteristic(Action action) const {
        const beam::Load<N> load = variable(action);
        return {load.q + partitions(action), load.F};
    }

    /// Permanent and variable actions together: the characteristic combination.
    [[nodiscard]] beam::Load<N> service(Action action) const {
        const beam::Load<N> load = characteristic(action);
        return {permanent_ + load.q, load.F};
    }

    [[nodiscard]] beam::Load<N> design(const CombinationCase& combination) const {
        const N gamma_G =
            combination.reduced_permanent ? en1990::reduced_permanent_factor(in_.xi, in_.gamma_G) : in_.gamma_G;
        const N gamma_Q = combination.combination_value
                              ? en1990::combination_variable_factor(in_.gamma_Q, psi_0(combination.action))
                              : in_.gamma_Q;
        const beam::Load<N> load = characteristic(combination.action);
        const en1990::Factors<N> factors{gamma_G, gamma_Q};
        return {named("q_d", "N/mm", "EN 1990 6.4.3.2", en1990::design_value(factors, permanent_, load.q)),
                named("F_d", "N", "EN 1990 6.4.3.2", en1990::design_value(factors, N(0.0), load.F))};
    }

    [[nodiscard]] const N& psi_0(Action action) const { return action == Action::snow ? in_.psi_0_s : in_.psi_0_q; }
    [[nodiscard]] const N& psi_2(Action action) const { return action == Action::snow ? in_.psi_2_s : in_.psi_2_q; }
    [[nodiscard]] const N& spacing() const noexcept { return in_.spacing; }
    [[nodiscard]] const N& concentrated_share() const noexcept { return in_.Q_share; }

private:
    ActionInputs<N> in_{};
    N self_weight_{};
    N permanent_{};
};

} // namespace spanledger
