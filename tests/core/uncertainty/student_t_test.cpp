// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/uncertainty/student_t.h"

#include <gtest/gtest.h>

#include <limits>

#include "tests/support/scipy.h"

namespace dampwright {
namespace {

TEST(CoverageFactor, TableG2OfTheGum) {
  // JCGM 100:2008, table G.2, column 95 % and 99 %, printed to two digits after the point.
  EXPECT_NEAR(coverageFactor(0.95, 1), 12.71, 0.005);
  EXPECT_NEAR(coverageFactor(0.95, 10), 2.23, 0.005);
  EXPECT_NEAR(coverageFactor(0.99, 16), 2.92, 0.005);
  EXPECT_NEAR(coverageFactor(0.95, std::numeric_limits<double>::infinity()), 1.960, 0.0005);
}

TEST(CoverageFactor, AgreesWithSciPy) {
  const std::vector<double> dofs = {1, 2, 3, 5, 9, 16, 30, 60, 200, 1e4, 1e7};
  const auto expected =
      test::pythonNumbers("from scipy.stats import t\nfor d in " + test::pythonList(dofs) +
                          ":\n  print(t.ppf(0.975, d), t.ppf(0.995, d), t.ppf(0.97725, d))\n");
  ASSERT_EQ(expected.size(), 3 * dofs.size());
  for (std::size_t i = 0; i < dofs.size(); ++i) {
    // SciPy's own quantile is good to about 1e-10
    EXPECT_NEAR(coverageFactor(0.95, dofs[i]), expected[3 * i], 1e-8 * expected[3 * i]);
    EXPECT_NEAR(coverageFactor(0.99, dofs[i]), expected[3 * i + 1], 1e-8 * expected[3 * i + 1]);
    EXPECT_NEAR(coverageFactor(0.9545, dofs[i]), expected[3 * i + 2], 1e-8 * expected[3 * i + 2]);
  }
}

TEST(CoverageFactor, DegreesOfFreedomAreTruncated) {
  EXPECT_EQ(coverageFactor(0.99, 16.75), coverageFactor(0.99, 16));
  EXPECT_EQ(coverageFactor(0.95, 0.3), coverageFactor(0.95, 1));
}

}  // namespace
}  // namespace dampwright
