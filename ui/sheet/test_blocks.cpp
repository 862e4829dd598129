// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/test_blocks.h"

#include <QCoreApplication>
#include <QPen>
#include <algorithm>

#include "ui/look/palette.h"
#include "ui/look/stamp.h"
#include "ui/plots/loop_painting.h"
#include "ui/sheet/test_words.h"
#include "ui/text/check_text.h"
#include "ui/text/names.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

constexpr double narrow = 120;  // mm: below that a test has half a page

QString nameOf(const SheetItem& item) {
  return cornerName(item.corner) + QStringLiteral(" · ") + damperName(item.damper);
}

QString identityOf(const SheetItem& item) {
  const DamperCard& damper = item.damper;
  QStringList parts;
  const auto add = [&parts](const QString& label, const std::string& value) {
    if (!value.empty()) parts << label.arg(QString::fromStdString(value));
  };
  add(Sheet::tr("Serial %1"), damper.serial);
  add(Sheet::tr("part number %1"), damper.partNumber);
  add(QStringLiteral("%1"), damper.kind);
  if (damper.position != item.corner) add(Sheet::tr("position %1"), damper.position);
  if (parts.isEmpty()) parts << Sheet::tr("No serial and no part number were noted");
  return parts.join(QStringLiteral(", "));
}

QString outcomeOf(const SheetTest& test) {
  if (test.phase == nullptr) return Sheet::tr("Received, not tested");
  const SheetPhase& phase = *test.phase;
  QString words = phaseTitle(phase.phase, test.item->damper);
  if (waits(phase)) return words;
  if (phase.verdict) {
    words += QStringLiteral(" · ") + verdictSummary(*phase.verdict);
  } else if (phase.measured) {
    words += QStringLiteral(" · ") + Sheet::tr("measured, no limits chosen");
  }
  return words;
}

struct StampWords {
  VerdictWord word = VerdictWord::NotTested;
  QString text;
};

StampWords stampOf(const SheetTest& test) {
  if (test.phase != nullptr && waits(*test.phase))
    return {VerdictWord::NotTested, Sheet::tr("Waits for confirmation")};
  const bool judged = test.phase != nullptr && test.phase->verdict.has_value();
  const VerdictWord word = judged ? test.phase->verdict->word : VerdictWord::NotTested;
  return {word, verdictName(word)};
}

struct Lines {
  QStringList text;
  TextStyle style;

  double height() const { return lineHeight(style) * static_cast<double>(text.size()); }
};

void paintLines(QPainter& painter, const QRectF& box, const std::vector<Lines>& all) {
  double y = box.top();
  for (const Lines& lines : all) {
    const double step = lineHeight(lines.style);
    for (const QString& line : lines.text) {
      drawText(painter, {box.left(), y, box.width(), step}, line, lines.style);
      y += step;
    }
  }
}

// What takes more than two lines is elided; the identity below says it in full.
QStringList inTwoLines(const QString& text, double width, const TextStyle& style) {
  const QStringList lines = wrapped(text, width, style);
  return lines.size() <= 2 ? lines : QStringList(elided(text, width, style, Qt::ElideMiddle));
}

double heightOf(const std::vector<Lines>& all) {
  double height = 0;
  for (const Lines& lines : all) height += lines.height();
  return height;
}

std::shared_ptr<const Figures> figuresOf(const SheetPhase& phase) {
  if (!phase.measured) return nullptr;
  const Measurement& measurement = phase.measured->measurement;
  const Verdict* verdict = phase.verdict ? &*phase.verdict : nullptr;
  return std::make_shared<const Figures>(
      Figures{loopFigure(FigureKind::ForceVelocity, measurement, verdict),
              loopFigure(FigureKind::ForceDisplacement, measurement, verdict)});
}

}  // namespace

std::vector<SheetTest> testsOf(const SheetContent& content) {
  std::vector<SheetTest> tests;
  for (const SheetItem& item : content.items) {
    if (item.phases.empty()) tests.push_back({&item, nullptr, nullptr});
    for (const SheetPhase& phase : item.phases) tests.push_back({&item, &phase, figuresOf(phase)});
  }
  return tests;
}

SheetBlock separator() {
  const auto paint = [](QPainter& painter, const QRectF& box) {
    painter.setPen(QPen(printPalette().ink, 0.35));
    painter.drawLine(box.topLeft(), box.topRight());
  };
  return {1.4, paint, true, {}, true};
}

