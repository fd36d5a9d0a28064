// SPDX-License-Identifier: MIT
#pragma once

#include <cstddef>
#include <string>
#include <string_view>
#include <vector>

// How much room text takes on paper. Widths are those of a sans serif face with the metrics of Helvetica, rounded up by
// kinds of characters, so that a text never needs more room than is said here.

namespace spanledger {

struct Font {
    double size = 9.0; ///< points
    bool bold = false;
};

/// In points.
[[nodiscard]] double text_width(std::string_view text, const Font& font);

/// The lines of a text that is `width` points wide: broken at spaces, within a word only where the word is too long.
/// Never empty.
[[nodiscard]] std::vector<std::string> text_lines(std::string_view text, const Font& font, double width);

/// Height in points of a row that holds so many lines.
[[nodiscard]] double row_height_of(std::size_t lines, const Font& font);

} // namespace spanledger
