// SPDX-License-Identifier: MIT
#include "launcher.hpp"

#include <sys/resource.h>
#include <sys/wait.h>
#include <unistd.h>

#include <array>
#include <sstream>

namespace spanledger::benchmark {
namespace {

[[noreturn]] void become(const std::vector<std::string>& command, int output) {
    std::vector<char*> arguments;
    for (const std::string& argument : command) arguments.push_back(const_cast<char*>(argument.c_str()));
    arguments.push_back(nullptr);
    dup2(output, STDOUT_FILENO);
    execv(arguments.front(), arguments.data());
    _exit(127);
}

std::string read_all(int from) {
    std::string text;
    std::array<char, 256> buffer;
    for (ssize_t got = read(from, buffer.data(), buffer.size()); got > 0;
         got = read(from, buffer.data(), buffer.size())) {
        text.append(buffer.data(), static_cast<std::size_t>(got));
    }
    return text;
}

} // namespace

Run launch(const std::vector<std::string>& command) {
    std::array<int, 2> ends{};
    if (pipe(ends.data()) != 0) return {};
    const pid_t child = fork();
    if (child == 0) {
        close(ends[0]);
        become(command, ends[1]);
    }
    close(ends[1]);
    std::istringstream printed(read_all(ends[0]));
    close(ends[0]);
    int status = 0;
    rusage used{};
    Run run;
    if (child < 0 || wait4(child, &status, 0, &used) != child) return run;
    run.peak_mib = static_cast<double>(used.ru_maxrss) / 1024.0;
    run.succeeded = WIFEXITED(status) && WEXITSTATUS(status) == 0 && printed >> run.sample.wall >> run.sample.processor;
    return run;
}

} // namespace spanledger::benchmark
