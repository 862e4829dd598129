// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/split_row.h"

#include <algorithm>
#include <optional>

#include "core/intake/letters.h"

namespace dampwright {
namespace {

bool isDelimiter(char letter, char delimiter) {
  return delimiter == blanksDelimiter ? isBlank(letter) : letter == delimiter;
}

std::size_t afterBlanks(std::string_view row, std::size_t at, char delimiter) {
  while (at < row.size() && isBlank(row[at]) && row[at] != delimiter) ++at;
  return at;
}

struct Field {
  Cell cell;
  std::size_t end = 0;  ///< where its delimiter stands, or the row's size
};

// The quoted field that opens at `at`; nothing where no quote closes it before a delimiter.
std::optional<Field> quotedField(std::string_view row, std::size_t at, char delimiter) {
  for (std::size_t i = at + 1; i < row.size(); ++i) {
    if (row[i] != '"') continue;
    if (i + 1 < row.size() && row[i + 1] == '"') {
      ++i;
      continue;
    }
    std::size_t end = i + 1;
    if (delimiter != blanksDelimiter) end = afterBlanks(row, end, delimiter);
    if (end < row.size() && !isDelimiter(row[end], delimiter)) return std::nullopt;
    return Field{{trimmed(row.substr(at + 1, i - at - 1)), true}, end};
  }
  return std::nullopt;
}

Field fieldAt(std::string_view row, std::size_t at, char delimiter) {
  if (delimiter != blanksDelimiter) at = afterBlanks(row, at, delimiter);
  if (at < row.size() && row[at] == '"') {
    if (const auto field = quotedField(row, at, delimiter)) return *field;
  }
  std::size_t end = at;
  while (end < row.size() && !isDelimiter(row[end], delimiter)) ++end;
  return {{trimmed(row.substr(at, end - at)), false}, end};
}

std::vector<Cell> splitAtBlanks(std::string_view row) {
  std::vector<Cell> cells;
  std::size_t at = 0;
  while (true) {
    while (at < row.size() && isBlank(row[at])) ++at;
    if (at >= row.size()) return cells;
    const Field field = fieldAt(row, at, blanksDelimiter);
    cells.push_back(field.cell);
    at = field.end;
  }
}

}  // namespace

std::vector<Cell> splitRow(std::string_view row, char delimiter) {
  if (delimiter == blanksDelimiter) return splitAtBlanks(row);
  std::vector<Cell> cells;
  std::size_t at = 0;
  while (true) {
    const Field field = fieldAt(row, at, delimiter);
    cells.push_back(field.cell);
    if (field.end >= row.size()) return cells;
    at = field.end + 1;
  }
}

std::string plainText(const Cell& cell) {
  std::string text;
  for (std::size_t i = 0; i < cell.text.size(); ++i) {
    const char letter = cell.text[i];
    text += letter == '\n' || letter == '\r' ? ' ' : letter;
    if (cell.quoted && letter == '"' && i + 1 < cell.text.size() && cell.text[i + 1] == '"') ++i;
  }
  return withSingleBlanks(text);
}

std::string delimiterName(char delimiter) {
  if (delimiter == '\t') return "tab";
  if (delimiter == blanksDelimiter) return "blanks";
  return {delimiter};
}

}  // namespace dampwright
