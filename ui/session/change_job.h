// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <string_view>

#include "core/job/job.h"

namespace dampwright {

// Each takes the job as it is and returns it changed; what does not fit leaves it as it is.

/// The draft with one item for each place of its vehicle, in the order of reading.
Job withAllCorners(Job job);

/// The item of a corner; nothing where the vehicle has none of that name.
const JobItem* findItem(const Job& job, std::string_view corner);
const JobPhase* findPhase(const Job& job, std::string_view corner, int phase);

/// The run taken out; a phase that loses its last run goes with it.
Job withoutRun(Job job, std::string_view corner, int phase, int run);

/// A phase's runs moved to the corner `to`, behind the phase of the same state and setting there.
Job withRunsMoved(Job job, std::string_view from, int phase, std::string_view to);

/// Customer, vehicle, plate, technician and notes of `details`; everything else stays.
Job withDetails(Job job, const Job& details);

Job withDamper(Job job, std::string_view corner, DamperCard card);
Job withStruckOut(Job job, std::string_view corner, int phase, int run, const TimeSpan& span);
/// The run read by these answers and, where `rig` is given, by the profile of that name.
Job withReading(Job job,
                std::string_view corner,
                int phase,
                int run,
                const ReadOptions& answers,
                const std::optional<std::string>& rig);
const JobRun* findRun(const Job& job, std::string_view corner, int phase, int run);
Job withPutBack(Job job, std::string_view corner, int phase, int run, const TimeSpan& span);

/// Runs added to the corner's phase of this state and setting, which is made where there is none.
Job withRuns(Job job, std::string_view corner, const JobPhase& runs);

}  // namespace dampwright
