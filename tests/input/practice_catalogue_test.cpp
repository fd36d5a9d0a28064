// SPDX-License-Identifier: MIT
#include "input/temporary_folder.hpp"
#include "spanledger/catalogue.hpp"

#include <catch2/catch.hpp>

#include <algorithm>
#include <chrono>
#include <filesystem>

using namespace spanledger;

namespace {

const std::string class_head = "class,standard,timber,f_m_k_MPa,f_v_k_MPa,f_c_90_k_MPa,E_0_mean_MPa,E_0_05_MPa,"
                               "G_mean_MPa,rho_k_kg_m3,rho_mean_kg_m3,size_exponent,source\n";
const std::string good_class = "OwnC,own tests,solid softwood,20,3.5,2.4,9500,6400,590,330,400,,report 12\n";
const std::string series_head = "series,region,b_mm,h_mm,source,seen\n";

struct Loaded {
    Catalogue catalogue;
    Diagnostics diagnostics;
};

Loaded load_classes(const std::string& text) {
    const TemporaryFolder folder;
    folder.write("classes.csv", text);
    Loaded loaded;
    loaded.catalogue = load_catalogue({{"classes.csv"}, {}, {}, {}}, "recommended", folder.path(), loaded.diagnostics);
    return loaded;
}

std::string codes_of(const Diagnostics& diagnostics) {
    std::string codes;
    for (const Diagnostic& diagnostic : diagnostics.all()) {
        codes += (codes.empty() ? "" : " ") + diagnostic.code;
    }
    return codes;
}

} // namespace

TEST_CASE("A practice's class is added and shown as its own") {
    const Loaded loaded = load_classes(class_head + good_class);
    CHECK(codes_of(loaded.diagnostics).empty());
    const TimberClass* own = find_timber_class(loaded.catalogue, "OwnC");
    REQUIRE(own != nullptr);
    CHECK(own->f_m_k == 20.0);
    CHECK(own->provenance.practice_own);
    CHECK(own->provenance.source == "report 12");
    CHECK_FALSE(own->provenance.seen);
    CHECK(own->provenance.line == 2);
    CHECK(own->provenance.file.find("classes.csv") != std::string::npos);
    CHECK_FALSE(own->f_t_0_k.has_value());
}

TEST_CASE("A practice's class takes the place of the built-in one of its name") {
    const Loaded loaded =
        load_classes(class_head + "C24,own tests,solid softwood,23,3.5,2.4,9500,6400,590,330,400,,report 12\n");
    CHECK(codes_of(loaded.diagnostics).empty());
    CHECK(find_timber_class(loaded.catalogue, "C24")->f_m_k == 23.0);
    CHECK(loaded.catalogue.timber_classes.size() == 39);
    CHECK(loaded.catalogue.timber_classes[5].name == "C24");
}

TEST_CASE("Wrong class rows are refused or warned of, each with its code, and left out if refused") {
    struct Row {
        const char* text;
        const char* codes;
    };
    const auto row = GENERATE(Row{"X,own,solid softwood,20,3.5,2.4,9500,6400,590,330,400,,\n", "missing-source"},
                              Row{"X,own,softwood,20,3.5,2.4,9500,6400,590,330,400,,r\n", "bad-word"},
                              Row{"X,,solid softwood,20,3.5,2.4,9500,6400,590,330,400,,r\n", "empty-field"},
                              Row{",own,solid softwood,20,3.5,2.4,9500,6400,590,330,400,,r\n", "empty-field"},
                              Row{"X,own,solid softwood,nan,3.5,2.4,9500,6400,590,330,400,,r\n", "bad-number"},
                              Row{"X,own,solid softwood,20,3.5,2.4,inf,6400,590,330,400,,r\n", "bad-number"},
                              Row{"X,own,solid softwood,20,3.5,2.4,9500,0x1900,590,330,400,,r\n", "bad-number"},
                              Row{"X,own,solid softwood,20,3.5 MPa,2.4,9500,6400,590,330,400,,r\n", "bad-number"},
                              Row{"X,own,solid softwood,,3.5,2.4,9500,6400,590,330,400,,r\n", "empty-field"},
                              Row{"X,own,solid softwood,-20,3.5,2.4,9500,6400,590,330,400,,r\n", "out-of-range"},
                              Row{"X,own,solid softwood,20,3.5,2.4,9.5,6400,590,330,400,,r\n", "out-of-range"},
                              Row{"X,own,solid softwood,20,3.5,2.4,6400,9500,590,330,400,,r\n", "contradiction"},
                              Row{"X,own,solid softwood,20,3.5,2.4,9500,6400,590,400,330,,r\n", "contradiction"},
                              Row{"X,own,LVL,44,4.2,6,13800,11600,600,480,510,,r\n", "empty-field"},
                              Row{"X,own,glulam,24,3.5,2.5,11500,9600,650,385,420,0.1,r\n", "contradiction"},
                              Row{"X Y,own,solid softwood,20,3.5,2.4,9500,6400,590,330,400,,r\n", "bad-name"},
                              Row{"X,own,solid softwood,20,3.5,2.4,9500,6400,590,330\n", "short-row"},
                              Row{"X,own,solid softwood,20,3.5,2.4,9500,6400,590,330,400,,r,extra\n", "long-row"});
    INFO(row.text);
    const Loaded loaded = load_classes(class_head + row.text);
    CHECK(codes_of(loaded.diagnostics) == row.codes);
    CHECK(loaded.diagnostics.has_errors());
    CHECK(loaded.catalogue.timber_classes.size() == 39);
}

