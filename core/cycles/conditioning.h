// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "core/cycles/find_blocks.h"
#include "core/cycles/group_cycles.h"

namespace dampwright {

/// Where a block stands in its recording.
struct BlockPlace {
  double speed = 0;  ///< m/s, peak
  bool firstFast =
      false;  ///< first of the recording above the slow speed, or after a long standstill
};

/// How many cycles at the start of a block are left out, and how many the rule asks for.
struct Conditioning {
  int leftOut = 0, wanted = 0;
};

/// The conditioning rule: the wanted number, but never more than a third of the cycles, rounded
/// down, so that one is always kept. Cycles that still settle count among them and are left out
/// even beyond the wanted number. A slow block loses none.
Conditioning conditioningOf(const CycleGroup& group,
                            const BlockPlace& place,
                            const CycleOptions& options);

/// Is this speed that of a slow block?
bool isSlow(double speed, const CycleOptions& options);

}  // namespace dampwright
