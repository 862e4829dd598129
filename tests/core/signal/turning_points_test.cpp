// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/turning_points.h"

#include <gtest/gtest.h>

#include <cmath>
#include <random>
#include <vector>

#include "core/base/units.h"
#include "tests/support/closed_form_traces.h"

namespace dampwright {
namespace {

using test::MadePlan;
using test::MadeShape;
using test::MadeWave;

std::vector<TurningPoint> turnsOf(const MadeWave& wave, double noise = 0, double rate = 2000) {
  MadePlan plan;
  plan.rate = rate;
  plan.waves = {wave};
  plan.displacementNoise = noise;
  const auto run = test::makeRun(plan);
  return turningPoints(run.displacement, {safeHysteresis(run.displacement), 0.1});
}

TEST(TurningPoints, OfASineStandBetweenSamplesAtHalfPeriods) {
  MadeWave wave{.stroke = 0.05, .frequency = 7.3, .cycles = 5};
  for (const double rate : {300.0, 2000.0}) {  // 41 and 274 samples a cycle
    const auto turns = turnsOf(wave, 0, rate);
    ASSERT_GE(turns.size(), 10u);
    for (std::size_t i = 1; i + 1 < turns.size(); ++i) {
      const double expected = static_cast<double>(i) / 2 / 7.3 * rate;
      // the parabolas leave 1e-5 of the period at 274 samples a cycle, 1e-3 at 41
      EXPECT_NEAR(turns[i].place, expected, rate < 1000 ? 0.03 : 4e-3);
      EXPECT_EQ(turns[i].upper, i % 2 == 1);
      EXPECT_FALSE(turns[i].atEdge);
    }
    EXPECT_TRUE(turns.front().atEdge);
  }
}

TEST(TurningPoints, OfASlowNoisySineAreOneToEachTurn) {
  const MadeWave wave{.stroke = 0.05, .frequency = test::sineFrequency(0.05, 0.005), .cycles = 2};
  const auto turns = turnsOf(wave, 1e-5);
  ASSERT_EQ(turns.size(), 5u);
  const double half = 0.5 / wave.frequency * 2000;
  // 1e-5 m over 5 mm/s, averaged over hundreds of samples: 0.1 ms, 0.2 samples; 5 of them allowed
  for (std::size_t i = 1; i < 4; ++i) EXPECT_NEAR(turns[i].place, static_cast<double>(i) * half, 1);
}

TEST(TurningPoints, OfACrankAndOfATriangleAreTheDeadCentres) {
  MadeWave wave{.stroke = 0.05, .frequency = 2, .cycles = 4};
  for (const MadeShape shape : {MadeShape::Crank, MadeShape::Triangle}) {
    wave.shape = shape;
    const auto turns = turnsOf(wave);
    ASSERT_GE(turns.size(), 8u);
    for (std::size_t i = 1; i + 1 < turns.size(); ++i)
      EXPECT_NEAR(turns[i].place, static_cast<double>(i) * 500, 0.01);
  }
}

TEST(TurningPoints, ADwellHasOneInItsMiddle) {
  const MadeWave wave{
      .stroke = 0.05, .frequency = 1, .cycles = 3, .shape = MadeShape::Triangle, .dwell = 0.3};
  const auto turns = turnsOf(wave, 1e-5);
  ASSERT_GE(turns.size(), 6u);
  // a half stroke of 0.5 s, then 0.3 s of rest: the turn is 0.65 s after the start
  for (std::size_t i = 1; i + 1 < turns.size(); ++i)
    EXPECT_NEAR(turns[i].place, (0.65 + 0.8 * static_cast<double>(i - 1)) * 2000, 2);
}

TEST(TurningPoints, ASmallReversalWithinAStrokeIsNone) {
  std::vector<double> x;
  for (int cycle = 0; cycle < 4; ++cycle) {
    for (int i = 0; i < 1000; ++i) {
      const double t = i / 1000.0;
      x.push_back(-std::cos(2 * pi * t) +
                  (i > 200 && i < 260 ? 0.15 * std::sin(pi * (i - 200) / 60.0) : 0));
    }
  }
  const auto turns = turningPoints(x, {0.001, 0.1});
  EXPECT_EQ(turns.size(), 9u);  // the edge at the start, eight turns
}

TEST(TurningPoints, UpsideDownTheyStandAtTheSamePlaces) {
  MadePlan plan;
  plan.waves = {MadeWave{.frequency = 3.1, .cycles = 4}};
  plan.displacementNoise = 1e-5;
  auto run = test::makeRun(plan);
  const auto up = turningPoints(run.displacement, {1e-3, 0.1});
  for (double& x : run.displacement) x = -x;
  const auto down = turningPoints(run.displacement, {1e-3, 0.1});
  ASSERT_EQ(up.size(), down.size());
  for (std::size_t i = 0; i < up.size(); ++i) {
    EXPECT_NEAR(up[i].place, down[i].place, 1e-9);
    EXPECT_NE(up[i].upper, down[i].upper);
  }
}

TEST(TurningPoints, AStandstillHasNone) {
  EXPECT_TRUE(turningPoints(std::vector<double>(100, 5.0), {0.1, 0.1}).empty());
  EXPECT_TRUE(turningPoints(std::vector<double>{}, {0.1, 0.1}).empty());
}

}  // namespace
}  // namespace dampwright
