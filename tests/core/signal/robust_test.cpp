// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/robust.h"

#include <gtest/gtest.h>

#include <cmath>
#include <random>
#include <vector>

#include "core/base/units.h"
#include "tests/support/scipy.h"

namespace dampwright {
namespace {

TEST(Robust, MedianIsTheMiddleOrTheMeanOfTheTwoMiddleOnes) {
  EXPECT_EQ(median({3, 1, 2}), 2);
  EXPECT_EQ(median({4, 1, 3, 2}), 2.5);
  EXPECT_TRUE(std::isnan(median({})));
}

TEST(Robust, SpreadIsSciPysScaledMedianDeviation) {
  std::mt19937_64 random(5);
  std::normal_distribution<double> normal(10, 3);
  std::vector<double> values(501);
  for (double& value : values) value = normal(random);
  const auto expected =
      test::pythonNumbers("from scipy.stats import median_abs_deviation as mad\nprint(mad(" +
                          test::pythonList(values) + ", scale='normal'))");
  EXPECT_NEAR(robustSpread(values), expected.at(0), 1e-12);
}

TEST(Robust, NoiseOnASineIsFoundWhateverTheSine) {
  std::mt19937_64 random(9);
  std::normal_distribution<double> normal(0, 1e-5);
  std::vector<double> signal(100000);
  for (std::size_t i = 0; i < signal.size(); ++i)
    signal[i] = 0.025 * std::sin(2 * pi * 6.4 * static_cast<double>(i) / 2000) + normal(random);
  EXPECT_NEAR(noiseLevel(signal), 1e-5, 4e-7);  // 20,000 differences: 1.3 %; the sine adds 3 %
}

TEST(Robust, SpikesDoNotRaiseTheNoise) {
  std::mt19937_64 random(9);
  std::normal_distribution<double> normal(0, 1);
  std::vector<double> signal(10000);
  for (std::size_t i = 0; i < signal.size(); ++i)
    signal[i] = normal(random) + (i % 100 == 0 ? 1e4 : 0);
  EXPECT_NEAR(noiseLevel(signal), 1, 0.08);
}

TEST(Robust, TooFewSamplesHaveNoNoise) { EXPECT_EQ(noiseLevel(std::vector<double>{1, 2, 3}), 0); }

}  // namespace
}  // namespace dampwright
