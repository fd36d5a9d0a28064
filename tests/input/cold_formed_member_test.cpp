// SPDX-License-Identifier: MIT
#include "input/temporary_folder.hpp"
#include "spanledger/engine/cell_solver.hpp"
#include "spanledger/member.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

namespace {

const Catalogue& catalogue() {
    static const Catalogue loaded = [] {
        Diagnostics diagnostics;
        return load_catalogue({}, "recommended", "", diagnostics);
    }();
    return loaded;
}

MembersEntry entry_of(std::vector<std::string> sizes) {
    MembersEntry entry;
    entry.name = "channels";
    entry.material_class = "S350GD";
    entry.sizes = std::move(sizes);
    return entry;
}

std::optional<Member> proposed(std::string_view text, Diagnostics& diagnostics) {
    return read_member(text, Brief{}, catalogue(), diagnostics);
}

std::string only_code(const Diagnostics& diagnostics) {
    return diagnostics.all().size() == 1 ? diagnostics.all()[0].code : std::to_string(diagnostics.all().size());
}

} // namespace

TEST_CASE("Channels are read however they are spaced", "[cold-formed]") {
    const auto text = GENERATE("C 200x74/66x20.8x2 r3", "c200X74/66x20.8x2r3", " C 200 × 74 / 66 × 20.8 × 2.0 R 3 ");
    INFO(text);
    const auto size = read_lipped_channel(text);
    REQUIRE(size.has_value());
    CHECK(size->h == 200.0);
    CHECK(size->b_1 == 74.0);
    CHECK(size->b_2 == 66.0);
    CHECK(size->c == 20.8);
    CHECK(size->t_nom == 2.0);
    CHECK(size->r == 3.0);
    CHECK(lipped_channel_name(*size) == "C 200x74/66x20.8x2 r3");
    CHECK(lipped_channel_name(*read_lipped_channel("C 150x50x15x1.5 r2.5")) == "C 150x50x15x1.5 r2.5");
}

TEST_CASE("What is no channel is refused", "[cold-formed]") {
    const auto text =
        GENERATE("", "C", "47x220", "IPE 200", "C 150x50x15x1.5", "C 150x50x15 r2.5", "150x50x15x1.5 r2.5",
                 "C 150x50x15x1.5x2 r2.5", "C 150x50/x15x1.5 r2.5", "C 150x50/60/70x15x1.5 r2.5",
                 "C 150x50x15x1,5 r2.5", "C 150x50x15xnan r2.5", "C 150x50x15x1.5 r2.5mm", "Z 150x50x15x1.5 r2.5",
                 "C 150x50x15x1.5 r", "C 150x50x15x1.5 r2.5 r3");
    INFO(text);
    CHECK_FALSE(read_lipped_channel(text).has_value());
}

TEST_CASE("Impossible channels are refused with a reason", "[cold-formed]") {
    const auto text =
        GENERATE("C 15x50x15x1.5 r2.5", "C 150x5x15x1.5 r2.5", "C 150x50x15x0 r2.5", "C 150x50x15x1.5 r60",
                 "C 150x50x5x1.5 r4", "C 150x50x80x1.5 r2.5", "C 150x30x15x1.5 r14", "C -150x50x15x1.5 r2");
    Diagnostics diagnostics;
    INFO(text);
    CHECK_FALSE(proposed(std::string("S350GD ") + text, diagnostics).has_value());
    CHECK(only_code(diagnostics) == "out-of-range");
}

TEST_CASE("A channel is named by grade and sizes", "[cold-formed]") {
    Diagnostics diagnostics;
    const auto member = proposed("S350GD C200x65x20x2r2.5", diagnostics);
    REQUIRE(member.has_value());
    CHECK(member_name(*member) == "S350GD C 200x65x20x2 r2.5");
    CHECK(material_name(*member) == "cold-formed steel");
    CHECK(depth_of(*member) == 200.0);
    // 369 mm along the sharp mid-lines less 4 (2 - pi/2) 3.5 mm, 2 mm thick, 7850 kg/m3.
    CHECK(mass_per_length(*member) == Approx((198 + 63 + 63 + 19 + 19 - 6.00885) * 2 * 7850e-6).epsilon(1e-6));
    CHECK(std::get<ColdFormedMember>(*member).size_provenance.has_value());
    CHECK_FALSE(stock_length_of(*member).has_value());
    CHECK(comparable(*member, *proposed("S350GD C 250x75x20x2 r2.5", diagnostics)));
    CHECK_FALSE(comparable(*member, *proposed("S350GD C 250x75x20x2.5 r3", diagnostics)));
    CHECK_FALSE(comparable(*member, *proposed("S280GD C 250x75x20x2 r2.5", diagnostics)));
    CHECK_FALSE(comparable(*member, *proposed("C24 47x220", diagnostics)));
    CHECK(diagnostics.all().empty());
}

TEST_CASE("Entries of channels", "[cold-formed]") {
    Diagnostics diagnostics;
    MembersEntry entry = entry_of({"C 200x65x20x2 r2.5", "c 200 x 65/65 x 20 x 2 r 2.5", "C 160x50x16x1.6 r2"});
    entry.stock_lengths = {6000.0, 12000.0};
    const auto members = members_of(entry, catalogue(), diagnostics);
    REQUIRE(members.size() == 2);
    CHECK(stock_length_of(members[1]) == 12000.0);
    CHECK_FALSE(std::get<ColdFormedMember>(members[1]).size_provenance.has_value());
    MembersEntry series = entry_of({});
    series.series = "C 200";
    CHECK(members_of(series, catalogue(), diagnostics).size() == 8);
    CHECK(diagnostics.all().empty());
}

