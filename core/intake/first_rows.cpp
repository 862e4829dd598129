// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/first_rows.h"

#include "core/intake/decode_text.h"
#include "core/intake/letters.h"
#include "core/intake/split_row.h"
#include "core/intake/text_lines.h"

namespace dampwright {
namespace {

constexpr std::size_t longestCell = 120;  // bytes; more than a person reads in a table

std::optional<char> letterOf(std::string_view delimiter) {
  for (const char letter : {',', ';', '|', '\t', blanksDelimiter}) {
    if (delimiterName(letter) == delimiter) return letter;
  }
  return std::nullopt;
}

std::vector<std::string> cellsOf(std::string_view row, std::optional<char> delimiter) {
  if (!delimiter) return {std::string(startOf(row, longestCell))};
  std::vector<std::string> cells;
  for (const Cell& cell : splitRow(row, *delimiter)) {
    if (cells.size() == mostColumns) break;
    cells.emplace_back(startOf(plainText(cell), longestCell));
  }
  return cells;
}

}  // namespace

std::string_view headOf(std::string_view bytes, std::size_t most) {
  if (bytes.size() <= most) return bytes;
  std::size_t end = bytes.find_last_of("\r\n", most - 1);
  if (end == std::string_view::npos) return bytes;
  ++end;
  const bool wide = end < bytes.size() && bytes[end] == 0;  // UTF-16, little end first
  return bytes.substr(0, end + (wide ? 1 : 0));
}

Result<std::vector<TextRow>> firstRows(std::string_view bytes,
                                       const std::optional<std::string>& encoding,
                                       std::string_view delimiter,
                                       std::size_t count) {
  const auto decoded = decodeText(bytes, encoding);
  if (!decoded) return decoded.error();
  const std::string_view text = decoded.value().text();
  LineReader lines(text, findLineEnd(text).letter);
  const auto letter = letterOf(delimiter);
  std::vector<TextRow> rows;
  while (rows.size() < count) {
    const auto line = lines.next();
    if (!line) break;
    rows.push_back({line->number, cellsOf(line->text, letter)});
  }
  return rows;
}

}  // namespace dampwright
