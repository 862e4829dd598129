// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <string_view>

namespace dampwright {

/// SHA-256 of the bytes as 64 lower-case hexadecimal digits. Source: FIPS 180-4, computed by
/// libcrypto.
std::string sha256Hex(std::string_view bytes);

}  // namespace dampwright
