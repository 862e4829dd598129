// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/clock.h"

#include <gmock/gmock.h>

#include <cmath>
#include <limits>

#include "tests/core/intake/made_text.h"

namespace dampwright {
namespace {

using testing::DoubleEq;
using testing::DoubleNear;
using testing::ElementsAre;
using testing::Pointwise;

constexpr double absent = std::numeric_limits<double>::quiet_NaN();

std::vector<double> even(int count, double step) {
  std::vector<double> stamps;
  for (int i = 0; i < count; ++i) stamps.push_back(i * step);
  return stamps;
}

TEST(Clock, AnEvenClockPassesUntouched) {
  const Clock clock = makeClock(even(100, 0.001));
  EXPECT_EQ(clock.time, even(100, 0.001));
  EXPECT_TRUE(clock.remarks.empty());
  EXPECT_TRUE(clock.kept.empty());
}

TEST(Clock, AClockThatStartsAgainGoesOnByOneStep) {
  std::vector<double> stamps = even(50, 0.01);
  const auto again = even(50, 0.01);
  stamps.insert(stamps.end(), again.begin(), again.end());
  const Clock clock = makeClock(stamps);
  for (std::size_t i = 0; i < 100; ++i) {
    EXPECT_NEAR(clock.time[i], 0.01 * static_cast<double>(i), 1e-12);  // rounding of 100 sums
  }
  const Remark* remark = remarkOf(clock.remarks, "clock-restarts");
  ASSERT_NE(remark, nullptr);
  EXPECT_EQ(remark->count, 1);
  EXPECT_EQ(remark->firstRow, 50);
}

TEST(Clock, OneStampOutOfLineIsPutBetweenItsNeighbours) {
  for (const double wrong : {0.001, 0.9}) {
    std::vector<double> stamps = even(50, 0.01);
    stamps[20] = wrong;
    const Clock clock = makeClock(stamps);
    EXPECT_NEAR(clock.time[20], 0.2, 1e-12) << wrong;
    EXPECT_NEAR(clock.time[49], 0.49, 1e-12) << wrong;
    ASSERT_TRUE(says(clock.remarks, "bad-stamps")) << wrong;
    EXPECT_EQ(remarkOf(clock.remarks, "bad-stamps")->firstRow, 20);
    EXPECT_FALSE(says(clock.remarks, "clock-restarts")) << wrong;
  }
}

TEST(Clock, StampsOfACoarseClockAreSpread) {
  const Clock clock = makeClock({0, 0, 0.001, 0.001, 0.002, 0.002});
  EXPECT_THAT(
      clock.time,
      Pointwise(DoubleNear(1e-15), std::vector<double>{0, 0.0005, 0.001, 0.0015, 0.002, 0.0025}));
  EXPECT_EQ(remarkOf(clock.remarks, "repeated-stamps")->count, 3);
}

TEST(Clock, AGapIsSaidAndNotFilled) {
  std::vector<double> stamps = even(50, 0.01);
  for (std::size_t i = 30; i < 50; ++i) stamps[i] += 0.5;
  const Clock clock = makeClock(stamps);
  EXPECT_EQ(clock.time, stamps);
  const Remark* remark = remarkOf(clock.remarks, "gap");
  ASSERT_NE(remark, nullptr);
  EXPECT_EQ(remark->firstRow, 30);
  EXPECT_NEAR(std::get<double>(remark->values[0].value), 0.51, 1e-12);
}

TEST(Clock, AJitteringClockIsSaidToBeUneven) {
  std::vector<double> stamps;
  for (int i = 0; i < 100; ++i) stamps.push_back(0.01 * i + (i % 2 == 0 ? 0 : 0.002));
  EXPECT_TRUE(says(makeClock(stamps).remarks, "uneven-clock"));
}

TEST(Clock, RowsWithoutStampAreLeftOutAndCounted) {
  const Clock clock = makeClock({0, absent, 0.02, 0.03, absent});
  EXPECT_THAT(clock.kept, ElementsAre(0u, 2u, 3u));
  EXPECT_THAT(clock.time, ElementsAre(0, 0.02, 0.03));
  EXPECT_EQ(remarkOf(clock.remarks, "rows-without-time")->count, 2);
  EXPECT_EQ(remarkOf(clock.remarks, "rows-without-time")->firstRow, 1);
}

TEST(Clock, DegenerateClocksAreHarmless) {
  EXPECT_TRUE(makeClock({}).time.empty());
  EXPECT_TRUE(makeClock({absent, absent}).time.empty());
  EXPECT_EQ(makeClock({5}).time, std::vector<double>{5});
  for (const double time : makeClock({1, 1, 1}).time) EXPECT_TRUE(std::isfinite(time));
  for (const double time : makeClock({3, 2, 1}).time) EXPECT_TRUE(std::isfinite(time));
}

TEST(Clock, WithoutStampsTheRateCounts) {
  EXPECT_THAT(evenClock(3, 500), ElementsAre(0, DoubleEq(0.002), DoubleEq(0.004)));
}

}  // namespace
}  // namespace dampwright
