// SPDX-License-Identifier: MIT
#pragma once

#include <cstddef>
#include <string>
#include <string_view>

// What to tell somebody whose TOML cannot be read. Works on single lines, without parsing.

namespace spanledger::toml {

/// "key = value", the value without a comment after it. Offsets are in bytes.
struct Assignment {
    std::string_view key;
    std::string_view value;
    std::size_t value_offset = 0;
};

/// Splits a line at its first '=' outside quotes; key and value are empty where it has none.
[[nodiscard]] Assignment split_assignment(std::string_view line);

/// Whether a line looks like "[header]" or "key =".
[[nodiscard]] bool begins_statement(std::string_view line);
[[nodiscard]] bool begins_header(std::string_view line);

/// More parts in one dotted key than any file needs; such keys are refused before they are parsed.
[[nodiscard]] bool has_endless_key(std::string_view line);

struct Advice {
    std::string message;
    std::string hint;
    bool at_value = false; ///< the place is the whole value, not where parsing stopped
};

/// Words for a line that cannot be read for `reason` (what the parser says).
[[nodiscard]] Advice syntax_advice(std::string_view line, std::string_view reason);

/// Words for a statement that is still open at the end of the text or where the next one begins.
[[nodiscard]] Advice unclosed_advice(std::string_view line);

} // namespace spanledger::toml
