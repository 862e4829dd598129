// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/local_polynomial.h"

#include <gtest/gtest.h>

#include <cmath>
#include <numeric>
#include <random>
#include <string>
#include <vector>

#include "core/base/units.h"
#include "tests/support/scipy.h"

namespace dampwright {
namespace {

void expectWeights(const LocalPolynomial& fit, const std::vector<double>& whole, double norm) {
  const auto weights = localWeights(fit);
  ASSERT_EQ(weights.size(), whole.size());
  for (std::size_t i = 0; i < whole.size(); ++i) EXPECT_NEAR(weights[i], whole[i] / norm, 1e-13);
}

// Source: Savitzky & Golay, Anal. Chem. 36 (1964) 1627; exact fractions by rational least squares.
TEST(LocalPolynomial, SmoothingWeightsAreThePublishedFractions) {
  expectWeights({2, 2, 0}, {-3, 12, 17, 12, -3}, 35);
  expectWeights({3, 3, 0}, {-2, 3, 6, 7, 6, 3, -2}, 21);
  expectWeights({4, 2, 0}, {-21, 14, 39, 54, 59, 54, 39, 14, -21}, 231);
  expectWeights({3, 4, 0}, {5, -30, 75, 131, 75, -30, 5}, 231);
  expectWeights({4, 5, 0}, {15, -55, 30, 135, 179, 135, 30, -55, 15}, 429);
}

TEST(LocalPolynomial, DerivativeWeightsAreThePublishedFractions) {
  expectWeights({2, 1, 1}, {-2, -1, 0, 1, 2}, 10);
  expectWeights({2, 4, 1}, {1, -8, 0, 8, -1}, 12);
  expectWeights({3, 3, 1}, {22, -67, -58, 0, 58, 67, -22}, 252);
  expectWeights({4, 4, 1}, {86, -142, -193, -126, 0, 126, 193, 142, -86}, 1188);
  expectWeights({2, 2, 2}, {2, -1, -2, -1, 2}, 7);
}

// A table in circulation prints 343 where 342 is right: the weights must sum to one.
TEST(LocalPolynomial, TheTwentyFivePointWeightIs342) {
  const auto weights = localWeights({12, 2, 0});
  EXPECT_NEAR(weights[7] * 5175, 342, 1e-9);
  EXPECT_NEAR(std::accumulate(weights.begin(), weights.end(), 0.0), 1, 1e-13);
}

TEST(LocalPolynomial, NoiseGainIsTheClosedForm) {
  for (const int m : {2, 4, 10}) {
    const auto weights = localWeights({m, 2, 1});
    const double gain = std::inner_product(weights.begin(), weights.end(), weights.begin(), 0.0);
    EXPECT_NEAR(gain, 3.0 / (m * (m + 1) * (2 * m + 1)), 1e-14);
  }
}

TEST(LocalPolynomial, PolynomialsUpToTheDegreeComeOutExactAtEverySample) {
  std::vector<double> quartic(40), slope(40);
  for (std::size_t i = 0; i < quartic.size(); ++i) {
    const double t = static_cast<double>(i) / 100;
    quartic[i] = 2 - 3 * t + 5 * t * t - 7 * t * t * t + 11 * t * t * t * t;
    slope[i] = -3 + 10 * t - 21 * t * t + 44 * t * t * t;
  }
  const auto value = applyLocal({5, 4, 0}, quartic, 100);
  const auto derivative = applyLocal({5, 4, 1}, quartic, 100);
  for (std::size_t i = 0; i < quartic.size(); ++i) {
    EXPECT_NEAR(value[i], quartic[i], 1e-12);
    EXPECT_NEAR(derivative[i], slope[i], 1e-10);  // rounding times the rate
  }
}

TEST(LocalPolynomial, IsSciPysSavgolFilterEndsIncluded) {
  std::mt19937_64 random(3);
  std::normal_distribution<double> normal(0, 1);
  std::vector<double> signal(60);
  for (double& value : signal) value = normal(random);
  for (const int derivative : {0, 1, 2}) {
    const auto expected = test::pythonNumbers(
        "from scipy.signal import savgol_filter\nprint(*savgol_filter(" + test::pythonList(signal) +
        ", 13, 4, deriv=" + std::to_string(derivative) + ", delta=0.001, mode='interp'))");
    const auto out = applyLocal({6, 4, derivative}, signal, 1000);
    ASSERT_EQ(out.size(), expected.size());
    for (std::size_t i = 0; i < out.size(); ++i)
      EXPECT_NEAR(out[i], expected[i], 1e-9 * std::pow(1000, derivative));
  }
}

// Gain of published derivative windows on a sine of 1.6667 Hz at 1 kHz.
TEST(LocalPolynomial, LossOfALongWindowIsTheTabulatedOne) {
  const double angle = 2 * pi * (100.0 / 60) / 1000;
  EXPECT_NEAR(1 - derivativeLoss({1, 2, 1}, angle), 0.99998172, 1e-8);
  EXPECT_NEAR(1 - derivativeLoss({4, 2, 1}, angle), 0.99978435, 1e-8);
  EXPECT_NEAR(1 - derivativeLoss({10, 2, 1}, angle), 0.99879789, 1e-8);
  EXPECT_NEAR(1 - derivativeLoss({25, 2, 1}, angle), 0.99289370, 1e-8);
}

TEST(LocalPolynomial, TheChosenDerivativeLosesNextToNothing) {
  // 6.4 Hz at 2 kHz is 1 m/s over 50 mm; 40 samples a cycle is the coarsest that is promised
  for (const double samplesPerCycle : {40.0, 100.0, 314.0, 6283.0, 62832.0}) {
    const double angle = 2 * pi / samplesPerCycle;
    const LocalPolynomial fit = derivativeFor(angle);
    EXPECT_LT(std::abs(derivativeLoss(fit, angle)), 2.6e-5) << samplesPerCycle;
  }
  EXPECT_EQ(derivativeFor(2 * pi / 40).halfWidth, 2);
  EXPECT_EQ(derivativeFor(2 * pi / 62832).halfWidth, 25);
}

}  // namespace
}  // namespace dampwright
