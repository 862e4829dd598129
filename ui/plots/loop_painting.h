// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPainter>
#include <QRectF>

#include "ui/plots/loop_figure.h"

namespace dampwright {

/// How a figure is put on paper. Lengths are in the painter's own units, so that the sheet may
/// count in millimetres, points or pixels as it likes.
struct PaperStyle {
  double text = 2.9;      ///< em of tick labels and axis titles; the title is bold of the same size
  double millimetre = 1;  ///< one millimetre on paper
};

/// Paints title, axes, limit band, loops, curve points and labels into `area`, always in
/// printPalette() and without transparency, so that PDF, printer and preview look the same and a
/// photocopy keeps every line. At most 20,000 vertices however many loops there are. Both figures
/// painted into areas of one size with one `force` scale have the same axis rectangle.
void paintLoopFigure(QPainter& painter,
                     const QRectF& area,
                     const LoopFigure& figure,
                     const AxisScale& force,
                     const PaperStyle& style);

/// Every `stride`-th point of each loop (ends kept) holds the figure under that many vertices.
int loopStride(const LoopFigure& figure, int mostVertices);

}  // namespace dampwright
