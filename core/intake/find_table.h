// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <optional>
#include <string>
#include <utility>
#include <vector>

#include "core/base/result.h"
#include "core/intake/dialect.h"
#include "core/intake/name_and_unit.h"
#include "core/intake/text_lines.h"

namespace dampwright {

/// Where the table stands in its text and what is written above it.
struct Table {
  std::vector<NameAndUnit> columns;  ///< nameless columns that hold nothing, at the end, left out
  std::vector<std::int64_t> headerRows;  ///< lines from 1, empty where there is no header
  std::int64_t unitRow = 0;              ///< line from 1, 0 none
  std::int64_t firstDataRow = 0;         ///< line from 1
  std::size_t firstDataByte = 0;         ///< where that line starts in the text
  std::vector<std::pair<std::string, std::string>> metadata;  ///< in file order, keys all different

  bool named() const { return !headerRows.empty(); }
};

/// Finds the first of at least three rows of data on end (in a shorter table: the longest run), the
/// header and unit row above it, and reads the rest above as "key: value" lines. `headerRow`, a
/// line from 1, settles the header. Errors: no-table, header-row-not-found, too-few-rows (fewer
/// than 2).
Result<Table> findTable(std::string_view text,
                        const SampleLines& sample,
                        const Dialect& dialect,
                        std::optional<std::int64_t> headerRow);

}  // namespace dampwright
