// SPDX-License-Identifier: MIT
#include "catalogue_rows.hpp"

#include "spanledger/member.hpp"

#include <fmt/format.h>

#include <array>

namespace spanledger {

namespace {

const NumberRange strength_range{100.0, 700.0, 220.0, 550.0, "MPa"};
const NumberRange depth_range{40.0, 1000.0, 100.0, 400.0, "mm"};
const NumberRange width_range{15.0, 400.0, 30.0, 150.0, "mm"};
const NumberRange lip_range{4.0, 150.0, 10.0, 40.0, "mm"};
const NumberRange thickness_range{0.3, 10.0, 0.9, 4.0, "mm"};
const NumberRange radius_range{0.0, 50.0, 1.0, 8.0, "mm"};

ColdFormedGrade read_grade(CsvRecord& record) {
    ColdFormedGrade row;
    row.name = read_name(record, "grade");
    row.standard = record.required_text("standard");
    row.f_yb = record.number("f_yb_MPa", strength_range);
    if (row.name.find_first_of(" \t\n") != std::string::npos) {
        record.error("grade", "bad-name", fmt::format("grade '{}' holds a space", row.name),
                     "write it without: a joist is named by its grade, a space and its section");
    }
    return row;
}

LippedChannelSize read_size(CsvRecord& record) {
    const LippedChannelSize size{.h = record.number("h_mm", depth_range),
                                 .b_1 = record.number("b_1_mm", width_range),
                                 .b_2 = record.number("b_2_mm", width_range),
                                 .c = record.number("c_mm", lip_range),
                                 .t_nom = record.number("t_nom_mm", thickness_range),
                                 .r = record.number("r_mm", radius_range)};
    if (!record.good()) return size;
    if (const std::string problem = lipped_channel_problem(size); !problem.empty()) {
        record.error("h_mm", "contradiction",
                     fmt::format("'{}' is not possible: {}", lipped_channel_name(size), problem),
                     "check whether values stand in the wrong column");
    }
    return size;
}

} // namespace

void read_cold_formed_grades(const RowFile& file, const std::vector<Source>& sources,
                             RowCollector<ColdFormedGrade>& collector, Diagnostics& diagnostics) {
    static const std::array<CsvColumn, 6> columns{
        {{"grade"}, {"standard"}, {"f_yb_MPa"}, {"source"}, {"seen", false}, {"note", false}}};
    for_each_record(file, columns, diagnostics, [&](CsvRecord& record) {
        ColdFormedGrade row = read_grade(record);
        row.provenance = read_provenance(record, file, sources);
        const std::string name = row.name;
        collector.add(std::move(row), name, record);
    });
}

void read_cold_formed_sizes(const RowFile& file, const std::vector<Source>& sources,
                            RowCollector<ColdFormedSize>& collector, Diagnostics& diagnostics) {
    static const std::array<CsvColumn, 10> columns{{{"series"},
                                                    {"h_mm"},
                                                    {"b_1_mm"},
                                                    {"b_2_mm"},
                                                    {"c_mm"},
                                                    {"t_nom_mm"},
                                                    {"r_mm"},
                                                    {"source"},
                                                    {"seen", false},
                                                    {"note", false}}};
    for_each_record(file, columns, diagnostics, [&](CsvRecord& record) {
        ColdFormedSize row;
        row.series = read_name(record, "series");
        row.size = read_size(record);
        row.provenance = read_provenance(record, file, sources);
        const std::string name = row.series + " " + lipped_channel_name(row.size);
        collector.add(std::move(row), name, record);
    });
}

} // namespace spanledger
