// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/condition/even_clock.h"

#include <gtest/gtest.h>

#include <cmath>
#include <random>
#include <vector>

namespace dampwright {
namespace {

std::vector<double> evenTimes(std::size_t count, double rate, double start = 0) {
  std::vector<double> times(count);
  for (std::size_t i = 0; i < count; ++i) times[i] = start + static_cast<double>(i) / rate;
  return times;
}

TEST(EvenClock, AnEvenClockIsEvenAndItsRateKnown) {
  const auto finding = lookAtClock(evenTimes(5000, 2000, 17.25));
  EXPECT_TRUE(finding.even);
  EXPECT_FALSE(finding.uneven);
  EXPECT_NEAR(finding.clock.rate, 2000, 1e-6);
  EXPECT_NEAR(finding.clock.start, 17.25, 1e-9);
  EXPECT_EQ(finding.clock.count, 5000u);
}

TEST(EvenClock, StampsRoundedToMillisecondsOfA2kHzClockAreEven) {
  auto times = evenTimes(5000, 2000);
  for (double& time : times) time = std::round(time * 1000) / 1000;
  const auto finding = lookAtClock(times);
  EXPECT_TRUE(finding.even);
  EXPECT_NEAR(finding.clock.rate, 2000, 0.01);  // rounding over 2.5 s
}

TEST(EvenClock, JitterIsUneven) {
  std::mt19937_64 random(1);
  std::uniform_real_distribution<double> jitter(-0.2, 0.2);
  auto times = evenTimes(5000, 1000);
  for (double& time : times) time += jitter(random) / 1000;
  const auto finding = lookAtClock(times);
  EXPECT_FALSE(finding.even);
  EXPECT_TRUE(finding.uneven);
  EXPECT_TRUE(finding.gapsBehind.empty());
  EXPECT_NEAR(finding.clock.rate, 1000, 0.2);
  EXPECT_NEAR(finding.worstStep, 0.4e-3, 0.05e-3);
}

TEST(EvenClock, AGapIsAGapAndTheRestEven) {
  auto times = evenTimes(5000, 1000);
  for (std::size_t i = 2000; i < times.size(); ++i) times[i] += 0.5;
  const auto finding = lookAtClock(times);
  EXPECT_FALSE(finding.even);
  EXPECT_FALSE(finding.uneven);
  ASSERT_EQ(finding.gapsBehind.size(), 1u);
  EXPECT_EQ(finding.gapsBehind[0], 1999u);
  EXPECT_NEAR(finding.clock.rate, 1000, 1e-6);
  EXPECT_EQ(finding.clock.count, 5500u);
}

TEST(EvenClock, ASlowClockIsUnevenOnlyIfItsStepsDiffer) {
  // a drifting clock: every step 1 ppm longer than the one before is no reason to resample
  std::vector<double> times = {0};
  for (int i = 0; i < 3000; ++i) times.push_back(times.back() + 0.01 * (1 + 1e-8 * i));
  EXPECT_TRUE(lookAtClock(times).even);
}

}  // namespace
}  // namespace dampwright
