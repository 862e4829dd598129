// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/laws/dry_friction.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

TEST(DryFriction, IsOddAndSaturates) {
  const DryFriction friction{25, 0.001};
  EXPECT_EQ(friction.at(0), 0);
  EXPECT_EQ(friction.at(-0.002), -friction.at(0.002));
  EXPECT_NEAR(friction.at(0.05), 25, 1e-12);
}

TEST(DryFriction, DerivativesAgreeWithFiniteDifferences) {
  const DryFriction friction{25, 0.001};
  const double v = 0.0013;
  const double h = 1e-8;  // 1e-5 of v_f: the central difference is good to 1e-10
  const double byChange =
      (DryFriction{25, 0.001 + h}.at(v) - DryFriction{25, 0.001 - h}.at(v)) / (2 * h);
  EXPECT_NEAR(gradientOf(friction, v).byChangeSpeed, byChange, 1e-4);
  EXPECT_NEAR(gradientOf(friction, v).byForce, friction.at(v) / 25, 1e-12);
}

}  // namespace
}  // namespace dampwright
