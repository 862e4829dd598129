// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <optional>
#include <span>
#include <string>
#include <vector>

#include "core/base/remark.h"
#include "core/base/units.h"
#include "core/intake/name_and_unit.h"
#include "core/intake/read_run.h"
#include "core/intake/stamp.h"

namespace dampwright {

/// A column as the roles are looked for: `values` is empty where it holds text.
struct ColumnFacts {
  NameAndUnit heading;
  std::span<const double> values;
  StampKind stamps = StampKind::None;  ///< its cells are times of day, read in seconds
};

/// Which column holds what, and how that is known.
struct RoleChoice {
  std::optional<std::size_t> column;
  std::string why;               ///< code of core/words
  std::optional<RigColumn> rig;  ///< what the rig profile says of the column
};

struct Roles {
  RoleChoice time, displacement, force, velocity, temperature;
  std::vector<OpenPoint> open;  ///< force and displacement that nothing settles
  std::vector<Remark> remarks;
};

/// The columns' roles by option, rig profile, name and unit, and where names say nothing by shape:
/// what rises evenly is time, what is exactly the slope of another is its velocity, the smoothest
/// oscillation is displacement, a last one left over is force (remark role-assumed). Times of day
/// are time; numbers that only count the rows are nothing. Where two columns would do, nothing is
/// guessed. Errors: column-not-found with what there is.
Result<Roles> findRoles(std::span<const ColumnFacts> columns,
                        const ReadOptions& options,
                        const std::optional<RigProfile>& rig);

}  // namespace dampwright
