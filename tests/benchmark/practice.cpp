// SPDX-License-Identifier: MIT
#include "practice.hpp"

#include <fmt/format.h>

#include <array>
#include <fstream>

namespace spanledger::benchmark {
namespace {

constexpr std::array classes{"C16", "C24", "GL24h", "GL28h"};

std::string series_text(std::size_t sizes) {
    constexpr std::size_t depths = 35;
    std::string text = "series,b_mm,h_mm,source\n";
    for (std::size_t i = 0; i < sizes; ++i) {
        text += fmt::format("benchmark,{},{},invented\n", 75 + 2 * (i / depths), 97 + 8 * (i % depths));
    }
    return text;
}

std::string load_text(std::size_t i) {
    return fmt::format("[[load]]\nname = \"load {}\"\ncategory = \"A\"\npermanent_kN_m2 = {:.2f}\n"
                       "variable_kN_m2 = {:.2f}\nconcentrated_kN = 2.0\nconcentrated_share = 0.5\n\n",
                       i + 1, 0.25 + 0.1 * static_cast<double>(i % 10), 1.5 + 0.5 * static_cast<double>(i / 10));
}

std::string table_text(const PracticeSize& size) {
    std::string members;
    for (const char* name : classes) members += fmt::format("\"{}\", ", name);
    std::string loads;
    for (std::size_t i = 0; i < size.loads; ++i) loads += fmt::format("\"load {}\", ", i + 1);
    std::string spacings;
    for (std::size_t i = 0; i < size.spacings; ++i) spacings += fmt::format("{}, ", 300 + 50 * i);
    return fmt::format("[[table]]\nname = \"Spans\"\nkind = \"permissible span\"\nmembers = [{}]\nloads = [{}]\n"
                       "spacings_mm = [{}]\n",
                       members, loads, spacings);
}

std::string limits_text(BriefKind kind) {
    std::string text = "[limits]\ninstantaneous_deflection = {ratio = 333, max_mm = 14}\n"
                       "final_deflection = {ratio = 250}\n";
    if (kind != BriefKind::without_vibration) {
        text += "vibration = {rule = \"uk\", floor_width_m = 4.0, strutting = false}\n";
    }
    return text;
}

std::string brief_text(const PracticeSize& size, BriefKind kind) {
    std::string text = fmt::format("[practice]\nnumber = \"BENCHMARK\"\nrevision = \"A\"\ndate = 2024-01-01\n\n"
                                   "[basis]\nparameters = \"uk\"\n\n[catalogue]\nseries = [\"series.csv\"]\n\n"
                                   "[support]\ncompression_edge = \"{}\"\n\n[deck]\nstiffness_Nmm2_per_m = 2.0e9\n\n",
                                   kind == BriefKind::free_edge ? "free" : "held");
    text += limits_text(kind) + "\n";
    for (std::size_t i = 0; i < size.loads; ++i) text += load_text(i);
    for (const char* name : classes) {
        text += fmt::format("[[members]]\nname = \"{0}\"\nclass = \"{0}\"\nseries = \"benchmark\"\n\n", name);
    }
    return text + table_text(size);
}

} // namespace

std::string write_practice(const std::string& folder, const PracticeSize& size, BriefKind kind) {
    const std::string brief = folder + "/brief.toml";
    std::ofstream(folder + "/series.csv") << series_text(size.sizes);
    std::ofstream(brief) << brief_text(size, kind);
    return brief;
}

} // namespace spanledger::benchmark
