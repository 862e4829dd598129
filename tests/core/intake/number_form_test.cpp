// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/number_form.h"

#include <gtest/gtest.h>

#include <clocale>

namespace dampwright {
namespace {

constexpr NumberForm point{'.', 0}, comma{',', 0}, pointGroups{',', '.'}, commaGroups{'.', ','};

TEST(ParseNumber, ReadsSignsExponentsAndBareMarks) {
  EXPECT_EQ(parseNumber("+14.287", point), 14.287);
  EXPECT_EQ(parseNumber("-1.53e4", point), -15300.0);
  EXPECT_EQ(parseNumber("1.53E+04", point), 15300.0);
  EXPECT_EQ(parseNumber("1.5D-03", point), 0.0015);
  EXPECT_EQ(parseNumber(".5", point), 0.5);
  EXPECT_EQ(parseNumber("5.", point), 5.0);
  EXPECT_EQ(parseNumber("\xE2\x88\x92"
                        "3,25",
                        comma),
            -3.25);
  EXPECT_EQ(parseNumber("- 3.5", point), -3.5);
}

TEST(ParseNumber, GroupsOfThreeOnlyAndOnlyWhereTheFormHasThem) {
  EXPECT_EQ(parseNumber("300,000,000.40", commaGroups), 300000000.40);
  EXPECT_EQ(parseNumber("1.234,5", pointGroups), 1234.5);
  EXPECT_EQ(parseNumber("12 345,5", NumberForm{',', ' '}), 12345.5);
  EXPECT_EQ(parseNumber("12\xC2\xA0"
                        "345,5",
                        NumberForm{',', ' '}),
            12345.5);
  EXPECT_EQ(parseNumber("12'345.5", NumberForm{'.', '\''}), 12345.5);
  EXPECT_EQ(parseNumber("0.000", pointGroups), 0.0);
}

TEST(ParseNumber, DoesNotKnowTheLocale) {
  const char* before = std::setlocale(LC_ALL, "de_DE.UTF-8");  // may not be installed
  EXPECT_EQ(parseNumber("1.5", point), 1.5);
  EXPECT_EQ(parseNumber("1,5", comma), 1.5);
  if (before != nullptr) std::setlocale(LC_ALL, "C");
}

TEST(ParseNumber, RefusesWhatIsNoNumberInTheForm) {
  for (const char* text : {"",    "-",       "abc",     "1.5.3",    "1,5",   "1e",  "1e+", "inf",
                           "nan", "0x1F",    "1e999",   "12N",      "e5",    "..5", "--5", "+-5",
                           "1 2", "1,234.5", "1.5e1.5", "infinity", "1_000", "٣"}) {
    EXPECT_EQ(parseNumber(text, point), std::nullopt) << text;
  }
  for (const char* text : {"1.5", "5.555", "1,5,3", "1.234,5"}) {
    EXPECT_EQ(parseNumber(text, comma), std::nullopt) << text;
  }
  for (const char* text :
       {"300,0,00.40", "30,0,0.406", "1,23", "0,123.5", ",123", "1,2345", "1234,567"}) {
    EXPECT_EQ(parseNumber(text, commaGroups), std::nullopt) << text;
  }
  EXPECT_EQ(parseNumber(std::string(100, '1'), point), std::nullopt);
}

TEST(LookAtNumber, SeesWhatProvesAMark) {
  EXPECT_EQ(lookAtNumber("1,5").decimal, ',');
  EXPECT_EQ(lookAtNumber("1,2345").decimal, ',');
  EXPECT_EQ(lookAtNumber("0,123").decimal, ',');
  EXPECT_EQ(lookAtNumber("1234,567").decimal, ',');
  EXPECT_EQ(lookAtNumber("1,234e5").decimal, ',');
  EXPECT_EQ(lookAtNumber("-0.123").decimal, '.');
  EXPECT_EQ(lookAtNumber("1,234,567").thousands, ',');
  EXPECT_EQ(lookAtNumber("1.234,5").decimal, ',');
  EXPECT_EQ(lookAtNumber("1.234,5").thousands, '.');
  EXPECT_EQ(lookAtNumber("1 234").thousands, ' ');
}

TEST(LookAtNumber, LeavesOpenWhatMayBeEither) {
  EXPECT_EQ(lookAtNumber("1,234").open, ',');
  EXPECT_EQ(lookAtNumber("-12.345").open, '.');
  EXPECT_EQ(lookAtNumber("0,000").open, ',');
  EXPECT_EQ(lookAtNumber("1,234").decimal, 0);
}

TEST(LookAtNumber, BrokenGroupsAreNoNumber) {
  EXPECT_FALSE(lookAtNumber("300,0,00.40").number);
  EXPECT_FALSE(lookAtNumber("1.2.3").number);
  EXPECT_FALSE(lookAtNumber("192.168.1.20").number);
  EXPECT_FALSE(lookAtNumber("12:00").number);
  EXPECT_FALSE(lookAtNumber("2020-01-01").number);
}

TEST(ProvenForm, TheMajorityOfACellsProofsWins) {
  FormVotes votes;
  for (const char* cell : {"5,5", "5,5", "5.5"}) votes.add(lookAtNumber(cell));
  EXPECT_EQ(provenForm(votes), comma);
  votes = {};
  votes.add(lookAtNumber("1,234"));
  EXPECT_EQ(provenForm(votes), std::nullopt);
  votes.add(lookAtNumber("1,234.5"));
  EXPECT_EQ(provenForm(votes), commaGroups);
}

TEST(IsMissing, KnowsTheUsualSignsOfNothing) {
  for (const char* text : {"", "NaN", "n/a", "-", "NULL", "#N/A"})
    EXPECT_TRUE(isMissing(text)) << text;
  for (const char* text : {"0", "x", "stop", "no value at all"})
    EXPECT_FALSE(isMissing(text)) << text;
}

}  // namespace
}  // namespace dampwright
