// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/samples/sample_set.h"

#include <gtest/gtest.h>

#include <filesystem>
#include <set>

#include "core/base/sha256.h"
#include "tests/samples/sample_folder.h"

namespace dampwright::samples {
namespace {

TEST(SampleRuns, OneOfThemIsMadeAgainByteForByte) {
  const SampleTruth truth = truthOf(motorcycleDampers().front(), motorcycle());
  ASSERT_EQ(truth.files.size(), 1u);
  EXPECT_EQ(sha256Hex(sampleBytes(truth.files.front().name)), sha256Hex(truth.files.front().bytes));
}

#ifndef __SANITIZE_ADDRESS__  // minutes there; the run above has been through the same code
TEST(SampleRuns, AreWhatTheScenarioMakesByteForByte) {
  std::set<std::string> names = {"make.sh"};
  for (const SampleFile& file : makeSamples()) {
    EXPECT_EQ(sha256Hex(sampleBytes(file.name)), sha256Hex(file.bytes)) << file.name;
    names.insert(file.name);
  }
  for (const auto& entry : std::filesystem::directory_iterator(sampleFolder()))
    EXPECT_TRUE(names.contains(entry.path().filename().string())) << entry.path();
}
#endif

TEST(SampleRuns, TakeLessThanTwentyFiveMegabytes) {
  std::uintmax_t bytes = 0;
  for (const auto& entry : std::filesystem::directory_iterator(sampleFolder()))
    bytes += entry.file_size();
  EXPECT_GT(bytes, 1'000'000u);
  EXPECT_LT(bytes, 25'000'000u);
}

}  // namespace
}  // namespace dampwright::samples
