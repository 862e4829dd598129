// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cmath>
#include <memory>
#include <vector>

#include "core/base/units.h"
#include "core/measure/measure_runs.h"
#include "core/verdict/verdict.h"

namespace dampwright::made {

// A made damper: F = gas + c(direction) · v, sine of ±25 mm at each speed, six cycles a block of
// which the first is conditioning, 1 kHz.
inline constexpr double gas = 150, compressionDamping = 1000, reboundDamping = 2500;  // N, N·s/m
inline constexpr double amplitude = 0.025, rate = 1000;                               // m, Hz
inline constexpr int cyclesEach = 6;

inline double forceAt(double v) { return gas + (v > 0 ? compressionDamping : reboundDamping) * v; }

inline Loop loopAt(double speed) {
  constexpr int grid = 720;
  Loop loop;
  for (int i = 0; i < grid; ++i) {
    const double angle = 2 * pi * i / grid;
    loop.displacement.push_back(-amplitude * std::cos(angle));
    loop.velocity.push_back(speed * std::sin(angle));
    loop.force.push_back(forceAt(loop.velocity.back()));
  }
  loop.period = 2 * pi * amplitude / speed;
  loop.cycles = cyclesEach - 1;
  return loop;
}

inline Reading readingAt(double speed, Direction direction) {
  const double sign = signOf(direction);
  Reading reading;
  reading.peakVelocity = speed;
  reading.force = sign * forceAt(sign * speed);
  reading.forceU = 4;
  reading.forceTotalU = 4;
  reading.forceDof = 20;
  reading.dampingForce = reading.force - sign * gas;
  reading.largestForce = reading.force;
  return reading;
}

inline void addBlock(Measured& made, double speed) {
  Motion& motion = made.motions.back();
  MeasuredBlock measured;
  measured.block.kind = BlockKind::Sine;
  measured.block.loop = loopAt(speed);
  measured.block.stroke = 2 * amplitude;
  const double period = measured.block.loop.period;
  measured.block.frequency = 1 / period;
  measured.block.start = static_cast<double>(motion.size()) / rate;
  for (int cycle = 0; cycle < cyclesEach; ++cycle) {
    const double start = measured.block.start + cycle * period;
    measured.block.cycles.push_back({start, start + period / 2, start + period, cycle == 0, false});
  }
  measured.block.end = measured.block.start + cyclesEach * period;
  while (static_cast<double>(motion.size()) / rate < measured.block.end) {
    const double t = static_cast<double>(motion.size()) / rate - measured.block.start;
    const double angle = 2 * pi * t / period;
    motion.displacement.push_back(-amplitude * std::cos(angle));
    motion.velocity.push_back(speed * std::sin(angle));
    motion.force.push_back(forceAt(motion.velocity.back()));
  }
  measured.compression = readingAt(speed, Direction::Compression);
  measured.rebound = readingAt(speed, Direction::Rebound);
  const std::size_t index = made.measurement.blocks.size();
  made.measurement.compression.points.push_back({index, 2 * amplitude, measured.compression});
  made.measurement.rebound.points.push_back({index, 2 * amplitude, measured.rebound});
  made.measurement.blocks.push_back(measured);
}

inline std::shared_ptr<Measured> measured(const std::vector<double>& speeds = {
                                              0.05, 0.1, 0.2, 0.3, 0.6, 1.0}) {
  auto made = std::make_shared<Measured>();
  made->motions.emplace_back();
  made->motions.back().rate = rate;
  made->measurement.runs.emplace_back();
  made->measurement.runs.back().source.file.name = "front_left.csv";
  made->measurement.compression.direction = Direction::Compression;
  made->measurement.rebound.direction = Direction::Rebound;
  for (const double speed : speeds) addBlock(*made, speed);
  made->measurement.gas.force = gas;
  return made;
}

inline CheckVerdict forceCheck(
    Direction direction, double speed, double min, double max, VerdictWord word) {
  CheckVerdict judged;
  judged.check.check = "force";
  judged.check.direction = direction;
  judged.check.velocity = speed;
  judged.check.min = min;
  judged.check.max = max;
  judged.verdict = word;
  judged.measured = readingAt(speed, direction).force;
  judged.standardUncertainty = 4.5;
  judged.coverageFactor = 2;
  judged.expandedUncertainty = 9;
  judged.min = min;
  judged.max = max;
  judged.margin = std::min(*judged.measured - min, max - *judged.measured);
  return judged;
}

// Four force checks around the made damper's forces: three pass, rebound at 600 mm/s fails.
inline Verdict verdict() {
  Verdict made;
  made.word = VerdictWord::Fail;
  made.title = "Made limits";
  made.checks = {forceCheck(Direction::Rebound, 0.3, 540, 660, VerdictWord::Pass),
                 forceCheck(Direction::Rebound, 0.6, 1400, 1600, VerdictWord::Fail),
                 forceCheck(Direction::Compression, 0.3, 400, 500, VerdictWord::Pass),
                 forceCheck(Direction::Compression, 0.6, 700, 800, VerdictWord::Pass)};
  return made;
}

}  // namespace dampwright::made
