// SPDX-License-Identifier: MIT
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
    entry.name = "joists";
    entry.material_class = "C24";
    entry.sizes = std::move(sizes);
    return entry;
}

std::vector<std::string> names_of(const std::vector<Member>& members) {
    std::vector<std::string> names;
    for (const Member& member : members) {
        names.push_back(member_name(member));
    }
    return names;
}

std::string only_code(const Diagnostics& diagnostics) {
    return diagnostics.all().size() == 1 ? diagnostics.all()[0].code : std::to_string(diagnostics.all().size());
}

} // namespace

TEST_CASE("Sizes are read however they are spaced") {
    const auto text = GENERATE("2/47x220", "2 / 47 x 220", " 2/47X220 ", "2/47×220", "2/47 × 220.0");
    const auto size = read_timber_size(text);
    REQUIRE(size.has_value());
    CHECK(size->plies == 2);
    CHECK(size->b == 47.0);
    CHECK(size->h == 220.0);
    CHECK(read_timber_size("44.5x220")->b == 44.5);
    CHECK(read_timber_size("44.5x220")->plies == 1);
}

TEST_CASE("What is no size is refused") {
    const auto text = GENERATE("", "47", "47x", "x220", "47*220", "47x220x3", "47xnan", "infx220", "47x-220", "0x220",
                               "47x0", "0/47x220", "1.5/47x220", "-2/47x220", "2/3/47x220", "/47x220", "1e9/47x220",
                               "47,5x220", "IPE 200", "47x220mm", "0x1Fx220");
    INFO(text);
    CHECK_FALSE(read_timber_size(text).has_value());
}

TEST_CASE("Names of a member") {
    TimberMember member{.timber_class = *find_timber_class(catalogue(), "GL24h"), .b = 44.5, .h = 220.0, .plies = 2};
    CHECK(section_name(member) == "2/44.5x220");
    CHECK(member_name(member) == "GL24h 2/44.5x220");
    CHECK(material_name(member) == "glulam");
    CHECK(depth_of(member) == 220.0);
    CHECK_FALSE(stock_length_of(member).has_value());
}

TEST_CASE("Members of a series stand in catalogue order, with the longest stock length") {
    MembersEntry entry;
    entry.material_class = "C16";
    entry.series = "UK 47";
    entry.stock_lengths = {4800.0, 6000.0, 5400.0};
    Diagnostics diagnostics;
    const auto members = members_of(entry, catalogue(), diagnostics);
    CHECK(diagnostics.all().empty());
    CHECK(names_of(members) == std::vector<std::string>{"C16 47x97", "C16 47x120", "C16 47x145", "C16 47x170",
                                                        "C16 47x195", "C16 47x220", "C16 47x245"});
    CHECK(stock_length_of(members.front()) == 6000.0);
    CHECK(std::get<TimberMember>(members.front()).size_provenance->source == "trade");
}

TEST_CASE("Listed sizes keep their order and stand once") {
    Diagnostics diagnostics;
    const auto members = members_of(entry_of({"47x220", "47x195", "47 X 220", "2/47x220"}), catalogue(), diagnostics);
    CHECK(diagnostics.all().empty());
    CHECK(names_of(members) == std::vector<std::string>{"C24 47x220", "C24 47x195", "C24 2/47x220"});
}

TEST_CASE("Plies may be stated by the entry or by the size, but not differently by both") {
    MembersEntry entry = entry_of({"47x220", "2/47x220"});
    entry.plies = 2;
    entry.plies_fixed_together = true;
    Diagnostics diagnostics;
    const auto members = members_of(entry, catalogue(), diagnostics);
    CHECK(diagnostics.all().empty());
    CHECK(names_of(members) == std::vector<std::string>{"C24 2/47x220"});
    CHECK(std::get<TimberMember>(members[0]).plies_fixed_together);

    entry.sizes = {"3/47x220"};
    CHECK(members_of(entry, catalogue(), diagnostics).empty());
    CHECK(only_code(diagnostics) == "contradiction");
}

TEST_CASE("Unknown names and impossible sizes are refused with a hint") {
    MembersEntry entry = entry_of({"47x220"});
    entry.material_class = "C42";
    Diagnostics unknown_class;
    CHECK(members_of(entry, catalogue(), unknown_class).empty());
    CHECK(only_code(unknown_class) == "unknown-class");
    CHECK(unknown_class.all()[0].hint.find("did you mean 'C24'?") == 0);

    entry = entry_of({});
    entry.series = "UK47";
    Diagnostics unknown_series;
    CHECK(members_of(entry, catalogue(), unknown_series).empty());
    CHECK(only_code(unknown_series) == "unknown-series");
    CHECK(unknown_series.all()[0].hint == "did you mean 'UK 47'?");

    const std::string wrong = GENERATE("9x220", "1001x1200", "47x19", "47x3001", "11/47x220");
    Diagnostics size;
    CHECK(members_of(entry_of({wrong}), catalogue(), size).empty());
    CHECK(only_code(size) == "out-of-range");
}

TEST_CASE("All problems of an entry are reported together") {
    MembersEntry entry = entry_of({"47", "48", "47x220"});
    entry.material_class = "X99";
    Diagnostics diagnostics;
    CHECK(members_of(entry, catalogue(), diagnostics).empty());
    CHECK(diagnostics.all().size() == 3);
}

TEST_CASE("A proposed member takes the stock lengths of the brief's") {
    Brief brief;
    brief.members.push_back(entry_of({"47x195", "47x220"}));
    brief.members.back().stock_lengths = {6000.0};
    Diagnostics diagnostics;
    const auto known = read_member("C24 47 x 220", brief, catalogue(), diagnostics);
    REQUIRE(known.has_value());
    CHECK(stock_length_of(*known) == 6000.0);
    const auto other_size = read_member("C24 47x245", brief, catalogue(), diagnostics);
    REQUIRE(other_size.has_value());
    CHECK_FALSE(stock_length_of(*other_size).has_value());
    CHECK(std::get<TimberMember>(*other_size).size_provenance.has_value());
    const auto other_class = read_member("C16 47x220", brief, catalogue(), diagnostics);
    CHECK_FALSE(stock_length_of(other_class.value()).has_value());
    const auto not_listed = read_member("LVL48P 2/43x301", brief, catalogue(), diagnostics);
    CHECK(member_name(not_listed.value()) == "LVL48P 2/43x301");
    CHECK_FALSE(std::get<TimberMember>(*not_listed).size_provenance.has_value());
    CHECK(diagnostics.all().empty());
}

TEST_CASE("A wrong proposed member is refused") {
    struct Row {
        const char* text;
        const char* code;
    };
    const auto row =
        GENERATE(Row{"", "bad-member"}, Row{"C24", "bad-member"}, Row{"47x220", "bad-member"}, Row{"C24 ", "bad-size"},
                 Row{"C24 47", "bad-size"}, Row{"c24 47x220", "unknown-class"}, Row{"C24 9x220", "out-of-range"});
    INFO(row.text);
    Diagnostics diagnostics;
    CHECK_FALSE(read_member(row.text, {}, catalogue(), diagnostics).has_value());
    CHECK(only_code(diagnostics) == row.code);
    CHECK(diagnostics.all()[0].place.file == "--member");
}
