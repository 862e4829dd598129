// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <span>

namespace dampwright {

/// A value with its standard uncertainty.
struct LineValue {
  double value = 0;
  double u = 0;
};

/// y = intercept + slope·x through points of equal weight.
struct StraightLine {
  double intercept = 0, interceptU = 0;
  double slope = 0, slopeU = 0;
  double correlation = 0;        ///< [1] of intercept and slope
  double residualDeviation = 0;  ///< s = √(Σr²/(n − 2)), unit of y
  double dof = 0;                ///< n − 2

  /// The line at x, with the standard uncertainty of the line itself.
  LineValue at(double x) const;
  /// The line at x, with the standard uncertainty of one new observation (prediction band).
  LineValue observationAt(double x) const;
};

/// Least-squares line. Needs two different x at least (else slope and its error are NaN); with two
/// points the errors are NaN. Sources: JCGM 100:2008 (GUM), H.3; M. G. Natrella, NBS Handbook 91
/// (1963), 5-4.1.
StraightLine fitLine(std::span<const double> x, std::span<const double> y);

}  // namespace dampwright
