// SPDX-License-Identifier: GPL-3.0-or-later
#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include "core/base/sha256.h"
#include "core/records/documents.h"
#include "tests/batch/run_batch.h"

namespace dampwright {
namespace {

using testing::HasSubstr;
using testing::StartsWith;

constexpr double coefficient = 2000;  // N·s/m: 600 N at 300 mm/s
const std::string settled = " --displacement-positive compression --zero-state 'no specimen'";

class Verbs : public testing::Test {
 protected:
  void SetUp() override { folder.write("run.csv", linearDamperRun(coefficient)); }
  Ended judge(const Limits& limits) {
    folder.write("stored.json", writeMeasurement(storedMeasurement()));
    folder.write("limits.json", writeLimits(limits));
    return folder.batch("judge stored.json --limits limits.json");
  }
  Folder folder;
};

TEST_F(Verbs, ColumnsSaysWhatEachColumnIsTakenForAndWhatIsOpen) {
  const Ended ended = folder.batch("columns run.csv");
  EXPECT_EQ(ended.status, 0) << ended.err;
  EXPECT_THAT(ended.out, HasSubstr("Displacement  mm    displacement"));
  EXPECT_THAT(ended.out, HasSubstr("Its name says so."));
  EXPECT_THAT(ended.out, HasSubstr("open: direction; answer with --displacement-positive"));
  EXPECT_EQ(ended.err, "");
}

TEST_F(Verbs, ColumnsAsADocumentReadsBack) {
  const Ended ended = folder.batch("columns run.csv --json");
  ASSERT_EQ(ended.status, 0) << ended.err;
  const auto reading = readColumns(ended.out, "stdout");
  ASSERT_TRUE(reading);
  EXPECT_EQ(reading.value().source.file.name, "run.csv");
  EXPECT_EQ(reading.value().source.file.sha256, sha256Hex(linearDamperRun(coefficient)));
  EXPECT_EQ(reading.value().source.columns.size(), 3u);
}

TEST_F(Verbs, AnAnswerOnTheCommandLineClosesItsOpenPoint) {
  const Ended ended = folder.batch("columns run.csv --displacement-positive rebound");
  EXPECT_EQ(ended.out.find("open: direction"), std::string::npos) << ended.out;
}

TEST_F(Verbs, MeasureGivesTheForceOfTheDamper) {
  const Ended ended = folder.batch("measure run.csv" + settled);
  ASSERT_EQ(ended.status, 0) << ended.err;
  const auto measurement = readMeasurement(ended.out, "stdout");
  ASSERT_TRUE(measurement);
  EXPECT_EQ(measurement.value().blocks.size(), 3u);
  ASSERT_EQ(measurement.value().rebound.points.size(), 3u);
  const Reading& fastest = measurement.value().rebound.points.back().reading;
  EXPECT_NEAR(fastest.peakVelocity, 0.3, 0.3 * 1e-4);  // 0.01 % for a sine
  EXPECT_NEAR(fastest.force, 600, 600 * 0.002 * 1.1);  // within the cycles' own scatter
}

TEST_F(Verbs, StandardInputIsAFileToo) {
  const Ended ended = folder.shell("cat run.csv | $BATCH measure -" + settled);
  ASSERT_EQ(ended.status, 0) << ended.err;
  EXPECT_TRUE(readMeasurement(ended.out, "stdout"));
}

TEST_F(Verbs, TheSameRunGivesTheSameBytes) {
  EXPECT_EQ(folder.batch("measure run.csv" + settled).out,
            folder.batch("measure run.csv" + settled).out);
}

TEST_F(Verbs, AStoredMeasurementIsJudgedAsTheRunThatItCameFrom) {
  folder.write("limits.json", writeLimits(reboundLimits(500, 700)));
  const Ended run = folder.batch("judge run.csv --limits limits.json" + settled);
  ASSERT_EQ(run.status, 0) << run.err << run.out;
  ASSERT_EQ(folder.batch("measure run.csv --out m.json" + settled).status, 0);
  const Ended stored = folder.batch("judge m.json --limits limits.json");
  EXPECT_EQ(stored.status, 0) << stored.err;
  const auto a = readVerdict(run.out, "run"), b = readVerdict(stored.out, "stored");
  ASSERT_TRUE(a && b);
  EXPECT_EQ(a.value().measurementSha256, b.value().measurementSha256);
  EXPECT_EQ(b.value().measurementSha256, sha256Hex(folder.read("m.json")));
  ASSERT_EQ(a.value().checks.size(), 1u);
  // one unit in the last place where mm and m do not map onto each other
  EXPECT_NEAR(*a.value().checks[0].measured, *b.value().checks[0].measured, 1e-11);
  EXPECT_NEAR(
      a.value().checks[0].expandedUncertainty, b.value().checks[0].expandedUncertainty, 1e-11);
}

TEST_F(Verbs, JudgeEndsWithTheVerdict) {
  // 600 N with U = 2·1 % = 12 N
  EXPECT_EQ(judge(reboundLimits(500, 700)).status, 0);
  EXPECT_EQ(judge(reboundLimits(650, 700)).status, 1);
  EXPECT_EQ(judge(reboundLimits(595, 700)).status, 2);
  Limits other = reboundLimits(500, 700);
  other.checks[0].velocity = 1;
  EXPECT_EQ(judge(other).status, 2);
  EXPECT_EQ(judge(Limits{}).status, 2);
}

TEST_F(Verbs, AVerdictNamesLimitsReasonAndMeasurement) {
  const Ended ended = judge(reboundLimits(650, 700));
  const auto verdict = readVerdict(ended.out, "stdout");
  ASSERT_TRUE(verdict);
  EXPECT_EQ(verdict.value().word, VerdictWord::Fail);
  EXPECT_EQ(verdict.value().title, "invented");
  EXPECT_EQ(verdict.value().measurementSha256, sha256Hex(folder.read("stored.json")));
  EXPECT_THAT(ended.out, HasSubstr("outside the limit of 650 N"));
}

TEST_F(Verbs, WithoutAnAnswerTheDirectionIsAssumedAndTheVerdictWaits) {
  folder.write("limits.json", writeLimits(reboundLimits(500, 700)));
  const Ended ended = folder.batch("judge run.csv --limits limits.json");
  EXPECT_EQ(ended.status, 2);
  EXPECT_THAT(ended.out, HasSubstr("direction-not-confirmed"));
  EXPECT_THAT(ended.err, HasSubstr("direction-assumed: run.csv: "));
}

TEST_F(Verbs, ARigProfileThatIsNamedIsUsedWhateverItsSignature) {
  RigProfile rig;
  rig.signature = "of another file";
  rig.displacementPositive = Direction::Rebound;
  rig.zeroState = ZeroState::NoSpecimen;
  rig.loadCell.readingPercent = 1;
  folder.write("rig.json", writeRig(rig));
  const Ended ended = folder.batch("measure run.csv --rig rig.json");
  ASSERT_EQ(ended.status, 0) << ended.err;
  const auto measurement = readMeasurement(ended.out, "stdout");
  ASSERT_TRUE(measurement);
  EXPECT_TRUE(measurement.value().runs.at(0).directionSettled);
  EXPECT_EQ(measurement.value().runs.at(0).zeroState, ZeroState::NoSpecimen);
  EXPECT_EQ(measurement.value().rig.loadCell.readingPercent, 1);
}

TEST_F(Verbs, ProgressIsSaidOnStandardError) {
  const Ended ended = folder.batch("measure run.csv --progress" + settled);
  EXPECT_EQ(ended.status, 0);
  EXPECT_THAT(ended.err, HasSubstr("progress: "));
  EXPECT_THAT(ended.out, StartsWith("{"));
}

TEST_F(Verbs, SheetHandsItsArgumentsToTheProgramBesideIt) {
  ASSERT_EQ(folder.shell("mkdir bin && cp \"$BATCH\" bin/").status, 0);
  folder.write("limits.json", writeLimits(reboundLimits(500, 700)));
  const std::string arguments = "sheet 'run 1.csv' --limits limits.json --pdf 'out 1.pdf'";
  const Ended missing = folder.shell("bin/dampwright-batch " + arguments);
  EXPECT_EQ(missing.status, 4);
  EXPECT_THAT(missing.err, StartsWith("sheet-program-missing: "));
  folder.write("bin/dampwright",
               "#!/bin/sh\necho \"$QT_QPA_PLATFORM\"\nfor a in \"$@\"; do echo \"<$a>\"; done\n"
               "echo said >&2\nexit 2\n");
  const Ended ended = folder.shell("chmod +x bin/dampwright && bin/dampwright-batch " + arguments);
  EXPECT_EQ(ended.status, 2);
  EXPECT_EQ(ended.out,
            "offscreen\n<sheet>\n<run 1.csv>\n<--limits>\n<limits.json>\n<--pdf>\n<out 1.pdf>\n");
  EXPECT_EQ(ended.err, "said\n");
}

}  // namespace
}  // namespace dampwright
