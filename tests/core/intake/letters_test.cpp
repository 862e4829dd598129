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

TEST(Letters, FoldedWordsHaveNoAccentsCapitalsOrWideForms) {
  EXPECT_EQ(folded("Déplacement D'ESSAI"), "deplacement d'essai");
  EXPECT_EQ(folded("De\xCC\x81placement"), "deplacement");  // the accent as a letter of its own
  EXPECT_EQ(folded("Größe Œuf"), "grosse oeuf");
  EXPECT_EQ(folded("ＦＯＲＣＥ（Ｎ）"), "force(n)");
  EXPECT_EQ(folded("㎜ ℃ ㎧ ºC"), "mm °c m/s °c");
  EXPECT_EQ(folded("ｽﾄﾛｰｸ ﾛｰﾄﾞ ﾎﾟ"), "ストローク ロード ポ");
  EXPECT_EQ(folded("変位"), "変位");
}

TEST(Letters, ALetterIsTakenApartAndPutTogether) {
  for (const char* text : {"a", "ä", "変", "\xF0\x9F\x98\x80"}) {
    const Letter letter = letterAt(text, 0);
    EXPECT_EQ(letter.bytes, std::string_view(text).size());
    EXPECT_EQ(withLetter("", letter.point), text);
  }
  EXPECT_EQ(letterAt("\xE5\xA4", 0).bytes, 3u);  // cut short: no byte beyond the end is read
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
