// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/letters.h"

namespace dampwright {
namespace {

constexpr std::string_view noBreakSpace = "\xC2\xA0";

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
