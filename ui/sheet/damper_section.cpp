// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/damper_section.h"

#include <algorithm>

#include "ui/sheet/check_list.h"
#include "ui/sheet/check_table.h"
#include "ui/sheet/labelled_grid.h"
#include "ui/sheet/test_words.h"

namespace dampwright {

namespace {

void paintFigures(QPainter& painter, const QRectF& box, const Figures& figures) {
  const AxisScale force = commonForceScale({&figures[0], &figures[1]});
  const double width = (box.width() - 4) / 2;
  paintFigure(painter, {box.left(), box.top(), width, box.height()}, figures[0], force);
  paintFigure(painter, {box.right() - width, box.top(), width, box.height()}, figures[1], force);
}

SheetBlock plotsBlock(const SheetTest& test, double height) {
  const auto paint = [figures = test.figures](QPainter& painter, const QRectF& box) {
    paintFigures(painter, box, *figures);
  };
  return {height, paint, true, {}, false};
}

SheetBlock plotsBesideChecks(const SheetTest& test, double height, double width) {
  const SheetPhase& phase = *test.phase;
  constexpr double listWidth = 74, gap = 4;  // mm
  const SheetBlock list = checkList(*phase.verdict, finalityOf(phase), listWidth);
  const double plots = width - listWidth - gap;
  const double tall = std::max(height, list.height);
  const auto paint = [=, figures = test.figures](QPainter& painter, const QRectF& box) {
    paintFigures(painter, {box.left(), box.top(), plots, tall}, *figures);
    list.paint(painter, {box.right() - listWidth, box.top(), listWidth, list.height});
  };
  return {tall, paint, true, {}, false};
}

void addFigures(
    SheetSection& section, const SheetTest& test, Checks checks, double plotHeight, double width) {
  const SheetPhase& phase = *test.phase;
  const bool beside = checks == Checks::Beside && phase.verdict;
  section.push_back(beside ? plotsBesideChecks(test, plotHeight, width)
                           : plotsBlock(test, plotHeight));
  section.push_back(space(1));
  section.back().keepWithNext = true;
  if (phase.verdict && !beside)
    append(section, checkTable(*phase.verdict, finalityOf(phase), width));
}

}  // namespace

SheetSection testSection(const SheetTest& test,
                         Checks checks,
                         double plotHeight,
                         const CommonConditions& common,
                         double width) {
  SheetSection section = {separator(), testHeading(test, width)};
  if (test.phase != nullptr && test.phase->measured) {
    const SheetPhase& phase = *test.phase;
    if (waits(phase)) append(section, waitingFrame(phase, width));
    addFigures(section, test, checks, plotHeight, width);
    append(section, sentences(reasonWords(phase), width, paperText(8)));
    append(section, sentences(remarkWords(phase), width, paperText(8)));
    section.push_back(space(0.8));
    append(section, labelledGrid(joined(ownConditions(phase, common)), width, 1, 20, 7.5));
  } else if (test.phase != nullptr) {
    append(section, sentences(problemWords(*test.phase), width, paperText(8.5)));
  }
  section.push_back(visualCheck(width));
  section.push_back(space(2));
  return section;
}

}  // namespace dampwright
