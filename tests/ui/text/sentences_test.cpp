// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/text/sentences.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

TEST(Sentences, AnUnknownCodeStillSaysItsName) {
  EXPECT_EQ(sentenceText("no-such-code", {}).toStdString(), "no-such-code");
  EXPECT_EQ(hintText("no-such-code", {}).toStdString(), "");
}

TEST(Sentences, NoCodeIsNoSentence) { EXPECT_TRUE(sentenceText("", {}).isEmpty()); }

TEST(Sentences, AnErrorNamesFileRowAndColumn) {
  Error error;
  error.code = "no-such-code";
  error.place = {"run7.csv", 12, 3};
  EXPECT_EQ(sentenceText(error).toStdString(), "run7.csv, row 12, column 3: no-such-code");
  error.place = {"run7.csv", 0, 0};
  EXPECT_EQ(sentenceText(error).toStdString(), "run7.csv: no-such-code");
}

}  // namespace
}  // namespace dampwright
