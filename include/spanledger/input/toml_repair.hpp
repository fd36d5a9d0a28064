// SPDX-License-Identifier: MIT
#pragma once

#include "spanledger/input/toml_text.hpp"

#include <functional>
#include <span>
#include <string>
#include <vector>

// A TOML parser stops at the first error. To report all of them, the statement at fault is reported and set aside, and
// the rest is parsed again.

namespace spanledger::toml {

/// Why and where parsing stopped.
struct ParseFailure {
    std::string reason;
    Mark mark;
};

/// Parses a text and says why it fails, if it does.
using TryParse = std::function<std::optional<ParseFailure>(const std::string& text)>;

class Repair {
public:
    Repair(const Document& document, TryParse try_parse, Diagnostics& diagnostics);

    /// The text to parse, statements at fault replaced.
    [[nodiscard]] std::string text() const { return joined(lines_.size()); }

    /// Reports the statement at fault and sets it aside. A key or table that stands twice is remembered only.
    void set_aside(const ParseFailure& failure);

    /// Reports what stands twice, with the first place found in the tree. Sections of `several` are written [[name]].
    void report_duplicates(const Node& root, std::span<const std::string> several);

    /// A header was set aside, and what stood under it is unread.
    [[nodiscard]] bool header_lost() const noexcept { return header_lost_; }

    /// Whether a key or a value is a substitute for something set aside.
    [[nodiscard]] static bool is_substitute(std::string_view text) noexcept;

private:
    struct Duplicate {
        std::string name;
        Mark mark;
        bool header = false;
        bool inlined = false; ///< within the value of its statement
    };

    [[nodiscard]] std::string joined(std::size_t line_count) const;
    [[nodiscard]] bool parses_before(std::size_t number) const;
    [[nodiscard]] std::size_t next_statement(std::size_t after) const;
    [[nodiscard]] std::size_t statement_at_fault(const ParseFailure& failure) const;
    [[nodiscard]] std::string substitute_for(const std::string& line);
    void report_syntax(const ParseFailure& failure, std::size_t first, bool left_open);
    void remember_duplicate(const ParseFailure& failure, std::size_t first);
    [[nodiscard]] std::optional<Mark> first_place(const Node& root, const Duplicate& duplicate) const;

    const Document* document_;
    TryParse try_parse_;
    Diagnostics* diagnostics_;
    std::vector<std::string> lines_;
    std::vector<Duplicate> duplicates_;
    std::size_t headers_set_aside_ = 0;
    bool header_lost_ = false;
};

} // namespace spanledger::toml
