// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/encodings.h"

#include <iconv.h>

#include <algorithm>
#include <array>
#include <cerrno>
#include <cstdint>
#include <utility>

#include "core/intake/letters.h"

namespace dampwright {
namespace {

constexpr char32_t replacement = 0xFFFD;

// Windows-1252 bytes 0x80 to 0x9F; the five without a letter become U+FFFD. Source: the Encoding
// Standard, index windows-1252.
constexpr std::array<std::uint16_t, 32> windows1252 = {
    0x20AC, 0xFFFD, 0x201A, 0x0192, 0x201E, 0x2026, 0x2020, 0x2021, 0x02C6, 0x2030, 0x0160,
    0x2039, 0x0152, 0xFFFD, 0x017D, 0xFFFD, 0xFFFD, 0x2018, 0x2019, 0x201C, 0x201D, 0x2022,
    0x2013, 0x2014, 0x02DC, 0x2122, 0x0161, 0x203A, 0x0153, 0xFFFD, 0x017E, 0x0178};

unsigned char byteAt(std::string_view bytes, std::size_t i) {
  return i < bytes.size() ? static_cast<unsigned char>(bytes[i]) : 0;
}

bool isWide(unsigned char byte) { return byte >= 0x80; }

bool isAsciiLetter(unsigned char byte) {
  return (byte >= 'A' && byte <= 'Z') || (byte >= 'a' && byte <= 'z');
}

class Converter {
 public:
  explicit Converter(WideEncoding encoding)
      : handle_(::iconv_open("UTF-8", encoding == WideEncoding::ShiftJis ? "CP932" : "GB18030")) {}
  ~Converter() {
    if (*this) ::iconv_close(handle_);
  }
  Converter(const Converter&) = delete;
  Converter& operator=(const Converter&) = delete;

  // (iconv_t)-1 is how the C library says no.
  explicit operator bool() const { return reinterpret_cast<std::intptr_t>(handle_) != -1; }

  struct Part {
    std::string text;
    std::size_t done = 0;  ///< bytes; what follows is no letter, or one cut short by the end
    bool cutShort = false;
  };

  Part convert(std::string_view bytes) {
    Part part;
    ::iconv(handle_, nullptr, nullptr, nullptr, nullptr);
    std::array<char, 16384> buffer;
    char* in = const_cast<char*>(bytes.data());  // iconv does not write to its input
    std::size_t left = bytes.size();
    while (left > 0) {
      char* out = buffer.data();
      std::size_t room = buffer.size();
      const std::size_t result = ::iconv(handle_, &in, &left, &out, &room);
      part.text.append(buffer.data(), buffer.size() - room);
      if (result != static_cast<std::size_t>(-1) || errno == E2BIG) continue;
      part.cutShort = errno == EINVAL;
      break;
    }
    part.done = bytes.size() - left;
    return part;
  }

 private:
  iconv_t handle_;
};

struct Shares {
  std::size_t usual = 0, all = 0;

