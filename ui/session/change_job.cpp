// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/session/change_job.h"

#include <algorithm>
#include <iterator>
#include <utility>

namespace dampwright {

namespace {

JobItem* itemOf(Job& job, std::string_view corner) {
  const auto found = std::ranges::find(job.items, corner, &JobItem::corner);
  return found == job.items.end() ? nullptr : &*found;
}

JobPhase* phaseOf(Job& job, std::string_view corner, int phase) {
  JobItem* item = itemOf(job, corner);
  if (item == nullptr || phase < 0 || phase >= std::ssize(item->phases)) return nullptr;
  return &item->phases[static_cast<std::size_t>(phase)];
}

JobRun* runOf(Job& job, std::string_view corner, int phase, int run) {
  JobPhase* found = phaseOf(job, corner, phase);
  if (found == nullptr || run < 0 || run >= std::ssize(found->runs)) return nullptr;
  return &found->runs[static_cast<std::size_t>(run)];
}

void dropPhase(JobItem& item, int phase) { item.phases.erase(item.phases.begin() + phase); }

}  // namespace

Job withAllCorners(Job job) {
  std::vector<JobItem> items;
  for (const std::string& corner : cornersOf(job.kind)) {
    const JobItem* given = findItem(job, corner);
    items.push_back(given != nullptr ? *given : JobItem{corner, {}, {}});
  }
  for (const JobItem& item : job.items) {
    const bool placed = std::ranges::find(items, item.corner, &JobItem::corner) != items.end();
    if (!placed) items.push_back(item);
  }
  job.items = std::move(items);
  return job;
}

const JobItem* findItem(const Job& job, std::string_view corner) {
  const auto found = std::ranges::find(job.items, corner, &JobItem::corner);
  return found == job.items.end() ? nullptr : &*found;
}

const JobPhase* findPhase(const Job& job, std::string_view corner, int phase) {
  const JobItem* item = findItem(job, corner);
  if (item == nullptr || phase < 0 || phase >= std::ssize(item->phases)) return nullptr;
  return &item->phases[static_cast<std::size_t>(phase)];
}

Job withoutRun(Job job, std::string_view corner, int phase, int run) {
  if (runOf(job, corner, phase, run) == nullptr) return job;
  JobItem& item = *itemOf(job, corner);
  JobPhase& found = item.phases[static_cast<std::size_t>(phase)];
  found.runs.erase(found.runs.begin() + run);
  if (found.runs.empty()) dropPhase(item, phase);
  return job;
}

Job withRunsMoved(Job job, std::string_view from, int phase, std::string_view to) {
  if (phaseOf(job, from, phase) == nullptr || itemOf(job, to) == nullptr || from == to) return job;
  const JobPhase moved = *phaseOf(job, from, phase);
  dropPhase(*itemOf(job, from), phase);
  return withRuns(std::move(job), to, moved);
}

Job withDetails(Job job, const Job& details) {
  job.customer = details.customer;
  job.vehicle = details.vehicle;
  job.plate = details.plate;
  job.technician = details.technician;
  job.notes = details.notes;
  return job;
}

Job withDamper(Job job, std::string_view corner, DamperCard card) {
  if (JobItem* item = itemOf(job, corner)) item->damper = std::move(card);
  return job;
}

Job withStruckOut(Job job, std::string_view corner, int phase, int run, const TimeSpan& span) {
  JobRun* found = runOf(job, corner, phase, run);
  if (found == nullptr || std::ranges::count(found->struckOut, span) > 0) return job;
  found->struckOut.push_back(span);
  std::ranges::sort(found->struckOut, {}, &TimeSpan::start);
  return job;
}

Job withPutBack(Job job, std::string_view corner, int phase, int run, const TimeSpan& span) {
  if (JobRun* found = runOf(job, corner, phase, run)) std::erase(found->struckOut, span);
  return job;
}

const JobRun* findRun(const Job& job, std::string_view corner, int phase, int run) {
  const JobPhase* found = findPhase(job, corner, phase);
  if (found == nullptr || run < 0 || run >= std::ssize(found->runs)) return nullptr;
  return &found->runs[static_cast<std::size_t>(run)];
}

Job withReading(Job job,
                std::string_view corner,
                int phase,
                int run,
                const ReadOptions& answers,
                const std::optional<std::string>& rig) {
  JobRun* found = runOf(job, corner, phase, run);
  if (found == nullptr) return job;
  found->answers = answers;
  if (rig) found->rig = *rig;
  return job;
}

Job withRuns(Job job, std::string_view corner, const JobPhase& runs) {
  JobItem* item = itemOf(job, corner);
  if (item == nullptr || runs.runs.empty()) return job;
  const auto same = std::ranges::find_if(item->phases, [&](const JobPhase& phase) {
    return phase.phase == runs.phase && phase.setting == runs.setting;
  });
  if (same == item->phases.end()) {
    item->phases.push_back(runs);
  } else {
    same->runs.insert(same->runs.end(), runs.runs.begin(), runs.runs.end());
  }
  return job;
}

}  // namespace dampwright
