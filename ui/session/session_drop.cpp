// SPDX-License-Identifier: GPL-3.0-or-later
// What comes of dropped files.
#include <QFileInfo>
#include <algorithm>
#include <set>
#include <utility>

#include "ui/session/change_job.h"
#include "ui/session/place_runs.h"
#include "ui/session/read_drop.h"
#include "ui/session/session.h"

namespace dampwright {

namespace {

QStringList namesOf(const QStringList& paths) {
  QStringList names;
  for (const QString& path : paths) names << QFileInfo(path).fileName();
  return names;
}

// What problems of documents stand under.
QStringList titlesOf(const std::vector<DroppedItem>& items) {
  QStringList titles;
  for (const DroppedItem& item : items) {
    if (const auto* card = std::get_if<DamperCard>(&item))
      titles << QString::fromStdString(card->serial);
    if (const auto* limits = std::get_if<Limits>(&item))
      titles << QString::fromStdString(limits->title);
  }
  return titles;
}

}  // namespace

void Session::dropFiles(const QStringList& paths, const QString& corner) {
  if (paths.isEmpty()) return;
  wasBusy_ = true;
  ++drops_;
  intake_.add(
      [task = DropTask{paths, desk_.profiles(), bookFile_}](const Progress& progress) {
        return readDrop(task, progress);
      },
      [this, corner, job = number_, names = namesOf(paths)](std::vector<DroppedItem> items) {
        --drops_;
        forgetProblems(names + titlesOf(items));
        if (job && job != number_) refuseJobItems(items);
        takeDrop(std::move(items), corner);
        settle();
      });
}

// What was said of a file before is out of date once the file was read again.
void Session::forgetProblems(const QStringList& files) {
  std::erase_if(dropProblems_,
                [&](const DropProblem& problem) { return files.contains(problem.file); });
}

void Session::dismissDropProblem(int problem) {
  if (problem < 0 || problem >= static_cast<int>(dropProblems_.size())) return;
  dropProblems_.erase(dropProblems_.begin() + problem);
  emit dropProblemsChanged();
}

void Session::dismissDropProblems() {
  if (std::exchange(dropProblems_, {}).empty()) return;
  emit dropProblemsChanged();
}

// What was dropped on one job must not land in another that was opened meanwhile.
void Session::refuseJobItems(std::vector<DroppedItem>& items) {
  for (DroppedItem& item : items) {
    std::string file;
    if (const auto* run = std::get_if<DroppedRun>(&item)) file = run->bytes.name;
    if (const auto* card = std::get_if<DamperCard>(&item)) file = card->serial;
    if (const auto* limits = std::get_if<Limits>(&item)) file = limits->title;
    if (file.empty()) continue;
    item = DropProblem{QString::fromStdString(file), {"job-was-left", {}, {file}}};
  }
}

// Documents first: a rig profile, a job or a card of the same drop counts for its runs.
void Session::takeDrop(std::vector<DroppedItem> items, const QString& corner) {
  std::vector<DroppedRun> runs;
  std::vector<DamperCard> cards;
  for (DroppedItem& item : items) {
    if (auto* run = std::get_if<DroppedRun>(&item)) runs.push_back(std::move(*run));
    if (auto* card = std::get_if<DamperCard>(&item)) cards.push_back(std::move(*card));
    if (auto* job = std::get_if<DroppedJob>(&item)) {
      addJob(job->job, tr("job dropped in"), job->files);
    }
    if (auto* rig = std::get_if<RigProfile>(&item)) editRig(tr("rig profile"), *rig);
    if (auto* problem = std::get_if<DropProblem>(&item)) dropProblems_.push_back(*problem);
  }
  for (const DamperCard& card : cards) takeCard(card, corner);
  if (!runs.empty()) takeRuns(std::move(runs), corner);
  for (const DroppedItem& item : items) {
    if (const auto* limits = std::get_if<Limits>(&item)) takeLimits(*limits);
  }
  emit dropProblemsChanged();
}

void Session::takeRuns(std::vector<DroppedRun> runs, const QString& corner) {
  if (!hasJob()) {
    Job draft;
    draft.kind = vehicleOf(runs);
    startJob(draft);
  }
  const Placed placed =
      placeRuns(*job_, runs, corner.toStdString(), selected_.corner.toStdString());
  for (const DroppedRun& run : runs) {
    const bool taken = std::ranges::count(placed.files, run.bytes.sha256, &RunBytes::sha256) > 0;
    if (taken) desk_.hold(run.bytes.sha256, {run.bytes.bytes, run.reading, {}, run.rig});
  }
  dropProblems_.insert(dropProblems_.end(), placed.problems.begin(), placed.problems.end());
  edit(tr("add %n run(s)", nullptr, static_cast<int>(placed.files.size())), placed.job);
  if (placed.last) select(*placed.last);
  askOpen(placed.files);
}

// What the first file of a layout answers need not be asked of the others.
void Session::askOpen(const std::vector<RunBytes>& files) {
  std::vector<RunPlace> places;
  std::set<std::string> asked;
  for (const JobItem& item : job_->items) {
    for (std::size_t phase = 0; phase < item.phases.size(); ++phase) {
      const std::vector<JobRun>& runs = item.phases[phase].runs;
      for (std::size_t run = 0; run < runs.size(); ++run) {
        if (std::ranges::count(files, runs[run].sha256, &RunBytes::sha256) == 0) continue;
        const auto reading = desk_.readingOf(runs[run].sha256);
        if (!reading || reading->open.empty()) continue;
        if (!asked.insert(reading->source.signature).second) continue;
        places.push_back({{QString::fromStdString(item.corner), static_cast<int>(phase)},
                          static_cast<int>(run)});
      }
    }
  }
  if (!places.empty()) emit questionsAsked(places);
}

void Session::takeCard(const DamperCard& card, const QString& corner) {
  if (!hasJob()) {
    dropProblems_.push_back({QString::fromStdString(card.serial), {"no-open-job", {}, {}}});
    return;
  }
  const Placed placed = placeCard(*job_, card, corner.toStdString());
  dropProblems_.insert(dropProblems_.end(), placed.problems.begin(), placed.problems.end());
  edit(tr("damper card"), placed.job);
}

void Session::takeLimits(const Limits& limits) {
  if (limitsTaken(limits)) {
    const Values which = {{"title", limits.title}, {"revision", limits.revision}};
    dropProblems_.push_back(
        {QString::fromStdString(limits.title), {"limits-revision-taken", which, {}}});
  } else if (hasJob()) {
    chooseLimits(limits);
  } else {
    keepLimits(limits);
  }
}

}  // namespace dampwright
