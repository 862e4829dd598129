// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/dialect.h"

#include <algorithm>
#include <array>
#include <functional>
#include <map>
#include <string>

#include "core/intake/letters.h"

namespace dampwright {
namespace {

// Where two split alike well, the earlier one is taken: a tab is never part of a number or name.
constexpr std::array<char, 5> delimiters = {'\t', ';', '|', ',', blanksDelimiter};

constexpr std::size_t rowsJudged = 300;

std::vector<std::string_view> rowsToJudge(const SampleLines& sample) {
  std::vector<std::string_view> rows;
  for (const auto* lines : {&sample.head, &sample.spread}) {
    for (const Line& line : *lines) {
      if (!trimmed(line.text).empty() && !isComment(line.text)) rows.push_back(line.text);
    }
  }
  return rows;
}

bool isStamp(std::string_view cell) {
  StampVotes votes;
  votes.add(cell);
  return votes.stamps() > 0;
}

struct RowCounts {
  int numbers = 0, texts = 0;
};

RowCounts countsOf(const std::vector<Cell>& cells) {
  RowCounts counts;
  for (const Cell& cell : cells) {
    if (lookAtNumber(cell.text).number || splitUnit(cell.text) || isStamp(cell.text)) {
      ++counts.numbers;
    } else if (!isMissing(cell.text)) {
      ++counts.texts;
    }
  }
  return counts;
}

// How well a delimiter splits: four times numbers less texts, summed over the rows of its best
// field count. One more for each row with a number at all lets "name;1;place" win over nothing, but
// not where blanks split: that is prose.
struct Split {
  char delimiter = ',';
  std::size_t columns = 0;
  std::int64_t score = 0;
};

Split judge(char delimiter, const std::vector<std::string_view>& rows) {
  std::map<std::size_t, std::int64_t> scores;
  for (const std::string_view row : rows) {
    const auto cells = splitRow(row, delimiter);
    const RowCounts counts = countsOf(cells);
    if (counts.numbers == 0) continue;
    const bool prose = delimiter == blanksDelimiter && counts.texts >= counts.numbers;
    scores[cells.size()] += 4 * std::max(counts.numbers - counts.texts, 0) + (prose ? 0 : 1);
  }
  Split best{delimiter, 0, -1};
  for (const auto& [columns, score] : scores) {
    if (score > best.score) best = {delimiter, columns, score};
  }
  return best;
}

Split bestSplit(const std::vector<std::string_view>& rows, std::optional<char> asked) {
  if (asked) return judge(*asked, rows);
  std::vector<std::string_view> some;
  const std::size_t stride = rows.size() / rowsJudged + 1;
  for (std::size_t i = 0; i < rows.size(); i += stride) some.push_back(rows[i]);
  Split best{',', 0, -1};
  for (const char delimiter : delimiters) {
    const Split split = judge(delimiter, some);
    const bool wider = split.score == best.score && split.columns > 1 && best.columns == 1;
    if (split.score > best.score || wider) best = split;
  }
  return best;
}

// What the cells of a column are: numbers, numbers with a unit, times of day, or text.
struct ColumnVotes {
  FormVotes form, formWithUnit;
  StampVotes stamps;
  std::map<std::string, int, std::less<>> units;
  int texts = 0, filled = 0;

  void add(std::string_view cell) {
    filled += cell.empty() ? 0 : 1;
    const NumberLook look = lookAtNumber(cell);
    form.add(look);
    if (look.number || isMissing(cell)) return;
    if (const auto split = splitUnit(cell)) {
      formWithUnit.add(lookAtNumber(split->number));
      ++units[std::string(split->unit)];
      return;
    }
    const int before = stamps.stamps();
    stamps.add(cell);
    texts += stamps.stamps() == before ? 1 : 0;
  }

