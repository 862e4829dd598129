// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <memory>
#include <optional>

#include "core/base/result.h"
#include "core/measure/measure_runs.h"
#include "core/verdict/verdict.h"

namespace dampwright {

/// Which measurement: the damper of a corner and the index of its phase (as found, after work, a
/// setting).
struct PhaseKey {
  QString corner;
  int phase = 0;

  bool operator==(const PhaseKey&) const = default;
};

/// One run file: its phase and its index there.
struct RunPlace {
  PhaseKey phase;
  int run = 0;

  bool operator==(const RunPlace&) const = default;
};

/// What is known of one phase. `measured` and `verdict` are the newest results; `busy` while a
/// newer one is made.
struct PhaseState {
  bool busy = false;
  double progress = 0;
  std::shared_ptr<const Measured> measured;
  std::optional<Verdict> verdict;
  std::optional<Error> problem;  ///< why there is no measurement
};

}  // namespace dampwright
