// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/text/questions.h"

#include <QCoreApplication>
#include <QStringList>

#include "ui/text/sentences.h"

namespace dampwright {

namespace {

struct Questions {
  Q_DECLARE_TR_FUNCTIONS(Questions)
};

QString listOf(const std::vector<std::string>& candidates) {
  QStringList list;
  for (const std::string& one : candidates) list << QString::fromStdString(one);
  return list.join(QStringLiteral(", "));
}

QString withCandidates(const QString& question, const OpenPoint& point) {
  if (point.candidates.empty()) return question;
  return question + QLatin1Char(' ') +
         Questions::tr("It could be: %1.").arg(listOf(point.candidates));
}

}  // namespace

QString questionText(const OpenPoint& point) {
  const std::string& what = point.point;
  if (what == "decimal") {
    return Questions::tr(
        "Is the comma in these numbers a decimal mark, or does it group thousands?");
  }
  if (what == "force") return withCandidates(Questions::tr("Which column is the force?"), point);
  if (what == "displacement") {
    return withCandidates(Questions::tr("Which column is the displacement?"), point);
  }
  if (what == "unit") {
    return Questions::tr("The column %1 is in volts: what does one volt stand for?")
        .arg(listOf(point.candidates));
  }
  if (what == "sample-rate") {
    return Questions::tr("There is no column of time: how many samples a second were taken?");
  }
  if (what == "direction") {
    return Questions::tr("Which way does the damper move where the displacement rises?");
  }
  return withCandidates(Questions::tr("What is %1?").arg(QString::fromStdString(what)), point);
}

QString questionsText(const RunReading& reading) {
  QStringList all;
  for (const OpenPoint& point : reading.open) all << questionText(point);
  return all.join(QLatin1Char(' '));
}

QString roleName(Role role) {
  switch (role) {
    case Role::Time:
      return Questions::tr("Time");
    case Role::Displacement:
      return Questions::tr("Displacement");
    case Role::Force:
      return Questions::tr("Force");
    case Role::Velocity:
      return Questions::tr("Velocity");
    case Role::Temperature:
      return Questions::tr("Temperature");
    case Role::Other:
      break;
  }
  return Questions::tr("Not used");
}

QString reasonText(const SourceColumn& column) {
  const QString why = sentenceText(column.why, {});
  if (!column.assumed || column.why == "role-by-shape") return why;
  return why + QLatin1Char(' ') + Questions::tr("The unit is assumed.");
}

}  // namespace dampwright
