// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/check_table.h"

#include <QCoreApplication>
#include <QPen>
#include <algorithm>
#include <array>

#include "ui/look/margin_bar.h"
#include "ui/look/palette.h"
#include "ui/look/stamp.h"
#include "ui/text/check_text.h"
#include "ui/text/names.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

bool isOpen(const CheckVerdict& check, Finality finality) {
  return finality == Finality::Waiting && check.check.direction.has_value();
}

enum Column { Asked, Target, LimitColumn, Measured, K, Margin, Bar, VerdictColumn, Columns };

constexpr double cellGap = 2.8;  // mm between columns
constexpr double points = 8;
constexpr double markWidth = 4;  // mm, left of the verdict word

struct Frame {
  std::array<double, Columns> left{}, width{};
};

using Texts = std::array<QString, Columns>;

Texts headTexts() {
  return {Sheet::tr("Check"),
          Sheet::tr("Target"),
          Sheet::tr("Limits"),
          Sheet::tr("Measured ± U"),
          Sheet::tr("k"),
          Sheet::tr("Margin"),
          QString(),
          Sheet::tr("Verdict")};
}

Texts textsOf(const CheckVerdict& check, Finality finality) {
  const CheckText text = checkText(check);
  return {text.title,
          text.target,
          text.limits,
          text.measured,
          text.coverage.section(QChar(0x00A0), -1),
          text.margin,
          QString(),
          shownVerdictName(check, finality)};
}

// Widest a column may get before its texts wrap; the first takes what is left.
constexpr std::array<double, Columns> mostWidth = {0, 25, 26, 31, 10, 19, 19, 17};

// Columns as wide as their widest text; a column without any text is left out.
Frame frameOf(const Verdict& verdict, Finality finality, double width) {
  Frame frame;
  for (const CheckVerdict& check : verdict.checks) {
    const Texts texts = textsOf(check, finality);
    for (int column = Target; column < Columns; ++column) {
      if (texts[column].isEmpty()) continue;
      const double natural = std::max(textWidth(texts[column], paperText(points)),
                                      textWidth(headTexts()[column], paperQuiet(points)));
      frame.width[column] = std::clamp(natural + 0.3, frame.width[column], mostWidth[column]);
    }
  }
  frame.width[Bar] = mostWidth[Bar];
  frame.width[VerdictColumn] += markWidth;
  double used = 0;
  for (const double column : frame.width) used += column > 0 ? column + cellGap : 0;
  frame.width[Asked] = width - used;
  double left = 0;
  for (int column = 0; column < Columns; ++column) {
    frame.left[column] = left;
    if (frame.width[column] > 0) left += frame.width[column] + cellGap;
  }
  return frame;
}

using Cells = std::array<QStringList, Columns>;

Cells cellsOf(const Texts& texts, const Frame& frame, const TextStyle& style) {
  Cells cells;
  for (int column = 0; column < Columns; ++column) {
    if (frame.width[column] <= 0 || texts[column].isEmpty()) continue;
    const double mark = column == VerdictColumn ? markWidth : 0;
    cells[column] = wrapped(texts[column], frame.width[column] - mark, style);
  }
  return cells;
}

double heightOf(const Cells& cells, const TextStyle& style) {
  qsizetype lines = 1;
  for (const QStringList& cell : cells) lines = std::max(lines, cell.size());
  return lineHeight(style) * static_cast<double>(lines) + 1.3;
}

bool isFigure(int column) {
  return column == Target || column == LimitColumn || column == Measured || column == Margin ||
         column == K;
}

void paintCells(QPainter& painter,
                const QRectF& box,
                const Frame& frame,
                const Cells& cells,
                const TextStyle& style) {
  for (int column = 0; column < Columns; ++column) {
    const double step = lineHeight(style);
    const auto lines = static_cast<double>(cells[column].size());
    double y = box.center().y() - step * lines / 2;
    const double mark = column == VerdictColumn ? markWidth : 0;
    for (const QString& line : cells[column]) {
      drawText(painter,
               {box.left() + frame.left[column] + mark, y, frame.width[column] - mark, step},
               line,
               style,
               (isFigure(column) ? Qt::AlignRight : Qt::AlignLeft) | Qt::AlignVCenter);
      y += step;
    }
  }
}

void rule(QPainter& painter, const QRectF& box, const QColor& colour) {
  painter.setPen(QPen(colour, hairlineMm));
  painter.drawLine(box.bottomLeft(), box.bottomRight());
}

SheetBlock headBlock(const Frame& frame) {
  const TextStyle style = paperQuiet(points);
  const Cells cells = cellsOf(headTexts(), frame, style);
  const auto paint = [frame, cells, style](QPainter& painter, const QRectF& box) {
    paintCells(painter, box, frame, cells, style);
    rule(painter, box, printPalette().ink);
  };
  return {heightOf(cells, style), paint, true, {}, false};
}

SheetBlock rowBlock(const CheckVerdict& check, Finality finality, const Frame& frame) {
  const TextStyle style = paperText(points);
  const VerdictWord word = shownVerdict(check, finality);
  const Cells cells = cellsOf(textsOf(check, finality), frame, style);
  const double height = heightOf(cells, style);
  const auto paint = [=](QPainter& painter, const QRectF& box) {
    paintCells(painter, box, frame, cells, style);
    paintMarginBar(painter,
                   {box.left() + frame.left[Bar], box.center().y() - 1.7, frame.width[Bar], 3.4},
                   check,
                   printPalette());
    paintMark(painter,
              {box.left() + frame.left[VerdictColumn], box.center().y() - 1.4, 2.8, 2.8},
              word,
              printPalette().ink);
    rule(painter, box, printPalette().hairline);
  };
  return {height, paint, false, {}, false};
}

}  // namespace

VerdictWord shownVerdict(const CheckVerdict& check, Finality finality) {
  return isOpen(check, finality) ? VerdictWord::NotTested : check.verdict;
}

QString shownVerdictName(const CheckVerdict& check, Finality finality) {
  return isOpen(check, finality) ? Sheet::tr("waits") : verdictName(check.verdict);
}

SheetSection checkTable(const Verdict& verdict, Finality finality, double width) {
  const Frame frame = frameOf(verdict, finality, width);
  const auto head = std::make_shared<const SheetBlock>(headBlock(frame));
  SheetSection section;
  section.push_back(*head);
  for (const CheckVerdict& check : verdict.checks) {
    section.push_back(rowBlock(check, finality, frame));
    section.back().repeat = head;
  }
  section.push_back(space(1.2));
  return section;
}

}  // namespace dampwright
