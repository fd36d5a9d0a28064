// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/inputs.hpp"
#include "spanledger/program/options.hpp"
#include "spanledger/program/run.hpp"
#include "spanledger/writers/safe_file.hpp"

#include <optional>
#include <string>

// What the commands say on standard error, and reading with its problems reported.

namespace spanledger {

/// Thrown through long work when the user asks to stop; the run ends with status 130.
struct Interruption {};

void stop_if_asked(const Surroundings& around);

/// One line, unless --quiet.
void say(const CommandLine& line, const Surroundings& around, const std::string& words);

/// A usage error. Returns its exit status.
[[nodiscard]] int refuse(const Surroundings& around, const std::string& message, const std::string& hint);

/// Returns its exit status.
[[nodiscard]] int could_not_write(const Surroundings& around, const WriteError& error);

/// Errors always; warnings unless --quiet.
void report_problems(const Diagnostics& diagnostics, const CommandLine& line, const Surroundings& around);

/// Reads a brief and reports what is wrong or unusual in it.
[[nodiscard]] std::optional<Inputs> read_and_report(const std::string& brief, const CommandLine& line,
                                                    const Surroundings& around);

/// With --verbose: where every catalogue row and parameter in use comes from.
void say_sources(const Inputs& inputs, const CommandLine& line, const Surroundings& around);

/// A file name as a shell takes it: quoted where it must be.
[[nodiscard]] std::string shell_word(const std::string& text);

} // namespace spanledger
