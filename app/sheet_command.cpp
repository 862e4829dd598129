// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/sheet_command.h"

#include <QFile>
#include <QGuiApplication>
#include <QTemporaryDir>
#include <filesystem>
#include <iostream>
#include <map>
#include <string_view>

#include "app/batch_files.h"
#include "app/batch_verbs.h"
#include "core/base/sha256.h"
#include "core/records/documents.h"
#include "core/verdict/judge.h"
#include "core/words/words.h"
#include "ui/sheet/sheet_output.h"
#include "ui/sheet/workshop_settings.h"

namespace dampwright {

namespace {

/// The request's files by the hash of their bytes, for the archive in the PDF.
using Paths = std::map<std::string, std::string>;

struct Judged {
  SheetContent content;
  VerdictWord word;
};

int say(const Error& error, int status) {
  std::cerr << englishLine(error) << '\n';
  return status;
}

// Standard input can be read once only, and the sheet needs its bytes twice: a copy stands in.
Result<BatchRequest> withoutStandardInput(BatchRequest request, const QString& folder) {
  for (std::string& file : request.files) {
    if (file != "-") continue;
    const auto bytes = loadInput(file);
    if (!bytes) return bytes.error();
    file = (folder + QStringLiteral("/standard-input.txt")).toStdString();
    const auto written = writeOutput(file, bytes.value());
    if (!written) return written.error();
  }
  return request;
}

Result<Job> jobOf(const BatchRequest& request,
                  const Limits& limits,
                  const Measurement& measurement) {
  Job job;
  job.kind = VehicleKind::SingleDamper;
  job.limits = limits;
  JobItem item;
  item.corner = "damper";
  if (!request.card.empty()) {
    const auto card = loadInput(request.card);
    if (!card) return card.error();
    const auto damper = readDamper(card.value(), request.card);
    if (!damper) return damper.error();
    item.damper = damper.value();
  }
  JobPhase phase;
  for (const MeasuredRun& run : measurement.runs) {
    JobRun entry{run.source.file.name, run.source.file.sha256, {}, {}, {}};
    if (run.zeroState != ZeroState::Unknown) entry.answers.zeroState = run.zeroState;
    phase.runs.push_back(std::move(entry));
  }
  item.phases.push_back(phase);
  job.items.push_back(item);
  return job;
}

Result<std::string> rigName(const BatchRequest& request) {
  if (request.rig.empty()) return std::string();
  const auto text = loadInput(request.rig);
  if (!text) return text.error();
  const auto rig = readRig(text.value(), request.rig);
  if (!rig) return rig.error();
  return rig.value().name;
}

Paths pathsOf(const BatchRequest& request, const Measurement& measurement) {
  Paths paths;
  for (std::size_t i = 0; i < measurement.runs.size() && i < request.files.size(); ++i) {
    paths[measurement.runs[i].source.file.sha256] = request.files[i];
  }
  return paths;
}

Result<Judged> judgedSheet(const BatchRequest& request) {
  const auto text = loadInput(request.limits);
  if (!text) return text.error();
  const auto limits = readLimits(text.value(), request.limits);
  if (!limits) return limits.error();
  const auto rig = rigName(request);
  if (!rig) return rig.error();
  const auto measurement = measureFiles(request);
  if (!measurement) return measurement.error();
  auto job = jobOf(request, limits.value(), measurement.value());
  if (!job) return job.error();
  for (JobRun& run : job.value().items[0].phases[0].runs) run.rig = rig.value();
  const SheetPhase phase{{},
                         std::make_shared<const Measured>(Measured{measurement.value(), {}}),
                         judge(measurement.value(), limits.value()),
                         {}};
  const Paths paths = pathsOf(request, measurement.value());
  const auto bytesOf = [&](const std::string& sha256) -> Result<std::string> {
    auto bytes = loadInput(paths.at(sha256));
    if (bytes && sha256Hex(bytes.value()) != sha256) {
      return Error{"file-changed", {}, {paths.at(sha256), 0, 0}};
    }
    return bytes;
  };
  auto content = sheetContent(
      job.value(), keptWorkshop(), [&](std::size_t, std::size_t) { return phase; }, bytesOf);
  if (!content) return content.error();
  return Judged{std::move(content).value(), phase.verdict->word};
}

int makeSheet(const BatchRequest& asked, const QString& folder) {
  const auto request = withoutStandardInput(asked, folder);
  if (!request) return say(request.error(), exit_status::badInput);
  const auto judged = judgedSheet(request.value());
  if (!judged) return say(judged.error(), exit_status::badInput);
  const SheetDocument document(judged.value().content, usualPaperSize());
  const auto written = writeSheetPdf(QString::fromStdString(asked.pdf), document);
  if (!written) return say(written.error(), exit_status::noOutput);
  const auto told = writeOutput(asked.out, asked.pdf + "\n");
  if (!told) return say(told.error(), exit_status::noOutput);
  return statusOf(judged.value().word);
}

}  // namespace

bool asksForSheet(int argc, const char* const* argv) {
  return argc > 1 && std::string_view(argv[1]) == "sheet";
}

int runSheetCommand(int argc, char** argv) {
  const ParsedRequest parsed = parseRequest(argc, argv);
  if (!parsed.request) {
    (parsed.status == exit_status::done ? std::cout : std::cerr) << parsed.text;
    return parsed.status;
  }
  const QTemporaryDir folder;
  qputenv("QT_QPA_PLATFORM", "offscreen");
  // Qt warns on standard error where a session left this out, and no session is needed here.
  if (qEnvironmentVariableIsEmpty("XDG_RUNTIME_DIR")) {
    qputenv("XDG_RUNTIME_DIR", QFile::encodeName(folder.path()));
  }
  const QGuiApplication application(argc, argv);
  return makeSheet(*parsed.request, folder.path());
}

}  // namespace dampwright
