// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/session/change_job.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

JobRun runNamed(const std::string& sha256) {
  JobRun run;
  run.file = sha256 + ".csv";
  run.sha256 = sha256;
  return run;
}

Job carWith(const std::string& corner, const std::vector<std::string>& runs) {
  Job job = withAllCorners({});
  for (const std::string& run : runs) {
    job = withRuns(std::move(job), corner, {Phase::AsFound, {}, {runNamed(run)}});
  }
  return job;
}

TEST(ChangeJob, ADraftGetsEveryPlaceOfItsVehicleAndKeepsWhatItHas) {
  Job draft;
  draft.items = {{"rear left", {}, {}}, {"spare wheel", {}, {}}};
  draft.items[0].damper.serial = "7";
  const Job job = withAllCorners(draft);
  ASSERT_EQ(job.items.size(), 5u);
  EXPECT_EQ(job.items[0].corner, "front left");
  EXPECT_EQ(job.items[2].damper.serial, "7");
  EXPECT_EQ(job.items[4].corner, "spare wheel");
}

TEST(ChangeJob, RunsOfOneSettingMakeOnePhaseAndOthersOneOfTheirOwn) {
  Job job = carWith("front left", {"a", "b"});
  job = withRuns(job, "front left", {Phase::AsFound, {{"rebound", 4}}, {runNamed("c")}});
  job = withRuns(job, "front left", {Phase::AfterWork, {}, {runNamed("d")}});
  const JobItem& item = *findItem(job, "front left");
  ASSERT_EQ(item.phases.size(), 3u);
  EXPECT_EQ(item.phases[0].runs.size(), 2u);
}

TEST(ChangeJob, APhaseGoesWithItsLastRun) {
  Job job = carWith("front left", {"a", "b"});
  job = withoutRun(job, "front left", 0, 0);
  ASSERT_EQ(findItem(job, "front left")->phases.size(), 1u);
  EXPECT_EQ(findPhase(job, "front left", 0)->runs[0].sha256, "b");
  job = withoutRun(job, "front left", 0, 0);
  EXPECT_TRUE(findItem(job, "front left")->phases.empty());
}

TEST(ChangeJob, RunsMoveToAnotherCornerBehindThoseThere) {
  Job job = carWith("front left", {"a"});
  job = withRuns(job, "front right", {Phase::AsFound, {}, {runNamed("b")}});
  job = withRunsMoved(job, "front left", 0, "front right");
  EXPECT_TRUE(findItem(job, "front left")->phases.empty());
  ASSERT_EQ(findPhase(job, "front right", 0)->runs.size(), 2u);
  EXPECT_EQ(findPhase(job, "front right", 0)->runs[1].sha256, "a");
}

TEST(ChangeJob, AStruckOutSpanIsKeptOnceAndPutBack) {
  const Job before = carWith("front left", {"a"});
  Job job = withStruckOut(before, "front left", 0, 0, {2, 3});
  job = withStruckOut(job, "front left", 0, 0, {1, 2});
  job = withStruckOut(job, "front left", 0, 0, {2, 3});
  const std::vector<TimeSpan> spans = {{1, 2}, {2, 3}};
  EXPECT_EQ(findPhase(job, "front left", 0)->runs[0].struckOut, spans);
  job = withPutBack(job, "front left", 0, 0, {1, 2});
  EXPECT_EQ(withPutBack(job, "front left", 0, 0, {2, 3}), before);
}

TEST(ChangeJob, WhatDoesNotFitChangesNothing) {
  const Job job = carWith("front left", {"a"});
  EXPECT_EQ(withoutRun(job, "front left", 0, 1), job);
  EXPECT_EQ(withoutRun(job, "front left", -1, 0), job);
  EXPECT_EQ(withoutRun(job, "roof", 0, 0), job);
  EXPECT_EQ(withRunsMoved(job, "front left", 0, "roof"), job);
  EXPECT_EQ(withRunsMoved(job, "front left", 0, "front left"), job);
  EXPECT_EQ(withStruckOut(job, "rear left", 0, 0, {1, 2}), job);
  EXPECT_EQ(withDamper(job, "roof", {}), job);
  EXPECT_EQ(withRuns(job, "roof", {Phase::AsFound, {}, {runNamed("b")}}), job);
}

TEST(ChangeJob, DetailsLeaveTheDampersAlone) {
  Job details;
  details.customer = "A. Customer";
  details.notes = "leaks";
  const Job job = withDetails(carWith("front left", {"a"}), details);
  EXPECT_EQ(job.customer, "A. Customer");
  EXPECT_EQ(job.notes, "leaks");
  EXPECT_EQ(job.items.size(), 4u);
}

}  // namespace
}  // namespace dampwright
