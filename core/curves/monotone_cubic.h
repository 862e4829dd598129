// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <vector>

namespace dampwright {

/// The monotone cubic through points: between two points it never leaves their range.
/// Slopes inside: weighted harmonic mean of the neighbouring secants (0 at an extreme); at the ends
/// the three-point formula, kept in the shape of the points. Two points: the straight line.
/// Source: Fritsch & Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300; ends as in SciPy's
/// PchipInterpolator (Moler, Numerical Computing with MATLAB, 2004, section 3.6).
class MonotoneCubic {
 public:
  /// x rises strictly; at least 2 points.
  MonotoneCubic(std::vector<double> x, std::vector<double> y);

  /// Inside the points' range; outside, the end pieces run on.
  double at(double x) const;
  double slopeAt(double x) const;
  double straightAt(double x) const;  ///< the polygon through the points, for comparison

 private:
  std::size_t piece(double x) const;

  std::vector<double> x_, y_, slopes_;
};

}  // namespace dampwright
