// SPDX-License-Identifier: MIT
#include "input/temporary_folder.hpp"
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
    entry.name = "beams";
    entry.material_class = "S275";
    entry.sizes = std::move(sizes);
    return entry;
}

std::string only_code(const Diagnostics& diagnostics) {
    return diagnostics.all().size() == 1 ? diagnostics.all()[0].code : std::to_string(diagnostics.all().size());
}

} // namespace

TEST_CASE("Rolled sections are read however they are spaced", "[rolled]") {
    const auto text =
        GENERATE("S275 UB 203x133x25", "S275 UB203x133x25", "S275 ub 203X133X25", "S275  Ub 203 x 133 x 25");
    INFO(text);
    Diagnostics diagnostics;
    const auto member = read_member(text, {}, catalogue(), diagnostics);
    REQUIRE(member.has_value());
    CHECK(member_name(*member) == "S275 UB 203x133x25");
    CHECK(material_name(*member) == "rolled steel");
    CHECK(depth_of(*member) == 203.2);
    CHECK(mass_per_length(*member) == Approx(25.1).margin(0.05)); // kg/m, as it is named
    CHECK(diagnostics.all().empty());
}

TEST_CASE("Members of a rolled series stand in catalogue order, with the longest stock length", "[rolled]") {
    MembersEntry entry = entry_of({});
    entry.series = "UPE";
    entry.stock_lengths = {12000.0, 6000.0};
    Diagnostics diagnostics;
    const auto members = members_of(entry, catalogue(), diagnostics);
    CHECK(diagnostics.all().empty());
    REQUIRE(members.size() == 11);
    CHECK(member_name(members.front()) == "S275 UPE 80");
    CHECK(member_name(members.back()) == "S275 UPE 300");
    CHECK(stock_length_of(members.front()) == 12000.0);
    CHECK(std::get<RolledMember>(members.front()).section.shape == RolledShape::channel);
    CHECK(comparable(members[0], members[1]));
}

TEST_CASE("Listed rolled sections stand once, and a proposed one takes the brief's stock length", "[rolled]") {
    Brief brief;
    brief.members.push_back(entry_of({"IPE 200", "ipe200", "HEA 100"}));
    brief.members.back().stock_lengths = {9000.0};
    Diagnostics diagnostics;
    CHECK(members_of(brief.members.back(), catalogue(), diagnostics).size() == 2);
    CHECK(stock_length_of(read_member("S275 IPE200", brief, catalogue(), diagnostics).value()) == 9000.0);
    CHECK_FALSE(stock_length_of(read_member("S355 IPE200", brief, catalogue(), diagnostics).value()).has_value());
    CHECK(diagnostics.all().empty());
}

TEST_CASE("Wrong rolled members are refused with a hint", "[rolled]") {
    struct Row {
        const char* text;
        const char* code;
    };
    const auto row = GENERATE(Row{"S275 IPE 201", "unknown-section"}, Row{"S275 47x220", "unknown-section"},
                              Row{"S285 IPE 200", "unknown-class"}, Row{"C24 IPE 200", "bad-size"});
    INFO(row.text);
    Diagnostics diagnostics;
    CHECK_FALSE(read_member(row.text, {}, catalogue(), diagnostics).has_value());
    CHECK(only_code(diagnostics) == row.code);
}

TEST_CASE("A steel joist has no plies, and its series is one of rolled sections", "[rolled]") {
    MembersEntry entry = entry_of({"IPE 200"});
    entry.plies = 2;
    Diagnostics plies;
    CHECK_FALSE(members_of(entry, catalogue(), plies).empty());
    CHECK(only_code(plies) == "contradiction");

    entry = entry_of({});
    entry.series = "UK 47";
    Diagnostics series;
    CHECK(members_of(entry, catalogue(), series).empty());
    CHECK(only_code(series) == "unknown-series");
}

namespace {

constexpr const char* section_head = "series,section,shape,h_mm,b_mm,tw_mm,tf_mm,r_mm,source\n";

Catalogue with_practice_file(const std::string& text, bool grades, Diagnostics& diagnostics) {
    const TemporaryFolder folder;
    folder.write("own.csv", text);
    CatalogueFiles files;
    (grades ? files.classes : files.sections) = {"own.csv"};
    return load_catalogue(files, "recommended", folder.path(), diagnostics);
}

} // namespace

TEST_CASE("A practice adds its own rolled sections and grades, and overrides built-in ones", "[rolled]") {
    Diagnostics diagnostics;
    const Catalogue sections = with_practice_file(
        std::string(section_head) + "IPE,IPE 200,I,200,100,5.5,8.5,12,mill\nWELD,PF 250,channel,250,90,7,12,14,mill\n",
        false, diagnostics);
    CHECK(diagnostics.all().empty());
    CHECK(sections.rolled_sections.size() == 95);
    CHECK(find_rolled_section(sections, "ipe 200")->t_w == 5.5);
    CHECK(find_rolled_section(sections, "ipe 200")->provenance.practice_own);
    CHECK(find_rolled_section(sections, "PF250")->shape == RolledShape::channel);

    const Catalogue grades =
        with_practice_file("grade,standard,f_y_16_MPa,source\nS420,EN 10025-3,420,mill\n", true, diagnostics);
    CHECK(diagnostics.all().empty());
    CHECK(find_steel_grade(grades, "S420")->f_y_16 == 420.0);
    CHECK_FALSE(find_steel_grade(grades, "S420")->f_y_40.has_value());
    CHECK(grades.steel_grades.size() == 4);
}

TEST_CASE("Rolled sections and grades that cannot be are refused at their column", "[rolled]") {
    struct Row {
        const char* text;
        bool grades;
        const char* code;
    };
    const auto row =
        GENERATE(Row{"X,X 1,I,100,60,5,30,25,mill\n", false, "contradiction"}, // no web between the roots
                 Row{"X,X 1,I,100,45,8,6,19,mill\n", false, "contradiction"},  // no flange beside the roots
                 Row{"X,X 1,I,900,45,12,4,5,mill\n", false, "contradiction"},  // hardly a flange
                 Row{"X,X 1,T,100,60,5,6,7,mill\n", false, "bad-word"},        // no such shape
                 Row{"X,X 1,I,100,60,5,6,7,\n", false, "missing-source"},      //
                 Row{"X,X 1,I,10,60,5,1,1,mill\n", false, "out-of-range"},     // depth
                 Row{"S9,EN,275,300,mill\n", true, "contradiction"},           // thicker is not stronger
                 Row{"S 9,EN,275,265,mill\n", true, "bad-name"}, Row{"S9,EN,27,26,mill\n", true, "out-of-range"});
    INFO(row.text);
    Diagnostics diagnostics;
    const std::string head = row.grades ? "grade,standard,f_y_16_MPa,f_y_40_MPa,source\n" : section_head;
    const Catalogue catalogue = with_practice_file(head + row.text, row.grades, diagnostics);
    REQUIRE(diagnostics.has_errors());
    CHECK(diagnostics.all().front().code == row.code);
    CHECK(catalogue.rolled_sections.size() == 94);
    CHECK(catalogue.steel_grades.size() == 3);
}
