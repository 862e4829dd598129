// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/condition_words.h"

#include <QCoreApplication>
#include <QStringList>
#include <algorithm>
#include <cmath>

#include "ui/text/names.h"
#include "ui/text/numbers.h"
#include "ui/text/sentences.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

const QString comma = QStringLiteral(", ");

// Texts of a list, each once, in order.
template <class Values, class Text>
QString eachOnce(const Values& values, Text text) {
  QStringList parts;
  for (const auto& value : values) {
    const QString part = text(value);
    if (!part.isEmpty() && !parts.contains(part)) parts << part;
  }
  return parts.join(comma);
}

bool isHold(const MeasuredBlock& block) { return block.block.kind == BlockKind::Hold; }

QStringList motionTexts(const Measurement& measurement) {
  std::vector<double> speeds;
  for (const MeasuredBlock& block : measurement.blocks) {
    if (!isHold(block)) {
      speeds.push_back(std::max(block.compression.peakVelocity, block.rebound.peakVelocity));
    }
  }
  std::sort(speeds.begin(), speeds.end());
  const QString unit = QChar(0x00A0) + unitSymbol(Quantity::Velocity);
  const QString list = eachOnce(speeds, [&](double speed) {
    return quantityText(speed, Quantity::Velocity).chopped(unit.size());
  });
  const QString strokes = eachOnce(measurement.blocks, [](const MeasuredBlock& block) {
    return isHold(block) ? QString() : quantityText(block.block.stroke, Quantity::Length);
  });
  const QString kinds = eachOnce(measurement.blocks, [](const MeasuredBlock& block) {
    return blockKindName(block.block.kind);
  });
  return {Sheet::tr("peak speeds %1").arg(list + unit),
          Sheet::tr("stroke %1").arg(strokes),
          Sheet::tr("waveform %1").arg(kinds)};
}

QString temperatureText(const Measurement& measurement) {
  double low = INFINITY, high = -INFINITY;
  for (const MeasuredBlock& block : measurement.blocks) {
    if (!block.block.temperature) continue;
    low = std::min(low, *block.block.temperature);
    high = std::max(high, *block.block.temperature);
  }
  if (low > high) return Sheet::tr("body temperature not recorded");
  const QString from = quantityText(low, Quantity::Temperature);
  const QString to = quantityText(high, Quantity::Temperature);
  return from == to ? Sheet::tr("body at %1").arg(from)
                    : Sheet::tr("body from %1 to %2").arg(from, to);
}

QString cyclesText(const Measurement& measurement) {
  int used = 0, conditioning = 0, struckOut = 0;
  for (const MeasuredBlock& block : measurement.blocks) {
    for (const Cycle& cycle : block.block.cycles) {
      used += cycle.used() ? 1 : 0;
      struckOut += cycle.struckOut ? 1 : 0;
      conditioning += cycle.conditioning && !cycle.struckOut ? 1 : 0;
    }
  }
  return Sheet::tr("%1 cycles averaged, %2 left out for conditioning, %3 struck out by hand")
      .arg(used)
      .arg(conditioning)
      .arg(struckOut);
}

QString gasText(const Gas& gas) {
  if (!gas.force) {
    const QString why = sentenceText(gas.reason, {});
    return why.isEmpty() ? Sheet::tr("gas force not determined")
                         : Sheet::tr("gas force not determined: %1").arg(why);
  }
  const QString method =
      gas.method == "hold" ? Sheet::tr("from a hold") : Sheet::tr("from the slow block");
  return Sheet::tr("gas force %1 %2").arg(quantityText(*gas.force, Quantity::Force), method);
}

QStringList forceTexts(const SheetPhase& phase) {
  const Measurement& measurement = phase.measured->measurement;
  const QString zero = eachOnce(measurement.runs, [](const MeasuredRun& run) {
    return Sheet::tr("force zero %1").arg(zeroStateText(run.zeroState));
  });
  const std::optional<std::string>& filter = measurement.rig.lowPass;
  QStringList parts = {zero};
  parts << (filter ? Sheet::tr("filter %1").arg(QString::fromStdString(*filter))
                   : Sheet::tr("no filter"));
  if (phase.verdict) {
    parts << Sheet::tr("judged: %1").arg(forceBasisName(phase.verdict->forceBasis));
  }
  parts << gasText(measurement.gas);
  return parts;
}

QString rigText(const SheetPhase& phase) {
  const LoadCell& cell = phase.measured->measurement.rig.loadCell;
  const QString names =
      eachOnce(phase.phase.runs, [](const JobRun& run) { return QString::fromStdString(run.rig); });
  QStringList parts = {names.isEmpty() ? Sheet::tr("rig without a profile") : names};
  parts << (cell.calibrated.empty()
                ? Sheet::tr("date of the load cell's calibration not known")
                : Sheet::tr("load cell calibrated %1").arg(dateText(cell.calibrated)));
  if (!cell.due.empty()) parts << Sheet::tr("due %1").arg(dateText(cell.due));
  return parts.join(comma);
}

QString recordingsText(const Measurement& measurement) {
  return eachOnce(measurement.runs, [](const MeasuredRun& run) {
    const QString sum = QString::fromStdString(run.source.file.sha256).left(12);
    return QString::fromStdString(run.source.file.name) + QStringLiteral(" (SHA-256\u00A0") + sum +
           QStringLiteral("…)");
  });
}

}  // namespace

std::vector<LabelledText> conditionWords(const SheetPhase& phase) {
  const Measurement& measurement = phase.measured->measurement;
  std::vector<LabelledText> words;
  const auto add = [&words](const QString& label, const QStringList& texts) {
    for (const QString& text : texts) words.emplace_back(label, text);
  };
  add(Sheet::tr("Motion"), motionTexts(measurement));
  add(Sheet::tr("Averaging"), {cyclesText(measurement), temperatureText(measurement)});
  add(Sheet::tr("Force"), forceTexts(phase));
  add(Sheet::tr("Rig"), {rigText(phase)});
  add(Sheet::tr("Recordings"), {recordingsText(measurement)});
  return words;
}

std::vector<LabelledText> joined(const std::vector<LabelledText>& words) {
  std::vector<LabelledText> lines;
  for (const auto& [label, text] : words) {
    if (!lines.empty() && lines.back().first == label) {
      lines.back().second += QStringLiteral("; ") + text;
    } else {
      lines.emplace_back(label, text);
    }
  }
  return lines;
}

CommonConditions commonConditions(const SheetContent& content) {
  std::vector<std::vector<LabelledText>> all;
  for (const SheetItem& item : content.items) {
    for (const SheetPhase& phase : item.phases) {
      if (phase.measured) all.push_back(conditionWords(phase));
    }
  }
  if (all.size() < 2) return {};
  CommonConditions common = all.front();
  std::erase_if(common, [&all](const LabelledText& entry) {
    return !std::all_of(all.begin(), all.end(), [&entry](const auto& words) {
      return std::find(words.begin(), words.end(), entry) != words.end();
    });
  });
  return common;
}

std::vector<LabelledText> ownConditions(const SheetPhase& phase, const CommonConditions& common) {
  std::vector<LabelledText> own = conditionWords(phase);
  std::erase_if(own, [&common](const LabelledText& entry) {
    return std::find(common.begin(), common.end(), entry) != common.end();
  });
  return own;
}

}  // namespace dampwright
