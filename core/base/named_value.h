// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <variant>
#include <vector>

#include "core/base/quantity.h"

namespace dampwright {

/// One fact that a sentence needs: core/words and ui/text put it where the sentence says {name}.
struct NamedValue {
  std::string name;
  std::variant<double, std::string>
      value;  ///< a number in the SI unit of `quantity`, or words as they stand in a file
  Quantity quantity = Quantity::None;

  bool operator==(const NamedValue&) const = default;
};

using Values = std::vector<NamedValue>;

}  // namespace dampwright
