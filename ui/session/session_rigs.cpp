// SPDX-License-Identifier: GPL-3.0-or-later
// Rig profiles, and what the technician says of how a run is read.
#include <algorithm>
#include <set>
#include <utility>

#include "ui/session/change_job.h"
#include "ui/session/find_profile.h"
#include "ui/session/rig_edit.h"
#include "ui/session/session.h"

namespace dampwright {

namespace {

Direction other(Direction direction) {
  return direction == Direction::Compression ? Direction::Rebound : Direction::Compression;
}

std::optional<RigColumn>* columnOf(RigProfile& rig, Role role) {
  switch (role) {
    case Role::Time:
      return &rig.time;
    case Role::Displacement:
      return &rig.displacement;
    case Role::Force:
      return &rig.force;
    case Role::Velocity:
      return &rig.velocity;
    case Role::Temperature:
      return &rig.temperature;
    case Role::Other:
      break;
  }
  return nullptr;
}

}  // namespace

void Session::putRig(const std::string& name,
                     const std::optional<RigProfile>& rig,
                     const QString& what) {
  wasBusy_ = true;
  std::vector<RigProfile> profiles = desk_.profiles();
  std::erase_if(profiles, [&](const RigProfile& profile) { return profile.name == name; });
  if (rig) profiles.insert(profiles.begin(), *rig);
  keeper_.write({[name, rig, text = what.toStdString()](Book& book) {
                   return rig ? book.saveRigProfile(*rig, text) : book.removeRigProfile(name, text);
                 },
                 {}});
  desk_.setProfiles(std::move(profiles));
}

void Session::editRig(const QString& text, const RigProfile& after) {
  const std::vector<RigProfile>& profiles = desk_.profiles();
  const auto known = std::ranges::find(profiles, after.name, &RigProfile::name);
  std::optional<RigProfile> before;
  if (known != profiles.end()) before = *known;
  if (before == after) return;
  undo_.push(new RigEdit(
      text,
      before,
      after,
      [this](const std::string& name, const std::optional<RigProfile>& rig, const QString& what) {
        putRig(name, rig, what);
      }));
}

// The rig of this name or file layout, or a new one under the next free name.
RigProfile Session::profileFor(const std::string& name, const std::string& signature) const {
  const std::vector<RigProfile>& profiles = desk_.profiles();
  if (const auto known = findProfile(profiles, name, signature)) return *known;
  RigProfile made;
  made.signature = signature;
  for (int i = 1; made.name.empty(); ++i) {
    const std::string free = "rig " + std::to_string(i);
    if (std::ranges::find(profiles, free, &RigProfile::name) == profiles.end()) made.name = free;
  }
  return made;
}

void Session::settleDirection(const PhaseKey& key, Direction displacementPositive) {
  const JobPhase* phase =
      hasJob() ? findPhase(*job_, key.corner.toStdString(), key.phase) : nullptr;
  if (phase == nullptr) return;
  std::set<std::pair<std::string, std::string>> layouts;
  for (const JobRun& run : phase->runs) {
    if (const auto reading = desk_.readingOf(run.sha256)) {
      layouts.emplace(run.rig, reading->source.signature);
    }
  }
  const QString text = tr("direction of the rig");
  undo_.beginMacro(text);
  for (const auto& [name, signature] : layouts) {
    RigProfile rig = profileFor(name, signature);
    rig.displacementPositive = displacementPositive;
    editRig(text, rig);
  }
  undo_.endMacro();
}

void Session::confirmColumns(const RunPlace& place,
                             const ReadOptions& answers,
                             const std::optional<RigProfile>& remember) {
  if (run(place) == nullptr) return;
  const QString text = tr("columns of %1").arg(QString::fromStdString(run(place)->file));
  undo_.beginMacro(text);
  if (remember) editRig(text, *remember);
  const auto rig = remember ? std::optional(remember->name) : std::nullopt;
  edit(text,
       withReading(
           *job_, place.phase.corner.toStdString(), place.phase.phase, place.run, answers, rig));
  undo_.endMacro();
}

void Session::turnForceSign(const RunPlace& place) {
  const JobRun* found = run(place);
  if (found == nullptr) return;
  ReadOptions answers = found->answers;
  if (answers.forcePositive) {
    answers.forcePositive = other(*answers.forcePositive);
    return confirmColumns(place, answers, std::nullopt);
  }
  std::optional<RigProfile> rig = rigOf(place);
  if (!rig || !rig->forcePositive) return;
  rig->forcePositive = other(*rig->forcePositive);
  editRig(tr("force sign of %1").arg(QString::fromStdString(rig->name)), *rig);
}

void Session::confirmUnits(const RunPlace& place) {
  const auto known = reading(place);
  if (!known) return;
  RigProfile rig = profileFor(run(place)->rig, known->source.signature);
  for (const SourceColumn& column : known->source.columns) {
    std::optional<RigColumn>* kept = columnOf(rig, column.role);
    if (kept == nullptr || !column.assumed) continue;
    if (!*kept) *kept = RigColumn{};
    (*kept)->name = column.name;
    if (column.name.empty()) (*kept)->number = column.index;
    (*kept)->unit = column.unit;
  }
  editRig(tr("units of %1").arg(QString::fromStdString(rig.name)), rig);
}

void Session::noteOffered(const QString& sha256, const QString& name) {
  keeper_.write({[sha256 = sha256.toStdString(), name = name.toStdString()](Book& book) {
                   return book.noteOffered(sha256, name);
                 },
                 {}});
}

}  // namespace dampwright
