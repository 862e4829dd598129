// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/find_table.h"

#include <algorithm>
#include <array>
#include <utility>

#include "core/intake/column_words.h"
#include "core/intake/letters.h"
#include "core/intake/metadata.h"
#include "core/intake/split_row.h"

namespace dampwright {
namespace {

using Cells = std::vector<Cell>;

constexpr std::size_t surelyTable = 3;  // rows of data on end that no preamble has by chance
constexpr std::size_t headerReach =
    6;  // filled lines above the data in which a header is looked for

bool isBlankRow(const Cells& cells) {
  return std::all_of(
      cells.begin(), cells.end(), [](const Cell& cell) { return cell.text.empty(); });
}

// Index into `lines` of the first row of the table; the number of lines where there is none.
std::size_t firstDataLine(const std::vector<Line>& lines,
                          const Dialect& dialect,
                          std::size_t from) {
  std::size_t best = lines.size(), longest = 0, start = 0, run = 0;
  for (std::size_t i = from; i < lines.size() && longest < surelyTable; ++i) {
    if (isComment(lines[i].text)) continue;
    const Cells cells = splitRow(lines[i].text, dialect.delimiter);
    if (isBlankRow(cells)) continue;
    if (!isDataRow(cells, dialect)) {
      run = 0;
      continue;
    }
    if (run++ == 0) start = i;
    if (run > longest) {
      longest = run;
      best = start;
    }
  }
  return best;
}

bool startsBracket(const Cell& cell) {
  return cell.text.starts_with('(') || cell.text.starts_with('[');
}

// Cells of one row put together again where `belongs` says so of the one before and the next.
template <class Belongs>
Cells joinedWhere(const Cells& cells, Belongs belongs) {
  Cells joined;
  for (const Cell& cell : cells) {
    if (joined.empty() || cell.text.empty() || !belongs(joined.back(), cell)) {
      joined.push_back(cell);
      continue;
    }
    const char* begin = joined.back().text.data();
    joined.back().text = {begin,
                          static_cast<std::size_t>(cell.text.data() + cell.text.size() - begin)};
  }
  return joined;
}

// The names of a header whose columns are split by blanks, where names may hold blanks themselves:
// two blanks or a tab part them, and a bracket belongs to the name before it.
Cells headerCells(std::string_view row, const Dialect& dialect) {
  Cells single = splitRow(row, dialect.delimiter);
  if (dialect.delimiter != blanksDelimiter || single.size() == dialect.columns) return single;
  Cells wide = joinedWhere(single, [](const Cell& before, const Cell& cell) {
    const char* gap = before.text.data() + before.text.size();
    return startsBracket(cell) || (cell.text.data() - gap == 1 && *gap != '\t');
  });
  if (wide.size() == dialect.columns) return wide;
  return joinedWhere(single, [](const Cell& before, const Cell& cell) {
    return !before.quoted && startsBracket(cell);
  });
}

struct HeaderRow {
  std::size_t line = 0;  ///< index into the lines
  Cells cells;
};

// Text over the columns, about as many cells as they are, and no "key:" in front.
std::optional<HeaderRow> headerRowAt(const std::vector<Line>& lines,
                                     std::size_t i,
                                     const Dialect& dialect) {
  std::string_view text = lines[i].text;
  if (isComment(text)) text.remove_prefix(std::min(text.find_first_not_of("#%/ \t"), text.size()));
  HeaderRow row{i, headerCells(text, dialect)};
  const Cells& cells = row.cells;
  const auto filled = static_cast<std::size_t>(std::count_if(
      cells.begin(), cells.end(), [](const Cell& cell) { return !cell.text.empty(); }));
  const bool fits = 2 * filled >= dialect.columns && cells.size() <= dialect.columns + 1;
  if (!fits || filled < 2 || looksLikeKey(plainText(cells.front()))) return std::nullopt;
  const bool numbers = std::any_of(
      cells.begin(), cells.end(), [](const Cell& cell) { return lookAtNumber(cell.text).number; });
  return numbers ? std::nullopt : std::optional(row);
}

bool isUnitRow(const Cells& cells) {
  bool known = false;
  for (const Cell& cell : cells) {
    if (isMissing(cell.text)) continue;
    const bool bracketed = withoutBrackets(cell.text) != cell.text;
    const auto unit = readUnit(cell.text);
    if (!unit && !bracketed && (cell.text.size() > 6 || roleOfName(cell.text))) return false;
    known = known || unit;
  }
  return known;
}

bool tells(const HeaderRow& row) {
  return std::any_of(row.cells.begin(), row.cells.end(), [](const Cell& cell) {
    const NameAndUnit named = splitNameAndUnit(plainText(cell));
    return roleOfName(named.name).has_value() || readUnit(named.unit).has_value();
  });
}

// Candidates above the data, nearest first; commented ones only where there are no others.
std::vector<HeaderRow> rowsAbove(const std::vector<Line>& lines,
                                 std::size_t data,
                                 const Dialect& dialect) {
  std::vector<HeaderRow> plain, commented;
  std::size_t filled = 0;
  for (std::size_t i = data; i-- > 0 && filled < headerReach;) {
    if (trimmed(lines[i].text).empty()) continue;
    ++filled;
    auto row = headerRowAt(lines, i, dialect);
    if (!row) continue;
    (isComment(lines[i].text) ? commented : plain).push_back(std::move(*row));
  }
  return plain.empty() ? commented : plain;
}

struct Heading {
  std::optional<HeaderRow> names, above, units;
};

// The nearest row that says something, else the nearest; a row of units right below it; and where
// its cells are not all filled, the row of group names right above it.
Heading headingOf(const std::vector<HeaderRow>& rows) {
  Heading heading;
  std::size_t at = 0;
  if (rows.size() > 1 && isUnitRow(rows[0].cells)) heading.units = rows[at++];
  if (at >= rows.size()) return heading;
  const auto telling =
      std::find_if(rows.begin() + static_cast<std::ptrdiff_t>(at), rows.end(), tells);
  if (telling != rows.end()) at = static_cast<std::size_t>(telling - rows.begin());
  heading.names = rows[at];
  const bool gaps = std::any_of(rows[at].cells.begin(), rows[at].cells.end(), [](const Cell& cell) {
    return cell.text.empty();
  });
  if (gaps && at + 1 < rows.size() && rows[at + 1].line + 1 == rows[at].line)
    heading.above = rows[at + 1];
  return heading;
}

std::string cellText(const std::optional<HeaderRow>& row, std::size_t column) {
  return row && column < row->cells.size() ? plainText(row->cells[column]) : std::string();
}

// A line of units above the header that says so in its first cell: "Unit;s;mm;N", "Einheit". It has
// a cell for each column, or one more.
bool isUnitLine(const Cells& cells, const Dialect& dialect) {
  if (cells.size() < 2 || cells.front().text.empty()) return false;
  const std::string label = folded(plainText(cells.front()));
  constexpr std::array<std::string_view, 7> words{"unit",
                                                  "einheit",
                                                  "unidad",
                                                  "eenheid",
                                                  "単位",
                                                  "单位",
                                                  "單位"};  // also unité, unità, unidade
  const bool says = std::any_of(words.begin(), words.end(), [&](std::string_view word) {
    return label.find(word) != label.npos;
  });
  const bool known = std::any_of(cells.begin() + 1, cells.end(), [](const Cell& cell) {
    return readUnit(cell.text).has_value();
  });
  return says && known && cells.size() <= dialect.columns + 1;
}

// Units from such a line for the columns that have none.
std::vector<NameAndUnit> withUnitLine(std::vector<NameAndUnit> columns,
                                      const std::vector<Line>& above,
                                      const Dialect& dialect) {
  for (const Line& line : above) {
    const Cells cells = splitRow(line.text, dialect.delimiter);
    if (!isUnitLine(cells, dialect)) continue;
    const std::size_t shift = cells.size() > columns.size() ? 1 : 0;
    for (std::size_t column = 0; column < columns.size(); ++column) {
      const std::size_t cell = column + shift;
      if (cell == 0 || cell >= cells.size() || !columns[column].unit.empty()) continue;
      const std::string unit(withoutBrackets(plainText(cells[cell])));
      if (!isMissing(unit)) columns[column].unit = unit;
    }
  }
  return columns;
}

std::vector<NameAndUnit> columnsOf(const Heading& heading, const Dialect& dialect) {
  std::vector<NameAndUnit> columns;
  for (std::size_t column = 0; column < dialect.columns; ++column) {
    std::string name = cellText(heading.names, column);
    if (name.empty()) name = cellText(heading.above, column);
    NameAndUnit named = splitNameAndUnit(name);
    const std::string unit(withoutBrackets(cellText(heading.units, column)));
    if (!isMissing(unit)) named.unit = unit;
    if (named.unit.empty()) named.unit = dialect.units[column];
    columns.push_back(std::move(named));
  }
  while (!columns.empty() && columns.back().name.empty() &&
         dialect.filled[columns.size() - 1] == 0) {
    columns.pop_back();
  }
  return columns;
}

std::vector<Line> linesAbove(const std::vector<Line>& lines,
                             std::size_t data,
                             const Heading& heading) {
  std::vector<Line> above;
  for (std::size_t i = 0; i < data; ++i) {
    const auto is = [i](const std::optional<HeaderRow>& row) { return row && row->line == i; };
    if (!is(heading.names) && !is(heading.above) && !is(heading.units)) above.push_back(lines[i]);
  }
  return above;
}

Result<Heading> headingAt(const std::vector<Line>& lines,
                          std::int64_t row,
                          const Dialect& dialect) {
  const auto line = std::find_if(
      lines.begin(), lines.end(), [row](const Line& each) { return each.number == row; });
  if (line == lines.end()) {
    return Error{"header-row-not-found", {}, {"", row, 0}};
  }
  const auto index = static_cast<std::size_t>(line - lines.begin());
  Heading heading;
  heading.names = HeaderRow{index, headerCells(line->text, dialect)};
  if (index + 1 < lines.size()) {
    const auto below = headerRowAt(lines, index + 1, dialect);
    if (below && isUnitRow(below->cells)) heading.units = below;
  }
  return heading;
}

}  // namespace

Result<Table> findTable(std::string_view text,
                        const SampleLines& sample,
                        const Dialect& dialect,
                        std::optional<std::int64_t> headerRow) {
  const std::vector<Line>& lines = sample.head;
  Heading heading;
  std::size_t from = 0;
  if (headerRow) {
    auto asked = headingAt(lines, *headerRow, dialect);
    if (!asked) return asked.error();
    heading = std::move(asked).value();
    from = heading.names->line + 1;
  }
  const std::size_t data = firstDataLine(lines, dialect, from);
  if (data == lines.size()) return Error{"too-few-rows", {}, {}};
  if (!headerRow) heading = headingOf(rowsAbove(lines, data, dialect));
  Table table;
  table.columns = columnsOf(heading, dialect);
  if (heading.above) table.headerRows.push_back(lines[heading.above->line].number);
  if (heading.names) table.headerRows.push_back(lines[heading.names->line].number);
  if (heading.units) table.unitRow = lines[heading.units->line].number;
  table.firstDataRow = lines[data].number;
  table.firstDataByte = static_cast<std::size_t>(lines[data].text.data() - text.data());
  const std::vector<Line> above = linesAbove(lines, data, heading);
  table.columns = withUnitLine(std::move(table.columns), above, dialect);
  table.metadata = readMetadata(above, dialect.delimiter);
  return table;
}

}  // namespace dampwright
