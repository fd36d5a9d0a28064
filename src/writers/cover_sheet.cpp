// SPDX-License-Identifier: MIT
#include "issue_sheets.hpp"
#include "sheet_pen.hpp"
#include "table_kinds.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace spanledger {
namespace {

const xlsx::Style title_style{.size = 16.0, .bold = true};
const xlsx::Style mark_style{.size = 11.0, .bold = true};
const xlsx::Style label_style{.size = 9.0, .bold = true, .at_top = true};

enum Column : std::uint32_t { label, words, between, second_label, second_words };

const TableResult* first_with_value(const Issue& issue) {
    const auto found = std::find_if(issue.tables.begin(), issue.tables.end(), [](const TableResult& table) {
        return std::any_of(table.cells.begin(), table.cells.end(),
                           [](const Cell& cell) { return cell.value.has_value(); });
    });
    return found == issue.tables.end() ? nullptr : &*found;
}

class Cover {
public:
    Cover(xlsx::Book& book, xlsx::Sheet& sheet, const Issue& issue)
        : pen_(book, sheet, {96.0, 258.0, 22.0, 92.0, 302.0}), issue_(&issue), practice_(&issue.brief.practice) {}

    void write(const CoverWords& given) {
        titles();
        title_block();
        status();
        purpose();
        how_to_read();
        list(given.sheets);
        cautions();
        values_in_use();
        identity(given.fingerprint);
        finish();
    }

private:
    void titles() {
        pen_.paragraph(label, practice_->title.empty() ? "Joist span tables" : practice_->title, title_style,
                       pen_.width());
        pen_.heading(issue_mark(*practice_), mark_style);
        pen_.gap(5.0);
    }

    struct Line {
        const char* name;
        std::string words;
        const char* second_name = "";
        std::string second_words = {};
        bool to_sign = false; ///< a line to write on takes the place of the second words
    };

    void title_block() {
        const auto or_else = [](const std::string& text, const char* otherwise) {
            return text.empty() ? std::string(otherwise) : text;
        };
        line({"Practice", practice_->name, "Prepared", or_else(practice_->prepared, "not named")});
        line({"Number", practice_->number, "Signature", "", true});
        line({"Revision", practice_->revision, "Checked", or_else(practice_->checked, "not named: not checked")});
        line({"Date", or_else(practice_->date, "not given"), "Signature", "", true});
        line({"Replaces", or_else(practice_->replaces, "nothing stated"), "Date of check", "", true});
        pen_.gap(4.0);
    }

    void line(const Line& line) {
        const Font font = font_of(running_text);
        const auto height = [&](const std::string& text, Column column) {
            return text_lines(text, font, pen_.widths()[column] - cell_padding).size();
        };
        const std::size_t lines = std::max(height(line.words, words), height(line.second_words, second_words));
        xlsx::Style wrapped = running_text;
        wrapped.wrapped = true;
        wrapped.at_top = true;
        text(label, line.name, label_style);
        text(words, line.words, wrapped);
        text(second_label, line.second_name, label_style);
        text(second_words, line.second_words, wrapped);
        if (line.to_sign) {
            xlsx::Style to_write_on = running_text;
            to_write_on.borders.bottom = xlsx::Line::thin;
            pen_.sheet().blank(pen_.at(second_words), pen_.style(to_write_on));
        }
        constexpr double room_to_sign = 20.0;
        pen_.end_row(std::max(row_height_of(lines, font) + 2.0, line.to_sign ? room_to_sign : 0.0));
    }

    void text(std::uint32_t column, const std::string& content, const xlsx::Style& style) {
        if (!content.empty()) pen_.sheet().text(pen_.at(column), content, pen_.style(style));
    }

    /// A label in the first column beside running text in the others.
    void labelled(const char* name, const std::string& content, const xlsx::Style& style) {
        text(label, name, label_style);
        pen_.paragraph(words, content, style, pen_.width() - pen_.widths()[label]);
        pen_.gap(3.0);
    }

    void status() {
        const bool checked = !practice_->checked.empty();
        labelled("Status",
                 checked ? fmt::format("Checked by {}. In force once both signatures stand above.", practice_->checked)
                         : std::string("NOT CHECKED: no checker is named. Not for use before a check."),
                 {.size = 9.0, .bold = true});
        if (issue_->brief.search.rounding == Rounding::nearest) {
            labelled("Rounding",
                     "For reproducing printed tables: spans are " + rounding_words(issue_->brief.search) +
                         ", not down.",
                     {.size = 9.0, .bold = true});
        }
        if (!practice_->notes.empty()) labelled("Notes", practice_->notes, running_text);
    }

    void section(const char* name) {
        pen_.gap(4.0);
        pen_.heading(name, group_heading);
        pen_.gap(2.0);
    }

    void purpose() {
        section("What the tables are for");
        std::string kinds;
        for (const KindWords& kind : kinds_in_use()) {
            const std::string unit = kind.unit.empty() ? "" : fmt::format(", in {}", kind.unit);
            kinds += fmt::format("{}{}{}: {}", kinds.empty() ? "" : ". ", kind.heading, unit,
                                 fmt::format(fmt::runtime(kind.about), rounding_words(issue_->brief.search)));
        }
        pen_.paragraph(label,
                       "To choose parallel joists at equal spacing for the load classes that stand over the columns. " +
                           kinds + ". The tables hold on the basis in the sheet Basis, and on no other.",
                       running_text, pen_.width());
    }

    [[nodiscard]] std::vector<KindWords> kinds_in_use() const {
        std::vector<KindWords> kinds;
        for (const TableResult& table : issue_->tables) {
            const bool known =
                std::any_of(kinds.begin(), kinds.end(), [&](const KindWords& kind) { return kind.kind == table.kind; });
            if (!known) kinds.push_back(words_of(table.kind));
        }
        return kinds;
    }

