// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/curves/remove_gas.h"

namespace dampwright {

Curve removeGas(Curve curve, const GasLine& gas) {
  const double sign = signOf(curve.direction);
  for (CurvePoint& point : curve.points) {
    point.reading.dampingForce.reset();
    if (gas) point.reading.dampingForce = point.reading.force - sign * gas(point);
  }
  return curve;
}

}  // namespace dampwright