SheetBlock testHeading(const SheetTest& test, double width) {
  const bool half = width < narrow;
  const QSizeF stamp = half ? QSizeF(29, 9.5) : QSizeF(52, 12.5);
  const double room = width - stamp.width() - 3;
  const TextStyle name = paperBold(half ? 9.5 : 11.5), identity = paperQuiet(half ? 7.5 : 8),
                  outcome = paperBold(half ? 8 : 8.5);
  const std::vector<Lines> lines = {{inTwoLines(nameOf(*test.item), room, name), name},
                                    {wrapped(identityOf(*test.item), room, identity), identity},
                                    {wrapped(outcomeOf(test), room, outcome), outcome}};
  const auto paint = [=, words = stampOf(test)](QPainter& painter, const QRectF& box) {
    paintLines(painter, box, lines);
    paintStamp(painter,
               {box.right() - stamp.width(), box.top() + 0.5, stamp.width(), stamp.height()},
               words.word,
               words.text,
               printPalette());
  };
  return {std::max(heightOf(lines), stamp.height() + 0.5) + 0.8, paint, true, {}, false};
}

SheetSection waitingFrame(const SheetPhase& phase, double width) {
  const TextStyle style = paperBold(8.5);
  QStringList all;
  for (const QString& line : waitingWords(phase)) all << wrapped(line, width - 6, style);
  const std::vector<Lines> lines = {{all, style}};
  const auto paint = [lines](QPainter& painter, const QRectF& box) {
    painter.setPen(QPen(printPalette().ink, 0.4));
    painter.drawRect(box.adjusted(0.2, 0.2, -0.2, -0.2));
    paintLines(painter, box.adjusted(3, 1.5, -3, 0), lines);
  };
  SheetSection section;
  section.push_back({heightOf(lines) + 3, paint, true, {}, false});
  section.push_back(space(1.5));
  section.back().keepWithNext = true;
  return section;
}

SheetSection sentences(const QStringList& lines, double width, const TextStyle& style) {
  SheetSection section;
  for (const QString& line : lines) append(section, paragraph(line, width, style));
  return section;
}

SheetBlock visualCheck(double width) {
  const bool half = width < narrow;
  const double points = half ? smallestPoints : 8, line = 4.6;
  const auto paint = [=](QPainter& painter, const QRectF& box) {
    const QString words = Sheet::tr("Seen and sound (tick by hand):");
    const TextStyle style = paperText(points), quiet = paperQuiet(points);
    QRectF row(box.left(), box.top(), box.width(), line);
    double x = box.left();
    const auto writeOn = [&](double from) {
      painter.setPen(QPen(printPalette().quiet, hairlineMm));
      painter.drawLine(QPointF(from + 4, row.center().y() + 1.5),
                       QPointF(row.right(), row.center().y() + 1.5));
    };
    drawText(painter, row, words, quiet);
    if (half) {
      writeOn(x + textWidth(words, quiet) - 2);
      row.translate(0, line);
    } else {
      x += textWidth(words, quiet) + 3.4;
    }
    for (const QString& point : {Sheet::tr("no leak"),
                                 Sheet::tr("rod"),
                                 Sheet::tr("bushes, eyes"),
                                 Sheet::tr("no dents"),
                                 Sheet::tr("threads, seat")}) {
      painter.setPen(QPen(printPalette().ink, hairlineMm));
      painter.setBrush(Qt::NoBrush);
      painter.drawRect(QRectF(x, row.center().y() - 1.4, 2.8, 2.8));
      x += 3.8;
      drawText(painter, {x, row.top(), box.width(), line}, point, style);
      x += textWidth(point, style) + (half ? 1.4 : 3.4);
    }
    if (!half) writeOn(x - 3.4);
  };
  return {half ? 2 * line : line, paint, false, {}, false};
}

Finality finalityOf(const SheetPhase& phase) {
  return waits(phase) ? Finality::Waiting : Finality::Final;
}

void paintFigure(QPainter& painter,
                 const QRectF& box,
                 const LoopFigure& figure,
                 const AxisScale& force) {
  paintLoopFigure(painter, box, figure, force, {paperText(smallestPoints).size, 1});
}

}  // namespace dampwright
