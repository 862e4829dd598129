// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <span>
#include <vector>

#include "core/base/progress.h"
#include "core/base/result.h"
#include "core/condition/motion.h"
#include "core/measure/measurement.h"
#include "core/rig/damper_card.h"
#include "core/rig/rig_profile.h"
#include "core/trace/trace.h"

namespace dampwright {

struct MeasureOptions {
  int firstBlockConditioning = 4;  ///< cycles left out of a recording's first block, >= 0
  int laterBlockConditioning = 1;  ///< cycles left out of every later block, >= 0
  RigProfile rig;  ///< delay, moving mass, filter, accuracies; defaults where unknown
  std::optional<DamperCard> card;
  std::vector<std::vector<TimeSpan>>
      struckOut;  ///< for each run, spans whose cycles are left out; may be shorter
};

/// The measurement with the conditioned recordings that the window draws; one motion for each run,
/// same order.
struct Measured {
  Measurement measurement;
  std::vector<Motion> motions;
};

/// The pipeline: condition, cut into cycles and blocks, read the curve, identify gas, friction and
/// laws, budget. All traces belong to one damper at one setting. Errors: no-full-cycle,
/// trace-too-short, stopped.
Result<Measured> measureRuns(std::span<const Trace> traces,
                             const MeasureOptions& options,
                             const Progress& progress);

}  // namespace dampwright
