// SPDX-License-Identifier: GPL-3.0-or-later
// The doors for edits: each makes a changed job and pushes it as an undo command.
#include <utility>

#include "ui/session/change_job.h"
#include "ui/session/job_edit.h"
#include "ui/session/session.h"

namespace dampwright {

void Session::edit(const QString& text, Job after) {
  if (!hasJob() || after == *job_) return;
  undo_.push(
      new JobEdit(text, *job_, std::move(after), [this](const Job& job, const QString& what) {
        put(job, what);
      }));
}

void Session::select(const PhaseKey& key) {
  if (key == selected_) return;
  selected_ = key;
  emit selectionChanged();
}

void Session::removeRun(const PhaseKey& key, int run) {
  if (!hasJob()) return;
  edit(tr("remove a run of %1").arg(key.corner),
       withoutRun(*job_, key.corner.toStdString(), key.phase, run));
}

void Session::moveRuns(const PhaseKey& from, const QString& toCorner) {
  if (!hasJob()) return;
  edit(tr("move the runs of %1 to %2").arg(from.corner, toCorner),
       withRunsMoved(*job_, from.corner.toStdString(), from.phase, toCorner.toStdString()));
}

void Session::setDamper(const QString& corner, const DamperCard& card) {
  if (!hasJob()) return;
  edit(tr("damper card of %1").arg(corner), withDamper(*job_, corner.toStdString(), card));
}

void Session::setJobDetails(const Job& details) {
  if (!hasJob()) return;
  edit(tr("job details"), withDetails(*job_, details));
}

void Session::strikeOut(const PhaseKey& key, int run, const TimeSpan& span) {
  if (!hasJob()) return;
  edit(tr("strike out a cycle"),
       withStruckOut(*job_, key.corner.toStdString(), key.phase, run, span));
}

void Session::putBack(const PhaseKey& key, int run, const TimeSpan& span) {
  if (!hasJob()) return;
  edit(tr("put back a cycle"), withPutBack(*job_, key.corner.toStdString(), key.phase, run, span));
}

}  // namespace dampwright
