// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/session/place_runs.h"

#include <gmock/gmock.h>

#include "core/job/suggest_corner.h"
#include "ui/session/change_job.h"

namespace dampwright {
namespace {

using testing::ElementsAre;

DroppedRun runOf(const std::string& name, const Metadata& metadata = {}) {
  RunReading reading;
  reading.source.metadata = metadata;
  DroppedRun run;
  run.bytes = {name, "hash of " + name, std::make_shared<const std::string>(name)};
  run.reading = std::make_shared<const RunReading>(std::move(reading));
  return run;
}

std::vector<std::string> codesOf(const Placed& placed) {
  std::vector<std::string> codes;
  for (const DropProblem& problem : placed.problems) {
    codes.push_back(problem.error.code + (problem.taken ? " (taken)" : ""));
  }
  return codes;
}

std::vector<std::string> filesAt(const Job& job, const std::string& corner, int phase) {
  std::vector<std::string> files;
  const JobPhase* found = findPhase(job, corner, phase);
  if (found == nullptr) return files;
  for (const JobRun& run : found->runs) files.push_back(run.file);
  return files;
}

const Job car = withAllCorners({});

TEST(PlaceRuns, TheTargetBeatsWhatTheFileSaysAndThatIsSaid) {
  const Placed placed = placeRuns(car, {runOf("FL.csv")}, "front right", "");
  EXPECT_THAT(filesAt(placed.job, "front right", 0), ElementsAre("FL.csv"));
  EXPECT_THAT(codesOf(placed), ElementsAre("corner-differs (taken)"));
}

TEST(PlaceRuns, WithoutATargetTheFilesNameDecidesElseTheSelection) {
  const Placed placed = placeRuns(car, {runOf("HR.csv"), runOf("x.csv")}, "", "front left");
  EXPECT_THAT(filesAt(placed.job, "rear right", 0), ElementsAre("HR.csv"));
  EXPECT_THAT(filesAt(placed.job, "front left", 0), ElementsAre("x.csv"));
  EXPECT_TRUE(placed.problems.empty());
  EXPECT_EQ(placed.files.size(), 2u);
}

TEST(PlaceRuns, WithoutAnyHintNothingIsGuessed) {
  const Placed placed = placeRuns(car, {runOf("x.csv")}, "", "");
  EXPECT_EQ(placed.job, car);
  EXPECT_THAT(codesOf(placed), ElementsAre("corner-unknown"));
}

TEST(PlaceRuns, AFileASpeedMakesOnePhase) {
  const Placed placed = placeRuns(car, {runOf("0600.csv"), runOf("0005.csv")}, "rear left", "");
  EXPECT_THAT(filesAt(placed.job, "rear left", 0), ElementsAre("0005.csv", "0600.csv"));
}

TEST(PlaceRuns, EachSettingMakesAPhaseInTheOrderOfTheClicks) {
  const auto at = [](const std::string& clicks, const std::string& name) {
    return runOf(name, {{"Rebound clicks", clicks}});
  };
  const Placed placed =
      placeRuns(car, {at("10", "a.csv"), at("2", "b.csv"), at("10", "c.csv")}, "rear left", "");
  EXPECT_THAT(filesAt(placed.job, "rear left", 0), ElementsAre("b.csv"));
  EXPECT_THAT(filesAt(placed.job, "rear left", 1), ElementsAre("a.csv", "c.csv"));
  EXPECT_EQ(placed.last, (PhaseKey{"rear left", 1}));
}

TEST(PlaceRuns, ARunIsAddedOnceOnly) {
  const Placed first = placeRuns(car, {runOf("a.csv"), runOf("a.csv")}, "rear left", "");
  EXPECT_THAT(codesOf(first), ElementsAre("run-already-here"));
  const Placed again = placeRuns(first.job, {runOf("a.csv")}, "rear right", "");
  EXPECT_EQ(again.job, first.job);
  EXPECT_THAT(codesOf(again), ElementsAre("run-already-here"));
  EXPECT_TRUE(again.files.empty());
}

TEST(PlaceRuns, ACornerWithoutASerialTakesTheRunsWithTheBooksCard) {
  DroppedRun run = runOf("a.csv", {{"Serial", "S 1"}});
  DamperCard card;
  card.serial = "S 1";
  card.partNumber = "P 1";
  run.knownCard = card;
  EXPECT_EQ(findItem(placeRuns(car, {run}, "rear left", "").job, "rear left")->damper, card);
}

TEST(PlaceRuns, ASerialOnTwoCornersIsSaidOnceForAllFilesOfTheDamper) {
  const Metadata serial = {{"Serial", "S 1"}};
  const Job job = placeRuns(car, {runOf("a.csv", serial)}, "rear left", "").job;
  const Placed placed =
      placeRuns(job, {runOf("b.csv", serial), runOf("c.csv", serial)}, "rear right", "");
  EXPECT_THAT(codesOf(placed), ElementsAre("serial-on-two-corners (taken)"));
  EXPECT_EQ(filesAt(placed.job, "rear right", 0).size(), 2u);
}

TEST(PlaceRuns, ASerialAgainstTheCardIsSaidAndTheCardStays) {
  DamperCard card;
  card.serial = "S 2";
  const Job job = withDamper(car, "rear left", card);
  const Placed placed = placeRuns(job, {runOf("a.csv", {{"Serial", "S 1"}})}, "rear left", "");
  EXPECT_THAT(codesOf(placed), ElementsAre("serial-differs (taken)"));
  EXPECT_EQ(findItem(placed.job, "rear left")->damper, card);
}

TEST(PlaceCard, ACardGoesToItsTargetItsSerialOrItsPosition) {
  DamperCard card;
  card.serial = "S 1";
  card.position = "rear left";
  EXPECT_EQ(findItem(placeCard(car, card, "front left").job, "front left")->damper, card);
  EXPECT_EQ(findItem(placeCard(car, card, "").job, "rear left")->damper, card);
  DamperCard old;
  old.serial = "S 1";
  const Job job = withDamper(car, "front right", old);
  EXPECT_EQ(findItem(placeCard(job, card, "").job, "front right")->damper, card);
  card = {};
  EXPECT_THAT(codesOf(placeCard(car, card, "")), ElementsAre("corner-unknown"));
}

TEST(PlaceCard, TheSameSerialOnAnotherCornerIsSaid) {
  DamperCard card;
  card.serial = "S 1";
  const Job job = withDamper(car, "front right", card);
  EXPECT_THAT(codesOf(placeCard(job, card, "front left")),
              ElementsAre("serial-on-two-corners (taken)"));
}

TEST(VehicleOf, RunsOfACarsCornerSpeakOfACar) {
  EXPECT_EQ(vehicleOf({runOf("x.csv"), runOf("FL.csv")}), VehicleKind::Car);
  EXPECT_EQ(vehicleOf({runOf("x.csv")}), VehicleKind::SingleDamper);
}

}  // namespace
}  // namespace dampwright
