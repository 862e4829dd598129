// SPDX-License-Identifier: GPL-3.0-or-later
// From the bytes of each sample run to its verdict, against what the scenario says is true.
#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <map>
#include <optional>
#include <string>
#include <vector>

#include "core/intake/read_run.h"
#include "core/measure/measure_runs.h"
#include "core/records/documents.h"
#include "core/verdict/judge.h"
#include "tests/samples/sample_folder.h"

namespace dampwright::samples {
namespace {

using nlohmann::json;

/// The profile among the workshop's four whose signature is the file's.
std::optional<RigProfile> profileOf(std::string_view signature) {
  for (const std::string number : {"1", "2", "3", "4"}) {
    std::string name = "rig_bench_";
    name.append(number).append(".json");
    const auto rig = readRig(sampleBytes(name), name);
    if (rig && rig.value().signature == signature) return rig.value();
  }
  return std::nullopt;
}

struct WholeWay {
  json truth;
  std::vector<RunReading> readings;
  std::optional<Measurement> measurement;
  std::optional<Verdict> verdict;
  std::string trouble;  ///< where the way ended early
};

std::vector<Trace> tracesOf(const WholeWay& way) {
  std::vector<Trace> traces;
  for (const RunReading& reading : way.readings)
    if (reading.trace) traces.push_back(*reading.trace);
  return traces;
}

WholeWay walk(const json& truth) {
  WholeWay way{truth, {}, {}, {}, {}};
  for (const json& file : truth.at("files")) {
    const std::string name = file;
    auto reading = readRun(sampleBytes(name), name, {}, profileOf, {});
    if (!reading) return way.trouble = name + ": " + reading.error().code, way;
    way.readings.push_back(std::move(reading).value());
  }
  const std::string rig = truth.at("rig"), card = truth.at("card"), sheet = truth.at("limits");
  MeasureOptions options;
  options.rig = readRig(sampleBytes(rig), rig).value();
  options.card = readDamper(sampleBytes(card), card).value();
  auto measured = measureRuns(tracesOf(way), options, {});
  if (!measured) return way.trouble = "measure: " + measured.error().code, way;
  way.measurement = std::move(measured).value().measurement;
  way.verdict = judge(*way.measurement, readLimits(sampleBytes(sheet), sheet).value());
  return way;
}

/// Each damper's way is walked once for all tests.
const WholeWay& wayOf(std::size_t index) {
  static std::map<std::size_t, WholeWay> walked;
  const auto found = walked.find(index);
  if (found != walked.end()) return found->second;
  return walked.emplace(index, walk(sampleTruths().at(index))).first->second;
}

std::string wordOf(VerdictWord word) {
  switch (word) {
    case VerdictWord::Pass:
      return "pass";
    case VerdictWord::Fail:
      return "fail";
    case VerdictWord::TooCloseToCall:
      return "too close to call";
    case VerdictWord::NotTested:
      break;
  }
  return "not tested";
}

class SampleRun : public testing::TestWithParam<std::size_t> {
 protected:
  void SetUp() override { ASSERT_EQ(way().trouble, ""); }
  const WholeWay& way() const { return wayOf(GetParam()); }
  const json& truth() const { return way().truth; }

