// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <memory>
#include <optional>
#include <string>
#include <vector>

#include "core/base/progress.h"
#include "core/base/result.h"
#include "core/intake/read_run.h"
#include "core/job/job.h"
#include "core/measure/measure_runs.h"
#include "core/verdict/verdict.h"

namespace dampwright {

/// What is kept in memory of a run: the bytes until the book has them, the reading once it was
/// made.
struct RunInHand {
  std::shared_ptr<const std::string> bytes;
  std::shared_ptr<const RunReading> reading;
  ReadOptions answers = {};  ///< by which `reading` was made
  std::string rig = {};      ///< by whose profile
};

/// Everything that a measurement depends on, as a snapshot.
struct PhaseTask {
  std::vector<JobRun> runs;
  std::vector<RunInHand> inHand;  ///< one for each run
  DamperCard card;
  std::vector<RigProfile> profiles;
  std::optional<Limits> limits;
  QString bookFile;  ///< where the bytes of all other runs are
};

struct PhaseOutcome {
  std::vector<std::shared_ptr<const RunReading>>
      readings;  ///< of every run, as far as it could be read
  std::shared_ptr<const Measured> measured;
  std::optional<Verdict> verdict;  ///< where there were limits
  std::optional<Error> problem;
};

/// Reads what is not read yet (from the book, with a connection of this thread), measures and
/// judges. Never on the GUI thread.
PhaseOutcome measurePhase(const PhaseTask& task, const Progress& progress);

/// What a reading without a recording still asks.
Error openPointsError(const RunReading& reading, std::string_view file);

}  // namespace dampwright
