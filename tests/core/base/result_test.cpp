// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/base/result.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

TEST(Result, HoldsAValueOrAnErrorAndSaysWhich) {
  const Result<int> good = 7;
  const Result<int> bad = Error{"file-empty", {}, {"a.csv", 3, 0}};
  EXPECT_TRUE(good);
  EXPECT_EQ(good.value(), 7);
  EXPECT_FALSE(bad);
  EXPECT_EQ(bad.error().code, "file-empty");
  EXPECT_EQ(bad.error().place.row, 3);
}

TEST(ResultDeathTest, AskingAnErrorForItsValueIsABrokenPromise) {
  const Result<int> bad = Error{"file-empty", {}, {}};
  EXPECT_DEATH((void)bad.value(), "broken promise at .*result.h");
}

}  // namespace
}  // namespace dampwright
