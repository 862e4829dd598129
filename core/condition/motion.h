// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <vector>

#include "core/base/remark.h"

namespace dampwright {

/// Doubtful samples are masked, never repaired: the numbers that stand there only keep a picture
/// whole.
enum Doubt : char {
  ForceClipped = 1,  ///< the force sat at the end of the cell's or the amplifier's range
  ForceMissing = 2,  ///< no force was recorded
  PlaceMissing = 4   ///< no displacement was recorded (force may not be read either)
};

/// A recording on an even clock, corrected for what the rig does to it. Signs as in core/trace.
/// Sample i is at startTime + i/rate.
struct Motion {
  double rate = 0;                   ///< Hz
  double startTime = 0;              ///< s, on the clock of the file
  std::vector<double> displacement;  ///< m, as the rig counts it (mid-positions belong to blocks)
  std::vector<double> velocity;      ///< m/s, derivative of the displacement
  std::vector<double> force;         ///< N, delay and moving mass taken out
  std::vector<double> temperature;   ///< °C, empty where not recorded
  std::vector<char>
      doubtful;  ///< why a sample is not to be read (bits of Doubt), 0 where it is sound
  std::vector<Remark> remarks;  ///< of conditioning only; those of the trace stay with it

  std::size_t size() const { return displacement.size(); }
  double timeOf(std::size_t sample) const { return startTime + static_cast<double>(sample) / rate; }
};

}  // namespace dampwright
