// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QTimer>
#include <QWidget>

class QLabel;
class QProgressBar;
class QPushButton;

namespace dampwright {

class Session;

/// What the program works on in the background, how far it is, and a button that stops it. Shown
/// only for work that takes longer than half a second.
class WorkStatus : public QWidget {
  Q_OBJECT
 public:
  explicit WorkStatus(Session& session, QWidget* parent = nullptr);

 private:
  void refresh();

  Session& session_;
  QLabel* what_;
  QProgressBar* bar_;
  QPushButton* stop_;
  QTimer patience_;
};

}  // namespace dampwright
