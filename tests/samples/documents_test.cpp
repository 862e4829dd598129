// SPDX-License-Identifier: GPL-3.0-or-later
// The program's strict readers take every document of sample_runs, which another hand wrote.
#include <gtest/gtest.h>

#include <algorithm>
#include <filesystem>

#include "core/base/sha256.h"
#include "core/records/documents.h"
#include "tests/samples/sample_folder.h"

namespace dampwright::samples {
namespace {

namespace fs = std::filesystem;

TEST(SampleDocuments, AllAreReadByTheirStrictReaders) {
  int read = 0;
  for (const auto& entry : fs::directory_iterator(sampleFolder())) {
    const std::string name = entry.path().filename().string();
    if (entry.path().extension() != ".json" || name == "truth.json") continue;
    const std::string bytes = sampleBytes(name);
    const auto complain = [&](const auto& result) { return result ? "" : result.error().code; };
    if (name.starts_with("rig_")) {
      EXPECT_EQ(complain(readRig(bytes, name)), "") << name;
    }
    if (name.starts_with("damper_")) {
      EXPECT_EQ(complain(readDamper(bytes, name)), "") << name;
    }
    if (name.starts_with("limits_")) {
      EXPECT_EQ(complain(readLimits(bytes, name)), "") << name;
    }
    if (name.ends_with("_job.json")) {
      EXPECT_EQ(complain(readJob(bytes, name)), "") << name;
    }
    ++read;
  }
  EXPECT_EQ(read, 4 + 5 + 2 + 2);
}

TEST(SampleDocuments, JobsHoldTheSheetsAndTheFilesThatStandBesideThem) {
  for (const char* name : {"demonstration_job.json", "motorcycle_job.json"}) {
    const auto job = readJob(sampleBytes(name), name);
    ASSERT_TRUE(bool(job)) << job.error().code;
    EXPECT_TRUE(job.value().invented);
    const bool car = job.value().kind == VehicleKind::Car;
    const std::string sheet = car ? "limits_car.json" : "limits_motorcycle.json";
    EXPECT_EQ(job.value().limits, readLimits(sampleBytes(sheet), sheet).value());
    EXPECT_EQ(job.value().items.size(), car ? 4u : 1u);
    for (const JobItem& item : job.value().items)
      for (const JobPhase& phase : item.phases)
        for (const JobRun& run : phase.runs)
          EXPECT_EQ(sha256Hex(sampleBytes(run.file)), run.sha256) << run.file;
  }
}

TEST(SampleDocuments, JobsPutDampersOnCornersThatTheVehicleHas) {
  for (const char* name : {"demonstration_job.json", "motorcycle_job.json"}) {
    const auto job = readJob(sampleBytes(name), name);
    ASSERT_TRUE(bool(job));
    const std::vector<std::string> corners = cornersOf(job.value().kind);
    for (const JobItem& item : job.value().items) {
      EXPECT_NE(std::find(corners.begin(), corners.end(), item.corner), corners.end());
      EXPECT_EQ(item.damper.position, item.corner);
    }
  }
}

}  // namespace
}  // namespace dampwright::samples
