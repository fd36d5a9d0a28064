// SPDX-License-Identifier: MIT
#include "spanledger/version.hpp"

namespace spanledger {

std::string_view program_version() noexcept {
    return SPANLEDGER_VERSION;
}

} // namespace spanledger
