// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/column_shape.h"

#include <gtest/gtest.h>

#include <cmath>
#include <random>
#include <vector>

#include "core/base/units.h"

namespace dampwright {
namespace {

template <class F>
std::vector<double> made(int count, F f) {
  std::vector<double> values;
  for (int i = 0; i < count; ++i) values.push_back(f(i));
  return values;
}

TEST(ColumnShape, AClockRisesEvenly) {
  EXPECT_TRUE(isClock(made(100, [](int i) { return 0.01 * i; })));
  EXPECT_TRUE(isClock(made(100, [](int i) { return 12.0 * i + i % 3; })));
  EXPECT_FALSE(isClock(made(100, [](int i) { return std::sin(0.1 * i); })));
  EXPECT_FALSE(isClock(made(100, [](int i) { return 0.01 * i * i; })));
  EXPECT_FALSE(isClock(made(100, [](int) { return 5.0; })));
  EXPECT_FALSE(isClock({}));
}

// sin: |second difference| / |first difference| = 2 sin(ωΔt/2). White noise: √(6/2) = 1.732.
TEST(ColumnShape, RoughnessTellsSineFromNoise) {
  EXPECT_NEAR(
      roughness(made(1000, [](int i) { return std::sin(0.1 * i); })), 2 * std::sin(0.05), 1e-3);
  std::mt19937 random(7);
  std::normal_distribution<double> normal;
  EXPECT_NEAR(
      roughness(made(10000, [&](int) { return normal(random); })), 1.732, 0.05);  // 3 / √10000
}

TEST(ColumnShape, AVelocityIsKnownByItsSlope) {
  const auto x = made(500, [](int i) { return 20 * std::sin(0.05 * i); });
  const auto v = made(500, [](int i) { return 7 * 20 * 0.05 * std::cos(0.05 * i); });
  ASSERT_TRUE(slopeFactor(x, v).has_value());
  EXPECT_NEAR(*slopeFactor(x, v), 7, 7 * 5e-4);  // central difference: (ωΔt)²/6 = 4e-4
  EXPECT_FALSE(slopeFactor(v, x).has_value());
  EXPECT_FALSE(slopeFactor(x, x).has_value());
  EXPECT_FALSE(slopeFactor({}, {}).has_value());
}

TEST(ColumnShape, CyclesAreCountedThroughNoise) {
  std::mt19937 random(3);
  std::normal_distribution<double> normal(0, 0.05);
  const auto noisy =
      made(2000, [&](int i) { return std::sin(2 * pi * i / 100.0) + normal(random); });
  ASSERT_TRUE(rowsPerCycle(noisy).has_value());
  EXPECT_NEAR(
      *rowsPerCycle(noisy), 100, 3);  // noise over slope at the crossing: 0.05/0.063 rows, × 2
  EXPECT_FALSE(rowsPerCycle(made(100, [](int i) { return 1.0 * i; })).has_value());
}

TEST(ColumnShape, AStepIsTheUsualOneThatIsNotZero) {
  EXPECT_DOUBLE_EQ(medianStep(std::vector<double>{0, 0, 2, 2, 4, 4, 9}), 2);
  EXPECT_EQ(medianStep(std::vector<double>{1, 1, 1}), 0);
}

}  // namespace
}  // namespace dampwright
