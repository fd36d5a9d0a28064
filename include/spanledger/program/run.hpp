// SPDX-License-Identifier: MIT
#pragma once

#include <functional>
#include <iosfwd>
#include <span>
#include <string>

namespace spanledger {

namespace exit_status {
inline constexpr int well = 0;
inline constexpr int failed_check = 1;
inline constexpr int bad_input = 2;
inline constexpr int could_not_write = 3;
inline constexpr int fault = 4;
inline constexpr int interrupted = 130;
} // namespace exit_status

/// What a run has around it.
struct Surroundings {
    std::ostream& out;                      ///< results
    std::ostream& err;                      ///< words
    bool err_is_terminal = false;           ///< progress is shown
    std::function<bool()> interrupted = {}; ///< asked during long work; true stops the run
};

/// The whole program but for signals and terminals: from the arguments after the program's name to the exit status.
/// Throws nothing.
[[nodiscard]] int run(std::span<const std::string> arguments, const Surroundings& around);

} // namespace spanledger
