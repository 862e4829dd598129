// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/text_lines.h"

#include <gmock/gmock.h>

#include <string>
#include <vector>

namespace dampwright {
namespace {

using testing::ElementsAre;

std::vector<std::string> linesOf(std::string_view text) {
  std::vector<std::string> lines;
  LineReader reader(text, findLineEnd(text).letter);
  while (const auto line = reader.next()) lines.emplace_back(line->text);
  return lines;
}

TEST(TextLines, EveryLineEndIsKnownAndTakenOff) {
  for (const auto& [end, name] : std::vector<std::pair<std::string, std::string>>{
           {"\n", "LF"}, {"\r\n", "CRLF"}, {"\r", "CR"}, {"\r\r\n", "CRCRLF"}}) {
    const std::string text = "a" + end + "b" + end;
    EXPECT_EQ(findLineEnd(text).name, name);
    EXPECT_THAT(linesOf(text), ElementsAre("a", "b")) << name;
  }
}

TEST(TextLines, MixedLineEndsAreReadAndSaid) {
  EXPECT_EQ(findLineEnd("a\nb\r\nc\n").name, "mixed");
  EXPECT_THAT(linesOf("a\nb\r\nc\n"), ElementsAre("a", "b", "c"));
}

TEST(TextLines, ALastLineWithoutEndIsNotTerminated) {
  LineReader reader("a\nb", '\n');
  EXPECT_TRUE(reader.next()->terminated);
  EXPECT_FALSE(reader.next()->terminated);
  EXPECT_FALSE(reader.next().has_value());
}

TEST(TextLines, AQuotedFieldMayRunOverLines) {
  LineReader reader("\"Force\n[N]\",\"x\"\n1,2\n", '\n');
  const auto first = reader.next();
  EXPECT_EQ(first->text, "\"Force\n[N]\",\"x\"");
  EXPECT_EQ(first->count, 2);
  EXPECT_EQ(reader.next()->number, 3);
}

TEST(TextLines, AnInchSignOpensNoQuotes) {
  EXPECT_THAT(linesOf("Travel (\"),Load\n1,2\n3,4\n"),
              ElementsAre("Travel (\"),Load", "1,2", "3,4"));
}

TEST(TextLines, AQuoteThatNeverClosesTakesNoOtherLine) {
  std::string text = "\"open,1\n";
  for (int i = 0; i < 100; ++i) text += "1,2\n";
  EXPECT_EQ(linesOf(text).size(), 101u);
}

TEST(TextLines, TheSampleReachesIntoEveryPartOfALongText) {
  std::string text;
  for (int i = 0; i < 20000; ++i) text += i < 19000 ? "1;2\n" : "1;2,5\n";
  const auto sample = sampleLines(text, '\n');
  ASSERT_TRUE(sample);
  EXPECT_EQ(sample.value().head.size(), 1000u);
  int late = 0;
  for (const Line& line : sample.value().spread) late += line.text == "1;2,5" ? 1 : 0;
  EXPECT_GT(late, 10);
}

TEST(TextLines, ALineOverTheLimitIsRefusedWithItsNumber) {
  const auto sample = sampleLines("a\n" + std::string(longestLine + 1, '1') + "\n", '\n');
  ASSERT_FALSE(sample);
  EXPECT_EQ(sample.error().code, "line-too-long");
  EXPECT_EQ(sample.error().place.row, 2);
}

TEST(TextLines, NothingAtAllHasNoLines) {
  EXPECT_TRUE(linesOf("").empty());
  EXPECT_TRUE(sampleLines("", '\n').value().head.empty());
}

}  // namespace
}  // namespace dampwright
