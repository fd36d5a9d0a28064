// SPDX-License-Identifier: MIT
#include "catalogue_rows.hpp"

#include "spanledger/input/suggestion.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>

namespace spanledger {

namespace {

void refuse_unknown_source(CsvRecord& record, const std::string& source, const std::vector<Source>& sources) {
    std::vector<std::string> keys;
    for (const Source& known : sources) {
        keys.push_back(known.key);
    }
    record.error("source", "unknown-source", fmt::format("source '{}' is not in sources.csv", source),
                 did_you_mean(source, keys));
}

} // namespace

Provenance read_provenance(CsvRecord& record, const RowFile& file, const std::vector<Source>& sources) {
    static const std::array<std::string, 2> seen_words{"from memory", "seen"};
    Provenance provenance{
        .source = record.text("source"), .practice_own = file.practice_own, .note = record.text("note")};
    if (provenance.source.empty()) {
        record.error("source", "missing-source", "the row has no source", "say where its values come from");
    } else if (!file.practice_own && std::none_of(sources.begin(), sources.end(), [&](const Source& source) {
                   return source.key == provenance.source;
               })) {
        refuse_unknown_source(record, provenance.source, sources);
    }
    provenance.seen = !record.text("seen").empty() && record.one_of("seen", seen_words) == 1;
    if (file.practice_own) {
        provenance.file = file.name;
        provenance.line = record.line();
    }
    return provenance;
}

std::string read_name(CsvRecord& record, std::string_view column) {
    const std::string& name = record.required_text(column);
    if (spoiled_by_spreadsheet(name)) {
        record.warning(
            column, "spoiled-name",
            fmt::format("'{}' looks like a name that a spreadsheet has turned into a date or a number", name),
            "format the column as text in the spreadsheet and type the name again");
    }
    return name;
}

bool has_column(std::string_view text, std::string_view column) {
    while (!text.empty()) {
        const std::size_t end = std::min(text.find('\n'), text.size());
        const std::string_view line = text.substr(0, end);
        const bool remark = line.starts_with('#') || line.find_first_not_of(" \t\r") == std::string_view::npos;
        if (!remark) return line.find(column) != std::string_view::npos;
        text.remove_prefix(std::min(end + 1, text.size()));
    }
    return false;
}

void read_sources(const RowFile& file, std::vector<Source>& sources, Diagnostics& diagnostics) {
    static const std::array<CsvColumn, 4> columns{{{"key"}, {"title"}, {"edition"}, {"note"}}};
    RowCollector<Source> collector(sources);
    for_each_record(file, columns, diagnostics, [&](CsvRecord& record) {
        Source source{record.required_text("key"), record.required_text("title"), record.required_text("edition"),
                      record.text("note")};
        const std::string key = source.key;
        collector.add(std::move(source), key, record);
    });
}

} // namespace spanledger
