// SPDX-License-Identifier: MIT
#pragma once

#include "program/outcome.hpp"

#include <csignal>
#include <cstdlib>
#include <optional>
#include <stdexcept>
#include <utility>

#include <fcntl.h>
#include <sys/resource.h>
#include <sys/wait.h>
#include <unistd.h>

namespace spanledger {

struct Launch {
    Arguments arguments;
    std::string program = SPANLEDGER_PROGRAM;
    std::string folder = ".";                                          ///< where it runs
    std::vector<std::pair<std::string, std::string>> environment = {}; ///< set on top of the test's own
    std::optional<rlim_t> file_size = {}; ///< greatest size of a file it may write, in bytes
    std::string out = {};                 ///< device that takes standard output, which is then not read back
};

/// A program in a process of its own. Its words go to scratch files, so that it never waits for the test to read them.
class Subprocess {
public:
    explicit Subprocess(const Launch& launch)
        : keeps_out_(launch.out.empty()),
          out_(keeps_out_ ? scratch() : ::open(launch.out.c_str(), O_WRONLY | O_CLOEXEC)), err_(scratch()) {
        int ends[2];
        if (::pipe2(ends, O_CLOEXEC) != 0) throw std::runtime_error("no pipe");
        input_ = ends[1];
        std::signal(SIGPIPE, SIG_IGN); // a program that stops reading is an answer, not the end of the test
        child_ = ::fork();
        if (child_ == 0) become(launch, ends[0]);
        ::close(ends[0]);
        if (child_ < 0) throw std::runtime_error("no process"); // and never a signal to process -1, which is all
    }
    Subprocess(const Subprocess&) = delete;
    Subprocess& operator=(const Subprocess&) = delete;
    ~Subprocess() {
        close_input();
        ::close(out_);
        ::close(err_);
    }

    /// Writes to its standard input; returns once all is written.
    void feed(const std::string& text) const {
        std::size_t done = 0;
        while (done < text.size()) {
            const ssize_t written = ::write(input_, text.data() + done, text.size() - done);
            if (written < 0) return; // it has ended or reads no more
            done += static_cast<std::size_t>(written);
        }
    }
    void close_input() {
        if (input_ >= 0) ::close(std::exchange(input_, -1));
    }
    void signal(int number) const { ::kill(child_, number); }

    Outcome wait() {
        close_input();
        int status = 0;
        ::waitpid(child_, &status, 0);
        const int ended = WIFEXITED(status) ? WEXITSTATUS(status) : 128 + WTERMSIG(status);
        return {ended, keeps_out_ ? text_of(out_) : std::string(), text_of(err_)};
    }

private:
    static int scratch() {
        std::string name = (std::filesystem::temp_directory_path() / "spanledger-words-XXXXXX").string();
        const int file = ::mkostemp(name.data(), O_CLOEXEC);
        ::unlink(name.c_str());
        return file;
    }

    [[noreturn]] void become(const Launch& launch, int input) const {
        std::signal(SIGPIPE, SIG_DFL);
        ::dup2(input, STDIN_FILENO);
        ::dup2(out_, STDOUT_FILENO);
        ::dup2(err_, STDERR_FILENO);
        for (const auto& [name, value] : launch.environment) ::setenv(name.c_str(), value.c_str(), 1);
        if (launch.file_size) {
            const rlimit limit{*launch.file_size, *launch.file_size};
            ::setrlimit(RLIMIT_FSIZE, &limit);
        }
        std::vector<char*> values{const_cast<char*>(launch.program.c_str())};
        for (const std::string& argument : launch.arguments) values.push_back(const_cast<char*>(argument.c_str()));
        values.push_back(nullptr);
        if (::chdir(launch.folder.c_str()) == 0) ::execvp(values[0], values.data());
        ::_exit(127);
    }

    static std::string text_of(int file) {
        std::string text;
        char part[4096];
        for (off_t at = 0;;) {
            const ssize_t count = ::pread(file, part, sizeof part, at);
            if (count <= 0) return text;
            text.append(part, static_cast<std::size_t>(count));
            at += count;
        }
    }

    bool keeps_out_;
    int out_;
    int err_;
    int input_ = -1;
    pid_t child_ = -1;
};

inline Outcome run_apart(const Launch& launch, const std::string& input = {}) {
    Subprocess process(launch);
    process.feed(input);
    return process.wait();
}

/// Another program, with a text on its standard input.
inline Outcome run_other(const std::string& program, const Arguments& arguments, const std::string& input = {}) {
    return run_apart({.arguments = arguments, .program = program}, input);
}

} // namespace spanledger
