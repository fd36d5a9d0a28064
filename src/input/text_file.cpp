// SPDX-License-Identifier: MIT
#include "spanledger/input/text_file.hpp"

#include "spanledger/input/utf8.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cerrno>
#include <cstring>
#include <filesystem>
#include <fstream>
#include <iostream>

namespace spanledger {

namespace {

void refuse_size(const std::string& file, std::uintmax_t bytes, Diagnostics& diagnostics) {
    constexpr double mebibyte = 1024.0 * 1024.0;
    diagnostics.error("file-too-large", Place{.file = file},
                      fmt::format("the file has {}{:.1f} MiB; at most 64 MiB are read",
                                  bytes > largest_text_file + 1 ? "" : "more than ",
                                  static_cast<double>(bytes) / mebibyte),
                      "check that this is the file you mean");
}

/// Reads up to one byte more than is accepted, so that a stream without end is refused too.
std::optional<std::string> read_stream(std::istream& in, const std::string& file, Diagnostics& diagnostics) {
    std::string text;
    std::array<char, 65536> buffer{};
    while (text.size() <= largest_text_file && (in.read(buffer.data(), buffer.size()) || in.gcount() > 0)) {
        text.append(buffer.data(), static_cast<std::size_t>(in.gcount()));
    }
    if (text.size() > largest_text_file) {
        refuse_size(file, largest_text_file, diagnostics);
        return std::nullopt;
    }
    if (in.bad()) {
        diagnostics.error("unreadable-file", Place{.file = file}, "the file could not be read to its end",
                          "check the disk or the pipe it comes from");
        return std::nullopt;
    }
    return text;
}

std::optional<std::string> read_named_file(const std::string& file, Diagnostics& diagnostics) {
    namespace fs = std::filesystem;
    std::error_code error;
    const fs::file_status status = fs::status(file, error);
    if (fs::is_directory(status)) {
        diagnostics.error("unreadable-file", Place{.file = file}, "this is a folder, not a file",
                          "name the file in the folder");
        return std::nullopt;
    }
    if (fs::is_regular_file(status)) {
        if (const std::uintmax_t bytes = fs::file_size(file, error); !error && bytes > largest_text_file) {
            refuse_size(file, bytes, diagnostics);
            return std::nullopt;
        }
    }
    errno = 0;
    std::ifstream in(file, std::ios::binary);
    if (!in) {
        diagnostics.error("unreadable-file", Place{.file = file},
                          fmt::format("the file cannot be read ({})", std::strerror(errno)),
                          "check the name, the folder and the permissions");
        return std::nullopt;
    }
    return read_stream(in, file, diagnostics);
}

Place place_of_offset(const std::string& file, std::string_view text, std::size_t offset) {
    const std::string_view before = text.substr(0, offset);
    const std::size_t break_before = before.rfind('\n');
    const std::size_t start = break_before == std::string_view::npos ? 0 : break_before + 1;
    const std::size_t end = std::min(text.find_first_of("\r\n", start), text.size());
    const auto breaks = static_cast<std::size_t>(std::count(before.begin(), before.end(), '\n'));
    return {.file = file,
            .line = breaks + 1,
            .column = count_characters(text.substr(start, offset - start)) + 1,
            .source_line = std::string(text.substr(start, end - start))};
}

} // namespace

std::optional<std::string_view> accept_text(const std::string& file, std::string_view text, Diagnostics& diagnostics) {
    constexpr std::string_view byte_order_mark = "\xEF\xBB\xBF";
    if (text.size() > largest_text_file) {
        refuse_size(file, text.size(), diagnostics);
        return std::nullopt;
    }
    if (text.starts_with(byte_order_mark)) {
        text.remove_prefix(byte_order_mark.size());
    }
    if (const auto offset = first_invalid_utf8(text)) {
        diagnostics.error("invalid-utf8", place_of_offset(file, text, *offset),
                          fmt::format("byte 0x{:02X} is not valid UTF-8", static_cast<unsigned char>(text[*offset])),
                          "save the file with the encoding UTF-8");
        return std::nullopt;
    }
    return text;
}

std::optional<std::string> read_text_file(const std::string& file, Diagnostics& diagnostics) {
    std::optional<std::string> text =
        file == "-" ? read_stream(std::cin, file, diagnostics) : read_named_file(file, diagnostics);
    if (!text) {
        return std::nullopt;
    }
    const std::optional<std::string_view> accepted = accept_text(file, *text, diagnostics);
    if (!accepted) {
        return std::nullopt;
    }
    text->erase(0, text->size() - accepted->size());
    return text;
}

std::string resolve_file(const std::string& base_directory, const std::string& file) {
    return (std::filesystem::path(base_directory) / file).string();
}

} // namespace spanledger
