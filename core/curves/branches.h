// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <functional>
#include <vector>

#include "core/base/direction.h"
#include "core/cycles/block.h"

namespace dampwright {

/// Gas force [N] over displacement from the block's mid-stroke [m].
using GasOverStroke = std::function<double(double)>;

/// One speed of one half of a loop: force in the direction that resists the motion, gas taken off,
/// on the way up to the peak speed and on the way down from it.
struct BranchPoint {
  double speed = 0;                           ///< m/s, magnitude
  double accelerating = 0, decelerating = 0;  ///< N

  double mean() const { return (accelerating + decelerating) / 2; }
  double width() const { return decelerating - accelerating; }  ///< N, positive where force lags
};

/// Both branches of one half on a grid of speeds from 10 to 90 % of its peak, each read by a local
/// quadratic in speed over ±10 % of the peak (less near it). A speed that one branch does not hold
/// (a triangle has one speed only), or that clipped or missing samples hide, is left out.
std::vector<BranchPoint> branchesOf(const Block& block,
                                    Direction direction,
                                    const GasOverStroke& gas);

/// How wide a loop is open over velocity. NaN where not read, see branchesOf.
struct LoopWidths {
  double atZero = 0;       ///< N, at v = 0
  double atHalfSpeed = 0;  ///< N, at half the peak speed
};

/// Width at zero speed: from 8 to 40 % of the peak speed each branch is extrapolated to v = 0 by a
/// quadratic, gas taken off; at each end of the stroke the step that friction makes there falls out
/// of the mean of the two branches that meet; the width is upper end less lower end, which is the
/// mean over both directions of decelerating less accelerating branch. Half speed: the same mean of
/// the branches there. Positive where force lags behind velocity, as behind a series stiffness.
/// Accuracy: a Maxwell damper's loop to 0.3 %.
LoopWidths loopWidths(const Block& block, const GasOverStroke& gas);

}  // namespace dampwright
