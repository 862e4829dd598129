// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>

#include "core/intake/read_run.h"
#include "core/rig/read_options.h"
#include "core/rig/rig_profile.h"

namespace dampwright {

/// What the columns window works on: a rig profile as it will be, and what a profile cannot say
/// before the file is cut into columns.
struct ColumnsDraft {
  RigProfile base;   ///< as kept, or empty
  RigProfile rig;    ///< with what was changed: columns, units, signs, zero state, the rig itself
  ReadOptions text;  ///< encoding, delimiter, decimal, header row, sample rate; and the unit of a
                     ///< column that the profile does not name

  bool operator==(const ColumnsDraft&) const = default;
};

/// A draft of a run that is read by `rig` and `answers`.
ColumnsDraft draftOf(const std::optional<RigProfile>& rig, const ReadOptions& answers);

/// The profile's entry for a role; null for Role::Other.
std::optional<RigColumn>* columnFor(RigProfile& rig, Role role);
const std::optional<RigColumn>* columnFor(const RigProfile& rig, Role role);

/// A column as a profile names it: by its name where that is its own, else by its number.
RigColumn rigColumn(const Source& source, int index);

/// The column (from 1) takes the role, and loses every other; what the role's last column had as
/// scale goes with it, its unit stays. `source` is how the file is understood now.
ColumnsDraft withRole(ColumnsDraft draft, const Source& source, Role role, int index);

/// The role's column read in another unit.
ColumnsDraft withUnit(ColumnsDraft draft, const Source& source, Role role, const std::string& unit);

/// The calibration of the role's column: SI value = unit of (raw · scale + offset).
ColumnsDraft withCalibration(
    ColumnsDraft draft, const Source& source, Role role, double scale, double offset);

/// What is kept when the layout is to be remembered: the rig under `name`, with every column as the
/// reading has it, found again by `signature` (empty: only runs that name it are read by it), and
/// the answers that stay with the run alone.
struct Remembered {
  RigProfile rig;
  ReadOptions answers;
};
Remembered remembered(const ColumnsDraft& draft,
                      const Source& source,
                      const std::string& name,
                      const std::string& signature);

/// The answers of this run alone: all that the draft says otherwise than the profile that is kept.
ReadOptions answersOf(const ColumnsDraft& draft);

/// Whether the draft changes what only a rig profile can hold (calibration, delay, load cell …).
bool needsProfile(const ColumnsDraft& draft);

}  // namespace dampwright
