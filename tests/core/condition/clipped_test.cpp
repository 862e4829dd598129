// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/condition/clipped.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <vector>

#include "tests/support/closed_form_traces.h"

namespace dampwright {
namespace {

using test::MadePlan;
using test::MadeWave;

std::vector<double> forceOf(const std::function<double(double, double)>& law,
                            double speed,
                            double noise = 0,
                            double rate = 2000) {
  MadePlan plan;
  plan.rate = rate;
  plan.waves = {MadeWave{.frequency = test::sineFrequency(0.05, speed), .cycles = 5}};
  plan.force = law;
  plan.forceNoise = noise;
  return test::makeRun(plan).force;
}

double viscous(double, double v) { return 1000 * v; }

std::vector<double> inSteps(std::vector<double> force, double step) {
  for (double& value : force) value = step * std::round(value / step);
  return force;
}

std::vector<double> cutAt(std::vector<double> force, double low, double high) {
  for (double& value : force) value = std::clamp(value, low, high);
  return force;
}

TEST(Clipped, AFlatTopAtTheEndOfTheRangeIsFoundWhole) {
  for (const double rate : {260.0, 2000.0}) {  // 41 and 314 samples a cycle
    const auto raw = forceOf(viscous, 1, 2, rate);
    const auto sides = findClipped(cutAt(raw, -2000, 900));
    ASSERT_EQ(sides.size(), 1u) << rate;
    EXPECT_EQ(sides[0].level, 900);
    const auto above = std::count_if(raw.begin(), raw.end(), [](double f) { return f >= 900; });
    EXPECT_EQ(sides[0].samples.size(), static_cast<std::size_t>(above));
  }
}

TEST(Clipped, BothEndsAreFoundAndCoarseStepsDoNotHideThem) {
  const auto sides = findClipped(cutAt(inSteps(forceOf(viscous, 1), 5), -800, 900));
  ASSERT_EQ(sides.size(), 2u);
  EXPECT_EQ(sides[0].level, 900);
  EXPECT_EQ(sides[1].level, -800);
}

TEST(Clipped, TheRoundTopOfACoarseSensorIsSound) {
  for (const double step : {0.5, 1.0, 5.0, 20.0})
    EXPECT_TRUE(findClipped(inSteps(forceOf(viscous, 1), step)).empty()) << step;
  EXPECT_TRUE(findClipped(inSteps(forceOf(viscous, 0.05), 1)).empty());
}

TEST(Clipped, AFrictionPlateauIsSound) {
  const auto coulomb = [](double, double v) { return v > 0 ? 60.0 : -60.0; };
  const auto rounded = [](double, double v) { return 40 * std::tanh(v / 0.001); };
  EXPECT_TRUE(findClipped(forceOf(coulomb, 0.1)).empty());
  EXPECT_TRUE(findClipped(inSteps(forceOf(rounded, 0.005), 1)).empty());
  EXPECT_TRUE(findClipped(inSteps(forceOf(rounded, 0.005), 5)).empty());
}

TEST(Clipped, NoiseAndConstantsAreSound) {
  EXPECT_TRUE(findClipped(forceOf(viscous, 0.25, 2)).empty());
  EXPECT_TRUE(findClipped(std::vector<double>(100, 7.0)).empty());
  EXPECT_TRUE(findClipped(std::vector<double>{}).empty());
}

}  // namespace
}  // namespace dampwright
