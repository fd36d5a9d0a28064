// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/program/options.hpp"

#include <string>
#include <string_view>

// Everything that is made from the option table, in lines of at most 80 columns where a terminal shows it.

namespace spanledger {

[[nodiscard]] std::string short_help();                        ///< what no arguments show
[[nodiscard]] std::string general_help();                      ///< spanledger --help
[[nodiscard]] std::string command_help(const CommandRow& row); ///< spanledger COMMAND --help

[[nodiscard]] std::string man_page(); ///< roff, for man(1)
[[nodiscard]] std::string bash_completion();
[[nodiscard]] std::string zsh_completion();
[[nodiscard]] std::string fish_completion();

/// What --print prints, by document_words(); empty where the name is none of them.
[[nodiscard]] std::string document(std::string_view name);

} // namespace spanledger
