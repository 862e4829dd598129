// SPDX-License-Identifier: GPL-3.0-or-later
#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include "core/records/documents.h"
#include "tests/batch/run_batch.h"

namespace dampwright {
namespace {

using testing::StartsWith;

class Output : public testing::Test {
 protected:
  void SetUp() override {
    folder.write("stored.json", writeMeasurement(storedMeasurement()));
    folder.write("limits.json", writeLimits(reboundLimits(500, 700)));
  }
  void expectNotWritten(const std::string& line) {
    const Ended ended = folder.shell(line);
    EXPECT_EQ(ended.status, 4) << line << ended.err;
    EXPECT_THAT(ended.err, StartsWith("output-not-written: ")) << line;
  }
  const std::string judge = "$BATCH judge stored.json --limits limits.json ";
  Folder folder;
};

TEST_F(Output, GoesToTheFileAndNotToStandardOutput) {
  const Ended ended = folder.shell(judge + "--out verdict.json");
  EXPECT_EQ(ended.status, 0) << ended.err;
  EXPECT_EQ(ended.out, "");
  EXPECT_TRUE(readVerdict(folder.read("verdict.json"), "verdict.json"));
  EXPECT_EQ(folder.entries(), 3);
}

TEST_F(Output, TakesThePlaceOfAnOlderFile) {
  folder.write("verdict.json", "old");
  EXPECT_EQ(folder.shell(judge + "--out verdict.json").status, 0);
  EXPECT_TRUE(readVerdict(folder.read("verdict.json"), "verdict.json"));
}

TEST_F(Output, AFullDiskIsSaidAndTheStatusIsNotTheVerdict) {
  expectNotWritten(judge + "--out /dev/full");
  expectNotWritten(judge + ">/dev/full");
  EXPECT_TRUE(std::filesystem::is_character_file("/dev/full"));
}

TEST_F(Output, AReaderThatWentAwayIsSaid) {
  expectNotWritten(judge + ">&-");
  const Ended ended =
      folder.shell("{ sleep 0.3; " + judge + "; echo $? >status; } | true; sleep 1; cat status");
  EXPECT_EQ(ended.out, "4\n");
}

TEST_F(Output, APlaceThatIsNoneIsSaidAndNothingIsLeftThere) {
  folder.shell("mkdir folder");
  expectNotWritten(judge + "--out missing/verdict.json");
  expectNotWritten(judge + "--out folder");
  EXPECT_EQ(folder.entries(), 3);
}

TEST_F(Output, AFileSizeLimitLeavesTheOlderFileWhole) {
  folder.write("verdict.json", "old");
  // the messages of the shell go into a file too, which the limit keeps empty
  EXPECT_EQ(folder.shell("(ulimit -f 0; trap '' XFSZ; " + judge + "--out verdict.json)").status, 4);
  EXPECT_EQ(folder.read("verdict.json"), "old");
  EXPECT_EQ(folder.entries(), 3);
}

}  // namespace
}  // namespace dampwright
