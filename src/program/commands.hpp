// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/program/options.hpp"
#include "spanledger/program/run.hpp"

// One function per command; each returns the exit status.

namespace spanledger {

[[nodiscard]] int start_command(const CommandLine& line, const Surroundings& around);
[[nodiscard]] int tables_command(const CommandLine& line, const Surroundings& around);
[[nodiscard]] int check_command(const CommandLine& line, const Surroundings& around);
[[nodiscard]] int catalogue_command(const CommandLine& line, const Surroundings& around);

} // namespace spanledger
