// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/split_row.h"

#include <gmock/gmock.h>

namespace dampwright {
namespace {

using testing::ElementsAre;

std::vector<std::string> texts(std::string_view row, char delimiter) {
  std::vector<std::string> list;
  for (const Cell& cell : splitRow(row, delimiter)) list.push_back(plainText(cell));
  return list;
}

TEST(SplitRow, CutsAtTheDelimiterAndTakesBlanksOff) {
  EXPECT_THAT(texts("1; 2 ;;4;", ';'), ElementsAre("1", "2", "", "4", ""));
  EXPECT_THAT(texts("1\t 2\t", '\t'), ElementsAre("1", "2", ""));
  EXPECT_THAT(texts("", ','), ElementsAre(""));
}

TEST(SplitRow, RunsOfBlanksAreOneDelimiter) {
  EXPECT_THAT(texts("   0.0  -2.9e-02\t 3 ", blanksDelimiter), ElementsAre("0.0", "-2.9e-02", "3"));
  EXPECT_THAT(texts("  ", blanksDelimiter), ElementsAre());
}

// RFC 4180, section 2, rules 5 to 7.
TEST(SplitRow, QuotedFieldsHoldDelimitersLineEndsAndDoubledQuotes) {
  EXPECT_THAT(texts("\"1,5\",\"say \"\"x\"\"\",b", ','), ElementsAre("1,5", "say \"x\"", "b"));
  EXPECT_THAT(texts("\"Force\n[N]\" ,2", ','), ElementsAre("Force [N]", "2"));
  EXPECT_THAT(texts("\"a b\" c", blanksDelimiter), ElementsAre("a b", "c"));
  EXPECT_TRUE(splitRow("\"1\",2", ',')[0].quoted);
  EXPECT_FALSE(splitRow("\"1\",2", ',')[1].quoted);
}

TEST(SplitRow, AQuoteThatDoesNotCloseIsAnOrdinaryLetter) {
  EXPECT_THAT(texts("\"a,b", ','), ElementsAre("\"a", "b"));
  EXPECT_THAT(texts("\"a\"x,b", ','), ElementsAre("\"a\"x", "b"));
  EXPECT_THAT(texts("Travel (\"),2\"", ','), ElementsAre("Travel (\")", "2\""));
}

TEST(SplitRow, DelimitersHaveNames) {
  EXPECT_EQ(delimiterName('\t'), "tab");
  EXPECT_EQ(delimiterName(blanksDelimiter), "blanks");
  EXPECT_EQ(delimiterName(';'), ";");
}

}  // namespace
}  // namespace dampwright
