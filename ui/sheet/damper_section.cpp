// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/damper_section.h"

#include <QCoreApplication>
#include <QPen>
#include <algorithm>
#include <array>

#include "ui/look/palette.h"
#include "ui/look/stamp.h"
#include "ui/plots/loop_figure.h"
#include "ui/plots/loop_painting.h"
#include "ui/sheet/check_list.h"
#include "ui/sheet/check_table.h"
#include "ui/sheet/condition_words.h"
#include "ui/sheet/labelled_grid.h"
#include "ui/sheet/test_words.h"
#include "ui/text/check_text.h"
#include "ui/text/names.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

constexpr double stampWidth = 52, stampHeight = 12.5;

struct Heading {
  QString name;      // Rear left · DA-1109
  QString identity;  // Part number …, monotube, …
  QString test;      // As found, rebound 8 clicks: 1 of 9 checks fails
  VerdictWord word = VerdictWord::NotTested;
  QString stamp;
};

QString nameOf(const SheetItem& item) {
  return cornerName(item.corner) + QStringLiteral(" · ") + damperName(item.damper);
}

QString identityOf(const DamperCard& damper) {
  QStringList parts;
  const auto add = [&parts](const QString& label, const std::string& value) {
    if (!value.empty()) parts << label.arg(QString::fromStdString(value));
  };
  add(Sheet::tr("Serial %1"), damper.serial);
  add(Sheet::tr("part number %1"), damper.partNumber);
  add(QStringLiteral("%1"), damper.kind);
  add(Sheet::tr("position %1"), damper.position);
  if (parts.isEmpty()) parts << Sheet::tr("No serial and no part number were noted");
  return parts.join(QStringLiteral(", "));
}

Heading headingOf(const SheetItem& item, const SheetPhase& phase) {
  Heading heading{nameOf(item),
                  identityOf(item.damper),
                  phaseTitle(phase.phase, item.damper),
                  VerdictWord::NotTested,
                  {}};
  if (waits(phase)) {
    heading.stamp = Sheet::tr("Waits for confirmation");
    return heading;
  }
  if (phase.verdict) {
    heading.word = phase.verdict->word;
    heading.test += QStringLiteral(" · ") + verdictSummary(*phase.verdict);
  } else if (phase.measured) {
    heading.test += QStringLiteral(" · ") + Sheet::tr("measured, no limits chosen");
  }
  heading.stamp = verdictName(heading.word);
  return heading;
}

SheetBlock separator() {
  const auto paint = [](QPainter& painter, const QRectF& box) {
    painter.setPen(QPen(printPalette().ink, 0.35));
    painter.drawLine(box.topLeft(), box.topRight());
  };
  return {1.4, paint, true, {}, true};
}

SheetBlock headingBlock(const Heading& heading) {
  const auto paint = [heading](QPainter& painter, const QRectF& box) {
    const double width = box.width() - stampWidth - 4;
    const auto line = [&](double top, double height, const QString& text, const TextStyle& style) {
      drawText(painter,
               {box.left(), box.top() + top, width, height},
               elided(text, width, style, Qt::ElideMiddle),
               style);
    };
    line(0, 5.2, heading.name, paperBold(11.5));
    line(5.2, 3.9, heading.identity, paperQuiet(8));
    line(9.2, 4.2, heading.test, paperBold(8.5));
    paintStamp(painter,
               {box.right() - stampWidth, box.top() + 0.5, stampWidth, stampHeight},
               heading.word,
               heading.stamp,
               printPalette());
  };
  return {14, paint, true, {}, false};
}

using Figures = std::array<LoopFigure, 2>;

void paintFigures(QPainter& painter, const QRectF& box, const Figures& figures) {
  const PaperStyle style{paperText(smallestPoints).size, 1};
  const AxisScale force = commonForceScale(figures[0], figures[1]);
  const double width = (box.width() - 4) / 2;
  paintLoopFigure(painter, {box.left(), box.top(), width, box.height()}, figures[0], force, style);
  paintLoopFigure(
      painter, {box.right() - width, box.top(), width, box.height()}, figures[1], force, style);
}

std::shared_ptr<const Figures> figuresOf(const SheetPhase& phase) {
  const Measurement& measurement = phase.measured->measurement;
  const Verdict* verdict = phase.verdict ? &*phase.verdict : nullptr;
  return std::make_shared<const Figures>(
      Figures{loopFigure(FigureKind::ForceVelocity, measurement, verdict),
              loopFigure(FigureKind::ForceDisplacement, measurement, verdict)});
}

SheetBlock plotsBlock(const SheetPhase& phase, double height) {
  const auto paint = [figures = figuresOf(phase)](QPainter& painter, const QRectF& box) {
    paintFigures(painter, box, *figures);
  };
  return {height, paint, true, {}, false};
}

Finality finalityOf(const SheetPhase& phase) {
  return waits(phase) ? Finality::Waiting : Finality::Final;
}

