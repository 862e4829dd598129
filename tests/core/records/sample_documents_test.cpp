// SPDX-License-Identifier: GPL-3.0-or-later
// The documents of sample_runs are read as a user would read them, and come back equal.
#include <gtest/gtest.h>

#include <filesystem>
#include <fstream>
#include <iterator>

#include "core/records/documents.h"
#include "core/words/words.h"

namespace dampwright {
namespace {

namespace fs = std::filesystem;

template <class T>
void expectRoundTrip(const std::string& bytes,
                     const std::string& name,
                     Result<T> (*read)(std::string_view, std::string_view),
                     std::string (*write)(const T&)) {
  const auto value = read(bytes, name);
  ASSERT_TRUE(value) << englishLine(value.error());
  const auto again = read(write(value.value()), name);
  ASSERT_TRUE(again) << englishLine(again.error());
  EXPECT_EQ(again.value(), value.value()) << name;
}

TEST(SampleDocuments, AllOfThemAreReadAndComeBackEqual) {
  int read = 0;
  for (const auto& entry :
       fs::directory_iterator(fs::path(DAMPWRIGHT_SOURCE_DIR) / "sample_runs")) {
    const std::string name = entry.path().filename().string();
    std::ifstream stream(entry.path(), std::ios::binary);
    const std::string bytes{std::istreambuf_iterator<char>(stream), {}};
    ++read;
    if (name.starts_with("rig_")) {
      expectRoundTrip(bytes, name, readRig, writeRig);
    } else if (name.starts_with("damper_")) {
      expectRoundTrip(bytes, name, readDamper, writeDamper);
    } else if (name.starts_with("limits_")) {
      expectRoundTrip(bytes, name, readLimits, writeLimits);
    } else if (name.ends_with("_job.json")) {
      expectRoundTrip(bytes, name, readJob, writeJob);
    } else {
      --read;
    }
  }
  EXPECT_GE(read, 13) << "four benches, five dampers, two limit sheets, two jobs";
}

}  // namespace
}  // namespace dampwright
