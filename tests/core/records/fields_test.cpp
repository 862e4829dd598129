// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/fields.h"

#include <gtest/gtest.h>

#include "core/records/document_words.h"
#include "core/words/words.h"

namespace dampwright {
namespace {

struct Thing {
  std::string name;
  double length = 7;
  std::optional<double> force;
  int count = 0;
  bool flag = false;
  std::optional<Direction> direction;
  std::vector<Thing> parts;
};

void describe(Fields& io, Thing& thing) {
  io.text("name", thing.name);
  io.number("length_mm", thing.length, positive);
  io.number("force_n", thing.force);
  io.count("count", thing.count);
  io.flag("flag", thing.flag);
  io.word("direction", thing.direction, words::directions);
  io.list("parts", thing.parts, [](Fields& one, Thing& part) { describe(one, part); });
}

Result<Thing> read(const std::string& members, Keys keys = Keys::Optional) {
  Thing thing;
  const std::string text = "{\"document\": \"dampwright thing\",\n\"version\": 1" + members + "}";
  const auto done = readDocument(text, "t.json", {"thing", 1}, [&](Fields& io) {
    io.require(keys);
    describe(io, thing);
  });
  if (!done) return done.error();
  return thing;
}

std::string problem(const std::string& members, Keys keys = Keys::Optional) {
  const auto thing = read(members, keys);
  return thing ? "" : englishLine(thing.error());
}

TEST(Fields, AbsentAndNullAreTheSameInSettings) {
  for (const char* members : {"", ", \"length_mm\": null, \"force_n\": null, \"name\": null"}) {
    const auto thing = read(members);
    ASSERT_TRUE(thing) << members;
    EXPECT_EQ(thing.value().length, 7);
    EXPECT_EQ(thing.value().force, std::nullopt);
    EXPECT_EQ(thing.value().name, "");
  }
}

TEST(Fields, AResultMayNotLackAKeyAndNullIsNotZero) {
  EXPECT_TRUE(problem(", \"name\": \"a\"", Keys::Required)
                  .starts_with("document-missing-key: t.json, row 1: The key length_mm"));
  const auto thing = read(
      ", \"name\": null, \"length_mm\": null, \"force_n\": null, \"count\": 1, \"flag\": true,"
      "\"direction\": null, \"parts\": []",
      Keys::Required);
  ASSERT_TRUE(thing) << englishLine(thing.error());
  EXPECT_NE(thing.value().length, thing.value().length) << "not a number";
}

TEST(Fields, AnUnknownKeyIsNamedWithItsPathRowAndWhatIsKnown) {
  const std::string line = problem(",\n\"parts\": [{},\n {\"lenght_mm\": 3}]");
  EXPECT_TRUE(line.starts_with("document-unknown-key: t.json, row 4: The key parts[1].lenght_mm"))
      << line;
  EXPECT_NE(line.find("\"length_mm\""), std::string::npos) << line;
}

TEST(Fields, AMisspeltKeyIsReportedRatherThanTheOneItStandsFor) {
  EXPECT_TRUE(problem(", \"nmae\": \"a\"", Keys::Required).starts_with("document-unknown-key"));
}

TEST(Fields, AWrongTypeNamesKeyAndValue) {
  EXPECT_NE(problem(", \"length_mm\": \"50\"").find("length_mm must be a number, and is \"50\""),
            std::string::npos);
  EXPECT_TRUE(problem(", \"name\": 3").starts_with("document-not-text"));
  EXPECT_TRUE(problem(", \"flag\": 0").starts_with("document-not-a-flag"));
  EXPECT_TRUE(problem(", \"parts\": {}").starts_with("document-not-a-list"));
  EXPECT_TRUE(problem(", \"parts\": [1]").starts_with("document-not-an-object"));
  EXPECT_TRUE(problem(", \"count\": true").starts_with("document-not-a-number"));
}

TEST(Fields, AValueOutOfRangeNamesTheRule) {
  EXPECT_NE(problem(", \"length_mm\": 0").find("length_mm is 0, and must be > 0"),
            std::string::npos);
  EXPECT_NE(problem(", \"count\": 1.5").find("must be 0, 1, 2, …"), std::string::npos);
  EXPECT_NE(problem(", \"count\": -1").find("must be 0, 1, 2, …"), std::string::npos);
  EXPECT_NE(problem(", \"count\": 3000000000").find("must be 0, 1, 2, …"), std::string::npos);
  EXPECT_NE(problem(", \"direction\": \"up\"").find("one of \"compression\", \"rebound\""),
            std::string::npos);
}

TEST(Fields, AnErrorNeverPrintsMoreThanItsLineCanHold) {
  const std::string line =
      problem(", \"length_mm\": \"" + std::string(59, 'a') + "ä" + std::string(100000, 'b') + "\"");
  EXPECT_LT(line.size(), 300u);
  EXPECT_NE(line.find(std::string(59, 'a').append("…")), std::string::npos) << line;
}

TEST(Fields, ADocumentOfAnotherKindOrANewerVersionIsRefusedBeforeItsKeys) {
  const auto code = [](const char* text) {
    const auto done = readDocument(text, "t.json", {"thing", 1}, [](Fields&) {});
    return done ? std::string() : done.error().code;
  };
  EXPECT_EQ(code(R"({"document": "dampwright thing", "version": 1})"), "");
  EXPECT_EQ(code(R"({"document": "dampwright rig", "version": 1})"), "document-of-another-kind");
  EXPECT_EQ(code(R"({"version": 1})"), "document-without-kind");
  EXPECT_EQ(code(R"([])"), "document-without-kind");
  EXPECT_EQ(code(R"({"document": "dampwright thing"})"), "document-without-version");
  EXPECT_EQ(code(R"({"document": "dampwright thing", "version": 0})"), "document-without-version");
  EXPECT_EQ(code(R"({"document": "dampwright thing", "version": 2, "new": 1})"),
            "document-from-newer-program");
}

TEST(Fields, ANameThatComesTwiceIsKeptAndWrittenApart) {
  std::vector<std::pair<std::string, std::string>> pairs{{"b", "1"}, {"a", "2"}, {"b", "3"}};
  const auto list = [&](Fields& io) { io.textByName("metadata", pairs); };
  const std::string text = writeDocument({"thing", 1}, list);
  ASSERT_TRUE(readDocument(text, "t.json", {"thing", 1}, list));
  const decltype(pairs) expected{{"b", "1"}, {"a", "2"}, {"b (2)", "3"}};
  EXPECT_EQ(pairs, expected);
}

TEST(Fields, TextThatIsNotUtf8IsWrittenAsSuchADocumentCanBeRead) {
  std::string name = "a\xFF";
  const auto list = [&](Fields& io) { io.text("name", name); };
  const std::string text = writeDocument({"thing", 1}, list);
  ASSERT_TRUE(readDocument(text, "t.json", {"thing", 1}, list));
  EXPECT_EQ(name, "a\xEF\xBF\xBD");
}

}  // namespace
}  // namespace dampwright
