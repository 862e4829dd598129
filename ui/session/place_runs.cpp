// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/session/place_runs.h"

#include <algorithm>
#include <utility>

#include "core/job/group_runs.h"
#include "core/job/read_metadata.h"
#include "core/job/suggest_corner.h"
#include "ui/session/change_job.h"

namespace dampwright {

namespace {

const Metadata& metadataOf(const DroppedRun& run) { return run.reading->source.metadata; }

std::vector<std::string> cornersIn(const Job& job) {
  std::vector<std::string> corners;
  for (const JobItem& item : job.items) corners.push_back(item.corner);
  return corners;
}

std::optional<std::string> saidCorner(const Job& job, const DroppedRun& run) {
  return suggestCorner(run.bytes.name, metadataOf(run), cornersIn(job));
}

// Where the bytes are already: corner and name there.
std::optional<std::pair<std::string, std::string>> findRun(const Job& job,
                                                           const std::string& sha256) {
  for (const JobItem& item : job.items) {
    for (const JobPhase& phase : item.phases) {
      for (const JobRun& run : phase.runs) {
        if (run.sha256 == sha256) return std::pair(item.corner, run.file);
      }
    }
  }
  return std::nullopt;
}

JobPhase phaseOf(const DroppedRun& run) {
  JobRun entry;
  entry.file = run.bytes.name;
  entry.sha256 = run.bytes.sha256;
  entry.rig = run.rig;
  return {Phase::AsFound, settingOfRun({run.bytes.name, metadataOf(run), {}}), {std::move(entry)}};
}

// By setting, then by name.
std::pair<std::vector<double>, std::string> orderOf(const DroppedRun& run) {
  std::vector<double> values;
  for (const SettingValue& one : settingOfRun({run.bytes.name, metadataOf(run), {}}))
    values.push_back(one.value);
  return {values, run.bytes.name};
}

void say(Placed& placed, const std::string& file, Error error, bool taken) {
  const auto same = [&](const DropProblem& one) {
    return one.taken && one.error.code == error.code && one.error.values == error.values;
  };
  if (std::ranges::any_of(placed.problems, same)) return;  // said of another file of this damper
  error.place.file = file;
  placed.problems.push_back({QString::fromStdString(file), std::move(error), taken});
}

// The serial that the file tells, against the cards of the job.
void checkSerial(Placed& placed, const DroppedRun& run, const std::string& corner) {
  const std::string serial = serialOf(metadataOf(run));
  if (serial.empty()) return;
  for (const JobItem& item : placed.job.items) {
    if (item.corner == corner || item.damper.serial != serial) continue;
    say(placed,
        run.bytes.name,
        {"serial-on-two-corners",
         {{"serial", serial}, {"corner", item.corner}, {"second", corner}},
         {}},
        true);
  }
  const DamperCard& card = findItem(placed.job, corner)->damper;
  if (card.serial.empty()) {
    DamperCard filled = run.knownCard && card == DamperCard{} ? *run.knownCard : card;
    filled.serial = serial;
    placed.job = withDamper(std::move(placed.job), corner, std::move(filled));
  } else if (card.serial != serial) {
    say(placed,
        run.bytes.name,
        {"serial-differs", {{"serial", serial}, {"corner", corner}, {"card", card.serial}}, {}},
        true);
  }
}

void take(Placed& placed, const DroppedRun& run, const std::string& corner) {
  const JobPhase phase = phaseOf(run);
  placed.job = withRuns(std::move(placed.job), corner, phase);
  placed.files.push_back(run.bytes);
  checkSerial(placed, run, corner);
  const std::vector<JobPhase>& phases = findItem(placed.job, corner)->phases;
  const auto index = std::ranges::find_if(phases, [&](const JobPhase& one) {
    return std::ranges::count(one.runs, run.bytes.sha256, &JobRun::sha256) > 0;
  });
  placed.last = {QString::fromStdString(corner), static_cast<int>(index - phases.begin())};
}

}  // namespace

Placed placeRuns(const Job& job,
                 std::vector<DroppedRun> runs,
                 const std::string& target,
                 const std::string& selected) {
  Placed placed{job, {}, {}, {}};
  std::ranges::sort(runs, {}, orderOf);  // a file manager hands files over in any order
  for (const DroppedRun& run : runs) {
    if (const auto there = findRun(placed.job, run.bytes.sha256)) {
      const Values where = {{"corner", there->first}, {"name", there->second}};
      say(placed, run.bytes.name, {"run-already-here", where, {}}, false);
      continue;
    }
    const std::optional<std::string> said = saidCorner(placed.job, run);
    const std::string corner = !target.empty() ? target : said.value_or(selected);
    if (findItem(placed.job, corner) == nullptr) {
      say(placed, run.bytes.name, {"corner-unknown", {}, {}}, false);
      continue;
    }
    if (said && *said != corner) {
      const Values both = {{"said", *said}, {"corner", corner}};
      say(placed, run.bytes.name, {"corner-differs", both, {}}, true);
    }
    take(placed, run, corner);
  }
  return placed;
}

Placed placeCard(const Job& job, const DamperCard& card, const std::string& target) {
  Placed placed{job, {}, {}, {}};
  std::string corner = target;
  for (const JobItem& item : job.items) {
    if (corner.empty() && !card.serial.empty() && item.damper.serial == card.serial) {
      corner = item.corner;
    }
  }
  if (corner.empty()) corner = cornerFromWords(card.position, cornersIn(job)).value_or("");
  if (corner.empty() && job.items.size() == 1) corner = job.items.front().corner;
  if (findItem(job, corner) == nullptr) {
    say(placed, card.serial, {"corner-unknown", {}, {}}, false);
    return placed;
  }
  for (const JobItem& item : job.items) {
    if (item.corner == corner || card.serial.empty() || item.damper.serial != card.serial) continue;
    const Values where = {{"serial", card.serial}, {"corner", item.corner}, {"second", corner}};
    say(placed, card.serial, {"serial-on-two-corners", where, {}}, true);
  }
  placed.job = withDamper(job, corner, card);
  return placed;
}

VehicleKind vehicleOf(const std::vector<DroppedRun>& runs) {
  const std::vector<std::string> corners = cornersOf(VehicleKind::Car);
  const bool car = std::ranges::any_of(runs, [&](const DroppedRun& run) {
    return suggestCorner(run.bytes.name, metadataOf(run), corners).has_value();
  });
  return car ? VehicleKind::Car : VehicleKind::SingleDamper;
}

}  // namespace dampwright
