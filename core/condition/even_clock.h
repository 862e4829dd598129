// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <span>
#include <vector>

#include "core/signal/resample.h"

namespace dampwright {

/// What the time column of a recording says about its clock.
struct ClockFinding {
  EvenClock clock;       ///< as it is, or the one to resample to
  bool even = true;      ///< rows are even but for the rounding of their stamps
  bool uneven = false;   ///< steps differ, gaps apart
  double worstStep = 0;  ///< s, largest deviation of a step from the usual one, gaps apart
  std::vector<std::size_t> gapsBehind;  ///< rows after which more than 1.5 rows are missing
};

/// Looks at stamps that never fall, at least 4 that are not all equal. Stamps rounded to a decimal
/// place count as even as long as rounding alone explains them.
ClockFinding lookAtClock(std::span<const double> times);

}  // namespace dampwright
