// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/rig_folder/rig_folder.h"

#include <gtest/gtest.h>

#include <QDir>
#include <QFile>
#include <QPushButton>
#include <QSettings>
#include <QSignalSpy>
#include <QTemporaryDir>
#include <QTest>

#include "core/base/sha256.h"
#include "core/book/book.h"
#include "ui/look/elided.h"
#include "ui/rig_folder/offer_bar.h"

namespace dampwright {
namespace {

constexpr int patience = 60'000;  // ms, only ever waited out by a failure
constexpr int longEnough = 7000;  // ms: three looks

class RigFolders : public testing::Test {
 protected:
  void SetUp() override {
    QSettings().clear();
    QDir(home.path()).mkdir("rig");
    restart();
  }
  void restart() {
    folder.reset();
    folder = std::make_unique<RigFolder>(book());
  }
  QString rig() const { return home.filePath("rig"); }
  QString book() const { return home.filePath("book.sqlite"); }
  void write(const QString& name, const QByteArray& bytes) const {
    QFile file(rig() + "/" + name);
    ASSERT_TRUE(file.open(QIODevice::WriteOnly));
    file.write(bytes);
  }
  void watch() {
    folder->watch(rig());
    ASSERT_TRUE(QTest::qWaitFor([] { return QSettings().contains("rigFolder/path"); }, patience));
  }
  bool offered(const QString& name) const {
    for (const OfferedFile& offer : folder->offers()) {
      if (offer.path == rig() + "/" + name) return true;
    }
    return false;
  }
  bool becomesOffered(const QString& name) {
    return QTest::qWaitFor([&] { return offered(name); }, patience);
  }

  QTemporaryDir home;
  std::unique_ptr<RigFolder> folder;
};

TEST_F(RigFolders, ANewFileIsOfferedWhenItIsWrittenAndAnOldOneIsNot) {
  write("old.csv", "1,2\n3,4\n");
  watch();
  write("new.csv", "5,6\n7,8\n");
  ASSERT_TRUE(becomesOffered("new.csv"));
  EXPECT_FALSE(offered("old.csv"));
  EXPECT_EQ(folder->offers().front().sha256.toStdString(), sha256Hex("5,6\n7,8\n"));
}

TEST_F(RigFolders, AFileThatStillGrowsIsNotOffered) {
  watch();
  QFile file(rig() + "/run.csv");
  ASSERT_TRUE(file.open(QIODevice::WriteOnly));
  QByteArray all;
  for (int i = 0; i < 12; ++i) {
    const QByteArray row = QByteArray::number(i) + ",1.5\n";
    all += row;
    file.write(row);
    file.flush();
    QTest::qWait(500);
    EXPECT_FALSE(offered("run.csv")) << i;
  }
  file.close();
  ASSERT_TRUE(becomesOffered("run.csv"));
  EXPECT_EQ(folder->offers().front().sha256.toStdString(), sha256Hex(all.toStdString()));
}

TEST_F(RigFolders, AFileMovedIntoPlaceAtOnceIsOfferedAndItsSuccessorToo) {
  watch();
  write("a.part", "1,2\n3,4\n");
  ASSERT_TRUE(QFile::rename(rig() + "/a.part", rig() + "/run.csv"));
  ASSERT_TRUE(becomesOffered("run.csv"));
  const QString first = folder->offers().front().sha256;
  folder->settle(first);
  write("b.part", "1,2\n3,5\n");
  ASSERT_TRUE(QFile::remove(rig() + "/run.csv"));
  ASSERT_TRUE(QFile::rename(rig() + "/b.part", rig() + "/run.csv"));
  ASSERT_TRUE(becomesOffered("run.csv"));
  EXPECT_NE(folder->offers().front().sha256, first);
}

TEST_F(RigFolders, TheSameBytesAreNotOfferedTwiceNotEvenAfterARestart) {
  watch();
  write("run.csv", "1,2\n3,4\n");
  ASSERT_TRUE(becomesOffered("run.csv"));
  {
    Book kept = Book::open(book()).value();
    ASSERT_TRUE(kept.noteOffered(sha256Hex("1,2\n3,4\n"), "run.csv"));
  }
  restart();
  EXPECT_EQ(folder->folder(), rig()) << "it goes on with the folder of last time";
  write("copy.csv", "1,2\n3,4\n");
  write("other.csv", "1,2\n3,9\n");
  ASSERT_TRUE(becomesOffered("other.csv"));
  QTest::qWait(longEnough);
  EXPECT_FALSE(offered("run.csv"));
  EXPECT_FALSE(offered("copy.csv"));
}

TEST_F(RigFolders, WhatCameWhileTheProgramWasClosedIsOffered) {
  watch();
  folder.reset();
  write("night.csv", "1,2\n3,4\n");
  restart();
  EXPECT_TRUE(becomesOffered("night.csv"));
}

TEST_F(RigFolders, WhatIsNoTextIsNotOffered) {
  watch();
  write("picture.png", QByteArray("\x89PNG\r\n\x1a\n\0\0\0\rIHDR", 16));
  write("run.csv", "1,2\n3,4\n");
  ASSERT_TRUE(becomesOffered("run.csv"));
  EXPECT_EQ(folder->offers().size(), 1u);
}

TEST_F(RigFolders, AFolderThatGoesIsSaidAndWatchedAgainWhenItIsBack) {
  watch();
  QSignalSpy trouble(folder.get(), &RigFolder::troubleChanged);
  ASSERT_TRUE(QDir(rig()).removeRecursively());
  ASSERT_TRUE(QTest::qWaitFor([&] { return trouble.count() == 1; }, patience));
  EXPECT_TRUE(trouble[0][0].toBool());
  QDir(home.path()).mkdir("rig");
  ASSERT_TRUE(QTest::qWaitFor([&] { return trouble.count() == 2; }, patience));
  write("run.csv", "1,2\n3,4\n");
  EXPECT_TRUE(becomesOffered("run.csv"));
}

TEST_F(RigFolders, WatchingEndsWhenItIsAsked) {
  watch();
  folder->watch({});
  restart();
  EXPECT_TRUE(folder->folder().isEmpty());
}

TEST(OfferBar, OffersAndIsGoneWhenThereIsNothing) {
  OfferBar bar;
  bar.setOffers({{"/rig/run 7.csv", "ab"}});
  EXPECT_FALSE(bar.isHidden());
  EXPECT_EQ(static_cast<ElidedLabel*>(bar.findChild<QLabel*>())->whole(),
            "From the rig folder: run 7.csv");
  QSignalSpy taken(&bar, &OfferBar::taken), left(&bar, &OfferBar::left);
  const auto buttons = bar.findChildren<QPushButton*>();
  QTest::mouseClick(buttons[0], Qt::LeftButton);
  QTest::mouseClick(buttons[1], Qt::LeftButton);
  ASSERT_EQ(taken.count(), 1);
  EXPECT_EQ(taken[0][0].value<std::vector<OfferedFile>>().front().sha256, "ab");
  EXPECT_EQ(left.count(), 1);
  bar.setOffers({});
  EXPECT_TRUE(bar.isHidden());
}

}  // namespace
}  // namespace dampwright
