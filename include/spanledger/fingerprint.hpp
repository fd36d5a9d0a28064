// SPDX-License-Identifier: MIT
#pragma once

#include <string>
#include <string_view>

namespace spanledger {

/// First 16 hexadecimal digits (lower case) of the SHA-256 of the text.
[[nodiscard]] std::string fingerprint_of(std::string_view text);

} // namespace spanledger
