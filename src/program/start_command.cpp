// SPDX-License-Identifier: MIT
#include "commands.hpp"
#include "spanledger/input/builtin_files.hpp"
#include "spanledger/writers/safe_file.hpp"
#include "words.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <deque>
#include <filesystem>
#include <ostream>
#include <vector>

namespace spanledger {
namespace {

namespace fs = std::filesystem;

constexpr std::array<std::string_view, 4> starter_files{"brief.toml", "schedule.csv", "floors.csv", "rates.csv"};
constexpr const char* catalogue_folder = "catalogue";

struct FileToWrite {
    std::string path;
    std::string_view text;
};

std::vector<FileToWrite> files_to_write(const fs::path& folder, bool with_catalogue) {
    std::vector<FileToWrite> files;
    files.reserve(starter_files.size() + builtin_files().size());
    for (const std::string_view name : starter_files) files.push_back({(folder / name).string(), builtin_file(name)});
    for (const BuiltinFile& file : builtin_files()) {
        const bool starter = std::find(starter_files.begin(), starter_files.end(), file.name) != starter_files.end();
        if (with_catalogue && !starter) files.push_back({(folder / catalogue_folder / file.name).string(), file.text});
    }
    return files;
}

std::string present_among(const std::vector<FileToWrite>& files) {
    std::string present;
    for (const FileToWrite& file : files) {
        std::error_code unknown; // a file that cannot be looked at is met again when it is written
        if (!fs::exists(fs::symlink_status(file.path, unknown))) continue;
        present += (present.empty() ? "" : ", ") + fs::path(file.path).filename().string();
    }
    return present;
}

/// All of the files or none.
WriteResult write_all(const std::vector<FileToWrite>& files) {
    std::deque<TemporaryFile> making;
    for (const FileToWrite& file : files) {
        TemporaryFile& made = making.emplace_back(file.path);
        if (made.problem()) return made.problem();
        if (auto error = made.write(file.text)) return error;
        if (auto error = made.settle()) return error;
    }
    for (TemporaryFile& made : making) {
        if (auto error = made.place()) return error;
    }
    return {};
}

} // namespace

int start_command(const CommandLine& line, const Surroundings& around) {
    const std::string& folder = line.operands.front();
    if (folder == "-") return refuse(around, "the files cannot go to standard output", "name a folder for them");
    const bool with_catalogue = line.has("catalogue");
    const std::vector<FileToWrite> files = files_to_write(folder, with_catalogue);
    if (const std::string present = present_among(files); !present.empty()) {
        return refuse(around, fmt::format("{} holds {} already", folder, present), "name a new folder");
    }
    if (auto error = prepare_folder(folder)) return could_not_write(around, *error);
    if (with_catalogue) {
        if (auto error = prepare_folder((fs::path(folder) / catalogue_folder).string())) {
            return could_not_write(around, *error);
        }
    }
    if (auto error = write_all(files)) return could_not_write(around, *error);
    for (const FileToWrite& file : files) around.out << file.path << "\n";
    say(line, around, fmt::format("An invented project. Next: spanledger tables {}", shell_word(files.front().path)));
    return exit_status::well;
}

} // namespace spanledger
