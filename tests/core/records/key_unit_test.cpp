// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/key_unit.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <random>

namespace dampwright {
namespace {

TEST(KeyUnit, TheEndOfAKeySaysTheUnit) {
  EXPECT_EQ(unitOfKey("stroke_mm").toSi(50), 0.05);
  EXPECT_EQ(unitOfKey("velocity_mm_s").toSi(300), 0.3);
  EXPECT_EQ(unitOfKey("series_stiffness_n_per_mm").toSi(4), 4000);
  EXPECT_EQ(unitOfKey("equivalent_damping_n_s_per_m").toSi(1600), 1600);
  EXPECT_EQ(unitOfKey("force_delay_u_ms").toSi(0.5), 0.0005);
  EXPECT_EQ(unitOfKey("pressure_bar").toSi(20), 2e6);
  EXPECT_DOUBLE_EQ(unitOfKey("phase_lag_deg").toSi(180), std::acos(-1.0));
  EXPECT_EQ(unitOfKey("bleed_mm_s_per_sqrt_n").toSi(5), 0.005);
  EXPECT_EQ(unitOfKey("force_n").toSi(7), 7);
  EXPECT_EQ(unitOfKey("temperature_c").toSi(21), 21);
  EXPECT_EQ(unitOfKey("mid").toSi(3), 3);
}

TEST(KeyUnit, AStandardUncertaintyHasTheUnitOfItsFigure) {
  EXPECT_EQ(unitOfKey("play_mm_u").toSi(1), 0.001);
  EXPECT_EQ(unitOfKey("rate_n_per_mm_u").toSi(1), 1000);
}

TEST(KeyUnit, NullMeansInfiniteOnlyForDegreesOfFreedomAndAicc) {
  EXPECT_TRUE(std::isinf(unitOfKey("force_n_dof").whenNull));
  EXPECT_TRUE(std::isinf(unitOfKey("dof").whenNull));
  EXPECT_TRUE(std::isinf(unitOfKey("aicc").whenNull));
  EXPECT_TRUE(std::isnan(unitOfKey("force_n").whenNull));
  EXPECT_TRUE(std::isnan(unitOfKey("anything").whenNull));
}

TEST(KeyUnit, WhatAPersonWroteIsWrittenBackWithTheSameDigits) {
  for (int tenths = 1; tenths < 20000; ++tenths) {
    const double written = tenths / 10.0;
    for (const char* key : {"stroke_mm", "velocity_mm_s", "pressure_bar", "rate_n_per_mm"}) {
      const KeyUnit& unit = unitOfKey(key);
      ASSERT_EQ(unit.fromSi(unit.toSi(written)), written) << key;
    }
  }
}

TEST(KeyUnit, AnyValueComesBackToWithinOneUnitInTheLastPlace) {
  std::mt19937_64 random(7);
  std::uniform_real_distribution<double> exponent(-12, 6);
  int exact = 0;
  constexpr int tries = 100000;
  const KeyUnit& unit = unitOfKey("stroke_mm");
  for (int i = 0; i < tries; ++i) {
    const double si = std::pow(10.0, exponent(random));
    const double back = unit.toSi(unit.fromSi(si));
    exact += back == si ? 1 : 0;
    // one unit in the last place of a double is at most 2.2e-16 of it
    ASSERT_NEAR(back, si, 2.3e-16 * si);
  }
  // 1000/1024: in that share of a binade the spacing of mm is coarser than that of m
  EXPECT_GT(exact, tries * 0.97);
}

TEST(KeyUnit, WhatIsNoNumberStaysNone) {
  const KeyUnit& unit = unitOfKey("stroke_mm");
  EXPECT_TRUE(std::isnan(unit.fromSi(std::numeric_limits<double>::quiet_NaN())));
  EXPECT_TRUE(std::isinf(unit.fromSi(std::numeric_limits<double>::infinity())));
}

}  // namespace
}  // namespace dampwright
