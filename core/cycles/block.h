// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <optional>
#include <vector>

#include "core/base/remark.h"

namespace dampwright {

enum class BlockKind { Sine, Crank, Triangle, Sweep, Hold, Other };

/// One cycle, from a lower turning point (fully in rebound) over the upper one to the next lower.
/// Times are on the clock of the file, placed between samples.
struct Cycle {
  double start = 0, top = 0, end = 0;  ///< s
  bool conditioning = false;           ///< left out by the conditioning rule
  bool struckOut = false;              ///< left out by the technician

  bool used() const { return !conditioning && !struckOut; }
};

/// The mean of a block's used cycles on an even phase grid, phase 0 at the lower turning point.
/// Sample i is at phase i/size; the grid is closed (sample `size` would be sample 0 again).
struct Loop {
  std::vector<double> displacement;  ///< m, zero at the block's mid-stroke
  std::vector<double> velocity;      ///< m/s
  std::vector<double> force;  ///< N; NaN at a phase that no used cycle has a sound sample for
  std::vector<double>
      forceSpread;  ///< N, standard deviation of single cycles about the mean; empty for one cycle
  double period = 0;   ///< s
  double top = 0.5;    ///< [1] phase of the upper turning point
  int cycles = 0;      ///< how many were averaged
  double samples = 0;  ///< recorded samples in one cycle, of which the grid was made

  std::size_t size() const { return displacement.size(); }
};

/// Neighbouring cycles alike in stroke and period (a speed block), or a standstill (kind Hold: no
/// cycles, no loop).
struct Block {
  BlockKind kind = BlockKind::Other;
  double start = 0, end = 0;  ///< s, clock of the file
  std::vector<Cycle> cycles;  ///< all of them, in time order
  double frequency = 0;       ///< Hz, of the used cycles
  double stroke = 0;          ///< m, peak to peak
  double mid = 0;             ///< m, mid-stroke on the rig's scale; of a hold: where it stands
  double holdForce = 0;       ///< N, mean force of a hold
  double holdForceU = 0;      ///< N, its standard uncertainty from scatter
  std::optional<double> temperature;  ///< °C, mean over the used cycles
  Loop loop;                  ///< empty (size 0) for a hold and where every cycle is struck out
  std::vector<Loop> singles;  ///< each used cycle on the same grid (cycles = 1), for spread and
                              ///< type A; its velocity is the mean loop's, scaled to its own period
  std::vector<Remark> remarks;

  int cyclesUsed() const {
    int used = 0;
    for (const Cycle& cycle : cycles) used += cycle.used() ? 1 : 0;
    return used;
  }
};

}  // namespace dampwright
