// SPDX-License-Identifier: MIT
#include "input/temporary_folder.hpp"
#include "spanledger/catalogue.hpp"

#include <catch2/catch.hpp>

#include <algorithm>

using namespace spanledger;

namespace {

struct Loaded {
    Catalogue catalogue;
    Diagnostics diagnostics;
};

Loaded load_parameters(const std::string& text) {
    const TemporaryFolder folder;
    folder.write("own.toml", text);
    Loaded loaded;
    loaded.catalogue = load_catalogue({}, "own.toml", folder.path(), loaded.diagnostics);
    return loaded;
}

std::string codes_of(const Diagnostics& diagnostics) {
    std::string codes;
    for (const Diagnostic& diagnostic : diagnostics.all()) {
        codes += (codes.empty() ? "" : " ") + diagnostic.code;
    }
    return codes;
}

const Parameter& find(const Catalogue& catalogue, const std::string& key) {
    const auto& rows = catalogue.parameters;
    return *std::find_if(rows.begin(), rows.end(), [&](const Parameter& row) { return row.key == key; });
}

} // namespace

TEST_CASE("A practice's parameters stand over the set they start from, marked as its own") {
    const Loaded loaded = load_parameters("starts_from = \"uk\"\nsource = \"office manual 3\"\n\n[values]\n"
                                          "k_cr_solid = 1.0\nk_sys_max_spacing = 600\n");
    CHECK(codes_of(loaded.diagnostics).empty());
    CHECK(loaded.catalogue.parameter_set == "own.toml");
    const Parameter& k_cr = find(loaded.catalogue, "k_cr_solid");
    CHECK(k_cr.value == 1.0);
    CHECK(k_cr.recommended == 0.67);
    CHECK(k_cr.set == "own.toml");
    CHECK(k_cr.provenance.practice_own);
    CHECK(k_cr.provenance.source == "office manual 3");
    CHECK(k_cr.provenance.line == 5);
    CHECK(parameter(loaded.catalogue, "xi") == 0.925);
    CHECK(find(loaded.catalogue, "xi").set == "uk");
    CHECK(find_load_category(loaded.catalogue, "H")->psi.psi0 == 0.7);
}

TEST_CASE("Wrong parameter files are refused") {
    struct Row {
        const char* text;
        const char* code;
        const char* hint;
    };
    const auto row =
        GENERATE(Row{"[values]\nxi = 0.9\n", "missing-key", "starts_from"},
                 Row{"starts_from = \"ukk\"\n", "unknown-parameters", "did you mean 'uk'?"},
                 Row{"starts_from = 3\n", "unknown-parameters", "uk"},
                 Row{"starts_from = \"uk\"\n[values]\ngama_G = 1.35\n", "unknown-key", "did you mean 'gamma_G'?"},
                 Row{"starts_from = \"uk\"\ngamma_G = 1.35\n", "unknown-key", "[values]"},
                 Row{"starts_from = \"uk\"\n[value]\n", "unknown-key", "did you mean 'values'?"},
                 Row{"starts_from = \"uk\"\nvalues = 3\n", "wrong-kind", "[values]"},
                 Row{"starts_from = \"uk\"\nsource = \"\"\n", "wrong-kind", "quotes"},
                 Row{"starts_from = \"uk\"\n[values]\ngamma_G = 0.9\n", "out-of-range", "recommends 1.35"},
                 Row{"starts_from = \"uk\"\n[values]\ngamma_G = nan\n", "bad-number", "number"},
                 Row{"starts_from = \"uk\"\n[values]\ngamma_G = 0x1\n", "bad-number", "number"},
                 Row{"starts_from = \"uk\"\n[values]\nk_sys_max_spacing = \"600 mm\"\n", "bad-number", "in mm"});
    INFO(row.text);
    const Loaded loaded = load_parameters(row.text);
    REQUIRE(codes_of(loaded.diagnostics) == row.code);
    CHECK(loaded.diagnostics.all()[0].hint.find(row.hint) != std::string::npos);
    CHECK(parameter(loaded.catalogue, "gamma_G") == 1.35);
}

TEST_CASE("An unknown set and a missing parameter file are refused") {
    Diagnostics diagnostics;
    (void)load_catalogue({}, "recomended", "", diagnostics);
    CHECK(codes_of(diagnostics) == "unknown-parameters");
    CHECK(diagnostics.all()[0].hint.find("did you mean 'recommended'?") == 0);
    Diagnostics missing;
    (void)load_catalogue({}, "no-such-file.toml", "", missing);
    CHECK(codes_of(missing) == "unreadable-file");
}
