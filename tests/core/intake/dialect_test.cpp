// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/dialect.h"

#include <gmock/gmock.h>

#include <string>

namespace dampwright {
namespace {

using testing::ElementsAre;

Result<Dialect> dialectOf(const std::string& text, const DialectOptions& options = {}) {
  static std::string kept;  // the sample looks into it
  kept = text;
  return findDialect(sampleLines(kept, '\n').value(), options);
}

struct Row {
  std::string text;
  char delimiter, decimal;
};

TEST(Dialect, DelimiterAndDecimalMarkOfEveryForm) {
  for (const Row& row : std::initializer_list<Row>{{"0.5,1.25,-3.0", ',', '.'},
                                                   {"0.5;1.25;-3.0", ';', '.'},
                                                   {"0,5;1,25;-3,0", ';', ','},
                                                   {"0.5\t1.25\t-3.0", '\t', '.'},
                                                   {"0,5\t1,25\t-3,0", '\t', ','},
                                                   {"0.5|1.25|-3.0", '|', '.'},
                                                   {"0,5|1,25|-3,0", '|', ','},
                                                   {"  0.5   1.25  -3.0", ' ', '.'},
                                                   {"0,5 1,25 -3,0", ' ', ','},
                                                   {"0.5, 1.25, -3.0", ',', '.'},
                                                   {"0,5; 1,25; -3,0", ';', ','},
                                                   {"\"0,5\",\"1,25\",\"-3,0\"", ',', ','},
                                                   {"1.234,5;2.345,5;7,0", ';', ','},
                                                   {"1,234.5;2,345.5;7.0", ';', '.'},
                                                   {"1e-3,2e+4,3E5", ',', '.'}}) {
    const auto dialect = dialectOf(row.text + "\n" + row.text + "\n" + row.text + "\n");
    ASSERT_TRUE(dialect) << row.text;
    EXPECT_EQ(dialect.value().delimiter, row.delimiter) << row.text;
    EXPECT_EQ(dialect.value().decimal, row.decimal) << row.text;
    EXPECT_THAT(dialect.value().numeric, ElementsAre(1, 1, 1)) << row.text;
    EXPECT_THAT(dialect.value().open, ElementsAre()) << row.text;
  }
}

TEST(Dialect, ColumnsMayDifferInTheirDecimalMark) {
  const auto dialect = dialectOf("1,1;1.1\n0,25;0.25\n");
  ASSERT_TRUE(dialect);
  EXPECT_THAT(dialect.value().forms, ElementsAre(NumberForm{',', 0}, NumberForm{'.', 0}));
}

TEST(Dialect, OneCommaBeforeThreeDigitsEverywhereIsAsked) {
  const auto dialect = dialectOf("1,234;2,345\n1,235;2,346\n");
  ASSERT_TRUE(dialect);
  EXPECT_THAT(dialect.value().open, ElementsAre(0u, 1u));
}

TEST(Dialect, AnotherColumnSettlesIt) {
  const auto comma = dialectOf("1,234;0,5\n1,235;0,6\n");
  ASSERT_TRUE(comma);
  EXPECT_TRUE(comma.value().open.empty());
  EXPECT_EQ(comma.value().forms[0], (NumberForm{',', 0}));
  const auto point = dialectOf("1,234;0.5\n1,235;0.6\n");
  ASSERT_TRUE(point);
  EXPECT_EQ(point.value().forms[0], (NumberForm{'.', ','}));
  EXPECT_THAT(point.value().settledByOthers, ElementsAre(0u));
}

TEST(Dialect, AnOptionSettlesIt) {
  DialectOptions options;
  options.decimal = ',';
  const auto comma = dialectOf("1,234;2,345\n1,235;2,346\n", options);
  ASSERT_TRUE(comma);
  EXPECT_TRUE(comma.value().open.empty());
  EXPECT_EQ(comma.value().forms[0], (NumberForm{',', 0}));
  options.decimal = '.';
  EXPECT_EQ(dialectOf("1,234;2,345\n1,235;2,346\n", options).value().forms[0],
            (NumberForm{'.', ','}));
}

TEST(Dialect, ThreeDecimalsBehindAPointAreDecimals) {
  const auto dialect = dialectOf("1.234;2.345\n1.235;2.346\n");
  ASSERT_TRUE(dialect);
  EXPECT_TRUE(dialect.value().open.empty());
  EXPECT_EQ(dialect.value().forms[0], (NumberForm{'.', 0}));
}

TEST(Dialect, PointsThatGroupOneColumnAreDecimalsInAnother) {
  const auto dialect = dialectOf("0.000;3.823\n901.000;3.821\n1.002.000;3.823\n");
  ASSERT_TRUE(dialect);
  EXPECT_THAT(dialect.value().forms, ElementsAre(NumberForm{',', '.'}, NumberForm{'.', 0}));
}

TEST(Dialect, TextColumnsAreNoNumbers) {
  const auto dialect = dialectOf("1;2.5;good\n2;3.5;good, mostly\n");
  ASSERT_TRUE(dialect);
  EXPECT_EQ(dialect.value().delimiter, ';');
  EXPECT_THAT(dialect.value().numeric, ElementsAre(1, 1, 0));
}

TEST(Dialect, ADataRowHasNumbersWhereNumbersBelong) {
  const auto dialect = dialectOf("1;2.5;good\n2;3.5;good\n").value();
  const auto isData = [&](std::string_view row) { return isDataRow(splitRow(row, ';'), dialect); };
  EXPECT_TRUE(isData("3;4,5;x"));
  EXPECT_TRUE(isData("3;;x"));
  EXPECT_TRUE(isData("3;4.5;x;"));
  EXPECT_FALSE(isData(";;x"));
  EXPECT_FALSE(isData("Time;Load;Note"));
  EXPECT_FALSE(isData("3;4.5"));
  EXPECT_FALSE(isData("3;4.5;x;6"));
}

// What has no dialect.

std::string codeOf(const std::string& text) {
  const auto dialect = dialectOf(text);
  return dialect ? "none" : dialect.error().code;
}

TEST(Dialect, ProseIsNoTable) {
  EXPECT_EQ(codeOf("The damper was tested on 5 May.\nIt passed, with 3 remarks, on bench 2.\n"),
            "no-table");
  EXPECT_EQ(codeOf("Name,Place\nA,B\nC,D\n"), "no-table");
  EXPECT_EQ(codeOf(""), "no-table");
  EXPECT_EQ(codeOf("\n\n# only a comment\n"), "no-table");
}

TEST(Dialect, OneColumnIsNoRun) {
  EXPECT_EQ(codeOf("1.5\n2.5\n3.5\n"), "one-column");
  EXPECT_EQ(codeOf("a;1.5;x\nb;2.5;x\n"), "one-column");
}

TEST(Dialect, TooManyColumnsAreRefused) {
  std::string row = "1";
  for (int i = 0; i < 1000; ++i) row += ",1";
  EXPECT_EQ(codeOf(row + "\n" + row + "\n"), "too-many-columns");
}

}  // namespace
}  // namespace dampwright
