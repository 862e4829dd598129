// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/fit/aicc.h"

#include <gtest/gtest.h>

#include <cmath>

namespace dampwright {
namespace {

TEST(Aicc, WorkedByHand) {
  // n = 10, two parameters and the variance: K = 3; 10·ln 0.5 + 6 + 24/6.
  EXPECT_NEAR(aicc(5, 10, 2), 10 * std::log(0.5) + 10, 1e-12);
}

TEST(Aicc, TooFewPointsAreInfinitelyBad) {
  EXPECT_TRUE(std::isinf(aicc(1, 4, 2)));
  EXPECT_TRUE(std::isfinite(aicc(1, 5, 2)));
}

TEST(Aicc, AParameterMustPayForItself) {
  EXPECT_LT(aicc(1.0, 12, 1), aicc(0.95, 12, 3));
  EXPECT_GT(aicc(1.0, 12, 1), aicc(0.2, 12, 3));
}

}  // namespace
}  // namespace dampwright
