// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string_view>
#include <vector>

#include "core/intake/dialect.h"

namespace dampwright {

/// The values of a row straight from its bytes, where nothing in it is unusual: the way that nearly
/// every row of a file goes. Refers to the dialect.
class FastRow {
 public:
  struct Parsed {
    const char* end = nullptr;  ///< behind the value, nothing where there is none
    double value = 0;
  };

  explicit FastRow(const Dialect& dialect);

  /// True where the row is good; its values are then in values().
  bool read(std::string_view text);

  /// One for each column, NaN in those of text.
  const std::vector<double>& values() const { return values_; }

 private:
  const char* afterBlanks(const char* at, const char* end) const;
  const char* textField(const char* at, const char* end) const;
  Parsed stamp(const char* at, const char* end, StampForm form) const;
  static const char* behindUnit(const char* at, const char* end, std::string_view unit);

  const Dialect& dialect_;
  std::vector<double> values_;
  std::vector<char> plain_;  ///< per column: numbers and nothing else
};

}  // namespace dampwright
