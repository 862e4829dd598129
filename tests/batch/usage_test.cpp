// SPDX-License-Identifier: GPL-3.0-or-later
#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include "tests/batch/run_batch.h"

namespace dampwright {
namespace {

using testing::HasSubstr;
using testing::StartsWith;

TEST(Usage, WhatIsWrongEndsWith64) {
  const Folder folder;
  for (const char* arguments : {"",
                                "wobble run.csv",
                                "columns",
                                "columns a.csv b.csv",
                                "columns a.csv --wobble",
                                "measure a.csv --json",
                                "judge a.csv",
                                "sheet a.csv --limits l.json",
                                "measure a.csv --displacement-positive up",
                                "measure a.csv --rate 0",
                                "measure a.csv --header-row x"}) {
    const Ended ended = folder.batch(arguments);
    EXPECT_EQ(ended.status, 64) << arguments;
    EXPECT_THAT(ended.err, StartsWith("wrong-usage: ")) << arguments;
    EXPECT_EQ(ended.out, "") << arguments;
  }
}

TEST(Usage, HelpAndVersionAreAnsweredAnywhere) {
  const Folder folder;
  for (const char* arguments :
       {"--version", "judge --version", "columns missing.csv --version", "measure --version"}) {
    const Ended ended = folder.batch(arguments);
    EXPECT_EQ(ended.status, 0) << arguments << ended.err;
    EXPECT_EQ(ended.out, "dampwright-batch " DAMPWRIGHT_VERSION "\n") << arguments;
  }
  for (const char* arguments : {"--help", "judge --help", "columns missing.csv --help"}) {
    const Ended ended = folder.batch(arguments);
    EXPECT_EQ(ended.status, 0) << arguments << ended.err;
    EXPECT_THAT(ended.out, HasSubstr("dampwright-batch")) << arguments;
  }
  EXPECT_THAT(folder.batch("--help").out, HasSubstr("64 wrong usage"));
  EXPECT_THAT(folder.batch("judge --help").out, HasSubstr("--displacement-positive"));
}

TEST(Usage, HelpThatCannotBeWrittenIsSaid) {
  EXPECT_EQ(Folder().shell("$BATCH --help >/dev/full").status, 4);
}

}  // namespace
}  // namespace dampwright
