// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/json_node.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

std::string codeOf(std::string_view text) {
  const auto tree = parseJson(text, "a.json");
  return tree ? "" : tree.error().code;
}

std::string textValue(const Error& error, const std::string& name) {
  for (const NamedValue& value : error.values)
    if (value.name == name) return std::get<std::string>(value.value);
  return "";
}

TEST(JsonNode, AValueRemembersTheLineWhereItStands) {
  const auto tree = parseJson("{\n  \"a\": 1,\n  \"b\": [\n    2\n  ]\n}\n", "a.json");
  ASSERT_TRUE(tree);
  const JsonNode::Object& root = *tree.value().object();
  EXPECT_EQ(tree.value().row, 1);
  EXPECT_EQ(root.find("a")->second.row, 2);
  EXPECT_EQ(root.find("b")->second.row, 3);
  EXPECT_EQ((*root.find("b")->second.list())[0].row, 4);
}

TEST(JsonNode, ARepeatedKeyIsAnErrorWithItsPathAndLine) {
  const auto tree = parseJson("{\"a\": [{}, {\"b\": {\"c\": 1,\n\"c\": 2}}]}", "a.json");
  ASSERT_FALSE(tree);
  EXPECT_EQ(tree.error().code, "document-repeated-key");
  EXPECT_EQ(textValue(tree.error(), "key"), "a[1].b.c");
  EXPECT_EQ(tree.error().place, (Place{"a.json", 2, 0}));
}

TEST(JsonNode, ABrokenTextSaysTheLine) {
  const auto tree = parseJson("{\n\"a\": 1,\n\"b\": tru\n}", "a.json");
  ASSERT_FALSE(tree);
  EXPECT_EQ(tree.error().code, "document-not-json");
  EXPECT_EQ(tree.error().place.row, 3);
}

TEST(JsonNode, WhatRfc8259DoesNotAllowIsRefused) {
  for (const char* text : {"",
                           " ",
                           "{",
                           "{\"a\": 1,}",
                           "{} {}",
                           "{\"a\": 01}",
                           "{\"a\": NaN}",
                           "{\"a\": 1e999}",
                           "{'a': 1}",
                           "{\"a\": 1} // remark",
                           "\"\xC3\x28\"",
                           "\"\xED\xA0\x80\"",
                           "\xFF\xFE{\0}\0",
                           "\"\\ud800\""}) {
    EXPECT_EQ(codeOf(text), "document-not-json") << text;
  }
}

TEST(JsonNode, SixtyFourLevelsAreReadAndOneMoreIsNot) {
  const auto nested = [](std::size_t levels) {
    return std::string(levels, '[') + std::string(levels, ']');
  };
  EXPECT_EQ(codeOf(nested(64)), "");
  EXPECT_EQ(codeOf(nested(65)), "document-too-deep");
  EXPECT_EQ(codeOf(std::string(10'000'000, '[')), "document-too-deep");
}

TEST(JsonNode, SixtyFourMegabytesAreReadAndOneByteMoreIsNot) {
  std::string text(largestDocument, ' ');
  text[0] = '1';
  EXPECT_EQ(codeOf(text), "");
  EXPECT_EQ(codeOf(text + " "), "document-too-large");
}

TEST(JsonNode, MoreValuesThanAnyDocumentHasAreRefusedBeforeTheyFillMemory) {
  std::string text = "[0";
  for (std::size_t i = 0; i < mostValues; ++i) text += ",0";
  EXPECT_EQ(codeOf(text + "]"), "document-too-large");
}

TEST(JsonNode, AByteOrderMarkInFrontIsNoMistake) {
  EXPECT_EQ(codeOf("\xEF\xBB\xBF{\"a\": 1}"), "");
}

}  // namespace
}  // namespace dampwright