  // Fewer than three letters say nothing.
  double share() const {
    return all >= 3 ? static_cast<double>(usual) / static_cast<double>(all) : 0;
  }
};

// Signs of the first rows, kana, and the 2965 characters of level 1 of JIS X 0208; half-width kana
// only two and more together.
bool isUsualJis(unsigned char lead, unsigned char trail) {
  const bool level1 = lead >= 0x88 && lead <= 0x98 && !(lead == 0x98 && trail > 0x72);
  return level1 || (lead >= 0x81 && lead <= 0x83) || (lead == 0x87 && trail >= 0x5F);
}

Shares sharesOfJis(std::string_view bytes) {
  Shares shares;
  for (std::size_t i = 0; i < bytes.size(); ++i) {
    const unsigned char lead = byteAt(bytes, i);
    if (!isWide(lead)) continue;
    ++shares.all;
    if (lead >= 0xA1 && lead <= 0xDF) {
      const auto half = [&](std::size_t at) {
        return byteAt(bytes, at) >= 0xA1 && byteAt(bytes, at) <= 0xDF;
      };
      shares.usual += half(i + 1) || (i > 0 && half(i - 1)) ? 1 : 0;
      continue;
    }
    shares.usual += isUsualJis(lead, byteAt(bytes, ++i)) ? 1 : 0;
  }
  return shares;
}

// Signs and the 3755 characters of level 1 of GB 2312.
Shares sharesOfGb(std::string_view bytes) {
  Shares shares;
  for (std::size_t i = 0; i < bytes.size(); ++i) {
    const unsigned char lead = byteAt(bytes, i);
    if (!isWide(lead)) continue;
    ++shares.all;
    const unsigned char trail = byteAt(bytes, ++i);
    const bool row = (lead >= 0xA1 && lead <= 0xA3) || (lead >= 0xB0 && lead <= 0xD7);
    shares.usual += row && trail >= 0xA1 ? 1 : 0;
  }
  return shares;
}

}  // namespace

std::string fromWindows1252(std::string_view bytes) {
  std::string text;
  text.reserve(bytes.size() + bytes.size() / 16);
  for (std::size_t i = 0; i < bytes.size(); ++i) {
    const unsigned char byte = byteAt(bytes, i);
    if (byte < 0x80) {
      text += bytes[i];
    } else {
      text = withLetter(std::move(text), byte < 0xA0 ? windows1252[byte - 0x80] : byte);
    }
  }
  return text;
}

std::string fromUtf16(std::string_view bytes, std::size_t high) {
  const auto unit = [&](std::size_t i) {
    return static_cast<char32_t>(byteAt(bytes, i + high) << 8 | byteAt(bytes, i + 1 - high));
  };
  std::string text;
  text.reserve(bytes.size() / 2 + bytes.size() / 32);
  for (std::size_t i = 0; i + 1 < bytes.size(); i += 2) {
    char32_t point = unit(i);
    if (point >= 0xD800 && point < 0xDC00 && i + 3 < bytes.size()) {
      const char32_t low = unit(i + 2);
      if (low >= 0xDC00 && low < 0xE000) {
        point = 0x10000 + ((point - 0xD800) << 10) + (low - 0xDC00);
        i += 2;
      }
    }
    if (point >= 0xD800 && point < 0xE000) point = replacement;
    text = withLetter(std::move(text), point);
  }
  return text;
}

std::optional<std::string> fromClean(std::string_view bytes, WideEncoding encoding) {
  Converter converter(encoding);
  if (!converter) return std::nullopt;
  Converter::Part part = converter.convert(bytes);
  const bool clean = part.done == bytes.size() || (part.cutShort && bytes.size() - part.done < 4);
  return clean ? std::optional(std::move(part.text)) : std::nullopt;
}

std::optional<std::string> fromAny(std::string_view bytes, WideEncoding encoding) {
  Converter converter(encoding);
  if (!converter) return std::nullopt;
  std::string text;
  while (true) {
    const Converter::Part part = converter.convert(bytes);
    text += part.text;
    if (part.done == bytes.size() || part.cutShort) return text;
    text = withLetter(std::move(text), replacement);
    bytes.remove_prefix(part.done + 1);
  }
}

double usualShare(std::string_view bytes, WideEncoding encoding) {
  return (encoding == WideEncoding::ShiftJis ? sharesOfJis(bytes) : sharesOfGb(bytes)).share();
}

double usualShareOfWindows1252(std::string_view bytes) {
  constexpr std::string_view signs = "\x80\x92\x93\x94\x96\x97\xA0\xB0\xB1\xB2\xB3\xB5\xB7\xBA\xD8";
  Shares shares;
  for (std::size_t i = 0; i < bytes.size(); ++i) {
    if (!isWide(byteAt(bytes, i))) continue;
    ++shares.all;
    const unsigned char before = i > 0 ? byteAt(bytes, i - 1) : 0, after = byteAt(bytes, i + 1);
    const bool alone = !isWide(before) && !isWide(after);
    const bool letter = byteAt(bytes, i) >= 0xC0;
    const bool sign = signs.find(bytes[i]) != signs.npos;
    // "ção" has two letters together.
    const bool inWord = letter && (isAsciiLetter(before) || isAsciiLetter(after));
    shares.usual += inWord || (alone && sign) ? 1 : 0;
  }
  return shares.share();
}

}  // namespace dampwright
