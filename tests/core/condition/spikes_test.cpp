// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/condition/spikes.h"

#include <gtest/gtest.h>

#include <cmath>
#include <vector>

#include "tests/support/closed_form_traces.h"

namespace dampwright {
namespace {

using test::MadePlan;
using test::MadeRun;
using test::MadeShape;
using test::MadeWave;

MadePlan plan(double speed, double rate = 2000) {
  MadePlan out;
  out.rate = rate;
  out.waves = {MadeWave{.frequency = test::sineFrequency(0.05, speed), .cycles = 5}};
  return out;
}

TEST(Spikes, PlantedOnesAreFoundEachOnceAndTakenOut) {
  MadePlan made = plan(0.5);
  made.forceNoise = 2;
  const MadeRun clean = test::makeRun(made);
  std::vector<double> force = clean.force;
  force[300] += 400;
  force[900] -= 250;
  force[901] -= 300;
  force[1500] += 60;  // 30 standard deviations
  const auto spikes = findSpikes(force, 8);
  ASSERT_EQ(spikes.size(), 3u);
  EXPECT_EQ(spikes[0].first, 300u);
  EXPECT_EQ(spikes[1].first, 900u);
  EXPECT_EQ(spikes[1].count, 2u);
  EXPECT_EQ(spikes[2].first, 1500u);
  const auto out = withoutSpikes(force, spikes);
  for (std::size_t i = 0; i < out.size(); ++i) EXPECT_NEAR(out[i], clean.force[i], 15);  // noise
}

TEST(Spikes, NoiseHasNone) {
  MadePlan made = plan(0.005);
  made.forceNoise = 2;
  made.displacementNoise = 1e-5;
  const MadeRun run = test::makeRun(made);
  ASSERT_GT(run.force.size(), 300000u);
  EXPECT_TRUE(findSpikes(run.force, 8).empty());
  EXPECT_TRUE(findSpikes(run.displacement, 8).empty());
}

TEST(Spikes, AFrictionStepAndACornerAreNone) {
  MadePlan made = plan(0.5);
  made.force = [](double, double v) { return v > 0 ? 60.0 : -60.0; };
  EXPECT_TRUE(findSpikes(test::makeRun(made).force, 8).empty());
  made.waves[0].shape = MadeShape::Triangle;
  for (const double rate : {200.0, 2000.0}) {
    made.rate = rate;
    EXPECT_TRUE(findSpikes(test::makeRun(made).displacement, 8).empty()) << rate;
  }
}

TEST(Spikes, TheRoundTopOfAFastSineIsNone) {
  const MadePlan made = plan(1.0, 40 * test::sineFrequency(0.05, 1.0));  // 40 samples a cycle
  EXPECT_TRUE(findSpikes(test::makeRun(made).displacement, 8).empty());
}

TEST(Spikes, ATogglingLastDigitIsNone) {
  MadeRun run = test::makeRun(plan(0.05));
  for (double& force : run.force) force = std::round(force);  // 1 N steps on ±50 N, no noise
  for (std::size_t i = 100; i < run.force.size(); i += 97) run.force[i] += 1;
  EXPECT_TRUE(findSpikes(run.force, 30).empty());
  for (double& force : run.force) force = 20 * std::round(force / 20);
  EXPECT_TRUE(findSpikes(run.force, 8).empty());
}

}  // namespace
}  // namespace dampwright
