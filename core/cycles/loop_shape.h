// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <vector>

#include "core/cycles/block.h"

namespace dampwright {

/// What the averaged displacement of a block says: how it moves, between which ends, how fast.
struct LoopShape {
  BlockKind kind = BlockKind::Other;  ///< Sine, Crank, Triangle or Other
  std::vector<double> velocity;       ///< m/s on the grid of the displacement
  double mid = 0, stroke = 0;         ///< m
};

/// Reads the shape from the displacement of an averaged loop (its velocity is not used).
///
/// Triangle (constant speed): between 10 and 90 % of the travel, out and back, within 0.7 % of the
/// stroke of a straight line. Crank: second harmonic of 1 % or more, in step with the dead centre,
/// and hardly any third. Sine: all harmonics together under 3 %. Velocity and ends come from the
/// harmonics that stand out of the noise by 5 standard errors (up to the 20th, or a third of the
/// samples); of a triangle, or a motion that harmonics do not meet, from a local polynomial.
/// Standard error of a sine's peak velocity: noise/amplitude·√(2/(samples·cycles)) of itself.
LoopShape loopShape(const Loop& loop);

}  // namespace dampwright
