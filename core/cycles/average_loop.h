// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <vector>

#include "core/condition/motion.h"
#include "core/cycles/block.h"
#include "core/cycles/find_cycles.h"
#include "core/cycles/loop_shape.h"
#include "core/signal/uniform_spline.h"

namespace dampwright {

inline constexpr std::size_t loopSize = 720;  ///< points of an averaged loop, half a degree each

/// The cycles of a block, laid over each other.
struct AveragedLoop {
  LoopShape shape;
  Loop mean;
  std::vector<Loop> singles;
};

/// Lays cycles on the phase grid. Each grid point holds the mean over its half degree of the cubic
/// spline through the samples: an interpolation where samples are few, an average where they are
/// many (it lowers the first harmonic by 3e-6 of itself). A point that touches a doubtful sample is
/// left out of its cycle; a phase at which no cycle is sound has force NaN.
class LoopAverager {
 public:
  /// Needs at least 4 samples.
  explicit LoopAverager(const Motion& motion);

  /// Needs at least one cycle; all of them inside the motion.
  AveragedLoop average(const std::vector<RawCycle>& cycles) const;

 private:
  Loop single(const RawCycle& cycle) const;
  bool sound(double from, double to) const;

  double rate_;
  UniformSpline displacement_, force_;
  std::vector<std::uint32_t> doubtBefore_;  // doubtful samples before each sample
};

}  // namespace dampwright
