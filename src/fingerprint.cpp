// SPDX-License-Identifier: MIT
#include "spanledger/fingerprint.hpp"

#include <fmt/format.h>
#include <openssl/evp.h>

#include <array>
#include <stdexcept>

namespace spanledger {

std::string fingerprint_of(std::string_view text) {
    constexpr std::size_t bytes_shown = 8;
    std::array<unsigned char, EVP_MAX_MD_SIZE> digest{};
    if (EVP_Digest(text.data(), text.size(), digest.data(), nullptr, EVP_sha256(), nullptr) != 1) {
        throw std::runtime_error("SHA-256 is not available");
    }
    std::string digits;
    for (std::size_t i = 0; i < bytes_shown; ++i) {
        digits += fmt::format("{:02x}", digest[i]);
    }
    return digits;
}

} // namespace spanledger
