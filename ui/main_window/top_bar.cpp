// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/main_window/top_bar.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QToolButton>

#include "ui/look/elided.h"
#include "ui/look/type.h"
#include "ui/main_window/actions.h"
#include "ui/main_window/work_status.h"
#include "ui/session/session.h"

namespace dampwright {

namespace {

QToolButton* buttonFor(QAction* action, const QString& name) {
  auto* button = new QToolButton;
  button->setObjectName(name);
  button->setDefaultAction(action);
  button->setToolButtonStyle(Qt::ToolButtonTextOnly);
  button->setMinimumHeight(32);
  button->setFocusPolicy(Qt::StrongFocus);
  button->setToolTip(
      QStringLiteral("%1 (%2)").arg(action->text().remove(QLatin1Char('&')),
                                    action->shortcut().toString(QKeySequence::NativeText)));
  return button;
}

}  // namespace

TopBar::TopBar(Session& session, const Actions& actions, QWidget* parent)
    : QFrame(parent),
      number_(new QLabel),
      invented_(new QLabel(tr("invented"))),
      about_(new ElidedLabel) {
  setObjectName(QStringLiteral("topBar"));
  number_->setFont(screenFont(TextSize::Job));
  about_->setObjectName(QStringLiteral("quiet"));
  invented_->setObjectName(QStringLiteral("chip"));
  invented_->setSizePolicy(QSizePolicy::Fixed, QSizePolicy::Fixed);
  invented_->setFont(screenFont(TextSize::Quiet));
  invented_->setToolTip(tr("The demonstration: nothing in it was measured on a real bench."));
  auto* row = new QHBoxLayout(this);
  row->setContentsMargins(20, 8, 16, 8);
  row->setSpacing(10);
  row->addWidget(number_);
  row->addWidget(invented_);
  row->addWidget(about_, 1);
  row->addWidget(new WorkStatus(session));
  for (const ActionId id : {ActionId::AddRuns, ActionId::Limits})
    row->addWidget(buttonFor(actions[id], QStringLiteral("plain")));
  row->addWidget(buttonFor(actions[ActionId::PrintSheet], QStringLiteral("primary")));
  setJob(nullptr);
}

void TopBar::setJob(const Job* job) {
  invented_->setVisible(job != nullptr && job->invented);
  if (job == nullptr) {
    number_->setText(QStringLiteral("Dampwright"));
    about_->setWhole({});
  } else {
    const QString number = QString::fromStdString(job->number);
    number_->setText(number.isEmpty() ? tr("New job") : tr("Job %1").arg(number));
    QStringList parts;
    for (const std::string& part : {job->customer, job->vehicle, job->plate, job->technician}) {
      if (!part.empty()) parts << QString::fromStdString(part);
    }
    about_->setWhole(parts.join(QStringLiteral(" · ")));
  }
}

}  // namespace dampwright
