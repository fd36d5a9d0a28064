// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/catalogue.hpp"
#include "spanledger/input/brief.hpp"
#include "spanledger/input/diagnostics.hpp"

#include <optional>
#include <string>
#include <string_view>

namespace spanledger {

/// What every command starts from: a brief whose names all resolve, and the catalogue it is read against.
struct Inputs {
    Brief brief;
    Catalogue catalogue;
};

/// Reads the brief `file` ("-" is standard input), the catalogue with the practice's files and parameters, and checks
/// that every name in the brief resolves and that no keys contradict each other. Every problem of every file goes to
/// `diagnostics`; empty where there was an error.
[[nodiscard]] std::optional<Inputs> read_inputs(const std::string& file, Diagnostics& diagnostics);

/// The same for a text already in memory; `file` is its name in messages and gives the folder of relative names.
[[nodiscard]] std::optional<Inputs> read_inputs_from_text(const std::string& file, std::string_view text,
                                                          Diagnostics& diagnostics);

} // namespace spanledger
