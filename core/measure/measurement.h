// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <optional>
#include <string>
#include <vector>

#include "core/base/direction.h"
#include "core/base/remark.h"
#include "core/curves/curve.h"
#include "core/cycles/block.h"
#include "core/cycles/time_span.h"
#include "core/identify/fitted_law.h"
#include "core/identify/gas.h"
#include "core/rig/rig_accuracy.h"
#include "core/trace/trace.h"
#include "core/uncertainty/budget.h"

namespace dampwright {

/// Raised whenever an algorithm changes any figure.
inline constexpr int measurementMethod = 1;

/// One run file as it went into a measurement.
struct MeasuredRun {
  Source source;
  double sampleRate = 0;  ///< Hz
  ZeroState zeroState = ZeroState::Unknown;
  bool directionSettled = false;
  std::vector<TimeSpan> struckOut;
  std::vector<Remark> remarks;
};

/// One block and what it says. A hold has no readings.
struct MeasuredBlock {
  std::size_t run = 0;  ///< index into runs
  Block block;
  double energy = 0;             ///< J absorbed per cycle
  double meanPower = 0;          ///< W
  double equivalentDamping = 0;  ///< N·s/m, ∮F dx / ∮v dx
  double loopWidth = 0;       ///< N, at v = 0, gas taken off; NaN where gas or branch is not known
  double halfSpeedWidth = 0;  ///< N, at half the peak speed, the same
  double phaseLag = 0;        ///< rad, first harmonic of force behind velocity
  std::array<double, 2> endForces{};  ///< N at full compression and full rebound of the stroke
  Reading compression, rebound;

  const Reading& reading(Direction direction) const {
    return direction == Direction::Compression ? compression : rebound;
  }
};

/// Everything the bench says about one damper at one setting. It knows no limits and no coverage
/// factor.
struct Measurement {
  std::string program;  ///< version that measured
  int method = measurementMethod;
  std::vector<MeasuredRun> runs;
  std::vector<MeasuredBlock> blocks;  ///< in time order within a run
  Curve compression{Direction::Compression, {}}, rebound{Direction::Rebound, {}};
  Gas gas;
  Friction friction;
  std::vector<FittedLaw> compressionLaws, reboundLaws;
  double typeAPercent = 0;  ///< %, pooled cycle-to-cycle scatter of one averaged peak force
  double typeADof = 0;
  RigAccuracy rig;
  std::vector<BudgetLine> budget;
  std::vector<Remark>
      remarks;  ///< of the measurement as a whole; those of a file stand with its run

  const Curve& curve(Direction direction) const {
    return direction == Direction::Compression ? compression : rebound;
  }
  const std::vector<FittedLaw>& laws(Direction direction) const {
    return direction == Direction::Compression ? compressionLaws : reboundLaws;
  }
};

}  // namespace dampwright
