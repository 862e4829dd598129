// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/laws/gas_column.h"

#include <gtest/gtest.h>

#include <cmath>

namespace dampwright {
namespace {

// Rod of 11 mm (95.0332 mm²) into 100 cm³ at 25 bar: L = V0/A. The polytropic law of the gas
// spring, p·A = p0·A·(V0/(V0 − A·x))^n; computed here from the volumes.
const double area = 95.0332e-6;
const double volume = 100e-6;

TEST(GasColumn, IsThePolytropicLawOfVolumes) {
  for (const double n : {1.0, 1.2, 1.4}) {
    const GasColumn column{237.5829, area / volume, n};
    for (const double x : {-0.05, 0.0, 0.08}) {
      const double expected = 237.5829 * std::pow(volume / (volume - area * x), n);
      EXPECT_NEAR(column.at(x), expected, 1e-10);
    }
    // stiffness n·p·A²/V0 at x = 0
    EXPECT_NEAR(column.slope(0), n * 237.5829 * area / volume, 1e-10);
  }
}

TEST(GasColumn, OutsidePressureTakenOffIsTheGasSpringFormula) {
  // (p − p_atm)·A with p0 = 25 bar gauge, x = 80 mm, n = 1.2 gives 262.1889 N.
  const double outside = 1.01325e5 * area;
  const GasColumn absolute{237.5829 + outside, area / volume, 1.2};
  EXPECT_NEAR(absolute.at(0.08) - outside, 262.1889, 1e-3);
  EXPECT_NEAR(absolute.slope(0), 281.920, 1e-3);  // N/m, n·p·A²/V0
}

TEST(GasColumn, InverseLengthZeroIsAConstantForce) {
  const GasColumn column{120, 0, 1.2};
  EXPECT_EQ(column.at(0.03), 120);
  EXPECT_EQ(column.slope(0.03), 0);
}

TEST(GasColumn, DerivativesAgreeWithFiniteDifferences) {
  const GasColumn column{200, 0.9, 1.2};
  const double x = 0.04;
  const double h = 1e-6;  // error of the central difference (h²/6 of the third derivative) < 1e-9
  const double byLength =
      (GasColumn{200, 0.9 + h, 1.2}.at(x) - GasColumn{200, 0.9 - h, 1.2}.at(x)) / (2 * h);
  EXPECT_NEAR(gradientOf(column, x).byInverseLength, byLength, 1e-7);
  EXPECT_NEAR(gradientOf(column, x).byForce, column.at(x) / 200, 1e-12);
  EXPECT_NEAR(column.slope(x), (column.at(x + h) - column.at(x - h)) / (2 * h), 1e-6);
}

}  // namespace
}  // namespace dampwright
