// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/core/measure/made_traces.h"

#include <random>

namespace dampwright::test {

Trace traceOf(const bench::Recording& recording) {
  Trace trace;
  trace.source.file.name = "made.csv";
  trace.source.rows = static_cast<std::int64_t>(recording.size());
  trace.time = recording.time;
  trace.displacement = recording.displacement;
  trace.force = recording.force;
  trace.temperature = recording.temperature;
  trace.zeroState = ZeroState::NoSpecimen;
  trace.directionSettled = true;
  return trace;
}

Trace noisyTrace(const bench::Recording& clean, const Noise& noise) {
  Trace trace = traceOf(clean);
  std::mt19937_64 random(noise.seed);
  std::normal_distribution<double> scatter(0, 1);
  for (double& force : trace.force) force += noise.force * scatter(random);
  for (double& place : trace.displacement) place += noise.displacement * scatter(random);
  return trace;
}

bench::Damper knownDamper() {
  bench::Damper damper;
  damper.compression = bench::twoSlopeLaw(1800, 500, 0.12);
  damper.rebound = bench::twoSlopeLaw(4200, 1300, 0.11);
  damper.gas.force = 160;
  damper.gas.length = 0.5;
  damper.friction.dry = 24;
  damper.friction.roundness = 0.0003;
  return damper;
}

bench::Damper unknownDamper() {
  bench::Damper damper = knownDamper();
  damper.compression = bench::leakAndOrificeLaw(6000, 0.02);
  damper.rebound = bench::arctanShoulderLaw(600, 0.08, 700);
  damper.friction.form = bench::FrictionForm::Bristle;
  damper.friction.breakaway = 24;
  return damper;
}

bench::DrivePlan programme() {
  return bench::speedsPlan(0.05, 0.005, 2, {0.05, 0.1, 0.2, 0.3, 0.5, 0.7, 1.0}, 10);
}

}  // namespace dampwright::test
