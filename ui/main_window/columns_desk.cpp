// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/main_window/columns_desk.h"

#include <QInputDialog>

#include "ui/columns/columns_window.h"
#include "ui/session/change_job.h"

namespace dampwright {

ColumnsDesk::ColumnsDesk(Session& session, QWidget* window)
    : QObject(window), session_(session), parent_(window) {
  connect(&session, &Session::questionsAsked, this, [this](const std::vector<RunPlace>& places) {
    waiting_.insert(waiting_.end(), places.begin(), places.end());
    openNext();
  });
}

ColumnsWindow* ColumnsDesk::window() const { return open_; }

void ColumnsDesk::openNext() {
  while (!open_ && !waiting_.empty()) {
    const RunPlace place = waiting_.front();
    waiting_.pop_front();
    // What was answered for its rig meanwhile need not be asked again.
    const auto reading = session_.reading(place);
    if (reading && !reading->open.empty()) open(place);
  }
}

void ColumnsDesk::open(const RunPlace& place) {
  const JobRun* run = session_.run(place);
  if (run == nullptr) return;
  if (open_) return open_->raise();
  ColumnsSubject subject{run->file, session_.loaderOf(place), session_.rigOf(place), run->answers};
  open_ = new ColumnsWindow(std::move(subject), session_.rigProfiles(), parent_);
  open_->setAttribute(Qt::WA_DeleteOnClose);
  connect(open_,
          &ColumnsWindow::confirmed,
          this,
          [this, place, sha256 = run->sha256](const ColumnsConfirmed& what) {
            const JobRun* now = session_.run(place);
            if (now == nullptr || now->sha256 != sha256) return;  // another job by now
            session_.confirmColumns(place, what.answers, what.rig);
          });
  connect(
      open_,
      &QDialog::finished,
      this,
      [this] {
        open_ = nullptr;
        openNext();
      },
      Qt::QueuedConnection);
  open_->open();
}

bool ColumnsDesk::canOpenSelected() const {
  return session_.run({session_.selected(), 0}) != nullptr;
}

void ColumnsDesk::openSelected() {
  const PhaseKey key = session_.selected();
  const JobPhase* phase =
      session_.hasJob() ? findPhase(session_.job(), key.corner.toStdString(), key.phase) : nullptr;
  if (phase == nullptr) return;
  for (int i = 0; i < static_cast<int>(phase->runs.size()); ++i) {
    const auto reading = session_.reading({key, i});
    if (reading && !reading->trace) return open({key, i});
  }
  const int run = phase->runs.size() == 1 ? 0 : chooseRun(*phase);
  if (run >= 0) open({key, run});
}

int ColumnsDesk::chooseRun(const JobPhase& phase) {
  QStringList files;
  for (const JobRun& run : phase.runs) files << QString::fromStdString(run.file);
  bool chosen = false;
  const QString file =
      QInputDialog::getItem(parent_, tr("Columns"), tr("Run file"), files, 0, false, &chosen);
  return chosen ? static_cast<int>(files.indexOf(file)) : -1;
}

}  // namespace dampwright
