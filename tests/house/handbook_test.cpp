// SPDX-License-Identifier: GPL-3.0-or-later
// The handbook lists every message, and nothing that the program does not say.
#include <gtest/gtest.h>

#include <fstream>
#include <regex>
#include <set>
#include <sstream>
#include <string>

namespace {

const std::string root = DAMPWRIGHT_SOURCE_DIR;

std::string textOf(const std::string& file) {
  std::ifstream stream(root + "/" + file);
  std::ostringstream text;
  text << stream.rdbuf();
  return text.str();
}

std::set<std::string> found(const std::string& text, const std::regex& pattern) {
  std::set<std::string> codes;
  for (std::sregex_iterator it(text.begin(), text.end(), pattern), end; it != end; ++it)
    codes.insert((*it)[1]);
  return codes;
}

TEST(Handbook, ListsEveryMessageOfTheProgram) {
  const std::regex row("\\{\\s*\"([a-z0-9-]+)\",");
  std::set<std::string> said;
  for (const char* table : {"reading", "measuring", "judging", "document", "book"}) {
    said.merge(found(textOf("core/words/" + std::string(table) + "_sentences.cpp"), row));
  }
  ASSERT_GT(said.size(), 50u);
  EXPECT_EQ(found(textOf("resources/handbook/messages.md"), std::regex("\n\\| `([a-z0-9-]+)` \\|")),
            said);
}

TEST(Handbook, EveryLinkOfItsPagesLeadsSomewhere) {
  for (const char* page : {"index",
                           "safety",
                           "first_job",
                           "run_files",
                           "measured",
                           "verdict",
                           "documents",
                           "accuracy"}) {
    const std::string text = textOf("resources/handbook/" + std::string(page) + ".md");
    EXPECT_FALSE(text.empty()) << page;
    for (const std::string& link : found(text, std::regex("\\]\\(([a-z_]+\\.[a-z]+)\\)"))) {
      EXPECT_FALSE(textOf("resources/handbook/" + link).empty()) << page << ": " << link;
    }
  }
}

}  // namespace