TEST_CASE("Unusual values and names that a spreadsheet changed are warned of") {
    const Loaded unusual = load_classes(class_head + "X,own,solid softwood,5,3.5,2.4,9500,6400,590,330,400,,r\n");
    CHECK(codes_of(unusual.diagnostics) == "unusual");
    CHECK(find_timber_class(unusual.catalogue, "X") != nullptr);
    const std::string name = GENERATE(as<std::string>(), "03-Dec", "2.00E+04");
    const Loaded spoiled =
        load_classes(class_head + name + ",own,solid softwood,20,3.5,2.4,9500,6400,590,330,400,,r\n");
    CHECK(codes_of(spoiled.diagnostics) == "spoiled-name");
    CHECK_FALSE(spoiled.diagnostics.has_errors());
}

TEST_CASE("A class that stands twice is refused naming both places") {
    const Loaded loaded = load_classes(class_head + good_class + good_class);
    REQUIRE(codes_of(loaded.diagnostics) == "duplicate-row");
    CHECK(loaded.diagnostics.all()[0].place.line == 3);
    CHECK(loaded.diagnostics.all()[0].hint.find("classes.csv:2") != std::string::npos);
}

TEST_CASE("A mistyped column is refused with a suggestion") {
    const Loaded loaded = load_classes("class,standard,timber,f_m_k,source\n");
    CHECK(loaded.diagnostics.all().at(0).code == "unknown-column");
    CHECK(loaded.diagnostics.all().at(0).hint == "did you mean 'f_m_k_MPa'?");
}

TEST_CASE("Semicolons, decimal commas and a byte order mark read like the plain file") {
    std::string text = class_head + good_class;
    std::replace(text.begin(), text.end(), ',', ';');
    std::replace(text.begin(), text.end(), '.', ',');
    const Loaded loaded = load_classes("\xEF\xBB\xBF" + text);
    CHECK(codes_of(loaded.diagnostics).empty());
    CHECK(find_timber_class(loaded.catalogue, "OwnC")->f_v_k == 3.5);
}

TEST_CASE("A practice's sizes add to a series and make new ones, from either key of the brief") {
    const TemporaryFolder folder;
    folder.write("sizes.csv", series_head + "UK 47,UK,47,270,merchant,seen\nYard,,50,200,merchant,\n");
    folder.write("more.csv", series_head + "UK 47,UK,47,220,uk-na-en1990,seen\n");
    Diagnostics diagnostics;
    const Catalogue catalogue = load_catalogue({{}, {"sizes.csv"}, {"more.csv"}, {}}, "uk", folder.path(), diagnostics);
    CHECK(codes_of(diagnostics).empty());
    std::vector<double> depths;
    for (const TimberSize& row : catalogue.timber_sizes) {
        if (row.series == "UK 47") {
            depths.push_back(row.h);
        }
    }
    CHECK(depths == std::vector<double>{97, 120, 145, 170, 195, 220, 245, 270});
    CHECK(catalogue.timber_sizes.back().series == "Yard");
    CHECK(catalogue.timber_sizes[5].provenance.practice_own);
    CHECK(catalogue.timber_sizes[5].provenance.seen);
}

