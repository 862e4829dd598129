// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/session/book_keeper.h"

#include <gmock/gmock.h>

#include <QDir>
#include <QFile>
#include <QTemporaryDir>
#include <QTest>

namespace dampwright {
namespace {

using testing::ElementsAre;

constexpr int patience = 20'000;  // ms, only ever waited out by a failure

class Keeper : public testing::Test {
 protected:
  QString file() const { return folder.filePath("shelf/book.sqlite"); }
  static BookWrite setting(const std::string& value) {
    return {[value](Book& book) { return book.setSetting("x", value); }, {}};
  }
  std::string settingInBook() const { return Book::open(file()).value().setting("x").value(); }

  QTemporaryDir folder;
};

TEST_F(Keeper, WritesAreDoneInOrderAndAReadSeesThem) {
  QDir(folder.path()).mkdir("shelf");
  BookKeeper keeper(file());
  for (int i = 0; i < 20; ++i) keeper.write(setting(std::to_string(i)));
  std::string seen;
  keeper.read([](const Book& book) { return book.setting("x"); },
              [&](const Result<std::string>& value) { seen = value.value(); });
  EXPECT_TRUE(keeper.busy());
  ASSERT_TRUE(QTest::qWaitFor([&] { return !keeper.busy(); }, patience));
  EXPECT_EQ(seen, "19");
  EXPECT_FALSE(keeper.hasUnwritten());
}

TEST_F(Keeper, TheDestructorWritesWhatWaits) {
  QDir(folder.path()).mkdir("shelf");
  {
    BookKeeper keeper(file());
    keeper.write(setting("kept"));
  }
  EXPECT_EQ(settingInBook(), "kept");
}

TEST_F(Keeper, WhatCannotBeWrittenIsKeptSaidOnceAndWrittenInOrderWhenItCan) {
  BookKeeper keeper(file());  // its folder is not there
  std::vector<std::string> told;
  QObject::connect(&keeper, &BookKeeper::trouble, &keeper, [&](const Error& error) {
    told.push_back(error.code);
  });
  QObject::connect(&keeper, &BookKeeper::well, &keeper, [&] { told.emplace_back("well"); });
  keeper.write(setting("first"));
  keeper.write(setting("second"));
  ASSERT_TRUE(QTest::qWaitFor([&] { return !told.empty() && !keeper.busy(); }, patience));
  EXPECT_TRUE(keeper.hasUnwritten());
  QDir(folder.path()).mkdir("shelf");
  ASSERT_TRUE(QTest::qWaitFor([&] { return !keeper.hasUnwritten(); }, patience));
  EXPECT_THAT(told, ElementsAre("book-cannot-open", "well"));
  EXPECT_EQ(settingInBook(), "second");
}

TEST_F(Keeper, ARefusalIsNotTriedAgain) {
  QDir(folder.path()).mkdir("shelf");
  BookKeeper keeper(file());
  int tries = 0;
  keeper.write({[&tries](Book&) -> Result<Done> {
                  ++tries;
                  return Error{"limits-revision-taken", {}, {}};
                },
                {}});
  keeper.write(setting("next"));
  ASSERT_TRUE(QTest::qWaitFor([&] { return !keeper.hasUnwritten(); }, patience));
  EXPECT_EQ(tries, 1);
  EXPECT_EQ(settingInBook(), "next");
}

}  // namespace
}  // namespace dampwright
