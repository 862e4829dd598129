// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <vector>

#include "core/curves/curve.h"
#include "core/cycles/block.h"

namespace dampwright {

/// What the averaged loop of one block says.
struct BlockReading {
  double energy = 0;                  ///< J absorbed per cycle, ∮F dx
  double meanPower = 0;               ///< W
  double equivalentDamping = 0;       ///< N·s/m, ∮F dx / ∮v dx
  double phaseLag = 0;                ///< rad, first harmonic of force behind that of velocity
  std::array<double, 2> endForces{};  ///< N, signed, at full compression and at full rebound
  Reading compression, rebound;
};

/// Reads a block by the definitions: `force` is the force at the instant of largest |v| of the
/// averaged loop (triangle: at mid-stroke), in the direction that resists the motion, never
/// rectified; `largestForce` the largest ordinate of the direction.
///
/// The force is read by a local polynomial of degree 4 in phase around the instant, over the widest
/// window that agrees with the narrower ones; peak velocity from the harmonics of the displacement
/// that stand out of its noise (triangle: slope over the middle half of the stroke). Standard
/// uncertainties come from the scatter between the used cycles (dof = cycles − 1); a block of one
/// used cycle has only the scatter of samples about the fit to go by.
/// Accuracy: peak velocity 0.01 % for sine and crank; energy 0.03 % from 100 samples a cycle.
/// A hold, or a block without a loop, reads NaN throughout. What clipped or missing samples hide is
/// NaN: the force at the peak where a sample of the narrowest window is hidden, the largest
/// ordinate and the energy of a direction where any is.
BlockReading readBlock(const Block& block);

/// The points of one direction by rising velocity, points of one velocity by stroke. Points that
/// could not be read are left out.
Curve makeCurve(Direction direction, std::vector<CurvePoint> points);

}  // namespace dampwright
