// SPDX-License-Identifier: GPL-3.0-or-later
// Every code that core hands out has exactly one sentence, and every sentence is one.
#include "core/words/words.h"

#include <gtest/gtest.h>

#include <filesystem>
#include <fstream>
#include <iterator>
#include <regex>
#include <set>
#include <string>

#include "core/words/tables.h"

namespace dampwright {
namespace {

namespace fs = std::filesystem;

std::set<std::string> codesIn(const std::string& source) {
  static const std::regex form(
      "(?:\\b(?:Error|Remark|Reason)\\s+\\w+|\\w*(?:[Ee]rror|[Rr]emark|[Rr]eason|[Ww]arning|[Nn]"
      "ote|"
      "[Ww]hy)|\\bcode)\\s*[({=]\\s*\"([a-z0-9]+(?:-[a-z0-9]+)*)\"");
  std::set<std::string> codes;
  for (std::sregex_iterator match(source.begin(), source.end(), form), end; match != end; ++match) {
    codes.insert((*match)[1]);
  }
  return codes;
}

TEST(Words, EveryFormOfACodeIsFound) {
  const auto codes = codesIn(R"(return Error{"a-1", {}}; Remark r{ "b-2"}; lineError("c-3", 4);
      note(
          "d-4"); remark.code = "e-5"; column.why = "f-6"; Error{name}; say("g-7"); gas.reason = "slow block")");
  EXPECT_EQ(codes, (std::set<std::string>{"a-1", "b-2", "c-3", "d-4", "e-5", "f-6"}));
}

TEST(Words, EveryCodeOfCoreHasASentence) {
  for (const auto& entry :
       fs::recursive_directory_iterator(fs::path(DAMPWRIGHT_SOURCE_DIR) / "core")) {
    if (entry.path().extension() != ".cpp" && entry.path().extension() != ".h") continue;
    if (entry.path().parent_path().filename() == "words") continue;
    std::ifstream stream(entry.path());
    const std::string source{std::istreambuf_iterator<char>(stream), {}};
    for (const std::string& code : codesIn(source)) {
      EXPECT_NE(findSentence(code), nullptr) << entry.path() << ": no sentence for " << code;
    }
  }
}

TEST(Words, EverySentenceHasACodeOfItsOwnAndIsAWholeSentence) {
  std::set<std::string_view> codes;
  for (const auto table : {readingSentences(),
                           measuringSentences(),
                           judgingSentences(),
                           documentSentences(),
                           bookSentences()}) {
    for (const Sentence& row : table) {
      EXPECT_TRUE(codes.insert(row.code).second) << row.code << " stands twice";
      EXPECT_TRUE(row.text.ends_with('.')) << row.code;
      EXPECT_TRUE(row.hint.empty() || row.hint.ends_with('.')) << row.code;
    }
  }
}

}  // namespace
}  // namespace dampwright
