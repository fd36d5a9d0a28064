// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/catalogue.hpp"
#include "spanledger/input/brief.hpp"
#include "spanledger/input/section_reader.hpp"

#include <vector>

// The sections of a brief become the struct Brief. What is wrong is reported and its fallback used, so that reading
// goes on to the next problem.

namespace spanledger {

/// The sections of a brief as they stand in the text. Unknown and missing sections are reported when it is made.
struct BriefSections {
    BriefSections(const toml::Document& document, Diagnostics& diagnostics);

    SectionReader practice;
    SectionReader basis;
    SectionReader catalogue;
    SectionReader support;
    SectionReader deck;
    SectionReader limits;
    SectionReader search;
    std::vector<SectionReader> loads;
    std::vector<SectionReader> members;
    std::vector<SectionReader> tables;
};

[[nodiscard]] Practice read_practice(SectionReader& section);
[[nodiscard]] BasisChoice read_basis(SectionReader& section);
[[nodiscard]] CatalogueFiles read_catalogue_files(SectionReader& section);
[[nodiscard]] Support read_support(SectionReader& section);
[[nodiscard]] Deck read_deck(SectionReader& section);
[[nodiscard]] SearchRange read_search(SectionReader& section);

/// The limits, with what belongs together among their keys checked.
[[nodiscard]] LimitsAsked read_limits(SectionReader& section);

/// Load classes, with duration and ψ of their category where the brief leaves them out.
[[nodiscard]] std::vector<LoadClass> read_loads(std::vector<SectionReader>& sections, const Catalogue& catalogue,
                                                const Diagnostics& diagnostics);
[[nodiscard]] std::vector<MembersEntry> read_members(std::vector<SectionReader>& sections);

/// Tables; `brief` has its loads, members and deck already.
[[nodiscard]] std::vector<TableRequest> read_tables(std::vector<SectionReader>& sections, const Brief& brief);

/// Reports keys of different sections that contradict each other or have no effect together.
void check_consistency(BriefSections& sections, const Brief& brief, const Catalogue& catalogue);

/// Reports members that the catalogue does not know, and what is unusual or idle for timber or steel.
void check_materials(BriefSections& sections, const Brief& brief, const Catalogue& catalogue, Diagnostics& diagnostics);

} // namespace spanledger
