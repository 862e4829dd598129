// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_content.h"

#include <QDateTime>
#include <set>

#include "core/records/documents.h"

namespace dampwright {

namespace {

QByteArray bytesOf(const std::string& text) {
  return QByteArray(text.data(), static_cast<qsizetype>(text.size()));
}

// Every run once, however many phases hold it.
Result<Done> addRuns(SheetContent& content, const RunBytesOf& runBytes) {
  std::set<std::string> seen;
  for (const JobItem& item : content.job.items) {
    for (const JobPhase& phase : item.phases) {
      for (const JobRun& run : phase.runs) {
        if (!seen.insert(run.sha256).second) continue;
        const Result<std::string> bytes = runBytes(run.sha256);
        if (!bytes) return bytes.error();
        content.attachments.push_back(
            {QStringLiteral("run"), QString::fromStdString(run.file), bytesOf(bytes.value())});
      }
    }
  }
  return Done{};
}

std::vector<SheetItem> itemsOf(const Job& job, const PhaseResult& result) {
  std::vector<SheetItem> items;
  for (std::size_t i = 0; i < job.items.size(); ++i) {
    const JobItem& item = job.items[i];
    if (item.phases.empty() && item.damper == DamperCard{}) continue;
    SheetItem sheet{item.corner, item.damper, {}};
    for (std::size_t p = 0; p < item.phases.size(); ++p) {
      sheet.phases.push_back(result(i, p));
      sheet.phases.back().phase = item.phases[p];
    }
    items.push_back(std::move(sheet));
  }
  return items;
}

}  // namespace

Result<SheetContent> sheetContent(const Job& job,
                                  const Workshop& workshop,
                                  const PhaseResult& result,
                                  const RunBytesOf& runBytes) {
  SheetContent content;
  content.workshop = workshop;
  content.job = job;
  const QDateTime now = QDateTime::currentDateTime();
  content.printed = now.toOffsetFromUtc(now.offsetFromUtc()).toString(Qt::ISODate);
  content.items = itemsOf(job, result);
  content.attachments.push_back(
      {QStringLiteral("job"), QStringLiteral("job.json"), bytesOf(writeJob(job))});
  if (job.limits) {
    content.attachments.push_back({QStringLiteral("limits"),
                                   QStringLiteral("limits.json"),
                                   bytesOf(writeLimits(*job.limits))});
  }
  const Result<Done> runs = addRuns(content, runBytes);
  if (!runs) return runs.error();
  return content;
}

bool waits(const SheetPhase& phase) { return phase.verdict && !phase.verdict->waiting.empty(); }

}  // namespace dampwright
