// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/bench_law.h"

#include <gtest/gtest.h>

#include <cmath>

#include "core/base/units.h"

namespace dampwright::bench {
namespace {

// Front damper in rebound of a public vehicle simulation (repository
// GjermundOstensvig/VehicleStateObserver): speed m/s, force N.
const std::vector<std::pair<double, double>> published = {
    {0.051, 227}, {0.132, 902}, {0.264, 1581}, {0.396, 1862}, {0.528, 2178}, {1.056, 4054}};

std::vector<Law> everyLaw() {
  return {linearLaw(1500),
          powerLaw(900, 0.5),
          powerLaw(800, 2),
          twoSlopeLaw(6000, 900, 0.12),
          smoothLaw(6000, 900, 0.12),
          bleedAndBlowOffLaw(0.006, 500, 900),
          leakAndOrificeLaw(4000, 0.02),
          arctanShoulderLaw(700, 0.08, 600),
          throughPointsLaw(published),
          leakingLaw(arctanShoulderLaw(700, 0.08, 600), 5000),
          scaledLaw(linearLaw(1500), 0.7)};
}

TEST(BenchLaw, EveryLawIsZeroAtZeroAndNeverFalls) {
  for (const Law& law : everyLaw()) {
    EXPECT_EQ(law.force(0), 0) << law.form;
    double before = 0;
    for (int i = 1; i <= 3000; ++i) {
      const double force = law.force(i * 5e-4);
      EXPECT_GE(force, before) << law.form << " at " << i * 5e-4;
      before = force;
    }
  }
}

TEST(BenchLaw, TheTablePassesThroughItsPointsAndGoesOnStraight) {
  const Law law = throughPointsLaw(published);
  for (const auto& [speed, force] : published) EXPECT_NEAR(law.force(speed), force, 1e-9);
  const double lastSlope = (4054.0 - 2178.0) / (1.056 - 0.528);
  EXPECT_NEAR(law.force(1.5), 4054 + lastSlope * (1.5 - 1.056), 1e-9);
}

// The forms given as speed of force hold when put back into their own equation.
TEST(BenchLaw, BleedAndBlowOffObeysItsEquation) {
  const double bleed = 0.006, opening = 500, valve = 900;
  const Law law = bleedAndBlowOffLaw(bleed, opening, valve);
  for (const double v : {0.001, 0.05, 0.13, 0.1342, 0.2, 0.9}) {
    const double force = law.force(v);
    EXPECT_NEAR(bleed * std::sqrt(force) + std::max(0.0, force - opening) / valve, v, 1e-12);
  }
}

TEST(BenchLaw, LeakAndOrificeObeysItsEquation) {
  const Law law = leakAndOrificeLaw(4000, 0.02);
  for (const double v : {1e-6, 0.01, 0.3, 2.0}) {
    const double force = law.force(v);
    EXPECT_NEAR(force / 4000 + 0.02 * std::sqrt(force), v, 1e-12 * v);
  }
}

TEST(BenchLaw, ALeakTakesOilPastTheValve) {
  const Law tight = arctanShoulderLaw(700, 0.08, 600);
  const Law leaking = leakingLaw(tight, 5000);
  for (const double v : {0.05, 0.3, 1.0}) {
    const double force = leaking.force(v);
    EXPECT_NEAR(tight.force(v - force / 5000), force, 1e-6);  // the root's last bits times slope
    EXPECT_LT(force, tight.force(v));
  }
}

TEST(BenchLaw, KneeOfTwoSlopeAndSmoothIsWhereTheTangentsMeet) {
  EXPECT_DOUBLE_EQ(twoSlopeLaw(6000, 900, 0.12).force(0.12), 720);
  const Law smooth = smoothLaw(6000, 900, 0.12);
  EXPECT_NEAR(smooth.force(1e-7) / 1e-7, 6000, 0.01);                 // tangent at zero
  EXPECT_NEAR(smooth.force(5) - 900 * 5, (6000 - 900) * 0.12, 1e-6);  // asymptote
}

}  // namespace
}  // namespace dampwright::bench