TEST_CASE("Wrong entries of channels are reported", "[cold-formed]") {
    Diagnostics unknown_series, timber_size, plies, unknown_class;
    MembersEntry series = entry_of({});
    series.series = "C 20";
    CHECK(members_of(series, catalogue(), unknown_series).empty());
    CHECK(only_code(unknown_series) == "unknown-series");
    CHECK(members_of(entry_of({"47x220"}), catalogue(), timber_size).empty());
    CHECK(only_code(timber_size) == "bad-size");
    MembersEntry doubled = entry_of({"C 200x65x20x2 r2.5"});
    doubled.plies = 2;
    CHECK_FALSE(members_of(doubled, catalogue(), plies).empty());
    CHECK(only_code(plies) == "contradiction");
    MembersEntry misspelt = entry_of({"C 200x65x20x2 r2.5"});
    misspelt.material_class = "S355GD";
    CHECK(members_of(misspelt, catalogue(), unknown_class).empty());
    CHECK(only_code(unknown_class) == "unknown-class");
    CHECK_THAT(unknown_class.all()[0].hint, Catch::Contains("S350GD"));
}

TEST_CASE("The grades and sections that are built in are sound", "[cold-formed]") {
    CHECK(catalogue().cold_formed_grades.size() == 8);
    for (const ColdFormedGrade& grade : catalogue().cold_formed_grades) {
        INFO(grade.name);
        CHECK(grade.name == "S" + std::to_string(static_cast<int>(grade.f_yb)) + "GD");
        CHECK_FALSE(grade.provenance.seen);
    }
    Inputs inputs{.brief = {}, .catalogue = catalogue()};
    inputs.brief.support.compression_edge = CompressionEdge::held;
    LoadClass load;
    load.permanent = 0.0005;
    load.variable = 0.0015;
    for (const ColdFormedSize& row : catalogue().cold_formed_sizes) {
        const ColdFormedMember member{.grade = *find_cold_formed_grade(catalogue(), "S350GD"), .size = row.size};
        INFO(section_name(member));
        const CellSolver solver(inputs, member, load, {400.0, 400.0});
        const Cell cell = solver.permissible_span(400.0);
        CHECK(cell.reason.empty());
        CHECK(cell.value.value_or(0.0) > 2500.0);
        CHECK(cell.utilisation <= 1.0);
    }
}

TEST_CASE("A practice's own grades and channels", "[cold-formed]") {
    const TemporaryFolder folder;
    folder.write("grades.csv", "grade,standard,f_yb_MPa,source\nG450,declared,450,supplier's declaration\n"
                               "S350GD,EN 10346,345,lower value of our supplier\n");
    folder.write("sections.csv", "series,h_mm,b_1_mm,b_2_mm,c_mm,t_nom_mm,r_mm,source\n"
                                 "own,220,72,66,22,1.9,3,supplier's catalogue\n");
    Diagnostics diagnostics;
    CatalogueFiles files;
    files.classes = {"grades.csv"};
    files.sections = {"sections.csv"};
    const Catalogue own = load_catalogue(files, "recommended", folder.path(), diagnostics);
    CHECK(diagnostics.all().empty());
    REQUIRE(find_cold_formed_grade(own, "G450") != nullptr);
    CHECK(find_cold_formed_grade(own, "S350GD")->f_yb == 345.0);
    CHECK(find_cold_formed_grade(own, "S350GD")->provenance.practice_own);
    CHECK(own.cold_formed_grades.size() == 9);
    MembersEntry entry;
    entry.material_class = "G450";
    entry.series = "own";
    const auto members = members_of(entry, own, diagnostics);
    REQUIRE(members.size() == 1);
    CHECK(member_name(members[0]) == "G450 C 220x72/66x22x1.9 r3");
    CHECK(std::get<ColdFormedMember>(members[0]).size_provenance->practice_own);
}

TEST_CASE("Wrong rows of a practice's channels are reported", "[cold-formed]") {
    struct Wrong {
        const char* row;
        const char* code;
    };
    const TemporaryFolder folder;
    for (const Wrong& wrong :
         {Wrong{"own,220,72,66,22,19,3,supplier", "out-of-range"},
          Wrong{"own,220,72,66,10,4,7,supplier", "contradiction"}, Wrong{"own,220,72,66,22,1.9,3,", "missing-source"},
          Wrong{"own,220,72,66,22,nan,3,supplier", "bad-number"}}) {
        folder.write("sections.csv",
                     std::string("series,h_mm,b_1_mm,b_2_mm,c_mm,t_nom_mm,r_mm,source\n") + wrong.row + "\n");
        Diagnostics diagnostics;
        CatalogueFiles files;
        files.sections = {"sections.csv"};
        const Catalogue own = load_catalogue(files, "recommended", folder.path(), diagnostics);
        INFO(wrong.row);
        CHECK(own.cold_formed_sizes.size() == catalogue().cold_formed_sizes.size());
        REQUIRE_FALSE(diagnostics.all().empty());
        CHECK(diagnostics.all()[0].code == wrong.code);
    }
}
