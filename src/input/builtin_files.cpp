// SPDX-License-Identifier: MIT
#include "spanledger/input/builtin_files.hpp"

#include <algorithm>
#include <stdexcept>
#include <string>

namespace spanledger {

std::string_view builtin_file(std::string_view name) {
    const auto files = builtin_files();
    const auto found = std::find_if(files.begin(), files.end(), [&](const auto& file) { return file.name == name; });
    if (found == files.end()) {
        throw std::logic_error("no built-in file " + std::string(name));
    }
    return found->text;
}

} // namespace spanledger
