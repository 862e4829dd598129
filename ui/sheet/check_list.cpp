// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/check_list.h"

#include <QCoreApplication>
#include <QPen>
#include <algorithm>

#include "ui/look/margin_bar.h"
#include "ui/look/palette.h"
#include "ui/look/stamp.h"
#include "ui/text/check_text.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

constexpr double points = 7.5;
constexpr double barWidth = 18, markWidth = 7, gap = 1.5;  // mm
constexpr double padding = 0.4;                            // mm above and below a row's lines
constexpr Qt::Alignment centred = Qt::AlignHCenter | Qt::AlignVCenter;

struct Row {
  CheckVerdict check;
  VerdictWord word;
  QStringList title, figures;
  QString margin, coverage;

  double height() const {
    return lineHeight(paperText(points)) * static_cast<double>(title.size() + figures.size()) +
           2 * padding;
  }
};

// The narrow columns at the right: bar and margin, mark and k.
QRectF barColumn(const QRectF& line) {
  return {line.right() - markWidth - gap - barWidth, line.top(), barWidth, line.height()};
}

QRectF markColumn(const QRectF& line) {
  return {line.right() - markWidth, line.top(), markWidth, line.height()};
}

QString figuresOf(const CheckText& text) {
  QString line =
      text.limits.isEmpty() ? text.measured : Sheet::tr("%1 of %2").arg(text.measured, text.limits);
  if (!text.target.isEmpty()) line += Sheet::tr(" (target %1)").arg(text.target);
  return line;
}

Row rowOf(const CheckVerdict& check, Finality finality, double width) {
  const CheckText text = checkText(check);
  const double room = width - barWidth - markWidth - 2 * gap;
  QString title = text.title;
  if (check.verdict != VerdictWord::Pass || shownVerdict(check, finality) != check.verdict) {
    title += QStringLiteral(" –\u00A0") + shownVerdictName(check, finality);
  }
  return {check,
          shownVerdict(check, finality),
          wrapped(title, room, paperBold(points)),
          wrapped(figuresOf(text), room, paperText(points)),
          text.margin,
          text.coverage.section(QChar(0x00A0), -1)};
}

void paintRow(QPainter& painter, const QRectF& box, const Row& row) {
  const double step = lineHeight(paperText(points));
  const QRectF first(box.left(), box.top() + padding, box.width(), step);
  QRectF line = first;
  for (const QString& words : row.title) {
    drawText(painter, line, words, paperBold(points));
    line.translate(0, step);
  }
  for (const QString& words : row.figures) {
    drawText(painter, line, words, paperText(points));
    line.translate(0, step);
  }
  const QRectF second = first.translated(0, step);
  paintMarginBar(painter, barColumn(first), row.check, printPalette());
  drawText(painter, barColumn(second), row.margin, paperText(points), centred);
  paintMark(painter, markColumn(first), row.word, printPalette().ink);
  drawText(painter, markColumn(second), row.coverage, paperText(points), centred);
  painter.setPen(QPen(printPalette().hairline, hairlineMm));
  painter.drawLine(box.bottomLeft(), box.bottomRight());
}

void paintHead(QPainter& painter, const QRectF& line) {
  const TextStyle style = paperQuiet(points);
  drawText(painter, line, Sheet::tr("Measured ± U of limits"), style);
  drawText(painter, barColumn(line), Sheet::tr("Margin"), style, centred);
  drawText(painter, markColumn(line), Sheet::tr("k"), style, centred);
  painter.setPen(QPen(printPalette().ink, hairlineMm));
  painter.drawLine(line.bottomLeft(), line.bottomRight());
}

}  // namespace

SheetBlock checkList(const Verdict& verdict, Finality finality, double width) {
  const double head = lineHeight(paperQuiet(points)) + 0.8;
  double height = head;
  std::vector<Row> rows;
  for (const CheckVerdict& check : verdict.checks) {
    rows.push_back(rowOf(check, finality, width));
    height += rows.back().height();
  }
  const auto paint = [rows, head](QPainter& painter, const QRectF& box) {
    paintHead(painter, {box.left(), box.top(), box.width(), head});
    double y = box.top() + head;
    for (const Row& row : rows) {
      paintRow(painter, {box.left(), y, box.width(), row.height()}, row);
      y += row.height();
    }
  };
  return {height, paint, true, {}, false};
}

}  // namespace dampwright
