// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/documents.h"

#include <gtest/gtest.h>

#include <fstream>
#include <iterator>
#include <locale>

#include "core/words/words.h"

namespace dampwright {
namespace {

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

TEST(Documents, RigExampleReadsInSiAndComesBackEqual) {
  const RigProfile rig = valueOf(readRig(example("rig.json"), "rig.json"));
  EXPECT_EQ(rig.name, "bench 1");
  EXPECT_EQ(rig.forceDelay, 0.00035);
  EXPECT_EQ(rig.displacementAccuracy, 0.00002);
  EXPECT_EQ(rig.displacementPositive, Direction::Rebound);
  EXPECT_EQ(rig.zeroState, ZeroState::NoSpecimen);
  EXPECT_EQ(rig.displacement->number, 2);
  EXPECT_EQ(rig.force->scale, 512.5);
  EXPECT_FALSE(rig.velocity);
  EXPECT_EQ(rig.loadCell.capacity, 5000);
  EXPECT_EQ(valueOf(readRig(writeRig(rig), "again")), rig);
}

TEST(Documents, ARigMayBeEmpty) {
  const auto rig = readRig(R"({"document": "dampwright rig", "version": 1})", "r");
  EXPECT_EQ(valueOf(rig), RigProfile{});
}

TEST(Documents, DamperExampleReadsInSiAndComesBackEqual) {
  const DamperCard card = valueOf(readDamper(example("damper.json"), "damper.json"));
  EXPECT_EQ(card.rodDiameter, 0.011);
  EXPECT_EQ(card.openLength, 0.5123);
  EXPECT_EQ(card.gas.pressure, 2e6);
  EXPECT_EQ(card.adjusters.at(0).zero, "full hard");
  EXPECT_EQ(card.notes, "invented, Größe µ");
  EXPECT_EQ(valueOf(readDamper(writeDamper(card), "again")), card);
}

TEST(Documents, LimitsExampleReadsInSiAndComesBackEqual) {
  const Limits limits = valueOf(readLimits(example("limits.json"), "limits.json"));
  EXPECT_EQ(limits.forceBasis, ForceBasis::GasRemoved);
  EXPECT_EQ(limits.conditions.stroke, 0.05);
  EXPECT_EQ(limits.conditions.temperatureTo, 35);
  ASSERT_EQ(limits.checks.size(), 4u);
  EXPECT_EQ(limits.checks[0].velocity, 0.3);
  EXPECT_EQ(limits.checks[0].target, 1150);
  EXPECT_EQ(limits.checks[0].toleranceAbsolute, 5);
  EXPECT_EQ(limits.checks[1].stroke, 0.05);
  EXPECT_EQ(limits.checks[3].basis, "half difference");
  EXPECT_EQ(valueOf(readLimits(writeLimits(limits), "again")), limits);
}

std::string limitsProblem(const std::string& check) {
  const auto limits = readLimits(
      R"({"document": "dampwright limits", "version": 1, "checks": [)" + check + "]}", "l.json");
  return limits ? "" : englishLine(limits.error());
}

TEST(Documents, ACheckHasTheKeysOfItsKindAndNoOthers) {
  EXPECT_EQ(limitsProblem(R"({"check": "gas force", "min_n": 1})"), "");
  EXPECT_TRUE(limitsProblem(R"({"check": "gas force", "min_n": 1, "velocity_mm_s": 3})")
                  .starts_with("document-unknown-key: l.json, row 1: The key "
                               "checks[0].velocity_mm_s"));
  EXPECT_TRUE(limitsProblem(R"({"check": "wobble", "min_n": 1})")
                  .starts_with("document-unknown-word: l.json, row 1: The key checks[0].check is "
                               "\"wobble\""));
  EXPECT_TRUE(limitsProblem(R"({"min_n": 1})").starts_with("document-unknown-key"));
  EXPECT_TRUE(limitsProblem("{}").starts_with("check-unknown"));
}

TEST(Documents, ACheckWhoseFieldsDoNotGoTogetherIsRefusedWithTheRule) {
  EXPECT_TRUE(limitsProblem(R"({"check": "gas force"})").starts_with("check-without-limit"));
  EXPECT_TRUE(limitsProblem(R"({"check": "gas force", "min_n": 1, "target_n": 3})")
                  .starts_with("check-with-two-limits"));
  EXPECT_TRUE(limitsProblem(R"({"check": "gas force", "target_n": 3})")
                  .starts_with("check-without-tolerance"));
  EXPECT_TRUE(limitsProblem(R"({"check": "gas force", "min_n": 3, "max_n": 1})")
                  .starts_with("check-limits-crossed"));
  EXPECT_TRUE(limitsProblem(R"({"check": "force", "direction": "rebound", "min_n": 3})")
                  .starts_with("check-incomplete: l.json, row 1: The check lacks velocity_mm_s"));
  EXPECT_TRUE(limitsProblem(
                  R"({"check": "force", "direction": "rebound", "velocity_mm_s": -3, "min_n": 3})")
                  .starts_with("document-out-of-range"));
  EXPECT_TRUE(
      limitsProblem(R"({"check": "gas force", "mni_n": 1})").starts_with("document-unknown-key"));
}

TEST(Documents, ATemperatureWindowHasTwoEndsInOrder) {
  const auto code = [](const std::string& window) {
    const auto limits = readLimits(
        R"({"document": "dampwright limits", "version": 1, "conditions": {"temperature_c": )" +
            window + "}}",
        "l.json");
    return limits ? "" : limits.error().code;
  };
  EXPECT_EQ(code("[15, 35]"), "");
  EXPECT_EQ(code("null"), "");
  EXPECT_EQ(code("[15]"), "document-bad-window");
  EXPECT_EQ(code("[35, 15]"), "document-bad-window");
  EXPECT_EQ(code("[null, 15]"), "document-bad-window");
  EXPECT_EQ(code("[\"15\", 35]"), "document-not-a-number");
}

TEST(Documents, AJobKeepsWhatWasSaidOfEachRunFile) {
  JobRun run;
  run.file = "run.csv";
  run.rig = "bench 1";
  run.answers.zeroState = ZeroState::DamperFitted;
  Job job;
  job.items = {{"front left", {}, {{Phase::AsFound, {}, {run, run, run}}}}};
  ReadOptions& answers = job.items[0].phases[0].runs[1].answers;
  answers.delimiter = ";";
  answers.headerRow = 7;
  answers.force = "3";
  answers.displacementUnit = "in";
  answers.sampleRate = 512.5;
  answers.forcePositive = Direction::Rebound;
  job.items[0].phases[0].runs[2].answers = {};
  EXPECT_EQ(valueOf(readJob(writeJob(job), "again")), job);
}

TEST(Documents, JobExampleComesBackEqual) {
  const Job job = valueOf(readJob(example("job.json"), "job.json"));
  EXPECT_EQ(job.kind, VehicleKind::Car);
  EXPECT_TRUE(job.invented);
  ASSERT_EQ(job.items.size(), 2u);
  const JobPhase& phase = job.items[0].phases.at(0);
  EXPECT_EQ(phase.setting.at(0), (SettingValue{"rebound", 8}));
  EXPECT_EQ(phase.setting.at(1), (SettingValue{"low speed mm", 2.5}));
  EXPECT_EQ(phase.runs.at(0).struckOut.at(0).end, 13.125);
  ASSERT_TRUE(job.limits);
  EXPECT_EQ(job.limits->checks.at(0).min, 120);
  EXPECT_EQ(valueOf(readJob(writeJob(job), "again")), job);
}

TEST(Documents, ADateIsCheckedAsFarAsACalendarGoesWithoutAYear) {
  const auto code = [](const std::string& date) {
    const auto job = readJob(
        R"({"document": "dampwright job", "version": 1, "opened": ")" + date + "\"}", "j.json");
    return job ? "" : job.error().code;
  };
  EXPECT_EQ(code("2031-01-12"), "");
  EXPECT_EQ(code("2031-01-12T09:30:00+01:00"), "");
  for (const char* wrong : {"12.1.2031", "2031-13-01", "2031-00-10", "2031-01-32", "2031-01-1x"})
    EXPECT_EQ(code(wrong), "document-out-of-range") << wrong;
}

TEST(Documents, TheTextDoesNotDependOnTheLocale) {
  struct Comma : std::numpunct<char> {
    char do_decimal_point() const override { return ','; }
    std::string do_grouping() const override { return "\3"; }
  };
  const Limits limits = valueOf(readLimits(example("limits.json"), "limits.json"));
  const std::string before = writeLimits(limits);
  const std::locale old = std::locale::global(std::locale(std::locale(), new Comma));
  const std::string after = writeLimits(limits);
  const Limits again = valueOf(readLimits(after, "again"));
  std::locale::global(old);
  EXPECT_EQ(after, before);
  EXPECT_EQ(again, limits);
}

}  // namespace
}  // namespace dampwright
