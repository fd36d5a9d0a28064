// SPDX-License-Identifier: MIT
#include "spanledger/input/input_reference.hpp"
#include "spanledger/program/help.hpp"

#include <algorithm>
#include <array>

namespace spanledger {
namespace {

// In the order of document_words().
constexpr std::array makers{man_page, bash_completion, zsh_completion, fish_completion, input_reference};

} // namespace

std::string document(std::string_view name) {
    const auto words = document_words();
    const auto found = std::find(words.begin(), words.end(), name);
    return found == words.end() ? std::string() : makers.at(static_cast<std::size_t>(found - words.begin()))();
}

} // namespace spanledger
