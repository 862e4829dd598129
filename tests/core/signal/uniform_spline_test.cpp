// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/uniform_spline.h"

#include <gtest/gtest.h>

#include <cmath>
#include <random>
#include <vector>

#include "core/base/units.h"
#include "tests/support/scipy.h"

namespace dampwright {
namespace {

std::vector<double> noise(std::size_t count) {
  std::mt19937_64 random(13);
  std::normal_distribution<double> normal(0, 1);
  std::vector<double> out(count);
  for (double& value : out) value = normal(random);
  return out;
}

TEST(UniformSpline, IsSciPysMirroredCubicSpline) {
  const std::vector<double> signal = noise(80);
  std::vector<double> places;
  for (double place = 0; place <= 79; place += 0.37) places.push_back(place);
  const auto expected = test::pythonNumbers(
      "from scipy.ndimage import map_coordinates\nprint(*map_coordinates(" +
      test::pythonList(signal) + ", [" + test::pythonList(places) + "], order=3, mode='mirror'))");
  const UniformSpline spline(signal);
  ASSERT_EQ(expected.size(), places.size());
  for (std::size_t i = 0; i < places.size(); ++i)
    EXPECT_NEAR(spline.at(places[i]), expected[i], 1e-10);
}

TEST(UniformSpline, GoesThroughTheSamples) {
  const std::vector<double> signal = noise(50);
  const UniformSpline spline(signal);
  for (std::size_t i = 0; i < signal.size(); ++i)
    EXPECT_NEAR(spline.at(static_cast<double>(i)), signal[i], 1e-12);
}

TEST(UniformSpline, MeanIsTheIntegralOfItsValues) {
  const UniformSpline spline(noise(50));
  for (const auto& [from, to] : {std::pair{3.2, 3.7}, std::pair{7.0, 9.5}, std::pair{10.3, 41.9}}) {
    double sum = 0;
    const int parts = 20000;  // midpoint rule: error (h²/24)·f'' = 1e-7 at the longest stretch
    for (int i = 0; i < parts; ++i) sum += spline.at(from + (to - from) * (i + 0.5) / parts);
    EXPECT_NEAR(spline.meanOver(from, to), sum / parts, 3e-7);
  }
}

TEST(UniformSpline, ASineOfFortySamplesIsMetToItsPromise) {
  std::vector<double> sine(400);
  for (std::size_t i = 0; i < sine.size(); ++i)
    sine[i] = std::sin(2 * pi * static_cast<double>(i) / 40);
  const UniformSpline spline(sine);
  for (double place = 100; place < 300; place += 0.13)
    EXPECT_NEAR(spline.at(place), std::sin(2 * pi * place / 40), 1.7e-6);
}

TEST(UniformSpline, PlacesOutsideAreClamped) {
  const std::vector<double> signal = {1, 2, 4, 3, 7};
  const UniformSpline spline(signal);
  EXPECT_NEAR(spline.at(-3), 1, 1e-12);
  EXPECT_NEAR(spline.at(99), 7, 1e-12);
  EXPECT_NEAR(spline.meanOver(-1, 0), 1, 1e-12);
}

}  // namespace
}  // namespace dampwright
