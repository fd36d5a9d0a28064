// SPDX-License-Identifier: MIT
#include "spanledger/input/csv_text.hpp"

#include "spanledger/input/utf8.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <utility>

namespace spanledger {

namespace {

// No table of the trade comes near these; a file beyond them is another kind of file.
constexpr std::size_t most_rows = 200000;
constexpr std::size_t most_columns = 100;
constexpr std::size_t longest_shown_line = 4000; ///< bytes

void trim(std::string& text) {
    constexpr std::string_view blanks = " \t\r\n";
    text.erase(std::min(text.find_last_not_of(blanks) + 1, text.size()));
    text.erase(0, text.find_first_not_of(blanks));
}

bool is_control(char c) noexcept {
    return (static_cast<unsigned char>(c) < 0x20 && c != '\t' && c != '\n' && c != '\r') || c == 0x7F;
}

/// Lines without their ends, which may be LF, CRLF or CR.
std::vector<std::string> lines_of(std::string_view text) {
    std::vector<std::string> lines;
    for (std::size_t start = 0; start <= text.size();) {
        const std::size_t end = std::min(text.find_first_of("\r\n", start), text.size());
        lines.emplace_back(text.substr(start, end - start));
        start = end + (text.substr(end, 2) == "\r\n" ? 2 : 1);
    }
    return lines;
}

/// The separator that the first row has most of outside quotes; comma where it has none.
char separator_of(const std::vector<std::string>& lines) {
    constexpr std::array separators{',', ';', '\t'};
    std::array<std::size_t, separators.size()> counts{};
    const auto first_row = std::find_if(lines.begin(), lines.end(), [](const std::string& line) {
        return line.find_first_not_of(" \t") != std::string::npos && line[0] != '#';
    });
    bool quoted = false;
    for (const char c : first_row == lines.end() ? std::string() : *first_row) {
        quoted = quoted != (c == '"');
        for (std::size_t i = 0; i < separators.size(); ++i) {
            counts[i] += !quoted && c == separators[i] ? 1 : 0;
        }
    }
    return separators[static_cast<std::size_t>(std::max_element(counts.begin(), counts.end()) - counts.begin())];
}

/// Walks through the text once.
class Splitter {
public:
    Splitter(const std::string& file, std::string_view text, Diagnostics& diagnostics)
        : text_(text), diagnostics_(diagnostics) {
        result_.file = file;
        result_.lines = lines_of(text);
        result_.separator = separator_of(result_.lines);
    }

    CsvText split() {
        while (at_ < text_.size() && within_bounds()) {
            if (text_[at_] == '#') {
                at_ = std::min(text_.find_first_of("\r\n", at_), text_.size());
                end_line();
                continue;
            }
            CsvRow row = read_row();
            const bool blank = std::all_of(row.fields.begin(), row.fields.end(),
                                           [](const CsvField& field) { return field.text.empty(); });
            if (!blank) {
                result_.rows.push_back(std::move(row));
            }
        }
        return std::move(result_);
    }

private:
    bool within_bounds() {
        if (!result_.rows.empty() && result_.rows.back().fields.size() > most_columns) {
            problem("too-many-columns", result_.rows.back().fields[most_columns],
                    fmt::format("the row has more than {} fields", most_columns), "check that it is the right file");
            return false;
        }
        if (result_.rows.size() > most_rows) {
            problem("too-many-rows", result_.rows.back().fields.front(),
                    fmt::format("the file has more than {} rows", most_rows), "split it");
            return false;
        }
        return true;
    }

    CsvRow read_row() {
        CsvRow row;
        row.fields.push_back(read_field());
        while (at_ < text_.size() && text_[at_] == result_.separator && row.fields.size() <= most_columns) {
            advance();
            row.fields.push_back(read_field());
        }
        end_line();
        return row;
    }

    CsvField read_field() {
        skip_blanks();
        CsvField field{.line = line_, .column = column_};
        if (at_ < text_.size() && text_[at_] == '"') {
            read_quoted(field);
            refuse_rest();
        } else {
            field.text = read_to_separator();
            field.width = std::max<std::size_t>(count_characters(field.text), 1);
            if (field.text.find('"') != std::string::npos) {
                problem("stray-quote", field, "a quote stands within a field that is not quoted",
                        "put the whole field in quotes, and write a quote in it twice");
            }
        }
        if (std::any_of(field.text.begin(), field.text.end(), is_control)) {
            problem("control-character", field, "the field holds a control character", "type the field again");
        }
        return field;
    }

    std::string read_to_separator() {
        const std::size_t start = at_;
        while (at_ < text_.size() && text_[at_] != result_.separator && !at_line_end()) {
            advance();
        }
        std::string text(text_.substr(start, at_ - start));
        trim(text);
        return text;
    }

    void read_quoted(CsvField& field) {
        advance();
        while (at_ < text_.size() && (text_[at_] != '"' || text_.substr(at_, 2) == "\"\"")) {
            if (text_[at_] == '"') {
                advance();
            }
            field.text += at_line_end() ? '\n' : text_[at_];
            at_line_end() ? end_line() : advance();
        }
        if (at_ >= text_.size()) {
            problem("unclosed-quote", field, "a quoted field is not closed", "end it with a quote");
            return;
        }
        advance();
        field.width = field.line == line_ ? column_ - field.column : 1;
        trim(field.text);
    }

    void refuse_rest() {
        const CsvField rest{.line = line_, .column = column_};
        if (!read_to_separator().empty()) {
            problem("stray-quote", rest, "text stands after the quote that closes a field",
                    "put the whole field in quotes, and write a quote in it twice");
        }
    }

    void problem(std::string code, const CsvField& field, std::string message, std::string hint) {
        result_.well_formed = false;
        diagnostics_.error(std::move(code), result_.place_of(field), std::move(message), std::move(hint));
    }

    [[nodiscard]] bool at_line_end() const noexcept { return text_[at_] == '\n' || text_[at_] == '\r'; }

    void skip_blanks() {
        while (at_ < text_.size() && (text_[at_] == ' ' || text_[at_] == '\t') && text_[at_] != result_.separator) {
            advance();
        }
    }

    void advance() noexcept {
        const bool begins_character = (static_cast<unsigned char>(text_[at_]) & 0xC0) != 0x80;
        column_ += begins_character ? 1 : 0;
        ++at_;
    }

    void end_line() noexcept {
        at_ = std::min(at_ + (text_.substr(std::min(at_, text_.size()), 2) == "\r\n" ? 2 : 1), text_.size());
        ++line_;
        column_ = 1;
    }

    std::string_view text_;
    Diagnostics& diagnostics_;
    CsvText result_{};
    std::size_t at_ = 0;
    std::size_t line_ = 1;
    std::size_t column_ = 1;
};

} // namespace

Place CsvText::place_of(const CsvField& field) const {
    const bool known = field.line >= 1 && field.line <= lines.size();
    const bool shown = known && lines[field.line - 1].size() <= longest_shown_line;
    return {file, field.line, field.column, shown ? lines[field.line - 1] : std::string(), field.width};
}

CsvText split_csv(const std::string& file, std::string_view text, Diagnostics& diagnostics) {
    return Splitter(file, text, diagnostics).split();
}

} // namespace spanledger
