// SPDX-License-Identifier: MIT
#pragma once

#include <string>
#include <string_view>
#include <vector>

namespace spanledger {

/// Gives out sheet names that every spreadsheet program accepts: at most 31 characters, none of []:*?/\ or control
/// characters, no apostrophe at an end, no reserved name, unique where case does not count.
class SheetNames {
public:
    [[nodiscard]] std::string unique(std::string_view wanted);

private:
    std::vector<std::string> taken_; ///< with case folded
};

} // namespace spanledger