SheetBlock plotsBesideChecks(const SheetPhase& phase, double height, double width) {
  constexpr double listWidth = 74, gap = 4;  // mm
  const SheetBlock list = checkList(*phase.verdict, finalityOf(phase), listWidth);
  const double plots = width - listWidth - gap;
  const double tall = std::max(height, list.height);
  const auto paint = [=, figures = figuresOf(phase)](QPainter& painter, const QRectF& box) {
    paintFigures(painter, {box.left(), box.top(), plots, tall}, *figures);
    list.paint(painter, {box.right() - listWidth, box.top(), listWidth, list.height});
  };
  return {tall, paint, true, {}, false};
}

SheetSection marked(const QStringList& lines, double width, const TextStyle& style) {
  SheetSection section;
  for (const QString& line : lines) append(section, paragraph(line, width, style));
  return section;
}

SheetBlock visualCheck() {
  const auto paint = [](QPainter& painter, const QRectF& box) {
    const TextStyle style = paperText(8);
    double x = box.left();
    const auto word = [&](const QString& text, const TextStyle& as) {
      drawText(painter, {x, box.top(), box.width(), box.height()}, text, as);
      x += textWidth(text, as);
    };
    word(Sheet::tr("Seen and sound (tick by hand):"), paperQuiet(8));
    for (const QString& point : {Sheet::tr("no leak"),
                                 Sheet::tr("rod"),
                                 Sheet::tr("bushes, eyes"),
                                 Sheet::tr("no dents"),
                                 Sheet::tr("threads, seat")}) {
      x += 3.4;
      painter.setPen(QPen(printPalette().ink, hairlineMm));
      painter.setBrush(Qt::NoBrush);
      painter.drawRect(QRectF(x, box.center().y() - 1.4, 2.8, 2.8));
      x += 4;
      word(point, style);
    }
    painter.setPen(QPen(printPalette().quiet, hairlineMm));
    painter.drawLine(QPointF(x + 4, box.center().y() + 1.5),
                     QPointF(box.right(), box.center().y() + 1.5));
  };
  return {4.6, paint, false, {}, false};
}

// What must be confirmed stands in a frame, before any figure.
SheetSection waitingFrame(const SheetPhase& phase, double width) {
  const QStringList lines = waitingWords(phase);
  const TextStyle style = paperBold(8.5);
  QStringList all;
  for (const QString& line : lines) all << wrapped(line, width - 6, style);
  const double height = lineHeight(style) * static_cast<double>(all.size()) + 3;
  const auto paint = [all, style](QPainter& painter, const QRectF& box) {
    painter.setPen(QPen(printPalette().ink, 0.4));
    painter.drawRect(box.adjusted(0.2, 0.2, -0.2, -0.2));
    double y = box.top() + 1.5;
    for (const QString& line : all) {
      drawText(painter, {box.left() + 3, y, box.width() - 6, lineHeight(style)}, line, style);
      y += lineHeight(style);
    }
  };
  SheetSection section;
  section.push_back({height, paint, true, {}, false});
  section.push_back(space(1.5));
  section.back().keepWithNext = true;
  return section;
}

void addFigures(SheetSection& section,
                const SheetPhase& phase,
                const Arrangement& arrangement,
                double width) {
  if (arrangement.compact && phase.verdict) {
    section.push_back(plotsBesideChecks(phase, arrangement.plotHeight, width));
  } else {
    section.push_back(plotsBlock(phase, arrangement.plotHeight));
  }
  section.push_back(space(1));
  section.back().keepWithNext = true;
  if (phase.verdict && !arrangement.compact) {
    append(section, checkTable(*phase.verdict, finalityOf(phase), width));
  }
}

SheetSection phaseSection(const SheetItem& item,
                          const SheetPhase& phase,
                          const Arrangement& arrangement,
                          const CommonConditions& common,
                          double width) {
  SheetSection section = {separator(), headingBlock(headingOf(item, phase))};
  if (phase.measured) {
    if (waits(phase)) append(section, waitingFrame(phase, width));
    addFigures(section, phase, arrangement, width);
    append(section, marked(reasonWords(phase), width, paperText(8)));
    append(section, marked(remarkWords(phase), width, paperText(8)));
    section.push_back(space(0.8));
    append(section, labelledGrid(ownConditions(phase, common), width, 1, 20, 7.5));
  } else {
    append(section, marked(problemWords(phase), width, paperText(8.5)));
  }
  section.push_back(visualCheck());
  section.push_back(space(2));
  return section;
}

}  // namespace

std::vector<SheetSection> damperSections(const SheetItem& item,
                                         const Arrangement& arrangement,
                                         const CommonConditions& common,
                                         double width) {
  std::vector<SheetSection> sections;
  for (const SheetPhase& phase : item.phases) {
    sections.push_back(phaseSection(item, phase, arrangement, common, width));
  }
  if (sections.empty()) {
    SheetSection section = {separator()};
    section.push_back(headingBlock({nameOf(item),
                                    identityOf(item.damper),
                                    Sheet::tr("Received, not tested"),
                                    VerdictWord::NotTested,
                                    verdictName(VerdictWord::NotTested)}));
    section.push_back(visualCheck());
    section.push_back(space(2.2));
    sections.push_back(std::move(section));
  }
  return sections;
}

}  // namespace dampwright
