// SPDX-License-Identifier: MIT
#include "spanledger/writers/sheet_names.hpp"

#include <catch2/catch.hpp>

using spanledger::SheetNames;

TEST_CASE("A good sheet name stays as it is", "[writers][sheet_names]") {
    SheetNames names;
    CHECK(names.unique("1 Floor joists, C24, 47 mm") == "1 Floor joists, C24, 47 mm");
}

TEST_CASE("Sheet names lose what spreadsheets refuse", "[writers][sheet_names]") {
    struct Case {
        const char* wanted;
        const char* given;
    };
    for (const Case& one : {Case{"a[b]c:d*e?f/g\\h", "a b c d e f g h"}, Case{"'quoted'", "quoted"}, Case{"", "Sheet"},
                            Case{" \t\n", "Sheet"}, Case{"History", "Sheet"}, Case{"it's", "it's"},
                            Case{"0123456789012345678901234567890 beyond", "0123456789012345678901234567890"}}) {
        INFO(one.wanted);
        SheetNames names;
        CHECK(names.unique(one.wanted) == one.given);
    }
}

TEST_CASE("Sheet names are cut between characters, and count as UTF-16 does", "[writers][sheet_names]") {
    SheetNames names;
    std::string umlauts;
    for (int i = 0; i < 40; ++i) umlauts += "ä";
    CHECK(names.unique(umlauts) == umlauts.substr(0, 2 * 31));
    std::string faces;
    for (int i = 0; i < 40; ++i) faces += "😀";
    CHECK(names.unique(faces) == faces.substr(0, 4 * 15));
}

TEST_CASE("Sheet names are unique where case does not count", "[writers][sheet_names]") {
    SheetNames names;
    CHECK(names.unique("Joists") == "Joists");
    CHECK(names.unique("JOISTS") == "JOISTS (2)");
    CHECK(names.unique("joists") == "joists (3)");
    CHECK(names.unique("Träger") == "Träger");
    CHECK(names.unique("TRÄGER") == "TRÄGER (2)");
    CHECK(names.unique("γ") == "γ");
    CHECK(names.unique("Γ") == "Γ (2)");
    CHECK(names.unique("0123456789012345678901234567890") == "0123456789012345678901234567890");
    CHECK(names.unique("0123456789012345678901234567890") == "012345678901234567890123456 (2)");
}
