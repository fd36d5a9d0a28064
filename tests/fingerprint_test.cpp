// SPDX-License-Identifier: MIT
#include "spanledger/fingerprint.hpp"

#include <catch2/catch.hpp>

// Digests of FIPS 180-4: the empty text, and "abc" of the example in its appendix.
TEST_CASE("A fingerprint is the first 16 digits of SHA-256") {
    CHECK(spanledger::fingerprint_of("") == "e3b0c44298fc1c14");
    CHECK(spanledger::fingerprint_of("abc") == "ba7816bf8f01cfea");
}
