// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QObject>
#include <QString>
#include <QStringList>
#include <QUndoStack>
#include <functional>
#include <memory>
#include <optional>
#include <string>
#include <vector>

#include "core/base/result.h"
#include "core/book/job_summary.h"
#include "core/job/job.h"
#include "ui/background/ordered_jobs.h"
#include "ui/session/book_keeper.h"
#include "ui/session/dropped.h"
#include "ui/session/phase_desk.h"
#include "ui/session/phase_state.h"

namespace dampwright {

/// Sole owner of the open job, its measurements and verdicts. Every edit is an undo command, and
/// each is written to the job book in a transaction at once: there is no save and no unsaved state.
/// Lives on the GUI thread; reading, measuring and writing run elsewhere.
class Session : public QObject {
  Q_OBJECT
 public:
  /// The job book is `bookFile`, made where there is none; the demonstration is made of the folder
  /// `sampleRuns`. The book is read in the background: bookRead() says when, and by then the last
  /// open job is back (if hasJob() is false then and recentJobs() is empty, this is a first start).
  Session(const QString& bookFile, const QString& sampleRuns, QObject* parent = nullptr);
  ~Session() override;  ///< waits until everything is written, or cannot be

  bool hasJob() const;
  const Job& job() const;
  const PhaseState& state(const PhaseKey& key) const;
  PhaseKey selected() const;
  std::vector<Limits> knownLimits()
      const;  ///< the job book's limit sheets, newest revision of each title
  const std::vector<JobSummary>& recentJobs() const;  ///< newest first, up to 50
  /// Of all drops, oldest first. One stays until it is dismissed or its file is dropped again.
  const std::vector<DropProblem>& dropProblems() const;
  bool busy() const;          ///< files are read, measured or written, or the book is not read yet
  bool hasUnwritten() const;  ///< the book is in trouble, and something typed is only in memory
  /// The bytes of a run as they came. Errors: run-file-missing, run-file-damaged, those of
  /// core/book.
  Result<std::string> bytesOfRun(const std::string& sha256) const;
  QUndoStack* undoStack();
  /// The run of the job; nothing where there is none.
  const JobRun* run(const RunPlace& place) const;
  /// How it was understood, also where something is still asked; nothing while it is being read.
  std::shared_ptr<const RunReading> reading(const RunPlace& place) const;
  /// Gets the run's bytes, from memory or from the book; for any thread. There must be the run.
  std::function<Result<std::shared_ptr<const std::string>>()> loaderOf(const RunPlace& place) const;
  const std::vector<RigProfile>& rigProfiles() const;  ///< last saved first
  /// The profile by which a run is read.
  std::optional<RigProfile> rigOf(const RunPlace& place) const;
  QString bookFile() const { return bookFile_; }  ///< for work that opens the book on its own

 public slots:
  void select(const dampwright::PhaseKey& key);
  /// Opens it at once; its number, the next free one ("2031-0007") or its own if that is free, is
  /// there when the book has it (jobChanged).
  void startJob(const dampwright::Job& draft);
  void openJob(const QString& number);
  void openDemonstration();
  /// Run files, limit sheets, rig profiles, damper cards, in any mixture. Runs go to `corner`, or
  /// where it is empty to the corner that name or metadata suggest, else to the selected one.
  void dropFiles(const QStringList& paths, const QString& corner);
  void removeRun(const dampwright::PhaseKey& key, int run);
  void moveRuns(const dampwright::PhaseKey& from, const QString& toCorner);
  void setDamper(const QString& corner, const dampwright::DamperCard& card);
  void setJobDetails(
      const dampwright::Job& details);  ///< customer, vehicle, plate, technician, notes
  void chooseLimits(const dampwright::Limits& limits);
  void strikeOut(const dampwright::PhaseKey& key, int run, const dampwright::TimeSpan& span);
  void putBack(const dampwright::PhaseKey& key, int run, const dampwright::TimeSpan& span);
  /// Answers the question which way is compression, for this run's rig, once and for good.
  void settleDirection(const dampwright::PhaseKey& key, dampwright::Direction displacementPositive);
  void dismissDropProblem(int problem);  ///< index into dropProblems()
  void dismissDropProblems();
  /// The run is read by `answers`; with `remember` its rig is that one from now on, and every run
  /// of that rig is read again. One edit.
  void confirmColumns(const dampwright::RunPlace& place,
                      const dampwright::ReadOptions& answers,
                      const std::optional<dampwright::RigProfile>& remember);
  /// The force sign that was given turned, where it was given: with the run, or in its profile.
  void turnForceSign(const dampwright::RunPlace& place);
  /// Units that were assumed become those of the run's rig.
  void confirmUnits(const dampwright::RunPlace& place);
  /// A file of the rig folder was taken or turned down; it is not offered again.
  void noteOffered(const QString& sha256, const QString& name);
  void stopWork();

