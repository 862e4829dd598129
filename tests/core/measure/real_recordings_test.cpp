// SPDX-License-Identifier: GPL-3.0-or-later
// Recordings of a magneto-rheological damper, published with stroke and frequency; origin and what
// was computed from them independently (NumPy) stand in tests/reference/real/README.md.
#include <gtest/gtest.h>

#include <fstream>
#include <sstream>

#include "core/intake/read_run.h"
#include "core/measure/measure_runs.h"

namespace dampwright {
namespace {

Measurement measureFile(const std::string& name) {
  std::ifstream file(DAMPWRIGHT_SOURCE_DIR "/tests/reference/real/" + name, std::ios::binary);
  std::stringstream bytes;
  bytes << file.rdbuf();
  const auto reading = readRun(bytes.str(), name, {}, {}, {});
  EXPECT_TRUE(reading && reading.value().trace) << name;
  if (!reading || !reading.value().trace) return {};
  const auto measured = measureRuns(std::span(&*reading.value().trace, 1), {}, {});
  EXPECT_TRUE(measured) << name;
  return measured ? measured.value().measurement : Measurement{};
}

const MeasuredBlock* longestBlock(const Measurement& measurement) {
  const MeasuredBlock* longest = nullptr;
  for (const MeasuredBlock& block : measurement.blocks) {
    if (longest == nullptr || block.block.cyclesUsed() > longest->block.cyclesUsed()) {
      longest = &block;
    }
  }
  return longest;
}

void expectBlock(const std::string& name, double period, double stroke, double energy, int cycles) {
  const Measurement measurement = measureFile(name);
  const MeasuredBlock* found = longestBlock(measurement);
  ASSERT_NE(found, nullptr);
  EXPECT_NEAR(1 / found->block.frequency, period, 0.01 * period);
  EXPECT_NEAR(found->block.stroke, stroke, 0.01 * stroke);
  EXPECT_NEAR(found->energy, energy, 0.01 * energy);
  // whole cycles as counted by others; one at each edge may fall to the ramp
  EXPECT_NEAR(static_cast<double>(found->block.cycles.size()), cycles, 2);
  EXPECT_GT(found->compression.force + found->rebound.force, 0);  // twice the half difference
  EXPECT_EQ(measurement.laws(Direction::Compression)[0].status, "friction-not-determined");
}

TEST(RealRecordings, StrokeOf24Point75Millimetres) {
  expectBlock("mr_damper_stroke_24.75mm_0.840Hz.csv", 1.19, 0.02441, 5.166, 23);
}

TEST(RealRecordings, StrokeOf15Point16Millimetres) {
  expectBlock("mr_damper_stroke_15.16mm_1.053Hz.csv", 0.95, 0.01513, 2.673, 28);
}

TEST(RealRecordings, TheirDirectionStaysAssumed) {
  const Measurement measurement = measureFile("mr_damper_stroke_15.16mm_1.053Hz.csv");
  ASSERT_TRUE(measurement.gas.force);  // of the standstill before the motion
  // friction of this damper is large, so ± half the force difference leaves the sign open
  EXPECT_LT(*measurement.gas.force, 3 * measurement.gas.totalU);
  EXPECT_FALSE(measurement.runs[0].directionSettled);
  int assumed = 0;
  for (const Remark& remark : measurement.remarks) assumed += remark.code == "direction-assumed";
  EXPECT_EQ(assumed, 1);
}

}  // namespace
}  // namespace dampwright
