// SPDX-License-Identifier: MIT
#include "program/subprocess.hpp"

#include <catch2/catch.hpp>

#include <locale>

namespace spanledger {
namespace {

/// Numbers as 1.234,5.
class CommaNumbers : public std::numpunct<char> {
protected:
    char do_decimal_point() const override { return ','; }
    char do_thousands_sep() const override { return '.'; }
    std::string do_grouping() const override { return "\3"; }
};

class GlobalLocale {
public:
    explicit GlobalLocale(const std::locale& chosen) : before_(std::locale::global(chosen)) {}
    ~GlobalLocale() { std::locale::global(before_); }
    GlobalLocale(const GlobalLocale&) = delete;
    GlobalLocale& operator=(const GlobalLocale&) = delete;

private:
    std::locale before_;
};

/// Makes a locale with decimal commas in `folder`.
void make_comma_locale(const std::string& folder) {
    std::filesystem::create_directories(folder);
    const Outcome made = run_other("localedef", {"-i", "de_DE", "-f", "UTF-8", folder + "/de_DE.UTF-8"});
    INFO(made.err);
    REQUIRE(std::filesystem::exists(folder + "/de_DE.UTF-8/LC_NUMERIC"));
}

TEST_CASE("the same bytes in any locale, time zone and temporary folder", "[program]") {
    const StartedFolder folder;
    const std::string locales = folder.path() + "/locales";
    const std::string temporary = folder.path() + "/temporary";
    make_comma_locale(locales);
    std::filesystem::create_directory(temporary);
    REQUIRE(run_inside(folder.tables()).status == 0);
    const auto issued = files_below(folder.out());
    const std::vector<std::vector<std::pair<std::string, std::string>>> environments{
        {},
        {{"LOCPATH", locales}, {"LC_ALL", "de_DE.UTF-8"}},
        {{"TZ", "Pacific/Kiritimati"}},
        {{"TZ", "America/St_Johns"}},
        {{"TMPDIR", temporary}},
        {{"SOURCE_DATE_EPOCH", "1000000000"}}, // the brief states its date
    };
    for (const auto& environment : environments) {
        INFO((environment.empty() ? std::string("plain") : environment.back().first));
        const Outcome outcome = run_apart({.arguments = folder.replacing_tables(), .environment = environment});
        REQUIRE(outcome.status == 0);
        CHECK(files_below(folder.out()) == issued);
    }
}

TEST_CASE("the same text of a check in any locale", "[program]") {
    const StartedFolder folder;
    const std::string locales = folder.path() + "/locales";
    make_comma_locale(locales);
    for (const Arguments& arguments : {folder.check("4.2 m"), with(folder.check("4.2 m"), "--json"), {"catalogue"}}) {
        const Outcome plain = run_apart({.arguments = arguments});
        const Outcome comma =
            run_apart({.arguments = arguments, .environment = {{"LOCPATH", locales}, {"LC_ALL", "de_DE.UTF-8"}}});
        CHECK(plain.status == 0);
        CHECK(comma.out == plain.out);
        CHECK(comma.err == plain.err);
    }
}

TEST_CASE("the same bytes where the process around the library writes decimal commas", "[program]") {
    const StartedFolder folder;
    REQUIRE(run_inside(folder.tables()).status == 0);
    const auto issued = files_below(folder.out());
    const Outcome plain = run_inside(folder.check("4.2 m"));
    const GlobalLocale commas(std::locale(std::locale(), new CommaNumbers));
    std::ostringstream judge;
    judge << 1234.5;
    REQUIRE(judge.str() == "1.234,5");
    CHECK(run_inside(folder.replacing_tables()).status == 0);
    CHECK(files_below(folder.out()) == issued);
    CHECK(run_inside(folder.check("4.2 m")).out == plain.out);
}

TEST_CASE("without a date in the brief SOURCE_DATE_EPOCH gives it, and the clock is never read", "[program]") {
    const StartedFolder folder;
    std::string brief = file_text(folder.brief());
    brief.erase(brief.find("\ndate = "), brief.find('\n', brief.find("\ndate = ") + 1) - brief.find("\ndate = "));
    std::ofstream(folder.brief()) << brief;
    const Outcome dated =
        run_apart({.arguments = folder.tables(), .environment = {{"SOURCE_DATE_EPOCH", "1769817600"}}}); // 2026-01-31
    CHECK(dated.status == 0);
    CHECK(file_text(folder.out() + "/EX-101-A.json").find("2026-01-31") != std::string::npos);
}

} // namespace
} // namespace spanledger
