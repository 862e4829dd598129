// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/harmonics.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <random>
#include <string>
#include <vector>

#include "core/base/units.h"
#include "tests/support/scipy.h"

namespace dampwright {
namespace {

struct Samples {
  std::vector<double> times, values;
};

// 3 + 2 cos + 5 sin + 0.5 cos 3, period 0.8, at uneven times
Samples uneven(double noise) {
  std::mt19937_64 random(11);
  std::normal_distribution<double> normal(0, 1);
  std::uniform_real_distribution<double> when(0, 2);
  Samples out;
  for (int i = 0; i < 500; ++i) {
    const double t = when(random), angle = 2 * pi * t / 0.8;
    out.times.push_back(t);
    out.values.push_back(3 + 2 * std::cos(angle) + 5 * std::sin(angle) + 0.5 * std::cos(3 * angle) +
                         noise * normal(random));
  }
  return out;
}

TEST(Harmonics, UnevenTimesGiveTheCoefficientsBack) {
  const Samples s = uneven(0);
  const Harmonics fit = fitHarmonics(s.times, s.values, 0.8, 4);
  EXPECT_NEAR(fit.mean, 3, 1e-12);
  EXPECT_NEAR(fit.cosine[0], 2, 1e-12);
  EXPECT_NEAR(fit.sine[0], 5, 1e-12);
  EXPECT_NEAR(fit.cosine[2], 0.5, 1e-12);
  EXPECT_NEAR(fit.amplitude(2), 0, 1e-12);
  EXPECT_NEAR(fit.rms, 0, 1e-12);
  EXPECT_NEAR(fit.at(0.3),
              3 + 2 * std::cos(0.75 * pi) + 5 * std::sin(0.75 * pi) + 0.5 * std::cos(2.25 * pi),
              1e-12);
}

TEST(Harmonics, SlopeIsTheFiniteDifference) {
  const Samples s = uneven(0);
  const Harmonics fit = fitHarmonics(s.times, s.values, 0.8, 4);
  const double h = 1e-5;  // error h²·(3ω)³·0.5/6 = 1e-7
  EXPECT_NEAR(fit.slopeAt(0.31), (fit.at(0.31 + h) - fit.at(0.31 - h)) / (2 * h), 2e-6);
}

TEST(Harmonics, IsTheLeastSquaresOfNumPy) {
  const Samples s = uneven(1);
  const Harmonics fit = fitHarmonics(s.times, s.values, 0.8, 3);
  const auto expected =
      test::pythonNumbers("import numpy as np\nt = np.array(" + test::pythonList(s.times) +
                          ")\ny = np.array(" + test::pythonList(s.values) +
                          ")\nw = 2*np.pi*t/0.8\n"
                          "A = np.column_stack([np.ones_like(t)] + [f(h*w) for h in (1,2,3) for f "
                          "in (np.cos, np.sin)])\n"
                          "c = np.linalg.lstsq(A, y, rcond=None)[0]\nprint(*c, "
                          "np.sqrt(np.sum((y-A@c)**2)/(len(t)-7)))");
  ASSERT_EQ(expected.size(), 8u);
  EXPECT_NEAR(fit.mean, expected[0], 1e-11);
  for (std::size_t h = 0; h < 3; ++h) {
    EXPECT_NEAR(fit.cosine[h], expected[1 + 2 * h], 1e-11);
    EXPECT_NEAR(fit.sine[h], expected[2 + 2 * h], 1e-11);
  }
  EXPECT_NEAR(fit.rms, expected[7], 1e-11);
}

TEST(Harmonics, MissingValuesAreLeftOut) {
  Samples s = uneven(0);
  for (std::size_t i = 0; i < s.values.size(); i += 7)
    s.values[i] = std::numeric_limits<double>::quiet_NaN();
  EXPECT_NEAR(fitHarmonics(s.times, s.values, 0.8, 4).sine[0], 5, 1e-12);
}

TEST(Harmonics, OnlyWhatStandsOutOfTheNoiseStays) {
  const Samples s = uneven(0.2);
  const Harmonics fit = significantPart(fitHarmonics(s.times, s.values, 0.8, 8), 500, 4);
  EXPECT_GT(fit.amplitude(3), 0.4);
  for (const int h : {2, 4, 5, 6, 7, 8}) EXPECT_EQ(fit.amplitude(h), 0) << h;
}

TEST(Harmonics, FewValuesCarryFewHarmonics) {
  const std::vector<double> times = {0, 0.1, 0.2, 0.3, 0.4, 0.5}, values = {0, 1, 0, -1, 0, 1};
  EXPECT_EQ(fitHarmonics(times, values, 0.4, 20).order(), 2);
}

}  // namespace
}  // namespace dampwright
