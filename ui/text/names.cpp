// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/text/names.h"

#include <QCoreApplication>
#include <QDateTime>
#include <QLocale>
#include <QStringList>

#include "core/base/expects.h"
#include "ui/text/numbers.h"

namespace dampwright {

namespace {

struct Names {
  Q_DECLARE_TR_FUNCTIONS(Names)
};

constexpr QChar noBreakSpace(0x00A0);

const Adjuster* findAdjuster(const std::vector<Adjuster>& adjusters, const std::string& name) {
  for (const Adjuster& adjuster : adjusters) {
    if (adjuster.name == name) return &adjuster;
  }
  return nullptr;
}

QString adjusterUnit(const std::string& unit) {
  if (unit == "clicks") return Names::tr("clicks");
  if (unit == "turns") return Names::tr("turns");
  if (unit == "amperes") return QStringLiteral("A");
  return QString::fromStdString(unit);
}

}  // namespace

QString verdictName(VerdictWord word) {
  switch (word) {
    case VerdictWord::Pass:
      return Names::tr("Pass");
    case VerdictWord::Fail:
      return Names::tr("Fail");
    case VerdictWord::TooCloseToCall:
      return Names::tr("Too close to call");
    case VerdictWord::NotTested:
      return Names::tr("Not tested");
  }
  expects(false);
  return {};
}

QString directionName(Direction direction) {
  return direction == Direction::Compression ? Names::tr("Compression") : Names::tr("Rebound");
}

QString phaseName(Phase phase) {
  return phase == Phase::AsFound ? Names::tr("As found") : Names::tr("After work");
}

QString severityName(Severity severity) {
  return severity == Severity::Warning ? Names::tr("Warning") : Names::tr("Note");
}

QString vehicleKindName(VehicleKind kind) {
  switch (kind) {
    case VehicleKind::Car:
      return Names::tr("Car");
    case VehicleKind::Motorcycle:
      return Names::tr("Motorcycle");
    case VehicleKind::SingleDamper:
      return Names::tr("Single damper");
  }
  expects(false);
  return {};
}

QString zeroStateText(ZeroState state) {
  switch (state) {
    case ZeroState::NoSpecimen:
      return Names::tr("with no damper on the rig");
    case ZeroState::DamperFitted:
      return Names::tr("with the damper fitted");
    case ZeroState::Unknown:
      return Names::tr("not known");
  }
  expects(false);
  return {};
}

QString decisionRuleName(DecisionRule rule) {
  return rule == DecisionRule::Guarded ? Names::tr("guarded") : Names::tr("simple");
}

QString forceBasisName(ForceBasis basis) {
  return basis == ForceBasis::GasRemoved ? Names::tr("gas force removed")
                                         : Names::tr("force as measured");
}

QString blockKindName(BlockKind kind) {
  switch (kind) {
    case BlockKind::Sine:
      return Names::tr("sine");
    case BlockKind::Crank:
      return Names::tr("crank");
    case BlockKind::Triangle:
      return Names::tr("constant speed");
    case BlockKind::Sweep:
      return Names::tr("sweep");
    case BlockKind::Hold:
      return Names::tr("hold");
    case BlockKind::Other:
      return Names::tr("other");
  }
  expects(false);
  return {};
}

QString cornerName(const std::string& corner) {
  if (corner == "front left") return Names::tr("Front left");
  if (corner == "front right") return Names::tr("Front right");
  if (corner == "rear left") return Names::tr("Rear left");
  if (corner == "rear right") return Names::tr("Rear right");
  if (corner == "front") return Names::tr("Front");
  if (corner == "rear") return Names::tr("Rear");
  if (corner == "damper") return Names::tr("Damper");
  return QString::fromStdString(corner);
}

QString settingText(const std::vector<SettingValue>& setting,
                    const std::vector<Adjuster>& adjusters) {
  QStringList parts;
  for (const SettingValue& value : setting) {
    const Adjuster* adjuster = findAdjuster(adjusters, value.adjuster);
    const QString unit = adjuster != nullptr ? adjusterUnit(adjuster->unit) : QString();
    QString part = QString::fromStdString(value.adjuster) + noBreakSpace +
                   exactText(value.value, Quantity::None);
    if (!unit.isEmpty()) part += noBreakSpace + unit;
    parts << part;
  }
  return parts.join(QStringLiteral(", "));
}

QString phaseTitle(const JobPhase& phase, const DamperCard& damper) {
  const QString setting = settingText(phase.setting, damper.adjusters);
  const QString name = phaseName(phase.phase);
  return setting.isEmpty() ? name : name + QStringLiteral(", ") + setting;
}

QString damperName(const DamperCard& damper) {
  if (!damper.serial.empty()) return QString::fromStdString(damper.serial);
  if (!damper.partNumber.empty()) return QString::fromStdString(damper.partNumber);
  return Names::tr("no serial");
}

QString dateText(const std::string& iso) {
  const QString text = QString::fromStdString(iso);
  const QDateTime moment = QDateTime::fromString(text, Qt::ISODate);
  if (!moment.isValid()) return text;
  const QString day = QLocale().toString(moment.date(), QStringLiteral("d MMMM yyyy"));
  if (!text.contains(QLatin1Char('T'))) return day;
  return day + QStringLiteral(", ") + moment.time().toString(QStringLiteral("HH:mm"));
}

}  // namespace dampwright
