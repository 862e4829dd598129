// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <vector>

#include "core/cycles/find_cycles.h"

namespace dampwright {

/// Neighbouring cycles alike in stroke and period.
struct CycleGroup {
  std::vector<RawCycle> cycles;
  int settling = 0;    ///< so many at its start differ by more than the others do among themselves
  bool sweep = false;  ///< one cycle of a run whose speed changes from cycle to cycle
};

/// Groups neighbouring cycles whose stroke and period differ by less than `alike` from the group's
/// first mean. A single cycle beside a larger group is a ramp and left out; so are cycles at a
/// group's end that differ from its median by more than 0.5 % and more than the others do. Eight or
/// more neighbouring cycles whose peak speed changes one way all along, by 15 % or more in all, are
/// a sweep: each its own group.
std::vector<CycleGroup> groupCycles(const std::vector<RawCycle>& cycles, double alike);

}  // namespace dampwright
