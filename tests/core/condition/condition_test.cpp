// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/condition/condition.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <limits>
#include <random>
#include <string>
#include <vector>

#include "core/base/units.h"
#include "tests/core/condition/made_trace.h"

namespace dampwright {
namespace {

using test::MadePlan;
using test::MadeRun;
using test::MadeWave;
using test::traceOf;

constexpr double nan = std::numeric_limits<double>::quiet_NaN();

MadePlan plan(double speed = 0.5, double rate = 2000) {
  MadePlan out;
  out.rate = rate;
  out.waves = {MadeWave{.frequency = test::sineFrequency(0.05, speed), .cycles = 6}};
  return out;
}

Motion conditioned(const Trace& trace, const ConditionOptions& options = {}) {
  auto motion = condition(trace, options);
  EXPECT_TRUE(motion);
  return motion ? std::move(motion).value() : Motion{};
}

const Remark* find(const Motion& motion, const std::string& code) {
  for (const Remark& remark : motion.remarks)
    if (remark.code == code) return &remark;
  return nullptr;
}

TEST(Condition, ACleanEvenRunGoesThroughUntouched) {
  const Trace trace = traceOf(test::makeRun(plan()));
  const Motion motion = conditioned(trace);
  EXPECT_NEAR(motion.rate, 2000, 1e-6);
  EXPECT_EQ(motion.displacement, trace.displacement);
  EXPECT_EQ(motion.force, trace.force);
  EXPECT_TRUE(motion.remarks.empty());
  EXPECT_TRUE(std::all_of(
      motion.doubtful.begin(), motion.doubtful.end(), [](char doubt) { return doubt == 0; }));
}

TEST(Condition, VelocityIsTheDerivativeToATenthOfAPermille) {
  for (const double rate : {400.0, 2000.0}) {  // 125 and 628 samples a cycle
    const MadeRun run = test::makeRun(plan(0.5, rate));
    const Motion motion = conditioned(traceOf(run));
    for (std::size_t i = 30; i + 30 < motion.size(); ++i)
      EXPECT_NEAR(motion.velocity[i], run.velocity[i], 5e-5);  // 1e-4 of 0.5 m/s
  }
}

TEST(Condition, ForceComesBackByItsDelay) {
  MadePlan made = plan();
  const MadeRun run = test::makeRun(made);
  Trace trace = traceOf(run);
  const double delay = 1.23e-3, omega = 2 * pi * made.waves[0].frequency;
  for (std::size_t i = 0; i < trace.force.size(); ++i)
    trace.force[i] = 500 * std::sin(omega * (trace.time[i] - delay));
  ConditionOptions options;
  options.forceDelay = delay;
  const Motion motion = conditioned(trace, options);
  for (std::size_t i = 20; i + 20 < motion.size(); ++i)
    EXPECT_NEAR(motion.force[i], run.force[i], 1e-6);
  EXPECT_EQ(motion.doubtful.back() & ForceMissing, ForceMissing);  // came from beyond the end
  EXPECT_EQ(motion.doubtful[1000], 0);
}

// 5.483 N a kilogram at 100 mm and 100 strokes a minute: m·ω²·X
TEST(Condition, InertiaOfTheMovingMassIsTakenOff) {
  MadePlan made;
  made.waves = {MadeWave{.stroke = 0.1, .frequency = 100.0 / 60, .cycles = 4}};
  made.force = [](double, double) { return 0.0; };
  Trace trace = traceOf(test::makeRun(made));
  const double omega = 2 * pi * 100 / 60;
  for (std::size_t i = 0; i < trace.force.size(); ++i)
    trace.force[i] = 2 * omega * omega * -trace.displacement[i];
  EXPECT_NEAR(*std::max_element(trace.force.begin(), trace.force.end()), 2 * 5.483, 2e-3);
  ConditionOptions options;
  options.movingMass = 2;
  const Motion motion = conditioned(trace, options);
  for (std::size_t i = 30; i + 30 < motion.size(); ++i)
    EXPECT_NEAR(motion.force[i], 0, 0.011);  // 0.1 %
}

TEST(Condition, TheLowPassMakesNoPhaseBetweenDisplacementAndForce) {
  const Trace trace = traceOf(test::makeRun(plan(1)));
  for (const LowPass& filter : {LowPass(CfcClass{60}), LowPass(Butterworth{80})}) {
    ConditionOptions options;
    options.lowPass = filter;
    const Motion motion = conditioned(trace, options);
    for (std::size_t i = 300; i + 300 < motion.size(); ++i)
      EXPECT_NEAR(motion.force[i], 1000 * motion.velocity[i], 0.1);  // 1e-4 of the peak
  }
}

TEST(Condition, SpikesAreTakenOutAndCounted) {
  Trace trace = traceOf(test::makeRun(plan()));
  trace.force[400] += 300;
  trace.force[700] -= 300;
  const Motion motion = conditioned(trace);
  const Remark* remark = find(motion, "spikes-removed");
  ASSERT_NE(remark, nullptr);
  EXPECT_EQ(remark->count, 2);
  EXPECT_EQ(remark->firstRow, 402);
  EXPECT_NEAR(motion.force[400], 1000 * motion.velocity[400], 0.5);
}

TEST(Condition, AClippedTopIsMaskedAndNotRepaired) {
  Trace trace = traceOf(test::makeRun(plan()));
  for (double& force : trace.force) force = std::min(force, 400.0);
  const Motion motion = conditioned(trace);
  const Remark* remark = find(motion, "clipped-force");
  ASSERT_NE(remark, nullptr);
  std::int64_t masked = 0;
  for (std::size_t i = 0; i < motion.size(); ++i) {
    EXPECT_EQ(motion.doubtful[i] == ForceClipped, motion.force[i] == 400) << i;
    masked += motion.doubtful[i] != 0 ? 1 : 0;
  }
  EXPECT_EQ(remark->count, masked);
  const auto first = std::find(trace.force.begin(), trace.force.end(), 400.0);
  EXPECT_EQ(remark->firstRow, first - trace.force.begin() + 2);
}

TEST(Condition, MissingValuesAreMaskedAndCounted) {
  Trace trace = traceOf(test::makeRun(plan()));
  trace.force[500] = trace.force[501] = nan;
  trace.displacement[900] = nan;
  const Motion motion = conditioned(trace);
  EXPECT_EQ(motion.doubtful[500], ForceMissing);
  EXPECT_EQ(motion.doubtful[501], ForceMissing);
  EXPECT_EQ(motion.doubtful[900], PlaceMissing);
  EXPECT_FALSE(std::isnan(motion.force[500]));
  const Remark* remark = find(motion, "missing-values");
  ASSERT_NE(remark, nullptr);
  EXPECT_EQ(remark->count, 3);
  EXPECT_EQ(remark->firstRow, 502);
}

TEST(Condition, AJitteringClockIsBroughtToAnEvenOne) {
  const MadePlan made = plan();
  const MadeRun run = test::makeRun(made);
  Trace trace = traceOf(run);
  std::mt19937_64 random(2);
  std::uniform_real_distribution<double> jitter(-0.1e-3, 0.1e-3);
  const double omega = 2 * pi * made.waves[0].frequency;
  for (std::size_t i = 0; i < trace.time.size(); ++i) {
    trace.time[i] += jitter(random);
    trace.displacement[i] = -0.025 * std::cos(omega * trace.time[i]);
    trace.force[i] = 500 * std::sin(omega * trace.time[i]);
  }
  const Motion motion = conditioned(trace);
  EXPECT_NE(find(motion, "uneven-clock"), nullptr);
  for (std::size_t i = 10; i + 10 < motion.size(); ++i) {
    EXPECT_NEAR(motion.displacement[i], -0.025 * std::cos(omega * motion.timeOf(i)), 1e-9);
    EXPECT_NEAR(motion.force[i], 500 * std::sin(omega * motion.timeOf(i)), 1e-4);
  }
}

TEST(Condition, AGapIsMarkedAndTheRestStaysWhereItWas) {
  Trace trace = traceOf(test::makeRun(plan()));
  for (auto* channel : {&trace.time, &trace.displacement, &trace.force})
    channel->erase(channel->begin() + 1000, channel->begin() + 1300);
  const Motion motion = conditioned(trace);
  const Remark* remark = find(motion, "gap");
  ASSERT_NE(remark, nullptr);
  EXPECT_EQ(remark->count, 1);
  EXPECT_EQ(remark->firstRow, 1002);
  EXPECT_EQ(motion.doubtful[1150], PlaceMissing | ForceMissing);
  EXPECT_EQ(motion.doubtful[990], 0);
  EXPECT_EQ(motion.doubtful[1310], 0);
  EXPECT_NEAR(motion.force[2000], trace.force[1700], 1e-6);
}

TEST(Condition, ARemarkOfTheTraceIsNotRepeated) {
  Trace trace = traceOf(test::makeRun(plan()));
  trace.force[500] = nan;
  trace.remarks.push_back({"missing-values", Severity::Warning, {}, 1, 502});
  EXPECT_EQ(find(conditioned(trace), "missing-values"), nullptr);
}

TEST(Condition, AVelocityChannelIsOnlyCompared) {
  MadePlan made = plan();
  made.displacementNoise = 1e-5;
  const MadeRun run = test::makeRun(made);
  Trace trace = traceOf(run);
  trace.velocity = run.velocity;
  const Motion agreeing = conditioned(trace);
  EXPECT_EQ(find(agreeing, "velocity-disagrees"), nullptr);
  for (double& velocity : trace.velocity) velocity *= 1.1;
  const Motion larger = conditioned(trace);
  ASSERT_NE(find(larger, "velocity-disagrees"), nullptr);
  EXPECT_NEAR(std::get<double>(find(larger, "velocity-disagrees")->values[0].value), 110, 1);
  EXPECT_EQ(larger.velocity, agreeing.velocity);
  for (double& velocity : trace.velocity) velocity *= -1;
  EXPECT_NE(find(conditioned(trace), "velocity-disagrees"), nullptr);
}

TEST(Condition, ASlowNoisyRunAgreesWithItsVelocityChannel) {
  MadePlan made = plan(0.005);
  made.waves[0].cycles = 1.5;
  made.displacementNoise = 1e-5;
  const MadeRun run = test::makeRun(made);
  Trace trace = traceOf(run);
  trace.velocity = run.velocity;
  EXPECT_EQ(find(conditioned(trace), "velocity-disagrees"), nullptr);
}

TEST(Condition, TemperatureIsCarriedAlong) {
  Trace trace = traceOf(test::makeRun(plan()));
  trace.temperature.assign(trace.time.size(), 31.5);
  trace.temperature[7] = nan;
  const Motion motion = conditioned(trace);
  ASSERT_EQ(motion.temperature.size(), motion.size());
  EXPECT_EQ(motion.temperature[7], 31.5);
}

TEST(Condition, StopsWhenAsked) {
  std::stop_source stop;
  stop.request_stop();
  const auto motion = condition(traceOf(test::makeRun(plan(1))), {}, {stop.get_token(), {}});
  ASSERT_FALSE(motion);
  EXPECT_EQ(motion.error().code, "stopped");
}

TEST(Condition, TooFewRowsAreAnError) {
  Trace trace = traceOf(test::makeRun(plan()));
  for (auto* channel : {&trace.time, &trace.displacement, &trace.force}) channel->resize(15);
  const auto motion = condition(trace);
  ASSERT_FALSE(motion);
  EXPECT_EQ(motion.error().code, "trace-too-short");
  EXPECT_EQ(condition(Trace{}).error().code, "trace-too-short");
}

TEST(Condition, AChannelOfNothingOrAClockThatStandsIsAnError) {
  Trace trace = traceOf(test::makeRun(plan()));
  trace.force.assign(trace.force.size(), nan);
  EXPECT_FALSE(condition(trace));
  trace = traceOf(test::makeRun(plan()));
  trace.time.assign(trace.time.size(), 1.0);
  EXPECT_FALSE(condition(trace));
}

TEST(Condition, AGapOfDaysIsAnErrorAndNotADayOfSamples) {
  Trace trace = traceOf(test::makeRun(plan()));
  trace.time.back() += 1e6;
  const auto motion = condition(trace);
  ASSERT_FALSE(motion);
  EXPECT_EQ(motion.error().code, "gap-too-long");
}

TEST(ConditionOptions, ComeFromTheRigProfile) {
  RigProfile rig;
  rig.forceDelay = 0.001;
  rig.movingMass = 1.5;
  rig.lowPass = "CFC 180 ISO";
  const ConditionOptions options = conditionOptions(rig);
  EXPECT_EQ(options.forceDelay, 0.001);
  EXPECT_EQ(options.movingMass, 1.5);
  ASSERT_TRUE(options.lowPass);
  EXPECT_EQ(std::get<CfcClass>(*options.lowPass).number, 180);
  EXPECT_EQ(std::get<CfcClass>(*options.lowPass).rule, CfcRule::Iso6487);
  rig.lowPass = "CFC 60";
  EXPECT_EQ(std::get<CfcClass>(*conditionOptions(rig).lowPass).rule, CfcRule::SaeJ211);
  rig.lowPass = "Butterworth 200 Hz";
  EXPECT_EQ(std::get<Butterworth>(*conditionOptions(rig).lowPass).cutoff, 200);
  rig.lowPass = "Butterworth -1 Hz";
  EXPECT_FALSE(conditionOptions(rig).lowPass);
  rig.lowPass = "soft";
  EXPECT_FALSE(conditionOptions(rig).lowPass);
}

}  // namespace
}  // namespace dampwright
