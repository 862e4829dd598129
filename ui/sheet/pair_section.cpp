// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/pair_section.h"

#include "ui/sheet/pair_table.h"
#include "ui/sheet/test_words.h"

namespace dampwright {

namespace {

std::string axleOf(const std::string& corner) { return corner.substr(0, corner.find(' ')); }

// The conditions of one test as running text.
QString conditionsText(const SheetPhase& phase, const CommonConditions& common) {
  QStringList parts;
  for (const auto& [label, text] : joined(ownConditions(phase, common)))
    parts << label + QStringLiteral(": ") + text;
  return parts.isEmpty() ? QString() : parts.join(QStringLiteral(". ")) + QLatin1Char('.');
}

SheetBlock plotsBlock(const SheetTest& left, const SheetTest& right, double plotHeight) {
  constexpr double gap = 1;  // mm
  const auto paint = [l = left.figures, r = right.figures, plotHeight](QPainter& painter,
                                                                       const QRectF& box) {
    const AxisScale force = commonForceScale({&(*l)[0], &(*l)[1], &(*r)[0], &(*r)[1]});
    const double half = halfOf(box.width());
    double y = box.top();
    for (const std::size_t kind : {0, 1}) {
      paintFigure(painter, {box.left(), y, half, plotHeight}, (*l)[kind], force);
      paintFigure(painter, {box.right() - half, y, half, plotHeight}, (*r)[kind], force);
      y += plotHeight + gap;
    }
  };
  return {2 * (plotHeight + gap) + 0.8, paint, true, {}, false};
}

// Reasons and remarks; what is so of both is said once, all else under the name of its side.
QStringList noteWords(const SheetTest& left, const SheetTest& right) {
  const auto wordsOf = [](const SheetTest& test) {
    return reasonWords(*test.phase) + remarkWords(*test.phase);
  };
  const QStringList ofLeft = wordsOf(left), ofRight = wordsOf(right);
  QStringList lines;
  for (const QString& line : ofLeft) {
    lines << (ofRight.contains(line) ? line : sideName(left, right) + QStringLiteral(": ") + line);
  }
  for (const QString& line : ofRight) {
    if (!ofLeft.contains(line)) lines << sideName(right, left) + QStringLiteral(": ") + line;
  }
  return lines;
}

SheetSection below(const SheetPhase& phase, const CommonConditions& common, double half) {
  SheetSection stack = paragraph(conditionsText(phase, common), half, paperQuiet(smallestPoints));
  stack.push_back(space(0.6));
  stack.push_back(visualCheck(half));
  return stack;
}

SheetSection waitingOf(const SheetPhase& phase, double half) {
  return waits(phase) ? waitingFrame(phase, half) : SheetSection{};
}

}  // namespace

bool belongTogether(const SheetTest& left, const SheetTest& right) {
  if (left.phase == nullptr || right.phase == nullptr) return false;
  if (!left.phase->measured || !right.phase->measured) return false;
  const bool near =
      left.item == right.item || axleOf(left.item->corner) == axleOf(right.item->corner);
  const auto &a = left.phase->verdict, &b = right.phase->verdict;
  return near && a.has_value() == b.has_value() && (!a || sameChecks(*a, *b));
}

SheetSection pairSection(const SheetTest& left,
                         const SheetTest& right,
                         double plotHeight,
                         const CommonConditions& common,
                         double width) {
  const double half = halfOf(width);
  SheetSection section = {separator(),
                          beside({testHeading(left, half)}, {testHeading(right, half)})};
  section.back().keepWithNext = true;
  if (waits(*left.phase) || waits(*right.phase)) {
    section.push_back(beside(waitingOf(*left.phase, half), waitingOf(*right.phase, half)));
    section.back().keepWithNext = true;
  }
  section.push_back(plotsBlock(left, right, plotHeight));
  if (left.phase->verdict) append(section, pairTable(left, right, width));
  append(section, sentences(noteWords(left, right), width, paperText(smallestPoints)));
  section.push_back(space(0.8));
  section.push_back(beside(below(*left.phase, common, half), below(*right.phase, common, half)));
  section.push_back(space(2));
  return section;
}

}  // namespace dampwright
