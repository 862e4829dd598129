// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <string_view>
#include <vector>

namespace dampwright {

inline constexpr std::size_t mostColumns = 1000;

/// The delimiter " " stands for runs of blanks and tabs.
inline constexpr char blanksDelimiter = ' ';

/// One field of a row, blanks at its ends and the quotes around it taken off; inside, a doubled
/// quote still stands as in the file.
struct Cell {
  std::string_view text;
  bool quoted = false;
};

/// Cuts a row into its fields, quotes as in RFC 4180. Never fails: a quote that does not close is
/// an ordinary letter. A row of nothing has one empty field, with blanks as delimiter none.
std::vector<Cell> splitRow(std::string_view row, char delimiter);

/// The text of a cell with doubled quotes made one and line ends made blanks.
std::string plainText(const Cell& cell);

/// "," ";" "|" "tab" "blanks": as in Source and in the options.
std::string delimiterName(char delimiter);

}  // namespace dampwright