TEST_CASE("A size twice in two of a practice's files is refused naming both") {
    const TemporaryFolder folder;
    folder.write("a.csv", series_head + "Yard,,50,200,merchant,\n");
    folder.write("b.csv", series_head + "Yard,,50,200.0,merchant,\n");
    Diagnostics diagnostics;
    (void)load_catalogue({{}, {"a.csv", "b.csv"}, {}, {}}, "uk", folder.path(), diagnostics);
    REQUIRE(codes_of(diagnostics) == "duplicate-row");
    CHECK(diagnostics.all()[0].hint.find("a.csv:2") != std::string::npos);
}

TEST_CASE("A practice's load categories add and override, by set where they name one") {
    const TemporaryFolder folder;
    folder.write("loads.csv", "parameters,category,use,roof,duration,psi0,psi1,psi2,q_k_kN_m2,source\n"
                              ",A,own floors,no,medium,0.7,0.5,0.4,1.75,office manual\n"
                              "recommended,H,own roofs,yes,short,0.1,0,0,,office manual\n"
                              ",Plant,plant rooms,no,long,1,0.9,0.8,7.5,client\n");
    Diagnostics diagnostics;
    const Catalogue catalogue = load_catalogue({{}, {}, {}, {"loads.csv"}}, "uk", folder.path(), diagnostics);
    CHECK(codes_of(diagnostics).empty());
    CHECK(find_load_category(catalogue, "A")->psi.psi2 == 0.4);
    CHECK(find_load_category(catalogue, "A")->provenance.practice_own);
    CHECK(find_load_category(catalogue, "H")->psi.psi0 == 0.7);
    CHECK(find_load_category(catalogue, "Plant")->duration == Duration::long_term);
}

TEST_CASE("Wrong load categories are refused") {
    struct Row {
        const char* text;
        const char* code;
    };
    const auto row = GENERATE(
        Row{",P,plant,no,long,1.1,0.9,0.8,r\n", "out-of-range"}, Row{",P,plant,no,long,1,0.5,0.8,r\n", "contradiction"},
        Row{",P,plant,no,longish,1,0.9,0.8,r\n", "bad-word"}, Row{",P,plant,perhaps,long,1,0.9,0.8,r\n", "bad-word"},
        Row{"u k,P,plant,no,long,1,0.9,0.8,r\n", "unknown-parameters"},
        Row{",P,plant,no,long,1,0.9,0.8,\n", "missing-source"});
    INFO(row.text);
    const TemporaryFolder folder;
    folder.write("loads.csv", std::string("parameters,category,use,roof,duration,psi0,psi1,psi2,source\n") + row.text);
    Diagnostics diagnostics;
    const Catalogue catalogue = load_catalogue({{}, {}, {}, {"loads.csv"}}, "uk", folder.path(), diagnostics);
    CHECK(codes_of(diagnostics) == row.code);
    CHECK(find_load_category(catalogue, "P") == nullptr);
}

TEST_CASE("A missing file and one that is too large are refused by name") {
    const TemporaryFolder folder;
    folder.write("large.csv", "class");
    std::filesystem::resize_file(folder.path() + "/large.csv", (std::uintmax_t{65} << 20));
    Diagnostics diagnostics;
    (void)load_catalogue({{"large.csv", "missing.csv"}, {}, {}, {}}, "uk", folder.path(), diagnostics);
    REQUIRE(codes_of(diagnostics) == "file-too-large unreadable-file");
    CHECK(diagnostics.all()[0].message.find("65.0 MiB") != std::string::npos);
    CHECK(diagnostics.all()[1].place.file.find("missing.csv") != std::string::npos);
}

TEST_CASE("A catalogue of 10,000 rows is read in under a second") {
    std::string text = class_head;
    for (int i = 0; i < 10000; ++i) {
        text += "Own" + std::to_string(i) + ",own tests,solid softwood,20,3.5,2.4,9500,6400,590,330,400,,report 12\n";
    }
    const auto start = std::chrono::steady_clock::now();
    const Loaded loaded = load_classes(text);
    const std::chrono::duration<double> taken = std::chrono::steady_clock::now() - start;
    CHECK(codes_of(loaded.diagnostics).empty());
    CHECK(loaded.catalogue.timber_classes.size() == 10039);
#ifdef NDEBUG
    CHECK(taken.count() < 1.0);
#else
    CHECK(taken.count() < 20.0);
#endif
}
