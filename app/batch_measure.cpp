// SPDX-License-Identifier: GPL-3.0-or-later
#include <filesystem>
#include <iostream>

#include "app/batch_files.h"
#include "app/batch_verbs.h"
#include "core/measure/measure_runs.h"
#include "core/records/documents.h"
#include "core/words/words.h"

namespace dampwright {
namespace {

// A document named on the command line; its default where none is.
template <class T>
Result<T> loadDocument(const std::string& path,
                       Result<T> (*read)(std::string_view bytes, std::string_view file)) {
  if (path.empty()) return T{};
  const auto bytes = loadInput(path);
  if (!bytes) return bytes.error();
  return read(bytes.value(), path);
}

void sayWarnings(const std::vector<Remark>& remarks, const std::string& place) {
  for (const Remark& remark : remarks) {
    if (remark.severity == Severity::Warning)
      std::cerr << remark.code << ": " << place << ": " << englishText(remark) << '\n';
  }
}

// Those of a file under its path; those of the measurement as a whole under the first.
void sayWarnings(const Measurement& measurement, const std::vector<std::string>& paths) {
  for (std::size_t i = 0; i < measurement.runs.size() && i < paths.size(); ++i)
    sayWarnings(measurement.runs[i].remarks, paths[i]);
  sayWarnings(measurement.remarks, paths.front());
}

// What must be answered before the file can be read, all points in one error.
Error openPoints(const RunReading& reading, const std::string& path) {
  std::string points, options;
  for (const OpenPoint& open : reading.open) {
    std::string choices;
    for (const std::string& candidate : open.candidates)
      choices.append(choices.empty() ? "" : " or ").append(candidate);
    points.append(points.empty() ? "" : ", ").append(open.point);
    options.append(options.empty() ? "" : "; ").append(open.option);
    if (!choices.empty()) options.append(" ").append(choices);
  }
  return Error{"open-points", {{"points", points}, {"options", options}}, {path, 0, 0}};
}

Progress progressOf(const BatchRequest& request) {
  Progress progress;
  if (!request.progress) return progress;
  progress.report = [last = -1](double share) mutable {
    const int percent = static_cast<int>(share * 100);
    if (percent == last) return;
    last = percent;
    std::cerr << "progress: " << percent << " %\n";
  };
  return progress;
}

Result<std::vector<Trace>> readTraces(const BatchRequest& request) {
  std::vector<Trace> traces;
  for (const std::string& path : request.files) {
    auto reading = readRunFile(request, path);
    if (!reading) return reading.error();
    if (!reading.value().trace) return openPoints(reading.value(), path);
    for (const Trace& before : traces) {
      if (before.source.file.sha256 == reading.value().source.file.sha256)
        return Error{"run-given-twice", {{"other", before.source.file.name}}, {path, 0, 0}};
    }
    traces.push_back(std::move(*reading.value().trace));
  }
  return traces;
}

}  // namespace

Result<RunReading> readRunFile(const BatchRequest& request, const std::string& path) {
  const auto rig = loadDocument(request.rig, readRig);
  if (!rig) return rig.error();
  const auto bytes = loadInput(path);
  if (!bytes) return bytes.error();
  const auto profile = [&](std::string_view) -> std::optional<RigProfile> {
    if (request.rig.empty()) return std::nullopt;
    return rig.value();
  };
  const std::string name = std::filesystem::path(path).filename().string();
  auto reading = readRun(bytes.value(), name, request.read, profile, progressOf(request));
  if (reading) return reading;
  Error error = reading.error();
  error.place.file = path;
  return error;
}

Result<Measurement> measureFiles(const BatchRequest& request) {
  const auto rig = loadDocument(request.rig, readRig);
  if (!rig) return rig.error();
  const auto card = loadDocument(request.card, readDamper);
  if (!card) return card.error();
  const auto traces = readTraces(request);
  if (!traces) return traces.error();
  MeasureOptions options;
  options.rig = rig.value();
  if (!request.card.empty()) options.card = card.value();
  auto measured = measureRuns(traces.value(), options, progressOf(request));
  if (!measured) return measured.error();
  sayWarnings(measured.value().measurement, request.files);
  return std::move(measured).value().measurement;
}

Result<BatchAnswer> measureVerb(const BatchRequest& request) {
  const auto measurement = measureFiles(request);
  if (!measurement) return measurement.error();
  return BatchAnswer{writeMeasurement(measurement.value()), exit_status::done};
}

}  // namespace dampwright
