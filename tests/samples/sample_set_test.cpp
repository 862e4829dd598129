// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/samples/sample_set.h"

#include <gtest/gtest.h>

#include <filesystem>
#include <fstream>
#include <set>
#include <sstream>

#include "core/base/sha256.h"

namespace dampwright::samples {
namespace {

namespace fs = std::filesystem;
const fs::path folder = fs::path(DAMPWRIGHT_SOURCE_DIR) / "sample_runs";

std::string bytesOf(const fs::path& file) {
  std::ostringstream bytes;
  bytes << std::ifstream(file, std::ios::binary).rdbuf();
  return bytes.str();
}

TEST(SampleRuns, AreWhatTheScenarioMakesByteForByte) {
  std::set<std::string> names = {"make.sh"};
  for (const SampleFile& file : makeSamples()) {
    EXPECT_EQ(sha256Hex(bytesOf(folder / file.name)), sha256Hex(file.bytes)) << file.name;
    names.insert(file.name);
  }
  for (const auto& entry : fs::directory_iterator(folder))
    EXPECT_TRUE(names.contains(entry.path().filename().string())) << entry.path();
}

TEST(SampleRuns, TakeLessThanTwentyFiveMegabytes) {
  std::uintmax_t bytes = 0;
  for (const auto& entry : fs::directory_iterator(folder)) bytes += entry.file_size();
  EXPECT_GT(bytes, 1'000'000u);
  EXPECT_LT(bytes, 25'000'000u);
}

}  // namespace
}  // namespace dampwright::samples
