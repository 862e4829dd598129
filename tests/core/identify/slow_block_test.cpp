// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/identify/slow_block.h"

#include <gtest/gtest.h>

#include <cmath>
#include <cstdio>

#include "tests/core/identify/made_run.h"

namespace dampwright {
namespace {

/// Gas 180 N at x = 0, L = 0.6 m, n = 1.2; friction 28 N, v_f = 0.3 mm/s; 900 and 1500 N·s/m.
double model(double x, double v) {
  const double slope = v > 0 ? 900 : 1500;
  return 180 * std::pow(0.6 / (0.6 - x), 1.2) + 28 * std::tanh(v / 0.0003) + slope * v;
}

SlowBlockFit fitted(const test::MadeForce& force, const test::MadeBlock& made = {}) {
  test::MadeRun run;
  run.add(force, made);
  return fitSlowBlock(run.block(0), GasShape::Column, 1.2);
}

TEST(FitSlowBlock, ExactDataGiveTheTruth) {
  const SlowBlockFit fit = fitted(model);
  ASSERT_TRUE(fit.usable()) << codeOf(fit.status);
  EXPECT_NEAR(fit.gas.force, 180, 1e-6);
  EXPECT_NEAR(1 / fit.gas.inverseLength, 0.6, 1e-6);
  EXPECT_NEAR(fit.friction.force, 28, 1e-6);
  EXPECT_NEAR(fit.friction.changeSpeed, 0.0003, 1e-9);
  EXPECT_NEAR(fit.rate, 180 * 1.2 / 0.6, 1e-4);
}

TEST(FitSlowBlock, MeetsItsTargetsAtTwoNewtonsOfNoise) {
  // 2 N on each of 720 points is the noise of a recording of only 23 Hz: the worst case.
  double worstGas = 0, worstDry = 0, gasBias = 0, dryBias = 0, gasInside = 0, dryInside = 0;
  const int runs = 100;
  for (unsigned seed = 1; seed <= runs; ++seed) {
    test::MadeBlock made;
    made.noise = 2;
    made.seed = seed;
    const SlowBlockFit fit = fitted(model, made);
    ASSERT_TRUE(fit.usable()) << codeOf(fit.status);
    worstGas = std::max(worstGas, std::abs(fit.gas.force - 180));
    worstDry = std::max(worstDry, std::abs(fit.friction.force - 28));
    gasBias += (fit.gas.force - 180) / runs;
    dryBias += (fit.friction.force - 28) / runs;
    gasInside += std::abs(fit.gas.force - 180) < 2 * fit.gasU ? 1.0 / runs : 0;
    dryInside += std::abs(fit.friction.force - 28) < 2 * fit.dryU ? 1.0 / runs : 0;
  }
  std::printf(
      "gas: bias %.3f, worst %.2f N, inside 2u %.0f %%; dry: bias %.3f, worst %.2f N, inside "
      "2u %.0f %%\n",
      gasBias,
      worstGas,
      100 * gasInside,
      dryBias,
      worstDry,
      100 * dryInside);
  EXPECT_LT(std::abs(gasBias), 0.1);
  EXPECT_LT(worstGas, 1.5);  // about four standard errors of 0.35 N
  EXPECT_LT(std::abs(dryBias), 0.3);
  EXPECT_GE(gasInside, 0.88);  // 95 % expected, 0.88 is three standard deviations of 100 runs below
  EXPECT_GE(dryInside, 0.88);
}

TEST(FitSlowBlock, AveragedSamplesOfTwoKilohertzMeetTheTargets) {
  // One cycle of 31.4 s at 2 kHz: 87 samples of 2 N to each of 720 points.
  for (unsigned seed = 1; seed <= 30; ++seed) {
    test::MadeBlock made;
    made.noise = 2 / std::sqrt(87.0);
    made.seed = seed;
    const SlowBlockFit fit = fitted(model, made);
    EXPECT_NEAR(fit.gas.force, 180, 0.5) << seed;
    EXPECT_NEAR(fit.friction.force, 28, 1) << seed;
  }
}

TEST(FitSlowBlock, AFrictionOfAnotherFormStaysInsideItsUncertainty) {
  // Stribeck: 40 N at rest fading to 25 N with 2 mm/s; the limit for speed → 0 is 40 N.
  const auto stribeck = [](double x, double v) {
    const double dry = 25 + 15 * std::exp(-std::pow(v / 0.002, 2));
    return 150 + 200 * x + dry * std::tanh(v / 0.0001) + 1000 * v;
  };
  for (unsigned seed = 1; seed <= 20; ++seed) {
    test::MadeBlock made;
    made.noise = 0.2;
    made.seed = seed;
    const SlowBlockFit fit = fitted(stribeck, made);
    ASSERT_TRUE(fit.usable());
    EXPECT_NEAR(fit.gas.force, 150, 0.5);
    EXPECT_NEAR(fit.friction.force, 40, 2 * fit.dryU) << seed;
    EXPECT_LT(fit.dryU, 12);
  }
}

TEST(FitSlowBlock, WithoutFrictionItIsZeroWithinItsError) {
  const auto smooth = [](double x, double v) { return 100 + 150 * x + 1200 * v; };
  test::MadeBlock made;
  made.noise = 0.5;
  for (made.seed = 1; made.seed <= 20; ++made.seed) {
    const SlowBlockFit fit = fitted(smooth, made);
    ASSERT_TRUE(fit.usable());
    EXPECT_GE(fit.friction.force, 0);
    EXPECT_LT(fit.friction.force, 3 * fit.dryU) << made.seed;
    EXPECT_NEAR(fit.gas.force, 100, 0.5);
  }
}

TEST(FitSlowBlock, AConstantGasForceHasNoLength) {
  const auto constant = [](double, double v) { return 100 + 30 * std::tanh(v / 0.0004) + 800 * v; };
  int without = 0;
  test::MadeBlock made;
  made.noise = 0.3;
  for (made.seed = 1; made.seed <= 20; ++made.seed) {
    const SlowBlockFit fit = fitted(constant, made);
    without += fit.gas.inverseLength == 0 ? 1 : 0;
    EXPECT_LT(std::abs(fit.rate), 4 * fit.rateU);
  }
  EXPECT_GE(without, 16);  // 2 standard errors: about 1 of 20 is kept by chance
}

TEST(FitSlowBlock, LostMotionAfterTheReversalDoesNotTouchIt) {
  // For 2 mm after each turning point the force stays where it was at the reversal.
  const auto gap = [](double x, double v) {
    const bool behind = (v > 0 && x < -0.023) || (v < 0 && x > 0.023);
    return behind ? model(x, 0) - std::copysign(20, v) : model(x, v);
  };
  const SlowBlockFit fit = fitted(gap);
  EXPECT_NEAR(fit.gas.force, 180, 1e-6);
  EXPECT_NEAR(fit.friction.force, 28, 1e-6);
}

TEST(FitSlowBlock, ATurnedRecordingGivesTheTurnedGas) {
  const auto turned = [](double x, double v) { return -model(-x, -v); };
  const SlowBlockFit fit = fitted(turned);
  EXPECT_NEAR(fit.gas.force, -180, 1e-6);
  EXPECT_NEAR(fit.friction.force, 28, 1e-6);
}

TEST(FitSlowBlock, MaskedPhasesAreLeftOut) {
  test::MadeRun run;
  run.add(model);
  Block block = run.block(0);
  for (std::size_t i = 200; i < 300; ++i) block.loop.force[i] = std::nan("");
  EXPECT_NEAR(fitSlowBlock(block, GasShape::Column, 1.2).gas.force, 180, 1e-6);
  for (double& force : block.loop.force) force = std::nan("");
  EXPECT_FALSE(fitSlowBlock(block, GasShape::Column, 1.2).usable());
}

TEST(FitSlowBlock, AnEmptyLoopIsNotUsable) {
  EXPECT_FALSE(fitSlowBlock(Block{}, GasShape::Column, 1.2).usable());
}

}  // namespace
}  // namespace dampwright
