// SPDX-License-Identifier: MIT
#include "spanledger/program/run.hpp"

#include <csignal>
#include <iostream>
#include <string>
#include <vector>

#include <unistd.h>

namespace {

// Set by the handler, asked by long work between its steps: nothing more may happen in a handler.
volatile std::sig_atomic_t interrupt_asked = 0; // NOLINT(cppcoreguidelines-avoid-non-const-global-variables)

void on_interrupt(int /*signal*/) {
    interrupt_asked = 1;
}

/// Signals that ask to stop end the run between steps, or end a wait for standard input: no SA_RESTART. What was to be
/// ignored when the program was started (nohup) stays so.
void prepare_signals() {
    struct sigaction asked {};
    asked.sa_handler = on_interrupt;
    for (const int signal : {SIGINT, SIGTERM, SIGHUP}) {
        struct sigaction before {};
        sigaction(signal, nullptr, &before);
        if (before.sa_handler != SIG_IGN) sigaction(signal, &asked, nullptr);
    }
    // A file that grows beyond its limit is then an error of write() and no death.
    std::signal(SIGXFSZ, SIG_IGN);
}

} // namespace

int main(int count, char** values) {
    // 1. The arguments after the program's name.
    const std::vector<std::string> arguments(values + (count > 0 ? 1 : 0), values + count);
    // 2. Signals.
    prepare_signals();
    // 3. The run.
    return spanledger::run(arguments,
                           {std::cout, std::cerr, isatty(STDERR_FILENO) != 0, [] { return interrupt_asked != 0; }});
}
