// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/measure/measure_runs.h"

#include <algorithm>
#include <limits>

#include "core/curves/branches.h"
#include "core/curves/read_block.h"
#include "core/curves/remove_gas.h"
#include "core/identify/fit_laws.h"
#include "core/identify/gas_and_friction.h"
#include "core/measure/budget_figures.h"
#include "core/measure/direction.h"
#include "core/measure/remarks.h"
#include "core/measure/run_blocks.h"

namespace dampwright {
namespace {

GasAndFriction gasAndFriction(const Measurement& measurement) {
  std::vector<BlockToIdentify> blocks;
  for (const MeasuredBlock& measured : measurement.blocks) {
    BlockToIdentify& item = blocks.emplace_back();
    item.block = &measured.block;
    item.reading.compression = measured.compression;
    item.reading.rebound = measured.rebound;
  }
  IdentifyOptions options;
  for (const MeasuredRun& run : measurement.runs) {
    if (options.zeroState != ZeroState::DamperFitted) options.zeroState = run.zeroState;
  }
  return identifyGasAndFriction(blocks, options);
}

Curve curveOf(const Measurement& measurement, Direction direction) {
  std::vector<CurvePoint> points;
  for (std::size_t i = 0; i < measurement.blocks.size(); ++i) {
    const MeasuredBlock& measured = measurement.blocks[i];
    if (measured.block.kind == BlockKind::Hold) continue;
    points.push_back({i, measured.block.stroke, measured.reading(direction)});
  }
  const auto gasAt = [&](const CurvePoint& point) {
    return measurement.gas.at(measurement.blocks[point.block].block.mid +
                              point.reading.displacement);
  };
  return removeGas(makeCurve(direction, std::move(points)),
                   measurement.gas.force ? GasLine(gasAt) : GasLine());
}

/// Sets the loop widths, for which the gas force over the stroke must be known: the whole of it, or
/// its rate where the zero hides the rest (a constant falls out of a width).
void readWidths(Measurement& measurement) {
  const Gas& gas = measurement.gas;
  for (MeasuredBlock& measured : measurement.blocks) {
    const Block& block = measured.block;
    const auto gasAt = [&](double x) {
      if (gas.force) return gas.at(block.mid + x);
      return gas.rate ? *gas.rate * x : std::numeric_limits<double>::quiet_NaN();
    };
    const LoopWidths widths = loopWidths(block, gasAt);
    measured.loopWidth = widths.atZero;
    measured.halfSpeedWidth = widths.atHalfSpeed;
  }
}

/// Everything but the direction, which may turn the recordings round.
Result<Measured> measureAsRead(std::span<const Trace> traces,
                               const MeasureOptions& options,
                               const Progress& progress) {
  Measured measured;
  Measurement& measurement = measured.measurement;
  measurement.program = DAMPWRIGHT_VERSION;
  measurement.rig = accuracyOf(options.rig);
  for (std::size_t i = 0; i < traces.size(); ++i) {
    if (progress.cancelled()) return Error{"stopped", {}, {}};
    Result<ReadRun> read = readRunBlocks(traces[i], i, options, progress);
    if (!read) return read.error();
    measurement.runs.push_back(std::move(read.value().run));
    measured.motions.push_back(std::move(read.value().motion));
    std::ranges::move(read.value().blocks, std::back_inserter(measurement.blocks));
    progress.done(0.9 * static_cast<double>(i + 1) / static_cast<double>(traces.size()));
  }
  const GasAndFriction identified = gasAndFriction(measurement);
  measurement.gas = identified.gas;
  measurement.friction = identified.friction;
  readWidths(measurement);
  measurement.compression = curveOf(measurement, Direction::Compression);
  measurement.rebound = curveOf(measurement, Direction::Rebound);
  measurement.compressionLaws =
      identifyLaws(measurement.compression, measurement.gas, measurement.friction);
  measurement.reboundLaws =
      identifyLaws(measurement.rebound, measurement.gas, measurement.friction);
  measurement = withBudget(std::move(measurement));
  measurement.remarks = remarksOf(measurement);
  return measured;
}

}  // namespace

Result<Measured> measureRuns(std::span<const Trace> traces,
                             const MeasureOptions& options,
                             const Progress& progress) {
  Result<Measured> measured = measureAsRead(traces, options, progress);
  if (!measured) return measured;
  const DirectionFinding finding = findDirection(measured.value().measurement);
  if (finding == DirectionFinding::Turned) {
    measured = measureAsRead(turned(traces), options, progress);
    if (!measured) return measured;
  }
  if (progress.cancelled()) return Error{"stopped", {}, {}};
  Measurement& measurement = measured.value().measurement;
  measurement = withDirection(std::move(measurement), finding);
  progress.done(1);
  return measured;
}

}  // namespace dampwright
