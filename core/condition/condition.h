// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>

#include "core/base/progress.h"
#include "core/base/result.h"
#include "core/condition/motion.h"
#include "core/rig/rig_profile.h"
#include "core/signal/low_pass.h"
#include "core/trace/trace.h"

namespace dampwright {

struct ConditionOptions {
  double forceDelay = 0;           ///< s, force lags displacement by this much, |delay| < 0.1
  double movingMass = 0;           ///< kg between cell and damper, >= 0
  std::optional<LowPass> lowPass;  ///< the same on displacement and force; nothing: no filter
  double spikeThreshold = 8;       ///< [1] robust standard deviations that make a spike, >= 4
};

/// Delay, moving mass and filter of the profile. "CFC 60", "CFC 180 ISO", "Butterworth
/// 200 Hz" (−3 dB after both passes) … name the filter; a name
/// that is none of these filters nothing.
ConditionOptions conditionOptions(const RigProfile& rig);

/// Makes a recording fit to be measured: an even clock (resampled only where it is uneven),
/// isolated spikes out, the force brought back by its delay, the inertia of the moving mass taken
/// off (F = F_cell − m·a), velocity and, by choice, the same zero-phase low-pass on displacement
/// and force. Clipped and missing stretches are marked doubtful, never repaired. The velocity is
/// always the derivative of the displacement; a velocity channel of the file is only compared with
/// it.
///
/// Remarks (those that the trace already carries are not repeated): uneven-clock, gap,
/// missing-values, spikes-removed, clipped-force, velocity-disagrees.
/// A filter too high for the sample rate (a cutoff over rate/2.6) filters nothing.
/// Errors: trace-too-short (values: rows, needed), gap-too-long (values: duration), stopped.
Result<Motion> condition(const Trace& trace,
                         const ConditionOptions& options = {},
                         const Progress& progress = {});

}  // namespace dampwright
