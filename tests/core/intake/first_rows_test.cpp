// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/first_rows.h"

#include <gmock/gmock.h>

namespace dampwright {
namespace {

using testing::ElementsAre;

TEST(FirstRows, StandAsInTheFileWithTheirLineNumbers) {
  const auto rows = firstRows("Rig: 1\n\n\"a;b\";F [N]\n1;2\n3;4\n", std::nullopt, ";", 4);
  ASSERT_TRUE(rows);
  ASSERT_EQ(rows.value().size(), 4u);
  EXPECT_THAT(rows.value()[0].cells, ElementsAre("Rig: 1"));
  EXPECT_THAT(rows.value()[1].cells, ElementsAre(""));
  EXPECT_THAT(rows.value()[2].cells, ElementsAre("a;b", "F [N]"));
  EXPECT_EQ(rows.value()[3].line, 4);
  EXPECT_THAT(rows.value()[3].cells, ElementsAre("1", "2"));
}

TEST(FirstRows, WithoutADelimiterEachRowIsOneCell) {
  const auto rows = firstRows("1;2\r\n3;4\r\n", std::nullopt, "", 9);
  ASSERT_TRUE(rows);
  ASSERT_EQ(rows.value().size(), 2u);
  EXPECT_THAT(rows.value()[1].cells, ElementsAre("3;4"));
}

TEST(FirstRows, TheEncodingCountsAndLongCellsAreCut) {
  const auto rows = firstRows("\xB5m\n" + std::string(5000, 'x'), "windows-1252", ",", 9);
  ASSERT_TRUE(rows);
  EXPECT_THAT(rows.value()[0].cells, ElementsAre("µm"));
  EXPECT_EQ(rows.value()[1].cells[0].size(), 120u);
}

TEST(FirstRows, AFileThatIsNoTextIsRefused) {
  const auto rows = firstRows(std::string(5000, '\0'), std::nullopt, ",", 9);
  ASSERT_FALSE(rows);
  EXPECT_EQ(rows.error().code, "file-is-binary");
}

TEST(HeadOf, EndsWithAWholeLine) {
  EXPECT_EQ(headOf("12\n34\n56", 7), "12\n34\n");
  EXPECT_EQ(headOf("12\n34", 7), "12\n34");
  EXPECT_EQ(headOf("123456789", 7), "123456789");
  using namespace std::string_view_literals;
  EXPECT_EQ(headOf("1\0\n\0002\0\n\000"sv, 6), "1\0\n\0"sv);  // UTF-16, little end first
}

}  // namespace
}  // namespace dampwright
