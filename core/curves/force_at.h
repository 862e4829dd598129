// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <functional>
#include <optional>
#include <string>

#include "core/curves/curve.h"

namespace dampwright {

/// Which figure of a reading is asked for.
enum class CurveFigure { Force, DampingForce, LargestForce };

struct ForceQuery {
  double speed = 0;              ///< m/s, magnitude, > 0
  std::optional<double> stroke;  ///< m; only points of this stroke (± 2 %) count
  CurveFigure figure = CurveFigure::Force;
  std::function<double(double)>
      law;  ///< the chosen law in terms of the same figure, N over m/s; may be empty
};

enum class HowRead {
  AtPoint,   ///< a measured point within 2 %, moved along the local slope
  Between,   ///< monotone cubic between two points
  EndSlope,  ///< up to 5 % outside the measured speeds, along the end slope: wants a remark
  NotRead    ///< see reason
};

struct ForceAtSpeed {
  HowRead how = HowRead::NotRead;
  double force = 0;  ///< N
  double slope = 0;  ///< N·s/m, of the curve at this speed
  double uInterpolation =
      0;              ///< N, |curve − law|/√3 (without a law: − straight line); 0 at a point
  double stroke = 0;  ///< m, of the points used
  std::size_t nearest = 0;      ///< index of the nearest point used, into the curve
  bool severalStrokes = false;  ///< no stroke was asked and the curve holds several: the one with
                                ///< the point nearest in speed was used
  std::string reason;  ///< code where not read: no-points | stroke-not-tested | speed-not-tested |
                       ///< gas-not-determined

  explicit operator bool() const { return how != HowRead::NotRead; }
};

/// The curve at a speed. A speed within 2 % of a measured one uses that point moved along the local
/// slope; between points a monotone cubic through the points of one stroke; up to 5 % outside, the
/// end slope; farther: nothing. Points of different stroke (more than 2 % apart) are never joined;
/// points of one stroke whose speeds differ by less than 0.5 % count as one, their mean.
/// Source: Fritsch & Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300 (the slopes of SciPy's
/// PCHIP).
ForceAtSpeed forceAt(const Curve& curve, const ForceQuery& query);

}  // namespace dampwright
