// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cmath>
#include <cstddef>
#include <optional>
#include <vector>

#include "core/base/direction.h"

namespace dampwright {

/// What one block says in one direction. Forces are in the direction that resists the motion (they
/// may be negative). Where clipped or missing samples hide the figure, it is NaN.
struct Reading {
  double peakVelocity = 0;  ///< m/s, magnitude
  double displacement = 0;  ///< m, where the peak velocity stands, zero at mid-stroke of the block
  double force = 0;         ///< N at the peak velocity of the averaged loop
  double forceU = 0;        ///< N, type A standard uncertainty from cycle to cycle
  double forceDof = 0;      ///< degrees of freedom of forceU
  double noiseU = 0;        ///< N, what of it the noise of samples within the cycles explains
  double noiseDof = 0;
  double cyclesU = 0;    ///< N, type A of force pooled over the measurement, see core/uncertainty
  double cyclesDof = 0;  ///< 0: not known
  std::optional<double>
      dampingForce;          ///< N, gas taken off; nothing while the gas is not determined
  double forceTotalU = 0;    ///< N, combined standard uncertainty of force, see core/uncertainty
  double forceTotalDof = 0;  ///< effective degrees of freedom of forceTotalU
  double dampingForceTotalU = 0;  ///< N, combined standard uncertainty of dampingForce
  double dampingForceTotalDof = 0;
  double largestForce = 0;    ///< N, largest ordinate of the direction
  double largestForceU = 0;   ///< N, type A standard uncertainty from cycle to cycle
  double largestCyclesU = 0;  ///< N, type A of largestForce pooled over the measurement
  double largestCyclesDof = 0;
  double energy = 0;  ///< J absorbed in this half of the cycle

  bool isRead() const { return !std::isnan(force); }
};

/// A point of the force-velocity curve: a reading with the block that it came from.
struct CurvePoint {
  std::size_t block = 0;  ///< index into the measurement's blocks
  double stroke = 0;      ///< m
  Reading reading;
};

/// Force against velocity in one direction, by rising velocity. Points of different stroke stand
/// beside each other and are never joined.
struct Curve {
  Direction direction = Direction::Compression;
  std::vector<CurvePoint> points;
};

}  // namespace dampwright
