// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace dampwright {

/// Force of a gas charge on the rod, F(x) = F0·(L/(L − x))^n = F0·(1 − x/L)^(−n), with x positive
/// in compression. Written with 1/L, so that a constant force is the value 0. The outside pressure
/// is neglected: it makes L a fitted length, not the column's own. Source: polytropic compression.
struct GasColumn {
  double force = 0;          ///< N at x = 0
  double inverseLength = 0;  ///< 1/m, 1/L; |x/L| < 1
  double exponent = 1.2;     ///< n: 1 slow, 1.4 fast

  double at(double x) const;     ///< N
  double slope(double x) const;  ///< dF/dx, N/m
};

/// Derivatives of GasColumn::at by its parameters.
struct GasColumnGradient {
  double byForce = 0;          ///< 1
  double byInverseLength = 0;  ///< N·m
};

GasColumnGradient gradientOf(const GasColumn& column, double x);

}  // namespace dampwright
