// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/axis_scale.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <random>

namespace dampwright {
namespace {

TEST(AxisScale, HoldsTheValuesBetweenRoundTicks) {
  std::mt19937 random(7);
  std::uniform_real_distribution<double> exponent(-3, 5), share(-1, 1);
  for (int i = 0; i < 2000; ++i) {
    const double size = std::pow(10.0, exponent(random));
    double low = size * share(random), high = size * share(random);
    if (low > high) std::swap(low, high);
    const AxisScale scale = niceScale(low, high, 7);
    const double rounding = 1e-6 * scale.step;  // a value on a tick opens no further interval
    EXPECT_LE(scale.low, low + rounding);
    EXPECT_GE(scale.high, high - rounding);
    EXPECT_LE((scale.high - scale.low) / scale.step, 7.5);
    const double digits = scale.step / std::pow(10.0, std::floor(std::log10(scale.step) + 1e-9));
    const bool round = std::abs(digits - 1) < 1e-6 || std::abs(digits - 2) < 1e-6 ||
                       std::abs(digits - 2.5) < 1e-6 || std::abs(digits - 5) < 1e-6;
    EXPECT_TRUE(round) << digits;
    EXPECT_LE(std::abs(scale.low / scale.step - std::round(scale.low / scale.step)), 1e-6);
  }
}

TEST(AxisScale, ForcesOfATypicalDamperGetTicksOf500) {
  EXPECT_EQ(niceScale(-1830, 1010, 7), (AxisScale{-2000, 1500, 500}));
}

TEST(AxisScale, EqualOrBrokenValuesStillMakeAScale) {
  for (const double value : {0.0, 5.0, -3e-12, 1e9}) {
    const AxisScale scale = niceScale(value, value, 5);
    EXPECT_LT(scale.low, scale.high);
    EXPECT_LE(scale.low, value);
    EXPECT_GE(scale.high, value);
  }
  const double nan = std::numeric_limits<double>::quiet_NaN();
  EXPECT_EQ(niceScale(nan, 3, 5), (AxisScale{-1, 1, 1}));
  EXPECT_EQ(niceScale(0, INFINITY, 5), (AxisScale{-1, 1, 1}));
}

TEST(AxisScale, ARoomyScaleKeepsTheOutermostMarksWhole) {
  const AxisScale scale = roomyScale(-1000, 1000, 6);
  EXPECT_EQ(scale, (AxisScale{-1100, 1100, 500}));
  EXPECT_EQ(ticksOf(scale), (std::vector<double>{-1000, -500, 0, 500, 1000}));
}

TEST(AxisScale, TicksIncludeBothEnds) {
  EXPECT_EQ(ticksOf({-2, 2, 1}), (std::vector<double>{-2, -1, 0, 1, 2}));
  EXPECT_EQ(ticksInside(-0.9, 1.2, 0.5), (std::vector<double>{-0.5, 0, 0.5, 1}));
  EXPECT_TRUE(ticksInside(0, 1, 0).empty());
}

TEST(AxisScale, TickTextTellsTicksApartAndUsesATrueMinus) {
  EXPECT_EQ(tickText(-500, 500), QString::fromUtf8("−500"));
  EXPECT_EQ(tickText(0.25, 0.25), QStringLiteral("0.25"));
  EXPECT_EQ(tickText(2.5, 2.5), QStringLiteral("2.5"));
  EXPECT_EQ(tickText(0.1, 0.1), QStringLiteral("0.1"));
  EXPECT_EQ(tickText(-1e-17, 0.1), QStringLiteral("0.0"));
}

}  // namespace
}  // namespace dampwright
