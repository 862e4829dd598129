// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/curves/read_block.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <vector>

#include "core/base/units.h"
#include "core/cycles/find_blocks.h"
#include "tests/core/cycles/made_motion.h"

namespace dampwright {
namespace {

using test::MadePlan;
using test::MadeShape;
using test::MadeWave;
using test::motionOf;
using test::waveAt;

using Law = std::function<double(double, double)>;

// 100 mm and 100 strokes a minute, as in QC/T 545-1999; begins and ends within a stroke.
MadeWave standardWave(double stroke = 0.1, double rate = 100, double cycles = 6.5) {
  MadeWave wave;
  wave.from = 0.7;
  wave.stroke = stroke;
  wave.frequency = rate / 60;
  wave.cycles = cycles;
  return wave;
}

Block blockOf(const Motion& motion) {
  auto blocks = findBlocks(motion);
  EXPECT_TRUE(blocks);
  std::vector<Block> all = std::move(blocks).value();
  std::erase_if(all, [](const Block& block) { return block.kind == BlockKind::Hold; });
  EXPECT_EQ(all.size(), 1u);
  return all.front();
}

BlockReading readingOf(const MadeWave& wave, const Law& law, double samplesPerCycle = 1200) {
  MadePlan plan;
  plan.rate = samplesPerCycle * wave.frequency;
  plan.waves = {wave};
  plan.force = law;
  return readBlock(blockOf(motionOf(test::makeRun(plan))));
}

double sign(double v) { return v > 0 ? 1.0 : v < 0 ? -1.0 : 0.0; }

// Peak speed π·S·n/60 of the strokes and rates of QC/T 545-1999 and QC/T 491-2018.
TEST(ReadBlock, PeakSpeedsOfThePublishedStrokesAndRates) {
  const struct {
    double stroke, rate, speed;
  } rows[] = {{0.025, 100, 0.13090},
              {0.05, 100, 0.26180},
              {0.1, 100, 0.52360},
              {0.1, 200, 1.04720},
              {0.08, 60, 0.25133},
              {0.1, 60, 0.31416},
              {0.075, 50, 0.19635}};
  for (const auto& row : rows) {
    const auto reading =
        readingOf(standardWave(row.stroke, row.rate), [](double, double v) { return v; });
    for (const Reading* one : {&reading.compression, &reading.rebound}) {
      EXPECT_NEAR(one->peakVelocity, row.speed, 1e-4 * row.speed);
      EXPECT_NEAR(one->displacement, 0, 1e-3 * row.stroke);
    }
  }
}

TEST(ReadBlock, PeakSpeedIsRightDownToFortySamplesACycle) {
  for (const double samples : {40.3, 64.0, 100.7, 314.0}) {
    const auto reading = readingOf(
        standardWave(), [](double, double v) { return 1500 * v; }, samples);
    // the spline through the samples: (2π/40)⁴/384 = 1.6e-6; jitter of the turns, squared, 1e-5
    EXPECT_NEAR(reading.compression.peakVelocity, 0.52359878, samples < 60 ? 2e-4 : 5e-5);
    EXPECT_NEAR(reading.compression.force, 785.398163, samples < 60 ? 0.5 : 0.1);
  }
}

// Crank of rod ratio λ: peak speed over r·ω and its place from mid-stroke over r.
TEST(ReadBlock, ACrankIsFasterThanASineAndFastestOffMidStroke) {
  const struct {
    double ratio, speed, place;
  } rows[] = {{0.05, 1.001249, 0.0249},
              {0.1, 1.004988, 0.0489},
              {0.2, 1.019833, 0.0917},
              {0.25, 1.030883, 0.1095}};
  for (const auto& row : rows) {
    MadeWave wave = standardWave();
    wave.shape = MadeShape::Crank;
    wave.rodRatio = row.ratio;
    const auto reading = readingOf(wave, [](double, double v) { return 1500 * v; });
    const double expected = row.speed * 0.05 * 2 * pi * wave.frequency;
    EXPECT_NEAR(reading.compression.peakVelocity, expected, 1e-4 * expected);
    EXPECT_NEAR(std::abs(reading.compression.displacement), row.place * 0.05, 2e-4 * 0.05 * 10);
  }
}

// W = π·c·ω·X²; Chopra, Dynamics of Structures, section 3.8 (from memory).
TEST(ReadBlock, ViscousEnergyPowerAndDamping) {
  const auto reading = readingOf(standardWave(), [](double, double v) { return 1500 * v; });
  EXPECT_NEAR(reading.energy, 123.370055, 3e-4 * 123.37);
  EXPECT_NEAR(reading.meanPower, 205.616758, 3e-4 * 205.6);
  EXPECT_NEAR(reading.equivalentDamping, 1500, 3e-4 * 1500);
  EXPECT_NEAR(reading.compression.force, 785.398163, 0.02);
  EXPECT_NEAR(reading.rebound.force, 785.398163, 0.02);
  EXPECT_NEAR(reading.compression.energy + reading.rebound.energy, reading.energy, 1e-9);
  EXPECT_NEAR(reading.compression.energy, reading.rebound.energy, 0.02);
  EXPECT_NEAR(reading.phaseLag, 0, 1e-4);
}

// W = 4·Fc·X and the sum of both; Stutts, Equivalent viscous damping, equations 10 to 12.
TEST(ReadBlock, CoulombEnergyAndItsSumWithViscous) {
  const auto coulomb = readingOf(standardWave(), [](double, double v) { return 60 * sign(v); });
  EXPECT_NEAR(coulomb.energy, 12.000, 3e-4 * 12);
  const Law both = [](double, double v) { return 1500 * v + 60 * sign(v); };
  EXPECT_NEAR(readingOf(standardWave(), both).energy, 135.370055, 3e-4 * 135.37);
  EXPECT_NEAR(readingOf(standardWave(0.05), both).energy, 36.842514, 3e-4 * 36.84);
}

// W = λ·c·ω^α·X^(α+1), λ = 2^(2+α)·Γ²(1+α/2)/Γ(2+α): seen in a public structural script.
TEST(ReadBlock, PowerLawEnergies) {
  const double omega = 2 * pi * 100 / 60, x = 0.05;
  for (const double exponent : {0.0, 0.5, 1.0, 2.0}) {
    const double lambda = std::pow(2, 2 + exponent) * std::pow(std::tgamma(1 + exponent / 2), 2) /
                          std::tgamma(2 + exponent);
    const double expected = lambda * 800 * std::pow(omega, exponent) * std::pow(x, exponent + 1);
    const auto reading = readingOf(standardWave(), [&](double, double v) {
      return 800 * std::pow(std::abs(v), exponent) * sign(v);
    });
    EXPECT_NEAR(reading.energy, expected, 3e-4 * expected) << exponent;
  }
  const auto quadratic =
      readingOf(standardWave(), [](double, double v) { return 800 * v * std::abs(v); });
  EXPECT_NEAR(quadratic.energy, 29.243272, 3e-4 * 29.24);
  EXPECT_NEAR(quadratic.equivalentDamping, 355.5556, 3e-4 * 355.6);
}

// GOST R 53816-2010, 5.5.4: energy of the cycle and of each stroke apart; closed form.
TEST(ReadBlock, AsymmetricDamperSplitsItsEnergyByStroke) {
  const auto reading =
      readingOf(standardWave(), [](double, double v) { return v > 0 ? 800 * v : 2400 * v; });
  EXPECT_NEAR(reading.energy, 131.594725, 3e-4 * 131.6);
  EXPECT_NEAR(reading.equivalentDamping, 1600, 3e-4 * 1600);
  EXPECT_NEAR(reading.rebound.force, 1256.637, 0.05);
  EXPECT_NEAR(reading.compression.force, 418.879, 0.05);
  EXPECT_NEAR(reading.rebound.energy / reading.compression.energy, 3, 1e-3);
}

// Maxwell element, c 2000 N·s/m in series with k; moduli r²/(1+r²), r/(1+r²), r = ω·c/k.
// Source: Introduction to Continuum Mechanics, p. 470 (moduli of the Maxwell element).
TEST(ReadBlock, MaxwellElementLags) {
  const struct {
    double k, r, force, degrees, energy, damping, atEnd;
  } rows[] = {{1e6, 0.0209440, 1046.96795, 1.19982, 164.421283, 1999.1231, 21.92284},
              {2e5, 0.1047198, 1041.50245, 5.97821, 162.709102, 1978.3055, 108.47273}};
  for (const auto& row : rows) {
    const double omega = 2 * pi * 100 / 60;
    const double loss = row.k * row.r / (1 + row.r * row.r) / omega;
    const double storage = row.k * row.r * row.r / (1 + row.r * row.r);
    const auto reading =
        readingOf(standardWave(), [&](double x, double v) { return storage * x + loss * v; });
    EXPECT_NEAR(reading.energy, row.energy, 3e-4 * row.energy);
    EXPECT_NEAR(reading.equivalentDamping, row.damping, 3e-4 * row.damping);
    EXPECT_NEAR(reading.phaseLag * 180 / pi, row.degrees, 0.01);
    EXPECT_NEAR(reading.endForces[0], row.atEnd, 0.1);
    EXPECT_NEAR(reading.endForces[1], -row.atEnd, 0.1);
    EXPECT_NEAR(reading.compression.largestForce, row.force, 0.05);
    EXPECT_NEAR(reading.compression.force, row.force * std::cos(row.degrees * pi / 180), 0.05);
    EXPECT_NEAR(reading.rebound.largestForce, row.force, 0.05);
  }
}

// The polygon of an ellipse of 64 points has 0.998394 of its area: sin(2π/N)/(2π/N).
TEST(ReadBlock, SixtyFourSamplesACycleAreNoPolygon) {
  const auto reading = readingOf(
      standardWave(), [](double, double v) { return 1500 * v; }, 64);
  EXPECT_NEAR(reading.energy / 123.370055, 1, 5e-4);
  EXPECT_GT(reading.energy / 123.370055, 0.9990);
  EXPECT_NEAR(readingOf(
                  standardWave(), [](double, double v) { return 1500 * v; }, 100.3)
                  .energy,
              123.370055,
              3e-4 * 123.37);
  EXPECT_NEAR(readingOf(
                  standardWave(), [](double, double v) { return 1500 * v; }, 40.3)
                  .energy,
              123.370055,
              1e-3 * 123.37);
}

TEST(ReadBlock, ATriangleIsReadAtMidStroke) {
  MadeWave wave = standardWave();
  wave.shape = MadeShape::Triangle;
  const Law law = [](double x, double v) { return 200 + 4000 * x + 1500 * v; };
  const auto reading = readingOf(wave, law);
  const double speed = 2 * 0.1 * 100 / 60;
  EXPECT_NEAR(reading.compression.peakVelocity, speed, 1e-3 * speed);
  EXPECT_NEAR(reading.rebound.peakVelocity, speed, 1e-3 * speed);
  EXPECT_NEAR(reading.compression.displacement, 0, 1e-5);
  EXPECT_NEAR(reading.compression.force, 200 + 1500 * speed, 0.5);
  EXPECT_NEAR(reading.rebound.force, 1500 * speed - 200, 0.5);
  // a corner that no rig has: the grid's half degree blunts each by a quarter of a point in 360
  EXPECT_NEAR(reading.energy, 2 * 0.1 * 1500 * speed, 3e-3 * 2 * 0.1 * 1500 * speed);
  EXPECT_NEAR(reading.equivalentDamping, 1500, 1e-3 * 1500);
}

TEST(ReadBlock, AForceThatPushesTheWrongWayIsNegativeAndNotRectified) {
  const Law gas = [](double, double v) { return 150 + 200 * v; };
  const auto reading = readingOf(standardWave(), gas);
  EXPECT_NEAR(reading.rebound.force, 200 * 0.52359878 - 150, 0.02);
  EXPECT_LT(reading.rebound.force, 0);
  EXPECT_NEAR(reading.compression.force, 200 * 0.52359878 + 150, 0.02);
}

TEST(ReadBlock, AKneeNearThePeakDoesNotPullTheForceDown) {
  for (const double knee : {0.6, 0.8, 0.9, 0.95, 0.98}) {
    const double v0 = knee * 0.52359878;
    const Law law = [&](double, double v) {
      const double a = std::abs(v);
      return sign(v) * (a < v0 ? 3000 * a : 3000 * v0 + 500 * (a - v0));
    };
    const auto reading = readingOf(standardWave(), law);
    const double expected = law(0, 0.52359878);
    EXPECT_NEAR(reading.compression.force, expected, 0.003 * expected) << knee;
  }
}

TEST(ReadBlock, ForceTimesKGivesReadingsTimesK) {
  const Law law = [](double x, double v) {
    return 100 + 500 * x + 900 * v + 40 * std::tanh(v / 0.01);
  };
  const auto one = readingOf(standardWave(), law);
  const auto three = readingOf(standardWave(), [&](double x, double v) { return 3 * law(x, v); });
  EXPECT_NEAR(three.compression.force, 3 * one.compression.force, 1e-6);
  EXPECT_NEAR(three.rebound.largestForce, 3 * one.rebound.largestForce, 1e-6);
  EXPECT_NEAR(three.energy, 3 * one.energy, 1e-6);
  EXPECT_NEAR(three.phaseLag, one.phaseLag, 1e-9);
  EXPECT_EQ(three.compression.peakVelocity, one.compression.peakVelocity);
}

TEST(ReadBlock, TurnedRoundTheDirectionsChangePlaces) {
  MadePlan plan;
  plan.waves = {standardWave(0.1, 100, 7)};
  plan.force = [](double x, double v) { return 1000 * x + (v > 0 ? 800 * v : 2400 * v); };
  plan.displacementNoise = 1e-5;
  plan.forceNoise = 2;
  Motion motion = motionOf(test::makeRun(plan));
  const auto one = readBlock(blockOf(motion));
  for (auto* channel : {&motion.displacement, &motion.velocity, &motion.force})
    for (double& value : *channel) value = -value;
  const auto other = readBlock(blockOf(motion));
  // half a cycle of difference in what is averaged: both within the noise
  EXPECT_NEAR(other.compression.force, one.rebound.force, 1);
  EXPECT_NEAR(other.rebound.force, one.compression.force, 1);
  EXPECT_NEAR(other.energy, one.energy, 1e-3 * one.energy);
}

TEST(ReadBlock, AClippedPeakIsNotReadAndTheOtherDirectionIs) {
  MadePlan plan;
  plan.waves = {standardWave()};
  plan.force = [](double, double v) { return 1500 * v; };
  Motion motion = motionOf(test::makeRun(plan));
  for (std::size_t i = 0; i < motion.size(); ++i) {
    if (motion.force[i] < 700) continue;
    motion.force[i] = 700;
    motion.doubtful[i] = ForceClipped;
  }
  const auto reading = readBlock(blockOf(motion));
  EXPECT_FALSE(reading.compression.isRead());
  EXPECT_TRUE(std::isnan(reading.compression.largestForce));
  EXPECT_TRUE(std::isnan(reading.compression.energy));
  EXPECT_TRUE(std::isnan(reading.energy));
  EXPECT_NEAR(reading.rebound.force, 785.398, 0.05);
  EXPECT_NEAR(reading.rebound.energy, 123.370055 / 2, 0.05);
  EXPECT_TRUE(makeCurve(Direction::Compression, {{0, 0.1, reading.compression}}).points.empty());
}

TEST(ReadBlock, AHoldReadsNothing) {
  Block hold;
  hold.kind = BlockKind::Hold;
  EXPECT_FALSE(readBlock(hold).compression.isRead());
  EXPECT_TRUE(std::isnan(readBlock(hold).energy));
}

TEST(MakeCurve, StandsByRisingVelocityThenStroke) {
  Reading slow, fast;
  slow.peakVelocity = 0.1;
  fast.peakVelocity = 0.5;
  const Curve curve =
      makeCurve(Direction::Rebound, {{0, 0.1, fast}, {1, 0.1, slow}, {2, 0.05, slow}});
  ASSERT_EQ(curve.points.size(), 3u);
  EXPECT_EQ(curve.direction, Direction::Rebound);
  EXPECT_EQ(curve.points[0].block, 2u);
  EXPECT_EQ(curve.points[1].block, 1u);
  EXPECT_EQ(curve.points[2].block, 0u);
}

}  // namespace
}  // namespace dampwright
