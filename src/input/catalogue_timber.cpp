// SPDX-License-Identifier: MIT
#include "catalogue_rows.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>

namespace spanledger {

namespace {

const std::array<std::string, 4> timber_words{"solid softwood", "solid hardwood", "glulam", "LVL"};

/// A column of numbers of a strength class, with what is possible and what is usual.
template <class Member> struct ClassColumn {
    const char* name;
    Member TimberClass::*member;
    NumberRange range;
};

const std::array<ClassColumn<double>, 8>& required_columns() {
    static const std::array<ClassColumn<double>, 8> columns{{
        {"f_m_k_MPa", &TimberClass::f_m_k, {1.0, 200.0, 10.0, 90.0, "MPa"}},
        {"f_v_k_MPa", &TimberClass::f_v_k, {0.1, 50.0, 1.0, 10.0, "MPa"}},
        {"f_c_90_k_MPa", &TimberClass::f_c_90_k, {0.1, 50.0, 1.0, 20.0, "MPa"}},
        {"E_0_mean_MPa", &TimberClass::E_0_mean, {500.0, 50000.0, 5000.0, 25000.0, "MPa"}},
        {"E_0_05_MPa", &TimberClass::E_0_05, {300.0, 50000.0, 3000.0, 22000.0, "MPa"}},
        {"G_mean_MPa", &TimberClass::G_mean, {20.0, 5000.0, 300.0, 1500.0, "MPa"}},
        {"rho_k_kg_m3", &TimberClass::rho_k, {100.0, 1500.0, 250.0, 1100.0, "kg/m3"}},
        {"rho_mean_kg_m3", &TimberClass::rho_mean, {100.0, 1500.0, 300.0, 1200.0, "kg/m3"}},
    }};
    return columns;
}

using Optional = std::optional<double>;

const std::array<ClassColumn<Optional>, 6>& optional_columns() {
    static const std::array<ClassColumn<Optional>, 6> columns{{
        {"f_t_0_k_MPa", &TimberClass::f_t_0_k, {0.1, 200.0, 5.0, 60.0, "MPa"}},
        {"f_t_90_k_MPa", &TimberClass::f_t_90_k, {0.01, 20.0, 0.2, 2.0, "MPa"}},
        {"f_c_0_k_MPa", &TimberClass::f_c_0_k, {0.5, 200.0, 10.0, 70.0, "MPa"}},
        {"E_90_mean_MPa", &TimberClass::E_90_mean, {10.0, 10000.0, 100.0, 2500.0, "MPa"}},
        {"G_0_05_MPa", &TimberClass::G_05, {10.0, 5000.0, 200.0, 1400.0, "MPa"}},
        {"size_exponent", &TimberClass::size_exponent, {0.0, 0.5, 0.05, 0.25, ""}},
    }};
    return columns;
}

std::vector<CsvColumn> class_columns() {
    std::vector<CsvColumn> columns{{"class"}, {"standard"}, {"timber"}};
    for (const auto& column : required_columns()) {
        columns.push_back({column.name});
    }
    for (const auto& column : optional_columns()) {
        columns.push_back({column.name, false});
    }
    columns.insert(columns.end(), {{"source"}, {"seen", false}, {"note", false}});
    return columns;
}

/// The smaller of two values must not be above the greater one.
void check_order(CsvRecord& record, const char* lower_column, double lower, const char* upper_column, double upper) {
    if (record.good() && lower > upper) {
        record.error(lower_column, "contradiction",
                     fmt::format("'{}' ({}) is above '{}' ({})", lower_column, lower, upper_column, upper),
                     "check whether values stand in the wrong column");
    }
}

void check_sense(CsvRecord& record, const TimberClass& row) {
    check_order(record, "E_0_05_MPa", row.E_0_05, "E_0_mean_MPa", row.E_0_mean);
    check_order(record, "rho_k_kg_m3", row.rho_k, "rho_mean_kg_m3", row.rho_mean);
    check_order(record, "G_mean_MPa", row.G_mean, "E_0_mean_MPa", row.E_0_mean);
    check_order(record, "f_v_k_MPa", row.f_v_k, "f_m_k_MPa", row.f_m_k);
    check_order(record, "G_0_05_MPa", row.G_05.value_or(0.0), "G_mean_MPa", row.G_mean);
    check_order(record, "E_90_mean_MPa", row.E_90_mean.value_or(0.0), "E_0_mean_MPa", row.E_0_mean);
    if (row.f_t_0_k) {
        check_order(record, "f_t_90_k_MPa", row.f_t_90_k.value_or(0.0), "f_t_0_k_MPa", *row.f_t_0_k);
    }
    if (row.f_c_0_k) {
        check_order(record, "f_c_90_k_MPa", row.f_c_90_k, "f_c_0_k_MPa", *row.f_c_0_k);
    }
    const bool lvl = row.timber == Timber::lvl;
    if (record.good() && lvl != row.size_exponent.has_value()) {
        record.error("size_exponent", lvl ? "empty-field" : "contradiction",
                     lvl ? "LVL needs its size exponent" : "only LVL has a size exponent",
                     lvl ? "take s from the declaration of performance" : "leave the field empty");
    }
}

TimberClass read_class(CsvRecord& record) {
    TimberClass row;
    row.name = read_name(record, "class");
    row.standard = record.required_text("standard");
    row.timber = static_cast<Timber>(record.one_of("timber", timber_words));
    for (const auto& column : required_columns()) {
        row.*column.member = record.number(column.name, column.range);
    }
    for (const auto& column : optional_columns()) {
        row.*column.member = record.optional_number(column.name, column.range);
    }
    if (row.name.find_first_of(" \t\n") != std::string::npos) {
        record.error("class", "bad-name", fmt::format("class '{}' holds a space", row.name),
                     "write it without: a joist is named by its class, a space and its size");
    }
    check_sense(record, row);
    return row;
}

const NumberRange breadth_range{10.0, 1000.0, 19.0, 400.0, "mm"};
const NumberRange depth_range{20.0, 3000.0, 60.0, 1500.0, "mm"};

} // namespace

void read_timber_classes(const RowFile& file, const std::vector<Source>& sources, RowCollector<TimberClass>& collector,
                         Diagnostics& diagnostics) {
    for_each_record(file, class_columns(), diagnostics, [&](CsvRecord& record) {
        TimberClass row = read_class(record);
        row.provenance = read_provenance(record, file, sources);
        const std::string name = row.name;
        collector.add(std::move(row), name, record);
    });
}

void read_timber_sizes(const RowFile& file, const std::vector<Source>& sources, RowCollector<TimberSize>& collector,
                       Diagnostics& diagnostics) {
    static const std::array<CsvColumn, 7> columns{
        {{"series"}, {"region", false}, {"b_mm"}, {"h_mm"}, {"source"}, {"seen", false}, {"note", false}}};
    for_each_record(file, columns, diagnostics, [&](CsvRecord& record) {
        TimberSize row;
        row.series = read_name(record, "series");
        row.region = record.text("region");
        row.b = record.number("b_mm", breadth_range);
        row.h = record.number("h_mm", depth_range);
        row.provenance = read_provenance(record, file, sources);
        const std::string name = fmt::format("{} {}x{}", row.series, row.b, row.h);
        collector.add(std::move(row), name, record);
    });
}

} // namespace spanledger
