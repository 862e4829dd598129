// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>

#include "core/cycles/block.h"

namespace dampwright {

/// What a closed loop says as a whole. NaN where a hidden sample takes part.
struct LoopNumbers {
  double compressionEnergy = 0, reboundEnergy = 0;  ///< J absorbed on the way in and out
  double speedIntegral = 0;                         ///< m²/s, ∮v dx
  double phaseLag = 0;  ///< rad, first harmonic of force behind that of velocity, (−π, π]
  std::array<double, 2> endForces{};  ///< N at full compression and at full rebound

  double energy() const { return compressionEnergy + reboundEnergy; }
};

/// ∮F dx with the differential of the eighth-order central difference on the phase grid (not the
/// polygon, which loses (2π/N)²/6): an ellipse on 720 points to 1e-11, from 100 samples a cycle to
/// 1e-5. The halves part at the upper turning point and add up to the whole. ∮v dx without what
/// noise adds to it: products of different cycles where there are two or more. End forces are the
/// middle of a step that friction makes there.
LoopNumbers loopNumbers(const Block& block);

}  // namespace dampwright
