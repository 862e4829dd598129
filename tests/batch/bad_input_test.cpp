// SPDX-License-Identifier: GPL-3.0-or-later
// What can't be used ends with 3 and one line: code, file, what is so, what to do.
#include <gmock/gmock.h>
#include <gtest/gtest.h>
#include <unistd.h>

#include <algorithm>

#include "core/records/documents.h"
#include "tests/batch/run_batch.h"

namespace dampwright {
namespace {

using testing::HasSubstr;
using testing::StartsWith;

class BadInput : public testing::Test {
 protected:
  void expectRefused(const std::string& arguments, const std::string& code) {
    const Ended ended = folder.batch(arguments);
    EXPECT_EQ(ended.status, 3) << arguments << ended.err;
    EXPECT_THAT(ended.err, StartsWith(code + ": ")) << arguments;
    EXPECT_EQ(std::count(ended.err.begin(), ended.err.end(), '\n'), 1) << ended.err;
    EXPECT_EQ(ended.out, "") << arguments;
  }
  void expectFileRefused(const std::string& name, const std::string& code) {
    for (const char* verb : {"columns ", "measure "}) {
      expectRefused(verb + name, code);
      EXPECT_THAT(folder.batch(verb + name).err, HasSubstr(": " + name)) << name;
    }
  }
  Folder folder;
};

TEST_F(BadInput, WhatIsNoRunIsNamed) {
  folder.write("empty.csv", "");
  folder.write("letter.txt", "Dear customer,\nthe dampers are ready.\nYours, the workshop\n");
  folder.write("picture.csv", std::string("\x89PNG\r\n\x1a\n\0\0\0\rIHDR", 16));
  folder.write("one.csv", "Force [N]\n1\n2\n3\n4\n");
  expectFileRefused("empty.csv", "file-empty");
  expectFileRefused("letter.txt", "no-table");
  expectFileRefused("picture.csv", "file-is-picture");
  expectFileRefused("one.csv", "one-column");
}

TEST_F(BadInput, WhatIsNoFileIsNamed) {
  folder.shell("mkdir folder");
  expectFileRefused("folder", "file-is-folder");
  expectFileRefused("missing.csv", "file-not-found");
}

TEST_F(BadInput, AFileWithoutPermissionIsNamed) {
  folder.write("closed.csv", linearDamperRun(2000));
  folder.shell("chmod 000 closed.csv && chmod 755 .");
  const std::string other = ::geteuid() == 0 ? "setpriv --reuid 65534 --clear-groups " : "";
  const Ended ended = folder.shell(other + "$BATCH columns closed.csv");
  if (ended.status == 126 || ended.status == 127)
    GTEST_SKIP() << "another user can't start the program here: " << ended.err;
  EXPECT_EQ(ended.status, 3);
  EXPECT_THAT(ended.err, StartsWith("file-no-permission: closed.csv: "));
}

TEST_F(BadInput, TwoGigabytesOfZerosAreNoRun) {
  ASSERT_EQ(folder.shell("truncate -s 2G zeros.csv").status, 0);
  expectRefused("columns zeros.csv", "file-is-binary");
  ASSERT_EQ(folder.shell("truncate -s 2147483649 more.csv").status, 0);
  expectRefused("columns more.csv", "file-too-large");
}

TEST_F(BadInput, LessThanOneCycleIsNamed) {
  std::string text = "Time [s],Displacement [mm],Force [N]\n";
  for (int i = 0; i < 200; ++i)
    text += std::to_string(i * 0.01) + "," + std::to_string(i * 0.1) + ",10\n";
  folder.write("half.csv", text);
  expectRefused("measure half.csv --displacement-positive compression", "no-full-cycle");
}

TEST_F(BadInput, ARunGivenTwiceIsNamed) {
  folder.write("a.csv", linearDamperRun(2000));
  folder.write("b.csv", linearDamperRun(2000));
  expectRefused("measure a.csv b.csv --displacement-positive compression", "run-given-twice");
}

TEST_F(BadInput, AnOpenPointThatStopsNamesItsOption) {
  folder.write("raw.csv", "1;2\n2;3\n3;4\n4;5\n3;4\n2;3\n1;2\n2;3\n");
  const Ended ended = folder.batch("measure raw.csv");
  EXPECT_EQ(ended.status, 3);
  EXPECT_THAT(ended.err, StartsWith("open-points: raw.csv: "));
  EXPECT_THAT(ended.err, HasSubstr("--"));
}

TEST_F(BadInput, AWrongDocumentIsNamedWithItsLine) {
  folder.write("run.csv", linearDamperRun(2000));
  folder.write("stored.json", writeMeasurement(storedMeasurement()));
  folder.write("limits.json", writeLimits(reboundLimits(1, 2)));
  folder.write("broken.json",
               "{\n\"document\": \"dampwright limits\",\n\"version\": 1,\n\"checks\": [");
  folder.write("typo.json",
               "{\"document\": \"dampwright limits\", \"version\": 1,\n\"cheks\": []}");
  folder.write("newer.json", "{\"document\": \"dampwright limits\", \"version\": 2}");
  folder.write("other.json", "{\"document\": \"dampwright wish\", \"version\": 1}");
  expectRefused("judge stored.json --limits broken.json", "document-not-json");
  expectRefused("judge stored.json --limits typo.json", "document-unknown-key");
  expectRefused("judge stored.json --limits newer.json", "document-from-newer-program");
  expectRefused("judge stored.json --limits stored.json", "document-of-another-kind");
  expectRefused("judge other.json --limits limits.json", "document-of-another-kind");
  expectRefused("judge stored.json --limits missing.json", "file-not-found");
  expectRefused("measure run.csv --rig limits.json", "document-of-another-kind");
  expectRefused("measure run.csv --card run.csv", "document-not-json");
  EXPECT_THAT(folder.batch("judge stored.json --limits typo.json").err,
              HasSubstr("typo.json, row 2: "));
}

TEST_F(BadInput, ANameThatIsNoColumnIsNamed) {
  folder.write("run.csv", linearDamperRun(2000));
  expectRefused("columns run.csv --force Wobble", "column-not-found");
}

}  // namespace
}  // namespace dampwright
