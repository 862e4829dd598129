// SPDX-License-Identifier: GPL-3.0-or-later
// The documents of results: columns, measurement, verdict.
#include <gtest/gtest.h>

#include <cmath>
#include <fstream>
#include <iterator>
#include <nlohmann/json.hpp>

#include "core/base/units.h"
#include "core/records/documents.h"
#include "core/words/words.h"
#include "tests/core/verdict/made_measurement.h"

namespace dampwright {
namespace {

constexpr double infinity = std::numeric_limits<double>::infinity();

Measurement fullMeasurement() {
  Measurement made = madeMeasurement();
  addPoint(made, Direction::Rebound, {0.1, 410.25, 0.05, 433});
  addPoint(made, Direction::Compression, {1.0 / 3.0, 212.5});
  made.blocks.back().compression.dampingForce = 180.125;
  made.blocks.back().compression.dampingForceTotalU = 1.5;
  made.blocks.back().compression.dampingForceTotalDof = infinity;
  made.runs[0].struckOut = {{3, 3.5}};
  made.runs[0].remarks = {{"unit-assumed",
                           Severity::Warning,
                           {{"column", std::string("Load")}, {"speed", 0.25, Quantity::Velocity}},
                           2,
                           7}};
  made.gas = {};
  made.gas.force = 151.5;
  made.gas.totalU = 0.75;
  made.gas.totalDof = 12.5;
  made.gas.rate = 1200;
  made.gas.columnLength = 0.15;
  made.gas.method = "slow block";
  made.friction.halfDifference = 24;
  made.friction.halfDifferenceTotalU = 0.5;
  made.friction.halfDifferenceTotalDof = infinity;
  made.friction.atVelocity = 0.004;
  made.reboundLaws = {{"two-slope",
                       true,
                       {{"low_n_s_per_m", 3000, 20, Quantity::Damping},
                        {"knee_mm_s", 0.12, 0.003, Quantity::Velocity}},
                       3.5,
                       infinity,
                       "",
                       ""}};
  made.rig.loadCell.readingPercent = 0.5;
  made.rig.loadCell.due = "2032-01-10";
  made.budget = {{"force", "load cell", 2.5, infinity}};
  return made;
}

std::string example(const std::string& name) {
  std::ifstream stream(std::string(DAMPWRIGHT_SOURCE_DIR "/tests/reference/documents/") + name,
                       std::ios::binary);
  return {std::istreambuf_iterator<char>(stream), {}};
}

template <class T>
T valueOf(const Result<T>& result) {
  EXPECT_TRUE(result) << (result ? "" : englishLine(result.error()));
  return result ? result.value() : T{};
}

TEST(Results, AMeasurementComesBackWithEverythingThatJudgingReads) {
  const Measurement made = fullMeasurement();
  const std::string text = writeMeasurement(made);
  const Measurement back = valueOf(readMeasurement(text, "m.json"));
  EXPECT_EQ(writeMeasurement(back), text);
  EXPECT_EQ(back.rig, made.rig);
  EXPECT_EQ(back.budget, made.budget);
  ASSERT_EQ(back.runs.size(), 1u);
  EXPECT_TRUE(back.runs[0].directionSettled);
  EXPECT_EQ(back.runs[0].remarks, made.runs[0].remarks);
  EXPECT_EQ(back.runs[0].struckOut, made.runs[0].struckOut);
  EXPECT_EQ(back.runs[0].source.metadata, made.runs[0].source.metadata);
  ASSERT_EQ(back.compression.points.size(), 1u);
  EXPECT_EQ(back.compression.points[0].block, 1u);
  EXPECT_DOUBLE_EQ(back.compression.points[0].reading.peakVelocity, 1.0 / 3.0);
  EXPECT_EQ(back.blocks[1].compression.dampingForce, 180.125);
  EXPECT_TRUE(std::isinf(back.blocks[1].compression.dampingForceTotalDof));
  EXPECT_EQ(back.blocks[0].compression.dampingForce, std::nullopt);
  EXPECT_EQ(back.blocks[0].block.cyclesUsed(), 1);
  EXPECT_EQ(back.gas.force, made.gas.force);
  EXPECT_EQ(back.gas.totalDof, made.gas.totalDof);
  EXPECT_EQ(back.friction.dry, std::nullopt);
  EXPECT_EQ(back.friction.halfDifference, 24);
  EXPECT_EQ(back.reboundLaws.at(0).parameters.at(1).quantity, Quantity::Velocity);
  EXPECT_EQ(back.reboundLaws.at(0).parameters.at(1).value, 0.12);
}

TEST(Results, WhatIsNotDeterminedIsNullAndNeverZero) {
  Measurement made = madeMeasurement();
  MeasuredBlock hold;
  hold.block.kind = BlockKind::Hold;
  hold.block.holdForce = 98;
  hold.energy = hold.compression.force = std::nan("");
  made.blocks = {hold};
  const auto json = nlohmann::json::parse(writeMeasurement(made));
  EXPECT_TRUE(json["gas"]["force_n"].is_null());
  EXPECT_TRUE(json["gas"]["force_n_u"].is_null());
  EXPECT_TRUE(json["friction"]["dry_n_u"].is_null());
  EXPECT_TRUE(json["blocks"][0]["energy_j"].is_null());
  EXPECT_TRUE(json["blocks"][0]["frequency_hz"].is_null());
  EXPECT_EQ(json["blocks"][0]["hold_force_n"], 98);
  EXPECT_TRUE(json["blocks"][0]["compression"]["force_n"].is_null());
  EXPECT_TRUE(json["blocks"][0]["compression"]["damping_force_n_u"].is_null());
  const auto moving = nlohmann::json::parse(writeMeasurement(fullMeasurement()));
  EXPECT_TRUE(moving["blocks"][0]["hold_force_n"].is_null());
  const Measurement back = valueOf(readMeasurement(writeMeasurement(made), "m.json"));
  EXPECT_TRUE(std::isnan(back.blocks.at(0).compression.force));
}

TEST(Results, NumbersStandInTheUnitOfTheirKey) {
  const auto json = nlohmann::json::parse(writeMeasurement(fullMeasurement()));
  EXPECT_EQ(json["blocks"][0]["stroke_mm"], 50);
  EXPECT_EQ(json["blocks"][0]["rebound"]["peak_velocity_mm_s"], 100);
  EXPECT_NEAR(json["blocks"][0]["phase_lag_deg"].get<double>(), 0.1 * 180 / pi, 1e-12);
  EXPECT_EQ(json["gas"]["rate_n_per_mm"], 1.2);
  EXPECT_EQ(json["laws"]["rebound"][0]["parameters"]["knee_mm_s"], 120);
  EXPECT_EQ(json["friction"]["at_velocity_mm_s"], 4);
}

// The examples were written by the program from the run that tests/batch makes (2000 N·s/m, no
// gas), so they must come back to the byte.
TEST(Results, ExamplesComeBackToTheByte) {
  const std::string columns = example("columns.json");
  const std::string measurement = example("measurement.json");
  const std::string verdict = example("verdict.json");
  EXPECT_EQ(writeColumns(valueOf(readColumns(columns, "columns.json"))), columns);
  EXPECT_EQ(writeMeasurement(valueOf(readMeasurement(measurement, "m.json"))), measurement);
  EXPECT_EQ(writeVerdict(valueOf(readVerdict(verdict, "verdict.json"))), verdict);
}

TEST(Results, AMeasurementThatPointsNowhereIsRefused) {
  auto json = nlohmann::json::parse(writeMeasurement(fullMeasurement()));
  json["curve"]["rebound"][0]["block"] = 2;
  const auto read = readMeasurement(json.dump(), "m.json");
  ASSERT_FALSE(read);
  EXPECT_EQ(read.error().code, "measurement-out-of-joint");
}

TEST(Results, AMeasurementThatLacksAKeyIsRefused) {
  auto json = nlohmann::json::parse(writeMeasurement(fullMeasurement()));
  json["gas"].erase("force_n");
  const auto read = readMeasurement(json.dump(), "m.json");
  ASSERT_FALSE(read);
  EXPECT_EQ(englishText(read.error().code, read.error().values),
            "The key gas.force_n is missing. Add it.");
}

TEST(Results, ColumnsComeBackAsTheyWere) {
  RunReading reading;
  reading.source = madeMeasurement().runs[0].source;
  reading.remarks = {{"bad-rows", Severity::Note, {}, 3, 17}};
  reading.open = {{"direction", {"compression", "rebound"}, "--displacement-positive"}};
  const std::string text = writeColumns(reading);
  const RunReading back = valueOf(readColumns(text, "c.json"));
  EXPECT_EQ(writeColumns(back), text);
  EXPECT_EQ(back.source.columns.at(1).role, Role::Force);
  EXPECT_EQ(back.source.headerRows, reading.source.headerRows);
  EXPECT_EQ(back.source.unitRow, 2);
  EXPECT_EQ(back.remarks, reading.remarks);
  EXPECT_EQ(back.open.at(0).candidates, reading.open[0].candidates);
}

TEST(Results, AVerdictComesBackAsItWas) {
  Verdict verdict;
  verdict.word = VerdictWord::TooCloseToCall;
  CheckVerdict force;
  force.check = {"force", Direction::Rebound, 0.3, "", std::nullopt, "", 870, 1120, {}, 0, 0};
  force.measured = 1118.5;
  force.standardUncertainty = 2;
  force.dof = infinity;
  force.coverageFactor = 2;
  force.expandedUncertainty = 4;
  force.min = 870;
  force.max = 1120;
  force.margin = 1.5;
  force.verdict = VerdictWord::TooCloseToCall;
  force.budget = {{"force", "cycles", 2, 4}};
  CheckVerdict friction;
  friction.check.check = "friction";
  friction.check.max = 60;
  friction.max = 60;
  friction.reason = {"friction-not-determined", {}};
  verdict.checks = {force, friction};
  verdict.waiting = {{"no-checks", {}}};
  verdict.measurementSha256 = std::string(64, 'b');
  const std::string text = writeVerdict(verdict);
  const Verdict back = valueOf(readVerdict(text, "v.json"));
  EXPECT_EQ(writeVerdict(back), text);
  EXPECT_EQ(back.checks.at(0).check, force.check);
  EXPECT_EQ(back.checks.at(0).budget, force.budget);
  EXPECT_TRUE(std::isinf(back.checks.at(0).dof));
  EXPECT_EQ(back.checks.at(1).measured, std::nullopt);
  EXPECT_EQ(back.checks.at(1).reason.code, "friction-not-determined");
  const auto json = nlohmann::json::parse(text);
  EXPECT_EQ(json["verdict"], "too close to call");
  EXPECT_TRUE(json["checks"][1]["expanded_uncertainty"].is_null());
  EXPECT_EQ(json["checks"][0]["velocity_mm_s"], 300);
}

}  // namespace
}  // namespace dampwright
