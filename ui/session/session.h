// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QObject>
#include <QString>
#include <QStringList>
#include <QUndoStack>
#include <memory>
#include <optional>
#include <vector>

#include "core/base/result.h"
#include "core/book/job_summary.h"
#include "core/job/job.h"
#include "core/measure/measure_runs.h"
#include "core/verdict/verdict.h"

namespace dampwright {

/// Which measurement: the damper of a corner and the index of its phase (as found, after work, a
/// setting).
struct PhaseKey {
  QString corner;
  int phase = 0;

  bool operator==(const PhaseKey&) const = default;
};

/// What is known of one phase. `measured` and `verdict` are the newest results; `busy` while a
/// newer one is made.
struct PhaseState {
  bool busy = false;
  double progress = 0;
  std::shared_ptr<const Measured> measured;
  std::optional<Verdict> verdict;
  std::optional<Error> problem;  ///< why there is no measurement
};

/// A file that was dropped and not taken, and why.
struct DropProblem {
  QString file;
  Error error;
};

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
  const std::vector<DropProblem>& dropProblems() const;
  bool busy() const;  ///< files are read, measured or written, or the book is not read yet
  /// The bytes of a run as they came. From any thread. Errors: run-file-missing, those of
  /// core/book.
  Result<std::string> bytesOfRun(const std::string& sha256) const;
  QUndoStack* undoStack();

 public slots:
  void select(const dampwright::PhaseKey& key);
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
  void stopWork();

 signals:
  void jobChanged();  ///< anything of the job itself, or another job
  void selectionChanged();
  void stateChanged(const dampwright::PhaseKey& key);  ///< busy, progress, measurement or verdict
  void limitsKnownChanged();
  void recentJobsChanged();
  void bookRead();  ///< once, after the start: limits, recent jobs and the last open job are there
  void idle();      ///< busy() has become false: a headless run may go on
  void dropProblemsChanged();
  void bookTrouble(const QString& sentence);  ///< the book could not be written; what was typed is
                                              ///< kept. Empty: it is well again

 private:
  void edit(const QString& text, Job after);
  void put(const Job& job, const QString& what);

  QString bookFile_, sampleRuns_;
  std::optional<Job> job_;
  PhaseKey selected_;
  std::vector<Limits> knownLimits_;
  std::vector<JobSummary> recentJobs_;
  std::vector<DropProblem> dropProblems_;
  QUndoStack undo_;
};

}  // namespace dampwright
