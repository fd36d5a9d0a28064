// SPDX-License-Identifier: MIT
#include "spanledger/writers/text_lines.hpp"

#include "utf8_bytes.hpp"

#include <cmath>

namespace spanledger {
namespace {

bool one_of(std::string_view set, char c) {
    return set.find(c) != std::string_view::npos;
}

/// Width of the character that begins with this byte, in parts of the font's size. Rounded up within each kind.
double character_width(char c) {
    if (static_cast<unsigned char>(c) >= 0xE3U) return 1.02; // ideographs, signs outside the usual alphabets
    if (static_cast<unsigned char>(c) >= 0x80U) return 0.84;
    if (one_of(" !',./:;I[\\]fijlt|", c)) return 0.28;
    if (one_of("\"()*-`r{}", c)) return 0.39;
    if (one_of("%@W", c)) return 1.02;
    if (one_of("mMw", c)) return 0.84;
    if (c >= 'A' && c <= 'Z') return 0.78;
    return 0.585;
}

/// Where the last character that still fits begins to overflow, at least one character in.
std::size_t fitting_bytes(std::string_view word, const Font& font, double width) {
    std::size_t end = 0;
    while (end < word.size()) {
        const std::size_t next = end + first_character_bytes(word.substr(end));
        if (end > 0 && text_width(word.substr(0, next), font) > width) break;
        end = next;
    }
    return end;
}

/// One paragraph filled into lines.
class Lines {
public:
    Lines(const Font& font, double width) : font_(font), width_(width) {}

    void add(std::string_view paragraph) {
        line_.clear();
        while (!paragraph.empty()) {
            const std::size_t space = paragraph.find(' ');
            add_word(paragraph.substr(0, space));
            paragraph.remove_prefix(space == std::string_view::npos ? paragraph.size() : space + 1);
        }
        lines_.push_back(line_);
    }

    std::vector<std::string> take() { return std::move(lines_); }

private:
    void add_word(std::string_view word) {
        const std::string longer = line_.empty() ? std::string(word) : line_ + ' ' + std::string(word);
        if (text_width(longer, font_) <= width_) {
            line_ = longer;
            return;
        }
        if (!line_.empty()) lines_.push_back(line_);
        while (text_width(word, font_) > width_) {
            const std::size_t bytes = fitting_bytes(word, font_, width_);
            if (bytes == word.size()) break;
            lines_.emplace_back(word.substr(0, bytes));
            word.remove_prefix(bytes);
        }
        line_ = word;
    }

    Font font_;
    double width_;
    std::string line_;
    std::vector<std::string> lines_;
};

} // namespace

double text_width(std::string_view text, const Font& font) {
    constexpr double bold_is_wider = 1.08;
    double width = 0.0;
    for (const char c : text) {
        if (!continues_character(c)) width += character_width(c);
    }
    return width * font.size * (font.bold ? bold_is_wider : 1.0);
}

std::vector<std::string> text_lines(std::string_view text, const Font& font, double width) {
    Lines lines(font, width);
    while (true) {
        const std::size_t end = text.find('\n');
        lines.add(text.substr(0, end));
        if (end == std::string_view::npos) return lines.take();
        text.remove_prefix(end + 1);
    }
}

double row_height_of(std::size_t lines, const Font& font) {
    constexpr double line_spacing = 1.25;
    constexpr double padding = 2.5; // points
    return std::ceil(static_cast<double>(lines) * font.size * line_spacing + padding);
}

} // namespace spanledger
