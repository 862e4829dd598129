// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/curves/monotone_cubic.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <random>
#include <vector>

#include "tests/support/scipy.h"

namespace dampwright {
namespace {

struct Points {
  std::vector<double> x, y;
};

Points some(std::uint64_t seed, bool rising) {
  std::mt19937_64 random(seed);
  std::uniform_real_distribution<double> step(0.02, 1), rise(rising ? 0 : -100, 100);
  Points points{{0.05}, {30}};
  for (int i = 0; i < 7; ++i) {
    points.x.push_back(points.x.back() + step(random));
    points.y.push_back(points.y.back() + rise(random));
  }
  return points;
}

TEST(MonotoneCubic, IsSciPysPchipWithItsSlope) {
  for (const bool rising : {true, false}) {
    for (const std::uint64_t seed : {1u, 2u, 3u}) {
      const Points points = some(seed, rising);
      std::vector<double> places;
      for (double x = points.x.front(); x <= points.x.back(); x += 0.037) places.push_back(x);
      const auto expected =
          test::pythonNumbers("from scipy.interpolate import PchipInterpolator as P\nf = P(" +
                              test::pythonList(points.x) + ", " + test::pythonList(points.y) +
                              ")\nx = " + test::pythonList(places) + "\nprint(*f(x), *f(x, 1))");
      const MonotoneCubic cubic(points.x, points.y);
      ASSERT_EQ(expected.size(), 2 * places.size());
      for (std::size_t i = 0; i < places.size(); ++i) {
        EXPECT_NEAR(cubic.at(places[i]), expected[i], 1e-9);
        EXPECT_NEAR(cubic.slopeAt(places[i]), expected[places.size() + i], 1e-8);
      }
    }
  }
}

TEST(MonotoneCubic, NeverLeavesTheRangeOfItsTwoPoints) {
  const Points points = some(5, true);
  const MonotoneCubic cubic(points.x, points.y);
  for (std::size_t i = 0; i + 1 < points.x.size(); ++i)
    for (double share = 0; share <= 1; share += 0.05) {
      const double y = cubic.at(points.x[i] + share * (points.x[i + 1] - points.x[i]));
      EXPECT_GE(y, points.y[i] - 1e-9);
      EXPECT_LE(y, points.y[i + 1] + 1e-9);
    }
}

TEST(MonotoneCubic, TwoPointsAreAStraightLine) {
  const MonotoneCubic line({1, 3}, {10, 20});
  EXPECT_NEAR(line.at(2.5), 17.5, 1e-12);
  EXPECT_NEAR(line.slopeAt(1.2), 5, 1e-12);
  EXPECT_NEAR(line.straightAt(2.5), 17.5, 1e-12);
}

}  // namespace
}  // namespace dampwright
