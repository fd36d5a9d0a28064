// SPDX-License-Identifier: MIT
#include "launcher.hpp"
#include "quads.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cstdlib>
#include <filesystem>
#include <functional>
#include <stdexcept>
#include <string>
#include <vector>

// The whole run against the bare writer, each run a process of its own. Links nothing large: see launcher.hpp.

namespace {

using namespace spanledger;

struct Case {
    std::string cells; ///< as `whole_run prepare` names them
    std::size_t quads = 0;
};

/// The programs beside this one, and one folder with all files of a case.
struct Bench {
    std::string programs;
    std::string folder;

    [[nodiscard]] std::string file(const char* name) const { return folder + "/" + name; }
    [[nodiscard]] std::vector<std::string> bare() const {
        return {programs + "/bare_writer", file("cells.bin"), file("bare.xlsx")};
    }
    [[nodiscard]] std::vector<std::string> whole(const char* what, const char* target) const {
        return {programs + "/whole_run", what, file("brief.toml"), file(target)};
    }
    [[nodiscard]] std::vector<std::string> prepare(const std::string& cells) const {
        return {programs + "/whole_run", "prepare", folder, cells};
    }
};

bool same_cells(const Bench& bench) {
    const std::string command =
        fmt::format("{} {}/compare_workbooks.py {} {}", SPANLEDGER_PYTHON, SPANLEDGER_BENCHMARK_SOURCE,
                    bench.file("bare.xlsx"), bench.file("whole.xlsx"));
    return std::system(command.c_str()) == 0;
}

/// A command as a measured piece of work that also keeps its largest peak memory.
std::function<benchmark::Sample()> work(const std::vector<std::string>& command, double& peak_mib) {
    return [&peak_mib, command] {
        const benchmark::Run run = benchmark::launch(command);
        if (!run.succeeded) throw std::runtime_error(fmt::format("{} {} did not succeed", command[0], command[1]));
        peak_mib = std::max(peak_mib, run.peak_mib);
        return run.sample;
    };
}

bool compare(const Bench& bench, const Case& size) {
    double peak = 0.0;
    double bare_peak = 0.0;
    double workbook_peak = 0.0;
    double all_peak = 0.0;
    work(bench.prepare(size.cells), peak)();
    const auto bare = work(bench.bare(), bare_peak);
    const auto workbook = work(bench.whole("workbook", "whole.xlsx"), workbook_peak);
    bare();
    workbook();
    if (!same_cells(bench)) {
        fmt::print("{} cells: the workbooks differ\n", size.cells);
        return false;
    }
    const auto line = [&](const char* what, const std::function<benchmark::Sample()>& b) {
        const benchmark::Ratios ratios = benchmark::measure(size.quads, bare, b);
        benchmark::print(fmt::format("{} / bare writer, {} cells", what, size.cells), ratios);
        return ratios;
    };
    const bool well = benchmark::control_holds(line("bare writer (control)", bare));
    line("sweep alone", work(bench.whole("sweep", ""), peak));
    line("whole run, workbook", workbook);
    line("whole run, all files", work(bench.whole("all", ""), all_peak));
    fmt::print("peak memory / bare writer, {} cells: workbook {:.2f}, all files {:.2f}\n", size.cells,
               workbook_peak / bare_peak, all_peak / bare_peak);
    return well;
}

} // namespace

/// whole_run_ratios [QUADS AT 10 000 CELLS [QUADS AT 1 000 000 CELLS]], 0 leaves a size out. Exit status 1 where
/// outputs differ or a control is off.
int main(int argc, char** argv) {
    const auto number = [&](int at, std::size_t otherwise) {
        return argc > at ? std::strtoul(argv[at], nullptr, 10) : otherwise;
    };
    std::string folder = (std::filesystem::temp_directory_path() / "spanledger-whole-run-XXXXXX").string();
    if (mkdtemp(folder.data()) == nullptr) return 2;
    const Bench bench{.programs = std::filesystem::canonical(argv[0]).parent_path().string(), .folder = folder};
    bool well = true;
    try {
        for (const Case& size : {Case{"ten-thousand", number(1, 25)}, Case{"million", number(2, 7)}}) {
            if (size.quads > 0) well = compare(bench, size) && well;
        }
    } catch (const std::runtime_error& failure) {
        fmt::print(stderr, "{}\n", failure.what());
        well = false;
    }
    std::filesystem::remove_all(folder);
    return well ? 0 : 1;
}
