// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/paper.h"

#include <QLocale>
#include <QPen>
#include <algorithm>
#include <iterator>
#include <numeric>

#include "core/base/expects.h"
#include "ui/look/palette.h"

namespace dampwright {

namespace {

constexpr double marginX = 14, marginY = 10;  // mm; printers leave up to 6 mm white
constexpr double headHeight = 12.4, footHeight = 9;

TextStyle style(double points, const QColor& colour, bool bold) {
  expects(points >= smallestPoints);
  return {points * 25.4 / 72, bold, colour};
}

}  // namespace

PaperFormat paperFormat(PaperSize size) {
  PaperFormat format;
  format.size = size == PaperSize::A4 ? QSizeF(210, 297) : QSizeF(215.9, 279.4);
  const double width = format.size.width() - 2 * marginX;
  const double bottom = format.size.height() - marginY;
  format.head = {marginX, marginY, width, headHeight};
  format.foot = {marginX, bottom - footHeight, width, footHeight};
  format.body = {marginX, format.head.bottom(), width, format.foot.top() - format.head.bottom()};
  return format;
}

QPageSize::PageSizeId pageSizeId(PaperSize size) {
  return size == PaperSize::A4 ? QPageSize::A4 : QPageSize::Letter;
}

PaperSize usualPaperSize() {
  switch (QLocale::system().territory()) {
    case QLocale::UnitedStates:
    case QLocale::Canada:
    case QLocale::Mexico:
    case QLocale::Philippines:
    case QLocale::PuertoRico:
      return PaperSize::Letter;
    default:
      return PaperSize::A4;
  }
}

TextStyle paperText(double points) { return style(points, printPalette().ink, false); }

TextStyle paperBold(double points) { return style(points, printPalette().ink, true); }

TextStyle paperQuiet(double points) { return style(points, printPalette().quiet, false); }

double heightOf(const SheetSection& section) {
  return std::accumulate(section.begin(), section.end(), 0.0, [](double sum, const SheetBlock& b) {
    return sum + b.height;
  });
}

SheetBlock space(double height) { return {height, {}, false, {}, false}; }

SheetBlock hairline(double above, double below) {
  const auto paint = [above](QPainter& painter, const QRectF& box) {
    painter.setPen(QPen(printPalette().bandOutline, hairlineMm));
    const double y = box.top() + above;
    painter.drawLine(QPointF(box.left(), y), QPointF(box.right(), y));
  };
  return {above + below, paint, false, {}, false};
}

SheetSection paragraph(const QString& text, double width, const TextStyle& style) {
  SheetSection section;
  for (const QString& line : wrapped(text, width, style)) {
    const auto paint = [line, style](QPainter& painter, const QRectF& box) {
      drawText(painter, box, line, style);
    };
    section.push_back({lineHeight(style), paint, false, {}, false});
  }
  if (section.size() > 1) {
    section.front().keepWithNext = true;
    section[section.size() - 2].keepWithNext = true;
  }
  return section;
}

double halfOf(double width) {
  constexpr double gap = 5;  // mm
  return (width - gap) / 2;
}

SheetBlock beside(const SheetSection& left, const SheetSection& right) {
  const auto paintStack = [](QPainter& painter, QRectF box, const SheetSection& stack) {
    for (const SheetBlock& block : stack) {
      box.setHeight(block.height);
      painter.save();
      if (block.paint) block.paint(painter, box);
      painter.restore();
      box.translate(0, block.height);
    }
  };
  const auto paint = [=](QPainter& painter, const QRectF& box) {
    const double half = halfOf(box.width());
    paintStack(painter, {box.left(), box.top(), half, box.height()}, left);
    paintStack(painter, {box.right() - half, box.top(), half, box.height()}, right);
  };
  return {std::max(heightOf(left), heightOf(right)), paint, false, {}, false};
}

void append(SheetSection& section, SheetSection more) {
  section.insert(
      section.end(), std::make_move_iterator(more.begin()), std::make_move_iterator(more.end()));
}

}  // namespace dampwright
