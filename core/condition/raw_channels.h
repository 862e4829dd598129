// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <vector>

#include "core/base/progress.h"
#include "core/base/remark.h"
#include "core/condition/even_clock.h"
#include "core/trace/trace.h"

namespace dampwright {

/// The channels of a trace with what was found wrong in them: no NaN is left, spikes are out, and
/// every sample that is not to be trusted has its bit of Doubt.
struct RawChannels {
  std::vector<double> displacement, force, velocity,
      temperature;  ///< SI; the last two may be empty
  std::vector<char> doubt;
  std::vector<Remark> remarks;
};

/// Looks through the rows of a trace as they stand. Remarks: missing-values, spikes-removed,
/// clipped-force. When asked to stop, what was done so far.
RawChannels lookThrough(const Trace& trace, double spikeThreshold, const Progress& progress);

/// The channels on the clock that was found; the same where it is even already. Gaps are marked.
/// Remarks: uneven-clock, gap.
RawChannels onEvenClock(RawChannels raw, const Trace& trace, const ClockFinding& finding);

}  // namespace dampwright
