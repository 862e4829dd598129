// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/load_file.h"

#include <gtest/gtest.h>
#include <sys/stat.h>
#include <unistd.h>

#include <atomic>
#include <fstream>
#include <thread>

namespace dampwright {
namespace {

namespace fs = std::filesystem;

class LoadFile : public testing::Test {
 protected:
  void SetUp() override {
    folder_ = fs::temp_directory_path() / ("dampwright_load_" + std::to_string(::getpid()));
    fs::create_directories(folder_);
  }
  void TearDown() override { fs::remove_all(folder_); }

  fs::path write(const std::string& name, const std::string& bytes) {
    std::ofstream(folder_ / name, std::ios::binary) << bytes;
    return folder_ / name;
  }

  std::string codeOf(const fs::path& path) {
    const auto bytes = loadFile(path);
    return bytes ? "none" : bytes.error().code;
  }

  fs::path folder_;
};

TEST_F(LoadFile, GivesTheBytesAsTheyAre) {
  std::string bytes("a\r\n\0b", 5);
  bytes.append(5'000'000, 'x');
  const auto loaded = loadFile(write("run.csv", bytes));
  ASSERT_TRUE(loaded);
  EXPECT_EQ(loaded.value(), bytes);
  EXPECT_EQ(loadFile(write("empty.csv", "")).value(), "");
}

TEST_F(LoadFile, ReadsWhatIsLongerThanItsSizeSays) {
  // Files of /proc say that they have no size at all: the same as one that grows while it is read.
  const auto loaded = loadFile("/proc/self/status");
  ASSERT_TRUE(loaded);
  EXPECT_GT(loaded.value().size(), 100u);
}

TEST_F(LoadFile, AFileThatShrinksAndGrowsMeanwhileGivesWhatWasThere) {
  const fs::path path = write("growing.csv", std::string(400'000, '7'));
  std::atomic<bool> stop = false;
  std::thread writer([&] {
    for (int i = 0; !stop; ++i) {
      fs::resize_file(path, i % 2 == 0 ? 1000 : 0);
      std::ofstream(path, std::ios::binary | std::ios::app) << std::string(400'000, '7');
    }
  });
  for (int i = 0; i < 200; ++i) {
    const auto loaded = loadFile(path);
    ASSERT_TRUE(loaded) << loaded.error().code;
    EXPECT_EQ(loaded.value().find_first_not_of('7'), std::string::npos);
    EXPECT_LE(loaded.value().size(), 401'000u);
  }
  stop = true;
  writer.join();
}

TEST_F(LoadFile, SaysWhatIsWrongAndWhere) {
  EXPECT_EQ(codeOf(folder_ / "nothing.csv"), "file-not-found");
  EXPECT_EQ(codeOf(write("file", "1") / "below.csv"), "file-not-found");
  EXPECT_EQ(codeOf(folder_), "file-is-folder");
  EXPECT_EQ(codeOf("/dev/zero"), "file-is-device");
  const fs::path pipe = folder_ / "pipe";
  ASSERT_EQ(::mkfifo(pipe.c_str(), 0600), 0);
  EXPECT_EQ(codeOf(pipe), "file-is-device");
  EXPECT_EQ(loadFile(folder_ / "nothing.csv").error().place.file, "nothing.csv");
}

TEST_F(LoadFile, NeedsPermission) {
  const fs::path path = write("secret.csv", "1");
  fs::permissions(path, fs::perms::none);
  const bool root = ::geteuid() == 0;  // root may read everything: ask as nobody
  if (root) {
    ASSERT_EQ(::seteuid(65534), 0);
  }
  const std::string code = codeOf(path);
  if (root) {
    ASSERT_EQ(::seteuid(0), 0);
  }
  EXPECT_EQ(code, "file-no-permission");
}

TEST_F(LoadFile, RefusesMoreThanTwoGigabytesUnread) {
  const fs::path path = write("huge.csv", "");
  fs::resize_file(path, static_cast<std::uintmax_t>(largestFile) + 1);  // takes no room on the disk
  EXPECT_EQ(codeOf(path), "file-too-large");
}

TEST_F(LoadFile, RefusesZerosByTheirBeginning) {
  const fs::path path = write("zeros.csv", "");
  fs::resize_file(path, static_cast<std::uintmax_t>(largestFile));  // takes no room on the disk
  EXPECT_EQ(codeOf(path), "file-is-binary");
}

}  // namespace
}  // namespace dampwright
