// SPDX-License-Identifier: MIT
#include "spanledger/input/brief_schema.hpp"

#include <array>

namespace spanledger {

namespace {

using enum ValueKind;

constexpr Measure area_load{Dimension::area_load, "kN/m2"};
constexpr KeyRange any_load{0, 400};
constexpr KeyRange usual_load{0, 50};
constexpr KeyRange share{0, 1};
constexpr std::string_view durations = "permanent|long|medium|short|instantaneous";
constexpr std::string_view from_category = "from the category";

constexpr std::array loads{
    KeyDefinition{.name = "name", .required = true, .meaning = "name of the load class, as in tables and --load"},
    KeyDefinition{.name = "category",
                  .required = true,
                  .meaning = "category of use: A, B, C1 to C5, D1, D2, E1, H, ... (`spanledger catalogue loads`)",
                  .clause = "EN 1991-1-1 Tables 6.1 to 6.10"},
    KeyDefinition{.name = "permanent_kN_m2",
                  .kind = number,
                  .measure = area_load,
                  .fallback = "0",
                  .hard = any_load,
                  .usual = usual_load,
                  .meaning = "permanent load g_k, without the joists themselves"},
    KeyDefinition{.name = "permanent_partitions_kN_m2",
                  .kind = number,
                  .measure = area_load,
                  .fallback = "0",
                  .hard = any_load,
                  .usual = usual_load,
                  .meaning = "partitions that stay where they are, as permanent load"},
    KeyDefinition{.name = "variable_kN_m2",
                  .kind = number,
                  .measure = area_load,
                  .fallback = "0",
                  .hard = any_load,
                  .usual = usual_load,
                  .meaning = "uniform variable load q_k"},
    KeyDefinition{.name = "partitions_kN_m2",
                  .kind = number,
                  .measure = area_load,
                  .fallback = "0",
                  .hard = any_load,
                  .usual = usual_load,
                  .meaning = "allowance for movable partitions, a variable load beside q_k and Q_k",
                  .clause = "EN 1991-1-1 6.3.1.2(8)"},
    KeyDefinition{.name = "duration",
                  .kind = choice,
                  .fallback_words = from_category,
                  .choices = durations,
                  .meaning = "load duration of q_k",
                  .clause = "EN 1995-1-1 2.3.1.2"},
    KeyDefinition{.name = "psi0",
                  .kind = number,
                  .fallback_words = from_category,
                  .hard = share,
                  .meaning = "factor for the combination value",
                  .clause = "EN 1990 Table A1.1"},
    KeyDefinition{.name = "psi1",
                  .kind = number,
                  .fallback_words = from_category,
                  .hard = share,
                  .meaning = "factor for the frequent value",
                  .clause = "EN 1990 Table A1.1"},
    KeyDefinition{.name = "psi2",
                  .kind = number,
                  .fallback_words = from_category,
                  .hard = share,
                  .meaning = "factor for the quasi-permanent value",
                  .clause = "EN 1990 Table A1.1"},
    KeyDefinition{.name = "snow_kN_m2",
                  .kind = number,
                  .measure = area_load,
                  .fallback = "0",
                  .hard = any_load,
                  .usual = usual_load,
                  .meaning = "snow on a roof, an alternative to q_k"},
    KeyDefinition{.name = "snow_duration",
                  .kind = choice,
                  .fallback = "short",
                  .choices = durations,
                  .meaning = "load duration of the snow"},
    KeyDefinition{.name = "snow_psi0",
                  .kind = number,
                  .fallback_words = "from the parameter set",
                  .hard = share,
                  .meaning = "factor for the combination value of the snow",
                  .clause = "EN 1990 Table A1.1"},
    KeyDefinition{.name = "snow_psi1",
                  .kind = number,
                  .fallback_words = "from the parameter set",
                  .hard = share,
                  .meaning = "factor for the frequent value of the snow",
                  .clause = "EN 1990 Table A1.1"},
    KeyDefinition{.name = "snow_psi2",
                  .kind = number,
                  .fallback_words = "from the parameter set",
                  .hard = share,
                  .meaning = "factor for the quasi-permanent value of the snow",
                  .clause = "EN 1990 Table A1.1"},
    KeyDefinition{.name = "concentrated_kN",
                  .kind = number,
                  .measure = {Dimension::force, "kN"},
                  .fallback = "0",
                  .hard = {0, 1000},
                  .usual = {0, 50},
                  .meaning = "concentrated load Q_k, an alternative to q_k",
                  .clause = "EN 1991-1-1 Table 6.2"},
    KeyDefinition{.name = "concentrated_share",
                  .kind = number,
                  .hard = {0.01, 1},
                  .needed_with = "concentrated_kN",
                  .meaning = "part of Q_k that one joist takes; 1.0 is the safe value"},
    KeyDefinition{.name = "concentrated_duration",
                  .kind = choice,
                  .fallback_words = from_category,
                  .choices = durations,
                  .meaning = "load duration of Q_k"},
    KeyDefinition{.name = "concentrated_in_deflection",
                  .kind = yes_no,
                  .fallback = "false",
                  .meaning = "Q_k counts in deflections too, not in strength only"},
};

constexpr std::array members{
    KeyDefinition{.name = "name", .required = true, .meaning = "name of the entry, as in the tables' members"},
    KeyDefinition{.name = "class",
                  .required = true,
                  .meaning = "strength class or grade, such as C24, S275 or S350GD (`spanledger catalogue classes`)"},
    KeyDefinition{.name = "series",
                  .needed_with = "no sizes",
                  .meaning = "a series of sections that can be bought (`spanledger catalogue series`)"},
    KeyDefinition{.name = "sizes",
                  .kind = texts,
                  .needed_with = "no series",
                  .meaning =
                      "sizes in mm, such as \"47x220\", or \"2/47x220\" for two plies; names such as \"IPE 200\"; "
                      "lipped channels such as \"C 150x50x15x1.5 r2.5\""},
    KeyDefinition{.name = "plies",
                  .kind = whole_number,
                  .fallback = "1",
                  .hard = {1, 10},
                  .usual = {1, 4},
                  .meaning = "pieces side by side in one joist"},
    KeyDefinition{.name = "plies_fixed_together",
                  .kind = yes_no,
                  .fallback = "false",
                  .meaning = "the plies buckle sideways as one piece"},
    KeyDefinition{.name = "stock_lengths_m",
                  .kind = numbers,
                  .measure = {Dimension::length, "m"},
                  .fallback_words = "no limit",
                  .hard = {0.3, 60},
                  .usual = {1.2, 20},
                  .meaning = "lengths that can be bought; the longest limits the span"},
};

constexpr std::array tables{
    KeyDefinition{.name = "name", .fallback_words = "Table 1, Table 2, ...", .meaning = "name of the table"},
    KeyDefinition{.name = "kind",
                  .kind = choice,
                  .choices = "permissible span|permissible load|utilisation|smallest section",
                  .required = true,
                  .meaning = "what a cell states"},
    KeyDefinition{.name = "members", .kind = texts, .required = true, .meaning = "names of [[members]]"},
    KeyDefinition{.name = "spacings_mm",
                  .kind = numbers,
                  .measure = {Dimension::length, "mm"},
                  .hard = {50, 10000},
                  .usual = {200, 4000},
                  .required = true,
                  .meaning = "spacings of the joists, centre to centre; for timber usual to 1200 mm"},
    KeyDefinition{.name = "loads", .kind = texts, .required = true, .meaning = "names of [[load]]"},
    KeyDefinition{.name = "spans_m",
                  .kind = numbers,
                  .measure = {Dimension::length, "m"},
                  .hard = {0.1, 60},
                  .usual = {0.5, 30},
                  .needed_with = "every kind but \"permissible span\"",
                  .meaning = "clear spans"},
};

} // namespace

std::span<const KeyDefinition> load_keys() noexcept {
    return loads;
}
std::span<const KeyDefinition> members_keys() noexcept {
    return members;
}
std::span<const KeyDefinition> table_keys() noexcept {
    return tables;
}

} // namespace spanledger
