// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <algorithm>
#include <cstddef>
#include <span>
#include <vector>

#include "core/condition/motion.h"
#include "core/cycles/standstill.h"

namespace dampwright {

/// A cycle in samples (between them), with what tells it from its neighbours.
struct RawCycle {
  double start = 0, top = 0, end = 0;  ///< samples; start may be −1, end the number of samples
  double stroke = 0;                   ///< m, mean of both half strokes
  std::size_t segment = 0;             ///< stretch without a rest that it lies in, by number

  double period() const { return end - start; }

  /// A turn at the very edge of a recording may stand up to a sample before the first one.
  std::size_t firstSample() const { return static_cast<std::size_t>(std::max(start, 0.0)); }
};

/// What was found on the way, for those who ask why there is no cycle.
struct StrokeSummary {
  std::vector<RawCycle> cycles;  ///< in time order, conditioning and ramp cycles too
  std::vector<Standstill> holds;
  std::size_t turningPoints = 0;
  double longestStroke = 0;  ///< m, largest half stroke
};

/// Cuts a motion where it rests (0.1 s or more) and at missing stretches, and what lies between
/// into cycles from one lower turning point to the next. A rest is a dwell of the wave, and cuts
/// nothing, if the motion rests as long at the turning point next to it, or at those of its kind
/// before and after. Other rests of `holdTime` or more are holds. A half cycle at an edge counts
/// only if the motion turned there: the edge lies within 0.5 % of the stroke, or six noise levels,
/// of the next turning point of its kind. A cycle's two half strokes are alike to 10 %.
/// @param reversal  [1] share of its neighbours that a half stroke must exceed
StrokeSummary findCycles(const Motion& motion, double reversal, double holdTime);

}  // namespace dampwright
