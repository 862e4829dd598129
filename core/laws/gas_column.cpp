// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/laws/gas_column.h"

#include <cmath>

namespace dampwright {

double GasColumn::at(double x) const { return force * std::pow(1 - x * inverseLength, -exponent); }

double GasColumn::slope(double x) const {
  return at(x) * exponent * inverseLength / (1 - x * inverseLength);
}

GasColumnGradient gradientOf(const GasColumn& column, double x) {
  const double remaining = 1 - x * column.inverseLength;
  const double ratio = std::pow(remaining, -column.exponent);
  return {ratio, column.force * ratio * column.exponent * x / remaining};
}

}  // namespace dampwright
