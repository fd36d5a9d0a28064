// SPDX-License-Identifier: MIT
#pragma once

#include <span>
#include <string>
#include <string_view>

namespace spanledger {

/// The known name most like `wanted`, the first of equals; empty where none is near. Case does not matter; letters
/// left out, added, changed or swapped with a neighbour count, up to a third of the length. Failing that, a known name
/// that begins with `wanted`.
[[nodiscard]] std::string nearest_name(std::string_view wanted, std::span<const std::string> known);

/// "a, b, c"
[[nodiscard]] std::string joined(std::span<const std::string> names);

/// A hint for an unknown name: "did you mean 'C24'?", or the known names where none is near (the first few of many).
[[nodiscard]] std::string did_you_mean(std::string_view wanted, std::span<const std::string> known);

} // namespace spanledger