    void how_to_read() {
        section("How to read a cell");
        const TableResult* table = first_with_value(*issue_);
        if (table == nullptr) {
            pen_.paragraph(label, "No cell of this issue holds a value: every cell says why.", running_text,
                           pen_.width());
            return;
        }
        const auto found = std::find_if(table->cells.begin(), table->cells.end(),
                                        [](const Cell& cell) { return cell.value.has_value(); });
        const auto index = static_cast<std::size_t>(found - table->cells.begin());
        example(*table, index / table->columns.size(), index % table->columns.size());
    }

    void example(const TableResult& table, std::size_t row, std::size_t column) {
        const Cell& cell = table.at(row, column);
        const KindWords& kind = words_of(table.kind);
        const int decimals = decimals_of(kind, issue_->brief.search);
        const std::string format = kind.shows_text ? "@" : number_format_of(decimals);
        const xlsx::StyleId style = pen_.style(cell_style(cell.governing, format));
        if (kind.shows_text) {
            pen_.sheet().text(pen_.at(label), cell.text, style);
        } else {
            pen_.sheet().number(pen_.at(label), *cell.value * kind.scale, style);
        }
        pen_.paragraph(words, example_words(table, row, column), running_text, pen_.width() - pen_.widths()[label]);
    }

    [[nodiscard]] std::string example_words(const TableResult& table, std::size_t row, std::size_t column) const {
        const Cell& cell = table.at(row, column);
        const KindWords& kind = words_of(table.kind);
        const RowHead& head = table.rows[row];
        const ColumnHead& over = table.columns[column];
        const std::string shown = kind.shows_text ? cell.text
                                                  : fmt::format("{:.{}f}{}{}", *cell.value * kind.scale,
                                                                decimals_of(kind, issue_->brief.search),
                                                                kind.unit.empty() ? "" : " ", kind.unit);
        const auto& span = head.span ? head.span : over.span;
        return fmt::format("{}{}{} at {} mm spacing under the load class {}{}: {} {}. {}", head.material_class,
                           head.section.empty() ? "" : " ", head.section, over.spacing, over.load,
                           span ? fmt::format(", clear span {:.2f} m", *span / 1000.0) : "", lower(kind.heading), shown,
                           limit_words(cell));
    }

    static std::string lower(std::string_view words) {
        std::string text(words);
        text.front() = static_cast<char>(text.front() - 'A' + 'a');
        return text;
    }

    static std::string limit_words(const Cell& cell) {
        if (!cell.governing) return fmt::format("The mark {} says: {}.", no_limit_mark, cell.reason);
        const LimitDefinition& limit = definition_of(*cell.governing);
        std::string text =
            fmt::format("The letter {} and the fill name the limit that governs: {}.", limit.letter, limit.about);
        if (cell.next) text += fmt::format(" The next limit is: {}.", definition_of(*cell.next).about);
        return text;
    }

    void list(const std::vector<SheetEntry>& sheets) {
        section("Sheets");
        const xlsx::StyleId link = pen_.style({.size = 9.0, .underlined = true, .at_top = true});
        const double room = pen_.width() - pen_.widths()[label] - pen_.widths()[words];
        for (const SheetEntry& entry : sheets) {
            pen_.sheet().link(pen_.at(label), entry.sheet, link);
            pen_.paragraph(between, entry.holds, running_text, room);
        }
    }

    void cautions() {
        section("Cautions");
        for (std::size_t i = 0; i < issue_->cautions.size(); ++i) {
            pen_.paragraph(label, fmt::format("{}.  {}", i + 1, issue_->cautions[i]), running_text, pen_.width());
        }
    }

    void values_in_use() {
        section("Where the values come from");
        const auto count = [this](auto&& wanted) {
            return std::count_if(issue_->sources.begin(), issue_->sources.end(), wanted);
        };
        const auto own = count([](const SourceLine& line) { return line.practice_own; });
        const auto seen = count([](const SourceLine& line) { return line.seen && !line.practice_own; });
        const auto recalled = count([](const SourceLine& line) { return !line.seen && !line.practice_own; });
        pen_.paragraph(
            label,
            fmt::format("{} catalogue rows and parameters are in use: {} seen in their source, {} recalled from "
                        "memory, {} the practice's own. Recalled values must be confirmed; the sheet Sources "
                        "marks each.",
                        issue_->sources.size(), seen, recalled, own),
            running_text, pen_.width());
    }

    void identity(const std::string& fingerprint) {
        section("Identity");
        const auto fact = [this](const char* name, const std::string& value) {
            text(label, name, label_style);
            pen_.paragraph(words, value, running_text, pen_.width() - pen_.widths()[label]);
        };
        fact("Fingerprint", fingerprint + "  (of the record of this issue; it changes with any number or word)");
        fact("Program", "spanledger " + issue_->program_version);
        fact("Catalogue", issue_->catalogue_fingerprint + "  (fingerprint of the data built into the program)");
    }

    void finish() {
        xlsx::PageSetUp page = page_set_up(*practice_);
        page.print_area = {{0, 0}, {pen_.next_row() - 1, second_words}};
        page.first_repeated_row = 0;
        page.last_repeated_row = 0;
        page.frozen = {1, 0};
        constexpr double fits_a_page = 640.0; // points: at four fifths of its size
        page.one_page = pen_.height() <= fits_a_page;
        pen_.sheet().set_up(page);
    }

    SheetPen pen_;
    const Issue* issue_;
    const Practice* practice_;
};

} // namespace

void write_cover(xlsx::Book& book, xlsx::Sheet& sheet, const Issue& issue, const CoverWords& words) {
    Cover(book, sheet, issue).write(words);
}

} // namespace spanledger
