// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/bench_drive.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>

#include "core/base/units.h"

namespace dampwright::bench {
namespace {

DrivePlan oneBlock(BlockPlan block) {
  DrivePlan plan;
  plan.steps.push_back(block);
  return plan;
}

struct Extremes {
  double speed = 0, low = 1e9, high = -1e9, atSpeed = 0;
};

Extremes extremesOf(const Drive& drive, double from, double to) {
  Extremes found;
  for (int i = 0; i <= 200000; ++i) {
    const DrivePoint point = drive.at(from + (to - from) * i / 200000);
    if (point.v > found.speed) found.atSpeed = point.x;
    found.speed = std::max(found.speed, point.v);
    found.low = std::min(found.low, point.x);
    found.high = std::max(found.high, point.x);
  }
  return found;
}

TEST(BenchDrive, VelocityAndAccelerationAreTheDerivativesOfPlace) {
  DrivePlan plan;
  plan.steps = {HoldPlan{0.01, 1},
                BlockPlan{.speed = 0.3, .turns = 4, .strokeDrift = 0.05, .midDrift = 0.002},
                BlockPlan{.speed = 0.3, .turns = 4, .wave = Wave::Crank},
                BlockPlan{.speed = 0.1, .turns = 8, .endSpeed = 0.5}};
  const Drive drive(plan);
  const double h = 1e-5;
  for (double t = 0.0137; t < drive.duration(); t += 0.0213) {
    const double v = (drive.at(t + h).x - drive.at(t - h).x) / (2 * h);
    const double a = (drive.at(t + h).v - drive.at(t - h).v) / (2 * h);
    EXPECT_NEAR(drive.at(t).v, v, 2e-6) << t;  // h²/6·third derivative, and a joint in between
    EXPECT_NEAR(drive.at(t).a, a, 2e-3) << t;  // a joint in between: h·jump of the third derivative
  }
}

TEST(BenchDrive, SineBlocksReachTheSpeedAndStrokeTheyWereAskedFor) {
  const Drive drive(oneBlock({.speed = 0.524, .stroke = 0.1, .turns = 6, .mid = 0.003}));
  const DriveBlock& block = drive.blocks().front();
  const Extremes found = extremesOf(drive, block.start, block.end);
  EXPECT_NEAR(found.speed, 0.524, 1e-8);
  EXPECT_NEAR(found.high, 0.053, 1e-9);
  EXPECT_NEAR(found.low, -0.047, 1e-9);
  EXPECT_NEAR(block.end - block.start, 6 * pi * 0.1 / 0.524 - 0.3, 1e-12);  // period = πS/v
  ASSERT_EQ(block.lowerTurnings.size(), 5u);
  for (const double t : block.lowerTurnings) EXPECT_NEAR(drive.at(t).x, -0.047, 1e-12);
}

// Crank-slider with rod ratio 0.25: peak speed 1.030883·rω, 0.1095 r from mid-stroke. (Closed form
// of the slider's motion; textbook value.)
TEST(BenchDrive, ACrankPeaksOffMidStrokeAndFasterThanItsSine) {
  DrivePlan plan = oneBlock({.speed = 0.5, .stroke = 0.05, .turns = 5, .wave = Wave::Crank});
  plan.rodRatio = 0.25;
  const Drive drive(plan);
  const DriveBlock& block = drive.blocks().front();
  const double period = block.lowerTurnings[1] - block.lowerTurnings[0];
  EXPECT_NEAR(0.5 / (0.025 * 2 * pi / period), 1.030883, 1e-6);
  const Extremes found = extremesOf(drive, block.start, block.end);
  EXPECT_NEAR(found.speed, 0.5, 1e-8);
  EXPECT_NEAR(std::abs(found.atSpeed) / 0.025, 0.1095, 1e-3);  // the grid's step at a flat top
}

TEST(BenchDrive, ATriangleKeepsItsSpeedBetweenTheCorners) {
  const Drive drive(oneBlock({.speed = 0.1, .stroke = 0.05, .turns = 3, .wave = Wave::Triangle}));
  const DriveBlock& block = drive.blocks().front();
  const Extremes found = extremesOf(drive, block.start, block.end);
  EXPECT_NEAR(found.speed, 0.1, 1e-12);
  EXPECT_NEAR(found.high - found.low, 0.05, 1e-9);
  const double first = block.lowerTurnings.front(), last = block.lowerTurnings.back();
  int atSpeed = 0;
  for (int i = 0; i < 1000; ++i) {
    const double t = first + (last - first) * i / 1000;
    atSpeed += std::abs(std::abs(drive.at(t).v) - 0.1) < 1e-9 ? 1 : 0;
  }
  EXPECT_NEAR(atSpeed, 900, 5);  // a tenth of the time turns round
}

TEST(BenchDrive, EveryBlockStartsAndEndsAtRest) {
  DrivePlan plan = speedsPlan(0.05, 0.005, 1, {0.05, 0.6}, 4);
  plan.dwell = 0;
  const Drive drive(plan);
  EXPECT_EQ(drive.blocks().size(), 3u);
  EXPECT_NEAR(drive.at(drive.duration()).v, 0, 1e-9);
  EXPECT_NEAR(drive.at(drive.duration()).x, -0.025, 1e-9);
  double before = drive.at(0).x;
  for (double t = 0; t < drive.duration(); t += 1e-4) {
    EXPECT_LT(std::abs(drive.at(t).x - before), 0.61e-4);  // no jump: top speed times step
    before = drive.at(t).x;
  }
}

TEST(BenchDrive, ADriftingStrokeGrowsOverTheBlock) {
  const Drive drive(oneBlock({.speed = 0.3, .stroke = 0.05, .turns = 20, .strokeDrift = 0.1}));
  const DriveBlock& block = drive.blocks().front();
  const double period = block.lowerTurnings[1] - block.lowerTurnings[0];
  const Extremes first = extremesOf(drive, block.start, block.start + period);
  const Extremes last = extremesOf(drive, block.end - period, block.end);
  EXPECT_NEAR((last.high - last.low) / (first.high - first.low), 1.095, 0.005);  // 19 of 20 cycles
}

TEST(BenchDrive, ASweepGlidesFromSpeedToSpeed) {
  const Drive drive(oneBlock({.speed = 0.05, .turns = 20, .endSpeed = 0.6}));
  const DriveBlock& block = drive.blocks().front();
  ASSERT_GE(block.lowerTurnings.size(), 18u);
  for (const double t : block.lowerTurnings) EXPECT_NEAR(drive.at(t).x, -0.025, 1e-9);
  // the rate grows with the root of the phase: 0.59 m/s half a cycle before the end
  EXPECT_NEAR(extremesOf(drive, block.lowerTurnings[17], block.end).speed, 0.6, 0.02);
}

}  // namespace
}  // namespace dampwright::bench