  bool areStamps() const {
    return stamps.stamps() > form.numbers + formWithUnit.numbers && stamps.stamps() >= texts;
  }
  bool haveUnits() const {
    return !areStamps() && formWithUnit.numbers > form.numbers && formWithUnit.numbers >= texts;
  }
  bool areNumbers() const {
    if (areStamps() || haveUnits()) return true;
    return form.numbers > 0 && form.numbers >= texts + stamps.stamps() + formWithUnit.numbers;
  }
  std::string unit() const {
    if (!haveUnits()) return {};
    return std::ranges::max_element(units, {}, [](const auto& each) { return each.second; })->first;
  }
  const FormVotes& votes() const { return haveUnits() ? formWithUnit : form; }
};

std::vector<ColumnVotes> votesOf(const std::vector<std::string_view>& rows, const Split& split) {
  std::vector<ColumnVotes> votes(split.columns);
  for (const std::string_view row : rows) {
    const auto cells = splitRow(row, split.delimiter);
    if (cells.size() != split.columns || countsOf(cells).numbers == 0) continue;
    for (std::size_t column = 0; column < cells.size(); ++column) {
      votes[column].add(cells[column].text);
    }
  }
  return votes;
}

// The mark that the columns which prove one agree on, by the most numbers.
Dialect withFileDecimal(Dialect dialect, const std::vector<ColumnVotes>& votes) {
  int point = 0, comma = 0;
  for (std::size_t column = 0; column < votes.size(); ++column) {
    if (dialect.numeric[column] == 0) continue;
    const FormVotes& form = votes[column].votes();
    point += form.pointDecimal;
    comma += form.commaDecimal;
  }
  dialect.decimalProven = point + comma > 0;
  dialect.decimal = comma > point ? ',' : '.';
  return dialect;
}

char groupMarkOf(const FormVotes& votes, char decimal) {
  if (decimal == '.' && votes.commaGroups + votes.commaOpen > 0) return ',';
  if (decimal == ',' && votes.pointGroups + votes.pointOpen > 0) return '.';
  if (votes.blankGroups > 0) return ' ';
  return votes.apostropheGroups > 0 ? '\'' : char{0};
}

// A column that does not settle its own form takes the file's. "1.234" with nothing else in the
// file is a point as everywhere; "1,234" with nothing else is asked.
Dialect withForms(Dialect dialect,
                  const std::vector<ColumnVotes>& votes,
                  const DialectOptions& options) {
  const bool known = options.decimal || dialect.decimalProven;
  if (options.decimal) dialect.decimal = *options.decimal;
  for (std::size_t column = 0; column < votes.size(); ++column) {
    const FormVotes& form = votes[column].votes();
    const auto own = options.decimal ? std::nullopt : provenForm(form);
    NumberForm chosen = own.value_or(NumberForm{dialect.decimal, 0});
    if (!own) {
      const bool either = form.commaOpen > 0 || (known && form.pointOpen > 0);
      chosen.thousands = groupMarkOf(form, dialect.decimal);
      const bool grouped = chosen.thousands == '.' || chosen.thousands == ',';
      if (dialect.numeric[column] != 0 && either && !known) dialect.open.push_back(column);
      if (dialect.numeric[column] != 0 && either && known && grouped && !options.decimal) {
        dialect.settledByOthers.push_back(column);
      }
    }
    if (options.thousands && *options.thousands != chosen.decimal) {
      chosen.thousands = *options.thousands;
    }
    dialect.forms.push_back(chosen);
  }
  return dialect;
}

// "sep=;", as spreadsheets write it for each other.
std::optional<char> delimiterNamedIn(const SampleLines& sample) {
  if (sample.head.empty()) return std::nullopt;
  const std::string line = lowered(sample.head.front().text);
  const std::string_view text = trimmed(std::string_view(line).substr(line.starts_with('"')));
  if (!text.starts_with("sep=") || text.size() < 5) return std::nullopt;
  const bool known = std::ranges::find(delimiters, text[4]) != delimiters.end();
  return known ? std::optional(text[4]) : std::nullopt;
}

Error noTable(const std::vector<std::string_view>& rows) {
  const std::string start(rows.empty() ? std::string_view{} : startOf(rows.front(), 40));
  return {"no-table", {{"start", withSingleBlanks(start)}}, {}};
}

std::string_view withoutUnit(std::string_view cell, std::string_view unit) {
  return unit.empty() || !cell.ends_with(unit) ? cell
                                               : trimmed(cell.substr(0, cell.size() - unit.size()));
}

// A value in whatever decimal mark.
bool isValue(std::string_view cell, const Dialect& dialect, std::size_t column) {
  const StampForm stamp = dialect.stamps[column];
  if (stamp.kind != StampKind::None) return readStamp(cell, stamp).has_value();
  return lookAtNumber(withoutUnit(cell, dialect.units[column])).number;
}

}  // namespace

Result<Dialect> findDialect(const SampleLines& sample, const DialectOptions& options) {
  const auto rows = rowsToJudge(sample);
  const Split split =
      bestSplit(rows, options.delimiter ? options.delimiter : delimiterNamedIn(sample));
  if (split.columns == 0 || split.score <= 0) return noTable(rows);
  if (split.columns > mostColumns) {
    return Error{"too-many-columns",
                 {{"columns", static_cast<double>(split.columns), Quantity::Count},
                  {"most", static_cast<double>(mostColumns), Quantity::Count}},
                 {}};
  }
  const auto votes = votesOf(rows, split);
  Dialect dialect;
  dialect.delimiter = split.delimiter;
  dialect.columns = split.columns;
  for (const ColumnVotes& column : votes) {
    dialect.numeric.push_back(column.areNumbers());
    dialect.filled.push_back(column.filled > 0);
    dialect.units.push_back(column.unit());
    dialect.stamps.push_back(column.areStamps() ? column.stamps.form() : StampForm{});
  }
  const auto numbers = std::count(dialect.numeric.begin(), dialect.numeric.end(), 1);
  if (numbers == 0) return noTable(rows);
  if (numbers == 1) return Error{"one-column", {}, {}};
  return withForms(withFileDecimal(std::move(dialect), votes), votes, options);
}

std::optional<double> readCell(std::string_view cell, const Dialect& dialect, std::size_t column) {
  const StampForm stamp = dialect.stamps[column];
  if (stamp.kind != StampKind::None) return readStamp(cell, stamp);
  return parseNumber(withoutUnit(cell, dialect.units[column]), dialect.forms[column]);
}

bool isDataRow(const std::vector<Cell>& cells, const Dialect& dialect) {
  if (cells.size() < dialect.columns) return false;
  int numbers = 0, wanted = 0;
  for (std::size_t column = 0; column < cells.size(); ++column) {
    const std::string_view text = cells[column].text;
    const bool extra = column >= dialect.columns || dialect.filled[column] == 0;
    if (extra && !text.empty()) return false;
    if (extra || dialect.numeric[column] == 0) continue;
    const bool number = isValue(text, dialect, column);
    if (!number && !isMissing(text)) return false;
    numbers += number ? 1 : 0;
    ++wanted;
  }
  return numbers > 0 && 2 * numbers >= wanted;
}

}  // namespace dampwright
