// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/program/run.hpp"

#include "input/temporary_folder.hpp"

#include <filesystem>
#include <fstream>
#include <functional>
#include <map>
#include <sstream>
#include <string>
#include <vector>

namespace spanledger {

/// What a run left behind.
struct Outcome {
    int status = -1; ///< exit status; 128 + signal where a signal ended it
    std::string out;
    std::string err;
};

using Arguments = std::vector<std::string>;

/// Runs the program inside this process.
inline Outcome run_inside(const Arguments& arguments, std::function<bool()> interrupted = {}) {
    std::ostringstream out;
    std::ostringstream err;
    const int status = run(arguments, Surroundings{out, err, false, std::move(interrupted)});
    return {status, out.str(), err.str()};
}

inline std::string file_text(const std::filesystem::path& path) {
    const std::ifstream file(path, std::ios::binary);
    std::ostringstream text;
    text << file.rdbuf();
    return text.str();
}

/// Every file below a folder, hidden ones too, by its path from there.
inline std::map<std::string, std::string> files_below(const std::filesystem::path& folder) {
    std::map<std::string, std::string> files;
    for (const auto& entry : std::filesystem::recursive_directory_iterator(folder)) {
        if (!entry.is_regular_file()) continue;
        files[entry.path().lexically_relative(folder).string()] = file_text(entry.path());
    }
    return files;
}

/// A folder that `start` filled; its brief asks for little work.
class StartedFolder {
public:
    StartedFolder() { started_ = run_inside({"start", project()}); }

    [[nodiscard]] const Outcome& started() const { return started_; }
    [[nodiscard]] std::string path() const { return folder_.path(); }
    [[nodiscard]] std::string project() const { return folder_.path() + "/project"; }
    [[nodiscard]] std::string brief() const { return project() + "/brief.toml"; }
    [[nodiscard]] std::string out() const { return folder_.path() + "/issued"; }

    [[nodiscard]] Arguments tables() const { return {"tables", brief(), "--out", out()}; }
    [[nodiscard]] Arguments replacing_tables() const { return {"tables", brief(), "--out", out(), "--replace"}; }
    [[nodiscard]] Arguments check(const std::string& clear_span) const {
        return {"check", brief(),  "--member",         "C24 47x220",   "--spacing",
                "400",   "--load", "Dwelling, G 0.50", "--clear-span", clear_span};
    }

private:
    TemporaryFolder folder_;
    Outcome started_;
};

inline Arguments with(Arguments arguments, const std::string& more) {
    arguments.push_back(more);
    return arguments;
}

} // namespace spanledger
