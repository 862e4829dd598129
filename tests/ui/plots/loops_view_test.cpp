// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/loops_view.h"

#include <gtest/gtest.h>

#include <QSignalSpy>
#include <QTest>

#include "tests/ui/made_measured.h"
#include "ui/look/palette.h"
#include "ui/look/style_sheet.h"
#include "ui/plots/loop_plot.h"
#include "ui/plots/run_plot.h"

namespace dampwright {
namespace {

class LoopsViewTest : public testing::Test {
 protected:
  void SetUp() override {
    view.resize(900, 700);
    view.show();
    ASSERT_TRUE(QTest::qWaitForWindowExposed(&view));
  }
  void fill() {
    measured = made::measured();
    view.setMeasured(measured, made::verdict());
    QTest::qWait(50);
  }
  static QWidget* canvasOf(QWidget* plot) { return plot->focusProxy(); }

  LoopsView view;
  std::shared_ptr<Measured> measured;
};

TEST_F(LoopsViewTest, BothLoopsAreOfOneSizeOnOneForceAxis) {
  fill();
  for (const QSize size : {QSize(900, 700), QSize(742, 640), QSize(1300, 800)}) {
    view.resize(size);
    QTest::qWait(50);
    const QRect left = view.forceVelocity()->axisRectangle();
    const QRect right = view.forceDisplacement()->axisRectangle();
    EXPECT_NEAR(left.width(), right.width(), 1);  // an odd number of pixels leaves one over
    EXPECT_EQ(left.height(), right.height());
    EXPECT_EQ(left.top(), right.top());
    EXPECT_EQ(view.forceVelocity()->forceRange(), view.forceDisplacement()->forceRange());
  }
}

TEST_F(LoopsViewTest, ZoomingOneForceAxisZoomsTheOther) {
  fill();
  const auto before = view.forceVelocity()->forceRange();
  QTest::keyClick(canvasOf(view.forceVelocity()), Qt::Key_Plus);
  EXPECT_NE(view.forceVelocity()->forceRange(), before);
  EXPECT_EQ(view.forceVelocity()->forceRange(), view.forceDisplacement()->forceRange());
  QTest::keyClick(canvasOf(view.forceVelocity()), Qt::Key_Home);
  EXPECT_EQ(view.forceDisplacement()->forceRange(), before);
}

TEST_F(LoopsViewTest, TheWheelZooms) {
  fill();
  QWidget* canvas = canvasOf(view.forceVelocity());
  const auto before = view.forceVelocity()->forceRange();
  const QPointF middle = QRectF(canvas->rect()).center();
  QWheelEvent wheel(middle,
                    canvas->mapToGlobal(middle),
                    {},
                    {0, 120},
                    Qt::NoButton,
                    Qt::NoModifier,
                    Qt::NoScrollPhase,
                    false);
  QApplication::sendEvent(canvas, &wheel);
  const auto after = view.forceVelocity()->forceRange();
  EXPECT_LT(after.second - after.first, before.second - before.first);
}

TEST_F(LoopsViewTest, PointingAtALoopMarksTheInstantInAllThree) {
  fill();
  QSignalSpy run(view.run(), &RunPlot::readoutChanged);
  const Instant instant{5, 0.25, std::nullopt};  // full speed into compression
  view.showInstant(instant);
  EXPECT_EQ(view.forceVelocity()->readout(), QString::fromUtf8("1000\u00A0mm/s · 1150\u00A0N"));
  EXPECT_EQ(view.forceDisplacement()->readout(), QString::fromUtf8("0\u00A0mm · 1150\u00A0N"));
  EXPECT_TRUE(view.run()->readout().contains("cycle")) << view.run()->readout().toStdString();
  EXPECT_EQ(run.count(), 1);
}

TEST_F(LoopsViewTest, TheMouseOverALoopPointsAtIt) {
  fill();
  QWidget* canvas = canvasOf(view.forceDisplacement());
  QSignalSpy pointed(view.forceDisplacement(), &LoopPlot::instantPointed);
  const QRect axes = view.forceDisplacement()->axisRectangle();
  const auto [low, high] = view.forceDisplacement()->forceRange();
  // The top of the fastest loop stands at x = 0.
  const double share = (high - made::forceAt(1.0)) / (high - low);
  QTest::mouseMove(canvas,
                   {axes.center().x(), axes.top() + static_cast<int>(share * axes.height())});
  ASSERT_TRUE(pointed.wait(1000));
  EXPECT_FALSE(view.forceDisplacement()->readout().isEmpty());
  EXPECT_FALSE(view.forceVelocity()->readout().isEmpty());
  QTest::keyClick(canvas, Qt::Key_Escape);
  EXPECT_TRUE(view.forceVelocity()->readout().isEmpty());
}

TEST_F(LoopsViewTest, ArrowKeysWalkAlongTheLoopAndToTheNextSpeed) {
  fill();
  QWidget* canvas = canvasOf(view.forceVelocity());
  QTest::keyClick(canvas, Qt::Key_Right);
  const QString first = view.forceVelocity()->readout();
  EXPECT_FALSE(first.isEmpty());
  QTest::keyClick(canvas, Qt::Key_Right, Qt::ShiftModifier);
  const QString second = view.forceVelocity()->readout();
  EXPECT_NE(second, first);
  QTest::keyClick(canvas, Qt::Key_Down);
  EXPECT_NE(view.forceVelocity()->readout(), second);
}

TEST_F(LoopsViewTest, ACycleIsStruckOutByKeyAndPutBack) {
  fill();
  QSignalSpy struck(view.run(), &RunPlot::strikeOutWanted);
  QSignalSpy back(view.run(), &RunPlot::putBackWanted);
  QWidget* canvas = canvasOf(view.run());
  QTest::keyClick(canvas, Qt::Key_Right);
  QTest::keyClick(canvas, Qt::Key_Right);
  ASSERT_TRUE(view.run()->chosenCycle());
  EXPECT_EQ(view.run()->chosenCycle()->cycle, 1u);
  QTest::keyClick(canvas, Qt::Key_Delete);
  ASSERT_EQ(struck.count(), 1);
  const Cycle& cycle = measured->measurement.blocks[0].block.cycles[1];
  EXPECT_EQ(struck[0][1].value<TimeSpan>(), (TimeSpan{cycle.start, cycle.end}));

  auto after = std::make_shared<Measured>(*measured);
  after->measurement.blocks[0].block.cycles[1].struckOut = true;
  after->measurement.runs[0].struckOut.push_back({cycle.start, cycle.end});
  view.setMeasured(after, made::verdict());
  ASSERT_TRUE(view.run()->chosenCycle());  // the choice outlives the new measurement
  QTest::keyClick(canvas, Qt::Key_Delete);
  EXPECT_EQ(back.count(), 1);
}

TEST_F(LoopsViewTest, AnotherFileOfTheSameLengthIsShownFromItsStart) {
  fill();
  view.run()->chooseCycle(1);
  QTest::keyClick(canvasOf(view.run()), Qt::Key_Plus);
  const auto whole = std::pair(0.0, view.run()->figure().end());
  ASSERT_NE(view.run()->timeRange(), whole);
  const auto mate = std::make_shared<Measured>(*measured);
  mate->measurement.runs[0].source.file = {"front_right.csv", std::string(64, 'b'), 1000};
  view.setMeasured(mate, made::verdict());
  EXPECT_EQ(view.run()->timeRange(), whole);
  EXPECT_FALSE(view.run()->chosenCycle());
}

TEST_F(LoopsViewTest, TheRunStaysInsideItsTime) {
  fill();
  QWidget* canvas = canvasOf(view.run());
  const auto whole = view.run()->timeRange();
  QTest::keyClick(canvas, Qt::Key_Minus);
  EXPECT_EQ(view.run()->timeRange(), whole);
  QTest::keyClick(canvas, Qt::Key_Plus);
  QTest::keyClick(canvas, Qt::Key_Left, Qt::ControlModifier);
  QTest::keyClick(canvas, Qt::Key_Left, Qt::ControlModifier);
  EXPECT_GE(view.run()->timeRange().first, 0);
  EXPECT_LT(view.run()->timeRange().second, whole.second);
}

TEST_F(LoopsViewTest, EmptyPlotsSayWhatWillStandThere) {
  for (QWidget* plot :
       {static_cast<QWidget*>(view.forceVelocity()), static_cast<QWidget*>(view.run())})
    EXPECT_TRUE(canvasOf(plot)->accessibleDescription().contains("here"));
  fill();
  EXPECT_TRUE(canvasOf(view.forceVelocity())->accessibleDescription().contains("6 speeds"));
}

// A picture of the middle of the window in both themes, for looking at.
TEST_F(LoopsViewTest, DrawsInBothThemes) {
  fill();
  view.resize(780, 760);
  view.showInstant(Instant{3, 0.3, std::nullopt});
  QImage pictures[2];
  for (const bool dark : {false, true}) {
    const Palette& palette = dark ? darkPalette() : lightPalette();
    QApplication::setPalette(asQPalette(palette));
    qApp->setStyleSheet(styleSheet(palette));
    QTest::qWait(50);
    pictures[dark] = view.grab().toImage();
    if (qEnvironmentVariableIsSet("DAMPWRIGHT_SHOTS"))
      pictures[dark].save(
          qEnvironmentVariable("DAMPWRIGHT_SHOTS") +
          (dark ? QStringLiteral("/loops_dark.png") : QStringLiteral("/loops.png")));
  }
  QApplication::setPalette(asQPalette(lightPalette()));
  qApp->setStyleSheet(styleSheet(lightPalette()));
  const QPoint inAxes =
      view.forceVelocity()->mapTo(&view, view.forceVelocity()->axisRectangle().topLeft()) +
      QPoint(4, 4);
  EXPECT_GT(pictures[0].pixelColor(inAxes).lightness(), 200);
  EXPECT_LT(pictures[1].pixelColor(inAxes).lightness(), 60);
}

TEST_F(LoopsViewTest, EveryPlotIsReachedByTab) {
  fill();
  for (QWidget* plot : {static_cast<QWidget*>(view.forceVelocity()),
                        static_cast<QWidget*>(view.forceDisplacement()),
                        static_cast<QWidget*>(view.run())}) {
    EXPECT_EQ(canvasOf(plot)->focusPolicy(), Qt::StrongFocus);
    EXPECT_FALSE(canvasOf(plot)->accessibleName().isEmpty());
  }
}

}  // namespace
}  // namespace dampwright
