// SPDX-License-Identifier: MIT
#include "spanledger/writers/safe_file.hpp"

#include "writers/size_limit.hpp"
#include "writers/working_folder.hpp"

#include <catch2/catch.hpp>

#include <algorithm>

using namespace spanledger;
using sample::bytes_of;
using sample::WorkingFolder;

TEST_CASE("A file is written beside and then put in place", "[writers][safe_file]") {
    const WorkingFolder folder;
    const std::string target = folder.file("result.txt");
    {
        TemporaryFile file(target);
        REQUIRE_FALSE(file.problem());
        REQUIRE_FALSE(file.write("first "));
        REQUIRE_FALSE(file.write("second"));
        CHECK_FALSE(std::filesystem::exists(target));
        CHECK(std::filesystem::path(file.path()).parent_path() == folder.path());
        REQUIRE_FALSE(file.settle());
        REQUIRE_FALSE(file.place());
    }
    CHECK(bytes_of(target) == "first second");
    CHECK(folder.names() == std::vector<std::string>{"result.txt"});
}

TEST_CASE("A file that was not put in place leaves nothing and touches nothing", "[writers][safe_file]") {
    const WorkingFolder folder;
    const std::string target = folder.file("result.txt");
    REQUIRE_FALSE(write_file(target, "old"));
    {
        TemporaryFile file(target);
        REQUIRE_FALSE(file.write("new"));
    }
    CHECK(bytes_of(target) == "old");
    CHECK(folder.names().size() == 1);
}

TEST_CASE("An existing file is replaced as a whole", "[writers][safe_file]") {
    const WorkingFolder folder;
    const std::string target = folder.file("result.txt");
    REQUIRE_FALSE(write_file(target, "a long old text"));
    REQUIRE_FALSE(write_file(target, "new"));
    CHECK(bytes_of(target) == "new");
}

TEST_CASE("A file has the rights that any new file gets", "[writers][safe_file]") {
    const WorkingFolder folder;
    REQUIRE_FALSE(write_file(folder.file("result.txt"), "x"));
    { std::ofstream(folder.file("plain.txt")) << "x"; }
    CHECK(std::filesystem::status(folder.file("result.txt")).permissions() ==
          std::filesystem::status(folder.file("plain.txt")).permissions());
}

TEST_CASE("A folder that is missing is found when the file is begun", "[writers][safe_file]") {
    const WorkingFolder folder;
    const auto error = write_file(folder.file("missing/result.txt"), "x");
    REQUIRE(error);
    CHECK(error->path == folder.file("missing/result.txt"));
    CHECK_FALSE(error->reason.empty());
}

TEST_CASE("A full disk is reported; the old file stays and nothing else does", "[writers][safe_file]") {
    const WorkingFolder folder;
    const std::string target = folder.file("result.txt");
    REQUIRE_FALSE(write_file(target, "old"));
    const int reported = sample::within_file_size(1000, [&] {
        const auto error = write_file(target, std::string(5000, 'x'));
        return error && error->path == target && !error->reason.empty() ? 1 : 0;
    });
    CHECK(reported == 1);
    CHECK(bytes_of(target) == "old");
    CHECK(folder.names().size() == 1);
}

TEST_CASE("A folder is made where it is missing, and tried", "[writers][safe_file]") {
    const WorkingFolder folder;
    CHECK_FALSE(prepare_folder(folder.file("new/deeper")));
    CHECK(std::filesystem::is_directory(folder.file("new/deeper")));
    CHECK(std::filesystem::is_empty(folder.file("new/deeper")));
    CHECK_FALSE(prepare_folder(folder.path()));
}

TEST_CASE("A folder that cannot be is named, with the reason", "[writers][safe_file]") {
    const WorkingFolder folder;
    REQUIRE_FALSE(write_file(folder.file("a file"), "x"));
    for (const std::string& path : {folder.file("a file"), folder.file("a file/below"), std::string("/proc/none")}) {
        INFO(path);
        const auto error = prepare_folder(path);
        REQUIRE(error);
        CHECK(error->path == path);
        CHECK_FALSE(error->reason.empty());
    }
}
