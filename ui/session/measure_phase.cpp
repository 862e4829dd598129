// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/session/measure_phase.h"

#include <utility>

#include "core/book/book.h"
#include "core/verdict/judge.h"
#include "ui/session/find_profile.h"

namespace dampwright {

namespace {

using RunRead = std::shared_ptr<const RunReading>;

constexpr double readingShare = 0.4;  // of the bar; measuring takes the rest

Result<std::string> bytesFromBook(const QString& file, const std::string& sha256) {
  const Result<Book> book = Book::open(file);
  if (!book) return book.error();
  return book.value().runFile(sha256);
}

Result<RunRead> readingOf(const PhaseTask& task, std::size_t index, const Progress& progress) {
  const RunInHand& inHand = task.inHand[index];
  if (inHand.reading) return inHand.reading;
  const JobRun& run = task.runs[index];
  std::shared_ptr<const std::string> bytes = inHand.bytes;
  if (!bytes) {
    Result<std::string> kept = bytesFromBook(task.bookFile, run.sha256);
    if (!kept) return kept.error();
    bytes = std::make_shared<const std::string>(std::move(kept).value());
  }
  const FindProfile find = [&](std::string_view signature) {
    return findProfile(task.profiles, run.rig, signature);
  };
  Result<RunReading> reading = readRun(*bytes, run.file, run.answers, find, progress);
  if (!reading) return reading.error();
  return RunRead(std::make_shared<const RunReading>(std::move(reading).value()));
}

// The share of one run within the reading of all.
Progress partOf(const Progress& whole, double from, double to) {
  return {whole.token,
          [&whole, from, to](double share) { whole.done(from + share * (to - from)); }};
}

MeasureOptions measureOptionsOf(const PhaseTask& task, const RunRead& first) {
  MeasureOptions options;
  options.rig = findProfile(task.profiles, task.runs.front().rig, first->source.signature)
                    .value_or(RigProfile{});
  options.card = task.card;
  for (const JobRun& run : task.runs) options.struckOut.push_back(run.struckOut);
  return options;
}

}  // namespace

Error openPointsError(const RunReading& reading, std::string_view file) {
  std::string points, options;
  for (const OpenPoint& open : reading.open) {
    points += (points.empty() ? "" : ", ") + open.point;
    options += (options.empty() ? "" : ", ") + open.option;
  }
  return {"open-points", {{"points", points}, {"options", options}}, {std::string(file)}};
}

PhaseOutcome measurePhase(const PhaseTask& task, const Progress& progress) {
  PhaseOutcome outcome;
  std::vector<Trace> traces;
  const double count = static_cast<double>(task.runs.size());
  for (std::size_t i = 0; i < task.runs.size(); ++i) {
    const double from = readingShare * static_cast<double>(i) / count;
    const Progress part = partOf(progress, from, from + readingShare / count);
    Result<RunRead> reading = readingOf(task, i, part);
    outcome.readings.push_back(reading ? reading.value() : nullptr);
    std::optional<Error> problem;
    if (!reading) {
      problem = reading.error();
    } else if (!reading.value()->trace) {
      problem = openPointsError(*reading.value(), task.runs[i].file);
    } else {
      traces.push_back(*reading.value()->trace);
    }
    if (problem && !outcome.problem) outcome.problem = std::move(problem);
  }
  if (outcome.problem) return outcome;
  Result<Measured> measured = measureRuns(
      traces, measureOptionsOf(task, outcome.readings.front()), partOf(progress, readingShare, 1));
  if (!measured) {
    outcome.problem = measured.error();
    return outcome;
  }
  outcome.measured = std::make_shared<const Measured>(std::move(measured).value());
  if (task.limits) outcome.verdict = judge(outcome.measured->measurement, *task.limits);
  return outcome;
}

}  // namespace dampwright
