// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/loop_painting.h"

#include <gtest/gtest.h>

#include <QImage>

#include "tests/ui/made_measured.h"

namespace dampwright {
namespace {

constexpr double pixelsPerMm = 8;

QImage painted(const LoopFigure& figure, const AxisScale& force) {
  QImage paper(
      static_cast<int>(88 * pixelsPerMm), static_cast<int>(70 * pixelsPerMm), QImage::Format_RGB32);
  paper.fill(Qt::white);
  QPainter painter(&paper);
  paintLoopFigure(painter, paper.rect(), figure, force, {2.8 * pixelsPerMm, pixelsPerMm});
  painter.end();
  return paper;
}

int dark(const QImage& image, const QRect& area) {
  int found = 0;
  for (int y = area.top(); y <= area.bottom(); ++y) {
    for (int x = area.left(); x <= area.right(); ++x) {
      if (qGray(image.pixel(x, y)) < 160) ++found;
    }
  }
  return found;
}

TEST(LoopPainting, LoopsSurviveAPhotocopy) {
  const auto measured = made::measured();
  const Verdict verdict = made::verdict();
  const LoopFigure velocity =
      loopFigure(FigureKind::ForceVelocity, measured->measurement, &verdict);
  const LoopFigure displacement =
      loopFigure(FigureKind::ForceDisplacement, measured->measurement, &verdict);
  const AxisScale force = commonForceScale({&velocity, &displacement});
  for (const LoopFigure* figure : {&velocity, &displacement}) {
    const QImage paper = painted(*figure, force);
    if (qEnvironmentVariableIsSet("DAMPWRIGHT_SHOTS"))
      paper.save(qEnvironmentVariable("DAMPWRIGHT_SHOTS") +
                 QStringLiteral("/paper_%1.png").arg(static_cast<int>(figure->kind)));
    // The loops themselves: the same figure without them is far lighter in the axis rectangle.
    LoopFigure without = *figure;
    const QRect inside = paper.rect().adjusted(120, 60, -40, -100);
    without.loops.clear();
    without.dots.clear();
    without.gasLine.clear();
    without.bands.clear();
    EXPECT_GT(dark(paper, inside), dark(painted(without, force), inside) + 2000);
  }
}

TEST(LoopPainting, NothingRunsOutOfItsArea) {
  const auto measured = made::measured();
  const LoopFigure figure = loopFigure(FigureKind::ForceVelocity, measured->measurement, nullptr);
  QImage paper(1000, 800, QImage::Format_RGB32);
  paper.fill(Qt::white);
  QPainter painter(&paper);
  const QRect area(100, 100, 800, 600);
  paintLoopFigure(
      painter, area, figure, commonForceScale({&figure}), {2.8 * pixelsPerMm, pixelsPerMm});
  painter.end();
  for (const QRect& margin : {QRect(0, 0, 1000, 98),
                              QRect(0, 702, 1000, 98),
                              QRect(0, 0, 98, 800),
                              QRect(902, 0, 98, 800)})
    EXPECT_EQ(dark(paper, margin), 0);
}

TEST(LoopPainting, AThousandLoopsStayUnderTwentyThousandVertices) {
  LoopFigure figure;
  for (std::size_t i = 0; i < 1000; ++i) figure.loops.push_back({i, {}, std::vector<QPointF>(721)});
  const auto stride = static_cast<std::size_t>(loopStride(figure, 20'000));
  EXPECT_LE(1000 * (720 / stride + 2), 20'000u);
  figure.loops.resize(8);
  EXPECT_EQ(loopStride(figure, 20'000), 1);
}

}  // namespace
}  // namespace dampwright
