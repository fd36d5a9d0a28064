// SPDX-License-Identifier: MIT
#include "spanledger/writers/xlsx_book.hpp"

#include <unzip.h>

#include <algorithm>
#include <string_view>

namespace spanledger::xlsx {
namespace {

/// The ends of an XML document that passes by in pieces.
class DocumentEnds {
public:
    void add(std::string_view piece) {
        constexpr std::size_t kept = 512; // enough for the declaration and the name of the root
        if (head_.size() < kept) head_ += piece.substr(0, kept - head_.size());
        tail_ += piece.substr(piece.size() - std::min(piece.size(), kept));
        if (tail_.size() > kept) tail_.erase(0, tail_.size() - kept);
    }

    /// Whether the root that was opened is closed at the very end.
    [[nodiscard]] bool root_is_closed() const {
        const std::size_t declaration = head_.find("?>");
        const std::size_t root = declaration == std::string::npos ? declaration : head_.find('<', declaration);
        if (root == std::string::npos) return false;
        const std::size_t name_end = head_.find_first_of(" >", root);
        if (name_end == std::string::npos) return false;
        const std::string closed = "</" + head_.substr(root + 1, name_end - root - 1) + '>';
        const std::string_view end(tail_);
        return end.substr(0, end.find_last_not_of('\n') + 1).ends_with(closed);
    }

private:
    std::string head_;
    std::string tail_;
};

bool part_is_whole(unzFile archive) {
    if (unzOpenCurrentFile(archive) != UNZ_OK) return false;
    std::string buffer(std::size_t{1} << 16U, '\0');
    DocumentEnds ends;
    int count = 0;
    while ((count = unzReadCurrentFile(archive, buffer.data(), static_cast<unsigned>(buffer.size()))) > 0) {
        ends.add(std::string_view(buffer).substr(0, static_cast<std::size_t>(count)));
    }
    const bool sums_agree = unzCloseCurrentFile(archive) == UNZ_OK;
    return count == 0 && sums_agree && ends.root_is_closed();
}

} // namespace

WriteResult check_parts(const std::string& file) {
    const WriteError broken{file, "the workbook read back is not whole: the disk may be full"};
    unzFile archive = unzOpen64(file.c_str());
    if (archive == nullptr) return broken;
    int next = unzGoToFirstFile(archive);
    bool whole = next == UNZ_OK;
    while (whole && next == UNZ_OK) {
        whole = part_is_whole(archive);
        next = unzGoToNextFile(archive);
    }
    whole = whole && next == UNZ_END_OF_LIST_OF_FILE;
    unzClose(archive);
    return whole ? WriteResult{} : broken;
}

} // namespace spanledger::xlsx
