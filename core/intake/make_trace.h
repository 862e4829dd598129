// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>

#include "core/base/result.h"
#include "core/intake/read_columns.h"
#include "core/intake/read_run.h"
#include "core/intake/stamp.h"

namespace dampwright {

/// What the table gives once its text is read: numbers by column, and how the file was understood
/// so far (everything of Source but its columns).
struct ReadTable {
  Source source;
  std::vector<NameAndUnit> headings;
  std::vector<StampKind> stamps;  ///< per heading: how its column writes the time of day
  Columns columns;
  std::vector<Remark> remarks;
};

/// Columns to channels: roles, units, clock, signs. While something that stops is open the reading
/// has no trace. Errors: column-not-found, option-not-understood.
Result<RunReading> makeTrace(ReadTable table,
                             const ReadOptions& options,
                             const std::optional<RigProfile>& rig);

}  // namespace dampwright
