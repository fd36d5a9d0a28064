// SPDX-License-Identifier: MIT
#include "spanledger/input/inputs.hpp"

#include "spanledger/input/brief_reader.hpp"
#include "spanledger/input/text_file.hpp"
#include "spanledger/input/toml_text.hpp"

#include <filesystem>

namespace spanledger {

namespace {

std::string folder_of(const std::string& file) {
    return file == "-" ? std::string() : std::filesystem::path(file).parent_path().string();
}

std::vector<std::string> repeated_sections() {
    std::vector<std::string> names;
    for (const SectionDefinition& section : brief_schema()) {
        if (section.several) {
            names.emplace_back(section.name);
        }
    }
    return names;
}

std::optional<Inputs> read_accepted(const std::string& file, std::string_view text, Diagnostics& diagnostics) {
    const toml::Document document = toml::parse(file, text, diagnostics, repeated_sections());
    BriefSections sections(document, diagnostics);
    Inputs inputs;
    Brief& brief = inputs.brief;
    brief.file = file;
    brief.practice = read_practice(sections.practice);
    brief.basis = read_basis(sections.basis);
    brief.catalogue = read_catalogue_files(sections.catalogue);
    inputs.catalogue = load_catalogue(brief.catalogue, brief.basis.parameters, folder_of(file), diagnostics);
    brief.support = read_support(sections.support);
    brief.deck = read_deck(sections.deck);
    brief.limits = read_limits(sections.limits);
    brief.search = read_search(sections.search);
    brief.loads = read_loads(sections.loads, inputs.catalogue, diagnostics);
    brief.members = read_members(sections.members);
    brief.tables = read_tables(sections.tables, brief);
    check_consistency(sections, brief, inputs.catalogue);
    check_materials(sections, brief, inputs.catalogue, diagnostics);
    if (diagnostics.has_errors()) {
        return std::nullopt;
    }
    return inputs;
}

} // namespace

std::optional<Inputs> read_inputs(const std::string& file, Diagnostics& diagnostics) {
    const std::optional<std::string> text = read_text_file(file, diagnostics);
    return text ? read_accepted(file, *text, diagnostics) : std::nullopt;
}

std::optional<Inputs> read_inputs_from_text(const std::string& file, std::string_view text, Diagnostics& diagnostics) {
    const std::optional<std::string_view> accepted = accept_text(file, text, diagnostics);
    return accepted ? read_accepted(file, *accepted, diagnostics) : std::nullopt;
}

} // namespace spanledger
