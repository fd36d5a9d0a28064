// SPDX-License-Identifier: MIT
#pragma once

#include <cstddef>
#include <iosfwd>
#include <string>
#include <vector>

namespace spanledger {

/// Where in a text something was found. Lines and columns count from 1; 0 means "no place in the text".
struct Place {
    std::string file{};
    std::size_t line = 0;
    std::size_t column = 0;
    std::string source_line{}; ///< the whole line as read, without its line end
    std::size_t width = 1;     ///< how many characters the caret underlines
};

enum class Severity { error, warning };

/// One thing wrong (or unusual) in what the user gave, and what would be right.
struct Diagnostic {
    Severity severity = Severity::error;
    std::string code; ///< stable, lower case with hyphens, e.g. "unknown-key"
    Place place;
    std::string message;
    std::string hint; ///< what to type instead; empty only where the message says it already
};

/// Gathers everything found in the inputs of one run, so that it is reported together.
class Diagnostics {
public:
    void add(Diagnostic diagnostic);
    void error(std::string code, Place place, std::string message, std::string hint);
    void warning(std::string code, Place place, std::string message, std::string hint);

    [[nodiscard]] bool has_errors() const noexcept { return errors_ > 0; }
    [[nodiscard]] const std::vector<Diagnostic>& all() const noexcept { return all_; }

private:
    std::vector<Diagnostic> all_;
    std::size_t errors_ = 0;
};

/// Writes "file:line:column: message [code]", the source line, a caret and the hint for each; of every file the
/// first 20 errors and 20 warnings are shown, then a count of the rest. Warnings carry the word "warning:".
void report(const Diagnostics& diagnostics, std::ostream& out);

} // namespace spanledger
