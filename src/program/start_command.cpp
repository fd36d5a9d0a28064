// SPDX-License-Identifier: MIT
#include "commands.hpp"

#include "spanledger/input/builtin_files.hpp"
#include "spanledger/writers/safe_file.hpp"

#include <fmt/format.h>

#include <array>
#include <filesystem>
#include <ostream>

namespace spanledger {
namespace {

constexpr std::array starter_files{"brief.toml", "schedule.csv", "floors.csv", "rates.csv"};

std::vector<std::string> files_to_write(bool with_catalogue) {
    std::vector<std::string> names(starter_files.begin(), starter_files.end());
    if (!with_catalogue) return names;
    for (const BuiltinFile& file : builtin_files()) {
        const bool starter = std::find(names.begin(), names.end(), file.name) != names.end();
        if (!starter) names.emplace_back(file.name);
    }
    return names;
}

} // namespace

int start_command(const CommandLine& line, const Surroundings& around) {
    const std::filesystem::path folder(line.operands.front());
    const std::vector<std::string> names = files_to_write(line.has("catalogue"));
    std::string present;
    for (const std::string& name : names) {
        std::error_code ignored;
        if (std::filesystem::exists(folder / name, ignored)) present += (present.empty() ? "" : ", ") + name;
    }
    if (!present.empty()) {
        return refuse(around, fmt::format("{} holds {} already", folder.string(), present), "name a new folder");
    }
    const auto failed = [&](const WriteError& error) {
        around.err << fmt::format("spanledger: could not write {}: {}\n", error.path, error.reason);
        return exit_status::could_not_write;
    };
    if (const WriteResult problem = prepare_folder(folder.string())) return failed(*problem);
    for (const std::string& name : names) {
        const std::string path = (folder / name).string();
        if (const WriteResult problem = write_file(path, builtin_file(name))) return failed(*problem);
        around.out << path << "\n";
    }
    say(line, around, fmt::format("An invented project. Next: spanledger tables {}", (folder / "brief.toml").string()));
    return exit_status::well;
}

} // namespace spanledger
