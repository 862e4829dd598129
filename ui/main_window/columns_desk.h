// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QObject>
#include <QPointer>
#include <QWidget>
#include <deque>

#include "ui/session/session.h"

namespace dampwright {

class ColumnsWindow;

/// Opens the columns window: for a run that somebody wants to look at, and one after another for
/// dropped runs that leave something open. What is confirmed goes to the session; a window that is
/// closed without leaves the run listed with its question.
class ColumnsDesk : public QObject {
  Q_OBJECT
 public:
  ColumnsDesk(Session& session, QWidget* window);

  void open(const RunPlace& place);
  /// For a run of the selected phase: the only one, the one that asks, or the one chosen.
  void openSelected();
  bool canOpenSelected() const;
  ColumnsWindow* window() const;  ///< nothing while none is open

 private:
  void openNext();
  int chooseRun(const JobPhase& phase);

  Session& session_;
  QWidget* parent_;
  std::deque<RunPlace> waiting_;
  QPointer<ColumnsWindow> open_;
};

}  // namespace dampwright
