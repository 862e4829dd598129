// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/closing_section.h"

#include <QCoreApplication>
#include <QPen>

#include "ui/look/palette.h"
#include "ui/text/cautions.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

QString scope() {
  return Sheet::tr(
      "A bench verdict is not a roadworthiness certificate. The damper maker's data, local rules "
      "and licensed inspection come first.");
}

QString reading() {
  return Sheet::tr(
      "U is the expanded uncertainty: k times the combined standard uncertainty, about 95 % "
      "coverage. "
      "Verdicts are made on unrounded figures. Margin: distance to the nearer limit, positive "
      "inside, "
      "U not taken off. Forces count in the direction that resists the motion.");
}

SheetBlock cautionBox(double width) {
  const TextStyle title = paperBold(8), text = paperText(7.5);
  const QStringList lines = wrapped(cautions().join(QLatin1Char(' ')), width - 6, text);
  const double height =
      3 + lineHeight(title) + lineHeight(text) * static_cast<double>(lines.size());
  const auto paint = [=](QPainter& painter, const QRectF& box) {
    painter.setPen(QPen(printPalette().ink, 0.35));
    painter.drawRect(box.adjusted(0.2, 0.2, -0.2, -0.2));
    QRectF line(box.left() + 3, box.top() + 1.4, box.width() - 6, lineHeight(title));
    drawText(painter, line, Sheet::tr("Cautions"), title);
    line.translate(0, lineHeight(title));
    for (const QString& words : lines) {
      line.setHeight(lineHeight(text));
      drawText(painter, line, words, text);
      line.translate(0, lineHeight(text));
    }
  };
  return {height, paint, false, {}, false};
}

SheetBlock signatures(const SheetContent& content) {
  const QString technician = QString::fromStdString(content.job.technician);
  const auto paint = [technician](QPainter& painter, const QRectF& box) {
    const TextStyle label = paperQuiet(8), words = paperText(8.5);
    const double width = (box.width() - 12) / 3;
    double x = box.left();
    const auto line = [&](const QString& below, const QString& above) {
      const double y = box.bottom() - 4.6;
      drawText(painter, {x, y - 4.6, width, 4.4}, elided(above, width, words), words);
      painter.setPen(QPen(printPalette().ink, hairlineMm));
      painter.drawLine(QPointF(x, y), QPointF(x + width, y));
      drawText(painter, {x, y + 0.5, width, 4}, below, label);
      x += width + 6;
    };
    line(Sheet::tr("Tested by"), technician);
    line(Sheet::tr("Authorised by (name and signature)"), {});
    line(Sheet::tr("Date"), {});
  };
  return {12.4, paint, false, {}, false};
}

}  // namespace

SheetSection closingSection(const SheetContent& content, double width) {
  SheetSection section;
  section.push_back(hairline(0, 1.4));
  if (!content.job.notes.empty()) {
    append(section,
           paragraph(Sheet::tr("Notes: %1").arg(QString::fromStdString(content.job.notes)),
                     width,
                     paperText(8.5)));
    section.push_back(space(1));
  }
  append(section, paragraph(scope(), width, paperBold(8)));
  append(section, paragraph(reading(), width, paperQuiet(7.5)));
  section.push_back(space(1.4));
  section.push_back(cautionBox(width));
  section.push_back(signatures(content));
  return section;
}

}  // namespace dampwright
