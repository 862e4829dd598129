// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/stamp.h"

#include <QPainterPath>
#include <QPen>
#include <QStringList>
#include <algorithm>

#include "ui/look/type.h"

namespace dampwright {

namespace {

// How the words and the mark sit in a stamp, for one way of breaking the words.
struct Setting {
  QStringList lines;
  double size = 0;   // em
  double width = 0;  // of the widest line
};

constexpr double markPerEm = 0.95;  // side of the mark's box
constexpr double gapPerEm = 0.35;

Setting fitted(const QStringList& lines, const QRectF& inside, double mostSize) {
  Setting setting{lines, mostSize, 0};
  double perEm = 0;
  for (const QString& line : lines) perEm = std::max(perEm, textWidth(line, {1, true, {}}));
  const double widest = inside.width() / (perEm + markPerEm + gapPerEm);
  const double tallest = inside.height() / (1.15 * static_cast<double>(lines.size()));
  setting.size = std::min({mostSize, widest, tallest});
  setting.width = perEm * setting.size;
  return setting;
}

// Breaks at the blank that makes the two lines most alike in width.
QStringList inTwo(const QString& words) {
  QStringList best;
  double least = 0;
  for (qsizetype at = words.indexOf(QLatin1Char(' ')); at > 0;
       at = words.indexOf(QLatin1Char(' '), at + 1)) {
    const QStringList lines{words.left(at), words.mid(at + 1)};
    const double widest =
        std::max(textWidth(lines[0], {1, true, {}}), textWidth(lines[1], {1, true, {}}));
    if (best.isEmpty() || widest < least) {
      best = lines;
      least = widest;
    }
  }
  return best;
}

Setting bestSetting(const QString& words, const QRectF& inside) {
  const Setting one = fitted({words}, inside, 0.52 * inside.height());
  const QStringList halves = inTwo(words);
  if (halves.isEmpty()) return one;
  const Setting two = fitted(halves, inside, 0.52 * inside.height());
  return two.size > one.size ? two : one;
}

QPen framePen(VerdictWord verdict, double thickness, const Palette& palette) {
  QPen pen(palette.ink, thickness);
  pen.setJoinStyle(Qt::MiterJoin);
  pen.setCapStyle(Qt::FlatCap);
  if (verdict == VerdictWord::TooCloseToCall) pen.setDashPattern({4, 2.4});
  if (verdict == VerdictWord::NotTested) {
    pen.setColor(palette.quiet);
    pen.setCapStyle(Qt::RoundCap);
    pen.setDashPattern({0.01, 2.4});
  }
  return pen;
}

QPainterPath markPath(VerdictWord verdict) {  // in the unit square, y downwards
  QPainterPath path;
  switch (verdict) {
    case VerdictWord::Pass:
      path.moveTo(0.12, 0.55);
      path.lineTo(0.38, 0.82);
      path.lineTo(0.88, 0.18);
      break;
    case VerdictWord::Fail:
      path.moveTo(0.17, 0.17);
      path.lineTo(0.83, 0.83);
      path.moveTo(0.83, 0.17);
      path.lineTo(0.17, 0.83);
      break;
    case VerdictWord::TooCloseToCall:
      for (const double y : {0.36, 0.66}) {
        path.moveTo(0.1, y + 0.06);
        path.cubicTo(0.32, y - 0.24, 0.62, y + 0.24, 0.9, y - 0.08);
      }
      break;
    case VerdictWord::NotTested:
      path.moveTo(0.18, 0.5);
      path.lineTo(0.82, 0.5);
      break;
  }
  return path;
}

void paintWords(QPainter& painter,
                const QRectF& inside,
                const Setting& setting,
                const QColor& colour,
                VerdictWord verdict) {
  const double mark = markPerEm * setting.size;
  const double gap = gapPerEm * setting.size;
  const double left = inside.center().x() - (mark + gap + setting.width) / 2;
  paintMark(painter, {left, inside.center().y() - mark / 2, mark, mark}, verdict, colour);
  const double step = 1.15 * setting.size;
  double top = inside.center().y() - step * static_cast<double>(setting.lines.size()) / 2;
  for (const QString& line : setting.lines) {
    drawText(
        painter, {left + mark + gap, top, setting.width, step}, line, {setting.size, true, colour});
    top += step;
  }
}

}  // namespace

void paintMark(QPainter& painter, const QRectF& box, VerdictWord verdict, const QColor& colour) {
  const double side = std::min(box.width(), box.height());
  painter.save();
  painter.setRenderHint(QPainter::Antialiasing);
  painter.translate(box.center() - QPointF(side / 2, side / 2));
  painter.scale(side, side);
  painter.setBrush(Qt::NoBrush);
  painter.setPen(QPen(colour, 0.15, Qt::SolidLine, Qt::FlatCap, Qt::MiterJoin));
  painter.drawPath(markPath(verdict));
  painter.restore();
}

void paintStamp(QPainter& painter,
                const QRectF& frame,
                VerdictWord verdict,
                const QString& words,
                const Palette& palette) {
  const double thickness =
      std::clamp(0.055 * frame.height(), 0.035 * frame.width() / 4, 0.08 * frame.height());
  const QRectF line = frame.adjusted(thickness / 2, thickness / 2, -thickness / 2, -thickness / 2);
  const double round = 0.12 * frame.height();
  const bool solid = verdict == VerdictWord::Fail;
  painter.save();
  painter.setRenderHint(QPainter::Antialiasing);
  painter.setPen(framePen(verdict, thickness, palette));
  painter.setBrush(solid ? palette.ink : palette.card);
  painter.drawRoundedRect(line, round, round);
  painter.restore();
  const double inset = thickness + 0.1 * frame.height();
  const QRectF inside = frame.adjusted(inset * 1.4, inset, -inset * 1.4, -inset);
  const QColor colour = solid                               ? palette.card
                        : verdict == VerdictWord::NotTested ? palette.quiet
                                                            : palette.ink;
  paintWords(painter, inside, bestSetting(words.toUpper(), inside), colour, verdict);
}

}  // namespace dampwright
