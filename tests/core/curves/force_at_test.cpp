// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/curves/force_at.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <vector>

#include "core/curves/monotone_cubic.h"
#include "core/curves/read_block.h"
#include "core/curves/remove_gas.h"

namespace dampwright {
namespace {

CurvePoint pointAt(double speed, double force, double stroke = 0.05) {
  CurvePoint point;
  point.stroke = stroke;
  point.reading.peakVelocity = speed;
  point.reading.force = force;
  point.reading.largestForce = force + 5;
  return point;
}

double digressive(double v) { return 200 * v + 500 * (1 - std::exp(-v / 0.2)); }

Curve digressiveCurve() {
  std::vector<CurvePoint> points;
  for (const double v : {0.05, 0.1, 0.25, 0.5, 1.0}) points.push_back(pointAt(v, digressive(v)));
  return makeCurve(Direction::Rebound, points);
}

ForceQuery at(double speed) {
  ForceQuery query;
  query.speed = speed;
  return query;
}

TEST(ForceAt, WithinTwoPercentThePointMovesAlongTheLocalSlope) {
  const Curve curve = digressiveCurve();
  const auto same = forceAt(curve, at(0.25));
  EXPECT_EQ(same.how, HowRead::AtPoint);
  EXPECT_EQ(same.force, digressive(0.25));
  EXPECT_EQ(same.uInterpolation, 0);
  const auto near = forceAt(curve, at(0.2549));
  EXPECT_EQ(near.how, HowRead::AtPoint);
  EXPECT_NEAR(near.force, same.force + same.slope * 0.0049, 1e-9);
  EXPECT_EQ(near.nearest, 2u);
  EXPECT_EQ(forceAt(curve, at(0.2551)).how, HowRead::Between);
}

TEST(ForceAt, NominalSpeedsOfTheStandardsMeetTheirTrueOnes) {
  // 25 and 100 mm at 100 and 200 strokes a minute against "0.13" and "1.04" m/s, QC/T 491-2018
  const Curve curve =
      makeCurve(Direction::Compression, {pointAt(0.1309, 300), pointAt(1.0472, 1200)});
  EXPECT_EQ(forceAt(curve, at(0.13)).how, HowRead::AtPoint);
  EXPECT_EQ(forceAt(curve, at(1.04)).how, HowRead::AtPoint);
}

TEST(ForceAt, BetweenPointsItIsTheMonotoneCubicWithItsDistanceFromTheLaw) {
  const Curve curve = digressiveCurve();
  const MonotoneCubic cubic(
      {0.05, 0.1, 0.25, 0.5, 1},
      {digressive(0.05), digressive(0.1), digressive(0.25), digressive(0.5), digressive(1)});
  ForceQuery query = at(0.35);
  query.law = [](double v) { return digressive(v) + 3; };
  const auto read = forceAt(curve, query);
  EXPECT_EQ(read.how, HowRead::Between);
  EXPECT_NEAR(read.force, cubic.at(0.35), 1e-9);
  EXPECT_NEAR(read.slope, cubic.slopeAt(0.35), 1e-9);
  EXPECT_NEAR(
      read.uInterpolation, std::abs(read.force - digressive(0.35) - 3) / std::sqrt(3), 1e-9);
  EXPECT_NEAR(read.force, digressive(0.35), 0.01 * digressive(0.35));
  const auto without = forceAt(curve, at(0.35));
  EXPECT_NEAR(
      without.uInterpolation, std::abs(read.force - cubic.straightAt(0.35)) / std::sqrt(3), 1e-9);
}

TEST(ForceAt, UpToFivePercentOutsideTheEndSlopeCarriesOn) {
  const Curve curve = digressiveCurve();
  ForceQuery query = at(1.045);
  query.law = digressive;
  const auto above = forceAt(curve, query);
  EXPECT_EQ(above.how, HowRead::EndSlope);
  EXPECT_NEAR(above.force, digressive(1) + above.slope * 0.045, 1e-9);
  EXPECT_GT(above.uInterpolation, 0);
  EXPECT_EQ(forceAt(curve, at(0.048)).how, HowRead::EndSlope);
}

TEST(ForceAt, FartherOutThereIsNothing) {
  const Curve curve = digressiveCurve();
  for (const double speed :
       {0.047, 1.051, 3.0, 0.0, -0.25, std::numeric_limits<double>::quiet_NaN()}) {
    const auto read = forceAt(curve, at(speed));
    EXPECT_FALSE(read) << speed;
    EXPECT_EQ(read.reason, "speed-not-tested") << speed;
  }
  EXPECT_EQ(forceAt(Curve{}, at(0.25)).reason, "no-points");
}

TEST(ForceAt, StrokesAreNeverMixed) {
  Curve curve = makeCurve(Direction::Rebound,
                          {pointAt(0.1, 100, 0.05),
                           pointAt(0.5, 500, 0.05),
                           pointAt(0.3, 900, 0.1),
                           pointAt(0.6, 1800, 0.1)});
  ForceQuery query = at(0.3);
  query.stroke = 0.0505;  // within 2 %
  const auto asked = forceAt(curve, query);
  EXPECT_EQ(asked.how, HowRead::Between);
  EXPECT_NEAR(asked.force, 300, 1e-9);  // two points: a straight line
  EXPECT_FALSE(asked.severalStrokes);
  const auto nearest = forceAt(curve, at(0.3));
  EXPECT_EQ(nearest.how, HowRead::AtPoint);
  EXPECT_EQ(nearest.force, 900);
  EXPECT_EQ(nearest.stroke, 0.1);
  EXPECT_TRUE(nearest.severalStrokes);
  query.stroke = 0.075;
  EXPECT_EQ(forceAt(curve, query).reason, "stroke-not-tested");
}

TEST(ForceAt, PointsOfOneSpeedCountAsTheirMean) {
  const Curve curve =
      makeCurve(Direction::Rebound,
                {pointAt(0.1, 100), pointAt(0.25, 240), pointAt(0.2505, 260), pointAt(0.5, 500)});
  const auto read = forceAt(curve, at(0.25025));
  EXPECT_EQ(read.how, HowRead::AtPoint);
  EXPECT_NEAR(read.force, 250, 1e-9);
}

TEST(ForceAt, OnePointAloneUsesTheLawsSlopeOrTheSecant) {
  const Curve curve = makeCurve(Direction::Rebound, {pointAt(0.25, 500)});
  EXPECT_NEAR(forceAt(curve, at(0.252)).force, 504, 1e-9);
  ForceQuery query = at(0.252);
  query.law = [](double v) { return 100 + 1000 * v; };
  const auto read = forceAt(curve, query);
  EXPECT_NEAR(read.force, 502, 1e-6);
  EXPECT_NEAR(read.uInterpolation, 2 / std::sqrt(3), 1e-6);
  EXPECT_EQ(forceAt(curve, at(0.26)).how, HowRead::EndSlope);
  EXPECT_FALSE(forceAt(curve, at(0.3)));
}

TEST(ForceAt, EachFigureHasItsOwnCurve) {
  Curve curve = digressiveCurve();
  ForceQuery query = at(0.25);
  query.figure = CurveFigure::LargestForce;
  EXPECT_NEAR(forceAt(curve, query).force, digressive(0.25) + 5, 1e-9);
  query.figure = CurveFigure::DampingForce;
  EXPECT_EQ(forceAt(curve, query).reason, "gas-not-determined");
  curve = removeGas(curve, [](const CurvePoint&) { return 150.0; });
  EXPECT_NEAR(forceAt(curve, query).force, digressive(0.25) + 150, 1e-9);
}

TEST(RemoveGas, TakesGasOffInCompressionAndAddsItInRebound) {
  CurvePoint point = pointAt(0.25, 400);
  point.reading.displacement = 0.002;
  const GasLine gas = [](const CurvePoint& p) { return 150 + 1000 * p.reading.displacement; };
  const Curve in = removeGas({Direction::Compression, {point}}, gas);
  const Curve out = removeGas({Direction::Rebound, {point}}, gas);
  EXPECT_NEAR(*in.points[0].reading.dampingForce, 400 - 152, 1e-12);
  EXPECT_NEAR(*out.points[0].reading.dampingForce, 400 + 152, 1e-12);
  EXPECT_FALSE(removeGas(in, {}).points[0].reading.dampingForce);
}

}  // namespace
}  // namespace dampwright
