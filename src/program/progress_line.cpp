// SPDX-License-Identifier: MIT
#include "progress_line.hpp"

#include "words.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <ostream>

namespace spanledger {

ProgressLine::~ProgressLine() {
    if (width_ > 0) around_->err << "\r" << std::string(width_, ' ') << "\r" << std::flush;
}

void ProgressLine::operator()(std::size_t done, std::size_t total) {
    stop_if_asked(*around_);
    if (!shown_ || Clock::now() < next_) return;
    next_ = Clock::now() + std::chrono::milliseconds(100);
    const std::string words = fmt::format("{} of {} cells", done, total);
    width_ = std::max(width_, words.size());
    around_->err << "\r" << words << std::flush;
}

} // namespace spanledger
