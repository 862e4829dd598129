// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string_view>

namespace dampwright {

/// How numbers are written in a column. `thousands` is 0 where digits are not grouped, ' ' also for
/// the no-break space.
struct NumberForm {
  char decimal = '.';
  char thousands = 0;

  bool operator==(const NumberForm&) const = default;
};

/// The number of a trimmed cell: sign (also U+2212), digits, one decimal mark, exponent with E or
/// D; digits grouped by `thousands` only in groups of three. Nothing for all else, also for "inf",
/// "nan", 1e999. Knows no locale.
std::optional<double> parseNumber(std::string_view cell, NumberForm form);

/// A cell that says that there is no value: empty, "nan", "inf", "n/a", "-", "null" and such.
bool isMissing(std::string_view cell);

/// What one cell gives away about the form of its column.
struct NumberLook {
  bool number = false;  ///< a number in some form
  char decimal = 0;     ///< proven decimal mark, 0 none
  char thousands = 0;   ///< proven thousands mark, 0 none
  char open = 0;        ///< the mark of "1,234" or "1.234", which may be either, else 0
};

NumberLook lookAtNumber(std::string_view cell);

/// A number with a known unit behind it: "12.5 mm", "120N", "20 °C".
struct NumberWithUnit {
  std::string_view number, unit;
};
std::optional<NumberWithUnit> splitUnit(std::string_view cell);

/// Votes of the cells of a column.
struct FormVotes {
  int numbers = 0, pointDecimal = 0, commaDecimal = 0, pointOpen = 0, commaOpen = 0;
  int pointGroups = 0, commaGroups = 0, blankGroups = 0, apostropheGroups = 0;

  void add(const NumberLook& look);
};

/// The form that a column's own cells prove; nothing where only the rest of the file can tell:
/// whole numbers, or marks that may be either.
std::optional<NumberForm> provenForm(const FormVotes& votes);

}  // namespace dampwright
