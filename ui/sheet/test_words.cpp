// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/test_words.h"

#include <QCoreApplication>
#include <algorithm>

#include "ui/text/check_text.h"
#include "ui/text/sentences.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

QString withHint(const QString& sentence, const QString& hint) {
  return hint.isEmpty() ? sentence : sentence + QLatin1Char(' ') + hint;
}

void addRemarks(QStringList& lines,
                const std::vector<Remark>& remarks,
                Severity severity,
                const QString& place) {
  for (const Remark& remark : remarks) {
    if (remark.severity != severity) continue;
    const QString sentence = sentenceText(remark);
    const QString line = place.isEmpty() ? sentence : place + QStringLiteral(": ") + sentence;
    if (!lines.contains(line)) lines << line;
  }
}

// What the frame above the plots has said already.
bool isWaitedFor(const Verdict& verdict, const CheckVerdict& check) {
  return std::any_of(verdict.waiting.begin(), verdict.waiting.end(), [&](const Reason& reason) {
    return reason.code == check.reason.code;
  });
}

}  // namespace

QStringList reasonWords(const SheetPhase& phase) {
  if (!phase.verdict) return {};
  std::vector<std::pair<QString, QStringList>> byReason;  // reason, titles
  for (const CheckVerdict& check : phase.verdict->checks) {
    if (check.verdict == VerdictWord::Pass || isWaitedFor(*phase.verdict, check)) continue;
    const CheckText text = checkText(check);
    if (text.reason.isEmpty()) continue;
    const auto same = std::find_if(byReason.begin(), byReason.end(), [&](const auto& row) {
      return row.first == text.reason;
    });
    if (same != byReason.end())
      same->second << text.title;
    else
      byReason.push_back({text.reason, {text.title}});
  }
  QStringList lines;
  for (const auto& [reason, titles] : byReason) {
    lines << titles.join(QStringLiteral(", ")) + QStringLiteral(": ") + reason;
  }
  return lines;
}

QStringList remarkWords(const SheetPhase& phase) {
  if (!phase.measured) return {};
  const Measurement& measurement = phase.measured->measurement;
  const bool several = measurement.runs.size() > 1;
  QStringList lines;
  for (const Severity severity : {Severity::Warning, Severity::Note}) {
    for (const MeasuredRun& run : measurement.runs) {
      const QString file = QString::fromStdString(run.source.file.name);
      addRemarks(lines, run.remarks, severity, several ? file : QString());
    }
    addRemarks(lines, measurement.remarks, severity, {});
  }
  return lines;
}

QStringList waitingWords(const SheetPhase& phase) {
  QStringList lines = {Sheet::tr("This sheet waits for a confirmation; its verdict is not final.")};
  for (const Reason& reason : phase.verdict->waiting) {
    lines << withHint(sentenceText(reason.code, reason.values),
                      hintText(reason.code, reason.values));
  }
  return lines;
}

QStringList problemWords(const SheetPhase& phase) {
  if (phase.problem) return {sentenceText(*phase.problem)};
  if (phase.phase.runs.empty()) return {Sheet::tr("No run was recorded.")};
  return {Sheet::tr("The runs have not been measured yet.")};
}

}  // namespace dampwright
