// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/inputs.hpp"
#include "spanledger/member.hpp"
#include "spanledger/results/check.hpp"

#include <string>

namespace spanledger {

struct CheckRequest {
    Member member;
    double spacing = 0.0;    ///< mm
    std::string load;        ///< name of a load class of the brief
    double clear_span = 0.0; ///< mm
};

/// One proposed joist against every limit of the brief's basis, with the answers to the next questions (next larger and
/// smaller depth of the brief's entry, next spacings of its tables). The load must be one of the brief's.
[[nodiscard]] CheckResult check_joist(const Inputs& inputs, const CheckRequest& request);

} // namespace spanledger
