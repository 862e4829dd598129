// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/identify/gas.h"

#include "core/laws/gas_column.h"

namespace dampwright {

double Gas::at(double rigDisplacement) const {
  if (!force) return 0;
  const double inverseLength = columnLength == 0 ? 0 : 1 / columnLength;
  return GasColumn{*force, inverseLength, exponent}.at(rigDisplacement - mid);
}

}  // namespace dampwright
