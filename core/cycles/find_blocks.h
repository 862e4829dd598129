// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <vector>

#include "core/base/progress.h"
#include "core/base/result.h"
#include "core/condition/motion.h"
#include "core/cycles/block.h"
#include "core/cycles/time_span.h"

namespace dampwright {

struct CycleOptions {
  int firstBlockConditioning = 4;  ///< cycles left out of the recording's first block above
                                   ///< slowSpeed and of a block after a long standstill, >= 0
  int laterBlockConditioning = 1;  ///< cycles left out of every later block, >= 0
  double slowSpeed = 0.005;        ///< m/s; blocks up to it (and 5 % more) lose no whole cycle
  double longStandstill = 60;      ///< s
  double reversal = 0.1;  ///< [1] share of its neighbours that a half stroke must exceed, (0, 0.5)
  double alike = 0.04;    ///< [1] stroke and period of a block's cycles differ by less, (0, 0.5)
  double holdTime = 1;    ///< s, shortest standstill that is a hold
  std::vector<TimeSpan> struckOut;  ///< cycles that touch one are left out
};

/// Cuts a motion into half strokes, these into cycles from one lower turning point to the next, and
/// neighbouring cycles alike in stroke and period into blocks, each with its averaged loop.
/// Standstills outside cycles become blocks of kind Hold. Blocks stand in time order.
///
/// Noise, a dwell at a turning point and half cycles at the edges make no cycle; cycles on the ramp
/// between two blocks belong to neither. A turning point is placed between samples, half way
/// between the crossings of levels beside it: to about 1e-4 of the period at 2 kHz, 0.01 mm noise,
/// ±25 mm. Conditioning: the first `firstBlockConditioning` cycles of the first block, then
/// `laterBlockConditioning`, never more than a third of a block, rounded down.
/// Remarks of a block: few-conditioning-cycles, not-warm, too-few-cycles, cycle-struck-out.
/// Errors: no-full-cycle (values: turning_points, longest_stroke, duration), stopped.
Result<std::vector<Block>> findBlocks(const Motion& motion,
                                      const CycleOptions& options = {},
                                      const Progress& progress = {});

}  // namespace dampwright
