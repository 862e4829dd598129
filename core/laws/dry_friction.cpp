// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/laws/dry_friction.h"

#include <cmath>

namespace dampwright {

double DryFriction::at(double velocity) const { return force * std::tanh(velocity / changeSpeed); }

DryFrictionGradient gradientOf(const DryFriction& friction, double velocity) {
  const double ratio = velocity / friction.changeSpeed;
  const double sign = std::tanh(ratio);
  return {sign, -friction.force * (1 - sign * sign) * ratio / friction.changeSpeed};
}

}  // namespace dampwright
