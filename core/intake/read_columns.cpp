// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/read_columns.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <optional>
#include <utility>

#include "core/intake/fast_row.h"
#include "core/intake/letters.h"

namespace dampwright {
namespace {

constexpr double absent = std::numeric_limits<double>::quiet_NaN();
constexpr std::int64_t rowsPerReport = 1 << 15;  // about 3 ms of work
constexpr std::size_t mostSections = 1000;
constexpr std::size_t longestSection = 200;  // bytes of its text that are kept
constexpr std::size_t formatRows = 20;       // rows that show how wide the last field is

struct Count {
  std::int64_t count = 0, firstRow = 0;

  void add(std::int64_t line, std::int64_t many = 1) {
    if (count == 0) firstRow = line;
    count += many;
  }
  void add(const Count& other) {
    if (other.count == 0) return;
    firstRow = count == 0 ? other.firstRow : std::min(firstRow, other.firstRow);
    count += other.count;
  }
};

// What was met since the last good row belongs to the data only when another good row follows.
struct Tally {
  Count missing, unreadable, ragged, bad, blank, section, comment;
  std::string example;  ///< the first unreadable cell
  std::vector<SectionMark> sections;

  void add(const Tally& other) {
    missing.add(other.missing);
    if (unreadable.count == 0) example = other.example;
    unreadable.add(other.unreadable);
    ragged.add(other.ragged);
    bad.add(other.bad);
    blank.add(other.blank);
    section.add(other.section);
    section.add(other.comment);
    const std::size_t room = mostSections - std::min(mostSections, sections.size());
    const std::size_t some = std::min(room, other.sections.size());
    sections.insert(sections.end(), other.sections.begin(), other.sections.begin() + some);
  }
};

class TableReader {
 public:
  TableReader(const Dialect& dialect, std::size_t bytes)
      : dialect_(dialect), fast_(dialect), bytes_(bytes) {
    columns_.values.resize(dialect.columns);
  }

  void take(const Line& line, std::size_t bytesDone) {
    lastLine_ = line;
    if (fast_.read(line.text)) {
      append(fast_.values(), line.number);
      good(line);
    } else {
      takeSlowly(line);
    }
    if (columns_.rows == 1000) reserve(bytesDone);
  }

  Columns finished() {
    cutShortRow();
    trimTo(goodRows_);
    addRemarks();
    return std::move(columns_);
  }

 private:
  void takeSlowly(const Line& line) {
    if (trimmed(line.text).empty()) return;
    if (isComment(line.text)) return addSection(line, pending_.comment);
    const auto cells = splitRow(line.text, dialect_.delimiter);
    const std::vector<double> nothing(dialect_.columns, absent);
    met_ = true;
    if (std::all_of(cells.begin(), cells.end(), [](const Cell& c) { return c.text.empty(); })) {
      pending_.blank.add(line.number);
      append(nothing, line.number);
    } else if (isSection(cells)) {
      addSection(line, pending_.section);
    } else if (!holdsNumber(cells)) {
      pending_.bad.add(line.number);
    } else if (!fieldsCanBeToldApart(cells)) {
      pending_.ragged.add(line.number);
      append(nothing, line.number);
    } else {
      takeCells(cells, line);
    }
  }

  // Text where numbers belong, and fewer numbers than a row of data has: "Step 2", "Speed;100", the
  // header once more.
  bool isSection(const std::vector<Cell>& cells) const {
    std::size_t numbers = 0, wanted = 0;
    bool text = false, first = true;
    for (std::size_t column = 0; column < dialect_.columns; ++column) {
      if (dialect_.numeric[column] == 0) continue;
      ++wanted;
      if (column >= cells.size()) continue;
      const std::string_view cell = cells[column].text;
      const bool number = readCell(cell, dialect_, column).has_value();
      numbers += number ? 1 : 0;
      if (first) text = !number && !isMissing(cell) && hasLetter(cell);
      first = false;
    }
    return text && 2 * numbers < wanted;
  }

