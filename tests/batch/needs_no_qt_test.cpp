// SPDX-License-Identifier: GPL-3.0-or-later
#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include "tests/batch/run_batch.h"

namespace dampwright {
namespace {

// The loader's list of libraries, those that the libraries need themselves with it.
TEST(BatchProgram, NeedsNoQtNorAnythingThatNeedsIt) {
  const Ended ended = Folder().shell("ldd $BATCH");
  ASSERT_EQ(ended.status, 0) << ended.err;
  EXPECT_THAT(ended.out, testing::HasSubstr("libstdc++"));
  for (const char* library : {"libQt", "libqcustomplot", "libX11", "libEGL", "libxcb"})
    EXPECT_THAT(ended.out, testing::Not(testing::HasSubstr(library)));
}

}  // namespace
}  // namespace dampwright
