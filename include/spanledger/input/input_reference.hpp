// SPDX-License-Identifier: MIT
#pragma once

#include <string>

namespace spanledger {

/// The input reference: every section and key of a brief with kind, unit, default, choices and both ranges, in
/// Markdown. Made from the schema that reading uses, so that it cannot differ from it.
[[nodiscard]] std::string input_reference();

} // namespace spanledger
