// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <limits>
#include <vector>

#include "core/base/units.h"
#include "core/measure/measurement.h"

/// A measurement put together by hand, so that a test knows every figure of it.
namespace dampwright {

/// One point: what was read at a speed. Type A is `typeA` N, by itself with 4 degrees of freedom.
struct MadePoint {
  double velocity = 0;  ///< m/s
  double force = 0;     ///< N
  double stroke = 0.05;
  double largest = 0;  ///< N, 0: as force
  double typeA = 1;    ///< N, of the point itself and pooled
  double pooledDof = 4;
};

inline void addPoint(Measurement& measurement, Direction direction, const MadePoint& point) {
  MeasuredBlock made;
  made.block.kind = BlockKind::Sine;
  made.block.stroke = point.stroke;
  made.block.frequency = point.velocity / (pi * point.stroke);
  made.block.end = 10;
  made.block.cycles = {{0, 0.5, 1, true, false}, {1, 1.5, 2, false, false}};
  made.block.temperature = 22;
  made.phaseLag = 0.1;
  made.endForces = {12, -3};
  Reading reading;
  reading.peakVelocity = point.velocity;
  reading.force = point.force;
  reading.forceU = point.typeA;
  reading.forceDof = 4;
  reading.cyclesU = point.typeA;
  reading.cyclesDof = point.pooledDof;
  reading.forceTotalU = point.typeA;
  reading.forceTotalDof = 4;
  reading.largestForce = point.largest > 0 ? point.largest : point.force;
  reading.largestForceU = point.typeA;
  reading.largestCyclesU = point.typeA;
  reading.largestCyclesDof = point.pooledDof;
  (direction == Direction::Compression ? made.compression : made.rebound) = reading;
  Curve& curve =
      direction == Direction::Compression ? measurement.compression : measurement.rebound;
  curve.points.push_back({measurement.blocks.size(), point.stroke, reading});
  measurement.blocks.push_back(made);
}

/// One run with its direction settled, no points, nothing known of the rig, so that the only part
/// of a budget is what the test puts in.
inline Measurement madeMeasurement() {
  Measurement measurement;
  measurement.program = "0.1.0";
  MeasuredRun run;
  run.source.file = {"made.csv", std::string(64, 'a'), 1234};
  run.source.rows = 20000;
  run.source.headerRows = {1};
  run.source.unitRow = 2;
  run.source.firstDataRow = 3;
  run.source.signature = "Time|Pos|Load";
  run.source.metadata = {{"serial", "INV-1"}, {"operator", "T. One"}};
  run.source.columns = {{1, "Time", "s", Role::Time, false, ""},
                        {2, "Load", "", Role::Force, true, ""}};
  run.sampleRate = 2000;
  run.zeroState = ZeroState::NoSpecimen;
  run.directionSettled = true;
  measurement.runs = {run};
  measurement.gas.reason = "gas-not-determined";
  measurement.friction.reason = "friction-not-determined";
  return measurement;
}

}  // namespace dampwright
