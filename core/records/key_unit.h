// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string_view>

#include "core/base/quantity.h"

namespace dampwright {

/// A number's unit as the end of its key says it ("stroke_mm", "force_n_u", "equivalent_damping_
/// n_s_per_m"). The one place where a document's unit becomes SI and back.
struct KeyUnit {
  std::string_view suffix;
  Quantity quantity = Quantity::None;
  double siNumerator = 1;  ///< SI value = number · siNumerator / siDenominator
  double siDenominator = 1;
  double whenNull = 0;  ///< what `null` stands for: NaN (not determined), +inf for degrees of
                        ///< freedom and AICc

  double toSi(double number) const { return number * siNumerator / siDenominator; }

  /// The number for a document: the one with the fewest digits that reads back as the same double
  /// where there is one, else the nearest (one unit in the last place, 2.3 % of all doubles for
  /// mm).
  double fromSi(double si) const;
};

/// The unit of a key; a key without a known ending is a plain number.
const KeyUnit& unitOfKey(std::string_view key);

}  // namespace dampwright
