// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/margin_bar.h"

#include <gtest/gtest.h>

#include "tests/ui/look/drawing.h"

namespace dampwright {
namespace {

CheckVerdict check(std::optional<double> y,
                   double u,
                   std::optional<double> min,
                   std::optional<double> max) {
  CheckVerdict verdict;
  verdict.measured = y;
  verdict.expandedUncertainty = u;
  verdict.min = min;
  verdict.max = max;
  return verdict;
}

TEST(MarginBars, TwoLimitsFillTheMiddleHalf) {
  const MarginScale scale = marginScale(check(995, 25, 870, 1120));
  EXPECT_NEAR(scale.allowedFrom, 0.25, 1e-12);  // straight line in double precision
  EXPECT_NEAR(scale.allowedTo, 0.75, 1e-12);
  EXPECT_NEAR(*scale.at, 0.5, 1e-12);
  EXPECT_NEAR(scale.from, 0.45, 1e-12);
  EXPECT_NEAR(scale.to, 0.55, 1e-12);
  EXPECT_FALSE(scale.beyond);
}

TEST(MarginBars, ALargestValueStandsAtThreeQuartersWithZeroAtTheEnd) {
  const MarginScale scale = marginScale(check(22.5, 0, {}, 45));
  EXPECT_NEAR(scale.allowedTo, 0.75, 1e-12);
  EXPECT_DOUBLE_EQ(scale.allowedFrom, 0);
  EXPECT_NEAR(*scale.at, 0.375, 1e-12);
}

TEST(MarginBars, ASmallestValueStandsAtOneQuarter) {
  const MarginScale scale = marginScale(check(120, 0, 120, {}));
  EXPECT_NEAR(scale.allowedFrom, 0.25, 1e-12);
  EXPECT_NEAR(*scale.at, 0.25, 1e-12);
  EXPECT_DOUBLE_EQ(scale.allowedTo, 1);
}

TEST(MarginBars, AFigureFarOutIsClampedAndSaysSo) {
  EXPECT_TRUE(marginScale(check(9000, 5, 870, 1120)).beyond);
  EXPECT_NEAR(*marginScale(check(9000, 5, 870, 1120)).at, 1.0, 1e-12);
  EXPECT_NEAR(*marginScale(check(-900, 5, 870, 1120)).at, 0.0, 1e-12);
}

TEST(MarginBars, DegenerateLimitsStayOnTheBar) {
  for (const auto& odd : {check(5, 1, 10, 10),
                          check(0, 0, {}, 0),
                          check(5, 1, 0, {}),
                          check(5, 1, {}, {}),
                          check({}, 0, 1, 2),
                          check(-3, 1, {}, -2)}) {
    const MarginScale scale = marginScale(odd);
    for (const double share : {scale.allowedFrom, scale.allowedTo, scale.at.value_or(0.5)}) {
      EXPECT_GE(share, 0);
      EXPECT_LE(share, 1);
    }
  }
}

TEST(MarginBars, NothingIsDrawnOutsideTheBox) {
  for (const double y : {-900.0, 860.0, 995.0, 1130.0, 9000.0}) {
    const QImage image = drawn({140, 40}, [y](QPainter& painter) {
      paintMarginBar(painter, {20, 10, 100, 18}, check(y, 60, 870, 1120), printPalette());
    });
    EXPECT_TRUE(QRect(19, 9, 102, 20).contains(inkBounds(image))) << y;
  }
}

}  // namespace
}  // namespace dampwright
