// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/identify/gas_and_friction.h"

#include <gtest/gtest.h>

#include <cmath>
#include <random>

#include "tests/core/identify/made_run.h"

namespace dampwright {
namespace {

/// Gas 160 N at x = 10 mm of the rig, L = 0.5 m; friction 24 N; 1000 N·s/m in and 2000 out.
double model(double x, double v) {
  const double slope = v > 0 ? 1000 : 2000;
  return 160 * std::pow(0.5 / (0.5 - (x - 0.01)), 1.2) + 24 * std::tanh(v / 0.0003) + slope * v;
}

test::MadeBlock slow(double speed = 0.005) { return {.peakSpeed = speed, .mid = 0.01}; }

TEST(IdentifyGasAndFriction, ASlowSineGivesBoth) {
  test::MadeRun run;
  run.add(model, slow(0.1));
  run.add(model, slow());
  const auto [gas, friction] = identifyGasAndFriction(run.items());
  ASSERT_TRUE(gas.force && gas.rate && friction.dry && friction.halfDifference);
  EXPECT_NEAR(*gas.force, 160, 1e-5);
  EXPECT_NEAR(*gas.rate, 160 * 1.2 / 0.5, 1e-3);
  EXPECT_NEAR(gas.at(0.03), model(0.03, 0), 1e-5);
  EXPECT_EQ(gas.mid, 0.01);
  EXPECT_EQ(gas.method, "slow block");
  EXPECT_EQ(gas.reason, "");
  EXPECT_NEAR(*friction.dry, 24, 1e-5);
  // half the difference at 5 mm/s: dry friction and the mean slope's 1500 N·s/m
  EXPECT_NEAR(*friction.halfDifference, 24 + 1500 * 0.005, 1e-6);
  EXPECT_EQ(friction.atVelocity, 0.005);
  EXPECT_EQ(friction.reason, "");
}

TEST(IdentifyGasAndFriction, OfHoldAndSlowBlockTheOneKnownBetterGivesTheGas) {
  test::MadeRun run;
  run.add(model, slow());
  run.addHold(0.014, model(0.014, 0) + 3, 0.1);  // the hold stands 3 N off, held by friction
  const auto [gas, friction] = identifyGasAndFriction(run.items());
  ASSERT_TRUE(gas.force);
  EXPECT_EQ(gas.method, "slow block");  // ±24 N of friction are in the hold
  EXPECT_NEAR(*gas.force, 160, 1e-5);
  EXPECT_NEAR(*friction.dry, 24, 1e-5);

  // A rough loop whose step at the reversal is the wrong way round, so that no friction is found.
  std::mt19937 random(3);
  std::normal_distribution<double> scatter(0, 10);
  test::MadeRun rough;
  const auto force = [&](double x, double v) {
    return 160 + 400 * x + 1500 * v - 8 * std::tanh(v / 3e-4) + scatter(random);
  };
  rough.add(force, slow());
  rough.addHold(0.01, 161, 0.1);
  const Gas held = identifyGasAndFriction(rough.items()).gas;
  EXPECT_EQ(held.method, "hold");
  EXPECT_NEAR(*held.force, 161, 1e-9);
  EXPECT_TRUE(std::isinf(held.forceDof));
}

TEST(IdentifyGasAndFriction, ARigAtRestAtTheEndOfItsStrokeIsNoHoldBesideASlowBlock) {
  test::MadeRun run;
  run.add(model, slow());
  run.addHold(-0.015, model(-0.015, 0) - 24, 0.1);
  const Gas gas = identifyGasAndFriction(run.items()).gas;
  EXPECT_EQ(gas.method, "slow block");
  EXPECT_NEAR(*gas.force, 160, 1e-5);
}

TEST(IdentifyGasAndFriction, AHoldAloneGivesGasButNoFriction) {
  test::MadeRun run;
  run.add(model, slow(0.05));
  run.add(model, slow(0.2));
  run.addHold(0.01, 161, 0.1);
  const auto [gas, friction] = identifyGasAndFriction(run.items());
  ASSERT_TRUE(gas.force);
  EXPECT_EQ(*gas.force, 161);
  EXPECT_FALSE(gas.rate);
  // friction is not known, but no more than the half difference of the slowest block
  EXPECT_NEAR(gas.forceU, (24 + 1500 * 0.05) / std::sqrt(3.0), 0.5);
  EXPECT_FALSE(friction.dry);
  EXPECT_FALSE(friction.halfDifference);
  EXPECT_EQ(friction.reason, "no-slow-block");
}

TEST(IdentifyGasAndFriction, OfSeveralHoldsTheOneNearestToMidStrokeCounts) {
  test::MadeRun run;
  run.add(model, slow(0.1));
  run.addHold(-0.015, 140, 0.1);
  run.addHold(0.009, 158, 0.1);
  EXPECT_EQ(identifyGasAndFriction(run.items()).gas.force, 158);
}

TEST(IdentifyGasAndFriction, NeitherIsSaidWithItsReason) {
  test::MadeRun run;
  run.add(model, slow(0.1));
  const auto [gas, friction] = identifyGasAndFriction(run.items());
  EXPECT_FALSE(gas.force);
  EXPECT_EQ(gas.reason, "no-slow-block-or-hold");
  EXPECT_FALSE(friction.dry);
  EXPECT_EQ(friction.reason, "no-slow-block");
  EXPECT_EQ(gas.at(0.02), 0);
}

TEST(IdentifyGasAndFriction, ASlowTriangleGivesTheHalfDifferenceOnly) {
  test::MadeRun run;
  test::MadeBlock triangle = slow();
  triangle.kind = BlockKind::Triangle;
  run.add(model, triangle);
  const auto [gas, friction] = identifyGasAndFriction(run.items());
  EXPECT_FALSE(gas.force);
  EXPECT_FALSE(friction.dry);
  EXPECT_EQ(friction.reason, "slow-triangle-only");
  ASSERT_TRUE(friction.halfDifference);
  EXPECT_NEAR(*friction.halfDifference, 31.5, 1e-9);
}

TEST(IdentifyGasAndFriction, ZeroedWithTheDamperOnlyTheRateIsKnown) {
  const auto zeroed = [](double x, double v) { return model(x, v) - 160; };
  test::MadeRun run;
  run.add(zeroed, slow());
  run.addHold(0.01, 0, 0.1);
  const auto [gas, friction] =
      identifyGasAndFriction(run.items(), {.zeroState = ZeroState::DamperFitted});
  EXPECT_FALSE(gas.force);
  EXPECT_EQ(gas.reason, "zeroed-with-damper");
  ASSERT_TRUE(gas.rate);
  // a line through the column over ±25 mm: the cubic part of the column adds under 1 %
  EXPECT_NEAR(*gas.rate, 160 * 1.2 / 0.5, 5);
  EXPECT_NEAR(*friction.dry, 24, 0.5);  // the column's bend, 0.9 N at the ends, is not in the line
}

TEST(IdentifyGasAndFriction, TheSlowestBlockIsUsed) {
  test::MadeRun run;
  run.add(model, slow(0.005));
  run.add(model, slow(0.002));
  EXPECT_EQ(identifyGasAndFriction(run.items()).friction.atVelocity, 0.002);
}

TEST(IdentifyGasAndFriction, ABlockThatCannotBeReadIsPassedOver) {
  test::MadeRun run;
  run.add(model, slow());
  auto items = run.items();
  items[0].reading.rebound.force = std::nan("");
  EXPECT_EQ(identifyGasAndFriction(items).gas.reason, "no-slow-block-or-hold");
  EXPECT_FALSE(identifyGasAndFriction({}).gas.force);
}

}  // namespace
}  // namespace dampwright
