// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <string>
#include <string_view>
#include <utility>
#include <vector>

#include "core/base/progress.h"
#include "core/base/remark.h"
#include "core/base/result.h"
#include "core/intake/dialect.h"
#include "core/intake/find_table.h"

namespace dampwright {

/// A line of text among the rows of data: what a logger writes between its steps.
struct SectionMark {
  std::int64_t line = 0;  ///< from 1
  std::string text;
};

/// The numbers of a table and what was not one.
struct Columns {
  std::vector<std::vector<double>> values;  ///< per column; empty where the column is text, NaN
                                            ///< where a cell holds no number
  std::int64_t rows = 0;
  std::int64_t unreadable = 0;  ///< cells that hold something else than a number
  std::vector<Remark> remarks;  ///< missing-values, unreadable-cells, ragged-rows, bad-rows,
                                ///< section-lines, blank-rows, trailing-text, truncated-last-row
  std::vector<SectionMark> sections;  ///< at most the first 1000

  /// Line of the file in which a row of the table stands.
  std::int64_t lineOf(std::int64_t row) const;

  std::vector<std::pair<std::int64_t, std::int64_t>> lineBreaks;  ///< row, line: from here on end
};

/// Reads all rows from the table's first one on in one pass. A row that holds no number is left out
/// and counted, one of text (or that begins with text and holds few numbers) kept as a section
/// mark; one with too few or too many fields stays in place with NaN for what is not there, or for
/// all where fields cannot be told apart; what stands below the last good row is trailing text, or
/// a last row cut short where the file ends without a line end. Errors: line-too-long, stopped.
Result<Columns> readColumns(std::string_view text,
                            char lineEnd,
                            const Dialect& dialect,
                            const Table& table,
                            const Progress& progress);

}  // namespace dampwright
