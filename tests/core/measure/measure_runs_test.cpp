// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/measure/measure_runs.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>

#include "tests/core/measure/made_traces.h"

namespace dampwright {
namespace {

/// A short programme: the slow block, then 100 and 300 mm/s.
const bench::BenchRun& shortRun() {
  static const bench::BenchRun run =
      bench::simulate(test::knownDamper(), bench::speedsPlan(0.05, 0.005, 2, {0.1, 0.2, 0.3}, 8));
  return run;
}

Measured measured(const std::vector<Trace>& traces, const MeasureOptions& options = {}) {
  const auto result = measureRuns(traces, options, {});
  EXPECT_TRUE(result) << (result ? "" : result.error().code);
  return result ? result.value() : Measured{};
}

int countOf(const std::vector<Remark>& remarks, const std::string& code) {
  return static_cast<int>(std::count_if(
      remarks.begin(), remarks.end(), [&](const Remark& remark) { return remark.code == code; }));
}

Trace mirrored(Trace trace) {
  for (double& value : trace.displacement) value = -value;
  for (double& value : trace.force) value = -value;
  return trace;
}

TEST(MeasureRuns, GivesEverythingThatADocumentNeeds) {
  MeasureOptions options;
  options.rig.loadCell.readingPercent = 0.5;
  options.rig.remountPercent = 0.7;
  const Measured all = measured({test::noisyTrace(shortRun().clean, {})}, options);
  const Measurement& m = all.measurement;
  EXPECT_EQ(m.program, DAMPWRIGHT_VERSION);
  EXPECT_EQ(m.method, measurementMethod);
  ASSERT_EQ(m.runs.size(), 1u);
  EXPECT_EQ(m.runs[0].source.file.name, "made.csv");
  EXPECT_NEAR(m.runs[0].sampleRate, 2000, 1e-6);
  ASSERT_EQ(all.motions.size(), 1u);
  EXPECT_EQ(m.compression.points.size(), 4u);
  EXPECT_EQ(m.rebound.points.size(), 4u);
  EXPECT_GT(m.typeADof, 10);
  EXPECT_GT(m.typeAPercent, 0);
  EXPECT_EQ(m.rig, accuracyOf(options.rig));
  for (const Direction direction : {Direction::Compression, Direction::Rebound}) {
    for (const CurvePoint& point : m.curve(direction).points) {
      ASSERT_TRUE(point.reading.dampingForce);
      // cell 0.5 %/√3 and mounting 0.7 %: 0.757 % without the scatter
      EXPECT_GT(point.reading.forceTotalU, 0.00757 * std::abs(point.reading.force));
      EXPECT_GT(point.reading.dampingForceTotalU, 0);
      const Reading& ofBlock = m.blocks[point.block].reading(direction);
      EXPECT_EQ(ofBlock.dampingForce, point.reading.dampingForce);
      EXPECT_EQ(ofBlock.forceTotalU, point.reading.forceTotalU);
    }
    EXPECT_NE(chosenLaw(m.laws(direction)), nullptr);
  }
  EXPECT_GT(m.gas.totalU, m.gas.forceU);
  EXPECT_GT(m.friction.dryTotalU, 0);
  EXPECT_GT(m.friction.halfDifferenceTotalU, 0);
}

TEST(MeasureRuns, DampingForceIsTheForceLessGasInCompressionAndPlusGasInRebound) {
  const Measurement m = measured({test::noisyTrace(shortRun().clean, {})}).measurement;
  for (const Direction direction : {Direction::Compression, Direction::Rebound}) {
    for (const CurvePoint& point : m.curve(direction).points) {
      const double gas = m.gas.at(m.blocks[point.block].block.mid + point.reading.displacement);
      EXPECT_NEAR(*point.reading.dampingForce, point.reading.force - signOf(direction) * gas, 1e-9);
    }
  }
}

TEST(MeasureRuns, AFileASpeedIsTheSameAsOneFile) {
  const auto& clean = shortRun().clean;
  const Measurement one = measured({test::noisyTrace(clean, {})}).measurement;
  std::vector<Trace> parts;
  for (const bench::BlockTruth& block : shortRun().blocks) {
    Trace part = test::noisyTrace(clean, {});
    const auto keep = [&](std::vector<double>& values) {
      std::vector<double> kept;
      for (std::size_t i = 0; i < values.size(); ++i) {
        if (clean.time[i] > block.start - 0.2 && clean.time[i] < block.end + 0.2) {
          kept.push_back(values[i]);
        }
      }
      values = kept;
    };
    keep(part.displacement);
    keep(part.force);
    keep(part.temperature);
    keep(part.time);
    parts.push_back(part);
  }
  const Measurement many = measured(parts).measurement;
  EXPECT_EQ(many.runs.size(), 4u);
  ASSERT_EQ(many.compression.points.size(), one.compression.points.size());
  for (std::size_t i = 0; i < one.compression.points.size(); ++i) {
    const CurvePoint& point = many.compression.points[i];
    // other cycles are conditioning ones when a file starts anew: 2 N of noise differ
    EXPECT_NEAR(point.reading.force, one.compression.points[i].reading.force, 1);
    EXPECT_EQ(many.blocks[point.block].run, i);
  }
  EXPECT_NEAR(*many.gas.force, *one.gas.force, 0.5);
}

TEST(MeasureRuns, TheOrderOfFilesDoesNotMatter) {
  const Trace trace = test::noisyTrace(shortRun().clean, {});
  const Trace other = test::noisyTrace(shortRun().clean, {.seed = 2});
  const Measurement a = measured({trace, other}).measurement;
  const Measurement b = measured({other, trace}).measurement;
  EXPECT_EQ(a.compression.points.size(), 8u);
  for (std::size_t i = 0; i < 8; i += 2) {
    const double pairA =
        a.compression.points[i].reading.force + a.compression.points[i + 1].reading.force;
    const double pairB =
        b.compression.points[i].reading.force + b.compression.points[i + 1].reading.force;
    EXPECT_NEAR(pairA, pairB, 1e-9);
  }
}

TEST(MeasureRuns, GasThatPullsTurnsARecordingWhoseDirectionIsOpen) {
  Trace trace = test::noisyTrace(shortRun().clean, {});
  const Measurement right = measured({trace}).measurement;
  trace.directionSettled = false;
  const Measurement turned = measured({mirrored(trace)}).measurement;
  EXPECT_TRUE(turned.runs[0].directionSettled);
  EXPECT_EQ(countOf(turned.remarks, "direction-from-gas"), 1);
  EXPECT_EQ(countOf(turned.remarks, "direction-assumed"), 0);
  EXPECT_NEAR(*turned.gas.force, *right.gas.force, 1e-9);
  ASSERT_EQ(turned.rebound.points.size(), right.rebound.points.size());
  for (std::size_t i = 0; i < right.rebound.points.size(); ++i) {
    EXPECT_NEAR(
        turned.rebound.points[i].reading.force, right.rebound.points[i].reading.force, 1e-9);
  }
}

TEST(MeasureRuns, GasThatPushesConfirmsTheAssumedDirection) {
  Trace trace = test::noisyTrace(shortRun().clean, {});
  trace.directionSettled = false;
  const Measurement m = measured({trace}).measurement;
  EXPECT_TRUE(m.runs[0].directionSettled);
  EXPECT_EQ(countOf(m.remarks, "direction-from-gas"), 1);
  EXPECT_GT(*m.gas.force, 0);
}

TEST(MeasureRuns, ASettledDirectionIsNeverTurned) {
  const Measurement m = measured({mirrored(test::noisyTrace(shortRun().clean, {}))}).measurement;
  EXPECT_LT(*m.gas.force, 0);
  EXPECT_EQ(countOf(m.remarks, "gas-force-negative"), 1);
  EXPECT_EQ(countOf(m.remarks, "direction-from-gas"), 0);
}

TEST(MeasureRuns, WithoutGasTheDirectionStaysAssumed) {
  // 28 N of gas and friction: below the 30 N that prove anything
  bench::Damper weak = test::knownDamper();
  weak.gas.force = 28;
  const auto run = bench::simulate(weak, bench::speedsPlan(0.05, 0.005, 2, {0.1}, 8));
  Trace trace = test::noisyTrace(run.clean, {});
  trace.directionSettled = false;
  const Measurement m = measured({trace}).measurement;
  EXPECT_FALSE(m.runs[0].directionSettled);
  EXPECT_EQ(countOf(m.remarks, "direction-assumed"), 1);

  Trace zeroed = test::noisyTrace(shortRun().clean, {});
  zeroed.directionSettled = false;
  zeroed.zeroState = ZeroState::DamperFitted;
  const Measurement hidden = measured({zeroed}).measurement;
  EXPECT_FALSE(hidden.gas.force);
  EXPECT_EQ(countOf(hidden.remarks, "zeroed-with-damper"), 1);
  EXPECT_EQ(countOf(hidden.remarks, "direction-assumed"), 1);
}

TEST(MeasureRuns, WithoutASlowBlockNothingIsInvented) {
  const auto run =
      bench::simulate(test::knownDamper(), bench::speedsPlan(0.05, 0.1, 6, {0.2, 0.3}, 8));
  const Measurement m = measured({test::noisyTrace(run.clean, {})}).measurement;
  EXPECT_FALSE(m.gas.force);
  EXPECT_EQ(m.gas.reason, "no-slow-block-or-hold");
  EXPECT_EQ(countOf(m.remarks, "no-slow-block-or-hold"), 1);
  for (const CurvePoint& point : m.rebound.points) EXPECT_FALSE(point.reading.dampingForce);
  EXPECT_EQ(m.laws(Direction::Rebound)[0].status, "gas-not-determined");
  EXPECT_EQ(chosenLaw(m.laws(Direction::Rebound)), nullptr);
}

TEST(MeasureRuns, FewSpeedsAndMixedStrokesAreRemarked) {
  bench::DrivePlan plan;
  plan.steps = {bench::BlockPlan{.speed = 0.2, .stroke = 0.05, .turns = 8},
                bench::BlockPlan{.speed = 0.3, .stroke = 0.03, .turns = 8}};
  const auto run = bench::simulate(test::knownDamper(), plan);
  const Measurement m = measured({test::noisyTrace(run.clean, {})}).measurement;
  EXPECT_EQ(countOf(m.remarks, "few-speeds"), 1);
  EXPECT_EQ(countOf(m.remarks, "mixed-strokes"), 1);
}

TEST(MeasureRuns, AStruckOutSpanTakesItsCyclesOutOfItsOwnRunOnly) {
  const Trace trace = test::noisyTrace(shortRun().clean, {});
  const Measurement before = measured({trace, trace}).measurement;
  const MeasuredBlock& last =
      *std::find_if(before.blocks.begin(), before.blocks.end(), [](auto& b) {
        return b.compression.peakVelocity > 0.25;
      });
  const Cycle& cycle = last.block.cycles.back();
  MeasureOptions options;
  options.struckOut = {{{cycle.start + 0.01, cycle.end - 0.01}}};
  const Measurement after = measured({trace, trace}, options).measurement;
  ASSERT_EQ(after.blocks.size(), before.blocks.size());
  EXPECT_EQ(after.runs[0].struckOut, options.struckOut[0]);
  EXPECT_TRUE(after.runs[1].struckOut.empty());
  int fewer = 0;
  for (std::size_t i = 0; i < after.blocks.size(); ++i) {
    fewer += before.blocks[i].block.cyclesUsed() - after.blocks[i].block.cyclesUsed();
  }
  EXPECT_EQ(fewer, 1);
}

TEST(MeasureRuns, ForceTimesTenIsEverythingTimesTen) {
  Trace trace = test::noisyTrace(shortRun().clean, {});
  const Measurement one = measured({trace}).measurement;
  for (double& force : trace.force) force *= 10;
  const Measurement ten = measured({trace}).measurement;
  EXPECT_NEAR(*ten.gas.force, 10 * *one.gas.force, 1e-5 * *ten.gas.force);
  EXPECT_NEAR(*ten.friction.dry, 10 * *one.friction.dry, 1e-5 * *ten.friction.dry);
  for (std::size_t i = 0; i < one.rebound.points.size(); ++i) {
    const Reading& a = one.rebound.points[i].reading;
    EXPECT_NEAR(ten.rebound.points[i].reading.force, 10 * a.force, 1e-9 * std::abs(10 * a.force));
  }
}

TEST(MeasureRuns, ATraceWithoutACycleIsAnErrorThatNamesItsFile) {
  Trace trace = test::noisyTrace(shortRun().clean, {});
  for (double& place : trace.displacement) place = 0.01;
  const auto result = measureRuns(std::span(&trace, 1), {}, {});
  ASSERT_FALSE(result);
  EXPECT_EQ(result.error().code, "no-full-cycle");
  EXPECT_EQ(result.error().place.file, "made.csv");
}

TEST(MeasureRuns, StopsWhenAskedAndReportsItsProgress) {
  const Trace trace = test::noisyTrace(shortRun().clean, {});
  std::stop_source stop;
  std::vector<double> shares;
  const Progress progress{stop.get_token(), [&](double share) {
                            shares.push_back(share);
                            stop.request_stop();
                          }};
  const std::vector<Trace> traces = {trace, trace};
  const auto result = measureRuns(traces, {}, progress);
  ASSERT_FALSE(result);
  EXPECT_EQ(result.error().code, "stopped");
  EXPECT_EQ(shares.size(), 1u);
}

}  // namespace
}  // namespace dampwright
