// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/writers/xlsx_book.hpp"

#include <string>
#include <string_view>

namespace spanledger::xlsx {

/// Header or footer as the file format codes it, at most 255 bytes: "&" begins a code, what is too long is shortened.
[[nodiscard]] std::string header_text(const PageWords& words, std::string_view font);

} // namespace spanledger::xlsx
