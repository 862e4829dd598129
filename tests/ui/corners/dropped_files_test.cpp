// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/corners/dropped_files.h"

#include <gtest/gtest.h>

#include <QUrl>

namespace dampwright {
namespace {

TEST(DroppedFiles, OnlyFilesOfThisMachineCount) {
  QMimeData data;
  data.setUrls({QUrl::fromLocalFile("/rig/front left.csv"), QUrl("https://example.org/a.csv")});
  EXPECT_EQ(droppedFiles(&data), QStringList{"/rig/front left.csv"});
  QMimeData text;
  text.setText("front left");
  EXPECT_TRUE(droppedFiles(&text).isEmpty());
  EXPECT_TRUE(droppedFiles(nullptr).isEmpty());
}

TEST(DroppedFiles, ThePromiseSaysWhatWillHappen) {
  EXPECT_EQ(dropPromise({"/a.csv"}, "Front left"), "Add this file to Front left");
  EXPECT_EQ(dropPromise({"/a.csv", "/b.csv"}, {}), "Add 2 files");
}

}  // namespace
}  // namespace dampwright
