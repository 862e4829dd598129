// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <optional>
#include <vector>

#include "core/verdict/verdict.h"
#include "ui/session/session.h"

namespace dampwright {

/// Something said in plain words, with what can be done about it.
enum class NoticeAction {
  None,
  SettleDirection,  ///< two answers: rising displacement is compression, or rebound
  TurnForceSign,    ///< the sign that was given is turned where it was given
  ConfirmUnits,     ///< the units that were assumed are right; else the columns window
  Columns,          ///< answered in the columns window
  Dismiss           ///< a file that was dropped: read and put away
};

struct NoticeView {
  QString title;  ///< what it is about: a file, a check; may be empty
  QString text;   ///< what is so
  QString hint;   ///< what to do; may be empty
  bool warning = false;
  NoticeAction action = NoticeAction::None;
  int index = 0;           ///< of a drop problem
  int run = 0;             ///< index into the phase's runs
  QString confirmed = {};  ///< what ConfirmUnits confirms: "mm"

  bool operator==(const NoticeView&) const = default;
};

/// Everything that the verdict part shows of the selected damper.
struct VerdictView {
  bool hasJob = false;
  QString damper;                                       ///< "Rear left · DA-1109"
  bool busy = false, measured = false, broken = false;  ///< broken: it could not be measured
  bool printable = false;                               ///< the job has something to print
  std::optional<Verdict> verdict;
  std::optional<Limits> chosen;  ///< of the job
  std::vector<Limits> known;
  std::vector<NoticeView> notices;  ///< most pressing first

  VerdictWord word() const { return verdict ? verdict->word : VerdictWord::NotTested; }
};

VerdictView verdictView(const Session& session);

/// Whether a job has anything for a sheet.
bool isPrintable(const Job& job);

/// One sentence below the stamp: the verdict in numbers, or what is missing for one.
QString verdictLine(const VerdictView& view);

}  // namespace dampwright
