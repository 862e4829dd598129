// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/session/session.h"

#include <QTimer>
#include <chrono>
#include <utility>

#include "ui/session/change_job.h"
#include "ui/session/find_profile.h"
#include "ui/text/sentences.h"

namespace dampwright {

namespace {

constexpr int recentCount = 50;
constexpr std::chrono::seconds lookAgainAfter{3};

}  // namespace

Session::Session(const QString& bookFile, const QString& sampleRuns, QObject* parent)
    : QObject(parent),
      bookFile_(bookFile),
      sampleRuns_(sampleRuns),
      keeper_(bookFile),
      desk_(bookFile) {
  connect(&keeper_, &BookKeeper::trouble, this, &Session::tellTrouble);
  connect(&keeper_, &BookKeeper::well, this, [this] { emit bookTrouble({}); });
  connect(&keeper_, &BookKeeper::settled, this, &Session::settle);
  connect(&desk_, &PhaseDesk::progressed, this, &Session::progressChanged);
  connect(&desk_, &PhaseDesk::changed, this, [this](const PhaseKey& key) {
    emit stateChanged(key);
    noteVerdict();
    settle();
  });
  readContents();
}

Session::~Session() {
  blockSignals(true);  // who listens may be half gone
  stopWork();
}

void Session::readContents() {
  keeper_.read([](const Book& book) { return contentsOf(book); },
               [this](Result<BookContents> contents) {
                 const bool first = !std::exchange(triedContents_, true);
                 if (contents) {
                   takeContents(std::move(contents).value());
                 } else {
                   if (first) tellTrouble(contents.error());
                   QTimer::singleShot(lookAgainAfter, this, &Session::readContents);
                 }
                 if (first) emit bookRead();
               });
}

Result<Session::BookContents> Session::contentsOf(const Book& book) {
  Result<std::vector<Limits>> limits = book.limitSheets();
  if (!limits) return limits.error();
  Result<std::vector<RigProfile>> rigs = book.rigProfiles();
  if (!rigs) return rigs.error();
  Result<std::vector<JobSummary>> recent = book.recentJobs(recentCount);
  if (!recent) return recent.error();
  const Result<std::string> last = book.setting("last job");
  if (!last) return last.error();
  BookContents contents{
      std::move(limits).value(), std::move(rigs).value(), std::move(recent).value(), std::nullopt};
  if (last.value().empty()) return contents;
  // A last job that can't be read must not keep all others away.
  if (Result<Job> job = book.job(last.value())) contents.lastJob = std::move(job).value();
  return contents;
}

void Session::takeContents(BookContents contents) {
  knownLimits_ = std::move(contents.limits);
  recentJobs_ = std::move(contents.recentJobs);
  desk_.setProfiles(std::move(contents.rigs));
  emit limitsKnownChanged();
  emit recentJobsChanged();
  if (contents.lastJob && !hasJob()) {
    open(*contents.lastJob, std::make_shared<std::string>(contents.lastJob->number));
  }
}

void Session::refreshRecentJobs() {
  keeper_.read([](const Book& book) { return book.recentJobs(recentCount); },
               [this](Result<std::vector<JobSummary>> jobs) {
                 if (!jobs || jobs.value() == recentJobs_) return;
                 recentJobs_ = std::move(jobs).value();
                 emit recentJobsChanged();
               });
}

bool Session::hasJob() const { return job_.has_value(); }

const Job& Session::job() const {
  expects(hasJob());
  return *job_;
}

const PhaseState& Session::state(const PhaseKey& key) const { return desk_.state(key); }
PhaseKey Session::selected() const { return selected_; }
std::vector<Limits> Session::knownLimits() const { return knownLimits_; }
const std::vector<JobSummary>& Session::recentJobs() const { return recentJobs_; }
const std::vector<DropProblem>& Session::dropProblems() const { return dropProblems_; }
bool Session::busy() const { return drops_ > 0 || keeper_.busy() || desk_.busy(); }
bool Session::hasUnwritten() const { return keeper_.hasUnwritten(); }
QUndoStack* Session::undoStack() { return &undo_; }

Result<std::string> Session::bytesOfRun(const std::string& sha256) const {
  if (const auto bytes = desk_.bytesOf(sha256)) return *bytes;
  const Result<Book> book = Book::open(bookFile_);
  if (!book) return book.error();
  return book.value().runFile(sha256);
}

const JobRun* Session::run(const RunPlace& place) const {
  const std::string corner = place.phase.corner.toStdString();
  return hasJob() ? findRun(*job_, corner, place.phase.phase, place.run) : nullptr;
}

std::shared_ptr<const RunReading> Session::reading(const RunPlace& place) const {
  const JobRun* found = run(place);
  return found != nullptr ? desk_.readingOf(found->sha256) : nullptr;
}

std::function<Result<std::shared_ptr<const std::string>>()> Session::loaderOf(
    const RunPlace& place) const {
  using Text = std::shared_ptr<const std::string>;
  const JobRun* found = run(place);
  expects(found != nullptr);
  const auto inHand = desk_.bytesOf(found->sha256);
  return [inHand, bookFile = bookFile_, sha256 = found->sha256]() -> Result<Text> {
    if (inHand) return inHand;
    const Result<Book> book = Book::open(bookFile);
    if (!book) return book.error();
    Result<std::string> bytes = book.value().runFile(sha256);
    if (!bytes) return bytes.error();
    return std::make_shared<const std::string>(std::move(bytes).value());
  };
}

const std::vector<RigProfile>& Session::rigProfiles() const { return desk_.profiles(); }

std::optional<RigProfile> Session::rigOf(const RunPlace& place) const {
  const JobRun* found = run(place);
  if (found == nullptr) return std::nullopt;
  const auto known = reading(place);
  return findProfile(desk_.profiles(), found->rig, known ? known->source.signature : std::string());
}

void Session::stopWork() {
  intake_.stop();
  drops_ = 0;
  desk_.stop();
  settle();
}

void Session::tellTrouble(const Error& error) { emit bookTrouble(sentenceText(error)); }

void Session::say(const QString& file, Error error) {
  dropProblems_.push_back({file, std::move(error), false});
  emit dropProblemsChanged();
}

void Session::noteVerdict() {
  if (!hasJob() || desk_.busy()) return;
  const std::optional<VerdictWord> verdict = desk_.verdictOfAll();
  if (verdict == writtenVerdict_) return;
  writtenVerdict_ = verdict;
  keeper_.write(
      {[number = number_, verdict](Book& book) { return book.setVerdict(*number, verdict); },
       [this] { refreshRecentJobs(); }});
}

void Session::settle() {
  const bool before = std::exchange(wasBusy_, busy());
  if (before && !wasBusy_) emit idle();
}

}  // namespace dampwright
