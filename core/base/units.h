// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string_view>

#include "core/base/quantity.h"

namespace dampwright {

/// A unit as it stands in files: SI value = value · siPerUnit + offset.
struct Unit {
  std::string_view symbol;  ///< as we write it
  Quantity quantity = Quantity::None;
  double siPerUnit = 1;
  double offset = 0;  ///< only temperatures have one (to °C)

  double toSi(double value) const { return value * siPerUnit + offset; }
  double fromSi(double si) const { return (si - offset) / siPerUnit; }
};

inline constexpr double metresPerInch = 0.0254;             ///< exact by definition
inline constexpr double newtonsPerKilogramForce = 9.80665;  ///< exact by definition
inline constexpr double newtonsPerPoundForce =
    4.4482216152605;                             ///< exact: 0.45359237 kg · 9.80665 m/s²
inline constexpr double pi = 3.141592653589793;  ///< the circle's, to double precision

/// The unit of a symbol as found in a file ("kN", "mm/s", "µm", "lbf"), blanks and brackets already
/// taken off. Letter case counts only where it changes the meaning; nothing where the symbol is
/// unknown.
std::optional<Unit> unitFromSymbol(std::string_view symbol);

}  // namespace dampwright
