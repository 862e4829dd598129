// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QObject>
#include <map>
#include <memory>
#include <optional>
#include <string>
#include <vector>

#include "core/job/job.h"
#include "ui/background/latest_job.h"
#include "ui/session/measure_phase.h"
#include "ui/session/phase_state.h"

namespace dampwright {

/// Keeps the measurement and the verdict of every phase of the open job up to date, off the GUI
/// thread. It measures again only what a measurement depends on, and only judges again where
/// nothing but the limits changed.
class PhaseDesk : public QObject {
  Q_OBJECT
 public:
  explicit PhaseDesk(const QString& bookFile, QObject* parent = nullptr);

  void show(const Job& job);  ///< the job as it is now; starts what is missing
  void clear();               ///< no job: all work is dropped, all runs leave the memory
  void setProfiles(std::vector<RigProfile> profiles);  ///< runs that they concern are read again
  const std::vector<RigProfile>& profiles() const { return profiles_; }

  /// A run that was just dropped need not be read from the book.
  void hold(const std::string& sha256, RunInHand run);
  void letBytesGo(const std::string& sha256);  ///< the book has them

  const PhaseState& state(const PhaseKey& key) const;
  std::shared_ptr<const RunReading> readingOf(const std::string& sha256) const;
  std::shared_ptr<const std::string> bytesOf(const std::string& sha256) const;
  bool busy() const;
  void stop();  ///< what runs is stopped, and says so as its problem

  /// The job's verdict in one word: the worst of its phases; nothing where one is missing.
  std::optional<VerdictWord> verdictOfAll() const;

 signals:
  void changed(const dampwright::PhaseKey& key);     ///< anything but progress
  void progressed(const dampwright::PhaseKey& key);  ///< progress alone

 private:
  struct Entry {
    PhaseKey key;
    std::vector<JobRun> runs;
    DamperCard card;
    std::optional<Limits> limits;  ///< by which the verdict is wanted
    bool stale = true;             ///< measured from something else, or not at all
    PhaseState state;
    LatestJob work;
  };
  using Entries = std::vector<std::unique_ptr<Entry>>;

  std::unique_ptr<Entry> takeEntry(const PhaseKey& key, const JobPhase& phase, const JobItem& item);
  void refresh(Entry& entry, const std::optional<Limits>& limits);
  void measure(Entry& entry);
  void judgeAgain(Entry& entry);
  void takeHome(Entry& entry, PhaseOutcome outcome, const std::optional<Limits>& judgedBy);
  void takeVerdictHome(Entry& entry, Verdict verdict, const Limits& judgedBy);

  QString bookFile_;
  std::vector<RigProfile> profiles_;
  std::map<std::string, RunInHand> runs_;
  Entries entries_;
};

}  // namespace dampwright
