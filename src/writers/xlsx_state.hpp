// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/writers/xlsx_book.hpp"

#include <fmt/format.h>
#include <xlsxwriter.h>

#include <deque>
#include <string>
#include <string_view>
#include <vector>

// The library's side of a workbook, for the files that fill it.

namespace spanledger::xlsx {

struct BookState {
    std::string file;
    std::string folder;
    lxw_workbook* workbook = nullptr;
    std::deque<Sheet> sheets;
    std::vector<Style> styles;
    std::vector<lxw_format*> formats;
    WriteResult problem;

    BookState() = default;
    BookState(const BookState&) = delete;
    BookState& operator=(const BookState&) = delete;
    ~BookState() {
        if (workbook != nullptr) lxw_workbook_free(workbook);
    }

    /// Every return code of the library comes by here.
    void check(lxw_error code, std::string_view doing) {
        if (code != LXW_NO_ERROR) report(fmt::format("{}: {}", doing, lxw_strerror(code)));
    }

    void report(std::string reason) {
        if (!problem) problem = WriteError{file, std::move(reason)};
    }
};

} // namespace spanledger::xlsx
