// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/loop_figure.h"

#include <gtest/gtest.h>

#include "tests/ui/made_measured.h"

namespace dampwright {
namespace {

TEST(LoopFigure, PointsStandWhereTheDamperPushes) {
  const auto measured = made::measured();
  const LoopFigure figure = loopFigure(FigureKind::ForceVelocity, measured->measurement, nullptr);
  ASSERT_EQ(figure.loops.size(), 6u);
  EXPECT_EQ(figure.loops.front().label, QString::fromUtf8("1000\u00A0mm/s"));
  ASSERT_EQ(figure.dots.size(), 12u);
  for (const CurveDot& dot : figure.dots) {
    // The made damper's law, signed: right and up in compression, left and down in rebound.
    EXPECT_NEAR(dot.at.y(), made::forceAt(dot.at.x() / 1000), 1e-9);
    EXPECT_DOUBLE_EQ(dot.bar, 8);
  }
}

TEST(LoopFigure, ALoopIsClosed) {
  const auto measured = made::measured();
  for (const FigureKind kind : {FigureKind::ForceVelocity, FigureKind::ForceDisplacement}) {
    for (const LoopLine& line : loopFigure(kind, measured->measurement, nullptr).loops) {
      ASSERT_EQ(line.points.size(), 721u);
      EXPECT_EQ(line.points.front(), line.points.back());
    }
  }
}

TEST(LoopFigure, LimitsOfReboundStandLeftAndBelow) {
  const auto measured = made::measured();
  const Verdict verdict = made::verdict();
  const LoopFigure figure = loopFigure(FigureKind::ForceVelocity, measured->measurement, &verdict);
  ASSERT_EQ(figure.bands.size(), 2u);
  const LimitSpan& rebound = figure.bands[0].front();
  EXPECT_EQ(rebound.x, -600);
  EXPECT_EQ(rebound.low, -1600);
  EXPECT_EQ(rebound.high, -1400);
  const LimitSpan& compression = figure.bands[1].back();
  EXPECT_EQ(compression.x, 600);
  EXPECT_EQ(compression.low, 700);
  EXPECT_EQ(compression.high, 800);
}

TEST(LoopFigure, LimitsWithoutGasAreDrawnWithTheGasThatTheLoopsHold) {
  const auto measured = made::measured();
  Verdict verdict = made::verdict();
  verdict.forceBasis = ForceBasis::GasRemoved;
  const LoopFigure figure = loopFigure(FigureKind::ForceVelocity, measured->measurement, &verdict);
  EXPECT_EQ(figure.bands[0].front().low, -1600 + made::gas);
  EXPECT_EQ(figure.bands[1].back().high, 800 + made::gas);
}

TEST(LoopFigure, ALimitOnOneSideIsOpenOnTheOther) {
  const auto measured = made::measured();
  Verdict verdict = made::verdict();
  verdict.checks.resize(1);
  verdict.checks[0].max.reset();
  const LoopFigure figure = loopFigure(FigureKind::ForceVelocity, measured->measurement, &verdict);
  EXPECT_EQ(figure.bands[0].front().low, -INFINITY);
  EXPECT_EQ(figure.bands[0].front().high, -540);
}

TEST(LoopFigure, BothFiguresShareOneForceScaleThatHoldsEverything) {
  const auto measured = made::measured();
  const LoopFigure velocity = loopFigure(FigureKind::ForceVelocity, measured->measurement, nullptr);
  const LoopFigure displacement =
      loopFigure(FigureKind::ForceDisplacement, measured->measurement, nullptr);
  const AxisScale force = commonForceScale({&velocity, &displacement});
  EXPECT_EQ(force.step, 1000);
  EXPECT_LE(force.low, made::forceAt(-1));
  EXPECT_GE(force.high, made::forceAt(1));
}

TEST(LoopFigure, SpeedsStandAboveTheirLoopsAndNeverOnEachOther) {
  const auto measured = made::measured();
  const LoopFigure figure =
      loopFigure(FigureKind::ForceDisplacement, measured->measurement, nullptr);
  const auto labels = speedLabels(figure, 150);
  ASSERT_EQ(labels.size(), 3u);  // tops at 1150, 750 and 450 N; then only 100 N and less between
  EXPECT_EQ(labels[0].text, QString::fromUtf8("1000\u00A0mm/s"));
  EXPECT_NEAR(labels[0].at.y(), made::forceAt(1), 1e-6);
  for (std::size_t i = 1; i < labels.size(); ++i)
    EXPECT_GE(labels[i - 1].at.y() - labels[i].at.y(), 150);
}

TEST(LoopFigure, TheSummarySaysSpeedsAndForces) {
  const auto measured = made::measured();
  const Verdict verdict = made::verdict();
  const QString text =
      figureSummary(loopFigure(FigureKind::ForceVelocity, measured->measurement, &verdict));
  EXPECT_TRUE(text.contains("6 speeds")) << text.toStdString();
  EXPECT_TRUE(text.contains("1000\u00A0mm/s"));
  EXPECT_TRUE(text.contains("2350\u00A0N"));
  EXPECT_TRUE(text.contains("1150\u00A0N"));
  EXPECT_TRUE(text.contains("limits"));
}

TEST(LoopFigure, NothingMeasuredSaysWhatWillStandThere) {
  EXPECT_TRUE(LoopFigure().empty());
  EXPECT_FALSE(figureSummary(LoopFigure()).isEmpty());
  EXPECT_EQ(commonForceScale({}), niceScale(0, 0, 6));
}

}  // namespace
}  // namespace dampwright
