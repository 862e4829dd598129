// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/find_table.h"

#include <gmock/gmock.h>

#include <string>

namespace dampwright {
namespace {

using testing::ElementsAre;
using testing::Pair;

Result<Table> tableOf(const std::string& text, std::optional<std::int64_t> headerRow = {}) {
  static std::string kept;  // the sample looks into it
  kept = text;
  const auto sample = sampleLines(kept, '\n').value();
  const auto dialect = findDialect(sample, {});
  if (!dialect) return dialect.error();
  return findTable(kept, sample, dialect.value(), headerRow);
}

const std::string data = "0.0;1.5;2\n0.1;1.6;3\n0.2;1.7;4\n0.3;1.8;5\n";

TEST(FindTable, HeaderRightAboveTheData) {
  const auto table = tableOf("Time;Travel (mm);Load (N)\n" + data);
  ASSERT_TRUE(table);
  EXPECT_THAT(table.value().headerRows, ElementsAre(1));
  EXPECT_EQ(table.value().firstDataRow, 2);
  EXPECT_THAT(
      table.value().columns,
      ElementsAre(NameAndUnit{"Time", ""}, NameAndUnit{"Travel", "mm"}, NameAndUnit{"Load", "N"}));
}

TEST(FindTable, UnitRowBelowTheHeader) {
  for (const char* units : {"s;mm;N\n", "[s];[mm];[N]\n", "(s);(mm);(N)\n"}) {
    const auto table = tableOf(std::string("Time;Travel;Load\n") + units + data);
    ASSERT_TRUE(table);
    EXPECT_EQ(table.value().unitRow, 2) << units;
    EXPECT_EQ(table.value().columns[1], (NameAndUnit{"Travel", "mm"})) << units;
  }
}

TEST(FindTable, PreambleBlankLinesAndCommentsAbove) {
  const auto table =
      tableOf("Serial;QD-1\nRate: 1000 Hz\n# made by hand\n\nTime;Travel;Load\n\n" + data);
  ASSERT_TRUE(table);
  EXPECT_THAT(table.value().headerRows, ElementsAre(5));
  EXPECT_EQ(table.value().firstDataRow, 7);
  EXPECT_THAT(
      table.value().metadata,
      ElementsAre(Pair("Serial", "QD-1"), Pair("Rate", "1000 Hz"), Pair("line 3", "made by hand")));
}

TEST(FindTable, PreambleLinesOfAsManyFieldsAreNoHeader) {
  const auto table =
      tableOf("\"Scale = \";0.1;2\n\"Inverted = \";\"NO\";\"NO\"\nTime;Travel;Load\n" + data);
  ASSERT_TRUE(table);
  EXPECT_THAT(table.value().headerRows, ElementsAre(3));
  EXPECT_EQ(table.value().firstDataRow, 4);
  EXPECT_THAT(table.value().metadata,
              ElementsAre(Pair("Scale", "0.1; 2"), Pair("Inverted", "NO; NO")));
}

TEST(FindTable, AHeaderBehindACommentMark) {
  const auto table = tableOf("# Time;Travel;Load\n" + data);
  ASSERT_TRUE(table);
  EXPECT_THAT(table.value().headerRows, ElementsAre(1));
  EXPECT_EQ(table.value().columns[0].name, "Time");
}

TEST(FindTable, WhatIsMissingInTheHeaderStandsInTheRowAbove) {
  const auto table = tableOf("Time;Damper;\n;Travel;Load\n" + data);
  ASSERT_TRUE(table);
  EXPECT_THAT(table.value().headerRows, ElementsAre(1, 2));
  EXPECT_EQ(table.value().columns[0].name, "Time");
  EXPECT_EQ(table.value().columns[1].name, "Travel");
}

TEST(FindTable, NamesWithBlanksWhereBlanksPartTheColumns) {
  const std::string blanks = "0.0 1.5 2\n0.1 1.6 3\n0.2 1.7 4\n";
  for (const char* header : {"Test time (s)  Damper travel (mm)  Load (N)\n",
                             "Time (s) Travel (mm) Load (N)\n",
                             "Time Travel Load\n"}) {
    const auto table = tableOf(header + blanks);
    ASSERT_TRUE(table);
    ASSERT_EQ(table.value().columns.size(), 3u);
    EXPECT_TRUE(table.value().columns[2].name == "Load") << header;
  }
}

TEST(FindTable, DelimitersAtTheEndMakeNoColumn) {
  const auto table = tableOf("Time;Travel;Load;\n0;1;2;\n1;2;3;\n2;3;4;\n");
  ASSERT_TRUE(table);
  EXPECT_EQ(table.value().columns.size(), 3u);
}

TEST(FindTable, AHeaderMayBeShorterThanTheRows) {
  const auto table = tableOf("Time;Travel\n" + data);
  ASSERT_TRUE(table);
  EXPECT_THAT(table.value().columns,
              ElementsAre(NameAndUnit{"Time", ""}, NameAndUnit{"Travel", ""}, NameAndUnit{"", ""}));
}

TEST(FindTable, WithoutHeaderColumnsHaveNoNames) {
  const auto table = tableOf(data);
  ASSERT_TRUE(table);
  EXPECT_FALSE(table.value().named());
  EXPECT_EQ(table.value().firstDataRow, 1);
  EXPECT_EQ(table.value().columns.size(), 3u);
}

TEST(FindTable, TheHeaderMayBeGiven) {
  const auto table = tableOf("A;B;C\nTime;Travel;Load\n" + data, 1);
  ASSERT_TRUE(table);
  EXPECT_THAT(table.value().headerRows, ElementsAre(1));
  EXPECT_EQ(table.value().columns[0].name, "A");
  const auto beyond = tableOf(data, 99);
  ASSERT_FALSE(beyond);
  EXPECT_EQ(beyond.error().code, "header-row-not-found");
  EXPECT_EQ(beyond.error().place.row, 99);
}

}  // namespace
}  // namespace dampwright
