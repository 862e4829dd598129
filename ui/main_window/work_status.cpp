// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/main_window/work_status.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QProgressBar>
#include <QPushButton>

#include "ui/session/session.h"
#include "ui/text/names.h"

namespace dampwright {

namespace {

constexpr int patienceMs = 500, barSteps = 1000;

struct Work {
  int phases = 0;
  double share = 0;  // sum over the phases
  QString corner;    // of one of them
};

Work workOf(const Session& session) {
  Work work;
  if (!session.hasJob()) return work;
  for (const JobItem& item : session.job().items) {
    for (std::size_t i = 0; i < item.phases.size(); ++i) {
      const PhaseState& state =
          session.state({QString::fromStdString(item.corner), static_cast<int>(i)});
      if (!state.busy) continue;
      ++work.phases;
      work.share += state.progress;
      work.corner = cornerName(item.corner);
    }
  }
  return work;
}

}  // namespace

WorkStatus::WorkStatus(Session& session, QWidget* parent)
    : QWidget(parent),
      session_(session),
      what_(new QLabel),
      bar_(new QProgressBar),
      stop_(new QPushButton(tr("Stop"))) {
  what_->setObjectName(QStringLiteral("quiet"));
  bar_->setTextVisible(false);
  bar_->setFixedWidth(96);
  bar_->setAccessibleName(tr("Progress"));
  auto* row = new QHBoxLayout(this);
  row->setContentsMargins(0, 0, 0, 0);
  row->addWidget(what_);
  row->addWidget(bar_);
  row->addWidget(stop_);
  patience_.setSingleShot(true);
  patience_.setInterval(patienceMs);
  connect(&patience_, &QTimer::timeout, this, [this] { setVisible(session_.busy()); });
  connect(stop_, &QPushButton::clicked, &session_, &Session::stopWork);
  connect(&session_, &Session::stateChanged, this, &WorkStatus::refresh);
  connect(&session_, &Session::progressChanged, this, &WorkStatus::refresh);
  connect(&session_, &Session::jobChanged, this, &WorkStatus::refresh);
  connect(&session_, &Session::idle, this, &WorkStatus::refresh);
  hide();
}

void WorkStatus::refresh() {
  if (!session_.busy()) {
    patience_.stop();
    return hide();
  }
  if (!isVisible() && !patience_.isActive()) patience_.start();
  const Work work = workOf(session_);
  bar_->setRange(0, work.phases == 0 ? 0 : barSteps);  // 0 to 0: busy, nobody knows how far
  if (work.phases > 0) bar_->setValue(static_cast<int>(work.share / work.phases * barSteps));
  what_->setText(work.phases == 1  ? tr("Measuring %1").arg(work.corner)
                 : work.phases > 1 ? tr("Measuring %1 dampers").arg(work.phases)
                                   : tr("Reading files"));
}

}  // namespace dampwright
