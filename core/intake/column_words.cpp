// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/column_words.h"

#include <algorithm>
#include <string>
#include <vector>

#include "core/intake/column_word_table.h"
#include "core/intake/letters.h"

namespace dampwright {
namespace {

// The blank-parted words of a row of the table, one after the other.
template <class Visit>
void forEachWord(std::string_view list, Visit visit) {
  while (!list.empty()) {
    const std::size_t end = std::min(list.find(' '), list.size());
    visit(list.substr(0, end));
    list.remove_prefix(std::min(end + 1, list.size()));
  }
}

bool holds(std::string_view text, std::string_view word) { return text.find(word) != text.npos; }

bool holdsOneOf(std::string_view text, std::string_view list) {
  bool found = false;
  forEachWord(list, [&](std::string_view word) { found = found || holds(text, word); });
  return found;
}

bool isLetter(char letter) {
  return (letter >= 'a' && letter <= 'z') || static_cast<unsigned char>(letter) >= 0x80;
}

bool standsThere(std::string_view text, std::size_t at, std::string_view word, Where where) {
  const std::size_t end = at + word.size();
  const bool starts = at == 0 || !isLetter(text[at - 1]);
  const bool ends = end == text.size() || !isLetter(text[end]);
  if (where == Where::Whole) return trimmed(text) == word;
  if (where == Where::Alone) return starts && ends;
  return where != Where::Tail || ends;
}

// Where the last such word ends, 0 where there is none.
std::size_t lastEndOf(std::string_view word, Where where, std::string_view text) {
  for (std::size_t at = text.rfind(word); at != text.npos; at = text.rfind(word, at - 1)) {
    if (standsThere(text, at, word, where)) return at + word.size();
    if (at == 0) break;
  }
  return 0;
}

// What is said before the first linking word that has something before it.
std::string_view headOf(std::string_view text) {
  std::size_t end = text.size();
  forEachWord(linkingWords(), [&](std::string_view word) {
    for (std::size_t at = text.find(word, 1); at < end; at = text.find(word, at + 1)) {
      const bool blankBefore = isBlank(text[at - 1]) || text[at - 1] == '_';
      if (blankBefore && standsThere(text, at, word, Where::Alone)) end = at;
    }
  });
  return text.substr(0, end);
}

struct FoundWord {
  std::optional<Role> role;
  bool aside = false;
  std::size_t end = 0, length = 0;

  bool beats(const FoundWord& other) const {
    if (!other.role || aside != other.aside) return !other.role || !aside;
    return end != other.end ? end > other.end : length > other.length;
  }
};

std::optional<Role> roleOfWords(std::string_view text) {
  FoundWord best;
  for (const ColumnWords& row : columnWords()) {
    forEachWord(row.words, [&](std::string_view word) {
      const std::size_t end = lastEndOf(word, row.where, text);
      const FoundWord found{row.role, row.where == Where::Aside, end, word.size()};
      if (end > 0 && found.beats(best)) best = found;
    });
  }
  return best.role;
}

std::optional<Direction> onlyDirectionIn(std::string_view text) {
  std::optional<Direction> found;
  for (const StrokeWords& stroke : strokeWords()) {
    if (!holdsOneOf(text, stroke.words)) continue;
    if (found) return std::nullopt;
    found = stroke.direction;
  }
  return found;
}

std::vector<std::string_view> clausesOf(std::string_view line) {
  std::vector<std::string_view> clauses;
  while (true) {
    const std::size_t end = std::min(line.find_first_of(",;|/"), line.size());
    clauses.push_back(line.substr(0, end));
    if (end == line.size()) return clauses;
    line.remove_prefix(end + 1);
  }
}

bool namesForce(std::string_view text) {
  bool found = false;
  for (const ColumnWords& row : columnWords()) {
    if (row.role != Role::Force) continue;
    forEachWord(row.words, [&](std::string_view word) {
      found = found || lastEndOf(word, row.where, text) > 0;
    });
  }
  return found;
}

}  // namespace

std::optional<Role> roleOfName(std::string_view name) {
  const std::string text = folded(name);
  const auto role = roleOfWords(headOf(text));
  return role ? role : roleOfWords(text);
}

bool isCommand(std::string_view name) {
  const std::string text = folded(name);
  return holdsOneOf(text, commandWords()) || holds(text, "set point");
}

std::optional<Direction> directionOfName(std::string_view name) {
  return onlyDirectionIn(folded(name));
}

std::optional<Direction> directionOfLine(std::string_view line) {
  const std::string text = folded(line);
  if (namesForce(text)) return std::nullopt;
  for (const std::string_view clause : clausesOf(text)) {
    if (!holdsOneOf(clause, positiveWords()) || holdsOneOf(clause, negativeWords())) continue;
    if (const auto direction = onlyDirectionIn(clause)) return direction;
  }
  return std::nullopt;
}

std::size_t tradeWordsIn(std::string_view text) {
  const std::string plain = folded(text);
  std::size_t found = 0;
  for (const ColumnWords& row : columnWords()) {
    if (row.where == Where::Whole) continue;
    forEachWord(row.words, [&](std::string_view word) {
      found += lastEndOf(word, row.where, plain) > 0 ? 1 : 0;
    });
  }
  return found;
}

}  // namespace dampwright
