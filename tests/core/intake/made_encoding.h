// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <gtest/gtest.h>
#include <iconv.h>

#include <string>
#include <string_view>

namespace dampwright {

/// UTF-8 as bytes of another encoding, by the C library's names ("CP932", "UTF-16LE").
inline std::string encoded(std::string_view text, const char* encoding) {
  std::string bytes(4 * text.size() + 16, '\0');
  const iconv_t handle = ::iconv_open(encoding, "UTF-8");
  char* in = const_cast<char*>(text.data());
  char* out = bytes.data();
  std::size_t left = text.size(), room = bytes.size();
  const std::size_t result = ::iconv(handle, &in, &left, &out, &room);
  EXPECT_NE(result, static_cast<std::size_t>(-1)) << encoding << " has no letter for " << in;
  ::iconv_close(handle);
  bytes.resize(bytes.size() - room);
  return bytes;
}

}  // namespace dampwright