  /// The block at a tested speed, nothing where it was not found.
  const MeasuredBlock* blockAt(double speedMmS) const {
    for (const MeasuredBlock& block : way().measurement->blocks) {
      const double speed = block.compression.peakVelocity * 1e3;
      if (block.block.kind != BlockKind::Hold && std::abs(speed / speedMmS - 1) < 0.05)
        return &block;
    }
    return nullptr;
  }
};

TEST_P(SampleRun, IsReadByItsProfileWithNothingLeftOpen) {
  for (const RunReading& reading : way().readings) {
    EXPECT_TRUE(reading.open.empty()) << reading.open.front().point;
    ASSERT_TRUE(reading.trace.has_value());
    EXPECT_TRUE(reading.trace->directionSettled);
    EXPECT_EQ(reading.trace->zeroState, ZeroState::NoSpecimen);
    EXPECT_TRUE(profileOf(reading.source.signature).has_value()) << reading.source.signature;
    for (const Remark& remark : reading.trace->remarks)
      EXPECT_NE(remark.severity, Severity::Warning) << remark.code;
  }
}

TEST_P(SampleRun, HasOneBlockForEachTestedSpeed) {
  std::size_t blocks = 0;
  for (const MeasuredBlock& block : way().measurement->blocks)
    blocks += block.block.kind == BlockKind::Hold ? 0 : 1;
  EXPECT_EQ(blocks, truth().at("blocks").size());
}

// The product's promise: force at each tested speed within 0.5 % or 2 N of the noise-free reading.
TEST_P(SampleRun, ForceAtEachTestedSpeedIsThatOfTheNoiseFreeRun) {
  for (const json& block : truth().at("blocks")) {
    const MeasuredBlock* measured = blockAt(block.at("speed_mm_s"));
    ASSERT_NE(measured, nullptr) << block.at("speed_mm_s");
    for (const Direction direction : {Direction::Compression, Direction::Rebound}) {
      const json& half = block.at(direction == Direction::Compression ? "compression" : "rebound");
      const double force = half.at("force_n");
      EXPECT_NEAR(measured->reading(direction).force, force, std::max(0.005 * std::abs(force), 2.0))
          << block.at("speed_mm_s");
    }
  }
}

TEST_P(SampleRun, PeakVelocityAndEnergyAreTheTrueOnes) {
  for (const json& block : truth().at("blocks")) {
    const MeasuredBlock* measured = blockAt(block.at("speed_mm_s"));
    ASSERT_NE(measured, nullptr);
    const double speed = block.at("compression").at("peak_velocity_mm_s");
    const double energy = block.at("energy_j");
    // where 0.01 mm of noise on 15 or 25 mm, two slow cycles between rests, puts the turning points
    EXPECT_NEAR(measured->compression.peakVelocity * 1e3, speed, 2e-4 * speed);
    // 2 N of noise on a slow cycle's path: 2·v_rms·√samples·dt/√cycles = 0.9 mJ, four times that
    EXPECT_NEAR(measured->energy, energy, std::max(1e-3 * energy, 3.5e-3));
  }
}

TEST_P(SampleRun, GasAndFrictionAreTheTrueOnes) {
  const Gas& gas = way().measurement->gas;
  const Friction& friction = way().measurement->friction;
  ASSERT_TRUE(gas.force && friction.dry && friction.halfDifference);
  // 2 N of noise average out over 30,000 samples; what is left is the form of the friction
  EXPECT_NEAR(*gas.force, truth().at("gas_force_n"), 0.5);
  EXPECT_NEAR(*friction.dry, truth().at("dry_friction_n"), 1.0);
  EXPECT_NEAR(*friction.halfDifference, truth().at("half_difference_n"), 0.5);
}

TEST_P(SampleRun, GetsThePromisedVerdictCheckByCheck) {
  const Verdict& verdict = *way().verdict;
  EXPECT_EQ(wordOf(verdict.word), truth().at("verdict"));
  EXPECT_TRUE(verdict.waiting.empty());
  const json& checks = truth().at("checks");
  ASSERT_EQ(verdict.checks.size(), checks.size());
  for (std::size_t i = 0; i < checks.size(); ++i) {
    const CheckVerdict& check = verdict.checks[i];
    EXPECT_EQ(wordOf(check.verdict), checks[i].at("verdict")) << checks[i] << check.reason.code;
    const double figure = checks[i].at("truth_n");
    EXPECT_NEAR(check.measured.value_or(NAN), figure, check.expandedUncertainty) << checks[i];
  }
}

std::string nameOfRun(const testing::TestParamInfo<std::size_t>& info) {
  const json truth = sampleTruths().at(info.param);
  std::string name = truth.at("vehicle");
  name += '_';
  name += std::string(truth.at("corner"));
  if (truth.contains("rebound_clicks")) {
    name += '_';
    name += std::to_string(static_cast<int>(truth.at("rebound_clicks")));
  }
  std::replace(name.begin(), name.end(), ' ', '_');
  return name;
}

INSTANTIATE_TEST_SUITE_P(All,
                         SampleRun,
                         testing::Range<std::size_t>(0, sampleTruths().size()),
                         nameOfRun);

}  // namespace
}  // namespace dampwright::samples
