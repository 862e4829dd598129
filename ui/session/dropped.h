// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <memory>
#include <optional>
#include <string>
#include <variant>
#include <vector>

#include "core/base/result.h"
#include "core/book/run_bytes.h"
#include "core/intake/read_run.h"
#include "core/job/job.h"

namespace dampwright {

/// A file of which something must be said: it was not taken, and why; or it was, and what to look
/// at.
struct DropProblem {
  QString file;
  Error error;
  bool taken = false;
};

/// A run file as it was dropped and read.
struct DroppedRun {
  RunBytes bytes;
  std::shared_ptr<const RunReading> reading;  ///< without a trace where it asks something first
  std::string rig;                            ///< name of the profile that it was read by
  std::optional<DamperCard> knownCard;  ///< the book's newest card of the serial that it tells
};

/// A job's document with the run files that lie beside it.
struct DroppedJob {
  Job job;
  std::vector<RunBytes> files;
};

using DroppedItem =
    std::variant<DroppedRun, Limits, RigProfile, DamperCard, DroppedJob, DropProblem>;

}  // namespace dampwright