  void addSection(const Line& line, Count& count) {
    met_ = true;
    count.add(line.number);
    if (pending_.sections.size() >= mostSections) return;
    pending_.sections.push_back(
        {line.number, std::string(startOf(trimmed(line.text), longestSection))});
  }

  // More fields than columns, or with blanks as delimiter fewer: nobody knows which is which.
  bool fieldsCanBeToldApart(const std::vector<Cell>& cells) const {
    const bool textLast = dialect_.numeric[dialect_.columns - 1] == 0;  // may hold the delimiter
    for (std::size_t i = dialect_.columns; i < cells.size() && !textLast; ++i) {
      if (!cells[i].text.empty()) return false;
    }
    return dialect_.delimiter != blanksDelimiter || cells.size() >= dialect_.columns;
  }

  bool holdsNumber(const std::vector<Cell>& cells) const {
    for (std::size_t column = 0; column < std::min(cells.size(), dialect_.columns); ++column) {
      if (readCell(cells[column].text, dialect_, column)) return true;
      if (lookAtNumber(cells[column].text).number) return true;
    }
    return false;
  }

  void takeCells(const std::vector<Cell>& cells, const Line& line) {
    Tally seen;
    std::vector<double> row(dialect_.columns, absent);
    int numbers = 0;
    for (std::size_t column = 0; column < dialect_.columns; ++column) {
      if (dialect_.numeric[column] == 0) continue;
      if (column >= cells.size()) {
        seen.ragged.add(line.number, seen.ragged.count == 0 ? 1 : 0);
        continue;
      }
      const std::string_view text = cells[column].text;
      if (const auto value = readCell(text, dialect_, column)) {
        row[column] = *value;
        ++numbers;
      } else if (isMissing(text)) {
        seen.missing.add(line.number);
      } else {
        if (seen.unreadable.count == 0) seen.example = std::string(startOf(text, 40));
        seen.unreadable.add(line.number);
      }
    }
    if (numbers == 0) {
      pending_.bad.add(line.number);
      return;
    }
    pending_.add(seen);
    append(row, line.number);
    if (seen.unreadable.count == 0 && seen.ragged.count == 0) good(line);
  }

  void append(const std::vector<double>& row, std::int64_t line) {
    for (std::size_t column = 0; column < dialect_.columns; ++column) {
      if (dialect_.numeric[column] != 0) columns_.values[column].push_back(row[column]);
    }
    if (columns_.lineBreaks.empty() || line != nextLine_) {
      columns_.lineBreaks.emplace_back(columns_.rows, line);
    }
    nextLine_ = line + 1;
    ++columns_.rows;
  }

  void good(const Line& line) {
    lastGood_[goodCount_++ % formatRows] = line.text;
    goodRows_ = columns_.rows;
    if (!met_) return;
    settled_.add(pending_);
    pending_ = {};
    met_ = false;
  }

  void reserve(std::size_t bytesDone) {
    const double rows = 1000.0 * static_cast<double>(bytes_) / static_cast<double>(bytesDone);
    for (std::vector<double>& values : columns_.values) {
      if (!values.empty()) values.reserve(static_cast<std::size_t>(rows * 1.02));
    }
  }

  void trimTo(std::int64_t rows) {
    for (std::vector<double>& values : columns_.values) {
      if (!values.empty()) values.resize(static_cast<std::size_t>(rows));
    }
    columns_.rows = rows;
  }

  // The text behind the decimal mark of a row's last field; 0 where there is none.
  std::size_t tailLength(std::string_view row) const {
    const auto cells = splitRow(row, dialect_.delimiter);
    const std::size_t last = dialect_.columns - 1;
    if (cells.size() != dialect_.columns || dialect_.numeric[last] == 0) return 0;
    const std::size_t mark = cells[last].text.find(dialect_.forms[last].decimal);
    return mark == std::string_view::npos ? 0 : cells[last].text.size() - mark - 1;
  }

