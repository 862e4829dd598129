// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/decode_text.h"

#include <algorithm>
#include <array>
#include <cstring>
#include <utility>

#include "core/intake/column_words.h"
#include "core/intake/encodings.h"
#include "core/intake/letters.h"
#include "core/intake/recognise_other.h"

namespace dampwright {
namespace {

using std::string_view_literals::operator""sv;

constexpr std::size_t headBytes = 4096;
constexpr std::size_t evidenceBytes = 8192;
constexpr char32_t replacement = 0xFFFD;

unsigned char byteAt(std::string_view bytes, std::size_t i) {
  return static_cast<unsigned char>(bytes[i]);
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
    text = withLetter(std::move(text), replacement);
    bytes.remove_prefix(bad + 1);
  }
}

// Most pairs are a zero and a letter of ASCII, and hardly any the other way round: names may be of
// any alphabet, numbers are not.
std::string utf16ByZeros(std::string_view head) {
  std::size_t little = 0, big = 0;
  const auto ascii = [](char letter) { return letter >= '\t' && letter <= '~'; };
  for (std::size_t i = 0; i + 1 < head.size(); i += 2) {
    little += head[i + 1] == '\0' && ascii(head[i]) ? 1 : 0;
    big += head[i] == '\0' && ascii(head[i + 1]) ? 1 : 0;
  }
  const std::size_t pairs = head.size() / 2;
  if (little > 0 && 10 * little >= 6 * pairs && 20 * big <= pairs) return "utf-16le";
  if (big > 0 && 10 * big >= 6 * pairs && 20 * little <= pairs) return "utf-16be";
  return {};
}

struct ByteOrderMark {
  std::string_view bytes, encoding;
};
constexpr std::array byteOrderMarks{ByteOrderMark{"\xEF\xBB\xBF"sv, "utf-8"},
                                    ByteOrderMark{"\xFF\xFE"sv, "utf-16le"},
                                    ByteOrderMark{"\xFE\xFF"sv, "utf-16be"}};

// The first lines that hold anything outside ASCII, lines as they are: names, units, remarks.
std::string linesThatTell(std::string_view bytes) {
  std::string telling;
  std::size_t from = 0;
  while (from < bytes.size() && telling.size() < evidenceBytes) {
    std::size_t at = from;
    while (at < bytes.size() && byteAt(bytes, at) < 0x80) ++at;
    if (at == bytes.size()) break;
    const std::size_t before = bytes.find_last_of("\r\n", at);
    const std::size_t start = std::max(before == bytes.npos ? 0 : before + 1, from);
    const std::size_t end = std::min(bytes.find_first_of("\r\n", at), bytes.size());
    telling.append(bytes.substr(start, std::min(end - start, evidenceBytes))).append("\n");
    from = end;
  }
  return telling;
}

struct WideName {
  std::string_view name;
  WideEncoding encoding;
};
constexpr std::array wideNames{WideName{"shift-jis", WideEncoding::ShiftJis},
                               WideName{"gb18030", WideEncoding::Gb18030}};

// Of text that is not UTF-8: the encoding that decodes cleanly and in which the most trade words
// stand; where that is a draw, the one whose usual letters the bytes are.
std::string encodingOfBytes(std::string_view bytes) {
  const std::string telling = linesThatTell(bytes);
  std::string best = "windows-1252";
  std::size_t words = tradeWordsIn(fromWindows1252(telling));
  double share = usualShareOfWindows1252(telling);
  for (const auto& [name, encoding] : wideNames) {
    const auto sample = fromClean(telling, encoding);
    if (!sample || !fromClean(bytes, encoding)) continue;
    const std::size_t found = tradeWordsIn(*sample);
    const double usual = usualShare(telling, encoding);
    if (found < words || (found == words && usual <= share)) continue;
    best = name;
    words = found;
    share = usual;
  }
  return best;
}

DecodedText converted(std::string_view raw, const std::string& encoding) {
  DecodedText decoded{encoding, raw, std::nullopt, 0, 0};
  if (encoding == "utf-16le") decoded.converted = fromUtf16(raw, 1);
  if (encoding == "utf-16be") decoded.converted = fromUtf16(raw, 0);
  for (const auto& [name, wide] : wideNames) {
    if (encoding == name) decoded.converted = fromAny(raw, wide);
  }
  if (encoding == "windows-1252") decoded.converted = fromWindows1252(raw);
  return decoded;
}

DecodedText withoutZeros(DecodedText decoded) {
  const std::string_view text = decoded.text();
  const std::size_t last = text.find_last_not_of('\0');
  const std::size_t kept = last == text.npos ? 0 : last + 1;
  decoded.zeroBytesAtEnd = static_cast<std::int64_t>(text.size() - kept);
  if (decoded.converted) {
    decoded.converted->resize(kept);
  } else {
    decoded.raw = decoded.raw.substr(0, kept);
    if (decoded.raw.find('\0') == decoded.raw.npos) return decoded;
    decoded.converted = std::string(decoded.raw);
  }
  for (char& letter : *decoded.converted) {
    if (letter != '\0') continue;
    letter = ' ';
    ++decoded.zeroBytesInside;
  }
  return decoded;
}

DecodedText bytesDecoded(std::string_view bytes, std::string encoding) {
  const std::size_t last = bytes.find_last_not_of('\0');
  const std::string_view kept = bytes.substr(0, last == bytes.npos ? 0 : last + 1);
  const std::string_view letters = withoutCutLetter(kept);
  const bool asked = !encoding.empty();
  const bool valid = (!asked || encoding == "utf-8") && firstBadByte(letters) == bytes.npos;
  if (!asked) encoding = valid ? "utf-8" : encodingOfBytes(kept);
  DecodedText decoded = converted(encoding == "utf-8" ? letters : kept, encoding);
  if (encoding == "utf-8" && !valid) decoded.converted = withBadBytesReplaced(letters);
  decoded = withoutZeros(std::move(decoded));
  decoded.zeroBytesAtEnd = static_cast<std::int64_t>(bytes.size() - kept.size());
  return decoded;
}

// Some zeros among text come from loggers that pad their fields or lost their power; with other
// control characters beside them, or many of them, the file is no text.
bool isBinary(std::string_view head) {
  std::size_t zeros = 0, others = 0;
  for (const char letter : head) {
    const auto byte = static_cast<unsigned char>(letter);
    zeros += byte == 0 ? 1 : 0;
    others += byte > 0 && byte < 0x20 && (byte < '\t' || byte > '\r') && byte != 0x1A ? 1 : 0;
  }
  return zeros > 0 && (others > 0 || 4 * zeros > head.size());
}

}  // namespace

Result<DecodedText> decodeText(std::string_view bytes, const std::optional<std::string>& asked) {
  if (bytes.empty()) return Error{"file-empty", {}, {}};
  std::string encoding = asked.value_or("");
  constexpr std::array known{
      "", "utf-8", "utf-16le", "utf-16be", "windows-1252", "shift-jis", "gb18030"};
  if (std::find(known.begin(), known.end(), encoding) == known.end()) {
    return Error{"option-not-understood",
                 {{"option", "--encoding"},
                  {"value", encoding},
                  {"choices", "utf-8, utf-16le, utf-16be, windows-1252, shift-jis, gb18030"}},
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
  if (encoding.empty()) encoding = utf16ByZeros(head);
  if (encoding.starts_with("utf-16")) return withoutZeros(converted(bytes, encoding));
  if (isBinary(head)) return Error{"file-is-binary", {}, {}};
  return bytesDecoded(bytes, encoding);
}

}  // namespace dampwright
