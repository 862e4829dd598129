// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/uncertainty/student_t.h"

#include <gtest/gtest.h>

#include <limits>

namespace dampwright {
namespace {

TEST(CoverageFactor, TableG2OfTheGum) {
  // JCGM 100:2008, table G.2, column 95 % and 99 %, printed to two digits after the point.
  EXPECT_NEAR(coverageFactor(0.95, 1), 12.71, 0.005);
  EXPECT_NEAR(coverageFactor(0.95, 10), 2.23, 0.005);
  EXPECT_NEAR(coverageFactor(0.99, 16), 2.92, 0.005);
  EXPECT_NEAR(coverageFactor(0.95, std::numeric_limits<double>::infinity()), 1.960, 0.0005);
}

TEST(CoverageFactor, DegreesOfFreedomAreTruncated) {
  EXPECT_EQ(coverageFactor(0.99, 16.75), coverageFactor(0.99, 16));
  EXPECT_EQ(coverageFactor(0.95, 0.3), coverageFactor(0.95, 1));
}

}  // namespace
}  // namespace dampwright
