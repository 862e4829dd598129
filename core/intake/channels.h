// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <span>
#include <string>
#include <vector>

#include "core/base/remark.h"
#include "core/base/result.h"
#include "core/base/units.h"
#include "core/intake/find_roles.h"
#include "core/intake/read_run.h"

namespace dampwright {

/// The unit that a column is read in.
struct ChosenUnit {
  Unit unit;
  std::string symbol;    ///< as written, or ours where it was assumed
  bool assumed = false;  ///< by plausibility only: remark unit-assumed
  bool volts = false;    ///< a voltage without scale: nothing can be read from it
};

/// What plausibility may lean on.
struct UnitHints {
  std::optional<double> rowsPerCycle;    ///< of the displacement
  std::optional<double> sampleRate;      ///< Hz, from preamble, profile or option
  std::span<const double> time;          ///< s, for a velocity
  std::span<const double> displacement;  ///< m, for a velocity
};

/// The unit of a role's column by option, rig profile, name or unit row, and else by what is
/// plausible for a damper on a rig: s, ms or µs by sampling rate and cycle, m, mm or µm by the span
/// of displacement, N or kN by the size of force, velocity by its displacement.
/// Errors: option-not-understood.
Result<ChosenUnit> chooseUnit(Role role,
                              const RoleChoice& choice,
                              const ColumnFacts& column,
                              const std::optional<std::string>& asked,
                              const UnitHints& hints);

/// The column in SI: unit.toSi(raw · scale + offset), scale and offset from the rig profile.
std::vector<double> toSi(std::span<const double> raw, const Unit& unit, const RoleChoice& choice);

/// Unit was assumed, with the span that it makes.
Remark unitAssumed(const SourceColumn& column,
                   const ChosenUnit& chosen,
                   std::span<const double> si);

}  // namespace dampwright
