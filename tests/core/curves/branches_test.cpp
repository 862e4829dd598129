// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/curves/branches.h"

#include <gtest/gtest.h>

#include <cmath>

#include "core/base/units.h"
#include "core/cycles/find_blocks.h"
#include "tests/core/cycles/made_motion.h"

namespace dampwright {
namespace {

constexpr double frequency = 100.0 / 60, amplitude = 0.05, omega = 2 * pi * frequency;

/// ±50 mm, 100 strokes a minute, 1200 samples a cycle.
Block blockOf(const std::function<double(double, double)>& force,
              test::MadeShape shape = test::MadeShape::Sine) {
  test::MadeWave wave;
  wave.from = 0.7;
  wave.stroke = 2 * amplitude;
  wave.frequency = frequency;
  wave.cycles = 6.5;
  wave.shape = shape;
  test::MadePlan plan;
  plan.rate = 1200 * frequency;
  plan.waves = {wave};
  plan.force = force;
  auto blocks = findBlocks(test::motionOf(test::makeRun(plan)));
  EXPECT_TRUE(blocks);
  return blocks.value().front();
}

double nothing(double) { return 0; }

/// The steady force of a damper c in series with a stiffness k under a sine, from place and speed.
std::function<double(double, double)> maxwell(double c, double k) {
  const double r = omega * c / k, share = 1 / (1 + r * r);
  return [=](double x, double v) { return c * share * v + k * r * r * share * x; };
}

// Force at the stroke end of a Maxwell damper, c 2000 N·s/m, ±50 mm, 100/min: 108.47273 N for
// k = 200 kN/m and 21.92284 N for 1 MN/m (K' = k·r²/(1 + r²), r = ωc/k). The loop is open by twice
// that at v = 0, and by √(1 − 1/4) of it at half speed.
TEST(LoopWidths, OfAMaxwellDamperAreTwiceTheForceAtItsStrokeEnds) {
  for (const auto& [k, atEnd] : {std::pair{2e5, 108.47273}, std::pair{1e6, 21.92284}}) {
    const LoopWidths widths = loopWidths(blockOf(maxwell(2000, k)), nothing);
    EXPECT_NEAR(widths.atZero, 2 * atEnd, 0.003 * 2 * atEnd);
    EXPECT_NEAR(widths.atHalfSpeed, std::sqrt(3.0) * atEnd, 0.003 * 2 * atEnd);
  }
}

// A force delayed by τ opens the loop by F(v=0)/F_max = sin ωτ: 2.094 % for 2 ms at 100/min.
TEST(LoopWidths, ADelayOpensTheLoop) {
  const double angle = omega * 0.002;
  const auto force = [&](double x, double v) {
    return 1500 * (std::cos(angle) * v + std::sin(angle) * omega * x);
  };
  const double largest = 1500 * omega * amplitude;
  EXPECT_NEAR(loopWidths(blockOf(force), nothing).atZero / largest, 2 * 0.02094, 2e-4);
}

TEST(LoopWidths, FrictionAndGasDoNotOpenTheLoop) {
  const auto gas = [](double x) { return 160 + 400 * x; };
  const auto force = [&](double x, double v) {
    return gas(x) + 30 * std::tanh(v / 0.001) + (v < 0 ? 2400 : 800) * v;
  };
  const LoopWidths widths = loopWidths(blockOf(force), gas);
  EXPECT_NEAR(widths.atZero, 0, 0.05);  // turning points to 1e-4 of the period
  EXPECT_NEAR(widths.atHalfSpeed, 0, 0.1);
}

TEST(LoopWidths, AKneeInsideTheRangeFallsOutOfTheDifference) {
  const auto force = [](double, double v) { return v < 0.12 ? 3000 * v : 360 + 700 * (v - 0.12); };
  EXPECT_NEAR(loopWidths(blockOf(force), nothing).atZero, 0, 0.5);  // of 630 N
}

TEST(LoopWidths, OfATriangleAreNotRead) {
  const auto force = [](double, double v) { return 1500 * v; };
  const LoopWidths widths = loopWidths(blockOf(force, test::MadeShape::Triangle), nothing);
  EXPECT_TRUE(std::isnan(widths.atZero));
  EXPECT_TRUE(std::isnan(widths.atHalfSpeed));
}

TEST(Branches, StandOnAGridOfSpeedsAndSayMeanAndWidth) {
  const Block block = blockOf(maxwell(2000, 2e5));
  for (const Direction direction : {Direction::Compression, Direction::Rebound}) {
    const auto points = branchesOf(block, direction, nothing);
    ASSERT_EQ(points.size(), 17u);
    for (const BranchPoint& point : points) {
      const double share = point.speed / (omega * amplitude);
      // C' = c/(1 + r²), r = 0.1047198
      EXPECT_NEAR(point.mean(), 2000 / (1 + 0.1047198 * 0.1047198) * point.speed, 0.3);
      EXPECT_NEAR(point.width(), 2 * 108.47273 * std::sqrt(1 - share * share), 1);
    }
  }
}

}  // namespace
}  // namespace dampwright
