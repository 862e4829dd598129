// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/read_columns.h"

#include <gmock/gmock.h>

#include <cmath>
#include <string>

#include "core/intake/layout.h"
#include "tests/core/intake/made_text.h"

namespace dampwright {
namespace {

using testing::ElementsAre;
using testing::IsNan;

Columns columnsOf(const std::string& text) {
  const auto layout = findLayout(text, {}).value();
  return readColumns(layout.decoded.text(), layout.lineEnd.letter, layout.dialect, layout.table, {})
      .value();
}

const std::string head = "t;x;F\n0.0;1.5;2\n0.1;1.6;3\n0.2;1.7;4\n";

TEST(ReadColumns, NumbersOfEveryRow) {
  const Columns columns = columnsOf(head);
  EXPECT_EQ(columns.rows, 3);
  EXPECT_THAT(columns.values[1], ElementsAre(1.5, 1.6, 1.7));
  EXPECT_TRUE(columns.remarks.empty());
}

TEST(ReadColumns, MissingCellsAreAbsentAndCounted) {
  const Columns columns = columnsOf(head + "0.3;;5\n0.4;NaN;6\n0.5;2.0;7\n");
  EXPECT_EQ(columns.rows, 6);
  EXPECT_THAT(columns.values[1], ElementsAre(1.5, 1.6, 1.7, IsNan(), IsNan(), 2.0));
  const Remark* remark = remarkOf(columns.remarks, "missing-values");
  ASSERT_NE(remark, nullptr);
  EXPECT_EQ(remark->count, 2);
  EXPECT_EQ(remark->firstRow, 5);
}

TEST(ReadColumns, TextInAColumnOfNumbersIsAbsentAndShown) {
  const Columns columns = columnsOf(head + "0.3;over;5\n0.4;1.9;6\n");
  EXPECT_THAT(columns.values[1], ElementsAre(1.5, 1.6, 1.7, IsNan(), 1.9));
  const Remark* remark = remarkOf(columns.remarks, "unreadable-cells");
  ASSERT_NE(remark, nullptr);
  EXPECT_EQ(std::get<std::string>(remark->values[0].value), "over");
  EXPECT_EQ(remark->firstRow, 5);
}

TEST(ReadColumns, InfinityAndNumbersTooLargeAreNoNumbers) {
  const Columns columns = columnsOf(head + "0.3;inf;5\n0.4;1e999;6\n0.5;1;7\n");
  EXPECT_THAT(columns.values[1], ElementsAre(1.5, 1.6, 1.7, IsNan(), IsNan(), 1.0));
}

TEST(ReadColumns, RowsOfAnotherLengthStayInPlaceAndAreCounted) {
  const Columns columns = columnsOf(head + "0.3;9\n0.4;9;9;9\n0.5;1.9;6\n");
  EXPECT_EQ(columns.rows, 6);
  EXPECT_THAT(columns.values[0], ElementsAre(0.0, 0.1, 0.2, 0.3, IsNan(), 0.5));
  EXPECT_THAT(columns.values[2], ElementsAre(2, 3, 4, IsNan(), IsNan(), 6));
  EXPECT_EQ(remarkOf(columns.remarks, "ragged-rows")->count, 2);
  EXPECT_EQ(remarkOf(columns.remarks, "ragged-rows")->firstRow, 5);
}

TEST(ReadColumns, TextLinesAmongTheDataAreKeptAsMarksOfSections) {
  const Columns columns = columnsOf(head + "Step 2 of 3\nt;x;F\n0.3;1.9;6\n");
  EXPECT_EQ(columns.rows, 4);
  EXPECT_EQ(remarkOf(columns.remarks, "section-lines")->count, 2);
  EXPECT_EQ(remarkOf(columns.remarks, "section-lines")->firstRow, 5);
  ASSERT_EQ(columns.sections.size(), 2u);
  EXPECT_EQ(columns.sections[0].text, "Step 2 of 3");
  EXPECT_EQ(columns.sections[1].line, 6);
  EXPECT_EQ(columns.lineOf(3), 7);
  EXPECT_EQ(columns.lineOf(0), 2);
}

TEST(ReadColumns, SectionsWithNumbersAreNoRowsOfData) {
  const Columns columns = columnsOf(head + "Step;2\nSpeed 100 mm/s;100;\n0.3;1.9;6\n");
  EXPECT_EQ(columns.rows, 4);
  EXPECT_EQ(columns.sections.size(), 2u);
}

TEST(ReadColumns, RowsOfMissingValuesOnlyAreLeftOutAndCounted) {
  const Columns columns = columnsOf(head + "-;-;-\n0.3;1.9;6\n");
  EXPECT_EQ(columns.rows, 4);
  EXPECT_EQ(remarkOf(columns.remarks, "bad-rows")->count, 1);
}

TEST(ReadColumns, BlankLinesAreNoRowsAndCommentsAreMarks) {
  const Columns columns = columnsOf(head + "\n# pause\n\n0.3;1.9;6\n# end\n\n");
  EXPECT_EQ(columns.rows, 4);
  ASSERT_EQ(columns.sections.size(), 1u);
  EXPECT_EQ(columns.sections[0].text, "# pause");
}

TEST(ReadColumns, RowsOfDelimitersAmongTheDataCountAndBelowItDoNot) {
  const Columns columns = columnsOf(head + ";;\n0.3;1.9;6\n;;\n;;\n");
  EXPECT_EQ(columns.rows, 5);
  EXPECT_EQ(remarkOf(columns.remarks, "blank-rows")->count, 1);
}

TEST(ReadColumns, FootersAreTrailingText) {
  const Columns columns = columnsOf(head + "Max;1.7;4\nEnd of file\n");
  EXPECT_EQ(columns.rows, 3);
  EXPECT_EQ(remarkOf(columns.remarks, "trailing-text")->firstRow, 5);
  EXPECT_FALSE(says(columns.remarks, "bad-rows"));
}

TEST(ReadColumns, ALastRowCutShortIsLeftOut) {
  for (const char* last : {"0.3;1", "0.3;", "0.3;1.8;-", "0.3;1.8;1e"}) {
    const Columns columns = columnsOf(head + last);
    EXPECT_EQ(columns.rows, 3) << last;
    EXPECT_TRUE(says(columns.remarks, "truncated-last-row")) << last;
  }
  EXPECT_EQ(columnsOf(head + "0.3;1.8;5").rows, 4);  // whole, only its line end is missing
}

TEST(ReadColumns, ALastNumberCutShortIsSeenByItsDecimals) {
  std::string text = "t;x;F\n";
  for (int i = 0; i < 30; ++i) text += std::to_string(i) + ";1.5;2.125\n";
  EXPECT_EQ(columnsOf(text + "30;1.5;2.125").rows, 31);
  const Columns cut = columnsOf(text + "30;1.5;2.1");
  EXPECT_EQ(cut.rows, 30);
  EXPECT_TRUE(says(cut.remarks, "truncated-last-row"));
  EXPECT_EQ(columnsOf(text + "30;1.5;2.1\n").rows, 31);  // its line end says that it is whole
}

TEST(ReadColumns, AllFormsOfNumbersAreReadTheSame) {
  const auto first = [](const std::string& text) { return columnsOf(text).values[0]; };
  const std::vector<double> expected = {1234.5, -0.25, 2000};
  EXPECT_EQ(first("1234.5,1\n-0.25,2\n+2e3,3\n"), expected);
  EXPECT_EQ(first("1234,5;1\n-0,25;2\n+2e3;3\n"), expected);
  EXPECT_EQ(first("1.234,5;1\n-0,25;2\n2.000;3\n"), expected);
  EXPECT_EQ(first("\"1,234.5\",1\n-0.25,2\n\"2,000\",3\n"), expected);
  EXPECT_EQ(first("  1234.5   1\n   -0.25   2\n   2.0e3 3\n"), expected);
  EXPECT_EQ(first("1 234,5;1\n-0,25;2\n2 000;3\n"), expected);
}

TEST(ReadColumns, StopsWhenAsked) {
  const std::string text = madeRun({.rows = 100000});
  const auto layout = findLayout(text, {}).value();
  std::stop_source stop;
  stop.request_stop();
  const auto columns =
      readColumns(text, '\n', layout.dialect, layout.table, {stop.get_token(), {}});
  ASSERT_FALSE(columns);
  EXPECT_EQ(columns.error().code, "stopped");
}

TEST(ReadColumns, RefusesALineOverTheLimit) {
  const std::string text = madeRun({.rows = 2000}) + std::string(longestLine + 1, '1') + "\n";
  const auto layout = findLayout(text, {}).value();
  const auto columns = readColumns(text, '\n', layout.dialect, layout.table, {});
  ASSERT_FALSE(columns);
  EXPECT_EQ(columns.error().code, "line-too-long");
  EXPECT_EQ(columns.error().place.row, 2002);
}

}  // namespace
}  // namespace dampwright
