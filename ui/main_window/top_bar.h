// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QFrame>

#include "core/job/job.h"

class QLabel;

namespace dampwright {

class Actions;
class ElidedLabel;
class Session;

/// Job number, customer and vehicle, the work in the background, and the actions of every day.
class TopBar : public QFrame {
  Q_OBJECT
 public:
  TopBar(Session& session, const Actions& actions, QWidget* parent = nullptr);

  void setJob(const Job* job);  ///< null: none is open

 private:
  QLabel *number_, *invented_;
  ElidedLabel* about_;
};

}  // namespace dampwright
