// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPointF>
#include <QString>
#include <cstddef>
#include <initializer_list>
#include <vector>

#include "core/measure/measurement.h"
#include "core/verdict/verdict.h"
#include "ui/plots/axis_scale.h"

namespace dampwright {

enum class FigureKind { ForceVelocity, ForceDisplacement };

/// The averaged loop of one speed block. Point i is at phase i/(size − 1); the last is the first
/// again.
struct LoopLine {
  std::size_t block = 0;  ///< index into the measurement's blocks
  QString label;          ///< its peak speed, "300 mm/s"
  std::vector<QPointF> points;
};

/// A point of the force-velocity curve with its expanded uncertainty (k = 2) up and down, 0: none.
struct CurveDot {
  std::size_t block = 0;
  QPointF at;
  double bar = 0;
};

/// Where a force check's limits stand; infinite where there is none on that side.
struct LimitSpan {
  double x = 0, low = 0, high = 0;
};

/// What a loop plot shows, in shown units (ui/text), positive in compression: right and up. Screen
/// and paper draw the same value.
struct LoopFigure {
  FigureKind kind = FigureKind::ForceVelocity;
  std::vector<LoopLine> loops;                ///< by falling speed, so that the widest comes first
  std::vector<CurveDot> dots;                 ///< force-velocity only
  std::vector<std::vector<LimitSpan>> bands;  ///< one for each direction, each by rising x
  std::vector<QPointF> gasLine;               ///< force-displacement only

  bool empty() const { return loops.empty() && bands.empty(); }
};

/// The figure of a measurement, with the limits of a verdict's force checks where there is one.
/// A limit on the force without gas is drawn with the gas force added, because the loops hold it.
LoopFigure loopFigure(FigureKind kind, const Measurement& measurement, const Verdict* verdict);

QString figureTitle(FigureKind kind);
QString figureXTitle(FigureKind kind);  ///< quantity, unit and direction in words
QString figureYTitle();
QString figureEmptyText(FigureKind kind);  ///< what will stand there
/// The figure in words, for those who do not see it.
QString figureSummary(const LoopFigure& figure);

/// A few words that name a line where it stands. `at` is the middle of their lower edge.
struct LoopLabel {
  QPointF at;
  QString text;
};

/// The speeds of the loops, each above the top of its loop; left out where the next loop is nearer
/// than `gap` newtons. Nothing for force-velocity, whose axis says the speed.
std::vector<LoopLabel> speedLabels(const LoopFigure& figure, double gap);

/// Scale that holds a figure's x values and zero.
AxisScale xScale(const LoopFigure& figure);
/// One force scale for figures that stand side by side at the same height.
AxisScale commonForceScale(std::initializer_list<const LoopFigure*> figures);

}  // namespace dampwright
