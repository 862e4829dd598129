// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/bench_run.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>

#include "core/base/units.h"

namespace dampwright::bench {
namespace {

Damper carDamper() {
  Damper damper;
  damper.compression = leakAndOrificeLaw(3000, 0.03);
  damper.rebound = arctanShoulderLaw(700, 0.08, 600);
  damper.gas = {.force = 170, .length = 0.8, .atmosphere = 32};
  damper.friction = {.dry = 18};
  damper.oilStiffness = 8e6;
  return damper;
}

DrivePlan shortPlan() { return speedsPlan(0.05, 0.02, 1, {0.1, 0.5}, 4); }

TEST(BenchRun, TheSameInputGivesTheSameRecordingToTheLastBit) {
  const BenchRun first = simulate(carDamper(), shortPlan());
  const BenchRun again = simulate(carDamper(), shortPlan());
  EXPECT_EQ(first.measured.force, again.measured.force);
  EXPECT_EQ(first.measured.displacement, again.measured.displacement);
  const BenchRun other = simulate(carDamper(), shortPlan(), {.seed = 2});
  EXPECT_NE(first.measured.force, other.measured.force);
  EXPECT_EQ(first.clean.force, other.clean.force);
}

TEST(BenchRun, TruthIsTheValveAndGasAndFrictionAtTheLargestSpeed) {
  const Damper damper = carDamper();
  const BenchRun run = simulate(damper, shortPlan());
  for (const BlockTruth& block : run.blocks) {
    const HalfTruth pushed = block.mean(Direction::Compression);
    const HalfTruth pulled = block.mean(Direction::Rebound);
    EXPECT_NEAR(pushed.velocity, block.plan.speed, 1e-9);
    // the series stiffness lags by c/k: force loses 1 − cos of that angle, well under 0.2 N
    EXPECT_NEAR(pushed.force, damper.compression.force(block.plan.speed) + 18 + pushed.gas, 0.2);
    EXPECT_NEAR(pulled.force, damper.rebound.force(block.plan.speed) + 18 - pulled.gas, 0.2);
  }
}

TEST(BenchRun, NoiseHasTheSizeThatWasAskedFor) {
  const BenchRun run =
      simulate(carDamper(), shortPlan(), {.forceNoise = 3, .displacementNoise = 2e-5});
  double force = 0, place = 0;
  const auto n = static_cast<double>(run.clean.size());
  for (std::size_t i = 0; i < run.clean.size(); ++i) {
    force += std::pow(run.measured.force[i] - run.clean.force[i], 2) / n;
    place += std::pow(run.measured.displacement[i] - run.clean.displacement[i], 2) / n;
  }
  EXPECT_NEAR(std::sqrt(force), 3, 0.09);  // 4/√(2n), n > 8000
  EXPECT_NEAR(std::sqrt(place), 2e-5, 0.06e-5);
}

TEST(BenchRun, TheInstrumentBendsTheRecordingAndLeavesTheCleanOneAlone) {
  const Instrument quiet{.forceNoise = 0, .displacementNoise = 0, .temperatureNoise = 0};
  Instrument bent = quiet;
  bent.forceScale = 1.01;
  bent.forceZero = 5;
  bent.clipAt = 400;
  bent.forceStep = 0.5;
  bent.displacementOffset = 0.1;
  bent.displacementStep = 1e-5;
  const BenchRun run = simulate(carDamper(), shortPlan(), bent);
  const BenchRun straight = simulate(carDamper(), shortPlan(), quiet);
  EXPECT_EQ(straight.measured.force, straight.clean.force);
  EXPECT_EQ(straight.clean.force, run.clean.force);
  for (std::size_t i = 0; i < run.clean.size(); ++i) {
    const double wanted = std::clamp(1.01 * run.clean.force[i] + 5, -400.0, 400.0);
    EXPECT_NEAR(run.measured.force[i], wanted, 0.2501);  // half a quantum
    EXPECT_NEAR(run.measured.displacement[i], run.clean.displacement[i] + 0.1, 0.501e-5);
  }
}

// A force late by τ opens the loop: F(v = 0)/F_max = sin ωτ, 2.094 % for 2 ms at 100/min.
TEST(BenchRun, ADelayOpensTheLoopOfAViscousDamper) {
  Damper damper;
  damper.compression = damper.rebound = linearLaw(1500);
  DrivePlan plan;
  plan.steps = {BlockPlan{.speed = 0.05 * 2 * pi * 100 / 60, .stroke = 0.1, .turns = 3}};
  const Instrument late{.rate = 2000, .forceNoise = 0, .displacementNoise = 0, .forceDelay = 0.002};
  const BenchRun run = simulate(damper, plan, late);
  const double top = (run.blocks.front().cycles[0].start + run.blocks.front().cycles[0].end) / 2;
  const auto sample = static_cast<std::size_t>(std::lround(top * 2000));
  const double off = static_cast<double>(sample) / 2000 - top;
  const double omega = 2 * pi * 100 / 60;
  EXPECT_NEAR(run.measured.force[sample] / 785.398163, std::sin(omega * (0.002 - off)), 1e-4);
  EXPECT_NEAR(std::sin(omega * 0.002), 0.02094, 1e-5);
}

// Inertia amplitude mω²X: 5.483 N for each kg at 100 mm, 100/min.
TEST(BenchRun, AMovingMassAddsItsInertia) {
  DrivePlan plan;
  plan.steps = {BlockPlan{.speed = 0.05 * 2 * pi * 100 / 60, .stroke = 0.1, .turns = 3}};
  const Instrument heavy{.forceNoise = 0, .displacementNoise = 0, .movingMass = 2};
  const BenchRun run = simulate(Damper{}, plan, heavy);
  const BlockTruth& block = run.blocks.front();
  const auto sample = static_cast<std::size_t>(std::ceil(block.cycles[0].start * 2000));
  EXPECT_NEAR(run.measured.force[sample], 2 * 5.483, 2e-3);
}

TEST(BenchRun, AClockErrorStretchesTrueTimeBehindTheStamps) {
  const BenchRun run = simulate(
      carDamper(), shortPlan(), {.clockErrorPercent = 1, .forceNoise = 0, .displacementNoise = 0});
  const Drive drive(shortPlan());
  for (const std::size_t i : {1000u, 5000u, 8000u})
    EXPECT_NEAR(run.measured.displacement[i], drive.at(run.measured.time[i] * 1.01).x, 1e-12);
}

TEST(BenchRun, EnergyOfABlockIsThatOfAViscousCycle) {
  Damper damper;
  damper.compression = linearLaw(800);
  damper.rebound = linearLaw(2400);
  DrivePlan plan;
  plan.steps = {BlockPlan{.speed = 0.05 * 2 * pi * 100 / 60, .stroke = 0.1, .turns = 4}};
  // asymmetric linear damper 2400/800: 131.594725 J, π(c1 + c2)/2·ωX²
  EXPECT_NEAR(simulate(damper, plan).blocks.front().meanEnergy(), 131.594725, 1e-4);
}

}  // namespace
}  // namespace dampwright::bench
