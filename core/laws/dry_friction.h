// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace dampwright {

/// Dry friction with a rounded change of sign, F(v) = Fc·tanh(v/v_f).
struct DryFriction {
  double force = 0;        ///< N, Fc: the limit away from v = 0
  double changeSpeed = 1;  ///< m/s, v_f > 0

  double at(double velocity) const;  ///< N, with the sign of the velocity
};

/// Derivatives of DryFriction::at by its parameters.
struct DryFrictionGradient {
  double byForce = 0;        ///< 1
  double byChangeSpeed = 0;  ///< N·s/m
};

DryFrictionGradient gradientOf(const DryFriction& friction, double velocity);

}  // namespace dampwright