  // A last row without line end is cut short where it is no good row, where its last number is
  // missing, or where that is shorter than all before it: the file was still being written.
  void cutShortRow() {
    if (!lastLine_ || lastLine_->terminated || columns_.rows == 0) return;
    const bool textBehind = pending_.bad.count + pending_.section.count > 0;
    if (goodRows_ != columns_.rows) {
      truncated_ = !textBehind && pending_.ragged.count + pending_.unreadable.count > 0;
    } else if (!textBehind && lastNumberIsShort()) {
      truncated_ = true;
      --goodRows_;
    }
  }

  bool lastNumberIsShort() const {
    const std::vector<double>& last = columns_.values[dialect_.columns - 1];
    if (!last.empty() && std::isnan(last.back())) return true;
    if (goodCount_ <= formatRows) return false;
    const std::size_t latest = (goodCount_ - 1) % formatRows;
    const std::size_t width = tailLength(lastGood_[(latest + 1) % formatRows]);
    for (std::size_t i = 0; i < formatRows; ++i) {
      if (i != latest && tailLength(lastGood_[i]) != width) return false;
    }
    return tailLength(lastGood_[latest]) < width;
  }

  void addRemark(const Count& count, Remark remark) {
    if (count.count == 0) return;
    remark.count = count.count;
    remark.firstRow = count.firstRow;
    columns_.remarks.push_back(std::move(remark));
  }

  void addRemarks() {
    addRemark(settled_.missing, Remark{"missing-values", Severity::Warning, {}});
    addRemark(settled_.unreadable,
              Remark{"unreadable-cells", Severity::Warning, {{"example", settled_.example}}});
    addRemark(settled_.ragged, Remark{"ragged-rows", Severity::Warning, {}});
    addRemark(settled_.bad, Remark{"bad-rows", Severity::Warning, {}});
    addRemark(settled_.section, Remark{"section-lines", Severity::Note, {}});
    addRemark(settled_.blank, Remark{"blank-rows", Severity::Note, {}});
    columns_.unreadable = settled_.unreadable.count;
    columns_.sections = std::move(settled_.sections);
    if (truncated_) {
      addRemark({1, lastLine_->number}, Remark{"truncated-last-row", Severity::Note, {}});
      return;
    }
    Count trailing = pending_.bad;
    trailing.add(pending_.section);
    trailing.add(pending_.ragged);
    trailing.add({pending_.unreadable.count > 0 ? 1 : 0, pending_.unreadable.firstRow});
    addRemark(trailing, Remark{"trailing-text", Severity::Note, {}});
  }

  const Dialect& dialect_;
  FastRow fast_;
  std::size_t bytes_;
  Columns columns_;
  Tally settled_, pending_;
  std::array<std::string_view, formatRows> lastGood_;
  std::size_t goodCount_ = 0;
  std::int64_t goodRows_ = 0, nextLine_ = 0;
  std::optional<Line> lastLine_;
  bool met_ = false;  ///< something unusual since the last good row
  bool truncated_ = false;
};

}  // namespace

std::int64_t Columns::lineOf(std::int64_t row) const {
  const auto after = std::upper_bound(
      lineBreaks.begin(), lineBreaks.end(), row, [](std::int64_t wanted, const auto& lineBreak) {
        return wanted < lineBreak.first;
      });
  if (after == lineBreaks.begin()) return 0;
  return (after - 1)->second + row - (after - 1)->first;
}

Result<Columns> readColumns(std::string_view text,
                            char lineEnd,
                            const Dialect& dialect,
                            const Table& table,
                            const Progress& progress) {
  LineReader lines(text, lineEnd, table.firstDataByte, table.firstDataRow);
  TableReader reader(dialect, text.size() - table.firstDataByte);
  for (std::int64_t n = 1; const auto line = lines.next(); ++n) {
    if (line->text.size() > longestLine) return lineTooLong(*line);
    reader.take(*line, lines.position() - table.firstDataByte);
    if (n % rowsPerReport != 0) continue;
    if (progress.cancelled()) return Error{"stopped", {}, {}};
    progress.done(static_cast<double>(lines.position()) / static_cast<double>(text.size()));
  }
  return reader.finished();
}

}  // namespace dampwright
