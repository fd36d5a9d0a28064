// SPDX-License-Identifier: MIT
#include "catalogue_rows.hpp"

#include <fmt/format.h>

#include <array>

namespace spanledger {

namespace {

const NumberRange strength_range{100.0, 1000.0, 200.0, 500.0, "MPa"};
const NumberRange depth_range{40.0, 2000.0, 80.0, 1100.0, "mm"};
const NumberRange width_range{20.0, 1000.0, 40.0, 450.0, "mm"};
const NumberRange thickness_range{1.0, 150.0, 3.0, 40.0, "mm"};
const NumberRange radius_range{0.0, 100.0, 5.0, 40.0, "mm"};
const std::array<std::string, 2> shape_words{"I", "channel"};

SteelGrade read_grade(CsvRecord& record) {
    SteelGrade row;
    row.name = read_name(record, "grade");
    row.standard = record.required_text("standard");
    row.f_y_16 = record.number("f_y_16_MPa", strength_range);
    row.f_y_40 = record.optional_number("f_y_40_MPa", strength_range);
    if (row.name.find_first_of(" \t\n") != std::string::npos) {
        record.error("grade", "bad-name", fmt::format("grade '{}' holds a space", row.name),
                     "write it without: a joist is named by its grade, a space and its section");
    }
    if (record.good() && row.f_y_40.value_or(row.f_y_16) > row.f_y_16) {
        record.error("f_y_40_MPa", "contradiction",
                     fmt::format("'f_y_40_MPa' ({}) is above 'f_y_16_MPa' ({})", *row.f_y_40, row.f_y_16),
                     "thicker parts are not stronger; check whether values stand in the wrong column");
    }
    return row;
}

/// What would leave no web, no flange, or flanges too weak for the formulas of a joist.
void check_sense(CsvRecord& record, const RolledSection& row) {
    if (!record.good()) return;
    const double flat_web = row.h - 2.0 * row.t_f - 2.0 * row.r;
    const double roots = row.shape == RolledShape::channel ? 1.0 : 2.0;
    const double outstands = row.b - row.t_w - roots * row.r;
    if (flat_web <= 0.0 || outstands <= 0.0) {
        record.error(flat_web <= 0.0 ? "h_mm" : "b_mm", "contradiction",
                     fmt::format("section '{}' has no room for its {}", row.name,
                                 flat_web <= 0.0 ? "web between flanges and roots" : "flanges beside web and roots"),
                     "check whether values stand in the wrong column");
    } else if (12.0 * row.b * row.t_f < row.t_w * row.h) {
        record.error("tf_mm", "contradiction",
                     fmt::format("section '{}' has flanges of less than a twelfth of its web", row.name),
                     "check whether values stand in the wrong column");
    }
}

RolledSection read_section(CsvRecord& record) {
    RolledSection row;
    row.series = read_name(record, "series");
    row.name = read_name(record, "section");
    row.shape = static_cast<RolledShape>(record.one_of("shape", shape_words));
    row.h = record.number("h_mm", depth_range);
    row.b = record.number("b_mm", width_range);
    row.t_w = record.number("tw_mm", thickness_range);
    row.t_f = record.number("tf_mm", thickness_range);
    row.r = record.number("r_mm", radius_range);
    check_sense(record, row);
    return row;
}

} // namespace

void read_steel_grades(const RowFile& file, const std::vector<Source>& sources, RowCollector<SteelGrade>& collector,
                       Diagnostics& diagnostics) {
    static const std::array<CsvColumn, 7> columns{
        {{"grade"}, {"standard"}, {"f_y_16_MPa"}, {"f_y_40_MPa", false}, {"source"}, {"seen", false}, {"note", false}}};
    for_each_record(file, columns, diagnostics, [&](CsvRecord& record) {
        SteelGrade row = read_grade(record);
        row.provenance = read_provenance(record, file, sources);
        const std::string name = row.name;
        collector.add(std::move(row), name, record);
    });
}

void read_rolled_sections(const RowFile& file, const std::vector<Source>& sources,
                          RowCollector<RolledSection>& collector, Diagnostics& diagnostics) {
    static const std::array<CsvColumn, 11> columns{{{"series"},
                                                    {"section"},
                                                    {"shape"},
                                                    {"h_mm"},
                                                    {"b_mm"},
                                                    {"tw_mm"},
                                                    {"tf_mm"},
                                                    {"r_mm"},
                                                    {"source"},
                                                    {"seen", false},
                                                    {"note", false}}};
    for_each_record(file, columns, diagnostics, [&](CsvRecord& record) {
        RolledSection row = read_section(record);
        row.provenance = read_provenance(record, file, sources);
        const std::string name = row.name;
        collector.add(std::move(row), name, record);
    });
}

} // namespace spanledger
