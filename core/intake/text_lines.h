// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "core/base/result.h"

namespace dampwright {

inline constexpr std::size_t longestLine = std::size_t{1} << 20;  ///< bytes

/// One row of text: a line, or several where a quoted field runs over a line end.
struct Line {
  std::string_view text;    ///< without its line end
  std::int64_t number = 0;  ///< of its first line, from 1
  std::int64_t count = 1;   ///< lines that it takes up
  bool terminated = true;   ///< a line end follows: it was written whole
};

/// LF, CRLF, CR, CRCRLF, or "mixed", and the letter that ends every line.
struct LineEnd {
  std::string name = "LF";
  char letter = '\n';
};

/// By the first 64 KB, or by the first line end where that is further on.
LineEnd findLineEnd(std::string_view text);

/// The text with every line ended by LF, where its first 64 KB mix CR alone with other line ends
/// (CR inside quotes stays); nothing where they do not.
std::optional<std::string> withOneLineEnd(std::string_view text);

/// Walks through a text line by line without copying.
class LineReader {
 public:
  /// Starts at byte `from`, which is the start of line `number`.
  LineReader(std::string_view text, char lineEnd, std::size_t from = 0, std::int64_t number = 1);

  std::optional<Line> next();
  std::size_t position() const { return at_; }  ///< byte where the next line starts

 private:
  std::string_view text_;
  char lineEnd_;
  bool quotes_;  ///< the text holds a quote at all
  std::size_t at_;
  std::int64_t number_;
};

/// The first lines in full, and further ones from all over the text, to judge its dialect by. Line
/// numbers after the head are not known and 0.
struct SampleLines {
  std::vector<Line> head;
  std::vector<Line> spread;
};

/// A line that starts with #, % or //.
bool isComment(std::string_view line);

/// The error of a line over longestLine.
Error lineTooLong(const Line& line);

/// Errors: line-too-long with its row.
Result<SampleLines> sampleLines(std::string_view text, char lineEnd);

/// All lines (of a very long text the first two million), the first ones as the head: for the rare
/// file whose sample does not settle its dialect. Errors: line-too-long with its row.
Result<SampleLines> everyLine(std::string_view text, char lineEnd);

}  // namespace dampwright
