// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/letters.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

TEST(Letters, BlanksAtBothEndsGoAlsoTheOnesThatDoNotBreak) {
  EXPECT_EQ(trimmed(" \t Load\xC2\xA0\r"), "Load");
  EXPECT_EQ(trimmed(" \xC2\xA0 "), "");
}

TEST(Letters, CapitalsWithAccentsBecomeSmall) {
  EXPECT_EQ(lowered("KOLBEN-DÄMPFER"), "kolben-dämpfer");
  EXPECT_EQ(lowered("×"), "×");  // U+00D7 stands between them and is no letter
  EXPECT_EQ(lowered("°C"), "°c");
}

TEST(Letters, RunsOfBlanksBecomeOne) {
  EXPECT_EQ(withSingleBlanks("  Lead  Actuator \t Force "), "Lead Actuator Force");
  EXPECT_EQ(withSingleBlanks(" \t "), "");
}

TEST(Letters, AStartHoldsOnlyWholeLetters) {
  EXPECT_EQ(startOf("Dämpfer", 2), "D");
  EXPECT_EQ(startOf("Dämpfer", 3), "Dä");
  EXPECT_EQ(startOf("D", 9), "D");
}

}  // namespace
}  // namespace dampwright
