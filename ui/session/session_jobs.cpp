// SPDX-License-Identifier: GPL-3.0-or-later
// Which job is open.
#include <QDateTime>
#include <utility>

#include "ui/session/change_job.h"
#include "ui/session/session.h"

namespace dampwright {

void Session::put(const Job& job, const QString&) {
  job_ = job;
  emit jobChanged();
}

void Session::startJob(const Job& draft) {
  Job job = withAllCorners(draft);
  if (job.opened.empty()) {
    const QDateTime now = QDateTime::currentDateTime();
    job.opened = now.toOffsetFromUtc(now.offsetFromUtc()).toString(Qt::ISODate).toStdString();
  }
  undo_.clear();
  put(job, tr("new job"));
  select({QString::fromStdString(job.items.front().corner), 0});
}

void Session::openJob(const QString&) {}
void Session::openDemonstration() {}
void Session::dropFiles(const QStringList&, const QString&) {}
void Session::settleDirection(const PhaseKey&, Direction) {}
void Session::stopWork() {}

}  // namespace dampwright
