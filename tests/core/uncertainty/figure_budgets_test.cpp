// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/uncertainty/figure_budgets.h"

#include <gtest/gtest.h>

#include <cmath>

namespace dampwright {
namespace {

double partOf(const std::vector<BudgetLine>& lines, const std::string& part) {
  for (const BudgetLine& line : lines) {
    if (line.part == part) return line.u;
  }
  return 0;
}

TEST(ForceBudget, ClassOneCellAt1200Newtons) {
  // ISO 7500-1 class 1: indication within ±1 %, rectangular: 12 N/√3 = 6.9282 N.
  RigAccuracy rig;
  rig.loadCell.readingPercent = 1;
  const auto lines = forceBudget({.force = 1200}, rig);
  ASSERT_EQ(lines.size(), 1u);
  EXPECT_NEAR(lines[0].u, 6.9282, 5e-5);  // printed to 4 digits
  EXPECT_EQ(lines[0].part, "load cell");
  EXPECT_TRUE(std::isinf(lines[0].dof));
  rig.loadCell.readingPercent = 0.5;
  EXPECT_NEAR(forceBudget({.force = -1200}, rig)[0].u, 3.4641, 5e-5);
}

TEST(ForceBudget, SpeedErrorsActThroughTheSlope) {
  RigAccuracy rig;
  rig.displacementAccuracy = 0.00003;  // m over an amplitude of 25 mm: 0.12 %
  rig.clockAccuracyPercent = 0.05;
  const auto lines =
      forceBudget({.force = 500, .slope = 1500, .velocity = 0.4, .amplitude = 0.025}, rig);
  EXPECT_NEAR(partOf(lines, "displacement"), 1500 * 0.4 * 0.0012 / std::sqrt(3.0), 1e-12);
  EXPECT_NEAR(partOf(lines, "clock"), 1500 * 0.4 * 0.0005 / std::sqrt(3.0), 1e-12);
}

TEST(ForceBudget, EveryPartHasItsLine) {
  RigAccuracy rig;
  rig.loadCell.capacity = 5000;
  rig.loadCell.readingPercent = 0.5;
  rig.loadCell.capacityPercent = 0.05;
  rig.loadCell.zeroDrift = 2;
  rig.displacementAccuracy = 2e-5;
  rig.clockAccuracyPercent = 0.01;
  rig.remountPercent = 0.8;
  const auto lines = forceBudget({.quantity = "force, 0.3 m/s",
                                  .force = 1000,
                                  .slope = 2000,
                                  .velocity = 0.3,
                                  .amplitude = 0.025,
                                  .cycles = {1, 30},
                                  .gas = {0.4, 200},
                                  .interpolationU = 1.5},
                                 rig);
  EXPECT_EQ(lines.size(), 8u);
  EXPECT_NEAR(partOf(lines, "cycles"), 1, 1e-12);
  EXPECT_NEAR(partOf(lines, "load cell"), std::hypot(5, 2.5) / std::sqrt(3.0), 1e-12);
  EXPECT_NEAR(partOf(lines, "zero"), 2 / std::sqrt(3.0), 1e-12);
  EXPECT_NEAR(partOf(lines, "remount"), 8, 1e-12);
  EXPECT_EQ(partOf(lines, "gas"), 0.4);
  EXPECT_EQ(partOf(lines, "interpolation"), 1.5);
  for (const BudgetLine& line : lines) EXPECT_EQ(line.quantity, "force, 0.3 m/s");
}

TEST(ForceBudget, UnknownScatterLeavesNoLine) {
  EXPECT_TRUE(forceBudget({.force = 1000, .cycles = {0, 0}}, {}).empty());
}

TEST(GasBudget, NothingWhileTheGasIsNotDetermined) {
  RigAccuracy rig;
  rig.loadCell.readingPercent = 1;
  EXPECT_TRUE(gasBudget({}, rig).empty());
}

TEST(GasBudget, AHoldCarriesItsOwnPart) {
  Gas gas;
  gas.force = 200;
  gas.forceU = 5;
  gas.forceDof = 1000;
  gas.rate = 300;
  gas.method = "hold";
  RigAccuracy rig;
  rig.displacementAccuracy = 1e-3;
  EXPECT_EQ(partOf(gasBudget(gas, rig), "gas"), 5);
  EXPECT_NEAR(partOf(gasBudget(gas, rig), "displacement"), 0.3 / std::sqrt(3.0), 1e-12);
  gas.method = "slow block";
  EXPECT_EQ(partOf(gasBudget(gas, rig), "cycles"), 5);
}

TEST(FrictionBudget, TheZeroOfTheCellCancels) {
  Friction friction;
  friction.dry = 30;
  friction.dryU = 0.2;
  friction.dryDof = 300;
  friction.halfDifference = 33;
  friction.halfDifferenceU = 0.4;
  friction.halfDifferenceDof = 4;
  RigAccuracy rig;
  rig.loadCell.zeroDrift = 100;
  EXPECT_NEAR(combine(frictionBudget(friction, FrictionKind::Dry, rig)).u, 0.2, 1e-12);
  EXPECT_NEAR(combine(frictionBudget(friction, FrictionKind::HalfDifference, rig)).dof, 4, 1e-9);
}

TEST(PooledTypeA, PoolsPercentagesByTheirDegreesOfFreedom) {
  std::vector<Reading> readings(2);
  readings[0].force = 100;
  readings[0].forceU = 1;  // 1 %
  readings[0].forceDof = 3;
  readings[1].force = -1000;
  readings[1].forceU = 20;  // 2 %
  readings[1].forceDof = 1;
  const TypeA pooled = pooledTypeA(readings);
  EXPECT_NEAR(pooled.u, std::sqrt((3 * 1.0 + 1 * 4.0) / 4), 1e-12);
  EXPECT_EQ(pooled.dof, 4);
}

TEST(PooledTypeA, AForceNearZeroDoesNotCount) {
  std::vector<Reading> readings(2);
  readings[0].force = 1000;
  readings[0].forceU = 10;
  readings[0].forceDof = 5;
  readings[1].force = 0.001;
  readings[1].forceU = 1;
  readings[1].forceDof = 5;
  EXPECT_NEAR(pooledTypeA(readings).u, 1, 1e-12);
  EXPECT_EQ(pooledTypeA({}).dof, 0);
}

}  // namespace
}  // namespace dampwright
