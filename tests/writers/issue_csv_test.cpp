// SPDX-License-Identifier: MIT
#include "spanledger/writers/issue_csv.hpp"

#include "writers/sample_issue.hpp"

#include <catch2/catch.hpp>

using namespace spanledger;

namespace {

std::string line_of(const Cell& cell) {
    Issue issue;
    TableResult table;
    table.name = "T";
    table.material = "solid timber";
    table.rows = {{"C24", "47x220", 220.0, {}}};
    table.columns = {{"Dwelling", 400.0, {}}};
    table.cells = {cell};
    issue.tables = {table};
    const std::string text = issue_csv(issue);
    return text.substr(text.find("\r\n") + 2);
}

} // namespace

TEST_CASE("CSV fields are quoted as RFC 4180 says", "[writers][csv]") {
    CHECK(csv_field("plain words") == "plain words");
    CHECK(csv_field("a,b") == "\"a,b\"");
    CHECK(csv_field("say \"so\"") == "\"say \"\"so\"\"\"");
    CHECK(csv_field("two\nlines") == "\"two\nlines\"");
    CHECK(csv_field("") == "");
}

TEST_CASE("Text like a formula is neutralised", "[writers][csv]") {
    CHECK(csv_field("=1+1") == "'=1+1");
    CHECK(csv_field("+1") == "'+1");
    CHECK(csv_field("-1") == "'-1");
    CHECK(csv_field("@a,b") == "\"'@a,b\"");
    CHECK(csv_field("\t=1") == "'\t=1");
    CHECK(csv_field("– not a minus") == "– not a minus");
}

TEST_CASE("A line holds the span, what governs, and each limit's own span rounded down", "[writers][csv]") {
    Cell cell;
    cell.value = 4210.0;
    cell.utilisation = 0.99812;
    cell.governing = Limit::bending;
    cell.next = Limit::final_deflection;
    cell.limits[index_of(Limit::bending)] = {LimitOutcome::Kind::spans, 4213.9999};
    cell.limits[index_of(Limit::shear)] = {LimitOutcome::Kind::never_reached, 0.0};
    cell.limits[index_of(Limit::final_deflection)] = {LimitOutcome::Kind::spans, 4299.99999999};
    CHECK(line_of(cell) ==
          "T,permissible span,solid timber,C24,47x220,400,Dwelling,4.21,,0.9982,bending,final deflection,,"
          "4.213,,,,,,,4.300,,,,\r\n");
}

TEST_CASE("A cell without a span gives the reason", "[writers][csv]") {
    CHECK(line_of(sample::without_span("no span, \"class 4\"")) ==
          "T,permissible span,solid timber,C24,47x220,400,Dwelling,,,,bending,,\"no span, \"\"class "
          "4\"\"\",0.000,,,,,,,,,,,\r\n");
}

TEST_CASE("Spans have as many decimals as their step needs", "[writers][csv]") {
    struct Case {
        double step;
        double value;
        const char* shown;
    };
    for (const Case& one :
         {Case{10.0, 4210.0, ",4.21,"}, Case{100.0, 4200.0, ",4.20,"}, Case{5.0, 4215.0, ",4.215,"},
          Case{25.0, 4225.0, ",4.225,"}, Case{12.5, 4212.5, ",4.2125,"}, Case{1.0, 4211.0, ",4.211,"}}) {
        Issue issue = sample::issue();
        issue.brief.search.step = one.step;
        issue.tables.resize(1);
        issue.tables.front().cells.front().value = one.value;
        CHECK(issue_csv(issue).find(one.shown) != std::string::npos);
    }
}
