// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/opening_section.h"

#include <QCoreApplication>

#include "ui/sheet/labelled_grid.h"
#include "ui/text/names.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

QString limitsName(const Limits& limits) {
  QString name = QString::fromStdString(limits.title);
  if (!limits.revision.empty()) {
    name += Sheet::tr(", revision %1").arg(QString::fromStdString(limits.revision));
  }
  if (!limits.source.empty()) {
    name += QStringLiteral(" (") + QString::fromStdString(limits.source) + QLatin1Char(')');
  }
  return name;
}

QString known(const std::string& text) {
  return text.empty() ? QStringLiteral("–") : QString::fromStdString(text);
}

std::vector<LabelledText> details(const SheetContent& content) {
  const Job& job = content.job;
  std::vector<LabelledText> entries = {
      {Sheet::tr("Customer"), known(job.customer)},
      {Sheet::tr("Received"), job.opened.empty() ? known({}) : dateText(job.opened)},
      {Sheet::tr("Vehicle"), known(job.vehicle)},
      {Sheet::tr("Sheet made"), dateText(content.printed.toStdString())},
      {Sheet::tr("Plate"), known(job.plate)},
      {Sheet::tr("Technician"), known(job.technician)},
      {Sheet::tr("Limits"), job.limits ? limitsName(*job.limits) : Sheet::tr("none chosen")}};
  if (job.limits) {
    const bool guarded = job.limits->decisionRule == DecisionRule::Guarded;
    entries.push_back({Sheet::tr("Decision"),
                       guarded ? Sheet::tr("guarded: pass if the figure with its uncertainty U "
                                           "lies inside the limits")
                               : Sheet::tr("simple: pass if the figure lies inside the limits, "
                                           "U left aside")});
  }
  return entries;
}

}  // namespace

SheetSection openingSection(const SheetContent& content,
                            const CommonConditions& common,
                            double width) {
  const TextStyle title = paperBold(15);
  SheetSection section;
  section.push_back({lineHeight(title) + 0.8,
                     [title](QPainter& painter, const QRectF& box) {
                       drawText(painter, box, Sheet::tr("Damper test sheet"), title);
                     },
                     true,
                     {},
                     false});
  append(section, labelledGrid(details(content), width, 2, 22, 8.5));
  if (!common.empty()) append(section, labelledGrid(joined(common), width, 1, 22, 7.5));
  section.push_back(space(1));
  return section;
}

}  // namespace dampwright
