// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/type.h"

#include <gtest/gtest.h>

#include <QFontInfo>
#include <QGuiApplication>
#include <QImage>

#include "tests/ui/look/drawing.h"

namespace dampwright {
namespace {

class Type : public testing::Test {
 protected:
  void SetUp() override { needApplication(); }
};

TEST_F(Type, TheFamilyIsThere) {
  EXPECT_EQ(QFontInfo(screenFont(TextSize::Text)).family(), fontFamily());
}

TEST_F(Type, FiguresAreAllOfOneWidth) {
  const double width = textWidth(QStringLiteral("0"), {10, false, {}});
  for (const char digit : std::string("123456789")) {
    EXPECT_DOUBLE_EQ(textWidth(QString(QLatin1Char(digit)), {10, false, {}}), width) << digit;
  }
}

TEST_F(Type, WidthGrowsWithTheSize) {
  const QString text = QStringLiteral("Rebound at 300 mm/s");
  EXPECT_NEAR(textWidth(text, {30, false, {}}), 10 * textWidth(text, {3, false, {}}), 1e-9);
}

TEST_F(Type, WrappedLinesFitAndLoseNothing) {
  const TextStyle style{3, false, Qt::black};
  const QString text = QStringLiteral(
      "Gas-charged dampers are under pressure: do not puncture, heat or open one before its charge "
      "is let out by the maker's procedure.");
  const QStringList lines = wrapped(text, 60, style);
  EXPECT_GT(lines.size(), 2);
  for (const QString& line : lines) EXPECT_LE(textWidth(line, style), 60) << line.toStdString();
  EXPECT_EQ(lines.join(QLatin1Char(' ')), text);
}

TEST_F(Type, AWordWiderThanTheLineIsBrokenNotLost) {
  const TextStyle style{3, false, Qt::black};
  const QString word(90, QLatin1Char('W'));
  const QStringList lines = wrapped(word, 40, style);
  for (const QString& line : lines) EXPECT_LE(textWidth(line, style), 40);
  EXPECT_EQ(lines.join(QString()), word);
}

TEST_F(Type, NumberAndUnitStayOnOneLine) {
  const TextStyle style{3, false, Qt::black};
  const QString value = QStringLiteral("964.0\u00A0±\u00A09.1\u00A0N");
  const double width = textWidth(QStringLiteral("measured 964.0"), style) + 1;
  EXPECT_EQ(wrapped(QStringLiteral("measured ") + value, width, style).at(1), value);
}

TEST_F(Type, NoLineEndsInsideAUnitOrARange) {
  const TextStyle style{3, false, Qt::black};
  const QString text = QStringLiteral("Rebound at 300\u00A0mm/s of 870–1120\u00A0N –\u00A0Fail");
  for (double width = 25; width < 70; width += 0.5) {
    for (const QString& line : wrapped(text, width, style)) {
      EXPECT_FALSE(line.endsWith(QLatin1Char('/'))) << width;
      EXPECT_FALSE(line.endsWith(QStringLiteral("–"))) << width;
      EXPECT_LE(textWidth(line, style), width);
    }
  }
}

TEST_F(Type, ElidedTextFits) {
  const TextStyle style{3, false, Qt::black};
  const QString text(80, QLatin1Char('m'));
  EXPECT_LE(textWidth(elided(text, 50, style), style), 50);
  EXPECT_EQ(elided(QStringLiteral("short"), 50, style), QStringLiteral("short"));
}

TEST_F(Type, TextIsDrawnAtTheAskedSizeInThePaintersUnits) {
  // The letter H in a painter of 10 dots to the unit: DejaVu's capitals are 0.729 em high.
  const QImage image = drawn({100, 100}, [](QPainter& painter) {
    painter.scale(10, 10);
    drawText(painter, {0, 0, 10, 10}, QStringLiteral("H"), {5, false, Qt::black});
  });
  EXPECT_NEAR(inkBounds(image).height(), 36.45, 2);  // rows of the edge
}

}  // namespace
}  // namespace dampwright
