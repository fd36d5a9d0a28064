// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/engine/basis.hpp"
#include "spanledger/results/issue.hpp"

namespace spanledger {

/// Every parameter in force with value, unit, clause and origin; load classes; limits; the definition of span; who must
/// hold what; assumptions and exclusions.
[[nodiscard]] std::vector<BasisLine> basis_lines(const Inputs& inputs);

/// Every catalogue row and parameter in use with its source, and whether it was seen there.
[[nodiscard]] std::vector<SourceLine> source_lines(const Inputs& inputs);

/// What every output that could be built from says: for competent persons, local codes first, no extrapolation.
[[nodiscard]] std::vector<std::string> cautions(const Inputs& inputs);

/// Which limits a table checks, and what is not checked in it, for its head.
void describe_table(const Inputs& inputs, const TableRequest& request, const std::vector<Member>& members,
                    TableResult& table);

} // namespace spanledger
