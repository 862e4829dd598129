// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/envelope.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <limits>
#include <random>

namespace dampwright {
namespace {

std::vector<double> noise(std::size_t size) {
  std::mt19937 random(11);
  std::normal_distribution<double> normal;
  std::vector<double> samples(size);
  for (double& sample : samples) sample = normal(random);
  return samples;
}

TEST(Envelope, ASingleSpikeIsDrawnAtAnyZoom) {
  std::vector<double> samples(1'000'000, 0.0);
  samples[654'321] = 7;
  samples[123'457] = -5;
  const Envelope envelope(samples, 0, 0.001);
  const auto points = envelope.visible(0, 1000, 700);
  EXPECT_LE(points.size(), 4 * 700);
  const auto byY = [](const QPointF& a, const QPointF& b) { return a.y() < b.y(); };
  EXPECT_EQ(std::max_element(points.begin(), points.end(), byY)->y(), 7);
  EXPECT_EQ(std::min_element(points.begin(), points.end(), byY)->y(), -5);
  EXPECT_EQ(envelope.smallest(), -5);
  EXPECT_EQ(envelope.largest(), 7);
}

// Columns are as the header says: equal shares of the samples in view.
TEST(Envelope, EveryColumnSpansItsSamples) {
  const std::vector<double> samples = noise(90'000);
  const Envelope envelope(samples, 2, 0.5);
  constexpr int columns = 300;
  constexpr std::size_t each = 300;
  const auto points = envelope.visible(0, 100'000, columns);
  EXPECT_LE(points.size(), 4 * columns);
  for (std::size_t column = 0; column < columns; ++column) {
    const double from = 2 + 0.5 * static_cast<double>(column * each);
    const double to = from + 0.5 * static_cast<double>(each);
    double low = INFINITY, high = -INFINITY;
    for (const QPointF& point : points) {
      if (point.x() < from || point.x() >= to) continue;
      low = std::min(low, point.y());
      high = std::max(high, point.y());
    }
    const auto begin = samples.begin() + static_cast<std::ptrdiff_t>(column * each);
    EXPECT_EQ(low, *std::min_element(begin, begin + each));
    EXPECT_EQ(high, *std::max_element(begin, begin + each));
  }
}

TEST(Envelope, ARisingSignalStaysOneRisingLine) {
  std::vector<double> samples(50'000);
  for (std::size_t i = 0; i < samples.size(); ++i) samples[i] = static_cast<double>(i);
  const auto points = Envelope(samples, 0, 1).visible(0, 50'000, 200);
  for (const QPointF& point : points) EXPECT_EQ(point.x(), point.y());
}

TEST(Envelope, FewSamplesAreDrawnOneByOneAndRunOutOfTheView) {
  const std::vector<double> samples = noise(1000);
  const Envelope envelope(samples, 0, 1);
  const auto points = envelope.visible(100.5, 110.5, 600);
  ASSERT_GE(points.size(), 12);
  EXPECT_LE(points.front().x(), 100.5);
  EXPECT_GE(points.back().x(), 110.5);
  for (const QPointF& point : points)
    EXPECT_EQ(point.y(), samples[static_cast<std::size_t>(point.x())]);
}

TEST(Envelope, MissingSamplesHideNoExtreme) {
  std::vector<double> samples = noise(10'000);
  for (std::size_t i = 0; i < samples.size(); i += 3)
    samples[i] = std::numeric_limits<double>::quiet_NaN();
  samples[5000] = 42;
  const Envelope envelope(samples, 0, 1);
  EXPECT_EQ(envelope.largest(), 42);
}

TEST(Envelope, NothingToDrawIsNothing) {
  EXPECT_TRUE(Envelope().visible(0, 1, 100).empty());
  const std::vector<double> one{3};
  EXPECT_EQ(Envelope(one, 0, 1).visible(-5, 5, 100).size(), 1);
  EXPECT_TRUE(Envelope(one, 0, 1).visible(1, 1, 100).empty());
}

}  // namespace
}  // namespace dampwright
