// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "core/base/result.h"
#include "core/intake/number_form.h"
#include "core/intake/split_row.h"
#include "core/intake/stamp.h"
#include "core/intake/text_lines.h"

namespace dampwright {

/// How the rows of a table are written.
struct Dialect {
  char delimiter = ',';
  std::size_t columns = 0;         ///< fields of a row, empty ones at its end included
  std::vector<char> numeric;       ///< per column: 1 where most rows hold a number
  std::vector<char> filled;        ///< per column: 1 where some row holds something
  std::vector<NumberForm> forms;   ///< per column
  std::vector<std::string> units;  ///< per column: what stands behind each of its numbers, or empty
  std::vector<StampForm> stamps;   ///< per column: how it writes the time of day, or none
  bool decimalProven = false;      ///< some column settles the decimal mark of the file
  char decimal = '.';  ///< of the file: of those columns that do not settle it themselves
  std::vector<std::size_t> open;  ///< columns of nothing but "1,234": only the user can tell
  std::vector<std::size_t> settledByOthers;  ///< columns of "1,234" that the other columns settled
};

struct DialectOptions {
  std::optional<char> delimiter, decimal, thousands;
};

/// The value of a cell in its column's form (of stamps in seconds); nothing where it holds none.
std::optional<double> readCell(std::string_view cell, const Dialect& dialect, std::size_t column);

/// Judges lines by what splits them into the most numbers and the least text. A comma never stands
/// for both delimiter and decimal mark unless the number is quoted; digits are grouped in thousands
/// only where a cell or another column proves it. A first line "sep=;" names the delimiter.
/// Errors: no-table (no two lines hold numbers), one-column, too-many-columns.
Result<Dialect> findDialect(const SampleLines& sample, const DialectOptions& options);

/// The row has as many fields as the dialect's rows, and a number or nothing in each column of
/// numbers, with numbers in at least half of them.
bool isDataRow(const std::vector<Cell>& cells, const Dialect& dialect);

}  // namespace dampwright
