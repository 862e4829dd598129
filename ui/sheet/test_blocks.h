// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QStringList>
#include <array>
#include <memory>
#include <vector>

#include "ui/plots/loop_figure.h"
#include "ui/sheet/check_table.h"
#include "ui/sheet/paper.h"
#include "ui/sheet/sheet_content.h"

namespace dampwright {

// The pieces that the part of one test is made of, on the whole width of a page or on half of it.

/// Force-velocity and force-displacement.
using Figures = std::array<LoopFigure, 2>;

/// One test, or a damper that was received and not tested (`phase` is null then). Points into the
/// content, which must outlive it.
struct SheetTest {
  const SheetItem* item = nullptr;
  const SheetPhase* phase = nullptr;
  std::shared_ptr<const Figures> figures;  ///< null where nothing was measured
};

/// All of a sheet, in its order.
std::vector<SheetTest> testsOf(const SheetContent& content);

SheetBlock separator();
/// Place and serial, identity, which test and how it came out in a sentence; the stamp right.
SheetBlock testHeading(const SheetTest& test, double width);
/// What must be confirmed before the verdict stands, in a frame.
SheetSection waitingFrame(const SheetPhase& phase, double width);
SheetSection sentences(const QStringList& lines, double width, const TextStyle& style);
/// A short list to tick by hand, and a line to write on.
SheetBlock visualCheck(double width);

Finality finalityOf(const SheetPhase& phase);

void paintFigure(QPainter& painter,
                 const QRectF& box,
                 const LoopFigure& figure,
                 const AxisScale& force);

}  // namespace dampwright
