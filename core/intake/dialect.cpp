// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/dialect.h"

#include <algorithm>
#include <array>
#include <map>

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

struct RowCounts {
  int numbers = 0, texts = 0;
};

RowCounts countsOf(const std::vector<Cell>& cells) {
  RowCounts counts;
  for (const Cell& cell : cells) {
    if (lookAtNumber(cell.text).number) {
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

struct ColumnVotes {
  FormVotes form;
  int texts = 0, filled = 0;
};

std::vector<ColumnVotes> votesOf(const std::vector<std::string_view>& rows, const Split& split) {
  std::vector<ColumnVotes> votes(split.columns);
  for (const std::string_view row : rows) {
    const auto cells = splitRow(row, split.delimiter);
    if (cells.size() != split.columns || countsOf(cells).numbers == 0) continue;
    for (std::size_t column = 0; column < cells.size(); ++column) {
      const NumberLook look = lookAtNumber(cells[column].text);
      votes[column].form.add(look);
      votes[column].filled += cells[column].text.empty() ? 0 : 1;
      votes[column].texts += look.number || isMissing(cells[column].text) ? 0 : 1;
    }
  }
  return votes;
}

// The mark that the columns which prove one agree on, by the most numbers.
Dialect withFileDecimal(Dialect dialect, const std::vector<ColumnVotes>& votes) {
  int point = 0, comma = 0;
  for (std::size_t column = 0; column < votes.size(); ++column) {
    if (dialect.numeric[column] == 0) continue;
    const FormVotes& form = votes[column].form;
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
    const FormVotes& form = votes[column].form;
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

Error noTable(const std::vector<std::string_view>& rows) {
  const std::string start(rows.empty() ? std::string_view{} : startOf(rows.front(), 40));
  return {"no-table", {{"start", withSingleBlanks(start)}}, {}};
}

}  // namespace

Result<Dialect> findDialect(const SampleLines& sample, const DialectOptions& options) {
  const auto rows = rowsToJudge(sample);
  const Split split = bestSplit(rows, options.delimiter);
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
    dialect.numeric.push_back(column.form.numbers > 0 && column.form.numbers >= column.texts);
    dialect.filled.push_back(column.filled > 0);
  }
  const auto numbers = std::count(dialect.numeric.begin(), dialect.numeric.end(), 1);
  if (numbers == 0) return noTable(rows);
  if (numbers == 1) return Error{"one-column", {}, {}};
  return withForms(withFileDecimal(std::move(dialect), votes), votes, options);
}

bool isDataRow(const std::vector<Cell>& cells, const Dialect& dialect) {
  if (cells.size() < dialect.columns) return false;
  int numbers = 0, wanted = 0;
  for (std::size_t column = 0; column < cells.size(); ++column) {
    const std::string_view text = cells[column].text;
    const bool extra = column >= dialect.columns || dialect.filled[column] == 0;
    if (extra && !text.empty()) return false;
    if (extra || dialect.numeric[column] == 0) continue;
    const bool number = lookAtNumber(text).number;
    if (!number && !isMissing(text)) return false;
    numbers += number ? 1 : 0;
    ++wanted;
  }
  return numbers > 0 && 2 * numbers >= wanted;
}

}  // namespace dampwright
