// SPDX-License-Identifier: GPL-3.0-or-later
// Which job is open, and how it gets into the book.
#include <QDateTime>
#include <algorithm>
#include <utility>

#include "ui/session/change_job.h"
#include "ui/session/read_drop.h"
#include "ui/session/session.h"

namespace dampwright {

namespace {

std::string nowWithOffset() {
  const QDateTime now = QDateTime::currentDateTime();
  return now.toOffsetFromUtc(now.offsetFromUtc()).toString(Qt::ISODate).toStdString();
}

}  // namespace

void Session::open(const Job& job, NumberCell number, const std::vector<RunBytes>& unwritten) {
  undo_.clear();
  desk_.clear();
  for (const RunBytes& file : unwritten) desk_.hold(file.sha256, {file.bytes, nullptr});
  job_ = job;
  number_ = std::move(number);
  writtenVerdict_.reset();
  desk_.show(*job_);
  const auto tested =
      std::ranges::find_if(job_->items, [](const JobItem& item) { return !item.phases.empty(); });
  const JobItem& first = tested == job_->items.end() ? job_->items.front() : *tested;
  selected_ = {QString::fromStdString(first.corner), 0};
  // What was said of files that were taken belongs to the job that took them.
  std::erase_if(dropProblems_, [](const DropProblem& problem) { return problem.taken; });
  emit dropProblemsChanged();
  emit jobChanged();
  emit selectionChanged();
}

void Session::remember(const NumberCell& number) {
  keeper_.write({[number](Book& book) { return book.setSetting("last job", *number); }, {}});
}

void Session::addJob(const Job& given, const QString& what, std::vector<RunBytes> files) {
  Job job = withAllCorners(given);
  if (job.opened.empty()) job.opened = nowWithOffset();
  const NumberCell number = std::make_shared<std::string>();
  const auto add = [number, job, text = what.toStdString(), files](Book& book) -> Result<Done> {
    Result<std::string> numbered = book.addJob(job, text, files);
    if (!numbered) return numbered.error();
    *number = std::move(numbered).value();
    return Done{};
  };
  const auto added = [this, number, files] {
    for (const RunBytes& file : files) desk_.letBytesGo(file.sha256);
    if (number_ != number) return;
    job_->number = *number;
    emit jobChanged();
    refreshRecentJobs();
  };
  keeper_.write({add, added});
  remember(number);
  open(job, number, files);
}

void Session::startJob(const Job& draft) { addJob(draft, tr("new job"), {}); }

void Session::openJob(const QString& number) {
  wasBusy_ = true;
  keeper_.read([number = number.toStdString()](const Book& book) { return book.job(number); },
               [this, number](Result<Job> job) {
                 if (job) {
                   takeJob(job.value());
                 } else {
                   say(number, job.error());
                 }
               });
}

void Session::takeJob(const Job& job) {
  const auto number = std::make_shared<std::string>(job.number);
  remember(number);
  forgetProblems({QString::fromStdString(job.number)});
  open(job, number);
}

// Everything that an edit makes of the job ends here: first written, then shown and measured.
void Session::put(const Job& job, const QString& what) {
  const std::string number = job_->number;
  job_ = job;
  job_->number = number;
  writeJob(*job_, what);
  desk_.show(*job_);
  emit jobChanged();
  noteVerdict();
}

std::vector<RunBytes> Session::unstored(const Job& job) const {
  std::vector<RunBytes> files;
  for (const JobItem& item : job.items) {
    for (const JobPhase& phase : item.phases) {
      for (const JobRun& run : phase.runs) {
        if (auto bytes = desk_.bytesOf(run.sha256)) {
          files.push_back({run.file, run.sha256, std::move(bytes)});
        }
      }
    }
  }
  return files;
}

void Session::writeJob(const Job& job, const QString& what) {
  wasBusy_ = true;
  const std::vector<RunBytes> files = unstored(job);
  const auto write = [job, number = number_, text = what.toStdString(), files](Book& book) {
    Job numbered = job;
    numbered.number = *number;
    return book.saveJob(numbered, text, files);
  };
  const auto written = [this, files] {
    for (const RunBytes& file : files) desk_.letBytesGo(file.sha256);
    refreshRecentJobs();
  };
  keeper_.write({write, written});
}

void Session::openDemonstration() {
  wasBusy_ = true;
  keeper_.read(
      [](const Book& book) -> Result<Job> {
        const Result<std::string> number = book.setting("demonstration");
        if (!number) return number.error();
        return book.job(number.value());
      },
      [this](Result<Job> made) {
        if (made) return takeJob(made.value());
        ++drops_;
        intake_.add([task = DropTask{documentsBelow(sampleRuns_), desk_.profiles(), bookFile_}](
                        const Progress& progress) { return readDrop(task, progress); },
                    [this](std::vector<DroppedItem> items) {
                      --drops_;
                      takeDemonstration(std::move(items));
                      settle();
                    });
      });
}

void Session::takeDemonstration(std::vector<DroppedItem> items) {
  bool found = false;
  for (DroppedItem& item : items) {
    if (const auto* rig = std::get_if<RigProfile>(&item))
      putRig(rig->name, *rig, tr("demonstration"));
    if (const auto* limits = std::get_if<Limits>(&item)) keepLimits(*limits);
    auto* dropped = std::get_if<DroppedJob>(&item);
    if (dropped == nullptr || found) continue;
    found = true;
    dropped->job.invented = true;
    addJob(dropped->job, tr("demonstration"), dropped->files);
    keeper_.write(
        {[number = number_](Book& book) { return book.setSetting("demonstration", *number); }, {}});
  }
  if (!found) {
    say(sampleRuns_, {"demonstration-missing", {{"folder", sampleRuns_.toStdString()}}, {}});
  }
}

}  // namespace dampwright
