// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/letters.h"

#include <algorithm>
#include <array>
#include <cctype>
#include <utility>

namespace dampwright {
namespace {

constexpr std::string_view noBreakSpace = "\xC2\xA0";

// U+00C0 to U+00FF without their accents; blank where the letter stays or is two letters.
constexpr std::string_view plainLatin =
    "aaaaaa ceeeeiiiidnooooo ouuuuyp aaaaaa ceeeeiiiidnooooo ouuuuypy";

struct Spelled {
  char32_t point;
  std::string_view plain;
};
constexpr std::array spelledOut = std::to_array<Spelled>({
    {0x00AA, "a"},  {0x00BA, "°"},  {0x00C6, "ae"}, {0x00DF, "ss"},  {0x00E6, "ae"},
    {0x0152, "oe"}, {0x0153, "oe"}, {0x0178, "y"},  {0x02DA, "°"},   {0x03BC, "µ"},
    {0x2018, "'"},  {0x2019, "'"},  {0x2032, "'"},  {0x207B, "-"},   {0x2010, "-"},
    {0x2011, "-"},  {0x2012, "-"},  {0x2013, "-"},  {0x2212, "-"},   {0x2103, "°c"},
    {0x2109, "°f"}, {0x2215, "/"},  {0x2044, "/"},  {0x2219, "·"},   {0x22C5, "·"},
    {0x3000, " "},  {0x3010, "["},  {0x3011, "]"},  {0x3014, "["},   {0x3015, "]"},
    {0x339B, "µm"}, {0x339C, "mm"}, {0x339D, "cm"}, {0x338F, "kg"},  {0x33A7, "m/s"},
    {0x33B2, "µs"}, {0x33B3, "ms"}, {0x3390, "hz"}, {0x3391, "khz"}, {0x212A, "k"},
    {0x00B2, "2"},  {0x00B3, "3"},  {0x00B9, "1"},  {0x30FB, "·"},   {0x00A0, " "},
    {0x202F, " "},  {0x2009, " "},  {0xFEFF, ""},   {0x200B, ""},
});

// Half-width kana U+FF66 to U+FF9D as their full-width forms, in order.
constexpr std::u32string_view fullKana =
    U"\u30F2\u30A1\u30A3\u30A5\u30A7\u30A9\u30E3\u30E5\u30E7\u30C3\u30FC\u30A2\u30A4\u30A6\u30A8"
    U"\u30AA\u30AB\u30AD\u30AF\u30B1\u30B3\u30B5\u30B7\u30B9\u30BB\u30BD\u30BF\u30C1\u30C4\u30C6"
    U"\u30C8\u30CA\u30CB\u30CC\u30CD\u30CE\u30CF\u30D2\u30D5\u30D8\u30DB\u30DE\u30DF\u30E0\u30E1"
    U"\u30E2\u30E4\u30E6\u30E8\u30E9\u30EA\u30EB\u30EC\u30ED\u30EF\u30F3";
constexpr char32_t firstHalfKana = 0xFF66, voiceMark = 0xFF9E, halfVoiceMark = 0xFF9F;

bool isCombiningAccent(char32_t point) { return point >= 0x0300 && point <= 0x036F; }

char32_t plainForm(char32_t point) {
  if (point >= 'A' && point <= 'Z') return point + 0x20;
  if (point >= 0xFF01 && point <= 0xFF5E) return plainForm(point - 0xFEE0);
  if (point >= 0xC0 && point <= 0xFF && plainLatin[point - 0xC0] != ' ') {
    return static_cast<unsigned char>(plainLatin[point - 0xC0]);
  }
  const bool halfKana = point >= firstHalfKana && point < firstHalfKana + fullKana.size();
  return halfKana ? fullKana[point - firstHalfKana] : point;
}

const Spelled* spelledFormOf(char32_t point) {
  for (const Spelled& row : spelledOut) {
    if (row.point == point) return &row;
  }
  return nullptr;
}

}  // namespace

std::string_view trimmed(std::string_view text) {
  while (true) {
    if (!text.empty() && isBlank(text.front())) {
      text.remove_prefix(1);
    } else if (!text.empty() && isBlank(text.back())) {
      text.remove_suffix(1);
    } else if (text.starts_with(noBreakSpace)) {
      text.remove_prefix(2);
    } else if (text.ends_with(noBreakSpace)) {
      text.remove_suffix(2);
    } else {
      return text;
    }
  }
}

std::string lowered(std::string_view text) {
  std::string lower(text);
  for (std::size_t i = 0; i < lower.size(); ++i) {
    const auto letter = static_cast<unsigned char>(lower[i]);
    const bool capital = letter >= 'A' && letter <= 'Z';
    const bool afterC3 = i > 0 && static_cast<unsigned char>(lower[i - 1]) == 0xC3;
    const bool accented = afterC3 && letter >= 0x80 && letter <= 0x9E && letter != 0x97;  // not ×
    if (capital || accented) lower[i] = static_cast<char>(letter + 0x20);
  }
  return lower;
}

std::string folded(std::string_view text) {
  std::string plain;
  char32_t last = 0;
  for (std::size_t i = 0; i < text.size();) {
    const Letter letter = letterAt(text, i);
    i += letter.bytes;
    if (isCombiningAccent(letter.point)) continue;
    // A voice mark behind half-width kana makes the next full-width form: カ, ガ.
    if ((letter.point == voiceMark || letter.point == halfVoiceMark) && last >= 0x30A0) {
      plain.resize(plain.size() - 3);
      last += letter.point == voiceMark ? 1 : 2;
      plain = withLetter(std::move(plain), last);
      continue;
    }
    if (const Spelled* spelled = spelledFormOf(letter.point)) {
      plain += spelled->plain;
      last = 0;
      continue;
    }
    last = plainForm(letter.point);
    plain = withLetter(std::move(plain), last);
    if (last < 0x30A0 || last > 0x30FF) last = 0;
  }
  return plain;
}

Letter letterAt(std::string_view text, std::size_t i) {
  const auto byte = [&](std::size_t at) -> char32_t {
    return at < text.size() ? static_cast<unsigned char>(text[at]) : 0x80u;
  };
  const char32_t lead = byte(i);
  const auto follower = [&](std::size_t n) { return byte(i + n) & 0x3F; };
  if (lead < 0xC0) return {lead, 1};
  if (lead < 0xE0) return {(lead & 0x1F) << 6 | follower(1), 2};
  if (lead < 0xF0) return {(lead & 0x0F) << 12 | follower(1) << 6 | follower(2), 3};
  return {(lead & 0x07) << 18 | follower(1) << 12 | follower(2) << 6 | follower(3), 4};
}

std::string withLetter(std::string text, char32_t point) {
  const auto add = [&text](char32_t byte) { text += static_cast<char>(byte); };
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

bool hasLetter(std::string_view text) {
  return std::any_of(text.begin(), text.end(), [](char letter) {
    return std::isalpha(static_cast<unsigned char>(letter)) != 0 || (letter & 0x80) != 0;
  });
}

std::string replaced(std::string_view text, std::string_view from, std::string_view to) {
  std::string result;
  while (true) {
    const std::size_t at = text.find(from);
    result.append(text.substr(0, at));
    if (at == text.npos) return result;
    result.append(to);
    text.remove_prefix(at + from.size());
  }
}

std::string_view startOf(std::string_view text, std::size_t bytes) {
  if (text.size() <= bytes) return text;
  while (bytes > 0 && (static_cast<unsigned char>(text[bytes]) & 0xC0) == 0x80) --bytes;
  return text.substr(0, bytes);
}

std::string withSingleBlanks(std::string_view text) {
  std::string tidy;
  for (const char letter : trimmed(text)) {
    if (!isBlank(letter)) {
      tidy += letter;
    } else if (tidy.back() != ' ') {
      tidy += ' ';
    }
  }
  return tidy;
}

}  // namespace dampwright
