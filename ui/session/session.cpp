// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/session/session.h"

#include <QDateTime>
#include <utility>

#include "ui/session/change_job.h"
#include "ui/session/job_edit.h"

namespace dampwright {

Session::Session(const QString& bookFile, const QString& sampleRuns, QObject* parent)
    : QObject(parent), bookFile_(bookFile), sampleRuns_(sampleRuns) {}

Session::~Session() = default;

bool Session::hasJob() const { return job_.has_value(); }

const Job& Session::job() const {
  expects(hasJob());
  return *job_;
}

const PhaseState& Session::state(const PhaseKey&) const {
  static const PhaseState nothing;
  return nothing;
}

PhaseKey Session::selected() const { return selected_; }
std::vector<Limits> Session::knownLimits() const { return knownLimits_; }
const std::vector<JobSummary>& Session::recentJobs() const { return recentJobs_; }
const std::vector<DropProblem>& Session::dropProblems() const { return dropProblems_; }
bool Session::busy() const { return false; }
QUndoStack* Session::undoStack() { return &undo_; }

Result<std::string> Session::bytesOfRun(const std::string& sha256) const {
  return Error{"run-file-missing", {{"sha256", sha256}}, {}};
}

}  // namespace dampwright
