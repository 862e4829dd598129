// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <vector>

#include "core/job/job.h"
#include "ui/session/dropped.h"
#include "ui/session/phase_state.h"

namespace dampwright {

/// Where dropped runs and cards went.
struct Placed {
  Job job;                            ///< with them
  std::vector<RunBytes> files;        ///< of the runs that were taken
  std::vector<DropProblem> problems;  ///< not taken, or taken with something to look at
  std::optional<PhaseKey> last;       ///< the phase of the last run taken
};

/// Puts runs into a job: on `target` where one was aimed at, else on the corner that the file says,
/// else on `selected`. Runs of one corner and one setting make one phase (a file a speed); each
/// other setting that the files tell makes one of its own. A run that is in the job already is not
/// added again. Said as well: a file that tells another corner than `target`, a serial that differs
/// from the card or that is on two corners. A corner without a serial takes the run's, with the
/// book's card of it.
Placed placeRuns(const Job& job,
                 std::vector<DroppedRun> runs,
                 const std::string& target,
                 const std::string& selected);

/// Puts a damper card on `target`, else on the corner of its serial, else of its position.
Placed placeCard(const Job& job, const DamperCard& card, const std::string& target);

/// The kind of vehicle that dropped runs speak of when there is no job yet: a car where one of them
/// names a car's corner, else a single damper.
VehicleKind vehicleOf(const std::vector<DroppedRun>& runs);

}  // namespace dampwright
