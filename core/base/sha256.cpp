// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/base/sha256.h"

#include <openssl/evp.h>

#include <array>

#include "core/base/expects.h"

namespace dampwright {

std::string sha256Hex(std::string_view bytes) {
  std::array<unsigned char, 32> digest{};
  unsigned int length = 0;
  const int ok =
      EVP_Digest(bytes.data(), bytes.size(), digest.data(), &length, EVP_sha256(), nullptr);
  expects(ok == 1 && length == digest.size());
  constexpr std::string_view digits = "0123456789abcdef";
  std::string hex;
  hex.reserve(2 * digest.size());
  for (const unsigned char byte : digest) {
    hex += digits[byte >> 4U];
    hex += digits[byte & 15U];
  }
  return hex;
}

}  // namespace dampwright
