// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/inputs.hpp"
#include "spanledger/results/issue.hpp"

#include <functional>

namespace spanledger {

/// Told how many cells of how many are done; may be empty.
using Progress = std::function<void(std::size_t done, std::size_t total)>;

/// Sweeps every table of the brief and states its basis and sources. `fingerprint` is left empty: the record writer
/// computes it.
[[nodiscard]] Issue issue_tables(const Inputs& inputs, const Progress& progress = {});

/// How many cells the tables of a brief have.
[[nodiscard]] std::size_t count_cells(const Inputs& inputs);

} // namespace spanledger
