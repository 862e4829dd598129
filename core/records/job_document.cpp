// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/describe.h"
#include "core/records/document_words.h"
#include "core/records/documents.h"

namespace dampwright {
namespace {

constexpr DocumentKind jobDocument{"job", 1};

void describe(Fields& io, ReadOptions& answers) {
  io.text("encoding", answers.encoding);
  io.text("delimiter", answers.delimiter);
  io.text("decimal", answers.decimal);
  io.count("header_row", answers.headerRow);
  io.object("columns", [&](Fields& columns) {
    columns.text("time", answers.time);
    columns.text("displacement", answers.displacement);
    columns.text("force", answers.force);
    columns.text("velocity", answers.velocity);
    columns.text("temperature", answers.temperature);
  });
  io.object("units", [&](Fields& units) {
    units.text("time", answers.timeUnit);
    units.text("displacement", answers.displacementUnit);
    units.text("force", answers.forceUnit);
    units.text("velocity", answers.velocityUnit);
    units.text("temperature", answers.temperatureUnit);
  });
  io.number("sample_rate_hz", answers.sampleRate, positive);
  io.word("displacement_positive", answers.displacementPositive, words::directions);
  io.word("force_positive", answers.forcePositive, words::directions);
}

// The zero state stands with the run, all other answers in an object of their own.
void describeAnswers(Fields& io, ReadOptions& answers) {
  std::optional<ZeroState> zeroed = answers.zeroState;
  io.word("zero_state", zeroed, words::zeroStates);
  if (zeroed == ZeroState::Unknown) zeroed.reset();
  std::optional<ReadOptions> others = answers;
  others->zeroState.reset();
  if (others == ReadOptions{}) others.reset();
  io.object("reading", others, [](Fields& inside, ReadOptions& one) { describe(inside, one); });
  answers = others.value_or(ReadOptions{});
  answers.zeroState = zeroed;
}

void describe(Fields& io, JobRun& run) {
  io.text("file", run.file);
  io.text("sha256", run.sha256);
  io.text("rig", run.rig);
  describeAnswers(io, run.answers);
  describeSpans(io, "struck_out_s", run.struckOut);
}

void describe(Fields& io, JobPhase& phase) {
  io.word("phase", phase.phase, words::phases);
  std::vector<std::pair<std::string, double>> setting;
  setting.reserve(phase.setting.size());
  for (const SettingValue& one : phase.setting) setting.emplace_back(one.adjuster, one.value);
  io.numberByName("setting", setting, NameUnits::None);
  if (io.reading()) {
    phase.setting.clear();
    for (const auto& [adjuster, value] : setting) phase.setting.push_back({adjuster, value});
  }
  io.list("runs", phase.runs, [](Fields& one, JobRun& run) { describe(one, run); });
}

void describe(Fields& io, JobItem& item) {
  io.text("corner", item.corner);
  io.object("damper", [&](Fields& card) { describe(card, item.damper); });
  io.list("phases", item.phases, [](Fields& one, JobPhase& phase) { describe(one, phase); });
}

void describe(Fields& io, Job& job) {
  io.text("number", job.number);
  io.text("customer", job.customer);
  io.text("vehicle", job.vehicle);
  io.text("plate", job.plate);
  io.word("kind", job.kind, words::vehicleKinds);
  io.text("technician", job.technician);
  io.date("opened", job.opened);
  io.flag("invented", job.invented);
  io.list("items", job.items, [](Fields& one, JobItem& item) { describe(one, item); });
  io.object("limits", job.limits, [](Fields& inside, Limits& limits) { describe(inside, limits); });
  io.text("notes", job.notes);
}

}  // namespace

void describeSpans(Fields& io, std::string_view key, std::vector<TimeSpan>& spans) {
  io.list(key, spans, [](Fields& one, TimeSpan& span) {
    one.number("start_s", span.start);
    one.number("end_s", span.end);
  });
}

Result<Job> readJob(std::string_view bytes, std::string_view file) {
  Job job;
  const auto read = readDocument(bytes, file, jobDocument, [&](Fields& io) { describe(io, job); });
  if (!read) return read.error();
  return job;
}

std::string writeJob(const Job& job) {
  Job copy = job;
  return writeDocument(jobDocument, [&](Fields& io) { describe(io, copy); });
}

}  // namespace dampwright
