// SPDX-License-Identifier: GPL-3.0-or-later
#include <gtest/gtest.h>

#include <cmath>

#include "core/verdict/judge.h"
#include "tests/core/verdict/made_measurement.h"

namespace dampwright {
namespace {

constexpr double scatter = 0.01;  // of force

// A straight 2000 N·s/m in rebound, so that any interpolation must give 2000·v.
Measurement straight() {
  Measurement made = madeMeasurement();
  for (const double velocity : {0.1, 0.2, 0.4, 0.8}) {
    const double force = 2000 * velocity;
    addPoint(made, Direction::Rebound, {velocity, force, 0.05, 0, scatter * force, 16});
  }
  return made;
}

CheckVerdict judged(const Measurement& made, double velocity, const Limits& basis = {}) {
  Limits limits = basis;
  Check check;
  check.check = "force";
  check.direction = Direction::Rebound;
  check.velocity = velocity;
  check.min = 1;
  limits.checks = {check};
  return judge(made, limits).checks.at(0);
}

TEST(ForceCheck, ATestedSpeedReadsItsPoint) {
  const CheckVerdict check = judged(straight(), 0.4);
  EXPECT_NEAR(check.measured.value(), 800, 1e-9);
  EXPECT_NEAR(check.standardUncertainty, 8, 1e-9);
}

TEST(ForceCheck, ASpeedNearATestedOneIsMovedAlongTheSlope) {
  EXPECT_NEAR(judged(straight(), 0.404).measured.value(), 808, 1e-6);
}

TEST(ForceCheck, BetweenTestedSpeedsTheCurveIsRead) {
  EXPECT_NEAR(judged(straight(), 0.3).measured.value(), 600, 1e-6);
}

TEST(ForceCheck, JustOutsideTheTestedSpeedsIsRemarkedAndFartherIsNotTested) {
  const CheckVerdict near = judged(straight(), 0.8 * 1.04);
  EXPECT_NEAR(near.measured.value(), 1664, 1e-6);
  ASSERT_FALSE(near.remarks.empty());
  EXPECT_EQ(near.remarks[0].code, "speed-outside-tested");
  const CheckVerdict far = judged(straight(), 0.8 * 1.06);
  EXPECT_EQ(far.verdict, VerdictWord::NotTested);
  EXPECT_EQ(far.reason.code, "speed-not-tested");
  EXPECT_EQ(far.measured, std::nullopt);
}

TEST(ForceCheck, TheRigsAccuraciesEnterTheBudget) {
  Measurement made = straight();
  made.rig.loadCell.readingPercent = 1;
  // rectangular ±1 % of 800 N: 8/√3 = 4.6188 N, beside 8 N of the cycles
  EXPECT_NEAR(judged(made, 0.4).standardUncertainty, std::hypot(8, 8 / std::sqrt(3.0)), 1e-9);
}

TEST(ForceCheck, ARigOfUnknownAccuracyIsRemarked) {
  Measurement made = straight();
  ASSERT_EQ(judged(made, 0.4).remarks.size(), 1u);
  EXPECT_EQ(judged(made, 0.4).remarks[0].code, "rig-accuracy-not-known");
  made.rig.loadCell.readingPercent = 0.5;
  EXPECT_TRUE(judged(made, 0.4).remarks.empty());
}

TEST(ForceCheck, GasIsTakenOffWhereTheLimitsAskForIt) {
  Measurement made = straight();
  Limits basis;
  basis.forceBasis = ForceBasis::GasRemoved;
  EXPECT_EQ(judged(made, 0.4, basis).reason.code, "gas-not-determined");
  made.gas = {};
  made.gas.force = 150;
  made.gas.forceU = 6;
  made.gas.forceDof = 1e9;
  for (CurvePoint& point : made.rebound.points)
    point.reading.dampingForce = point.reading.force + 150;
  const CheckVerdict check = judged(made, 0.4, basis);
  EXPECT_NEAR(check.measured.value(), 950, 1e-6);
  EXPECT_NEAR(check.standardUncertainty, std::hypot(9.5, 6), 1e-9);
}

TEST(ForceCheck, TheLargestOrdinateIsNotDefinedWithGasRemoved) {
  Limits limits;
  limits.forceBasis = ForceBasis::GasRemoved;
  Check check;
  check.check = "force";
  check.direction = Direction::Rebound;
  check.velocity = 0.4;
  check.reading = "largest";
  check.min = 1;
  limits.checks = {check};
  EXPECT_EQ(judge(straight(), limits).checks.at(0).reason.code, "largest-with-gas-removed");
}

TEST(ForceCheck, PointsOfAnotherStrokeNeverCount) {
  Measurement made = straight();
  addPoint(made, Direction::Rebound, {0.4, 5000, 0.1});
  Limits limits;
  limits.conditions.stroke = 0.05;
  EXPECT_NEAR(judged(made, 0.4, limits).measured.value(), 800, 1e-6);
  limits.conditions.stroke = 0.03;
  EXPECT_EQ(judged(made, 0.4, limits).reason.code, "stroke-not-tested");
}

TEST(ForceCheck, ADirectionThatWasNotTestedSaysSo) {
  Limits limits;
  Check check;
  check.check = "force";
  check.direction = Direction::Compression;
  check.velocity = 0.4;
  check.min = 1;
  limits.checks = {check};
  EXPECT_EQ(judge(straight(), limits).checks.at(0).reason.code, "no-points");
}

}  // namespace
}  // namespace dampwright
