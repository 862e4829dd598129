// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/stamp.h"

#include <gtest/gtest.h>

#include <map>

#include "tests/ui/look/drawing.h"

namespace dampwright {
namespace {

const std::map<VerdictWord, QString> words = {
    {VerdictWord::Pass, QStringLiteral("Pass")},
    {VerdictWord::Fail, QStringLiteral("Fail")},
    {VerdictWord::TooCloseToCall, QStringLiteral("Too close to call")},
    {VerdictWord::NotTested, QStringLiteral("Not tested")}};

QImage stamp(VerdictWord verdict, const QString& text, const QSize& frame) {
  return drawn(frame + QSize(40, 40), [&](QPainter& painter) {
    paintStamp(painter, QRectF(QPointF(20, 20), frame), verdict, text, printPalette());
  });
}

TEST(Stamps, NothingIsDrawnOutsideTheFrameAtAnySize) {
  for (const auto& [verdict, text] : words) {
    for (const QSize frame : {QSize(70, 22), QSize(70, 34), QSize(300, 64), QSize(40, 40)}) {
      const QRect ink = inkBounds(stamp(verdict, text, frame));
      EXPECT_TRUE(QRect(QPoint(20, 20), frame).contains(ink))
          << text.toStdString() << " in " << frame.width() << "x" << frame.height();
    }
  }
}

TEST(Stamps, LongWordsStayInsideTheFrame) {
  const QString longWords = QStringLiteral("Zu knapp für eine Entscheidung");
  const QRect ink = inkBounds(stamp(VerdictWord::NotTested, longWords, {70, 22}));
  EXPECT_TRUE(QRect(20, 20, 70, 22).contains(ink));
}

// Grey, and without reading a word: the frame's top edge is whole, solid, broken or dotted.
TEST(Stamps, TheFourShapesDifferInGrey) {
  const auto edge = [](VerdictWord verdict) {
    const QImage image = stamp(verdict, words.at(verdict), {300, 64});
    return inkShare(image, QRect(60, 21, 220, 2));
  };
  const auto body = [](VerdictWord verdict) {
    return inkShare(stamp(verdict, words.at(verdict), {300, 64}), QRect(26, 26, 288, 52));
  };
  EXPECT_GT(edge(VerdictWord::Pass), 0.98);
  EXPECT_LT(body(VerdictWord::Pass), 0.3);
  EXPECT_GT(body(VerdictWord::Fail), 0.6);
  EXPECT_GT(edge(VerdictWord::TooCloseToCall), 0.5);
  EXPECT_LT(edge(VerdictWord::TooCloseToCall), 0.75);  // dashes 4 of 6.4
  EXPECT_LT(edge(VerdictWord::NotTested), 0.5);        // dots 1 of 2.4
  EXPECT_GT(edge(VerdictWord::NotTested), 0.1);
}

TEST(Stamps, MarksDifferFromEachOther) {
  std::map<VerdictWord, QImage> marks;
  for (const auto& [verdict, text] : words) {
    marks[verdict] = drawn({24, 24}, [v = verdict](QPainter& painter) {
      paintMark(painter, {0, 0, 24, 24}, v, Qt::black);
    });
    EXPECT_FALSE(inkBounds(marks[verdict]).isEmpty());
  }
  for (const auto& [one, image] : marks) {
    for (const auto& [other, otherImage] : marks) {
      if (one == other) continue;
      EXPECT_NE(image, otherImage);
    }
  }
}

}  // namespace
}  // namespace dampwright
