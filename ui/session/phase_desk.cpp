// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/session/phase_desk.h"

#include <algorithm>
#include <utility>

#include "core/verdict/judge.h"
#include "ui/session/find_profile.h"

namespace dampwright {

namespace {

bool sameFiles(const std::vector<JobRun>& a, const std::vector<JobRun>& b) {
  return std::ranges::equal(a, b, {}, &JobRun::sha256, &JobRun::sha256);
}

// What of a card has no part in a measurement must not start one.
DamperCard measuredPart(DamperCard card) {
  card.serial.clear();
  card.partNumber.clear();
  card.position.clear();
  card.notes.clear();
  return card;
}

// The worse verdict of a damper decides about the job.
int badness(VerdictWord word) {
  switch (word) {
    case VerdictWord::Pass:
      return 0;
    case VerdictWord::NotTested:
      return 1;
    case VerdictWord::TooCloseToCall:
      return 2;
    case VerdictWord::Fail:
      break;
  }
  return 3;
}

}  // namespace

PhaseDesk::PhaseDesk(const QString& bookFile, QObject* parent)
    : QObject(parent), bookFile_(bookFile) {}

void PhaseDesk::show(const Job& job) {
  Entries now;
  for (const JobItem& item : job.items) {
    for (std::size_t i = 0; i < item.phases.size(); ++i) {
      if (item.phases[i].runs.empty()) continue;
      const PhaseKey key{QString::fromStdString(item.corner), static_cast<int>(i)};
      now.push_back(takeEntry(key, item.phases[i], item));
    }
  }
  entries_ = std::move(now);
  for (const auto& entry : entries_) refresh(*entry, job.limits);
}

void PhaseDesk::clear() {
  entries_.clear();
  runs_.clear();
}

// The entry that has these runs already, wherever it stood: moving a damper measures nothing.
std::unique_ptr<PhaseDesk::Entry> PhaseDesk::takeEntry(const PhaseKey& key,
                                                       const JobPhase& phase,
                                                       const JobItem& item) {
  const auto same = std::ranges::find_if(
      entries_, [&](const auto& entry) { return entry && sameFiles(entry->runs, phase.runs); });
  std::unique_ptr<Entry> entry =
      same == entries_.end() ? std::make_unique<Entry>() : std::move(*same);
  const DamperCard card = measuredPart(item.damper);
  if (entry->runs != phase.runs || entry->card != card) {
    entry->stale = true;
    entry->runs = phase.runs;
    entry->card = card;
  }
  entry->key = key;
  return entry;
}

void PhaseDesk::refresh(Entry& entry, const std::optional<Limits>& limits) {
  const bool otherLimits = entry.limits != limits;
  entry.limits = limits;
  if (entry.stale) {
    measure(entry);
  } else if (!entry.state.busy && otherLimits && entry.state.measured) {
    judgeAgain(entry);
  }
}

void PhaseDesk::measure(Entry& entry) {
  PhaseTask task{entry.runs, {}, entry.card, profiles_, entry.limits, bookFile_};
  for (const JobRun& run : entry.runs) {
    RunInHand& inHand = runs_[run.sha256];
    if (inHand.answers != run.answers || inHand.rig != run.rig) {
      inHand = {inHand.bytes, nullptr, run.answers, run.rig};
    }
    task.inHand.push_back(inHand);
  }
  entry.stale = false;
  entry.state.busy = true;
  entry.state.progress = 0;
  entry.state.problem.reset();
  entry.work.start(
      [task = std::move(task)](const Progress& progress) { return measurePhase(task, progress); },
      [this, &entry, judgedBy = entry.limits](PhaseOutcome outcome) {
        takeHome(entry, std::move(outcome), judgedBy);
      },
      [this, &entry](double share) {
        entry.state.progress = share;
        emit progressed(entry.key);
      });
  emit changed(entry.key);
}

void PhaseDesk::takeHome(Entry& entry,
                         PhaseOutcome outcome,
                         const std::optional<Limits>& judgedBy) {
  for (std::size_t i = 0; i < outcome.readings.size(); ++i) {
    const JobRun& run = entry.runs[i];
    RunInHand& inHand = runs_[run.sha256];
    if (outcome.readings[i]) inHand = {inHand.bytes, outcome.readings[i], run.answers, run.rig};
  }
  entry.state = {false, 1, outcome.measured, std::move(outcome.verdict), outcome.problem};
  if (entry.state.measured && entry.limits != judgedBy) {
    judgeAgain(entry);
  } else {
    emit changed(entry.key);
  }
}

void PhaseDesk::judgeAgain(Entry& entry) {
  if (!entry.limits) {
    entry.state.verdict.reset();
    emit changed(entry.key);
    return;
  }
  entry.state.busy = true;
  entry.work.start([measured = entry.state.measured, limits = *entry.limits](
                       const Progress&) { return judge(measured->measurement, limits); },
                   [this, &entry, judgedBy = *entry.limits](Verdict verdict) {
                     takeVerdictHome(entry, std::move(verdict), judgedBy);
                   });
  emit changed(entry.key);
}

void PhaseDesk::takeVerdictHome(Entry& entry, Verdict verdict, const Limits& judgedBy) {
  entry.state.busy = false;
  entry.state.verdict = std::move(verdict);
  if (entry.limits != judgedBy) {
    judgeAgain(entry);
  } else {
    emit changed(entry.key);
  }
}

void PhaseDesk::setProfiles(std::vector<RigProfile> profiles) {
  const std::vector<RigProfile> before = std::exchange(profiles_, std::move(profiles));
  for (auto& [sha256, run] : runs_) {
    if (!run.reading) continue;
    const std::string& signature = run.reading->source.signature;
    if (findProfile(before, run.rig, signature) == findProfile(profiles_, run.rig, signature)) {
      continue;
    }
    run.reading.reset();
    for (const auto& entry : entries_) {
      if (std::ranges::count(entry->runs, sha256, &JobRun::sha256) > 0) entry->stale = true;
    }
  }
  for (const auto& entry : entries_) {
    // What is being measured right now may be reading by the profiles of before.
    if (entry->stale || (entry->state.busy && before != profiles_)) measure(*entry);
  }
}

void PhaseDesk::hold(const std::string& sha256, RunInHand run) { runs_[sha256] = std::move(run); }

void PhaseDesk::letBytesGo(const std::string& sha256) {
  const auto found = runs_.find(sha256);
  if (found != runs_.end()) found->second.bytes.reset();
}

const PhaseState& PhaseDesk::state(const PhaseKey& key) const {
  static const PhaseState nothing;
  const auto found =
      std::ranges::find_if(entries_, [&](const auto& entry) { return entry->key == key; });
  return found == entries_.end() ? nothing : (*found)->state;
}

std::shared_ptr<const RunReading> PhaseDesk::readingOf(const std::string& sha256) const {
  const auto found = runs_.find(sha256);
  return found == runs_.end() ? nullptr : found->second.reading;
}

std::shared_ptr<const std::string> PhaseDesk::bytesOf(const std::string& sha256) const {
  const auto found = runs_.find(sha256);
  return found == runs_.end() ? nullptr : found->second.bytes;
}

bool PhaseDesk::busy() const {
  return std::ranges::any_of(entries_, [](const auto& entry) { return entry->state.busy; });
}

void PhaseDesk::stop() {
  for (const auto& entry : entries_) {
    if (!entry->state.busy) continue;
    entry->work.stop();
    entry->stale = true;
    entry->state.busy = false;
    entry->state.problem = Error{"stopped", {}, {}};
    emit changed(entry->key);
  }
}

std::optional<VerdictWord> PhaseDesk::verdictOfAll() const {
  std::optional<VerdictWord> worst;
  for (const auto& entry : entries_) {
    if (!entry->state.verdict) return std::nullopt;
    const VerdictWord word = entry->state.verdict->word;
    if (!worst || badness(word) > badness(*worst)) worst = word;
  }
  return worst;
}

}  // namespace dampwright
