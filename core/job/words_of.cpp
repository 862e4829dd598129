// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/job/words_of.h"

#include <utility>

namespace dampwright {

namespace {

enum class Kind { Gap, Small, Capital, Digit };

Kind kindOf(char c) {
  if (c >= '0' && c <= '9') return Kind::Digit;
  if (c >= 'A' && c <= 'Z') return Kind::Capital;
  const bool beyondAscii = static_cast<unsigned char>(c) >= 0x80;
  return (c >= 'a' && c <= 'z') || beyondAscii ? Kind::Small : Kind::Gap;
}

bool splitsBefore(Kind previous, Kind now) {
  if (now == Kind::Gap || (previous == Kind::Small && now == Kind::Capital)) return true;
  return (previous == Kind::Digit) != (now == Kind::Digit);
}

}  // namespace

std::vector<std::string> wordsOf(std::string_view text) {
  std::vector<std::string> words;
  std::string word;
  Kind previous = Kind::Gap;
  for (const char c : text) {
    const Kind now = kindOf(c);
    if (splitsBefore(previous, now) && !word.empty()) words.push_back(std::exchange(word, {}));
    if (now != Kind::Gap) word += now == Kind::Capital ? static_cast<char>(c - 'A' + 'a') : c;
    previous = now;
  }
  if (!word.empty()) words.push_back(word);
  return words;
}

}  // namespace dampwright
