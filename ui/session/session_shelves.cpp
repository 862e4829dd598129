// SPDX-License-Identifier: GPL-3.0-or-later
// Limit sheets and rig profiles: what the job book holds besides jobs.
#include <algorithm>
#include <set>
#include <utility>

#include "ui/session/change_job.h"
#include "ui/session/find_profile.h"
#include "ui/session/rig_edit.h"
#include "ui/session/session.h"

namespace dampwright {

namespace {

// "C" becomes "C2", "C2" becomes "C3", none becomes "2".
std::string nextRevision(const std::string& revision) {
  std::size_t digits = revision.size();
  while (digits > 0 && revision[digits - 1] >= '0' && revision[digits - 1] <= '9') --digits;
  const QString number = QString::fromStdString(revision.substr(digits));
  const int next = number.isEmpty() ? 2 : number.toInt() + 1;
  return revision.substr(0, digits) + std::to_string(next);
}

}  // namespace

bool Session::limitsTaken(const Limits& limits) const {
  return std::ranges::any_of(knownLimits_, [&](const Limits& known) {
    return known.title == limits.title && known.revision == limits.revision && known != limits;
  });
}

void Session::keepLimits(const Limits& limits) {
  wasBusy_ = true;
  keeper_.write({[limits](Book& book) { return book.addLimits(limits); }, {}});
  const auto same = std::ranges::find(knownLimits_, limits.title, &Limits::title);
  if (same == knownLimits_.end()) {
    knownLimits_.push_back(limits);
    std::ranges::sort(knownLimits_, {}, &Limits::title);
  } else {
    *same = limits;
  }
  emit limitsKnownChanged();
}

void Session::chooseLimits(const Limits& given) {
  if (!hasJob()) return;
  Limits limits = given;
  while (limitsTaken(limits)) limits.revision = nextRevision(limits.revision);
  if (std::ranges::find(knownLimits_, limits) == knownLimits_.end()) keepLimits(limits);
  Job after = *job_;
  after.limits = limits;
  edit(tr("limits %1").arg(QString::fromStdString(limits.title)), std::move(after));
}

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

// The rig of this file layout, or a new one under the next free name.
RigProfile Session::profileFor(const std::string& signature) const {
  const std::vector<RigProfile>& profiles = desk_.profiles();
  if (const auto known = findProfile(profiles, signature)) return *known;
  RigProfile made;
  made.signature = signature;
  for (int i = 1; made.name.empty(); ++i) {
    const std::string name = "rig " + std::to_string(i);
    if (std::ranges::find(profiles, name, &RigProfile::name) == profiles.end()) made.name = name;
  }
  return made;
}

void Session::settleDirection(const PhaseKey& key, Direction displacementPositive) {
  const JobPhase* phase =
      hasJob() ? findPhase(*job_, key.corner.toStdString(), key.phase) : nullptr;
  if (phase == nullptr) return;
  std::set<std::string> signatures;
  for (const JobRun& run : phase->runs) {
    if (const auto reading = desk_.readingOf(run.sha256)) {
      signatures.insert(reading->source.signature);
    }
  }
  const QString text = tr("direction of the rig");
  undo_.beginMacro(text);
  for (const std::string& signature : signatures) {
    RigProfile rig = profileFor(signature);
    rig.displacementPositive = displacementPositive;
    editRig(text, rig);
  }
  undo_.endMacro();
}

}  // namespace dampwright
