// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/page_head.h"

#include <QCoreApplication>
#include <QPen>

#include "ui/look/palette.h"
#include "ui/sheet/paper.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

void paintWorkshop(QPainter& painter, const QRectF& box, const Workshop& workshop) {
  const QRectF first(box.left(), box.top(), box.width(), 5.4);
  if (!workshop.name.isEmpty()) {
    const TextStyle name = paperBold(11);
    drawText(painter, first, elided(workshop.name, box.width(), name), name);
    const TextStyle address = paperQuiet(8);
    const QString line = QString(workshop.address).replace(QLatin1Char('\n'), QStringLiteral(", "));
    drawText(painter,
             {box.left(), first.bottom(), box.width(), 4},
             elided(line, box.width(), address),
             address);
    return;
  }
  const TextStyle label = paperQuiet(8);
  const QString words = Sheet::tr("Workshop");
  drawText(painter, {box.left(), box.top() + 2.6, box.width(), 4}, words, label);
  painter.setPen(QPen(printPalette().quiet, hairlineMm));
  const double y = box.top() + 6.4;
  painter.drawLine(QPointF(box.left() + textWidth(words, label) + 2, y), QPointF(box.right(), y));
}

void paintInventedMark(QPainter& painter, const QRectF& box) {
  const TextStyle style = paperBold(8);
  const QString words = Sheet::tr("Invented demonstration data");
  const double width = textWidth(words, style) + 5;
  const QRectF frame(box.right() - width, box.top() + 0.6, width, 5.6);
  painter.setPen(QPen(printPalette().ink, 0.35));
  painter.setBrush(Qt::NoBrush);
  painter.drawRect(frame);
  drawText(painter, frame, words, style, Qt::AlignCenter);
}

}  // namespace

QString jobName(const Job& job) {
  if (job.number.empty()) return Sheet::tr("No job number");
  return Sheet::tr("Job %1").arg(QString::fromStdString(job.number));
}

void paintPageHead(
    QPainter& painter, const QRectF& box, const SheetContent& content, int page, int pages) {
  const double jobWidth = 0.26 * box.width(), markWidth = 0.28 * box.width();
  const QRectF right(box.right() - jobWidth, box.top(), jobWidth, 5.4);
  const TextStyle bold = paperBold(11);
  drawText(painter,
           right,
           elided(jobName(content.job), jobWidth, bold, Qt::ElideMiddle),
           bold,
           Qt::AlignRight | Qt::AlignVCenter);
  drawText(painter,
           right.translated(0, 5.0),
           Sheet::tr("Page %1 of %2").arg(page).arg(pages),
           paperQuiet(8),
           Qt::AlignRight | Qt::AlignVCenter);
  paintWorkshop(painter,
                {box.left(), box.top(), box.width() - jobWidth - markWidth - 4, box.height()},
                content.workshop);
  if (content.job.invented) {
    paintInventedMark(painter, {right.left() - markWidth - 2, box.top(), markWidth, box.height()});
  }
  painter.setPen(QPen(printPalette().ink, hairlineMm));
  painter.drawLine(QPointF(box.left(), box.top() + 10.6), QPointF(box.right(), box.top() + 10.6));
}

void paintPageFoot(
    QPainter& painter, const QRectF& box, const SheetContent& content, int page, int pages) {
  painter.setPen(QPen(printPalette().bandOutline, hairlineMm));
  painter.drawLine(QPointF(box.left(), box.top() + 1.6), QPointF(box.right(), box.top() + 1.6));
  const TextStyle style = paperQuiet(7.5);
  const QRectF first(box.left(), box.top() + 2, box.width(), 3.4);
  drawText(painter,
           first,
           Sheet::tr("These results relate only to the items tested, in the condition tested."),
           style);
  drawText(painter,
           first.translated(0, 3.4),
           QStringLiteral("Dampwright " DAMPWRIGHT_VERSION ", ") + jobName(content.job),
           style);
  drawText(
      painter,
      first,
      page == pages ? Sheet::tr("End of sheet") : Sheet::tr("Continued on page %1").arg(page + 1),
      page == pages ? paperBold(7.5) : style,
      Qt::AlignRight | Qt::AlignVCenter);
  drawText(painter,
           first.translated(0, 3.4),
           Sheet::tr("Not to be copied except in full"),
           style,
           Qt::AlignRight | Qt::AlignVCenter);
}

}  // namespace dampwright