 signals:
  void jobChanged();  ///< anything of the job itself, or another job
  void selectionChanged();
  void stateChanged(const dampwright::PhaseKey& key);  ///< busy, measurement, verdict or problem
  void progressChanged(const dampwright::PhaseKey& key);
  void limitsKnownChanged();
  void recentJobsChanged();
  void bookRead();  ///< once, after the start: limits, recent jobs and the last open job are there
  void idle();      ///< busy() has become false: a headless run may go on
  void dropProblemsChanged();
  /// Dropped runs leave something open: the first of each file layout.
  void questionsAsked(const std::vector<dampwright::RunPlace>& places);
  void bookTrouble(const QString& sentence);  ///< the book could not be written; what was typed is
                                              ///< kept. Empty: it is well again

 private:
  struct BookContents {  // what is read at the start
    std::vector<Limits> limits;
    std::vector<RigProfile> rigs;
    std::vector<JobSummary> recentJobs;
    std::optional<Job> lastJob;
  };
  /// The number of a new job is given by the book's thread when it is written; later writes of the
  /// same job, which may already wait behind that, find it here.
  using NumberCell = std::shared_ptr<std::string>;

  static Result<BookContents> contentsOf(const Book& book);
  void readContents();
  void takeContents(BookContents contents);
  void takeJob(const Job& job);                                             // from the book
  void addJob(const Job& job, const QString& what, std::vector<RunBytes>);  // to the book, and open
  void open(const Job& job, NumberCell number, const std::vector<RunBytes>& unwritten = {});
  void remember(const NumberCell& number);  // as the last open job
  void put(const Job& job, const QString& what);
  void putRig(const std::string& name, const std::optional<RigProfile>& rig, const QString& what);
  void edit(const QString& text, Job after);
  void editRig(const QString& text, const RigProfile& after);
  void keepLimits(const Limits& limits);
  bool limitsTaken(const Limits& limits) const;  // title and revision, by another sheet
  std::vector<RunBytes> unstored(const Job& job) const;
  void writeJob(const Job& job, const QString& what);
  void takeDrop(std::vector<DroppedItem> items, const QString& corner);
  void forgetProblems(const QStringList& files);
  static void refuseJobItems(std::vector<DroppedItem>& items);
  void takeRuns(std::vector<DroppedRun> runs, const QString& corner);
  void takeCard(const DamperCard& card, const QString& corner);
  void takeLimits(const Limits& limits);
  void takeDemonstration(std::vector<DroppedItem> items);
  void say(const QString& file, Error error);
  void tellTrouble(const Error& error);
  RigProfile profileFor(const std::string& name, const std::string& signature) const;
  void askOpen(const std::vector<RunBytes>& files);
  void refreshRecentJobs();
  void noteVerdict();
  void settle();

  QString bookFile_, sampleRuns_;
  std::optional<Job> job_;
  NumberCell number_;
  PhaseKey selected_;
  std::vector<Limits> knownLimits_;
  std::vector<JobSummary> recentJobs_;
  std::vector<DropProblem> dropProblems_;
  std::optional<VerdictWord> writtenVerdict_;
  bool wasBusy_ = true, triedContents_ = false;
  int drops_ = 0;  // being read
  QUndoStack undo_;
  BookKeeper keeper_;
  PhaseDesk desk_;
  OrderedJobs intake_;
};

}  // namespace dampwright
