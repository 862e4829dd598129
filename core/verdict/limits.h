// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <vector>

#include "core/base/direction.h"

namespace dampwright {

enum class ForceBasis { AsMeasured, GasRemoved };
enum class DecisionRule { Guarded, Simple };

/// One line of a limit sheet. Which fields a kind of check needs and may have, its row in
/// check_kinds.h says. `min`, `max`, `target` are in the SI unit of the check's quantity.
struct Check {
  std::string check;  ///< kind: force | gas force | friction
  std::optional<Direction> direction;
  std::optional<double> velocity;  ///< m/s, magnitude
  std::string reading;             ///< at peak velocity (default) | largest
  std::optional<double> stroke;    ///< m, peak to peak; only points of this stroke (± 2 %) count
  std::string basis;               ///< of friction: half difference (default) | dry
  std::optional<double> min, max, target;
  double tolerancePercent = 0;   ///< % of target, added to …
  double toleranceAbsolute = 0;  ///< … this, SI

  bool operator==(const Check&) const = default;
};

/// What must hold for the limits to be valid at all; a mismatch is "not tested" with the reason.
struct LimitConditions {
  std::optional<double> stroke;                          // m
  std::optional<double> temperatureFrom, temperatureTo;  // °C
  std::string setting, waveform;

  bool operator==(const LimitConditions&) const = default;
};

struct Limits {
  std::string title, source, revision;
  ForceBasis forceBasis = ForceBasis::AsMeasured;
  DecisionRule decisionRule = DecisionRule::Guarded;
  double coverageFactor = 2;
  LimitConditions conditions;
  std::vector<Check> checks;

  bool operator==(const Limits&) const = default;
};

}  // namespace dampwright
