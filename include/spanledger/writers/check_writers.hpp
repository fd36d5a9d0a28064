// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/results/check.hpp"
#include "spanledger/writers/json_text.hpp"

#include <string>

namespace spanledger {

/// One check as JSON with full precision: the fields that the documentation promises first, then the further ones.
[[nodiscard]] std::string check_json(const CheckResult& check);

/// The same as one element of a longer JSON text, such as a list of checks.
void write_check(JsonText& json, const CheckResult& check);

/// One check as plain text of at most 100 columns: the verdict in the first line, then utilisations worst first.
[[nodiscard]] std::string check_text(const CheckResult& check);

} // namespace spanledger
