// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/decode_text.h"

#include <algorithm>
#include <array>
#include <cstring>

#include "core/intake/recognise_other.h"

namespace dampwright {
namespace {

using std::string_view_literals::operator""sv;

constexpr std::size_t headBytes = 4096;
constexpr std::uint32_t replacement = 0xFFFD;

// Windows-1252 bytes 0x80 to 0x9F; the five without a letter become U+FFFD. Source: the Encoding
// Standard, index windows-1252.
constexpr std::array<std::uint16_t, 32> windows1252 = {
    0x20AC, 0xFFFD, 0x201A, 0x0192, 0x201E, 0x2026, 0x2020, 0x2021, 0x02C6, 0x2030, 0x0160,
    0x2039, 0x0152, 0xFFFD, 0x017D, 0xFFFD, 0xFFFD, 0x2018, 0x2019, 0x201C, 0x201D, 0x2022,
    0x2013, 0x2014, 0x02DC, 0x2122, 0x0161, 0x203A, 0x0153, 0xFFFD, 0x017E, 0x0178};

unsigned char byteAt(std::string_view bytes, std::size_t i) {
  return static_cast<unsigned char>(bytes[i]);
}

std::string withUtf8(std::string text, std::uint32_t point) {
  const auto add = [&text](std::uint32_t byte) { text += static_cast<char>(byte); };
  if (point < 0x80) {
    add(point);
  } else if (point < 0x800) {
    add(0xC0 | point >> 6);
    add(0x80 | (point & 0x3F));
  } else if (point < 0x10000) {
    add(0xE0 | point >> 12);
    add(0x80 | (point >> 6 & 0x3F));
    add(0x80 | (point & 0x3F));
  } else {
    add(0xF0 | point >> 18);
    add(0x80 | (point >> 12 & 0x3F));
    add(0x80 | (point >> 6 & 0x3F));
    add(0x80 | (point & 0x3F));
  }
  return text;
}

std::string fromWindows1252(std::string_view bytes) {
  std::string text;
  text.reserve(bytes.size() + bytes.size() / 16);
  for (std::size_t i = 0; i < bytes.size(); ++i) {
    const unsigned char byte = byteAt(bytes, i);
    if (byte < 0x80) {
      text += bytes[i];
    } else {
      text = withUtf8(std::move(text), byte < 0xA0 ? windows1252[byte - 0x80] : byte);
    }
  }
  return text;
}

// `high`: which byte of each pair is the more significant, 0 or 1. An odd last byte is left out: a
// file still being written.
std::string fromUtf16(std::string_view bytes, std::size_t high) {
  const auto unit = [&](std::size_t i) {
    return static_cast<std::uint32_t>(byteAt(bytes, i + high) << 8 | byteAt(bytes, i + 1 - high));
  };
  std::string text;
  text.reserve(bytes.size() / 2 + bytes.size() / 32);
  for (std::size_t i = 0; i + 1 < bytes.size(); i += 2) {
    std::uint32_t point = unit(i);
    if (point >= 0xD800 && point < 0xDC00 && i + 3 < bytes.size()) {
      const std::uint32_t low = unit(i + 2);
      if (low >= 0xDC00 && low < 0xE000) {
        point = 0x10000 + ((point - 0xD800) << 10) + (low - 0xDC00);
        i += 2;
      }
    }
    if (point >= 0xD800 && point < 0xE000) point = replacement;
    text = withUtf8(std::move(text), point);
  }
  return text;
}

std::size_t followersOf(unsigned char lead) {
  if (lead >= 0xC2 && lead <= 0xDF) return 1;
  if (lead >= 0xE0 && lead <= 0xEF) return 2;
  if (lead >= 0xF0 && lead <= 0xF4) return 3;
  return 0;
}

// The second byte's range is what keeps overlong forms, surrogates and points past U+10FFFF out.
bool secondByteFits(unsigned char lead, unsigned char second) {
  if (lead == 0xE0) return second >= 0xA0 && second <= 0xBF;
  if (lead == 0xED) return second >= 0x80 && second <= 0x9F;
  if (lead == 0xF0) return second >= 0x90 && second <= 0xBF;
  if (lead == 0xF4) return second >= 0x80 && second <= 0x8F;
  return second >= 0x80 && second <= 0xBF;
}

// Bytes of the letter at `i`, 0 where no letter stands there.
std::size_t letterLength(std::string_view bytes, std::size_t i) {
  const unsigned char lead = byteAt(bytes, i);
  if (lead < 0x80) return 1;
  const std::size_t followers = followersOf(lead);
  if (followers == 0 || i + followers >= bytes.size()) return 0;
  if (!secondByteFits(lead, byteAt(bytes, i + 1))) return 0;
  for (std::size_t k = 2; k <= followers; ++k) {
    if ((byteAt(bytes, i + k) & 0xC0) != 0x80) return 0;
  }
  return followers + 1;
}

// A letter cut short by the end is left out: the file may still be written.
std::string_view withoutCutLetter(std::string_view bytes) {
  for (std::size_t back = 1; back <= std::min<std::size_t>(3, bytes.size()); ++back) {
    const unsigned char byte = byteAt(bytes, bytes.size() - back);
    if ((byte & 0xC0) == 0x80) continue;
    return followersOf(byte) >= back ? bytes.substr(0, bytes.size() - back) : bytes;
  }
  return bytes;
}

std::size_t firstBadByte(std::string_view bytes) {
  std::size_t i = 0;
  while (i < bytes.size()) {
    std::uint64_t eight = 0x80;
    if (i + 8 <= bytes.size()) std::memcpy(&eight, bytes.data() + i, 8);
    if ((eight & 0x8080808080808080u) == 0) {
      i += 8;
      continue;
    }
    const std::size_t length = letterLength(bytes, i);
    if (length == 0) return i;
    i += length;
  }
  return bytes.npos;
}

std::string withBadBytesReplaced(std::string_view bytes) {
  std::string text;
  while (true) {
    const std::size_t bad = firstBadByte(bytes);
    text.append(bytes.substr(0, bad));
    if (bad == bytes.npos) return text;
    text = withUtf8(std::move(text), replacement);
    bytes.remove_prefix(bad + 1);
  }
}

struct ZeroBytes {
  std::size_t even = 0, odd = 0;
};

ZeroBytes zerosIn(std::string_view head) {
  ZeroBytes zeros;
  for (std::size_t i = 0; i < head.size(); ++i) {
    if (head[i] == '\0') ++(i % 2 == 0 ? zeros.even : zeros.odd);
  }
  return zeros;
}

// Text of western letters in UTF-16 has a zero in nearly every second byte and none in the others.
std::string utf16ByZeros(std::string_view head) {
  const ZeroBytes zeros = zerosIn(head);
  const std::size_t most = head.size() / 2 * 7 / 10;
  if (most > 0 && zeros.even == 0 && zeros.odd >= most) return "utf-16le";
  if (most > 0 && zeros.odd == 0 && zeros.even >= most) return "utf-16be";
  return {};
}

struct ByteOrderMark {
  std::string_view bytes, encoding;
};
constexpr std::array byteOrderMarks{ByteOrderMark{"\xEF\xBB\xBF"sv, "utf-8"},
                                    ByteOrderMark{"\xFF\xFE"sv, "utf-16le"},
                                    ByteOrderMark{"\xFE\xFF"sv, "utf-16be"}};

DecodedText converted(std::string_view raw, const std::string& encoding) {
  DecodedText decoded{encoding, raw, std::nullopt, 0};
  if (encoding == "utf-16le") decoded.converted = fromUtf16(raw, 1);
  if (encoding == "utf-16be") decoded.converted = fromUtf16(raw, 0);
  if (encoding == "windows-1252") decoded.converted = fromWindows1252(raw);
  return decoded;
}

DecodedText withoutZerosAtEnd(std::string_view bytes, std::string encoding) {
  const std::size_t last = bytes.find_last_not_of('\0');
  const std::string_view kept = bytes.substr(0, last == bytes.npos ? 0 : last + 1);
  const std::string_view letters = withoutCutLetter(kept);
  const bool valid = encoding != "windows-1252" && firstBadByte(letters) == bytes.npos;
  if (encoding.empty()) encoding = valid ? "utf-8" : "windows-1252";
  DecodedText decoded = converted(encoding == "utf-8" ? letters : kept, encoding);
  if (encoding == "utf-8" && !valid) decoded.converted = withBadBytesReplaced(letters);
  decoded.zeroBytesAtEnd = static_cast<std::int64_t>(bytes.size() - kept.size());
  return decoded;
}

}  // namespace

Result<DecodedText> decodeText(std::string_view bytes, const std::optional<std::string>& asked) {
  if (bytes.empty()) return Error{"file-empty", {}, {}};
  std::string encoding = asked.value_or("");
  constexpr std::array known{"", "utf-8", "utf-16le", "utf-16be", "windows-1252"};
  if (std::find(known.begin(), known.end(), encoding) == known.end()) {
    return Error{"option-not-understood",
                 {{"option", "--encoding"},
                  {"value", encoding},
                  {"choices", "utf-8, utf-16le, utf-16be, windows-1252"}},
                 {}};
  }
  for (const ByteOrderMark& mark : byteOrderMarks) {
    if (!bytes.starts_with(mark.bytes)) continue;
    bytes.remove_prefix(mark.bytes.size());
    if (encoding.empty()) encoding = mark.encoding;
    break;
  }
  if (const auto other = recogniseOther(bytes)) return *other;
  const std::string_view head = bytes.substr(0, headBytes);
  if (encoding.empty()) encoding = utf16ByZeros(head.substr(0, head.size() / 2 * 2));
  if (encoding.starts_with("utf-16")) return converted(bytes, encoding);
  if (head.find('\0') != head.npos) return Error{"file-is-binary", {}, {}};
  return withoutZerosAtEnd(bytes, encoding);
}

}  // namespace dampwright
